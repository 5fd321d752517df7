import { type Rational, isWhole, isZero, rational, signOf } from '../exact/rational.ts';
import { withPeroxo } from './oxidation-peroxo.ts';
import type { Site } from './oxidation-site.ts';
import { type State, has } from './oxidation-state.ts';
import { boundsOf, commonNumbers, isMetal } from './oxidation-table.ts';

/** Every choice of common numbers for the open elements that closes the charge. */
const closings = (state: State): readonly (readonly Site[])[] => {
  const [next, ...others] = state.open;
  if (next === undefined) return isZero(state.rest) ? [state.sites] : [];
  const [element, count] = next;
  return commonNumbers(element).flatMap((value) => {
    const site: Site = { element, number: rational(value), count };
    const rest = state.rest.sub(count.mul(site.number));
    return closings({ ...state, open: new Map(others), sites: [...state.sites, site], rest });
  });
};

const MOST_OPEN = 4;

const closeByTable = (state: State): readonly Site[] | undefined => {
  if (state.open.size > MOST_OPEN) return undefined;
  const [only, ...others] = closings(state);
  return others.length > 0 ? undefined : only;
};

/** Carbonyl metals go down to -4 (Fe(CO)4^2-). */
const lowestOf = (state: State, element: string): number =>
  state.bag.carbonyl && isMetal(element) ? -4 : boundsOf(element).lowest;

/** A metal left over beside hydride is no compound of whole numbers but an alloy with hydrogen in it: LaNi5H6, PdH0.6. */
const isAlloyHydride = (state: State, element: string, average: Rational): boolean =>
  isMetal(element) && !isWhole(average) && state.sites.some((site) => site.element === 'H' && signOf(site.number) < 0n);

/** Anions of little electronegativity: their compounds with metals are often alloys (Fe3C, Ni3P, FeSb2). */
const SOFT_ANIONS: ReadonlySet<string> = new Set(['C', 'Si', 'Ge', 'P', 'As', 'Sb', 'Te']);

/**
 * Without oxygen, a metal must come out at a common number beside several anions (FeAsS would give 5 for Fe) or beside
 * a soft one (FeSb2 would give 6); what stands with known ions or ligands is no such compound.
 */
const isPlausible = (state: State, element: string, average: Rational): boolean => {
  if (isAlloyHydride(state, element, average)) return false;
  if (has(state, 'O') || !isMetal(element) || state.bag.stripped) return true;
  const anions = state.sites.filter(({ number }) => signOf(number) < 0n).map((site) => site.element);
  const doubtful = anions.length > 1 || anions.some((anion) => SOFT_ANIONS.has(anion));
  return !doubtful || commonNumbers(element).some((number) => average.equals(number));
};

/** The last open element takes the average that closes the charge, within its bounds. */
const closeByAverage = (state: State, element: string, count: Rational): readonly Site[] | undefined => {
  const average = state.rest.div(count);
  const { highest } = boundsOf(element);
  if (average.compare(lowestOf(state, element)) < 0 || !isPlausible(state, element, average)) return undefined;
  if (average.compare(highest) <= 0) return [...state.sites, { element, number: average, count }];
  const oxygens = state.sites.find((site) => site.element === 'O')?.count;
  if (oxygens === undefined) return undefined;
  const sites = withPeroxo(element, count, average, BigInt(highest), oxygens);
  return sites === undefined ? undefined : [...state.sites.filter((site) => site.element !== 'O'), ...sites];
};

/**
 * The sites with the last open element at the average that closes the charge, or, with several open, at the only
 * choice of common numbers that does; undefined where there is none or more than one.
 */
export const close = (state: State): readonly Site[] | undefined => {
  const [last, ...others] = state.open;
  if (last === undefined) return isZero(state.rest) ? state.sites : undefined;
  return others.length > 0 ? closeByTable(state) : closeByAverage(state, ...last);
};
