import { type Rational, rationalFromText } from '../exact/rational.ts';
import { type Run, compositionKey, countsOf, runOf } from './oxidation-spelling.ts';

/** An ion or ligand that keeps its charge wherever a formula shows it. */
export interface KnownGroup {
  /** Spellings by which it is recognised without brackets; none for what only brackets make sure. */
  readonly runs: readonly Run[];
  /** In brackets (or under a defined name) it is recognised by composition. */
  readonly key: string;
  readonly counts: ReadonlyMap<string, Rational>;
  readonly charge: Rational;
  /** Carbon or nitrogen groups that an organic formula may show by chance: looked for beside metals and ammonium only. */
  readonly inSaltsOnly: boolean;
}

/**
 * Charge, then ions with that charge, each by its spellings. In `BRACKETED` stand those that unbracketed letters do not
 * make sure: CO, NH3, azide (N3 in C3N3Cl3 is none), hypohalites (OCl in FeOCl is none). Common inorganic ions after the IUPAC Red Book
 * 2005, table IX; ligands of plating and analysis, common practice.
 */
const OXOANIONS = `
  -1 ClO4; -1 ClO3; -1 ClO2; -1 BrO4; -1 BrO3; -1 IO4; -1 IO3; -5 IO6; -1 NO3; -1 MnO4; -1 TcO4; -1 ReO4;
  -1 NH2SO3 SO3NH2; -2 S2O8; -2 S4O6; -2 S3O6; -2 S5O6; -2 S2O7; -2 S2O6; -2 S2O5; -2 S2O4; -2 S2O3; -2 SO5; -2 SO4;
  -2 SO3; -2 SeO4; -2 SeO3; -2 TeO4; -2 TeO3; -6 TeO6; -2 Cr2O7; -2 CrO4; -2 MoO4; -2 WO4; -3 VO4; -5 P3O10; -4 P2O7;
  -3 PO4; -2 HPO3; -1 H2PO2 PO2H2; -3 AsO4; -3 AsO3; -2 B4O7; -3 BO3; -4 SiO4; -2 SiO3; -1 BF4; -1 PF6; -1 AsF6;
  -1 SbF6; -2 SiF6; -1 BH4; 1 NH4; 1 N2H5; 2 N2H6`;

const SALT_IONS = `
  -1 NO2; -1 SCN NCS CNS; -1 SeCN NCSe; -1 OCN NCO CNO; -1 CN NC; -2 C2O4; -2 CO3; -1 HCOO HCO2 CHO2;
  -1 CH3COO CH3CO2 C2H3O2 OOCCH3 O2CCH3; -1 CH3SO3; -1 C3H5O3; -1 C6H11O7; -2 C4H4O6; -3 C6H5O7; -4 C10H12N2O8;
  -1 NH2CH2COO C2H4NO2; -1 C5H7O2; -1 C5H5; 1 CH3NH3`;

const BRACKETED = `
  -1 ClO; -1 BrO; -1 IO; -1 NH2; -1 N3; -2 O2; 0 CO; 0 NH3; 0 N2H4; 0 N2; 0 C2H8N2; 0 C4H13N3; 0 C6H18N4; 0 C5H5N;
  0 C10H8N2; 0 C12H8N2; 0 CH4N2S; 0 CH4N2O; 0 C2H3N; 0 C6H15NO3; 0 C2H6OS; 0 CH4O; 0 C2H6O; 0 H2O;
  1 C4H12N; 1 C8H20N; 1 C16H36N`;

const readGroups = (table: string, spelled: boolean, inSaltsOnly: boolean): readonly KnownGroup[] =>
  table.split(';').map((entry) => {
    const [charge = '', ...spellings] = entry.trim().split(/\s+/);
    const runs = spellings.map(runOf);
    const counts = countsOf(runs[0] ?? []);
    const key = compositionKey(counts);
    return { runs: spelled ? runs : [], key, counts, charge: rationalFromText(charge), inSaltsOnly };
  });

/** All known ions and ligands. Longer runs stand before shorter ones that they hold (SCN before CN). */
export const KNOWN_GROUPS: readonly KnownGroup[] = [
  ...readGroups(OXOANIONS, true, false),
  ...readGroups(SALT_IONS, true, true),
  ...readGroups(BRACKETED, false, true),
];
