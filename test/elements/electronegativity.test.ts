import { describe, expect, it } from 'vitest';
import { electronegativity } from '../../src/elements/electronegativity.ts';

const value = (symbol: string): number => electronegativity(symbol) ?? Number.NaN;

describe('Allen electronegativities', () => {
  // The order that decides oxidation numbers of binary compounds; Karen et al. 2016, from memory.
  it.each([
    ['F', 'O'],
    ['O', 'N'],
    ['N', 'Cl'],
    ['Cl', 'Br'],
    ['Br', 'S'],
    ['S', 'C'],
    ['C', 'H'],
    ['H', 'B'],
    ['P', 'As'],
    ['Te', 'Sb'],
    ['S', 'Fe'],
  ])('put %s above %s', (above, below) => {
    expect(value(above)).toBeGreaterThan(value(below));
  });

  it('give none where none is tabulated', () => {
    expect(electronegativity('U')).toBeUndefined();
  });
});
