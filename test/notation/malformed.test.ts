import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { readEquation, readSpecies } from '../../src/species/read.ts';

const unescape = (text: string): string => String(JSON.parse(`"${text.replaceAll('"', '\\"')}"`));

const cases = readFileSync('fixtures/notation/malformed.tsv', 'utf8')
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'))
  .map((line) => {
    const [kind = '', text = '', code = '', from = '', to = ''] = line.split('\t');
    return { kind, shown: text, text: unescape(text), code, from: Number(from), to: Number(to) };
  });

test('holds at least 80 malformed spellings', () => {
  expect(cases.length).toBeGreaterThanOrEqual(80);
});

test.each(cases)('refuses the $kind "$shown" as $code at $from to $to', ({ kind, text, code, from, to }) => {
  const result = kind === 'species' ? readSpecies(text) : readEquation(text);
  if (result.ok) throw new Error('it was read');
  expect({ code: result.fault.code, span: result.fault.span }).toEqual({ code, span: { from, to } });
  expect(result.fault.message).not.toBe('');
});
