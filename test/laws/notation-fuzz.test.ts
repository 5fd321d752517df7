import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Result } from '../../src/report/result.ts';
import { readDiagram } from '../../src/species/diagram.ts';
import { readDefinitions, readEquation, readSpecies } from '../../src/species/read.ts';
import { plainWithState } from '../../src/species/species.ts';

const SEED = 20261201;

const spellings = readFileSync('fixtures/notation/spellings.tsv', 'utf8')
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'))
  .map((line) => line.split('\t')[0] ?? '');

const equations = readFileSync('fixtures/notation/equations.tsv', 'utf8')
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'))
  .map((line) => line.split('\t')[0] ?? '');

/** What a typing hand, a bad paste or a spiteful one puts into a text. */
const scraps = fc.constantFrom(
  ...[
    '^',
    '+',
    '-',
    '(',
    ')',
    '[',
    ']',
    '{',
    '}',
    '0',
    '1',
    '2',
    '9',
    '.',
    '*',
    '/',
    ' ',
    '->',
    '-->',
    '=',
    '|',
    ',',
    '||',
  ],
  ...[
    'x',
    'n',
    'e',
    'H',
    'O',
    'Xx',
    'q',
    '²',
    '⁺',
    '⁻',
    '₂',
    '₋',
    '−',
    '–',
    '½',
    '·',
    '•',
    '(aq)',
    '(s,',
    'δ',
    '↑',
    '⇌',
  ],
  ...['\u0421', '\u200b', '\u202e', '\u0662', '\u0000', '\ud83d', '\ude00', '😀', '\ufeff', '__proto__', '\\', '"'],
);

const edit = fc.record({
  at: fc.nat(60),
  drop: fc.nat(3),
  put: fc.oneof(scraps, scraps, fc.string({ maxLength: 4, unit: 'binary' })),
});

const mutated = (texts: readonly string[]): fc.Arbitrary<string> =>
  fc.tuple(fc.constantFrom(...texts), fc.array(edit, { minLength: 1, maxLength: 5 })).map(([text, edits]) =>
    edits.reduce((now, { at, drop, put }) => {
      const place = now.length === 0 ? 0 : at % (now.length + 1);
      return now.slice(0, place) + put + now.slice(place + drop);
    }, text),
  );

/** A fault of reading says what and where; the place lies within the text, and covers something unless the text is blank. */
const checkFault = (text: string, result: Result<unknown>): void => {
  if (result.ok) return;
  const { code, message, span } = result.fault;
  if (span === undefined) throw new Error(`${code} without a place: ${message}`);
  const length = Array.from(text).length;
  expect(span.from).toBeGreaterThanOrEqual(0);
  expect(span.to).toBeLessThanOrEqual(length);
  if (/^[ \t\r\n\u00a0\u2000-\u200a\u202f\u205f\u3000]*$/u.test(text)) expect(span).toEqual({ from: 0, to: 0 });
  else expect(span.from).toBeLessThan(span.to);
  expect(message).not.toBe('');
};

test('a mutated spelling reads to something that reads back, or faults at a place in it', () => {
  fc.assert(
    fc.property(mutated(spellings), (text) => {
      const result = readSpecies(text);
      checkFault(text, result);
      if (!result.ok) return;
      const plain = plainWithState(result.value.species);
      const again = readSpecies(plain);
      if (plain === '') return;
      if (!again.ok) throw new Error(`${text} was read as ${plain}, which faults: ${again.fault.message}`);
      expect(plainWithState(again.value.species)).toBe(plain);
      expect(again.value.species.key).toBe(result.value.species.key);
    }),
    { numRuns: 3000, seed: SEED },
  );
});

test('a mutated equation reads or faults at a place in it', () => {
  fc.assert(
    fc.property(mutated(equations), (text) => {
      checkFault(text, readEquation(text));
    }),
    { numRuns: 2000, seed: SEED },
  );
});

test('any string at all reads or faults at a place in it', () => {
  fc.assert(
    fc.property(fc.oneof(fc.string({ unit: 'binary', maxLength: 40 }), fc.string({ maxLength: 40 })), (text) => {
      checkFault(text, readSpecies(text));
      checkFault(text, readEquation(text));
      checkFault(text, readDiagram(text));
    }),
    { numRuns: 1000, seed: SEED },
  );
});

test('a mutated diagram reads or faults at a place in it', () => {
  const diagrams = ['Zn(s)|Zn2+(aq, 1 M)||Cu2+(aq)|Cu(s)', 'Pt | H2(g, 1 bar) | HCl(aq) | AgCl | Ag'];
  fc.assert(
    fc.property(mutated(diagrams), (text) => {
      checkFault(text, readDiagram(text));
    }),
    { numRuns: 500, seed: SEED },
  );
});

test('definitions of any name and formula are taken or refused', () => {
  fc.assert(
    fc.property(mutated(['EDTA^4-', 'en', 'acac^-']), mutated(['C10H12N2O8^4-', 'C2H8N2']), (name, formula) => {
      const result = readDefinitions({ [name]: formula });
      if (!result.ok) expect(result.fault.field).toBeDefined();
    }),
    { numRuns: 500, seed: SEED },
  );
});
