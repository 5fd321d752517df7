import type { Token } from 'moo';
import type { Fault } from '../report/fault.ts';
import { faultAt, isType, placeOf } from './place.ts';

const HINT = 'write a charge as ^2+, ^- or ^3-';
const isSign = (token: Token | undefined): token is Token => isType(token, 'plus', 'minus', 'superPlus', 'superMinus');
const isDigit = (token: Token | undefined): token is Token =>
  isType(token, 'digit', 'zero', 'superDigit', 'superZero', 'period', 'slash', 'curlyOpen', 'roundOpen');

/** From the caret or sign at `at` over all digits, signs and brackets behind it. */
const chargeAt = (tokens: readonly Token[], at: number): readonly Token[] => {
  const end = tokens.findIndex(
    (token, index) => index > at && !isSign(token) && !isDigit(token) && !isType(token, 'roundClose', 'curlyClose'),
  );
  return tokens.slice(at, end < 0 ? tokens.length : end);
};

const zeroCharge = (text: string, tokens: readonly Token[]): Fault | null => {
  const at = tokens.findIndex(
    (token, index) =>
      token.type === 'superZero' ||
      (token.type === 'zero' &&
        !isType(tokens[index - 1], 'digit', 'period') &&
        !isType(tokens[index + 1], 'period') &&
        (isType(tokens[index - 1], 'caret', 'plus', 'minus', 'curlyOpen') || isSign(tokens[index + 1]))),
  );
  const zero = tokens[at];
  if (zero === undefined || isType(tokens[at - 1], 'superDigit')) return null;
  return faultAt(text, 'bad-charge', placeOf(zero), 'a charge of 0 is not written', 'leave the charge out');
};

const caretFault = (text: string, tokens: readonly Token[], caret: Token): Fault | null => {
  const written = chargeAt(tokens, tokens.indexOf(caret));
  const place = placeOf(caret, written.at(-1));
  if (written.length === 1) return faultAt(text, 'bad-charge', place, 'a charge was expected after ^', HINT);
  if (!written.some(isSign)) return faultAt(text, 'bad-charge', place, 'this charge has no sign', HINT);
  if (tokens[0] !== caret && /^\^\d*(?:\++|-+)$/u.test(text.slice(place.from, place.to))) return null;
  return faultAt(text, 'bad-charge', place, 'this is no charge', HINT);
};

/** The first charge that is none: a lone caret, a missing sign, zero, a sign before the formula; else null. */
export const chargeFault = (text: string, tokens: readonly Token[]): Fault | null => {
  const zero = zeroCharge(text, tokens);
  if (zero !== null) return zero;
  const electron = tokens[0];
  if (isType(electron, 'electron') && tokens.length === 1)
    return faultAt(text, 'bad-charge', placeOf(electron), 'the electron is written with its charge', 'write e^-');
  const caret = tokens.find(({ type }) => type === 'caret');
  if (caret !== undefined) return caretFault(text, tokens, caret);
  const sign = tokens.find(isSign);
  if (sign === undefined) return null;
  const written = chargeAt(tokens, tokens.indexOf(sign));
  const place = placeOf(sign, written.at(-1));
  return tokens[0] === sign || place.to === text.length
    ? faultAt(text, 'bad-charge', place, 'this is no charge', HINT)
    : faultAt(
        text,
        'bad-charge',
        place,
        'the formula goes on behind this charge',
        'a charge comes last, before the state',
      );
};
