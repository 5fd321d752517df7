import { ONE } from '../exact/rational.ts';
import { note } from '../report/note.ts';
import { type Result, chain, success } from '../report/result.ts';
import type { Equation, EquationTerm } from '../species/equation.ts';
import { foldHydronium, isHydronium } from '../species/hydronium.ts';
import { type ReadingOptions, readEquation } from '../species/read.ts';
import { sameSpecies } from '../species/species.ts';
import type { AskedMedium } from './schema/ask.ts';

/** How the texts of an ask are read: as the floors below know it, and what the desk does to what was read. */
export interface DeskOptions extends ReadingOptions {
  readonly foldHydronium?: boolean;
}

const FOLDED = note('hydronium-folded', 'Each H3O^+ was read as H^+ and H2O, as asked.');

const folded = (equation: Equation, change: (equation: Equation) => Equation): Result<Equation> =>
  [...equation.left, ...equation.right].some(({ species }) => isHydronium(species))
    ? success(change(equation), [FOLDED])
    : success(equation);

/** An equation as written; where it was asked for, with every H3O^+ as H^+ and H2O. Note: `hydronium-folded`. */
export const readWritten = (text: string, options: DeskOptions): Result<Equation> => {
  const read = readEquation(text, options);
  return options.foldHydronium === true ? chain(read, (equation) => folded(equation, foldHydronium)) : read;
};

const isWater = ({ species }: EquationTerm): boolean => species.key === 'H2O';

const WATERY: readonly (AskedMedium | undefined)[] = [undefined, 'acid', 'base', 'neutral'];

const lendsWater = (medium: AskedMedium | undefined): boolean =>
  typeof medium === 'object' ? medium.helpers.some((helper) => helper.trim() === 'H2O') : WATERY.includes(medium);

/** The proton of a folded term alone; any other term as it is. */
const protonOf = (term: EquationTerm): EquationTerm =>
  foldHydronium({ text: '', left: [term], right: [] }).left[0] ?? term;

/** The water of a folded term. */
const waterOf = (term: EquationTerm): EquationTerm | undefined =>
  isHydronium(term.species) ? foldHydronium({ text: '', left: [term], right: [] }).left.find(isWater) : undefined;

/**
 * The water that came with H^+ may end on either side, or drop out. Where the medium lends water it does so by itself,
 * and none is written; elsewhere it stands at the end of both sides.
 */
const withFreeWater = ({ text, left, right }: Equation, medium: AskedMedium | undefined): Equation => {
  const [spare] = [...left, ...right].flatMap((term) => waterOf(term) ?? []);
  const protons = [left, right].map((terms) => terms.map(protonOf));
  const dry = protons.map((terms) => terms.filter((term) => !isWater(term)));
  const [lent, other] =
    lendsWater(medium) && dry.every((terms) => terms.length > 0) ? dry : protons.map(withWater(spare));
  return { text, left: lent ?? left, right: other ?? right };
};

const withWater =
  (spare: EquationTerm | undefined) =>
  (terms: readonly EquationTerm[]): readonly EquationTerm[] =>
    spare === undefined || terms.some(({ species }) => sameSpecies(species, spare.species))
      ? terms
      : [...terms, { ...spare, coefficient: ONE, coefficientWritten: false }];

/**
 * A skeleton for a medium; where it was asked for, H3O^+ is H^+, and water is free in sign beside it. Note:
 * `hydronium-folded`.
 */
export const readSketch = (text: string, options: DeskOptions, medium: AskedMedium | undefined): Result<Equation> => {
  const read = readEquation(text, options);
  return options.foldHydronium === true
    ? chain(read, (equation) => folded(equation, (one) => withFreeWater(one, medium)))
    : read;
};
