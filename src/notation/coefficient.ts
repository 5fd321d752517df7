import { type Rational, ONE, ZERO, rational, rationalFromText, signOf } from '../exact/rational.ts';
import { type Result, failure, success } from '../report/result.ts';
import type { Unknowns } from './count.ts';
import { UNKNOWN_SUBSCRIPTS } from './lexer.ts';
import { LIMITS } from './limits.ts';
import { faultAt } from './place.ts';
import { VULGAR_CLASS, VULGAR_FRACTIONS } from './vulgar.ts';

/** A term cut into its coefficient and the rest; `length` UTF-16 units of coefficient, 0 where none is written. */
export interface Coefficient {
  readonly value: Rational;
  readonly length: number;
}

const NUMBER = String.raw`\d+\s*[/⁄]\s*\d+|\d+(?:\.\d+)?|\.\d+`;
/** `2`, `1/2`, `0.5`, `½`, `1½`, `1 1/2`, `(1/2)`, `-2`; then spaces or a times sign. */
const NUMERIC = new RegExp(
  String.raw`^([-−–]?)(?:(\d*)\s*([${VULGAR_CLASS}])|(\d+)\s+(\d+\s*[/⁄]\s*\d+)|\(\s*(${NUMBER})\s*\)|(${NUMBER}))(?:\s*[*·×]\s*(?=[A-Za-z([{^])|\s*)`,
  'u',
);

const valueOf = (text: string): Rational | null => {
  const [above = '', below = '1'] = text.replace('⁄', '/').split('/');
  const divisor = rationalFromText(below.trim());
  return signOf(divisor) === 0n ? null : rationalFromText(above.trim()).div(divisor);
};

const numericValue = (match: RegExpExecArray): Rational | null => {
  const [, sign = '', wholeBefore = '', vulgar, mixedWhole, mixedPart, bracketed, simple] = match;
  const parts =
    vulgar !== undefined
      ? [wholeBefore === '' ? '0' : wholeBefore, VULGAR_FRACTIONS.get(vulgar) ?? '0']
      : mixedWhole !== undefined
        ? [mixedWhole, mixedPart ?? '0']
        : [bracketed ?? simple ?? '0'];
  const values = parts.map(valueOf);
  if (values.includes(null)) return null;
  const total = values.reduce<Rational>((sum, value) => sum.add(value ?? ZERO), ZERO);
  return sign === '' ? total : total.neg();
};

const SUMMAND = String.raw`(?:\d+(?:\.\d+)?)?\s*U|\d+(?:\.\d+)?(?:\s*/\s*\d+)?`;

interface UnknownPatterns {
  readonly start: RegExp;
  readonly summand: RegExp;
}

const patternsOf = (unknowns: readonly string[]): UnknownPatterns => {
  const names = unknowns
    .filter((name) => /^\p{Ll}\p{L}*$/u.test(name) && name !== 'e')
    .toSorted((a, b) => b.length - a.length)
    .join('|');
  const one = SUMMAND.replace('U', `(?:${names})(?:\\s*/\\s*\\d+)?`);
  const follows = String.raw`(?=\s*(?:[A-Z([{^]|e\s*[-−^⁻]))`;
  return {
    start: new RegExp(
      `^(?:(\\d*(?:\\.\\d+)?\\s*(?:${names}))|\\(((?:${one})(?:\\s*[-+−]\\s*(?:${one}))*)\\))\\s*${follows}`,
      'u',
    ),
    summand: new RegExp(`([-+−]?)\\s*(\\d+(?:\\.\\d+)?)?\\s*(${names})?(?:\\s*/\\s*(\\d+))?`, 'gu'),
  };
};

const USUAL_PATTERNS = patternsOf(UNKNOWN_SUBSCRIPTS);

const unknownPatterns = (unknowns: Unknowns): UnknownPatterns =>
  [...unknowns.keys()].every((name) => UNKNOWN_SUBSCRIPTS.includes(name))
    ? USUAL_PATTERNS
    : patternsOf([...new Set([...unknowns.keys(), ...UNKNOWN_SUBSCRIPTS])]);

/** The name of an unknown that has no value, or the value of the sum. */
const sumValue = (text: string, summand: RegExp, unknowns: Unknowns): Rational | string => {
  let total = ZERO;
  for (const [whole, sign, factor, name, divisor] of text.matchAll(summand)) {
    if (whole.trim() === '') continue;
    const times = name === undefined ? ONE : unknowns.get(name);
    if (times === undefined) return name ?? '';
    const size = factor === undefined ? ONE : rationalFromText(factor);
    const value = size.mul(times).div(divisor === undefined ? ONE : rational(BigInt(divisor)));
    total = sign === '-' || sign === '−' ? total.sub(value) : total.add(value);
  }
  return total;
};

const checked = (term: string, length: number, value: Rational | null): Result<Coefficient> => {
  const to = term.slice(0, length).trimEnd().length;
  if (value !== null && signOf(value) > 0n) return success({ value, length });
  const message =
    value === null
      ? 'a fraction has no 0 below its line'
      : signOf(value) === 0n
        ? 'a coefficient of 0 means that nothing is there'
        : 'a coefficient is positive';
  return failure(
    faultAt(term, 'bad-count', { from: 0, to }, message, 'leave the term out, or put it on the other side'),
  );
};

/**
 * The coefficient at the start of `term`; 1 with length 0 where none is written. Faults: `bad-count` for zero, negative
 * and unset ones, `too-long` for too many digits; spans within `term`.
 */
export const coefficientOf = (term: string, unknowns: Unknowns): Result<Coefficient> => {
  const numeric = NUMERIC.exec(term);
  const { start, summand } = unknownPatterns(unknowns);
  const symbolic = start.exec(term);
  if (symbolic !== null && symbolic[0].length >= (numeric?.[0].length ?? 0)) {
    const value = sumValue(symbolic[1] ?? symbolic[2] ?? '', summand, unknowns);
    if (typeof value !== 'string') return checked(term, symbolic[0].length, value);
    const place = { from: 0, to: symbolic[0].trimEnd().length };
    return failure(
      faultAt(
        term,
        'bad-count',
        place,
        `the coefficient ${value} has no value`,
        `give it in where, as {"${value}": "0.4"}`,
      ),
    );
  }
  if (numeric === null) return success({ value: ONE, length: 0 });
  if (numeric[0].replaceAll(/\D/gu, '').length > LIMITS.digits)
    return failure(
      faultAt(
        term,
        'too-long',
        { from: 0, to: numeric[0].trimEnd().length },
        `a number has at most ${String(LIMITS.digits)} digits`,
      ),
    );
  return checked(term, numeric[0].length, numericValue(numeric));
};
