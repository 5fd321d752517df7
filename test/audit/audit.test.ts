import { describe, expect, it } from 'vitest';
import { type Audit, auditEquation } from '../../src/audit/audit.ts';
import { contributionsOf } from '../../src/audit/contributions.ts';
import { plainReaction } from '../../src/balance/reaction.ts';
import { showRational } from '../../src/exact/rational.ts';
import { mediumRow } from '../../src/redox/media.ts';
import type { Medium } from '../../src/redox/medium.ts';
import type { Note } from '../../src/report/note.ts';
import { plainEquation, residualByHand } from '../support/plain.ts';

const audited = (text: string, medium?: Medium): { audit: Audit; notes: readonly Note[] } => {
  const result = auditEquation(plainEquation(text), medium);
  if (!result.ok) throw new Error(result.fault.message);
  return { audit: result.value, notes: result.notes };
};

const codes = (text: string, medium?: Medium): readonly string[] => audited(text, medium).notes.map(({ code }) => code);

const residual = (text: string): Record<string, string> =>
  Object.fromEntries([...audited(text).audit.residual].map(([label, value]) => [label, showRational(value)]));

const repairs = (text: string, medium?: Medium): readonly string[] =>
  audited(text, medium).audit.repairs.map(({ reaction }) => plainReaction(reaction));

const kinds = (text: string): readonly string[] => audited(text).audit.repairs.map(({ kind }) => kind);

const ACID = mediumRow('acid');
const BASE = mediumRow('base');
const NEUTRAL = mediumRow('neutral');

describe('the verdict', () => {
  it('leaves a balanced equation alone', () => {
    expect(audited('Fe^3+ + e^- -> Fe^2+').audit).toMatchObject({ verdict: 'balanced', dimension: 1, repairs: [] });
    expect(residual('Fe^3+ + e^- -> Fe^2+')).toEqual({});
  });

  it('gives the residual right minus left, zeros left out', () => {
    expect(residual('MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 3 H2O')).toEqual({ O: '-1', H: '-2' });
    expect(residual('Fe^2+ -> Fe^3+')).toEqual({ charge: '1' });
  });

  it('keeps the ledger of both sides, the charge always in it', () => {
    const { ledger } = audited('2 H2 + O2 -> H2O').audit;
    const shown = [...ledger].map(([label, [left, right]]) => [label, showRational(left), showRational(right)]);
    expect(shown).toEqual([
      ['H', '4', '2'],
      ['O', '2', '1'],
      ['charge', '0', '0'],
    ]);
  });

  it('divides whole coefficients with a common factor, as the one repair', () => {
    const { audit, notes } = audited('2 Fe^3+ + 2 e^- -> 2 Fe^2+');
    expect(audit.verdict).toBe('not-lowest');
    expect(audit.repairs.map(({ kind, reaction }) => [kind, plainReaction(reaction)])).toEqual([
      ['lowest-terms', 'Fe^3+ + e^- -> Fe^2+'],
    ]);
    expect(audit.repairs[0]?.edits).toContainEqual({
      term: 'Fe^3+',
      from: '2',
      to: '1',
      text: '1 Fe^3+ instead of 2 on the left',
    });
    expect(notes.map(({ code }) => code)).toContain('common-factor');
  });

  it('accepts fractions that conserve, with a note, even with a common factor', () => {
    expect(audited('H2 + 1/2 O2 -> H2O').audit).toMatchObject({ verdict: 'balanced', repairs: [] });
    expect(codes('H2 + 1/2 O2 -> H2O')).toContain('fractions');
    expect(audited('3 H2 + 3/2 O2 -> 3 H2O').audit.verdict).toBe('balanced');
  });

  it('counts written species less the rank of elements and charge as the dimension', () => {
    // MnO4^-, H^+, e^-, Mn^2+, H2O against Mn, O, H and charge: 5 - 4
    expect(audited('MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O').audit.dimension).toBe(1);
    // without electrons the four are independent
    expect(audited('MnO4^- + 8 H^+ -> Mn^2+ + 4 H2O').audit.dimension).toBe(0);
    // six species against Mn, O, H and charge
    expect(audited('2 MnO4^- + 5 H2O2 + 6 H^+ -> 2 Mn^2+ + 8 H2O + 5 O2').audit.dimension).toBe(2);
    // water on both sides is one species
    expect(audited('H2O + H2 -> H2 + H2O').audit.dimension).toBe(0);
  });

  it('is exact beyond the whole numbers that floats hold', () => {
    expect(residual('90071992547409931 H2 + 45035996273704966 O2 -> 90071992547409931 H2O')).toEqual({ O: '-1' });
  });

  it('reads decimal subscripts exactly', () => {
    expect(residual('LiCoO2 -> Li0.65CoO2 + 0.35 Li^+ + 0.35 e^-')).toEqual({});
    expect(residual('LiCoO2 -> Li0.6CoO2 + 0.35 Li^+ + 0.35 e^-')).toEqual({ Li: '-1/20' });
  });

  it('tells what each term puts into the ledger', () => {
    const given = contributionsOf(plainEquation('MnO4^- + 8 H^+ -> Mn^2+'));
    const shown = given.map(({ species, side, amounts }) => [
      species.key,
      side,
      Object.fromEntries([...amounts].map(([label, value]) => [label, showRational(value)])),
    ]);
    expect(shown).toEqual([
      ['MnO4^-', 'left', { Mn: '1', O: '4', charge: '-1' }],
      ['H^+', 'left', { H: '8', charge: '8' }],
      ['Mn^2+', 'right', { Mn: '1', charge: '2' }],
    ]);
  });
});

