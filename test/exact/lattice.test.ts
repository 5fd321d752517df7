import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { USUAL_BOUNDS, startMeter } from '../../src/exact/bounds.ts';
import { floorDivide, hermite, integerKernel } from '../../src/exact/lattice.ts';
import { isInside, sizeOf, supportOf, unionOf } from '../../src/exact/support.ts';
import { matrixOf } from './cases.ts';
import { matrices, product } from './generators.ts';

describe("Hermite's normal form", () => {
  it('reduces the rows by hand-made steps', () => {
    // (2 3) and (4 1): 4 1 less twice 2 3 is 0 -5; then 3 stands in [0, 5)
    expect(hermite(matrixOf('4 1; 2 3'), [0, 1], startMeter(USUAL_BOUNDS))).toEqual({
      rows: matrixOf('2 3; 0 5'),
      pivots: [0, 1],
    });
  });

  it('has positive pivots, 0 below them and smaller numbers that are not negative above', () => {
    fc.assert(
      fc.property(matrices(5, 6, 9n), (matrix) => {
        const columns = (matrix[0] ?? []).map((_, column) => column);
        const { rows, pivots } = hermite(matrix, columns, startMeter(USUAL_BOUNDS));
        pivots.forEach((column, at) => {
          const pivot = rows[at]?.[column] ?? 0n;
          expect(pivot > 0n).toBe(true);
          rows.forEach((row, other) => {
            const value = row[column] ?? 0n;
            if (other < at) expect(value >= 0n && value < pivot).toBe(true);
            if (other > at) expect(value).toBe(0n);
          });
        });
      }),
    );
  });

  it('gives a basis of all whole null vectors, not of a part of them', () => {
    // by hand: 2 x + 3 y + 6 z = 0 has the lattice basis (3 -2 0), (0 2 -1), whose cross product is (2 3 6)
    const kernel = integerKernel(matrixOf('2 3 6'), 3, startMeter(USUAL_BOUNDS));
    expect(kernel.length).toBe(2);
    for (const vector of kernel) expect(product(matrixOf('2 3 6'), vector)).toEqual([0n]);
    const [[a = 0n, b = 0n, c = 0n] = [], [d = 0n, e = 0n, f = 0n] = []] = kernel;
    // the cross product of a lattice basis is the primitive normal itself, up to sign
    const normal = [b * f - c * e, c * d - a * f, a * e - b * d];
    expect([normal, normal.map((value) => -value)]).toContainEqual([2n, 3n, 6n]);
  });

  it.each([
    [7n, 2n, 3n],
    [-7n, 2n, -4n],
    [-6n, 2n, -3n],
    [0n, 5n, 0n],
    [-1n, 10n ** 60n, -1n],
  ])('rounds %s / %s down to %s', (a, b, expected) => {
    expect(floorDivide(a, b)).toBe(expected);
  });
});

describe('supports', () => {
  const places = fc.uniqueArray(fc.integer({ min: 0, max: 99 }));
  const vectorOf = (at: readonly number[]): readonly bigint[] =>
    Array.from({ length: 100 }, (_, index) => (at.includes(index) ? 1n : 0n));

  it('behaves as the set of places, past 32 and 64', () => {
    fc.assert(
      fc.property(places, places, (a, b) => {
        const [left, right] = [supportOf(vectorOf(a)), supportOf(vectorOf(b))];
        expect(sizeOf(left)).toBe(a.length);
        expect(sizeOf(unionOf(left, right))).toBe(new Set([...a, ...b]).size);
        expect(isInside(left, right)).toBe(a.every((at) => b.includes(at)));
        expect(isInside(left, unionOf(left, right))).toBe(true);
      }),
    );
  });

  it('looks only at the first columns where a width is given', () => {
    expect(sizeOf(supportOf([1n, 0n, 1n, 1n], 3))).toBe(2);
  });
});
