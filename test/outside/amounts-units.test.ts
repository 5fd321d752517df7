import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { QUANTITIES, isQuantityName } from '../../src/amounts/quantities.ts';
import { readQuantity } from '../../src/amounts/quantity.ts';
import { unitNamed } from '../../src/amounts/units.ts';
import { toFloat } from '../../src/amounts/number.ts';
import { FARADAY, GAS_CONSTANT } from '../../src/elements/constants.ts';

const file = new URL('../../fixtures/amounts/conversions.tsv', import.meta.url);
const conversions = readFileSync(file, 'utf8')
  .trim()
  .split('\n')
  .filter((line) => !line.startsWith('#'))
  .map((line) => {
    const [quantity = '', text = '', value = '', base = '', gnu = ''] = line.split('\t');
    return { quantity, text, value: Number(value), base, gnu };
  });

const read = (quantity: string, text: string): number => {
  if (!isQuantityName(quantity)) throw new Error(quantity);
  const result = readQuantity(text, QUANTITIES[quantity]);
  if (!result.ok) throw new Error(result.fault.message);
  return result.value.value;
};

const gnuUnits = (...args: readonly string[]): string | null => {
  try {
    return execFileSync('units', args, { encoding: 'utf8' }).trim();
  } catch {
    return null;
  }
};
const present = gnuUnits('-t', '1 inch', 'cm') === '2.54';

describe('conversions of the trade', () => {
  it('has the 53 conversions of the trade and more', () => {
    expect(conversions.length).toBeGreaterThanOrEqual(53);
  });

  it.each(conversions)('agrees with the table of GNU units for $text', ({ quantity, text, value }) => {
    expect(Math.abs(read(quantity, text) / value - 1)).toBeLessThan(1e-12);
  });

  it.skipIf(!present)('agrees with the GNU units program itself (skipped where `units` is not installed)', () => {
    for (const { quantity, text, base, gnu } of conversions) {
      const found = Number(gnuUnits('-t', '-d', '15', gnu, base));
      expect(Math.abs(read(quantity, text) / found - 1), text).toBeLessThan(1e-12);
    }
  });

  it.skipIf(!present)('agrees with the GNU units program on temperatures', () => {
    for (const celsius of [-40, 0, 25, 96]) {
      const kelvin = Number(gnuUnits('-t', '-d', '15', `tempC(${String(celsius)})`, 'K'));
      expect(read('temperature', `${String(celsius)} °C`)).toBeCloseTo(kelvin, 10);
    }
    for (const fahrenheit of [-40, 32, 77, 212]) {
      const kelvin = Number(gnuUnits('-t', '-d', '15', `tempF(${String(fahrenheit)})`, 'K'));
      expect(read('temperature', `${String(fahrenheit)} °F`)).toBeCloseTo(kelvin, 10);
    }
  });

  it('keeps the definitions of 1959 and the SI: yard, pound, troy ounce, gallon, mmHg (NIST SP 811)', () => {
    expect(read('thickness', '1 yd')).toBe(0.9144);
    expect(read('mass', '1 lb')).toBe(0.45359237);
    expect(read('mass', '16 oz_av')).toBe(0.45359237);
    expect(read('mass', '12 oz_t')).toBe(0.3732417216);
    expect(read('volume', '1 gal_us')).toBe(0.003785411784);
    expect(read('volume', '1 gal_imp')).toBe(0.00454609);
    expect(read('pressure', '760 torr')).toBe(101325);
    expect(read('pressure', '1 mmHg')).toBe(133.322387415);
  });

  it('builds its faraday, normal cubic metre and degrees on the constants of the SI', () => {
    expect(unitNamed('F')?.factor.equals(FARADAY)).toBe(true);
    const normal = 101325 / (toFloat(GAS_CONSTANT) * 273.15);
    expect(toFloat(unitNamed('Nm3')?.factor ?? FARADAY)).toBeCloseTo(normal, 12);
    expect(toFloat(unitNamed('°C')?.offset ?? FARADAY)).toBe(273.15);
  });
});
