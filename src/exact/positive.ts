import { type Meter, type TooHard, startMeter } from './bounds.ts';
import { lcmOf } from './integer.ts';
import { echelonOf, entry, leftNullSpace, primitivePair, primitiveVector, range, times, weighted } from './matrix.ts';
import type { IntegerMatrix, IntegerVector } from './matrix.ts';
import { solveNonNegative } from './simplex.ts';

/** Whole numbers for the strict and for the free columns. */
export interface WholeSolution {
  readonly strict: bigint[];
  readonly free: bigint[];
}

/** A strictly positive solution, or the proof that there is none, or the work limit that was passed. */
export type Positivity =
  | ({ readonly kind: 'solvable' } & WholeSolution)
  | { readonly kind: 'impossible'; readonly certificate: bigint[] }
  | TooHard;

/**
 * Solves  A_S x + A_H h = 0  with every x > 0 and h of any sign, exactly. A_S is `strict`, A_H is `free`; both have the
 * same rows, at least one.
 *
 * Gives a whole, jointly primitive solution; or a certificate w, primitive, of few rows:  w A_H = 0  and
 * 0 != w A_S >= 0. Stiemke's lemma (E. Stiemke, Math. Ann. 76 (1915) 340; A. Schrijver, Theory of Linear and Integer
 * Programming, 1986, section 7.8): exactly one of the two exists. One half is plain: with both,
 * 0 = w (A_S x + A_H h) = (w A_S) x > 0. Free of h, with the rows of C a basis of { w : w A_H = 0 }, the system is
 * C A_S x = 0, and since it is homogeneous x >= 1 stands for x > 0.
 *
 * Where rows of the certificate can be spared the earlier rows are kept; a certificate at the work limit may keep more.
 */
export const strictlyPositive = (
  strict: IntegerMatrix,
  free: IntegerMatrix,
  meter: Meter = startMeter(),
): Positivity => {
  const single = singleRow(strict, free);
  if (single !== undefined) return { kind: 'impossible', certificate: single };
  const attempt = atLeast(strict, free, onesFor(strict), meter);
  if (attempt.kind !== 'impossible') return attempt;
  return { kind: 'impossible', certificate: fewestRows(strict, free, attempt.certificate, meter) };
};

const onesFor = (strict: IntegerMatrix): bigint[] => new Array<bigint>(widthOf(strict)).fill(1n);

/**
 * Looks for x >= 0 and free h with  A_S x + A_H h = 0  and x[index] > 0: a whole solution, or undefined where every
 * such solution has x[index] = 0.
 */
export const nonNegativeWith = (
  strict: IntegerMatrix,
  free: IntegerMatrix,
  index: number,
): WholeSolution | undefined => {
  const lower = range(widthOf(strict)).map((column) => (column === index ? 1n : 0n));
  const found = atLeast(strict, free, lower, startMeter());
  return found.kind === 'solvable' ? { strict: found.strict, free: found.free } : undefined;
};

/** The columns that are 0 in every solution, or the work limit that was passed. */
export type IdleColumns = { readonly kind: 'idle'; readonly columns: readonly number[] } | TooHard;

/**
 * The strict columns that are 0 in every solution with x >= 0 and free h. All of them: only x = 0 is left. None: some
 * solution is strictly positive.
 *
 * Every certificate against a set of columns names idle ones: w A_H = 0 and w A_S >= 0 leave x = 0 wherever
 * (w A_S)_j > 0, since 0 = w (A_S x + A_H h) = sum (w A_S)_j x_j. Without those the rest is asked again. In the rest
 * w A_S is 0, so that a later certificate does not depend on those before: there are at most as many as rows.
 */
export const idleColumns = (strict: IntegerMatrix, free: IntegerMatrix, meter: Meter = startMeter()): IdleColumns => {
  const width = widthOf(strict);
  let live = range(width);
  while (live.length > 0) {
    const rest = strict.map((row) => live.map((column) => entry(row, column)));
    const found = atLeast(rest, free, onesFor(rest), meter);
    if (found.kind === 'too-hard') return found;
    if (found.kind === 'solvable') break;
    const sums = weighted(found.certificate, rest, live.length);
    live = live.filter((_, at) => entry(sums, at) === 0n);
  }
  const kept = new Set(live);
  return { kind: 'idle', columns: range(width).filter((column) => !kept.has(column)) };
};

