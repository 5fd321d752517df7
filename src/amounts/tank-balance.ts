import { FARADAY } from '../elements/constants.ts';
import { ZERO, isZero } from '../exact/rational.ts';
import { type Result, chain, failure, success } from '../report/result.ts';
import { plainSpecies } from '../species/species.ts';
import type { Quantity } from './answered.ts';
import { type Circuit, branchesOf } from './branches.ts';
import { type Derived, deriveAll } from './derivation.ts';
import { type GivenTexts, convertGiven, readGivenTexts } from './given.ts';
import { type Measured, scaled, times, uncertaintyOf } from './measured.ts';
import { toFloat } from './number.ts';
import { type Problem, setUp } from './problem.ts';
import { type Stack, readStack } from './stack.ts';
import { type Stake, exactYield, foldedYield, stakesOf } from './stakes.ts';

/** What the tank gains (negative: loses) while the charge flows. An entry is absent where nothing of it changes. */
export interface TankBalance {
  /** mol of H^+; acid made. */
  readonly acid?: Quantity;
  /** mol of OH^-; base made. */
  readonly base?: Quantity;
  readonly water?: { readonly amount: Quantity; readonly mass: Quantity; readonly volume: Quantity };
}

/** Charge and reactions, no species: the contract's `given` with what fixes the charge. */
export interface BalanceRequest extends Stack {
  readonly circuit: Circuit;
  readonly given: GivenTexts;
}

/** Density of water at 25 °C and 101.325 kPa in kg/m^3 (IAPWS-95; CRC Handbook of Chemistry and Physics). */
const WATER_DENSITY = 997.047;
const LITRES = 1000;
const GRAMS = 1000;

const quantity = (measured: Measured, factor: number, unit: string): Quantity => {
  const uncertainty = uncertaintyOf(measured) * factor;
  return { value: measured.value * factor, unit, ...(uncertainty > 0 ? { uncertainty } : {}) };
};

/** Moles of a species made by the charge that works. */
const madeOf = (plain: string, problem: Problem, net: Measured): { stake: Stake; amount: Measured } | undefined => {
  const stake = problem.stakes.find(({ species }) => plainSpecies(species) === plain);
  if (stake === undefined) return undefined;
  const gained = foldedYield(stake, problem.folding, problem.branches) ?? exactYield(stake, problem.branches);
  if (gained === null || isZero(gained)) return undefined;
  return { stake, amount: scaled(net, toFloat(gained.div(FARADAY))) };
};

const waterOf = (problem: Problem, net: Measured): TankBalance['water'] => {
  const made = madeOf('H2O', problem, net);
  const molarMass = made === undefined ? undefined : problem.weigh(made.stake.species);
  if (made === undefined || molarMass === undefined) return undefined;
  const mass = times(made.amount, molarMass);
  return {
    amount: quantity(made.amount, 1, 'mol'),
    mass: quantity(mass, GRAMS, 'g'),
    volume: quantity(mass, LITRES / WATER_DENSITY, 'L'),
  };
};

const balanceFrom = (problem: Problem, { known }: Derived): Result<TankBalance> => {
  const net = known.get('net');
  if (net === undefined)
    return failure({
      code: 'not-enough-given',
      message: 'a balance of the tank needs the charge',
      field: 'given',
      missing: ['charge'],
    });
  const acid = madeOf('H^+', problem, net);
  const base = madeOf('OH^-', problem, net);
  const water = waterOf(problem, net);
  return success({
    ...(acid === undefined ? {} : { acid: quantity(acid.amount, 1, 'mol') }),
    ...(base === undefined ? {} : { base: quantity(base.amount, 1, 'mol') }),
    ...(water === undefined ? {} : { water }),
  });
};

const sharesMissing: Result<never> = failure({
  code: 'not-enough-given',
  message: 'the balance of a tank needs the share of every reaction',
  field: 'electrode',
  missing: ['share'],
});

const efficiencyUnclear: Result<never> = failure({
  code: 'bad-ask',
  message: 'with several reactions an efficiency does not say whose it is',
  field: 'given.efficiency',
  hint: 'Give the shares of the reactions instead.',
});

/** The whole current for a lone reaction without a share, so that its yields are known. */
const wholeCircuit = (circuit: Circuit): Circuit => {
  const reactions = circuit.kind === 'half' ? [circuit.half] : circuit.kind === 'electrode' ? circuit.reactions : [];
  const [only, more] = reactions;
  if (only === undefined || more !== undefined || only.share !== undefined) return circuit;
  return { kind: 'half', half: { ...only, share: '100 %' } };
};

/** The charge does not depend on which species is asked: any will do that is left over. */
const setUpAny = (circuit: Circuit): Result<Problem | null> =>
  chain(branchesOf(circuit), (branches) => {
    if (branches.some(({ share }) => share === null)) return sharesMissing;
    const first = stakesOf(branches).find((stake) => !isZero(exactYield(stake, branches) ?? ZERO));
    return first === undefined ? success(null) : setUp(circuit, first.species);
  });

/** An efficiency stands for the share of a lone reaction. */
const asShare = (circuit: Circuit, { efficiency, share, ...given }: GivenTexts): [Circuit, GivenTexts] => {
  const part = efficiency ?? share;
  if (circuit.kind !== 'half' || typeof part !== 'string') return [circuit, given];
  return [{ kind: 'half', half: { ...circuit.half, share: part } }, given];
};

/**
 * Acid, base and water of a tank: what the reactions of a circuit make (positive) and use up (negative) of H^+, OH^- and
 * H2O for a charge, by stoichiometry alone; evaporation, spray and what crosses a separator are not counted. An
 * efficiency holds for a lone reaction. Faults: those of reading, `not-enough-given` without a charge or a share.
 */
export const tankBalance = ({ circuit, given, ...stack }: BalanceRequest): Result<TankBalance> => {
  const several = circuit.kind === 'cell' || (circuit.kind === 'electrode' && circuit.reactions.length > 1);
  if (several && (given['efficiency'] ?? given['share']) !== undefined) return efficiencyUnclear;
  const [whole, rest] = asShare(wholeCircuit(circuit), given);
  return chain(setUpAny(whole), (problem) => {
    if (problem === null) return success({});
    return chain(readGivenTexts(rest), (readings) =>
      chain(convertGiven(readings, problem.weigh(problem.asked.species)), (values) =>
        chain(readStack(stack), (series) =>
          chain(deriveAll(problem, values, series), (derived) => balanceFrom(problem, derived)),
        ),
      ),
    );
  });
};
