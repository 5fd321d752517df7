import { describe, expect, it } from 'vitest';
import { plainReaction } from '../../src/balance/reaction.ts';
import { type Rational, showRational } from '../../src/exact/rational.ts';
import { completeHalf } from '../../src/redox/half.ts';
import type { Result } from '../../src/report/result.ts';
import type { Equation, EquationTerm } from '../../src/species/equation.ts';
import { readEquation } from '../../src/species/read.ts';
import { plainSpecies } from '../../src/species/species.ts';
import { readTable } from '../support/table.ts';

/**
 * 495 half-reactions as printed in the tables named in the fixture, each stripped of its helpers, electrons and
 * coefficients (unless that empties a side) and balanced again.
 */
const rows = readTable('published/standard-potentials.tsv');

/**
 * Those that conservation alone does not settle, and what is said of them instead: a fault whose first coupling is the
 * published half-reaction, or the only elementary balance of the couple.
 */
const OPEN: Readonly<Record<string, string>> = {
  'O3(g) + 2 H^+(aq) + 2 e^- -> O2(g) + H2O(l)': 'several-balances',
  'O3(g) + H2O(l) + 2 e^- -> O2(g) + 2 OH^-(aq)': 'several-balances',
  'O2(g) + 2 H2O(l) + 2 e^- -> H2O2(aq) + 2 OH^-(aq)': 'several-balances',
  'O2^-(aq) + H2O(l) + e^- -> HO2^-(aq) + OH^-(aq)': 'several-balances',
  'O2(g) + H2O(l) + 2 e^- -> HO2^-(aq) + OH^-(aq)': '3 O2(g) + 2 H2O + 4 e^- -> 4 HO2^-(aq)',
};

const HELPERS: Readonly<Record<string, readonly string[]>> = {
  acid: ['H2O', 'H^+'],
  base: ['H2O', 'OH^-'],
  any: ['H2O', 'H^+'],
};

const valueOf = <T>(result: Result<T>): T => {
  if (!result.ok) throw new Error(result.fault.message);
  return result.value;
};

const stripSide = (terms: readonly EquationTerm[], helpers: readonly string[]): readonly EquationTerm[] => {
  const bare = terms.filter(({ species }) => species.key !== 'e^-');
  const core = bare.filter(({ species }) => !helpers.includes(plainSpecies(species)));
  return core.length > 0 ? core : bare;
};

/** Species and numbers, states aside, in any order. */
const gist = (terms: readonly (readonly [string, Rational])[]): readonly string[] =>
  terms.map(([species, nu]) => `${showRational(nu)} ${species}`).sort();

const gistOfEquation = ({ left, right }: Equation): readonly string[] =>
  gist([
    ...left.map(({ species, coefficient }): [string, Rational] => [plainSpecies(species), coefficient.neg()]),
    ...right.map(({ species, coefficient }): [string, Rational] => [plainSpecies(species), coefficient]),
  ]);

describe('published half-reactions', () => {
  it('are all there', () => {
    expect(rows).toHaveLength(495);
  });

  it.each(rows)('$reaction in $medium', ({ reaction = '', medium = '' }) => {
    const published = valueOf(readEquation(reaction));
    const helpers = HELPERS[medium] ?? [];
    const skeleton: Equation = {
      ...published,
      left: stripSide(published.left, helpers),
      right: stripSide(published.right, helpers),
    };
    const result = completeHalf(skeleton, medium === 'any' ? 'acid' : medium);
    const open = OPEN[reaction];
    if (open === 'several-balances') {
      expect(result).toMatchObject({ ok: false, fault: { code: open } });
      const [first] = !result.ok && result.fault.code === 'several-balances' ? result.fault.couplings : [];
      const settled = valueOf(readEquation(first?.reaction?.plain ?? ''));
      expect(gistOfEquation(settled)).toEqual(gistOfEquation(published));
      return;
    }
    if (open !== undefined) {
      expect(plainReaction(valueOf(result).reaction)).toBe(open);
      expect(result).toMatchObject({ notes: [{ code: 'other-balances' }] });
      return;
    }
    const half = valueOf(result);
    const found = half.reaction.terms.map(({ species, nu }): [string, Rational] => [plainSpecies(species), nu]);
    expect(gist(found), plainReaction(half.reaction)).toEqual(gistOfEquation(published));
    expect(half.kind).toBe('reduction');
  });
});
