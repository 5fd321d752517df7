import type { Fault } from './fault.ts';
import type { Span } from './span.ts';

/** Code points that take two columns: East Asian wide and fullwidth, and emoji (Unicode UAX #11, main blocks). */
const WIDE =
  /[\u1100-\u115f\u2e80-\u303e\u3041-\u33ff\u3400-\u4dbf\u4e00-\u9fff\ua000-\ua4cf\uac00-\ud7a3\uf900-\ufaff\ufe30-\ufe6f\uff00-\uff60\uffe0-\uffe6\u{1f300}-\u{1faff}\u{20000}-\u{3fffd}]/u;
const WIDTHLESS = /[\p{Mn}\p{Me}\u200d]/u;
/** What would move the cursor or hide: controls, format characters, line and paragraph separators, lone surrogates. */
const UNSEEN = /[\p{Cc}\p{Cf}\p{Zl}\p{Zp}\p{Cs}]/u;

const shown = (point: string): string => {
  if (point === '\t') return ' ';
  return UNSEEN.test(point) ? '\u25a1' : point;
};

const width = (point: string): number => {
  if (UNSEEN.test(point)) return 1;
  if (WIDTHLESS.test(point)) return 0;
  return WIDE.test(point) ? 2 : 1;
};

/** Columns that `text` takes in a terminal. */
export const displayWidth = (text: string): number => Array.from(text).reduce((sum, point) => sum + width(point), 0);

/** `text` with everything replaced that could move a terminal's cursor or colour it. */
export const printable = (text: string): string => Array.from(text).map(shown).join('');

interface Line {
  readonly points: readonly string[];
  /** 1 for the first. */
  readonly number: number;
  /** Code points of the whole text before this line. */
  readonly start: number;
}

/** The line in which code point `at` stands; an end right behind the last line feed stands in the last line. */
const lineAt = (text: string, at: number): Line => {
  let start = 0;
  let number = 1;
  for (const line of text.split('\n')) {
    const points = Array.from(line);
    if (at <= start + points.length) return { points, number, start };
    start += points.length + 1;
    number += 1;
  }
  return { points: [], number, start };
};

const REACH = 36;

/** A long line is shown around the span only:   …left REACH | span | right REACH… */
const windowOf = (length: number, span: Span): Span => ({
  from: span.from <= REACH + 1 ? 0 : span.from - REACH,
  to: Math.min(length, Math.min(span.to, span.from + 2 * REACH) + REACH),
});

const textAndCarets = (line: Line, span: Span): readonly [string, string] => {
  const inLine = { from: span.from - line.start, to: Math.max(span.to, span.from + 1) - line.start };
  const seen = windowOf(line.points.length, inLine);
  const before = line.points.slice(seen.from, inLine.from);
  const under = line.points.slice(inLine.from, Math.min(inLine.to, seen.to));
  const head = seen.from > 0 ? '…' : '';
  const tail = seen.to < line.points.length ? '…' : '';
  const text = head + line.points.slice(seen.from, seen.to).map(shown).join('') + tail;
  const indent = ' '.repeat(displayWidth(head + before.join('')));
  return [text, indent + '^'.repeat(Math.max(1, displayWidth(under.join(''))))];
};

/**
 * A fault with the text it stands in, for a person's eyes:
 *
 *     skeleton:1:9
 *       Fe^2+ + Xx -> Fe^3+
 *               ^^ There is no element Xx.
 *       Did you mean Xe?
 *
 * `text` is the part of the ask that the fault's field names, null where there is none. Nothing in it can move
 * the cursor: controls are shown as boxes.
 */
export const excerpt = (fault: Fault, text: string | null): string => {
  const field = fault.field ?? 'ask';
  const hint = fault.hint === undefined ? [] : [`  ${printable(fault.hint)}`];
  const message = printable(fault.message);
  if (text === null || fault.span === undefined) return [printable(field), `  ${message}`, ...hint].join('\n');
  const line = lineAt(text, fault.span.from);
  const column = fault.span.from - line.start + 1;
  const [seen, carets] = textAndCarets(line, fault.span);
  const place = `${printable(field)}:${String(line.number)}:${String(column)}`;
  return [place, `  ${seen}`, `  ${carets} ${message}`, ...hint].join('\n');
};
