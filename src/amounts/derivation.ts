import { type Note, note } from '../report/note.ts';
import { type Result, all, chain, failure, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import { gasKind } from './gases.ts';
import type { Given } from './given.ts';
import { type Measured, exactly } from './measured.ts';
import { type Problem, allowsDefault, constantsOf, writtenEfficiency } from './problem.ts';
import {
  FLOW_RELATIONS,
  type Relation,
  type RelationChoice,
  type VariableName,
  speciesRelations,
} from './relations.ts';
import { checkDivisions, checkValues, nameOf } from './sense.ts';
import { type Check, type Derivation, type Known, checksOf, compareValues, derive } from './solver.ts';
import { checkTank, tankDirection } from './tank-direction.ts';

/** All that follows from what was given, and what was taken for granted on the way. */
export interface Derived {
  readonly known: Known;
  readonly steps: readonly Derivation[];
  readonly relations: readonly Relation[];
  /** Names whose value nobody gave: no blank, a dry gas, 100 %. */
  readonly assumed: ReadonlySet<VariableName>;
}

const volumeOf = (problem: Problem, given: readonly Given[]): RelationChoice['volume'] => {
  const has = (name: VariableName): boolean => given.some((one) => one.name === name);
  if (has('from') || has('to')) return tankDirection(problem, given);
  return gasKind(problem.asked.species) === 'no-gas' ? 'none' : 'gas';
};

const relationsFor = (problem: Problem, given: readonly Given[], series: Measured): readonly Relation[] => {
  const areal = !given.some(({ name }) => name === 'blank') && series.value === 1;
  return [...FLOW_RELATIONS, ...speciesRelations({ volume: volumeOf(problem, given), areal })];
};

/** Two values for one quantity, as faults and notes name them. */
const disagreement = (one: Given, other: string, found: Measured, unit: string): Result<never> =>
  failure({
    code: 'contradiction',
    message: `${one.field} is ${show(one.measured)} ${unit}, but ${other} gives ${show(found)} ${unit}`,
    field: one.field,
    ...(one.text === '' ? {} : { span: wholeSpan(one.text) }),
    hint: 'Correct one of them, or leave one out and it is derived.',
  });

const show = (measured: Measured): string => String(Number(measured.value.toPrecision(7)));

/** Base unit of a quantity in words of faults; a hidden one is named by its formula alone. */
const BASE_UNITS: Partial<Record<VariableName, string>> = {
  charge: 'C',
  current: 'A',
  current_density: 'A/m^2',
  area: 'm^2',
  time: 's',
  amount: 'mol',
  mass: 'kg',
  volume: 'm^3',
  temperature: 'K',
  pressure: 'Pa',
  density: 'kg/m^3',
  thickness: 'm',
  voltage: 'V',
  energy: 'J',
  mass_per_charge: 'kg/C',
  charge_per_mass: 'C/kg',
  energy_per_mass: 'J/kg',
};

/** One value per variable; a second one for the same variable (efficiency and share, charge and record) must agree. */
const gather = (start: Known, given: readonly Given[]): Result<Known> => {
  const known = new Map(start);
  const notes: Note[] = [];
  for (const one of given) {
    const before = known.get(one.name);
    if (before === undefined) {
      known.set(one.name, one.measured);
      continue;
    }
    if (!compareValues(before, one.measured).agrees)
      return disagreement(one, 'another part of the ask', before, BASE_UNITS[one.name] ?? '');
    notes.push(note('surplus-agrees', `${one.field} agrees with what else says so`));
  }
  return success(known, notes);
};

const contradicted = (check: Check, given: readonly Given[]): Result<never> => {
  const involved = given.filter(({ measured }) =>
    [...measured.slopes.keys()].some((own) => check.sources.includes(own)),
  );
  const named = involved.find(({ name }) => name === check.name) ?? involved.at(-1);
  const unit = BASE_UNITS[check.name] ?? '';
  const known = `${show(check.known)} ${unit}`.trim();
  const found = `${show(check.found)} ${unit}`.trim();
  return failure({
    code: 'contradiction',
    message: `${check.relation.formula}: ${nameOf(check.name)} is ${known} one way and ${found} the other`,
    ...(named === undefined ? { field: 'given' } : { field: named.field }),
    ...(named === undefined || named.text === '' ? {} : { span: wholeSpan(named.text) }),
    hint: `Given are ${involved.map(({ field }) => field).join(', ')}: correct one of them, or leave one out.`,
  });
};

const judge = (derived: Derived, given: readonly Given[]): Result<Derived> => {
  const checks = checksOf(derived.known, derived.relations);
  const failed = checks.find(({ agrees }) => !agrees);
  if (failed !== undefined) return contradicted(failed, given);
  const formulas = [...new Set(checks.map(({ relation }) => relation.formula))];
  const notes = formulas.map((formula) =>
    note('surplus-agrees', `more was given than needed, and it agrees: ${formula}`),
  );
  return success(derived, notes.slice(0, 1));
};

const WHOLE = exactly(1);
const NONE = exactly(0);

/** What follows with no blank and a dry gas where nothing else is said, before an efficiency is taken for granted. */
const solve = (given: Known, relations: readonly Relation[]): Derived => {
  const assumed = new Set<VariableName>();
  const start = new Map(given);
  for (const name of ['blank', 'vapour_pressure'] as const) {
    if (start.has(name)) continue;
    start.set(name, NONE);
    assumed.add(name);
  }
  const { known, derived } = derive(start, relations);
  return { known, steps: derived, relations, assumed };
};

/** The same with an efficiency of 100 % where none follows and one may be taken. */
const withDefault = (problem: Problem, derived: Derived): Derived => {
  if (derived.known.has('efficiency') || !allowsDefault(problem)) return derived;
  const { known, derived: steps } = derive(new Map([...derived.known, ['efficiency', WHOLE]]), derived.relations);
  const assumed = new Set<VariableName>([...derived.assumed, 'efficiency']);
  return { ...derived, known, steps: [...derived.steps, ...steps], assumed };
};

const normalVolume = (given: Given, message: string): Result<never> =>
  failure({
    code: 'unknown-unit',
    message,
    field: given.field,
    span: wholeSpan(given.text),
    hint: 'A normal volume counts a gas. Give a volume in L or m^3, or write the state of the species: (g).',
  });

/** Normal volumes are of a gas: neither a tank nor a solid has one. */
const checkNormal = (problem: Problem, given: readonly Given[]): Result<null> => {
  const normal = given.find(({ name }) => name === 'normal');
  if (normal === undefined) return success(null);
  const choice = volumeOf(problem, given);
  if (choice === 'gas') return success(null);
  return normalVolume(normal, choice === 'none' ? `${problem.asked.name} is no gas here` : 'a tank holds no gas');
};

/**
 * Derives all that follows for the species asked. `series` multiplies the charge (cells in series, bypass). Notes:
 * `surplus-agrees`. Faults: `contradiction` with both values, at one of the quantities that disagree, or where what
 * follows cannot be; `unknown-unit` for the normal volume of what is no gas.
 */
export const deriveAll = (problem: Problem, given: readonly Given[], series: Measured): Result<Derived> => {
  const start = new Map(constantsOf(problem, series));
  const written = writtenEfficiency(problem);
  if (written !== undefined) start.set('efficiency', written);
  const relations = relationsFor(problem, given, series);
  return chain(all([checkTank(problem, given), checkNormal(problem, given)]), () =>
    chain(gather(start, given), (known) => {
      const first = solve(known, relations);
      const derived = withDefault(problem, first);
      return chain(checkDivisions(relations, first.known, given), () =>
        chain(judge(derived, given), () => chain(checkValues(derived, given), () => success(derived))),
      );
    }),
  );
};
