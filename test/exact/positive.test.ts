import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Meter, USUAL_BOUNDS, startMeter } from '../../src/exact/bounds.ts';
import { gcdOf } from '../../src/exact/integer.ts';
import { type IntegerMatrix, rankOf } from '../../src/exact/matrix.ts';
import { idleColumns, nonNegative, nonNegativeWith, strictlyPositive, withFree } from '../../src/exact/positive.ts';
import { casesOf, matrixOf, vectorOf } from './cases.ts';
import { type System, combination, product, residual, solvedSystems, systems } from './generators.ts';

const BIG = 2n ** 210n;
const isZeroVector = (vector: readonly bigint[]): boolean => vector.every((value) => value === 0n);

const expectCertificate = ({ strict, free }: System, weights: readonly bigint[]): void => {
  const gained = combination(weights, strict);
  expect(isZeroVector(combination(weights, free))).toBe(true);
  expect(gained.every((value) => value >= 0n)).toBe(true);
  expect(isZeroVector(gained)).toBe(false);
  expect(gcdOf(weights)).toBe(1n);
};

const expectSolution = (system: System, x: readonly bigint[], h: readonly bigint[]): void => {
  expect(isZeroVector(residual(system, x, h))).toBe(true);
  expect(gcdOf([...x, ...h])).toBe(1n);
};

const without = (matrix: IntegerMatrix, index: number): IntegerMatrix => matrix.filter((_, row) => row !== index);

describe('strictly positive solutions', () => {
  it.each(casesOf('positivity.tsv'))('settles: %s', (_, strict = '', free = '', outcome = '', x = '', h = '') => {
    const found = strictlyPositive(matrixOf(strict), matrixOf(free));
    const expected =
      outcome === 'solvable'
        ? { kind: 'solvable', strict: vectorOf(x), free: vectorOf(h) }
        : { kind: 'impossible', certificate: vectorOf(x) };
    expect(found).toEqual(expected);
  });

  it('proves each of its answers: a solution by putting it in, an impossibility by its certificate', () => {
    fc.assert(
      fc.property(systems(5, 6, 3, 6n), (system) => {
        const found = strictlyPositive(system.strict, system.free);
        if (found.kind === 'impossible') {
          expectCertificate(system, found.certificate);
          return;
        }
        if (found.kind === 'too-hard') throw new Error('this is not hard');
        expectSolution(system, found.strict, found.free);
        expect(found.strict.every((value) => value > 0n)).toBe(true);
      }),
      { numRuns: 300 },
    );
  });

  it('finds a solution wherever one was put', () => {
    fc.assert(
      fc.property(solvedSystems(4, 5, 3, 6n), ({ strict, free, x }) => {
        // columns that the known solution leaves at 0 are dropped: in the rest it is strictly positive
        const live = strict.map((row) => row.filter((_, at) => x[at] !== 0n));
        expect(strictlyPositive(live, free).kind).toBe('solvable');
      }),
    );
  });

  it('names no row in a certificate that could be spared', () => {
    fc.assert(
      fc.property(systems(5, 6, 2, 4n), ({ strict, free }) => {
        const found = strictlyPositive(strict, free);
        if (found.kind !== 'impossible') {
          fc.pre(false);
          return;
        }
        const inUse = (_: unknown, row: number): boolean => found.certificate[row] !== 0n;
        const [rows, freeRows] = [strict.filter(inUse), free.filter(inUse)];
        rows.forEach((_, index) => {
          if (rows.length === 1) return;
          expect(strictlyPositive(without(rows, index), without(freeRows, index)).kind).toBe('solvable');
        });
      }),
    );
  });

  it('stays exact past 2^200', () => {
    fc.assert(
      fc.property(systems(4, 5, 2, BIG), (system) => {
        const found = strictlyPositive(system.strict, system.free);
        if (found.kind === 'impossible') expectCertificate(system, found.certificate);
        else if (found.kind === 'too-hard') throw new Error('this is not hard');
        else expectSolution(system, found.strict, found.free);
      }),
    );
  });

  it('ends where the least-index rule is needed (Beale 1955, from memory)', () => {
    // 1/4 x1 - 8 x2 - x3 + 9 x4 <= 0, 1/2 x1 - 12 x2 - 1/2 x3 + 3 x4 <= 0, x3 <= 1 x8, with slacks, cleared of fractions
    const strict = matrixOf('1 -32 -4 36 4 0 0 0; 1 -24 -1 6 0 2 0 0; 0 0 1 0 0 0 1 -1');
    const found = strictlyPositive(strict, []);
    expect(found.kind).toBe('solvable');
    if (found.kind === 'solvable') expectSolution({ strict, free: [[], [], []] }, found.strict, found.free);
  });
});

