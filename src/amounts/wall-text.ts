import type { Quantity } from './answered.ts';
import { printQuantity } from './print.ts';
import { type WallConditions, type WallRow, NORMAL_CONDITIONS } from './wall-table.ts';

/** How the table is written: aligned columns, Markdown, or comma-separated values (RFC 4180). */
export type WallFormat = 'text' | 'markdown' | 'csv';

const headings = ({ temperature, pressure }: WallConditions): readonly string[] => [
  'half-reaction',
  'species',
  'e^- per mol',
  'e^- in mol/kg',
  'g/(A h)',
  'A h/kg',
  `gas in mL/(A min) at ${temperature}, ${pressure}`,
];

/** The number alone, rounded by its uncertainty: the heading holds the unit. */
const cell = (quantity: Quantity | null): string =>
  quantity === null ? '' : printQuantity({ ...quantity, unit: '' }).trim();

const cellsOf = (row: WallRow): readonly string[] => [
  row.reaction,
  row.species,
  row.electronsPerMole,
  cell(row.electronsPerKilogram),
  cell(row.massPerCharge),
  cell(row.chargePerMass),
  cell(row.gasPerCharge),
];

const aligned = (lines: readonly (readonly string[])[]): string => {
  const widths = (lines[0] ?? []).map((_, column) => Math.max(...lines.map((line) => (line[column] ?? '').length)));
  return lines
    .map((line) =>
      line
        .map((text, column) => text.padEnd(widths[column] ?? 0))
        .join('  ')
        .trimEnd(),
    )
    .join('\n');
};

const markdown = (lines: readonly (readonly string[])[]): string => {
  const row = (line: readonly string[]): string => `| ${line.map((text) => text.replaceAll('|', '\\|')).join(' | ')} |`;
  const [head = [], ...body] = lines;
  return [row(head), row(head.map((_, column) => (column < 2 ? '---' : '---:'))), ...body.map(row)].join('\n');
};

const quoted = (text: string): string => (/[",\n]/u.test(text) ? `"${text.replaceAll('"', '""')}"` : text);

const csv = (lines: readonly (readonly string[])[]): string =>
  lines.map((line) => line.map(quoted).join(',')).join('\r\n');

/** The wall table as text, every number rounded by its uncertainty; ends with a line break. */
export const wallText = (
  rows: readonly WallRow[],
  format: WallFormat,
  conditions: WallConditions = NORMAL_CONDITIONS,
): string => {
  const lines = [headings(conditions), ...rows.map(cellsOf)];
  const write = { text: aligned, markdown, csv }[format];
  return `${write(lines)}${format === 'csv' ? '\r\n' : '\n'}`;
};
