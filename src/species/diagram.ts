import type { Place } from '../notation/arrows.ts';
import { type WithConcentration, cutConcentration } from '../notation/concentration.ts';
import { LIMITS } from '../notation/limits.ts';
import { faultAt } from '../notation/place.ts';
import { type DiagramPiece, diagramPieces } from '../notation/split-diagram.ts';
import { isBlank, trimPlace } from '../notation/spaces.ts';
import type { Fault } from '../report/fault.ts';
import { note } from '../report/note.ts';
import { type Result, all, chain, failure, map, success, withNotes } from '../report/result.ts';
import { codePointsBefore, shiftSpan, wholeSpan } from '../report/span.ts';
import { type ReadingOptions, readSpecies } from './read-species.ts';
import type { Species } from './species.ts';

/** A cell diagram: phases from the left terminal to the right one, each with its species in the order written. */
export interface Diagram {
  readonly text: string;
  /** Left of the bridge; all phases where there is none. */
  readonly left: readonly (readonly Species[])[];
  /** Right of the bridge; empty where there is none. */
  readonly right: readonly (readonly Species[])[];
  /** False where one electrolyte touches both electrodes. */
  readonly bridge: boolean;
}

/** Species places, phase by phase. */
type Phase = readonly Place[];

/** The faults of a part that begins at `from`, seen from the whole text. */
const shifted = (fault: Fault, text: string, from: number, to: number): Fault => {
  if (fault.span === undefined) return fault;
  const span = shiftSpan(fault.span, codePointsBefore(text, from));
  return { ...fault, span: { from: span.from, to: Math.min(span.to, codePointsBefore(text, to)) } };
};

const readPlace = (text: string, place: Place, options: ReadingOptions): Result<Species> => {
  const part = text.slice(place.from, place.to);
  const { formula, state, concentration }: WithConcentration = cutConcentration(part);
  const reading = readSpecies(part.slice(formula.from, formula.to) + state, options);
  if (!reading.ok) return failure(shifted(reading.fault, text, place.from, place.to));
  const ignored =
    concentration === null
      ? []
      : [note('concentration-ignored', `${concentration} of ${part.slice(formula.from, formula.to)} was ignored`)];
  return withNotes(
    map(reading, ({ species }) => species),
    ignored,
  );
};

const missing = (text: string, pieces: readonly DiagramPiece[], index: number): Fault => {
  const beside = pieces[index - 1] ?? pieces[index + 1];
  const place = beside?.place ?? { from: 0, to: text.length };
  return faultAt(
    text,
    'empty-side',
    place,
    'a species is missing beside this',
    'write a species between two separators',
  );
};

interface Sides {
  readonly sides: readonly (readonly Phase[])[];
}

/** Species gathered into phases, phases into sides. */
const gather = (text: string, pieces: readonly DiagramPiece[]): Sides => {
  const sides: Place[][][] = [[[]]];
  for (const piece of pieces) {
    if (piece.kind === 'bridge') sides.push([[]]);
    if (piece.kind === 'boundary') sides.at(-1)?.push([]);
    if (piece.kind === 'species') sides.at(-1)?.at(-1)?.push(trimPlace(text, piece.place));
  }
  return { sides };
};

const readSide = (
  text: string,
  side: readonly Phase[],
  options: ReadingOptions,
): Result<readonly (readonly Species[])[]> =>
  all(side.map((phase) => all(phase.map((place) => readPlace(text, place, options)))));

const checkPieces = (text: string, pieces: readonly DiagramPiece[]): Fault | null => {
  const empty = pieces.findIndex(({ kind, place }) => kind === 'species' && isBlank(text.slice(place.from, place.to)));
  if (empty >= 0) return missing(text, pieces, empty);
  const bridges = pieces.filter(({ kind }) => kind === 'bridge');
  const second = bridges[1];
  if (second !== undefined)
    return faultAt(
      text,
      'bad-ask',
      second.place,
      'a cell has one salt bridge; this is a second',
      'describe one cell at a time',
    );
  if (pieces.some(({ kind }) => kind === 'bridge' || kind === 'boundary')) return null;
  return {
    code: 'bad-ask',
    message: 'no phase boundary stands in this diagram',
    span: wholeSpan(text),
    hint: 'write the phases from the anode to the cathode, as Zn | Zn^2+ || Cu^2+ | Cu',
  };
};

/**
 * The cell diagram that `text` spells. Notes: `concentration-ignored` and those of its species. Faults: the codes of
 * reading with spans in code points of `text`; `empty-side` where a species is missing; `bad-ask` for no phase boundary
 * or a second bridge.
 */
export const readDiagram = (text: string, options: ReadingOptions = {}): Result<Diagram> => {
  if (text.length > LIMITS.equationLength) {
    const message = `a diagram has at most ${String(LIMITS.equationLength)} characters`;
    return failure({ code: 'too-long', message, span: wholeSpan(text), hint: 'describe one cell at a time' });
  }
  if (isBlank(text)) return failure({ code: 'empty', message: 'nothing is written', span: { from: 0, to: 0 } });
  const pieces = diagramPieces(text);
  const fault = checkPieces(text, pieces);
  if (fault !== null) return failure(fault);
  const { sides } = gather(text, pieces);
  return chain(all(sides.map((side) => readSide(text, side, options))), ([left = [], right = []]) =>
    success({ text, left, right, bridge: sides.length > 1 }),
  );
};
