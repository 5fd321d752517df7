import type { Span } from '../report/span.ts';
import type { Place } from './arrows.ts';

/** Turns UTF-16 offsets of one text into spans in code points. */
export type SpanOfPlace = (place: Place) => Span;

/** `SpanOfPlace` of a text, counted once: a long equation asks for the span of each of its terms. */
export const spansIn = (text: string): SpanOfPlace => {
  if (!/[\ud800-\udbff]/.test(text)) return ({ from, to }) => ({ from, to });
  const before: number[] = [];
  let count = 0;
  for (const char of text) {
    for (let unit = 0; unit < char.length; unit += 1) before.push(count);
    count += 1;
  }
  return ({ from, to }) => ({ from: before[from] ?? count, to: before[to] ?? count });
};
