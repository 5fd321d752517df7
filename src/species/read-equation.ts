import { type Place, arrowsIn, pointsLeft, startsOf } from '../notation/arrows.ts';
import { type SpanOfPlace, spansIn } from '../notation/code-points.ts';
import { coefficientOf } from '../notation/coefficient.ts';
import { LIMITS } from '../notation/limits.ts';
import { faultAt } from '../notation/place.ts';
import { placementsOf } from '../notation/terms.ts';
import { isBlank, trimPlace } from '../notation/spaces.ts';
import type { Fault } from '../report/fault.ts';
import { type Result, all, chain, failure, map, success } from '../report/result.ts';
import { codePointsBefore, shiftSpan, spanOf, wholeSpan } from '../report/span.ts';
import type { Equation, EquationTerm } from './equation.ts';
import { type ReadingOptions, readSpecies, spells } from './read-species.ts';

/** A fault seen from the whole text, where its part begins at UTF-16 offset `from`. */
const shifted = (fault: Fault, text: string, from: number): Fault =>
  fault.span === undefined ? fault : { ...fault, span: shiftSpan(fault.span, codePointsBefore(text, from)) };

/** True where the text is a term: a coefficient, if any, and something that parses as a species. */
const readsAsTerm =
  (options: ReadingOptions) =>
  (part: string): boolean => {
    const { from, to } = trimPlace(part, { from: 0, to: part.length });
    const term = part.slice(from, to);
    if (term === '' || term.startsWith('+')) return false;
    const coefficient = coefficientOf(term, options.where ?? new Map());
    if (!coefficient.ok) return coefficient.fault.code === 'bad-count';
    return spells(term.slice(coefficient.value.length), options);
  };

const missingTerm = (text: string, place: Place): Fault => {
  const at = place.from > 0 && text[place.from - 1] === '+' ? place.from - 1 : Math.min(place.to, text.length - 1);
  return faultAt(
    text,
    'empty-side',
    { from: at, to: at + 1 },
    'a species is missing beside this plus sign',
    'write it or leave the plus out',
  );
};

const missingSpecies = (text: string, coefficient: Place): Fault =>
  faultAt(text, 'empty-side', coefficient, 'a species is missing behind this number', 'write what is counted');

const readTerm = (
  text: string,
  place: Place,
  spanOfPlace: SpanOfPlace,
  options: ReadingOptions,
): Result<EquationTerm> => {
  const { from, to } = trimPlace(text, place);
  if (from === to) return failure(missingTerm(text, place));
  const term = text.slice(from, to);
  const coefficient = coefficientOf(term, options.where ?? new Map());
  if (!coefficient.ok) return failure(shifted(coefficient.fault, text, from));
  const { value, length } = coefficient.value;
  if (length === term.length) return failure(missingSpecies(text, { from, to }));
  const reading = readSpecies(term.slice(length), options);
  if (!reading.ok) return failure(shifted(reading.fault, text, from + length));
  return success(
    {
      coefficient: value,
      coefficientWritten: length > 0,
      species: reading.value.species,
      span: spanOfPlace({ from, to }),
    },
    reading.notes,
  );
};

const severalPlacements = (text: string, side: Place, ways: readonly (readonly Place[])[]): Fault => {
  const readings = ways.map((way) =>
    way.map(({ from, to }) => text.slice(side.from + from, side.from + to).trim()).join(' + '),
  );
  return {
    code: 'several-readings',
    message: `the plus signs can be placed in more than one way: ${readings.join(', or ')}`,
    span: spanOf(text, side.from, side.to),
    hint: 'put spaces around the plus signs that separate, and carets before charges',
    readings,
  };
};

const readSide = (
  text: string,
  place: Place,
  arrow: Place,
  options: ReadingOptions,
): Result<readonly EquationTerm[]> => {
  const side = trimPlace(text, place);
  if (side.from === side.to)
    return failure(
      faultAt(text, 'empty-side', arrow, 'a side of the equation is empty', 'write at least one species on each side'),
    );
  const ways = placementsOf(text.slice(side.from, side.to), readsAsTerm(options));
  if (ways === 'too-many') {
    const message = 'too many plus signs stand without spaces';
    return failure({
      code: 'too-hard',
      message,
      span: spanOf(text, side.from, side.to),
      hint: 'put spaces around the plus signs that separate',
      limit: 'readings',
    });
  }
  const [way = []] = ways;
  if (ways.length > 1) return failure(severalPlacements(text, side, ways));
  const spanOfPlace = spansIn(text);
  return all(
    way.map(({ from, to }) => readTerm(text, { from: side.from + from, to: side.from + to }, spanOfPlace, options)),
  );
};

/** Beginnings of the arrow with which the term before it reads; all of them where none does. */
const startsThatRead = (text: string, arrow: Place, options: ReadingOptions): readonly number[] => {
  const starts = startsOf(text, arrow);
  if (starts.length === 1) return starts;
  const reads = readsAsTerm(options);
  const fitting = starts.filter((start) => {
    const ways = placementsOf(text.slice(0, start), reads);
    const last = ways === 'too-many' ? undefined : ways[0]?.at(-1);
    return last !== undefined && reads(text.slice(last.from, last.to));
  });
  return fitting.length === 0 ? starts.slice(0, 1) : fitting;
};

const doubtfulArrow = (text: string, arrow: Place, starts: readonly number[]): Fault => {
  const right = text.slice(arrow.to).trim();
  const readings = starts.map((start) => `${text.slice(0, start).trim()} -> ${right}`);
  return {
    code: 'several-readings',
    message: 'a dash here can be a charge or belong to the arrow',
    span: spanOf(text, arrow.from, arrow.to),
    hint: 'put a space before the arrow',
    readings,
  };
};

const noArrow = (text: string): Fault => ({
  code: 'no-arrow',
  message: pointsLeft(text) ? 'the arrow points to the left' : 'no arrow stands between two sides',
  span: wholeSpan(text),
  hint: pointsLeft(text) ? 'write the reactants on the left and -> between the sides' : 'write -> between the sides',
});

const findArrow = (text: string, options: ReadingOptions): Result<Place> => {
  const [arrow, second] = arrowsIn(text);
  if (arrow === undefined) return failure(noArrow(text));
  if (second !== undefined)
    return failure(
      faultAt(
        text,
        'no-arrow',
        second,
        'an equation has one arrow; this is a second',
        'write each step as an equation of its own',
      ),
    );
  const starts = startsThatRead(text, arrow, options);
  const [from = arrow.from] = starts;
  return starts.length > 1 ? failure(doubtfulArrow(text, arrow, starts)) : success({ from, to: arrow.to });
};

/**
 * The equation or skeleton that `text` spells, as written. Notes: those of its species. Faults: the codes of reading,
 * with spans in code points of `text`; `several-readings` also for plus signs and dashes that fit in two ways.
 */
export const readEquation = (text: string, options: ReadingOptions = {}): Result<Equation> => {
  if (text.length > LIMITS.equationLength) {
    const message = `an equation has at most ${String(LIMITS.equationLength)} characters`;
    return failure({ code: 'too-long', message, span: wholeSpan(text), hint: 'ask for one reaction at a time' });
  }
  if (isBlank(text)) return failure({ code: 'empty', message: 'nothing is written', span: { from: 0, to: 0 } });
  return chain(findArrow(text, options), (arrow) =>
    chain(readSide(text, { from: 0, to: arrow.from }, arrow, options), (left) =>
      map(readSide(text, { from: arrow.to, to: text.length }, arrow, options), (right) => ({ text, left, right })),
    ),
  );
};
