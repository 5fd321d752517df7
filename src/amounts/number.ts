import { type Rational, denominatorOf, numeratorOf, rational, rationalFromText } from '../exact/rational.ts';

/** A decimal number as written, with the uncertainty in brackets after its last digits if there is one. */
export interface WrittenNumber {
  readonly value: Rational;
  /** Standard uncertainty from `2.000(4)`; null where none is written. */
  readonly uncertainty: Rational | null;
  /** One unit in the last written digit. */
  readonly lastDigit: Rational;
}

const BLANK = '[ \\u00a0\\u2009\\u202f]';
const WHOLE = `\\d{1,3}(?:${BLANK}\\d{3})+(?!\\d)|\\d+`;

/**
 * A number at the start of a text: groups of three digits, a decimal point, an uncertainty in brackets, a power of
 * ten as `e3`, `x10^3` or `× 10³`; the brackets may stand behind the power too. Groups: sign, whole part, decimals,
 * uncertainty, exponent, the same after ×, the same in superscript, uncertainty behind it.
 */
export const NUMBER_PATTERN = new RegExp(
  `([+−-]?)(${WHOLE})?(?:\\.(\\d*))?(?:\\((\\d+(?:\\.\\d+)?)\\))?` +
    '(?:(?:[eE]([+−-]?\\d+)(?![\\d.])|\\s*[x×*·]\\s*10(?:\\^([+−-]?\\d+)|([⁺⁻]?[⁰¹²³⁴-⁹]+)))(?:\\((\\d+(?:\\.\\d+)?)\\))?)?',
  'uy',
);

const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const plainDigits = (text: string): string =>
  text
    .replace(/[−⁻]/gu, '-')
    .replace(/⁺/gu, '')
    .replace(/[⁰¹²³⁴-⁹]/gu, (digit) => String(SUPERSCRIPTS.indexOf(digit)));

const tenTo = (power: number): Rational =>
  power < 0 ? rational(1n, 10n ** BigInt(-power)) : rational(10n ** BigInt(power));

/** Digits of a number, and its largest power of ten either way. */
export const MOST_DIGITS = 60;

/** Brackets hold digits of the last places, `2.000(4)` is 0.004; with a point they hold the value, `20.0(1.2)`. */
const bracketed = (text: string, lastDigit: Rational): Rational =>
  text.includes('.') ? rationalFromText(text) : rationalFromText(text).mul(lastDigit);

/** Why a text that looks like a number is none of use. */
export type NumberFault = 'no-digits' | 'too-many-digits' | 'out-of-range' | 'two-uncertainties';

/** The parts of a match, '' for what is not written. */
interface Parts {
  readonly sign: string;
  readonly digits: string;
  readonly decimals: string;
  readonly exponent: number;
  /** Brackets before the power of ten and behind it. */
  readonly uncertainties: readonly string[];
}

const partsOf = (match: RegExpExecArray): Parts => {
  const [, sign = '', whole = '', decimals = '', ...others] = match as readonly (string | undefined)[];
  const [inside, plain, raised, superscript, behind] = others;
  return {
    sign,
    digits: whole.replace(/\D/gu, ''),
    decimals,
    exponent: Number(plainDigits(plain ?? raised ?? superscript ?? '0')),
    uncertainties: [inside, behind].filter((text) => text !== undefined),
  };
};

const faultOf = ({ digits, decimals, exponent, uncertainties }: Parts): NumberFault | null => {
  if (digits + decimals === '') return 'no-digits';
  if (digits.length + decimals.length > MOST_DIGITS) return 'too-many-digits';
  if (Math.abs(exponent) > MOST_DIGITS) return 'out-of-range';
  return uncertainties.length > 1 ? 'two-uncertainties' : null;
};

/** The number that a match of `NUMBER_PATTERN` spells, or why it is of no use. */
export const numberFromMatch = (match: RegExpExecArray): WrittenNumber | NumberFault => {
  const parts = partsOf(match);
  const fault = faultOf(parts);
  if (fault !== null) return fault;
  const { sign, digits, decimals, exponent, uncertainties } = parts;
  const [uncertainty] = uncertainties;
  const size = rationalFromText(`${digits === '' ? '0' : digits}.${decimals}`).mul(tenTo(exponent));
  const spread = uncertainty === undefined ? null : bracketed(uncertainty, tenTo(-decimals.length));
  return {
    value: sign === '' || sign === '+' ? size : size.neg(),
    uncertainty: spread?.mul(tenTo(exponent)) ?? null,
    lastDigit: tenTo(exponent - decimals.length),
  };
};

/** The nearest float of an exact number. */
export const toFloat = (value: Rational): number => Number(numeratorOf(value)) / Number(denominatorOf(value));
