/** One record of a CSV file and the line on which it begins, from 1. */
export interface CsvRecord {
  readonly line: number;
  readonly fields: readonly string[];
}

/** Longest record that is kept, in characters: an open quotation mark would else swallow the whole file. */
export const LONGEST_RECORD = 100_000;

/** Thrown where a file is no CSV: a quotation mark that is never closed. */
export class BrokenCsv extends Error {}

/**
 * Reads CSV piece by piece (RFC 4180): fields in double quotes may hold the separator, line ends and doubled quotes.
 * The separator is the first of tab, semicolon and comma that stands in the header outside quotes.
 */
export class CsvReader {
  private separator: string | null = null;
  private text = '';
  private line = 1;

  /** The records that `piece` completes. */
  public *take(piece: string): Generator<CsvRecord> {
    this.text += piece;
    for (let end = this.recordEnd(); end !== -1; end = this.recordEnd()) {
      const record = this.text.slice(0, end).replace(/\r$/, '');
      this.text = this.text.slice(end + 1);
      yield* this.release(record);
    }
    if (this.text.length > LONGEST_RECORD)
      throw new BrokenCsv(`line ${String(this.line)}: a quotation mark is never closed`);
  }

  /** The last record, where the file does not end in a line end. */
  public *rest(): Generator<CsvRecord> {
    const record = this.text;
    this.text = '';
    if ((record.match(/"/g)?.length ?? 0) % 2 === 1) {
      throw new BrokenCsv(`line ${String(this.line)}: a quotation mark is never closed`);
    }
    yield* this.release(record.replace(/\r$/, ''));
  }

  /** The first line end outside quotes:  a,"b\n
   *                                       c",d\n
   *                                           ^  */
  private recordEnd(): number {
    let quoted = false;
    for (let at = 0; at < this.text.length; at += 1) {
      const letter = this.text[at];
      if (letter === '"') quoted = !quoted;
      else if (letter === '\n' && !quoted) return at;
    }
    return -1;
  }

  private *release(record: string): Generator<CsvRecord> {
    const line = this.line;
    this.line += record.split('\n').length;
    if (record.trim() === '') return;
    this.separator ??= separatorOf(record);
    yield { line, fields: fieldsOf(record, this.separator) };
  }
}

const separatorOf = (header: string): string => {
  const bare = header.replaceAll(/"[^"]*"/g, '');
  return ['\t', ';', ','].find((mark) => bare.includes(mark)) ?? ',';
};

const fieldsOf = (record: string, separator: string): readonly string[] => {
  const fields: string[] = [];
  let field = '';
  let quoted = false;
  for (const letter of record) {
    if (letter === '"') quoted = !quoted;
    if (letter === separator && !quoted) {
      fields.push(unquoted(field));
      field = '';
    } else field += letter;
  }
  return [...fields, unquoted(field)];
};

const unquoted = (field: string): string => {
  const inner = /^\s*"(.*)"\s*$/s.exec(field)?.[1];
  return inner === undefined ? field.trim() : inner.replaceAll('""', '"');
};
