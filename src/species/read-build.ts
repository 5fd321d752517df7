import { type Rational, ONE, rational } from '../exact/rational.ts';
import { type FormulaContext, formulaOf } from '../notation/formula-of.ts';
import { numberValue } from '../notation/count.ts';
import { formulaKey, formulaText } from '../notation/print/formula-text.ts';
import { stateOf } from '../notation/state.ts';
import type { ChargeSyntax, SpeciesSyntax } from '../notation/syntax.ts';
import { type Result, map } from '../report/result.ts';
import { type Species, ELECTRON, countAtoms, plainCharge } from './species.ts';

/** The charge number of a written charge; 0 for none. */
export const chargeNumber = (charge: ChargeSyntax | null): Rational => {
  if (charge === null) return rational(0n);
  const size = (charge.size === null ? ONE : numberValue(charge.size)).mul(rational(BigInt(charge.run)));
  return charge.sign === '-' ? size.neg() : size;
};

/** The species of one reading. Fault: `bad-count` for an unknown subscript without a value, or one below 0. */
export const buildSpecies = (context: FormulaContext, syntax: SpeciesSyntax): Result<Species> => {
  const state = stateOf(syntax.state);
  if (syntax.parts === null) return { ok: true, value: { ...ELECTRON, state }, notes: [] };
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
