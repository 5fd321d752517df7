import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { USUAL_BOUNDS, startMeter } from '../../src/exact/bounds.ts';
import { integerKernel } from '../../src/exact/lattice.ts';
import { type IntegerMatrix, nullSpace, rankOf, transpose } from '../../src/exact/matrix.ts';
import { matrices } from '../exact/generators.ts';
import { asPari, askPari, isInstalled, skeletonSystems } from './exact-programs.ts';

const absent = !isInstalled('gp');
const widthOf = (matrix: IntegerMatrix): number => matrix[0]?.length ?? 0;

/** Random matrices of a fixed seed, small and past 2^200, and those of the skeletons. */
const cases = (): readonly IntegerMatrix[] => [
  ...fc.sample(matrices(8, 10, 9n), { numRuns: 80, seed: 11 }),
  ...fc.sample(matrices(6, 8, 2n ** 210n), { numRuns: 20, seed: 12 }),
  ...skeletonSystems().map(({ system }) => system.strict.map((row, index) => [...row, ...(system.free[index] ?? [])])),
];

/** For each case one line of 0 and 1: what PARI/GP says of ours. */
const verdicts = (statement: (matrix: IntegerMatrix) => string): readonly string[] =>
  askPari(
    cases()
      .map((matrix) => `M=${asPari(matrix, widthOf(matrix))};${statement(matrix)}`)
      .join('\n'),
  );

describe.skipIf(absent)('linear algebra against PARI/GP (skipped where gp is not installed)', () => {
  it('finds the same ranks', () => {
    expect(verdicts(() => 'print(matrank(M))')).toEqual(cases().map((matrix) => String(rankOf(matrix))));
  });

  it('finds the same null spaces', () => {
    // N holds our vectors as columns: M N = 0, independent, as many as PARI/GP finds, each without content
    const said = verdicts((matrix) => {
      const basis = nullSpace(matrix, widthOf(matrix));
      const columns = asPari(transpose(basis, widthOf(matrix)), basis.length);
      return (
        `N=${columns};K=matker(M);` +
        'print([if(#N,M*N==0,1),if(#N,matrank(N)==#N,1),#K==#N,vecsum(vector(#N,j,content(N[,j])!=1))==0])'
      );
    });
    expect(said).toEqual(cases().map(() => '[1, 1, 1, 1]'));
  });

  it('finds the same lattices of whole null vectors', () => {
    const said = verdicts((matrix) => {
      const kernel = integerKernel(matrix, widthOf(matrix), startMeter(USUAL_BOUNDS));
      const columns = asPari(transpose(kernel, widthOf(matrix)), kernel.length);
      return `N=${columns};K=matkerint(M);print(if(#N||#K,#N==#K&&mathnf(N)==mathnf(K),1))`;
    });
    expect(said).toEqual(cases().map(() => '1'));
  });
});
