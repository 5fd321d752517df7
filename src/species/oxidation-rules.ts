import { electronegativity } from '../elements/electronegativity.ts';
import { type Rational, ZERO, isWhole, isZero, rational, signOf } from '../exact/rational.ts';
import { withPeroxo } from './oxidation-peroxo.ts';
import { chargeOf, type Site } from './oxidation-site.ts';
import {
  anionNumber,
  boundsOf,
  commonNumbers,
  fixedNumber,
  isHalogen,
  isHydrideFormer,
  isMetal,
} from './oxidation-table.ts';

/** Atoms that share a charge, with what the spelling tells about them. */
export interface Bag {
  readonly counts: ReadonlyMap<string, Rational>;
  readonly charge: Rational;
  /** Halogens that are spelled in front of oxygen (ClO3): they are not halide. */
  readonly oxoHalogens: ReadonlySet<string>;
  /** Known ions or ligands were taken out: H is then acidic first, and carbonyl metals may be negative. */
  readonly stripped: boolean;
  readonly carbonyl: boolean;
}

/** What is settled so far. Over the open elements, the sum of number times count must come to `rest`. */
interface State {
  readonly bag: Bag;
  readonly sites: readonly Site[];
  readonly open: ReadonlyMap<string, Rational>;
  readonly rest: Rational;
}

const assign = (state: State, element: string, number: bigint): State => {
  const count = state.open.get(element);
  if (count === undefined || state.open.size < 2) return state;
  const open = new Map(state.open);
  open.delete(element);
  const site = { element, number: rational(number), count };
  return { ...state, open, sites: [...state.sites, site], rest: state.rest.sub(count.mul(site.number)) };
};

const assignAll = (state: State, numbers: Iterable<readonly [string, bigint]>): State =>
  [...numbers].reduce((next, [element, number]) => assign(next, element, number), state);

const openElements = (state: State): readonly string[] => [...state.open.keys()];

/** F -1, then groups 1 and 2 and aluminium, then hydrogen, then oxygen -2: each only beside other open elements. */
const assignUsual = (state: State, hydrogen: bigint): State => {
  const fixed = openElements(state).flatMap((element): readonly (readonly [string, bigint])[] => {
    const number = fixedNumber(element);
    return number === undefined ? [] : [[element, number]];
  });
  return assignAll(state, [['F', -1n], ...fixed, ['H', hydrogen], ['O', -2n]]);
};

/** With metals settled, what stands with carbon takes its number as in organic names; carbon becomes the average. */
const BESIDE_CARBON: readonly (readonly [string, bigint])[] = [
  ['N', -3n],
  ['Cl', -1n],
  ['Br', -1n],
  ['I', -1n],
  ['S', -2n],
  ['Se', -2n],
  ['B', 3n],
  ['Si', 4n],
];

const has = (state: State, element: string): boolean => state.bag.counts.has(element);

/** Sulfur beside C, H and O is thiol, sulfoxide, sulfone or sulfonate, and a sum formula does not tell which. */
const isSulfurOpen = (state: State): boolean => has(state, 'S') && has(state, 'H') && has(state, 'O');

const assignCarbon = (state: State): State => {
  if (!state.open.has('C') || openElements(state).some(isMetal)) return state;
  if (state.open.has('S') && isSulfurOpen(state)) return state;
  const phosphorus: readonly (readonly [string, bigint])[] = has(state, 'O') ? [['P', 5n]] : [];
  return assignAll(state, [...BESIDE_CARBON, ...phosphorus]);
};

/** Elements that stay anions when a more electronegative anion is already there (CuAs in Cu3AsS4 is not arsenide). */
const ALWAYS_ANIONS: ReadonlySet<string> = new Set(['N', 'S', 'Se', 'Cl', 'Br', 'I']);

const mostElectronegative = (elements: readonly string[]): string | undefined =>
  elements.toSorted((a, b) => (electronegativity(b) ?? 0) - (electronegativity(a) ?? 0))[0];

