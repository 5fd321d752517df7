import { editDistance } from '../report/suggest.ts';

/** A chemical element and its place in the periodic table. */
export interface ChemicalElement {
  readonly symbol: string;
  /** IUPAC name. */
  readonly name: string;
  readonly atomicNumber: number;
  /** 1 to 18; null in the f block (La to Yb, Ac to No), which has no group number. */
  readonly group: number | null;
  /** 1 to 7. */
  readonly period: number;
}

/**
 * Symbols and names in the order of atomic numbers, one period a paragraph.
 * Source: IUPAC periodic table of the elements, 4 May 2022 (from memory of the published table).
 */
const PERIODS: readonly string[] = [
  'H hydrogen, He helium',
  'Li lithium, Be beryllium, B boron, C carbon, N nitrogen, O oxygen, F fluorine, Ne neon',
  'Na sodium, Mg magnesium, Al aluminium, Si silicon, P phosphorus, S sulfur, Cl chlorine, Ar argon',
  'K potassium, Ca calcium, Sc scandium, Ti titanium, V vanadium, Cr chromium, Mn manganese, Fe iron, Co cobalt, ' +
    'Ni nickel, Cu copper, Zn zinc, Ga gallium, Ge germanium, As arsenic, Se selenium, Br bromine, Kr krypton',
  'Rb rubidium, Sr strontium, Y yttrium, Zr zirconium, Nb niobium, Mo molybdenum, Tc technetium, Ru ruthenium, ' +
    'Rh rhodium, Pd palladium, Ag silver, Cd cadmium, In indium, Sn tin, Sb antimony, Te tellurium, I iodine, Xe xenon',
  'Cs caesium, Ba barium, La lanthanum, Ce cerium, Pr praseodymium, Nd neodymium, Pm promethium, Sm samarium, ' +
    'Eu europium, Gd gadolinium, Tb terbium, Dy dysprosium, Ho holmium, Er erbium, Tm thulium, Yb ytterbium, ' +
    'Lu lutetium, Hf hafnium, Ta tantalum, W tungsten, Re rhenium, Os osmium, Ir iridium, Pt platinum, Au gold, ' +
    'Hg mercury, Tl thallium, Pb lead, Bi bismuth, Po polonium, At astatine, Rn radon',
  'Fr francium, Ra radium, Ac actinium, Th thorium, Pa protactinium, U uranium, Np neptunium, Pu plutonium, ' +
    'Am americium, Cm curium, Bk berkelium, Cf californium, Es einsteinium, Fm fermium, Md mendelevium, No nobelium, ' +
    'Lr lawrencium, Rf rutherfordium, Db dubnium, Sg seaborgium, Bh bohrium, Hs hassium, Mt meitnerium, ' +
    'Ds darmstadtium, Rg roentgenium, Cn copernicium, Nh nihonium, Fl flerovium, Mc moscovium, Lv livermorium, ' +
    'Ts tennessine, Og oganesson',
];

/**
 * Group of the element at `place` (from 0) in a period of `size`. The s block fills from the left; what follows is
 * counted back from group 18, and in the long periods the 14 places before group 3 belong to the f block.
 */
const groupAt = (place: number, size: number): number | null => {
  const fromLeft = size === 2 ? 1 : 2;
  if (place < fromLeft) return place + 1;
  const group = 18 - (size - 1 - place);
  return group < 3 ? null : group;
};

const elementsOfPeriod = (text: string, period: number, before: number): readonly ChemicalElement[] =>
  text.split(', ').map((entry, place, all) => {
    const [symbol = '', name = ''] = entry.split(' ');
    return { symbol, name, atomicNumber: before + place + 1, group: groupAt(place, all.length), period };
  });

/** All 118 elements in the order of atomic numbers. */
export const ELEMENTS: readonly ChemicalElement[] = PERIODS.reduce<readonly ChemicalElement[]>(
  (known, text, index) => [...known, ...elementsOfPeriod(text, index + 1, known.length)],
  [],
);

const BY_SYMBOL: ReadonlyMap<string, ChemicalElement> = new Map(ELEMENTS.map((element) => [element.symbol, element]));

/** True where `symbol` is the symbol of an element, in its right case. */
export const isElement = (symbol: string): boolean => BY_SYMBOL.has(symbol);

/** The element with this symbol, or undefined. */
export const elementOf = (symbol: string): ChemicalElement | undefined => BY_SYMBOL.get(symbol);

/** The key of a composition split into mass number and symbol: "2H" is {massNumber: "2", symbol: "H"}. */
export const splitNuclide = (key: string): { readonly massNumber: string | null; readonly symbol: string } => {
  const [, digits = '', symbol = ''] = /^(\d*)(.*)$/.exec(key) ?? [];
  return { massNumber: digits === '' ? null : digits, symbol };
};

const capitalised = (text: string): string => text.slice(0, 1).toUpperCase() + text.slice(1).toLowerCase();

/**
 * Symbols that the writer of `text` may have meant, likeliest first, at most three: the same letters in the right
 * case (fe: Fe, CL: Cl), the symbol of a name or the start of one (Iron: Fe), then symbols of two letters that
 * share the first and symbols one edit away (Xx: Xe).
 */
export const nearestElements = (text: string): readonly string[] => {
  const meant = capitalised(text);
  if (isElement(meant)) return [meant];
  const named = ELEMENTS.filter(({ name }) => name === text.toLowerCase());
  if (named.length > 0) return named.map(({ symbol }) => symbol);
  return ELEMENTS.filter(({ symbol }) => symbol[0] === meant[0] && editDistance(symbol, meant) <= 1)
    .toSorted((a, b) => b.symbol.length - a.symbol.length)
    .slice(0, 3)
    .map(({ symbol }) => symbol);
};
