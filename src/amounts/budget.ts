import type { Measured } from './measured.ts';
import { isQuantityName } from './quantities.ts';
import type { Known } from './solver.ts';

/** What one input contributes: its part of the variance (0 to 1, for uncorrelated inputs). */
export interface BudgetLine {
  readonly input: string;
  /** Standard uncertainty of the input, SI base units. */
  readonly uncertainty: number;
  /** Sensitivity coefficient, SI base units (JCGM 100:2008, 5.1.3). */
  readonly sensitivity: number;
  readonly part: number;
}

/** Who contributes what to the uncertainty of a quantity, the largest first. */
export type Budget = readonly BudgetLine[];

/** The uncertainty budget of a value; [] where no input is uncertain. */
const budgetOf = (measured: Measured): Budget => {
  const lines = [...measured.slopes].map(([source, slope]) => ({
    input: source.name,
    uncertainty: source.uncertainty,
    sensitivity: slope,
    variance: (slope * source.uncertainty) ** 2,
  }));
  const total = lines.reduce((sum, { variance }) => sum + variance, 0);
  return lines
    .filter(({ variance }) => variance > 0)
    .sort((a, b) => b.variance - a.variance)
    .map(({ input, uncertainty, sensitivity, variance }) => ({
      input,
      uncertainty,
      sensitivity,
      part: variance / total,
    }));
};

/** The budgets of the named quantities. */
export const budgetsOf = (known: Known, names: readonly string[]): Readonly<Record<string, Budget>> =>
  Object.fromEntries(
    names.flatMap((name) => {
      const value = isQuantityName(name) ? known.get(name) : undefined;
      return value === undefined ? [] : [[name, budgetOf(value)]];
    }),
  );
