import type { Token } from 'moo';
import type { Fault } from '../report/fault.ts';
import { describeCharacter } from './characters.ts';
import { faultAt, placeOf } from './place.ts';

/** The first character that has no meaning in a formula, by its name; null where there is none. */
export const characterFault = (text: string, tokens: readonly Token[]): Fault | null => {
  const stray = tokens.find(({ type }) => type === 'stray');
  if (stray === undefined) return null;
  const { name, hint } = describeCharacter(stray.text);
  return faultAt(text, 'unknown-character', placeOf(stray), `${name} has no meaning in a formula`, hint);
};
