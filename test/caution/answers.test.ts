import { describe, expect, test } from 'vitest';
import { answer } from '../../src/desk/answer.ts';

type Shown = readonly { readonly text: string; readonly because: readonly string[]; readonly basis: string }[];

const cautionsOf = (ask: Readonly<Record<string, unknown>>): Shown => {
  const given = answer(ask);
  if (!given.ok) throw new Error(given.fault.message);
  return given.cautions;
};
const cell = (anode: string, cathode: string, more: Readonly<Record<string, unknown>> = {}): Shown =>
  cautionsOf({ ask: 'cell', anode: [anode], cathode: [cathode], ...more });
const starts = (cautions: Shown): readonly string[] => cautions.map(({ text }) => text);
const find = (cautions: Shown, start: string) => cautions.find(({ text }) => text.startsWith(start));

describe('cautions of an answer', () => {
  test('a cyanide tank in acid leads with hydrogen cyanide', () => {
    const [first] = cell('H2O -> O2', 'Ag(CN)2^- -> Ag + CN^-', { medium: 'acid' });
    expect(first?.text).toMatch(/^Cyanide below about pH 11/);
    expect(first?.because).toContain('CN^-');
    expect(first?.basis).toMatch(/^GHS acute toxicity/);
  });

  test('a cyanide tank in base is warned of in its own words', () => {
    const texts = starts(cell('OH^- -> O2', 'Zn(CN)4^2- -> Zn + CN^-', { medium: 'base' }));
    expect(texts.some((text) => text.startsWith('Even alkaline cyanide'))).toBe(true);
    expect(texts.some((text) => text.startsWith('Cyanide below'))).toBe(false);
  });

  test('a bath of ligands is known as basic by its hydroxide', () => {
    const medium = { helpers: ['CN^-', 'H2O', 'OH^-'] };
    const shown = cautionsOf({ ask: 'half', skeleton: 'Au(CN)2^- -> Au', medium });
    expect(find(shown, 'Even alkaline cyanide')?.text).toMatch(/plating\.$/);
  });

  test('chlorine from a chloride anode comes first, for electrolysis', () => {
    const [first] = cell('Cl^- -> Cl2', 'Ni^2+ -> Ni', { medium: 'acid' });
    expect(first?.text).toMatch(/^Chloride at an inert anode .* Applies in electrolysis or on charging\.$/);
    expect(first?.because).toEqual(['Cl2']);
  });

  test('hydrogen with oxygen comes first; a separator takes the undivided cell away', () => {
    const water = (separator?: boolean) =>
      cell('OH^- -> O2', 'H2O -> H2', { medium: 'base', ...(separator === undefined ? {} : { separator }) });
    expect(starts(water(false)).slice(0, 2)).toEqual([
      expect.stringMatching(/^Hydrogen burns in air/),
      expect.stringMatching(/^An undivided water electrolysis cell .* mixed gas\.$/),
    ]);
    expect(find(water(), 'An undivided')?.text).toMatch(/Applies in an undivided cell\.$/);
    expect(find(water(true), 'An undivided')).toBeUndefined();
  });

  test('a diagram says by its bridge whether the cell is divided', () => {
    const shown = cautionsOf({ ask: 'cell', diagram: 'Pt | H2 | H^+ | O2 | Pt' });
    expect(find(shown, 'Hydrogen burns')).toBeDefined();
  });

  test('two electrodes in two media name the one that a caution needs', () => {
    const shown = cell('Zn -> Zn(OH)4^2-', 'MnO4^- -> Mn^2+', {
      anode: [{ skeleton: 'Zn -> Zn(OH)4^2-', medium: 'base' }],
      cathode: [{ skeleton: 'MnO4^- -> Mn^2+', medium: 'acid' }],
    });
    expect(find(shown, 'Permanganate in concentrated')?.text).toMatch(/Applies in acid, and when concentrated\.$/);
    expect(find(shown, 'Aluminium, zinc')?.text).toMatch(/Applies in base\.$/);
  });

  test('a half-reaction alone is a cathode where it reduces and an anode where it oxidises', () => {
    const half = (skeleton: string) => cautionsOf({ ask: 'half', skeleton, medium: 'acid' });
    expect(find(half('Cl^- -> Cl2'), 'Chloride at an inert anode')).toBeDefined();
    expect(find(half('Cl2 -> Cl^-'), 'Chloride at an inert anode')).toBeUndefined();
  });

  test('amounts warn of what the charge runs through, at the electrode where it runs', () => {
    const given = { charge: '1 A h' };
    const chlorine = cautionsOf({ ask: 'amounts', half: '2 Cl^- -> Cl2 + 2 e^-', species: 'Cl2', given });
    expect(find(chlorine, 'Chloride at an inert anode')).toBeDefined();
    const zinc = cautionsOf({ ask: 'amounts', half: 'Zn^2+ + 2 e^- -> Zn', species: 'Zn', given });
    expect(find(zinc, 'Heavy-metal')?.because).toEqual(['Zn']);
  });

  test('an overall reaction is warned of without electrodes', () => {
    const shown = cautionsOf({ ask: 'redox', skeleton: 'MnO4^- + Cl^- -> Mn^2+ + Cl2', medium: 'acid' });
    expect(find(shown, 'Acid permanganate oxidises chloride')).toBeDefined();
  });

  test('what is harmless on the page raises nothing but what its medium does', () => {
    expect(cautionsOf({ ask: 'species', text: 'H2O' })).toEqual([]);
    expect(cell('Fe^2+ -> Fe^3+', 'Ce^4+ -> Ce^3+', { medium: 'none' })).toEqual([]);
  });

  test('each caution is said once', () => {
    const texts = starts(cell('Pb + SO4^2- -> PbSO4', 'PbO2 + SO4^2- -> PbSO4', { medium: 'acid' }));
    expect(new Set(texts).size).toBe(texts.length);
    expect(texts.length).toBeGreaterThan(3);
  });
});

