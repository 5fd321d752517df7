import { ONE, ZERO } from '../exact/rational.ts';
import { type PrintStyle, type PrintedTerm, printReaction, printSpecies, printTerm } from '../notation/print/print.ts';
import { type Piece, type Spelled, piecesOf } from '../notation/print/pieces.ts';
import { readSpecies } from '../species/read.ts';
import type { Look } from './look.ts';

/** Words that are no formula: the names an ask defined. As spelled they print like a row of symbols. */
const namesIn = (plain: string): readonly string[] =>
  (plain.match(/\p{L}[\p{L}\d]*\p{L}|\p{L}/gu) ?? []).filter((word) => !readSpecies(word).ok);

/** What cannot be read is shown as it stands. */
const asItStands = (plain: string): Spelled => {
  const members = [{ kind: 'named', name: plain, members: [], count: ONE } as const];
  return { parts: [{ multiplier: ONE, members }], charge: ZERO, state: null };
};

const withNames = (plain: string, names: readonly string[]): Spelled => {
  const define = {
    members: new Map(names.map((name) => [name, []] as const)),
    spellings: new Set<string>(),
    signature: `as spelled: ${names.join(' ')}`,
  };
  const read = readSpecies(plain, { define });
  return read.ok ? read.value.species : asItStands(plain);
};

/** A canonical species in its parts. */
const spelledOf = (plain: string): Spelled => {
  const read = readSpecies(plain);
  return read.ok ? read.value.species : withNames(plain, namesIn(plain));
};

/** A canonical species cut into what a picture places differently. */
export const speciesPieces = (plain: string): readonly Piece[] => piecesOf(spelledOf(plain));

const TERM = /^(?:(\d[\d./]*) )?(.+)$/s;

const termOf = (plain: string): PrintedTerm => {
  const [, coefficient = '', species = plain] = TERM.exec(plain) ?? [];
  return { coefficient, species: spelledOf(species) };
};

const sideOf = (plain: string): readonly PrintedTerm[] => plain.split(' + ').filter(isWritten).map(termOf);

const isWritten = (text: string): boolean => text.trim() !== '';

/** A canonical species in one of the styles. */
export const styledSpecies = (plain: string, style: PrintStyle): string =>
  style === 'plain' ? plain : printSpecies(spelledOf(plain), style);

/** A canonical reaction in one of the styles. */
export const styledReaction = (plain: string, style: PrintStyle): string => {
  if (style === 'plain') return plain;
  const [left = '', right = ''] = plain.split('->');
  return printReaction({ left: sideOf(left.trim()), right: sideOf(right.trim()) }, style);
};

const styleOf = ({ unicode }: Look): PrintStyle => (unicode ? 'unicode' : 'plain');

/** A canonical species as the look wants it. */
export const speciesText = (plain: string, look: Look): string => styledSpecies(plain, styleOf(look));

/** A term of a canonical reaction, its coefficient with it. */
export const termText = (plain: string, look: Look): string =>
  look.unicode ? printTerm(termOf(plain), 'unicode') : plain;

/** A canonical reaction as the look wants it: coefficients stay on the line. */
export const reactionText = (plain: string, look: Look): string =>
  plain === '' ? 'nothing is left' : styledReaction(plain, styleOf(look));

/** A number that may be negative as the look wants it: with a minus sign, or with a hyphen. */
export const numberText = (plain: string, look: Look): string => (look.unicode ? plain.replace('-', '−') : plain);

/** What e^- is called in headings and counts. */
export const electronText = (look: Look): string => (look.unicode ? 'e⁻' : 'e-');
