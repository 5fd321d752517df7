import type { QuantityName } from './quantities.ts';

/**
 * What relations speak of besides the quantities of the contract: `working` charge of all cells, `net` of the blank;
 * `series`: number of cells times what does not bypass; `faraday`: charge per mole of the species, F z / |nu|;
 * `molar_mass`; `gas_constant`; `dry` partial pressure; `drop` in concentration; per area `charge_density`; `normal`
 * volume of a gas, counted in mol.
 */
export type HiddenName =
  | 'working'
  | 'net'
  | 'series'
  | 'faraday'
  | 'molar_mass'
  | 'gas_constant'
  | 'dry'
  | 'drop'
  | 'charge_density'
  | 'areal'
  | 'normal';

export type VariableName = QuantityName | HiddenName;

/**
 * A relation: `product` holds where the product of all variables to their powers is 1, `sum` where the weighted sum is
 * 0. Solved for one variable when all others are known. A `step` only carries values to another relation: a given that
 * enters nothing but steps has led nowhere.
 */
export interface Relation {
  readonly kind: 'product' | 'sum';
  readonly formula: string;
  readonly terms: readonly (readonly [VariableName, number])[];
  readonly step?: true;
}

const relation = (
  kind: Relation['kind'],
  formula: string,
  terms: Partial<Record<VariableName, number>>,
  step?: true,
): Relation => ({
  kind,
  formula,
  terms: Object.entries(terms).flatMap(([name, power]) => (isVariable(name) ? [[name, power] as const] : [])),
  ...(step === undefined ? {} : { step }),
});

const isVariable = (name: string): name is VariableName => name !== '';

/** Relations of what flows, the same for every species; tried from the first to the last. */
export const FLOW_RELATIONS: readonly Relation[] = [
  relation('product', 'Q = I t', { charge: -1, current: 1, time: 1 }),
  relation('product', 'j = I / A', { current_density: -1, current: 1, area: -1 }),
  relation('product', 'Q / A = j t', { charge_density: -1, current_density: 1, time: 1 }, true),
  relation('product', 'Q = (Q / A) A', { charge: -1, charge_density: 1, area: 1 }, true),
  relation('product', 'Q(cells) = Q N (1 - bypass)', { working: -1, charge: 1, series: 1 }, true),
  relation('sum', 'Q(net) = Q - Q(blank)', { net: -1, working: 1, blank: -1 }, true),
  relation('product', 'E = U Q', { energy: -1, voltage: 1, charge: 1 }),
  relation('sum', 'p(dry) = p - p_w', { dry: -1, pressure: 1, vapour_pressure: -1 }, true),
];

/** Faraday's law of electrolysis, as derivations show it. */
export const FARADAY_FORMULA = 'n = η Q |ν| / (z F)';

/** Faraday's law and what follows from the amount and mass of one species. */
const SPECIES_RELATIONS: readonly Relation[] = [
  relation('product', FARADAY_FORMULA, { amount: -1, efficiency: 1, net: 1, faraday: -1 }),
  relation('product', 'm = n M', { mass: -1, amount: 1, molar_mass: 1 }),
  relation('product', 'm / Q = η M |ν| / (z F)', { mass_per_charge: -1, efficiency: 1, molar_mass: 1, faraday: -1 }),
  relation('product', 'Q / m = 1 / (m / Q)', { charge_per_mass: 1, mass_per_charge: 1 }),
  relation('product', 'E / m = U Q / m', { energy_per_mass: -1, voltage: 1, charge_per_mass: 1, series: -1 }),
];

const GAS = relation('product', 'V = n R T / (p - p_w)', {
  volume: -1,
  amount: 1,
  gas_constant: 1,
  temperature: 1,
  dry: -1,
});

const NORMAL_GAS = relation('product', 'n = p° V° / (R T°)', { amount: -1, normal: 1 });

const THICKNESS: readonly Relation[] = [
  relation('product', 'd = m / (ρ A)', { thickness: -1, mass: 1, density: -1, area: -1 }),
];

/** Thickness from current density and time needs no area: d = η (Q / A) M |ν| / (z F ρ), without a blank. */
const AREAL: readonly Relation[] = [
  relation('product', 'm / A = (m / Q) j t', { areal: -1, mass_per_charge: 1, charge_density: 1 }, true),
  relation('product', 'd = (m / A) / ρ', { thickness: -1, areal: 1, density: -1 }),
];

const tank = (rises: boolean): readonly Relation[] => {
  const formula = rises ? 'n = V (c2 - c1)' : 'n = V (c1 - c2)';
  const [from, to] = rises ? [-1, 1] : [1, -1];
  return [
    relation('sum', 'Δc = |c1 - c2|', { drop: -1, from, to }, true),
    relation('product', formula, { amount: -1, volume: 1, drop: 1 }),
  ];
};

/** What a species allows: a gas has a volume, a tank loses or gains it, a blank forbids the way without area. */
export interface RelationChoice {
  readonly volume: 'gas' | 'falls' | 'rises' | 'none';
  readonly areal: boolean;
}

/** The relations of one species, in the order in which they are tried. */
export const speciesRelations = ({ volume, areal }: RelationChoice): readonly Relation[] => [
  ...SPECIES_RELATIONS,
  ...(volume === 'gas' ? [GAS, NORMAL_GAS] : []),
  ...(volume === 'falls' || volume === 'rises' ? tank(volume === 'rises') : []),
  ...THICKNESS,
  ...(areal ? AREAL : []),
];
