import type { Unknown } from '../../balance/unknowns.ts';
import { range } from '../../exact/matrix.ts';
import { signOf } from '../../exact/rational.ts';
import { plainSpecies } from '../../species/species.ts';
import { countOf, labelsOf } from './labels.ts';
import type { PairHalves } from './pair-halves.ts';
import { lesserForm } from './odd-atom.ts';
import type { MeasuredChange, Pair } from './pair.ts';
import { untracedElements } from './untraced.ts';

/** A pair with its halves. */
export interface PairWithHalves {
  readonly pair: Pair;
  readonly halves: PairHalves;
}

/**
 * A name for each pair by what it assumes, all different: "if H2O2 is only oxidised, to O2" for a reactant that is a
 * partner in every pair, all whose changes go the one way that is told; one made of untraced elements only before others,
 * since it is their atoms that conservation cannot follow; else both halves in words.
 */
export const nameCouplings = (unknowns: readonly Unknown[], pairs: readonly PairWithHalves[]): readonly string[] => {
  for (const index of reactants(unknowns)) {
    const names = pairs.flatMap((one) => nameBy(index, unknowns, one) ?? []);
    if (names.length === pairs.length && new Set(names).size === names.length) return names.map(told(pairs));
  }
  return pairs.map((one) => bothHalves(unknowns, one)).map(told(pairs));
};

/** The words for a reactant, or for both halves, with what else a pair assumes. */
const told =
  (pairs: readonly PairWithHalves[]) =>
  (words: string, at: number): string => {
    const also = pairs[at]?.pair.also;
    return `if ${words}${also === undefined ? '' : `, and ${also}`}`;
  };

const reactants = (unknowns: readonly Unknown[]): readonly number[] => {
  const loose = untracedElements(unknowns);
  const left = range(unknowns.length).filter((index) => unknowns[index]?.side === 'left');
  const untraced = (index: number): boolean =>
    [...(unknowns[index]?.species.composition.keys() ?? [])].every((element) => loose.has(element));
  const hasLesser = (index: number): boolean => lesserForm(unknowns, index) !== undefined;
  const rank = (index: number): number => (hasLesser(index) ? 0 : untraced(index) ? 1 : 2);
  return left.toSorted((a, b) => rank(a) - rank(b));
};

const nameBy = (index: number, unknowns: readonly Unknown[], one: PairWithHalves): string | undefined => {
  const { oxidation, reduction } = one.pair;
  if ((oxidation.index === index) === (reduction.index === index)) return undefined;
  const isOxidised = oxidation.index === index;
  const change = isOxidised ? oxidation : reduction;
  const name = nameOf(unknowns, index);
  const lesser = lesserForm(unknowns, index);
  if (lesser !== undefined && change.transitions.every(({ from }) => from.odd)) {
    return `1 ${name} gives 1 ${nameOf(unknowns, lesser)}`;
  }
  if (change.transitions.some(({ given }) => signOf(given) !== (isOxidised ? 1n : -1n))) return undefined;
  return `${name} is only ${isOxidised ? 'oxidised' : 'reduced'}, to ${productsOf(unknowns, one, isOxidised)}`;
};

const bothHalves = (unknowns: readonly Unknown[], one: PairWithHalves): string => {
  const { oxidation, reduction } = one.pair;
  const oxidised = `${nameOf(unknowns, oxidation.index)} is oxidised to ${productsOf(unknowns, one, true)}`;
  return `${oxidised} and ${nameOf(unknowns, reduction.index)} is reduced to ${productsOf(unknowns, one, false)}`;
};

const nameOf = (unknowns: readonly Unknown[], index: number): string => {
  const unknown = unknowns[index];
  return unknown === undefined ? '' : plainSpecies(unknown.species);
};

/** The products that take up what changes: the written ones, or where there are none those that the medium takes up. */
const productsOf = (unknowns: readonly Unknown[], { pair, halves }: PairWithHalves, isOxidation: boolean): string => {
  const change = isOxidation ? pair.oxidation : pair.reduction;
  const numbers = (isOxidation ? halves.oxidation : halves.reduction) ?? pair.numbers;
  const lesser = change.transitions.some(({ from }) => from.odd) ? lesserForm(unknowns, change.index) : undefined;
  const holding = halves.unknowns.filter(
    (unknown, index) => (numbers[index] ?? 0n) > 0n && (index === lesser || holdsTarget(unknown, change)),
  );
  const written = holding.filter((unknown) => unknown.written);
  return listed((written.length > 0 ? written : holding).map(({ species }) => plainSpecies(species)));
};

const holdsTarget = ({ species }: Unknown, { transitions }: MeasuredChange): boolean => {
  const labelled = labelsOf(species) ?? [];
  return transitions.some(({ to }) => countOf(labelled, to).compare(0) > 0);
};

const listed = (names: readonly string[]): string =>
  names.length < 2 ? (names[0] ?? 'nothing') : `${names.slice(0, -1).join(', ')} and ${names.at(-1) ?? ''}`;
