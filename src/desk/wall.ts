import { QUANTITIES } from '../amounts/quantities.ts';
import { readQuantity } from '../amounts/quantity.ts';
import { type WallConditions, type WallRow, wallTable } from '../amounts/wall-table.ts';
import type { Fault } from '../report/fault.ts';
import type { Note } from '../report/note.ts';
import { type Result, all, chain, inField, map, success } from '../report/result.ts';
import { readSpecies } from '../species/read.ts';
import type { Species } from '../species/species.ts';
import { readCircuit } from './amounts.ts';
import { cautionsOfCircuits } from './cautions.ts';
import type { DeskOptions } from './hydronium.ts';
import type { Ask, AskedMedium } from './schema/ask.ts';
import type { ShownCaution } from './schema/shape.ts';
import { readSettings } from './settings.ts';

/** A half-reaction of the table; without a species every product makes a row. */
export interface WallLine {
  readonly half: string;
  readonly species?: string;
}

/** How the half-reactions of a table are read, and at what conditions gas is counted. */
export interface WallSettings extends Pick<Ask, 'where' | 'define' | 'strict'> {
  readonly medium?: AskedMedium | undefined;
  readonly conditions: WallConditions;
}

/** The rows that one line makes, with what must be known of them; or its fault. */
export type WallEntryAnswer = WallLine &
  (
    | { readonly rows: readonly WallRow[]; readonly notes: readonly Note[]; readonly cautions: readonly ShownCaution[] }
    | { readonly fault: Fault }
  );

const speciesOf = ({ species }: WallLine, options: DeskOptions): Result<Species | null> =>
  species === undefined
    ? success(null)
    : map(inField(readSpecies(species, options), 'species'), ({ species: one }) => one);

type Rows = Omit<Extract<WallEntryAnswer, { readonly rows: unknown }>, 'half' | 'species' | 'notes'>;

const rowsOf = (line: WallLine, { medium, conditions }: WallSettings, options: DeskOptions): Result<Rows> =>
  chain(readCircuit({ half: line.half, medium }, options), (circuit) =>
    chain(speciesOf(line, options), (species) => {
      if (circuit.kind !== 'half') throw new RangeError('a half-reaction became something else');
      const entry = species === null ? circuit.half : { ...circuit.half, species };
      return map(wallTable([entry], conditions), (rows) => ({
        rows,
        cautions: cautionsOfCircuits([{ circuit, divided: null }]),
      }));
    }),
  );

const readConditions = ({ temperature, pressure }: WallConditions): Result<unknown> =>
  all([
    inField(readQuantity(temperature, QUANTITIES.temperature), 'temperature'),
    inField(readQuantity(pressure, QUANTITIES.pressure), 'pressure'),
  ]);

/**
 * The table for the wall: electrons, charge, mass and gas of each half-reaction. One line at fault does not lose the
 * others. Faults of the whole: those of `where`, `define`, `temperature` and `pressure`.
 */
export const answerWall = (lines: readonly WallLine[], settings: WallSettings): Result<readonly WallEntryAnswer[]> =>
  chain(readSettings(settings), (options) =>
    map(readConditions(settings.conditions), () =>
      lines.map((line) => {
        const found = rowsOf(line, settings, options);
        return found.ok ? { ...line, ...found.value, notes: found.notes } : { ...line, fault: found.fault };
      }),
    ),
  );
