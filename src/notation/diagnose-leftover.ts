import type { Token } from 'moo';
import type { Fault, PlainFaultCode } from '../report/fault.ts';
import { faultAt, isType, placeOf } from './place.ts';

/** What a token that fits nowhere is called, its code, and what was expected. */
const LEFTOVERS: ReadonlyMap<string, readonly [PlainFaultCode, string, string]> = new Map([
  [
    'space',
    ['unknown-character', 'a space stands inside the formula', 'leave it out, or put a plus between two species'],
  ],
  ['state', ['bracket', 'the state comes last', 'put the state after formula and charge']],
  ['arrowMark', ['unknown-character', 'an arrow for gas or precipitate comes last', 'write a state: (g) or (s)']],
  ['adduct', ['bad-count', 'a formula was expected on both sides of the dot', 'write adducts as CuSO4*5H2O']],
  ['dot', ['bad-count', 'a formula was expected on both sides of the dot', 'write adducts as CuSO4*5H2O']],
  ['period', ['bad-count', 'a formula or digits were expected after the period', 'write adducts as CuSO4*5H2O']],
  ['slash', ['bad-count', 'a fraction stands in brackets', 'write (1/2)']],
  [
    'unknown',
    [
      'bad-count',
      'an unknown subscript stands where none can be',
      'write it after an atom or in brackets: Li(1-x)CoO2',
    ],
  ],
  ['electron', ['bad-charge', 'e stands for the electron, alone and with its charge', 'write e^-']],
]);

/** The fault of the token at `stop`, or of the last one where the text ends too soon. */
export const leftover = (text: string, tokens: readonly Token[], stop: number): Fault => {
  const at = Math.min(stop, tokens.length - 1);
  const token = (isType(tokens[at - 1], 'space') ? tokens[at - 1] : tokens[at]) ?? tokens[0];
  const place = token === undefined ? { from: 0, to: text.length } : placeOf(token);
  const [code, message, hint] = LEFTOVERS.get(token?.type ?? '') ?? [
    'bad-count',
    'this does not go on as a formula',
    'a formula is made of element symbols, counts and brackets, then a charge, then a state',
  ];
  return faultAt(text, code, place, message, hint);
};
