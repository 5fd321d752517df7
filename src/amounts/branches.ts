import type { Reaction } from '../balance/reaction.ts';
import type { CellReaction, WeightedHalf } from '../cell/cell-reaction.ts';
import { type Rational, ONE, ZERO, showDecimal, signOf } from '../exact/rational.ts';
import { type Note, note } from '../report/note.ts';
import { type Result, all, chain, failure, inField, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import { isElectron } from '../species/species.ts';
import { type Measured, exactly, measuredFrom, weightedSum } from './measured.ts';
import { toFloat } from './number.ts';
import { QUANTITIES } from './quantities.ts';
import { readQuantity } from './quantity.ts';

/** A reaction at an electrode: `electrons` at the scale of `reaction`; `share` as text ("96 %", "24/25", "0.96(1)"). */
export interface ParallelReaction {
  readonly reaction: Reaction;
  readonly electrons: Rational;
  readonly share?: string;
}

/** What the charge flows through: one electrode, or a composed cell and which of its electrodes had shares written. */
export type Circuit =
  | { readonly kind: 'half'; readonly half: ParallelReaction }
  | { readonly kind: 'electrode'; readonly reactions: readonly ParallelReaction[] }
  | {
      readonly kind: 'cell';
      readonly cell: CellReaction;
      readonly shares: { readonly anode: boolean; readonly cathode: boolean };
    };

/** The part of an electrode's current that a reaction takes. */
export interface Share {
  readonly exact: Rational;
  readonly measured: Measured;
}

/** One reaction of the circuit. */
export interface Branch {
  readonly reaction: Reaction;
  readonly electrons: Rational;
  readonly electrode: 'anode' | 'cathode' | 'electrode';
  /** null: to be found from what was measured. */
  readonly share: Share | null;
  /** True where shares were written at this electrode: then the share is the efficiency of the reaction. */
  readonly written: boolean;
}

/** A share as text: "96 %", "24/25", "0.96(1)". Faults of reading, `bad-ask` below 0, in `electrode[index].share`. */
export const readShare = (text: string, index: number): Result<Share> => {
  const name = `electrode[${String(index)}].share`;
  const read = readQuantity(text, QUANTITIES.share);
  return chain(inField(read, name), ({ exact, value, uncertainty }) =>
    signOf(exact) < 0n
      ? failure({ code: 'bad-ask', message: 'a share cannot be negative', field: name, span: wholeSpan(text) })
      : success({ exact, measured: measuredFrom({ name, value, uncertainty, lastDigit: 0 }) }),
  );
};

const overWhole = (sum: Rational): Result<never> =>
  failure({
    code: 'contradiction',
    message: `the shares add up to ${showDecimal(sum.mul(100n))} %, more than the whole current`,
    field: 'electrode',
    hint: 'Shares are parts of one current: 100 % together at the most.',
  });

const restOf = (shares: readonly Share[]): Share => {
  const exact = shares.reduce((rest, share) => rest.sub(share.exact), ONE);
  const { slopes } = weightedSum(shares.map(({ measured }) => [-1, measured]));
  return { exact, measured: { value: toFloat(exact), slopes } };
};

/** 1 for an oxidation, electrons on the right; -1 for a reduction. */
const directionOf = ({ reaction }: ParallelReaction): number =>
  reaction.terms.filter(({ species }) => isElectron(species)).reduce((sum, { nu }) => sum + Number(signOf(nu)), 0);

/** One current flows one way: what runs in parallel is all oxidation or all reduction. */
const turned = (reactions: readonly ParallelReaction[]): Result<never> | null => {
  const [first, ...others] = reactions.map(directionOf);
  const at = others.findIndex((direction) => direction !== first) + 1;
  if (at === 0) return null;
  return failure({
    code: 'electrode-direction',
    message: `electrode[0] is ${first === 1 ? 'an oxidation' : 'a reduction'}, electrode[${String(at)}] the opposite: one current does not drive both`,
    field: `electrode[${String(at)}]`,
    hint: 'Write it the other way round, or give the two electrodes as a cell with an anode and a cathode.',
  });
};

const parallelBranches = (reactions: readonly ParallelReaction[]): Result<readonly Branch[]> => {
  const read = all(
    reactions.map(({ share }, index) => (share === undefined ? success(null) : readShare(share, index))),
  );
  if (!read.ok) return read;
  const opposite = turned(reactions);
  if (opposite !== null) return opposite;
  const given = read.value.filter((share) => share !== null);
  const sum = given.reduce((total, share) => total.add(share.exact), ZERO);
  if (sum.compare(ONE) > 0) return overWhole(sum);
  const takesRest = given.length > 0 && given.length === reactions.length - 1;
  const rest = takesRest ? restOf(given) : null;
  const branches = reactions.map(({ reaction, electrons }, index): Branch => ({
    reaction,
    electrons,
    electrode: 'electrode',
    share: read.value[index] ?? rest,
    written: given.length > 0,
  }));
  return success(branches, rest === null ? [] : [assigned(rest.exact)]);
};

const assigned = (rest: Rational): Note =>
  note(
    'share-assigned',
    `the reaction without a share takes the rest of the current, ${showDecimal(rest.mul(100n))} %`,
  );

/** In a cell the multipliers fix what part of the current each reaction takes: m z / sum of m z at its electrode. */
const cellBranches = (
  halves: readonly WeightedHalf[],
  electrode: 'anode' | 'cathode',
  written: boolean,
): readonly Branch[] => {
  const total = halves.reduce((sum, { half, multiplier }) => sum.add(half.electrons.mul(multiplier)), ZERO);
  return halves.map(({ half, multiplier }) => {
    const exact = half.electrons.mul(multiplier).div(total);
    const share = { exact, measured: exactly(toFloat(exact)) };
    return { reaction: half.reaction, electrons: half.electrons, electrode, share, written };
  });
};

/**
 * The reactions of a circuit with their shares. Notes: `share-assigned`. Faults: `contradiction` over 100 %, `bad-ask`
 * or a fault of reading for a share, in the field `electrode[i].share`; `electrode-direction` for an oxidation beside a
 * reduction.
 */
export const branchesOf = (circuit: Circuit): Result<readonly Branch[]> => {
  if (circuit.kind === 'half') return parallelBranches([circuit.half]);
  if (circuit.kind === 'electrode') return parallelBranches(circuit.reactions);
  return success([
    ...cellBranches(circuit.cell.anode, 'anode', circuit.shares.anode),
    ...cellBranches(circuit.cell.cathode, 'cathode', circuit.shares.cathode),
  ]);
};
