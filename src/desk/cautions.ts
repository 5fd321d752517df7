import type { Circuit } from '../amounts/branches.ts';
import { type Reaction, sideOf } from '../balance/reaction.ts';
import { type CautionMedium, type Scene, type Sides, cautionsFor } from '../caution/cautions.ts';
import type { CellReaction, WeightedHalf } from '../cell/cell-reaction.ts';
import type { HalfReaction } from '../redox/half-reaction.ts';
import type { Medium } from '../redox/medium.ts';
import { type Species, isElectron } from '../species/species.ts';
import type { ShownCaution } from './schema/shape.ts';

const speciesOn = (reactions: readonly Reaction[], side: 'left' | 'right'): readonly Species[] =>
  reactions
    .flatMap((reaction) => sideOf(reaction, side).map(({ species }) => species))
    .filter((one) => !isElectron(one));

const sidesOf = (...reactions: readonly Reaction[]): Sides => ({
  reactants: speciesOn(reactions, 'left'),
  products: speciesOn(reactions, 'right'),
});

/** A medium as the cautions know it; null where its name does not say (a list of helpers, `none`). */
const mediumOf = ({ name }: Medium): CautionMedium | null => {
  if (name === 'acid' || name === 'base' || name === 'neutral') return name;
  if (name === 'bicarbonate') return 'neutral';
  if (name === 'ammonia') return 'nonaqueous';
  return name?.startsWith('molten-') === true ? 'molten' : null;
};

/** The medium that all halves share; null where they differ. */
const sharedMedium = (halves: readonly HalfReaction[]): CautionMedium | null => {
  const media = new Set(halves.map(({ medium }) => mediumOf(medium)));
  const [only] = media;
  return media.size === 1 && only !== undefined ? only : null;
};

const NOTHING: Sides = { reactants: [], products: [] };

/** The cautions of half-reactions at electrodes that need not make a whole cell. */
export const cautionsOfHalf = (half: HalfReaction): readonly ShownCaution[] => {
  const sides = sidesOf(half.reaction);
  const oxidation = half.kind === 'oxidation';
  return cautionsFor({
    anode: oxidation ? sides : NOTHING,
    cathode: oxidation ? NOTHING : sides,
    overall: sides,
    medium: mediumOf(half.medium),
    mode: null,
    divided: null,
  });
};

/** The cautions of a reaction as it is, in a medium or in none that is known. */
export const cautionsOfReaction = (reaction: Reaction, medium: Medium | null): readonly ShownCaution[] =>
  cautionsFor({
    anode: NOTHING,
    cathode: NOTHING,
    overall: sidesOf(reaction),
    medium: medium === null ? null : mediumOf(medium),
    mode: null,
    divided: null,
  });

/** The cautions of a cell; `divided` as the ask says of its separator, null where it says nothing. */
export const cautionsOfCell = (cell: CellReaction, divided: boolean | null): readonly ShownCaution[] => {
  const reactions = (halves: readonly WeightedHalf[]): readonly Reaction[] => halves.map(({ half }) => half.reaction);
  const scene: Scene = {
    anode: sidesOf(...reactions(cell.anode)),
    cathode: sidesOf(...reactions(cell.cathode)),
    overall: sidesOf(cell.overall),
    medium: sharedMedium([...cell.anode, ...cell.cathode].map(({ half }) => half)),
    mode: null,
    divided,
  };
  return cautionsFor(scene);
};

/** The cautions of what the charge of an amounts ask flows through. */
export const cautionsOfCircuit = (circuit: Circuit): readonly ShownCaution[] => {
  if (circuit.kind === 'cell') return cautionsOfCell(circuit.cell, null);
  const reactions =
    circuit.kind === 'half' ? [circuit.half.reaction] : circuit.reactions.map(({ reaction }) => reaction);
  return cautionsFor({
    anode: NOTHING,
    cathode: NOTHING,
    overall: sidesOf(...reactions),
    medium: null,
    mode: null,
    divided: null,
  });
};
