import { describe, expect, it } from 'vitest';
import { answer } from '../../src/desk/answer.ts';
import { renderAnswer } from '../../src/render/answer.ts';
import { type Look, PLAIN_LOOK, UNPAINTED } from '../../src/render/look.ts';
import { cautionLines, graveLines } from '../../src/render/remarks.ts';

const pageOf = (ask: Readonly<Record<string, unknown>>, look: Look = PLAIN_LOOK): string => {
  const given = answer(ask);
  if (!given.ok) throw new Error(given.fault.message);
  return renderAnswer(given, { text: '' }, look);
};

const cautionsOf = (ask: Readonly<Record<string, unknown>>) => {
  const given = answer(ask);
  if (!given.ok) throw new Error(given.fault.message);
  return given.cautions;
};

describe('a grave caution', () => {
  // Common practice, no source: what each of these can do to the person beside the cell.
  it.each([
    ['cyanide in acid', { ask: 'half', skeleton: 'Au(CN)2^- -> Au + HCN', medium: 'acid' }],
    ['cyanide with hypochlorite', { ask: 'redox', skeleton: 'CN^- + ClO^- -> CNO^- + Cl^-', medium: 'base' }],
    ['acidified hypochlorite', { ask: 'half', skeleton: 'HClO -> Cl^-', medium: 'acid' }],
    ['chlorine at an anode', { ask: 'half', skeleton: 'Cl^- -> Cl2', medium: 'acid' }],
    ['hydrogen with oxygen', { ask: 'cell', anode: ['H2O -> O2'], cathode: ['H2O -> H2'], medium: 'neutral' }],
  ])('stands before the answer: %s', (_, ask) => {
    const [first] = cautionsOf(ask);
    expect(first?.grave).toBe(true);
    const page = pageOf(ask);
    expect(page.startsWith('  danger      ')).toBe(true);
    expect(page.indexOf('danger')).toBeLessThan(page.indexOf('->'));
  });

  it('is painted, and not shown again behind the answer', () => {
    const bad: Look = { unicode: false, paint: { ...UNPAINTED, bad: (text) => `<${text}>` } };
    const cautions = cautionsOf({ ask: 'half', skeleton: 'Cl^- -> Cl2', medium: 'acid' });
    expect(graveLines(cautions, bad)[0]).toMatch(/^<danger> {6}<.*>$/);
    expect(cautionLines(cautions, bad).join('\n')).not.toContain('<');
  });

  it('is none of copper alone', () => {
    expect(cautionsOf({ ask: 'half', skeleton: 'Cu^2+ -> Cu' }).filter(({ grave }) => grave === true)).toEqual([]);
  });
});

describe('the other cautions', () => {
  const ask = { ask: 'half', skeleton: 'H^+ -> H2', medium: 'acid' };

  it('come behind the answer, each with its basis in brackets, those with a condition last', () => {
    const page = pageOf(ask).replaceAll(/\s+/g, ' ');
    const cautions = cautionsOf(ask);
    expect(cautions.length).toBeGreaterThan(1);
    for (const { text, because, basis } of cautions)
      expect(page).toContain(`${text} (${because.length === 0 ? '' : `${because.join(', ')}; `}${basis})`);
    const open = cautions.map(({ conditional }) => conditional === true);
    expect(open).toEqual([...open].sort());
    expect(page.indexOf('2 H^+')).toBeLessThan(page.indexOf(' caution '));
  });

  it('end with one line on absence and fit a terminal of 80 columns', () => {
    const lines = pageOf(ask).trimEnd().split('\n');
    expect(lines.every((line) => line.length <= 80)).toBe(true);
    expect(lines.at(-3)).toBe('');
    expect(lines.slice(-2).join(' ').replaceAll(/\s+/g, ' ')).toContain('does not mean that it is safe');
  });
});
