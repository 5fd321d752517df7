import { BrokenCsv, CsvReader, type CsvRecord } from './csv.ts';

/** One equation of a file: its line from 1, its label or "", its text. */
export interface ListedEquation {
  readonly line: number;
  readonly label: string;
  readonly text: string;
}

/** Thrown where a file cannot be read as a list of equations at all. */
export class BrokenList extends Error {}

/** "tank 3: Zn -> Zn^2+ + 2 e^-  # by hand": label, equation, comment. A comment begins at the line's start or after a blank. */
const lineOf = (line: number, typed: string): ListedEquation | null => {
  const text = typed.replace(/(^|\s)#.*$/s, '').trim();
  if (text === '') return null;
  const [, label = '', equation = text] = /^([^:]*\S)\s*:\s+(\S.*)$/s.exec(text) ?? [];
  return { line, label, text: equation };
};

/** The equations of a text, one a line; blank lines and comments are passed over. */
export const equationsOfText = async function* (pieces: AsyncIterable<string>): AsyncGenerator<ListedEquation> {
  let rest = '';
  let number = 0;
  for await (const piece of pieces) {
    const lines = (rest + piece).split('\n');
    rest = lines.pop() ?? '';
    for (const line of lines) {
      number += 1;
      const equation = lineOf(number, line);
      if (equation !== null) yield equation;
    }
  }
  const last = lineOf(number + 1, rest);
  if (last !== null) yield last;
};

/** How the columns of a CSV file are used. */
interface Columns {
  readonly equation: number;
  readonly label: number;
}

const columnsOf = ({ fields }: CsvRecord, column: string): Columns => {
  const find = (name: string): number => fields.findIndex((field) => field.trim().toLowerCase() === name.toLowerCase());
  const equation = find(column);
  if (equation === -1) throw new BrokenList(`There is no column ${column}. The columns are ${fields.join(', ')}.`);
  return { equation, label: find('label') };
};

const recordsOf = async function* (pieces: AsyncIterable<string>): AsyncGenerator<CsvRecord> {
  const reader = new CsvReader();
  try {
    for await (const piece of pieces) yield* reader.take(piece);
    yield* reader.rest();
  } catch (problem) {
    if (problem instanceof BrokenCsv) throw new BrokenList(`This is no CSV: ${problem.message}.`);
    throw problem;
  }
};

/** The equations in the named column of a CSV file with a header; a column `label` gives the labels. */
export const equationsOfCsv = async function* (
  pieces: AsyncIterable<string>,
  column: string,
): AsyncGenerator<ListedEquation> {
  let columns: Columns | null = null;
  for await (const record of recordsOf(pieces)) {
    if (columns === null) {
      columns = columnsOf(record, column);
      continue;
    }
    const text = record.fields[columns.equation] ?? '';
    if (text.trim() !== '') yield { line: record.line, label: record.fields[columns.label] ?? '', text: text.trim() };
  }
};
