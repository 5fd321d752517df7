import type { Token } from 'moo';
import type { Fault } from '../report/fault.ts';
import { bracketFault } from './diagnose-brackets.ts';
import { characterFault } from './diagnose-characters.ts';
import { chargeFault } from './diagnose-charge.ts';
import { countFault } from './diagnose-count.ts';
import { letterFault } from './diagnose-letters.ts';
import { leftover } from './diagnose-leftover.ts';

/**
 * Why `tokens` of `text` are no species. `stop` is the index of the first token that no reading can take; it equals
 * the number of tokens where the text ends too soon. The plainest cause is named first: a character that is no
 * chemistry, brackets, letters that are no element, counts, charges.
 */
export const diagnose = (text: string, tokens: readonly Token[], stop: number): Fault =>
  characterFault(text, tokens) ??
  bracketFault(text, tokens) ??
  letterFault(text, tokens) ??
  countFault(text, tokens) ??
  chargeFault(text, tokens) ??
  leftover(text, tokens, stop);
