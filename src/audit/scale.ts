import { type Rational, ONE, isWhole, isZero, rational } from '../exact/rational.ts';

/** Written numbers, null where a term is new, and how far a set of numbers is from them. */
export type Written = readonly (Rational | null)[];

interface Fit {
  readonly scale: Rational;
  readonly changed: number;
  readonly distance: number;
}

const valueOf = (value: Rational): number => Number(value.n) / Number(value.d);

/** How far `to` is from `from` in doublings. */
export const doublings = (from: Rational, to: Rational): number => {
  const ratio = valueOf(to.div(from));
  return Number.isFinite(ratio) && ratio > 0 ? Math.abs(Math.log2(ratio)) : 0;
};

const fitOf = (numbers: readonly bigint[], written: Written, scale: Rational): Fit => {
  let changed = 0;
  let distance = 0;
  numbers.forEach((number, index) => {
    const was = written[index] ?? null;
    const is = scale.mul(rational(number));
    if (was === null || isZero(was) || isZero(is) || is.equals(was)) return;
    changed += 1;
    distance += doublings(was, is);
  });
  return { scale, changed, distance };
};

/**
 * The multiples of the primitive `numbers` (all >= 0) worth showing: the one that changes the fewest of the written
 * numbers, the smallest change first; and the primitive one itself, if that is another. Fractions come only where
 * fractions were written: every multiple keeps to their common denominator `allowed`.
 */
export const bestScales = (
  numbers: readonly bigint[],
  written: Written,
  allowed: bigint,
): readonly (readonly Rational[])[] => {
  const fits = (scale: Rational): boolean => numbers.every((number) => isWhole(scale.mul(rational(number * allowed))));
  const candidates = [ONE];
  numbers.forEach((number, index) => {
    const was = written[index] ?? null;
    if (was === null || number === 0n) return;
    const scale = was.div(rational(number));
    if (fits(scale) && !candidates.some((other) => other.equals(scale))) candidates.push(scale);
  });
  const ranked = candidates
    .map((scale) => fitOf(numbers, written, scale))
    .sort(
      (a, b) => a.changed - b.changed || Number(isUnit(b.scale)) - Number(isUnit(a.scale)) || a.distance - b.distance,
    );
  const kept = ranked.filter(({ scale }, index) => index === 0 || isUnit(scale));
  return kept.map(({ scale }) => numbers.map((number) => scale.mul(rational(number))));
};

const isUnit = (scale: Rational): boolean => scale.equals(ONE);
