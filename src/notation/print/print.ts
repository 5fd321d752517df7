import { htmlPiece } from './html.ts';
import { latexPiece } from './latex.ts';
import { mathmlSpecies } from './mathml.ts';
import { type Piece, type Spelled, piecesOf } from './pieces.ts';
import { plainPiece } from './plain.ts';
import { unicodePiece } from './unicode.ts';

/** The ways to write a species: canonical plain text, Unicode, HTML, plain LaTeX math, MathML. */
export type PrintStyle = 'plain' | 'unicode' | 'html' | 'latex' | 'mathml';

/** A term of a reaction: its coefficient as text, "" for 1 ("5", "1/2"), and its species. */
export interface PrintedTerm {
  readonly coefficient: string;
  readonly species: Spelled;
}

/** A reaction to print, with the terms of both sides in order. */
export interface PrintedReaction {
  readonly left: readonly PrintedTerm[];
  readonly right: readonly PrintedTerm[];
}

const PIECES: Readonly<Record<Exclude<PrintStyle, 'mathml'>, (piece: Piece, before: Piece | undefined) => string>> = {
  plain: plainPiece,
  unicode: unicodePiece,
  html: htmlPiece,
  latex: latexPiece,
};

const speciesInside = (species: Spelled, style: PrintStyle): string =>
  style === 'mathml'
    ? mathmlSpecies(species)
    : piecesOf(species)
        .map((piece, index, all) => PIECES[style](piece, all[index - 1]))
        .join('');

const wrapped = (inside: string, style: PrintStyle): string => {
  if (style === 'latex') return `\\mathrm{${inside}}`;
  return style === 'mathml' ? `<math xmlns="http://www.w3.org/1998/Math/MathML">${inside}</math>` : inside;
};

/** A species in one of the styles, its state behind it. Plain and Unicode read back to the same species. */
export const printSpecies = (species: Spelled, style: PrintStyle): string =>
  wrapped(speciesInside(species, style), style);

const fractionOf = (coefficient: string, style: PrintStyle): string => {
  const [above = '', below] = coefficient.split('/');
  if (style === 'mathml')
    return below === undefined ? `<mn>${above}</mn>` : `<mfrac><mn>${above}</mn><mn>${below}</mn></mfrac>`;
  return style === 'latex' && below !== undefined ? `\\frac{${above}}{${below}}` : coefficient;
};

/** What stands between coefficient and species, between terms, and between the sides. */
const JOINTS: Readonly<Record<PrintStyle, readonly [string, string, string]>> = {
  plain: [' ', ' + ', ' -> '],
  unicode: [' ', ' + ', ' → '],
  html: ['\u00a0', ' + ', ' → '],
  latex: ['\\,', ' + ', ' \\rightarrow '],
  mathml: ['<mspace width="0.17em"/>', '<mo>+</mo>', '<mo>→</mo>'],
};

const termInside = ({ coefficient, species }: PrintedTerm, style: PrintStyle): string => {
  const inside = style === 'latex' ? printSpecies(species, style) : speciesInside(species, style);
  return coefficient === '' ? inside : fractionOf(coefficient, style) + JOINTS[style][0] + inside;
};

/** One term of a reaction in one of the styles. */
export const printTerm = (term: PrintedTerm, style: PrintStyle): string =>
  style === 'mathml' ? wrapped(termInside(term, style), style) : termInside(term, style);

/** A reaction in one of the styles; "" where nothing stands on either side. */
export const printReaction = ({ left, right }: PrintedReaction, style: PrintStyle): string => {
  if (left.length + right.length === 0) return '';
  const [, plus, arrow] = JOINTS[style];
  const side = (terms: readonly PrintedTerm[]): string => terms.map((term) => termInside(term, style)).join(plus);
  const inside = side(left) + arrow + side(right);
  return style === 'mathml' ? wrapped(inside, style) : inside;
};
