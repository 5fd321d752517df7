import { elementaryBalances } from '../balance/elementary.ts';
import { pickColumns, speciesMatrix } from '../balance/matrix.ts';
import type { Numbers } from '../balance/solve.ts';
import type { Unknown } from '../balance/unknowns.ts';
import { gcd, gcdOf, lcm, magnitude } from '../exact/integer.ts';
import { primitiveVector, range, rankOf } from '../exact/matrix.ts';
import { type Rational, rational } from '../exact/rational.ts';
import { ELECTRON, sameSpecies } from '../species/species.ts';
import { PROTON } from './media.ts';

/** One oxidation with one reduction, and the overall numbers that they add up to. */
export interface Pair {
  /** Of `unknowns`, whole and primitive. */
  readonly oxidation: Numbers;
  readonly reduction: Numbers;
  readonly overall: Numbers;
  /** Exchanged at the scale of `overall`. */
  readonly electrons: Rational;
}

/** Pairs with the unknowns that their numbers belong to: those of the skeleton, H^+ if it is passed on, the electron. */
export interface Pairing {
  readonly unknowns: readonly Unknown[];
  readonly pairs: readonly Pair[];
}

/** Pairs of halves looked at. */
const MOST_PAIRS = 20_000;

/**
 * Every way to pair one oxidation with one reduction so that each species of the skeleton takes part on its side. The
 * halves are the elementary balances with an electron: none can lose a species. Where the medium lends no H^+ the two
 * halves may still hand it to one another, as those of a molecular skeleton do; it must then cancel.
 * The pairs come in the order of `usualFirst`; none where the halves are too many to list.
 */
export const pairHalves = (skeletonUnknowns: readonly Unknown[]): Pairing => {
  const passesProton = !skeletonUnknowns.some((unknown) => sameSpecies(unknown.species, PROTON));
  const base = passesProton ? [...skeletonUnknowns, lent(PROTON)] : skeletonUnknowns;
  const unknowns = [...base, electron('free')];
  const [oxidations, reductions] = [halves(base, 'right'), halves(base, 'left')];
  const pairs: Pair[] = [];
  if (oxidations.length * reductions.length > MOST_PAIRS) return { unknowns, pairs };
  for (const oxidation of oxidations) {
    for (const reduction of reductions) {
      const pair = join(oxidation, reduction);
      const proton = passesProton ? pair.overall[base.length - 1] : 0n;
      if (proton === 0n && covers(unknowns, pair) && usesIndependent(unknowns, pair)) pairs.push(pair);
    }
  }
  return { unknowns, pairs: usualFirst(unknowns, pairs) };
};

const lent = (species: Unknown['species']): Unknown => ({ species, side: 'free', written: false, helper: true });

const electron = (side: Unknown['side']): Unknown => ({ species: ELECTRON, side, written: false, helper: false });

/** Elementary balances with the electron on `side`: on the left a reduction, on the right an oxidation. */
const halves = (base: readonly Unknown[], side: 'left' | 'right'): readonly Numbers[] => {
  const found = elementaryBalances([...base, electron(side)]);
  return found.kind === 'too-hard' ? [] : found.balances.filter((numbers) => numbers.at(-1) !== 0n);
};

/**
 * With electron numbers p of the oxidation and q of the reduction, g their greatest common divisor:
 *     overall = (q/g) oxidation + (p/g) reduction,   electrons = lcm(p, q),   both over the content of the overall numbers
 */
const join = (oxidation: Numbers, reduction: Numbers): Pair => {
  const [p, q] = [magnitude(oxidation.at(-1) ?? 0n), magnitude(reduction.at(-1) ?? 0n)];
  const g = gcd(p, q);
  const sum = oxidation.map((value, index) => (q / g) * value + (p / g) * (reduction[index] ?? 0n));
  const content = gcdOf(sum);
  return {
    oxidation,
    reduction,
    overall: primitiveVector(sum),
    electrons: rational(lcm(p, q), content === 0n ? 1n : content),
  };
};

/** Every species with a side takes part; the halves keep sides, so their sum does. */
const covers = (unknowns: readonly Unknown[], { overall }: Pair): boolean =>
  unknowns.every(({ side }, index) => side === 'free' || overall[index] !== 0n);

/** The free species that the two halves use do not depend on one another: H^+ in one and OH^- in the other is no pair. */
const usesIndependent = (unknowns: readonly Unknown[], { oxidation, reduction }: Pair): boolean => {
  const used = range(unknowns.length).filter(
    (index) => unknowns[index]?.side === 'free' && (oxidation[index] !== 0n || reduction[index] !== 0n),
  );
  const { rows } = speciesMatrix(unknowns.map((unknown) => unknown.species));
  return rankOf(pickColumns(rows, used)) === used.length;
};

/**
 * The chemist's usual answer first: the pair whose larger half has the fewest written species (a couple of one reactant
 * and one product before anything else), then the fewest written species in both, then the fewest electrons exchanged,
 * then the smallest numbers.
 */
const usualFirst = (unknowns: readonly Unknown[], pairs: readonly Pair[]): readonly Pair[] => {
  const size = (half: Numbers): number =>
    unknowns.filter((unknown, index) => unknown.written && half[index] !== 0n).length;
  const keys = (pair: Pair): readonly number[] => {
    const [a, b] = [size(pair.oxidation), size(pair.reduction)];
    return [
      Math.max(a, b),
      a + b,
      pair.electrons.valueOf(),
      Number(pair.overall.reduce((s, v) => s + magnitude(v), 0n)),
    ];
  };
  const byKeys = (a: Pair, b: Pair): number => {
    const other = keys(b);
    return (
      keys(a)
        .map((value, at) => value - (other[at] ?? 0))
        .find((difference) => difference !== 0) ?? 0
    );
  };
  return pairs.toSorted(byKeys);
};
