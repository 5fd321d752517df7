import type { Quantity } from './answered.ts';
import { printQuantity } from './print.ts';
import { type WallConditions, type WallRow, NORMAL_CONDITIONS } from './wall-table.ts';

/** How the table is written for other programs: Markdown, or comma-separated values (RFC 4180). */
export type WallFormat = 'markdown' | 'csv';

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
export const wallCell = (quantity: Quantity | null): string =>
  quantity === null ? '' : printQuantity({ ...quantity, unit: '' }).trim();

const cellsOf = (row: WallRow): readonly string[] => [
  row.reaction,
  row.species,
  row.electronsPerMole,
  wallCell(row.electronsPerKilogram),
  wallCell(row.massPerCharge),
  wallCell(row.chargePerMass),
  wallCell(row.gasPerCharge),
];

const markdown = (lines: readonly (readonly string[])[]): string => {
  const row = (line: readonly string[]): string => `| ${line.map((text) => text.replaceAll('|', '\\|')).join(' | ')} |`;
  const [head = [], ...body] = lines;
  return [row(head), row(head.map((_, column) => (column < 2 ? '---' : '---:'))), ...body.map(row)].join('\n');
};

const quoted = (text: string): string => (/[",\n]/u.test(text) ? `"${text.replaceAll('"', '""')}"` : text);

const csv = (lines: readonly (readonly string[])[]): string =>
  lines.map((line) => line.map(quoted).join(',')).join('\r\n');

/** The wall table, every number rounded by its uncertainty; ends with a line break. */
export const wallText = (
  rows: readonly WallRow[],
  format: WallFormat,
  conditions: WallConditions = NORMAL_CONDITIONS,
): string => {
  const lines = [headings(conditions), ...rows.map(cellsOf)];
  const write = { markdown, csv }[format];
  return `${write(lines)}${format === 'csv' ? '\r\n' : '\n'}`;
};
