import { irreducibleBalances } from '../balance/family.ts';
import { showReaction } from '../balance/reaction.ts';
import { attempt, finish } from '../redox/attempt.ts';
import { chooseMedium } from '../redox/choose-medium.ts';
import { type Result, chain, failure } from '../report/result.ts';
import type { ReadSkeleton } from './electrodes.ts';

/**
 * `result` with the irreducible whole balances in its fault `several-balances`; anything else stays as it is. `electron`:
 * e^- is an unknown, in a half-reaction. Fault instead: `too-hard` where they are beyond the work limits.
 */
export const withIrreducible = <T>(
  result: Result<T>,
  { skeleton, medium }: ReadSkeleton,
  electron: boolean,
): Result<T> => {
  if (result.ok || result.fault.code !== 'several-balances') return result;
  const { fault } = result;
  return chain(chooseMedium(medium, skeleton), (chosen) => {
    const tried = attempt(skeleton, chosen, electron);
    const found = irreducibleBalances(tried.unknowns);
    if (found.kind === 'family')
      return failure({ ...fault, irreducible: found.members.map((numbers) => showReaction(finish(tried, numbers))) });
    const message = `To list the irreducible balances takes more than ${found.limit}.`;
    const place = fault.field === undefined ? {} : { field: fault.field };
    return failure({ code: 'too-hard', limit: found.limit, message, hint: 'Ask without irreducible.', ...place });
  });
};
