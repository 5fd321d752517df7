/** A stretch of a text: code points counted from 0, `to` exclusive. An empty text has {0, 0}. */
export interface Span {
  readonly from: number;
  readonly to: number;
}

/** The number of code points before UTF-16 offset `offset` of `text`. */
export const codePointsBefore = (text: string, offset: number): number => {
  let count = 0;
  for (let at = 0; at < offset && at < text.length; count += 1) {
    const point = text.codePointAt(at) ?? 0;
    at += point > 0xffff ? 2 : 1;
  }
  return count;
};

/** The span in code points of the UTF-16 offsets `from` (inclusive) to `to` (exclusive) of `text`. */
export const spanOf = (text: string, from: number, to: number): Span => ({
  from: codePointsBefore(text, from),
  to: codePointsBefore(text, to),
});

/** The span of the whole text. */
export const wholeSpan = (text: string): Span => spanOf(text, 0, text.length);

/** `span` moved right by `by` code points: a part's span seen from the whole text. */
export const shiftSpan = (span: Span, by: number): Span => ({
  from: span.from + by,
  to: span.to + by,
});
