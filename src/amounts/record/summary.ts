import type { Quantity } from '../answered.ts';
import type { RecordColumn } from './columns.ts';
import type { Delimiter } from './fields.ts';
import type { Integral, IntegralRules } from './integral.ts';
import type { DecimalSign } from './number.ts';
import type { SeriesPoint } from './series.ts';
import type { BadRowReason, CountedRows } from './tally.ts';

/** A column as it was read. */
export interface ShownColumn {
  readonly name: string;
  /** Empty for clock times and dates. */
  readonly unit: string;
}

/** A gap with its place: the line of the reading after it. */
export interface ShownGap {
  readonly line: number;
  readonly from: Quantity;
  readonly duration: Quantity;
}

/** The lines of a record: together they are all of them. */
export interface RecordLineCounts {
  readonly total: number;
  readonly used: number;
  readonly bad: number;
  readonly blank: number;
  readonly comments: number;
  /** The header and what stands before it. */
  readonly before: number;
}

/** What a current record comes to, and what became of each of its lines. */
export interface RecordSummary {
  readonly charge: Quantity;
  readonly forward: Quantity;
  /** Not positive: forward and reverse add up to the charge. */
  readonly reverse: Quantity;
  readonly duration: Quantity;
  /** The time over which charge was counted. */
  readonly counted: Quantity;
  readonly current: { readonly mean: Quantity; readonly least: Quantity; readonly greatest: Quantity };
  readonly paused: { readonly count: number; readonly time: Quantity; readonly zero: Quantity };
  readonly reversals: { readonly count: number; readonly lines: readonly number[] };
  readonly gaps: {
    /** Absent where nothing says what a gap is. */
    readonly limit?: Quantity;
    readonly usualStep?: Quantity;
    readonly counted: boolean;
    readonly count: number;
    readonly time: Quantity;
    readonly list: readonly ShownGap[];
  };
  readonly rule: IntegralRules['rule'];
  readonly lines: RecordLineCounts;
  /** Rows that were not used, by reason: exact counts, the first line numbers, what stood in the first. */
  readonly bad: readonly CountedRows<BadRowReason>[];
  /** Readings at the time of the one before: used, as steps. */
  readonly repeated: readonly CountedRows<'repeated-time'>[];
  readonly columns: { readonly time: ShownColumn; readonly current: ShownColumn };
  readonly delimiter: Delimiter;
  readonly decimal: DecimalSign;
  /** Midnights that clock times ran past. */
  readonly midnights: number;
  /** True where the last line was used and has no line end: it may have been cut short. */
  readonly unended: boolean;
  readonly series: readonly SeriesPoint[];
}

const seconds = (value: number): Quantity => ({ value, unit: 's' });
const amperes = (value: number): Quantity => ({ value, unit: 'A' });
const coulombs = (value: number): Quantity => ({ value, unit: 'C' });

const shownGaps = ({ gaps }: Integral, rules: IntegralRules): RecordSummary['gaps'] => ({
  ...(Number.isFinite(gaps.limit) ? { limit: seconds(gaps.limit) } : {}),
  ...(gaps.usualStep === null ? {} : { usualStep: seconds(gaps.usualStep) }),
  counted: rules.gapCharge === 'count',
  count: gaps.count,
  time: seconds(gaps.time),
  list: gaps.list.map(({ line, from, duration }) => ({ line, from: seconds(from), duration: seconds(duration) })),
});

/** The quantities of an integral with their units. */
export const shownIntegral = (integral: Integral, rules: IntegralRules) => ({
  charge: coulombs(integral.charge),
  forward: coulombs(integral.forward),
  reverse: coulombs(integral.reverse),
  duration: seconds(integral.duration),
  counted: seconds(integral.counted),
  current: {
    mean: amperes(integral.current.mean),
    least: amperes(integral.current.least),
    greatest: amperes(integral.current.greatest),
  },
  paused: { count: integral.paused.count, time: seconds(integral.paused.time), zero: amperes(rules.zero) },
  reversals: integral.reversals,
  gaps: shownGaps(integral, rules),
  rule: rules.rule,
  series: integral.series,
});

/** A column without what only the reader needs. */
export const shownColumn = ({ name, unit }: RecordColumn): ShownColumn => ({ name, unit });
