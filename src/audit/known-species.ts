import { KNOWN_IONS } from '../species/ions.ts';
import { readSpecies } from '../species/read.ts';
import type { Species } from '../species/species.ts';
import { COMMON_IONS, COMMON_SUBSTANCES, RARE_SPECIES } from './common-substances.ts';

const wordsOf = (text: string): readonly string[] => text.split(/\s+/u).filter((word) => word !== '');

const readAll = (spellings: readonly string[]): readonly Species[] =>
  spellings.flatMap((spelling) => {
    const reading = readSpecies(spelling);
    return reading.ok ? [reading.value.species] : [];
  });

/** Ions and substances of everyday electrode reactions, read from their tables. */
export const commonSpecies = (): readonly Species[] =>
  readAll([...wordsOf(COMMON_IONS), ...wordsOf(COMMON_SUBSTANCES)]);

/** Keys of real species that are seldom meant where they are written: atoms, radicals, the rest of the known ions. */
export const rareSpellings = (): ReadonlySet<string> => new Set([...KNOWN_IONS, ...wordsOf(RARE_SPECIES)]);
