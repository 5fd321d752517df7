import { type Result, all, chain, failure, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import type { Given } from './given.ts';
import type { Measured } from './measured.ts';
import { QUANTITIES, isQuantityName } from './quantities.ts';
import type { Relation, VariableName } from './relations.ts';
import { type Known, isNearZero } from './solver.ts';

const HIDDEN_NAMES: Partial<Record<VariableName, string>> = {
  working: 'the charge through all cells',
  net: 'the charge without the blank',
  dry: 'the pressure of the dry gas',
  drop: 'the change of the concentration',
  normal: 'the normal volume',
};

const isNamed = (name: VariableName): boolean => isQuantityName(name) || HIDDEN_NAMES[name] !== undefined;

/** A variable in words. */
export const nameOf = (name: VariableName): string =>
  isQuantityName(name) ? QUANTITIES[name].name : (HIDDEN_NAMES[name] ?? name);

/** What was given that enters a value, the last of it: where a fault points. */
const culprit = (value: Measured, given: readonly Given[]): Given | undefined =>
  given.filter(({ measured }) => [...measured.slopes.keys()].some((source) => value.slopes.has(source))).at(-1);

const IMPOSSIBLE = 'What is given cannot all be true: correct it, or leave out what can be derived.';

const impossible = (
  value: Measured,
  given: readonly Given[],
  message: string,
  at?: VariableName,
  hint = IMPOSSIBLE,
): Result<never> => {
  const named = given.find(({ name }) => name === at) ?? culprit(value, given);
  return failure({
    code: 'contradiction',
    message,
    field: named?.field ?? 'given',
    ...(named === undefined || named.text === '' ? {} : { span: wholeSpan(named.text) }),
    hint,
  });
};

/** Values and which of them nobody gave. */
interface Values {
  readonly known: Known;
  readonly assumed: ReadonlySet<VariableName>;
}

/** No charge makes these negative, whichever way it flows; a mass that is taken off may be. */
const NEVER_NEGATIVE: readonly VariableName[] = [
  'time',
  'area',
  'efficiency',
  'temperature',
  'pressure',
  'vapour_pressure',
  'density',
  'mass_per_charge',
  'charge_per_mass',
];

const checkNegative = (name: VariableName, known: Known, given: readonly Given[]): Result<null> => {
  const value = known.get(name);
  if (value === undefined || value.value >= 0) return success(null);
  return impossible(value, given, `${nameOf(name)} comes out negative, which cannot be`);
};

/** The vapour is a part of the whole pressure, and some gas is left beside it. */
const checkVapour = (known: Known, given: readonly Given[]): Result<null> => {
  const dry = known.get('dry');
  if (dry === undefined || dry.value > 0) return success(null);
  return impossible(dry, given, 'the vapour alone presses as much as the whole: no dry gas is left', 'vapour_pressure');
};

/** A tank cannot lose more than it holds; what is below nothing within its digits passes. */
const checkConcentration = (name: 'from' | 'to', { known, assumed }: Values, given: readonly Given[]): Result<null> => {
  const value = known.get(name);
  const other = known.get(name === 'to' ? 'from' : 'to');
  if (value === undefined || value.value >= 0 || isNearZero(value, Math.abs(other?.value ?? 0))) return success(null);
  const shown = String(Number((value.value / 1000).toPrecision(4)));
  const hint = assumed.has('efficiency') ? 'An efficiency of 100 % was taken: give the efficiency.' : undefined;
  const message = `${nameOf(name)} comes out as ${shown} mol/L: the tank does not hold so much`;
  return impossible(value, given, message, undefined, hint);
};

const checkTankVolume = (known: Known, given: readonly Given[]): Result<null> => {
  const volume = known.get('volume');
  if (volume === undefined || volume.value >= 0 || !known.has('drop')) return success(null);
  return impossible(volume, given, 'the volume of the tank comes out negative: the concentration goes the wrong way');
};

/** Values that follow and cannot be. Fault: `contradiction`, at a quantity that enters. */
export const checkValues = (values: Values, given: readonly Given[]): Result<null> => {
  const { known } = values;
  const checks = [
    checkVapour(known, given),
    ...(['from', 'to'] as const).map((name) => checkConcentration(name, values, given)),
    checkTankVolume(known, given),
    ...NEVER_NEGATIVE.map((name) => checkNegative(name, known, given)),
  ];
  return chain(all(checks), () => success(null));
};

/** What may be infinite without harm: the charge for a kilogram of what is not made at all. */
const BOUNDLESS: readonly VariableName[] = ['mass_per_charge', 'charge_per_mass', 'energy_per_mass', 'faraday'];

/**
 * Product  x^p (product of y^q) = 1  with x alone unknown: x = product of y^(-q/p). A zero in the divisor and none in
 * the dividend leaves no x at all; a zero in both leaves any.
 */
const checkDivision = ({ kind, formula, terms }: Relation, known: Known, given: readonly Given[]): Result<null> => {
  const open = terms.filter(([name]) => !known.has(name));
  const [unknown, more] = open;
  if (kind !== 'product' || unknown === undefined || more !== undefined || BOUNDLESS.includes(unknown[0]))
    return success(null);
  const zeros = terms.filter(([name]) => known.get(name)?.value === 0);
  const divides = ([, power]: readonly [VariableName, number]): boolean => power / unknown[1] > 0;
  const [divisor] = zeros;
  const value = divisor === undefined ? undefined : known.get(divisor[0]);
  if (divisor === undefined || value === undefined || !zeros.every(divides)) return success(null);
  const others = terms
    .filter((term) => term !== unknown && !divides(term) && isNamed(term[0]))
    .map(([name]) => nameOf(name));
  const message = `${formula}: ${nameOf(divisor[0])} is 0, but ${others.join(' and ')} ${others.length > 1 ? 'are' : 'is'} not`;
  return impossible(value, given, message);
};

/** Relations that no value can satisfy: 60 g of a deposit without a charge. Fault: `contradiction`. */
export const checkDivisions = (relations: readonly Relation[], known: Known, given: readonly Given[]): Result<null> =>
  chain(all(relations.map((relation) => checkDivision(relation, known, given))), () => success(null));
