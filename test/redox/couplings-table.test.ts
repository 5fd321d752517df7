import { describe, expect, it } from 'vitest';
import { plainReaction } from '../../src/balance/reaction.ts';
import { showRational } from '../../src/exact/rational.ts';
import { balanceRedox } from '../../src/redox/redox.ts';
import type { SplitHalf } from '../../src/redox/split/complete.ts';
import { electronsIn, leftOver, scaled } from '../support/halves.ts';
import { plainEquation, residualByHand } from '../support/plain.ts';
import { faultWith, overall } from '../support/redox.ts';
import { readTable } from '../support/table.ts';

const rows = readTable('redox/couplings.tsv').map((row) => {
  const of = (name: string): string => row[name] ?? '';
  return {
    skeleton: of('skeleton'),
    medium: of('medium'),
    place: Number(of('place')),
    assume: of('assume'),
    overall: of('overall'),
    electrons: of('electrons'),
    oxidation: of('oxidation'),
    reduction: of('reduction'),
    changes: of('changes').split('; ').toSorted(),
    net: of('net') === '' ? of('overall') : of('net'),
  };
});

const shown = (split: SplitHalf | null): string =>
  split === null ? '-' : `${showRational(split.multiplier)} ${plainReaction(split.half.reaction)}`;

describe('the table of couplings', () => {
  it.each(rows)('was written down right by an independent count: $skeleton, $assume', (row) => {
    const halves = [row.oxidation, row.reduction];
    expect(residualByHand(row.overall)).toEqual(new Map());
    expect(residualByHand(row.net)).toEqual(new Map());
    for (const half of halves) expect(residualByHand(scaled(half).half)).toEqual(new Map());
    expect(leftOver(halves, row.net)).toEqual([]);
    for (const half of halves) expect(showRational(electronsIn(half))).toBe(row.electrons);
  });

  it.each(rows)('offers $assume in its place for $skeleton', (row) => {
    const fault = faultWith(overall(row.skeleton, row.medium), 'several-balances');
    const { assume, overall: reaction, electrons } = fault.couplings[row.place - 1] ?? {};
    expect({ assume, reaction: reaction?.plain, electrons }).toEqual({
      assume: row.assume,
      reaction: row.overall,
      electrons: row.electrons,
    });
  });

  it.each(rows)('settles $skeleton, $assume', (row) => {
    const found = balanceRedox(plainEquation(row.skeleton), row.medium === '' ? undefined : row.medium, row.assume);
    if (!found.ok) throw new Error(found.fault.message);
    const { oxidation, reduction, electrons, changes } = found.value;
    expect(plainReaction(found.value.overall)).toBe(row.overall);
    expect(showRational(electrons)).toBe(row.electrons);
    expect(shown(oxidation)).toBe(row.oxidation);
    expect(shown(reduction)).toBe(row.reduction);
    const told = changes.map(({ element, from, to }) => `${element} ${showRational(from)} ${showRational(to)}`);
    expect(told.toSorted()).toEqual(row.changes);
  });
});
