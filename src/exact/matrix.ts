import type { Meter } from './bounds.ts';
import { gcd, gcdOf, lcmOf } from './integer.ts';

/** A whole vector. */
export type IntegerVector = readonly bigint[];

/** A matrix of whole numbers, row by row; every row is equally long. */
export type IntegerMatrix = readonly IntegerVector[];

/** The entry of `row` in `column`; 0 beyond its end. */
export const entry = (row: IntegerVector, column: number): bigint => row[column] ?? 0n;

/** The whole numbers from 0 below `count`. */
export const range = (count: number): readonly number[] => Array.from({ length: count }, (_, index) => index);

/** Sum of the products of like entries. */
export const dot = (a: IntegerVector, b: IntegerVector): bigint =>
  a.reduce((sum, value, index) => (value === 0n ? sum : sum + value * entry(b, index)), 0n);

/** `matrix` times the column vector `vector`. */
export const times = (matrix: IntegerMatrix, vector: IntegerVector): bigint[] => matrix.map((row) => dot(row, vector));

/** The row vector `weights` times `matrix` of `columnCount` columns. */
export const weighted = (weights: IntegerVector, matrix: IntegerMatrix, columnCount: number): bigint[] => {
  const sum = new Array<bigint>(columnCount).fill(0n);
  matrix.forEach((row, index) => {
    const weight = entry(weights, index);
    if (weight === 0n) return;
    row.forEach((value, column) => {
      if (value !== 0n) sum[column] = entry(sum, column) + weight * value;
    });
  });
  return sum;
};

/** `vector` divided by the greatest common divisor of its entries: direction kept, a zero vector stays. */
export const primitiveVector = (vector: IntegerVector): bigint[] => {
  let divisor = 0n;
  for (const value of vector) {
    if (value !== 0n) divisor = gcd(divisor, value);
    if (divisor === 1n) return [...vector];
  }
  return divisor === 0n ? [...vector] : vector.map((value) => value / divisor);
};

/**
 * `row` with its entry in `column` cleared by `pivot`, whose entry p there is positive.
 *
 *     row' = (p/g) row - (r/g) pivot,   r = row[column],   g = gcd(p, r),   then divided by its content
 *
 * so row'[column] = (p/g) r - (r/g) p = 0, no fraction arises, and since p/g > 0 an equation keeps its sense.
 * The fraction-free step of Bareiss (Math. Comp. 22 (1968) 565) divides by the pivot before; here the whole content
 * goes, so that each row divides the row of Bareiss and its entries stay below the minors of Hadamard's bound, while
 * rows with r = 0, most rows of a sparse matrix, are not touched at all.
 */
export const clearColumn = (row: IntegerVector, pivot: IntegerVector, column: number): IntegerVector => {
  const r = entry(row, column);
  if (r === 0n) return row;
  const p = entry(pivot, column);
  const g = gcd(p, r);
  const [up, down] = [p / g, r / g];
  const cleared = row.map((value, index) => {
    const below = entry(pivot, index);
    const kept = up === 1n || value === 0n ? value : up * value;
    return below === 0n ? kept : kept - down * below;
  });
  return primitiveVector(cleared);
};

/** Reduced echelon form over the whole numbers. */
export interface Echelon {
  /** The rows that are not zero: primitive, positive at their own pivot, zero at every other pivot. */
  readonly rows: IntegerMatrix;
  /** The pivot column of each row. */
  readonly pivots: readonly number[];
}

/**
 * The reduced echelon form of `matrix`, its pivots sought in the columns of `order` and in that order. Unfinished once
 * the meter, if any, has passed a bound.
 */
export const echelonOf = (matrix: IntegerMatrix, order: readonly number[], meter?: Meter): Echelon => {
  const rows = matrix.map((row) => primitiveVector(row) as IntegerVector);
  const pivots: number[] = [];
  for (const column of order) {
    if (pivots.length === rows.length) break;
    // rows[0 .. pivots.length) own a pivot; the next one is the sparsest of the rest
    const found = sparsestRow(rows, pivots.length, column);
    if (found === undefined) continue;
    const pivot = entry(found.row, column) < 0n ? found.row.map((value) => -value) : found.row;
    rows[found.index] = rows[pivots.length] ?? [];
    rows[pivots.length] = pivot;
    let cleared = 0;
    rows.forEach((row, index) => {
      if (index === pivots.length || entry(row, column) === 0n) return;
      rows[index] = clearColumn(row, pivot, column);
      cleared += 1;
    });
    pivots.push(column);
    if (meter?.write(cleared, pivot.length, entry(pivot, column)) === false) break;
  }
  return { rows: rows.slice(0, pivots.length), pivots };
};

