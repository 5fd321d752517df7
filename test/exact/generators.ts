import fc from 'fast-check';
import type { IntegerMatrix } from '../../src/exact/matrix.ts';

/** A matrix of up to `rows` by up to `columns`, never empty, entries within ± `size`. */
export const matrices = (rows: number, columns: number, size: bigint): fc.Arbitrary<IntegerMatrix> =>
  fc
    .tuple(fc.integer({ min: 1, max: rows }), fc.integer({ min: 1, max: columns }))
    .chain(([height, width]) => matricesOf(height, width, size));

/** A matrix of exactly `height` by `width`. */
export const matricesOf = (height: number, width: number, size: bigint): fc.Arbitrary<IntegerMatrix> => {
  // half of the entries 0, as in tables of composition
  const value = fc.oneof(fc.constant(0n), fc.bigInt({ min: -size, max: size }));
  const row = fc.array(value, { minLength: width, maxLength: width });
  return fc.array(row, { minLength: height, maxLength: height });
};

/** Strict and free columns over the same rows. */
export interface System {
  readonly strict: IntegerMatrix;
  readonly free: IntegerMatrix;
}

/** Systems of up to `rows` equations with up to `strict` strict and up to `free` free columns. */
export const systems = (rows: number, strict: number, free: number, size: bigint): fc.Arbitrary<System> =>
  fc
    .tuple(fc.integer({ min: 1, max: rows }), fc.integer({ min: 1, max: strict }), fc.integer({ min: 0, max: free }))
    .chain(([height, width, freeWidth]) =>
      fc.record({ strict: matricesOf(height, width, size), free: matricesOf(height, freeWidth, size) }),
    );

/** A system together with a solution x >= 0 it was built around: the last strict column closes every row. */
export const solvedSystems = (
  rows: number,
  strict: number,
  free: number,
  size: bigint,
): fc.Arbitrary<System & { readonly x: readonly bigint[] }> =>
  systems(rows, strict, free, size).chain((system) => {
    const width = system.strict[0]?.length ?? 0;
    const freeWidth = system.free[0]?.length ?? 0;
    const numbers = fc.array(fc.bigInt({ min: 0n, max: 4n }), { minLength: width, maxLength: width });
    const offsets = fc.array(fc.bigInt({ min: -3n, max: 3n }), { minLength: freeWidth, maxLength: freeWidth });
    return fc.tuple(numbers, offsets).map(([x, h]) => {
      const closed = system.strict.map((row, index) => [...row, -sum(row, x) - sum(system.free[index] ?? [], h)]);
      return { strict: closed, free: system.free, x: [...x, 1n] };
    });
  });

const sum = (row: readonly bigint[], x: readonly bigint[]): bigint => {
  let total = 0n;
  for (let at = 0; at < row.length; at += 1) total += (row[at] ?? 0n) * (x[at] ?? 0n);
  return total;
};

/** `matrix` times `x`, by plain counting. */
export const product = (matrix: IntegerMatrix, x: readonly bigint[]): readonly bigint[] =>
  matrix.map((row) => sum(row, x));

/** `weights` times `matrix`, by plain counting. */
export const combination = (weights: readonly bigint[], matrix: IntegerMatrix): readonly bigint[] =>
  (matrix[0] ?? []).map((_, column) =>
    sum(
      weights,
      matrix.map((row) => row[column] ?? 0n),
    ),
  );

/** What is left of every row with these numbers. */
export const residual = (system: System, x: readonly bigint[], h: readonly bigint[]): readonly bigint[] => {
  const free = product(system.free, h);
  return product(system.strict, x).map((value, index) => value + (free[index] ?? 0n));
};
