import { type Rational, ZERO, signOf } from '../exact/rational.ts';
import { WATER } from '../redox/media.ts';
import type { Species } from '../species/species.ts';

/** Water in the state given; what H^+ and OH^- fold into. */
export const waterIn = (state: string | null): Species => ({ ...WATER, state });

/** Amounts of species, positive on the right. `water` is how much H^+ and OH^- became, never negative. */
export interface Folded {
  readonly species: readonly Species[];
  readonly amounts: readonly Rational[];
  readonly water: Rational;
  /** Where the folded water went in `species`; -1 where nothing folded. */
  readonly place: number;
}

/**
 * H^+ and OH^- on one side replaced by water on that side:  H^+ + OH^- = H2O.  On the right both were made, on the
 * left both were used; what is left over of one of them stays. Opposite sides are left alone.
 */
export const foldIons = (species: readonly Species[], amounts: readonly Rational[]): Folded => {
  const left = [...amounts];
  let signed = ZERO;
  for (const acid of placesOf(species, 'H^+')) {
    for (const base of placesOf(species, 'OH^-')) {
      const folded = commonPart(left[acid] ?? ZERO, left[base] ?? ZERO);
      left[acid] = (left[acid] ?? ZERO).sub(folded);
      left[base] = (left[base] ?? ZERO).sub(folded);
      signed = signed.add(folded);
    }
  }
  if (signOf(signed) === 0n) return { species, amounts, water: ZERO, place: -1 };
  const place = waterPlace(species);
  const all = place < species.length ? species : [...species, waterIn(isDissolved(species) ? 'l' : null)];
  left[place] = (left[place] ?? ZERO).add(signed);
  return { species: all, amounts: left, water: signed.abs(), place };
};

const placesOf = (species: readonly Species[], key: string): readonly number[] =>
  species.flatMap((one, place) => (one.key === key ? [place] : []));

/** The part of `a` that `b` matches: the smaller of two amounts on one side, 0 for opposite sides. */
const commonPart = (a: Rational, b: Rational): Rational => {
  if (signOf(a) !== signOf(b)) return ZERO;
  return a.abs().compare(b.abs()) <= 0 ? a : b;
};

const isDissolved = (species: readonly Species[]): boolean =>
  species.some((one) => (one.key === 'H^+' || one.key === 'OH^-') && one.state !== null);

/** The place of the water that ions in solution become: liquid or of no stated state, else a new place at the end. */
const waterPlace = (species: readonly Species[]): number => {
  const waters = placesOf(species, 'H2O');
  const stateOf = (place: number): string | null => species[place]?.state ?? null;
  const fitting =
    waters.find((place) => stateOf(place) === 'l' || stateOf(place) === null) ??
    (isDissolved(species) ? undefined : waters[0]);
  return fitting ?? species.length;
};
