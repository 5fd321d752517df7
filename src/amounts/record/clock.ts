/** How the times of a record are written. */
export type TimeFormat = 'number' | 'clock' | 'date';

/** A time of a record in s: of day, elapsed, or since 1970 (UTC where no zone is written). */
export interface WrittenTime {
  readonly format: 'clock' | 'date';
  readonly seconds: number;
}

const CLOCK = /^(\d{1,4}):([0-5]\d)(?::([0-5]\d)(?:[.,](\d+))?)?\s*([ap]m)?$/i;
const DATE =
  /^(?:(\d{4})-(\d\d)-(\d\d)|(\d\d?)\.(\d\d?)\.(\d{4}))[T ]+(\d\d?):([0-5]\d)(?::([0-5]\d)(?:[.,](\d+))?)?\s*(Z|[+-]\d\d:?\d\d)?$/i;

const HOUR = 3600;
const DAY = 86_400;

const fraction = (digits: string | undefined): number => (digits === undefined ? 0 : Number(`0.${digits}`));

/** 12 am is midnight and 12 pm is noon. */
const hourOf = (hour: number, half: string | undefined): number =>
  half === undefined ? hour : (hour % 12) + (half.toLowerCase() === 'pm' ? 12 : 0);

const zoneSeconds = (zone: string | undefined): number => {
  const [, sign, hours, minutes] = /^([+-])(\d\d):?(\d\d)$/.exec(zone ?? '') ?? [];
  return (sign === '-' ? -1 : 1) * (Number(hours ?? 0) * HOUR + Number(minutes ?? 0) * 60);
};

/** Whole days since 1970-01-01; undefined for a day that no calendar has. */
const daysOf = (year: number, month: number, day: number): number | undefined => {
  const date = new Date(Date.UTC(year, month - 1, day));
  return date.getUTCMonth() === month - 1 && date.getUTCDate() === day ? date.getTime() / 1000 / DAY : undefined;
};

/**
 * A clock time (10:05, 10:05:30.5, 1:05 pm; elapsed hours may pass 24) or a date with its time (ISO 8601 with T or a
 * blank, or day.month.year). `minutes`: two numbers are minutes and seconds. undefined for anything else.
 */
export const readClock = (text: string, minutes: boolean): WrittenTime | undefined => {
  const clock = CLOCK.exec(text);
  if (clock !== null) {
    const [, first = '0', second = '0', third, decimals, half] = clock;
    const short = minutes && third === undefined;
    const seconds = short
      ? Number(first) * 60 + Number(second)
      : hourOf(Number(first), half) * HOUR + Number(second) * 60 + Number(third ?? 0) + fraction(decimals);
    return { format: 'clock', seconds };
  }
  const date = DATE.exec(text);
  if (date === null) return undefined;
  const [, year, month, day, day2, month2, year2, hour, minute, second, decimals, zone] = date as readonly (
    string | undefined
  )[];
  const days = daysOf(Number(year ?? year2), Number(month ?? month2), Number(day ?? day2));
  if (days === undefined || Number(hour) > 24) return undefined;
  const ofDay = Number(hour) * HOUR + Number(minute) * 60 + Number(second ?? 0) + fraction(decimals);
  return { format: 'date', seconds: days * DAY + ofDay - zoneSeconds(zone) };
};

/**
 * Clock times run on past midnight: a step back of more than half a day is the next day. Anything less is a time that
 * is out of order.
 */
export class Midnights {
  passed = 0;
  private last = -Infinity;

  /** The seconds since the midnight before the first reading. */
  unroll(seconds: number): number {
    if (seconds + this.passed * DAY < this.last - DAY / 2) this.passed += 1;
    const unrolled = seconds + this.passed * DAY;
    this.last = Math.max(this.last, unrolled);
    return unrolled;
  }
}
