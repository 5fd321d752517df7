import type { Term } from '../balance/reaction.ts';
import { proved } from '../balance/recount.ts';
import { lcmOf } from '../exact/integer.ts';
import { type Rational, ZERO, denominatorOf, isZero, rational, signOf } from '../exact/rational.ts';
import { type Result, all, chain, failure, success } from '../report/result.ts';
import type { Cancelled, CellReaction, Electrode, ElectrodeReaction, WeightedHalf } from './cell-reaction.ts';
import { cellNotes } from './cell-notes.ts';
import { crossingOf } from './crossing.ts';
import { type Folded, foldIons } from './fold.ts';
import { type Pool, amountsIn, poolOf } from './pool.ts';
import { hasShares, splitCurrent } from './shares.ts';
import { runSteps } from './steps.ts';

/** The half-reactions of a cell, at least one at each electrode. */
export type Electrodes = Readonly<Record<Electrode, readonly ElectrodeReaction[]>>;

export interface ComposeOptions {
  /** With a separator H^+ and OH^- do not meet: nothing folds, and `crossing` is told. */
  readonly separator?: boolean;
}

/** A half-reaction with how often it runs for one electron in the outer circuit. */
interface Run {
  readonly electrode: Electrode;
  readonly half: ElectrodeReaction['half'];
  readonly times: Rational;
}

/**
 * The cell reaction of these half-reactions with its electron number, both together in lowest terms.
 * Several reactions at one electrode split the current by their shares, or are consecutive steps without shares.
 * Faults: `bad-ask`, `not-enough-given` and `contradiction` for shares, `electrode-direction` for an oxidation at
 * the cathode or a reduction at the anode. Notes: `share-assigned`, `media-differ`, `states-differ`, `nothing-left`.
 */
export const composeCell = (electrodes: Electrodes, options: ComposeOptions = {}): Result<CellReaction> =>
  chain(all([runsAt('anode', electrodes), runsAt('cathode', electrodes)]), (runs) => {
    const turned = turnedAround(electrodes);
    return turned === null ? addUp(runs.flat(), options.separator === true) : turned;
  });

const runsAt = (electrode: Electrode, electrodes: Electrodes): Result<readonly Run[]> => {
  const reactions = electrodes[electrode];
  const times = hasShares(reactions)
    ? splitCurrent(electrode, reactions)
    : success(runSteps(reactions.map((reaction) => reaction.half)));
  return chain(times, (each) =>
    success(reactions.map(({ half }, at) => ({ electrode, half, times: each[at] ?? ZERO }))),
  );
};

const DIRECTION = { anode: 'oxidation', cathode: 'reduction' } as const;

/** The fault of the first reaction that runs the wrong way for its electrode; null where all are right. */
const turnedAround = (electrodes: Electrodes): Result<never> | null => {
  for (const electrode of ['anode', 'cathode'] as const) {
    const at = electrodes[electrode].findIndex(({ half }) => half.kind !== DIRECTION[electrode]);
    const kind = electrodes[electrode][at]?.half.kind;
    if (kind !== undefined) return wrongDirection(electrode, at, kind);
  }
  return null;
};

const wrongDirection = (electrode: Electrode, at: number, kind: 'oxidation' | 'reduction'): Result<never> =>
  failure({
    code: 'electrode-direction',
    message: `this is ${kind === 'oxidation' ? 'an oxidation' : 'a reduction'}, but the ${electrode} is where ${DIRECTION[electrode]} runs`,
    field: `${electrode}[${String(at)}]`,
    hint: 'swap anode and cathode, or turn the reaction around',
  });

/**
 * For one electron the cell makes  v = sum of times x half,  in which the electrons of anode (+1) and cathode (-1)
 * cancel. The smallest s that makes s v and s whole is the least common multiple of the denominators of v; then s v
 * and the electron number s have no common divisor, for a divisor of both would make s smaller.
 */
