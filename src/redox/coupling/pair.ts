import type { Numbers } from '../../balance/solve.ts';
import type { Rational } from '../../exact/rational.ts';
import type { Transition } from './labels.ts';

/** What one reactant undergoes: the labels that change, and to what. */
export interface Change {
  /** The reactant's place among the unknowns. */
  readonly index: number;
  readonly transitions: readonly Transition[];
}

/** A change with the atoms that each of its transitions moves, at the scale of the overall reaction. */
export interface MeasuredChange extends Change {
  readonly moved: readonly Rational[];
}

/** One oxidation paired with one reduction, and the overall numbers that follow from it. */
export interface Pair {
  readonly oxidation: MeasuredChange;
  readonly reduction: MeasuredChange;
  /** Of the unknowns, whole and primitive. */
  readonly numbers: Numbers;
  /** Exchanged at that scale. */
  readonly electrons: Rational;
  /** What is assumed besides, in words, where the two changes leave a choice: "HO2^- and O2 form one to one". */
  readonly also?: string;
}
