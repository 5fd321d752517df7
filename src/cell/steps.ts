import { lcmOf } from '../exact/integer.ts';
import { type IntegerVector, nullSpace, range } from '../exact/matrix.ts';
import { type Rational, ONE, ZERO, denominatorOf, numeratorOf, rational, signOf } from '../exact/rational.ts';
import type { HalfReaction } from '../redox/half-reaction.ts';
import { amountsIn, poolOf } from './pool.ts';

/** Which of two steps makes the intermediate: the one listed first, the one listed later, or either. */
type Sense = 'any' | 'forward' | 'backward';

/**
 * How often each of several consecutive steps runs for one electron of their electrode's current: scaled so that
 * what one step makes and another uses cancels, where that fixes the ratio; else one to one.
 */
export const runSteps = (halves: readonly HalfReaction[]): readonly Rational[] => {
  const ratio = halves.length === 1 ? [ONE] : stepRatio(halves);
  const electrons = halves.reduce((sum, half, step) => sum.add(half.electrons.mul(ratio[step] ?? ZERO)), ZERO);
  return ratio.map((times) => times.div(electrons));
};

const stepRatio = (halves: readonly HalfReaction[]): readonly Rational[] => {
  for (const sense of ['any', 'forward', 'backward'] as const) {
    const found = linkedRatio(intermediateRows(halves, sense), halves.length);
    if (found !== null) return found;
  }
  return halves.map(() => ONE);
};

/** One row for each intermediate: what every step makes of it. Helpers of the media are not intermediates. */
const intermediateRows = (halves: readonly HalfReaction[], sense: Sense): readonly IntegerVector[] => {
  const pool = poolOf(halves.map((half) => half.reaction));
  const helpers = new Set(halves.flatMap((half) => half.medium.helpers.map((helper) => helper.key)));
  const made = halves.map((half) => amountsIn(pool, half.reaction));
  return pool.species
    .map((species, place) => (helpers.has(species.key) ? [] : made.map((amounts) => amounts[place] ?? ZERO)))
    .filter((row) => passesOn(row.map(signOf), sense))
    .map(wholeRow);
};

/** A step makes it (1n) and another one uses it (-1n), in the sense asked. */
const passesOn = (signs: readonly bigint[], sense: Sense): boolean => {
  if (!signs.includes(1n) || !signs.includes(-1n)) return false;
  if (sense === 'any') return true;
  return signs.indexOf(1n) < signs.indexOf(-1n) === (sense === 'forward');
};

const wholeRow = (row: readonly Rational[]): IntegerVector => {
  const scale = rational(lcmOf(row.map(denominatorOf)));
  return row.map((value) => numeratorOf(value.mul(scale)));
};

/**
 * The positive ratio w with  row w = 0  for every row. Steps that no row links are independent of one another and
 * run one to one; null where a group of linked steps has no positive ratio or more than one.
 */
const linkedRatio = (rows: readonly IntegerVector[], steps: number): readonly Rational[] | null => {
  const ratio = range(steps).map(() => 1n);
  for (const group of linkedGroups(rows, steps)) {
    if (group.length === 1) continue;
    const basis = nullSpace(
      rows.map((row) => group.map((step) => row[step] ?? 0n)),
      group.length,
    );
    const [only] = basis;
    if (basis.length !== 1 || only === undefined || only.some((value) => value <= 0n)) return null;
    group.forEach((step, at) => (ratio[step] = only[at] ?? 1n));
  }
  return ratio.map((value) => rational(value));
};

/** The steps in groups that share rows, directly or through one another. */
const linkedGroups = (rows: readonly IntegerVector[], steps: number): readonly (readonly number[])[] => {
  const group = range(steps).map((step) => step);
  for (const row of rows) {
    const linked = new Set(group.filter((_, step) => (row[step] ?? 0n) !== 0n));
    const first = Math.min(...linked);
    group.forEach((label, step) => {
      if (linked.has(label)) group[step] = first;
    });
  }
  return [...new Set(group)].map((label) => range(steps).filter((step) => group[step] === label));
};
