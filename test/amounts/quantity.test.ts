import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import { QUANTITIES, isQuantityName } from '../../src/amounts/quantities.ts';
import { readQuantity } from '../../src/amounts/quantity.ts';

interface ReadCase {
  readonly of: string;
  readonly text: string;
  readonly value: number;
  readonly uncertainty?: number;
  readonly note?: string;
}
interface FaultCase {
  readonly of: string;
  readonly text: string;
  readonly code: string;
  readonly span: readonly [number, number];
  readonly hint?: string;
  readonly message?: string;
}
const file = readFileSync(new URL('../../fixtures/amounts/quantity-texts.yaml', import.meta.url), 'utf8');
const cases = parse(file) as { readonly read: readonly ReadCase[]; readonly faults: readonly FaultCase[] };

const read = (of: string, text: string) => {
  if (!isQuantityName(of)) throw new Error(of);
  return readQuantity(text, QUANTITIES[of]);
};

describe('a quantity text', () => {
  it.each(cases.read)('reads "$text" as a $of', ({ of, text, value, uncertainty = 0, note }) => {
    const result = read(of, text);
    if (!result.ok) throw new Error(result.fault.message);
    expect(Math.abs(result.value.value - value)).toBeLessThanOrEqual(1e-14 * Math.abs(value));
    expect(Math.abs(result.value.uncertainty - uncertainty)).toBeLessThanOrEqual(1e-14 * uncertainty);
    expect(result.notes.map(({ code }) => code)).toEqual(note === undefined ? [] : [note]);
  });

  it.each(cases.faults)(
    'refuses "$text" as a $of and points at it',
    ({ of, text, code, span: [from, to], hint = '', message = '' }) => {
      const result = read(of, text);
      if (result.ok) throw new Error(`read as ${String(result.value.value)}`);
      expect(result.fault.code).toBe(code);
      expect(result.fault.span).toEqual({ from, to });
      expect(result.fault.hint ?? '').toContain(hint);
      expect(result.fault.message).toContain(message);
    },
  );

  it('refuses what is too long and what is no number of any use', () => {
    for (const text of ['1'.repeat(201) + ' A', '1e999 A', '1'.repeat(70) + ' A', '1e61 A'])
      expect(read('current', text).ok, text).toBe(false);
  });
});
