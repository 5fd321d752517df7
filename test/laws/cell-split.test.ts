import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { composeCell } from '../../src/cell/compose.ts';
import { type Rational, ZERO, isZero } from '../../src/exact/rational.ts';
import { balanceRedox } from '../../src/redox/redox.ts';
import { plainEquation } from '../support/plain.ts';

const skeletons = readFileSync('fixtures/redox/redox.tsv', 'utf8')
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'))
  .map((line) => line.split('\t'))
  .filter(([, , , , oxidation, , , net]) => oxidation !== '-' && net === '')
  .map(([skeleton = '', medium = '']) => ({ skeleton, medium }));

describe('splitting and composing again', () => {
  it.each(skeletons)('returns the overall reaction of $skeleton', ({ skeleton, medium }) => {
    const split = balanceRedox(plainEquation(skeleton), medium === '' ? undefined : medium);
    if (!split.ok) throw new Error(split.fault.message);
    const { overall, electrons, oxidation, reduction } = split.value;
    if (oxidation === null || reduction === null) throw new Error('this row has halves');
    const cell = composeCell({
      anode: [{ half: oxidation.half, share: null }],
      cathode: [{ half: reduction.half, share: null }],
    });
    if (!cell.ok) throw new Error(cell.fault.message);
    // a cell is in lowest terms jointly with its electron number, a redox reaction by itself
    const factor = electrons.div(cell.value.electrons);
    const rest = new Map<string, Rational>();
    const put = (key: string, value: Rational): void => {
      rest.set(key, (rest.get(key) ?? ZERO).add(value));
    };
    for (const { species, nu } of cell.value.overall.terms) put(species.key, nu.mul(factor));
    for (const { species, nu } of overall.terms) put(species.key, nu.neg());
    expect([...rest].filter(([, value]) => !isZero(value))).toEqual([]);
  });
});
