import { describe, expect, test } from 'vitest';
import { rationalFromText, showRational } from '../../src/exact/rational.ts';
import { foldHydronium } from '../../src/species/hydronium.ts';
import { type ReadingOptions, readDefinitions, readEquation, readSpecies } from '../../src/species/read.ts';
import { plainSpecies, sameSpecies } from '../../src/species/species.ts';

const define = (record: Readonly<Record<string, string>>): ReadingOptions => {
  const result = readDefinitions(record);
  if (!result.ok) throw new Error(result.fault.message);
  return { define: result.value };
};

const read = (text: string, options: ReadingOptions = {}) => {
  const result = readSpecies(text, options);
  if (!result.ok) throw new Error(`${text}: ${result.fault.message}`);
  return result.value.species;
};

const atoms = (text: string, options: ReadingOptions = {}): Readonly<Record<string, string>> =>
  Object.fromEntries([...read(text, options).composition].map(([key, count]) => [key, showRational(count)]));

describe('named species', () => {
  const bath = define({ 'EDTA^4-': 'C10H12N2O8^4-', en: 'C2H8N2', 'acac^-': 'C5H7O2^-' });

  test('stand for the atoms of their formula, with the charge that is written', () => {
    expect(atoms('Cu(EDTA)^2-', bath)).toEqual({ Cu: '1', C: '10', H: '12', N: '2', O: '8' });
    expect(plainSpecies(read('Cu(EDTA)^2-', bath))).toBe('Cu(EDTA)^2-');
    expect(atoms('[Co(en)3]3+', bath)).toEqual({ Co: '1', C: '6', H: '24', N: '6' });
    expect(plainSpecies(read('[Co(en)3]3+', bath))).toBe('[Co(en)3]^3+');
    expect(atoms('Fe(acac)3', bath)).toEqual({ Fe: '1', C: '15', H: '21', O: '6' });
  });

  test('take the charge of their definition where a digit could be a count', () => {
    expect(plainSpecies(read('EDTA4-', bath))).toBe('EDTA^4-');
  });

  test('are the same species as their formula', () => {
    expect(sameSpecies(read('EDTA^4-', bath), read('C10H12N2O8^4-'))).toBe(true);
  });

  test('are unknown where they are not defined', () => {
    const result = readSpecies('Cu(EDTA)^2-');
    if (result.ok) throw new Error('it was read');
    expect(result.fault.code).toBe('unknown-element');
  });

  test.each([
    ['an element', { Co: 'C2H4' }],
    ['an element with a charge', { 'Fe^2+': 'C2H4^2+' }],
    ['a formula', { CN: 'C2H4' }],
    ['the electron', { 'e^-': 'Cl^-' }],
    ['an unknown subscript', { x: 'H2' }],
    ['a state', { aq: 'H2O' }],
    ['another charge than its formula', { 'EDTA^4-': 'C10H12N2O8^3-' }],
    ['a charge that its formula has not', { EDTA: 'C10H12N2O8^4-' }],
    ['no name', { '4-': 'Cl^4-' }],
    ['an adduct', { salt: 'CuSO4*5H2O' }],
    ['two formulas', { 'EDTA^4-': 'C10H12N2O8^4-', 'EDTA^3-': 'C10H13N2O8^3-' }],
  ])('are refused where the name is %s', (_, record) => {
    const result = readDefinitions(record);
    if (result.ok) throw new Error('it was taken');
    expect(result.fault.code).toBe('bad-ask');
    expect(result.fault.field).toMatch(/^define\./u);
  });

  test('pass on the fault of a formula that cannot be read', () => {
    const result = readDefinitions({ 'EDTA^4-': 'C10Xx^4-' });
    if (result.ok) throw new Error('it was taken');
    expect(result.fault).toMatchObject({ code: 'unknown-element', span: { from: 3, to: 5 }, field: 'define.EDTA^4-' });
  });
});

