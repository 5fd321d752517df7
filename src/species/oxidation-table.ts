import { elementOf } from '../elements/table.ts';

/**
 * Per element: the lowest and highest oxidation number that a formula may show, then the numbers that it commonly has
 * beside oxygen and sulfur. General chemistry, after N. N. Greenwood, A. Earnshaw, Chemistry of the Elements, 2nd ed.
 * (from memory). Where two common numbers of one metal would leave every mixed oxide open, only the one that stands in
 * minerals is listed (Ti 4, Cr 3 and 6); permanganate is known as an ion.
 */
const TABLE = `
  H -1 1: 1; B -1 3: 3; C -4 4: 4; N -3 5: 3 5; O -2 2: -2; F -1 0: -1; Si -4 4: 4; P -3 5: 3 5; S -2 6: 4 6;
  Cl -1 7: 1 3 5 7; Ge -4 4: 4; As -3 5: 3 5; Se -2 6: 4 6; Br -1 7: 1 3 5 7; Sb -3 5: 3 5; Te -2 6: 4 6;
  I -1 7: 1 3 5 7; Kr 0 2: 2; Xe 0 8: 2 4 6 8; Al 0 3: 3; Ga 0 3: 3; In 0 3: 3; Tl 0 3: 1 3; Sn -4 4: 2 4; Pb -4 4: 2 4;
  Bi -3 5: 3 5; Sc 0 3: 3; Ti 0 4: 4; V 0 5: 3 4 5; Cr 0 6: 3 6; Mn 0 7: 2 3 4; Fe 0 6: 2 3; Co 0 4: 2 3; Ni 0 4: 2 3;
  Cu 0 3: 1 2; Zn 0 2: 2; Y 0 3: 3; Zr 0 4: 4; Nb 0 5: 5; Mo 0 6: 4 6; Tc 0 7: 4 7; Ru 0 8: 3 4; Rh 0 6: 3 4; Pd 0 4: 2 4;
  Ag 0 3: 1; Cd 0 2: 2; Hf 0 4: 4; Ta 0 5: 5; W 0 6: 6; Re 0 7: 4 7; Os 0 8: 4 8; Ir 0 6: 3 4; Pt 0 6: 2 4; Au -1 5: 1 3;
  Hg 0 2: 1 2; La 0 3: 3; Ce 0 4: 3 4; Pr 0 4: 3 4; Nd 0 4: 3; Pm 0 3: 3; Sm 0 3: 3; Eu 0 3: 2 3; Gd 0 3: 3; Tb 0 4: 3 4;
  Dy 0 4: 3; Ho 0 3: 3; Er 0 3: 3; Tm 0 3: 3; Yb 0 3: 3; Lu 0 3: 3; Ac 0 3: 3; Th 0 4: 4; Pa 0 5: 5; U 0 6: 4 6;
  Np 0 7: 4 5; Pu 0 7: 4; Am 0 7: 3; Cm 0 4: 3; Bk 0 4: 3 4; Cf 0 4: 3`;

interface Row {
  readonly lowest: number;
  readonly highest: number;
  readonly common: readonly bigint[];
}

const readRow = (text: string): readonly [string, Row] => {
  const [head = '', tail = ''] = text.split(':');
  const [symbol = '', lowest, highest] = head.trim().split(' ');
  return [symbol, { lowest: Number(lowest), highest: Number(highest), common: tail.trim().split(' ').map(BigInt) }];
};

const ROWS: ReadonlyMap<string, Row> = new Map(TABLE.split(';').map(readRow));

const NONMETALS: ReadonlySet<string> = new Set(
  'H He B C N O F Ne Si P S Cl Ar Ge As Se Br Kr Te I Xe At Rn'.split(' '),
);

const HALOGENS: ReadonlySet<string> = new Set(['F', 'Cl', 'Br', 'I', 'At']);

/** True for metals; boron, silicon, germanium, arsenic and tellurium count as nonmetals here. */
export const isMetal = (symbol: string): boolean => !NONMETALS.has(symbol);

export const isHalogen = (symbol: string): boolean => HALOGENS.has(symbol);

/** The number an element has in every compound: 1 in group 1, 2 in group 2, 3 for aluminium; hydrogen has none. */
export const fixedNumber = (symbol: string): bigint | undefined => {
  const group = elementOf(symbol)?.group;
  if (symbol === 'Al') return 3n;
  return symbol !== 'H' && (group === 1 || group === 2) ? BigInt(group) : undefined;
};

/** The lowest and highest number that a compound may show. Group 1 and 2: 0 to the group; unknown elements: 0 to 8. */
export const boundsOf = (symbol: string): { readonly lowest: number; readonly highest: number } =>
  ROWS.get(symbol) ?? { lowest: 0, highest: Number(fixedNumber(symbol) ?? 8n) };

/** The common numbers beside oxygen and sulfur; none where none is tabulated. */
export const commonNumbers = (symbol: string): readonly bigint[] => {
  const fixed = fixedNumber(symbol);
  return fixed === undefined ? (ROWS.get(symbol)?.common ?? []) : [fixed];
};

/** Hydrogen is hydridic (-1) beside these alone: metals, B, Si, Ge; not beside Sb, Bi and Po, as SbH3 is read. */
export const isHydrideFormer = (symbol: string): boolean =>
  (isMetal(symbol) && !['Sb', 'Bi', 'Po'].includes(symbol)) || ['B', 'Si', 'Ge'].includes(symbol);

/** The number of the element as the more electronegative partner, group minus 18 (8 - N rule): S -2, N -3, Cl -1. */
export const anionNumber = (symbol: string): bigint | undefined => {
  const group = elementOf(symbol)?.group;
  const able = ['N', 'C', 'Si', 'Ge', 'P', 'As', 'Sb', 'S', 'Se', 'Te', 'Cl', 'Br', 'I', 'At'].includes(symbol);
  return able && typeof group === 'number' ? BigInt(group - 18) : undefined;
};
