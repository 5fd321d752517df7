import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { readSpecies } from '../../src/species/read.ts';
import { plainWithState } from '../../src/species/species.ts';

interface Case {
  readonly spelling: string;
  readonly expected: string;
  readonly others: readonly string[];
}

interface Group {
  readonly title: string;
  readonly cases: readonly Case[];
}

const groups = readFileSync('fixtures/notation/spellings.tsv', 'utf8')
  .split('\n## ')
  .slice(1)
  .map((block): Group => {
    const [title = '', ...lines] = block.split('\n').filter((line) => line !== '');
    const cases = lines.map((line): Case => {
      const [spelling = '', expected = '', ...others] = line.split('\t');
      return { spelling, expected, others };
    });
    return { title, cases };
  });

test('holds at least 300 spellings', () => {
  expect(groups.flatMap(({ cases }) => cases).length).toBeGreaterThanOrEqual(300);
});

const contested = ({ spelling, expected }: Case): void => {
  const reading = readSpecies(spelling);
  const both = expected.slice(1).split(' | ');
  expect(reading.ok).toBe(false);
  if (reading.ok || reading.fault.code !== 'several-readings') throw new Error(`${spelling} was read`);
  expect(new Set(reading.fault.readings)).toEqual(new Set(both));
  expect(reading.fault.span).toEqual({ from: 0, to: spelling.length });
};

const read = ({ spelling, expected, others }: Case): void => {
  const reading = readSpecies(spelling);
  if (!reading.ok) throw new Error(`${spelling}: ${reading.fault.message}`);
  expect(plainWithState(reading.value.species)).toBe(expected);
  expect(reading.value.readings.map(plainWithState)).toEqual([expected, ...others]);
  expect(reading.notes.some(({ code }) => code === 'reading-chosen')).toBe(others.length > 0);
  const strict = readSpecies(spelling, { strict: true });
  expect(strict.ok).toBe(others.length === 0);
};

describe.each(groups)('$title', ({ cases }) => {
  test.each(cases)('reads $spelling as $expected', (each) => {
    if (each.expected.startsWith('?')) contested(each);
    else read(each);
  });
});
