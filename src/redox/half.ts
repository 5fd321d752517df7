import { explain } from '../balance/explain.ts';
import { type Reaction, plainReaction, showReaction } from '../balance/reaction.ts';
import type { Meter } from '../exact/bounds.ts';
import { ZERO, isZero, signOf } from '../exact/rational.ts';
import type { Note } from '../report/note.ts';
import { type Result, chain, failure, success } from '../report/result.ts';
import type { Equation } from '../species/equation.ts';
import { isElectron } from '../species/species.ts';
import { type Attempt, attempt, finish, notesOf } from './attempt.ts';
import { type MediumChoice, chooseMedium } from './choose-medium.ts';
import type { HalfReaction } from './half-reaction.ts';
import { needless } from './coupling/needless.ts';
import { settleHalf } from './coupling/settle-half.ts';

/**
 * The half-reaction of a skeleton: helpers of the medium and electrons found, lowest whole numbers, recounted.
 * `settle` is the `assume` text of one of the couplings that `several-balances` gave.
 * Faults, in this order: `unknown-medium`, `bad-ask`, `missing-element`, `several-balances` (or `too-hard`), `no-balance`,
 * `wrong-side`, `idle-species`, `no-electrons`. `meter` counts the work of all halves of one ask together.
 */
export const completeHalf = (
  skeleton: Equation,
  choice: MediumChoice,
  settle?: string,
  meter?: Meter,
): Result<HalfReaction> =>
  chain(chooseMedium(choice, skeleton), (medium) => complete(attempt(skeleton, medium, true, meter), settle));

const complete = (tried: Attempt, settle: string | undefined): Result<HalfReaction> => {
  const { verdict } = tried;
  if (verdict.kind === 'unique') {
    if (settle !== undefined) return needless(settle);
    return halfOf(tried, finish(tried, verdict.numbers), verdict.dimension);
  }
  if (verdict.kind !== 'family') return failure(explain(verdict, tried.asWritten));
  return chain(settleHalf(tried, verdict.dimension, settle), ({ reaction, notes }) =>
    halfOf(tried, reaction, verdict.dimension, notes),
  );
};

const halfOf = (
  tried: Attempt,
  reaction: Reaction,
  dimension: number,
  notes: readonly Note[] = [],
): Result<HalfReaction> => {
  const electrons = electronsIn(reaction);
  if (isZero(electrons)) return noElectrons(reaction);
  const kind = signOf(electrons) < 0n ? 'reduction' : 'oxidation';
  const half: HalfReaction = { reaction, kind, electrons: electrons.abs(), medium: tried.medium, dimension };
  return success(half, [...notesOf(tried, reaction), ...notes]);
};

/** The stoichiometric number of e^-: negative in a reduction, which takes electrons up. */
const electronsIn = (reaction: Reaction): Reaction['terms'][number]['nu'] =>
  reaction.terms.find((term) => isElectron(term.species))?.nu ?? ZERO;

const noElectrons = (reaction: Reaction): Result<never> =>
  failure({
    code: 'no-electrons',
    reaction: showReaction(reaction),
    message: `Nothing is oxidised or reduced: this balances without electrons, ${plainReaction(reaction)}.`,
    hint: 'Write a product in which an element has another oxidation number.',
  });
