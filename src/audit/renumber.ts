import { isElectron } from '../species/species.ts';
import { isZero, signOf } from '../exact/rational.ts';
import { isHelper } from './helper-ions.ts';
import { type Candidate, type Problem, hasBothSides, keepsToFractions } from './problem.ts';
import type { RepairKind } from './repair-kinds.ts';
import { bestScales } from './scale.ts';
import { completion, onlyOne } from './solve.ts';
import { type Draft, type DraftTerm, otherSide, signedColumn } from './writing.ts';

/** Above this many terms only single numbers are tried where the balance is not unique. */
const MOST_TERMS_FOR_PAIRS = 14;

/** Repairs by other numbers: class 1, and what the numbers themselves say of sides and superfluous terms. */
export const renumberings = (problem: Problem): readonly Candidate[] => {
  const numbers = onlyOne(problem.balances);
  if (numbers !== null) return onRay(problem, problem.draft, numbers, 'coefficients');
  return problem.balances.length === 0 ? [] : sparseChanges(problem);
};

/**
 * The drafts that write the only balance. One number below 0 means a term on the wrong side, one number 0 a term that
 * takes no part; more of either is no slip, and gives nothing.
 */
export const onRay = (
  problem: Problem,
  draft: Draft,
  numbers: readonly bigint[],
  kind: RepairKind,
): readonly Candidate[] => {
  const wrong = numbers.flatMap((value, index) => (value < 0n ? [index] : []));
  const idle = numbers.flatMap((value, index) => (value === 0n ? [index] : []));
  if (wrong.length + idle.length > 1) return [];
  const written = draft.map(({ coefficient, origin }) => (origin === null ? null : coefficient));
  const sizes = numbers.map((value) => (value < 0n ? -value : value));
  return bestScales(sizes, written, problem.denominator)
    .map((scaled) => draftWith(draft, (term, index) => ({ ...term, coefficient: scaled[index] ?? term.coefficient })))
    .map((scaled) => flipped(scaled, wrong[0]).filter(({ coefficient }) => !isZero(coefficient)))
    .filter(hasBothSides)
    .map((solved) => ({ kind: kindOn(problem, draft, kind, wrong[0], idle[0]), draft: solved }));
};

const draftWith = (draft: Draft, change: (term: DraftTerm, index: number) => DraftTerm): Draft => draft.map(change);

/** `draft` with the term at `index` on the other side, at its end. */
export const flipped = (draft: Draft, index: number | undefined): Draft => {
  const moved = index === undefined ? undefined : draft[index];
  if (moved === undefined) return draft;
  return [...draft.filter((term) => term !== moved), { ...moved, side: otherSide(moved.side) }];
};

const kindOn = (
  problem: Problem,
  draft: Draft,
  kind: RepairKind,
  wrong: number | undefined,
  idle: number | undefined,
): RepairKind => {
  const moved = wrong === undefined ? undefined : draft[wrong];
  const dropped = idle === undefined ? undefined : draft[idle];
  if (moved !== undefined) return kindOfMove(moved);
  return dropped === undefined ? kind : kindOfDrop(problem, dropped);
};

const kindOfMove = ({ species }: DraftTerm): RepairKind => (isElectron(species) ? 'electron-side' : 'term-side');

const kindOfDrop = (problem: Problem, { species }: DraftTerm): RepairKind => {
  if (isElectron(species)) return 'electrons';
  return isHelper(species, problem.medium) ? 'helpers' : 'term-dropped';
};

/**
 * Where the written species allow several balances: the changes of one number, or of two, that conserve. The rest of
 * what was written stands, so the writer's own choice of the ratio is kept.
 */
const sparseChanges = (problem: Problem): readonly Candidate[] => {
  const single = problem.draft.flatMap((_, index) => changeOf(problem, [index]));
  if (problem.draft.length > MOST_TERMS_FOR_PAIRS) return single;
  const pairs = problem.draft.flatMap((_, second) =>
    problem.draft.slice(0, second).flatMap((_term, first) => changeOf(problem, [first, second])),
  );
  return [...single, ...pairs];
};

const changeOf = (problem: Problem, indices: readonly number[]): readonly Candidate[] => {
  const terms = indices.flatMap((index) => problem.draft[index] ?? []);
  const steps = completion(
    problem.surplus,
    terms.map((term) => signedColumn(problem.columns, term)),
  );
  if (steps === null || steps.some(isZero)) return [];
  const numbers = problem.draft.map(({ coefficient }, index) => {
    const step = steps[indices.indexOf(index)];
    return step === undefined ? coefficient : coefficient.add(step);
  });
  if (!numbers.every((value) => keepsToFractions(value, problem))) return [];
  const wrong = numbers.findIndex((value) => signOf(value) < 0n);
  const idle = numbers.findIndex(isZero);
  if (indices.length > 1 && (wrong >= 0 || idle >= 0)) return [];
  const draft = draftWith(problem.draft, (term, index) => ({
    ...term,
    coefficient: (numbers[index] ?? term.coefficient).abs(),
  }));
  const solved = flipped(draft, wrong < 0 ? undefined : wrong).filter(({ coefficient }) => !isZero(coefficient));
  if (!hasBothSides(solved)) return [];
  const kind = kindOn(
    problem,
    problem.draft,
    'coefficients',
    wrong < 0 ? undefined : wrong,
    idle < 0 ? undefined : idle,
  );
  return [{ kind, draft: solved }];
};
