import Fraction from 'fraction.js';

/** An exact fraction in lowest terms. Only this file knows that fraction.js stands behind it. */
export type Rational = Fraction;

export const ZERO: Rational = new Fraction(0n);
export const ONE: Rational = new Fraction(1n);

/** The rational `numerator / denominator`; the denominator must not be 0. */
export const rational = (numerator: bigint, denominator: bigint = 1n): Rational => new Fraction(numerator, denominator);

const DECIMAL = String.raw`(\d+(?:\.\d*)?|\.\d+)`;
const RATIONAL = new RegExp(`^([+-]?)${DECIMAL}(?:/${DECIMAL})?$`, 'u');

/**
 * The exact value of a decimal or of a fraction of decimals: "0.35" is 7/20, "-5/2", "1.5/4" is 3/8. Undefined for
 * anything else, a division by 0 among it; there are no exponents, no inner blanks, no repeating decimals.
 */
export const readRational = (text: string): Rational | undefined => {
  const match = RATIONAL.exec(text.trim());
  if (match === null) return undefined;
  const [, sign = '', numerator = '', denominator = '1'] = match;
  const below = decimal(denominator);
  if (isZero(below)) return undefined;
  const size = decimal(numerator).div(below);
  return sign === '-' ? size.neg() : size;
};

/** The exact value of a text that is known to be well formed; anything `readRational` refuses is a broken program. */
export const rationalFromText = (text: string): Rational => {
  const value = readRational(text);
  if (value === undefined) throw new RangeError(`not an exact number: ${text}`);
  return value;
};

/** Digits after the point become a power of ten below the line: no float, no repeating-decimal syntax. */
const decimal = (text: string): Rational => {
  const [whole = '', part = ''] = text.split('.');
  return new Fraction(BigInt(whole + part), 10n ** BigInt(part.length));
};

/** Numerator, with the sign. */
export const numeratorOf = (value: Rational): bigint => value.s * value.n;

/** Denominator, always positive. */
export const denominatorOf = (value: Rational): bigint => value.d;

/** True where the denominator is 1. */
export const isWhole = (value: Rational): boolean => value.d === 1n;

/** True for exactly 0. */
export const isZero = (value: Rational): boolean => value.n === 0n;

/** -1n, 0n or 1n. */
export const signOf = (value: Rational): bigint => (value.n === 0n ? 0n : value.s);

/** The contract's exact string: "5", "-5/2". */
export const showRational = (value: Rational): string =>
  isWhole(value) ? String(numeratorOf(value)) : `${String(numeratorOf(value))}/${String(value.d)}`;

/** A terminating decimal as such ("0.35"), anything else as "1/3"; integers plain. */
export const showDecimal = (value: Rational): string => {
  let rest = value.d;
  let twos = 0;
  let fives = 0;
  for (; rest % 2n === 0n; rest /= 2n) twos += 1;
  for (; rest % 5n === 0n; rest /= 5n) fives += 1;
  if (rest !== 1n) return showRational(value);
  const places = Math.max(twos, fives);
  if (places === 0) return showRational(value);
  const scaled = (value.n * 10n ** BigInt(places)) / value.d;
  const digits = scaled.toString().padStart(places + 1, '0');
  const sign = value.s < 0n ? '-' : '';
  return `${sign}${digits.slice(0, -places)}.${digits.slice(-places)}`;
};
