import type { Piece } from './pieces.ts';

/** One piece of plain LaTeX math, to stand inside `\mathrm{}`. No package is needed. */
export const latexPiece = (piece: Piece): string => {
  switch (piece.kind) {
    case 'bracket':
      return '{}'.includes(piece.text) ? `\\${piece.text}` : piece.text;
    case 'count':
      return `_{${piece.text.includes('/') ? `(${piece.text})` : piece.text}}`;
    case 'mass':
      return `{}^{${piece.text}}`;
    case 'dot':
      return '\\cdot ';
    case 'charge':
      return `^{${piece.size}${piece.sign}}`;
    case 'state':
      return `(${piece.text})`;
    case 'multiplier':
    case 'symbol':
      return piece.text;
  }
};
