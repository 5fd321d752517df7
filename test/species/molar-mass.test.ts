import { describe, expect, it } from 'vitest';
import { ONE, rational, showDecimal } from '../../src/exact/rational.ts';
import { molarMass } from '../../src/species/molar-mass.ts';
import { ELECTRON, type Species } from '../../src/species/species.ts';
import { plain } from '../support/plain.ts';

const known = (species: Species): Extract<ReturnType<typeof molarMass>, { kind: 'known' }> => {
  const mass = molarMass(species);
  if (mass.kind === 'missing') throw new Error(`no mass: ${mass.element}`);
  return mass;
};

const withNuclides = (...atoms: readonly (readonly [string, bigint])[]): Species => ({
  ...plain('H'),
  composition: new Map(atoms.map(([key, count]) => [key, rational(count)])),
});

describe('molar mass', () => {
  // Added by hand from the abridged weights of 2021.
  it.each([
    ['H2O', '18.015'],
    ['NaCl', '58.44'],
    ['CuSO4*5H2O', '249.677'],
    ['K2Cr2O7', '294.181'],
    ['K4[Fe(CN)6]', '368.345'],
    ['Li0.5CoO2', '94.401'],
    ['AgNO3', '169.874'],
    ['MnO4^-', '118.934'],
    ['Al2(SO4)3*18H2O', '666.402'],
  ])('of %s is %s g/mol, exactly', (text, sum) => {
    expect(showDecimal(known(plain(text)).exact)).toBe(sum);
    expect(known(plain(text)).value).toBe(Number(sum));
  });

  it('does not drift with thousands of atoms', () => {
    expect(known(plain('(C2H4)30000')).value).toBe(841_620); // 28.054 × 30000
  });

  it('spreads the half-widths as rectangles, together within an element, in quadrature between elements', () => {
    // H2O: sqrt((2 × 0.0002)² + 0.001²) / sqrt(3)
    expect(known(plain('H2O')).uncertainty).toBeCloseTo(Math.sqrt(1.16e-6 / 3), 12);
    // O8 has 8 times the uncertainty of O, not sqrt(8) times
    expect(known(plain('O8')).uncertainty).toBeCloseTo(0.008 / Math.sqrt(3), 12);
    // atoms of one element at different places are still one weight
    expect(known(plain('CH3CH3')).uncertainty).toBe(known(plain('C2H6')).uncertainty);
  });

  it('weighs named nuclides by their own mass', () => {
    const heavyWater = known(withNuclides(['2H', 2n], ['O', 1n]));
    expect(showDecimal(heavyWater.exact)).toBe('20.027203556');
    expect(known(withNuclides(['12C', 1n]))).toEqual({
      kind: 'known',
      value: 12,
      uncertainty: 0,
      exact: rational(12n),
    });
  });

  it.each([
    ['TcO4^-', 'Tc'],
    ['PuO2', 'Pu'],
    ['NaAt', 'At'],
  ])('of %s is missing because %s has no standard atomic weight', (text, element) => {
    expect(molarMass(plain(text))).toEqual({ kind: 'missing', element });
  });

  it('is missing for a nuclide outside the table, and names it', () => {
    expect(molarMass(withNuclides(['99Fe', 1n]))).toEqual({ kind: 'missing', element: '99Fe' });
  });

  it('is missing for the electron', () => {
    expect(molarMass(ELECTRON)).toEqual({ kind: 'missing', element: 'e' });
  });

  it('ignores the electrons that an ion gained or lost', () => {
    expect(known(plain('Fe^3+')).value).toBe(known(plain('Fe')).value);
    expect(known({ ...plain('Fe'), charge: ONE }).value).toBe(55.845);
  });
});
