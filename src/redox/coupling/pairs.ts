import type { Unknown } from '../../balance/unknowns.ts';
import { type Bounds, type Meter, USUAL_BOUNDS, startMeter } from '../../exact/bounds.ts';
import { signOf } from '../../exact/rational.ts';
import { isElectron } from '../../species/species.ts';
import { balancePair } from './balance-pair.ts';
import { type Label, type Labelled, type Transition, distinctLabels } from './labels.ts';
import { labelsInSkeleton } from './odd-atom.ts';
import type { Change, Pair } from './pair.ts';
import { isSolvent } from './solvent.ts';
import { usualFirst } from './usual-first.ts';

/** Changes that are thought of, and pairs of them that are tried; among many unknowns fewer, since each try costs more. */
const MOST_CHANGES = 400;
const BOUNDS: Bounds = { ...USUAL_BOUNDS, steps: 40_000_000 };
const triesAmong = (count: number): number => Math.min(4_000, Math.floor(400_000 / (count * count)));

/**
 * Every way to pair the oxidation of one reactant with the reduction of one reactant in which each species of a skeleton
 * takes part on its side, the chemist's usual answer first (`usualFirst`). Besides elements and charge each oxidation
 * number of each element is conserved but for the changes that the pair assumes; the pair counts where that, or with it
 * that all of a partner's atoms of a changing number change, leaves one balance. In a half at least one element changes, each of its oxidation numbers to one other. None where convention does
 * not decide the oxidation numbers.
 */
export const pairHalves = (unknowns: readonly Unknown[], whole?: Meter): readonly Pair[] => {
  const labelled = labelsInSkeleton(unknowns);
  if (labelled === undefined) return [];
  const changes = changesOf(unknowns, labelled).slice(0, MOST_CHANGES);
  const order = usualFirst(unknowns, labelled);
  const found = new Map<string, Pair>();
  const meter = startMeter(BOUNDS, whole);
  for (const [one, other] of inPairs(changes).slice(0, triesAmong(unknowns.length))) {
    const pair = balancePair(unknowns, labelled, [one, other], meter);
    if (meter.passed() !== undefined) break;
    const name = pair?.numbers.join() ?? '';
    const known = found.get(name);
    if (pair !== undefined && (known === undefined || order(pair, known) < 0)) found.set(name, pair);
  }
  return [...found.values()].toSorted(order);
};

/** Changes of each reactant to oxidation numbers that some product has. */
const changesOf = (unknowns: readonly Unknown[], labelled: readonly Labelled[]): readonly Change[] => {
  const targets = distinctLabels(labelled.filter((_, index) => unknowns[index]?.side !== 'left'));
  const lent = distinctLabels(labelled.filter((_, index) => unknowns[index]?.helper));
  return unknowns.flatMap((unknown, index) => {
    if (unknown.side === 'right' || isElectron(unknown.species)) return [];
    const own = (labelled[index] ?? []).map(({ label }) => label);
    const all = subsets(own, targets);
    const kept = isSolvent(unknown) ? all : all.filter((transitions) => !isOfSolvent(transitions, lent));
    return kept.map((transitions): Change => ({ index, transitions }));
  });
};

/**
 * Atoms that could as well be the solvent's are oxidised, and none but of their elements change beside them: then it is the
 * solvent that is oxidised, 2 H2O -> O2 + ..., and not the sulfate in S2O8^2-.
 */
const isOfSolvent = (transitions: readonly Transition[], lent: readonly Label[]): boolean =>
  transitions.every(({ from }) => lent.some(({ element }) => element === from.element)) &&
  transitions.some(({ from, given }) => signOf(given) > 0n && lent.some(({ name }) => name === from.name));

/** For each label stay, or go to one target of its element; all stay is no change. */
const subsets = (own: readonly Label[], targets: readonly Label[]): readonly (readonly Transition[])[] => {
  let found: readonly (readonly Transition[])[] = [[]];
  for (const from of own) {
    const ways = targets.filter((to) => to.element === from.element && !to.number.equals(from.number));
    const steps = ways.map((to): Transition => ({ from, to, given: to.number.sub(from.number) }));
    // each label multiplies the ways; cut as they grow, not when millions stand
    found = found.flatMap((before) => [before, ...steps.map((step) => [...before, step])]).slice(0, MOST_CHANGES);
  }
  return found.filter((transitions) => transitions.length > 0);
};

/**
 * Two changes, those of fewest transitions first; not two that move the same label to the same target, nor two that only
 * exchange their labels: electrons that go in a circle are none.
 */
const inPairs = (changes: readonly Change[]): readonly (readonly [Change, Change])[] => {
  const pairs = changes.flatMap((one, index) =>
    changes
      .slice(index + 1)
      .flatMap((other): readonly (readonly [Change, Change])[] =>
        one.transitions.some((a) => other.transitions.some((b) => isSame(a, b) || isOpposite(a, b)))
          ? []
          : [[one, other]],
      ),
  );
  const size = ([one, other]: readonly [Change, Change]): number => one.transitions.length + other.transitions.length;
  return pairs.toSorted((a, b) => size(a) - size(b));
};

const isSame = (a: Transition, b: Transition): boolean => a.from.name === b.from.name && a.to.name === b.to.name;

const isOpposite = (a: Transition, b: Transition): boolean =>
  a.from.element === b.from.element && a.from.number.equals(b.to.number) && b.from.number.equals(a.to.number);
