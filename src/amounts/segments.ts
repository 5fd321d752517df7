import { type Rational } from '../exact/rational.ts';
import { type Result, failure, success } from '../report/result.ts';
import { spanOf } from '../report/span.ts';
import { type NumberFault, type WrittenNumber, MOST_DIGITS, NUMBER_PATTERN, numberFromMatch } from './number.ts';

/** A number and its unit inside a quantity text; places are UTF-16 offsets. */
export interface Segment {
  readonly number: WrittenNumber;
  readonly unitText: string;
  readonly at: number;
  readonly unitAt: number;
  readonly end: number;
}

/** A unit after its number: a unit of time straight before the next digit (1h30min), else up to the next number. */
const UNIT_TEXT = /\s*(?:(min|d|h|s)(?=\d)|(.*?)(?=\s+[+−-]?\.?\d|$))\s*/uy;

const HOW_TO_WRITE = 'Write a number and its unit, as in 250 A, 1 h 30 min, 96 %, 2.000(4) A or 2.000 A ± 0.004 A.';
const DECIMAL_POINT = 'Write the decimal sign as a point and separate thousands by blanks: 1 250.5 A.';

/** `bad-ask` for a part of a text that is no quantity: UTF-16 offsets, and in words what is wrong where that is known. */
export const badNumber = (text: string, from: number, to: number, message = 'this is no quantity'): Result<never> =>
  failure({
    code: 'bad-ask',
    message,
    span: spanOf(text, from, to),
    hint: /\d,\d/u.test(text) ? DECIMAL_POINT : HOW_TO_WRITE,
  });

const WHY: Readonly<Record<NumberFault, string | undefined>> = {
  'no-digits': undefined,
  'too-many-digits': `a number may have at most ${String(MOST_DIGITS)} digits`,
  'out-of-range': `nothing measured is so large or small: powers of ten from -${String(MOST_DIGITS)} to ${String(MOST_DIGITS)} are read`,
  'two-uncertainties': 'this number has two uncertainties',
};

/** What brackets after a number hold where it is no number of digits:  100.0(-2) C */
const ODD_BRACKETS = /^\(\s*[+−-]?[\d.]/u;

/**
 * One segment from offset `at`.   1 h 30 min
 *                                     ^      */
const segmentAt = (text: string, view: string, at: number): Result<Segment> => {
  NUMBER_PATTERN.lastIndex = at;
  const match = NUMBER_PATTERN.exec(view);
  const number = match === null ? 'no-digits' : numberFromMatch(match);
  if (match === null || typeof number === 'string')
    return badNumber(text, at, view.length, WHY[typeof number === 'string' ? number : 'no-digits']);
  const after = at + match[0].length;
  UNIT_TEXT.lastIndex = after;
  const unit = UNIT_TEXT.exec(view);
  const unitText = (unit?.[1] ?? unit?.[2] ?? '').trim();
  if (/^[,;]/u.test(unitText)) return badNumber(text, at, view.length);
  if (ODD_BRACKETS.test(unitText))
    return badNumber(
      text,
      at,
      view.length,
      'brackets after a number hold its uncertainty: the digits of the last places',
    );
  const unitAt = view.indexOf(unitText, after);
  return success({ number, unitText, at, unitAt, end: after + (unit?.[0].length ?? 0) });
};

const isNegative = (value: Rational): boolean => value.compare(0) < 0;

/** A sign before the first part holds for the whole, -1 h 30 min; no other part has one, and one has an uncertainty. */
const asSum = (text: string, segments: readonly Segment[]): Result<readonly Segment[]> => {
  const [first, ...others] = segments;
  const turned = others.find(({ number }) => isNegative(number.value));
  if (turned !== undefined)
    return badNumber(
      text,
      turned.at,
      turned.end,
      'a part of a sum cannot be negative: the sign stands before the whole',
    );
  const uncertain = segments.filter(({ number }) => number.uncertainty !== null);
  const second = uncertain[1];
  if (second !== undefined) return badNumber(text, second.at, second.end, WHY['two-uncertainties']);
  if (first === undefined || !isNegative(first.number.value)) return success(segments);
  const negated = others.map((one) => ({ ...one, number: { ...one.number, value: one.number.value.neg() } }));
  return success([first, ...negated]);
};

/** The segments of `view`, which is `text` with blanks where something else was read: every offset stays. */
export const segmentsOf = (text: string, view = text): Result<readonly Segment[]> => {
  const segments: Segment[] = [];
  let at = view.length - view.trimStart().length;
  do {
    const segment = segmentAt(text, view, at);
    if (!segment.ok) return segment;
    segments.push(segment.value);
    at = segment.value.end;
  } while (at < view.length);
  return asSum(text, segments);
};
