import { type Rational, ONE, ZERO, isZero } from '../exact/rational.ts';
import type { Fault } from '../report/fault.ts';
import { type Result, failure, success } from '../report/result.ts';
import { type Span, spanOf } from '../report/span.ts';
import { didYouMean, nearest } from '../report/suggest.ts';
import { type Dimension, NUMBER, combine } from './dimension.ts';
import { type Unit, AMBIGUOUS_UNITS, UNIT_NAMES, unitNamed } from './units.ts';

/** What a unit text means: value in the unit times `factor` plus `offset` is the value in SI base units. */
export interface UnitValue {
  readonly dimension: Dimension;
  readonly factor: Rational;
  readonly offset: Rational;
}

/** A piece of a unit text: a name with its power, an operator or a bracket; `at` counts UTF-16 units. */
type Piece = { readonly at: number; readonly text: string } & (
  | { readonly kind: 'unit'; readonly unit: Unit; readonly power: number }
  | { readonly kind: 'times' | 'over' | 'open' | 'close' }
);

/** `loose`: a slash divides by everything up to the next slash, as in g/A h; else by the next unit only. */
type Manner = 'strict' | 'loose';

const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const PIECE = /\s+|[*·⋅×.∙/()]|[^\s*·⋅×.∙/()]+/gu;
/** A name and its power.   dm^-2, dm-2, m3, m², s⁻¹ */
const POWERED = /^(.*[^\d^⁰¹²³⁴-⁹⁻−+-])\^?([⁻−-]?)([\d⁰¹²³⁴-⁹]+)$/u;

const unknownUnit = (name: string, span: Span): Fault => {
  const spellings = AMBIGUOUS_UNITS.get(name);
  if (spellings !== undefined) {
    const message = `${name} is the name of more than one unit`;
    return { code: 'unknown-unit', message, span, hint: `Write ${spellings}.` };
  }
  const hint = didYouMean(nearest(name, UNIT_NAMES, Math.min(2, Math.floor(name.length / 2))));
  return {
    code: 'unknown-unit',
    message: `${name} is no unit that is known here`,
    span,
    ...(hint === undefined ? {} : { hint }),
  };
};

const digitsOf = (text: string): number =>
  Number(text.replace(/[⁰¹²³⁴-⁹]/gu, (digit) => String(SUPERSCRIPTS.indexOf(digit))));

const unitPiece = (text: string, at: number): Piece | undefined => {
  const whole = unitNamed(text);
  if (whole !== undefined) return { kind: 'unit', at, text, unit: whole, power: 1 };
  const [, name = '', sign = '', digits = ''] = POWERED.exec(text) ?? [];
  const unit = unitNamed(name);
  if (unit === undefined || digits.length > 2) return undefined;
  return { kind: 'unit', at, text, unit, power: (sign === '' ? 1 : -1) * digitsOf(digits) };
};

/** A hyphen between two names is a product:  A-h, kW-h. */
const hyphenated = (text: string, at: number): readonly Piece[] | undefined => {
  const [first = '', second = '', more] = text.split('-');
  const left = unitPiece(first, at);
  const right = unitPiece(second, at + first.length + 1);
  return more !== undefined || left === undefined || right === undefined ? undefined : [left, right];
};

const OPERATORS = new Map<string, 'over' | 'open' | 'close'>([
  ['/', 'over'],
  ['per', 'over'],
  ['(', 'open'],
  [')', 'close'],
]);

const piecesOf = (text: string): Result<readonly Piece[]> => {
  const pieces: Piece[] = [];
  for (const match of text.matchAll(PIECE)) {
    const [token] = match;
    const at = match.index;
    const operator = OPERATORS.get(token);
    if (operator !== undefined) pieces.push({ kind: operator, at, text: token });
    else if (/^[*·⋅×.∙]$/u.test(token)) pieces.push({ kind: 'times', at, text: token });
    else if (token.trim() !== '') {
      const piece = unitPiece(token, at);
      const found = piece === undefined ? hyphenated(token, at) : [piece];
      if (found === undefined) return failure(unknownUnit(token, spanOf(text, at, at + token.length)));
      pieces.push(...found);
    }
  }
  return success(pieces);
};

const PLAIN: UnitValue = { dimension: NUMBER, factor: ONE, offset: ZERO };

const raise = (factor: Rational, power: number): Rational => {
  let result = ONE;
  for (let step = 0; step < Math.abs(power); step += 1) result = result.mul(factor);
  return power < 0 ? ONE.div(result) : result;
};

