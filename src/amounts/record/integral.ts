import { type SeriesPoint, ThinnedSeries } from './series.ts';
import { CompensatedSum } from './sum.ts';

/** How a record is integrated. Times in s, currents in A. */
export interface IntegralRules {
  /** Between two readings: a straight line, or the earlier reading held until the later. */
  readonly rule: 'trapezoid' | 'hold';
  /** A step longer than this is a gap; null: longer than `gapSteps` times the usual step. */
  readonly gapLimit: number | null;
  readonly gapSteps: number;
  /** Whether charge is counted across a gap as across any step, or not at all. */
  readonly gapCharge: 'count' | 'skip';
  /** A current of this size or less is none. */
  readonly zero: number;
}

/** A gap: the line of the reading after it, when it began and how long it lasted, in s. */
export interface Gap {
  readonly line: number;
  readonly from: number;
  readonly duration: number;
}

/** What a record comes to. Charge in C, time in s, current in A; times count from the first reading. */
export interface Integral {
  readonly charge: number;
  readonly forward: number;
  /** Not positive: forward + reverse = charge. */
  readonly reverse: number;
  readonly duration: number;
  /** Time over which charge was counted: all of it, less gaps that were skipped. */
  readonly counted: number;
  readonly paused: { readonly count: number; readonly time: number };
  readonly reversals: { readonly count: number; readonly lines: readonly number[] };
  readonly gaps: {
    readonly limit: number;
    /** The median of the first steps; null where a limit was given. */
    readonly usualStep: number | null;
    readonly count: number;
    readonly time: number;
    readonly list: readonly Gap[];
  };
  readonly current: { readonly mean: number; readonly least: number; readonly greatest: number };
  readonly rows: number;
  readonly series: readonly SeriesPoint[];
}

/** Whether a reading was used: at an equal time it is a step, at an earlier one it is left out. */
export type Taken = 'used' | 'repeated' | 'backward';

/** Steps whose median is the usual step, and gaps and reversals whose places are kept. */
const STEPS_WATCHED = 101;
const PLACES_KEPT = 20;

interface Reading {
  readonly time: number;
  readonly current: number;
  readonly line: number;
}

/**
 * Integrates a current record reading by reading in constant memory. Reversed current counts apart; a trapezoid that
 * crosses zero is split where it crosses:
 *   a > 0 > b over dt:  forward dt a^2 / (2 (a - b)),  reverse dt b^2 / (2 (a - b)),  their difference dt (a + b) / 2.
 */
export class RecordIntegral {
  private readonly rules: IntegralRules;
  private readonly forward = new CompensatedSum();
  private readonly reverse = new CompensatedSum();
  private readonly counted = new CompensatedSum();
  private readonly pausedTime = new CompensatedSum();
  private readonly gapTime = new CompensatedSum();
  private readonly series = new ThinnedSeries();
  private readonly gaps: Gap[] = [];
  private readonly reversed: number[] = [];
  /** Readings that wait until the usual step is known; null once it is. */
  private waiting: Reading[] | null;
  private limit: number;
  private usualStep: number | null = null;
  private gapCount = 0;
  private pauses = 0;
  private pausing = false;
  private reversals = 0;
  private direction = 0;
  private rows = 0;
  private start = 0;
  private newest = -Infinity;
  private time = 0;
  private current = 0;
  private least = Infinity;
  private greatest = -Infinity;

  constructor(rules: IntegralRules) {
    this.rules = rules;
    this.limit = rules.gapLimit ?? Infinity;
    this.waiting = rules.gapLimit === null ? [] : null;
  }

  /** Takes a reading: `time` in s, `current` in A, the line it stands on. */
  take(time: number, current: number, line: number): Taken {
    if (time < this.newest) return 'backward';
    const taken = time === this.newest ? 'repeated' : 'used';
    this.newest = time;
    if (this.waiting === null) this.step(time, current, line);
    else {
      this.waiting.push({ time, current, line });
      if (this.waiting.length > STEPS_WATCHED) this.settle();
    }
    return taken;
  }

