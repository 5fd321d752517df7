import type { Term } from '../../balance/reaction.ts';
import { lcmOf } from '../../exact/integer.ts';
import { type IntegerVector, nullSpace } from '../../exact/matrix.ts';
import { type Rational, ZERO, denominatorOf, numeratorOf, rational, signOf } from '../../exact/rational.ts';
import { oxidationNumbers } from '../../species/oxidation.ts';
import type { Species } from '../../species/species.ts';
import { type Background, type Component, isLent } from './components.ts';
import { type Flow, elementsOf } from './flows.ts';

/** The part of a component that is oxidised and the part that is reduced. */
export interface Division {
  readonly oxidised: readonly Term[];
  readonly reduced: readonly Term[];
}

/**
 * A component in which some atoms are oxidised and others reduced, divided in two. A species all of whose atoms of an
 * element change goes by those atoms, in part to each side where they do; a reactant of which only some change, by those;
 * the others go where conservation of the elements that no helper holds sends them. Null where that contradicts itself or leaves a choice.
 */
export const divide = (component: Component, sides: readonly bigint[], background: Background): Division | null => {
  const { terms, flows } = component;
  const parts = terms.map((term) => partByFlows(term, flows, sides, background));
  if (parts.includes('contradiction')) return null;
  const known = parts.map((part) => (part === 'contradiction' ? null : part));
  const found = solveOthers(terms, known, background);
  if (found === null) return null;
  const oxidised = terms.map(({ species }, at) => ({ species, nu: found[at] ?? ZERO }));
  const reduced = terms.map(({ species, nu }, at) => ({ species, nu: nu.sub(found[at] ?? ZERO) }));
  const turned = (part: readonly Term[]): boolean =>
    part.some(({ nu }, at) => signOf(nu) !== 0n && signOf(nu) !== signOf(terms[at]?.nu ?? ZERO));
  return turned(oxidised) || turned(reduced) ? null : { oxidised, reduced };
};

/** The oxidised amount of a term, as its changing atoms tell it; null where they do not. */
const partByFlows = (
  { species, nu }: Term,
  flows: readonly Flow[],
  sides: readonly bigint[],
  background: Background,
): Rational | 'contradiction' | null => {
  const isReactant = signOf(nu) < 0n;
  const told = elementsOf(species).flatMap((element) => {
    const own = flows.flatMap((flow, at) => {
      const [here, number] = isReactant ? [flow.source, flow.from] : [flow.sink, flow.to];
      const counts = here.key === species.key && flow.element === element && !isLent(background, element, number);
      return counts ? [{ atoms: flow.atoms, side: sides[at] ?? 0n }] : [];
    });
    const changing = sumOf(own.map(({ atoms }) => atoms));
    if (!changing.equals(atomsOf(species, element).mul(nu.abs())) || own.length === 0) return [];
    return [sumOf(own.filter(({ side }) => side > 0n).map(({ atoms }) => atoms)).div(changing)];
  });
  const [first] = told;
  if (first === undefined) return isReactant ? wholeByFlows({ species, nu }, flows, sides, background) : null;
  return told.every((part) => part.equals(first)) ? nu.mul(first) : 'contradiction';
};

/** A reactant in which all atoms of some number change, all to one side, goes there whole: S2O8^2- by its two peroxide atoms. */
const wholeByFlows = (
  { species, nu }: Term,
  flows: readonly Flow[],
  sides: readonly bigint[],
  background: Background,
): Rational | null => {
  const own = flows
    .map((flow, at) => ({ ...flow, side: sides[at] ?? 0n }))
    .filter(({ source, element, from }) => source.key === species.key && !isLent(background, element, from));
  const [first] = own;
  const isWhole = ({ element, from }: Flow): boolean => {
    const same = own.filter((flow) => flow.element === element && flow.from.equals(from));
    return sumOf(same.map(({ atoms }) => atoms)).equals(atomsWith(species, element, from).mul(nu.abs()));
  };
  if (first === undefined || own.some(({ side }) => side !== first.side) || !own.every(isWhole)) return null;
  return first.side > 0n ? nu : ZERO;
};

/** Atoms of `element` with this oxidation number in one formula unit. */
const atomsWith = (species: Species, element: string, number: Rational): Rational => {
  const found = oxidationNumbers(species);
  if (found.kind === 'undecided') return ZERO;
  const at = found.numbers.get(element)?.findIndex((own) => own.equals(number)) ?? -1;
  return found.counts.get(element)?.[at] ?? ZERO;
};

const sumOf = (values: readonly Rational[]): Rational => values.reduce((sum, value) => sum.add(value), ZERO);

/** Atoms of `element` in one formula unit, all its nuclides together. */
const atomsOf = (species: Species, element: string): Rational =>
  sumOf([...species.composition].filter(([key]) => key.replace(/^\d+/u, '') === element).map(([, count]) => count));

/**
 * The oxidised amounts x of all terms. Those not known follow from  sum x_j a_ij = 0  for each element i that no helper
 * holds; the known ones are gathered in a last column, which must come out once.
 */
const solveOthers = (
  terms: readonly Term[],
  known: readonly (Rational | null)[],
  background: Background,
): readonly Rational[] | null => {
  const elements = [...new Set(terms.flatMap(({ species }) => elementsOf(species)))].filter(
    (element) => !background.elements.has(element),
  );
  const unknown = terms.flatMap(({ species }, at) => (known[at] === null ? [{ species, at }] : []));
  const rows = elements.map((element) => {
    const gathered = sumOf(terms.map(({ species }, at) => (known[at] ?? ZERO).mul(atomsOf(species, element))));
    return wholeRow([...unknown.map(({ species }) => atomsOf(species, element)), gathered]);
  });
  const lines = nullSpace(rows, unknown.length + 1);
  const [line, second] = lines;
  const scale = line?.at(-1) ?? 0n;
  if (line === undefined || second !== undefined || scale === 0n) return null;
  return terms.map((_, at) => {
    const place = unknown.findIndex((one) => one.at === at);
    return place === -1 ? (known[at] ?? ZERO) : rational(line[place] ?? 0n, scale);
  });
};

const wholeRow = (row: readonly Rational[]): IntegerVector => {
  const scale = rational(lcmOf(row.map(denominatorOf)));
  return row.map((value) => numeratorOf(value.mul(scale)));
};
