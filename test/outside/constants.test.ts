import { describe, expect, it } from 'vitest';
import { BOLTZMANN, FARADAY, GAS_CONSTANT } from '../../src/elements/constants.ts';
import { rational } from '../../src/exact/rational.ts';
import { molarMass } from '../../src/species/molar-mass.ts';
import { plain } from '../support/plain.ts';
import { readTable } from '../support/table.ts';

const FARADAY_VALUE = FARADAY.valueOf();

const grams = (formula: string): number => {
  const mass = molarMass(plain(formula));
  return mass.kind === 'known' ? mass.value : Number.NaN;
};

describe('constants against CODATA 2022', () => {
  // E. Tiesinga et al., CODATA recommended values of the fundamental physical constants: 2022; printed digits, exact.
  it('the Faraday constant is 96 485.332 12... C/mol', () => {
    expect(FARADAY_VALUE.toFixed(5)).toBe('96485.33212');
  });

  it('the molar gas constant is 8.314 462 618... J/(mol K)', () => {
    expect(GAS_CONSTANT.valueOf().toFixed(9)).toBe('8.314462618');
  });

  it('a mole of ideal gas at 273.15 K and 101.325 kPa fills 22.413 969 54... L', () => {
    const volume = GAS_CONSTANT.mul(rational(27315n, 100n)).div(101_325n).mul(1000n).valueOf();
    expect(String(volume).slice(0, 11)).toBe('22.41396954'); // printed cut off, not rounded
  });

  it('k T at 298.15 K over e is 25.692 6 mV, the thermal voltage of electrochemistry', () => {
    const volts = BOLTZMANN.mul(rational(29815n, 100n)).valueOf() / 1.602176634e-19;
    expect((volts * 1000).toFixed(4)).toBe('25.6926');
  });
});

describe('the international ampere of 1908', () => {
  /** It deposits 0.001 118 00 g of silver in a second (London conference of 1908); it was 0.999 85 A (1948). */
  it('agrees with M(Ag) / F to a part in ten thousand', () => {
    const milligramsPerCoulomb = (1000 * grams('Ag')) / FARADAY_VALUE;
    expect(Math.abs(milligramsPerCoulomb / 1.118 - 1)).toBeLessThan(1e-4);
  });

  it('needs silver at one electron: two would miss by half', () => {
    expect((1000 * grams('Ag')) / (2 * FARADAY_VALUE)).toBeCloseTo(0.559, 3);
  });
});

describe('electrochemical equivalents and capacities of handbooks', () => {
  it.each(readTable('elements/electrochemical-equivalents.tsv'))(
    '$formula with $electrons electrons: $printed $quantity',
    ({ formula = '', electrons, quantity, printed = '' }) => {
      const gramsPerCoulomb = grams(formula) / (Number(electrons) * FARADAY_VALUE);
      const found = quantity === 'mg/C' ? 1000 * gramsPerCoulomb : 1000 / (3600 * gramsPerCoulomb);
      const unit = 10 ** -(printed.split('.')[1] ?? '').length;
      expect(Math.abs(found - Number(printed))).toBeLessThan(unit + 2e-4 * found);
    },
  );
});
