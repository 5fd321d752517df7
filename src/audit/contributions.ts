import type { Label } from '../balance/matrix.ts';
import { CHARGE } from '../balance/matrix.ts';
import { type Rational, isZero } from '../exact/rational.ts';
import type { Equation } from '../species/equation.ts';
import type { Species } from '../species/species.ts';
import { type Side, draftOf } from './writing.ts';

/** What one written term puts into the ledger. */
export interface Contribution {
  readonly species: Species;
  readonly side: Side;
  readonly coefficient: Rational;
  /** Atoms of each element, and the charge where it is not 0, coefficient included. */
  readonly amounts: ReadonlyMap<Label, Rational>;
}

/** What each term of `equation` puts into the ledger, in the order written. */
export const contributionsOf = (equation: Equation): readonly Contribution[] =>
  draftOf(equation).map(({ species, side, coefficient }) => {
    const each: readonly (readonly [Label, Rational])[] = [...species.composition, [CHARGE, species.charge]];
    const amounts = each.flatMap(([label, amount]) =>
      isZero(amount) ? [] : [[label, amount.mul(coefficient)] as const],
    );
    return { species, side, coefficient, amounts: new Map(amounts) };
  });
