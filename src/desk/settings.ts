import { type Rational, rationalFromText } from '../exact/rational.ts';
import type { MediumChoice } from '../redox/choose-medium.ts';
import { type Result, all, chain, failure, inField, map, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import { type ReadingOptions, readDefinitions, readSpecies } from '../species/read.ts';
import type { DeskOptions } from './hydronium.ts';
import type { Ask, AskedMedium } from './schema/ask.ts';

/** "0.4", "2/5": at most 40 digits on either side of the point or the stroke. */
const EXACT = /^\s*[+-]?(\d{1,40}(\.\d{0,40})?|\.\d{1,40})\s*$|^\s*[+-]?\d{1,40}\/0*[1-9]\d{0,39}\s*$/;
const PERCENT = /^(.*\S)\s*%\s*$/;

/** The exact value of a decimal or fraction text; `bad-ask` in `field` for anything else. */
export const readExact = (text: string, field: string, example: string): Result<Rational> =>
  EXACT.test(text)
    ? success(rationalFromText(text.trim()))
    : failure({
        code: 'bad-ask',
        field,
        span: wholeSpan(text),
        message: `${field} must be a number.`,
        hint: `Write a decimal or a fraction: ${example}.`,
      });

/** A share of the current: "0.95", "19/20", "95 %". Fault: `bad-ask`. */
export const readShare = (text: string, field: string): Result<Rational> => {
  const percent = PERCENT.exec(text)?.[1];
  const example = '"0.95" or "95 %"';
  if (percent === undefined) return readExact(text, field, example);
  return map(readExact(percent, field, example), (value) => value.div(rationalFromText('100')));
};

/** Bounds of one ask: work grows with the helpers faster than with anything else. */
export const MOST_HELPERS = 24;
export const MOST_SUBSCRIPTS = 200;

const tooMany = (field: string, most: number, what: string): Result<never> =>
  failure({
    code: 'too-hard',
    field,
    limit: `${String(most)} ${what}`,
    message: `An ask may have at most ${String(most)} ${what}.`,
    hint: `Give only the ${what} that take part.`,
  });

const NONE: DeskOptions = {};
const FOLDING: DeskOptions = { foldHydronium: true };

type Common = Pick<Ask, 'where' | 'define' | 'strict'> & { readonly foldHydronium?: boolean | undefined };

const readWhere = (where: Readonly<Record<string, string>>): Result<ReadonlyMap<string, Rational>> => {
  if (Object.keys(where).length > MOST_SUBSCRIPTS) return tooMany('where', MOST_SUBSCRIPTS, 'unknown subscripts');
  const values = Object.entries(where).map(([name, text]) =>
    map(readExact(text, `where.${name}`, '"0.4"'), (value) => [name, value] as const),
  );
  return map(all(values), (entries) => new Map(entries));
};

/** What an ask says of how to read its texts. Faults: `bad-ask` and faults of reading, in `where.x` and `define.NAME`. */
export const readSettings = ({ where, define, strict, foldHydronium }: Common): Result<DeskOptions> => {
  const folding = foldHydronium === true ? FOLDING : NONE;
  if (where === undefined && define === undefined && strict !== true) return success(folding);
  return chain(readWhere(where ?? {}), (values) => {
    const options: DeskOptions = { ...folding, where: values, strict: strict === true };
    if (define === undefined) return success(options);
    return map(inField(readDefinitions(define, options), 'define'), (names) => ({ ...options, define: names }));
  });
};

/** A medium as the floors below take it: a name as it is, the helpers of a list read. */
export const readMedium = (
  asked: AskedMedium | undefined,
  options: ReadingOptions,
  field = 'medium',
): Result<MediumChoice> => {
  if (asked === undefined || typeof asked === 'string') return success(asked);
  if (asked.helpers.length > MOST_HELPERS) return tooMany(field, MOST_HELPERS, 'helpers');
  const helpers = asked.helpers.map((text, at) =>
    map(inField(readSpecies(text, options), `${field}.helpers[${String(at)}]`), ({ species }) => species),
  );
  return map(all(helpers), (list) => ({ helpers: list }));
};
