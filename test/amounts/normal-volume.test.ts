import { describe, expect, it } from 'vitest';
import { answerOf, faultOf } from './outcome.ts';

const COPPER = 'Cu^2+ + 2 e^- -> Cu';
const OXYGEN = '2 H2O -> O2 + 4 H^+ + 4 e^-';

// One mole of an ideal gas at 0 °C and 101.325 kPa: 22.41396954 L (CODATA 2022); F = 96485.33212 C/mol.
describe('a normal volume', () => {
  it('is answered for the gas and for no other species', () => {
    const { quantities, alongside, notes } = answerOf(OXYGEN, 'O2', { charge: '4 F' }, { want: { volume: 'Nm3' } });
    expect(quantities['volume']?.value).toBeCloseTo(0.02241396954, 9);
    expect(alongside['H2O']?.['volume']).toBeUndefined();
    expect(alongside['H^+']?.['volume']).toBeUndefined();
    expect(notes).toContain('gas-assumed');
    expect(notes).not.toContain('dry-gas');
  });

  it.each(['Nm3', 'L'])('in %s does not follow where nothing is a gas, and says so', (unit) => {
    const fault = faultOf(COPPER, 'Cu', { charge: '1 A h' }, { want: { volume: unit } });
    expect(fault).toMatchObject({ code: 'not-enough-given', field: 'want.volume', missing: ['from', 'to'] });
    expect(fault.message).toContain('none is a gas');
    expect(faultOf('2 H^+ + 2 e^- -> H2(aq)', 'H2', { charge: '1 F' }, { want: { volume: unit } })).toMatchObject({
      code: 'not-enough-given',
    });
  });

  it('follows without temperature and pressure, while litres name what is missing for another gas', () => {
    const wanted = { want: { volume: 'NL' } };
    expect(answerOf(OXYGEN, 'H2O', { charge: '4 F' }, wanted).alongside['O2']?.['volume']?.value).toBeCloseTo(
      22.41396954,
      6,
    );
    expect(faultOf(OXYGEN, 'H2O', {}, wanted)).toMatchObject({ missing: ['charge'] });
    expect(faultOf(OXYGEN, 'H2O', { charge: '4 F' }, { want: { volume: 'L' } })).toMatchObject({
      missing: ['temperature', 'pressure'],
    });
  });

  it('gives the amount of a gas', () => {
    const { quantities, notes } = answerOf(OXYGEN, 'O2', { volume: '22.41396954 NL' });
    expect(quantities['amount']?.value).toBeCloseTo(1, 9);
    expect(notes).toContain('gas-assumed');
  });

  it('is no measure of a solid or of a tank', () => {
    expect(faultOf(COPPER, 'Cu', { volume: '1 Nm3' })).toMatchObject({
      code: 'unknown-unit',
      field: 'given.volume',
      span: { from: 0, to: 5 },
    });
    const tank = { volume: '1 Nm3', from: '1 g/L', to: '0 g/L' };
    expect(faultOf(COPPER, 'Cu^2+', tank)).toMatchObject({ code: 'unknown-unit', field: 'given.volume' });
    const litres = { ...tank, volume: '100 L' };
    expect(faultOf(COPPER, 'Cu^2+', litres, { want: { volume: 'Nm3' } })).toMatchObject({
      code: 'not-enough-given',
      field: 'want.volume',
    });
  });
});

describe('units of an answer', () => {
  it.each([
    ['charge', 'Ah', 'A h'],
    ['charge', 'mAh', 'mA h'],
    ['mass_per_charge', 'g/Ah', 'g/(A h)'],
    ['mass_per_charge', 'kg/(kAh)', 'kg/(kA h)'],
    ['mass_per_charge', 'mg mAh^-1', 'mg mA^-1 h^-1'],
    ['mass_per_charge', 'g per Ah', 'g per (A h)'],
    ['charge_per_mass', 'Ah/kg', 'A h/kg'],
    ['charge_per_mass', 'mAh g^-1', 'mA h g^-1'],
    ['mass', 'lb', 'lb'],
    ['charge', 'coulombs', 'coulombs'],
  ])('%s in %s is answered in %s', (name, unit, shown) => {
    expect(answerOf(COPPER, 'Cu', { charge: '1 A h' }, { want: { [name]: unit } }).quantities[name]?.unit).toBe(shown);
  });

  it('are read back as what they were', () => {
    for (const unit of ['mg mAh^-1', 'g/Ah', 'kg/(kAh)']) {
      const shown = answerOf(COPPER, 'Cu', {}, { want: { mass_per_charge: unit } }).quantities['mass_per_charge'];
      const again = answerOf(COPPER, 'Cu', {}, { want: { mass_per_charge: shown?.unit ?? '' } });
      expect(again.quantities['mass_per_charge']).toEqual(shown);
    }
  });
});
