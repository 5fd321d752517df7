import type { Reaction } from '../balance/reaction.ts';
import { type Result, chain, map, success } from '../report/result.ts';
import type { Equation } from '../species/equation.ts';
import { withMediumOfHalves } from './assumed-medium.ts';
import type { MediumChoice } from './choose-medium.ts';
import type { Medium } from './medium.ts';
import { balanceOverall } from './overall.ts';
import { type RedoxSplit, splitReaction } from './split/split.ts';

/** An overall reaction with its halves, its electron number and the oxidation numbers that change in it. */
export interface RedoxReaction extends RedoxSplit {
  readonly overall: Reaction;
  /** Unknown species minus rank of elements and charge. */
  readonly dimension: number;
  readonly medium: Medium;
}

/**
 * A redox skeleton balanced and split into its halves. `settle` is the `assume` text of one of the couplings that
 * `several-balances` gave.
 * Faults, in this order: those of `balanceOverall`, then `no-electrons`. Notes: theirs, `halves-omitted` and
 * `no-oxidation-numbers`.
 */
export const balanceRedox = (skeleton: Equation, choice: MediumChoice, settle?: string): Result<RedoxReaction> => {
  const result = balanceAndSplit(skeleton, choice, settle);
  return result.ok ? success(result.value, withMediumOfHalves(result.notes, result.value)) : result;
};

const balanceAndSplit = (skeleton: Equation, choice: MediumChoice, settle?: string): Result<RedoxReaction> =>
  chain(balanceOverall(skeleton, choice, settle), ({ reaction, dimension, medium, coupling }) =>
    map(coupling?.split ?? splitReaction({ reaction, medium, halves: null, exchanged: null }), (split) => ({
      ...split,
      overall: reaction,
      dimension,
      medium,
    })),
  );
