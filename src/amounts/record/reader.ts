import type { Fault } from '../../report/fault.ts';
import { type Result, failure, success } from '../../report/result.ts';
import { readClock } from './clock.ts';
import {
  type HeaderReading,
  type RecordColumns,
  columnsWithUnits,
  columnsWithoutHeader,
  readHeader,
} from './columns.ts';
import { noHeader, noUnit, tooFewReadings } from './faults.ts';
import { type Delimiter, delimiterOf, fieldsOf, namesOf } from './fields.ts';
import { RecordIntegral } from './integral.ts';
import { LONGEST_RECORD_LINE, RecordLines } from './lines.ts';
import { RecordNumbers } from './number.ts';
import { type ReadingRules, type RecordOptions, readRecordOptions } from './options.ts';
import { RecordRows } from './rows.ts';
import { type RecordSummary, shownColumn, shownIntegral } from './summary.ts';
import { type BadRowReason, RowTally } from './tally.ts';

/** Lines that may stand before the header: what a logger says of itself. */
const MOST_BEFORE = 200;

/** What stands in a text that was no UTF-8 where a character could not be read. */
const UNREADABLE = '\ufffd';

/** The table once its header is known. */
interface Table {
  readonly columns: RecordColumns;
  readonly delimiter: Delimiter;
  readonly rows: RecordRows;
  /** The header as written; empty where there is none. */
  readonly header: string;
}

const isMeasured = (field: string): boolean =>
  typeof new RecordNumbers(null).read(field) === 'number' || readClock(field.trim(), false) !== undefined;

/** Two readings or more, and no more words than readings: this is no header. */
const isReading = (fields: readonly string[]): boolean => {
  const written = fields.filter((field) => field.trim() !== '');
  const measured = written.filter(isMeasured).length;
  return measured >= 2 && measured * 2 >= written.length;
};

const isComment = (line: string): boolean => line.startsWith('#') || line.startsWith('%') || line.startsWith('//');

/**
 * Reads a current record from pieces of its text and integrates it as it comes, in constant memory. Every line is
 * accounted for: used, or counted by reason with its line number. Where the pieces are cut makes no difference.
 */
export class RecordReader {
  private readonly options: RecordOptions;
  private readonly rules: ReadingRules;
  private readonly integral: RecordIntegral;
  private readonly lines: RecordLines;
  private readonly bad = new RowTally<BadRowReason>();
  private readonly repeated = new RowTally<'repeated-time'>();
  private table: Table | null = null;
  private fault: Fault | null = null;
  private lacking: Fault | null = null;
  private before: readonly string[] = [];
  private readonly counts = { total: 0, used: 0, bad: 0, blank: 0, comments: 0, before: 0 };
  private unended = false;

  constructor(options: RecordOptions, rules: ReadingRules) {
    this.options = options;
    this.rules = rules;
    this.integral = new RecordIntegral(rules.integral);
    this.lines = new RecordLines((text, ended) => {
      if (this.fault === null) this.line(text, ended);
    });
  }

  /** True once a fault was found: the rest need not be read. */
  get failed(): boolean {
    return this.fault !== null;
  }

  /** Takes the next piece of the record's text. */
  take(piece: string): void {
    if (this.fault === null) this.lines.take(piece);
  }

  /**
   * The record as a whole. Faults: `bad-ask` for columns that are missing or ambiguous, `unknown-unit`,
   * `not-enough-given` for fewer than two readings that can be used.
   */
  end(): Result<RecordSummary> {
    this.lines.rest();
    if (this.fault !== null) return failure(this.fault);
    if (this.table === null) return failure(this.lacking ?? noHeader(this.before));
    const integral = this.integral.end();
    if (integral === undefined) return failure(tooFewReadings(this.bad.list()[0]));
    const { columns, delimiter, rows } = this.table;
    return success({
      ...shownIntegral(integral, this.rules.integral),
      lines: { ...this.counts },
      bad: this.bad.list(),
      repeated: this.repeated.list(),
      columns: { time: shownColumn(columns.time), current: shownColumn(columns.current) },
      delimiter,
      decimal: rows.decimal,
      midnights: rows.midnights.passed,
      unended: this.unended,
    });
  }

