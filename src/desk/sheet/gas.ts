import { ROOM, dilutionAir, gasRate } from '../../amounts/gas-rate.ts';
import { toFloat } from '../../amounts/number.ts';
import { FARADAY } from '../../elements/constants.ts';
import type { GasRate, WholeRun } from './answer.ts';

/** Species that are gases wherever a tank makes them as written here. */
const isGas = (run: WholeRun, species: string, gases: ReadonlySet<string>): boolean =>
  gases.has(species) || run.amounts.answer.alongside[species]?.['volume'] !== undefined;

/** The greatest current of a run in A: that of its record, else the stated or the mean one. */
const currentOf = ({ record, amounts }: WholeRun): number => {
  const logged = (record?.trace ?? []).reduce((most, { greatest }) => Math.max(most, greatest), 0);
  return Math.max(logged, Math.abs(amounts.answer.quantities['current']?.value ?? 0));
};

/** Moles of electrons through the cell for each mole of the species, losses included. */
const chargePerMole = ({ amounts }: WholeRun, species: string): number | undefined => {
  const { alongside, quantities } = amounts.answer;
  const made = (alongside[species] ?? quantities)['amount']?.value;
  const { charge } = quantities;
  if (made === undefined || charge === undefined || made <= 0) return undefined;
  return (Math.abs(charge.value) * SECONDS_PER_HOUR) / (made * toFloat(FARADAY));
};

const SECONDS_PER_HOUR = 3600;
const LITRES_PER_CUBIC_METRE = 1000;
const MINUTES = 60;

const rateOf = (run: WholeRun, species: string): GasRate | undefined => {
  const electrons = chargePerMole(run, species);
  const current = currentOf(run);
  if (electrons === undefined || current === 0) return undefined;
  const litres = gasRate(current, electrons, ROOM);
  const air = (dilutionAir(litres) * MINUTES) / LITRES_PER_CUBIC_METRE;
  return {
    species,
    run: run.name,
    rate: { value: litres, unit: 'L/min' },
    air: species === 'H2' ? { value: air, unit: 'm^3/h' } : null,
  };
};

/**
 * The fastest rate of each gas of a tank over its runs, dry at 25 °C and 101.325 kPa, and for hydrogen the fresh air that
 * keeps it below a quarter of its lower flammable limit: an estimate that defers to local codes.
 */
export const gasRatesOf = (
  runs: readonly WholeRun[],
  products: readonly string[],
  gases: ReadonlySet<string>,
): readonly GasRate[] =>
  products.flatMap((species) => {
    const rates = runs.filter((run) => isGas(run, species, gases)).flatMap((run) => rateOf(run, species) ?? []);
    const [fastest] = rates.sort((one, other) => other.rate.value - one.rate.value);
    return fastest === undefined ? [] : [fastest];
  });
