import { type Rational, isZero, showRational } from '../exact/rational.ts';
import { type Species, isElectron } from '../species/species.ts';
import { knownSpecies } from './known-species.ts';

/** Atoms and charge number as one text, elements in the order of the alphabet. */
export const contentsOf = (composition: ReadonlyMap<string, Rational>, charge: Rational): string => {
  const atoms = [...composition]
    .filter(([, count]) => !isZero(count))
    .map(([element, count]) => `${element}${showRational(count)}`)
    .sort();
  return `${atoms.join(' ')} ${showRational(charge)}`;
};

interface KnownIndex {
  readonly keys: ReadonlySet<string>;
  readonly byContents: ReadonlyMap<string, readonly Species[]>;
}

const indexOf = (species: readonly Species[]): KnownIndex => {
  const byContents = new Map<string, Species[]>();
  for (const one of species) {
    const contents = contentsOf(one.composition, one.charge);
    byContents.set(contents, [...(byContents.get(contents) ?? []), one]);
  }
  return { keys: new Set(species.map(({ key }) => key)), byContents };
};

let index: KnownIndex | undefined;

/** The table of known ions and common substances, indexed the first time it is asked. */
const known = (): KnownIndex => (index ??= indexOf(knownSpecies()));

/** True for what stands in the table of known ions and common substances, however spelled, and for the electron. */
export const isKnown = (species: Species): boolean =>
  isElectron(species) ||
  known().keys.has(species.key) ||
  known().byContents.has(contentsOf(species.composition, species.charge));

/** The known species with these atoms and this charge number. */
export const knownWith = (composition: ReadonlyMap<string, Rational>, charge: Rational): readonly Species[] =>
  known().byContents.get(contentsOf(composition, charge)) ?? [];
