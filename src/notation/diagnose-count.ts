import type { Token } from 'moo';
import type { Fault } from '../report/fault.ts';
import { faultAt, isType, placeOf } from './place.ts';

const DIGITS: readonly string[] = ['digit', 'zero', 'onePoint', 'subDigit', 'subZero'];
const isDigit = (token: Token | undefined): token is Token => isType(token, ...DIGITS);
const inNumber = (token: Token | undefined): token is Token => isDigit(token) || isType(token, 'period');

/** From the digit at `at` to the end of its number. */
const numberAt = (tokens: readonly Token[], at: number): readonly Token[] => {
  const end = tokens.findIndex((token, index) => index > at && !inNumber(token));
  return tokens.slice(at, end < 0 ? tokens.length : end);
};

const zeroFault = (text: string, number: readonly Token[], first: Token, before: Token | undefined): Fault | null => {
  const next = number[1];
  if (!isType(first, 'zero', 'subZero') || (isType(next, 'period') && isDigit(number[2]))) return null;
  if (isType(before, 'caret', 'plus', 'minus', 'curlyOpen')) return null;
  const place = placeOf(first, number.at(-1));
  return number.length === 1
    ? faultAt(text, 'bad-count', place, 'a count of 0 means that nothing is there', 'leave the atom out')
    : faultAt(text, 'bad-count', place, 'a count does not begin with 0', 'leave the zeros in front out');
};

/** The first count that is zero, begins with 0, ends in its period or has nothing to count; null where there is none. */
export const countFault = (text: string, tokens: readonly Token[]): Fault | null => {
  for (const [at, token] of tokens.entries()) {
    const before = tokens[at - 1];
    if (!isDigit(token) || inNumber(before)) continue;
    const number = numberAt(tokens, at);
    const after = tokens[at + number.length];
    const last = number.at(-1) ?? token;
    if (at === 0)
      return faultAt(
        text,
        'bad-count',
        placeOf(token, last),
        'a number stands before the formula',
        'a species has no coefficient; a part that counts more than once goes in brackets: (CdSO4)3*8H2O',
      );
    if (isType(after, 'plus', 'minus')) continue;
    const zero = zeroFault(text, number, token, before);
    if (zero !== null) return zero;
    if (isType(last, 'period') && at + number.length >= tokens.length)
      return faultAt(
        text,
        'bad-count',
        placeOf(last),
        'nothing stands after the period',
        'write digits or a formula after it',
      );
  }
  return null;
};
