import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { parse } from 'yaml';
import { cautionsFor } from '../../src/caution/cautions.ts';
import { CAUTION_ROWS } from '../../src/caution/table.ts';
import { parseTrigger } from '../../src/caution/trigger.ts';
import { readSpecies } from '../../src/species/read.ts';
import { type Run, sceneOf } from './scene-of.ts';

interface Case {
  readonly trigger: string;
  readonly on: Run;
  readonly applies?: string;
  readonly off: Run;
}

const CASES = parse(
  readFileSync(new URL('../../fixtures/caution/cases.yaml', import.meta.url), 'utf8'),
) as readonly Case[];

const rowOf = (trigger: string) => {
  const row = CAUTION_ROWS.find((one) => one.trigger === trigger);
  if (row === undefined) throw new Error(`no row ${trigger}`);
  return row;
};

describe('the table of cautions', () => {
  test('has 107 rows, each with its case', () => {
    expect(CAUTION_ROWS).toHaveLength(107);
    expect(CASES.map(({ trigger }) => trigger)).toEqual(CAUTION_ROWS.map(({ trigger }) => trigger));
  });

  test('names a basis and asks for something in every row', () => {
    for (const { trigger, text, basis } of CAUTION_ROWS) {
      expect(text).toMatch(/^[A-Z].+\.$/);
      expect(basis).not.toBe('');
      const { places, elements, media, modes } = parseTrigger(trigger);
      expect(places.length + elements.length + media.length + modes.length, trigger).toBeGreaterThan(0);
    }
  });

  test('spells every species as the reader of species does', () => {
    const texts = CAUTION_ROWS.flatMap(({ trigger }) => trigger.match(/[^=|;]+(?=[|;]|$)/g) ?? []);
    const written = texts.filter((text) => /\((s|l|g|aq)(,red)?\)$/.test(text));
    const named = CAUTION_ROWS.flatMap(({ trigger }) => parseTrigger(trigger).places).flatMap(({ wanted }) =>
      [...wanted].flatMap(([key, states]) => states.map((state) => `${key} ${String(state)}`)),
    );
    const read = written.map((text) => {
      const result = readSpecies(text);
      return result.ok ? `${result.value.species.key} ${String(result.value.species.state)}` : text;
    });
    expect(named.toSorted()).toEqual(read.toSorted());
    expect(named.length).toBeGreaterThan(200);
  });

  test.each([['oxidant=MnO4^-'], ['any='], ['medium=sour'], ['mode=idle'], ['condition=wet'], ['element=iron']])(
    'cannot hold a row that nobody understands: %s',
    (trigger) => {
      expect(() => parseTrigger(trigger)).toThrow('caution table');
    },
  );
});

describe.each(CASES)('$trigger', ({ trigger, on, applies, off }) => {
  const row = rowOf(trigger);
  test('speaks once, with its basis and what it depends on', () => {
    const raised = cautionsFor(sceneOf(on)).filter(({ text }) => text.startsWith(row.text));
    const text = applies === undefined ? row.text : `${row.text} Applies ${applies}.`;
    expect(raised.map((one) => [one.text, one.basis])).toEqual([[text, row.basis]]);
  });
  test('is silent where it does not belong', () => {
    expect(cautionsFor(sceneOf(off)).filter(({ text }) => text.startsWith(row.text))).toEqual([]);
  });
});
