import type { Meter } from './bounds.ts';
import { magnitude } from './integer.ts';
import { type IntegerMatrix, type IntegerVector, entry, range, transpose } from './matrix.ts';

/** Rows in Hermite's normal form; those after the last pivot are 0 in every column that was asked for. */
export interface Hermite {
  readonly rows: IntegerMatrix;
  readonly pivots: readonly number[];
}

/** The largest whole number not above a / b, for b > 0. */
export const floorDivide = (a: bigint, b: bigint): bigint => {
  const quotient = a / b;
  return a < 0n && quotient * b !== a ? quotient - 1n : quotient;
};

/** `a` less `factor` times `b`. */
export const subtract = (a: IntegerVector, factor: bigint, b: IntegerVector): IntegerVector =>
  factor === 0n ? a : a.map((value, index) => value - factor * entry(b, index));

/**
 * Hermite's normal form of `rows` in `columns`, in that order: only unimodular steps (a row less a whole multiple of
 * another, rows exchanged, a sign), so that the rows span the same lattice after as before. Each pivot is positive,
 * 0 stands below it and numbers in [0, pivot) above it (C. Hermite, J. reine angew. Math. 41 (1851) 191; H. Cohen, A
 * Course in Computational Algebraic Number Theory, 1993, section 2.4). Unfinished once the meter has passed a bound.
 */
export const hermite = (rows: IntegerMatrix, columns: readonly number[], meter: Meter): Hermite => {
  const work = [...rows];
  const pivots: number[] = [];
  for (const column of columns) {
    const top = pivots.length;
    if (!gatherPivot(work, top, column, meter)) continue;
    const pivot = work[top] ?? [];
    for (const index of range(top)) work[index] = reduceBy(work[index] ?? [], pivot, column);
    pivots.push(column);
  }
  return { rows: work, pivots };
};

/** Euclid's algorithm down `column` from row `top` on: leaves one entry, positive, in row `top`; false if there is none. */
const gatherPivot = (work: IntegerVector[], top: number, column: number, meter: Meter): boolean => {
  for (;;) {
    const live = range(work.length).filter((index) => index >= top && entry(work[index] ?? [], column) !== 0n);
    const [first = -1, ...others] = live.toSorted((a, b) =>
      magnitude(entry(work[a] ?? [], column)) < magnitude(entry(work[b] ?? [], column)) ? -1 : 1,
    );
    if (first < 0) return false;
    const least = work[first] ?? [];
    const pivot = entry(least, column) < 0n ? least.map((value) => -value) : least;
    if (!meter.step(live.length * pivot.length) || !meter.hold(pivot, 0)) return false;
    work[first] = work[top] ?? [];
    work[top] = pivot;
    if (others.length === 0) return true;
    for (const index of range(work.length)) {
      if (index > top) work[index] = reduceBy(work[index] ?? [], pivot, column);
    }
  }
};

/** `row` with its entry in `column` brought into [0, pivot). */
const reduceBy = (row: IntegerVector, pivot: IntegerVector, column: number): IntegerVector =>
  subtract(row, floorDivide(entry(row, column), entry(pivot, column)), pivot);

/**
 * A lattice basis of the whole vectors v with  matrix v = 0  (not only a basis over the fractions): in the rows
 * [transposed matrix | 1], those that Hermite's form leaves 0 on the left show on the right what made them so.
 */
export const integerKernel = (matrix: IntegerMatrix, columnCount: number, meter: Meter): IntegerMatrix => {
  const height = matrix.length;
  const joined = transpose(matrix, columnCount).map((row, index) => [
    ...row,
    ...range(columnCount).map((column) => (column === index ? 1n : 0n)),
  ]);
  const { rows, pivots } = hermite(joined, range(height), meter);
  return rows.slice(pivots.length).map((row) => row.slice(height));
};