describe('decimals', () => {
  it.each([
    ['H2 + 0.333 O2 -> 0.667 H2O', false],
    ['1/3 N2 + H2 -> 0.6667 NH3', true],
    ['0.3333 N2 + H2 -> 0.6667 NH3', true],
    ['0.333333333333333 N2 + H2 -> 0.666666666666667 NH3', true],
    ['0.666 Al + Cu^2+ -> 0.666 Al^3+ + Cu', true],
    ['H2 + 0.4 O2 -> H2O', false],
  ])('of %s miss by rounding only: %s', (text, rounded) => {
    expect(audited(text).audit.verdict).toBe('unbalanced');
    expect(codes(text).includes('rounding')).toBe(rounded);
    expect(kinds(text)[0] === 'rounding').toBe(rounded);
  });

  it('become exact numbers', () => {
    expect(repairs('0.3333 N2 + H2 -> 0.6667 NH3')[0]).toBe('1/3 N2 + H2 -> 2/3 NH3');
    expect(residual('0.333333333333333 N2 + H2 -> 0.666666666666667 NH3')).toEqual({
      N: '1/1000000000000000',
      H: '1/1000000000000000',
    });
    const told = (text: string) => audited(text).notes.find(({ code }) => code === 'rounding')?.message;
    expect(told('0.333333333333333 N2 + H2 -> 0.666666666666667 NH3')).toContain('off by 1e-15 N, 1e-15 H.');
    expect(told('0.3333 N2 + H2 -> 0.6667 NH3')).toContain('off by 1e-4 N, 1e-4 H.');
  });
});

