import type { Fault } from '../report/fault.ts';
import { type Result, chain, failure, success } from '../report/result.ts';
import { answer } from './answer.ts';
import type { Quantity } from './schema/shape.ts';
import type { SheetTarget } from './schema/sheet.ts';
import type { AmountsReply, WholeTarget } from './sheet-answer.ts';
import { type Clock, clockText, minutesBetween } from './sheet-clock.ts';
import { type Goal, readGoal, readStart } from './sheet-goal.ts';

/** What belongs to a target and not to the law. */
const BESIDES = new Set(['label', 'goal', 'product', 'start']);
/** What makes the current, left out where it is asked. */
const FLOWS = new Set(['current', 'current_density']);

type Given = Readonly<Record<string, string>>;
/** The ask of the target's tank for one species with what is given. */
export type AskOfTank = (species: string, given: Given) => object;

/** What a target came from: its fields without those that are no quantities. */
interface Plan {
  readonly target: SheetTarget;
  readonly goal: Goal;
  readonly start: Clock | null;
  readonly species: string;
  readonly given: Given;
  /** Minutes from start to end, where both are stated. */
  readonly window: number | null;
}

const quantitiesIn = (target: SheetTarget, without: ReadonlySet<string>): Given =>
  Object.fromEntries(
    Object.entries(target).filter(([name, value]) => value !== undefined && !BESIDES.has(name) && !without.has(name)),
  );

const amountsFor = (ask: object): Result<AmountsReply> => {
  const given = answer(ask);
  if (!given.ok) return failure(given.fault);
  if (given.ask !== 'amounts') throw new RangeError('amounts were answered with something else');
  return success(given);
};

const NONE: ReadonlySet<string> = new Set();

/** How long the stated current takes; null where none is stated. */
const neededFor = (plan: Plan, ask: AskOfTank): Result<AmountsReply | null> => {
  if (plan.target.current === undefined && plan.target.current_density === undefined) return success(null);
  const given = { ...quantitiesIn(plan.target, NONE), ...plan.given };
  return amountsFor(ask(plan.species, given));
};

/** The current that makes the goal from start to end; null without both. */
const enoughFor = (plan: Plan, ask: AskOfTank): Result<AmountsReply | null> => {
  if (plan.window === null) return success(null);
  const time = { time: `${String(plan.window)} min` };
  return amountsFor(ask(plan.species, { ...quantitiesIn(plan.target, FLOWS), ...plan.given, ...time }));
};

const notEnough = (missing: string, hint: string): Fault => ({
  code: 'not-enough-given',
  field: 'goal',
  message: 'This goal cannot be judged: neither a current nor a start and an end are stated.',
  missing: [missing],
  hint,
});

const HOUR = 60;

const shown = (plan: Plan, needed: AmountsReply | null, enough: AmountsReply | null): WholeTarget => {
  const { target, goal, start, species, window } = plan;
  const time = needed?.answer.quantities['time'] ?? null;
  const minutes = time === null ? null : time.value * HOUR;
  const spare = minutes === null || window === null ? null : window - minutes;
  const later = goal.by === null || minutes === null || start !== null ? null : clockText(goal.by.clock, -minutes);
  const hours = (value: number): Quantity => ({ value: value / HOUR, unit: 'h' });
  return {
    name: target.label ?? target.goal,
    species,
    goal: { quantity: goal.quantity, text: goal.text },
    start: target.start ?? null,
    by: goal.by?.text ?? null,
    needed: time,
    current: needed?.answer.quantities['current'] ?? null,
    ready: start === null || minutes === null ? null : clockText(start, minutes),
    latest: later,
    reached: spare === null ? null : spare >= -1e-6,
    spare: spare === null ? null : hours(spare),
    enough: enough?.answer.quantities['current'] ?? null,
    assumed: [...(needed?.notes ?? []), ...(enough?.notes ?? [])].some(({ code }) => code === 'efficiency-assumed'),
  };
};

const planOf = (target: SheetTarget, product: string): Result<Plan> =>
  chain(readGoal(target.goal), (goal) =>
    chain(readStart(target.start), (start) => {
      const window = start === null || goal.by === null ? null : minutesBetween(start, goal.by.clock);
      if (window !== null && window <= 0) {
        const message = 'This goal ends before its start.';
        return failure({ code: 'contradiction', field: 'goal', message, hint: 'Look at the two dates.' });
      }
      const species = target.product ?? goal.species ?? product;
      return success({ target, goal, start, species, given: { [goal.quantity]: goal.text }, window });
    }),
  );

/**
 * What a target takes: the time at its current and whether the goal is reached, and the current that would reach it.
 * Faults: those of the goal and of the amounts asked, in the fields of the ask; `not-enough-given`.
 */
export const answerTarget = (target: SheetTarget, product: string, ask: AskOfTank): Result<WholeTarget> =>
  chain(planOf(target, product), (plan) =>
    chain(neededFor(plan, ask), (needed) =>
      chain(enoughFor(plan, ask), (enough) =>
        needed === null && enough === null
          ? failure(notEnough('current', 'Give a current, or a start and "by" a time.'))
          : success(shown(plan, needed, enough)),
      ),
    ),
  );

/** The keys of a target for the quantities of its asks. */
export const TARGET_KEYS: Readonly<Record<string, string>> = {
  mass: 'goal',
  thickness: 'goal',
  volume: 'goal',
  amount: 'goal',
  charge: 'goal',
  time: 'start',
};
