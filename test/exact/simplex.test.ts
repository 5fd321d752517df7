import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { solveNonNegative } from '../../src/exact/simplex.ts';
import { matrixOf } from './cases.ts';
import { combination, matricesOf, product } from './generators.ts';

const problems = fc.tuple(fc.integer({ min: 1, max: 5 }), fc.integer({ min: 1, max: 6 })).chain(([height, width]) =>
  fc.record({
    matrix: matricesOf(height, width, 6n),
    right: fc.array(fc.bigInt({ min: -9n, max: 9n }), { minLength: height, maxLength: height }),
  }),
);

const sumOf = (a: readonly bigint[], b: readonly bigint[]): bigint =>
  a.reduce((sum, value, at) => sum + value * (b[at] ?? 0n), 0n);

describe('non-negative solutions of equations with a right side', () => {
  it('gives a solution as whole numbers over a denominator', () => {
    expect(solveNonNegative(matrixOf('2 0; 0 3'), [1n, 2n], 2)).toEqual({
      kind: 'feasible',
      numbers: [3n, 4n],
      denominator: 6n,
    });
  });

  it('has the zero solution where the right side is zero or there is no equation', () => {
    expect(solveNonNegative(matrixOf('1 2'), [0n], 2)).toMatchObject({ kind: 'feasible', numbers: [0n, 0n] });
    expect(solveNonNegative([], [], 2)).toMatchObject({ kind: 'feasible', numbers: [0n, 0n] });
  });

  it('proves each of its answers, by putting it in or by Farkas weights', () => {
    fc.assert(
      fc.property(problems, ({ matrix, right }) => {
        const found = solveNonNegative(matrix, right, matrix[0]?.length ?? 0);
        if (found.kind === 'feasible') {
          expect(found.denominator > 0n && found.numbers.every((value) => value >= 0n)).toBe(true);
          expect(product(matrix, found.numbers)).toEqual(right.map((value) => value * found.denominator));
        } else {
          if (found.kind === 'too-hard') throw new Error('this is not hard');
          expect(combination(found.weights, matrix).every((value) => value >= 0n)).toBe(true);
          expect(sumOf(found.weights, right) < 0n).toBe(true);
        }
      }),
      { numRuns: 300 },
    );
  });
});
