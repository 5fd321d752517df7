import { ONE, rational } from '../exact/rational.ts';
import type { Member } from '../notation/formula.ts';
import { HYDROXIDE, PROTON, WATER } from '../redox/media.ts';
import type { Medium } from '../redox/medium.ts';
import { type Species, ELECTRON } from '../species/species.ts';
import type { Draft } from './writing.ts';

const atom = (symbol: string, count: bigint): Member => ({
  kind: 'atom',
  symbol,
  massNumber: null,
  count: rational(count),
});

/** The oxonium ion as some write the hydrogen ion, H3O^+. */
export const OXONIUM: Species = {
  ...PROTON,
  formula: 'H3O',
  parts: [{ multiplier: ONE, members: [atom('H', 3n), atom('O', 1n)] }],
  composition: new Map([
    ['H', rational(3n)],
    ['O', ONE],
  ]),
  key: 'H3O^+',
};

const isOneOf = (species: Species, list: readonly Species[]): boolean => list.some((one) => one.key === species.key);

/** True for H^+ and H3O^+. */
export const isProton = (species: Species): boolean => isOneOf(species, [PROTON, OXONIUM]);

/** True for OH^-. */
export const isHydroxide = (species: Species): boolean => species.key === HYDROXIDE.key;

/** True for what a medium lends: the helpers of `medium`, else water and its ions. */
export const isHelper = (species: Species, medium: Medium | undefined): boolean =>
  isOneOf(species, medium?.helpers ?? []) || isOneOf(species, [WATER, PROTON, HYDROXIDE, OXONIUM]);

/**
 * The helpers that may have been forgotten in `draft`: those of the medium where it is given, else water with the
 * ion that is written, or with both ions where neither is. A medium is never assumed: a repair that names H^+ says so.
 */
export const helpersFor = (draft: Draft, medium: Medium | undefined): readonly Species[] => {
  if (medium !== undefined) return medium.helpers;
  const written = (test: (species: Species) => boolean): boolean => draft.some(({ species }) => test(species));
  const acid = written((species) => species.key === OXONIUM.key) ? OXONIUM : PROTON;
  if (written(isProton) && !written(isHydroxide)) return [WATER, acid];
  if (written(isHydroxide) && !written(isProton)) return [WATER, HYDROXIDE];
  return [WATER, acid, HYDROXIDE];
};

/** All species that a repair may bring in beside the written ones. */
export const lentTo = (draft: Draft, medium: Medium | undefined): readonly Species[] => [
  ...helpersFor(draft, medium),
  WATER,
  PROTON,
  HYDROXIDE,
  OXONIUM,
  ELECTRON,
];
