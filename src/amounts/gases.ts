import { type Species, plainSpecies } from '../species/species.ts';

/**
 * Formulas that are taken as gases when they carry no state: gases at 25 °C and 1 bar that electrodes make or use
 * (common practice, no source). Anything else must be written with (g).
 */
const GASES: ReadonlySet<string> = new Set(
  (
    'H2 D2 T2 HD ^2H2 ^3H2 O2 O3 N2 F2 Cl2 He Ne Ar Kr Xe Rn CO CO2 COS NO N2O NO2 N2O3 NH3 N2H2 HCl HBr HI HF H2S H2Se ' +
    'SO2 SF6 SO2F2 PH3 AsH3 SbH3 GeH4 SiH4 SiF4 BF3 B2H6 CH4 C2H2 C2H4 C2H6 C3H6 C3H8 C4H10 CF4 C2F6 CHF3 COF2 COCl2 ' +
    'CH3Cl HCN C2N2 (CN)2 ClO2 Cl2O ClF NF3 NOCl OF2'
  ).split(' '),
);

/** Whether a species has a gas volume: written (g), or without a state and in the list. */
export const gasKind = (species: Species): 'written' | 'assumed' | 'no-gas' => {
  if (species.state !== null) return species.state === 'g' ? 'written' : 'no-gas';
  return GASES.has(plainSpecies(species)) ? 'assumed' : 'no-gas';
};
