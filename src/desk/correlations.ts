import type { Correlation } from '../amounts/measured.ts';
import { toFloat } from '../amounts/number.ts';
import { ONE } from '../exact/rational.ts';
import { type Result, all, chain, failure, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import { didYouMean, nearest } from '../report/suggest.ts';
import type { AskedCorrelation } from './schema/ask.ts';
import { readExact } from './settings.ts';

const unknownInput = (name: string, inputs: readonly string[], field: string): Result<never> =>
  failure({
    code: 'bad-ask',
    field,
    span: wholeSpan(name),
    message: `${name === '' ? 'An input without a name' : name} is not among what is given.`,
    hint: didYouMean(nearest(name, inputs)) ?? `Given are ${inputs.join(', ')}.`,
  });

const outside = (text: string, field: string): Result<never> =>
  failure({
    code: 'bad-ask',
    field,
    span: wholeSpan(text),
    message: 'A correlation coefficient lies between -1 and 1.',
    hint: 'Write for example "0.5".',
  });

const readOne = (
  { between, coefficient }: AskedCorrelation,
  inputs: readonly string[],
  field: string,
): Result<Correlation> => {
  const stranger = between.findIndex((name) => !inputs.includes(name));
  if (stranger >= 0) return unknownInput(between[stranger] ?? '', inputs, `${field}.between[${String(stranger)}]`);
  const [one, other] = between;
  if (one === other) {
    const message = `${one} is always fully correlated with itself.`;
    return failure({ code: 'bad-ask', field: `${field}.between`, message, hint: 'Name two different inputs.' });
  }
  const place = `${field}.coefficient`;
  return chain(readExact(coefficient, place, '"0.5"'), (exact) =>
    exact.abs().compare(ONE) > 0
      ? outside(coefficient, place)
      : success<Correlation>({ between: [one, other], coefficient: toFloat(exact) }),
  );
};

/** The correlations of an ask; `inputs` are the names that may be correlated. Fault: `bad-ask` in `correlations[i]`. */
export const readCorrelations = (
  asked: readonly AskedCorrelation[],
  inputs: readonly string[],
): Result<readonly Correlation[]> => all(asked.map((one, at) => readOne(one, inputs, `correlations[${String(at)}]`)));