  /** Everything up to the last reading; undefined for fewer than two. */
  end(): Integral | undefined {
    this.settle();
    return this.rows < 2 ? undefined : this.result();
  }

  private result(): Integral {
    const charge = this.forward.less(this.reverse);
    const counted = this.counted.value;
    return {
      charge,
      forward: this.forward.value,
      reverse: 0 - this.reverse.value,
      duration: this.time - this.start,
      counted,
      paused: { count: this.pauses, time: this.pausedTime.value },
      reversals: { count: this.reversals, lines: this.reversed },
      gaps: {
        limit: this.limit,
        usualStep: this.usualStep,
        count: this.gapCount,
        time: this.gapTime.value,
        list: this.gaps,
      },
      current: { mean: counted > 0 ? charge / counted : 0, least: this.least, greatest: this.greatest },
      rows: this.rows,
      series: this.series.points(),
    };
  }

  /** The median of the first steps tells what a gap is; then the readings that waited are integrated. */
  private settle(): void {
    const { waiting } = this;
    if (waiting === null) return;
    this.waiting = null;
    const steps = waiting.slice(1).map(({ time }, at) => time - (waiting[at]?.time ?? time));
    const sorted = steps.filter((step) => step > 0).sort((a, b) => a - b);
    this.usualStep = sorted[Math.floor((sorted.length - 1) / 2)] ?? null;
    this.limit = this.usualStep === null ? Infinity : this.usualStep * this.rules.gapSteps;
    for (const { time, current, line } of waiting) this.step(time, current, line);
  }

  private step(time: number, current: number, line: number): void {
    if (this.rows === 0) this.start = time;
    else if (time > this.time) this.between(time, current, line);
    this.turn(current, line);
    this.rows += 1;
    this.time = time;
    this.current = current;
    if (current < this.least) this.least = current;
    if (current > this.greatest) this.greatest = current;
    this.series.add(time - this.start, current, this.forward.less(this.reverse));
  }

  private between(time: number, current: number, line: number): void {
    const step = time - this.time;
    if (step > this.limit) {
      this.gapCount += 1;
      this.gapTime.add(step);
      if (this.gaps.length < PLACES_KEPT) this.gaps.push({ line, from: this.time - this.start, duration: step });
      if (this.rules.gapCharge === 'skip') {
        this.pausing = false;
        return;
      }
    }
    this.counted.add(step);
    const end = this.rules.rule === 'hold' ? this.current : current;
    this.pause(step, end);
    this.charge(step, this.current, end);
  }

  private charge(step: number, a: number, b: number): void {
    if (a >= 0 && b >= 0) this.forward.add((step * (a + b)) / 2);
    else if (a <= 0 && b <= 0) this.reverse.add((-step * (a + b)) / 2);
    else {
      const height = 2 * Math.abs(a - b);
      const [up, down] = a > 0 ? [a, b] : [b, a];
      this.forward.add((step * up * up) / height);
      this.reverse.add((step * down * down) / height);
    }
  }

  private pause(step: number, end: number): void {
    const { zero } = this.rules;
    const idle = Math.abs(this.current) <= zero && Math.abs(end) <= zero;
    if (idle) {
      if (!this.pausing) this.pauses += 1;
      this.pausedTime.add(step);
    }
    this.pausing = idle;
  }

  private turn(current: number, line: number): void {
    if (Math.abs(current) <= this.rules.zero) return;
    const direction = Math.sign(current);
    if (this.direction !== 0 && direction !== this.direction) {
      this.reversals += 1;
      if (this.reversed.length < PLACES_KEPT) this.reversed.push(line);
    }
    this.direction = direction;
  }
}

/** The integral of readings in order, `[time in s, current in A]`; undefined for fewer than two. */
export const integrateRecord = (
  readings: Iterable<readonly [time: number, current: number]>,
  rules: IntegralRules,
): Integral | undefined => {
  const integral = new RecordIntegral(rules);
  let line = 0;
  for (const [time, current] of readings) integral.take(time, current, (line += 1));
  return integral.end();
};
