import { readFileSync } from 'node:fs';

/** The rows of a tab-separated fixture as records; lines that start with # are its source and notes. */
export const readTable = (name: string): readonly Readonly<Record<string, string>>[] => {
  const text = readFileSync(new URL(`../../fixtures/${name}`, import.meta.url), 'utf8');
  const [head = '', ...rows] = text.split('\n').filter((line) => line.trim() !== '' && !line.startsWith('#'));
  const names = head.split('\t');
  return rows.map((row) => {
    const cells = row.split('\t');
    if (cells.length !== names.length) throw new Error(`${name}: ${String(cells.length)} cells in "${row}"`);
    return Object.fromEntries(names.map((column, index) => [column, cells[index] ?? '']));
  });
};