describe('what else is wrong', () => {
  it('says that the ratio of two independent reactions is the choice of the writer', () => {
    expect(codes('2 MnO4^- + 7 H2O2 + 6 H^+ -> 2 Mn^2+ + 10 H2O + 6 O2')).toContain('not-unique');
    expect(codes('Fe^3+ + e^- -> Fe^2+')).not.toContain('not-unique');
  });

  it('says that an ion is foreign to the medium, and changes nothing for it', () => {
    const text = 'O2 + 4 H^+ + 4 e^- -> 2 H2O';
    expect(audited(text, BASE).audit).toMatchObject({ verdict: 'balanced', repairs: [] });
    expect(codes(text, BASE)).toContain('medium-clash');
    expect(codes(text, ACID)).not.toContain('medium-clash');
    expect(codes(text, NEUTRAL)).not.toContain('medium-clash');
    expect(codes('O2 + 2 H2O + 4 e^- -> 4 OH^-', ACID)).toContain('medium-clash');
  });

  it('never assumes a medium', () => {
    expect(codes('Cu^2+ + 2 e^- -> Cu')).toEqual([]);
    expect(codes('Fe^2+ -> Fe^3+')).toEqual([]);
  });

  it('says that H^+ and OH^- stand on one line', () => {
    expect(codes('H2O -> H^+ + OH^-')).toContain('medium-clash');
  });

  it('says that a species on both sides could be cancelled', () => {
    expect(codes('Zn + Cu^2+ + SO4^2- -> Zn^2+ + Cu + SO4^2-')).toContain('both-sides');
    expect(codes('Zn + Cu^2+ -> Zn^2+ + Cu')).not.toContain('both-sides');
  });

  it('says that electrons are left in an overall reaction', () => {
    expect(codes('Zn + 2 Cu^2+ + 2 e^- -> Zn^2+ + 2 Cu')).toContain('electrons-left');
    expect(codes('MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O')).not.toContain('electrons-left');
    // both Si and H change their numbers here, but nothing balances without electrons
    expect(codes('Si + 4 H^+ + 4 e^- -> SiH4')).not.toContain('electrons-left');
  });

  it('says that nothing is oxidised or reduced', () => {
    expect(codes('AgCl -> Ag^+ + Cl^-')).toContain('not-redox');
    expect(codes('Cl2 + 2 OH^- -> Cl^- + ClO^- + H2O')).not.toContain('not-redox');
    expect(codes('Zn + Cu^2+ -> Zn^2+ + Cu')).not.toContain('not-redox');
  });

  it('says that some states are missing, and that one species stands in two', () => {
    expect(codes('Zn(s) + Cu^2+(aq) -> Zn^2+(aq) + Cu')).toContain('state-missing');
    expect(codes('Zn(s) + Cu^2+(aq) -> Zn^2+(aq) + Cu(s)')).toEqual([]);
    expect(codes('2 H2(g) + O2(g) + H2O(l) -> 3 H2O(g)')).toContain('states-differ');
    expect(codes('Br2(l) -> Br2(aq)')).not.toContain('states-differ');
  });
});

