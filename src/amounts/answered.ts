import { allByRank } from '../report/precedence.ts';
import { type Result, chain, failure, inField, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import { AMOUNT, DENSITY, NUMBER, sameDimension } from './dimension.ts';
import { type Correlation, type Measured, times, uncertaintyOf } from './measured.ts';
import { quantityNamed } from './given.ts';
import { toFloat } from './number.ts';
import { QUANTITIES, QUANTITY_NAMES, type QuantityName } from './quantities.ts';
import { readWantedUnit } from './quantity.ts';
import type { Known } from './solver.ts';
import { type UnitValue, readUnitText } from './unit-expression.ts';

/** The contract's quantity: unrounded, one standard uncertainty in the same unit where anything is known. */
export interface Quantity {
  readonly value: number;
  readonly unit: string;
  readonly uncertainty?: number;
}

/** The unit that a quantity is answered in. */
export interface AnswerUnit {
  readonly text: string;
  readonly unit: UnitValue;
}

/** The units of an answer by quantity: those wanted, else the usual ones. */
export type AnswerUnits = ReadonlyMap<QuantityName, AnswerUnit>;

const usualUnits: AnswerUnits = new Map(
  QUANTITY_NAMES.map((name) => {
    const text = QUANTITIES[name].unit;
    const read = readUnitText(text);
    const unit = read.ok ? read.value[0] : undefined;
    if (unit === undefined) throw new Error(`the usual unit of ${name}`);
    return [name, { text, unit }];
  }),
);

const wantOne = (name: string, text: string): Result<readonly [QuantityName, AnswerUnit]> =>
  chain(quantityNamed(name, 'want'), (known) =>
    chain(inField(readWantedUnit(text, QUANTITIES[known]), `want.${name}`), (unit) => {
      const wrong = (known === 'volume' && /mol/u.test(text)) || isFraction(known, unit);
      return wrong ? notAUnit(known, text) : success([known, { text: shownUnit(text.trim()), unit }] as const);
    }),
  );

/** An ampere hour in one word: what divides it, its prefix, its power.   g/mAh, Ah^-1 */
const AMPERE_HOUR = /(\/\s*|\bper\s+)?(?<!\p{L})([µumkM]?)Ah(\^?[⁻−-]?[\d⁰¹²³⁴-⁹]+)?(?![\p{L}\d])/gu;

/** `mAh` is `mA h`, in a divisor with brackets: `g/Ah` is `g/(A h)`. Any other unit is answered as it was typed. */
const shownUnit = (text: string): string =>
  text.replace(AMPERE_HOUR, (_, over: string | undefined, prefix: string, power = '') => {
    const product = `${prefix}A${power} h${power}`;
    return over === undefined ? product : `${over}(${product})`;
  });

/** A concentration cannot be answered as a mass fraction: nothing says what the solution weighs afterwards. */
const isFraction = (name: QuantityName, unit: UnitValue): boolean =>
  (name === 'from' || name === 'to') && sameDimension(unit.dimension, NUMBER);

const notAUnit = (name: QuantityName, text: string): Result<never> =>
  failure({
    code: 'unknown-unit',
    message: `${text} is no unit to answer ${QUANTITIES[name].name} in`,
    field: `want.${name}`,
    span: wholeSpan(text),
    hint: `Ask for it in ${QUANTITIES[name].example}.`,
  });

/** The units of the answer. Faults: `unknown-quantity`, `unknown-unit`, in `want.NAME`. */
export const readWanted = (want: Readonly<Record<string, string>>): Result<AnswerUnits> =>
  chain(allByRank(Object.entries(want).map(([name, text]) => wantOne(name, text))), (wanted) =>
    success(new Map([...usualUnits, ...wanted])),
  );

/** What is left of inputs that cancel is rounding, not uncertainty. */
const NEGLIGIBLE = 1e-13;

const inUnit = (measured: Measured, { text, unit }: AnswerUnit, correlations: readonly Correlation[]): Quantity => {
  const factor = toFloat(unit.factor);
  const value = (measured.value - toFloat(unit.offset)) / factor;
  const uncertainty = uncertaintyOf(measured, correlations) / factor;
  return { value, unit: text, ...(uncertainty > NEGLIGIBLE * Math.abs(value) ? { uncertainty } : {}) };
};

/** Mass concentrations weigh the species; a normal volume is that of a gas; all else stands as it is. */
const toAnswer = (name: QuantityName, known: Known, unit: UnitValue): Measured | undefined => {
  const value = known.get(name);
  if (name === 'volume' && sameDimension(unit.dimension, AMOUNT)) return known.get('normal');
  if ((name !== 'from' && name !== 'to') || !sameDimension(unit.dimension, DENSITY)) return value;
  const mass = known.get('molar_mass');
  return value === undefined || mass === undefined ? undefined : times(value, mass);
};

/** The named quantities that are known, each in its unit, in the order of the table. */
export const showQuantities = (
  known: Known,
  names: ReadonlySet<QuantityName>,
  units: AnswerUnits,
  correlations: readonly Correlation[],
): Readonly<Record<string, Quantity>> => {
  const shown: Record<string, Quantity> = {};
  for (const name of QUANTITY_NAMES) {
    const answer = units.get(name);
    if (!names.has(name) || answer === undefined) continue;
    const measured = toAnswer(name, known, answer.unit);
    if (measured !== undefined && Number.isFinite(measured.value)) shown[name] = inUnit(measured, answer, correlations);
  }
  return shown;
};
