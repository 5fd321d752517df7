import { type Rational, ONE, isZero } from '../exact/rational.ts';
import { type Result, all, chain, map, success } from '../report/result.ts';
import { type Unknowns, countValue, numberValue } from './count.ts';
import type { Atom, Formula, Group, Member, Named, Part } from './formula.ts';
import { type Chain, type MemberSyntax, type PartSyntax, type Unit, chainItems } from './syntax.ts';

/** The members that a defined name stands for. */
export type NamedMembers = ReadonlyMap<string, readonly Member[]>;

/** What a formula is built with: its text for faults, values of unknown subscripts, and defined names. */
export interface FormulaContext {
  readonly text: string;
  readonly unknowns: Unknowns;
  readonly names: NamedMembers;
}

const HYDROGEN: ReadonlyMap<string, { readonly massNumber: string; readonly spelled: 'D' | 'T' }> = new Map([
  ['D', { massNumber: '2', spelled: 'D' }],
  ['T', { massNumber: '3', spelled: 'T' }],
]);

const atomOf = (symbol: string, mass: string | null, count: Rational): Atom => {
  const isotope = mass === null ? HYDROGEN.get(symbol) : undefined;
  if (isotope !== undefined) return { kind: 'atom', symbol: 'H', ...isotope, count };
  return { kind: 'atom', symbol, massNumber: mass, count };
};

const BRACKETS: ReadonlyMap<string, Group['bracket']> = new Map([
  ['(', '('],
  ['[', '['],
  ['{', '{'],
]);

const unitOf = (context: FormulaContext, unit: Unit, count: Rational): Result<Member> => {
  if (unit.kind === 'element') {
    const mass = unit.mass === null ? null : String(numberValue(unit.mass).n);
    return success(atomOf(unit.token.value, mass, count));
  }
  if (unit.kind === 'name') {
    const named: Named = {
      kind: 'named',
      name: unit.token.value,
      members: context.names.get(unit.token.value) ?? [],
      count,
    };
    return success(named);
  }
  const bracket = BRACKETS.get(unit.open.text) ?? '(';
  return map(membersOf(context, unit.members), (members) => ({ kind: 'group', bracket, members, count }));
};

/** The members, those whose subscript came out as 0 left out. */
const membersOf = (context: FormulaContext, syntax: Chain<MemberSyntax>): Result<readonly Member[]> => {
  const members = chainItems(syntax).map(({ unit, count }) =>
    chain(countValue(context.text, count, context.unknowns), (value) => unitOf(context, unit, value)),
  );
  return map(all(members), (built) => built.filter(({ count }) => !isZero(count)));
};

const partOf = (context: FormulaContext, part: PartSyntax): Result<Part> =>
  chain(
    part.multiplier === null ? success(ONE) : countValue(context.text, part.multiplier, context.unknowns),
    (multiplier) => map(membersOf(context, part.members), (members) => ({ multiplier, members })),
  );

/** The formula of a parsed species; null parts are the electron's. Fault: `bad-count`. */
export const formulaOf = (context: FormulaContext, parts: Chain<PartSyntax> | null): Result<Formula> =>
  map(all(chainItems(parts).map((part) => partOf(context, part))), (built) =>
    built.filter(({ multiplier }) => !isZero(multiplier)),
  );
