import { type Measured, type Source, productOf, scaled, uncertaintyOf, weightedSum } from './measured.ts';
import type { Relation, VariableName } from './relations.ts';

/** Values known so far, in SI base units. */
export type Known = ReadonlyMap<VariableName, Measured>;

/** A value and the relation that gave it. */
export interface Derivation {
  readonly name: VariableName;
  readonly relation: Relation;
  readonly from: readonly VariableName[];
}

/** What follows from what was given, and how, in the order of derivation. */
export interface Solution {
  readonly known: Known;
  readonly derived: readonly Derivation[];
}

/**
 * The unknown of a relation from the others.
 * Product:  x^p (product of y^q) = 1  gives  x = (product of y^(-q/p)), and p is 1 or -1.
 * Sum:      a x + (sum of b y) = 0    gives  x = -(sum of b y) / a.
 */
const solveFor = (relation: Relation, name: VariableName, known: Known): Measured | undefined => {
  const own = relation.terms.find(([variable]) => variable === name)?.[1] ?? 1;
  const others: (readonly [number, Measured])[] = [];
  for (const [variable, power] of relation.terms) {
    const value = known.get(variable);
    if (variable !== name && value !== undefined) others.push([power, value]);
  }
  if (relation.kind === 'sum') return scaled(weightedSum(others), -1 / own);
  const factors = others.map(([power, value]) => [-power / own, value] as const);
  const result = productOf(factors);
  return Number.isFinite(result.value) ? result : undefined;
};

const unknownsOf = (relation: Relation, has: (name: VariableName) => boolean): readonly VariableName[] =>
  relation.terms.map(([name]) => name).filter((name) => !has(name));

/**
 * Derives whatever follows: the first relation in the list with one unknown gives it, and the list is gone through
 * again until nothing new comes. A division by zero gives nothing.
 */
export const derive = (given: Known, relations: readonly Relation[]): Solution => {
  const known = new Map(given);
  const derived: Derivation[] = [];
  const step = (): boolean =>
    relations.some((relation) => {
      const [name, more] = unknownsOf(relation, (variable) => known.has(variable));
      if (name === undefined || more !== undefined) return false;
      const value = solveFor(relation, name, known);
      if (value === undefined) return false;
      known.set(name, value);
      const from = relation.terms.map(([variable]) => variable).filter((variable) => variable !== name);
      derived.push({ name, relation, from });
      return true;
    });
  while (step());
  return { known, derived };
};

/** The names that could be derived if only names matter. */
export const closureOf = (names: Iterable<VariableName>, relations: readonly Relation[]): ReadonlySet<VariableName> => {
  const known = new Set(names);
  const step = (): boolean =>
    relations.some((relation) => {
      const [name, more] = unknownsOf(relation, (variable) => known.has(variable));
      if (name === undefined || more !== undefined) return false;
      known.add(name);
      return true;
    });
  while (step());
  return known;
};

/** A relation between known values that does not follow from the others: a check of what was given. */
export interface Check {
  readonly relation: Relation;
  /** The quantity checked, its value as known, and its value from the others. */
  readonly name: VariableName;
  readonly known: Measured;
  readonly found: Measured;
  readonly agrees: boolean;
  /** The inputs on which the check depends. */
  readonly sources: readonly Source[];
}

const ROUNDING = 1e-9;
/** Agreement within this many standard uncertainties. */
const COVERAGE = 3;
const COARSEST = 0.01;

/**
 * Two values agree where they differ by no more than three standard uncertainties of the difference, plus one unit in
 * the last digit of the most finely written input that enters (at most 1 %): nobody can ask for more.
 */
const agree = (difference: Measured, scale: number, sources: readonly Source[]): boolean => {
  const written = sources
    .filter((source) => source.lastDigit > 0 && source.value !== 0)
    .map((source) => Math.abs(source.lastDigit / source.value));
  const finest = Math.min(COARSEST, ...(written.length === 0 ? [0] : written));
  const allowed = COVERAGE * uncertaintyOf(difference) + (finest + ROUNDING) * scale;
  return Math.abs(difference.value) <= allowed;
};

/**
 * The inputs that the difference really depends on. Where a relation follows from those that gave its values, the
 * difference is zero whatever the inputs are, and so are its slopes.
 */
const sourcesOf = (difference: Measured, scale: number): readonly Source[] =>
  [...difference.slopes]
    .filter(([source, slope]) => Math.abs(slope * (source.value === 0 ? 1 : source.value)) > ROUNDING * scale)
    .map(([source]) => source);

/** Whether a value that is small beside `scale` may be 0, by its digits and uncertainties. */
export const isNearZero = (value: Measured, scale: number): boolean => agree(value, scale, sourcesOf(value, scale));

/** Whether two values of one quantity agree, and the inputs on which their difference depends. */
export const compareValues = (
  known: Measured,
  found: Measured,
): { readonly agrees: boolean; readonly sources: readonly Source[] } => {
  const difference = weightedSum([
    [1, known],
    [-1, found],
  ]);
  const scale = Math.max(Math.abs(known.value), Math.abs(found.value));
  const sources = sourcesOf(difference, scale);
  const tautology = sources.length === 0 && Math.abs(difference.value) <= ROUNDING * scale;
  return { agrees: tautology || agree(difference, scale, sources), sources };
};

const checkRelation = (relation: Relation, known: Known): Check | undefined => {
  const checked = relation.terms.find(([name]) => {
    const found = solveFor(relation, name, known);
    return found !== undefined && known.has(name);
  });
  if (checked === undefined) return undefined;
  const [name] = checked;
  const value = known.get(name);
  const found = solveFor(relation, name, known);
  if (value === undefined || found === undefined) return undefined;
  const { agrees, sources } = compareValues(value, found);
  return agrees && sources.length === 0 ? undefined : { relation, name, known: value, found, agrees, sources };
};

/** Every relation whose values are all known and that says something about the inputs. */
export const checksOf = (known: Known, relations: readonly Relation[]): readonly Check[] =>
  relations
    .filter((relation) => relation.terms.every(([name]) => known.has(name)))
    .flatMap((relation) => checkRelation(relation, known) ?? []);
