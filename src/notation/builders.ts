import type { Token } from 'moo';
import type {
  Chain,
  ChargeSyntax,
  CountSyntax,
  MemberSyntax,
  NumberSyntax,
  PartSyntax,
  SpeciesSyntax,
  Summand,
  SumSyntax,
  Unit,
} from './syntax.ts';

type Sign = '+' | '-';

/** A list of one. */
export const start = <T>(last: T): Chain<T> => ({ before: null, last });

/** The list with one more at its end. */
export const append = <T>(before: Chain<T>, last: T): Chain<T> => ({ before, last });

/** A number that starts with this digit. */
export const number = (token: Token): NumberSyntax => ({ kind: 'number', tokens: start(token) });

/** The number with one more digit, point or slash. */
export const digit = (before: NumberSyntax, token: Token): NumberSyntax => ({
  kind: 'number',
  tokens: append(before.tokens, token),
});

/** `above / below`: both kept whole, joined by the slash. */
export const fraction = (above: NumberSyntax, slash: Token, below: NumberSyntax): NumberSyntax => ({
  kind: 'number',
  tokens: append(above.tokens, slash),
  below,
});

/** One summand of a subscript: factor times unknown over divisor; a missing piece is 1. */
export const summand = (factor: NumberSyntax | null, unknown: Token | null, divisor: NumberSyntax | null): Summand => ({
  sign: '+',
  factor,
  unknown,
  divisor,
});

/** A subscript with unknowns. */
export const sum = (summands: Chain<Summand>): SumSyntax => ({ kind: 'sum', summands });

/** The subscript with one more summand. */
export const add = (before: SumSyntax, sign: Sign, last: Summand): SumSyntax =>
  sum(append(before.summands, { ...last, sign }));

/** The subscript that is one unknown. */
export const sumOf = (unknown: Token): SumSyntax => sum(start(summand(null, unknown, null)));

/** An element, or a nuclide where `mass` is its mass number. */
export const element = (token: Token, mass: NumberSyntax | null): Unit => ({ kind: 'element', token, mass });

/** A defined name. */
export const name = (token: Token): Unit => ({ kind: 'name', token });

/** Members in brackets. */
export const group = (open: Token, members: Chain<MemberSyntax>): Unit => ({ kind: 'group', open, members });

/** A unit with the count behind it. */
export const member = (unit: Unit, count: CountSyntax | null): MemberSyntax => ({ unit, count });

/** A part of an adduct with the number in front of it. */
export const part = (multiplier: CountSyntax | null, members: Chain<MemberSyntax>): PartSyntax => ({
  multiplier,
  members,
  separator: null,
});

/** A formula of one part. */
export const firstPart = (members: Chain<MemberSyntax>): Chain<PartSyntax> => start(part(null, members));

/** The formula with one more part behind `separator`. */
export const nextPart = (before: Chain<PartSyntax>, separator: Token, last: PartSyntax): Chain<PartSyntax> =>
  append(before, { ...last, separator });

/** A charge with a caret, a bracket or a space before it. */
export const charge = (size: NumberSyntax, sign: Sign): ChargeSyntax => ({ size, run: 1, sign, tight: false });

/** A charge of one digit without a caret: the digit may be a count as well. */
export const tightCharge = (token: Token, sign: Sign): ChargeSyntax => ({
  size: number(token),
  run: 1,
  sign,
  tight: true,
});

/** A charge of signs alone. */
export const signRun = (sign: Sign): ChargeSyntax => ({ size: null, run: 1, sign, tight: false });

/** One sign more. */
export const longerRun = (charge: ChargeSyntax): ChargeSyntax => ({ ...charge, run: charge.run + 1 });

/** Formula (null: the electron) and charge. */
export const substance = (parts: Chain<PartSyntax> | null, charge: ChargeSyntax | null): SpeciesSyntax => ({
  parts,
  charge,
  state: null,
  radical: null,
});

/** A formula with the dot of a radical. */
export const radical = (dot: Token, parts: Chain<PartSyntax>, charge: ChargeSyntax | null): SpeciesSyntax => ({
  ...substance(parts, charge),
  radical: dot,
});

/** The species with its state. */
export const species = (before: SpeciesSyntax, state: Token | null): SpeciesSyntax => ({ ...before, state });