const idleIn = (strict: IntegerMatrix, free: IntegerMatrix): readonly number[] => {
  const found = idleColumns(strict, free);
  if (found.kind === 'too-hard') throw new Error('this is not hard');
  return found.columns;
};

describe('non-negative solutions', () => {
  it('calls idle exactly the columns that no solution can use', () => {
    fc.assert(
      fc.property(systems(4, 6, 2, 4n), (system) => {
        const idle = idleIn(system.strict, system.free);
        (system.strict[0] ?? []).forEach((_, index) => {
          const found = nonNegativeWith(system.strict, system.free, index);
          expect(found === undefined).toBe(idle.includes(index));
          if (found === undefined) return;
          expectSolution(system, found.strict, found.free);
          expect(found.strict.every((value, at) => (at === index ? value > 0n : value >= 0n))).toBe(true);
        });
        expect(strictlyPositive(system.strict, system.free).kind === 'solvable').toBe(idle.length === 0);
      }),
    );
  });

  it('leaves the columns at work in a balance of their own once the idle ones are gone', () => {
    fc.assert(
      fc.property(systems(4, 6, 2, 4n), ({ strict, free }) => {
        const idle = idleIn(strict, free);
        const live = strict.map((row) => row.filter((_, at) => !idle.includes(at)));
        fc.pre((live[0] ?? []).length > 0);
        expect(strictlyPositive(live, free).kind).toBe('solvable');
        expect(nonNegative(strict, free)).toBeDefined();
      }),
    );
  });

  it('names idle columns over several certificates', () => {
    // x0 + x1 = 0 stops both, and only then x1 + x2 - x3 = 0 and x3 + x4 = 0 stop the others
    expect(idleIn(matrixOf('1 1 0 0 0 0 0; 0 -1 1 -1 0 0 0; 0 0 0 1 1 0 0; 0 0 0 0 0 1 -1'), [])).toEqual([
      0, 1, 2, 3, 4,
    ]);
  });

  it('stops at a bound of steps', () => {
    const hard = matrixOf('3 -2 5 -7 1; 1 4 -6 2 -3; -2 1 1 1 -1');
    const few = (): Meter => startMeter({ ...USUAL_BOUNDS, steps: 10 });
    const passed = { kind: 'too-hard', limit: '10 steps' };
    expect(strictlyPositive(hard, [], few())).toEqual(passed);
    expect(idleColumns(hard, [], few())).toEqual(passed);
  });

  it('finds a solution that is not zero, or says that there is none', () => {
    expect(nonNegative(matrixOf('1 1; 0 1'), [])).toBeUndefined();
    expect(nonNegative(matrixOf('1 0 -2'), [])).toEqual({ strict: [2n, 0n, 1n], free: [] });
    expect(nonNegative(matrixOf('1 0 2'), [])).toEqual({ strict: [0n, 1n, 0n], free: [] });
    expect(nonNegative(matrixOf('1 2'), matrixOf('3'))).toEqual({ strict: [3n, 0n], free: [-1n] });
    expect(idleIn(matrixOf('1 1 0'), [])).toEqual([0, 1]);
  });
});

describe('free numbers that go with strict ones', () => {
  it('scales both until both are whole and primitive', () => {
    expect(withFree(matrixOf('1'), matrixOf('-2'), [1n])).toEqual({ strict: [2n], free: [1n] });
    expect(withFree(matrixOf('2'), matrixOf('-2'), [3n])).toEqual({ strict: [1n], free: [1n] });
  });

  it('gives 0 to a free column that depends on earlier ones', () => {
    expect(withFree(matrixOf('1'), matrixOf('-1 -1'), [2n])).toEqual({ strict: [1n], free: [1n, 0n] });
  });

  it('says when none fit', () => {
    expect(withFree(matrixOf('1; 1'), matrixOf('1; 0'), [1n])).toBeUndefined();
  });

  it('closes the rows wherever independent free columns were taken away', () => {
    fc.assert(
      fc.property(solvedSystems(4, 4, 3, 6n), ({ strict, free, x }) => {
        const found = withFree(strict, free, x);
        expect(found).toBeDefined();
        if (found === undefined) return;
        expectSolution({ strict, free }, found.strict, found.free);
        expect(rankOf([x, found.strict])).toBe(1);
        expect(product(strict, found.strict).length).toBe(strict.length);
      }),
    );
  });
});
