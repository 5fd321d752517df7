import type { Token } from 'moo';

/** What the grammar's productions build: small, pure and in constant time, since a parser runs them on every attempt. */

/** A list grown at its end by one cell a step; shared prefixes cost nothing. */
export type Chain<T> = { readonly before: Chain<T> | null; readonly last: T };

/** The items of a chain, first to last. */
export const chainItems = <T>(chain: Chain<T> | null): readonly T[] => {
  const items: T[] = [];
  for (let at = chain; at !== null; at = at.before) items.push(at.last);
  return items.reverse();
};

/** A number as spelled: digit tokens, a point among them; a fraction ends in its slash and has a number `below` it. */
export interface NumberSyntax {
  readonly kind: 'number';
  readonly tokens: Chain<Token>;
  readonly below?: NumberSyntax;
}

/** One summand of a subscript with unknowns: sign, factor, unknown. */
export interface Summand {
  readonly sign: '+' | '-';
  readonly factor: NumberSyntax | null;
  readonly unknown: Token | null;
  readonly divisor: NumberSyntax | null;
}

/** A subscript with unknowns: 1-x, 2n+2, x/2. */
export interface SumSyntax {
  readonly kind: 'sum';
  readonly summands: Chain<Summand>;
}

export type CountSyntax = NumberSyntax | SumSyntax;

/** An element, a nuclide, a defined name or a bracketed group, before its count. */
export type Unit =
  | { readonly kind: 'element'; readonly token: Token; readonly mass: NumberSyntax | null }
  | { readonly kind: 'name'; readonly token: Token }
  | { readonly kind: 'group'; readonly open: Token; readonly members: Chain<MemberSyntax> };

export interface MemberSyntax {
  readonly unit: Unit;
  readonly count: CountSyntax | null;
}

export interface PartSyntax {
  readonly multiplier: CountSyntax | null;
  readonly members: Chain<MemberSyntax>;
  /** What stands before this part of an adduct; null for the first. */
  readonly separator: Token | null;
}

/** A charge: size null is 1. `run` counts repeated signs (Fe+++). `tight`: no caret, superscript, bracket or space marks it. */
export interface ChargeSyntax {
  readonly size: NumberSyntax | null;
  readonly run: number;
  readonly sign: '+' | '-';
  readonly tight: boolean;
}

/** A whole species as spelled. `parts` is null for the electron. */
export interface SpeciesSyntax {
  readonly parts: Chain<PartSyntax> | null;
  readonly charge: ChargeSyntax | null;
  readonly state: Token | null;
  /** The dot of a radical, O2•-: a remark. */
  readonly radical: Token | null;
}
