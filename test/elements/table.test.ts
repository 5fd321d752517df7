import { describe, expect, it } from 'vitest';
import { ELEMENTS, elementOf, isElement, nearestElements, splitNuclide } from '../../src/elements/table.ts';

describe('the table of elements', () => {
  it('holds 118 elements, each symbol and name once, numbered without a gap', () => {
    expect(ELEMENTS).toHaveLength(118);
    expect(new Set(ELEMENTS.map(({ symbol }) => symbol)).size).toBe(118);
    expect(new Set(ELEMENTS.map(({ name }) => name)).size).toBe(118);
    expect(ELEMENTS.map(({ atomicNumber }) => atomicNumber)).toEqual(Array.from({ length: 118 }, (_, i) => i + 1));
  });

  it('writes every symbol as a capital and at most one small letter', () => {
    for (const { symbol } of ELEMENTS) expect(symbol).toMatch(/^[A-Z][a-z]?$/);
  });

  // Periodic table of the IUPAC, from memory.
  it.each([
    ['H', 1, 1, 1],
    ['He', 2, 18, 1],
    ['Be', 4, 2, 2],
    ['B', 5, 13, 2],
    ['O', 8, 16, 2],
    ['Al', 13, 13, 3],
    ['Sc', 21, 3, 4],
    ['Fe', 26, 8, 4],
    ['Cu', 29, 11, 4],
    ['Zn', 30, 12, 4],
    ['Br', 35, 17, 4],
    ['Ag', 47, 11, 5],
    ['Cs', 55, 1, 6],
    ['La', 57, null, 6],
    ['Yb', 70, null, 6],
    ['Lu', 71, 3, 6],
    ['Pt', 78, 10, 6],
    ['Pb', 82, 14, 6],
    ['Ac', 89, null, 7],
    ['U', 92, null, 7],
    ['Lr', 103, 3, 7],
    ['Og', 118, 18, 7],
  ])('places %s as number %i in group %j, period %i', (symbol, atomicNumber, group, period) => {
    expect(elementOf(symbol)).toMatchObject({ symbol, atomicNumber, group, period });
  });

  it('knows a symbol only in its right case', () => {
    expect(isElement('Co')).toBe(true);
    expect(isElement('CO')).toBe(false);
    expect(isElement('D')).toBe(false);
    expect(elementOf('Xx')).toBeUndefined();
  });
});

describe('did you mean, for elements', () => {
  it.each([
    ['Xx', ['Xe']],
    ['CL', ['Cl']],
    ['fe', ['Fe']],
    ['iron', ['Fe']],
    ['Zm', ['Zn', 'Zr']],
    ['Jq', []],
    ['', []],
  ])('offers for %j %j', (text, symbols) => {
    expect(nearestElements(text)).toEqual(symbols);
  });

  it('offers three at most', () => {
    expect(nearestElements('Sx').length).toBe(3);
  });
});

describe('keys of a composition', () => {
  it('split into mass number and symbol', () => {
    expect(splitNuclide('2H')).toEqual({ massNumber: '2', symbol: 'H' });
    expect(splitNuclide('Fe')).toEqual({ massNumber: null, symbol: 'Fe' });
  });
});
