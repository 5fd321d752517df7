import type { Species } from '../../species/species.ts';
import { type Portion, ionsOfSalt } from './salt.ts';

/*
 * Which salts dissolve and which acids are strong, in water at room temperature. Common practice, no source: the rules
 * that every course of analytical chemistry gives; what they do not name counts as undissolved.
 */
const SOLID_HALIDES = new Set(['Ag^+', 'Hg2^2+', 'Pb^2+', 'Cu^+', 'Tl^+', 'Au^+', 'Pd^2+', 'Pt^2+']);
const SOLID_SULFATES = new Set(['Ba^2+', 'Sr^2+', 'Pb^2+', 'Hg2^2+', 'Ag^+', 'Ca^2+']);
const HALIDES = new Set(['Cl^-', 'Br^-', 'I^-']);
const ALWAYS_DISSOLVED = new Set(
  'NO3^- ClO4^- ClO3^- ClO^- OCl^- CH3COO^- C2H3O2^- SCN^- BF4^- MnO4^- S2O8^2-'.split(' '),
);
const DISSOLVING_CATIONS = new Set('Li^+ Na^+ K^+ Rb^+ Cs^+ NH4^+ N2H5^+ NH3OH^+'.split(' '));
const DISSOLVED_BASES = new Set(['Ba^2+', 'Sr^2+', 'Ca^2+']);
const STRONG_ACIDS = new Set(
  'Cl^- Br^- I^- NO3^- ClO4^- ClO3^- BrO3^- IO3^- SO4^2- HSO4^- MnO4^- CrO4^2- Cr2O7^2- SCN^- BF4^- PF6^- SiF6^2- S2O8^2- AuCl4^- PtCl6^2-'.split(
    ' ',
  ),
);

/** The ions of a salt that dissolves, or of a strong acid or base; null for what stays whole in water. */
export const dissolvedIons = (species: Species): readonly Portion[] | null => {
  const ions = ionsOfSalt(species);
  return ions !== null && dissolves(ions.map((portion) => portion.species.key)) ? ions : null;
};

const dissolves = (keys: readonly string[]): boolean => {
  const others = keys.filter((key) => !DISSOLVING_CATIONS.has(key));
  const meets = (set: ReadonlySet<string>): boolean => others.some((key) => set.has(key));
  const onlyDissolving = others.length < keys.length && !others.some((key) => key.endsWith('+'));
  if (others.includes('O^2-')) return false;
  if (onlyDissolving) return true;
  if (others.includes('H^+')) return meets(STRONG_ACIDS);
  if (others.includes('OH^-')) return meets(DISSOLVED_BASES);
  if (meets(ALWAYS_DISSOLVED)) return true;
  if (meets(HALIDES)) return !meets(SOLID_HALIDES);
  return others.includes('SO4^2-') && !meets(SOLID_SULFATES);
};
