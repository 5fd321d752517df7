import type { TraceStretch } from '../../desk/sheet/answer.ts';
import { PICTURE_WIDTH } from './band.ts';
import { element, formulaSpans, heightAfter, label, pathThrough } from './element.ts';
import { type Scale, scaleOver, timeScale, timeUnit } from './scale.ts';

/** The frame of the two panels: charge above, current below, one axis of time. */
const LEFT = 44;
const RIGHT = PICTURE_WIDTH - 42;
const TOP = 22;
const MIDDLE = 132;
const GAP = 34;
const CURRENT_TOP = MIDDLE + GAP;
const BOTTOM = CURRENT_TOP + 44;
/** Pixels of the whole picture. */
export const CHART_HEIGHT = BOTTOM + 32;

/** What a charge has made of the product: kg for each A h, at the efficiency of the run. */
export interface Making {
  readonly species: string;
  readonly unit: string;
  readonly perCharge: number;
}

const grouped = (value: number): string =>
  String(value).replace(/\B(?=(\d{3})+$)/g, Math.abs(value) < 10_000 ? '' : ' ');

const ruled = (scale: Scale, unit: string, title: readonly [number, string]): string => {
  const lines = scale.ticks
    .map((tick) => {
      const y = scale.at(tick);
      const rule = element('line', { class: tick === 0 ? 'base' : 'rule', x1: LEFT, x2: RIGHT, y1: y, y2: y });
      return rule + label(LEFT - 6, y + 4, grouped(tick), { 'text-anchor': 'end', class: 'axis' });
    })
    .join('');
  return lines + label(0, title[0], `${title[1]}, ${unit}`, { class: 'axis' });
};

/** The axis of mass stands on that of charge: one line is read on both. */
const massAxis = (charge: Scale, making: Making): string => {
  const ends = [charge.from * making.perCharge, charge.to * making.perCharge] as const;
  const { ticks } = scaleOver(ends[0], ends[1], [0, 1]);
  const within = ticks.filter((tick) => tick >= ends[0] - 1e-12 && tick <= ends[1] * (1 + 1e-9));
  const marks = within.map((tick) => {
    const y = charge.at(tick / making.perCharge);
    const mark = element('line', { class: 'base', x1: RIGHT, x2: RIGHT + 4, y1: y, y2: y });
    return mark + label(RIGHT + 7, y + 4, String(tick), { class: 'axis' });
  });
  const name = element(
    'text',
    { x: PICTURE_WIDTH, y: 9, 'text-anchor': 'end', class: 'axis' },
    `${formulaSpans(making.species)}${element('tspan', { dy: -heightAfter(making.species) }, `, ${making.unit}`)}`,
  );
  return marks.join('') + name;
};

const timeAxis = (time: Scale): string => {
  const { unit, seconds } = timeUnit(time.to);
  const ticks = time.ticks.map((tick) => {
    const x = time.at(tick);
    const mark = element('line', { class: 'base', x1: x, x2: x, y1: BOTTOM, y2: BOTTOM + 4 });
    return mark + label(x, BOTTOM + 16, String(tick / seconds), { 'text-anchor': 'middle', class: 'axis' });
  });
  return ticks.join('') + label(PICTURE_WIDTH, BOTTOM + 16, unit, { 'text-anchor': 'end', class: 'axis' });
};

const chargeLine = (trace: readonly TraceStretch[], time: Scale, charge: Scale): string => {
  const points = trace.map(({ to, charge: at }): readonly [number, number] => [time.at(to), charge.at(at)]);
  const [first] = trace;
  const start = first === undefined ? [] : [[time.at(first.from), charge.at(0)] as const];
  return element('path', { class: 'line', d: pathThrough([...start, ...points]) });
};

/** Between the greatest and the least current of each stretch: no peak and no pause is smoothed away. */
const currentShape = (trace: readonly TraceStretch[], time: Scale, current: Scale): string => {
  const corners = (pick: (one: TraceStretch) => number): readonly (readonly [number, number])[] =>
    trace.flatMap((one) => [
      [time.at(one.from), current.at(pick(one))] as const,
      [time.at(one.to), current.at(pick(one))] as const,
    ]);
  const zero = current.at(0);
  const ends = [time.at(trace.at(-1)?.to ?? 0), time.at(trace[0]?.from ?? 0)] as const;
  const area = [
    ...corners(({ greatest }) => Math.max(0, greatest)),
    [ends[0], zero] as const,
    [ends[1], zero] as const,
  ];
  const envelope = [...corners(({ greatest }) => greatest), ...corners(({ least }) => least).toReversed()];
  return (
    element('path', { class: 'area', d: `${pathThrough(area)}Z` }) +
    element('path', { class: 'envelope', d: `${pathThrough(envelope)}Z` })
  );
};

/** Charge and mass over time above the current of a record; `making` is null where no mass follows. */
export const recordChart = (trace: readonly TraceStretch[], making: Making | null): string => {
  const seconds = trace.at(-1)?.to ?? 0;
  const most = (pick: (one: TraceStretch) => number): number => Math.max(0, ...trace.map(pick));
  const least = (pick: (one: TraceStretch) => number): number => Math.min(0, ...trace.map(pick));
  const time = timeScale(seconds, [LEFT, RIGHT]);
  const charge = scaleOver(
    least((one) => one.charge),
    most((one) => one.charge),
    [MIDDLE, TOP],
  );
  const current = scaleOver(
    least((one) => one.least),
    most((one) => one.greatest),
    [BOTTOM, CURRENT_TOP],
    3,
  );
  return [
    ruled(charge, 'A h', [9, 'charge']),
    making === null ? '' : massAxis(charge, making),
    chargeLine(trace, time, charge),
    ruled(current, 'A', [CURRENT_TOP - 12, 'current']),
    currentShape(trace, time, current),
    timeAxis(time),
  ].join('');
};
