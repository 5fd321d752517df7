import {
  type Dimension,
  AMOUNT,
  AREA,
  CHARGE,
  CHARGE_PER_MASS,
  CURRENT,
  CURRENT_DENSITY,
  DENSITY,
  ENERGY,
  ENERGY_PER_MASS,
  LENGTH,
  MASS,
  MASS_PER_CHARGE,
  MOLAR_CONCENTRATION,
  NUMBER,
  PRESSURE,
  TEMPERATURE,
  TIME,
  VOLTAGE,
  VOLUME,
} from './dimension.ts';
import type { Measurand } from './quantity.ts';

/** The quantities of the contract that hold one value; `record` is a list and becomes `charge` and `time`. */
export type QuantityName =
  | 'charge'
  | 'current'
  | 'current_density'
  | 'area'
  | 'time'
  | 'efficiency'
  | 'share'
  | 'blank'
  | 'amount'
  | 'mass'
  | 'volume'
  | 'temperature'
  | 'pressure'
  | 'vapour_pressure'
  | 'density'
  | 'thickness'
  | 'from'
  | 'to'
  | 'voltage'
  | 'energy'
  | 'mass_per_charge'
  | 'charge_per_mass'
  | 'energy_per_mass';

/** Which values make sense: a charge may flow backwards, a blank may be nothing, a density may not. */
type Sign = 'any' | 'not-zero' | 'not-negative' | 'positive';

/** A quantity: what it measures, the unit it is answered in when none is wanted, and the values it may take. */
export interface QuantityKind extends Measurand {
  readonly unit: string;
  readonly sign: Sign;
}

const kind = (
  name: string,
  dimensions: readonly Dimension[],
  unit: string,
  example: string,
  sign: Sign,
): QuantityKind => ({ name, dimensions, unit, example, sign });

const concentration = (name: string): QuantityKind =>
  kind(name, [DENSITY, MOLAR_CONCENTRATION, NUMBER], 'g/L', 'g/L, mol/L or ppm', 'not-negative');

/** Every quantity with its default unit, in the order in which an answer lists them. */
export const QUANTITIES: Readonly<Record<QuantityName, QuantityKind>> = {
  charge: kind('the charge', [CHARGE], 'C', 'C or A h', 'any'),
  current: kind('the current', [CURRENT], 'A', 'A', 'not-zero'),
  current_density: kind('the current density', [CURRENT_DENSITY], 'A/dm^2', 'A/dm^2', 'not-zero'),
  area: kind('the area', [AREA], 'dm^2', 'dm^2', 'positive'),
  time: kind('the time', [TIME], 's', 's, min or h', 'positive'),
  efficiency: { ...kind('the efficiency', [NUMBER], '%', '%', 'not-negative'), bare: true },
  share: { ...kind('the share', [NUMBER], '%', '%', 'not-negative'), bare: true },
  blank: kind('the blank', [CHARGE], 'C', 'C or A h', 'any'),
  amount: kind('the amount', [AMOUNT], 'mol', 'mol', 'not-negative'),
  mass: kind('the mass', [MASS], 'g', 'g or kg', 'not-negative'),
  volume: kind('the volume', [VOLUME, AMOUNT], 'L', 'L or Nm3', 'not-negative'),
  temperature: kind('the temperature', [TEMPERATURE], 'K', '°C or K', 'positive'),
  pressure: kind('the pressure', [PRESSURE], 'kPa', 'kPa or bar', 'positive'),
  vapour_pressure: kind('the vapour pressure', [PRESSURE], 'kPa', 'kPa or mmHg', 'not-negative'),
  density: kind('the density', [DENSITY], 'g/cm^3', 'g/cm^3', 'positive'),
  thickness: kind('the thickness', [LENGTH], 'µm', 'µm or mil', 'not-negative'),
  from: concentration('the concentration at the start'),
  to: concentration('the concentration at the end'),
  voltage: kind('the voltage', [VOLTAGE], 'V', 'V', 'any'),
  energy: kind('the energy', [ENERGY], 'kWh', 'kWh', 'any'),
  mass_per_charge: kind('the mass per charge', [MASS_PER_CHARGE], 'g/(A h)', 'g/(A h)', 'positive'),
  charge_per_mass: kind('the charge per mass', [CHARGE_PER_MASS], 'A h/kg', 'A h/kg', 'positive'),
  energy_per_mass: kind('the energy per mass', [ENERGY_PER_MASS], 'kWh/kg', 'kWh/kg', 'any'),
};

/** The names in the order of the table. */
export const QUANTITY_NAMES = Object.keys(QUANTITIES).filter((name): name is QuantityName => isQuantityName(name));

/** True for the name of a quantity that holds one value. */
export function isQuantityName(name: string): name is QuantityName {
  return Object.hasOwn(QUANTITIES, name);
}
