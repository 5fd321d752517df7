import type { Piece } from '../notation/print/pieces.ts';
import { speciesPieces, styledReaction, styledSpecies } from './spelling.ts';

const ENTITIES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** Controls but tab and line end, lone surrogates, and what turns the direction of text around. */
const FORBIDDEN = /[^\P{Cc}\t\n]|[\p{Cs}\ufffe\uffff\u202a-\u202e\u2066-\u2069]/gu;

const allowed = (text: string): string => text.replaceAll(FORBIDDEN, '\ufffd');

/** `text` with what HTML and SVG keep for themselves written as entities, and without characters that XML forbids. */
export const escaped = (text: string): string =>
  allowed(text).replaceAll(/[&<>"']/g, (point) => ENTITIES[point] ?? point);

/** A part of a formula: on the line, lowered or raised. */
export interface FormulaPart {
  readonly text: string;
  readonly place: 'line' | 'low' | 'high';
}

const partOf = (piece: Piece): FormulaPart => {
  switch (piece.kind) {
    case 'count':
      return { text: piece.text.includes('/') ? `(${piece.text})` : piece.text, place: 'low' };
    case 'mass':
      return { text: piece.text, place: 'high' };
    case 'charge':
      return { text: piece.size + (piece.sign === '-' ? '−' : '+'), place: 'high' };
    case 'dot':
      return { text: '·', place: 'line' };
    case 'state':
      return { text: `(${piece.text})`, place: 'line' };
    case 'symbol':
    case 'bracket':
    case 'multiplier':
      return { text: piece.text, place: 'line' };
  }
};

/** A canonical species in the parts that a picture places by itself; neighbours on the line are joined. */
export const formulaParts = (plain: string): readonly FormulaPart[] => {
  const parts: FormulaPart[] = [];
  for (const part of speciesPieces(plain).map(partOf)) {
    const last = parts.at(-1);
    if (last?.place === 'line' && part.place === 'line')
      parts[parts.length - 1] = { ...last, text: last.text + part.text };
    else parts.push(part);
  }
  return parts;
};

/** A canonical species or reaction in HTML. */
export const formulaHtml = (plain: string): string => {
  const text = allowed(plain);
  return text.includes('->') ? styledReaction(text, 'html') : styledSpecies(text, 'html');
};
