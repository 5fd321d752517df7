import { type Rational, ONE, rational } from '../exact/rational.ts';
import { type FormulaContext, formulaOf } from '../notation/formula-of.ts';
import { LIMITS } from '../notation/limits.ts';
import { numberValue } from '../notation/count.ts';
import { formulaKey, formulaText } from '../notation/print/formula-text.ts';
import { stateOf } from '../notation/state.ts';
import { faultAt } from '../notation/place.ts';
import {
  type Chain,
  type ChargeSyntax,
  type MemberSyntax,
  type PartSyntax,
  type SpeciesSyntax,
  chainItems,
} from '../notation/syntax.ts';
import type { Fault } from '../report/fault.ts';
import { type Result, failure, map, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import { type Species, ELECTRON, countAtoms, plainCharge } from './species.ts';

/** The charge number of a written charge; 0 for none. */
export const chargeNumber = (charge: ChargeSyntax | null): Rational => {
  if (charge === null) return rational(0n);
  const size = (charge.size === null ? ONE : numberValue(charge.size)).mul(rational(BigInt(charge.run)));
  return charge.sign === '-' ? size.neg() : size;
};

const buildElectron = (text: string, { charge }: SpeciesSyntax, state: string | null): Result<Species> => {
  if (chargeNumber(charge).equals(ELECTRON.charge)) return success({ ...ELECTRON, state });
  const message = 'e stands for the electron, and that has the charge 1-';
  return failure({ code: 'bad-charge', message, span: wholeSpan(text), hint: 'write e^-' });
};

/** Roman numerals in brackets, Fe(III): letters that are iodine and vanadium as well. */
const oxidationNumber = (text: string, parts: Chain<PartSyntax> | null): Fault | null => {
  for (const { unit, count } of chainItems(parts).flatMap(({ members }) => chainItems(members))) {
    if (unit.kind !== 'group' || unit.open.text !== '(' || count !== null) continue;
    const letters = chainItems(unit.members).map((member) => romanLetter(member));
    if (!/^(?:I{1,3}|IV|VI{0,3}|IX)$/u.test(letters.join(''))) continue;
    const from = unit.open.offset;
    const place = { from, to: from + letters.length + 2 };
    return faultAt(text, 'bad-charge', place, 'an oxidation number is no part of a formula', 'write the charge: Fe^3+');
  }
  return null;
};

const romanLetter = ({ unit, count }: MemberSyntax): string =>
  unit.kind === 'element' && unit.mass === null && count === null ? unit.token.value : '?';

const tooManySigns = (text: string): Fault => ({
  code: 'bad-charge',
  message: `a charge is a run of at most ${String(LIMITS.signRun)} signs`,
  span: wholeSpan(text),
  hint: 'write its size and one sign: ^12-',
});

/** The species of one reading. Fault: `bad-count` for an unknown subscript without a value, or one below 0. */
export const buildSpecies = (context: FormulaContext, syntax: SpeciesSyntax): Result<Species> => {
  const state = stateOf(syntax.state);
  if (syntax.parts === null) return buildElectron(context.text, syntax, state);
  if ((syntax.charge?.run ?? 1) > LIMITS.signRun) return failure(tooManySigns(context.text));
  const numeral = oxidationNumber(context.text, syntax.parts);
  if (numeral !== null) return failure(numeral);
  return map(formulaOf(context, syntax.parts), (parts) => {
    const charge = chargeNumber(syntax.charge);
    return {
      formula: formulaText(parts),
      parts,
      composition: countAtoms(parts),
      charge,
      state,
      key: formulaKey(parts) + plainCharge(charge),
    };
  });
};
