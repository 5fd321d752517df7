import { lcmOf } from '../exact/integer.ts';
import { type Rational, ONE, denominatorOf, isWhole, rational } from '../exact/rational.ts';
import type { Medium } from '../redox/medium.ts';
import type { Species } from '../species/species.ts';
import { helpersFor, lentTo } from './helper-ions.ts';
import type { RepairKind } from './repair-kinds.ts';
import { balancesOf } from './solve.ts';
import {
  type Columns,
  type Draft,
  type DraftTerm,
  type Surplus,
  columnsOf,
  signedColumn,
  surplusOf,
} from './writing.ts';

/** An equation that does not conserve, ready for the search of repairs. */
export interface Problem {
  readonly draft: Draft;
  readonly medium: Medium | undefined;
  /** Helpers that may have been forgotten. */
  readonly helpers: readonly Species[];
  readonly columns: Columns;
  readonly surplus: Surplus;
  /** Common denominator of the written numbers; a repair keeps to it. */
  readonly denominator: bigint;
  /** The balances of the terms as they stand, one vector for each independent one, most of its numbers positive. */
  readonly balances: readonly (readonly bigint[])[];
  /** Whether the written species balance on the sides where they stand. */
  readonly solvable: boolean;
}

/** A repaired equation before it is ranked. */
export interface Candidate {
  readonly kind: RepairKind;
  readonly draft: Draft;
}

/** Written fractions finer than this are rounded decimals: a repair does not keep to them. */
const FINEST = 60n;

const commonDenominator = (draft: Draft): bigint => {
  const denominator = lcmOf(draft.map(({ coefficient }) => denominatorOf(coefficient)));
  return denominator > FINEST ? 1n : denominator;
};

/** The problem that `draft` poses. */
export const problemOf = (draft: Draft, medium: Medium | undefined): Problem => {
  const columns = columnsOf([...draft.map(({ species }) => species), ...lentTo(draft, medium)]);
  const balances = balancesOf(
    draft.map((term) => signedColumn(columns, term)),
    columns.rowCount,
  );
  return {
    draft,
    medium,
    helpers: helpersFor(draft, medium),
    columns,
    surplus: surplusOf(draft, columns),
    denominator: commonDenominator(draft),
    balances,
    solvable: balances.length > 1 || balances[0]?.every((value) => value > 0n) === true,
  };
};

/** True where `value` is no finer a fraction than those that were written. */
export const keepsToFractions = (value: Rational, { denominator }: Problem): boolean =>
  isWhole(value.mul(rational(denominator)));

/** A term that was not written. */
export const addedTerm = (species: Species, side: DraftTerm['side'], coefficient: Rational = ONE): DraftTerm => ({
  species,
  side,
  coefficient,
  coefficientWritten: false,
  origin: null,
});

/** True where both sides still have a term. */
export const hasBothSides = (draft: Draft): boolean =>
  draft.some(({ side }) => side === 'left') && draft.some(({ side }) => side === 'right');
