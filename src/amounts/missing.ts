import type { QuantityName } from './quantities.ts';
import type { Relation, VariableName } from './relations.ts';
import { closureOf } from './solver.ts';

/** In which order quantities are proposed where something is missing: what a shop has at hand first. */
const PROPOSALS: readonly QuantityName[] = [
  'time',
  'current',
  'charge',
  'efficiency',
  'temperature',
  'pressure',
  'density',
  'area',
  'voltage',
  'current_density',
  'volume',
  'from',
  'to',
  'mass',
  'amount',
  'energy',
  'thickness',
  'charge_per_mass',
];

/** With a current density the area leads from it to the current; a current given too would leave it idle. */
const DENSITY_FIRST: readonly QuantityName[] = ['time', 'area', 'density', ...PROPOSALS];

/** What is known by name, the relations, and whether an efficiency may be taken as 100 % where none follows. */
export interface Knowledge {
  readonly names: ReadonlySet<VariableName>;
  readonly relations: readonly Relation[];
  readonly defaultEfficiency: boolean;
}

/** True where a name follows by name alone: then only a division by zero can be in the way. */
export const followsByName = (knowledge: Knowledge, name: VariableName): boolean => reachable(knowledge, []).has(name);

/** The names that follow when `more` is given too, by the same steps as the values. */
const reachable = (
  { names, relations, defaultEfficiency }: Knowledge,
  more: readonly VariableName[],
): ReadonlySet<VariableName> => {
  const first = closureOf([...names, ...more], relations);
  return defaultEfficiency && !first.has('efficiency') ? closureOf([...first, 'efficiency'], relations) : first;
};

/**
 * The fewest quantities that would do, one or two or three, in the order of the proposals; [] where nothing does.
 * `reached` judges the names that would be known.
 */
export const whatWouldDo = (
  knowledge: Knowledge,
  reached: (names: ReadonlySet<VariableName>) => boolean,
  except: readonly VariableName[] = [],
): readonly QuantityName[] => {
  const proposals = knowledge.names.has('current_density') ? [...new Set(DENSITY_FIRST)] : PROPOSALS;
  const open = proposals.filter((name) => !knowledge.names.has(name) && !except.includes(name));
  for (let size = 1; size <= 3; size += 1) {
    const found = subsets(open, size).find((set) => reached(reachable(knowledge, set)));
    if (found !== undefined) return found;
  }
  return [];
};

const subsets = <T>(items: readonly T[], size: number): readonly (readonly T[])[] =>
  size === 0
    ? [[]]
    : items.flatMap((item, index) => subsets(items.slice(index + 1), size - 1).map((rest) => [item, ...rest]));

const HIDDEN: ReadonlySet<VariableName> = new Set<VariableName>([
  'working',
  'net',
  'series',
  'dry',
  'drop',
  'charge_density',
  'areal',
]);

/** All that enters a relation, through the steps that only carry values to it. */
const reach = (relation: Relation, steps: readonly Relation[]): ReadonlySet<VariableName> => {
  const names = new Set(relation.terms.map(([name]) => name));
  for (const name of names) {
    if (!HIDDEN.has(name)) continue;
    for (const step of steps) {
      const terms = step.terms.map(([variable]) => variable);
      if (terms.includes(name)) terms.forEach((variable) => names.add(variable));
    }
  }
  return names;
};

/** True where the given quantity enters a relation whose values are all known: it led somewhere. */
export const isUsed = (
  name: VariableName,
  known: ReadonlySet<VariableName>,
  relations: readonly Relation[],
): boolean => {
  const steps = relations.filter((relation) => relation.step === true);
  return relations.some(
    (relation) =>
      relation.step !== true &&
      relation.terms.every(([variable]) => known.has(variable)) &&
      reach(relation, steps).has(name),
  );
};
