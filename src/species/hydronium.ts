import { ONE, rational } from '../exact/rational.ts';
import type { Atom } from '../notation/formula.ts';
import type { Equation, EquationTerm } from './equation.ts';
import { type Species, countAtoms } from './species.ts';

const atom = (symbol: string, count: bigint): Atom => ({
  kind: 'atom',
  symbol,
  massNumber: null,
  count: rational(count),
});

const simple = (
  formula: string,
  key: string,
  members: readonly Atom[],
  charge: bigint,
  state: string | null,
): Species => {
  const parts = [{ multiplier: ONE, members }];
  return { formula, parts, composition: countAtoms(parts), charge: rational(charge), state, key };
};

/** True for H3O^+ as spelled; H^+ and H3O^+ are different species. */
export const isHydronium = (species: Species): boolean => species.key === 'H3O^+';

/** H3O^+ as H^+ and H2O, each with the coefficient of the term and its place. */
const foldTerm = (term: EquationTerm): readonly EquationTerm[] => {
  if (!isHydronium(term.species)) return [term];
  const { state } = term.species;
  const water = state === null ? null : 'l';
  return [
    { ...term, species: simple('H', 'H^+', [atom('H', 1n)], 1n, state) },
    { ...term, species: simple('H2O', 'H2O', [atom('H', 2n), atom('O', 1n)], 0n, water) },
  ];
};

/** The equation with every H3O^+ written as H^+ and H2O: for those who ask for it. Nothing is cancelled. */
export const foldHydronium = (equation: Equation): Equation => ({
  text: equation.text,
  left: equation.left.flatMap(foldTerm),
  right: equation.right.flatMap(foldTerm),
});
