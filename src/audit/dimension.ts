import { speciesMatrix } from '../balance/matrix.ts';
import { rankOf } from '../exact/matrix.ts';
import { sameSpecies } from '../species/species.ts';
import type { Draft } from './writing.ts';

/** Distinct written species minus the rank of their elements and charges: how many balances are free. */
export const dimensionOf = (draft: Draft): number => {
  const distinct = draft.filter(
    ({ species }, index) => draft.findIndex((other) => sameSpecies(other.species, species)) === index,
  );
  return distinct.length - rankOf(speciesMatrix(distinct.map(({ species }) => species)).rows);
};
