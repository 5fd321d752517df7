import { type Rational, ONE, isZero } from '../exact/rational.ts';
import type { Token } from 'moo';
import { elementOf } from '../elements/table.ts';
import { type Result, all, chain, failure, map, success } from '../report/result.ts';
import { type Unknowns, countValue, numberValue } from './count.ts';
import type { Atom, Formula, Group, Member, Named, Part } from './formula.ts';
import { faultAt, placeOf } from './place.ts';
import { type Chain, type MemberSyntax, type NumberSyntax, type PartSyntax, type Unit, chainItems } from './syntax.ts';

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

/** Mass number at least the atomic number, since protons count; the heaviest nuclides hold about 2.6 nucleons a proton. */
const isPossibleMass = (symbol: string, mass: bigint): boolean => {
  const protons = BigInt(elementOf(symbol)?.atomicNumber ?? 1);
  return mass >= protons && mass <= 3n * protons + 4n;
};

const nuclideOf = (text: string, token: Token, mass: NumberSyntax | null, count: Rational): Result<Member> => {
  if (mass === null) return success(atomOf(token.value, null, count));
  const { n } = numberValue(mass);
  if (isPossibleMass(token.value, n)) return success(atomOf(token.value, String(n), count));
  const first = chainItems(mass.tokens)[0] ?? token;
  const message = `${token.value} has no nuclide of mass number ${String(n)}`;
  return failure(faultAt(text, 'bad-count', placeOf(first, token), message, 'a count stands behind its atom: H2O'));
};

const BRACKETS: ReadonlyMap<string, Group['bracket']> = new Map([
  ['(', '('],
  ['[', '['],
  ['{', '{'],
]);

const unitOf = (context: FormulaContext, unit: Unit, count: Rational): Result<Member> => {
  if (unit.kind === 'element') return nuclideOf(context.text, unit.token, unit.mass, count);
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