const multiply = (left: UnitValue, right: UnitValue, power: number): UnitValue => ({
  dimension: combine(left.dimension, right.dimension, power),
  factor: left.factor.mul(raise(right.factor, power)),
  offset: ZERO,
});

interface Reading {
  readonly value: UnitValue;
  /** The piece at which reading stopped: the unit itself, or the bracket that closes. */
  readonly next: number;
}

const failAt = (text: string, piece: Piece | undefined, message: string): Result<never> => {
  const at = piece?.at ?? text.length;
  const span = spanOf(text, at, at + (piece?.text.length ?? 0));
  return failure({ code: 'unknown-unit', message, span, hint: 'Write a unit as in g/(A h), A dm^-2 or kWh/t.' });
};

/**
 * The first operator, closing bracket or end that has no unit before it.
 *   g / * h
 *       ^    */
const misplaced = (pieces: readonly Piece[]): number =>
  [...pieces, undefined].findIndex((piece, index) => {
    const before = pieces[index - 1]?.kind;
    const complete = before === 'unit' || before === 'close';
    return piece?.kind === 'unit' || piece?.kind === 'open' ? false : !complete;
  });

/** Whether the next factor divides: in the strict manner a slash holds for one factor, in the loose one for all. */
const divides = (kind: 'times' | 'over', manner: Manner, before: boolean): boolean =>
  kind === 'over' || (manner === 'loose' && before);

/**
 * Reads factors up to a closing bracket or the end; `over` tells whether the next factor divides.
 *   g / ( A h ) kg^-1
 *       ^ next: a slash was just seen
 */
const readProduct = (text: string, pieces: readonly Piece[], from: number, manner: Manner): Result<Reading> => {
  let value = PLAIN;
  let over = false;
  let at = from;
  for (; at < pieces.length; at += 1) {
    const piece = pieces[at];
    if (piece === undefined || piece.kind === 'close') break;
    if (piece.kind === 'over' || piece.kind === 'times') {
      over = divides(piece.kind, manner, over);
      continue;
    }
    const factor = piece.kind === 'unit' ? success(readUnit(piece, at)) : readBracket(text, pieces, at, manner);
    if (!factor.ok) return factor;
    at = factor.value.next;
    value = multiply(value, factor.value.value, over ? -1 : 1);
    over = manner === 'loose' && over;
  }
  return success({ value, next: at });
};

const readUnit = ({ unit, power }: Extract<Piece, { kind: 'unit' }>, at: number): Reading => ({
  value: multiply(PLAIN, unit, power),
  next: at,
});

const readBracket = (text: string, pieces: readonly Piece[], at: number, manner: Manner): Result<Reading> => {
  const inner = readProduct(text, pieces, at + 1, manner);
  if (!inner.ok) return inner;
  const closing = pieces[inner.value.next];
  return closing === undefined ? failAt(text, pieces[at], 'this bracket is not closed') : inner;
};

const readWhole = (text: string, pieces: readonly Piece[], manner: Manner): Result<UnitValue> => {
  const reading = readProduct(text, pieces, 0, manner);
  if (!reading.ok) return reading;
  const left = pieces[reading.value.next];
  return left === undefined ? success(reading.value.value) : failAt(text, left, 'this bracket was never opened');
};

/**
 * What a unit text can mean, the strict reading first: `g/(A h)`, `A dm^-2`, `kWh/t`, `mA/cm²`. A slash followed by a
 * product without brackets (`g/A h`) has two readings: the quantity it stands for decides. An empty text is the
 * number 1. Fault: `unknown-unit` with its place; a name with several meanings (`oz`) says how to write which.
 */
export const readUnitText = (text: string): Result<readonly UnitValue[]> => {
  if (text.trim() === '') return success([PLAIN]);
  const named = unitNamed(text.trim());
  if (named !== undefined) return success([named]);
  const pieces = piecesOf(text);
  if (!pieces.ok) return pieces;
  const gap = misplaced(pieces.value);
  if (gap >= 0) return failAt(text, pieces.value[gap], 'a unit is missing here');
  const strict = readWhole(text, pieces.value, 'strict');
  const loose = readWhole(text, pieces.value, 'loose');
  if (!strict.ok) return strict;
  return success(loose.ok && !isSame(strict.value, loose.value) ? [strict.value, loose.value] : [strict.value]);
};

const isSame = (a: UnitValue, b: UnitValue): boolean =>
  isZero(a.factor.sub(b.factor)) && a.dimension.every((power, index) => power === b.dimension[index]);
