import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gcdOf } from '../../src/exact/integer.ts';
import {
  independentColumns,
  leftNullSpace,
  nullSpace,
  primitivePair,
  primitiveVector,
  rankOf,
  transpose,
  type IntegerMatrix,
} from '../../src/exact/matrix.ts';
import { casesOf, matrixOf } from './cases.ts';
import { combination, matrices, product } from './generators.ts';

const BIG = 2n ** 210n;
const widthOf = (matrix: IntegerMatrix): number => matrix[0]?.length ?? 0;
const isZeroVector = (vector: readonly bigint[]): boolean => vector.every((value) => value === 0n);

/**
 * The rank modulo the prime 2^61 - 1, by plain elimination with inverses: another field, another method. It equals the
 * rank as long as no minor is a multiple of the prime, and minors of the matrices here are far smaller.
 */
const rankByModulus = (matrix: IntegerMatrix): number => {
  const prime = 2n ** 61n - 1n;
  const inverse = (value: bigint): bigint => {
    let [power, base, result] = [prime - 2n, value, 1n];
    for (; power > 0n; power /= 2n, base = (base * base) % prime)
      if (power % 2n === 1n) result = (result * base) % prime;
    return result;
  };
  const rows = matrix.map((row) => row.map((value) => ((value % prime) + prime) % prime));
  let rank = 0;
  for (let column = 0; column < widthOf(matrix); column += 1) {
    const at = rows.findIndex((row, index) => index >= rank && row[column] !== 0n);
    const pivot = rows[at];
    if (pivot === undefined) continue;
    rows[at] = rows[rank] ?? [];
    rows[rank] = pivot;
    const scale = inverse(pivot[column] ?? 1n);
    for (let index = rank + 1; index < rows.length; index += 1) {
      const factor = ((rows[index]?.[column] ?? 0n) * scale) % prime;
      rows[index] = (rows[index] ?? []).map(
        (value, place) => (((value - factor * (pivot[place] ?? 0n)) % prime) + prime) % prime,
      );
    }
    rank += 1;
  }
  return rank;
};

describe('null spaces', () => {
  it.each(casesOf('null-spaces.tsv'))('finds the null space: %s', (_, matrix = '', basis = '') => {
    const rows = matrixOf(matrix);
    expect(nullSpace(rows, widthOf(rows))).toEqual(matrixOf(basis));
  });

  it('is the whole space where there is no row', () => {
    expect(nullSpace([], 2)).toEqual([
      [1n, 0n],
      [0n, 1n],
    ]);
  });

  it('is carried to zero, primitive, and as large as the rank leaves', () => {
    fc.assert(
      fc.property(matrices(6, 8, 9n), (matrix) => {
        const basis = nullSpace(matrix, widthOf(matrix));
        for (const vector of basis) {
          expect(isZeroVector(product(matrix, vector))).toBe(true);
          expect(gcdOf(vector)).toBe(1n);
        }
        expect(basis.length + rankByModulus(matrix)).toBe(widthOf(matrix));
        expect(rankByModulus(basis)).toBe(basis.length);
      }),
    );
  });

  it('stays exact past 2^200', () => {
    fc.assert(
      fc.property(matrices(4, 6, BIG), (matrix) => {
        const basis = nullSpace(matrix, widthOf(matrix));
        expect(basis.length).toBe(widthOf(matrix) - rankOf(matrix));
        expect(basis.every((vector) => isZeroVector(product(matrix, vector)) && gcdOf(vector) === 1n)).toBe(true);
      }),
    );
  });

  it('does not change when a row is scaled, negated or added to another', () => {
    fc.assert(
      fc.property(matrices(5, 7, 9n), fc.bigInt({ min: 1n, max: BIG }), (matrix, factor) => {
        const [first = [], second = [], ...rest] = matrix;
        const mixed = [first.map((value, at) => -factor * value + (second[at] ?? 0n)), second, ...rest];
        const rows = matrix.length > 1 ? mixed : [first.map((value) => -factor * value)];
        expect(nullSpace(rows, widthOf(matrix))).toEqual(nullSpace(matrix, widthOf(matrix)));
      }),
    );
  });
});

describe('ranks and independent columns', () => {
  it('agrees with the rank modulo a prime, and with the rank of the turned matrix', () => {
    fc.assert(
      fc.property(matrices(6, 8, 9n), (matrix) => {
        expect(rankOf(matrix)).toBe(rankByModulus(matrix));
        expect(rankOf(transpose(matrix, widthOf(matrix)))).toBe(rankOf(matrix));
      }),
    );
  });

  it('keeps the columns that come first in the order given', () => {
    const matrix = matrixOf('1 2 0 1; 0 0 0 1');
    expect(independentColumns(matrix)).toEqual([0, 3]);
    expect(independentColumns(matrix, [3, 2, 1, 0])).toEqual([3, 1]);
    expect(independentColumns(matrix, [2, 1])).toEqual([1]);
  });

  it('leaves out exactly the columns that add nothing to the rank of those before', () => {
    fc.assert(
      fc.property(matrices(5, 7, 4n), (matrix) => {
        const greedy = (matrix[0] ?? []).flatMap((_, at) => {
          const before = rankByModulus(matrix.map((row) => row.slice(0, at)));
          return rankByModulus(matrix.map((row) => row.slice(0, at + 1))) > before ? [at] : [];
        });
        expect(independentColumns(matrix)).toEqual(greedy);
      }),
    );
  });
});

describe('left null spaces', () => {
  it('gives weights that cancel every column', () => {
    fc.assert(
      fc.property(matrices(6, 5, 9n), (matrix) => {
        const basis = leftNullSpace(matrix);
        expect(basis.length).toBe(matrix.length - rankByModulus(matrix));
        for (const weights of basis) expect(isZeroVector(combination(weights, matrix))).toBe(true);
      }),
    );
  });

  it('leaves every row free where there is no column', () => {
    expect(leftNullSpace([[], []])).toEqual([
      [1n, 0n],
      [0n, 1n],
    ]);
  });
});

describe('primitive vectors', () => {
  it('divides by the greatest common divisor and keeps the direction', () => {
    expect(primitiveVector([-4n, 6n, 0n])).toEqual([-2n, 3n, 0n]);
    expect(primitiveVector([0n, -5n])).toEqual([0n, -1n]);
    expect(primitiveVector([0n, 0n])).toEqual([0n, 0n]);
    expect(primitiveVector([])).toEqual([]);
  });

  it('divides a pair together', () => {
    expect(primitivePair([4n, 6n], [8n])).toEqual([[2n, 3n], [4n]]);
    expect(primitivePair([4n, 6n], [3n])).toEqual([[4n, 6n], [3n]]);
    expect(primitivePair([0n], [])).toEqual([[0n], []]);
  });
});
