import type { Reaction } from '../balance/reaction.ts';
import type { Rational } from '../exact/rational.ts';
import type { HalfReaction } from '../redox/half-reaction.ts';
import type { Species } from '../species/species.ts';

/** The two electrodes: oxidation runs at the anode, reduction at the cathode. */
export type Electrode = 'anode' | 'cathode';

/** A half-reaction at an electrode, with the part of that electrode's current it takes (0 to 1) or null. */
export interface ElectrodeReaction {
  readonly half: HalfReaction;
  readonly share: Rational | null;
}

/** A half-reaction and how often it runs in the cell reaction. */
export interface WeightedHalf {
  readonly half: HalfReaction;
  readonly multiplier: Rational;
}

/** What stood on both sides of the sum and was struck out, at the scale of the overall reaction. */
export interface Cancelled {
  readonly species: Species;
  readonly amount: Rational;
}

/**
 * What must pass the separator for each electron in the outer circuit, so that neither half-cell charges up.
 * An ion made at one electrode and used at the other crosses by itself; `species` null is positive charge that
 * ions taking no part in the half-reactions must carry (cations with the arrow, or anions against it).
 */
export interface Crossing {
  readonly species: Species | null;
  /** Moles per mole of electrons; of unit positive charges where `species` is null. */
  readonly amount: Rational;
  readonly from: Electrode;
  readonly to: Electrode;
}

/** A cell: its overall reaction with the electron number, and how the half-reactions add up to it. */
export interface CellReaction {
  readonly overall: Reaction;
  /** Whole: overall reaction and electron number together are in lowest terms. */
  readonly electrons: Rational;
  readonly anode: readonly WeightedHalf[];
  readonly cathode: readonly WeightedHalf[];
  readonly cancelled: readonly Cancelled[];
  /** Water made of H^+ and OH^- that stood on one side, at the scale of the overall reaction. */
  readonly waterFormed: Rational;
  /** Only with a separator, else null. */
  readonly crossing: readonly Crossing[] | null;
}