describe('repairs', () => {
  it('say what to do, term by term', () => {
    const [first] = audited('MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 3 H2O').audit.repairs;
    expect(first?.edits).toEqual([{ term: 'H2O', from: '3', to: '4', text: '4 H2O instead of 3 on the right' }]);
    expect(audited('Cu^2+ -> Cu + 2 e^-').audit.repairs[0]?.edits).toEqual([
      { term: 'e^-', from: 'right', to: 'left', text: 'move 2 e^- from the right to the left' },
    ]);
    expect(audited('Fe^2+ -> Fe^3+').audit.repairs[0]?.edits).toEqual([
      { term: 'e^-', from: '0', to: '1', text: 'add e^- on the right' },
    ]);
    expect(audited('Fe^3+ + e^- -> Fe^2+ + H2O').audit.repairs[0]?.edits).toEqual([
      { term: 'H2O', from: '1', to: '0', text: 'drop H2O on the right' },
    ]);
    expect(audited('Cr2O7^- + 14 H^+ + 6 e^- -> 2 Cr^3+ + 7 H2O').audit.repairs[0]?.edits).toEqual([
      { term: 'Cr2O7^-', from: 'Cr2O7^-', to: 'Cr2O7^2-', text: 'Cr2O7^2- instead of Cr2O7^- on the left' },
    ]);
  });

  it('keep the order of what was written, added helpers before the electrons', () => {
    expect(repairs('MnO4^- + 5 e^- -> Mn^2+ + 4 H2O')[0]).toBe('MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O');
    expect(repairs('2 e^- + Cu^2+ -> 2 Cu')[0]).toBe('2 e^- + Cu^2+ -> Cu');
  });

  it('change the fewest numbers, at the scale of the writer', () => {
    expect(repairs('4 H2 + 2 O2 -> 3 H2O')[0]).toBe('4 H2 + 2 O2 -> 4 H2O');
    expect(repairs('4 H2 + 2 O2 -> 3 H2O')).toContain('2 H2 + O2 -> 2 H2O');
    expect(repairs('H2 + 1/2 O2 -> 2 H2O')[0]).toBe('H2 + 1/2 O2 -> H2O');
  });

  it('bring no fractions where none were written', () => {
    expect(repairs('H2 + O2 -> H2O')[0]).toBe('2 H2 + O2 -> 2 H2O');
  });

  it('solve a skeleton without any number', () => {
    expect(repairs('MnO4^- + Fe^2+ + H^+ -> Mn^2+ + Fe^3+ + H2O')[0]).toBe(
      'MnO4^- + 5 Fe^2+ + 8 H^+ -> Mn^2+ + 5 Fe^3+ + 4 H2O',
    );
    expect(repairs('Cr2O7^2- + H^+ + e^- -> Cr^3+ + H2O')[0]).toBe('Cr2O7^2- + 14 H^+ + 6 e^- -> 2 Cr^3+ + 7 H2O');
  });

  it('never start with protons and electrons brought in together', () => {
    expect(repairs('Cr2O7^2- -> 2 Cr^3+')).toEqual([]);
    const { notes } = audited('Cr2O7^2- -> 2 Cr^3+');
    expect(notes.find(({ code }) => code === 'no-repair')?.message).toContain('balance nearly anything');
  });

  it('never start with a solution that leaves hardly a number standing', () => {
    // the planted slip is Fe^4+ for Fe^2+ twice over; what balances is far from what was written
    const text = '3 Fe^4+ + 2 Cr2O7^2- + 3 H^+ -> 3 Fe^3+ + 2 Cr^3+ + 2 H2O';
    const { audit } = audited(text);
    expect(audit.verdict).toBe('unbalanced');
    expect(audit.repairs[0]?.improbable ?? false).toBe(false);
  });

  it('say why there are none', () => {
    const { audit, notes } = audited('Zn + Cu^2+ -> Zn^2+ + H3PO4');
    expect(audit.repairs).toEqual([]);
    expect(notes.find(({ code }) => code === 'no-repair')?.message).toMatch(/stands on the (left|right) only/);
  });

  it('drop what stands on one side only and takes no part', () => {
    expect(repairs('Zn + Cu^2+ + SO4^2- -> Zn^2+ + Cu')[0]).toBe('Zn + Cu^2+ -> Zn^2+ + Cu');
    expect(repairs('Zn + Cu^2+ + 2 e^- -> Zn^2+ + Cu')[0]).toBe('Zn + Cu^2+ -> Zn^2+ + Cu');
  });

  it('keep states, also of a respelled species', () => {
    expect(repairs('Cr2O7^-(aq) + 14 H^+(aq) + 6 e^- -> 2 Cr^3+(aq) + 7 H2O(l)')[0]).toBe(
      'Cr2O7^2-(aq) + 14 H^+(aq) + 6 e^- -> 2 Cr^3+(aq) + 7 H2O(l)',
    );
  });

  it('give what they add a state where all the rest has one', () => {
    expect(repairs('MnO4^-(aq) + 5 e^- -> Mn^2+(aq) + 4 H2O(l)')[0]).toBe(
      'MnO4^-(aq) + 8 H^+(aq) + 5 e^- -> Mn^2+(aq) + 4 H2O(l)',
    );
    expect(repairs('O2(g) + 4 e^- -> 4 OH^-(aq)')[0]).toBe('O2(g) + 2 H2O(l) + 4 e^- -> 4 OH^-(aq)');
    expect(repairs('O2 + 4 e^- -> 4 OH^-(aq)')[0]).toBe('O2 + 2 H2O + 4 e^- -> 4 OH^-(aq)');
  });

  it('take helpers from the medium that was given, and from no other', () => {
    expect(repairs('MnO4^- + 3 e^- -> MnO2', BASE)[0]).toBe('MnO4^- + 2 H2O + 3 e^- -> MnO2 + 4 OH^-');
    expect(repairs('MnO4^- + 3 e^- -> MnO2', ACID)[0]).toBe('MnO4^- + 4 H^+ + 3 e^- -> MnO2 + 2 H2O');
  });

  it('show a tie as a tie', () => {
    expect(codes('MnO4^- + 3 e^- -> MnO2')).toContain('tie');
  });

  it('stay within bounds on long equations', () => {
    const metals = 'Li Na K Rb Cs Mg Ca Sr Ba Al Ga In Tl Sn Pb Sb Bi Cu Ag Au Zn Cd Hg'.split(' ');
    const long = `${metals.map((metal) => `2 ${metal}`).join(' + ')} -> ${metals.join(' + ')}`;
    const { audit, notes } = audited(long);
    expect(audit.verdict).toBe('unbalanced');
    expect(audit.repairs).toEqual([]);
    expect(notes.map(({ code }) => code)).toContain('no-repair');
  });

  it('conserve by a count of somebody else', () => {
    for (const text of ['MnO4^- + 3 e^- -> MnO2', 'Cu + 2 e^- -> Cu', 'Al + Cu^2+ -> Al^3+ + Cu']) {
      for (const repaired of repairs(text)) expect(residualByHand(repaired).size).toBe(0);
    }
  });
});

