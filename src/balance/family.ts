import { type Meter, type TooHard, startMeter } from '../exact/bounds.ts';
import { hilbertBasis } from '../exact/hilbert.ts';
import { magnitude } from '../exact/integer.ts';
import { type IntegerMatrix, independentColumns, nullSpace, range } from '../exact/matrix.ts';
import { bySupport, minimalSolutions } from '../exact/minimal.ts';
import { pickColumns, speciesMatrix } from './matrix.ts';
import { type Numbers, type Split, joinColumns, splitColumns } from './solve.ts';
import type { Unknown } from './unknowns.ts';

/** Balances of a skeleton, or the work limit that was passed. */
export type Family =
  | {
      readonly kind: 'family';
      readonly members: readonly Numbers[];
      /** False where free unknowns depend on one another in more ways than are looked at: there may be more members. */
      readonly complete: boolean;
    }
  | TooHard;

/** How many independent sets of dependent free unknowns are looked at. */
const MOST_SETS = 32;

/**
 * The minimal non-negative balances of `unknowns`: each keeps every species that has a side on that side or leaves it
 * out, none can lose a species and stay one, and every balance of the skeleton is a non-negative combination of them.
 * They are the extreme rays of  { (x, h) : A_S x + A_H h = 0, x >= 0, h free }.
 * Where the free unknowns depend on one another that set has no extreme rays: those of every independent set of free
 * unknowns are given in their place, for up to 32 sets.
 */
export const minimalBalances = (unknowns: readonly Unknown[], meter: Meter = startMeter()): Family => {
  const matrix = speciesMatrix(unknowns.map((unknown) => unknown.species));
  const split = splitColumns(matrix, unknowns);
  if (split.strictIndex.length === 0) {
    return { kind: 'family', members: nullSpace(matrix.rows, unknowns.length), complete: true };
  }
  const found = new Map<string, Numbers>();
  const sets = independentSets(split.free, meter);
  for (const kept of sets) {
    const some: Split = { ...split, free: pickColumns(split.free, kept), freeIndex: pick(split.freeIndex, kept) };
    const minimal = minimalSolutions(some.strict, some.free, meter);
    if (minimal.kind === 'too-hard') return minimal;
    if (minimal.kind === 'lines') throw new Error('an independent set cannot depend on itself');
    for (const ray of minimal.rays) {
      const numbers = joinColumns(some, ray, unknowns);
      found.set(numbers.join(), numbers);
    }
  }
  const members = bySupport([...found.values()], sizesOf);
  return meter.passed() ?? { kind: 'family', members, complete: sets.length < MOST_SETS };
};

/**
 * The irreducible whole balances: no one is a sum of two others, and every whole balance is a sum of them (the Hilbert
 * basis). The minimal balances are among them. Asked for where free unknowns depend on one another it is that of the
 * first independent set.
 */
export const irreducibleBalances = (unknowns: readonly Unknown[], meter: Meter = startMeter()): Family => {
  const split = splitColumns(speciesMatrix(unknowns.map((unknown) => unknown.species)), unknowns);
  const kept = independentColumns(split.free);
  const some: Split = { ...split, free: pickColumns(split.free, kept), freeIndex: pick(split.freeIndex, kept) };
  const found = hilbertBasis(some.strict, some.free, meter);
  if (found.kind === 'too-hard') return found;
  if (found.kind === 'lines') throw new Error('an independent set cannot depend on itself');
  const members = found.elements.map((element) => joinColumns(some, element, unknowns));
  return { kind: 'family', members, complete: kept.length === split.freeIndex.length };
};

const sizesOf = (numbers: Numbers): Numbers => numbers.map(magnitude);

const pick = (indices: readonly number[], at: readonly number[]): readonly number[] =>
  at.map((index) => indices[index] ?? 0);

/**
 * The largest sets of columns of `matrix` that do not depend on one another: all columns where they are independent.
 * Found by trying the columns in other orders: each column in turn is put last, and what falls out is put back before.
 */
const independentSets = (matrix: IntegerMatrix, meter: Meter): readonly (readonly number[])[] => {
  const columns = range(matrix[0]?.length ?? 0);
  const sets = new Map<string, readonly number[]>();
  const waiting: (readonly number[])[] = [columns];
  for (let order = waiting.shift(); order !== undefined && sets.size < MOST_SETS; order = waiting.shift()) {
    if (!meter.step(columns.length)) break;
    const kept = [...independentColumns(matrix, order, meter)].sort((a, b) => a - b);
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
