import { describe, expect, it } from 'vitest';
import { gcdOf } from '../../src/exact/integer.ts';
import { isWhole, numeratorOf } from '../../src/exact/rational.ts';
import { plainEquation, residualByHand } from '../support/plain.ts';
import { half } from '../support/redox.ts';
import { readTable } from '../support/table.ts';

const rows = readTable('redox/half-reactions.tsv');

/** The coefficients of a written reaction, counted without the product. */
const coefficients = (reaction: string): readonly bigint[] => {
  const { left, right } = plainEquation(reaction);
  return [...left, ...right].map(({ coefficient }) => {
    expect(isWhole(coefficient)).toBe(true);
    return numeratorOf(coefficient);
  });
};

describe('the table of half-reactions', () => {
  it('has at least 150 rows and every medium', () => {
    expect(rows.length).toBeGreaterThanOrEqual(150);
    const media = new Set(rows.map(({ medium }) => medium));
    expect(media).toContain('molten-nitride');
    expect(media.size).toBeGreaterThan(20);
  });

  it.each(rows)('$skeleton in $medium', ({ skeleton = '', medium = '', reaction = '', electrons = '' }) => {
    expect(residualByHand(reaction)).toEqual(new Map());
    expect(gcdOf(coefficients(reaction))).toBe(1n);
    expect(half(skeleton, medium)).toMatchObject({ reaction, electrons });
  });
});