describe('what no chemist would write', () => {
  const brought = (text: string): readonly string[] =>
    audited(text).audit.repairs.flatMap(({ edits }) => edits.map(({ to }) => to));

  it('bears no charge that its atoms are not known to bear', () => {
    for (const text of ['O2 + 4 H^+ + 2 e^- -> 2 H2O', 'Na^+ -> Na + e^-', 'PbSO4 + e^- -> Pb + SO4^2-']) {
      expect(brought(text).filter((to) => /^(H2O\^|Na\^2\+|PbSO4\^)/.test(to))).toEqual([]);
    }
  });

  it('does not stand behind something sensible', () => {
    expect(repairs('Na^+ -> Na + e^-')).toEqual(['Na^+ + e^- -> Na']);
    expect(repairs('H2 + O2 -> H2O')).toEqual(['2 H2 + O2 -> 2 H2O', 'H2 + O2 -> H2O2']);
    expect(brought('Ag^+ + 2 e^- -> Ag')).not.toContain('Ag^-');
  });

  it('is no re-solve with numbers that grow over fourfold, while an ion is left that nobody knows', () => {
    const found = audited('Cl2 + OH^- -> Cl^- + ClO3^2- + H2O').audit.repairs;
    expect(found.map(({ reaction, improbable }) => [plainReaction(reaction), improbable])).toEqual([
      ['3 Cl2 + 6 OH^- -> 5 Cl^- + ClO3^- + 3 H2O', false],
      ['5 Cl2 + 12 OH^- -> 8 Cl^- + 2 ClO3^2- + 6 H2O', true],
    ]);
  });

  it('still gives the numbers of a complex that no table holds', () => {
    expect(repairs('Co(C3H8N2)3^3+ + H2O -> Co(C3H8N2)3^2+ + O2 + H^+')).toEqual([
      '4 Co(C3H8N2)3^3+ + 2 H2O -> 4 Co(C3H8N2)3^2+ + O2 + 4 H^+',
    ]);
  });

  it('does not say of several balances that a slip explains nothing', () => {
    const { audit, notes } = audited('H2O2 + MnO4^- + H^+ -> Mn^2+ + O2 + H2O');
    expect(audit.repairs).toEqual([]);
    expect(notes.find(({ code }) => code === 'no-repair')?.message).toContain('several balances');
  });

  it('spells a salt that a bracket is not needed in without it', () => {
    expect(repairs('AgNO3 + Cu -> Cu(NO3)3 + Ag')).toContain('AgNO3 + Cu -> CuNO3 + Ag');
    expect(repairs('C2H5OH + H2O -> CH3COOH + 3 H^+ + 4 e^-').filter((text) => text.includes('HO^-'))).toEqual([]);
  });
});
