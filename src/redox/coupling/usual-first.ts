import type { Unknown } from '../../balance/unknowns.ts';
import { magnitude } from '../../exact/integer.ts';
import { range } from '../../exact/matrix.ts';
import { ZERO, signOf } from '../../exact/rational.ts';
import { type Labelled, countOf } from './labels.ts';
import type { Pair } from './pair.ts';
import { isSolvent } from './solvent.ts';
import { untracedElements } from './untraced.ts';

/**
 * The chemist's usual answer first: pairs in which all that changes in a half goes the same way, up in the oxidation and
 * down in the reduction; then those with the fewest changes; then those that leave the solvent and other helpers alone;
 * then of two partners rather than one; then those whose products keep the elements of the reactant; then those that assume
 * nothing besides; then with the fewest electrons per atom that changes; then with the smallest numbers.
 */
export const usualFirst =
  (unknowns: readonly Unknown[], labelled: readonly Labelled[]) =>
  (a: Pair, b: Pair): number => {
    const keys = (pair: Pair): readonly number[] => {
      const { oxidation, reduction, electrons, numbers } = pair;
      const atoms = [...oxidation.moved, ...reduction.moved].reduce((sum, value) => sum.add(value), ZERO);
      const strange = strangers(unknowns, labelled, pair);
      const size = numbers.reduce((sum, value) => sum + magnitude(value), 0n);
      return [
        isPure(pair) ? 0 : 1,
        oxidation.transitions.length + reduction.transitions.length,
        unknowns.filter((one, at) => isSolvent(one) && (oxidation.index === at || reduction.index === at)).length,
        oxidation.index === reduction.index ? 1 : 0,
        strange,
        pair.also === undefined ? 0 : 1,
        electrons.div(atoms).valueOf(),
        Number(size),
      ];
    };
    const other = keys(b);
    return (
      keys(a)
        .map((value, at) => value - (other[at] ?? 0))
        .find((difference) => difference !== 0) ?? 0
    );
  };

/** Elements, untraced ones aside, that a partner does not share with the nearest product of each of its changes. */
const strangers = (unknowns: readonly Unknown[], labelled: readonly Labelled[], pair: Pair): number => {
  const loose = untracedElements(unknowns);
  const traced = (index: number): readonly string[] =>
    [...(unknowns[index]?.species.composition.keys() ?? [])].filter((element) => !loose.has(element));
  const apart = (a: readonly string[], b: readonly string[]): number =>
    a.filter((element) => !b.includes(element)).length + b.filter((element) => !a.includes(element)).length;
  const steps = [pair.oxidation, pair.reduction].flatMap(({ index, transitions }) =>
    transitions.map(({ to }) => ({ index, to })),
  );
  const distances = steps.map(({ index, to }) => {
    const holders = range(unknowns.length).filter(
      (other) => (pair.numbers[other] ?? 0n) > 0n && signOf(countOf(labelled[other] ?? [], to)) > 0n,
    );
    return Math.min(...holders.map((holder) => apart(traced(index), traced(holder))));
  });
  return distances.reduce((sum, distance) => sum + distance, 0);
};

const isPure = ({ oxidation, reduction }: Pair): boolean =>
  oxidation.transitions.every(({ given }) => signOf(given) > 0n) &&
  reduction.transitions.every(({ given }) => signOf(given) < 0n);
