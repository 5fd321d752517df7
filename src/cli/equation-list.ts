import { arrowsIn } from '../notation/arrows.ts';
import { BrokenCsv, CsvReader, type CsvRecord, LONGEST_RECORD } from './csv.ts';
import { UnreadableFile } from './world.ts';

/** One equation of a file: its line from 1, its label or "", its text. */
export interface ListedEquation {
  readonly line: number;
  readonly label: string;
  readonly text: string;
}

/** "1. ", "2) ", "- ": the number or dash of a list, which no formula begins with. */
const LIST_MARK = /^(?:\d+[.)]|[-*•])\s+/;

/** "tank 3: Zn -> Zn^2+ + 2 e^-  # by hand": label, equation, comment. A comment begins at the line's start or after a blank. */
const lineOf = (line: number, typed: string): ListedEquation | null => {
  const text = typed
    .replace(/(^|\s)#.*$/s, '')
    .trim()
    .replace(LIST_MARK, '');
  if (text === '') return null;
  const [, label = '', equation = text] = /^([^:]*\S)\s*:\s+(\S.*)$/s.exec(text) ?? [];
  return { line, label, text: equation.replace(LIST_MARK, '') };
};

/** The same text with a line feed for every line end; a return that ends a piece waits for what follows it. */
const withLineFeeds = async function* (pieces: AsyncIterable<string>): AsyncGenerator<string> {
  let returned = '';
  for await (const piece of pieces) {
    const text = returned + piece;
    returned = text.endsWith('\r') ? '\r' : '';
    yield text.slice(0, text.length - returned.length).replaceAll(/\r\n?/g, '\n');
  }
  if (returned !== '') yield '\n';
};

/** The equations of a text, one a line; blank lines and comments are passed over. Throws `UnreadableFile`. */
export const equationsOfText = async function* (pieces: AsyncIterable<string>): AsyncGenerator<ListedEquation> {
  let rest = '';
  let number = 0;
  for await (const piece of withLineFeeds(pieces)) {
    const lines = (rest + piece).split('\n');
    rest = lines.pop() ?? '';
    if (rest.length > LONGEST_RECORD)
      throw new UnreadableFile(`Line ${String(number + lines.length + 1)} is too long.`);
    for (const line of lines) {
      number += 1;
      const equation = lineOf(number, line);
      if (equation !== null) yield equation;
    }
  }
  const last = lineOf(number + 1, rest);
  if (last !== null) yield last;
};

const COLUMN_MARK = /[\t;,]/;

/**
 * The columns that the first line names where the file looks like CSV: the first line has no arrow, the second has one,
 * and both are parted alike; else null.
 */
export const columnsNamed = (first: ListedEquation, second: ListedEquation): readonly string[] | null => {
  const parts = ({ label, text }: ListedEquation): readonly string[] => `${label} ${text}`.split(COLUMN_MARK);
  const [head, row] = [parts(first), parts(second)];
  if (head.length < 2 || row.length < head.length) return null;
  if (arrowsIn(first.text).length > 0 || arrowsIn(second.text).length === 0) return null;
  return head.map((name) => name.replaceAll('"', '').trim());
};

/** How the columns of a CSV file are used. */
interface Columns {
  readonly equation: number;
  readonly label: number;
}

const columnsOf = ({ fields }: CsvRecord, column: string): Columns => {
  const find = (name: string): number => fields.findIndex((field) => field.trim().toLowerCase() === name.toLowerCase());
  const equation = find(column);
  if (equation === -1) throw new UnreadableFile(`There is no column ${column}. The columns are ${fields.join(', ')}.`);
  return { equation, label: find('label') };
};

const recordsOf = async function* (pieces: AsyncIterable<string>): AsyncGenerator<CsvRecord> {
  const reader = new CsvReader();
  try {
    for await (const piece of withLineFeeds(pieces)) yield* reader.take(piece);
    yield* reader.rest();
  } catch (problem) {
    if (problem instanceof BrokenCsv) throw new UnreadableFile(`This is no CSV: ${problem.message}.`);
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
