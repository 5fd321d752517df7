import type { Token } from 'moo';
import type { Fault } from '../report/fault.ts';
import { faultAt, placeOf } from './place.ts';

const PARTNER: ReadonlyMap<string, string> = new Map([
  ['(', ')'],
  ['[', ']'],
  ['{', '}'],
]);
const CLOSING: ReadonlySet<string> = new Set(PARTNER.values());

const strayClosing = (text: string, token: Token, open: Token | undefined): Fault => {
  const expected = open === undefined ? undefined : PARTNER.get(open.text);
  return expected === undefined
    ? faultAt(
        text,
        'bracket',
        placeOf(token),
        `${token.text} closes a bracket that was never opened`,
        'open it or leave it out',
      )
    : faultAt(
        text,
        'bracket',
        placeOf(token),
        `${token.text} stands where ${expected} was expected`,
        `write ${expected}`,
      );
};

/** The first bracket without a partner, or an empty pair; null where all brackets are in order. */
export const bracketFault = (text: string, tokens: readonly Token[]): Fault | null => {
  const open: Token[] = [];
  for (const [index, token] of tokens.entries()) {
    const before = tokens[index - 1];
    if (PARTNER.has(token.text)) open.push(token);
    if (!CLOSING.has(token.text)) continue;
    const partner = open.pop();
    if (partner === undefined || PARTNER.get(partner.text) !== token.text) return strayClosing(text, token, partner);
    if (before === partner)
      return faultAt(
        text,
        'bracket',
        placeOf(partner, token),
        'nothing stands in these brackets',
        'fill them or leave them out',
      );
  }
  const unclosed = open.at(-1);
  if (unclosed === undefined) return null;
  const expected = PARTNER.get(unclosed.text) ?? '';
  return faultAt(text, 'bracket', placeOf(unclosed), `${unclosed.text} is never closed`, `add ${expected}`);
};
