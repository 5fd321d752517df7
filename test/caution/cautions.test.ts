import { describe, expect, test } from 'vitest';
import { type Caution, cautionsFor } from '../../src/caution/cautions.ts';
import { mediaOf } from '../../src/caution/scene.ts';
import { mediumRow } from '../../src/redox/media.ts';
import { readSpecies } from '../../src/species/read.ts';
import { plain } from '../support/plain.ts';
import { type Run, sceneOf } from './scene-of.ts';

const cautionsOf = (run: Run): readonly Caution[] => cautionsFor(sceneOf(run));
const naming = (run: Run, word: string): readonly string[] =>
  cautionsOf(run).flatMap(({ text }) => (text.includes(word) ? [text] : []));

describe('matching of species', () => {
  test('a missing state matches any, two that differ do not', () => {
    expect(naming({ anode: '2 Br^- -> Br2 + 2 e^-' }, 'Bromine')).toHaveLength(1);
    expect(naming({ anode: '2 Br^- -> Br2(l) + 2 e^-' }, 'Bromine')).toHaveLength(1);
    expect(naming({ anode: '2 Br^- -> Br2(g) + 2 e^-' }, 'Bromine')).toHaveLength(0);
  });

  test('a charge that differs is another species', () => {
    expect(naming({ cathode: 'MnO4^2- + 2 H2O + 2 e^- -> MnO2 + 4 OH^-', medium: 'acid' }, 'Permanganate')).toEqual([]);
  });

  test('an outer pair of brackets makes no difference', () => {
    expect(naming({ cathode: '[Ag(CN)2]^- + e^- -> Ag + 2 CN^-', medium: 'acid' }, 'Cyanide below')).toHaveLength(1);
  });

  test('isotopes are as dangerous as their element', () => {
    const species = ['D2', '^235U', 'DT'].map((text) => {
      const read = readSpecies(text);
      if (!read.ok) throw new Error(text);
      return read.value.species;
    });
    const nothing = { reactants: [], products: [] };
    const texts = cautionsFor({ ...sceneOf({}), overall: { ...nothing, products: species } }).map(({ text }) => text);
    expect(texts.some((text) => text.startsWith('Hydrogen collects'))).toBe(true);
    expect(texts.some((text) => text.startsWith('These elements are radioactive'))).toBe(true);
  });

  test('names each species that raised a caution once, and the element where that did', () => {
    const [caution] = cautionsOf({ anode: 'Ni -> Ni^2+ + 2 e^-', overall: 'Ni -> Ni^2+ + 2 e^-' });
    expect(caution?.because).toEqual(['Ni']);
    const azide = cautionsOf({ overall: '2 N3^- + Cu^2+ -> 3 N2 + Cu' }).find(({ text }) => text.includes('Azide'));
    expect(azide?.because).toEqual(['N3^-', 'Cu']);
  });

  test('a watery medium holds water that no reaction uses; an unknown one may', () => {
    const metal = { cathode: 'Na^+ + e^- -> Na' };
    expect(naming({ ...metal, medium: 'neutral' }, 'react with water')).toHaveLength(1);
    expect(naming({ ...metal, medium: 'molten-chloride' }, 'react with water')).toHaveLength(0);
    expect(naming(metal, 'react with water').map((text) => text.split('. ').at(-1))).toEqual([
      'Applies where water is present.',
    ]);
  });

  test('says nothing of the anode for what runs at the cathode', () => {
    expect(naming({ anode: '2 Cl^- -> Cl2 + 2 e^-' }, 'inert anode')).toHaveLength(1);
    expect(naming({ cathode: 'Cl2 + 2 e^- -> 2 Cl^-' }, 'inert anode')).toHaveLength(0);
  });
});

