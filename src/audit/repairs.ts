import { type Reaction, plainReaction } from '../balance/reaction.ts';
import type { Rational } from '../exact/rational.ts';
import type { Medium } from '../redox/medium.ts';
import { type Note, note } from '../report/note.ts';
import { additions } from './additions.ts';
import { type Edit, editOf } from './changes.ts';
import { exchanges } from './exchange.ts';
import { respellings } from './mistyped.ts';
import { mistypedSkeletons } from './mistyped-skeleton.ts';
import { type Candidate, type Problem, problemOf } from './problem.ts';
import { type Ranked, ranked } from './rank.ts';
import { renumberings } from './renumber.ts';
import { MOST_REPAIRS, type RepairKind, TIE } from './repair-kinds.ts';
import { isSensible, withoutNonsense } from './sensible.ts';
import { sayTiny, unrounded } from './rounding.ts';
import type { Draft } from './writing.ts';

/** A repaired equation. */
export interface Repair {
  readonly kind: RepairKind;
  readonly reaction: Reaction;
  readonly edits: readonly Edit[];
  /** Never the first. */
  readonly improbable: boolean;
}

/** Repairs with what must be said of them. */
export interface Repairs {
  readonly repairs: readonly Repair[];
  readonly notes: readonly Note[];
}

/** Above this many terms no repair is sought: the work of an audit stays bounded. */
const MOST_TERMS = 40;

/** The likely repairs of an equation that leaves `residual`, the likeliest first; a note where there is none. */
export const repairsOf = (
  draft: Draft,
  residual: ReadonlyMap<string, Rational>,
  medium: Medium | undefined,
): Repairs => {
  if (draft.length > MOST_TERMS) {
    return none(`No repair was sought: more than ${String(MOST_TERMS)} terms are written.`);
  }
  const problem = problemOf(draft, medium);
  const found = searched(problem, residual);
  const [first] = found;
  if (first === undefined) return none(reasonFor(problem, residual));
  if (first.improbable) return none(onlyImprobable(first));
  return { repairs: found.slice(0, MOST_REPAIRS).map(repairFrom), notes: notesOn(first, found, residual) };
};

/** Any species is doubted only where nothing sensible is found otherwise. */
const searched = (problem: Problem, residual: ReadonlyMap<string, Rational>): readonly Ranked[] => {
  const candidates = candidatesFor(problem, residual);
  const found = ranked(problem, candidates);
  if (found.some(isSensible)) return withoutNonsense(found);
  return withoutNonsense(ranked(problem, [...candidates, ...mistypedSkeletons(problem, 'any')]));
};

const candidatesFor = (problem: Problem, residual: ReadonlyMap<string, Rational>): readonly Candidate[] => [
  ...unrounded(problem),
  ...renumberings(problem),
  ...exchanges(problem),
  ...additions(problem),
  ...respellings(problem, residual),
  ...mistypedSkeletons(problem, 'suspects'),
];

const repairFrom = ({ kind, reaction, changes, improbable }: Ranked): Repair => ({
  kind,
  reaction,
  edits: changes.map(editOf),
  improbable,
});

const notesOn = (first: Ranked, found: readonly Ranked[], residual: ReadonlyMap<string, Rational>): readonly Note[] => {
  if (first.kind === 'rounding') {
    const off = [...residual].map(([label, value]) => `${sayTiny(value)} ${label}`).join(', ');
    return [note('rounding', `The decimals are rounded: off by ${off}. Exact numbers conserve.`)];
  }
  const tied = found.filter(({ cost, improbable }) => !improbable && cost - first.cost < TIE);
  if (tied.length < 2) return [];
  return [note('tie', `The first ${String(tied.length)} repairs are equally plausible.`)];
};

const none = (reason: string): Repairs => ({ repairs: [], notes: [note('no-repair', reason)] });

const onlyImprobable = ({ reaction, changes }: Ranked): string =>
  changes.some(({ kind }) => kind === 'added')
    ? `No plausible repair was found. Only protons and electrons added together would balance it (${plainReaction(reaction)}), and they balance nearly anything.`
    : `No plausible repair was found. The only balance of these species, ${plainReaction(reaction)}, leaves hardly a number as written: look for a mistyped species.`;

const SEVERAL = 'the written species allow several balances, and no one or two numbers settle which was meant';

/** Why nothing was found: an element on one side only, or more than one slip. */
const reasonFor = ({ draft, balances }: Problem, residual: ReadonlyMap<string, Rational>): string => {
  const sidesOf = (element: string): ReadonlySet<string> =>
    new Set(draft.filter(({ species }) => species.composition.has(element)).map(({ side }) => side));
  const orphan = [...residual.keys()].find((element) => sidesOf(element).size === 1);
  if (orphan === undefined)
    return `No plausible repair was found: ${balances.length > 1 ? SEVERAL : 'no single slip explains what is left over'}.`;
  const [side = 'left'] = sidesOf(orphan);
  return `No plausible repair was found: ${orphan} stands on the ${side} only.`;
};
