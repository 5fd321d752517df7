import type { Quantity } from './answered.ts';

const WITHOUT_UNCERTAINTY = 7;
const UNCERTAINTY_DIGITS = 2;

/** Decimals that show an uncertainty with two significant digits; negative left of the point. */
const decimalsFor = (uncertainty: number): number => {
  const exponent = Math.floor(Math.log10(uncertainty));
  const rounded = Number(uncertainty.toExponential(UNCERTAINTY_DIGITS - 1));
  return UNCERTAINTY_DIGITS - 1 - (rounded >= 10 ** (exponent + 1) ? exponent + 1 : exponent);
};

/** Rounds half away from zero on the decimal spelling, so that the last digit is the one a person would write. */
const fixed = (value: number, decimals: number): string => {
  if (decimals >= 0) return value.toFixed(Math.min(decimals, 100));
  const step = 10 ** -decimals;
  return String(Math.round(value / step) * step);
};

const withUncertainty = (value: number, uncertainty: number): string => {
  const decimals = decimalsFor(uncertainty);
  const digits = Math.round(uncertainty * 10 ** decimals);
  if (decimals <= 0) return `${fixed(value, decimals)}(${String(digits * 10 ** -decimals)})`;
  return `${fixed(value, decimals)}(${String(digits)})`;
};

/** A number without uncertainty to seven significant digits, without trailing zeros. */
export const printNumber = (value: number): string => String(Number(value.toPrecision(WITHOUT_UNCERTAINTY)));

/**
 * A quantity as it is printed: rounded by its standard uncertainty to two digits of it, "1.185494(32) g/(A h)" (JCGM
 * 100:2008, 7.2.2 and 7.2.6), or to seven significant digits where none is known. Very small and very large values take
 * a power of ten: "1.500(20)e-9 mol".
 */
export const printQuantity = ({ value, unit, uncertainty }: Quantity): string => {
  const exponent = value === 0 ? 0 : Math.floor(Math.log10(Math.abs(value)));
  const far = exponent < -4 || exponent > 9;
  if (uncertainty === undefined) return `${printNumber(value)} ${unit}`;
  if (!far) return `${withUncertainty(value, uncertainty)} ${unit}`;
  const scale = 10 ** exponent;
  return `${withUncertainty(value / scale, uncertainty / scale)}e${String(exponent)} ${unit}`;
};
