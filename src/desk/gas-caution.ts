import { ROOM, dilutionAir, gasRate } from '../amounts/gas-rate.ts';
import { gasKind } from '../amounts/gases.ts';
import { toFloat } from '../amounts/number.ts';
import { type Reaction, sideOf } from '../balance/reaction.ts';
import { type Rational, ZERO } from '../exact/rational.ts';
import { type Species, plainSpecies } from '../species/species.ts';
import type { ShownCaution } from './schema/shape.ts';

/** A half-reaction at one electrode and how often it runs there: `electrons` at the scale of `reaction`. */
export interface GasSource {
  readonly reaction: Reaction;
  readonly electrons: Rational;
  readonly multiplier: Rational;
}

interface Gas {
  readonly species: Species;
  /** Moles of gas for each mole of electrons through the electrode. */
  readonly perElectron: number;
}

/** The gases that the reactions of one electrode make, each species once. */
const gasesOf = (sources: readonly GasSource[]): readonly Gas[] => {
  const electrons = sources.reduce((sum, one) => sum.add(one.electrons.mul(one.multiplier)), ZERO);
  const moles = new Map<string, { readonly species: Species; readonly amount: Rational }>();
  for (const { reaction, multiplier } of sources)
    for (const { species, nu } of sideOf(reaction, 'right')) {
      if (gasKind(species) === 'no-gas') continue;
      const before = moles.get(species.key)?.amount ?? ZERO;
      moles.set(species.key, { species, amount: before.add(nu.mul(multiplier)) });
    }
  return [...moles.values()].map(({ species, amount }) => ({ species, perElectron: toFloat(amount.div(electrons)) }));
};

/** Three digits are more than an estimate is worth. */
const shown = (litres: number): string =>
  litres < 0.1 ? `${(litres * 1000).toPrecision(2)} mL/min` : `${litres.toPrecision(2)} L/min`;

const BASIS = "Faraday's law and the ideal gas equation";
const LIMIT = 'lower flammable limit of hydrogen 4 % by volume in air (ISO 10156)';

/**
 * What gas the electrodes make for each ampere and, for hydrogen, the fresh air that keeps it below a quarter of its
 * lower flammable limit: an estimate, as a caution. Nothing where no gas is made.
 */
export const gasCautions = (electrodes: readonly (readonly GasSource[])[]): readonly ShownCaution[] => {
  const gases = electrodes.flatMap(gasesOf);
  if (gases.length === 0) return [];
  const rates = gases.map(({ species, perElectron }) => ({
    name: plainSpecies(species),
    rate: gasRate(1, 1 / perElectron, ROOM),
  }));
  const made = rates.map(({ name, rate }) => `${shown(rate)} of ${name}`).join(' and ');
  const hydrogen = rates.reduce((sum, { name, rate }) => sum + (name === 'H2' ? rate : 0), 0);
  const air =
    hydrogen === 0
      ? ''
      : ` About ${shown(dilutionAir(hydrogen))} of fresh air per ampere, evenly mixed, keeps the hydrogen below a quarter of its lower flammable limit (4 % by volume).`;
  const text = `Each ampere makes up to about ${made} (dry, 25 °C, 101.325 kPa).${air} This is an estimate: local codes decide on ventilation.`;
  return [
    {
      text,
      because: [...new Set(rates.map(({ name }) => name))],
      basis: hydrogen === 0 ? BASIS : `${BASIS}; ${LIMIT}`,
    },
  ];
};
