import { type Rational, rational } from '../exact/rational.ts';
import type { Site } from './oxidation-site.ts';

/** Atoms that share a charge, with what the spelling tells about them. */
export interface Bag {
  readonly counts: ReadonlyMap<string, Rational>;
  readonly charge: Rational;
  /** Halogens that are spelled in front of oxygen (ClO3): they are not halide. */
  readonly oxoHalogens: ReadonlySet<string>;
  /** Known ions or ligands were taken out: H is then acidic first, and carbonyl metals may be negative. */
  readonly stripped: boolean;
  readonly carbonyl: boolean;
}

/** What is settled so far. Over the open elements, the sum of number times count must come to `rest`. */
export interface State {
  readonly bag: Bag;
  readonly sites: readonly Site[];
  readonly open: ReadonlyMap<string, Rational>;
  readonly rest: Rational;
}

/** The state with the open `element` settled at `number`; the last open element is left for the closing. */
export const assign = (state: State, element: string, number: bigint): State => {
  const count = state.open.get(element);
  if (count === undefined || state.open.size < 2) return state;
  const open = new Map(state.open);
  open.delete(element);
  const site = { element, number: rational(number), count };
  return { ...state, open, sites: [...state.sites, site], rest: state.rest.sub(count.mul(site.number)) };
};

/** The numbers settled one after another. */
export const assignAll = (state: State, numbers: Iterable<readonly [string, bigint]>): State =>
  [...numbers].reduce((next, [element, number]) => assign(next, element, number), state);

/** Elements without a number yet. */
export const openElements = (state: State): readonly string[] => [...state.open.keys()];

/** True where the bag holds the element, settled or not. */
export const has = (state: State, element: string): boolean => state.bag.counts.has(element);

/** A bag with no spelling to look at. */
export const bagOf = (counts: ReadonlyMap<string, Rational>, charge: Rational): Bag => ({
  counts,
  charge,
  oxoHalogens: new Set(),
  stripped: false,
  carbonyl: false,
});
