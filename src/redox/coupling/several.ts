import { type Family, minimalBalances } from '../../balance/family.ts';
import { type Reaction, showReaction } from '../../balance/reaction.ts';
import type { ShownCoupling } from '../../report/fault.ts';
import { type Note, note } from '../../report/note.ts';
import { type Result, failure, success } from '../../report/result.ts';
import { didYouMean, nearest } from '../../report/suggest.ts';
import { type Attempt, finish } from '../attempt.ts';

/** The choice that `settle` names by its assumption, with the note that says so; fault `bad-ask` if none is so called. */
export const settled = <Choice extends { readonly assume: string }>(
  choices: readonly Choice[],
  settle: string,
  reactionOf: (choice: Choice) => Reaction,
): Result<{ readonly choice: Choice; readonly reaction: Reaction; readonly notes: readonly Note[] }> => {
  const choice = choices.find(({ assume }) => assume === settle);
  if (choice !== undefined) {
    const notes = [note('settled', `Several balances exist; this one holds ${settle}.`)];
    return success({ choice, reaction: reactionOf(choice), notes });
  }
  const names = choices.map(({ assume }) => assume);
  const listed = names.length === 0 ? 'No simple assumption settles it.' : `It can be settled by: ${names.join('; ')}.`;
  return failure({
    code: 'bad-ask',
    field: 'settle',
    message: `No coupling of this skeleton is called ${JSON.stringify(settle)}.`,
    hint: didYouMean(nearest(settle, names, 8, 1)) ?? listed,
  });
};

/** Members of a family that a fault shows. */
export const MOST_SHOWN = 200;

/** What of a family is not shown, as a sentence after a space; "" where all of it is. */
export const cutSentence = ({ members, complete }: Extract<Family, { readonly kind: 'family' }>): string => {
  const count = String(members.length);
  if (members.length > MOST_SHOWN) {
    const of = complete ? count : `at least ${count}`;
    return ` Of ${of} minimal ones the ${String(MOST_SHOWN)} with the fewest species are shown.`;
  }
  return complete ? '' : ` ${count} minimal ones are shown; there may be more.`;
};

/** The fault `several-balances` with its family, or `too-hard` where the family is beyond the work limits. */
export const severalBalances = (
  tried: Attempt,
  dimension: number,
  couplings: readonly ShownCoupling[],
): Result<never> => {
  const family = minimalBalances(tried.unknowns, tried.meter);
  if (family.kind === 'too-hard') {
    return failure({
      code: 'too-hard',
      limit: family.limit,
      message: `This has ${String(dimension)} independent balances, and to list them all takes more than ${family.limit}.`,
      hint: 'Take species out, or split the skeleton.',
    });
  }
  const [first] = couplings;
  return failure({
    code: 'several-balances',
    dimension,
    family: family.members.slice(0, MOST_SHOWN).map((numbers) => showReaction(finish(tried, numbers))),
    couplings,
    message: `Conservation does not settle this: it has ${String(dimension)} independent balances.${cutSentence(family)}`,
    hint:
      first === undefined
        ? 'Write fewer species, or a medium with fewer helpers.'
        : `Settle it with one of the assumptions in couplings, for example "${first.assume}".`,
  });
};
