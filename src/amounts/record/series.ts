/** A stretch of a record for a picture. */
export interface SeriesPoint {
  /** First and last time, in s from the start of the record. */
  readonly from: number;
  readonly to: number;
  /** Least and greatest current in A. */
  readonly least: number;
  readonly greatest: number;
  /** Net charge at its end, in C. */
  readonly charge: number;
}

type Stretch = { -readonly [Key in keyof SeriesPoint]: SeriesPoint[Key] } & { rows: number };

/** Stretches that are kept at the most. */
export const MOST_STRETCHES = 512;

const merged = (a: Stretch, b: Stretch): Stretch => ({
  from: a.from,
  to: b.to,
  least: Math.min(a.least, b.least),
  greatest: Math.max(a.greatest, b.greatest),
  charge: b.charge,
  rows: a.rows + b.rows,
});

/**
 * A record thinned to a bounded number of stretches of as many rows each; when they are full, neighbours are merged and
 * a stretch holds twice as many rows. No peak is lost: each stretch keeps its extremes.
 */
export class ThinnedSeries {
  private stretches: Stretch[] = [];
  private rowsEach = 1;

  add(time: number, current: number, charge: number): void {
    const last = this.stretches.at(-1);
    if (last === undefined || last.rows >= this.rowsEach) {
      if (this.stretches.length >= MOST_STRETCHES) this.halve();
      this.stretches.push({ from: time, to: time, least: current, greatest: current, charge, rows: 1 });
      return;
    }
    last.to = time;
    if (current < last.least) last.least = current;
    if (current > last.greatest) last.greatest = current;
    last.charge = charge;
    last.rows += 1;
  }

  points(): readonly SeriesPoint[] {
    return this.stretches.map(({ from, to, least, greatest, charge }) => ({ from, to, least, greatest, charge }));
  }

  private halve(): void {
    const halved: Stretch[] = [];
    for (let at = 0; at < this.stretches.length; at += 2) {
      const [a, b] = [this.stretches[at], this.stretches[at + 1]];
      if (a !== undefined) halved.push(b === undefined ? a : merged(a, b));
    }
    this.stretches = halved;
    this.rowsEach *= 2;
  }
}
