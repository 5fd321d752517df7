import { describe, expect, it } from 'vitest';
import { showRational } from '../../src/exact/rational.ts';
import { dissolvedIons } from '../../src/redox/split/dissolve.ts';
import { ionsOfSalt } from '../../src/redox/split/salt.ts';
import { plainSpecies } from '../../src/species/species.ts';
import { plain } from '../support/plain.ts';

const shown = (text: string): string | null =>
  ionsOfSalt(plain(text))
    ?.map(({ species, count }) => `${showRational(count)} ${plainSpecies(species)}`)
    .join(' + ') ?? null;

describe('the ions of a salt', () => {
  // by hand, from the formulas
  it.each([
    ['NaCl', '1 Na^+ + 1 Cl^-'],
    ['K2Cr2O7', '2 K^+ + 1 Cr2O7^2-'],
    ['KMnO4', '1 K^+ + 1 MnO4^-'],
    ['K2MnO4', '2 K^+ + 1 MnO4^2-'],
    ['FeSO4', '1 Fe^2+ + 1 SO4^2-'],
    ['Fe2(SO4)3', '2 Fe^3+ + 3 SO4^2-'],
    ['H2SO4', '2 H^+ + 1 SO4^2-'],
    ['KHSO4', '1 K^+ + 1 HSO4^-'],
    ['HNO3', '1 H^+ + 1 NO3^-'],
    ['NH4NO3', '1 NH4^+ + 1 NO3^-'],
    ['(NH4)2Cr2O7', '2 NH4^+ + 1 Cr2O7^2-'],
    ['Fe(NH4)2(SO4)2', '1 Fe^2+ + 2 NH4^+ + 2 SO4^2-'],
    ['KAl(SO4)2*12H2O', '1 K^+ + 1 Al^3+ + 2 SO4^2- + 12 H2O'],
    ['CuSO4*5H2O', '1 Cu^2+ + 1 SO4^2- + 5 H2O'],
    ['K4[Fe(CN)6]', '4 K^+ + 1 [Fe(CN)6]^4-'],
    ['K3Fe(CN)6', '3 K^+ + 1 Fe(CN)6^3-'],
    ['CH3COONa', '1 CH3COO^- + 1 Na^+'],
    ['Hg2Cl2', '1 Hg2^2+ + 2 Cl^-'],
    ['HgCl2', '1 Hg^2+ + 2 Cl^-'],
    ['NaClO', '1 Na^+ + 1 ClO^-'],
    ['NaOCl', '1 Na^+ + 1 OCl^-'],
    ['Ca(ClO)2', '1 Ca^2+ + 2 ClO^-'],
    ['Na2O2', '2 Na^+ + 1 O2^2-'],
    ['Na2O', '2 Na^+ + 1 O^2-'],
    ['CaO', '1 Ca^2+ + 1 O^2-'],
    ['NaBiO3', '1 Na^+ + 1 BiO3^-'],
    ['Ba(OH)2', '1 Ba^2+ + 2 OH^-'],
    ['Cu(NH3)4SO4', '1 Cu(NH3)4^2+ + 1 SO4^2-'],
  ])('of %s are %s', (salt, ions) => {
    expect(shown(salt)).toBe(ions);
  });

  it.each([
    'H2O',
    'NH3',
    'CH4',
    'SO2',
    'Fe2O3',
    'Cl2',
    'MnO2',
    'SO3',
    'CuO',
    'LiCoO2',
    'CoO2',
    'C2H5OH',
    'Fe^2+',
    'As2S3',
  ])('are not sought in %s', (text) => {
    expect(shown(text)).toBeNull();
  });
});

describe('what dissolves', () => {
  // from memory: rules of solubility and the strong acids
  it.each([
    'NaCl',
    'K2Cr2O7',
    'FeSO4',
    'HNO3',
    'H2SO4',
    'HCl',
    'KOH',
    'Ba(OH)2',
    'Pb(NO3)2',
    'CuCl2',
    'ZnSO4',
    'Na2S',
    'HClO4',
  ])('%s does', (text) => {
    expect(dissolvedIons(plain(text))).not.toBeNull();
  });

  it.each([
    'AgCl',
    'PbSO4',
    'Hg2Cl2',
    'FeS',
    'Fe(OH)3',
    'H2S',
    'CH3COOH',
    'H3PO4',
    'H2O2',
    'BaSO4',
    'CuI',
    'Fe2O3',
    'H2C2O4',
    'Na2O',
    'CaO',
  ])('%s does not, or stays whole', (text) => {
    expect(dissolvedIons(plain(text))).toBeNull();
  });
});
