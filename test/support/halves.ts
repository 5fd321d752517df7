import { type Rational, ONE, ZERO, rationalFromText } from '../../src/exact/rational.ts';
import { plainEquation } from './plain.ts';

/** `5/2 2 I^- -> I2 + 2 e^-`: how often, and the half. */
export const scaled = (text: string): { readonly times: Rational; readonly half: string } => {
  const [times = '', ...rest] = text.split(' ');
  return { times: rationalFromText(times), half: rest.join(' ') };
};

const add = (sums: Map<string, Rational>, text: string, times: Rational): void => {
  const { left, right } = plainEquation(text);
  for (const { coefficient, species } of right) put(sums, species.key, coefficient.mul(times));
  for (const { coefficient, species } of left) put(sums, species.key, coefficient.mul(times).neg());
};

const put = (sums: Map<string, Rational>, key: string, value: Rational): void => {
  sums.set(key, (sums.get(key) ?? ZERO).add(value));
};

/** What two scaled halves and minus a reaction leave over; H^+ with OH^- counted as water. */
export const leftOver = (halves: readonly string[], reaction: string): readonly string[] => {
  const sums = new Map<string, Rational>();
  for (const text of halves) add(sums, scaled(text).half, scaled(text).times);
  add(sums, reaction, ONE.neg());
  const acid = sums.get('H^+') ?? ZERO;
  put(sums, 'H^+', acid.neg());
  put(sums, 'OH^-', acid.neg());
  put(sums, 'H2O', acid);
  return [...sums].filter(([, value]) => !value.equals(ZERO)).map(([key]) => key);
};

/** Electrons in a scaled half. */
export const electronsIn = (text: string): Rational => {
  const { times, half } = scaled(text);
  const { left, right } = plainEquation(half);
  const electron = [...left, ...right].find(({ species }) => species.key === 'e^-');
  return (electron?.coefficient ?? ZERO).mul(times);
};
