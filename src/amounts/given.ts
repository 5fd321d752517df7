import { allByRank } from '../report/precedence.ts';
import { type Result, all, chain, failure, inField, map, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import { didYouMean, nearest } from '../report/suggest.ts';
import { AMOUNT, DENSITY, MOLAR_CONCENTRATION, sameDimension } from './dimension.ts';
import { type Measured, measuredFrom, over, times } from './measured.ts';
import { QUANTITIES, QUANTITY_NAMES, type QuantityKind, type QuantityName, isQuantityName } from './quantities.ts';
import { type ReadQuantity, readQuantity } from './quantity.ts';
import { type RecordText, readRecord } from './record/record.ts';
import type { VariableName } from './relations.ts';

/** What an ask gives: quantity texts by name, and a list of pairs for `record`. */
export type GivenTexts = Readonly<Record<string, string | RecordText>>;

/** A given value for a variable; `field` is where it was written. Two may stand for one variable. */
export interface Given {
  readonly name: VariableName;
  readonly field: string;
  readonly text: string;
  readonly measured: Measured;
}

/** A quantity as read, before concentrations are counted in moles. */
type GivenReading = Given & { readonly read: ReadQuantity };

const unknownQuantity = (name: string, where: 'given' | 'want'): Result<never> => {
  const hint = didYouMean(nearest(name, [...QUANTITY_NAMES, 'record']));
  return failure({
    code: 'unknown-quantity',
    message: `there is no quantity ${name === '' ? 'without a name' : name}`,
    field: `${where}.${name}`,
    span: wholeSpan(name),
    hint: hint ?? `The quantities are ${[...QUANTITY_NAMES, 'record'].join(', ')}.`,
  });
};

/** The quantity of this name, or `unknown-quantity` with the nearest ones. */
export const quantityNamed = (name: string, where: 'given' | 'want'): Result<QuantityName> =>
  isQuantityName(name) ? success(name) : unknownQuantity(name, where);

const badSign = (kind: QuantityKind, text: string, field: string, what: string): Result<never> =>
  failure({ code: 'bad-ask', message: `${kind.name} cannot be ${what}`, field, span: wholeSpan(text) });

const checkSign = (read: ReadQuantity, kind: QuantityKind, text: string, field: string): Result<ReadQuantity> => {
  if (kind.sign === 'not-zero' && read.value === 0) return badSign(kind, text, field, 'zero: no charge would flow');
  if (kind.sign === 'any' || kind.sign === 'not-zero') return success(read);
  if (read.value < 0) return badSign(kind, text, field, 'negative');
  return kind.sign === 'positive' && read.value === 0 ? badSign(kind, text, field, 'zero') : success(read);
};

const overWhole = (text: string, field: string): Result<never> =>
  failure({
    code: 'contradiction',
    message: 'more than 100 % of the charge cannot go into one reaction',
    field,
    span: wholeSpan(text),
    hint: /%/u.test(text)
      ? 'To find an efficiency from what was weighed, leave it out.'
      : 'Write a percentage with its sign: 96 %.',
  });

const readOne = (name: QuantityName, text: string): Result<ReadQuantity> => {
  const field = `given.${name}`;
  const kind = QUANTITIES[name];
  const read = chain(inField(readQuantity(text, kind), field), (value) => checkSign(value, kind, text, field));
  if (!read.ok) return read;
  if ((name === 'efficiency' || name === 'share') && read.value.value > 1) return overWhole(text, field);
  return read;
};

/** A volume written in moles would not say of what: only normal volumes stand for an amount. */
const isMoles = (name: QuantityName, read: ReadQuantity, text: string): boolean =>
  name === 'volume' && sameDimension(read.dimension, AMOUNT) && /mol/u.test(text);

const asVariable = (name: QuantityName, read: ReadQuantity): VariableName => {
  if (name === 'share') return 'efficiency';
  return name === 'volume' && sameDimension(read.dimension, AMOUNT) ? 'normal' : name;
};

const giveOne = (name: QuantityName, text: string): Result<GivenReading> => {
  const field = `given.${name}`;
  return chain(readOne(name, text), (read) => {
    if (isMoles(name, read, text)) return wrongVolume(text, field);
    const { value, uncertainty, lastDigit } = read;
    const measured = measuredFrom({ name, value, uncertainty, lastDigit });
    return success({ name: asVariable(name, read), field, text, measured, read });
  });
};

const wrongVolume = (text: string, field: string): Result<never> =>
  failure({
    code: 'unknown-unit',
    message: 'moles are no unit of a volume',
    field,
    span: wholeSpan(text),
    hint: 'Give it as amount, or the volume in L or Nm3.',
  });

/** The molar mass of the species asked and the density of the solution, which mass concentrations need. */
interface Conversion {
  readonly molarMass: Measured | undefined;
  readonly density: Measured | undefined;
}

const needs = (field: string, missing: string, message: string): Result<never> =>
  failure({ code: 'not-enough-given', message, field, missing: [missing] });

/** Concentrations count the species asked: g/L over M, mg/kg times the density of the solution over M. */
const toMolar = (given: GivenReading, conversion: Conversion): Result<Given> => {
  const { read, measured, field } = given;
  if (read.value === 0 || sameDimension(read.dimension, MOLAR_CONCENTRATION)) return success(given);
  const { molarMass, density } = conversion;
  if (molarMass === undefined)
    return needs(field, 'molar_mass', 'without a standard atomic weight this concentration must be given in mol/L');
  if (sameDimension(read.dimension, DENSITY)) return success({ ...given, measured: over(measured, molarMass) });
  if (density === undefined) return needs(field, 'density', 'a mass fraction needs the density of the solution');
  return success({ ...given, measured: over(times(measured, density), molarMass) });
};

const giveRecord = (record: string | RecordText | undefined): Result<readonly Given[]> => {
  if (record === undefined) return success([]);
  const field = 'given.record';
  if (typeof record === 'string')
    return failure({
      code: 'bad-ask',
      message: 'a record is a list of pairs of time and current',
      field,
      span: wholeSpan(record),
      hint: 'Write [["0 s", "2.1 A"], ["60 s", "2.0 A"]].',
    });
  return chain(inField(readRecord(record), field), ({ charge, time }) =>
    success([
      { name: 'charge', field, text: '', measured: charge },
      { name: 'time', field, text: '', measured: time },
    ]),
  );
};

const notText = (name: string): Result<never> =>
  failure({
    code: 'bad-ask',
    message: 'only a record is a list',
    field: `given.${name}`,
    hint: 'Write a text: "250 A".',
  });

/** All texts of `given`, read but not yet converted. */
export interface GivenReadings {
  readonly recorded: readonly Given[];
  readonly readings: readonly GivenReading[];
}

/** Reads every quantity given, in the order of the ask. Faults carry their field and span, those of reading first. */
export const readGivenTexts = (given: GivenTexts): Result<GivenReadings> => {
  const entries = Object.entries(given).filter(([name]) => name !== 'record');
  const read = allByRank(
    entries.map(([name, text]) => {
      const known = quantityNamed(name, 'given');
      if (!known.ok) return known;
      return typeof text === 'string' ? giveOne(known.value, text) : notText(name);
    }),
  );
  const recorded = giveRecord(given['record']);
  const ranked = allByRank<unknown>([recorded, read]);
  if (!ranked.ok) return ranked;
  return chain(recorded, (record) => map(read, (readings) => ({ recorded: record, readings })));
};

/** Everything given in SI base units, concentrations counted in moles of the species of this molar mass. */
export const convertGiven = (
  { recorded, readings }: GivenReadings,
  molarMass: Measured | undefined,
): Result<readonly Given[]> => {
  const density = readings.find(({ name }) => name === 'density')?.measured;
  const converted = all(
    readings.map((one) =>
      one.name === 'from' || one.name === 'to' ? toMolar(one, { molarMass, density }) : success<Given>(one),
    ),
  );
  return chain(converted, (values) => success([...recorded, ...values]));
};
