import type { Term } from '../../balance/reaction.ts';
import { type Rational, ZERO, signOf } from '../../exact/rational.ts';
import { oxidationNumbers } from '../../species/oxidation.ts';
import type { Species } from '../../species/species.ts';
import { type Flow, directionOf, elementsOf } from './flows.ts';

/** What the helpers of a medium stand for: their elements, and the oxidation numbers that these have in them. */
export interface Background {
  readonly keys: ReadonlySet<string>;
  readonly elements: ReadonlySet<string>;
  readonly numbers: ReadonlyMap<string, readonly Rational[]>;
}

/** Species that hang together, with the changes of oxidation number among them. */
export interface Component {
  readonly terms: readonly Term[];
  readonly flows: readonly Flow[];
}

/** The background of these helpers. */
export const backgroundOf = (helpers: readonly Species[]): Background => {
  const numbers = new Map<string, readonly Rational[]>();
  for (const helper of helpers) {
    const found = oxidationNumbers(helper);
    if (found.kind === 'undecided') continue;
    for (const [element, own] of found.numbers) numbers.set(element, [...(numbers.get(element) ?? []), ...own]);
  }
  const elements = new Set(helpers.flatMap(elementsOf));
  return { keys: new Set(helpers.map((helper) => helper.key)), elements, numbers };
};

/** True where an atom could as well be one of a helper: oxygen -2 and hydrogen 1 where water is lent. */
export const isLent = (background: Background, element: string, number: Rational): boolean =>
  background.numbers.get(element)?.some((own) => own.equals(number)) ?? false;

/**
 * The species of a reaction, helpers aside, in groups: two belong together where they share an element that no helper
 * holds, or where atoms pass between them that could not be a helper's, whether they change (H2O2 -> O2) or keep their
 * oxidation number (O3 -> O2, H2O2 -> HO2^-).
 */
export const componentsOf = (
  terms: readonly Term[],
  flows: readonly Flow[],
  background: Background,
): readonly Component[] => {
  const own = terms.filter(({ species }) => !background.keys.has(species.key));
  const group = new Map(own.map(({ species }, at) => [species.key, at]));
  const join = (a: string, b: string): void => {
    const [one, other] = [group.get(a), group.get(b)];
    if (one === undefined || other === undefined || one === other) return;
    for (const [key, at] of group) if (at === other) group.set(key, one);
  };
  const holders = new Map<string, string>();
  for (const { species } of own) {
    for (const element of elementsOf(species)) {
      if (background.elements.has(element)) continue;
      join(holders.get(element) ?? species.key, species.key);
      holders.set(element, species.key);
    }
  }
  for (const flow of flows) {
    const lent = isLent(background, flow.element, flow.from) || isLent(background, flow.element, flow.to);
    if (!lent) join(flow.source.key, flow.sink.key);
  }
  for (const one of own) {
    for (const other of own)
      if (signOf(one.nu) !== signOf(other.nu) && shareAtoms(one, other, background))
        join(one.species.key, other.species.key);
  }
  return [...new Set(group.values())].map((label) => {
    const members = own.filter(({ species }) => group.get(species.key) === label);
    return { terms: members, flows: flows.filter((flow) => concerns(flow, members, background)) };
  });
};

/** Atoms with one oxidation number in both that could not be a helper's. */
const shareAtoms = (one: Term, other: Term, background: Background): boolean => {
  const [here, there] = [oxidationNumbers(one.species), oxidationNumbers(other.species)];
  if (here.kind === 'undecided' || there.kind === 'undecided') return false;
  return [...here.numbers].some(([element, numbers]) =>
    numbers.some(
      (number) =>
        !isLent(background, element, number) &&
        there.numbers.get(element)?.some((same) => same.equals(number)) === true,
    ),
  );
};

/** A flow concerns a component where atoms of its own, not of a helper's kind, begin or end there. */
const concerns = (flow: Flow, members: readonly Term[], background: Background): boolean => {
  const holds = (species: Species): boolean => members.some((term) => term.species.key === species.key);
  const begins = holds(flow.source) && !isLent(background, flow.element, flow.from);
  const ends = holds(flow.sink) && !isLent(background, flow.element, flow.to);
  return begins || ends;
};

/**
 * Whether each flow of a component belongs to the oxidation (1n) or to the reduction (-1n). A reactant is oxidised or
 * reduced as a whole, by the sum of its changes (CuFeS2 is oxidised though its iron is reduced), unless the same element
 * goes both ways in it (Cl2 to Cl^- and ClO3^-), or its changes even out, or the atoms are a helper's.
 */
export const sidesOf = ({ flows }: Component, background: Background): readonly bigint[] => {
  const ownOf = (source: Species): readonly Flow[] =>
    flows.filter((flow) => flow.source.key === source.key && !isLent(background, flow.element, flow.from));
  return flows.map((flow) => {
    const own = ownOf(flow.source);
    const bothWays = own.some((one) =>
      own.some((other) => other.element === one.element && directionOf(other) !== directionOf(one)),
    );
    const gain = own.reduce((sum, one) => sum.add(one.to.sub(one.from).mul(one.atoms)), ZERO);
    return !own.includes(flow) || bothWays || signOf(gain) === 0n ? directionOf(flow) : signOf(gain);
  });
};
