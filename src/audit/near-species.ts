import { gcdOf } from '../exact/integer.ts';
import { ONE, isZero, rational, signOf } from '../exact/rational.ts';
import type { Member } from '../notation/formula.ts';
import { ionsOfSalt, speciesOf } from '../redox/split/salt.ts';
import { editDistance } from '../report/suggest.ts';
import type { Species } from '../species/species.ts';
import { commonOfElements, familiarityOf, isOddlyCharged, sameContents } from './known.ts';

/** Counts of the two ions of a salt: up to 3 of one charge number and 4 of the other, in lowest terms. */
const RATIOS = [1n, 2n, 3n]
  .flatMap((first) => [1n, 2n, 3n, 4n].map((second) => [first, second] as const))
  .filter((ratio) => gcdOf(ratio) === 1n);

/** A formula with more members is no salt of two ions that a slip would hide: the work stays bounded. */
const MOST_MEMBERS = 10;

/** Found once for each species: a pure function of it, kept as long as it lives. */
const found = new WeakMap<Species, readonly Species[]>();

/**
 * The everyday species one slip away from `species`: the same atoms with another charge, another subscript at the same
 * charge, or the ions of a salt in the ratio in which their charges cancel. Of the same elements all; their state is
 * that of `species`.
 */
export const nearSpecies = (species: Species): readonly Species[] => {
  const near = found.get(species) ?? search(species);
  found.set(species, near);
  return near;
};

const search = (species: Species): readonly Species[] => {
  const inTables = commonOfElements(species).filter(
    (other) => !sameContents(other, species) && isOneSlipAway(species, other),
  );
  const salts = saltsOfSameIons(species).filter((salt) => !inTables.some((other) => sameContents(other, salt)));
  return [...inTables, ...salts].map((other) => ({ ...other, state: species.state }));
};

/** Of the same elements: the charge alone differs, or one digit of the formula does, brackets aside. */
const isOneSlipAway = (species: Species, other: Species): boolean => {
  if (!other.charge.equals(species.charge)) return sameContents({ ...other, charge: species.charge }, species);
  return editDistance(unbracketed(other), unbracketed(species)) <= 1;
};

const unbracketed = ({ formula }: Species): string => formula.replaceAll(/[()]/gu, '');

/**
 * The salts that the ions of a neutral formula make where their charges cancel:
 *
 *     Na|SO4     the cut between the ions is tried everywhere, with every ratio:   Na2SO4
 */
const saltsOfSameIons = (species: Species): readonly Species[] => {
  const [part, ...adducts] = species.parts;
  if (part === undefined || adducts.length > 0 || !isZero(species.charge) || part.members.length > MOST_MEMBERS)
    return [];
  return part.members.slice(1).flatMap((_, index) => {
    const [first, second] = [part.members.slice(0, index + 1), part.members.slice(index + 1)];
    return RATIOS.map(([a, b]) =>
      speciesOf([{ multiplier: ONE, members: [...times(first, a), ...times(second, b)] }], species.charge),
    ).filter((salt) => isSaltOfTwo(salt) && !sameContents(salt, species));
  });
};

/** A cation, spelled first, and an anion. */
const isSaltOfTwo = (salt: Species): boolean => {
  const ions = ionsOfSalt(salt);
  return ions?.length === 2 && ions[0] !== undefined && signOf(ions[0].species.charge) > 0n;
};

/** One ion `count` times: SO4 twice is (SO4)2. */
const times = (ion: readonly Member[], count: bigint): readonly Member[] => {
  const [only] = ion;
  if (ion.length === 1 && only !== undefined) {
    return count === 1n && only.kind === 'group' ? only.members : [{ ...only, count: rational(count) }];
  }
  return count === 1n ? ion : [{ kind: 'group', bracket: '(', members: ion, count: rational(count) }];
};

/**
 * True where a species is in no table and an everyday one is near: an ion nobody knows beside one that all know
 * (ClO3^2-), an ion without its charge (MnO4), a molecule of an element
 * (Cu2), or a salt whose charges do not cancel (NaSO4). Another neutral species that no table holds proves nothing else.
 */
export const isSuspect = (species: Species): boolean => {
  const familiarity = familiarityOf(species);
  if (familiarity === 'unlisted-ion') return nearSpecies(species).length > 0;
  if (familiarity !== 'unlisted') return false;
  const isElement = species.composition.size === 1 && nearSpecies(species).length > 0;
  return isElement || isOddlyCharged(species) || saltsOfSameIons(species).length > 0;
};
