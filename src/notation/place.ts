import type { Token } from 'moo';
import type { Fault, PlainFaultCode } from '../report/fault.ts';
import { spanOf } from '../report/span.ts';

/** A fault of reading at the UTF-16 offsets `from` to `to` of `text`. */
export const faultAt = (
  text: string,
  code: PlainFaultCode,
  place: { readonly from: number; readonly to: number },
  message: string,
  hint?: string,
): Fault => ({ code, message, span: spanOf(text, place.from, place.to), ...(hint === undefined ? {} : { hint }) });

/** The UTF-16 offsets from the start of `first` to the end of `last`. */
export const placeOf = (first: Token, last: Token = first): { readonly from: number; readonly to: number } => ({
  from: first.offset,
  to: last.offset + last.text.length,
});

/** True where the token is of one of these types. */
export const isType = (token: Token | undefined, ...types: readonly string[]): token is Token =>
  token?.type !== undefined && types.includes(token.type);
