import type { Piece } from './pieces.ts';

/** One piece in canonical plain text: `[18O]` is closed by the symbol that follows its mass number. */
export const plainPiece = (piece: Piece, before: Piece | undefined): string => {
  switch (piece.kind) {
    case 'symbol':
      return before?.kind === 'mass' ? `${piece.text}]` : piece.text;
    case 'count':
      return piece.text.includes('/') ? `(${piece.text})` : piece.text;
    case 'mass':
      return `[${piece.text}`;
    case 'dot':
      return '*';
    case 'charge':
      return `^${piece.size}${piece.sign}`;
    case 'state':
      return `(${piece.text})`;
    case 'bracket':
    case 'multiplier':
      return piece.text;
  }
};
