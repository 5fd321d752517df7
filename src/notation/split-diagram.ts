import type { Place } from './arrows.ts';

/** A piece of a cell diagram in IUPAC line notation (Green Book, 3rd ed., 2.13). */
export type DiagramPiece =
  | { readonly kind: 'species'; readonly place: Place }
  /** `|`, or `¦` between miscible liquids, with nothing else. */
  | { readonly kind: 'boundary'; readonly place: Place }
  /** `||`, `‖`, `¦¦`, `//`: the liquid junction whose potential is taken as removed. */
  | { readonly kind: 'bridge'; readonly place: Place }
  | { readonly kind: 'comma'; readonly place: Place };

const OPEN = '([{';
const CLOSE = ')]}';

/** A bridge or a boundary at `at`: its length, 0 for none. `/` counts only in pairs or with spaces around it. */
const BRIDGE = /^(?:\|\s*\||¦\s*¦|⁞\s*⁞|‖|∥|\/\/|⦀|‖)/u;
const BOUNDARY = /^(?:\||¦|⁞|│|∣|ǀ)/u;
const BAR = /[|¦⁞│∣ǀ‖∥⦀]/u;
const SLASH = /^\/(?!\/)/u;

const separatorAt = (
  text: string,
  at: number,
): { readonly kind: 'bridge' | 'boundary'; readonly length: number } | null => {
  const rest = text.slice(at, at + 12);
  const bridge = BRIDGE.exec(rest);
  if (bridge !== null) return { kind: 'bridge', length: bridge[0].length };
  if (BOUNDARY.test(rest) || (SLASH.test(rest) && !/\d$/u.test(text.slice(0, at))))
    return { kind: 'boundary', length: 1 };
  return null;
};

/**
 * The pieces of a diagram in order, offsets in UTF-16. Commas and slashes inside brackets are text:
 *   Pt | Fe^2+ (0.1 mol/L), Fe^3+ || Ag^+ | Ag
 *      ^                  ^       ^^      ^
 */
export const diagramPieces = (text: string): readonly DiagramPiece[] => {
  const pieces: DiagramPiece[] = [];
  let depth = 0;
  let start = 0;
  const close = (to: number): void => {
    pieces.push({ kind: 'species', place: { from: start, to } });
  };
  for (let at = 0; at < text.length; at += 1) {
    const char = text[at] ?? '';
    if (OPEN.includes(char)) depth += 1;
    if (CLOSE.includes(char)) depth = Math.max(0, depth - 1);
    // A bar never stands inside a formula: it ends a bracket that was left open, whose own fault is found later.
    if (BAR.test(char)) depth = 0;
    if (depth > 0) continue;
    const separator = separatorAt(text, at);
    if (separator === null && char !== ',' && char !== ';') continue;
    close(at);
    const length = separator?.length ?? 1;
    pieces.push({ kind: separator?.kind ?? 'comma', place: { from: at, to: at + length } });
    start = at + length;
    at = start - 1;
  }
  close(text.length);
  return pieces;
};
