import { type Rational, ZERO, isWhole, isZero, signOf } from '../exact/rational.ts';
import { type Species, isElectron, plainSpecies } from '../species/species.ts';
import { CHARGE } from '../balance/matrix.ts';
import { editDistance } from '../report/suggest.ts';
import { commonWith, familiarityOf, isOddlyCharged, sameContents } from './known.ts';
import type { Candidate, Problem } from './problem.ts';
import { withCharge, withOneSubscript } from './respell.ts';
import type { DraftTerm } from './writing.ts';

/** Charge numbers beyond this are believed of a listed species only. */
const LARGEST_UNKNOWN_CHARGE = 4;

/**
 * Class 6: one species mistyped, every number as written. With the coefficient c of a term on the right,
 *
 *     c (v' - v) + R = 0,   so   v' = v - R / c,    and on the left   v' = v + R / c
 *
 * with R right minus left: what the species must hold follows, and the tables are asked for just that.
 */
export const respellings = (problem: Problem, residual: ReadonlyMap<string, Rational>): readonly Candidate[] =>
  problem.draft.flatMap((term, index) =>
    isElectron(term.species)
      ? []
      : meant(term, residual)
          .filter((species) => !problem.draft.some((other) => sameContents(other.species, species)))
          .map((species) => ({
            kind: 'species' as const,
            draft: problem.draft.map((other, at) => (at === index ? { ...other, species } : other)),
          })),
  );

const meant = (
  { species, side, coefficient }: DraftTerm,
  residual: ReadonlyMap<string, Rational>,
): readonly Species[] => {
  const share = (label: string): Rational => {
    const part = (residual.get(label) ?? ZERO).div(coefficient);
    return side === 'right' ? part.neg() : part;
  };
  const charge = species.charge.add(share(CHARGE));
  const elements = new Set([...species.composition.keys(), ...residual.keys()]);
  elements.delete(CHARGE);
  const wanted = new Map(
    [...elements].map((element) => [element, (species.composition.get(element) ?? ZERO).add(share(element))]),
  );
  if (!isWhole(charge) || [...wanted.values()].some((count) => signOf(count) < 0n)) return [];
  if ([...wanted.values()].every(isZero)) return [];
  return nearestSpellings(species, [...fromTable(species, wanted, charge), ...spelledAlike(species, wanted, charge)]);
};

/** The written spelling with another charge, or with another subscript at the same charge. */
const spelledAlike = (
  species: Species,
  wanted: ReadonlyMap<string, Rational>,
  charge: Rational,
): readonly Species[] => {
  const atomsStand = [...wanted].every(([element, count]) => (species.composition.get(element) ?? ZERO).equals(count));
  if (atomsStand) return [withCharge(species, charge)].filter(isBelievable);
  return charge.equals(species.charge) ? withOneSubscript(species, wanted).filter(isBelievable) : [];
};

const isCommon = (species: Species): boolean => familiarityOf(species) === 'common';

/** A species in no table is never proposed with a charge that its atoms do not bear: no H2O^2+, no Na^2+. */
const isBelievable = (species: Species): boolean =>
  isCommon(species) || (Math.abs(Number(species.charge.n)) <= LARGEST_UNKNOWN_CHARGE && !isOddlyCharged(species));

/** Known species with these contents whose spelling is near what was written. */
const fromTable = (species: Species, wanted: ReadonlyMap<string, Rational>, charge: Rational): readonly Species[] =>
  commonWith(wanted, charge)
    .filter((found) => editDistance(plainSpecies(found), plainSpecies(species)) <= 3)
    .map((found) => ({ ...found, state: species.state }));

/** Of each contents the spelling nearest to what was written, that of the table before another as near. */
const nearestSpellings = (written: Species, found: readonly Species[]): readonly Species[] => {
  const distance = (one: Species): number => editDistance(plainSpecies(one), plainSpecies(written));
  const sorted = found.toSorted((a, b) => distance(a) - distance(b));
  return sorted.filter((one, index) => sorted.findIndex((other) => sameContents(other, one)) === index);
};
