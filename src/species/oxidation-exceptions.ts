import { type Rational, ONE, rationalFromText, showRational } from '../exact/rational.ts';
import { compositionKey, countsOf, runOf } from './oxidation-spelling.ts';
import type { Site } from './oxidation-site.ts';

/**
 * Whole species whose numbers the rules would miss: formula, charge: element number, "x" the atoms that have it.
 * Sulfides, ions and complexes after N. N. Greenwood, A. Earnshaw, Chemistry of the Elements, 2nd ed., and P. Karen
 * et al., Pure Appl. Chem. 88 (2016) 831; carbon compounds by counting bonds (from memory).
 */
const BY_COMPOSITION = `
  FeS2 0: Fe 2, S -1; CoS2 0: Co 2, S -1; NiS2 0: Ni 2, S -1; MnS2 0: Mn 2, S -1; CuS2 0: Cu 2, S -1;
  RuS2 0: Ru 2, S -1; OsS2 0: Os 2, S -1; CuFeS2 0: Cu 1, Fe 3, S -2; CuFeO2 0: Cu 1, Fe 3, O -2;
  Cu2ZnSnS4 0: Cu 1, Zn 2, Sn 4, S -2; Cu2FeSnS4 0: Cu 1, Fe 2, Sn 4, S -2; MnFe2O4 0: Mn 2, Fe 3, O -2;
  AgN3 0: Ag 1, N -1/3; CuN3 0: Cu 1, N -1/3; TlN3 0: Tl 1, N -1/3; NH4N3 0: N -3 x1, N -1/3 x3, H 1;
  CuFe2S3 0: Cu 1, Fe 5/2, S -2; WC 0: W 4, C -4;
  Ag2C2 0: Ag 1, C -1; Cu2C2 0: Cu 1, C -1; CrO8 -3: Cr 5, O -1; O2PtF6 0: O 1/2, Pt 5, F -1;
  NO2Cl 0: N 5, O -2, Cl -1; ClCN 0: C 4, N -3, Cl -1; BrCN 0: C 4, N -3, Br -1; ICN 0: C 4, N -3, I -1;
  C2N2S2 0: C 4, N -3, S -1; SiHCl3 0: Si 4, H -1, Cl -1; SiH2Cl2 0: Si 4, H -1, Cl -1; SiH3Cl 0: Si 4, H -1, Cl -1;
  H2NSO3 -1: H 1, N -3, S 6, O -2; H3NSO3 0: H 1, N -3, S 6, O -2;
  Fe7C18N18 0: Fe 3 x4, Fe 2 x3, C 2, N -3; Fe5C12N12 0: Fe 2 x3, Fe 3 x2, C 2, N -3;
  KFe2C6N6 0: K 1, Fe 2 x1, Fe 3 x1, C 2, N -3; NaFe2C6N6 0: Na 1, Fe 2 x1, Fe 3 x1, C 2, N -3;
  FeC5N6O -2: Fe 2, C 2, N -3 x5, N 3 x1, O -2;
  CH3SO3 -1: C -2, H 1, S 4, O -2; CH4SO3 0: C -2, H 1, S 4, O -2; C2H6SO 0: C -2, H 1, S 0, O -2;
  C2H6SO2 0: C -2, H 1, S 2, O -2; C3H7NO2S 0: C 2/3, H 1, N -3, O -2, S -2; C6H12N2O4S2 0: C 2/3, H 1, N -3, O -2, S -1;
  C2H4O2S 0: C 1, H 1, O -2, S -2; C4H6O4S2 0: C 1, H 1, O -2, S -1; C2H8N4S2 2: C 4, H 1, N -3, S -1;
  C2H6N4S2 0: C 4, H 1, N -3, S -1`;

/** Isomers that share a composition with something else: known by their spelling only. */
const BY_SPELLING = `
  ONOO -1: N 3, O -2 x1, O -1 x2; OONO -1: N 3, O -2 x1, O -1 x2;
  CH3COOOH 0: C 0, H 1, O -2 x1, O -1 x2; CH3CO3H 0: C 0, H 1, O -2 x1, O -1 x2;
  CH3SSCH3 0: C -2, H 1, S -1; CH3NO2 0: C -2, H 1, N 3, O -2; C6H5NO2 0: C -2/3, H 1, N 3, O -2; C6H5NO 0: C -2/3, H 1, N 1, O -2;
  C6H5NHOH 0: C -2/3, H 1, N -1, O -2`;

const readSites = (text: string, counts: ReadonlyMap<string, Rational>): readonly Site[] =>
  text.split(',').map((entry) => {
    const [element = '', number = '', times] = entry.trim().split(' ');
    const count = times === undefined ? (counts.get(element) ?? ONE) : rationalFromText(times.slice(1));
    return { element, number: rationalFromText(number), count };
  });

const readTable = (table: string, keyOf: (formula: string) => string): ReadonlyMap<string, readonly Site[]> =>
  new Map(
    table.split(';').map((entry) => {
      const [head = '', tail = ''] = entry.split(':');
      const [formula = '', charge = ''] = head.trim().split(' ');
      return [`${keyOf(formula)} ^${charge}`, readSites(tail, countsOf(runOf(formula)))];
    }),
  );

const COMPOSITIONS = readTable(BY_COMPOSITION, (formula) => compositionKey(countsOf(runOf(formula))));
const SPELLINGS = readTable(BY_SPELLING, (formula) => formula);

/** The listed numbers of a species of this composition and charge, or undefined. */
export const exceptionOf = (counts: ReadonlyMap<string, Rational>, charge: Rational): readonly Site[] | undefined =>
  COMPOSITIONS.get(`${compositionKey(counts)} ^${showRational(charge)}`);

/** The listed numbers of a species spelled exactly so, or undefined. */
export const spelledExceptionOf = (spelling: string, charge: Rational): readonly Site[] | undefined =>
  SPELLINGS.get(`${spelling} ^${showRational(charge)}`);

/** Every listed species with its sites, for checks of the table itself. */
export const EXCEPTIONS: ReadonlyMap<string, readonly Site[]> = new Map([...COMPOSITIONS, ...SPELLINGS]);
