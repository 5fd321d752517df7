import type { Unknown } from '../../balance/unknowns.ts';

/**
 * The elements whose atoms conservation cannot follow from one written species to another: those that helpers bring and
 * take, and H and O, which pass from one species to another as water and H^+ even where no medium lends them.
 */
export const untracedElements = (unknowns: readonly Unknown[]): ReadonlySet<string> =>
  new Set(['H', 'O', ...unknowns.filter((one) => one.helper).flatMap((one) => [...one.species.composition.keys()])]);
