import { type Meter, type TooHard, startMeter } from '../exact/bounds.ts';
import { echelonOf, freeColumns, nullVector, primitiveVector, range } from '../exact/matrix.ts';
import { type WholeSolution, idleColumns, strictlyPositive } from '../exact/positive.ts';
import { type Label, type SpeciesMatrix, pickColumns, speciesMatrix } from './matrix.ts';
import { orient, wrongSided } from './orient.ts';
import type { Unknown } from './unknowns.ts';

/** Stoichiometric numbers of the unknowns, in their order; negative: a reactant. Whole and primitive. */
export type Numbers = readonly bigint[];

/** Weights on elements and charge that prove an impossibility: not 0, in the order of the labels. */
export type Weights = ReadonlyMap<Label, bigint>;

/** What conservation says of a skeleton. `dimension`: unknowns minus rank. `index` points into the unknowns. */
export type Verdict =
  | { readonly kind: 'unique'; readonly numbers: Numbers; readonly dimension: number }
  | { readonly kind: 'family'; readonly dimension: number }
  | { readonly kind: 'missing-element'; readonly element: Label; readonly index: number }
  | { readonly kind: 'no-balance'; readonly weights: Weights }
  | { readonly kind: 'wrong-side'; readonly index: number; readonly numbers: Numbers }
  | { readonly kind: 'idle-species'; readonly index: number }
  | TooHard;

/**
 * The verdict on `unknowns`, by the contract's precedence: `missing-element`; then, where every strict unknown can
 * stand on its side, `unique` (dimension 1) or `family`; else dimension 0 is `no-balance`, dimension 1 `wrong-side` or
 * `idle-species`, a larger one `idle-species` where some of the skeleton balances, else `no-balance`. `too-hard` once
 * `meter` has passed a bound.
 */
export const solve = (unknowns: readonly Unknown[], meter: Meter = startMeter()): Verdict => {
  const missing = missingElement(unknowns);
  if (missing !== undefined) return missing;
  const matrix = speciesMatrix(unknowns.map((unknown) => unknown.species));
  const echelon = echelonOf(matrix.rows, range(unknowns.length), meter);
  const passed = meter.passed();
  if (passed !== undefined) return passed;
  const [free, second] = freeColumns(echelon, unknowns.length);
  const split = splitColumns(matrix, unknowns);
  if (free === undefined) return noBalance(matrix, split, meter);
  if (second === undefined) return onLine(unknowns, nullVector(echelon, free, unknowns.length));
  return inSpace(matrix, split, unknowns.length - echelon.pivots.length, meter);
};

/** An element that only one side of the skeleton writes and that no helper brings or takes. */
const missingElement = (unknowns: readonly Unknown[]): Verdict | undefined => {
  const lent = new Set(unknowns.filter((one) => one.helper).flatMap((one) => [...one.species.composition.keys()]));
  const elements = new Set(unknowns.flatMap((one) => [...one.species.composition.keys()]));
  for (const element of elements) {
    if (lent.has(element)) continue;
    const holders = unknowns.filter((one) => one.species.composition.has(element));
    const stands = (side: 'left' | 'right'): boolean => holders.some((one) => one.side === side || one.side === 'free');
    if (stands('left') && stands('right')) continue;
    return { kind: 'missing-element', element, index: unknowns.findIndex((one) => one === holders[0]) };
  }
  return undefined;
};

/** The strict columns, signed so that every one of them is sought positive, and the free ones. */
export interface Split {
  readonly strictIndex: readonly number[];
  readonly freeIndex: readonly number[];
  readonly strict: readonly (readonly bigint[])[];
  readonly free: readonly (readonly bigint[])[];
}

/** Reactants change sign:  sum nu_j a_j = 0  with nu_j = -x_j on the left and x_j on the right, all x_j > 0. */
export const splitColumns = (matrix: SpeciesMatrix, unknowns: readonly Unknown[]): Split => {
  const indices = unknowns.map((_, index) => index);
  const strictIndex = indices.filter((index) => unknowns[index]?.side !== 'free');
  const freeIndex = indices.filter((index) => unknowns[index]?.side === 'free');
  const signs = strictIndex.map((index) => (unknowns[index]?.side === 'left' ? -1n : 1n));
  const strict = pickColumns(matrix.rows, strictIndex).map((row) => row.map((value, at) => value * (signs[at] ?? 1n)));
  return { strictIndex, freeIndex, strict, free: pickColumns(matrix.rows, freeIndex) };
};

/** The numbers of the unknowns that a solution of the split columns stands for. */
export const joinColumns = (split: Split, found: WholeSolution, unknowns: readonly Unknown[]): Numbers => {
  const numbers = new Array<bigint>(unknowns.length).fill(0n);
  split.strictIndex.forEach((index, at) => {
    const x = found.strict[at] ?? 0n;
    numbers[index] = unknowns[index]?.side === 'left' ? -x : x;
  });
  split.freeIndex.forEach((index, at) => {
    numbers[index] = found.free[at] ?? 0n;
  });
  return numbers;
};

/** All balances are multiples of one vector. */
const onLine = (unknowns: readonly Unknown[], line: Numbers): Verdict => {
  const numbers = orient(unknowns, line);
  const wrong = wrongSided(unknowns, numbers);
  if (wrong !== undefined) return { kind: 'wrong-side', index: wrong, numbers };
  const idle = unknowns.findIndex((unknown, index) => unknown.side !== 'free' && numbers[index] === 0n);
  return idle === -1 ? { kind: 'unique', numbers, dimension: 1 } : { kind: 'idle-species', index: idle };
};

/** More than one balance, if any. A column that is 0 in every non-negative solution is idle; all of them: none exists. */
const inSpace = (matrix: SpeciesMatrix, split: Split, dimension: number, meter: Meter): Verdict => {
  const idle = idleColumns(split.strict, split.free, meter);
  if (idle.kind === 'too-hard') return idle;
  const [first] = idle.columns;
  if (first === undefined) return { kind: 'family', dimension };
  if (idle.columns.length === split.strictIndex.length) return noBalance(matrix, split, meter);
  return { kind: 'idle-species', index: split.strictIndex[first] ?? 0 };
};

/** Stiemke's certificate, its weights those of whole atoms; nothing to certify where no species has a side of its own. */
const noBalance = (matrix: SpeciesMatrix, split: Split, meter: Meter): Verdict => {
  if (split.strictIndex.length === 0) return { kind: 'no-balance', weights: new Map() };
  const found = strictlyPositive(split.strict, split.free, meter);
  if (found.kind === 'too-hard') return found;
  if (found.kind === 'solvable') throw new Error('a solvable system has no certificate');
  const weights = primitiveVector(found.certificate.map((weight, row) => weight * (matrix.scales[row] ?? 1n)));
  const pairs = matrix.labels.map((label, row): [Label, bigint] => [label, weights[row] ?? 0n]);
  return { kind: 'no-balance', weights: new Map(pairs.filter(([, weight]) => weight !== 0n)) };
};
