import { displayWidth } from '../report/excerpt.ts';

/** How a column stands. */
export type Alignment = 'left' | 'right';

/** A cell: what is measured, and how it is painted once it has been padded. */
export interface Cell {
  readonly text: string;
  readonly paint?: (text: string) => string;
}

const cellOf = (cell: Cell | string): Cell => (typeof cell === 'string' ? { text: cell } : cell);

const padded = ({ text, paint }: Cell, width: number, alignment: Alignment): string => {
  const room = ' '.repeat(Math.max(0, width - displayWidth(text)));
  const shown = paint === undefined ? text : paint(text);
  return alignment === 'left' ? shown + room : room + shown;
};

/** Rows of cells as lines whose columns stand under one another, two spaces apart, without blanks at the end. */
export const columns = (
  rows: readonly (readonly (Cell | string)[])[],
  alignments: readonly Alignment[],
): readonly string[] => {
  const cells = rows.map((row) => row.map(cellOf));
  const widths: number[] = [];
  for (const row of cells) {
    row.forEach(({ text }, at) => {
      widths[at] = Math.max(widths[at] ?? 0, displayWidth(text));
    });
  }
  return cells.map((row) =>
    row
      .map((cell, at) => padded(cell, widths[at] ?? 0, alignments[at] ?? 'left'))
      .join('  ')
      .trimEnd(),
  );
};

/** Lines moved right by two spaces for each level. */
export const indented = (lines: readonly string[], levels = 1): readonly string[] =>
  lines.map((line) => (line === '' ? '' : '  '.repeat(levels) + line));
