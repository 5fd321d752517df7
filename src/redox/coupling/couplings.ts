import type { Reaction } from '../../balance/reaction.ts';
import type { Numbers } from '../../balance/solve.ts';
import type { Success } from '../../report/result.ts';
import { type Attempt, finish } from '../attempt.ts';
import { type RedoxSplit, type Unsplit, splitReaction } from '../split/split.ts';
import { assumedBalances } from './assume.ts';
import { nameCouplings } from './name-coupling.ts';
import { type PairHalves, halvesOfPair } from './pair-halves.ts';
import { pairHalves } from './pairs.ts';

/** One way to settle a redox skeleton: an oxidation paired with a reduction, or a simple ratio. */
export interface Coupling {
  readonly assume: string;
  readonly overall: Reaction;
  /** Its halves, electrons and changes, and the notes on them: what is promised is what settling gives. */
  readonly split: Success<RedoxSplit>;
}

/** Pairs, the usual first, that are split into their halves. */
const MOST_PAIRS = 40;

/** Each way of pairing one oxidation with one reduction; where there is none, simple assumptions. */
export const couplingsOf = (tried: Attempt, dimension: number): readonly Coupling[] => {
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
  const pairs = pairHalves(unknowns, tried.meter)
    .slice(0, MOST_PAIRS)
    .map((pair) => ({ pair, halves: halvesOfPair(unknowns, pair) }));
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
