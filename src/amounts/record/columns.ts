import type { Fault } from '../../report/fault.ts';
import { didYouMean, nearest } from '../../report/suggest.ts';
import { QUANTITIES } from '../quantities.ts';
import { type ColumnKind, PARTINGS, candidateOf, factorOf } from './names.ts';
import type { RecordOptions } from './options.ts';

/** A column of a record. `factor`: to s or A; null where no unit is known, as beside clock times. */
export interface RecordColumn {
  readonly index: number;
  readonly name: string;
  readonly unit: string;
  readonly factor: number | null;
}

/** Where time and current stand. */
export interface RecordColumns {
  readonly time: RecordColumn;
  readonly current: RecordColumn;
  /** A column of dates beside clock times. */
  readonly date: number | null;
  /** How many columns a row has; null where no header says. */
  readonly count: number | null;
}

/** A column that was sought: found, not there, or a fault. */
type Sought = RecordColumn | 'missing' | Fault;

const listed = (names: readonly string[]): string => names.filter((name) => name !== '').join(', ');

const ambiguous = (kind: ColumnKind, names: readonly string[]): Fault => ({
  code: 'bad-ask',
  message: `more than one column may be the ${kind}: ${listed(names)}`,
  field: kind,
  hint: `Say which: --${kind} "${names[0] ?? ''}".`,
});

/** The column that the header itself shows. */
const shownColumn = (names: readonly string[], kind: ColumnKind): Sought => {
  const found = names.flatMap((name, index) => {
    const candidate = candidateOf(name, kind);
    return candidate === undefined ? [] : [{ index, name, ...candidate }];
  });
  const best = Math.min(...found.map(({ rank }) => rank));
  const [column, other] = found.filter(({ rank }) => rank === best);
  if (column === undefined) return 'missing';
  if (other !== undefined)
    return ambiguous(
      kind,
      found.filter(({ rank }) => rank === best).map(({ name }) => name),
    );
  return { index: column.index, name: column.name, unit: column.unit, factor: column.factor };
};

const bare = (name: string): string => name.replace(/\s*[[(][^\])]*[\])]$/, '').toLowerCase();

/** The column that was asked for by name, by its name without unit, or by number. */
const askedColumn = (names: readonly string[], kind: ColumnKind, asked: string): Sought => {
  const lower = asked.trim().toLowerCase();
  const exact = names.findIndex((name) => name.toLowerCase() === lower);
  const loose = exact >= 0 ? exact : names.findIndex((name) => bare(name) === lower);
  const index = loose >= 0 || !/^[1-9]\d*$/.test(lower) ? loose : Number(lower) - 1;
  const name = names[index];
  if (name === undefined) return 'missing';
  const parted = PARTINGS.map((parting) => parting.exec(name)?.[2] ?? '').find(
    (unit) => unit !== '' && factorOf(unit, kind) !== undefined,
  );
  const unit = parted ?? '';
  return { index, name, unit, factor: unit === '' ? null : (factorOf(unit, kind) ?? null) };
};

/** What to say of a header that lacks one of the two columns. */
const lacking = (names: readonly string[], kind: ColumnKind, asked: string | undefined): Fault => {
  const hint = asked === undefined ? `Say which column it is: --${kind} NAME.` : didYouMean(nearest(asked, names));
  return {
    code: 'bad-ask',
    message: `the record has no column ${asked ?? `of ${kind}`}; it has ${listed(names)}`,
    field: kind,
    ...(hint === undefined ? {} : { hint }),
  };
};

/** The unit that was given stands above the one in the header. */
const inUnit = (column: Sought, kind: ColumnKind, unit: string | undefined): Sought => {
  if (unit === undefined || column === 'missing' || 'code' in column) return column;
  const factor = factorOf(unit, kind);
  if (factor !== undefined) return { ...column, unit, factor };
  return {
    code: 'unknown-unit',
    message: `${unit} is no unit of ${kind}`,
    field: `${kind}Unit`,
    hint: `Give it in ${QUANTITIES[kind].example}.`,
  };
};

const soughtColumn = (names: readonly string[], kind: ColumnKind, options: RecordOptions): Sought => {
  const asked = options[kind];
  const found = asked === undefined ? shownColumn(names, kind) : askedColumn(names, kind, asked);
  return inUnit(found, kind, kind === 'time' ? options.timeUnit : options.currentUnit);
};

/** What a line is as a header: its columns, no header at all, or a fault. */
export type HeaderReading =
  | { readonly kind: 'columns'; readonly columns: RecordColumns }
  | { readonly kind: 'part'; readonly fault: Fault }
  | { readonly kind: 'none' }
  | { readonly kind: 'fault'; readonly fault: Fault };

/** Reads a line as a header. A line that shows only one of the two columns is part of one. */
export const readHeader = (names: readonly string[], options: RecordOptions): HeaderReading => {
  const time = soughtColumn(names, 'time', options);
  const current = soughtColumn(names, 'current', options);
  if (time === 'missing' && current === 'missing') return { kind: 'none' };
  if (typeof time === 'object' && 'code' in time) return { kind: 'fault', fault: time };
  if (typeof current === 'object' && 'code' in current) return { kind: 'fault', fault: current };
  if (time === 'missing') return { kind: 'part', fault: lacking(names, 'time', options.time) };
  if (current === 'missing') return { kind: 'part', fault: lacking(names, 'current', options.current) };
  const date = names.findIndex((name, index) => /^(date|datum)$/i.test(name) && index !== time.index);
  return { kind: 'columns', columns: { time, current, date: date < 0 ? null : date, count: names.length } };
};

/** The columns with the units of a line of units below the header; undefined where the line holds none. */
export const columnsWithUnits = (columns: RecordColumns, names: readonly string[]): RecordColumns | undefined => {
  const united = (column: RecordColumn, kind: ColumnKind): RecordColumn | undefined => {
    if (column.factor !== null) return column;
    const unit = (names[column.index] ?? '').trim().replace(/^[[(](.*)[\])]$/, '$1');
    const factor = unit === '' ? undefined : factorOf(unit, kind);
    return factor === undefined ? undefined : { ...column, unit, factor };
  };
  const current = united(columns.current, 'current');
  return current === undefined
    ? undefined
    : { ...columns, current, time: united(columns.time, 'time') ?? columns.time };
};

/** The columns of a record without a header: the first two, or those asked for by number. */
export const columnsWithoutHeader = (options: RecordOptions): HeaderReading => {
  const numbered = (text: string | undefined, usual: string): string =>
    /^[1-9]\d*$/.test(text ?? '') ? `column ${text ?? ''}` : usual;
  const names = Array.from({ length: 99 }, (_, at) => `column ${String(at + 1)}`);
  const asked = {
    ...options,
    time: numbered(options.time, 'column 1'),
    current: numbered(options.current, 'column 2'),
  };
  const read = readHeader(names, asked);
  return read.kind === 'columns' ? { kind: 'columns', columns: { ...read.columns, date: null, count: null } } : read;
};
