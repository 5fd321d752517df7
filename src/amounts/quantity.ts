import { type Rational, ONE, ZERO, isZero, rationalFromText } from '../exact/rational.ts';
import { type Note, note } from '../report/note.ts';
import { type Result, chain, failure, success, withNotes } from '../report/result.ts';
import { type Span, shiftSpan, spanOf, wholeSpan } from '../report/span.ts';
import { type Dimension, NUMBER, TEMPERATURE, sameDimension } from './dimension.ts';
import { toFloat } from './number.ts';
import { type Segment, badNumber, segmentsOf } from './segments.ts';
import { type UnitValue, readUnitText } from './unit-expression.ts';

/** What a quantity text may measure: its name in faults, the dimensions it may have, a unit to propose. */
export interface Measurand {
  readonly name: string;
  readonly dimensions: readonly Dimension[];
  readonly example: string;
  /** True where a number without a unit says enough: 0.96. */
  readonly bare?: true;
}

/** A quantity as read: SI base units throughout; a temperature in kelvins. */
export interface ReadQuantity {
  readonly exact: Rational;
  readonly value: number;
  /** Standard uncertainty; 0 where none is written. */
  readonly uncertainty: number;
  /** One unit in the last written digit. */
  readonly lastDigit: number;
  readonly dimension: Dimension;
}

const LONGEST = 200;
const PLUS_MINUS = /±|\+\/[-−]|\+-/u;

const wrongUnit = (measurand: Measurand, unitText: string, span: Span): Result<never> =>
  failure({
    code: 'unknown-unit',
    message:
      unitText === '' ? `the unit of ${measurand.name} is missing` : `${unitText} is no unit of ${measurand.name}`,
    span,
    hint: `Give it in ${measurand.example}.${unitText === 'C' ? ' Degrees Celsius are written °C.' : ''}`,
  });

/** A bare zero is zero in every unit but on a temperature scale. */
const bareUnit = (measurand: Measurand, { number }: Segment, alone: boolean): UnitValue | undefined => {
  const [dimension = NUMBER] = measurand.dimensions;
  if (measurand.bare === true) return { dimension: NUMBER, factor: ONE, offset: ZERO };
  if (!alone || !isZero(number.value) || sameDimension(dimension, TEMPERATURE)) return undefined;
  return { dimension, factor: ONE, offset: ZERO };
};

const fits = (measurand: Measurand, unit: UnitValue): boolean =>
  measurand.dimensions.some((dimension) => sameDimension(dimension, unit.dimension));

const looseNote = (unitText: string): Note =>
  note('unit-reading', `${unitText} was read as one quotient: everything after the slash divides`);
const ppmNote = (unitText: string): Note => note('unit-reading', `${unitText} was read as a mass fraction, mg/kg`);

/** The unit of a segment in the sense that fits the measurand; `at` is its place in `whole`. */
const unitFor = (measurand: Measurand, unitText: string, whole: string, at: number): Result<UnitValue> => {
  const span = spanOf(whole, at, at + unitText.length);
  const readings = readUnitText(unitText);
  if (!readings.ok) {
    const inner = readings.fault.span;
    return failure({ ...readings.fault, span: inner === undefined ? span : shiftSpan(inner, span.from) });
  }
  const index = readings.value.findIndex((unit) => fits(measurand, unit));
  const unit = readings.value[index];
  if (unit === undefined) return wrongUnit(measurand, unitText, span);
  const notes = [...(index > 0 ? [looseNote(unitText)] : []), ...(unitText === 'ppm' ? [ppmNote(unitText)] : [])];
  return success(unit, notes);
};

const inUnit = (value: Rational, unit: UnitValue): Rational => value.mul(unit.factor).add(unit.offset);

interface Sum {
  readonly exact: Rational;
  readonly uncertainty: Rational;
  readonly lastDigit: Rational;
  readonly unit: UnitValue;
  readonly unitText: string;
  /** The value as written, for a percentage of the reading. */
  readonly reading: Rational;
}

/** The unit of a segment: its own, the one borrowed from after ±, or none where a bare number says enough. */
const segmentUnit = (
  measurand: Measurand,
  text: string,
  segment: Segment,
  alone: boolean,
  borrowed: string,
): Result<UnitValue> => {
  const own = segment.unitText !== '';
  const written = own ? segment.unitText : borrowed;
  if (written !== '') return unitFor(measurand, written, text, own ? segment.unitAt : segment.at);
  const bare = bareUnit(measurand, segment, alone);
  return bare === undefined ? wrongUnit(measurand, '', wholeSpan(text)) : success(bare);
};

const addSegment = (sum: Sum | undefined, { number }: Segment, unit: UnitValue, unitText: string): Sum => {
  const exact = inUnit(number.value, unit);
  return {
    exact: sum === undefined ? exact : sum.exact.add(exact),
    uncertainty: number.uncertainty?.mul(unit.factor) ?? sum?.uncertainty ?? ZERO,
    lastDigit: number.lastDigit.mul(unit.factor),
    unit,
    unitText,
    reading: sum === undefined ? number.value.mul(unit.factor) : sum.exact.add(exact),
  };
};

/** Only like adds to like, `1 h 30 min`, and degrees on a scale do not add at all. */
const addsUp = (sum: Sum | undefined, unit: UnitValue): boolean =>
  sum === undefined || (sameDimension(sum.unit.dimension, unit.dimension) && isZero(unit.offset));

