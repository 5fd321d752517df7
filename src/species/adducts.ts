import type { Part } from '../notation/formula.ts';
import { formulaKey } from '../notation/print/formula-text.ts';
import { ONE } from '../exact/rational.ts';

/** Molecules that crystals and adducts hold beside the salt (common practice, no source). */
const ADDUCT_MOLECULES: ReadonlySet<string> = new Set([
  'H2O',
  '{2H}2O',
  'NH3',
  'H2O2',
  'HCl',
  'HF',
  'HBr',
  'HI',
  'H2SO4',
  'HNO3',
  'CH3OH',
  'C2H5OH',
  'CH3CN',
  'C2H6O',
  'C4H10O',
  'C4H8O',
  '(C2H5)2O',
  'C6H6',
  'NaCl',
  'KCl',
  'SO2',
  'BF3',
  'C5H5N',
  'N2H4',
  'C2H6OS',
  '(CH3)2SO',
  'HClO4',
]);

/** True for a part of an adduct that is a molecule such as water, whatever its multiplier. */
export const isAdductMolecule = (part: Part): boolean =>
  ADDUCT_MOLECULES.has(formulaKey([{ ...part, multiplier: ONE }]));
