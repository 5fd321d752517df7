import { type Rational, denominatorOf, numeratorOf } from '../exact/rational.ts';
import { lcmOf } from '../exact/integer.ts';
import { type IntegerMatrix, type IntegerVector, entry } from '../exact/matrix.ts';
import { speciesMatrix } from '../balance/matrix.ts';
import type { Reaction } from '../balance/reaction.ts';
import type { Equation, EquationTerm } from '../species/equation.ts';
import type { Species } from '../species/species.ts';

/** The side of the arrow. */
export type Side = 'left' | 'right';

/** The other side. */
export const otherSide = (side: Side): Side => (side === 'left' ? 'right' : 'left');

/** A term of an equation that may differ from what was written. */
export interface DraftTerm {
  readonly species: Species;
  readonly side: Side;
  /** Positive. */
  readonly coefficient: Rational;
  /** Whether the number itself is written. */
  readonly coefficientWritten: boolean;
  /** Index of the written term it comes from; null for an added one. */
  readonly origin: number | null;
}

/** An equation, written or repaired, reactants first. */
export type Draft = readonly DraftTerm[];

/** The terms of `equation` as they are written. */
export const draftOf = (equation: Equation): Draft => {
  const side = (terms: readonly EquationTerm[], which: Side, first: number): Draft =>
    terms.map(({ species, coefficient, coefficientWritten }, index) => ({
      species,
      side: which,
      coefficient,
      coefficientWritten,
      origin: first + index,
    }));
  return [...side(equation.left, 'left', 0), ...side(equation.right, 'right', equation.left.length)];
};

/** The reaction that a draft writes: stoichiometric numbers negative on the left. */
export const reactionOf = (draft: Draft): Reaction => ({
  terms: [...draft.filter(({ side }) => side === 'left'), ...draft.filter(({ side }) => side === 'right')].map(
    ({ species, side, coefficient }) => ({ species, nu: side === 'left' ? coefficient.neg() : coefficient }),
  ),
});

/** Whole columns of what is conserved, one for each species asked for, in one order of rows. */
export interface Columns {
  /** The column of a species that was given to `columnsOf`. */
  readonly of: (species: Species) => IntegerVector;
  readonly rowCount: number;
}

/** The columns of `species`: atoms of each element, and the charge number. */
export const columnsOf = (species: readonly Species[]): Columns => {
  const { rows } = speciesMatrix(species);
  const byKey = new Map(species.map((one, index) => [one.key, rows.map((row) => entry(row, index))]));
  return { of: (one) => byKey.get(one.key) ?? [], rowCount: rows.length };
};

/** The column of a term, its sign that of its side: right counts, left takes away. */
export const signedColumn = (
  columns: Columns,
  { species, side }: Pick<DraftTerm, 'species' | 'side'>,
): IntegerVector => {
  const column = columns.of(species);
  return side === 'right' ? column : column.map((value) => -value);
};

/** The matrix with these columns. */
export const matrixOf = (columns: readonly IntegerVector[], rowCount: number): IntegerMatrix =>
  Array.from({ length: rowCount }, (_, row) => columns.map((column) => entry(column, row)));

/** A surplus: `vector` divided by `scale` is right minus left. */
export interface Surplus {
  readonly vector: IntegerVector;
  readonly scale: bigint;
}

/** Right minus left of a draft, over its common denominator. */
export const surplusOf = (draft: Draft, columns: Columns): Surplus => {
  const scale = lcmOf(draft.map(({ coefficient }) => denominatorOf(coefficient)));
  const vector = new Array<bigint>(columns.rowCount).fill(0n);
  for (const { species, side, coefficient } of draft) {
    const whole = (numeratorOf(coefficient) * scale) / denominatorOf(coefficient);
    const times = side === 'left' ? -whole : whole;
    columns.of(species).forEach((value, row) => {
      vector[row] = (vector[row] ?? 0n) + times * value;
    });
  }
  return { vector, scale };
};

/** True where nothing is left over. */
export const isConserved = ({ vector }: Surplus): boolean => vector.every((value) => value === 0n);
