import { explain } from '../balance/explain.ts';
import { type Reaction, showReaction } from '../balance/reaction.ts';
import type { Numbers } from '../balance/solve.ts';
import { showRational } from '../exact/rational.ts';
import type { Note } from '../report/note.ts';
import { type Result, type Success, chain, failure, success } from '../report/result.ts';
import type { Equation } from '../species/equation.ts';
import { isElectron } from '../species/species.ts';
import { assumedBalances } from './coupling/assume.ts';
import { type Attempt, attempt, finish, notesOf } from './attempt.ts';
import { type MediumChoice, chooseMedium } from './choose-medium.ts';
import type { Medium } from './medium.ts';
import { nameCouplings } from './coupling/name-coupling.ts';
import { type PairHalves, halvesOfPair } from './coupling/pair-halves.ts';
import { pairHalves } from './coupling/pairs.ts';
import { needless } from './coupling/needless.ts';
import { settled, severalBalances } from './coupling/several.ts';
import { type RedoxSplit, type Unsplit, splitReaction } from './split/split.ts';

/** One way to settle a redox skeleton: an oxidation paired with a reduction, or a simple ratio. */
export interface Coupling {
  readonly assume: string;
  readonly overall: Reaction;
  /** Its halves, electrons and changes, and the notes on them: what is promised is what settling gives. */
  readonly split: Success<RedoxSplit>;
}

/** An overall reaction in lowest whole numbers, recounted, before it is split into halves. */
export interface OverallBalance {
  readonly reaction: Reaction;
  readonly dimension: number;
  readonly medium: Medium;
  /** The coupling that `settle` named; null where conservation alone gives the reaction. */
  readonly coupling: Coupling | null;
}

/**
 * The overall reaction of a redox skeleton. `settle` is the `assume` text of one of the couplings that
 * `several-balances` gave.
 * Faults: `unknown-medium`, `bad-ask` (e^- written, both H^+ and OH^- without a medium, unknown assumption),
 * `missing-element`, `several-balances` (or `too-hard`), `no-balance`, `wrong-side`, `idle-species`.
 */
export const balanceOverall = (skeleton: Equation, choice: MediumChoice, settle?: string): Result<OverallBalance> =>
  chain(withoutElectrons(skeleton), () =>
    chain(chooseMedium(choice, skeleton), (medium) => balance(attempt(skeleton, medium, false), settle)),
  );

const withoutElectrons = (skeleton: Equation): Result<Equation> => {
  const term = [...skeleton.left, ...skeleton.right].find(({ species }) => isElectron(species));
  if (term === undefined) return success(skeleton);
  return failure({
    code: 'bad-ask',
    span: term.span,
    message: 'An overall reaction has no e^-: its electrons pass from one species to the other.',
    hint: 'Leave e^- out, or ask for a half-reaction.',
  });
};

const balance = (tried: Attempt, settle: string | undefined): Result<OverallBalance> => {
  const { verdict, medium } = tried;
  if (verdict.kind !== 'unique' && verdict.kind !== 'family') return failure(explain(verdict, tried.asWritten));
  const found = (reaction: Reaction, coupling: Coupling | null, notes: readonly Note[]): Result<OverallBalance> =>
    success({ reaction, dimension: verdict.dimension, medium, coupling }, [...notesOf(tried, reaction), ...notes]);
  if (verdict.kind === 'unique') {
    return settle === undefined ? found(finish(tried, verdict.numbers), null, []) : needless(settle);
  }
  const couplings = couplingsOf(tried, verdict.dimension);
  if (settle === undefined) return severalBalances(tried, verdict.dimension, couplings.map(showCoupling));
  return chain(
    settled(couplings, settle, (one) => one.overall),
    ({ choice, reaction, notes }) => found(reaction, choice, notes),
  );
};

/** Each way of pairing one oxidation with one reduction; where there is none, simple assumptions. */
const couplingsOf = (tried: Attempt, dimension: number): readonly Coupling[] => {
  const paired = pairedCouplings(tried);
  if (paired.length > 0) return paired;
  return assumedBalances(tried.unknowns, dimension, tried.meter).flatMap(({ assume, numbers }) => {
    const overall = finish(tried, numbers);
    return couplingOf(assume, { reaction: overall, medium: tried.medium, halves: null, exchanged: null });
  });
};

/** The coupling of a reaction in which electrons pass; none else. */
const couplingOf = (assume: string, unsplit: Unsplit): readonly Coupling[] => {
  const split = splitReaction(unsplit);
  return split.ok ? [{ assume, overall: unsplit.reaction, split }] : [];
};

/** Pairs whose two halves add up, where there are any; of two that go by one name the usual. */

const pairedCouplings = (tried: Attempt): readonly Coupling[] => {
  const { unknowns } = tried;
  const pairs = pairHalves(unknowns, tried.meter).map((pair) => ({ pair, halves: halvesOfPair(unknowns, pair) }));
  const split = pairs.flatMap(({ pair, halves }) =>
    couplingOf('', {
      reaction: finish(tried, pair.numbers),
      medium: tried.medium,
      halves: reactionsOf(tried, halves),
      exchanged: pair.electrons,
    }).map((coupling) => ({ pair, halves, coupling })),
  );
  const sound = split.filter(
    ({ coupling, pair }) =>
      coupling.split.value.oxidation !== null && coupling.split.value.electrons.equals(pair.electrons),
  );
  const kept = sound.length > 0 ? sound : split;
  const names = nameCouplings(unknowns, kept);
  const named = kept.map(({ coupling }, index) => ({ ...coupling, assume: names[index] ?? '' }));
  return named.filter(({ assume }, index) => names.indexOf(assume) === index);
};

const reactionsOf = (tried: Attempt, { unknowns, oxidation, reduction }: PairHalves): Unsplit['halves'] => {
  if (oxidation === null || reduction === null) return null;
  const reaction = (numbers: Numbers): Reaction => finish({ ...tried, unknowns }, numbers);
  return { oxidation: reaction(oxidation), reduction: reaction(reduction) };
};

const showCoupling = (coupling: Coupling): Parameters<typeof severalBalances>[2][number] => ({
  assume: coupling.assume,
  overall: showReaction(coupling.overall),
  electrons: showRational(coupling.split.value.electrons),
});
