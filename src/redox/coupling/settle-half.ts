import { elementaryBalances } from '../../balance/elementary.ts';
import type { Reaction } from '../../balance/reaction.ts';
import { showReaction } from '../../balance/reaction.ts';
import type { Numbers } from '../../balance/solve.ts';
import { type Note, note } from '../../report/note.ts';
import { type Result, success } from '../../report/result.ts';
import { isElectron } from '../../species/species.ts';
import { assumedBalances } from './assume.ts';
import { type Attempt, finish } from '../attempt.ts';
import { settled, severalBalances } from './several.ts';

/** A reaction chosen among several, with the notes that say so. */
export interface Settled {
  readonly reaction: Reaction;
  readonly notes: readonly Note[];
}

/**
 * The half-reaction among several: the one that `settle` assumes; else, for a couple of one reactant and one product, its
 * only elementary balance with electrons.
 * Faults: `bad-ask` for an unknown assumption, `several-balances`, `too-hard`.
 */
export const settleHalf = (tried: Attempt, dimension: number, settle: string | undefined): Result<Settled> => {
  const couplings = assumedBalances(tried.unknowns, dimension, tried.meter).filter(
    ({ numbers }) => electronsOf(tried, numbers) !== 0n,
  );
  if (settle !== undefined) {
    return settled(couplings, settle, (chosen) => finish(tried, chosen.numbers));
  }
  const only = onlyElementary(tried);
  if (only !== undefined) return success({ reaction: finish(tried, only), notes: [OTHERS] });
  return severalBalances(
    tried,
    dimension,
    couplings.map(({ assume, numbers }) => ({
      assume,
      reaction: showReaction(finish(tried, numbers)),
      electrons: String(magnitudeOf(electronsOf(tried, numbers))),
    })),
  );
};

const OTHERS = note(
  'other-balances',
  'Other balances exist; this is the only one with electrons from which no species can be dropped.',
);

/** A couple: one reactant and one product, the electron aside. Beyond the work limit, which the meter keeps, none. */
const onlyElementary = (tried: Attempt): Numbers | undefined => {
  const { left, right } = tried.skeleton;
  const couple = [left, right].every((side) => side.filter((term) => !isElectron(term.species)).length === 1);
  if (!couple) return undefined;
  const found = elementaryBalances(tried.unknowns, tried.meter);
  if (found.kind === 'too-hard') return undefined;
  const fitting = found.balances.filter((numbers) => {
    const whole = tried.unknowns.every((unknown, index) => unknown.side === 'free' || numbers[index] !== 0n);
    return whole && electronsOf(tried, numbers) !== 0n;
  });
  return fitting.length === 1 ? fitting[0] : undefined;
};

const electronsOf = ({ unknowns }: Attempt, numbers: Numbers): bigint =>
  numbers[unknowns.findIndex((unknown) => isElectron(unknown.species))] ?? 0n;

const magnitudeOf = (value: bigint): bigint => (value < 0n ? -value : value);
