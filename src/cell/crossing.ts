import { type Rational, ONE, ZERO, isZero, signOf } from '../exact/rational.ts';
import type { Species } from '../species/species.ts';
import type { Crossing, Electrode } from './cell-reaction.ts';

/**
 * What must pass the separator for one electron that goes from anode to cathode outside.
 *
 * The anode's half-cell gains one positive charge for each electron it gives, the cathode's loses one, so the charge
 * that crosses inside, counted from anode to cathode, must be +1. Ions made on one side and used on the other cross
 * in the smaller of the two amounts; what they leave of the +1 is carried by ions that take no part.
 *
 * @param made for one electron, what each electrode makes (positive) or uses (negative) of each species
 */
export const crossingOf = (
  species: readonly Species[],
  made: Readonly<Record<Electrode, readonly Rational[]>>,
): readonly Crossing[] => {
  const ions = species.flatMap((ion, place) => {
    const atAnode = made.anode[place] ?? ZERO;
    const atCathode = made.cathode[place] ?? ZERO;
    if (isZero(ion.charge) || signOf(atAnode) * signOf(atCathode) !== -1n) return [];
    const amount = atAnode.abs().compare(atCathode.abs()) <= 0 ? atAnode.abs() : atCathode.abs();
    return [{ species: ion, amount, ...way(signOf(atAnode) > 0n) }];
  });
  const carried = ions.reduce((sum, ion) => sum.add(chargeForward(ion)), ZERO);
  const rest = ONE.sub(carried);
  return isZero(rest) ? ions : [...ions, { species: null, amount: rest.abs(), ...way(signOf(rest) > 0n) }];
};

const way = (forward: boolean): Pick<Crossing, 'from' | 'to'> =>
  forward ? { from: 'anode', to: 'cathode' } : { from: 'cathode', to: 'anode' };

/** The charge that a crossing brings from anode to cathode. */
const chargeForward = (ion: Crossing): Rational => {
  const charge = (ion.species?.charge ?? ONE).mul(ion.amount);
  return ion.from === 'anode' ? charge : charge.neg();
};
