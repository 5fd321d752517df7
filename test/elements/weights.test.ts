import { describe, expect, it } from 'vitest';
import { ELEMENTS } from '../../src/elements/table.ts';
import { STANDARD_WEIGHTS, standardWeight } from '../../src/elements/weights.ts';

describe('standard atomic weights', () => {
  it('exist for exactly the 84 elements with a characteristic terrestrial composition', () => {
    // Prohaska et al. 2022: no value for Tc, Pm, Po to Ac, and the elements after uranium.
    const without = new Set([43, 61, 84, 85, 86, 87, 88, 89]);
    const expected = ELEMENTS.filter(({ atomicNumber: z }) => z <= 92 && !without.has(z)).map(({ symbol }) => symbol);
    expect([...STANDARD_WEIGHTS.keys()]).toEqual(expected);
    expect(expected).toHaveLength(84);
  });

  it('write the half-width to the last place of the value', () => {
    const places = (text: string): number => (text.split('.')[1] ?? '').length;
    for (const [symbol, { value, halfWidth }] of STANDARD_WEIGHTS) {
      expect([symbol, places(halfWidth)]).toEqual([symbol, places(value)]);
    }
  });

  // Prohaska et al. 2022, abridged values, from memory.
  it.each([
    ['H', '1.0080', '0.0002'],
    ['Li', '6.94', '0.06'],
    ['O', '15.999', '0.001'],
    ['S', '32.06', '0.02'],
    ['Ar', '39.95', '0.16'],
    ['Zn', '65.38', '0.02'],
    ['Pb', '207.2', '1.1'],
    ['U', '238.03', '0.01'],
  ])('give %s %s ± %s', (symbol, value, halfWidth) => {
    expect(standardWeight(symbol)).toEqual({ value, halfWidth });
  });

  it.each(['Tc', 'Pm', 'Po', 'Rn', 'Pu', 'Og', 'Xx'])('give none for %s', (symbol) => {
    expect(standardWeight(symbol)).toBeUndefined();
  });
});