/** The sum of the segments; a unit that is missing is `borrowed` from after ±. */
const sumOf = (measurand: Measurand, text: string, segments: readonly Segment[], borrowed: string): Result<Sum> => {
  let sum: Sum | undefined;
  const notes: Note[] = [];
  for (const segment of segments) {
    const unit = segmentUnit(measurand, text, segment, segments.length === 1, borrowed);
    if (!unit.ok) return unit;
    if (!addsUp(sum, unit.value)) return badNumber(text, segment.at, segment.end);
    notes.push(...unit.notes);
    sum = addSegment(sum, segment, unit.value, segment.unitText === '' ? borrowed : segment.unitText);
  }
  return sum === undefined ? badNumber(text, 0, text.length) : success(sum, notes);
};

const PERCENT = new Set(['%', 'percent', 'pct']);

/** The size of `± …` in SI units: percent of the reading, or percentage points where the value is a percentage. */
const spreadOf = (measurand: Measurand, sum: Sum, text: string, right: Segment): Result<Rational> => {
  const { number, unitText, unitAt } = right;
  if (unitText === '') return success(number.value.mul(sum.unit.factor));
  const percentage = PERCENT.has(sum.unitText);
  if (PERCENT.has(unitText) && !percentage)
    return success(sum.reading.mul(number.value).mul(rationalFromText('0.01')).abs());
  const unit = unitFor(measurand, unitText, text, unitAt);
  return chain(unit, ({ factor }) => success(number.value.mul(factor)));
};

const readSpread = (measurand: Measurand, text: string, at: number, length: number): Result<Sum> => {
  const opened = /^\s*\(/u.exec(text.slice(0, at))?.[0].length ?? 0;
  const closing = opened > 0 ? text.indexOf(')', at) : -1;
  // Blanks take the place of what is read elsewhere, so that every offset stays that of the whole text.
  const blank = (from: number, to: number, of: string): string =>
    of.slice(0, from) + ' '.repeat(to - from) + of.slice(to);
  const bare = closing < 0 ? text : blank(closing, closing + 1, blank(0, opened, text));
  const right = segmentsOf(text, blank(0, at + length, bare));
  const left = segmentsOf(text, bare.slice(0, at));
  if (!left.ok) return left;
  if (!right.ok) return right;
  const [spread, more] = right.value;
  if (spread === undefined || more !== undefined) return badNumber(text, at, text.length);
  if (spread.number.value.compare(0) < 0)
    return badNumber(text, spread.at, spread.end, 'an uncertainty cannot be negative');
  if ([...left.value, spread].some(({ number }) => number.uncertainty !== null))
    return badNumber(text, 0, text.length, 'this number has two uncertainties');
  const sum = sumOf(measurand, text, left.value, spread.unitText);
  if (!sum.ok) return sum;
  const size = spreadOf(measurand, sum.value, text, spread);
  return size.ok ? withNotes(success({ ...sum.value, uncertainty: size.value }), sum.notes) : size;
};

/** A part of a whole as a fraction: 24/25. */
const FRACTION = /^\s*-?\d{1,60}\/0*[1-9]\d{0,59}\s*$/u;

const fractionOf = (text: string): Sum => {
  const exact = rationalFromText(text);
  const unit = { dimension: NUMBER, factor: ONE, offset: ZERO };
  return { exact, uncertainty: ZERO, lastDigit: ZERO, unit, unitText: '', reading: exact };
};

const readSum = (measurand: Measurand, text: string): Result<Sum> => {
  if (text.trim() === '')
    return failure({
      code: 'empty',
      message: `${measurand.name} is empty`,
      span: wholeSpan(text),
      hint: 'Give it a value.',
    });
  if (text.length > LONGEST)
    return failure({ code: 'too-long', message: 'this is too long for a quantity', span: wholeSpan(text) });
  if (measurand.bare === true && FRACTION.test(text)) return success(fractionOf(text.trim()));
  const sign = PLUS_MINUS.exec(text);
  if (sign !== null) return readSpread(measurand, text, sign.index, sign[0].length);
  return chain(segmentsOf(text), (segments) => sumOf(measurand, text, segments, ''));
};

/**
 * Reads a quantity text: "250 A", "1 h 30 min", "96 %", "2.000(4) A", "2.000 A ± 0.004 A", "(2.000 ± 0.004) A",
 * "2 A ± 1 %", and "24/25" for a part of a whole. What follows ± is one standard uncertainty: percentage points on a percentage, a fraction of the reading
 * elsewhere, kelvins on °C. Notes: `unit-reading`. Faults, each with its place in the text: `empty`, `too-long`,
 * `bad-ask` (no quantity), `unknown-unit` (no unit, an unknown one, one with several meanings, or of another dimension).
 */
export const readQuantity = (text: string, measurand: Measurand): Result<ReadQuantity> =>
  chain(readSum(measurand, text), ({ exact, uncertainty, lastDigit, unit }) =>
    success({
      exact,
      value: toFloat(exact),
      uncertainty: toFloat(uncertainty),
      lastDigit: toFloat(lastDigit),
      dimension: unit.dimension,
    }),
  );

/** The unit that `want` names for a measurand. Faults as `readQuantity`. */
export const readWantedUnit = (text: string, measurand: Measurand): Result<UnitValue> =>
  unitFor(measurand, text.trim(), text, text.length - text.trimStart().length);
