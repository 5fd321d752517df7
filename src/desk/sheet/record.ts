import type { RecordOptions } from '../../amounts/record/options.ts';
import type { RecordSummary } from '../../amounts/record/summary.ts';
import type { Fault } from '../../report/fault.ts';
import { type Result, failure, success } from '../../report/result.ts';
import { fieldsOf } from '../read-ask.ts';
import { runSchema } from '../schema/sheet.ts';
import type { RecordSource } from '../schema/sheet.ts';
import type { Quantity } from '../schema/shape.ts';
import type { RecordedRun } from './answer.ts';
import { recordRemarks } from './record-remarks.ts';
import type { SheetText } from './text.ts';

/** A record that a sheet names: where it lies, seen from the sheet, and how it is to be read. */
export interface NamedRecord {
  /** Tells records apart: the same file may be read in two ways. */
  readonly key: string;
  readonly path: string;
  readonly options: RecordOptions;
}

/** What the shell made of the records that a sheet names, by key. */
export type Records = ReadonlyMap<string, Result<RecordSummary>>;

type Fields = Exclude<RecordSource, string>;

const optionsOf = ({
  time,
  current,
  time_unit,
  current_unit,
  decimal,
  rule,
  gap,
  gap_charge,
  zero,
}: Fields): RecordOptions => ({
  ...(time === undefined ? {} : { time }),
  ...(current === undefined ? {} : { current }),
  ...(time_unit === undefined ? {} : { timeUnit: time_unit }),
  ...(current_unit === undefined ? {} : { currentUnit: current_unit }),
  ...(decimal === undefined ? {} : { decimal }),
  ...(rule === undefined ? {} : { rule }),
  ...(gap === undefined ? {} : { gap }),
  ...(gap_charge === undefined ? {} : { gapCharge: gap_charge }),
  ...(zero === undefined ? {} : { zero }),
});

/** A run's record as the shell is to read it. */
export const namedRecord = (source: RecordSource): NamedRecord => {
  if (typeof source === 'string') return { key: source, path: source, options: {} };
  const options = optionsOf(source);
  return { key: JSON.stringify([source.file, options]), path: source.file, options };
};

const listOf = (value: unknown): readonly unknown[] => (Array.isArray(value) ? value : []);

/** The records that the runs of a sheet name, each once; a run that is at fault names none. */
export const recordsNamed = (sheet: Pick<SheetText, 'value'>): readonly NamedRecord[] => {
  const runs = listOf(fieldsOf(sheet.value)?.['cells']).flatMap((tank) => listOf(fieldsOf(tank)?.['runs']));
  const named = runs.flatMap((run) => {
    const source = runSchema.shape.record.safeParse(fieldsOf(run)?.['record']).data;
    return source === undefined ? [] : [namedRecord(source)];
  });
  return [...new Map(named.map((one) => [one.key, one])).values()];
};

const HOUR = 3600;

const hours = ({ value }: Quantity): Quantity => ({ value: value / HOUR, unit: 'h' });
const ampereHours = ({ value }: Quantity): Quantity => ({ value: value / HOUR, unit: 'A h' });

/** A record as a run shows it. */
export const recordedRun = (path: string, summary: RecordSummary): RecordedRun => ({
  path,
  rows: summary.lines.used,
  time: hours(summary.duration),
  charge: ampereHours(summary.charge),
  ...(summary.reverse.value < 0
    ? { reversed: { forward: ampereHours(summary.forward), reverse: ampereHours(summary.reverse) } }
    : {}),
  remarks: recordRemarks(summary),
  trace: summary.series.map(({ charge, ...stretch }) => ({ ...stretch, charge: charge / HOUR })),
});

/** The record of a run with the charge and time that it gives. */
export interface UsedRecord {
  readonly shown: RecordedRun;
  readonly given: { readonly charge: string; readonly time: string };
}

/** A fault of reading, with the path and in the words of a sheet: the option --current-unit is its key current_unit. */
const placedFault = (path: string, { hint, ...fault }: Fault): Fault => ({
  ...fault,
  field: 'record',
  message: fault.message.includes(path) ? fault.message : `${path}: ${fault.message}`,
  ...(hint === undefined
    ? {}
    : { hint: hint.replace(/--([a-z]+(?:-[a-z]+)*)/g, (_, name: string) => name.replaceAll('-', '_')) }),
});

/** The record that `source` names. Faults: those of reading it, in `record`. */
export const useRecord = (source: RecordSource, records: Records): Result<UsedRecord> => {
  const { key, path } = namedRecord(source);
  const read = records.get(key);
  if (read === undefined) {
    return failure({ code: 'bad-ask', field: 'record', message: `The record ${path} was not read.` });
  }
  if (!read.ok) return failure(placedFault(path, read.fault));
  const meter = typeof source === 'string' || source.meter === undefined ? '' : ` ± ${source.meter}`;
  const { charge, duration } = read.value;
  return success({
    shown: recordedRun(path, read.value),
    given: { charge: `${String(charge.value)} C${meter}`, time: `${String(duration.value)} s` },
  });
};
