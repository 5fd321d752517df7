import { type Rational, isZero, showRational } from '../exact/rational.ts';
import { type Species, isElectron } from '../species/species.ts';
import { commonSpecies, rareSpellings } from './known-species.ts';

/** Atoms and charge number as one text, elements in the order of the alphabet. */
export const contentsOf = (composition: ReadonlyMap<string, Rational>, charge: Rational): string => {
  const atoms = [...composition]
    .filter(([, count]) => !isZero(count))
    .map(([element, count]) => `${element}${showRational(count)}`)
    .sort();
  return `${atoms.join(' ')} ${showRational(charge)}`;
};

/** True where two species hold the same atoms and charge, however spelled. */
export const sameContents = (a: Species, b: Species): boolean =>
  contentsOf(a.composition, a.charge) === contentsOf(b.composition, b.charge);

interface KnownIndex {
  readonly common: ReadonlyMap<string, readonly Species[]>;
  readonly rare: ReadonlySet<string>;
}

const indexed = (): KnownIndex => {
  const common = new Map<string, Species[]>();
  for (const one of commonSpecies()) {
    const contents = contentsOf(one.composition, one.charge);
    common.set(contents, [...(common.get(contents) ?? []), one]);
  }
  return { common, rare: rareSpellings() };
};

let index: KnownIndex | undefined;

/** The tables, indexed the first time they are asked. */
const tables = (): KnownIndex => (index ??= indexed());

/** How well a species is known: in the tables, in them as rare, not in them and charged, or not in them. */
export type Familiarity = 'common' | 'rare' | 'unlisted-ion' | 'unlisted';

/** How well `species` is known, however spelled. A missing neutral species says little: no table holds them all. */
export const familiarityOf = (species: Species): Familiarity => {
  const contents = contentsOf(species.composition, species.charge);
  if (isElectron(species) || tables().common.has(contents)) return 'common';
  if (tables().rare.has(species.key)) return 'rare';
  return isZero(species.charge) ? 'unlisted' : 'unlisted-ion';
};

/** The common species with these atoms and this charge number. */
export const commonWith = (composition: ReadonlyMap<string, Rational>, charge: Rational): readonly Species[] =>
  tables().common.get(contentsOf(composition, charge)) ?? [];
