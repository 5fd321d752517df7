import { describe, expect, it } from 'vitest';
import { NUCLIDE_MASSES, nuclideMass } from '../../src/elements/nuclides.ts';
import { isElement, splitNuclide } from '../../src/elements/table.ts';

describe('masses of nuclides', () => {
  it('lie within 0.11 of the mass number, as every nuclide from hydrogen to americium does', () => {
    for (const [nuclide, { value }] of NUCLIDE_MASSES) {
      const { massNumber, symbol } = splitNuclide(nuclide);
      expect(isElement(symbol)).toBe(true);
      expect(Math.abs(Number(value) - Number(massNumber))).toBeLessThan(0.11);
    }
  });

  it('take 12C as exactly 12', () => {
    expect(nuclideMass('12C')).toEqual({ value: '12', uncertainty: '0' });
  });

  it('give none for a nuclide that the table does not hold', () => {
    expect(nuclideMass('99Fe')).toBeUndefined();
    expect(nuclideMass('H')).toBeUndefined();
  });
});
