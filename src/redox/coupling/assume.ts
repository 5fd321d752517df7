import { speciesMatrix } from '../../balance/matrix.ts';
import type { Numbers } from '../../balance/solve.ts';
import type { Unknown } from '../../balance/unknowns.ts';
import { type Bounds, type Meter, USUAL_BOUNDS, startMeter } from '../../exact/bounds.ts';
import { type IntegerVector, nullSpace, range } from '../../exact/matrix.ts';
import { type Species, ELECTRON, isElectron, plainSpecies } from '../../species/species.ts';

/** A balance and the assumption, in words, that singles it out. */
export interface Assumed {
  readonly assume: string;
  readonly numbers: Numbers;
}

/** One condition  row nu = 0  on the numbers, in words without "if". */
export interface Condition {
  readonly words: string;
  readonly row: IntegerVector;
}

/** Conditions thought of, balances given, and sets of conditions tried: among many unknowns fewer, as each costs more. */
const MOST_CONDITIONS = 40;
const MOST_PER_SIDE = 60;
const BOUNDS: Bounds = { ...USUAL_BOUNDS, steps: 40_000_000 };
const MOST_GIVEN = 12;
const triesAmong = (count: number): number => Math.min(400, Math.floor(400_000 / (count * count)));

/**
 * The balances that `dimension` - 1 simple conditions single out and in which every species with a side takes part on
 * it. Conditions, the first tried first: a reactant gives a product one to one, of a couple or of two forms of an element;
 * two products, or two reactants, go one to one, those of like elements first; an unwritten helper takes no part (a later
 * one before an earlier one, so that the order of the list is its preference), first of these where helpers depend on one
 * another.
 */
export const assumedBalances = (unknowns: readonly Unknown[], dimension: number, whole?: Meter): readonly Assumed[] => {
  const { rows } = speciesMatrix(unknowns.map((unknown) => unknown.species));
  const found = new Map<string, Assumed>();
  const meter = startMeter(BOUNDS, whole);
  for (const conditions of choices(conditionsOn(unknowns), dimension - 1, triesAmong(unknowns.length))) {
    if (found.size >= MOST_GIVEN) break;
    const [line, second] = nullSpace([...rows, ...conditions.map(({ row }) => row)], unknowns.length, meter);
    if (meter.passed() !== undefined) break;
    const numbers = line === undefined || second !== undefined ? undefined : onTheirSides(unknowns, line);
    if (numbers === undefined || found.has(numbers.join())) continue;
    found.set(numbers.join(), { assume: `if ${conditions.map(({ words }) => words).join(' and ')}`, numbers });
  }
  return [...found.values()];
};

/** `line` or its opposite, whichever has every unknown with a side on it; undefined if neither. */
export const onTheirSides = (unknowns: readonly Unknown[], line: Numbers): Numbers | undefined => {
  const fits = (numbers: Numbers): boolean =>
    unknowns.every(({ side }, index) => {
      const nu = numbers[index] ?? 0n;
      return side === 'free' || (side === 'left' ? nu < 0n : nu > 0n);
    });
  const opposite = line.map((value) => -value);
  return fits(line) ? line : fits(opposite) ? opposite : undefined;
};

interface Standing {
  readonly species: Species;
  readonly index: number;
}

/** The first that have this side: among more of them no condition is a likely one. */
const standing = (unknowns: readonly Unknown[], side: Unknown['side']): readonly Standing[] =>
  unknowns
    .flatMap(({ species, side: own }, index) => (own === side && !isElectron(species) ? [{ species, index }] : []))
    .slice(0, MOST_PER_SIDE);

/** Conditions that two products form one to one, those of like elements first. */
export const ratiosOfProducts = (unknowns: readonly Unknown[]): readonly Condition[] =>
  oneToOne(unknowns, standing(unknowns, 'right'), 'form');

const oneToOne = (unknowns: readonly Unknown[], all: readonly Standing[], verb: string): readonly Condition[] =>
  pairsOf(all)
    .slice(0, MOST_CONDITIONS)
    .map(([a, b]) => ({
      words: `${plainSpecies(a.species)} and ${plainSpecies(b.species)} ${verb} one to one`,
      row: rowOf(unknowns, a, b, -1n),
    }));

/**  nu_a + sign nu_b = 0,  or without b  nu_a = 0. */
const rowOf = (unknowns: readonly Unknown[], a: Standing, b: Standing | null, sign: bigint): IntegerVector =>
  range(unknowns.length).map((index) => (index === a.index ? 1n : index === b?.index ? sign : 0n));

const conditionsOn = (unknowns: readonly Unknown[]): readonly Condition[] => {
  const [reactants, products] = [standing(unknowns, 'left'), standing(unknowns, 'right')];
  const isCouple = reactants.length === 1 && products.length === 1;
  const couples = reactants.flatMap((a) => products.map((b): readonly [Standing, Standing] => [a, b]));
  const likely = couples.filter(([a, b]) => isCouple || areForms(a.species, b.species));
  const free = standing(unknowns, 'free');
  const idle = free
    .toReversed()
    .map((a) => ({ words: `${plainSpecies(a.species)} takes no part`, row: rowOf(unknowns, a, null, 0n) }));
  const dependent = areDependent(free.map(({ species }) => species));
  return [
    ...likely.map(([a, b]) => ({
      words: `1 ${plainSpecies(a.species)} gives 1 ${plainSpecies(b.species)}`,
      row: rowOf(unknowns, a, b, 1n),
    })),
    ...(dependent ? idle : []),
    ...ratiosOfProducts(unknowns),
    ...oneToOne(unknowns, reactants, 'are used'),
    ...(dependent ? [] : idle),
  ].slice(0, MOST_CONDITIONS);
};

/** Helpers that depend on one another, the electron beside them: to leave one out is then natural, and arbitrary else. */
const areDependent = (helpers: readonly Species[]): boolean =>
  nullSpace(speciesMatrix([...helpers, ELECTRON]).rows, helpers.length + 1).length > 0;

/** Two forms of one element: O3 and O2. */
const areForms = (a: Species, b: Species): boolean => a.composition.size === 1 && unlike(a, b) === 0;

/** Elements that only one of the two holds. */
const unlike = (a: Species, b: Species): number => {
  const [first, second] = [[...a.composition.keys()], [...b.composition.keys()]];
  const shared = first.filter((element) => b.composition.has(element)).length;
  return first.length + second.length - 2 * shared;
};

/** All pairs, those of like elements first: NO and NO2 before NO and Cu(NO3)2. */
const pairsOf = (all: readonly Standing[]): readonly (readonly [Standing, Standing])[] =>
  all
    .flatMap((a, at) => all.slice(at + 1).map((b): readonly [Standing, Standing] => [a, b]))
    .toSorted(([a, b], [c, d]) => unlike(a.species, b.species) - unlike(c.species, d.species));

/** The first `most` ways to choose `count` of `items`, in their order. */
const choices = <T>(items: readonly T[], count: number, most: number): readonly (readonly T[])[] => {
  if (count === 0) return [[]];
  const found: (readonly T[])[] = [];
  for (const [index, item] of items.entries()) {
    if (found.length >= most || items.length - index < count) break;
    const rest = choices(items.slice(index + 1), count - 1, most - found.length);
    found.push(...rest.map((chosen) => [item, ...chosen]));
  }
  return found;
};
