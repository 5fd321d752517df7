import { type Result, failure, success } from '../report/result.ts';
import { allowsDefault } from './problem.ts';
import type { AmountsAnswer, Working } from './working.ts';
import { AMOUNT, sameDimension } from './dimension.ts';
import type { Given } from './given.ts';
import { gasKind } from './gases.ts';
import { type Knowledge, followsByName, isUsed, whatWouldDo } from './missing.ts';
import { nameOf } from './sense.ts';
import { QUANTITIES, type QuantityName, isQuantityName } from './quantities.ts';
import type { VariableName } from './relations.ts';
import { closureOf } from './solver.ts';

const knowledgeOf = ({ derived, problem }: Working): Knowledge => ({
  names: new Set(derived.known.keys()),
  relations: derived.relations,
  defaultEfficiency: allowsDefault(problem),
});

const listed = (names: readonly string[]): string => names.map((name) => name.replaceAll('_', ' ')).join(' and ');

const notEnough = (field: string, message: string, missing: readonly string[]): Result<never> =>
  failure({
    code: 'not-enough-given',
    message,
    field,
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

/** A density turned mass fractions into concentrations. */
const turnsFractions = (one: Given, given: readonly Given[]): boolean =>
  one.name === 'density' &&
  given.some((other) => other !== one && [...one.measured.slopes.keys()].some((own) => other.measured.slopes.has(own)));

/** The given quantities that lead nowhere. */
export const idleGivens = ({ derived, given }: Working): Working['given'] => {
  const known = new Set(derived.known.keys());
  return given.filter((one) => !isUsed(one.name, known, derived.relations) && !turnsFractions(one, given));
};

/** What is counted by weight. */
const BY_WEIGHT: readonly VariableName[] = [
  'mass',
  'thickness',
  'mass_per_charge',
  'charge_per_mass',
  'energy_per_mass',
];

/** Without a standard atomic weight nothing is said by weight. */
const isWeightless = ({ derived, problem }: Working, name: VariableName): boolean =>
  BY_WEIGHT.includes(name) && !derived.known.has('molar_mass') && problem.weigh(problem.asked.species) === undefined;

const weightless = (field: string, { problem }: Working): Result<never> =>
  failure({
    code: 'not-enough-given',
    message: `${problem.asked.name} has no standard atomic weight, so that nothing follows by weight`,
    field,
    missing: ['molar_mass'],
    hint: 'Give or ask the amount in mol.',
  });

const TANK = ['volume', 'from', 'to'] as const;
const CONDITIONS = ['temperature', 'pressure'] as const;

const speaksOf = ({ derived }: Working, name: VariableName): boolean =>
  derived.relations.some(({ terms }) => terms.some(([term]) => term === name));

/** A gas volume needs temperature and pressure, whatever else could be turned around; a tank its concentrations. */
const missingBeside = (working: Working, name: VariableName): readonly string[] => {
  const { known, relations } = working.derived;
  const beside = speaksOf(working, 'gas_constant') ? CONDITIONS : TANK;
  if (name === 'volume' || name === 'from' || name === 'to')
    return [...new Set<VariableName>(name === 'volume' ? beside : TANK)].filter((one) => !known.has(one));
  const leads = (names: ReadonlySet<VariableName>): boolean => names.has('charge') || names.has('amount');
  const used = whatWouldDo(knowledgeOf(working), (names) => leads(names) && isUsed(name, names, relations), [name]);
  return used.length > 0 ? used : whatWouldDo(knowledgeOf(working), leads, [name]);
};

/** What is given must reach a charge or an amount, or what is wanted; what is idle beside that is noted. */
const checkIdle = (working: Working, wanted: readonly string[]): Result<null> => {
  const { known } = working.derived;
  const [idle] = idleGivens(working);
  if (idle === undefined || known.has('charge') || known.has('amount') || wanted.length > 0) return success(null);
  if (isWeightless(working, idle.name)) return weightless('given', working);
  return notEnough('given', `${nameOf(idle.name)} alone leads nowhere`, missingBeside(working, idle.name));
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

/** A volume in Nm3 is another variable than one in L: it needs neither temperature nor pressure. */
const variableOf = ({ units }: Working, name: QuantityName): VariableName => {
  const unit = units.get(name)?.unit;
  return name === 'volume' && unit !== undefined && sameDimension(unit.dimension, AMOUNT) ? 'normal' : name;
};

/** Why no volume follows where the species asked is no gas: another one may be, or none is. */
const noVolume = (working: Working, field: string): Result<never> => {
  const { derived, problem } = working;
  const gases = problem.stakes.filter(({ species }) => gasKind(species) !== 'no-gas').map(({ name }) => name);
  if (gases.length === 0 && speaksOf(working, 'drop'))
    return notEnough(field, 'the volume of a tank is no normal volume of a gas', []);
  if (gases.length === 0)
    return failure({
      code: 'not-enough-given',
      message: `${problem.stakes.map(({ name }) => name).join(', ')}: none is a gas here, and no tank is spoken of`,
      field,
      missing: ['from', 'to'],
      hint: 'Write the state of a gas, (g); the volume of a tank follows from the concentrations from and to.',
    });
  const conditions = variableOf(working, 'volume') === 'normal' ? [] : CONDITIONS;
  const missing = ['charge' as const, ...conditions].filter((one) => !derived.known.has(one));
  return notEnough(field, `the volume of ${gases.join(', ')} does not follow from what is given`, missing);
};

const missingFor = (working: Working, name: QuantityName): readonly string[] => {
  if (name === 'share' || name === 'efficiency') return missingForEfficiency(working);
  if (working.derived.assumed.has(name)) return [name];
  const variable = variableOf(working, name);
  const found = whatWouldDo(knowledgeOf(working), (names) => names.has(variable), [name]);
  if (found.length > 0) return found;
  // No relation of this ask leads there: a tank needs its other figures, anything else can only be given.
  const tank = TANK.filter((one) => one !== name && !working.derived.known.has(one));
  return name === 'from' || name === 'to' ? tank : [name];
};

const doesNotFollow = (working: Working, name: QuantityName): Result<never> => {
  const field = `want.${name}`;
  const what = QUANTITIES[name].name;
  if (isWeightless(working, name)) return weightless(field, working);
  const { assumed } = working.derived;
  const variable = variableOf(working, name);
  if (name === 'volume' && !speaksOf(working, variable)) return noVolume(working, field);
  if (!assumed.has(variable) && name !== 'share' && followsByName(knowledgeOf(working), variable))
    return notEnough(field, `${what} does not follow: it would be divided by 0`, []);
  return notEnough(field, `${what} does not follow from what is given`, missingFor(working, name));
};

const checkWanted = (working: Working, answer: AmountsAnswer, wanted: readonly string[]): Result<null> => {
  const name = wanted.filter(isQuantityName).find((one) => !follows(answer, one));
  return name === undefined ? success(null) : doesNotFollow(working, name);
};

/**
 * Refuses an ask that leads nowhere: a wanted quantity that follows for no species, a charge without the share of the
 * reaction, or nothing given that reaches a charge. Fault: `not-enough-given`, with what would do in `missing`.
 */
export const checkEnough = (working: Working, answer: AmountsAnswer): Result<null> => {
  const wanted = Object.keys(working.request.want ?? {});
  for (const result of [checkShare(working), checkWanted(working, answer, wanted), checkIdle(working, wanted)])
    if (!result.ok) return result;
  return success(null);
};
