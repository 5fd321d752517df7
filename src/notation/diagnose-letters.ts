import type { Token } from 'moo';
import { nearestElements } from '../elements/table.ts';
import type { Fault } from '../report/fault.ts';
import { didYouMean } from '../report/suggest.ts';
import { faultAt, isType, placeOf } from './place.ts';

const isLower = (token: Token | undefined): token is Token => token !== undefined && /^\p{Ll}+$/u.test(token.text);
const touches = (left: Token, right: Token): boolean => left.offset + left.text.length === right.offset;

/** The symbol-like run around `at`: small letters go on to both sides, and to the capital in front of them. */
const runAround = (tokens: readonly Token[], at: number): readonly [Token, Token] | null => {
  const middle = tokens[at];
  if (middle === undefined) return null;
  let first = middle;
  for (let index = at - 1; isLower(first); index -= 1) {
    const before = tokens[index];
    if (!isType(before, 'element', 'letters', 'unknown', 'electron') || !touches(before, first)) break;
    first = before;
  }
  let last = middle;
  for (let index = at + 1; isLower(tokens[index]); index += 1) last = tokens[index] ?? last;
  return [first, last];
};

const strange = (tokens: readonly Token[]): number =>
  tokens.findIndex(
    (token, at) =>
      token.type === 'letters' ||
      (isType(token, 'unknown', 'electron') && isType(tokens[at + 1], 'unknown', 'electron')),
  );

/** `(graphite)`, `(solid)`: a word in round brackets behind a formula is meant as a state. */
const isState = (tokens: readonly Token[], [first, last]: readonly [Token, Token]): boolean =>
  tokens[tokens.indexOf(first) - 1]?.type === 'roundOpen' &&
  ['roundClose', 'stray'].includes(tokens[tokens.indexOf(last) + 1]?.type ?? '') &&
  isLower(first);

const STATE_HINT = 'states are (s), (l), (g), (aq), (cr), (am); a remark goes behind one, as in (s, graphite)';

/** The first letters that are no element, with the elements they may stand for; null where there are none. */
export const letterFault = (text: string, tokens: readonly Token[]): Fault | null => {
  const run = runAround(tokens, strange(tokens));
  if (run === null) return null;
  const place = placeOf(...run);
  const letters = text.slice(place.from, place.to);
  if (isState(tokens, run))
    return faultAt(text, 'unknown-element', place, `no state is written (${letters})`, STATE_HINT);
  const hint = didYouMean(nearestElements(letters)) ?? 'symbols have one capital letter and at most one small one';
  return faultAt(text, 'unknown-element', place, `no element has the symbol ${letters}`, hint);
};
