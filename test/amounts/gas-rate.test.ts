import { describe, expect, test } from 'vitest';
import { HYDROGEN_LOWER_LIMIT, ROOM, dilutionAir, gasRate } from '../../src/amounts/gas-rate.ts';

describe('the rate of a gas', () => {
  test('agrees with the hydrogen of a battery room: 0.42 L per ampere hour at 0 °C', () => {
    // IEC 62485-2 (from memory): an ampere hour decomposes 0.336 g of water into 0.42 L of hydrogen and 0.21 L of oxygen.
    const zero = { temperature: 273.15, pressure: 101_325 };
    expect(gasRate(1, 2, zero) * 60).toBeCloseTo(0.42, 2);
    expect(gasRate(1, 4, zero) * 60).toBeCloseTo(0.21, 2);
  });

  test('is 7.607 mL/min of hydrogen an ampere at 25 °C and one atmosphere', () => {
    // By hand: 60 s / (2 x 96 485.33 C/mol) = 3.109281e-4 mol; 8.314463 x 298.15 / 101 325 = 0.02446540 m^3/mol.
    expect(gasRate(1, 2, ROOM) * 1000).toBeCloseTo(7.60698, 4);
  });

  test('goes with the current whichever way it flows, and against the pressure', () => {
    expect(gasRate(-250, 2, ROOM)).toBeCloseTo(250 * gasRate(1, 2, ROOM), 12);
    expect(gasRate(1, 2, { ...ROOM, pressure: 202_650 })).toBeCloseTo(gasRate(1, 2, ROOM) / 2, 12);
  });
});

describe('the air that dilutes hydrogen', () => {
  test('is 99 times the hydrogen: 1 % by volume is a quarter of 4 %', () => {
    expect(dilutionAir(1)).toBeCloseTo(99, 10);
    const hydrogen = 0.37;
    const mixed = hydrogen / (hydrogen + dilutionAir(hydrogen));
    expect(mixed).toBeCloseTo(HYDROGEN_LOWER_LIMIT / 4, 12);
  });

  test('is nothing for no hydrogen', () => {
    expect(dilutionAir(0)).toBe(0);
  });
});
