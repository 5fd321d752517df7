import type { TooHard } from '../exact/bounds.ts';
import { hilbertBasis } from '../exact/hilbert.ts';
import { type IntegerMatrix, independentColumns, nullSpace, range } from '../exact/matrix.ts';
import { compareSupports, minimalSolutions } from '../exact/minimal.ts';
import { pickColumns, speciesMatrix } from './matrix.ts';
import { type Numbers, type Split, joinColumns, splitColumns } from './solve.ts';
import type { Unknown } from './unknowns.ts';

/** The minimal balances of a skeleton, or the work limit that was passed. */
export type Family = { readonly kind: 'family'; readonly members: readonly Numbers[] } | TooHard;

/** How many independent sets of dependent free unknowns are looked at. */
const MOST_SETS = 32;

/**
 * The minimal non-negative balances of `unknowns`: each keeps every species that has a side on that side or leaves it
 * out, none can lose a species and stay one, and every balance of the skeleton is a non-negative combination of them.
 * They are the extreme rays of  { (x, h) : A_S x + A_H h = 0, x >= 0, h free }.
 * Where the free unknowns depend on one another that set has no extreme rays: those of every independent set of free
 * unknowns are given in their place, for up to 32 sets.
 */
export const minimalBalances = (unknowns: readonly Unknown[]): Family => {
  const matrix = speciesMatrix(unknowns.map((unknown) => unknown.species));
  const split = splitColumns(matrix, unknowns);
  if (split.strictIndex.length === 0) return { kind: 'family', members: nullSpace(matrix.rows, unknowns.length) };
  const found = new Map<string, Numbers>();
  for (const kept of independentSets(split.free)) {
    const some: Split = { ...split, free: pickColumns(split.free, kept), freeIndex: pick(split.freeIndex, kept) };
    const minimal = minimalSolutions(some.strict, some.free);
    if (minimal.kind === 'too-hard') return minimal;
    if (minimal.kind === 'lines') throw new Error('an independent set cannot depend on itself');
    for (const ray of minimal.rays) {
      const numbers = joinColumns(some, ray, unknowns);
      found.set(numbers.join(), numbers);
    }
  }
  return { kind: 'family', members: [...found.values()].toSorted(bySize) };
};

/**
 * The irreducible whole balances: no one is a sum of two others, and every whole balance is a sum of them (the Hilbert
 * basis). The minimal balances are among them. Asked for where free unknowns depend on one another it is that of the
 * first independent set.
 */
export const irreducibleBalances = (unknowns: readonly Unknown[]): Family => {
  const split = splitColumns(speciesMatrix(unknowns.map((unknown) => unknown.species)), unknowns);
  const kept = independentColumns(split.free);
  const some: Split = { ...split, free: pickColumns(split.free, kept), freeIndex: pick(split.freeIndex, kept) };
  const found = hilbertBasis(some.strict, some.free);
  if (found.kind === 'too-hard') return found;
  if (found.kind === 'lines') throw new Error('an independent set cannot depend on itself');
  return { kind: 'family', members: found.elements.map((element) => joinColumns(some, element, unknowns)) };
};

const bySize = (a: Numbers, b: Numbers): number => {
  const sizes = (numbers: Numbers): Numbers => numbers.map((value) => (value < 0n ? -value : value));
  return compareSupports(sizes(a), sizes(b));
};

const pick = (indices: readonly number[], at: readonly number[]): readonly number[] =>
  at.map((index) => indices[index] ?? 0);

/**
 * The largest sets of columns of `matrix` that do not depend on one another: all columns where they are independent.
 * Found by trying the columns in other orders: each column in turn is put last, and what falls out is put back before.
 */
const independentSets = (matrix: IntegerMatrix): readonly (readonly number[])[] => {
  const columns = range(matrix[0]?.length ?? 0);
  const sets = new Map<string, readonly number[]>();
  const waiting: (readonly number[])[] = [columns];
  for (let order = waiting.shift(); order !== undefined && sets.size < MOST_SETS; order = waiting.shift()) {
    const kept = [...independentColumns(matrix, order)].sort((a, b) => a - b);
    const name = kept.join();
    if (sets.has(name)) continue;
    sets.set(name, kept);
    const out = columns.filter((column) => !kept.includes(column));
    // an exchange: one that is out comes first, one that is in goes last
    for (const coming of out) for (const going of kept) waiting.push(exchanged(kept, out, coming, going));
  }
  return [...sets.values()];
};

const exchanged = (
  kept: readonly number[],
  out: readonly number[],
  coming: number,
  going: number,
): readonly number[] => [
  coming,
  ...kept.filter((column) => column !== going),
  ...out.filter((column) => column !== coming),
  going,
];
