import type { Rational } from '../exact/rational.ts';

/** Atoms of one element or nuclide: `massNumber` is "18" in ^18O, null for the natural element. D is H with "2". */
export interface Atom {
  readonly kind: 'atom';
  readonly symbol: string;
  readonly massNumber: string | null;
  /** Where the text says D or T; the nuclide is the same as ^2H or ^3H. */
  readonly spelled?: 'D' | 'T';
  readonly count: Rational;
}

/** Members in brackets, with the count that follows. */
export interface Group {
  readonly kind: 'group';
  readonly bracket: '(' | '[' | '{';
  readonly members: readonly Member[];
  readonly count: Rational;
}

/** A name defined in the ask, standing for the members of its definition. */
export interface Named {
  readonly kind: 'named';
  readonly name: string;
  readonly members: readonly Member[];
  readonly count: Rational;
}

export type Member = Atom | Group | Named;

/** One part of an adduct: 5H2O in CuSO4*5H2O. A plain formula has a single part with multiplier 1. */
export interface Part {
  readonly multiplier: Rational;
  readonly members: readonly Member[];
}

/** A formula as spelled, unknown subscripts already replaced. The electron has no parts. */
export type Formula = readonly Part[];
