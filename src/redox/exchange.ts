import type { Reaction } from '../balance/reaction.ts';
import { type Rational, ZERO, signOf } from '../exact/rational.ts';
import { type Label, countOf, distinctLabels, labelsOfAll } from './labels.ts';

/**
 * The electrons that an overall reaction exchanges at its own scale: the sum of all increases in oxidation number.
 * Undefined where convention does not decide the oxidation numbers of some species.
 *
 * For each element the labels used up are matched to those formed in rising order, the lowest with the lowest: numbers do
 * not cross, and no matching has a smaller sum.
 */
export const exchangedElectrons = (reaction: Reaction): Rational | undefined => {
  const all = labelsOfAll(reaction.terms.map(({ species }) => species));
  if (all === undefined) return undefined;
  const labels = distinctLabels(all);
  const net = (label: Label): Rational =>
    reaction.terms.reduce((sum, { nu }, index) => sum.add(nu.mul(countOf(all[index] ?? [], label))), ZERO);
  const elements = new Set(labels.map(({ element }) => element));
  return [...elements].reduce((sum, element) => {
    const own = labels.filter((label) => label.element === element).toSorted((a, b) => a.number.compare(b.number));
    return sum.add(increases(own.map((label) => ({ number: label.number, amount: net(label) }))));
  }, ZERO);
};

interface Net {
  readonly number: Rational;
  /** Atoms formed with this number, or used up where negative. */
  readonly amount: Rational;
}

/**
 * `nets` rise in number and add up to 0. What is used up below a gap between two neighbours and not formed there must
 * cross the gap upwards, each atom rising by the width of the gap:  sum of  width * max(0, used - formed below).
 */
const increases = (nets: readonly Net[]): Rational => {
  let [sum, below] = [ZERO, ZERO];
  nets.forEach(({ number, amount }, index) => {
    const next = nets[index + 1];
    below = below.sub(amount);
    if (next !== undefined && signOf(below) > 0n) sum = sum.add(next.number.sub(number).mul(below));
  });
  return sum;
};
