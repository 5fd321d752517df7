import { type Result, failure, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import { isMetal } from '../species/oxidation-table.ts';
import type { Species } from '../species/species.ts';
import type { Given } from './given.ts';
import type { Problem } from './problem.ts';
import type { VariableName } from './relations.ts';

const valueOf = (given: readonly Given[], name: VariableName): number | undefined =>
  given.find((one) => one.name === name)?.measured.value;

/** A metal that is made leaves the solution: its concentration counts what is still dissolved of it. */
const isDeposit = ({ composition, charge }: Species): boolean =>
  composition.size === 1 && charge.equals(0) && [...composition.keys()].every((element) => isMetal(element));

/**
 * Which way the concentration of a tank goes. What is used up falls. A metal that is made is counted as what leaves the
 * solution, unless both concentrations say otherwise; anything else that is made rises.
 */
export const tankDirection = ({ equivalence, asked }: Problem, given: readonly Given[]): 'falls' | 'rises' => {
  if (equivalence.sign < 0) return 'falls';
  if (!isDeposit(asked.species)) return 'rises';
  const from = valueOf(given, 'from');
  const to = valueOf(given, 'to');
  return from !== undefined && to !== undefined && to > from ? 'rises' : 'falls';
};

/** A charge that flows backwards turns every change round. */
const runsBackwards = (given: readonly Given[]): boolean =>
  (['charge', 'current', 'current_density'] as const).some((name) => (valueOf(given, name) ?? 0) < 0);

/** `contradiction` where concentrations go the wrong way: what is used up cannot rise, what is made cannot fall. */
export const checkTank = (problem: Problem, given: readonly Given[]): Result<null> => {
  const { asked, equivalence } = problem;
  const from = valueOf(given, 'from');
  const to = given.find(({ name }) => name === 'to');
  if (equivalence.sign === 0 || from === undefined || to === undefined || runsBackwards(given)) return success(null);
  const change = to.measured.value - from;
  if (change === 0 || change > 0 === (tankDirection(problem, given) === 'rises')) return success(null);
  return failure({
    code: 'contradiction',
    message: `${asked.name} is ${change > 0 ? 'used up, yet its concentration rises' : 'made, yet its concentration falls'}`,
    field: to.field,
    span: wholeSpan(to.text),
    hint: 'from is the concentration at the start, to the one at the end.',
  });
};
