import type { Token } from 'moo';
import { type Rational, ONE, ZERO, isZero, rationalFromText, signOf } from '../exact/rational.ts';
import { type Result, failure, success } from '../report/result.ts';
import { faultAt, placeOf } from './place.ts';
import { type CountSyntax, type NumberSyntax, type Summand, type SumSyntax, chainItems } from './syntax.ts';

/** Values of unknown subscripts by name. */
export type Unknowns = ReadonlyMap<string, Rational>;

const textOf = (number: NumberSyntax): string =>
  chainItems(number.tokens)
    .map((token) => token.value)
    .join('');

/** The value of a number as spelled. */
export const numberValue = (number: NumberSyntax): Rational => {
  const { below } = number;
  if (below === undefined) return rationalFromText(textOf(number));
  return rationalFromText(`${textOf(number).slice(0, -1)}/${textOf(below)}`);
};

const summandValue = (summand: Summand, unknowns: Unknowns): Rational | Token => {
  const { factor, unknown, divisor } = summand;
  const size = factor === null ? ONE : numberValue(factor);
  const times = unknown === null ? ONE : unknowns.get(unknown.value);
  if (times === undefined) return unknown ?? ZERO;
  const value = size.mul(times).div(divisor === null ? ONE : numberValue(divisor));
  return summand.sign === '-' ? value.neg() : value;
};

const isToken = (value: Rational | Token): value is Token => 'offset' in value;

const sumValue = (text: string, sum: SumSyntax, unknowns: Unknowns): Result<Rational> => {
  const summands = chainItems(sum.summands);
  const values = summands.map((summand) => summandValue(summand, unknowns));
  const unset = values.find(isToken);
  if (unset !== undefined) {
    const message = `the subscript ${unset.value} has no value`;
    return failure(
      faultAt(text, 'bad-count', placeOf(unset), message, `give it in where, as {"${unset.value}": "0.4"}`),
    );
  }
  const total = values.filter((value): value is Rational => !isToken(value)).reduce((a, b) => a.add(b), ZERO);
  if (signOf(total) >= 0n) return success(total);
  const named = summands.flatMap(({ unknown }) => unknown ?? []);
  const [first] = named;
  const place = first === undefined ? { from: 0, to: text.length } : placeOf(first, named.at(-1));
  return failure(faultAt(text, 'bad-count', place, 'this subscript comes out negative', 'check the value in where'));
};

/** The value of a count; a missing one is 1. Fault: `bad-count` for an unknown without a value or a negative result. */
export const countValue = (text: string, count: CountSyntax | null, unknowns: Unknowns): Result<Rational> => {
  if (count === null) return success(ONE);
  if (count.kind === 'sum') return sumValue(text, count, unknowns);
  const value = numberValue(count);
  if (!isZero(value)) return success(value);
  const tokens = chainItems(count.tokens);
  const first = tokens[0];
  const place = first === undefined ? { from: 0, to: 0 } : placeOf(first, tokens.at(-1));
  return failure(faultAt(text, 'bad-count', place, 'a count of 0 means that nothing is there', 'leave the atom out'));
};
