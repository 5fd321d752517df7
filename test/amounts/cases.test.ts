import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import type { GivenTexts } from '../../src/amounts/given.ts';
import type { RecordText } from '../../src/amounts/record/record.ts';
import { amountsOf, circuitOf } from './circuit.ts';

const lines = readFileSync(new URL('../../fixtures/amounts/cases.tsv', import.meta.url), 'utf8')
  .trim()
  .split('\n');
const cases = lines
  .filter((line) => !line.startsWith('#'))
  .map((line) => {
    const [group = '', half = '', species = '', given = '', quantity = '', unit = '', value = '', tolerance = ''] =
      line.split('\t');
    return { group, half, species, given, quantity, unit, value: Number(value), tolerance: Number(tolerance) };
  });

const recordOf = (text: string): RecordText =>
  text.split('|').map((row) => {
    const [time = '', current = ''] = row.split(',');
    return [time, current];
  });

const givenOf = (text: string): GivenTexts =>
  Object.fromEntries(
    text.split(';').flatMap((part) => {
      const [name = '', value = ''] = part.split('=');
      return name === '' ? [] : [[name, name === 'record' ? recordOf(value) : value]];
    }),
  );

describe('amounts computed outside the program', () => {
  it('has 150 cases and more', () => {
    expect(cases.length).toBeGreaterThanOrEqual(150);
  });

  it.each(cases)('$group: $quantity of $species in $half with $given', (one) => {
    const [name = '', part] = one.quantity.split('.');
    const given = givenOf(one.given);
    const result = amountsOf(circuitOf(one.half), one.species, given, { want: { [name]: one.unit } });
    if (!result.ok) throw new Error(JSON.stringify(result.fault));
    const quantity = result.value.quantities[name];
    expect(quantity?.unit).toBe(one.unit);
    const found = part === 'uncertainty' ? quantity?.uncertainty : quantity?.value;
    expect(Math.abs((found ?? NaN) - one.value)).toBeLessThanOrEqual(one.tolerance * Math.abs(one.value));
  });
});
