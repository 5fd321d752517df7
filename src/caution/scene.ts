import type { Medium } from '../redox/medium.ts';
import type { Species } from '../species/species.ts';

/** A medium as the cautions see it. */
export type CautionMedium = 'acid' | 'base' | 'neutral' | 'molten' | 'nonaqueous';

/** What drives the current. */
export type CautionMode = 'electrolysis' | 'galvanic' | 'charging';

/** Species on the two sides of one or more reactions. */
export interface Sides {
  readonly reactants: readonly Species[];
  readonly products: readonly Species[];
}

/** What runs: the species by where they stand, and what else is known. null: the ask does not say. */
export interface Scene {
  readonly anode: Sides;
  readonly cathode: Sides;
  /** Reactants and products of the overall reaction, or of a lone half-reaction. */
  readonly overall: Sides;
  /** Species that are there and take no part. */
  readonly present?: readonly Species[];
  /** The media there are, or that there may be; empty where nothing is known. */
  readonly media: readonly CautionMedium[];
  readonly mode: CautionMode | null;
  /** True where something keeps the two electrodes apart. */
  readonly divided: boolean | null;
}

/** The media of water. */
export const WATER_MEDIA: readonly CautionMedium[] = ['acid', 'base', 'neutral'];

/** True for a medium that holds water whether or not a reaction uses it. */
export const isWatery = (medium: CautionMedium): boolean => WATER_MEDIA.includes(medium);

/** A built-in medium in the words of the cautions; undefined for `none`, which may be anything. */
const named = (name: string): CautionMedium | undefined => {
  if (name === 'acid' || name === 'base' || name === 'neutral') return name;
  if (name === 'bicarbonate') return 'neutral';
  if (name === 'ammonia') return 'nonaqueous';
  return name.startsWith('molten-') ? 'molten' : undefined;
};

/** What the species themselves say: H^+ stands in acid, OH^- in base, water or (aq) in one of the three. */
const toldBy = (species: readonly Species[]): readonly CautionMedium[] => {
  const has = (...keys: readonly string[]): boolean => species.some(({ key }) => keys.includes(key));
  const acid = has('H^+', 'H3O^+');
  const base = has('OH^-');
  if (acid !== base) return [acid ? 'acid' : 'base'];
  return acid || species.some(({ key, state }) => state === 'aq' || (key === 'H2O' && state !== 'g'))
    ? WATER_MEDIA
    : [];
};

/**
 * The media that a reaction with these species may stand in: the one its medium names; else what helpers and species
 * tell (common practice, no source); none where nothing does. `medium` is null where no medium was read at all.
 */
export const mediaOf = (medium: Medium | null, species: readonly Species[]): readonly CautionMedium[] => {
  const known = named(medium?.name ?? 'none');
  return known === undefined ? toldBy([...(medium?.helpers ?? []), ...species]) : [known];
};