const addUp = (runs: readonly Run[], separator: boolean): Result<CellReaction> => {
  const pool = poolOf(runs.map(({ half }) => half.reaction));
  const made = (which: readonly Run[]): readonly Rational[] => sumOf(pool, which, 'net');
  const net = made(runs);
  const folded = separator ? unfolded(pool, net) : foldIons(pool.species, net);
  const scale = rational(lcmOf(folded.amounts.map(denominatorOf)));
  const atElectrode = (electrode: Electrode): readonly Run[] => runs.filter((run) => run.electrode === electrode);
  const weighted = (electrode: Electrode): readonly WeightedHalf[] =>
    atElectrode(electrode).map(({ half, times }) => ({ half, multiplier: times.mul(scale) }));
  const cell: CellReaction = {
    overall: proved({ terms: orderedTerms(runs, folded, scale) }),
    electrons: scale,
    anode: weighted('anode'),
    cathode: weighted('cathode'),
    cancelled: struckOut(pool, runs, folded, scale),
    waterFormed: folded.water.mul(scale),
    crossing: separator
      ? crossingOf(pool.species, { anode: made(atElectrode('anode')), cathode: made(atElectrode('cathode')) })
      : null,
  };
  return success(cell, cellNotes(cell));
};

const unfolded = (pool: Pool, amounts: readonly Rational[]): Folded => ({
  species: pool.species,
  amounts,
  water: ZERO,
  place: -1,
});

/** What the runs make of each species: in all, or only what they use (`left`) or give (`right`), as sizes. */
const sumOf = (pool: Pool, runs: readonly Run[], side: 'net' | 'left' | 'right'): readonly Rational[] => {
  const keep = (amount: Rational): Rational => {
    if (side === 'net') return amount;
    return signOf(amount) === (side === 'left' ? -1n : 1n) ? amount.abs() : ZERO;
  };
  return runs.reduce<readonly Rational[]>(
    (sum, { half, times }) => {
      const amounts = amountsIn(pool, half.reaction);
      return sum.map((value, place) => value.add(keep((amounts[place] ?? ZERO).mul(times))));
    },
    pool.species.map(() => ZERO),
  );
};

/** Reactants before products; in each, what the reactions are about before what the media lend. */
const orderedTerms = (runs: readonly Run[], folded: Folded, scale: Rational): readonly Term[] => {
  const helpers = [...new Set(runs.flatMap(({ half }) => half.medium.helpers.map((helper) => helper.key)))];
  const terms = folded.species.map((species, place) => ({ species, nu: (folded.amounts[place] ?? ZERO).mul(scale) }));
  const side = ({ nu }: Term): bigint => signOf(nu);
  const rank = ({ species }: Term): number => helpers.indexOf(species.key);
  return terms.filter(({ nu }) => !isZero(nu)).sort((a, b) => Number(side(a) - side(b)) || rank(a) - rank(b));
};

/** The smaller of what is used and what is made of each species, folded water counted in. */
const struckOut = (pool: Pool, runs: readonly Run[], folded: Folded, scale: Rational): readonly Cancelled[] => {
  const used = sumOf(pool, runs, 'left');
  const given = sumOf(pool, runs, 'right');
  return folded.species.flatMap((species, place) => {
    const water = place === folded.place ? foldedSide(pool, runs, folded) : { left: ZERO, right: ZERO };
    const left = (used[place] ?? ZERO).add(water.left);
    const right = (given[place] ?? ZERO).add(water.right);
    const amount = left.compare(right) < 0 ? left : right;
    return isZero(amount) ? [] : [{ species, amount: amount.mul(scale) }];
  });
};

/** The folded water on the side where it stands: the net of its place before folding tells. */
const foldedSide = (pool: Pool, runs: readonly Run[], folded: Folded): { left: Rational; right: Rational } => {
  const before = sumOf(pool, runs, 'net')[folded.place] ?? ZERO;
  const onRight = signOf((folded.amounts[folded.place] ?? ZERO).sub(before)) > 0n;
  return onRight ? { left: ZERO, right: folded.water } : { left: folded.water, right: ZERO };
};
