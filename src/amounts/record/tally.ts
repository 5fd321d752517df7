/** Line numbers that are kept for each reason; the counts are exact. */
export const LINES_KEPT = 20;

/** Why a row of a record was not used. */
export type BadRowReason =
  | 'too-few-columns'
  | 'too-many-columns'
  | 'missing-value'
  | 'not-a-number'
  | 'decimal-sign'
  | 'bad-time'
  | 'other-time-format'
  | 'backward-time'
  | 'open-quote'
  | 'not-text'
  | 'too-long'
  | 'header-again'
  | 'cut-short';

/** Rows of one kind: how many, the first lines of them, and what stood in the first. */
export interface CountedRows<Reason extends string> {
  readonly reason: Reason;
  readonly count: number;
  readonly lines: readonly number[];
  readonly example: string;
}

const LONGEST_EXAMPLE = 60;

/** Counts rows by reason and keeps the first lines of each. */
export class RowTally<Reason extends string> {
  private readonly found = new Map<Reason, { count: number; lines: number[]; example: string }>();

  add(reason: Reason, line: number, text: string): void {
    const row = this.found.get(reason);
    if (row === undefined) this.found.set(reason, { count: 1, lines: [line], example: text.slice(0, LONGEST_EXAMPLE) });
    else {
      row.count += 1;
      if (row.lines.length < LINES_KEPT) row.lines.push(line);
    }
  }

  /** The commonest first. */
  list(): readonly CountedRows<Reason>[] {
    return [...this.found].map(([reason, row]) => ({ reason, ...row })).sort((a, b) => b.count - a.count);
  }
}
