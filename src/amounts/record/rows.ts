import { type TimeFormat, Midnights, readClock } from './clock.ts';
import type { RecordColumn, RecordColumns } from './columns.ts';
import { type DecimalSign, RecordNumbers } from './number.ts';
import type { BadRowReason } from './tally.ts';

/** A reading: time in s, current in A. */
export interface RowReading {
  readonly time: number;
  readonly current: number;
}

/** What a time was: seconds, a reason, or a number where no unit of time is known. */
type ReadTime = number | BadRowReason | 'no-unit';

/** The field as a clock time or a date: a column of dates stands before its clock time. */
const written = (fields: readonly string[], { date, time }: RecordColumns): string => {
  const clock = (fields[time.index] ?? '').trim();
  return date === null ? clock : `${(fields[date] ?? '').trim()} ${clock}`;
};

const isMinutes = ({ unit }: RecordColumn): boolean => /^m+:s/i.test(unit);

/** Reads rows of fields as readings. All times of a record are written alike, as the first one is. */
export class RecordRows {
  readonly midnights = new Midnights();
  private readonly numbers: RecordNumbers;
  private readonly columns: RecordColumns;
  private readonly widest: number;
  private readonly minutes: boolean;
  private format: TimeFormat | null = null;
  /** The first date, so that seconds since 1970 do not use up the digits of a time. */
  private origin = 0;

  constructor(columns: RecordColumns, sign: DecimalSign) {
    this.columns = columns;
    this.numbers = new RecordNumbers(sign);
    this.widest = Math.max(columns.time.index, columns.current.index, columns.date ?? 0);
    this.minutes = isMinutes(columns.time);
  }

  /** The decimal sign that the numbers showed. */
  get decimal(): DecimalSign {
    return this.numbers.sign;
  }

  /** The reading of a row, or why it gives none. */
  read(fields: readonly string[]): RowReading | BadRowReason | 'no-unit' {
    const { count, current } = this.columns;
    if (fields.length <= this.widest) return 'too-few-columns';
    // A mark at the end of a row makes one more field, which is empty.
    if (count !== null && fields.length > count && fields.slice(count).some((field) => field.trim() !== ''))
      return 'too-many-columns';
    const time = this.timeOf(fields);
    if (typeof time === 'string') return time;
    const flow = this.numbers.read(fields[current.index] ?? '');
    return typeof flow === 'number' ? { time, current: flow * (current.factor ?? 1) } : flow;
  }

  private timeOf(fields: readonly string[]): ReadTime {
    const { time } = this.columns;
    const field = fields[time.index] ?? '';
    if (!field.includes(':')) return this.numberOf(field, time.factor);
    const clock = readClock(written(fields, this.columns), this.minutes);
    if (clock === undefined) return 'bad-time';
    if (!this.alike(clock.format)) return 'other-time-format';
    return clock.format === 'clock' ? this.midnights.unroll(clock.seconds) : this.sinceFirst(clock.seconds);
  }

  private numberOf(field: string, factor: number | null): ReadTime {
    const value = this.numbers.read(field);
    if (typeof value === 'string') return value === 'not-a-number' ? 'bad-time' : value;
    if (!this.alike('number')) return 'other-time-format';
    return factor === null ? 'no-unit' : value * factor;
  }

  private sinceFirst(seconds: number): number {
    if (this.origin === 0) this.origin = Math.floor(seconds);
    return seconds - this.origin;
  }

  private alike(format: TimeFormat): boolean {
    this.format ??= format;
    return this.format === format;
  }
}
