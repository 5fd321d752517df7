import { isZero } from '../exact/rational.ts';
import { dissolvedIons } from '../redox/split/dissolve.ts';
import { ionsOfSalt } from '../redox/split/salt.ts';
import type { Species } from '../species/species.ts';

/** True for an ion, for what is dissolved, and for a salt, acid or base that dissolves or is molten. */
export const isElectrolyte = (species: Species): boolean =>
  !isZero(species.charge) || species.state === 'aq' || dissociate(species) !== null;

/**
 * The ions of a dissolved or molten salt, acid or base; null for anything else. Where no state is written, rules of
 * solubility say whether it is dissolved: AgCl is not, KCl is.
 */
export const dissociate = (species: Species): readonly Species[] | null => {
  const { state } = species;
  const ions = state === null ? dissolvedIons(species) : state === 'aq' || state === 'l' ? ionsOfSalt(species) : null;
  return ions?.map((portion) => portion.species) ?? null;
};
