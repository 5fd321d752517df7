import { describe, expect, it } from 'vitest';
import { FARADAY } from '../../src/elements/constants.ts';
import { toFloat } from '../../src/amounts/number.ts';
import { amountsOf } from '../amounts/circuit.ts';

const value = (
  half: string,
  species: string,
  given: Readonly<Record<string, string>>,
  name: string,
  unit: string,
): number => {
  const result = amountsOf(half, species, given, { want: { [name]: unit } });
  if (!result.ok) throw new Error(JSON.stringify(result.fault));
  return result.value.quantities[name]?.value ?? NaN;
};

/** Half-reaction to the metal, electrochemical equivalent in mg/C as handbooks round it. */
const EQUIVALENTS: readonly (readonly [half: string, species: string, milligrams: number])[] = [
  // Lange's Handbook of Chemistry and electroplating handbooks, table of electrochemical equivalents (from memory)
  ['Ag^+ + e^- -> Ag', 'Ag', 1.118],
  ['Cu^2+ + 2 e^- -> Cu', 'Cu', 0.3293],
  ['Zn^2+ + 2 e^- -> Zn', 'Zn', 0.3388],
  ['Ni^2+ + 2 e^- -> Ni', 'Ni', 0.3041],
  ['Al^3+ + 3 e^- -> Al', 'Al', 0.0932],
  ['Pb^2+ + 2 e^- -> Pb', 'Pb', 1.0736],
  ['Cd^2+ + 2 e^- -> Cd', 'Cd', 0.5825],
  ['Fe^2+ + 2 e^- -> Fe', 'Fe', 0.2894],
  ['Au^+ + e^- -> Au', 'Au', 2.0415],
  ['Sn^2+ + 2 e^- -> Sn', 'Sn', 0.615],
  ['Co^2+ + 2 e^- -> Co', 'Co', 0.3054],
  ['Mg^2+ + 2 e^- -> Mg', 'Mg', 0.126],
  ['Na^+ + e^- -> Na', 'Na', 0.2383],
  ['Hg^2+ + 2 e^- -> Hg', 'Hg', 1.0395],
];

/** Specific capacity in mA h/g as battery reviews print it (from memory). */
const CAPACITIES: readonly (readonly [half: string, species: string, capacity: number, tolerance: number])[] = [
  ['Li -> Li^+ + e^-', 'Li', 3861, 2],
  ['Na -> Na^+ + e^-', 'Na', 1166, 1],
  ['Mg -> Mg^2+ + 2 e^-', 'Mg', 2205, 1],
  ['Al -> Al^3+ + 3 e^-', 'Al', 2980, 1],
  ['Zn -> Zn^2+ + 2 e^-', 'Zn', 820, 1],
  ['C6 + Li^+ + e^- -> LiC6', 'C6', 372, 0.5],
  ['LiFePO4 -> FePO4 + Li^+ + e^-', 'LiFePO4', 170, 0.5],
  ['LiCoO2 -> CoO2 + Li^+ + e^-', 'LiCoO2', 274, 0.5],
  ['LiMn2O4 -> Mn2O4 + Li^+ + e^-', 'LiMn2O4', 148, 0.5],
  ['Li4Ti5O12 + 3 Li^+ + 3 e^- -> Li7Ti5O12', 'Li4Ti5O12', 175, 0.5],
  ['S + 2 Li^+ + 2 e^- -> Li2S', 'S', 1672, 3],
  ['4 Si + 15 Li^+ + 15 e^- -> Li15Si4', 'Si', 3579, 1],
  ['MnO2 + H^+ + e^- -> MnOOH', 'MnO2', 308, 0.5],
  ['NiOOH + H2O + e^- -> Ni(OH)2 + OH^-', 'NiOOH', 292, 0.5],
  ['PbO2 + SO4^2- + 4 H^+ + 2 e^- -> PbSO4 + 2 H2O', 'PbO2', 224, 0.5],
];

