/** A stretch of numbers on a stretch of pixels. */
export interface Scale {
  readonly at: (value: number) => number;
  readonly ticks: readonly number[];
  /** The ends of the axis: the first and last tick, or beyond. */
  readonly from: number;
  readonly to: number;
}

/** Steps of 1, 2 or 5 times a power of ten, at the most `most` of them. */
const stepFor = (range: number, most: number): number => {
  const rough = range / most;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = [1, 2, 5, 10].find((one) => one * power >= rough * (1 - 1e-9)) ?? 10;
  return step * power;
};

/** A number of a tick without what binary fractions add to it. */
const clean = (value: number): number => Number(value.toPrecision(12));

/** A scale from `low` to `high` rounded out to whole steps; `pixels` are where its ends stand. */
export const scaleOver = (low: number, high: number, pixels: readonly [number, number], most = 4): Scale => {
  const range = high - low || Math.abs(high) || 1;
  const step = stepFor(range, most);
  const from = clean(Math.floor(low / step + 1e-9) * step);
  const to = Math.max(clean(Math.ceil(high / step - 1e-9) * step), clean(from + step));
  const count = Math.round((to - from) / step);
  const ticks = Array.from({ length: count + 1 }, (_, at) => clean(from + at * step));
  const [start, end] = pixels;
  return { at: (value) => start + ((value - from) / (to - from)) * (end - start), ticks, from, to };
};

/** Steps of time that people read: 1, 2, 5, 10, 15, 30 min, 1, 2, 3, 6, 12 h, whole days. */
const TIMES = [1, 2, 5, 10, 15, 30, 60, 120, 180, 360, 720, 1440, 2880, 7200, 14_400, 43_200].map(
  (minutes) => minutes * 60,
);

/** Ticks of a time axis in s that ends where the record ends. */
export const timeScale = (seconds: number, pixels: readonly [number, number], most = 6): Scale => {
  const step = TIMES.find((one) => seconds / one <= most) ?? stepFor(seconds, most);
  const ticks = Array.from({ length: Math.floor(seconds / step + 1e-9) + 1 }, (_, at) => at * step);
  const [start, end] = pixels;
  return { at: (value) => start + (value / (seconds || 1)) * (end - start), ticks, from: 0, to: seconds };
};

/** A time of the axis: in min below two hours, in h below three days, else in days. */
export const timeUnit = (seconds: number): { readonly unit: string; readonly seconds: number } => {
  if (seconds < 7200) return { unit: 'min', seconds: 60 };
  return seconds < 259_200 ? { unit: 'h', seconds: 3600 } : { unit: 'd', seconds: 86_400 };
};
