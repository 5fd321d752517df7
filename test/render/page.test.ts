import { describe, expect, it } from 'vitest';
import { answer } from '../../src/desk/answer.ts';
import { renderAnswer } from '../../src/render/answer.ts';
import { renderFault } from '../../src/render/fault.ts';
import { type Look, PLAIN_LOOK, UNPAINTED } from '../../src/render/look.ts';

const pageOf = (ask: Readonly<Record<string, unknown>>, look: Look = PLAIN_LOOK): string => {
  const given = answer(ask);
  if (!given.ok) throw new Error(given.fault.message);
  const subject = ask['equation'] ?? ask['species'];
  return renderAnswer({ ...given, cautions: [] }, { text: typeof subject === 'string' ? subject : '' }, look);
};

describe('a page', () => {
  it('of a half-reaction shows the reaction, its electrons and its ledger', () => {
    expect(pageOf({ ask: 'half', skeleton: 'MnO4^- -> Mn^2+', medium: 'acid' })).toBe(
      [
        '  MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O',
        '',
        '  kind        reduction',
        '  electrons   5',
        '  medium      acid',
        '',
        '              Mn  O  H  charge',
        '  left         1  4  8      +2',
        '  right        1  4  8      +2',
        '',
      ].join('\n'),
    );
  });

  it('of a cell shows how often each half is taken', () => {
    const page = pageOf({ ask: 'cell', anode: ['H2O -> O2'], cathode: ['Cu^2+ -> Cu'], medium: 'acid' });
    expect(page).toContain('anode       1 x  2 H2O -> O2 + 4 H^+ + 4 e^-');
    expect(page).toContain('cathode     2 x  Cu^2+ + 2 e^- -> Cu');
  });

  it('of an audit marks in the repair what was edited, and nothing else', () => {
    const marking: Look = { unicode: false, paint: { ...UNPAINTED, mark: (text) => `<${text}>` } };
    const page = pageOf({ ask: 'audit', equation: 'MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 3 H2O' }, marking);
    expect(page).toContain('MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + <4 H2O>');
  });

  it('shows a caution with what calls for it, its basis, and that none shown is no promise', () => {
    const given = answer({ ask: 'half', skeleton: 'H^+ -> H2', medium: 'acid' });
    if (!given.ok) throw new Error('a fault');
    const [caution] = given.cautions;
    if (caution === undefined) throw new Error('hydrogen raises no caution');
    const page = renderAnswer({ ...given, cautions: [caution] }, { text: '' }, PLAIN_LOOK).replaceAll(/\s+/g, ' ');
    expect(page).toContain(caution.text);
    expect(page).toContain(`${caution.because.join(', ')}; ${caution.basis}`);
    expect(page).toContain('does not mean that it is safe');
  });

  it('of a fault lists the readings to choose from', () => {
    const given = answer({ ask: 'species', text: 'I3-' });
    if (given.ok) throw new Error('I3- was read');
    const page = renderFault(given.fault, 'I3-', PLAIN_LOOK);
    expect(page).toContain('I3^-');
    expect(page).toContain('I^3-');
  });
});
