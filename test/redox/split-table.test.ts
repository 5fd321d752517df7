import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { plainReaction } from '../../src/balance/reaction.ts';
import { rational, showRational } from '../../src/exact/rational.ts';
import { balanceRedox } from '../../src/redox/redox.ts';
import type { SplitHalf } from '../../src/redox/split/complete.ts';
import { electronsIn, leftOver, scaled } from '../support/halves.ts';
import { plainEquation, residualByHand } from '../support/plain.ts';

const rows = readFileSync('fixtures/redox/redox.tsv', 'utf8')
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'))
  .map((line) => {
    const [
      skeleton = '',
      medium = '',
      overall = '',
      electrons = '',
      oxidation = '',
      reduction = '',
      changes = '',
      net = '',
    ] = line.split('\t');
    return { skeleton, medium, overall, electrons, oxidation, reduction, changes, net };
  });

const shownHalf = (split: SplitHalf | null): string =>
  split === null ? '-' : `${showRational(split.multiplier)} ${plainReaction(split.half.reaction)}`;

const sorted = (changes: readonly string[]): readonly string[] => changes.toSorted((a, b) => (a < b ? -1 : 1));

describe('the table of redox reactions', () => {
  it('holds at least 80', () => {
    expect(rows.length).toBeGreaterThanOrEqual(80);
  });

  it.each(rows)(
    'was written down right by an independent count: $skeleton',
    ({ overall, oxidation, reduction, ...row }) => {
      expect(residualByHand(overall).size).toBe(0);
      if (oxidation === '-') return;
      for (const text of [oxidation, reduction]) expect(residualByHand(scaled(text).half).size).toBe(0);
      const net = row.net === '' ? overall : row.net;
      expect(residualByHand(net).size).toBe(0);
      expect(leftOver([oxidation, reduction], net)).toEqual([]);
      for (const text of [oxidation, reduction]) expect(showRational(electronsIn(text))).toBe(row.electrons);
    },
  );

  it.each(rows)('is balanced and split: $skeleton', (row) => {
    const found = balanceRedox(plainEquation(row.skeleton), row.medium === '' ? undefined : row.medium);
    if (!found.ok) throw new Error(found.fault.message);
    const { overall, electrons, oxidation, reduction, changes } = found.value;
    expect(plainReaction(overall)).toBe(row.overall);
    expect(showRational(electrons)).toBe(row.electrons);
    expect(shownHalf(oxidation)).toBe(row.oxidation);
    expect(shownHalf(reduction)).toBe(row.reduction);
    const told = changes.map(({ element, from, to }) => `${element} ${showRational(from)} ${showRational(to)}`);
    expect(sorted(told)).toEqual(sorted(row.changes.split('; ')));
    expect(found.notes.some(({ code }) => code === 'halves-omitted')).toBe(row.oxidation === '-');
  });
});

describe('a reaction without electrons', () => {
  // by hand: precipitation, neutralisation, complexation, acid to anhydride
  it.each([
    ['AgNO3 + NaCl -> AgCl + NaNO3', 'AgNO3 + NaCl -> AgCl + NaNO3'],
    ['Ag^+ + Cl^- -> AgCl', 'Ag^+ + Cl^- -> AgCl'],
    ['Zn^2+ + CN^- -> Zn(CN)4^2-', 'Zn^2+ + 4 CN^- -> Zn(CN)4^2-'],
    ['CrO4^2- -> Cr2O7^2-', '2 CrO4^2- + 2 H^+ -> Cr2O7^2- + H2O'],
    ['Mg3N2 + H2O -> Mg(OH)2 + NH3', 'Mg3N2 + 6 H2O -> 3 Mg(OH)2 + 2 NH3'],
    ['HCl + NaOH -> NaCl + H2O', 'HCl + NaOH -> NaCl + H2O'],
  ])('is refused with its balance: %s', (skeleton, balance) => {
    const found = balanceRedox(plainEquation(skeleton), 'acid');
    expect(found.ok ? null : found.fault).toMatchObject({ code: 'no-electrons', reaction: { plain: balance } });
  });
});

describe('a coupling that was settled', () => {
  const settle = 'if H2O2 is only oxidised, to O2';

  it('gives its own halves', () => {
    const found = balanceRedox(plainEquation('MnO4^- + H2O2 -> Mn^2+ + O2'), 'acid', settle);
    if (!found.ok) throw new Error(found.fault.message);
    // from memory: the titration of hydrogen peroxide with permanganate
    expect(plainReaction(found.value.overall)).toBe('2 MnO4^- + 5 H2O2 + 6 H^+ -> 2 Mn^2+ + 5 O2 + 8 H2O');
    expect(found.value.electrons.equals(rational(10n))).toBe(true);
    expect(shownHalf(found.value.oxidation)).toBe('5 H2O2 -> O2 + 2 H^+ + 2 e^-');
    expect(shownHalf(found.value.reduction)).toBe('2 MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O');
  });

  it('gives ionic halves of a molecular skeleton', () => {
    const skeleton = 'KMnO4 + H2O2 + H2SO4 -> K2SO4 + MnSO4 + O2 + H2O';
    const found = balanceRedox(plainEquation(skeleton), undefined, settle);
    if (!found.ok) throw new Error(found.fault.message);
    expect(shownHalf(found.value.oxidation)).toBe('5 H2O2 -> O2 + 2 H^+ + 2 e^-');
    expect(shownHalf(found.value.reduction)).toBe('2 MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O');
  });
});
