/** Powers of length, mass, time, electric current, temperature and amount of substance. */
export type Dimension = readonly [
  length: number,
  mass: number,
  time: number,
  current: number,
  temperature: number,
  amount: number,
];

export const NUMBER: Dimension = [0, 0, 0, 0, 0, 0];
export const LENGTH: Dimension = [1, 0, 0, 0, 0, 0];
export const MASS: Dimension = [0, 1, 0, 0, 0, 0];
export const TIME: Dimension = [0, 0, 1, 0, 0, 0];
export const CURRENT: Dimension = [0, 0, 0, 1, 0, 0];
export const TEMPERATURE: Dimension = [0, 0, 0, 0, 1, 0];
export const AMOUNT: Dimension = [0, 0, 0, 0, 0, 1];

/** The dimension of the product `a` times `b` to the power `power`. */
export const combine = (a: Dimension, b: Dimension, power = 1): Dimension => [
  a[0] + b[0] * power,
  a[1] + b[1] * power,
  a[2] + b[2] * power,
  a[3] + b[3] * power,
  a[4] + b[4] * power,
  a[5] + b[5] * power,
];

/** `base` to the power `power`. */
const powerOf = (base: Dimension, power: number): Dimension => combine(NUMBER, base, power);

export const sameDimension = (a: Dimension, b: Dimension): boolean => a.every((power, index) => power === b[index]);

export const AREA = powerOf(LENGTH, 2);
export const VOLUME = powerOf(LENGTH, 3);
export const CHARGE = combine(CURRENT, TIME);
export const PRESSURE: Dimension = [-1, 1, -2, 0, 0, 0];
export const ENERGY: Dimension = [2, 1, -2, 0, 0, 0];
export const POWER = combine(ENERGY, TIME, -1);
export const VOLTAGE = combine(POWER, CURRENT, -1);
export const CURRENT_DENSITY = combine(CURRENT, AREA, -1);
export const DENSITY = combine(MASS, VOLUME, -1);
export const MOLAR_CONCENTRATION = combine(AMOUNT, VOLUME, -1);
export const MASS_PER_CHARGE = combine(MASS, CHARGE, -1);
export const CHARGE_PER_MASS = combine(CHARGE, MASS, -1);
export const ENERGY_PER_MASS = combine(ENERGY, MASS, -1);
