import { speciesMatrix } from '../balance/matrix.ts';
import type { Numbers } from '../balance/solve.ts';
import type { Unknown } from '../balance/unknowns.ts';
import { gcdOf } from '../exact/integer.ts';
import { type IntegerMatrix, nullSpace, primitiveVector } from '../exact/matrix.ts';
import { type Rational, ZERO, denominatorOf, numeratorOf, rational, signOf } from '../exact/rational.ts';
import { isElectron } from '../species/species.ts';
import { onTheirSides } from './assume.ts';
import {
  type Label,
  type Labelled,
  type Transition,
  countOf,
  distinctLabels,
  labelRows,
  labelsOfAll,
} from './labels.ts';
import type { Change, MeasuredChange, Pair } from './pair.ts';
import { usualFirst } from './usual-first.ts';

/** Changes that are thought of, and pairs of them that are tried; among many unknowns fewer, since each try costs more. */
const MOST_CHANGES = 400;
const triesAmong = (count: number): number => Math.min(4_000, Math.floor(400_000 / (count * count)));

/**
 * Every way to pair the oxidation of one reactant with the reduction of one reactant in which each species of a skeleton
 * takes part on its side, the chemist's usual answer first (`usualFirst`). Besides elements and charge each oxidation
 * number of each element is conserved but for the changes that the pair assumes; the pair counts where that, or with it
 * that all of a partner's atoms of a changing number change, leaves one balance. In a half at least one element changes, each of its oxidation numbers to one other. None where convention does
 * not decide the oxidation numbers.
 */
export const pairHalves = (unknowns: readonly Unknown[]): readonly Pair[] => {
  const labelled = labelsOfAll(unknowns.map(({ species }) => species));
  if (labelled === undefined) return [];
  const changes = changesOf(unknowns, labelled).slice(0, MOST_CHANGES);
  const order = usualFirst(unknowns, labelled);
  const found = new Map<string, Pair>();
  for (const [one, other] of inPairs(changes).slice(0, triesAmong(unknowns.length))) {
    const pair = balancePair(unknowns, labelled, one, other);
    const name = pair?.numbers.join() ?? '';
    const known = found.get(name);
    if (pair !== undefined && (known === undefined || order(pair, known) < 0)) found.set(name, pair);
  }
  return [...found.values()].toSorted(order);
};

/** Changes of each reactant to oxidation numbers that some product has. */
const changesOf = (unknowns: readonly Unknown[], labelled: readonly Labelled[]): readonly Change[] => {
  const targets = distinctLabels(labelled.filter((_, index) => unknowns[index]?.side !== 'left'));
  return unknowns.flatMap((unknown, index) => {
    if (unknown.side === 'right' || isElectron(unknown.species)) return [];
    const own = (labelled[index] ?? []).map(({ label }) => label);
    return subsets(own, targets).map((transitions): Change => ({ index, transitions }));
  });
};

/** For each label stay, or go to one target of its element; all stay is no change. */
const subsets = (own: readonly Label[], targets: readonly Label[]): readonly (readonly Transition[])[] => {
  let found: readonly (readonly Transition[])[] = [[]];
  for (const from of own) {
    const ways = targets.filter((to) => to.element === from.element && to.name !== from.name);
    const steps = ways.map((to): Transition => ({ from, to, given: to.number.sub(from.number) }));
    found = found.flatMap((before) => [before, ...steps.map((step) => [...before, step])]);
  }
  return found.filter((transitions) => transitions.length > 0);
};

/** Two changes, those of fewest transitions first; not two that move the same label to the same target. */
const inPairs = (changes: readonly Change[]): readonly (readonly [Change, Change])[] => {
  const pairs = changes.flatMap((one, index) =>
    changes
      .slice(index + 1)
      .flatMap((other): readonly (readonly [Change, Change])[] =>
        one.transitions.some((a) =>
          other.transitions.some((b) => a.from.name === b.from.name && a.to.name === b.to.name),
        )
          ? []
          : [[one, other]],
      ),
  );
  const size = ([one, other]: readonly [Change, Change]): number => one.transitions.length + other.transitions.length;
  return pairs.toSorted((a, b) => size(a) - size(b));
};

const balancePair = (
  unknowns: readonly Unknown[],
  labelled: readonly Labelled[],
  one: Change,
  other: Change,
): Pair | undefined => {
  const transitions = [...one.transitions, ...other.transitions];
  const width = unknowns.length + transitions.length;
  const { rows } = speciesMatrix(unknowns.map(({ species }) => species));
  const joined = [...rows.map((row) => [...row, ...transitions.map(() => 0n)]), ...labelRows(labelled, transitions)];
  const whole = wholeRows(unknowns.length, labelled, [one, other]);
  const line = onlyVector(joined, width) ?? onlyVector([...joined, ...whole], width);
  if (line === undefined) return undefined;
  const numbers = onTheirSides(unknowns, line.slice(0, unknowns.length));
  if (numbers === undefined) return undefined;
  // what moves follows the sign and, since numbers of their own are made primitive, the content of the species' part
  const scale = gcdOf(numbers) * (numbers.every((value, index) => value === line[index]) ? 1n : -1n);
  const moved = line.slice(unknowns.length).map((value) => rational(value, scale));
  if (moved.some((value) => signOf(value) <= 0n)) return undefined;
  const at = one.transitions.length;
  const measured = [
    { ...one, moved: moved.slice(0, at) },
    { ...other, moved: moved.slice(at) },
  ].toSorted((a, b) => electronsGiven(b).compare(electronsGiven(a)));
  const [oxidation, reduction] = measured;
  if (oxidation === undefined || reduction === undefined) return undefined;
  const electrons = electronsGiven(oxidation);
  return signOf(electrons) === 0n ? undefined : { oxidation, reduction, numbers: primitiveVector(numbers), electrons };
};

/** The vector that spans the null space of `rows`, if one does. */
const onlyVector = (rows: IntegerMatrix, width: number): Numbers | undefined => {
  const [line, second] = nullSpace(rows, width);
  return second === undefined ? line : undefined;
};

/**
 * Where the labels alone leave the pair open, all that may change in a partner does: of reactant j, n atoms of a label in
 * one formula unit,   moved + n nu_j = 0.
 */
const wholeRows = (count: number, labelled: readonly Labelled[], changes: readonly Change[]): IntegerMatrix => {
  const steps = changes.flatMap(({ index, transitions }) => transitions.map(({ from }) => ({ index, from })));
  return steps.map(({ index, from }, at) => {
    const atoms = countOf(labelled[index] ?? [], from);
    const row = new Array<bigint>(count + steps.length).fill(0n);
    row[index] = numeratorOf(atoms);
    row[count + at] = denominatorOf(atoms);
    return row;
  });
};

/** Electrons that a change gives; negative where it takes them. In a pair the two sums are opposite. */
const electronsGiven = ({ transitions, moved }: MeasuredChange): Rational =>
  transitions.reduce((sum, { given }, at) => sum.add(given.mul(moved[at] ?? ZERO)), ZERO);
