import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { rationalFromText, showRational } from '../../src/exact/rational.ts';
import { readEquation } from '../../src/species/read.ts';
import type { EquationTerm } from '../../src/species/equation.ts';
import { plainWithState } from '../../src/species/species.ts';

const unescape = (text: string): string => String(JSON.parse(`"${text}"`));

const cases = readFileSync('fixtures/notation/equations.tsv', 'utf8')
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'))
  .map((line) => {
    const [text = '', expected = ''] = line.split('\t');
    return { shown: text, text: unescape(text), expected };
  });

const shown = ({ coefficient, species }: EquationTerm): string =>
  (showRational(coefficient) === '1' ? '' : `${showRational(coefficient)} `) + plainWithState(species);

test.each(cases)('reads $shown', ({ text, expected }) => {
  const result = readEquation(text);
  if (!result.ok) {
    expect(`?${result.fault.code}`).toBe(expected);
    return;
  }
  const side = (terms: readonly EquationTerm[]): string => terms.map(shown).join(' + ');
  expect(`${side(result.value.left)} -> ${side(result.value.right)}`).toBe(expected);
});

test('gives the place of each term, coefficient included, in code points', () => {
  const result = readEquation('  2 H2(g) +O2 → 2H2O');
  if (!result.ok) throw new Error(result.fault.message);
  const { left, right } = result.value;
  expect([...left, ...right].map(({ span }) => span)).toEqual([
    { from: 2, to: 9 },
    { from: 11, to: 13 },
    { from: 16, to: 20 },
  ]);
  expect([...left, ...right].map(({ coefficientWritten }) => coefficientWritten)).toEqual([true, false, true]);
});

test('tells both placements of a dash that may be a charge', () => {
  const result = readEquation('2 Cl-->Cl2');
  if (result.ok || result.fault.code !== 'several-readings') throw new Error('it was read');
  expect(result.fault.readings).toEqual(['2 Cl -> Cl2', '2 Cl- -> Cl2']);
});

test('gives unknown coefficients their values', () => {
  const where = new Map([['x', rationalFromText('0.4')]]);
  const result = readEquation('xLi+ + x e- + Li(1-x)CoO2 -> LiCoO2', { where });
  if (!result.ok) throw new Error(result.fault.message);
  expect(result.value.left.map(shown)).toEqual(['2/5 Li^+', '2/5 e^-', 'Li0.6CoO2']);
});
