import { describe, expect, it } from 'vitest';
import { plainEquation, residualByHand } from '../support/plain.ts';
import { faultWith, half, overall } from '../support/redox.ts';
import { readTable } from '../support/table.ts';

const rows = readTable('redox/families.tsv');

/** A reaction with the terms of each side in order of the alphabet. */
const sorted = (reaction: string): string =>
  reaction
    .split(' -> ')
    .map((side) => side.split(' + ').toSorted().join(' + '))
    .join(' -> ');

const keysOf = (reaction: string): ReadonlySet<string> => {
  const { left, right } = plainEquation(reaction);
  return new Set([...left, ...right].map(({ species }) => species.key));
};

describe('the table of families', () => {
  it('has at least 30 rows', () => {
    expect(rows.length).toBeGreaterThanOrEqual(30);
  });

  it.each(rows)('$ask: $skeleton in $medium', ({ ask, skeleton = '', medium = '', dimension, family = '' }) => {
    const fault = faultWith(ask === 'half' ? half(skeleton, medium) : overall(skeleton, medium), 'several-balances');
    const expected = family.split(' ; ');
    for (const member of expected) expect(residualByHand(member)).toEqual(new Map());
    expect(fault.dimension).toBe(Number(dimension));
    expect(fault.family.map(({ plain }) => sorted(plain)).toSorted()).toEqual(expected.map(sorted).toSorted());
  });

  it.each(rows)(
    'couplings of $ask: $skeleton hold every species and conserve',
    ({ ask, skeleton = '', medium = '' }) => {
      const fault = faultWith(ask === 'half' ? half(skeleton, medium) : overall(skeleton, medium), 'several-balances');
      expect(new Set(fault.couplings.map(({ assume }) => assume)).size).toBe(fault.couplings.length);
      for (const coupling of fault.couplings) {
        const reaction = coupling.overall?.plain ?? coupling.reaction?.plain ?? '';
        expect(residualByHand(reaction)).toEqual(new Map());
        for (const key of keysOf(skeleton)) expect(keysOf(reaction)).toContain(key);
        const chosen =
          ask === 'half' ? half(skeleton, medium, coupling.assume) : overall(skeleton, medium, coupling.assume);
        expect(chosen).toMatchObject({
          reaction,
          dimension: fault.dimension,
          notes: expect.arrayContaining(['settled']) as unknown,
        });
      }
    },
  );
});
