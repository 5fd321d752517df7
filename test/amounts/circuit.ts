import type { Reaction } from '../../src/balance/reaction.ts';
import { ZERO } from '../../src/exact/rational.ts';
import type { Circuit, ParallelReaction } from '../../src/amounts/branches.ts';
import { isElectron } from '../../src/species/species.ts';
import { plain, plainEquation } from '../support/plain.ts';
import type { AmountsAnswer, AmountsRequest } from '../../src/amounts/working.ts';
import { computeAmounts } from '../../src/amounts/amounts.ts';
import type { Result } from '../../src/report/result.ts';

/** A balanced reaction of a plain spelling, with its electron number; nothing is completed. */
export const plainHalf = (text: string, share?: string): ParallelReaction => {
  const { left, right } = plainEquation(text);
  const terms = [
    ...left.map(({ species, coefficient }) => ({ species, nu: coefficient.neg() })),
    ...right.map(({ species, coefficient }) => ({ species, nu: coefficient })),
  ];
  const reaction: Reaction = { terms };
  const electrons = terms
    .filter(({ species }) => isElectron(species))
    .reduce((sum, { nu }) => sum.add(nu), ZERO)
    .abs();
  return { reaction, electrons, ...(share === undefined ? {} : { share }) };
};

export const halfCircuit = (text: string): Circuit => ({ kind: 'half', half: plainHalf(text) });

export const electrodeCircuit = (...reactions: readonly (readonly [string, string?])[]): Circuit => ({
  kind: 'electrode',
  reactions: reactions.map(([text, share]) => plainHalf(text, share)),
});

type Rest = Omit<AmountsRequest, 'circuit' | 'species' | 'given'>;

/** The amounts of a half-reaction in plain spelling. */
export const amountsOf = (
  half: string | Circuit,
  species: string,
  given: AmountsRequest['given'],
  rest: Rest = {},
): Result<AmountsAnswer> =>
  computeAmounts({
    circuit: typeof half === 'string' ? halfCircuit(half) : half,
    species: plain(species),
    given,
    ...rest,
  });

/** A half-reaction, or reactions in parallel apart by ' || ' with shares after ' @ '. */
export const circuitOf = (text: string): Circuit => {
  if (!text.includes(' || ')) return halfCircuit(text);
  const reactions = text.split(' || ').map((one): readonly [string, string?] => {
    const [half = '', share] = one.split(' @ ');
    return share === undefined ? [half] : [half, share];
  });
  return electrodeCircuit(...reactions);
};
