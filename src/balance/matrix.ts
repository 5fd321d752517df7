import { lcmOf } from '../exact/integer.ts';
import type { IntegerMatrix } from '../exact/matrix.ts';
import { type Rational, ZERO, denominatorOf, numeratorOf } from '../exact/rational.ts';
import type { Species } from '../species/species.ts';

/** What is conserved: an element or nuclide as a composition keys it ("Fe", "2H"), or the charge. */
export type Label = string;

/** The label of the charge; no element has a name in lower case. */
export const CHARGE: Label = 'charge';

/** The conservation matrix: a row for each label, a column for each species. */
export interface SpeciesMatrix {
  readonly rows: IntegerMatrix;
  /** Elements in the order in which they first appear, the charge last. */
  readonly labels: readonly Label[];
  /** What each row was multiplied by to make it whole: 1 without decimal subscripts. */
  readonly scales: readonly bigint[];
}

/** How much of `label` one formula unit of `species` carries. */
export const amountOf = (species: Species, label: Label): Rational =>
  label === CHARGE ? species.charge : (species.composition.get(label) ?? ZERO);

/**
 * Elements and charge of `species` as whole numbers. A reaction conserves where  sum nu_j a_ij = 0  in every row i;
 * a row may be multiplied by any number but 0 without change, so decimal subscripts are cleared row by row with the
 * least common multiple of their denominators.
 */
export const speciesMatrix = (species: readonly Species[]): SpeciesMatrix => {
  const elements = new Set(species.flatMap((one) => [...one.composition.keys()]));
  const labels = [...elements, CHARGE];
  const amounts = labels.map((label) => species.map((one) => amountOf(one, label)));
  const scales = amounts.map((row) => lcmOf(row.map(denominatorOf)));
  return { labels, scales, rows: amounts.map((row, index) => wholeRow(row, scales[index] ?? 1n)) };
};

const wholeRow = (row: readonly Rational[], scale: bigint): bigint[] =>
  row.map((value) => numeratorOf(value) * (scale / denominatorOf(value)));

/** `matrix` with the columns `columns` only, in that order. */
export const pickColumns = (matrix: IntegerMatrix, columns: readonly number[]): IntegerMatrix =>
  matrix.map((row) => columns.map((column) => row[column] ?? 0n));
