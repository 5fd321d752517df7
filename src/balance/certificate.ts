import { magnitude } from '../exact/integer.ts';
import type { Certificate } from '../report/fault.ts';
import { isElectron } from '../species/species.ts';
import { CHARGE } from './matrix.ts';
import type { Weights } from './solve.ts';
import type { Unknown } from './unknowns.ts';

/** Weights that prove an impossibility, with what they say in words. */
export const certificateOf = (weights: Weights, unknowns: readonly Unknown[]): Certificate => ({
  weights: Object.fromEntries([...weights].map(([label, weight]) => [label, String(weight)])),
  text: inWords(weights, unknowns),
});

const inWords = (weights: Weights, unknowns: readonly Unknown[]): string => {
  const [first, second] = [...weights];
  if (first === undefined) return 'no species here changes';
  if (second === undefined) return oneRow(...first);
  return countsElectrons(weights, unknowns) ? electrons(weights, unknowns) : excess(weights);
};

/** A positive weight: only products hold it, so what the right gains nothing on the left can give. */
const oneRow = (label: string, weight: bigint): string => {
  if (label === CHARGE) return `the charge grows more ${weight > 0n ? 'positive' : 'negative'} in any amounts`;
  return weight > 0n ? `nothing here gives ${label}` : `nothing here takes up ${label}`;
};

/**
 * With weight q on the charge, -q on H and 2q on O, a species weighs q (z - n(H) + 2 n(O)): q times the sum of the
 * oxidation numbers of its other elements, whose own weights only shift where they are counted from, since they are
 * conserved. A gain on the way to the right is then an oxidation. It says nothing where electrons are among the unknowns.
 */
const countsElectrons = (weights: Weights, unknowns: readonly Unknown[]): boolean => {
  const charge = weights.get(CHARGE);
  if (charge === undefined || unknowns.some((unknown) => isElectron(unknown.species))) return false;
  const holds = (element: string): boolean => unknowns.some((unknown) => unknown.species.composition.has(element));
  const fits = (element: string, weight: bigint): boolean => !holds(element) || weights.get(element) === weight;
  return fits('H', -charge) && fits('O', 2n * charge);
};

const electrons = (weights: Weights, unknowns: readonly Unknown[]): string => {
  const reactants = unknowns.filter((unknown) => unknown.side === 'left' && !unknown.helper).length;
  const who = reactants === 1 ? 'the only reactant is' : reactants === 2 ? 'both partners are' : 'all partners are';
  return (weights.get(CHARGE) ?? 0n) > 0n
    ? `${who} oxidised: no electrons are accepted`
    : `${who} reduced: no electrons are given`;
};

const excess = (weights: Weights): string => {
  const [first = ['', 0n] as const] = weights;
  const flip = first[1] < 0n;
  const terms = [...weights].map(([label, weight], index) => {
    const size = magnitude(weight) === 1n ? label : `${String(magnitude(weight))} ${label}`;
    if (index === 0) return size;
    return weight < 0n === flip ? ` + ${size}` : ` - ${size}`;
  });
  const [more, less] = flip ? ['left', 'right'] : ['right', 'left'];
  return `counted as ${terms.join('')}, the ${more} exceeds the ${less} in any amounts`;
};
