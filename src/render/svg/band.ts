import type { CurrentPart } from '../../desk/sheet/answer.ts';
import { element, formulaSpans, heightAfter, label } from './element.ts';

/** Pixels of all pictures: a phone shows them at their own size. */
export const PICTURE_WIDTH = 360;
const BAR = 20;
const LINE = 19;
const SWATCH = 11;

/** How a part is filled: told apart by pattern as well as by colour, so that paper without colour says the same. */
const fillOf = (part: CurrentPart, at: number): string => (part.species === null ? 'rest' : `part${String(at % 4)}`);

/** "93.4 %"; a share that would be rounded to nothing or to all keeps three decimals. */
export const shareText = (share: number): string => {
  const percent = share * 100;
  if (percent > 0 && percent < 0.001) return 'under 0.001 %';
  const near = (percent > 0 && percent < 0.1) || (percent > 99.9 && percent < 100);
  return `${String(Number(percent.toFixed(near ? 3 : 1)))} %`;
};

const UNNAMED = 'not accounted for';

/** What a reader without the picture is told: "Cu 93.4 %, not accounted for 6.6 %". */
export const bandText = (parts: readonly CurrentPart[]): string =>
  parts.map(({ species, share }) => `${species ?? UNNAMED} ${shareText(share)}`).join(', ');

const barOf = (parts: readonly CurrentPart[], y: number): string => {
  let x = 0;
  const total = Math.max(
    1,
    parts.reduce((sum, { share }) => sum + share, 0),
  );
  const segments = parts.map((part, at) => {
    const width = (part.share / total) * (PICTURE_WIDTH - 1);
    const drawn = element('rect', { class: fillOf(part, at), x: 0.5 + x, y, width, height: BAR });
    x += width;
    return drawn;
  });
  return segments.join('');
};

/** Pixels that a text takes, roughly: nothing breaks where it is a little more or less. */
const roughWidth = (text: string): number => Array.from(text).length * 7.2;

interface Entry {
  readonly x: number;
  readonly line: number;
}

/** Entries one behind the other; one that does not fit begins a new line. */
const placed = (widths: readonly number[]): readonly Entry[] => {
  let x = 0;
  let line = 0;
  return widths.map((width) => {
    if (x > 0 && x + width > PICTURE_WIDTH) {
      x = 0;
      line += 1;
    }
    const entry = { x, line };
    x += width + 18;
    return entry;
  });
};

const legendEntry = (part: CurrentPart, at: number, { x, line }: Entry, y: number): string => {
  const top = y + line * LINE;
  const swatch = element('rect', { class: fillOf(part, at), x: x + 0.5, y: top, width: SWATCH, height: SWATCH });
  const name = part.species === null ? element('tspan', {}, UNNAMED) : formulaSpans(part.species);
  const back = part.species === null ? 0 : -heightAfter(part.species);
  const share = element(
    'tspan',
    { class: 'figure', dx: 6, ...(back === 0 ? {} : { dy: back }) },
    shareText(part.share),
  );
  return swatch + element('text', { x: x + SWATCH + 6, y: top + 10 }, `${name}${share}`);
};

/** A band and its height in pixels. */
export interface Band {
  readonly markup: string;
  readonly height: number;
}

/** Where the current of one electrode went: a band of shares under its name, and what each part is. */
export const electrodeBand = (name: string, parts: readonly CurrentPart[], top: number): Band => {
  const widths = parts.map((part) => SWATCH + 14 + roughWidth(`${part.species ?? UNNAMED} ${shareText(part.share)}`));
  const entries = placed(widths);
  const legendTop = top + 14 + BAR + 9;
  const legend = parts.map((part, at) => legendEntry(part, at, entries[at] ?? { x: 0, line: 0 }, legendTop)).join('');
  const lines = (entries.at(-1)?.line ?? 0) + 1;
  const markup = `${label(0, top + 8, name, { class: 'axis' })}${barOf(parts, top + 14)}${legend}`;
  return { markup, height: 14 + BAR + 9 + lines * LINE };
};
