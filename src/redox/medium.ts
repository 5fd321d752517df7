import type { Species } from '../species/species.ts';

/** The names of the built-in media. */
export type MediumName =
  | 'acid'
  | 'base'
  | 'neutral'
  | 'none'
  | 'molten-chloride'
  | 'molten-oxide'
  | 'molten-carbonate'
  | 'molten-fluoride'
  | 'molten-nitride'
  | 'ammonia'
  | 'bicarbonate';

/** A medium: helper species that may appear on either side. `name` is null for a list of the user's. */
export interface Medium {
  readonly name: MediumName | null;
  readonly helpers: readonly Species[];
}
