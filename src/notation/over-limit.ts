import type { Fault } from '../report/fault.ts';
import { spanOf, wholeSpan } from '../report/span.ts';
import { LIMITS } from './limits.ts';

const DIGITS = new RegExp(`[\\d₀-₉⁰¹²³⁴-⁹]{${String(LIMITS.digits + 1)},}`, 'u');
/** A number, a period and digits, with more formula behind: count 4.5, or count 4 and 5 of what follows. */
const DOUBTFUL_PERIOD = /(?<![\d.])(?!1\.)[1-9]\d*\.(?=[1-9])/gu;

const nestingOf = (text: string): { readonly depth: number; readonly at: number } => {
  let depth = 0;
  let deepest = { depth: 0, at: 0 };
  for (let at = 0; at < text.length; at += 1) {
    const char = text[at] ?? '';
    if ('([{'.includes(char)) depth += 1;
    if (')]}'.includes(char)) depth -= 1;
    if (depth > deepest.depth) deepest = { depth, at };
    if (depth > LIMITS.nesting) return deepest;
  }
  return deepest;
};

const tooHard = (text: string, message: string, from: number, to: number, limit: string): Fault => ({
  code: 'too-hard',
  message,
  span: spanOf(text, from, to),
  limit,
});

/** The fault of a species text beyond the limits, or null: `too-long` for length and digits, else `too-hard`. */
export const overLimit = (text: string): Fault | null => {
  if (text.length > LIMITS.speciesLength) {
    const message = `a species has at most ${String(LIMITS.speciesLength)} characters`;
    return { code: 'too-long', message, span: wholeSpan(text), hint: 'split the text into species' };
  }
  const digits = DIGITS.exec(text);
  if (digits !== null) {
    const message = `a number has at most ${String(LIMITS.digits)} digits`;
    return { code: 'too-long', message, span: spanOf(text, digits.index, digits.index + digits[0].length) };
  }
  const { depth, at } = nestingOf(text);
  if (depth > LIMITS.nesting)
    return tooHard(text, `brackets nest at most ${String(LIMITS.nesting)} deep`, at, at + 1, 'nesting');
  const periods = [...text.matchAll(DOUBTFUL_PERIOD)];
  const surplus = periods[LIMITS.doubtfulPeriods];
  if (surplus === undefined) return null;
  const message = 'too many periods that can be a decimal point or the dot of an adduct';
  return {
    ...tooHard(text, message, surplus.index, surplus.index + surplus[0].length, 'readings'),
    hint: 'write the dot of an adduct as *',
  };
};