  private line(text: string | null, ended: boolean): void {
    this.counts.total += 1;
    if (text === null) this.leaveOut('too-long', `more than ${String(LONGEST_RECORD_LINE)} characters`);
    else if (text.trim() === '') this.counts.blank += 1;
    else if (isComment(text)) this.counts.comments += 1;
    else if (this.table === null) this.open(text, ended);
    else if (this.table.columns.current.factor === null) this.units(this.table, text);
    else this.row(this.table, text, ended);
  }

  /** A line before the table is known: a reading, the header, or what a logger says of itself. */
  private open(text: string, ended: boolean): void {
    const delimiter = delimiterOf(text);
    const fields = fieldsOf(text, delimiter) ?? [];
    if (isReading(fields)) {
      this.fault = this.lacking;
      const table = this.fault === null ? this.begin(columnsWithoutHeader(this.options), delimiter, '') : null;
      if (table?.columns.current.factor === null) this.units(table, text);
      else if (table !== null) this.row(table, text, ended);
      return;
    }
    this.counts.before += 1;
    const names = namesOf(text, delimiter) ?? [];
    if (this.begin(readHeader(names, this.options), delimiter, text) === null) this.before = names;
    if (this.table === null && this.counts.before > MOST_BEFORE) this.fault = this.lacking ?? noHeader([]);
  }

  private begin(reading: HeaderReading, delimiter: Delimiter, header: string): Table | null {
    if (reading.kind === 'fault') this.fault = reading.fault;
    else if (reading.kind === 'part') this.lacking = reading.fault;
    if (reading.kind !== 'columns') return null;
    const { columns } = reading;
    return (this.table = this.tableOf(columns, delimiter, header));
  }

  private tableOf(columns: RecordColumns, delimiter: Delimiter, header: string): Table {
    return { columns, delimiter, header, rows: new RecordRows(columns, this.rules.decimal) };
  }

  /** The line below a header without units may be one of units: s; A. Readings without a unit are a fault. */
  private units({ columns, delimiter, header }: Table, text: string): void {
    const united = columnsWithUnits(columns, namesOf(text, delimiter) ?? []);
    if (united === undefined || header === '') this.fault = noUnit('current', columns.current.name, header !== '');
    else {
      this.table = this.tableOf(united, delimiter, header);
      this.counts.before += 1;
    }
  }

  private row({ columns, delimiter, rows, header }: Table, text: string, ended: boolean): void {
    const fields = fieldsOf(text, delimiter);
    const reading = fields === null ? 'open-quote' : rows.read(fields);
    if (reading === 'no-unit') this.fault = noUnit('time', columns.time.name, header !== '');
    else if (typeof reading === 'string') this.leaveOut(this.reasonFor(reading, text, header, ended), text);
    else if (this.use(reading.time, reading.current, text)) this.unended = !ended;
  }

  private use(time: number, current: number, text: string): boolean {
    const taken = this.integral.take(time, current, this.counts.total);
    if (taken === 'backward') {
      this.leaveOut('backward-time', text);
      return false;
    }
    if (taken === 'repeated') this.repeated.add('repeated-time', this.counts.total, text);
    this.counts.used += 1;
    return true;
  }

  private reasonFor(reason: BadRowReason, text: string, header: string, ended: boolean): BadRowReason {
    if (!ended) return 'cut-short';
    if (text === header) return 'header-again';
    return text.includes(UNREADABLE) ? 'not-text' : reason;
  }

  private leaveOut(reason: BadRowReason, text: string): void {
    this.counts.bad += 1;
    this.bad.add(reason, this.counts.total, text);
  }
}

/** A reader of one record. Faults: those of the options, in their fields. */
export const openRecord = (options: RecordOptions = {}): Result<RecordReader> => {
  const rules = readRecordOptions(options);
  return rules.ok ? success(new RecordReader(options, rules.value), rules.notes) : rules;
};
