import type { Quantity } from '../desk/schema/shape.ts';

const DIGITS = 6;

/** Decimal places that show `value` with `digits` significant digits. */
const placesFor = (value: number, digits: number): number =>
  value === 0 ? 0 : Math.max(0, digits - 1 - Math.floor(Math.log10(Math.abs(value))));

const grouped = (text: string): string => {
  const [whole = '', part] = text.split('.');
  const digits = whole.replace(/^-/, '');
  const spaced = digits.length < 5 ? whole : whole.replace(/\B(?=(\d{3})+$)/g, ' ');
  return part === undefined ? spaced : `${spaced}.${part}`;
};

const fixed = (value: number, places: number): string => grouped(value.toFixed(Math.min(places, 20)));

/** Too large or too small to be read with zeros. */
const isExtreme = (value: number): boolean => value !== 0 && (Math.abs(value) >= 1e9 || Math.abs(value) < 1e-4);

/** The number of a quantity, rounded by its uncertainty (two digits of it) or to six significant digits. */
export const figureOf = ({ value, uncertainty }: Quantity): string => {
  if (isExtreme(value)) return value.toExponential(DIGITS - 1);
  const known = uncertainty !== undefined && uncertainty > 0;
  if (!known)
    return fixed(value, placesFor(value, DIGITS))
      .replace(/(\.\d*?)0+$/, '$1')
      .replace(/\.$/, '');
  return fixed(value, Math.min(placesFor(uncertainty, 2), placesFor(value, 10)));
};

/** "± 0.00003" in the digits of the figure, "" where nothing is known. */
export const uncertaintyOf = ({ value, uncertainty }: Quantity): string => {
  if (uncertainty === undefined || uncertainty === 0) return '';
  if (isExtreme(value)) return `± ${uncertainty.toExponential(1)}`;
  const shown = fixed(uncertainty, Math.min(placesFor(uncertainty, 2), placesFor(value, 10)));
  return Number(shown) === 0 ? '' : `± ${shown}`;
};

/** A whole quantity in one piece: "1.185494 ± 0.000030 g/(A h)". */
export const quantityText = (quantity: Quantity): string =>
  [figureOf(quantity), uncertaintyOf(quantity), quantity.unit].filter((word) => word !== '').join(' ');
