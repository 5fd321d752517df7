import { gcdOf } from '../exact/integer.ts';
import { type Rational, ZERO, isZero, numeratorOf, showRational, signOf } from '../exact/rational.ts';
import { ionsOfSalt } from '../redox/split/salt.ts';
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
  readonly common: Groups;
  /** The same by the atoms alone, and by the elements alone. */
  readonly byAtoms: Groups;
  readonly byElements: Groups;
  readonly rare: ReadonlySet<string>;
  /** Formulas of the rare species, their charges left out. */
  readonly rareFormulas: ReadonlySet<string>;
}

type Groups = ReadonlyMap<string, readonly Species[]>;

const grouped = (species: readonly Species[], keyOf: (one: Species) => string): Groups => {
  const groups = new Map<string, Species[]>();
  for (const one of species) {
    const group = groups.get(keyOf(one));
    if (group === undefined) groups.set(keyOf(one), [one]);
    else group.push(one);
  }
  return groups;
};

const atomsOf = ({ composition }: Species): string => contentsOf(composition, ZERO);
const elementsOf = ({ composition }: Species): string => [...composition.keys()].sort().join(' ');

const indexed = (): KnownIndex => {
  const [common, rare] = [commonSpecies(), rareSpellings()];
  return {
    common: grouped(common, ({ composition, charge }) => contentsOf(composition, charge)),
    byAtoms: grouped(common, atomsOf),
    byElements: grouped(common, elementsOf),
    rare,
    rareFormulas: new Set([...rare].map((spelling) => spelling.replace(/\^.*$/u, ''))),
  };
};

let index: KnownIndex | undefined;

/** The tables, indexed the first time they are asked. */
const tables = (): KnownIndex => (index ??= indexed());

/**
 * How well a species is known: in the tables; a salt, acid or base whose ions cancel; in the tables as rare; in none
 * and charged; or in none.
 */
export type Familiarity = 'common' | 'salt' | 'rare' | 'unlisted-ion' | 'unlisted';

/** How well `species` is known, however spelled. A missing neutral species says little: no table holds them all. */
export const familiarityOf = (species: Species): Familiarity => {
  const contents = contentsOf(species.composition, species.charge);
  if (isElectron(species) || tables().common.has(contents)) return 'common';
  if (tables().rare.has(species.key)) return 'rare';
  if (!isZero(species.charge)) return 'unlisted-ion';
  return isSalt(species) ? 'salt' : 'unlisted';
};

/** Found once for each species: a pure function of it, kept as long as it lives. */
const salts = new WeakMap<Species, boolean>();

/** True for ions whose charges cancel in the lowest ratio: Na2SO4, not H2Cl2. */
const isSalt = (species: Species): boolean => {
  const known = salts.get(species) ?? hasIonsInLowestRatio(species);
  salts.set(species, known);
  return known;
};

const hasIonsInLowestRatio = (species: Species): boolean => {
  const ions = ionsOfSalt(species);
  return ions !== null && gcdOf(ions.map(({ count }) => numeratorOf(count))) === 1n;
};

/** True where the species is in no table. */
export const isUnlisted = (species: Species): boolean => familiarityOf(species).startsWith('unlisted');

/** The one anion of an element whose common ion is a cation that tables of potentials hold. */
const HYDRIDE = 'H^-';

/**
 * True where nothing speaks against a species that nobody wrote: no radical, and no ion charged against its common ones
 * (Na^-), hydride aside.
 */
export const isEveryday = (species: Species): boolean => {
  const familiarity = familiarityOf(species);
  if (familiarity !== 'rare') return !isUnlisted(species);
  if (species.key === HYDRIDE) return true;
  const signs = (tables().byAtoms.get(atomsOf(species)) ?? []).map(({ charge }) => signOf(charge));
  const own = signOf(species.charge);
  return own !== 0n && (signs.includes(own) || !signs.includes(-own));
};

/** True where the tables know the atoms of an unlisted species at other charges only: H2O^2+, Mn^3-, PbO2^4-. */
export const isOddlyCharged = (species: Species): boolean =>
  isUnlisted(species) && (tables().byAtoms.has(atomsOf(species)) || tables().rareFormulas.has(species.formula));

/** The common species with these atoms and this charge number. */
export const commonWith = (composition: ReadonlyMap<string, Rational>, charge: Rational): readonly Species[] =>
  tables().common.get(contentsOf(composition, charge)) ?? [];

/** The common species of just the elements of `species`. */
export const commonOfElements = (species: Species): readonly Species[] =>
  tables().byElements.get(elementsOf(species)) ?? [];
