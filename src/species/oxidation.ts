import { type Rational, ONE, ZERO, showRational } from '../exact/rational.ts';
import type { Formula, Member, Part } from '../notation/formula.ts';
import { exceptionOf, spelledExceptionOf } from './oxidation-exceptions.ts';
import type { KnownGroup } from './oxidation-groups.ts';
import { type Allowed, elementCounts, takeGroups } from './oxidation-match.ts';
import { solveBag } from './oxidation-rules.ts';
import { chargeOf, merged, repeated, type Site } from './oxidation-site.ts';
import { bagOf } from './oxidation-state.ts';
import { isMetal } from './oxidation-table.ts';
import { type Species, isElectron } from './species.ts';

/** The oxidation numbers of a species, or why convention does not decide them. Keys are element symbols. */
export type OxidationNumbers =
  | {
      readonly kind: 'decided';
      /** The distinct numbers of each element, rising: N has -3 and 5 in NH4NO3. */
      readonly numbers: ReadonlyMap<string, readonly Rational[]>;
      /** How many atoms have each of these numbers, in the same order. */
      readonly counts: ReadonlyMap<string, readonly Rational[]>;
      /** Number times count, added up per element. Over all elements this comes to the charge number. */
      readonly totals: ReadonlyMap<string, Rational>;
    }
  | { readonly kind: 'undecided'; readonly why: string };

const spell = (members: readonly Member[]): string =>
  members
    .map((member) => {
      const count = member.count.equals(ONE) ? '' : showRational(member.count);
      return (member.kind === 'atom' ? member.symbol : `(${spell(member.members)})`) + count;
    })
    .join('');

/** Carbon with hydrogen and no metal, ammonium aside: letters like CN or NO2 are then no ions. */
const isOrganic = (members: readonly Member[]): boolean => {
  const { counts } = takeGroups(members, (group) => group.key === 'H4 N1');
  return counts.has('C') && counts.has('H') && ![...counts.keys()].some(isMetal);
};

const isCarbonyl = (group: KnownGroup): boolean => group.key === 'C1 O1';

/** A known group by itself: listed, or by the rules. */
const sitesOfGroup = (group: KnownGroup): readonly Site[] | undefined =>
  isCarbonyl(group)
    ? solveBag(bagOf(group.counts, ZERO))
    : (exceptionOf(group.counts, group.charge) ?? solveBag(bagOf(group.counts, group.charge)));

/** Groups first, each with its own charge; what is left shares the rest of the charge. */
const solveMembers = (members: readonly Member[], charge: Rational, allowed: Allowed): readonly Site[] | undefined => {
  const taken = takeGroups(members, allowed);
  let rest = charge;
  const sites: Site[] = [];
  for (const { group, count } of taken.groups) {
    const own = sitesOfGroup(group);
    if (own === undefined) return undefined;
    sites.push(...repeated(own, count));
    rest = rest.sub(group.charge.mul(count));
  }
  const stripped = taken.groups.length > 0;
  const carbonyl = taken.groups.some(({ group }) => isCarbonyl(group));
  const left = solveBag({ ...taken, charge: rest, stripped, carbonyl });
  return left === undefined ? undefined : [...sites, ...left];
};

/** All known groups; then those that letters make sure; then none. The first that closes the charge is taken. */
const attempts = (members: readonly Member[]): readonly Allowed[] => {
  const sure: Allowed = (group) => !group.inSaltsOnly;
  return isOrganic(members) ? [sure, () => false] : [() => true, sure, () => false];
};

const solvePart = (part: Part, charge: Rational): readonly Site[] | undefined => {
  const counts = elementCounts(part.members);
  const listed = spelledExceptionOf(spell(part.members), charge) ?? exceptionOf(counts, charge);
  if (listed !== undefined) return listed;
  for (const allowed of attempts(part.members)) {
    const sites = solveMembers(part.members, charge, allowed);
    if (sites !== undefined) return sites;
  }
  return undefined;
};

/** The parts of an adduct are neutral, but for the first, which carries the charge: CuSO4*5H2O. */
const solveParts = (parts: Formula, charge: Rational): readonly Site[] | undefined => {
  const sites: Site[] = [];
  for (const [index, part] of parts.entries()) {
    const own = solvePart(part, index === 0 ? charge.div(part.multiplier) : ZERO);
    if (own === undefined) return undefined;
    sites.push(...repeated(own, part.multiplier));
  }
  return sites;
};

const byElement = <T>(sites: readonly Site[], pick: (own: readonly Site[]) => T): ReadonlyMap<string, T> => {
  const elements = new Set(sites.map(({ element }) => element));
  return new Map([...elements].map((element) => [element, pick(sites.filter((site) => site.element === element))]));
};

/** Numbers already found: a pure function of the species, whose readings are shared, kept as long as the species is. */
const known = new WeakMap<Species, OxidationNumbers>();

/**
 * Oxidation numbers of `species` by the conventions of the IUPAC (P. Karen, P. McArdle, J. Takats, Pure Appl. Chem. 86
 * (2014) 1017 and 88 (2016) 831), read from the formula: like atoms of a species share their average, except
 * peroxide oxygen, ions and ligands that the formula shows apart, and a short list of whole species. Undecided where
 * these do not settle the formula; the electron has no atoms and is undecided too.
 */
export const oxidationNumbers = (species: Species): OxidationNumbers => {
  const found = known.get(species) ?? findNumbers(species);
  known.set(species, found);
  return found;
};

const findNumbers = (species: Species): OxidationNumbers => {
  if (isElectron(species)) return { kind: 'undecided', why: 'The electron has no atoms.' };
  const solved = solveParts(species.parts, species.charge);
  if (solved === undefined || !chargeOf(solved).equals(species.charge)) {
    return { kind: 'undecided', why: `Convention does not decide the oxidation numbers in ${species.formula}.` };
  }
  const sites = inOrderOf([...species.composition.keys()], merged(solved));
  return {
    kind: 'decided',
    numbers: byElement(sites, (own) => own.map(({ number }) => number)),
    counts: byElement(sites, (own) => own.map(({ count }) => count)),
    totals: byElement(sites, chargeOf),
  };
};

/** Elements in the order of the formula. */
const inOrderOf = (keys: readonly string[], sites: readonly Site[]): readonly Site[] => {
  const order = keys.map((key) => key.replace(/^\d+/, ''));
  return sites.toSorted((a, b) => order.indexOf(a.element) - order.indexOf(b.element));
};