/** The row from `start` on with an entry in `column` and the fewest entries in all: it fills the others least. */
const sparsestRow = (
  rows: IntegerMatrix,
  start: number,
  column: number,
): { readonly index: number; readonly row: IntegerVector } | undefined => {
  let best: { readonly index: number; readonly row: IntegerVector } | undefined;
  let fewest = Infinity;
  rows.forEach((row, index) => {
    if (index < start || entry(row, column) === 0n) return;
    const count = row.reduce((sum, value) => (value === 0n ? sum : sum + 1), 0);
    if (count < fewest) [best, fewest] = [{ index, row }, count];
  });
  return best;
};

/** The rank of `matrix`. */
export const rankOf = (matrix: IntegerMatrix): number => echelonOf(matrix, range(matrix[0]?.length ?? 0)).pivots.length;

/** The columns of `matrix` that do not depend on those before them in `order` (left to right if not given). */
export const independentColumns = (
  matrix: IntegerMatrix,
  order: readonly number[] = range(matrix[0]?.length ?? 0),
  meter?: Meter,
): readonly number[] => echelonOf(matrix, order, meter).pivots;

/**
 * A basis of { v : matrix v = 0 } for a matrix of `columnCount` columns: primitive whole vectors, one for each column
 * without a pivot, positive there and 0 in the other columns without a pivot. Of no use once the meter has passed a bound.
 */
export const nullSpace = (matrix: IntegerMatrix, columnCount: number, meter?: Meter): bigint[][] => {
  const echelon = echelonOf(matrix, range(columnCount), meter);
  return freeColumns(echelon, columnCount).map((column) => nullVector(echelon, column, columnCount));
};

/** The columns without a pivot: as many as the null space has dimensions. */
export const freeColumns = ({ pivots }: Echelon, columnCount: number): readonly number[] => {
  const known = new Set(pivots);
  return range(columnCount).filter((column) => !known.has(column));
};

/**
 * The null vector of the free column f: positive there, 0 in the other free columns, primitive. Each row says  p v[pivot] + r v[f] = 0,  so with v[f] = L, the least common
 * multiple of all p / gcd(p, r), v[pivot] = -r L / p is whole.
 */
export const nullVector = (echelon: Echelon, free: number, columnCount: number): bigint[] => {
  const vector = new Array<bigint>(columnCount).fill(0n);
  const parts = echelon.rows.map((row, index) => {
    const pivot = echelon.pivots[index] ?? 0;
    return { pivot, p: entry(row, pivot), r: entry(row, free) };
  });
  const scale = lcmOf(parts.map(({ p, r }) => p / gcd(p, r)));
  vector[free] = scale;
  for (const { pivot, p, r } of parts) vector[pivot] = (-r * scale) / p;
  return primitiveVector(vector);
};

/** `matrix` of `columnCount` columns turned: its columns as rows. */
export const transpose = (matrix: IntegerMatrix, columnCount: number): IntegerMatrix =>
  range(columnCount).map((column) => matrix.map((row) => entry(row, column)));

/** A basis of { w : w matrix = 0 } for a matrix of `rowCount` rows: primitive whole vectors, one entry for each row. */
export const leftNullSpace = (matrix: IntegerMatrix, rowCount: number = matrix.length): bigint[][] =>
  nullSpace(transpose(matrix, matrix[0]?.length ?? 0), rowCount);

/** `(x, y)` divided by the greatest common divisor of all entries of both. */
export const primitivePair = (x: IntegerVector, y: IntegerVector): readonly [bigint[], bigint[]] => {
  const divisor = gcdOf([...x, ...y]);
  if (divisor === 0n) return [[...x], [...y]];
  return [x.map((value) => value / divisor), y.map((value) => value / divisor)];
};
