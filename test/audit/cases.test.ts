import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { auditEquation } from '../../src/audit/audit.ts';
import type { Repair } from '../../src/audit/repairs.ts';
import { plainReaction } from '../../src/balance/reaction.ts';
import { plainEquation, residualByHand } from '../support/plain.ts';
import { sortedText } from './planting.ts';

const rows = readFileSync(new URL('../../fixtures/audit/cases.tsv', import.meta.url), 'utf8')
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'))
  .slice(1)
  .map((line) => line.split('\t'))
  .map(([kind = '', equation = '', repaired = '']) => ({ kind, equation, repaired }));

const right = rows.filter(({ kind }) => kind === '');
const wrong = rows.filter(({ kind }) => kind !== '');

const audit = (text: string) => {
  const result = auditEquation(plainEquation(text));
  if (!result.ok) throw new Error(result.fault.message);
  return result.value;
};

const sameEquation = (repair: Repair | undefined, text: string): boolean =>
  repair !== undefined && sortedText(plainEquation(plainReaction(repair.reaction))) === sortedText(plainEquation(text));

describe('equations written by hand', () => {
  it('are at least 120, half of them right', () => {
    expect(rows.length).toBeGreaterThanOrEqual(120);
    expect(right.length / rows.length).toBeCloseTo(0.5, 1);
  });

  it.each(right)('finds nothing wrong with $equation', ({ equation }) => {
    expect(residualByHand(equation).size).toBe(0);
    expect(audit(equation)).toMatchObject({ verdict: 'balanced', repairs: [] });
  });

  it.each(wrong)('repairs $equation by $kind', ({ kind, equation, repaired }) => {
    expect(residualByHand(repaired).size).toBe(0);
    const { verdict, residual, repairs } = audit(equation);
    expect(verdict).toBe('unbalanced');
    expect(residual).toEqual(residualByHand(equation));
    expect(repairs[0]?.kind).toBe(kind);
    expect(sameEquation(repairs[0], repaired)).toBe(true);
  });
});
