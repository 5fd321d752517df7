import { escaped, formulaParts } from '../markup.ts';

/** Attributes of an element; numbers are written with two decimals at the most. */
export type Attributes = Readonly<Record<string, string | number>>;

const number = (value: number): string => String(Number(value.toFixed(2)));

const attributeText = ([name, value]: readonly [string, string | number]): string =>
  ` ${name}="${typeof value === 'number' ? number(value) : escaped(value)}"`;

/** An SVG element; `inside` is markup already. */
export const element = (name: string, attributes: Attributes, inside = ''): string => {
  const written = Object.entries(attributes).map(attributeText).join('');
  return inside === '' ? `<${name}${written}/>` : `<${name}${written}>${inside}</${name}>`;
};

/** Text on the picture, escaped. */
export const label = (x: number, y: number, text: string, attributes: Attributes = {}): string =>
  element('text', { x, y, ...attributes }, escaped(text));

const RISE = { line: 0, low: 3, high: -4 } as const;

/** A species as running spans: digits are moved down or up, and back again after them. */
export const formulaSpans = (plain: string): string => {
  let height = 0;
  return formulaParts(plain)
    .map(({ text, place }) => {
      const move = RISE[place] - height;
      height = RISE[place];
      const small = place === 'line' ? {} : { class: 'small' };
      return element('tspan', { ...(move === 0 ? {} : { dy: move }), ...small }, escaped(text));
    })
    .join('');
};

/** Where the line after a formula has to be lifted back to: the height at which its last part stands. */
export const heightAfter = (plain: string): number => RISE[formulaParts(plain).at(-1)?.place ?? 'line'];

/** A stretch of a path through points. */
export const pathThrough = (points: readonly (readonly [number, number])[]): string =>
  points.map(([x, y], at) => `${at === 0 ? 'M' : 'L'}${number(x)} ${number(y)}`).join('');

/** A picture with a title that is read aloud; it is as wide as its place allows, up to `width` pixels. */
export const picture = (title: string, width: number, height: number, inside: string): string =>
  element(
    'svg',
    { role: 'img', 'aria-label': title, viewBox: `0 0 ${number(width)} ${number(height)}`, width, height },
    `<title>${escaped(title)}</title>${inside}`,
  );
