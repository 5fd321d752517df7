import { describe, expect, it } from 'vitest';
import { showRational } from '../../src/exact/rational.ts';
import { balanceOverall } from '../../src/redox/overall.ts';
import { flowsOf, increaseIn } from '../../src/redox/split/flows.ts';
import { plainReaction } from '../../src/balance/reaction.ts';
import { plainEquation, residualByHand } from '../support/plain.ts';
import { readTable } from '../support/table.ts';

const rows = readTable('redox/overall.tsv');

/** The species of one side as text, without coefficients and without what is left out. */
const strip = (side: string, without: readonly string[]): string => {
  const species = side.split(' + ').map((term) => term.replace(/^\d+ /, ''));
  return species.filter((one) => !without.includes(one)).join(' + ');
};

/** Terms of a reaction in any order: helpers may be written in the middle of a row. */
const terms = (reaction: string): readonly (readonly string[])[] =>
  reaction.split(' -> ').map((side) => side.split(' + ').toSorted());

describe('the table of overall reactions', () => {
  it('has at least 80 rows', () => {
    expect(rows.length).toBeGreaterThanOrEqual(80);
  });

  it.each(rows)('$reaction in $medium', ({ reaction = '', medium = '', without = '', electrons = '' }) => {
    expect(residualByHand(reaction)).toEqual(new Map());
    const [left = '', right = ''] = reaction.split(' -> ').map((side) => strip(side, without.split(' ')));
    const result = balanceOverall(plainEquation(`${left} -> ${right}`), medium);
    if (!result.ok) throw new Error(result.fault.message);
    expect(terms(plainReaction(result.value.reaction))).toEqual(terms(reaction));
    const { flows, decided } = flowsOf(result.value.reaction.terms);
    expect(decided ? showRational(increaseIn(flows)) : '').toBe(electrons);
  });
});
