import { isZero } from '../exact/rational.ts';
import { type Note, note } from '../report/note.ts';
import { type Result, chain, failure, success } from '../report/result.ts';
import type { Diagram } from '../species/diagram.ts';
import { type Species, plainSpecies } from '../species/species.ts';
import type { Electrodes } from './compose.ts';
import { isElectrolyte } from './electrolyte.ts';
import { type HalfCell, type HalfCellReaction, reactHalfCell } from './half-cell.ts';

type Phase = readonly Species[];

type Phases = Pick<Diagram, 'left' | 'right' | 'bridge'>;

/** Metals and carbon that conduct and do not react where they need not. */
const INERT = new Set(['Pt', 'Au', 'Pd', 'Ir', 'C']);

/**
 * The electrode reactions of a cell diagram: left is the anode, right the cathode.
 * Notes: `inert-electrode`, `spectator` for ions that take no part, `species-dropped` for other species that do not.
 * Faults: those of `reactHalfCell`, naming the half-cell.
 */
export const electrodesOfDiagram = (diagram: Phases): Result<Electrodes> => {
  const [left, right] = halfCellsOf(diagram);
  return chain(named(left, reactHalfCell(left)), (anode) =>
    chain(named(right, reactHalfCell(right)), (cathode) =>
      success(
        { anode: [{ half: anode.half, share: null }], cathode: [{ half: cathode.half, share: null }] },
        diagramNotes(diagram, anode, cathode),
      ),
    ),
  );
};

const halfCellsOf = (diagram: Phases): readonly [HalfCell, HalfCell] => {
  const [left, right] = diagram.bridge ? [diagram.left, diagram.right] : sharedElectrolyte(diagram);
  return [
    { electrode: 'anode', species: left.flat(), terminals: terminalsIn(left[0]) },
    { electrode: 'cathode', species: right.flat(), terminals: terminalsIn(right.at(-1)) },
  ];
};

const terminalsIn = (phase: Phase = []): readonly Species[] =>
  phase.filter((species) => INERT.has(species.formula) && isZero(species.charge));

/**
 * Without a bridge the electrolyte belongs to both electrodes.
 *
 *     Pt | H2 | HCl | AgCl | Ag        left takes all phases up to the last that holds an electrolyte,
 *               ^^^                    right all from the first that does
 */
const sharedElectrolyte = (diagram: Phases): readonly [readonly Phase[], readonly Phase[]] => {
  const phases = [...diagram.left, ...diagram.right];
  const holds = phases.map((phase) => phase.some(isElectrolyte));
  const first = holds.indexOf(true);
  if (first === -1) return [phases, phases];
  return [phases.slice(0, holds.lastIndexOf(true) + 1), phases.slice(first)];
};

/** A fault says which half-cell it is about. */
const named = ({ electrode }: HalfCell, result: Result<HalfCellReaction>): Result<HalfCellReaction> => {
  if (result.ok) return result;
  const where = electrode === 'anode' ? 'left half-cell (anode)' : 'right half-cell (cathode)';
  return failure({ ...result.fault, message: `${where}: ${result.fault.message}` });
};

const diagramNotes = (diagram: Phases, anode: HalfCellReaction, cathode: HalfCellReaction): readonly Note[] => {
  const inert = [...new Set([...anode.inert, ...cathode.inert].map(plainSpecies))];
  const idle = diagram.bridge ? [...anode.idle, ...cathode.idle] : idleInBoth(anode, cathode);
  const told = new Map(idle.map((species) => [plainSpecies(species), species]));
  return [
    ...inert.map((name) =>
      note('inert-electrode', `${name} was taken as an inert terminal: the rest reacts without it`),
    ),
    ...[...told.values()].map(idleNote),
  ];
};

/** Of a common electrolyte only what neither electrode uses is idle. */
const idleInBoth = (anode: HalfCellReaction, cathode: HalfCellReaction): readonly Species[] => {
  const used = new Set([...anode.half.reaction.terms, ...cathode.half.reaction.terms].map((term) => term.species.key));
  return [...anode.idle, ...cathode.idle].filter((species) => !used.has(species.key));
};

const idleNote = (species: Species): Note => {
  const name = plainSpecies(species);
  return isZero(species.charge)
    ? note('species-dropped', `${name} takes no part in the half-reaction and was left out`)
    : note('spectator', `${name} takes no part in the half-reactions`);
};
