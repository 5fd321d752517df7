import { ledgerOf, showLedger } from '../../balance/ledger.ts';
import { showReaction } from '../../balance/reaction.ts';
import type { CellReaction, WeightedHalf } from '../../cell/cell-reaction.ts';
import { showRational } from '../../exact/rational.ts';
import type { RedoxReaction } from '../../redox/redox.ts';
import type { HalfReaction } from '../../redox/half-reaction.ts';
import { plainSpecies } from '../../species/species.ts';
import type { CellAnswer, RedoxAnswer } from '../schema/answer.ts';
import type { ShownHalf, ShownScaledHalf } from '../schema/shape.ts';
import { showMedium } from './species.ts';

/** The contract's HALF. */
export const showHalf = (half: HalfReaction): ShownHalf => ({
  reaction: showReaction(half.reaction),
  kind: half.kind,
  electrons: showRational(half.electrons),
  medium: showMedium(half.medium),
  ledger: showLedger(ledgerOf(half.reaction)),
  dimension: half.dimension,
});

/** A half-reaction with how often it is taken. */
export const showWeighted = ({ half, multiplier }: WeightedHalf): ShownScaledHalf => ({
  ...showHalf(half),
  multiplier: showRational(multiplier),
});

/** The answer to an ask of kind `cell`. */
export const showCell = (cell: CellReaction): CellAnswer => ({
  overall: showReaction(cell.overall),
  electrons: showRational(cell.electrons),
  ledger: showLedger(ledgerOf(cell.overall)),
  anode: cell.anode.map(showWeighted),
  cathode: cell.cathode.map(showWeighted),
  cancelled: cell.cancelled.map(({ species, amount }) => ({
    species: plainSpecies(species),
    amount: showRational(amount),
  })),
  waterFormed: showRational(cell.waterFormed),
  ...(cell.crossing === null
    ? {}
    : {
        crossing: cell.crossing.map(({ species, amount, from, to }) => ({
          species: species === null ? null : plainSpecies(species),
          amount: showRational(amount),
          from,
          to,
        })),
      }),
});

/** The answer to an ask of kind `redox`. */
export const showRedox = ({
  overall,
  electrons,
  dimension,
  oxidation,
  reduction,
  changes,
}: RedoxReaction): RedoxAnswer => ({
  overall: showReaction(overall),
  electrons: showRational(electrons),
  dimension,
  ledger: showLedger(ledgerOf(overall)),
  ...(oxidation === null ? {} : { oxidation: showWeighted(oxidation) }),
  ...(reduction === null ? {} : { reduction: showWeighted(reduction) }),
  changes: changes.map(({ element, from, to }) => ({ element, from: showRational(from), to: showRational(to) })),
});
