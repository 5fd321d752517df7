import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { type Audit, auditEquation } from '../../src/audit/audit.ts';
import { plainReaction } from '../../src/balance/reaction.ts';
import { readEquation } from '../../src/species/read-equation.ts';
import { sortedText } from '../audit/planting.ts';
import { publishedEquilibria, publishedHalves } from '../audit/published.ts';
import { plainEquation } from '../support/plain.ts';

/**
 * Published equations: 495 half-reactions (fixtures/published/standard-potentials.tsv) and 124 equilibria
 * (fixtures/published/equilibria.tsv), each row with its source and marked as typed from memory of it.
 */

const audit = (text: string): { audit: Audit; codes: readonly string[] } => {
  const equation = readEquation(text);
  if (!equation.ok) throw new Error(`${text}: ${equation.fault.message}`);
  const result = auditEquation(equation.value);
  if (!result.ok) throw new Error(result.fault.message);
  return { audit: result.value, codes: result.notes.map(({ code }) => code) };
};

const errata = readFileSync(new URL('../../fixtures/audit/errata.tsv', import.meta.url), 'utf8')
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'))
  .slice(1)
  .map((line) => line.split('\t'))
  .map(([kind = '', misprint = '', meant = '']) => ({ kind, misprint, meant }));

describe('published equations', () => {
  it('are balanced, all 619 of them', () => {
    const published = [...publishedHalves(), ...publishedEquilibria()];
    expect(published.length).toBeGreaterThanOrEqual(600);
    const wrong = published.filter((text) => audit(text).audit.verdict !== 'balanced');
    expect(wrong).toEqual([]);
  });

  it('are half-reactions: no electrons are left over, no ion clashes, no state is missing', () => {
    const told = publishedHalves().flatMap((text) => audit(text).codes);
    expect(told.filter((code) => code !== 'not-unique' && code !== 'remark-dropped')).toEqual([]);
  });

  it('are the only balance of their species but for five around O2, O3 and HO2^-', () => {
    const open = publishedHalves().filter((text) => audit(text).codes.includes('not-unique'));
    expect(open).toEqual([
      'O2(g) + H2O(l) + 2 e^- -> HO2^-(aq) + OH^-(aq)',
      'O2(g) + 2 H2O(l) + 2 e^- -> H2O2(aq) + 2 OH^-(aq)',
      'O3(g) + 2 H^+(aq) + 2 e^- -> O2(g) + H2O(l)',
      'O3(g) + H2O(l) + 2 e^- -> O2(g) + 2 OH^-(aq)',
      'O2^-(aq) + H2O(l) + e^- -> HO2^-(aq) + OH^-(aq)',
    ]);
  });

  it('of equilibria oxidise and reduce nothing, but that the atoms of a trihalide share their charge', () => {
    const redox = publishedEquilibria().filter((text) => !audit(text).codes.includes('not-redox'));
    expect(redox).toEqual(['Br2(aq) + Br^-(aq) -> Br3^-(aq)', 'I2(aq) + I^-(aq) -> I3^-(aq)']);
  });
});

describe('misprints known from memory', () => {
  it.each(errata)('finds what was meant by $misprint', ({ kind, misprint, meant }) => {
    const { audit: found } = audit(misprint);
    expect(found.verdict).toBe('unbalanced');
    const [first] = found.repairs;
    expect(first?.kind).toBe(kind);
    expect(first === undefined ? '' : sortedText(plainEquation(plainReaction(first.reaction)))).toBe(
      sortedText(plainEquation(meant)),
    );
  });
});
