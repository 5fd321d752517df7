import { type Rational, ONE, ZERO, isZero, signOf } from '../exact/rational.ts';
import { type Species, isElectron, plainSpecies, plainWithState, sameSpecies } from '../species/species.ts';
import type { Branch } from './branches.ts';
import { type Measured, weightedSum } from './measured.ts';
import { toFloat } from './number.ts';

/** Where a species takes part: per branch, its stoichiometric number over the electron number (mol per mol of e^-). */
export interface Stake {
  readonly species: Species;
  /** How answers name it: without its state, unless another state of it takes part too. */
  readonly name: string;
  readonly parts: readonly { readonly branch: number; readonly perElectron: Rational }[];
}

interface Part {
  readonly branch: number;
  readonly species: Species;
  readonly perElectron: Rational;
}

const partsOf = (branches: readonly Branch[]): readonly Part[] =>
  branches.flatMap(({ reaction, electrons }, branch) =>
    reaction.terms
      .filter(({ species }) => !isElectron(species))
      .map(({ species, nu }) => ({ branch, species, perElectron: nu.div(electrons) })),
  );

/** Every species of the circuit but the electron, in the order of the reactions. */
export const stakesOf = (branches: readonly Branch[]): readonly Stake[] => {
  const groups: { species: Species; parts: Part[] }[] = [];
  for (const part of partsOf(branches)) {
    const group = groups.find(({ species }) => sameSpecies(species, part.species));
    if (group === undefined) groups.push({ species: part.species, parts: [part] });
    else {
      group.parts.push(part);
      if (group.species.state === null) group.species = part.species;
    }
  }
  const alone = (species: Species): boolean => groups.filter((group) => group.species.key === species.key).length === 1;
  return groups.map(({ species, parts }) => ({
    species,
    name: alone(species) ? plainSpecies(species) : plainWithState(species),
    parts,
  }));
};

/** Whether all reactions of the species stand at one electrode whose shares are its efficiency. */
const sharesAreEfficiency = (stake: Stake, branches: readonly Branch[]): boolean => {
  const own = stake.parts.flatMap(({ branch }) => branches[branch] ?? []);
  const [first] = own;
  if (first === undefined || own.some(({ electrode }) => electrode !== first.electrode)) return false;
  return first.written || (own.length === 1 && (first.share === null || first.share.exact.equals(ONE)));
};

/** The exact net amount per mole of electrons, negative where used up; null while a share is unknown. */
export const exactYield = (stake: Stake, branches: readonly Branch[]): Rational | null => {
  let sum = ZERO;
  for (const { branch, perElectron } of stake.parts) {
    const share = branches[branch]?.share ?? null;
    if (share === null) return null;
    sum = sum.add(perElectron.mul(share.exact));
  }
  return sum;
};

/** The parts of the current that the reactions of a species take together; null while one is unknown. */
const exactShare = (stake: Stake, branches: readonly Branch[]): Rational | null => {
  let sum = ZERO;
  for (const branch of new Set(stake.parts.map((part) => part.branch))) {
    const share = branches[branch]?.share ?? null;
    if (share === null) return null;
    sum = sum.add(share.exact);
  }
  return sum;
};

/** Charge and amount of one species: the electrons per mole of it, and what stands for its efficiency. */
export interface Equivalence {
  /** Moles of electrons per mole of the species, z / |nu|; null where a share must be known first. */
  readonly electronsPerMole: Rational | null;
  /** True where the shares of its reactions are its current efficiency. */
  readonly byShare: boolean;
  /** The efficiency that written shares give, exact; null where none is written. */
  readonly efficiency: Rational | null;
  /** -1 used up, 1 made, 0 neither on balance. */
  readonly sign: number;
}

/**
 * With shares s at one electrode the amount per electron is y = |sum of s nu / z|, its efficiency is eta = sum of s, and
 * z / |nu| = eta / y: for a single reaction the share drops out. Elsewhere (both electrodes, consecutive steps) eta is 1
 * and z / |nu| = 1 / y. `folded` is the yield of a cell in which H^+ and OH^- became water.
 */
