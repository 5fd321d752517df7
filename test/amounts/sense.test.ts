import { describe, expect, it } from 'vitest';
import type { AmountsRequest } from '../../src/amounts/working.ts';
import { answerOf, faultOf } from './outcome.ts';

const COPPER = 'Cu^2+ + 2 e^- -> Cu';
const DISSOLVING = 'Cu -> Cu^2+ + 2 e^-';
const HYDROGEN = '2 H^+ + 2 e^- -> H2(g)';
const GAS = { charge: '2 A h', temperature: '25 °C', pressure: '1 bar' };

type Given = AmountsRequest['given'];

describe('what cannot be', () => {
  it.each<readonly [string, string, string, Given, string]>([
    ['as much vapour as pressure', HYDROGEN, 'H2', { ...GAS, vapour_pressure: '1 bar' }, 'given.vapour_pressure'],
    ['more vapour than pressure', HYDROGEN, 'H2', { vapour_pressure: '2 bar', ...GAS }, 'given.vapour_pressure'],
    ['a tank below nothing', COPPER, 'Cu^2+', { volume: '1 L', from: '1 g/L', charge: '50 A h' }, 'given.charge'],
    ['a start below nothing', DISSOLVING, 'Cu^2+', { volume: '1 L', to: '1 g/L', charge: '50 A h' }, 'given.charge'],
    ['an ion made that falls', DISSOLVING, 'Cu^2+', { volume: '100 L', from: '3 g/L', to: '1 g/L' }, 'given.to'],
    ['an ion used up that rises', COPPER, 'Cu^2+', { volume: '100 L', from: '1 g/L', to: '3 g/L' }, 'given.to'],
    [
      'a gas made that falls',
      '2 Cl^- -> Cl2 + 2 e^-',
      'Cl2',
      { volume: '1 L', from: '3 g/L', to: '1 g/L' },
      'given.to',
    ],
    ['a deposit of a charge that flows back', COPPER, 'Cu', { charge: '-1 A h', mass: '72 g' }, 'given.mass'],
    ['a deposit at no efficiency', COPPER, 'Cu', { efficiency: '0 %', mass: '72 g' }, 'given.efficiency'],
    ['a deposit without a charge', COPPER, 'Cu', { charge: '0 C', mass: '60 g' }, 'given.charge'],
    ['a deposit of the blank alone', COPPER, 'Cu', { charge: '5 C', blank: '5 C', mass: '60 g' }, 'given.blank'],
    ['energy without a charge', COPPER, 'Cu', { charge: '0 C', energy: '2 kWh' }, 'given.charge'],
    ['energy without a voltage', COPPER, 'Cu', { voltage: '0 V', energy: '1 kWh' }, 'given.voltage'],
    ['a time before the start', COPPER, 'Cu', { charge: '-1 A h', current: '2 A' }, 'given.current'],
    [
      'an area of less than nothing',
      COPPER,
      'Cu',
      { current: '-1 A', current_density: '2 A/dm^2', time: '1 h' },
      'given.current_density',
    ],
    ['an amount without a change', COPPER, 'Cu^2+', { from: '1 g/L', to: '1 g/L', amount: '1 mol' }, 'given.to'],
  ])('refuses %s', (_, half, species, given, field) => {
    expect(faultOf(half, species, given)).toMatchObject({ code: 'contradiction', field });
  });

  it('lets nothing be made by no charge, at no efficiency and with no change', () => {
    expect(answerOf(COPPER, 'Cu', { charge: '0 C' }).quantities['mass']?.value).toBe(0);
    expect(answerOf(COPPER, 'Cu', { charge: '0 C', mass: '0 g' }).quantities['mass']?.value).toBe(0);
    expect(answerOf(COPPER, 'Cu', { charge: '1 A h', efficiency: '0 %' }).quantities['mass']?.value).toBe(0);
    const still = { volume: '1 L', from: '3 g/L', to: '3 g/L', charge: '1 C' };
    expect(answerOf(COPPER, 'Cu^2+', still).quantities['efficiency']?.value).toBe(0);
  });

  it('counts a metal that is made as what leaves the tank, and as what enters it where both figures say so', () => {
    expect(answerOf(COPPER, 'Cu', { volume: '1 L', from: '3 g/L', to: '1 g/L' }).quantities['mass']?.value).toBeCloseTo(
      2,
    );
    expect(answerOf(COPPER, 'Cu', { volume: '1 L', from: '1 g/L', to: '3 g/L' }).quantities['mass']?.value).toBeCloseTo(
      2,
    );
  });

  it('notes a tank that is empty but for the digits', () => {
    // 1 g of Cu takes 2 F / 63.546 = 0.843530 A h
    const { quantities, notes } = answerOf(COPPER, 'Cu^2+', { volume: '1 L', from: '1 g/L', charge: '0.84354 A h' });
    expect(quantities['to']?.value).toBeLessThan(0);
    expect(notes).toContain('below-zero');
  });

  it('notes a charge that flows back', () => {
    expect(answerOf(COPPER, 'Cu', { charge: '1 C', blank: '2 C' }).notes).toContain('runs-backwards');
    const back = answerOf(COPPER, 'Cu', { current: '-1 A', time: '1 h' });
    expect(back.notes).toContain('runs-backwards');
    expect(back.quantities['mass']?.value).toBeCloseTo(-1.185494, 6);
    expect(answerOf(COPPER, 'Cu', { current: '1 A', time: '1 h' }).notes).not.toContain('runs-backwards');
    const rising = { volume: '1 L', from: '1 g/L', to: '3 g/L', charge: '-1.68706 A h' };
    expect(answerOf(COPPER, 'Cu^2+', rising).quantities['efficiency']?.value).toBeCloseTo(100, 3);
  });
});

describe('species in several states', () => {
  const HALF = 'H2O(l) + O2 + H2O(g) + 4 e^- -> 4 OH^-';

  it('are not taken one for the other', () => {
    const fault = faultOf(HALF, 'H2O', { charge: '4 F' });
    expect(fault).toMatchObject({ code: 'bad-ask', field: 'species', span: { from: 0, to: 3 } });
    expect(fault.hint).toBe('Write which is meant: H2O(l) or H2O(g).');
    expect(answerOf(HALF, 'H2O(g)', { charge: '4 F' }).quantities['amount']?.value).toBeCloseTo(1, 12);
  });
});
