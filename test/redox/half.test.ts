import { describe, expect, it } from 'vitest';
import { completeHalf } from '../../src/redox/half.ts';
import { readEquation } from '../../src/species/read.ts';
import { plainEquation } from '../support/plain.ts';
import { faultWith, half } from '../support/redox.ts';

/** The skeleton read by the product, so that faults carry spans. */
const faultOf = (text: string, medium?: string) => {
  const skeleton = readEquation(text);
  if (!skeleton.ok) throw new Error(skeleton.fault.message);
  const result = completeHalf(skeleton.value, medium);
  if (result.ok) throw new Error('a fault was expected');
  return result.fault;
};

describe('completing a half-reaction', () => {
  it('prints the skeleton as written, then helpers in the order of the medium, then e^-', () => {
    expect(half('MnO4^- -> Mn^2+', 'acid')).toMatchObject({ reaction: 'MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O' });
    expect(half('Mn^2+ -> MnO4^-', 'acid')).toMatchObject({ reaction: 'Mn^2+ + 4 H2O -> MnO4^- + 8 H^+ + 5 e^-' });
    expect(half('NH3OH^+ -> N2', 'acid')).toMatchObject({ reaction: '2 NH3OH^+ -> N2 + 2 H2O + 4 H^+ + 2 e^-' });
  });

  it('prints the electron last even where it is written first', () => {
    expect(half('e^- + MnO4^- -> Mn^2+', 'acid')).toMatchObject({
      reaction: 'MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O',
    });
  });

  it('keeps the order in which helpers are written', () => {
    expect(half('H^+ + MnO4^- -> H2O + Mn^2+', 'acid')).toMatchObject({
      reaction: '8 H^+ + MnO4^- + 5 e^- -> 4 H2O + Mn^2+',
    });
  });

  it('tells reduction from oxidation and gives a positive electron number', () => {
    expect(half('Cu^2+ -> Cu', 'none')).toMatchObject({ kind: 'reduction', electrons: '2', dimension: 1 });
    expect(half('Cu -> Cu^2+', 'none')).toMatchObject({ kind: 'oxidation', electrons: '2', dimension: 1 });
  });

  it('ignores coefficients and says so', () => {
    expect(half('2 MnO4^- -> 7 Mn^2+', 'acid')).toMatchObject({
      reaction: 'MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O',
      notes: ['coefficients-ignored'],
    });
    expect(half('MnO4^- -> Mn^2+', 'acid')).toMatchObject({ notes: [] });
  });

  it('merges duplicates on one side', () => {
    expect(half('MnO4^- + MnO4^- -> Mn^2+ + Mn^2+', 'acid')).toMatchObject({
      reaction: 'MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O',
    });
  });

  it('takes a species without a state as the same in any state, and two states as two species', () => {
    expect(half('I2(s) + I2 -> I^-', 'none')).toMatchObject({ reaction: 'I2(s) + 2 e^- -> 2 I^-' });
    expect(half('I2(s) + I2(aq) -> I^-', 'none')).toMatchObject({ code: 'several-balances', dimension: 2 });
  });

  it('takes a written helper in its written state', () => {
    expect(half('O2(g) + H^+(aq) -> H2O(l)', 'acid')).toMatchObject({
      reaction: 'O2(g) + 4 H^+(aq) + 4 e^- -> 2 H2O(l)',
    });
  });

  it('leaves a species on both sides free and drops it at 0 with a note', () => {
    expect(half('Cu + NaCl -> Cu^2+ + NaCl', 'acid')).toMatchObject({
      reaction: 'Cu -> Cu^2+ + 2 e^-',
      notes: ['species-dropped'],
    });
  });

  it('keeps a species on both sides that takes part, on the side where it ends', () => {
    expect(half('MnO4^- + H2O -> Mn^2+ + H2O', 'acid')).toMatchObject({
      reaction: 'MnO4^- + 8 H^+ + 5 e^- -> 4 H2O + Mn^2+',
      notes: [],
    });
  });

  it('leaves out helpers that take no part', () => {
    expect(half('Ag^+ -> Ag', 'acid')).toMatchObject({ reaction: 'Ag^+ + e^- -> Ag' });
  });

  it('lets helpers end on either side, two on the same side too', () => {
    expect(half('N2H5^+ -> NH4^+', 'acid')).toMatchObject({ reaction: 'N2H5^+ + 3 H^+ + 2 e^- -> 2 NH4^+' });
    expect(half('N2 -> NH3OH^+', 'acid')).toMatchObject({
      reaction: 'N2 + 2 H2O + 4 H^+ + 2 e^- -> 2 NH3OH^+',
    });
  });

  it('gives the only elementary balance of a couple, with its dimension and a note', () => {
    expect(half('O2 -> H2O2', 'acid')).toEqual({
      reaction: 'O2 + 2 H^+ + 2 e^- -> H2O2',
      kind: 'reduction',
      electrons: '2',
      dimension: 2,
      notes: ['other-balances'],
    });
    expect(half('H2O2 -> O2', 'acid')).toMatchObject({ reaction: 'H2O2 -> O2 + 2 H^+ + 2 e^-' });
    expect(half('O2 + e^- -> H2O2', 'acid')).toMatchObject({ dimension: 2, notes: ['other-balances'] });
  });

  it('has no such exception with more than one reactant or product', () => {
    expect(half('O2 + H^+ -> H2O2', 'acid')).toMatchObject({ code: 'several-balances', dimension: 2 });
  });

  it('reports several balances where a list of helpers depends on itself', () => {
    const fault = faultWith(half('MnO4^- -> Mn^2+', 'H2O, H^+, OH^-'), 'several-balances');
    expect(fault.dimension).toBe(2);
    expect(fault.couplings.map(({ assume, electrons }) => `${assume}: ${electrons}`)).toEqual([
      'if OH^- takes no part: 5',
      'if H^+ takes no part: 5',
      'if H2O takes no part: 5',
    ]);
  });

  it('settles by the exact text of an assumption, and says so', () => {
    expect(half('O3 -> O2', 'acid', 'if 1 O3 gives 1 O2')).toMatchObject({
      reaction: 'O3 + 2 H^+ + 2 e^- -> O2 + H2O',
      dimension: 2,
      notes: ['settled'],
    });
    const fault = faultWith(half('O3 -> O2', 'acid', 'if 1 O3 gives 1 O'), 'bad-ask');
    expect(fault).toMatchObject({ field: 'settle', hint: 'Did you mean if 1 O3 gives 1 O2?' });
  });

  it('refuses an assumption where nothing is to be settled', () => {
    expect(half('MnO4^- -> Mn^2+', 'acid', 'zzz')).toMatchObject({ code: 'bad-ask', field: 'settle' });
    expect(half('CrO4^2- -> Cr2O7^2-', 'acid', 'zzz')).toMatchObject({ code: 'bad-ask', field: 'settle' });
    expect(half('MnO4^- + Na^+ -> Mn^2+', 'acid', 'zzz')).toMatchObject({ code: 'missing-element' });
    expect(half('O2 -> H2O2', 'acid', 'zzz')).toMatchObject({ code: 'bad-ask', field: 'settle' });
  });

  it('gives the balanced reaction where nothing is oxidised or reduced', () => {
    const fault = faultWith(half('CrO4^2- -> Cr2O7^2-', 'acid'), 'no-electrons');
    expect(fault.reaction.plain).toBe('2 CrO4^2- + 2 H^+ -> Cr2O7^2- + H2O');
  });

  it('puts wrong-side, idle-species and several-balances before no-electrons', () => {
    expect(half('CrO4^2- -> Cr2O7^2- + H^+', 'acid')).toMatchObject({ code: 'wrong-side', species: 'H^+' });
    expect(half('CrO4^2- + e^- -> Cr2O7^2-', 'acid')).toMatchObject({ code: 'idle-species', species: 'e^-' });
    expect(half('O3 -> O2', 'none')).toMatchObject({ code: 'no-electrons' });
  });

  it('prints a species that stands on the wrong side where it belongs', () => {
    const fault = faultWith(half('Cr2O7^2- + H2O -> Cr^3+', 'acid'), 'wrong-side');
    expect(fault.reaction.plain).toBe('Cr2O7^2- + 14 H^+ + 6 e^- -> 2 Cr^3+ + 7 H2O');
  });

  it('points at the species that is meant', () => {
    expect(faultOf('Cr2O7^2- + H2O -> Cr^3+', 'acid')).toMatchObject({ span: { from: 11, to: 14 } });
    expect(faultOf('Cu + Na^+ -> Cu^2+', 'acid')).toMatchObject({ span: { from: 5, to: 9 } });
    expect(faultOf('Cu^2+ + H^+ -> Cu', 'acid')).toMatchObject({ span: { from: 8, to: 11 } });
  });

  it('balances tens of electrons, hundreds of H^+ and two-digit charges exactly', () => {
    expect(half('C57H110O6 -> CO2', 'acid')).toMatchObject({
      reaction: 'C57H110O6 + 108 H2O -> 57 CO2 + 326 H^+ + 326 e^-',
    });
    expect(half('P2W18O62^6- -> W', 'acid')).toMatchObject({ code: 'missing-element', element: 'P' });
    expect(half('H2W12O42^10- -> W', 'acid')).toMatchObject({
      reaction: 'H2W12O42^10- + 82 H^+ + 72 e^- -> 12 W + 42 H2O',
    });
  });

  it('stays exact beyond 2^53', () => {
    const skeleton = plainEquation('C90071992547409931H2 -> CO2');
    const result = completeHalf(skeleton, 'acid');
    expect(result.ok && result.value.electrons.toString()).toBe('360287970189639726');
  });
});
