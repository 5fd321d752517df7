import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import { answer } from '../../src/desk/answer.ts';

/** Asks with hand-written expectations: fixtures/contract/*.yaml. */
interface Case {
  readonly name: string;
  readonly ask: unknown;
  readonly expect?: Readonly<Record<string, unknown>>;
  readonly near?: Readonly<Record<string, number>>;
  readonly notes?: readonly string[];
  readonly absent?: readonly string[];
  readonly unordered?: readonly string[];
  /** The repaired equation that must stand first. */
  readonly first?: string;
}

const cases = ['asks', 'more-asks', 'audit-asks', 'amounts-asks'].flatMap(
  (name) => parse(readFileSync(`fixtures/contract/${name}.yaml`, 'utf8')) as readonly Case[],
);

/** The value at a dotted path of a JSON value, undefined where there is none. */
const at = (value: unknown, path: string): unknown =>
  path
    .split('.')
    .reduce<unknown>(
      (inner, key) =>
        typeof inner === 'object' && inner !== null ? (inner as Record<string, unknown>)[key] : undefined,
      value,
    );

/** `value` without what stands at a dotted path: that part is compared by itself. */
const without = (value: unknown, [key = '', ...rest]: readonly string[]): unknown =>
  typeof value !== 'object' || value === null
    ? value
    : Object.fromEntries(
        Object.entries(value).flatMap(([name, inner]) => {
          if (name !== key) return [[name, inner]];
          return rest.length === 0 ? [] : [[name, without(inner, rest)]];
        }),
      );

const sorted = (list: unknown): unknown =>
  Array.isArray(list) ? list.map((item) => JSON.stringify(item)).sort() : list;

describe('the contract, ask by ask', () => {
  it('expects something of every ask', () => {
    const idle = cases.filter(
      ({ expect: expected = {}, near = {}, notes = [], absent = [], first }) =>
        Object.keys({ ...expected, ...near }).length + notes.length + absent.length === 0 && first === undefined,
    );
    expect(idle.map(({ name }) => name)).toEqual([]);
    expect(new Set(cases.map(({ name }) => name)).size).toBe(cases.length);
  });

  it.each(cases)(
    '$name',
    ({ ask, expect: expected = {}, near = {}, notes = [], absent = [], unordered = [], first }) => {
      const given: unknown = JSON.parse(JSON.stringify(answer(ask)));
      if (first !== undefined) expect(at(given, 'answer.repairs.0.reaction.plain')).toBe(first);
      for (const path of unordered) expect(sorted(at(given, path))).toEqual(sorted(at(expected, path)));
      const ordered = unordered.reduce<unknown>((rest, path) => without(rest, path.split('.')), expected);
      expect(given).toMatchObject(ordered as object);
      for (const [path, value] of Object.entries(near)) {
        expect(Number(at(given, path)) / value, path).toBeCloseTo(1, 6);
      }
      const codes = at(given, 'notes');
      for (const code of notes) expect(codes).toContainEqual(expect.objectContaining({ code }));
      for (const path of absent) expect(at(given, path)).toBeUndefined();
    },
  );
});
