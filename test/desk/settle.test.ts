import { describe, expect, it } from 'vitest';
import { answer } from '../../src/desk/answer.ts';

const settle = 'if 1 O3 gives 1 O2';
const cell = { ask: 'cell', anode: ['Zn -> Zn^2+'], cathode: ['O3 -> O2'], medium: 'acid' };

describe('a settle of a whole cell', () => {
  // by hand: O3 + 2 H^+ + 2 e^- -> O2 + H2O against Zn -> Zn^2+ + 2 e^-
  it('is read by the electrode that needs it', () => {
    expect(answer({ ...cell, settle })).toMatchObject({
      ok: true,
      answer: { overall: { plain: 'Zn + O3 + 2 H^+ -> Zn^2+ + O2 + H2O' }, electrons: '2' },
    });
  });

  it('is refused where no electrode needs it', () => {
    const fault = answer({ ...cell, cathode: ['Cu^2+ -> Cu'], settle });
    expect(fault).toMatchObject({ ok: false, fault: { code: 'bad-ask', field: 'settle' } });
  });

  it('is refused at an electrode of its own that needs none', () => {
    const fault = answer({ ...cell, anode: [{ skeleton: 'Zn -> Zn^2+', settle }], cathode: ['Cu^2+ -> Cu'] });
    expect(fault).toMatchObject({ ok: false, fault: { code: 'bad-ask' } });
  });
});

describe('a settle of one skeleton that has one balance', () => {
  it.each([
    { ask: 'half', skeleton: 'MnO4^- -> Mn^2+', medium: 'acid' },
    { ask: 'redox', skeleton: 'MnO4^- + Fe^2+ -> Mn^2+ + Fe^3+', medium: 'acid' },
  ])('is refused in $ask', (ask) => {
    expect(answer({ ...ask, settle })).toMatchObject({ ok: false, fault: { code: 'bad-ask', field: 'settle' } });
  });
});
