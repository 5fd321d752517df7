import { electronegativity } from '../elements/electronegativity.ts';
import { isZero } from '../exact/rational.ts';
import { close } from './oxidation-close.ts';
import { chargeOf, type Site } from './oxidation-site.ts';
import { type Bag, type State, assign, assignAll, has, openElements } from './oxidation-state.ts';
import { anionNumber, commonNumbers, fixedNumber, isHalogen, isHydrideFormer, isMetal } from './oxidation-table.ts';

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

/** Sulfur beside C, H and O is thiol, sulfoxide, sulfone or sulfonate, and a sum formula does not tell which. */
const isSulfurOpen = (state: State): boolean => has(state, 'S') && has(state, 'H') && has(state, 'O');

const assignCarbon = (state: State): State => {
  if (!state.open.has('C') || openElements(state).some(isMetal)) return state;
  if (state.open.has('S') && isSulfurOpen(state)) return state;
  const phosphorus: readonly (readonly [string, bigint])[] = has(state, 'O') ? [['P', 5n]] : [];
  return assignAll(state, [...BESIDE_CARBON, ...phosphorus]);
};

/** Elements that stay anions when a more electronegative anion is already there (As in Cu3AsS4 is no arsenide). */
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
  // beside a known ion the metals of groups 1 and 2 keep their number: K2MnO4 does not hold MnO4^-
  const fixed = others.length === 0 ? fixedNumber(element) : undefined;
  if (fixed !== undefined && !bag.charge.equals(count.mul(fixed))) return undefined;
  for (const hydrogen of hydrogenNumbers(bag)) {
    const sites = solveWith(bag, hydrogen);
    if (sites !== undefined && chargeOf(sites).equals(bag.charge)) return sites;
  }
  return undefined;
};
