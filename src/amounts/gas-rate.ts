import { FARADAY, GAS_CONSTANT } from '../elements/constants.ts';
import { toFloat } from './number.ts';

/** Under which conditions a volume of gas is meant. */
export interface GasConditions {
  /** In K. */
  readonly temperature: number;
  /** Of the dry gas, in Pa: the total pressure less that of water vapour. */
  readonly pressure: number;
}

/** 25 °C and 101.325 kPa, dry: what a rate is stated at where nothing else is given (common practice, no source). */
export const ROOM: GasConditions = { temperature: 298.15, pressure: 101_325 };

/** Lower flammable limit of hydrogen in air as a volume fraction: 4 % (ISO 10156; from memory). */
export const HYDROGEN_LOWER_LIMIT = 0.04;

/** A quarter of the lower flammable limit is what ventilation commonly has to keep (NFPA 69, IEC 62485-2; from memory). */
const QUARTER = 0.25;

const SECONDS_PER_MINUTE = 60;
const LITRES_PER_CUBIC_METRE = 1000;

/**
 * Ideal gas made by a current, in L/min:  dV/dt = (I / (z F)) (R T / p), Faraday's law and the ideal gas equation.
 * `current`: what goes into this gas, in A (share or efficiency applied). `electronsPerMole`: z of one mole of the gas, 2
 * for hydrogen, 4 for oxygen from water.
 */
export const gasRate = (
  current: number,
  electronsPerMole: number,
  { temperature, pressure }: GasConditions,
): number => {
  const molesPerSecond = Math.abs(current) / (electronsPerMole * toFloat(FARADAY));
  const cubicMetresPerMole = (toFloat(GAS_CONSTANT) * temperature) / pressure;
  return molesPerSecond * cubicMetresPerMole * LITRES_PER_CUBIC_METRE * SECONDS_PER_MINUTE;
};

/**
 * Fresh air that keeps evenly mixed hydrogen at a quarter of its lower flammable limit, in the unit of `hydrogenRate`:
 * q / (q + air) = x,  so  air = q (1 - x) / x,  with x = 4 % / 4. An estimate without a safety factor for poor mixing,
 * pockets under ceilings or surges; local codes decide.
 */
export const dilutionAir = (hydrogenRate: number): number => {
  const fraction = HYDROGEN_LOWER_LIMIT * QUARTER;
  return (hydrogenRate * (1 - fraction)) / fraction;
};
