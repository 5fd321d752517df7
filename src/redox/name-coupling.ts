import type { Numbers } from '../balance/solve.ts';
import type { Unknown } from '../balance/unknowns.ts';
import { range } from '../exact/matrix.ts';
import { isElectron, plainSpecies } from '../species/species.ts';
import type { Pair, Pairing } from './pairs.ts';

/**
 * A name for each pair by what it assumes, all different: "if H2O2 is only oxidised, to O2" for a reactant that stands in
 * one half of every pair, one made of the helpers' elements only before others, since it is their atoms that conservation
 * cannot follow; else both halves in words. Pairs that differ in their helpers only say which takes no part.
 */
export const nameCouplings = ({ unknowns, pairs }: Pairing): readonly string[] => {
  const subject = reactants(unknowns).find((index) => {
    const names = pairs.map((pair) => nameBy(index, unknowns, pair));
    return names.every((name) => name !== undefined) && allDiffer(pairs, names);
  });
  const names = pairs.map(
    (pair) => (subject === undefined ? undefined : nameBy(subject, unknowns, pair)) ?? bothHalves(unknowns, pair),
  );
  return names.map((name, index) =>
    names.indexOf(name) === names.lastIndexOf(name) ? name : name + withoutWords(unknowns, pairs[index]),
  );
};

/** Equal names are allowed where the pairs differ in unwritten species only. */
const allDiffer = (pairs: readonly Pair[], names: readonly (string | undefined)[]): boolean =>
  new Set(names).size === names.length || pairs.every((pair) => pair.electrons.equals(pairs[0]?.electrons ?? 0));

const reactants = (unknowns: readonly Unknown[]): readonly number[] => {
  const lent = new Set(unknowns.filter((one) => one.helper).flatMap((one) => [...one.species.composition.keys()]));
  const left = range(unknowns.length).filter((index) => unknowns[index]?.side === 'left');
  const untraced = (index: number): boolean =>
    [...(unknowns[index]?.species.composition.keys() ?? [])].every((element) => lent.has(element));
  return [...left.filter(untraced), ...left.filter((index) => !untraced(index))];
};

const nameBy = (index: number, unknowns: readonly Unknown[], pair: Pair): string | undefined => {
  const [oxidised, reduced] = [pair.oxidation[index] !== 0n, pair.reduction[index] !== 0n];
  const species = unknowns[index]?.species;
  if (oxidised === reduced || species === undefined) return undefined;
  const half = oxidised ? pair.oxidation : pair.reduction;
  const word = oxidised ? 'oxidised' : 'reduced';
  return `if ${plainSpecies(species)} is only ${word}, to ${productsOf(unknowns, half)}`;
};

/** The written products of a half; where it has none, what the medium takes up. */
const productsOf = (unknowns: readonly Unknown[], half: Numbers): string => {
  const written = side(unknowns, half, 1n, true);
  return listed(written.length > 0 ? written : side(unknowns, half, 1n, false));
};

const bothHalves = (unknowns: readonly Unknown[], pair: Pair): string => {
  const change = (half: Numbers, word: string): string => {
    const from = side(unknowns, half, -1n, true);
    const who = from.length > 0 ? from : side(unknowns, half, -1n, false);
    return `${listed(who)} ${who.length === 1 ? 'is' : 'are'} ${word} to ${productsOf(unknowns, half)}`;
  };
  return `if ${change(pair.oxidation, 'oxidised')}, and ${change(pair.reduction, 'reduced')}`;
};

const side = (unknowns: readonly Unknown[], half: Numbers, sign: bigint, written: boolean): readonly string[] =>
  unknowns.flatMap((unknown, index) => {
    const stands = (half[index] ?? 0n) * sign > 0n && unknown.written === written;
    return stands && !isElectron(unknown.species) ? [plainSpecies(unknown.species)] : [];
  });

const withoutWords = (unknowns: readonly Unknown[], pair: Pair | undefined): string => {
  const idle = unknowns.filter((unknown, index) => {
    const used = pair?.oxidation[index] !== 0n || pair.reduction[index] !== 0n;
    return unknown.helper && !unknown.written && !used;
  });
  return idle.length === 0
    ? ''
    : `, and ${listed(idle.map((one) => plainSpecies(one.species)))} ${idle.length === 1 ? 'takes' : 'take'} no part`;
};

const listed = (names: readonly string[]): string =>
  names.length < 2 ? (names[0] ?? 'nothing') : `${names.slice(0, -1).join(', ')} and ${names.at(-1) ?? ''}`;