describe('published figures', () => {
  it('carries the Faraday constant of CODATA 2022, 96485.33212... C/mol, exact', () => {
    expect(toFloat(FARADAY)).toBe(96485.33212331001);
    expect(value('Ag^+ + e^- -> Ag', 'Ag', { amount: '1 mol' }, 'charge', 'C')).toBe(toFloat(FARADAY));
  });

  it('gives the silver of the international ampere of 1908: 1.11800 mg per coulomb', () => {
    // London conference 1908: the current that deposits 1.11800 mg of silver a second.
    const milligrams = value('Ag^+ + e^- -> Ag', 'Ag', { current: '1 A', time: '1 s' }, 'mass', 'mg');
    expect(Math.abs(milligrams - 1.118)).toBeLessThan(0.0002);
  });

  it('gives the weights of IUPAC 2021, with the half-width of a rectangle over root three', () => {
    // T. Prohaska et al., Pure Appl. Chem. 94 (2022) 573: Cu 63.546(3), Zn 65.38(2), Pb 207.2(1.1).
    for (const [metal, weight, half] of [
      ['Cu', 63.546, 0.003],
      ['Zn', 65.38, 0.02],
      ['Pb', 207.2, 1.1],
    ] as const) {
      const result = amountsOf(`${metal}^2+ + 2 e^- -> ${metal}`, metal, { amount: '1 mol' });
      const mass = result.ok ? result.value.quantities['mass'] : undefined;
      expect(mass?.value).toBeCloseTo(weight, 10);
      expect(mass?.uncertainty).toBeCloseTo(half / Math.sqrt(3), 10);
    }
  });

  it.each(EQUIVALENTS)('%s: the equivalent of %s in handbooks is %d mg/C', (half, species, milligrams) => {
    const found = value(half, species, {}, 'mass_per_charge', 'mg/C');
    expect(Math.abs(found / milligrams - 1)).toBeLessThan(5e-4);
  });

  it.each(CAPACITIES)('%s: the capacity of %s in reviews is %d mA h/g', (half, species, capacity, tolerance) => {
    const found = value(half, species, {}, 'charge_per_mass', 'mA h/g');
    expect(Math.abs(found - capacity)).toBeLessThanOrEqual(tolerance);
  });

  it('makes 22.414 L of an ideal gas per mole at 0 °C and 101.325 kPa (CODATA 2022: 22.41396954 L/mol)', () => {
    const given = { amount: '1 mol', temperature: '0 °C', pressure: '101.325 kPa' };
    expect(value('2 H^+ + 2 e^- -> H2(g)', 'H2', given, 'volume', 'L')).toBeCloseTo(22.41396954, 7);
  });

  it('takes 2.98 kA h for a kilogram of aluminium and 0.6 to 0.8 kA h per kilogram of chlorine (handbooks, from memory)', () => {
    expect(value('Al^3+ + 3 e^- -> Al', 'Al', {}, 'charge_per_mass', 'kA h/kg')).toBeCloseTo(2.98, 2);
    expect(value('2 Cl^- -> Cl2 + 2 e^-', 'Cl2', {}, 'charge_per_mass', 'A h/kg')).toBeCloseTo(756, 0);
  });
});

describe('common practice of the trade, no source', () => {
  it('finds the gases of water splitting 2 to 1 by volume at one temperature and pressure', () => {
    const given = { charge: '1 A h', temperature: '20 °C', pressure: '1 bar', vapour_pressure: '2.3 kPa' };
    const hydrogen = value('2 H^+ + 2 e^- -> H2(g)', 'H2', given, 'volume', 'L');
    const oxygen = value('2 H2O -> O2(g) + 4 H^+ + 4 e^-', 'O2', given, 'volume', 'L');
    expect(hydrogen / oxygen).toBeCloseTo(2, 12);
  });

  it('deposits mass in proportion to charge and to M/z (Faraday)', () => {
    const copper = (charge: string): number => value('Cu^2+ + 2 e^- -> Cu', 'Cu', { charge }, 'mass', 'g');
    expect(copper('3 A h') / copper('1 A h')).toBeCloseTo(3, 12);
    const silver = value('Ag^+ + e^- -> Ag', 'Ag', { charge: '1 A h' }, 'mass', 'g');
    expect(silver / copper('1 A h')).toBeCloseTo(107.87 / (63.546 / 2), 12);
  });

  it('plates about 12 µm of nickel in an hour at 1 A/dm² and about 13 µm of copper in half an hour at 2 A/dm²', () => {
    const nickel = { current_density: '1 A/dm^2', time: '1 h', density: '8.9 g/cm^3' };
    expect(value('Ni^2+ + 2 e^- -> Ni', 'Ni', nickel, 'thickness', 'µm')).toBeCloseTo(12.3, 1);
    const copper = { current_density: '2 A/dm^2', time: '30 min', density: '8.96 g/cm^3' };
    expect(value('Cu^2+ + 2 e^- -> Cu', 'Cu', copper, 'thickness', 'µm')).toBeCloseTo(13.2, 1);
  });
});
