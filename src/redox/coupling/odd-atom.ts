import type { Unknown } from '../../balance/unknowns.ts';
import { range } from '../../exact/matrix.ts';
import { ONE, isZero } from '../../exact/rational.ts';
import type { Species } from '../../species/species.ts';
import { type Label, type Labelled, labelsOfAll } from './labels.ts';

/**
 * The labels of the unknowns of a skeleton; undefined where convention does not decide. Where a form of an element on the
 * left has one atom more than a form of it on the right, that atom has a label of its own: ozone that oxidises gives it
 * away and leaves as oxygen, O3 + 2 H^+ + 2 e^- -> O2 + H2O. Common practice, no source.
 */
export const labelsInSkeleton = (unknowns: readonly Unknown[]): readonly Labelled[] | undefined =>
  labelsOfAll(unknowns.map(({ species }) => species))?.map((labelled, index) =>
    lesserForm(unknowns, index) === undefined ? labelled : withOddAtom(labelled),
  );

/** The place of the form with one atom less that the reactant at `index` leaves as, O2 for O3, if there is one. */
export const lesserForm = (unknowns: readonly Unknown[], index: number): number | undefined => {
  const form = unknowns[index];
  if (form?.side !== 'left') return undefined;
  return range(unknowns.length).find((other) => {
    const lesser = unknowns[other];
    return lesser?.side === 'right' && hasOneLess(lesser.species, form.species);
  });
};

const hasOneLess = (lesser: Species, form: Species): boolean => {
  const [[element, count] = [], ...others] = form.composition;
  if (element === undefined || count === undefined || others.length > 0 || lesser.composition.size !== 1) return false;
  if (!isZero(form.charge) || !isZero(lesser.charge)) return false;
  return lesser.composition.get(element)?.add(ONE).equals(count) ?? false;
};

const withOddAtom = (labelled: Labelled): Labelled =>
  labelled.flatMap(({ label, count }) => {
    const odd: Label = { ...label, name: `${label.name}, odd`, odd: true };
    return [
      { label: odd, count: ONE },
      { label, count: count.sub(ONE) },
    ];
  });
