import type { Reaction } from '../balance/reaction.ts';
import type { Rational } from '../exact/rational.ts';
import type { Medium } from './medium.ts';

/** A balanced half-reaction that exchanges electrons. */
export interface HalfReaction {
  readonly reaction: Reaction;
  readonly kind: 'reduction' | 'oxidation';
  /** Electron number, positive, at the scale of `reaction`. */
  readonly electrons: Rational;
  readonly medium: Medium;
  /** Unknown species minus rank of elements and charge. */
  readonly dimension: number;
}
