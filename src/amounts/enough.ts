import { type Result, failure, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import { allowsDefault } from './problem.ts';
import type { AmountsAnswer, Working } from './working.ts';
import { type Knowledge, isUsed, whatWouldDo } from './missing.ts';
import { QUANTITIES, type QuantityName, isQuantityName } from './quantities.ts';
import type { VariableName } from './relations.ts';
import { closureOf } from './solver.ts';

/** Quantities that were measured for the sake of the answer: given and leading nowhere, they are never passed over. */
const NEVER_IDLE: readonly VariableName[] = ['volume', 'thickness', 'from', 'to'];

const knowledgeOf = ({ derived, problem }: Working): Knowledge => ({
  names: new Set(derived.known.keys()),
  relations: derived.relations,
  defaultEfficiency: allowsDefault(problem),
});

const listed = (names: readonly string[]): string => names.map((name) => name.replaceAll('_', ' ')).join(' and ');

const notEnough = (field: string, message: string, missing: readonly string[], text?: string): Result<never> =>
  failure({
    code: 'not-enough-given',
    message,
    field,
    ...(text === undefined ? {} : { span: wholeSpan(text) }),
    ...(missing.length === 0 ? {} : { hint: `Give ${listed(missing)} too.` }),
    missing,
  });

/** Charge flows, but nothing says which part of it the species took. */
const checkShare = ({ derived, problem }: Working): Result<null> => {
  if (!derived.known.has('charge') || derived.known.has('amount')) return success(null);
  const missing = problem.asked.parts.some(({ branch }) => (problem.branches[branch]?.share ?? null) === null);
  return missing
    ? notEnough('electrode', 'the share of the current that this reaction takes is not known', ['share'])
    : success(null);
};

/** The given quantities that lead nowhere. */
export const idleGivens = ({ derived, given }: Working): Working['given'] => {
  const known = new Set(derived.known.keys());
  return given.filter(({ name }) => !isUsed(name, known, derived.relations));
};

/** A gas volume needs temperature and pressure, whatever else could be turned around; any other is that of a tank. */
const missingBeside = (working: Working, name: VariableName): readonly string[] => {
  const { known, relations } = working.derived;
  const gas = relations.some(({ terms }) => terms.some(([term]) => term === 'gas_constant'));
  if (name === 'volume')
    return (gas ? (['temperature', 'pressure'] as const) : (['from', 'to'] as const)).filter((one) => !known.has(one));
  return whatWouldDo(knowledgeOf(working), (names) => isUsed(name, names, relations), [name]);
};

const checkIdle = (working: Working, wanted: readonly string[]): Result<null> => {
  const { derived } = working;
  const led = derived.known.has('charge') || derived.known.has('amount') || wanted.length > 0;
  const perArea = derived.steps.some(({ relation }) => !derived.relations.includes(relation));
  const idle = idleGivens(working)
    .filter(({ name }) => !(perArea && name === 'density'))
    .find(({ name }) => !led || NEVER_IDLE.includes(name));
  if (idle === undefined) return success(null);
  const beside = missingBeside(working, idle.name);
  const missing = beside.length === 0 && !derived.known.has('charge') ? ['charge'] : beside;
  const what = isQuantityName(idle.name) ? QUANTITIES[idle.name].name : idle.field;
  return notEnough(led ? idle.field : 'given', `${what} alone leads nowhere`, missing, led ? idle.text : undefined);
};

const follows = ({ quantities, alongside }: AmountsAnswer, name: string): boolean =>
  [quantities, ...Object.values(alongside)].some((one) => one[name] !== undefined);

/** An efficiency needs both a charge and a measured amount; what was only assumed is neither. */
const missingForEfficiency = ({ derived, given }: Working): readonly string[] => {
  const constants = (['gas_constant', 'series', 'faraday', 'molar_mass'] as const).filter((name) =>
    derived.known.has(name),
  );
  const measured = closureOf([...constants, ...given.map(({ name }) => name)], derived.relations);
  return [...(measured.has('charge') ? [] : ['charge']), ...(measured.has('amount') ? [] : ['mass'])];
};

const missingFor = (working: Working, name: QuantityName): readonly string[] =>
  name === 'share' || name === 'efficiency'
    ? missingForEfficiency(working)
    : whatWouldDo(knowledgeOf(working), (names) => names.has(name), [name]);

const checkWanted = (working: Working, answer: AmountsAnswer, wanted: readonly string[]): Result<null> => {
  const name = wanted.filter(isQuantityName).find((one) => !follows(answer, one));
  if (name === undefined) return success(null);
  return notEnough(
    `want.${name}`,
    `${QUANTITIES[name].name} does not follow from what is given`,
    missingFor(working, name),
  );
};

/**
 * Refuses an ask that leads nowhere: a wanted quantity that follows for no species, a measurement that cannot be used,
 * a charge without the share of the reaction, or nothing given that reaches a charge. Fault: `not-enough-given`, with
 * what would do in `missing`.
 */
export const checkEnough = (working: Working, answer: AmountsAnswer): Result<null> => {
  const wanted = Object.keys(working.request.want ?? {});
  for (const result of [checkShare(working), checkWanted(working, answer, wanted), checkIdle(working, wanted)])
    if (!result.ok) return result;
  return success(null);
};
