import { computeAmounts } from '../../amounts/amounts.ts';
import type { BudgetLine } from '../../amounts/budget.ts';
import { chain } from '../../report/result.ts';
import { readSpecies } from '../../species/read.ts';
import { readCircuit } from '../amounts.ts';
import { readAsk } from '../read-ask.ts';
import { readSettings } from '../settings.ts';
import type { BudgetShare, Efficiency } from './answer.ts';

/** What one input does to an efficiency: its standard uncertainty times the sensitivity, signed, as a fraction. */
interface Influence {
  readonly input: string;
  readonly shift: number;
}

/** A current efficiency found by weighing, as a fraction, before it is shown. */
export interface FoundEfficiency {
  readonly value: number;
  /** The mass that the charge could have made: the weight of this run among others. */
  readonly possible: number;
  readonly influences: readonly Influence[];
}

/** What the sheet calls the inputs of the ask: a run weighs its mass, a record gives its charge. */
export type InputNames = Readonly<Record<string, string>>;

const influenceOf = ({ input, sensitivity, uncertainty }: BudgetLine, names: InputNames): Influence => ({
  input: names[input] ?? input,
  shift: sensitivity * uncertainty,
});

/** The efficiency that an amounts ask with a weighed mass finds, with what every input contributes; null without one. */
export const foundEfficiency = (ask: object, names: InputNames): FoundEfficiency | null => {
  const found = chain(readAsk(ask), (valid) =>
    chain(readSettings(valid), (options) => {
      if (valid.ask !== 'amounts') throw new RangeError('an amounts ask was read as something else');
      return chain(readCircuit(valid, options), (circuit) =>
        chain(readSpecies(valid.species, options), ({ species }) =>
          computeAmounts({ circuit, species, given: valid.given, budget: true }),
        ),
      );
    }),
  );
  if (!found.ok) return null;
  const { quantities, budgets } = found.value;
  const { efficiency, mass } = quantities;
  if (efficiency === undefined || mass === undefined || efficiency.value <= 0) return null;
  const value = efficiency.value / 100;
  return {
    value,
    possible: mass.value / value,
    influences: (budgets?.['efficiency'] ?? []).map((line) => influenceOf(line, names)),
  };
};

/** One standard uncertainty of a found efficiency, as a fraction. */
export const uncertaintyOfFound = ({ influences }: FoundEfficiency): number =>
  Math.sqrt(influences.reduce((sum, { shift }) => sum + shift * shift, 0));

/** True where the sheet states an uncertainty: the atomic weights alone say nothing about a weighing. */
export const isStated = ({ influences }: FoundEfficiency): boolean => influences.some(({ input }) => !isWeight(input));

const isWeight = (input: string): boolean => input.startsWith('atomic weight');

/** Influences of one input added up as variances: the same scale errs anew each time. */
const budgetOf = (influences: readonly Influence[]): readonly BudgetShare[] => {
  const variances = new Map<string, number>();
  for (const { input, shift } of influences) variances.set(input, (variances.get(input) ?? 0) + shift * shift);
  const total = [...variances.values()].reduce((sum, one) => sum + one, 0);
  return [...variances]
    .filter(([, variance]) => variance > 0)
    .sort(([, one], [, other]) => other - one)
    .map(([input, variance]) => ({ input, contribution: Math.sqrt(variance) * 100, part: variance / total }));
};

/** A found efficiency in %, with its uncertainty and budget where the sheet states what enters it. */
export const showEfficiency = (found: FoundEfficiency): Efficiency => {
  const efficiency = { value: found.value * 100, unit: '%' };
  if (!isStated(found)) return { efficiency, budget: [] };
  return {
    efficiency: { ...efficiency, uncertainty: uncertaintyOfFound(found) * 100 },
    budget: budgetOf(found.influences),
  };
};

/**
 * Several runs as one: η = Σ m / Σ m(possible), with the possible masses as weights w = m(possible) / Σ m(possible).
 *
 *     dη/dm_i = w_i dη_i/dm_i,   dη/dx_i = w_i (η / η_i) dη_i/dx_i  for all that enters the possible mass,
 *
 * to first order (JCGM 100:2008, 5.1.2). The atomic weights are the same in all runs and are added with their signs.
 */
export const togetherOf = (runs: readonly FoundEfficiency[]): FoundEfficiency => {
  const possible = runs.reduce((sum, run) => sum + run.possible, 0);
  const value = runs.reduce((sum, run) => sum + run.value * run.possible, 0) / possible;
  const own: Influence[] = [];
  const shared = new Map<string, number>();
  for (const run of runs) {
    const weight = run.possible / possible;
    for (const { input, shift } of run.influences) {
      const moved = weight * shift * (input === 'weighed' ? 1 : value / run.value);
      if (isWeight(input)) shared.set(input, (shared.get(input) ?? 0) + moved);
      else own.push({ input, shift: moved });
    }
  }
  return { value, possible, influences: [...own, ...[...shared].map(([input, shift]) => ({ input, shift }))] };
};
