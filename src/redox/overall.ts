import { explain } from '../balance/explain.ts';
import { type Reaction, showReaction } from '../balance/reaction.ts';
import { showRational } from '../exact/rational.ts';
import type { Note } from '../report/note.ts';
import { type Result, chain, failure, success } from '../report/result.ts';
import type { Equation } from '../species/equation.ts';
import { isElectron } from '../species/species.ts';
import { type Attempt, attempt, finish, notesOf } from './attempt.ts';
import { type MediumChoice, chooseMedium } from './choose-medium.ts';
import { type Coupling, couplingsOf } from './coupling/couplings.ts';
import { needless } from './coupling/needless.ts';
import { settled, severalBalances } from './coupling/several.ts';
import type { Medium } from './medium.ts';

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

const showCoupling = (coupling: Coupling): Parameters<typeof severalBalances>[2][number] => ({
  assume: coupling.assume,
  overall: showReaction(coupling.overall),
  electrons: showRational(coupling.split.value.electrons),
});
