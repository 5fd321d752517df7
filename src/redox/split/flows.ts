import type { Term } from '../../balance/reaction.ts';
import { type Rational, ZERO, isZero, signOf } from '../../exact/rational.ts';
import { oxidationNumbers } from '../../species/oxidation.ts';
import type { Species } from '../../species/species.ts';

/** Atoms of one element that pass from a reactant to a product and change their oxidation number on the way. */
export interface Flow {
  readonly element: string;
  readonly source: Species;
  readonly sink: Species;
  readonly from: Rational;
  readonly to: Rational;
  readonly atoms: Rational;
}

/** Atoms of one element with one oxidation number in one term of a reaction; `atoms` is positive. */
interface Site {
  readonly species: Species;
  readonly number: Rational;
  readonly atoms: Rational;
}

/** The changes of oxidation number in a reaction, and whether convention decides all of them. */
export interface Flows {
  readonly flows: readonly Flow[];
  readonly decided: boolean;
}

/**
 * Which atoms change their oxidation number. For each element, what keeps its number is struck out first; the rest is
 * matched in rising order, the lowest number used with the lowest formed, so that numbers do not cross. Atoms of several
 * species with one number share in each change by their amounts; or, with `rank`, those of the lowest rank go to the lowest
 * number and so on, as with S2O8^2- and H2O2, of which only one becomes oxygen. An element that stands in a species whose oxidation
 * numbers convention leaves open is left out.
 */
export const flowsOf = (terms: readonly Term[], rank?: (species: Species) => number): Flows => {
  const numbered = terms.map((term) => ({ term, numbers: oxidationNumbers(term.species) }));
  const open = new Set(
    numbered.flatMap(({ term, numbers }) => (numbers.kind === 'undecided' ? elementsOf(term.species) : [])),
  );
  const elements = [...new Set(terms.flatMap(({ species }) => elementsOf(species)))].filter((one) => !open.has(one));
  const sitesOf = (element: string, sign: bigint): readonly Site[] =>
    numbered.flatMap(({ term, numbers }) => {
      if (numbers.kind === 'undecided' || signOf(term.nu) !== sign) return [];
      const counts = numbers.counts.get(element) ?? [];
      return (numbers.numbers.get(element) ?? []).map((number, at) => ({
        species: term.species,
        number,
        atoms: (counts[at] ?? ZERO).mul(term.nu.abs()),
      }));
    });
  const flows = elements.flatMap((element) => matched(element, sitesOf(element, -1n), sitesOf(element, 1n), rank));
  return { flows, decided: open.size === 0 };
};

/** Elements, nuclides as their elements. */
export const elementsOf = (species: Species): readonly string[] => [
  ...new Set([...species.composition.keys()].map((key) => key.replace(/^\d+/u, ''))),
];

/** All atoms with one oxidation number. */
interface Level {
  readonly number: Rational;
  readonly atoms: Rational;
  readonly sites: readonly Site[];
}

const levelsOf = (sites: readonly Site[]): readonly Level[] => {
  const numbers = sites.map((site) => site.number).toSorted((a, b) => a.compare(b));
  const distinct = numbers.filter((number, at) => at === 0 || !number.equals(numbers[at - 1] ?? ZERO));
  return distinct.map((number) => {
    const own = sites.filter((site) => site.number.equals(number));
    return { number, sites: own, atoms: own.reduce((sum, site) => sum.add(site.atoms), ZERO) };
  });
};

const matched = (
  element: string,
  used: readonly Site[],
  formed: readonly Site[],
  rank: ((species: Species) => number) | undefined,
): readonly Flow[] => {
  const kept = withoutKept(levelsOf(used), levelsOf(formed));
  const sources = rank === undefined ? kept : kept.flatMap((level) => apart(level, rank));
  return transport(sources, withoutKept(levelsOf(formed), levelsOf(used))).flatMap(({ source, sink, atoms }) =>
    source.sites.flatMap((from) =>
      sink.sites.map((to) => ({
        element,
        source: from.species,
        sink: to.species,
        from: source.number,
        to: sink.number,
        atoms: atoms.mul(partOf(from, source)).mul(partOf(to, sink)),
      })),
    ),
  );
};

/** A level as one for each of its sites, the lowest rank first. */
const apart = (level: Level, rank: (species: Species) => number): readonly Level[] =>
  level.sites
    .toSorted((a, b) => rank(a.species) - rank(b.species))
    .map((site) => ({ number: level.number, sites: [site], atoms: level.atoms.mul(partOf(site, level)) }));

/** The part that a site has of the atoms with its number. */
const partOf = (site: Site, level: Level): Rational =>
  site.atoms.div(level.sites.reduce((sum, each) => sum.add(each.atoms), ZERO));

/** Atoms that find their own number on the other side stay as they are. */
const withoutKept = (levels: readonly Level[], others: readonly Level[]): readonly Level[] =>
  levels
    .map((level) => {
      const kept = others.find((other) => other.number.equals(level.number))?.atoms ?? ZERO;
      return { ...level, atoms: kept.compare(level.atoms) < 0 ? level.atoms.sub(kept) : ZERO };
    })
    .filter((level) => !isZero(level.atoms));

interface Move {
  readonly source: Level;
  readonly sink: Level;
  readonly atoms: Rational;
}

/** Levels of both sides rise; the first of each are emptied into one another, and the emptied one is left behind. */
const transport = (sources: readonly Level[], sinks: readonly Level[]): readonly Move[] => {
  const moves: Move[] = [];
  const [from, to] = [[...sources], [...sinks]];
  for (;;) {
    const [source, sink] = [from.shift(), to.shift()];
    if (source === undefined || sink === undefined) return moves;
    const atoms = source.atoms.compare(sink.atoms) < 0 ? source.atoms : sink.atoms;
    moves.push({ source, sink, atoms });
    if (!source.atoms.equals(atoms)) from.unshift({ ...source, atoms: source.atoms.sub(atoms) });
    if (!sink.atoms.equals(atoms)) to.unshift({ ...sink, atoms: sink.atoms.sub(atoms) });
  }
};

/** 1n for an oxidation, -1n for a reduction. */
export const directionOf = (flow: Flow): bigint => signOf(flow.to.sub(flow.from));

/** The sum of all increases in oxidation number: electrons given up. */
export const increaseIn = (flows: readonly Flow[]): Rational =>
  flows
    .filter((flow) => directionOf(flow) > 0n)
    .reduce((sum, flow) => sum.add(flow.to.sub(flow.from).mul(flow.atoms)), ZERO);

/** A change of oxidation number, told once however many species share it. */
export interface OxidationChange {
  readonly element: string;
  readonly from: Rational;
  readonly to: Rational;
}

/** Each distinct change once, in the order of the flows. */
export const distinctChanges = (flows: readonly Flow[]): readonly OxidationChange[] =>
  flows
    .filter((flow, at) => flows.findIndex((other) => sameChange(other, flow)) === at)
    .map(({ element, from, to }) => ({ element, from, to }));

const sameChange = (a: Flow, b: Flow): boolean => a.element === b.element && a.from.equals(b.from) && a.to.equals(b.to);
