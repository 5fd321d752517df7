import type { Piece } from './pieces.ts';

const MINUS = '\u2212';

/** `text` with the characters that HTML and MathML keep for themselves written as entities. */
export const escapeMarkup = (text: string): string =>
  text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;');

/** A sign as printed: the minus sign, not the hyphen. */
export const printedSign = (sign: '+' | '-'): string => (sign === '-' ? MINUS : sign);

/** One piece in HTML: `<sub>`, `<sup>`, and text. */
export const htmlPiece = (piece: Piece): string => {
  switch (piece.kind) {
    case 'count':
      return `<sub>${piece.text.includes('/') ? `(${piece.text})` : piece.text}</sub>`;
    case 'mass':
      return `<sup>${piece.text}</sup>`;
    case 'dot':
      return '·';
    case 'charge':
      return `<sup>${piece.size}${printedSign(piece.sign)}</sup>`;
    case 'state':
      return `(${escapeMarkup(piece.text)})`;
    case 'bracket':
    case 'multiplier':
    case 'symbol':
      return escapeMarkup(piece.text);
  }
};
