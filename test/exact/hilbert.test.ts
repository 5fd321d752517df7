import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { USUAL_BOUNDS, startMeter } from '../../src/exact/bounds.ts';
import { hilbertBasis } from '../../src/exact/hilbert.ts';
import { minimalSolutions } from '../../src/exact/minimal.ts';
import type { IntegerMatrix } from '../../src/exact/matrix.ts';
import { asSet, casesOf, matrixOf } from './cases.ts';
import { residual, solvedSystems, systems } from './generators.ts';

/** Whether x is a sum of elements, by trying each that fits, depth first. */
const isSum = (x: readonly bigint[], elements: IntegerMatrix): boolean =>
  x.every((value) => value === 0n) ||
  elements.some(
    (element) =>
      element.every((value, at) => value <= (x[at] ?? 0n)) &&
      isSum(
        x.map((value, at) => value - (element[at] ?? 0n)),
        elements,
      ),
  );

/** Every x with entries up to `most` that solves, h whole: by trying all of them. Free numbers within ± `reach`. */
const allSolutions = (strict: IntegerMatrix, free: IntegerMatrix, most: bigint, reach: bigint): IntegerMatrix => {
  const box = (width: number, from: bigint, to: bigint): IntegerMatrix => {
    if (width === 0) return [[]];
    const values: bigint[] = [];
    for (let value = from; value <= to; value += 1n) values.push(value);
    return box(width - 1, from, to).flatMap((vector) => values.map((value) => [...vector, value]));
  };
  const offsets = box(free[0]?.length ?? 0, -reach, reach);
  return box(strict[0]?.length ?? 0, 0n, most).filter((x) =>
    offsets.some((h) => residual({ strict, free }, x, h).every((value) => value === 0n)),
  );
};

describe('Hilbert bases', () => {
  it.each(casesOf('minimal.tsv'))('lists the irreducible: %s', (_, strict = '', free = '', _rays, elements = '') => {
    const found = hilbertBasis(matrixOf(strict), matrixOf(free));
    expect(found.kind).toBe('basis');
    if (found.kind === 'basis')
      expect(asSet(found.elements.map((element) => element.strict))).toEqual(asSet(matrixOf(elements)));
  });

  it('gives each its free numbers', () => {
    expect(hilbertBasis(matrixOf('1 1'), matrixOf('2'))).toEqual({
      kind: 'basis',
      elements: [
        { strict: [2n, 0n], free: [-1n] },
        { strict: [0n, 2n], free: [-1n] },
        { strict: [1n, 1n], free: [-1n] },
      ],
    });
  });

  it('returns the lines of dependent free columns', () => {
    expect(hilbertBasis(matrixOf('1'), matrixOf('1 2'))).toEqual({ kind: 'lines', lines: [[-2n, 1n]] });
  });

  it.each([
    [3, 5],
    [4, 20],
  ])(
    'finds the irreducible magic squares of side %i: %i (Ahmed, De Loera, Hemmecke 2003, from memory)',
    (side, count) => {
      const found = hilbertBasis(magicSquares(side), []);
      expect(found.kind === 'basis' ? found.elements.length : found).toBe(count);
    },
  );

  it('agrees with trying every small vector', () => {
    fc.assert(
      fc.property(systems(2, 4, 1, 2n), ({ strict, free }) => {
        const found = hilbertBasis(strict, free);
        if (found.kind !== 'basis') return;
        const most = 4n;
        const small = allSolutions(strict, free, most, 34n).filter((x) => x.some((value) => value !== 0n));
        const irreducible = small.filter(
          (x) => !small.some((y) => y !== x && y.every((value, at) => value <= (x[at] ?? 0n))),
        );
        const elements = found.elements.map((element) => element.strict);
        expect(asSet(elements.filter((x) => x.every((value) => value <= most)))).toEqual(asSet(irreducible));
      }),
      { numRuns: 60 },
    );
  });

  it('makes up every whole solution as a sum, and holds no element that is one', () => {
    fc.assert(
      fc.property(solvedSystems(3, 5, 2, 3n), ({ strict, free, x }) => {
        const found = hilbertBasis(strict, free);
        if (found.kind !== 'basis') {
          fc.pre(false);
          return;
        }
        const elements = found.elements.map((element) => element.strict);
        expect(isSum(x, elements)).toBe(true);
        // one inside another would leave a difference that solves too
        for (const element of elements) {
          expect(elements.filter((other) => other.every((value, at) => value <= (element[at] ?? 0n)))).toEqual([
            element,
          ]);
        }
        for (const { strict: whole, free: h } of found.elements) {
          expect(residual({ strict, free }, whole, h).every((value) => value === 0n)).toBe(true);
        }
      }),
      { numRuns: 60 },
    );
  });

  it('holds every minimal solution', () => {
    fc.assert(
      fc.property(systems(3, 6, 2, 3n), ({ strict, free }) => {
        const rays = minimalSolutions(strict, free);
        const found = hilbertBasis(strict, free);
        if (rays.kind !== 'rays' || found.kind !== 'basis') {
          expect(found.kind === 'too-hard' || rays.kind === found.kind).toBe(true);
          return;
        }
        const elements = new Set(asSet(found.elements.map((element) => element.strict)));
        for (const ray of asSet(rays.rays.map((element) => element.strict))) expect(elements.has(ray)).toBe(true);
      }),
      { numRuns: 60 },
    );
  });

  it('stays exact past 2^200', () => {
    const [a, b] = [2n ** 210n + 1n, 2n ** 210n + 2n];
    expect(hilbertBasis([[a, -b]], [])).toEqual({ kind: 'basis', elements: [{ strict: [b, a], free: [] }] });
  });

  it('stops at a bound and names it', () => {
    // x, y, 10^60 x - y >= 0: (1, k) is irreducible for every k up to 10^60
    const endless = [[10n ** 60n, -1n, -1n]];
    expect(hilbertBasis(endless, [], startMeter({ ...USUAL_BOUNDS, vectors: 50 }))).toEqual({
      kind: 'too-hard',
      limit: '50 vectors',
    });
    expect(hilbertBasis(endless, [], startMeter({ ...USUAL_BOUNDS, digits: 20 }))).toEqual({
      kind: 'too-hard',
      limit: '20 digits',
    });
    const few = startMeter({ ...USUAL_BOUNDS, steps: 30 });
    expect(hilbertBasis(endless, [], few)).toEqual({ kind: 'too-hard', limit: '30 steps' });
  });
});

/** Square matrices of side n, row by row, whose rows, columns and two diagonals all have one sum. */
function magicSquares(side: number): IntegerMatrix {
  const cells = Array.from({ length: side * side }, (_, at) => ({ row: Math.floor(at / side), column: at % side }));
  const line = (inLine: (cell: { row: number; column: number }) => boolean): readonly bigint[] =>
    cells.map((cell) => (inLine(cell) ? 1n : 0n) - (cell.row === 0 ? 1n : 0n));
  const places = Array.from({ length: side }, (_, at) => at);
  return [
    ...places.flatMap((at) => [line(({ row }) => row === at), line(({ column }) => column === at)]),
    line(({ row, column }) => row === column),
    line(({ row, column }) => row + column === side - 1),
  ];
}
