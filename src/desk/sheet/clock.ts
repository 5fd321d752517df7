/** A time of day, with a date where the sheet gives one: minutes since midnight, or since the start of 1970. */
export interface Clock {
  readonly minutes: number;
  readonly dated: boolean;
}

const DAY = 1440;
const FORM = /^\s*(?:(\d{4})-(\d{2})-(\d{2})[ T]+)?(\d{1,2}):(\d{2})\s*$/;
const MINUTE = 60_000;

/** Minutes at the start of a calendar day; undefined for the 31st of June. */
const dayOf = (year: string, month: string, day: string): number | undefined => {
  const date = new Date(Date.UTC(Number(year), Number(month) - 1, Number(day)));
  const real = date.getUTCMonth() === Number(month) - 1 && date.getUTCDate() === Number(day);
  return real ? date.getTime() / MINUTE : undefined;
};

/** "16:00" or "2026-05-04 16:00"; undefined for anything else. */
export const readClock = (text: string): Clock | undefined => {
  const [, year, month = '', day = '', hours = '', minutes = ''] = FORM.exec(text) ?? [];
  const time = Number(hours) * 60 + Number(minutes);
  if (hours === '' || Number(hours) > 23 || Number(minutes) > 59) return undefined;
  if (year === undefined) return { minutes: time, dated: false };
  const start = dayOf(year, month, day);
  return start === undefined ? undefined : { minutes: start + time, dated: true };
};

const daysIn = (minutes: number): number => Math.floor(minutes / DAY);

/** Minutes from `start` to `end`. An end without a date is the next such time after the start; a dated one may lie before. */
export const minutesBetween = (start: Clock, end: Clock): number => {
  if (start.dated && end.dated) return end.minutes - start.minutes;
  const gap = (end.minutes % DAY) - (start.minutes % DAY);
  return gap > 0 ? gap : gap + DAY;
};

const twoDigits = (value: number): string => String(value).padStart(2, '0');

/** The time `minutes` after (or before) a clock, rounded up to the minute: "13:12", "02:30, 1 day later". */
export const clockText = (from: Clock, minutes: number): string => {
  const at = Math.ceil(from.minutes + minutes - 1e-6);
  const ofDay = at - daysIn(at) * DAY;
  const time = `${twoDigits(Math.floor(ofDay / 60))}:${twoDigits(ofDay % 60)}`;
  if (from.dated) return `${new Date(at * MINUTE).toISOString().slice(0, 10)} ${time}`;
  const days = daysIn(at) - daysIn(from.minutes);
  if (days === 0) return time;
  const many = `${String(Math.abs(days))} ${Math.abs(days) === 1 ? 'day' : 'days'}`;
  return `${time}, ${many} ${days > 0 ? 'later' : 'before'}`;
};
