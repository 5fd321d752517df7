import type { Quantity } from '../schema/shape.ts';
import type { ProductTotal, Totals, WholeRun } from './answer.ts';
import { quantitiesOf } from './products.ts';

/** A run with the products of its tank. */
export interface CountedRun {
  readonly run: WholeRun;
  readonly products: readonly string[];
}

/** The sum of quantities in one unit, without an uncertainty: what runs share is not known here. */
const summed = (quantities: readonly (Quantity | undefined)[]): Quantity | undefined => {
  const known = quantities.filter((one): one is Quantity => one !== undefined);
  const [first] = known;
  if (first === undefined) return undefined;
  return { value: known.reduce((sum, { value }) => sum + value, 0), unit: first.unit };
};

const ofRuns = (runs: readonly CountedRun[], species: string, name: string): readonly (Quantity | undefined)[] =>
  runs
    .filter(({ products }) => products.includes(species))
    .map(({ run }) => quantitiesOf(run.amounts.answer, species)[name]);

/** Volumes add up to something only where every run that makes the gas has one. */
const productTotal = (runs: readonly CountedRun[], species: string): ProductTotal => {
  const mass = summed(ofRuns(runs, species, 'mass'));
  const amount = summed(ofRuns(runs, species, 'amount'));
  const volumes = ofRuns(runs, species, 'volume');
  const volume = volumes.includes(undefined) ? undefined : summed(volumes);
  return {
    species,
    ...(mass === undefined ? {} : { mass }),
    ...(amount === undefined ? {} : { amount }),
    ...(volume === undefined ? {} : { volume }),
  };
};

/** Charge, energy, and mass, amount and volume of each product, summed over runs. */
export const totalsOf = (runs: readonly CountedRun[]): Totals => {
  const quantities = runs.map(({ run }) => run.amounts.answer.quantities);
  const energies = quantities.map(({ energy }) => energy);
  const species = [...new Set(runs.flatMap(({ products }) => products))];
  return {
    runs: runs.length,
    charge: summed(quantities.map(({ charge }) => charge)) ?? { value: 0, unit: 'A h' },
    energy: summed(energies) ?? null,
    withoutVoltage: energies.filter((energy) => energy === undefined).length,
    products: species.map((one) => productTotal(runs, one)),
  };
};
