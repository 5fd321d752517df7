import { FARADAY } from '../elements/constants.ts';
import { type Result, success } from '../report/result.ts';
import { type Shared, shareFault, showPercent } from './found-shares.ts';
import { gasKind } from './gases.ts';
import type { Derived } from './derivation.ts';
import type { Given } from './given.ts';
import { type Measured, exactly, over, scaled, times, weightedSum } from './measured.ts';
import { toFloat } from './number.ts';
import { type Problem, chargePerMole, equivalenceIn } from './problem.ts';
import type { QuantityName } from './quantities.ts';
import { type VariableName, speciesRelations } from './relations.ts';
import { type Known, derive, isNearZero } from './solver.ts';
import { type Stake, foldedMeasure, measuredYield } from './stakes.ts';

/** The part of the electrode's current that each reaction takes, as far as it is known. */
export interface Parts {
  readonly parts: readonly (Measured | null)[];
  /** The reaction that was left with the rest of the current; null where none was. */
  readonly rest: number | null;
  /** True where several reactions of the species asked were found to share the current so. */
  readonly found: boolean;
}

const WHOLE = exactly(1);
const ROUNDING = 1e-9;

/** What the asked species' efficiency makes of a branch in which it takes part. */
const ownPart = (problem: Problem, share: Measured | null, efficiency: Measured | undefined): Measured | null => {
  if (problem.equivalence.efficiency !== null) return share;
  if (efficiency === undefined) return null;
  return share === null || problem.equivalence.byShare ? efficiency : times(share, efficiency);
};

/** Parts of the current after the efficiency of the species asked is known; a last open one takes the rest. */
export const partsOf = (problem: Problem, { derived: { known }, found }: Shared): Parts => {
  const own = new Set(problem.asked.parts.map(({ branch }) => branch));
  const efficiency = known.get('efficiency');
  const parts = problem.branches.map(({ share }, branch) => {
    const measured = share?.measured ?? found?.[branch] ?? null;
    if (found !== null) return measured;
    // An efficiency of several reactions together says nothing of any of them.
    if (measured === null && own.size > 1) return null;
    return own.has(branch) ? ownPart(problem, measured, efficiency) : measured;
  });
  const open = parts.flatMap((part, branch) => (part === null ? [branch] : []));
  const [rest, more] = open;
  const all = { found: found !== null };
  if (rest === undefined || more !== undefined) return { ...all, parts, rest: null };
  const taken = parts.filter((part) => part !== null);
  const left = weightedSum([[1, WHOLE], ...taken.map((part) => [-1, part] as const)]);
  if (left.value < -ROUNDING) return { ...all, parts, rest: null };
  return { ...all, parts: parts.map((part, branch) => (branch === rest ? left : part)), rest };
};

/**
 * A share found from what was measured and the shares written cannot exceed the whole together; what was weighed over
 * 100 % by itself is for a note. Fault: `contradiction`.
 */
export const checkParts = (
  { circuit, asked, branches }: Problem,
  { parts }: Parts,
  given: readonly Given[],
): Result<null> => {
  const own = new Set(asked.parts.map(({ branch }) => branch));
  const taken = parts.flatMap((part) => part ?? []);
  const beside = parts.some((part, branch) => part !== null && part.value > 0 && !own.has(branch));
  const open = branches.some(({ share }) => share === null);
  const over = weightedSum([[-1, WHOLE], ...taken.map((part) => [1, part] as const)]);
  if (circuit.kind !== 'electrode' || !beside || !open || over.value <= 0 || isNearZero(over, 1)) return success(null);
  const sum = showPercent(weightedSum(taken.map((part) => [1, part] as const)));
  return shareFault(given, `what ${asked.name} takes and the shares written add up to ${sum} of the current`);
};

/** Names that are the same for every species of the circuit. */
const FLOW: readonly VariableName[] = ['charge', 'net', 'series', 'voltage', 'gas_constant', 'temperature', 'dry'];

/** The efficiency of another species and its charge per mole, so that n = efficiency net / (charge per mole). */
const equivalentOf = (
  stake: Stake,
  problem: Problem,
  parts: Parts['parts'],
): readonly [Measured, Measured] | undefined => {
  const { electronsPerMole, byShare } = equivalenceIn(stake, problem);
  const amount = problem.folding === null ? measuredYield(stake, parts) : foldedMeasure(stake, problem.folding, parts);
  if (amount === undefined || Math.abs(amount.value) < ROUNDING) return undefined;
  const size = amount.value < 0 ? scaled(amount, -1) : amount;
  const branches = [...new Set(stake.parts.map(({ branch }) => branch))].flatMap((branch) => parts[branch] ?? []);
  const [only, more] = branches;
  if (byShare && only !== undefined && more === undefined && electronsPerMole !== null)
    return [only, chargePerMole(electronsPerMole)];
  const efficiency = byShare ? weightedSum(branches.map((part) => [1, part])) : WHOLE;
  return [efficiency, scaled(over(efficiency, size), toFloat(FARADAY))];
};

/** Everything known of one other species for the same charge. */
const knownOf = (stake: Stake, problem: Problem, derived: Derived, parts: Parts['parts']): Known => {
  const equivalent = equivalentOf(stake, problem, parts);
  if (equivalent === undefined) return new Map();
  const [efficiency, faraday] = equivalent;
  const start = new Map<VariableName, Measured>([
    ['efficiency', efficiency],
    ['faraday', faraday],
  ]);
  for (const name of FLOW) {
    const value = derived.known.get(name);
    if (value !== undefined) start.set(name, value);
  }
  const mass = problem.weigh(stake.species);
  if (mass !== undefined) start.set('molar_mass', mass);
  const gas = gasKind(stake.species) !== 'no-gas';
  return derive(start, speciesRelations({ volume: gas ? 'gas' : 'none', areal: false })).known;
};

/** What is shown of another species, besides its share where shares split the current. */
export const ALONGSIDE_NAMES: readonly QuantityName[] = [
  'amount',
  'mass',
  'volume',
  'mass_per_charge',
  'charge_per_mass',
  'energy_per_mass',
];

/** Another species of the circuit and what is known of it. */
export interface Companion {
  readonly stake: Stake;
  readonly known: Known;
  /** True where its efficiency is a share of the current that was written or found. */
  readonly shared: boolean;
}

/** Every other species for the same charge, in the order of the reactions. */
export const companionsOf = (problem: Problem, derived: Derived, { parts }: Parts): readonly Companion[] =>
  problem.stakes
    .filter((stake) => stake !== problem.asked)
    .map((stake) => ({
      stake,
      known: knownOf(stake, problem, derived, parts),
      shared: splitsCurrent(problem) && stake.parts.length === 1,
    }));

/** True where several reactions stand at one electrode and their shares are spoken of. */
export const splitsCurrent = ({ circuit, branches }: Problem): boolean =>
  circuit.kind === 'electrode' ? branches.length > 1 : branches.some(({ written }) => written);
