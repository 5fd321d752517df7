import { bench, describe } from 'vitest';
import { type IntegerMatrix, nullSpace } from '../../src/exact/matrix.ts';
import { startMeter } from '../../src/exact/bounds.ts';
import { hilbertBasis } from '../../src/exact/hilbert.ts';
import { minimalSolutions } from '../../src/exact/minimal.ts';
import { strictlyPositive } from '../../src/exact/positive.ts';
import { type Rational, ZERO, isZero, rational } from '../../src/exact/rational.ts';

/** A made-up table of composition, always the same: entries 1 to 9, about four in a column. */
const composition = (rows: number, columns: number): IntegerMatrix => {
  let state = 2026n;
  const next = (below: bigint): bigint => {
    state = (state * 1103515245n + 12345n) % 2n ** 31n;
    return (state >> 16n) % below;
  };
  const density = BigInt(Math.max(2, Math.floor(rows / 4)));
  return Array.from({ length: rows }, () =>
    Array.from({ length: columns }, () => (next(density) === 0n ? next(9n) + 1n : 0n)),
  );
};

/** Half of the species reactants, and one more that closes every row for the numbers 1, 2, 3, 1, 2, 3 and so on. */
const sided = (matrix: IntegerMatrix): IntegerMatrix =>
  matrix
    .map((row) => row.map((value, column) => (column % 2 === 0 ? -value : value)))
    .map((row) => [...row, -row.reduce((sum, value, column) => sum + value * BigInt((column % 3) + 1), 0n)]);

/** The same reduced echelon form with an object for each fraction: what the whole-number kernel is measured against. */
const eliminateFractions = (matrix: readonly (readonly Rational[])[]): readonly (readonly Rational[])[] => {
  const rows = [...matrix];
  let rank = 0;
  for (let column = 0; column < (rows[0]?.length ?? 0) && rank < rows.length; column += 1) {
    const at = rows.findIndex((row, index) => index >= rank && !isZero(row[column] ?? ZERO));
    const found = rows[at];
    if (found === undefined) continue;
    rows[at] = rows[rank] ?? [];
    const scale = found[column] ?? ZERO;
    const pivot = found.map((value) => value.div(scale));
    rows[rank] = pivot;
    rows.forEach((row, index) => {
      const factor = row[column] ?? ZERO;
      if (index === rank || isZero(factor)) return;
      rows[index] = row.map((value, place) => value.sub(factor.mul(pivot[place] ?? ZERO)));
    });
    rank += 1;
  }
  return rows;
};

/** Long runs are few: enough to compare, and all benchmarks end in a few minutes. */
const BRIEFLY = { time: 200, iterations: 2, warmupTime: 0, warmupIterations: 1 };

const SIZES = [
  [2, 3],
  [4, 6],
  [6, 12],
  [10, 25],
  [20, 50],
  [30, 100],
  [45, 200],
  [60, 400],
] as const;

describe.each(SIZES)('null space of %i rows', (rows, columns) => {
  const matrix = composition(rows, columns);
  bench(
    `${String(columns)} columns`,
    () => {
      nullSpace(matrix, columns);
    },
    BRIEFLY,
  );
});

describe.each([
  [4, 6],
  [10, 25],
  [20, 50],
] as const)('elimination of %i rows, %i columns', (rows, columns) => {
  const matrix = composition(rows, columns);
  const fractions = matrix.map((row) => row.map((value) => rational(value)));
  bench('whole numbers', () => {
    nullSpace(matrix, columns);
  });
  bench('an object for each fraction', () => {
    eliminateFractions(fractions);
  });
});

describe.each([
  [4, 6],
  [6, 12],
  [10, 25],
  [20, 50],
] as const)('positive solutions of %i rows, %i columns', (rows, columns) => {
  const matrix = sided(composition(rows, columns));
  bench('strictly positive', () => {
    strictlyPositive(matrix, []);
  });
});

describe.each([
  [3, 6],
  [4, 8],
  [4, 10],
] as const)('families of %i rows, %i columns', (rows, columns) => {
  const matrix = sided(composition(rows, columns));
  bench('minimal', () => {
    minimalSolutions(matrix, []);
  });
  bench(
    'irreducible, within bounds',
    () => {
      hilbertBasis(matrix, [], startMeter({ vectors: 500, steps: 500_000, digits: 100 }));
    },
    BRIEFLY,
  );
});
