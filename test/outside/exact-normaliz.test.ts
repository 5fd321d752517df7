import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { hilbertBasis } from '../../src/exact/hilbert.ts';
import { nullSpace } from '../../src/exact/matrix.ts';
import { minimalSolutions } from '../../src/exact/minimal.ts';
import type { WholeSolution } from '../../src/exact/positive.ts';
import { asSet } from '../exact/cases.ts';
import { type System, solvedSystems, systems } from '../exact/generators.ts';
import { askNormaliz, isInstalled, skeletonSystems } from './exact-programs.ts';

const absent = !isInstalled('normaliz');

const joined = (solutions: readonly WholeSolution[]): readonly string[] =>
  asSet(solutions.map(({ strict, free }) => [...strict, ...free]));

const expectSame = (system: System): void => {
  const theirs = askNormaliz(system);
  const rays = minimalSolutions(system.strict, system.free);
  const irreducible = hilbertBasis(system.strict, system.free);
  expect(rays.kind === 'rays' ? joined(rays.rays) : rays).toEqual(asSet(theirs.rays));
  expect(irreducible.kind === 'basis' ? joined(irreducible.elements) : irreducible).toEqual(asSet(theirs.irreducible));
};

/** Pointed systems only: dependent free columns leave lines. */
const pointed = (system: System): boolean => nullSpace(system.free, system.free[0]?.length ?? 0).length === 0;

describe.skipIf(absent)(
  'minimal and irreducible solutions against Normaliz (skipped where it is not installed)',
  () => {
    it('finds the same on random systems', () => {
      fc.sample(systems(4, 7, 2, 3n).filter(pointed), { numRuns: 25, seed: 21 }).forEach(expectSame);
    });

    it('finds the same on random systems that have solutions', () => {
      fc.sample(solvedSystems(3, 6, 2, 3n).filter(pointed), { numRuns: 25, seed: 22 }).forEach(expectSame);
    });

    it.each(skeletonSystems())('finds the same for $name', ({ system }) => {
      expectSame(system);
    });
  },
);