/** A whole solution with x >= 0, x not 0, and free h of  A_S x + A_H h = 0; undefined where only x = 0 is left. */
export const nonNegative = (strict: IntegerMatrix, free: IntegerMatrix): WholeSolution | undefined => {
  for (const column of range(widthOf(strict))) {
    const found = nonNegativeWith(strict, free, column);
    if (found !== undefined) return found;
  }
  return undefined;
};

/**
 * The h that goes with x, whole after both are scaled:  A_S x + A_H h = 0. Later dependent columns of A_H get 0.
 * Undefined where no h fits. The echelon row  p h[pivot] + ... + r = 0  of [A_H | A_S x] gives h[pivot] = -r / p.
 */
export const withFree = (
  strict: IntegerMatrix,
  free: IntegerMatrix,
  x: IntegerVector,
  meter?: Meter,
): WholeSolution | undefined => {
  const columns = widthOf(free);
  const sums = times(strict, x);
  const joined = sums.map((sum, index) => [...(free[index] ?? []), sum]);
  const { rows, pivots } = echelonOf(joined, range(columns + 1), meter);
  if (pivots.includes(columns)) return undefined;
  const scale = lcmOf(rows.map((row, index) => entry(row, pivots[index] ?? 0)));
  const h = new Array<bigint>(columns).fill(0n);
  rows.forEach((row, index) => {
    const pivot = pivots[index] ?? 0;
    h[pivot] = (-entry(row, columns) * scale) / entry(row, pivot);
  });
  const [first, second] = primitivePair(
    x.map((value) => value * scale),
    h,
  );
  return { strict: first, free: second };
};

const widthOf = (matrix: IntegerMatrix): number => matrix[0]?.length ?? 0;

/** x = lower + y with y >= 0:  C A_S y = -C A_S lower.  Farkas' u gives the certificate w = u C. */
const atLeast = (strict: IntegerMatrix, free: IntegerMatrix, lower: IntegerVector, meter: Meter): Positivity => {
  const width = widthOf(strict);
  const basis = leftNullSpace(free, strict.length);
  const reduced = basis.map((row) => weighted(row, strict, width));
  const right = times(reduced, lower).map((value) => -value);
  const found = solveNonNegative(reduced, right, width, meter);
  if (found.kind === 'too-hard') return found;
  if (found.kind === 'infeasible') {
    return { kind: 'impossible', certificate: primitiveVector(weighted(found.weights, basis, strict.length)) };
  }
  const x = lower.map((value, index) => value * found.denominator + entry(found.numbers, index));
  const solution = withFree(strict, free, primitiveVector(x));
  if (solution === undefined) throw new Error('a vector free of h must have its h');
  return { kind: 'solvable', ...solution };
};

/** A row that no free column meets and that is of one sign and not zero in the strict ones: the shortest reason. */
const singleRow = (strict: IntegerMatrix, free: IntegerMatrix): bigint[] | undefined => {
  for (const [index, row] of strict.entries()) {
    if ((free[index] ?? []).some((value) => value !== 0n) || row.every((value) => value === 0n)) continue;
    const sign = row.every((value) => value >= 0n) ? 1n : row.every((value) => value <= 0n) ? -1n : 0n;
    if (sign !== 0n) return strict.map((_, other) => (other === index ? sign : 0n));
  }
  return undefined;
};

/**
 * Leaves rows out of the certificate's support, the last first, as long as what stays is still impossible: no row of
 * the result can then be spared.
 */
const fewestRows = (strict: IntegerMatrix, free: IntegerMatrix, certificate: bigint[], meter: Meter): bigint[] => {
  let best = certificate;
  for (const index of range(strict.length).toReversed()) {
    if (entry(best, index) === 0n) continue;
    const kept = range(strict.length).filter((row) => row !== index && entry(best, row) !== 0n);
    if (kept.length === 0) break;
    const pick = (matrix: IntegerMatrix): IntegerMatrix => kept.map((row) => matrix[row] ?? []);
    const smaller = atLeast(pick(strict), pick(free), onesFor(strict), meter);
    if (smaller.kind === 'too-hard') break;
    if (smaller.kind === 'solvable') continue;
    best = strict.map((_, row) => entry(smaller.certificate, kept.indexOf(row)));
  }
  return best;
};
