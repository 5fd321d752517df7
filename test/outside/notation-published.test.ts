import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { showRational } from '../../src/exact/rational.ts';
import { KNOWN_IONS } from '../../src/species/ions.ts';
import { readEquation, readSpecies } from '../../src/species/read.ts';
import type { EquationTerm } from '../../src/species/equation.ts';
import { type Species, plainSpecies } from '../../src/species/species.ts';
import { plain, plainEquation } from '../support/plain.ts';

/** Half-reactions typed from published tables; each row names its source. */
const published = readFileSync('fixtures/published/standard-potentials.tsv', 'utf8')
  .split('\n')
  .slice(1)
  .filter((line) => line !== '' && !line.startsWith('#'))
  .map((line) => line.split('\t')[0] ?? '')
  .filter((reaction) => reaction.includes('->'));

const contents = (species: Species): unknown => ({
  atoms: Object.fromEntries([...species.composition].map(([key, count]) => [key, showRational(count)])),
  charge: showRational(species.charge),
  state: species.state,
  key: species.key,
});

const shown = ({ coefficient, species }: EquationTerm): unknown => [showRational(coefficient), contents(species)];

test('reads every published half-reaction as a second reader does', () => {
  expect(published.length).toBeGreaterThan(480);
  for (const reaction of published) {
    const result = readEquation(reaction);
    if (!result.ok) throw new Error(`${reaction}: ${result.fault.message}`);
    const byHand = plainEquation(reaction);
    expect(result.value.left.map(shown), reaction).toEqual(byHand.left.map(shown));
    expect(result.value.right.map(shown), reaction).toEqual(byHand.right.map(shown));
    expect(result.notes.filter(({ code }) => code === 'reading-chosen')).toEqual([]);
  }
});

test('counts every ion of the table as a second reader does', () => {
  expect(KNOWN_IONS.length).toBeGreaterThan(500);
  for (const ion of KNOWN_IONS.filter((spelling) => !/D|\[/u.test(spelling))) {
    const result = readSpecies(ion);
    if (!result.ok) throw new Error(`${ion}: ${result.fault.message}`);
    expect(result.value.readings).toHaveLength(1);
    expect(contents(result.value.species), ion).toEqual(contents(plain(ion)));
  }
});

test('takes the ion, or asks, where an ion of the table is written without its caret', () => {
  for (const ion of KNOWN_IONS.filter((spelling) => !/\^\d\d/u.test(spelling))) {
    const result = readSpecies(ion.replace('^', ''));
    if (result.ok) expect(plainSpecies(result.value.species)).toBe(ion);
    else {
      if (result.fault.code !== 'several-readings') throw new Error(`${ion}: ${result.fault.message}`);
      expect(result.fault.readings).toContain(ion);
    }
  }
});
