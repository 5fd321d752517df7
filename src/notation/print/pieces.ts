import { type Rational, ONE, isZero, showDecimal, showRational, signOf } from '../../exact/rational.ts';
import type { Formula, Member } from '../formula.ts';

/** What printing needs of a species; every species of the floor above has it. The electron has no parts. */
export interface Spelled {
  readonly parts: Formula;
  readonly charge: Rational;
  readonly state: string | null;
}

/** A species cut into what a style writes differently. Sizes are plain text: "4", "0.5", "1/3"; "" is never among them. */
export type Piece =
  | { readonly kind: 'symbol'; readonly text: string }
  | { readonly kind: 'bracket'; readonly text: string }
  | { readonly kind: 'count'; readonly text: string }
  | { readonly kind: 'mass'; readonly text: string }
  | { readonly kind: 'dot' }
  | { readonly kind: 'multiplier'; readonly text: string }
  | { readonly kind: 'charge'; readonly size: string; readonly sign: '+' | '-' }
  | { readonly kind: 'state'; readonly text: string };

const CLOSING = { '(': ')', '[': ']', '{': '}' } as const;

const countPieces = (count: Rational): readonly Piece[] =>
  count.equals(ONE) ? [] : [{ kind: 'count', text: showDecimal(count) }];

const memberPieces = (member: Member): readonly Piece[] => {
  const count = countPieces(member.count);
  if (member.kind === 'named') return [{ kind: 'symbol', text: member.name }, ...count];
  if (member.kind === 'group') {
    const inside = member.members.flatMap(memberPieces);
    const close = CLOSING[member.bracket];
    return [{ kind: 'bracket', text: member.bracket }, ...inside, { kind: 'bracket', text: close }, ...count];
  }
  const { massNumber, symbol, spelled } = member;
  if (spelled !== undefined) return [{ kind: 'symbol', text: spelled }, ...count];
  const mass: readonly Piece[] = massNumber === null ? [] : [{ kind: 'mass', text: massNumber }];
  return [...mass, { kind: 'symbol', text: symbol }, ...count];
};

const formulaPieces = (parts: Formula): readonly Piece[] =>
  parts.flatMap(({ multiplier, members }, index): readonly Piece[] => [
    ...(index > 0 ? [{ kind: 'dot' } as const] : []),
    ...(multiplier.equals(ONE) ? [] : [{ kind: 'multiplier', text: showDecimal(multiplier) } as const]),
    ...members.flatMap(memberPieces),
  ]);

/** The charge with its size, "" for 1; null for none. */
export const chargePiece = (charge: Rational): (Piece & { readonly kind: 'charge' }) | null => {
  if (isZero(charge)) return null;
  const size = charge.abs().equals(ONE) ? '' : showRational(charge.abs());
  return { kind: 'charge', size, sign: signOf(charge) > 0n ? '+' : '-' };
};

/** All pieces of a species in the order in which they are written. */
export const piecesOf = ({ parts, charge, state }: Spelled): readonly Piece[] => {
  const formula: readonly Piece[] = parts.length === 0 ? [{ kind: 'symbol', text: 'e' }] : formulaPieces(parts);
  const written = chargePiece(charge);
  const phase: readonly Piece[] = state === null ? [] : [{ kind: 'state', text: state }];
  return [...formula, ...(written === null ? [] : [written]), ...phase];
};
