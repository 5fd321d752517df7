import { type Reaction, plainReaction } from '../balance/reaction.ts';
import { factorPerMole, scaled } from '../balance/scale.ts';
import type { CellReaction, WeightedHalf } from '../cell/cell-reaction.ts';
import { type Rational, ONE } from '../exact/rational.ts';
import type { HalfReaction } from '../redox/half-reaction.ts';
import type { RedoxReaction } from '../redox/redox.ts';
import { note } from '../report/note.ts';
import { type Result, chain, failure, inField, map, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import { type ReadingOptions, readSpecies } from '../species/read.ts';
import { ELECTRON, isElectron, plainSpecies } from '../species/species.ts';

/** The word for the scale at which the electron number is 1. */
const ELECTRON_WORD = 'electron';

/** What is scaled: a reaction and the electrons that go with it. */
interface Scalable {
  readonly reaction: Reaction;
  readonly electrons: Rational;
}

const takesNoPart = (per: string, { reaction }: Scalable): Result<never> =>
  failure({
    code: 'bad-ask',
    field: 'per',
    span: wholeSpan(per),
    message: `${per.trim()} takes no part in ${plainReaction(reaction)}.`,
    hint: `Give "${ELECTRON_WORD}" or a species of the reaction.`,
  });

const factorOf = (per: string, of: Scalable, options: ReadingOptions): Result<Rational> => {
  const read = per.trim() === ELECTRON_WORD ? success(ELECTRON) : map(readSpecies(per, options), (one) => one.species);
  return chain(inField(read, 'per'), (species) => {
    const factor = isElectron(species) ? of.electrons.inverse() : factorPerMole(of.reaction, species);
    if (factor === undefined) return takesNoPart(per, of);
    const what = isElectron(species) ? 'electron' : `mole of ${plainSpecies(species)}`;
    const said = note('scaled', `The reaction is written per ${what}, as asked: its numbers may be fractions.`);
    return success(factor, factor.equals(ONE) ? [] : [said]);
  });
};

const scaledBy = <T>(
  per: string | undefined,
  value: T,
  of: Scalable,
  options: ReadingOptions,
  scale: (factor: Rational) => T,
): Result<T> => (per === undefined ? success(value) : map(factorOf(per, of, options), scale));

const weighted = <Half extends WeightedHalf>(half: Half, factor: Rational): Half => ({
  ...half,
  multiplier: half.multiplier.mul(factor),
});

/** A half-reaction at the scale that `per` asks for. Note: `scaled`. Faults, in `per`: those of reading, `bad-ask`. */
export const halfPer = (half: HalfReaction, per: string | undefined, options: ReadingOptions): Result<HalfReaction> =>
  scaledBy(per, half, half, options, (factor) => ({
    ...half,
    reaction: scaled(half.reaction, factor),
    electrons: half.electrons.mul(factor),
  }));

/** A redox reaction at the scale that `per` asks for: its halves stay as they are, taken more or less often. */
export const redoxPer = (
  redox: RedoxReaction,
  per: string | undefined,
  options: ReadingOptions,
): Result<RedoxReaction> =>
  scaledBy(per, redox, { reaction: redox.overall, electrons: redox.electrons }, options, (factor) => ({
    ...redox,
    overall: scaled(redox.overall, factor),
    electrons: redox.electrons.mul(factor),
    oxidation: redox.oxidation === null ? null : weighted(redox.oxidation, factor),
    reduction: redox.reduction === null ? null : weighted(redox.reduction, factor),
  }));

/** A cell reaction at the scale that `per` asks for: its halves stay as they are, taken more or less often. */
export const cellPer = (cell: CellReaction, per: string | undefined, options: ReadingOptions): Result<CellReaction> =>
  scaledBy(per, cell, { reaction: cell.overall, electrons: cell.electrons }, options, (factor) => ({
    ...cell,
    overall: scaled(cell.overall, factor),
    electrons: cell.electrons.mul(factor),
    anode: cell.anode.map((half) => weighted(half, factor)),
    cathode: cell.cathode.map((half) => weighted(half, factor)),
    cancelled: cell.cancelled.map(({ species, amount }) => ({ species, amount: amount.mul(factor) })),
    waterFormed: cell.waterFormed.mul(factor),
  }));
