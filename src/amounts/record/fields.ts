/** What parts the columns of a record; a space stands for any run of blanks. */
export type Delimiter = '\t' | ';' | ',' | ' ';

/** A word, a quoted text, or a date with its time; with blanks for columns "2026-03-01 10:00:00" is one field. */
const BLANK_FIELD = /"(?:[^"]|"")*"|\d{4}-\d\d-\d\d[ T]\d\d?:\d\d\S*|\d\d?\.\d\d?\.\d{4} \d\d?:\d\d\S*|\S+/g;

/** A column's name and its unit: t (min), I / A, Current [mA]. */
const BLANK_NAME = /"(?:[^"]|"")*"|[^\s[(]+\s*(?:\[[^\]]*\]|\([^)]*\))|\S+\s+\/\s+\S+|\S+/g;

/** Numbers with decimal commas between blanks: 0,5 12,25. */
const COMMA_NUMBERS = /^\s*[+-]?\d+(?:,\d+)?(?:\s+[+-]?\d+(?:,\d+)?)+\s*$/;

/** The delimiter of a line: the first of tab, semicolon and comma outside quotes and brackets, else blanks. */
export const delimiterOf = (line: string): Delimiter => {
  if (COMMA_NUMBERS.test(line) && !line.includes('\t')) return ' ';
  const bare = line.replaceAll(/"[^"]*"|\[[^\]]*\]|\([^)]*\)/g, '');
  const marks = ['\t', ';', ','] as const;
  return marks.find((mark) => bare.includes(mark)) ?? ' ';
};

const unquoted = (field: string): string => {
  const text = field.trim();
  return text.length > 1 && text.startsWith('"') && text.endsWith('"')
    ? text.slice(1, -1).replaceAll('""', '"').trim()
    : text;
};

/** Cuts outside quotes:  "1,5",2
 *                             ^   */
const quotedFields = (line: string, delimiter: Delimiter): readonly string[] | null => {
  const fields: string[] = [];
  let from = 0;
  let quoted = false;
  for (let at = 0; at < line.length; at += 1) {
    const letter = line[at];
    if (letter === '"') quoted = !quoted;
    else if (letter === delimiter && !quoted) {
      fields.push(unquoted(line.slice(from, at)));
      from = at + 1;
    }
  }
  return quoted ? null : [...fields, unquoted(line.slice(from))];
};

const matches = (line: string, pattern: RegExp): readonly string[] | null =>
  (line.split('"').length - 1) % 2 === 1 ? null : [...line.matchAll(pattern)].map(([field]) => unquoted(field));

/** The fields of a line; null where a quotation mark is never closed. */
export const fieldsOf = (line: string, delimiter: Delimiter): readonly string[] | null => {
  if (delimiter === ' ') return /[":]/.test(line) ? matches(line, BLANK_FIELD) : line.trim().split(/\s+/);
  return line.includes('"') ? quotedFields(line, delimiter) : line.split(delimiter);
};

/** The names in a header: as fields, but that blanks before a unit do not part it from its name. */
export const namesOf = (line: string, delimiter: Delimiter): readonly string[] | null =>
  delimiter === ' ' ? matches(line, BLANK_NAME) : (fieldsOf(line, delimiter)?.map((name) => name.trim()) ?? null);
