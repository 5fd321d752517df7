import type { Reaction } from '../balance/reaction.ts';
import { FARADAY, GAS_CONSTANT } from '../elements/constants.ts';
import { type Rational, isZero } from '../exact/rational.ts';
import { type Result, chain, failure, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import { type Species, isElectron, plainSpecies, plainWithState, sameSpecies } from '../species/species.ts';
import { type Branch, type Circuit, branchesOf } from './branches.ts';
import { type Measured, exactly, weightedSum } from './measured.ts';
import { toFloat } from './number.ts';
import type { VariableName } from './relations.ts';
import {
  type Equivalence,
  type Folding,
  type Stake,
  equivalenceOf,
  foldedYield,
  foldingOf,
  stakesOf,
} from './stakes.ts';
import { type Weighing, createWeighing } from './weighing.ts';

/** The circuit seen from the species asked. */
export interface Problem {
  readonly circuit: Circuit;
  readonly branches: readonly Branch[];
  readonly stakes: readonly Stake[];
  readonly folding: Folding | null;
  readonly asked: Stake;
  readonly equivalence: Equivalence;
  readonly weigh: Weighing;
}

/** Water that forms of H^+ and OH^- although no half-reaction holds any. */
const formedWater = (overall: Reaction, stakes: readonly Stake[]): readonly Stake[] =>
  overall.terms
    .filter(({ species }) => !isElectron(species) && !stakes.some((stake) => sameSpecies(stake.species, species)))
    .map(({ species }) => ({ species, name: plainSpecies(species), parts: [] }));

const allStakes = (circuit: Circuit, branches: readonly Branch[]): readonly Stake[] => {
  const stakes = stakesOf(branches);
  return circuit.kind === 'cell' ? [...stakes, ...formedWater(circuit.cell.overall, stakes)] : stakes;
};

const folds = (circuit: Circuit): boolean => circuit.kind === 'cell' && circuit.cell.crossing === null;

const noPart = (species: Species, stakes: readonly Stake[]): Result<never> => {
  const name = plainWithState(species);
  return failure({
    code: 'bad-ask',
    message: `${name} takes no part in the reaction`,
    field: 'species',
    span: wholeSpan(name),
    hint: `The species here are ${stakes.map((stake) => stake.name).join(', ')}.`,
  });
};

const severalStates = (species: Species, one: Stake, other: Stake): Result<never> => {
  const name = plainWithState(species);
  return failure({
    code: 'bad-ask',
    message: `${name} takes part in more than one state`,
    field: 'species',
    span: wholeSpan(name),
    hint: `Write which is meant: ${one.name} or ${other.name}.`,
  });
};

const nothingLeft = (species: Species): Result<never> => {
  const name = plainWithState(species);
  return failure({
    code: 'bad-ask',
    message: `as much of ${name} is made as is used up: none is left to count`,
    field: 'species',
    span: wholeSpan(name),
    hint: 'Ask for it at one electrode, with its half-reaction.',
  });
};

/** The equivalence of any species of the circuit. */
export const equivalenceIn = (
  stake: Stake,
  { branches, folding }: Pick<Problem, 'branches' | 'folding'>,
): Equivalence => equivalenceOf(stake, branches, foldedYield(stake, folding, branches));

/** True where the amount is known and is nothing: shares are known, yet no electrons can be counted per mole. */
const isNothing = (stake: Stake, branches: readonly Branch[], electronsPerMole: Rational | null): boolean =>
  electronsPerMole === null && stake.parts.every(({ branch }) => (branches[branch]?.share ?? null) !== null);

/**
 * Sets up the circuit for one species. Faults: those of the shares; `bad-ask` in `species` where it takes no part, takes
 * part in several states, or nothing of it is left.
 */
export const setUp = (circuit: Circuit, species: Species): Result<Problem> =>
  chain(branchesOf(circuit), (branches) => {
    const stakes = allStakes(circuit, branches);
    const [asked, other] = stakes.filter((stake) => sameSpecies(stake.species, species));
    if (asked === undefined) return noPart(species, stakes);
    if (other !== undefined) return severalStates(species, asked, other);
    const folding = folds(circuit) ? foldingOf(stakes, branches) : null;
    const equivalence = equivalenceIn(asked, { branches, folding });
    if (isNothing(asked, branches, equivalence.electronsPerMole)) return nothingLeft(species);
    return success({ circuit, branches, stakes, folding, asked, equivalence, weigh: createWeighing() });
  });

/** True where an efficiency that is not given and does not follow may be taken as 100 %. */
export const allowsDefault = ({ equivalence, asked, branches }: Problem): boolean =>
  equivalence.efficiency === null &&
  equivalence.electronsPerMole !== null &&
  (asked.parts.every(({ branch }) => (branches[branch]?.share ?? null) !== null) || branches.length === 1);

/** Charge per mole of a species in C/mol, F z / |nu|. */
export const chargePerMole = (electronsPerMole: Rational): Measured => exactly(toFloat(FARADAY.mul(electronsPerMole)));

/** The efficiency that written shares give, as measured; undefined where none is written. */
export const writtenEfficiency = ({ equivalence, asked, branches }: Problem): Measured | undefined => {
  if (equivalence.efficiency === null) return undefined;
  const shares = [...new Set(asked.parts.map(({ branch }) => branch))].flatMap(
    (branch) => branches[branch]?.share?.measured ?? [],
  );
  return weightedSum(shares.map((share) => [1, share]));
};

/** What is known before anything is given. `series` is the number of cells times the part that does not bypass. */
export const constantsOf = (problem: Problem, series: Measured): ReadonlyMap<VariableName, Measured> => {
  const { equivalence, asked, weigh } = problem;
  const molarMass = weigh(asked.species);
  const known = new Map<VariableName, Measured>([
    ['gas_constant', exactly(toFloat(GAS_CONSTANT))],
    ['series', series],
  ]);
  if (equivalence.electronsPerMole !== null && !isZero(equivalence.electronsPerMole))
    known.set('faraday', chargePerMole(equivalence.electronsPerMole));
  if (molarMass !== undefined) known.set('molar_mass', molarMass);
  return known;
};

/** Moles of electrons per mole of each species, where they are exact. */
export const electronsPerMole = (problem: Problem): readonly (readonly [name: string, Rational])[] =>
  problem.stakes.flatMap((stake) => {
    const own = stake === problem.asked ? problem.equivalence : equivalenceIn(stake, problem);
    return own.electronsPerMole === null ? [] : [[stake.name, own.electronsPerMole] as const];
  });
