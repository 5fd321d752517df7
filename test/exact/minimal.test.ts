import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { USUAL_BOUNDS, startMeter } from '../../src/exact/bounds.ts';
import { gcdOf } from '../../src/exact/integer.ts';
import { bySupport, minimalSolutions } from '../../src/exact/minimal.ts';
import { type Rational, ZERO, isZero, rational, signOf } from '../../src/exact/rational.ts';
import { asSet, casesOf, matrixOf } from './cases.ts';
import { residual, solvedSystems, systems } from './generators.ts';

const BIG = 2n ** 210n;

const supportOf = (vector: readonly bigint[]): ReadonlySet<number> =>
  new Set(vector.flatMap((value, at) => (value === 0n ? [] : [at])));

/**
 * Peels rays off x: take a ray inside the support, as often as it fits, and at least one more place becomes 0. What is
 * left of x is still a solution, so if every ray is in the list this ends at 0; if one is missing some x sticks.
 */
const isPeeled = (x: readonly bigint[], rays: readonly (readonly bigint[])[]): boolean => {
  let rest: readonly Rational[] = x.map((value) => rational(value));
  while (rest.some((value) => !isZero(value))) {
    const ray = rays.find((candidate) => candidate.every((value, at) => value === 0n || !isZero(rest[at] ?? ZERO)));
    if (ray === undefined) return false;
    const ratios = ray.flatMap((value, at) => (value === 0n ? [] : [(rest[at] ?? ZERO).div(rational(value))]));
    const least = ratios.reduce((a, b) => (a.compare(b) <= 0 ? a : b));
    rest = rest.map((value, at) => value.sub(least.mul(rational(ray[at] ?? 0n))));
    if (rest.some((value) => signOf(value) < 0n)) return false;
  }
  return true;
};

describe('minimal solutions', () => {
  it.each(casesOf('minimal.tsv'))('lists the extreme rays: %s', (_, strict = '', free = '', rays = '') => {
    const found = minimalSolutions(matrixOf(strict), matrixOf(free));
    expect(found.kind).toBe('rays');
    if (found.kind !== 'rays') return;
    // the table gives x alone; where h asks for it x is a multiple, and x alone is compared
    const primitive = found.rays.map(({ strict: x }) => x.map((value) => value / gcdOf(x)));
    expect(asSet(primitive)).toEqual(asSet(matrixOf(rays)));
  });

  it('scales until the free numbers are whole and the whole vector primitive', () => {
    expect(minimalSolutions(matrixOf('1 2'), matrixOf('3'))).toEqual({
      kind: 'rays',
      rays: [
        { strict: [3n, 0n], free: [-1n] },
        { strict: [0n, 3n], free: [-2n] },
      ],
    });
  });

  it('returns the lines of dependent free columns', () => {
    expect(minimalSolutions(matrixOf('1; 0'), matrixOf('1 2; 0 0'))).toEqual({ kind: 'lines', lines: [[-2n, 1n]] });
    expect(minimalSolutions(matrixOf('1'), matrixOf('0'))).toEqual({ kind: 'lines', lines: [[1n]] });
  });

  it('orders them by fewest columns, least total, earlier columns', () => {
    const order = matrixOf('0 1 0; 2 0 0; 1 1 0; 1 0 1; 1 1 1');
    expect(bySupport(order.toReversed(), (vector) => vector)).toEqual(order);
  });

  it('lists the permutation matrices for squares of equal line sums (Birkhoff 1946)', () => {
    const found = minimalSolutions(equalLines(4), []);
    expect(found.kind === 'rays' ? found.rays.length : found).toBe(24);
    expect(found.kind === 'rays' && found.rays.every(({ strict }) => strict.every((value) => value <= 1n))).toBe(true);
  });

  it('solves, is primitive, and has no support inside another', () => {
    fc.assert(
      fc.property(systems(4, 7, 2, 4n), (system) => {
        const found = minimalSolutions(system.strict, system.free);
        if (found.kind !== 'rays') return;
        const supports = found.rays.map(({ strict }) => supportOf(strict));
        found.rays.forEach(({ strict, free }, index) => {
          expect(residual(system, strict, free).every((value) => value === 0n)).toBe(true);
          expect(strict.every((value) => value >= 0n)).toBe(true);
          expect(gcdOf([...strict, ...free])).toBe(1n);
          const others = supports.filter((_, other) => other !== index);
          expect(others.some((other) => [...other].every((at) => supports[index]?.has(at)))).toBe(false);
        });
      }),
      { numRuns: 200 },
    );
  });

  it('makes up every solution', () => {
    fc.assert(
      fc.property(solvedSystems(3, 6, 2, 3n), ({ strict, free, x }) => {
        const found = minimalSolutions(strict, free);
        if (found.kind !== 'rays') {
          fc.pre(false);
          return;
        }
        const rays = found.rays.map((ray) => ray.strict);
        expect(isPeeled(x, rays)).toBe(true);
      }),
      { numRuns: 300 },
    );
  });

  it('stays exact past 2^200', () => {
    const [a, b] = [BIG + 1n, BIG + 2n];
    expect(minimalSolutions([[a, -b]], [])).toEqual({ kind: 'rays', rays: [{ strict: [b, a], free: [] }] });
    fc.assert(
      fc.property(solvedSystems(3, 4, 1, BIG), ({ strict, free, x }) => {
        const found = minimalSolutions(strict, free);
        if (found.kind !== 'rays') {
          fc.pre(false);
          return;
        }
        const rays = found.rays.map((ray) => ray.strict);
        expect(isPeeled(x, rays)).toBe(true);
      }),
    );
  });
});

describe('bounds of the search for minimal solutions', () => {
  it('stops at a number of vectors, of steps, of digits, and names the bound', () => {
    const squares = equalLines(4);
    const limited = (bounds: Partial<typeof USUAL_BOUNDS>): unknown =>
      minimalSolutions(squares, [], startMeter({ ...USUAL_BOUNDS, ...bounds }));
    expect(limited({ vectors: 10 })).toEqual({ kind: 'too-hard', limit: '10 vectors' });
    expect(limited({ steps: 100 })).toEqual({ kind: 'too-hard', limit: '100 steps' });
    const wide = matrixOf('1000003 -1000033 0; 0 1000037 -1000039');
    expect(minimalSolutions(wide, [], startMeter({ ...USUAL_BOUNDS, digits: 8 }))).toEqual({
      kind: 'too-hard',
      limit: '8 digits',
    });
  });

  it('gives up on a hundred crowded columns within its usual bounds', () => {
    let state = 12345n;
    const next = (): bigint => {
      state = (state * 1103515245n + 12345n) % 2n ** 31n;
      return ((state >> 16n) % 11n) - 5n;
    };
    const rows = Array.from({ length: 12 }, () => Array.from({ length: 100 }, next));
    expect(minimalSolutions(rows, [])).toMatchObject({ kind: 'too-hard' });
  });
});

/** Square matrices of side n, row by row, whose rows and columns all have the sum of the first row. */
function equalLines(side: number): readonly (readonly bigint[])[] {
  const cells = Array.from({ length: side * side }, (_, at) => ({ row: Math.floor(at / side), column: at % side }));
  const line = (inLine: (cell: { row: number; column: number }) => boolean): readonly bigint[] =>
    cells.map((cell) => (inLine(cell) ? 1n : 0n) - (cell.row === 0 ? 1n : 0n));
  return Array.from({ length: side }, (_, at) => at).flatMap((at) => [
    line(({ row }) => row === at),
    line(({ column }) => column === at),
  ]);
}
