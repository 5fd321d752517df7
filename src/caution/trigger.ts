import type { Result } from '../report/result.ts';
import { type SpeciesReading, readSpecies } from '../species/read.ts';
import type { Species } from '../species/species.ts';

/** What a caution can ask of the species of a cell: where one stands. */
export type Place = 'any' | 'with' | 'reactant' | 'product' | 'anode' | 'cathode' | 'anode_product' | 'cathode_product';

/** A trigger taken apart: every list is a choice (or), all that are there must hold (and). */
export interface Trigger {
  readonly places: readonly { readonly place: Place; readonly species: readonly Species[] }[];
  readonly elements: readonly string[];
  readonly media: readonly string[];
  readonly modes: readonly string[];
  readonly conditions: readonly string[];
}

const PLACES: readonly string[] = [
  'any',
  'with',
  'reactant',
  'product',
  'anode',
  'cathode',
  'anode_product',
  'cathode_product',
] satisfies readonly Place[];

const isPlace = (key: string): key is Place => PLACES.includes(key);

/** A table that cannot be read is a broken program, not a fault of the ask. */
const speciesOf = (text: string): Species => {
  const reading: Result<SpeciesReading> = readSpecies(text);
  if (!reading.ok) throw new Error(`caution table: ${text}: ${reading.fault.message}`);
  return reading.value.species;
};

/** The trigger of a row's text. The grammar stands at `CautionRow.trigger`. */
export const parseTrigger = (text: string): Trigger => {
  const clauses = text.split(';').map((clause) => {
    const [key = '', values = ''] = clause.split(/=(.*)/s);
    return { key, values: values.split('|') };
  });
  const valuesOf = (key: string): readonly string[] => clauses.find((clause) => clause.key === key)?.values ?? [];
  return {
    places: clauses.flatMap(({ key, values }) =>
      isPlace(key) ? [{ place: key, species: values.map(speciesOf) }] : [],
    ),
    elements: valuesOf('element'),
    media: valuesOf('medium'),
    modes: valuesOf('mode'),
    conditions: valuesOf('condition'),
  };
};
