import type { Circuit } from '../amounts/branches.ts';
import { type Reaction, sideOf } from '../balance/reaction.ts';
import { cautionsFor } from '../caution/cautions.ts';
import { type CautionMedium, type CautionMode, type Scene, type Sides, mediaOf } from '../caution/scene.ts';
import type { CellReaction, WeightedHalf } from '../cell/cell-reaction.ts';
import { ONE } from '../exact/rational.ts';
import type { HalfReaction } from '../redox/half-reaction.ts';
import type { Medium } from '../redox/medium.ts';
import { type Species, isElectron } from '../species/species.ts';
import { type GasSource, gasCautions } from './gas-caution.ts';
import type { ShownCaution } from './schema/shape.ts';

const speciesOn = (reactions: readonly Reaction[], side: 'left' | 'right'): readonly Species[] =>
  reactions
    .flatMap((reaction) => sideOf(reaction, side).map(({ species }) => species))
    .filter((one) => !isElectron(one));

const sidesOf = (...reactions: readonly Reaction[]): Sides => ({
  reactants: speciesOn(reactions, 'left'),
  products: speciesOn(reactions, 'right'),
});

/** The media of reactions that run together: what each may stand in, each once. */
const mediaOfAll = (all: readonly (readonly CautionMedium[])[]): readonly CautionMedium[] => [...new Set(all.flat())];

const speciesOf = ({ reactants, products }: Sides): readonly Species[] => [...reactants, ...products];

const NOTHING: Sides = { reactants: [], products: [] };

const sidesOfHalf = ({ reaction, kind }: Pick<HalfReaction, 'reaction' | 'kind'>): AtElectrode => {
  const sides = sidesOf(reaction);
  return kind === 'oxidation' ? { anode: sides, cathode: NOTHING } : { anode: NOTHING, cathode: sides };
};

/** What stands at the anode and what at the cathode. */
interface AtElectrode {
  readonly anode: Sides;
  readonly cathode: Sides;
}

/** The cautions of a half-reaction alone: an oxidation runs at an anode, a reduction at a cathode. */
export const cautionsOfHalf = (half: HalfReaction): readonly ShownCaution[] => {
  const overall = sidesOf(half.reaction);
  const media = mediaOf(half.medium, speciesOf(overall));
  return withGas(
    cautionsFor({ ...sidesOfHalf(half), overall, media, mode: null, divided: null }),
    gasCautions([[{ ...half, multiplier: ONE }]]),
  );
};

/** What is made for certain stands before what depends on a condition, and behind what is grave. */
const withGas = (cautions: readonly ShownCaution[], gas: readonly ShownCaution[]): readonly ShownCaution[] => {
  const open = ({ grave, conditional }: ShownCaution): boolean => grave !== true && conditional === true;
  return [...cautions.filter((one) => !open(one)), ...gas, ...cautions.filter(open)];
};

/** The cautions of a reaction as it is, in a medium or in none that is known. */
export const cautionsOfReaction = (reaction: Reaction, medium: Medium | null): readonly ShownCaution[] => {
  const overall = sidesOf(reaction);
  const media = mediaOf(medium, speciesOf(overall));
  return cautionsFor({ anode: NOTHING, cathode: NOTHING, overall, media, mode: null, divided: null });
};

/** What else is known of a cell: what drives it, and what is there and takes no part. */
export interface Besides {
  readonly mode: CautionMode | null;
  readonly present: readonly Species[];
}

const NOTHING_ELSE: Besides = { mode: null, present: [] };

/** The hazards of a cell; `divided` as the ask says of its separator, null where it says nothing. */
export const hazardsOfCell = (
  cell: CellReaction,
  divided: boolean | null,
  { mode, present }: Besides = NOTHING_ELSE,
): readonly ShownCaution[] => {
  const halves = [...cell.anode, ...cell.cathode].map(({ half }) => half);
  const reactions = (weighted: readonly WeightedHalf[]): readonly Reaction[] =>
    weighted.map(({ half }) => half.reaction);
  const scene: Scene = {
    anode: sidesOf(...reactions(cell.anode)),
    cathode: sidesOf(...reactions(cell.cathode)),
    overall: sidesOf(cell.overall),
    media: mediaOfAll(halves.map(({ medium, reaction }) => mediaOf(medium, speciesOf(sidesOf(reaction))))),
    mode,
    divided,
    present,
  };
  return cautionsFor(scene);
};

/** What gas a cell makes for each ampere, and the air that dilutes its hydrogen. */
export const gasCautionsOfCell = ({ anode, cathode }: CellReaction): readonly ShownCaution[] =>
  gasCautions([gasSources(anode), gasSources(cathode)]);

/** The cautions of a cell: its hazards and its gases, what depends on a condition last. */
export const cautionsOfCell = (cell: CellReaction, divided: boolean | null): readonly ShownCaution[] =>
  withGas(hazardsOfCell(cell, divided), gasCautionsOfCell(cell));

const gasSources = (weighted: readonly WeightedHalf[]): readonly GasSource[] =>
  weighted.map(({ half: { reaction, electrons }, multiplier }) => ({ reaction, electrons, multiplier }));

/** A half-reaction as it is written: electrons on the left reduce. */
const kindOf = (reaction: Reaction): 'reduction' | 'oxidation' =>
  sideOf(reaction, 'left').some(({ species }) => isElectron(species)) ? 'reduction' : 'oxidation';

/** How grave: what kills at once first; of equals, what holds as it stands before what depends on a condition. */
const gravity = ({ grave, conditional }: ShownCaution): number =>
  (grave === true ? 0 : 2) + (conditional === true ? 1 : 0);

/** The cautions of all that one charge flows through, each once, the gravest first. */
export const cautionsOfCircuits = (
  circuits: readonly { readonly circuit: Circuit; readonly divided: boolean | null }[],
): readonly ShownCaution[] => {
  const lists = circuits.map(({ circuit, divided }) => cautionsOfCircuit(circuit, divided));
  const [only, ...others] = lists;
  if (only !== undefined && others.length === 0) return only;
  const all = lists.flat();
  return all
    .filter((one, at) => all.findIndex(({ text }) => text === one.text) === at)
    .toSorted((one, other) => gravity(one) - gravity(other));
};

/** The cautions of what the charge of an amounts ask flows through; `divided` as in `cautionsOfCell`. */
const cautionsOfCircuit = (circuit: Circuit, divided: boolean | null = null): readonly ShownCaution[] => {
  if (circuit.kind === 'cell') return cautionsOfCell(circuit.cell, divided);
  const reactions =
    circuit.kind === 'half' ? [circuit.half.reaction] : circuit.reactions.map(({ reaction }) => reaction);
  const places = reactions.map((reaction) => sidesOfHalf({ reaction, kind: kindOf(reaction) }));
  return cautionsFor({
    anode: joined(places.map(({ anode }) => anode)),
    cathode: joined(places.map(({ cathode }) => cathode)),
    overall: sidesOf(...reactions),
    media: mediaOf(
      null,
      reactions.flatMap((reaction) => speciesOf(sidesOf(reaction))),
    ),
    mode: null,
    divided,
  });
};

const joined = (sides: readonly Sides[]): Sides => ({
  reactants: sides.flatMap(({ reactants }) => reactants),
  products: sides.flatMap(({ products }) => products),
});
