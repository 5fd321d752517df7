import { describe, expect, it } from 'vitest';
import { speciesMatrix } from '../../src/balance/matrix.ts';
import { rankOf } from '../../src/exact/matrix.ts';
import { chooseMedium } from '../../src/redox/choose-medium.ts';
import { MEDIA } from '../../src/redox/media.ts';
import type { Fault } from '../../src/report/fault.ts';
import { readEquation, readSpecies } from '../../src/species/read.ts';
import { plainSpecies } from '../../src/species/species.ts';
import { plain, plainEquation } from '../support/plain.ts';
import { faultWith, half } from '../support/redox.ts';

type Choice = { readonly name: string | null; readonly notes: readonly string[] } | Fault;

const choose = (skeleton: string, medium?: string): Choice => {
  const result = chooseMedium(medium, plainEquation(skeleton));
  return result.ok ? { name: result.value.name, notes: result.notes.map(({ code }) => code) } : result.fault;
};

describe('the built-in media', () => {
  it('lend the helpers that the trade expects', () => {
    const lent = Object.fromEntries(MEDIA.map(({ name, helpers }) => [name, helpers.map(plainSpecies)]));
    expect(lent).toMatchObject({
      acid: ['H2O', 'H^+'],
      base: ['H2O', 'OH^-'],
      none: [],
      'molten-chloride': ['Cl^-'],
      'molten-oxide': ['O^2-'],
      'molten-carbonate': ['CO3^2-', 'CO2'],
      'molten-fluoride': ['F^-'],
      'molten-nitride': ['N^3-'],
      ammonia: ['NH3', 'NH4^+', 'NH2^-'],
    });
  });

  it('spell their helpers as they are read', () => {
    for (const helper of MEDIA.flatMap(({ helpers }) => helpers)) {
      const reading = readSpecies(plainSpecies(helper));
      expect(reading.ok && reading.value.species).toMatchObject({ key: helper.key, formula: helper.formula });
      expect(plain(plainSpecies(helper)).composition).toEqual(helper.composition);
    }
  });

  it('print a preference exactly where their helpers depend on one another', () => {
    for (const { helpers, preference } of MEDIA) {
      const dependent = helpers.length > 0 && rankOf(speciesMatrix(helpers).rows) < helpers.length;
      expect(preference !== undefined).toBe(dependent);
    }
  });

  it('settle dependent helpers by their preference, with a note', () => {
    expect(half('CO2 -> CO', 'bicarbonate')).toMatchObject({ dimension: 1, notes: ['medium-preference'] });
    expect(half('Cu^2+ -> Cu', 'bicarbonate')).toMatchObject({ dimension: 1, notes: [] });
    expect(half('H2 + NH2^- -> NH3', 'ammonia')).toMatchObject({
      reaction: 'H2 + 2 NH2^- -> 2 NH3 + 2 e^-',
      notes: ['medium-preference'],
    });
  });
});

describe('choosing a medium', () => {
  it('takes the one that is named', () => {
    expect(choose('Cu^2+ -> Cu', 'base')).toEqual({ name: 'base', notes: [] });
  });

  it('takes acid or base from the text, with a note', () => {
    expect(choose('NO3^- + H^+ -> NO')).toEqual({ name: 'acid', notes: ['medium-from-text'] });
    expect(choose('Zn -> ZnO + OH^-')).toEqual({ name: 'base', notes: ['medium-from-text'] });
  });

  it('takes acid where nothing is said, with a note', () => {
    expect(choose('Cu^2+ -> Cu')).toEqual({ name: 'acid', notes: ['medium-assumed'] });
  });

  it('refuses to guess where both H^+ and OH^- are written, and points at the later one', () => {
    const skeleton = readEquation('H^+ + MnO4^- -> MnO2 + OH^-');
    const result = skeleton.ok ? chooseMedium(undefined, skeleton.value) : skeleton;
    expect(result).toMatchObject({ ok: false, fault: { code: 'bad-ask', span: { from: 23, to: 27 } } });
  });

  it('names what was meant by an unknown medium', () => {
    expect(choose('Cu^2+ -> Cu', 'acdi')).toMatchObject({
      code: 'unknown-medium',
      field: 'medium',
      span: { from: 0, to: 4 },
    });
    expect(faultWith(choose('Cu^2+ -> Cu', 'alkalin'), 'unknown-medium').hint).toMatch(/^Did you mean base\?/);
    expect(faultWith(choose('Cu^2+ -> Cu', ''), 'unknown-medium').span).toEqual({ from: 0, to: 0 });
  });

  it('takes exactly the helpers of a list, each once, and no electron', () => {
    const skeleton = plainEquation('Cu^2+ -> Cu');
    const listed = chooseMedium({ helpers: [plain('CN^-'), plain('H2O'), plain('CN^-')] }, skeleton);
    expect(listed.ok && listed.value.helpers.map(plainSpecies)).toEqual(['CN^-', 'H2O']);
    expect(chooseMedium({ helpers: [plain('e^-')] }, skeleton)).toMatchObject({ fault: { code: 'bad-ask' } });
  });
});

describe('a neutral medium', () => {
  it('adds OH^- to both sides where H^+ would stand on the left', () => {
    expect(half('MnO4^- -> MnO2', 'neutral')).toMatchObject({ reaction: 'MnO4^- + 2 H2O + 3 e^- -> MnO2 + 4 OH^-' });
  });

  it('keeps H^+ that forms, and H^+ that is written', () => {
    expect(half('Mn^2+ -> MnO2', 'neutral')).toMatchObject({ reaction: 'Mn^2+ + 2 H2O -> MnO2 + 4 H^+ + 2 e^-' });
    expect(half('H^+ -> H2', 'neutral')).toMatchObject({ reaction: '2 H^+ + 2 e^- -> H2' });
  });

  it('lets written water end on either side', () => {
    expect(half('O2 -> H2O', 'neutral')).toMatchObject({ reaction: 'O2 + 2 H2O + 4 e^- -> 4 OH^-' });
    expect(half('MnO4^- + H2O -> MnO2', 'neutral')).toMatchObject({
      reaction: 'MnO4^- + 2 H2O + 3 e^- -> MnO2 + 4 OH^-',
    });
  });

  it('says so where written water folds away', () => {
    expect(half('H2O2 -> H2O', 'neutral')).toMatchObject({
      reaction: 'H2O2 + 2 e^- -> 2 OH^-',
      notes: ['species-dropped'],
    });
  });

  it('balances with OH^- where that is written', () => {
    expect(half('MnO4^- -> MnO2 + OH^-', 'neutral')).toMatchObject({
      reaction: 'MnO4^- + 2 H2O + 3 e^- -> MnO2 + 4 OH^-',
      dimension: 1,
    });
  });
});
