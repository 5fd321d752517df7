import type { Species } from '../species/species.ts';

/** Ions and common substances that a mistyped species may have been meant to be. */
export const knownSpecies = (): readonly Species[] => [];