/** Without oxygen, the more electronegative of the open elements takes 8 - N (Karen et al. 2016). */
const assignAnions = (state: State): State => {
  if (has(state, 'O') || (has(state, 'C') && has(state, 'H'))) return state;
  let next = state;
  for (let first = !has(state, 'F'); next.open.size > 1; first = false) {
    const element = mostElectronegative(openElements(next));
    const number = element === undefined ? undefined : anionNumber(element);
    if (element === undefined || number === undefined) return next;
    if (!first && !ALWAYS_ANIONS.has(element)) return next;
    next = assign(next, element, number);
  }
  return next;
};

/** Beside oxygen, a halogen that is not spelled in front of it is halide: POCl3, BiOCl. */
const assignHalides = (state: State): State =>
  assignAll(
    state,
    openElements(state)
      .filter((element) => has(state, 'O') && isHalogen(element) && !state.bag.oxoHalogens.has(element))
      .map((element) => [element, -1n]),
  );

/** Elements with one common number take it: Zn 2, La 3. */
const assignSingle = (state: State): State =>
  assignAll(
    state,
    openElements(state).flatMap((element): readonly (readonly [string, bigint])[] => {
      const [number, ...others] = commonNumbers(element);
      return number === undefined || others.length > 0 || !isMetal(element) ? [] : [[element, number]];
    }),
  );

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

/** In a compound with several anions a metal must come out at a common number: FeAsS gives 5 for Fe, which is none. */
const isPlausible = (state: State, element: string, average: Rational): boolean => {
  if (isAlloyHydride(state, element, average)) return false;
  const anions = state.sites.filter((site) => !isMetal(site.element) && site.number.compare(ZERO) < 0);
  if (has(state, 'O') || !isMetal(element) || anions.length < 2 || !isWhole(average)) return true;
  return commonNumbers(element).some((number) => average.equals(number)) || state.bag.stripped;
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

const close = (state: State): readonly Site[] | undefined => {
  const [last, ...others] = state.open;
  if (last === undefined) return isZero(state.rest) ? state.sites : undefined;
  return others.length > 0 ? closeByTable(state) : closeByAverage(state, ...last);
};

const STEPS: readonly ((state: State) => State)[] = [
  assignCarbon,
  assignAnions,
  assignHalides,
  assignSingle,
  assignCarbon,
];

const solveWith = (bag: Bag, hydrogen: bigint): readonly Site[] | undefined => {
  const start: State = { bag, sites: [], open: bag.counts, rest: bag.charge };
  return close(STEPS.reduce((state, step) => step(state), assignUsual(start, hydrogen)));
};

/** Hydrogen is -1 beside metals, B, Si and Ge alone; where known ions were taken out of an acid, +1 comes first. */
const hydrogenNumbers = (bag: Bag): readonly bigint[] => {
  const hydridic = [...bag.counts.keys()].every((element) => element === 'H' || isHydrideFormer(element));
  if (!hydridic) return [1n];
  return bag.stripped ? [1n, -1n] : [-1n];
};

/**
 * Oxidation numbers of the atoms in `bag` by rule, or undefined where no rule decides. One element: charge over count.
 * Else in this order: F -1; groups 1 and 2; Al 3; H; O -2; the elements beside carbon; the more electronegative of
 * the open elements (8 - N); halides beside oxygen; elements with one common number; then the last element takes the
 * average, or, with several left, the only choice of common numbers that closes the charge.
 */
export const solveBag = (bag: Bag): readonly Site[] | undefined => {
  const [first, ...others] = bag.counts;
  if (first === undefined) return isZero(bag.charge) ? [] : undefined;
  const [element, count] = first;
  if (others.length === 0 && !bag.stripped) return [{ element, number: bag.charge.div(count), count }];
  for (const hydrogen of hydrogenNumbers(bag)) {
    const sites = solveWith(bag, hydrogen);
    if (sites !== undefined && chargeOf(sites).equals(bag.charge)) return sites;
  }
  return undefined;
};

/** A bag with no spelling to look at. */
export const bagOf = (counts: ReadonlyMap<string, Rational>, charge: Rational): Bag => ({
  counts,
  charge,
  oxoHalogens: new Set(),
  stripped: false,
  carbonyl: false,
});
