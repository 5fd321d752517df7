import { type Meter, type TooHard, startMeter } from '../exact/bounds.ts';
import { minimalSolutions } from '../exact/minimal.ts';
import { speciesMatrix } from './matrix.ts';
import { type Numbers, joinColumns, splitColumns } from './solve.ts';
import type { Unknown } from './unknowns.ts';

/** All elementary balances, or the work limit that was passed. */
export type Elementary = { readonly kind: 'elementary'; readonly balances: readonly Numbers[] } | TooHard;

/**
 * The elementary balances of `unknowns`: those from which no species at all, helpers included, can be dropped. Each keeps
 * the sides that are written; a free unknown may stand on either.
 *
 * Other than a family, which must not split a free unknown, these are just what splitting gives: with h = p - n the
 * extreme rays of  A_S x + A_H p - A_H n = 0,  x, p, n >= 0  are the vectors of smallest support (conformal sums,
 * R. T. Rockafellar, The elementary vectors of a subspace of R^N, 1969) and the pairs p_j = n_j, which are left out.
 */
export const elementaryBalances = (unknowns: readonly Unknown[], meter: Meter = startMeter()): Elementary => {
  const split = splitColumns(speciesMatrix(unknowns.map((unknown) => unknown.species)), unknowns);
  const [strictCount, freeCount] = [split.strictIndex.length, split.freeIndex.length];
  const doubled = split.strict.map((row, index) => {
    const free = split.free[index] ?? [];
    return [...row, ...free, ...free.map((value) => -value)];
  });
  const minimal = minimalSolutions(
    doubled,
    doubled.map(() => []),
    meter,
  );
  if (minimal.kind === 'too-hard') return minimal;
  if (minimal.kind === 'lines') throw new Error('no column is free here');
  const balances = minimal.rays.flatMap(({ strict: ray }) => {
    const plus = ray.slice(strictCount, strictCount + freeCount);
    const minus = ray.slice(strictCount + freeCount);
    if (plus.some((value, at) => value !== 0n && minus[at] !== 0n)) return [];
    const free = plus.map((value, at) => value - (minus[at] ?? 0n));
    return [joinColumns(split, { strict: ray.slice(0, strictCount), free }, unknowns)];
  });
  return { kind: 'elementary', balances };
};
