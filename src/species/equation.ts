import type { Rational } from '../exact/rational.ts';
import type { Span } from '../report/span.ts';
import type { Species } from './species.ts';

/** One term as written. */
export interface EquationTerm {
  /** 1 where none is written. */
  readonly coefficient: Rational;
  readonly coefficientWritten: boolean;
  readonly species: Species;
  /** Of the whole term in the equation's text, coefficient included. */
  readonly span: Span;
}

/** An equation or skeleton as written: nothing balanced, nothing merged. Both sides have at least one term. */
export interface Equation {
  readonly text: string;
  readonly left: readonly EquationTerm[];
  readonly right: readonly EquationTerm[];
}