export const equivalenceOf = (stake: Stake, branches: readonly Branch[], folded: Rational | null): Equivalence => {
  const [only, more] = stake.parts;
  const byShare = folded === null && sharesAreEfficiency(stake, branches);
  const net = folded ?? exactYield(stake, branches);
  const written = stake.parts.some(({ branch }) => branches[branch]?.written === true);
  const share = byShare ? exactShare(stake, branches) : null;
  const efficiency = byShare && written ? share : null;
  if (byShare && only !== undefined && more === undefined) {
    const electronsPerMole = ONE.div(only.perElectron.abs());
    return { electronsPerMole, byShare, efficiency, sign: Number(signOf(only.perElectron)) };
  }
  if (net === null || isZero(net)) return { electronsPerMole: null, byShare, efficiency, sign: 0 };
  const electronsPerMole = (share ?? ONE).div(net.abs());
  return { electronsPerMole, byShare, efficiency, sign: Number(signOf(net)) };
};

/** The amount per mole of electrons with the parts of the current as measured; undefined while one is unknown. */
export const measuredYield = (stake: Stake, parts: readonly (Measured | null)[]): Measured | undefined => {
  const sums: (readonly [number, Measured])[] = [];
  for (const { branch, perElectron } of stake.parts) {
    const part = parts[branch] ?? null;
    if (part === null) return undefined;
    sums.push([toFloat(perElectron), part]);
  }
  return weightedSum(sums);
};

/** How much H^+ and OH^- meet: the amount of water that forms, of the type that the yields have. */
export interface Folding {
  readonly proton: Stake;
  readonly hydroxide: Stake;
}

const isPlain = (stake: Stake, plain: string): boolean => plainSpecies(stake.species) === plain;

/** The two ions that fold into water where a circuit folds and both are left on one side; null elsewhere. */
export const foldingOf = (stakes: readonly Stake[], branches: readonly Branch[]): Folding | null => {
  const proton = stakes.find((stake) => isPlain(stake, 'H^+'));
  const hydroxide = stakes.find((stake) => isPlain(stake, 'OH^-'));
  if (proton === undefined || hydroxide === undefined) return null;
  const product = (exactYield(proton, branches) ?? ZERO).mul(exactYield(hydroxide, branches) ?? ZERO);
  return signOf(product) > 0n ? { proton, hydroxide } : null;
};

/** The exact yield of H^+, OH^- or H2O after folding  H^+ + OH^- -> H2O; null for every other species. */
export const foldedYield = (stake: Stake, folding: Folding | null, branches: readonly Branch[]): Rational | null => {
  if (folding === null) return null;
  const h = exactYield(folding.proton, branches) ?? ZERO;
  const oh = exactYield(folding.hydroxide, branches) ?? ZERO;
  const water = h.abs().compare(oh.abs()) < 0 ? h : oh;
  if (stake === folding.proton) return h.sub(water);
  if (stake === folding.hydroxide) return oh.sub(water);
  return isPlain(stake, 'H2O') ? (exactYield(stake, branches) ?? ZERO).add(water) : null;
};

/** The same with the parts of the current as measured, for efficiencies that are no exact numbers. */
export const foldedMeasure = (
  stake: Stake,
  folding: Folding,
  parts: readonly (Measured | null)[],
): Measured | undefined => {
  const h = measuredYield(folding.proton, parts);
  const oh = measuredYield(folding.hydroxide, parts);
  const own = measuredYield(stake, parts);
  if (h === undefined || oh === undefined || own === undefined || h.value * oh.value <= 0) return own;
  const water = Math.abs(h.value) < Math.abs(oh.value) ? h : oh;
  if (!isFolded(stake, folding)) return own;
  return weightedSum([
    [1, own],
    [isPlain(stake, 'H2O') ? 1 : -1, water],
  ]);
};

const isFolded = (stake: Stake, folding: Folding): boolean =>
  stake === folding.proton || stake === folding.hydroxide || isPlain(stake, 'H2O');
