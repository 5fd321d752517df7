import { describe, expect, it } from 'vitest';
import { electrodeCircuit } from './circuit.ts';
import { answerOf, faultOf } from './outcome.ts';

const ZINC = 'Zn^2+ + 2 e^- -> Zn';
const COPPER = 'Cu^2+ + 2 e^- -> Cu';
const HYDROGEN = '2 H^+ + 2 e^- -> H2(g)';
const WATER = 'O2 + 4 H^+ + 4 e^- -> 2 H2O';
const PEROXIDE = 'O2 + 2 H^+ + 2 e^- -> H2O2';
const REDUCED_PEROXIDE = 'H2O2 + 2 H^+ + 2 e^- -> 2 H2O';

describe('shares found beside shares written', () => {
  const circuit = electrodeCircuit([ZINC, '50 %'], [COPPER], [HYDROGEN]);

  it('leave the rest to the last reaction', () => {
    // 20 g / 63.546 g/mol of 1 mol for 2 F: 31.473 %, and 18.527 % are left
    const { quantities, alongside } = answerOf(circuit, 'Cu', { charge: '2 F', mass: '20 g' });
    expect(quantities['share']?.value).toBeCloseTo(31.4733, 4);
    expect(alongside['H2']?.['share']?.value).toBeCloseTo(18.5267, 4);
  });

  it('are a contradiction over the whole together', () => {
    const fault = faultOf(circuit, 'Cu', { charge: '2 F', mass: '40 g' });
    expect(fault).toMatchObject({ code: 'contradiction', field: 'given.mass', span: { from: 0, to: 4 } });
    expect(fault.message).toContain('112.9 %');
    expect(faultOf(circuit, 'Cu', { charge: '2 F', share: '60 %' })).toMatchObject({ code: 'contradiction' });
  });

  it('may reach the whole within what is uncertain', () => {
    expect(answerOf(circuit, 'Cu', { charge: '2 F', mass: '31.8(1) g' }).quantities['share']?.value).toBeCloseTo(
      50.04,
      2,
    );
  });
});

describe('shares of two reactions of one species', () => {
  const both = electrodeCircuit([WATER], [REDUCED_PEROXIDE]);

  it('follow from its amount where the two make different amounts of it', () => {
    // s/2 + (1 - s) = 2.5/4 mol per mol of electrons: s = 3/4
    const { quantities, alongside, notes } = answerOf(both, 'H2O', { charge: '4 F', amount: '2.5 mol' });
    expect(alongside['O2']?.['share']?.value).toBeCloseTo(75, 9);
    expect(alongside['H2O2']?.['share']?.value).toBeCloseTo(25, 9);
    expect(alongside['O2']?.['amount']?.value).toBeCloseTo(0.75, 12);
    expect(quantities['efficiency']?.value).toBeCloseTo(100, 9);
    expect(quantities['mass_per_charge']?.value).toBeCloseTo((2.5 * 18.015 * 3600) / (4 * 96485.33212), 6);
    expect(notes).toContain('share-found');
  });

  it('follow of a reactant too', () => {
    // s/4 + (1 - s)/2 = 1.25/4: s = 3/4
    const oxygen = answerOf(electrodeCircuit([WATER], [PEROXIDE]), 'O2', { charge: '4 F', amount: '1.25 mol' });
    expect(oxygen.alongside['H2O']?.['share']?.value).toBeCloseTo(75, 9);
    expect(oxygen.alongside['H2O2']?.['share']?.value).toBeCloseTo(25, 9);
  });

  it('follow with a third reaction whose share is written', () => {
    // with 20 % for H2: 0.8 = s + t and s/2 + t = 2/4: s = 0.6, t = 0.2
    const three = electrodeCircuit([WATER], [REDUCED_PEROXIDE], [HYDROGEN, '20 %']);
    const { alongside, quantities } = answerOf(three, 'H2O', { charge: '4 F', amount: '2 mol' });
    expect(alongside['O2']?.['share']?.value).toBeCloseTo(60, 9);
    expect(alongside['H2O2']?.['share']?.value).toBeCloseTo(20, 9);
    expect(quantities['efficiency']?.value).toBeCloseTo(80, 9);
  });

  it('follow for the only one of them without a share', () => {
    // 0.6 for water and t for peroxide: 0.6/2 + t = 2/4: t = 0.2, and 0.2 are left
    const three = electrodeCircuit([WATER, '60 %'], [REDUCED_PEROXIDE], [HYDROGEN]);
    const { alongside } = answerOf(three, 'H2O', { charge: '4 F', amount: '2 mol' });
    expect(alongside['H2O2']?.['share']?.value).toBeCloseTo(20, 9);
    expect(alongside['H2']?.['amount']?.value).toBeCloseTo(0.4, 9);
  });

  it('share what an efficiency leaves them', () => {
    // s + t = 0.9 and s/2 + t = 2.5/4: s = 0.55, t = 0.35
    const { alongside } = answerOf(both, 'H2O', { charge: '4 F', amount: '2.5 mol', efficiency: '90 %' });
    expect(alongside['O2']?.['share']?.value).toBeCloseTo(55, 9);
    expect(alongside['H2O2']?.['share']?.value).toBeCloseTo(35, 9);
  });

  it('are a contradiction where no shares give the amount', () => {
    expect(faultOf(both, 'H2O', { charge: '4 F', amount: '5 mol' })).toMatchObject({
      code: 'contradiction',
      field: 'given.amount',
      span: { from: 0, to: 5 },
    });
    expect(faultOf(both, 'H^+', { charge: '4 F', amount: '1 mol' })).toMatchObject({ code: 'contradiction' });
    expect(faultOf(both, 'H2O', { charge: '0 C', amount: '1 mol' })).toMatchObject({ code: 'contradiction' });
  });

  it('are asked for where the amount does not say them', () => {
    const open = { code: 'not-enough-given', field: 'electrode', missing: ['share'] };
    expect(faultOf(both, 'H^+', { charge: '4 F', amount: '4 mol' })).toMatchObject(open);
    const three = electrodeCircuit([WATER], [REDUCED_PEROXIDE], [HYDROGEN]);
    expect(faultOf(three, 'H2O', { charge: '4 F', amount: '2 mol' })).toMatchObject(open);
    const turned = electrodeCircuit([PEROXIDE], [REDUCED_PEROXIDE]);
    expect(faultOf(turned, 'H2O2', { charge: '4 F', amount: '0.1 mol' })).toMatchObject(open);
  });
});

describe('reactions in parallel', () => {
  it('all run one way', () => {
    const mixed = electrodeCircuit(['Cu -> Cu^2+ + 2 e^-', '50 %'], [HYDROGEN]);
    expect(faultOf(mixed, 'Cu', { charge: '1 F' })).toMatchObject({
      code: 'electrode-direction',
      field: 'electrode[1]',
    });
  });
});
