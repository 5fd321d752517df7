import type { Piece } from './pieces.ts';

const shifted = (text: string, plain: string, shift: string): string =>
  text.replaceAll(/[0-9+-]/gu, (char) => shift[plain.indexOf(char)] ?? char);

/** "12" as "₁₂". A point keeps its place on the line: "0.5" is "₀.₅". */
export const subscript = (text: string): string => shifted(text, '0123456789+-', '₀₁₂₃₄₅₆₇₈₉₊₋');

/** "2-" as "²⁻". */
export const superscript = (text: string): string => shifted(text, '0123456789+-', '⁰¹²³⁴⁵⁶⁷⁸⁹⁺⁻');

/** One piece in Unicode. A fraction has no raised or lowered form that reads back: it stays plain, in its brackets or behind its caret. */
export const unicodePiece = (piece: Piece): string => {
  switch (piece.kind) {
    case 'count':
      return piece.text.includes('/') ? `(${piece.text})` : subscript(piece.text);
    case 'mass':
      return superscript(piece.text);
    case 'dot':
      return '·';
    case 'charge':
      return piece.size.includes('/') ? `^${piece.size}${piece.sign}` : superscript(piece.size + piece.sign);
    case 'state':
      return `(${piece.text})`;
    case 'bracket':
    case 'multiplier':
    case 'symbol':
      return piece.text;
  }
};
