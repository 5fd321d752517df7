import { ONE, isZero } from '../exact/rational.ts';
import { type Species, isElectron } from '../species/species.ts';
import { familiarityOf, sameContents } from './known.ts';
import { nearSpecies } from './near-species.ts';
import type { Candidate, Problem } from './problem.ts';
import { onRay } from './renumber.ts';
import { balancesOf, onlyOne } from './solve.ts';
import { type Draft, type DraftTerm, columnsOf, signedColumn } from './writing.ts';

/** Above this many terms no slip is sought together with new numbers: the work of an audit stays bounded. */
const MOST_TERMS = 12;

/** The most balances that are solved for one equation. */
const MOST_SOLVED = 40;

/** Which terms may be mistyped: those that look it, or any. */
type Suspicion = 'suspects' | 'any';

/**
 * Class 6 where the numbers are those of a skeleton: one species for its near ones, and the numbers solved anew.
 *
 *     NaOH + H2SO4 -> NaSO4 + H2O     2 NaOH + H2SO4 -> Na2SO4 + 2 H2O
 */
export const mistypedSkeletons = (problem: Problem, suspicion: Suspicion): readonly Candidate[] => {
  const { draft } = problem;
  if (draft.length > MOST_TERMS || !isNearlySkeleton(draft)) return [];
  const suspects = draft.filter((term) => suspicion === 'any' || looksMistyped(draft, term));
  const drafts = suspects.flatMap((term) => respelledAt(draft, term));
  return drafts.slice(0, MOST_SOLVED).flatMap((respelled) => solvedAnew(problem, respelled));
};

/** True where more than half of the numbers are 1: hardly anything was claimed of them. */
const isNearlySkeleton = (draft: Draft): boolean =>
  2 * draft.filter(({ coefficient }) => coefficient.equals(ONE)).length > draft.length;

const looksMistyped = (draft: Draft, term: DraftTerm): boolean =>
  familiarityOf(term.species) !== 'common' || standsOnBothSides(draft, term);

/** True where a term stands on the other side too, unchanged: one of the two was meant otherwise. */
export const standsOnBothSides = (draft: Draft, { species, side }: DraftTerm): boolean =>
  draft.some((other) => other.side !== side && other.species.key === species.key);

const respelledAt = (draft: Draft, term: DraftTerm): readonly Draft[] => {
  if (isElectron(term.species)) return [];
  const isNew = (near: Species): boolean => !draft.some(({ species }) => sameContents(species, near));
  return nearSpecies(term.species)
    .filter((near) => isNew(near) && (!isRadical(term.species) || !near.charge.equals(term.species.charge)))
    .map((species) => draft.map((other) => (other === term ? { ...other, species } : other)));
};

/** A radical is what it is, or an ion whose charge was left out: OH for OH^-. */
const isRadical = (species: Species): boolean => isZero(species.charge) && familiarityOf(species) === 'rare';

const solvedAnew = (problem: Problem, draft: Draft): readonly Candidate[] => {
  const columns = columnsOf(draft.map(({ species }) => species));
  const balances = balancesOf(
    draft.map((term) => signedColumn(columns, term)),
    columns.rowCount,
  );
  const numbers = onlyOne(balances);
  return numbers?.every((value) => value > 0n) === true ? onRay(problem, draft, numbers, 'species') : [];
};
