import { type Rational, ONE, ZERO, isZero } from '../exact/rational.ts';
import { editDistance } from '../report/suggest.ts';
import { plainSpecies } from '../species/species.ts';
import { isHydroxide, isProton } from './helper-ions.ts';
import { familiarityOf, sameContents } from './known.ts';
import type { Problem } from './problem.ts';
import { EDIT_COSTS, RESPELLING_COSTS } from './repair-kinds.ts';
import type { DraftTerm } from './writing.ts';

/** What it costs to take the species of `was` for that of `is`: how well both are known, and how far apart they are. */
export const respellingCost = ({ medium }: Problem, was: DraftTerm, is: DraftTerm): number => {
  if (isIonExchange(was, is)) {
    const foreign = medium !== undefined && !medium.helpers.some(({ key }) => key === was.species.key);
    return foreign ? EDIT_COSTS.foreignIonExchanged : EDIT_COSTS.ionExchanged;
  }
  const further = EDIT_COSTS.perFurtherUnit * Math.max(0, slipsBetween(was, is) - 1);
  const twoSlips = !was.species.charge.equals(is.species.charge) && !sameAtoms(was, is);
  const stateClash = isZero(was.species.charge) && !isZero(is.species.charge) && isBulk(was.species.state);
  return (
    RESPELLING_COSTS[familiarityOf(was.species)][meantAs(is)] +
    further +
    (sameElements(was, is) ? 0 : EDIT_COSTS.otherElements) +
    (twoSlips ? EDIT_COSTS.chargeAndAtoms : 0) +
    (stateClash ? EDIT_COSTS.ionInBulk : 0) -
    (isDissolvedElement(was) ? EDIT_COSTS.dissolvedElement : 0)
  );
};

const meantAs = ({ species }: DraftTerm): 'common' | 'salt' | 'other' => {
  const familiarity = familiarityOf(species);
  return familiarity === 'common' || familiarity === 'salt' ? familiarity : 'other';
};

const sameElements = ({ species: a }: DraftTerm, { species: b }: DraftTerm): boolean =>
  a.composition.size === b.composition.size && [...a.composition.keys()].every((element) => b.composition.has(element));

const sameAtoms = ({ species: a }: DraftTerm, { species: b }: DraftTerm): boolean =>
  sameContents({ ...a, charge: ZERO }, { ...b, charge: ZERO });

/** An element of single atoms in solution lacks its charge: Ag(aq). */
const isDissolvedElement = ({ species }: DraftTerm): boolean =>
  species.state === 'aq' &&
  isZero(species.charge) &&
  species.composition.size === 1 &&
  [...species.composition.values()].every((count) => count.equals(ONE));

/** No ion is written as a solid, a liquid or a gas. */
const isBulk = (state: string | null): boolean => state === 's' || state === 'l' || state === 'g';

const isIonExchange = (was: DraftTerm, is: DraftTerm): boolean =>
  (isProton(was.species) && isHydroxide(is.species)) || (isHydroxide(was.species) && isProton(is.species));

/** Atoms and charges by which two species differ; letters where a bracket was left out, as in Fe2SO4 for Fe2(SO4)3. */
const slipsBetween = (was: DraftTerm, is: DraftTerm): number => {
  const [written, meant] = [plainSpecies(was.species), plainSpecies(is.species)];
  const inBrackets = meant.includes('(') && !written.includes('(');
  return inBrackets ? Math.min(distanceBetween(was, is), editDistance(written, meant)) : distanceBetween(was, is);
};

/** Atoms and charges by which two species differ. */
const distanceBetween = ({ species: a }: DraftTerm, { species: b }: DraftTerm): number => {
  const size = (value: Rational): number => Number(value.n) / Number(value.d);
  // a sign turned over is one slip, however large the charge
  const isTurned = !isZero(a.charge) && a.charge.equals(b.charge.neg());
  let sum = isTurned ? 1 : size(a.charge.sub(b.charge));
  for (const element of new Set([...a.composition.keys(), ...b.composition.keys()])) {
    const here = a.composition.get(element) ?? ZERO;
    sum += size(here.sub(b.composition.get(element) ?? ZERO));
  }
  return sum;
};