describe('unknown subscripts', () => {
  const where = new Map([['x', rationalFromText('0.4')]]);

  test.each([
    ['Li(1-x)CoO2', 'Li0.6CoO2'],
    ['Li1-xCoO2', 'Li0.6CoO2'],
    ['Li₁₋ₓCoO₂', 'Li0.6CoO2'],
    ['CuxS', 'Cu0.4S'],
    ['Cu(2-x)S', 'Cu1.6S'],
    ['Cu2-xS', 'Cu1.6S'],
    ['Na2xMnO2', 'Na0.8MnO2'],
    ['LiNi1-x/2O2', 'LiNi0.8O2'],
    ['Li1+xMn2O4', 'Li1.4Mn2O4'],
    ['WO3-x', 'WO2.6'],
    ['V2O5*xH2O', 'V2O5*0.4H2O'],
  ])('%s with x = 0.4 is %s', (text, expected) => {
    expect(plainSpecies(read(text, { where }))).toBe(expected);
  });

  test('of an alkane come out whole', () => {
    const n = { where: new Map([['n', rationalFromText('10')]]) };
    expect(plainSpecies(read('C(n)H(2n+2)', n))).toBe('C10H22');
  });

  test('may have any name that is given a value', () => {
    const q = { where: new Map([['q', rationalFromText('3')]]) };
    expect(plainSpecies(read('Fe(q)O4', q))).toBe('Fe3O4');
  });

  test('that come out 0 leave the atom out; below 0 they are a fault', () => {
    const one = { where: new Map([['x', rationalFromText('1')]]) };
    expect(plainSpecies(read('Li1-xCoO2', one))).toBe('CoO2');
    const two = readSpecies('Li1-xCoO2', { where: new Map([['x', rationalFromText('2')]]) });
    if (two.ok) throw new Error('it was read');
    expect(two.fault.code).toBe('bad-count');
  });

  test('cannot take the letter of the electron, and a name that is no word changes nothing', () => {
    const odd = { where: new Map(['e', '(', '', '[', 'x|y', '^', 'H'].map((name) => [name, rationalFromText('2')])) };
    expect(plainSpecies(read('e-', odd))).toBe('e^-');
    expect(plainSpecies(read('Fe(OH)3', odd))).toBe('Fe(OH)3');
    const result = readEquation('HO2^- + H2O + 2 e- -> 3 OH-', odd);
    if (!result.ok) throw new Error(result.fault.message);
    expect(result.value.left.map(({ species }) => plainSpecies(species))).toEqual(['HO2^-', 'H2O', 'e^-']);
  });

  test('without a value are named in the fault', () => {
    const result = readSpecies('CuxS');
    if (result.ok) throw new Error('it was read');
    expect(result.fault).toMatchObject({ code: 'bad-count', span: { from: 2, to: 3 } });
    expect(result.fault.message).toContain('x');
    expect(result.fault.hint).toContain('where');
  });
});

describe('the same species', () => {
  test.each([
    ['[Fe(CN)6]^3-', 'Fe(CN)6^3-', true],
    ['[Fe(CN)6]^3-', '(Fe(CN)6)^3-', true],
    ['D2O', '[2H]2O', true],
    ['D2O', 'H2O', false],
    ['H2O(l)', 'H2O', true],
    ['H2O(l)', 'H2O(g)', false],
    ['H3O^+', 'H^+', false],
    ['CH3CH2OH', 'C2H5OH', false],
    ['CuSO4*5H2O', 'CuSO4·5H2O', true],
    ['Fe^2+', 'Fe^3+', false],
    ['[Co(NH3)6]^3+', 'Co(NH3)6 3+', true],
  ])('%s and %s: %s', (a, b, expected) => {
    expect(sameSpecies(read(a), read(b))).toBe(expected);
  });

  test('hydronium is folded into H^+ and water for those who ask', () => {
    const result = readEquation('2 H3O^+ + 2 e^- -> H2 + 2 H2O');
    if (!result.ok) throw new Error(result.fault.message);
    const { left } = foldHydronium(result.value);
    expect(left.map(({ coefficient, species }) => `${showRational(coefficient)} ${plainSpecies(species)}`)).toEqual([
      '2 H^+',
      '2 H2O',
      '2 e^-',
    ]);
  });
});

describe('hints', () => {
  test.each([
    ['fe2+', 'Fe^2+'],
    ['CL-', 'Cl^-'],
    ['Mno4-', 'MnO4^-'],
    ['SO4^2', '^2+'],
    ['\u0421O2', 'U+0421'],
    ['\u0662H', 'ARABIC-INDIC DIGIT TWO'],
    ['H\u200b2', 'ZERO WIDTH SPACE'],
    ['\u202eH2', 'RIGHT-TO-LEFT OVERRIDE'],
  ])('for %j name %s', (text, expected) => {
    const result = readSpecies(text);
    if (result.ok) throw new Error('it was read');
    expect(result.fault.hint).toContain(expected);
  });
});

test('beyond the limits a text is refused at once', () => {
  const code = (text: string): string => {
    const result = readEquation(text);
    return result.ok ? 'ok' : result.fault.code;
  };
  expect(code('H'.repeat(200_000))).toBe('too-long');
  expect(code(`${'H'.repeat(1001)} -> H`)).toBe('too-long');
  expect(code(`H${'1'.repeat(41)} -> H`)).toBe('too-long');
  expect(code(`${'('.repeat(33)}H${')'.repeat(33)} -> H`)).toBe('too-hard');
  expect(code(`${'H2.5'.repeat(6)} -> H`)).toBe('too-hard');
  expect(code(`${'H2+2'.repeat(200)}H -> H`)).toBe('too-hard');
});

test('the same text is read once: the very same answer comes again', () => {
  const first = readSpecies('Cr2O7^2-');
  expect(readSpecies('Cr2O7^2-')).toBe(first);
});