describe('gas for each ampere', () => {
  test('hydrogen and oxygen of water, with the air that dilutes the hydrogen', () => {
    // By hand at 25 °C and 101.325 kPa: 7.607 mL/min of H2, half of it O2, 99 times the hydrogen is 0.753 L/min of air.
    const gas = find(cell('OH^- -> O2', 'H2O -> H2', { medium: 'base' }), 'Each ampere');
    expect(gas?.text).toContain('3.8 mL/min of O2 and 7.6 mL/min of H2');
    expect(gas?.text).toContain('About 0.75 L/min of fresh air');
    expect(gas?.text).toContain('local codes decide');
    expect(gas?.because).toEqual(['O2', 'H2']);
  });

  test('parallel reactions share the ampere', () => {
    // Zinc takes 90 %, hydrogen 10 %: a tenth of 7.607 mL/min, and 99 times that is 75 mL/min of air.
    const shares = {
      cathode: [
        { skeleton: 'Zn(OH)4^2- -> Zn', share: '0.9' },
        { skeleton: 'H2O -> H2', share: '0.1' },
      ],
    };
    const gas = find(cell('OH^- -> O2', '', { medium: 'base', ...shares }), 'Each ampere');
    expect(gas?.text).toContain('0.76 mL/min of H2');
    expect(gas?.text).toContain('About 75 mL/min of fresh air');
  });

  test('no gas, no rate; no hydrogen, no air', () => {
    expect(find(cell('Cu -> Cu^2+', 'Ag^+ -> Ag'), 'Each ampere')).toBeUndefined();
    const oxygen = find(cell('H2O -> O2', 'Cu^2+ -> Cu', { medium: 'acid' }), 'Each ampere');
    expect(oxygen?.text).toContain('3.8 mL/min of O2');
    expect(oxygen?.text).not.toContain('air');
  });
});