describe('what the scene leaves open', () => {
  const cyanide = { cathode: 'Ag(CN)2^- + e^- -> Ag + 2 CN^-' };

  test('an unknown medium is a condition with a name', () => {
    expect(naming(cyanide, 'Cyanide below')[0]).toMatch(/authorisation\. Applies in acid or in neutral solution\.$/);
  });

  test('two electrodes in two media name the one that matters', () => {
    const scene = { ...sceneOf(cyanide), media: ['acid', 'base'] as const };
    const texts = cautionsFor(scene).map(({ text }) => text);
    expect(texts.filter((text) => text.includes('Applies in acid.'))).toHaveLength(1);
    expect(texts.filter((text) => text.includes('Applies in base.'))).toHaveLength(1);
    expect(texts.filter((text) => text.includes('melt'))).toHaveLength(0);
  });

  test('an unknown mode is a condition with a name', () => {
    expect(naming({ anode: '2 Cl^- -> Cl2 + 2 e^-' }, 'inert anode')[0]).toMatch(
      /Applies in electrolysis or on charging\.$/,
    );
  });

  test('a separator settles what an undivided cell would do', () => {
    const water = { cathode: '2 H2O + 2 e^- -> H2 + 2 OH^-', anode: '4 OH^- -> O2 + 2 H2O + 4 e^-' };
    expect(naming(water, 'undivided')[0]).toMatch(/Applies in an undivided cell\.$/);
    expect(naming({ ...water, divided: false }, 'undivided')[0]).toMatch(/store the mixed gas\.$/);
    expect(naming({ ...water, divided: true }, 'undivided')).toEqual([]);
  });
});

describe('order', () => {
  test('a cyanide tank in acid, chlorine from chloride, hydrogen with oxygen undivided come first', () => {
    const first = (run: Run): string => cautionsOf(run)[0]?.text ?? '';
    expect(first({ cathode: 'Cd(CN)4^2- + 2 e^- -> Cd + 4 CN^-', medium: 'acid' })).toMatch(/^Cyanide below/);
    expect(first({ anode: '2 Cl^- -> Cl2 + 2 e^-', cathode: 'Ni^2+ + 2 e^- -> Ni', medium: 'acid' })).toMatch(
      /^Chloride at an inert anode/,
    );
    const water = { cathode: '2 H2O + 2 e^- -> H2 + 2 OH^-', anode: '4 OH^- -> O2 + 2 H2O + 4 e^-' };
    const two = cautionsOf({ ...water, medium: 'base', divided: false }).slice(0, 2);
    expect(two.map(({ text }) => text.slice(0, 20))).toEqual(['Hydrogen burns in ai', 'An undivided water e']);
  });

  test('what holds as it stands comes before what depends on a condition', () => {
    const texts = cautionsOf({ cathode: 'Ni^2+ + 2 e^- -> Ni', medium: 'acid' }).map(({ text }) => text);
    const open = texts.map((text) => text.includes('Applies '));
    expect(open).toEqual([...open].sort());
    expect(open).toContain(true);
    expect(open).toContain(false);
  });

  test('no caution is said twice', () => {
    const texts = cautionsOf({
      anode: 'Pb + 2 Cl^- -> PbCl2 + 2 e^-',
      cathode: 'Pb^2+ + 2 e^- -> Pb',
      overall: 'Pb + Pb^2+ + 2 Cl^- -> PbCl2 + Pb',
      medium: 'acid',
    }).map(({ text }) => text);
    expect(new Set(texts).size).toBe(texts.length);
  });
});

describe('the medium of a scene', () => {
  const named = (name: string) => mediaOf(mediumRow(name) ?? null, []);
  const told = (...species: readonly string[]) => mediaOf(null, species.map(plain));

  test.each([
    ['acid', ['acid']],
    ['base', ['base']],
    ['neutral', ['neutral']],
    ['bicarbonate', ['neutral']],
    ['ammonia', ['nonaqueous']],
    ['molten-chloride', ['molten']],
    ['molten-oxide', ['molten']],
    ['molten-carbonate', ['molten']],
    ['none', []],
  ])('%s counts as %j', (name, media) => {
    expect(named(name)).toEqual(media);
  });

  test('helpers of a list and species tell it where no name does', () => {
    const list = (...helpers: readonly string[]) => mediaOf({ name: null, helpers: helpers.map(plain) }, []);
    expect(list('CN^-', 'H2O', 'OH^-')).toEqual(['base']);
    expect(list('H2O', 'H^+')).toEqual(['acid']);
    expect(list('H2O', 'CN^-')).toEqual(['acid', 'base', 'neutral']);
    expect(list('Cl^-')).toEqual([]);
    expect(told('H3O^+', 'Cu^2+')).toEqual(['acid']);
    expect(told('Cu^2+(aq)')).toEqual(['acid', 'base', 'neutral']);
    expect(told('H2O(g)', 'O^2-')).toEqual([]);
    expect(told('H^+', 'OH^-')).toEqual(['acid', 'base', 'neutral']);
  });
});
