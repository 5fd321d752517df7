import { displayWidth } from '../report/excerpt.ts';
import { type Cell, columns, indented } from './columns.ts';
import type { Look } from './look.ts';

/** Columns of running text: with the indentation of a page it fits a terminal of 80. */
const MEASURE = 76;
const LABEL = 10;

/** Running text broken at spaces so that no line is wider than `measure`. */
export const wrapped = (text: string, measure = MEASURE): readonly string[] => {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(' ')) {
    const longer = line === '' ? word : `${line} ${word}`;
    if (line !== '' && displayWidth(longer) > measure) {
      lines.push(line);
      line = word;
    } else line = longer;
  }
  return [...lines, line];
};

/** Labels on the left, what they name on the right; every block of an answer shares the width of the labels. */
export const labelled = (rows: readonly (readonly [string, Cell | string])[], look: Look): readonly string[] =>
  columns(
    rows.map(([label, value]) => [{ text: label.padEnd(LABEL), paint: look.paint.faint }, value]),
    ['left', 'left'],
  );

/** A label with running text that hangs behind it; a label without its own paint is painted as the text is. */
export const hanging = (
  label: string,
  text: string,
  paint: (text: string) => string,
  labelPaint: (text: string) => string = paint,
): readonly string[] =>
  wrapped(text, MEASURE - LABEL - 2).map((line, at) => {
    const shown = at === 0 && label !== '' ? labelPaint(label) + ' '.repeat(LABEL - label.length) : ' '.repeat(LABEL);
    return `${shown}  ${paint(line)}`;
  });

/** Blocks with one blank line between them, each moved in by one level; empty blocks are left out. */
export const page = (blocks: readonly (readonly string[])[]): string => {
  const full = blocks.filter((block) => block.length > 0);
  return `${full.map((block) => indented(block).join('\n')).join('\n\n')}\n`;
};
