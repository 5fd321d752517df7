import { lcmOf } from '../../exact/integer.ts';
import type { IntegerMatrix } from '../../exact/matrix.ts';
import { type Rational, ZERO, denominatorOf, numeratorOf, showRational } from '../../exact/rational.ts';
import { oxidationNumbers } from '../../species/oxidation.ts';
import { type Species, isElectron } from '../../species/species.ts';

/** Atoms of one element with one oxidation number: `name` is "Mn 7". */
export interface Label {
  readonly name: string;
  readonly element: string;
  readonly number: Rational;
  /** The atom that one form of an element has more than another, O3 more than O2; its name says so too. */
  readonly odd?: true;
}

/** The labels in one formula unit of a species, with their atoms. */
export type Labelled = readonly { readonly label: Label; readonly count: Rational }[];

/** The atoms of `species` by oxidation number; none for the electron; undefined where convention does not decide. */
export const labelsOf = (species: Species): Labelled | undefined => {
  if (isElectron(species)) return [];
  const found = oxidationNumbers(species);
  if (found.kind === 'undecided') return undefined;
  return [...found.numbers].flatMap(([element, numbers]) =>
    numbers.map((number, index) => ({
      label: { name: `${element} ${showRational(number)}`, element, number },
      count: found.counts.get(element)?.[index] ?? ZERO,
    })),
  );
};

/** The labels of several species; undefined where one of them is undecided. */
export const labelsOfAll = (species: readonly Species[]): readonly Labelled[] | undefined => {
  const found = species.map(labelsOf).filter((labelled) => labelled !== undefined);
  return found.length === species.length ? found : undefined;
};

/** Atoms of `label` in a species. */
export const countOf = (labelled: Labelled, label: Label): Rational =>
  labelled.find((one) => one.label.name === label.name)?.count ?? ZERO;

/** All labels, each once, in the order in which they appear. */
export const distinctLabels = (all: readonly Labelled[]): readonly Label[] => [
  ...new Map(all.flatMap((labelled) => labelled.map(({ label }) => [label.name, label] as const))).values(),
];

/** Atoms change their label: so many electrons are given per atom, negative where they are taken. */
export interface Transition {
  readonly from: Label;
  readonly to: Label;
  readonly given: Rational;
}

/**
 * Conservation label by label. Where transition t takes tau atoms from label a to label b,
 *     sum nu_j n_jL  -  (tau where L = b)  +  (tau where L = a)  =  0     in the row of each label L
 * Columns: the species, then the transitions. Rows are made whole.
 */
export const labelRows = (all: readonly Labelled[], transitions: readonly Transition[]): IntegerMatrix =>
  distinctLabels(all).map((label) => {
    const counts = all.map((labelled) => countOf(labelled, label));
    const scale = lcmOf(counts.map(denominatorOf));
    const moved = transitions.map(({ from, to }) =>
      to.name === label.name ? -scale : from.name === label.name ? scale : 0n,
    );
    return [...counts.map((count) => numeratorOf(count) * (scale / denominatorOf(count))), ...moved];
  });
