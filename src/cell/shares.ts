import { type Rational, ONE, ZERO, showDecimal, signOf } from '../exact/rational.ts';
import { note } from '../report/note.ts';
import { type Result, failure, success } from '../report/result.ts';
import type { Electrode, ElectrodeReaction } from './cell-reaction.ts';

/** True where at least one reaction of the electrode says what part of the current it takes. */
export const hasShares = (reactions: readonly ElectrodeReaction[]): boolean =>
  reactions.some((reaction) => reaction.share !== null);

/**
 * How often each reaction runs for one electron of the electrode's current: its share over its electron number.
 * One share may be left out and takes the rest, with the note `share-assigned`.
 * Faults: `bad-ask` for a negative share, `not-enough-given` for two left out, `contradiction` where the shares
 * do not add up to the whole current.
 */
export const splitCurrent = (
  electrode: Electrode,
  reactions: readonly ElectrodeReaction[],
): Result<readonly Rational[]> => {
  const given = reactions.flatMap(({ share }) => (share === null ? [] : [share]));
  const sum = given.reduce((total, share) => total.add(share), ZERO);
  const missing = reactions.length - given.length;
  const rest = ONE.sub(sum);
  if (given.some((share) => signOf(share) < 0n)) return negativeShare(electrode);
  if (missing > 1) return sharesMissing(electrode, missing);
  if (signOf(rest) < 0n || (missing === 0 && signOf(rest) !== 0n)) return sharesDisagree(electrode, sum);
  const runs = reactions.map(({ half, share }) => (share ?? rest).div(half.electrons));
  if (missing === 0) return success(runs);
  const told = `the ${electrode} reaction without a share takes the rest of the current, ${showDecimal(rest)}`;
  return success(runs, [note('share-assigned', told)]);
};

const negativeShare = (electrode: Electrode): Result<never> =>
  failure({ code: 'bad-ask', message: 'a share of the current cannot be negative', field: electrode });

const sharesMissing = (electrode: Electrode, missing: number): Result<never> =>
  failure({
    code: 'not-enough-given',
    message: `${String(missing)} reactions at the ${electrode} have no share: only one may be left to take the rest`,
    field: electrode,
    hint: 'give the shares of all reactions but one',
    missing: ['share'],
  });

const sharesDisagree = (electrode: Electrode, sum: Rational): Result<never> =>
  failure({
    code: 'contradiction',
    message: `the shares at the ${electrode} add up to ${showDecimal(sum)}, not to 1`,
    field: electrode,
    hint: 'shares split the whole current of an electrode; leave one out and it takes the rest',
  });
