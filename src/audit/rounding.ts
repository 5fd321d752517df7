import { type Rational, ONE, denominatorOf, isWhole, numeratorOf, rational, showDecimal } from '../exact/rational.ts';
import type { Candidate, Problem } from './problem.ts';
import { onlyOne } from './solve.ts';

/** Decimals with this many places may have been cut instead of rounded. */
const PLACES_CUT = 3;

/** Places after the point of a decimal fraction, or null where `value` is whole or no decimal ("1/3"). */
export const decimalPlaces = (value: Rational): number | null => {
  if (isWhole(value)) return null;
  let rest = denominatorOf(value);
  let [twos, fives] = [0, 0];
  for (; rest % 2n === 0n; rest /= 2n) twos += 1;
  for (; rest % 5n === 0n; rest /= 5n) fives += 1;
  return rest === 1n ? Math.max(twos, fives) : null;
};

/** How far the number meant may be from the written one: half a unit of the last place, a whole one where it was cut. */
const slackOf = (value: Rational): Rational => {
  const places = decimalPlaces(value);
  if (places === null) return ONE.sub(ONE);
  const unit = rational(1n, 10n ** BigInt(places));
  return places >= PLACES_CUT ? unit : unit.div(rational(2n));
};

/**
 * The exact numbers that the written decimals stand for, where the only balance p agrees with all of them: a scale s
 * with  |s p_i - c_i| <= slack_i  for every i. The intervals of s meet in one, and its simplest fraction is taken.
 */
export const unrounded = (problem: Problem): readonly Candidate[] => {
  if (!problem.draft.some(({ coefficient }) => decimalPlaces(coefficient) !== null)) return [];
  const numbers = onlyOne(problem.balances);
  if (numbers === null || !problem.solvable) return [];
  const scale = commonScale(problem, numbers);
  if (scale === null) return [];
  const draft = problem.draft.map((term, index) => ({
    ...term,
    coefficient: scale.mul(rational(numbers[index] ?? 1n)),
  }));
  return [{ kind: 'rounding', draft }];
};

const commonScale = ({ draft }: Problem, numbers: readonly bigint[]): Rational | null => {
  const bounds = draft.map(({ coefficient }, index) => {
    const [slack, number] = [slackOf(coefficient), rational(numbers[index] ?? 1n)];
    return { low: coefficient.sub(slack).div(number), high: coefficient.add(slack).div(number) };
  });
  const low = bounds.reduce((most, bound) => (bound.low.compare(most) > 0 ? bound.low : most), ONE.sub(ONE));
  const high = bounds.reduce<Rational | null>(
    (least, bound) => (least === null || bound.high.compare(least) < 0 ? bound.high : least),
    null,
  );
  return high === null || low.compare(high) > 0 ? null : simplestBetween(low, high);
};

/**
 * The fraction with the smallest denominator in [low, high], low >= 0, by the continued fraction:
 *
 *     whole numbers first; else  a = floor(low),  low = a + 1/u,  high = a + 1/v,  v <= u,  answer a + 1/simplest[v, u]
 */
export const simplestBetween = (low: Rational, high: Rational): Rational => {
  const up = low.ceil();
  if (up.compare(high) <= 0) return up;
  const floor = low.floor();
  return floor.add(ONE.div(simplestBetween(ONE.div(high.sub(floor)), ONE.div(low.sub(floor)))));
};

/** A small exact number as one says it, by its two leading digits: 1/10^15 is "1e-15", 0.00033.. "3.3e-4". */
export const sayTiny = (value: Rational): string => {
  let exponent = 0;
  const unit = denominatorOf(value);
  let number = numeratorOf(value.abs());
  if (number === 0n || number >= unit) return showDecimal(value.abs());
  for (; number < unit; exponent -= 1) number *= 10n;
  const next = ((number * 10n) / unit) % 10n;
  return `${String(number / unit)}${next === 0n ? '' : `.${String(next)}`}e${String(exponent)}`;
};
