import type { Reaction } from '../balance/reaction.ts';
import { plainReaction } from '../balance/reaction.ts';
import { isConserved } from '../balance/recount.ts';
import { type Rational, ONE, ZERO, isZero } from '../exact/rational.ts';
import { isElectron } from '../species/species.ts';
import { type Change, changesOf } from './changes.ts';
import { isHelper, isHydroxide, isProton } from './helper-ions.ts';
import { standsOnBothSides } from './mistyped-skeleton.ts';
import { isSuspect } from './near-species.ts';
import type { Candidate, Problem } from './problem.ts';
import { EDIT_COSTS, IMPROBABLE, REPAIR_KINDS, type RepairKind, TIE } from './repair-kinds.ts';
import { redoxChangeOf } from './redox-change.ts';
import { respellingCost } from './respelling-cost.ts';
import { doublings } from './scale.ts';
import { type Draft, type DraftTerm, reactionOf } from './writing.ts';

/** A candidate with what its edits cost. */
export interface Ranked {
  readonly kind: RepairKind;
  readonly reaction: Reaction;
  readonly changes: readonly Change[];
  readonly cost: number;
  readonly improbable: boolean;
}

/** The candidates that conserve, each reaction once, the likeliest first and the improbable ones last. */
export const ranked = (problem: Problem, candidates: readonly Candidate[]): readonly Ranked[] => {
  const best = new Map<string, Ranked>();
  for (const candidate of candidates) {
    const one = rank(problem, candidate);
    const text = plainReaction(one.reaction);
    const other = best.get(text);
    if (
      isConserved(one.reaction) &&
      !isNothing(problem.draft, one.reaction) &&
      (other === undefined || before(one, other) < 0)
    )
      best.set(text, one);
  }
  return [...best.values()].sort(before);
};

/** True where the electrons alone made the difference: without them X -> X is left. */
const isNothing = (written: Draft, { terms }: Reaction): boolean => {
  const net = new Map<string, Rational>();
  for (const { species, nu } of terms) net.set(species.key, (net.get(species.key) ?? ZERO).add(nu));
  return written.some(({ species }) => isElectron(species)) && [...net.values()].every(isZero);
};

const before = (a: Ranked, b: Ranked): number => {
  const gap = a.cost - b.cost;
  const byCost = Math.abs(gap) < TIE ? REPAIR_KINDS[a.kind].order - REPAIR_KINDS[b.kind].order : gap;
  return Number(a.improbable) - Number(b.improbable) || byCost;
};

const rank = (problem: Problem, { kind, draft }: Candidate): Ranked => {
  const changes = changesOf(problem.draft, draft);
  const isTrusted = !draft.some(({ species }) => isSuspect(species));
  const costs = changes.map((change) => costOf(problem, change, isTrusted));
  const further = addedHelpers(changes).length > 1 ? EDIT_COSTS.furtherHelper - EDIT_COSTS.helperAdded : 0;
  const doubtful = !isTrusted && isSkeleton(problem.draft) ? EDIT_COSTS.suspectInSkeleton : 0;
  const idle = leavesOnBothSides(problem, draft) ? EDIT_COSTS.leftOnBothSides : 0;
  return {
    kind,
    reaction: reactionOf(draft),
    changes,
    cost: kind === 'rounding' ? 0 : costs.reduce((sum, cost) => sum + cost, further + doubtful + idle),
    improbable: kind !== 'rounding' && isImprobable(problem.draft, draft, changes, isTrusted),
  };
};

/** True where a species that was written on both sides, no helper, still stands there unchanged. */
const leavesOnBothSides = ({ draft: written, medium }: Problem, draft: Draft): boolean =>
  draft.some(
    (term) =>
      !isElectron(term.species) &&
      !isHelper(term.species, medium) &&
      standsOnBothSides(draft, term) &&
      standsOnBothSides(written, term),
  );

const addedHelpers = (changes: readonly Change[]): readonly DraftTerm[] =>
  changes.flatMap((change) => (change.kind === 'added' && !isElectron(change.is.species) ? [change.is] : []));

/** `isTrusted`: no species that looks mistyped is left. */
const costOf = (problem: Problem, change: Change, isTrusted: boolean): number => {
  switch (change.kind) {
    case 'number':
      return numberCost(isTrusted && isSkeleton(problem.draft), change.was, change.is);
    case 'moved':
      if (isElectron(change.was.species)) return EDIT_COSTS.electronMoved;
      return isHelper(change.was.species, problem.medium) ? EDIT_COSTS.helperMoved : EDIT_COSTS.termMoved;
    case 'respelled':
      return respellingCost(problem, change.was, change.is);
    case 'dropped':
      if (isElectron(change.was.species)) return EDIT_COSTS.electronsDropped;
      return dropCost(problem, change.was);
    case 'added':
      if (!isElectron(change.is.species)) return EDIT_COSTS.helperAdded;
      return needsNoElectrons(problem) ? EDIT_COSTS.electronsAddedInVain : EDIT_COSTS.electronsAdded;
  }
};

/** An overall reaction: its species balance without electrons, or one is oxidised while another is reduced. */
const needsNoElectrons = ({ solvable, draft }: Problem): boolean => solvable || redoxChangeOf(draft) === 'both';

const dropCost = ({ draft, medium }: Problem, { species }: DraftTerm): number => {
  if (!isHelper(species, medium)) return EDIT_COSTS.termDropped;
  const ions = draft.filter((term) => isProton(term.species) || isHydroxide(term.species));
  const both = ions.some((term) => isProton(term.species)) && ions.some((term) => isHydroxide(term.species));
  const isIon = isProton(species) || isHydroxide(species);
  return isIon && both ? EDIT_COSTS.oneOfBothIonsDropped : EDIT_COSTS.helperDropped;
};

const isSkeleton = (draft: Draft): boolean => !draft.some(({ coefficientWritten }) => coefficientWritten);

const numberCost = (ofSkeleton: boolean, was: DraftTerm, is: DraftTerm): number => {
  const far = EDIT_COSTS.perDoubling * doublings(was.coefficient, is.coefficient);
  if (ofSkeleton) return EDIT_COSTS.skeletonNumber + far;
  return far + (was.coefficientWritten ? EDIT_COSTS.writtenNumber : EDIT_COSTS.unwrittenNumber);
};

/** A re-solve that leaves hardly a number standing, or protons and electrons brought in together. */
const isImprobable = (written: Draft, draft: Draft, changes: readonly Change[], isTrusted: boolean): boolean =>
  bringsProtonsAndElectrons(changes) || (!(isTrusted && isSkeleton(written)) && isReSolve(written, draft, changes));

const bringsProtonsAndElectrons = (changes: readonly Change[]): boolean => {
  const ions = addedHelpers(changes).filter(({ species }) => species.charge.n !== 0n);
  const electrons = changes.some((change) => change.kind === 'added' && isElectron(change.is.species));
  return electrons && ions.length > 0;
};

const isReSolve = (written: Draft, draft: Draft, changes: readonly Change[]): boolean => {
  const changed = changes.filter(({ kind }) => kind === 'number').length;
  const grown = largest(draft).div(largest(written));
  return changed > IMPROBABLE.share * written.length && grown.compare(IMPROBABLE.growth) > 0;
};

const largest = (draft: Draft): Rational =>
  draft.reduce((most, { coefficient }) => (coefficient.compare(most) > 0 ? coefficient : most), ONE);
