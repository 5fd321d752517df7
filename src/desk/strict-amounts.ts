import { QUANTITIES, isQuantityName } from '../amounts/quantities.ts';
import { readQuantity, readWantedUnit } from '../amounts/quantity.ts';
import type { Note } from '../report/note.ts';
import { type Result, failure } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import type { AskOf } from './schema/ask.ts';

type AmountsAsk = AskOf<'amounts'>;

interface UnitText {
  readonly field: string;
  readonly text: string;
  readonly notes: readonly Note[];
}

/** Every text of an ask that holds a unit, with what reading it noted. */
const unitTexts = ({ given, want = {} }: AmountsAsk): readonly UnitText[] => {
  const quantities = Object.entries(given).flatMap(([name, text]) => {
    if (typeof text !== 'string' || !isQuantityName(name)) return [];
    const read = readQuantity(text, QUANTITIES[name]);
    return [{ field: `given.${name}`, text, notes: read.ok ? read.notes : [] }];
  });
  const units = Object.entries(want).flatMap(([name, text]) => {
    if (!isQuantityName(name)) return [];
    const read = readWantedUnit(text, QUANTITIES[name]);
    return [{ field: `want.${name}`, text, notes: read.ok ? read.notes : [] }];
  });
  return [...quantities, ...units];
};

const looseUnit = (ask: AmountsAsk, { message }: Note): Result<never> => {
  const found = unitTexts(ask).find(({ notes }) => notes.some((one) => one.code === 'unit-reading'));
  const place = found === undefined ? {} : { field: found.field, span: wholeSpan(found.text) };
  const hint = 'Write the unit so that it has one meaning: g/(A h), mg/kg.';
  return failure({ code: 'unknown-unit', message: `A strict ask allows one meaning: ${message}.`, hint, ...place });
};

const REACTION_FIELDS = ['half', 'electrode', 'cell'] as const;

const stateless = (ask: AmountsAsk, { message }: Note): Result<never> => {
  const field = REACTION_FIELDS.find((name) => name in ask) ?? 'half';
  const text = 'half' in ask ? ask.half : null;
  const place = text === null ? { field } : { field, span: wholeSpan(text) };
  const hint = 'Write the state of the gas in the reaction: O2(g).';
  return failure({ code: 'bad-ask', message: `A strict ask assumes nothing: ${message}.`, hint, ...place });
};

/**
 * In a strict ask every ambiguity is a fault: a unit that was read in one of its meanings (`unknown-unit`), a species
 * without a state that was taken as a gas (`bad-ask`). Anything else stays as it is.
 */
export const strictly = <T>(result: Result<T>, ask: AmountsAsk): Result<T> => {
  if (!result.ok || ask.strict !== true) return result;
  const unit = result.notes.find(({ code }) => code === 'unit-reading');
  if (unit !== undefined) return looseUnit(ask, unit);
  const gas = result.notes.find(({ code }) => code === 'gas-assumed');
  return gas === undefined ? result : stateless(ask, gas);
};
