import type { Fault } from '../../report/fault.ts';
import { type Result, chain, failure, success } from '../../report/result.ts';
import { answer } from '../answer.ts';
import type { Quantity } from '../schema/shape.ts';
import type { SheetTarget } from '../schema/sheet.ts';
import type { AmountsReply, WholeTarget } from './answer.ts';
import { type Clock, clockText, minutesBetween } from './clock.ts';
import { type Goal, readGoal, readStart } from './goal.ts';

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
    Object.entries(target).flatMap(([name, value]) =>
      value === undefined || BESIDES.has(name) || without.has(name) ? [] : [[name, value] as const],
    ),
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

const NOT_ENOUGH: Fault = {
  code: 'not-enough-given',
  field: 'goal',
  message: 'This goal cannot be judged: neither a current nor a start and an end are stated.',
  missing: ['current'],
  hint: 'Give a current, or a start and "by" a time.',
};

const MINUTE = 60;
const HOUR = 3600;
/** Minutes that are rounding and no lateness. */
const ROUNDING = 1e-6;

const inHours = ({ value, uncertainty }: Quantity): Quantity => ({
  value: value / HOUR,
  unit: 'h',
  ...(uncertainty === undefined ? {} : { uncertainty: uncertainty / HOUR }),
});

type Timing = Pick<WholeTarget, 'needed' | 'ready' | 'latest' | 'reached' | 'spare'>;

const UNTIMED: Timing = { needed: null, ready: null, latest: null, reached: null, spare: null };

/** When the stated current is done, and how that stands to the end. A start is rounded down to the minute, an end up. */
const timingOf = ({ goal, start, window }: Plan, time: Quantity | undefined): Timing => {
  if (time === undefined) return UNTIMED;
  const minutes = time.value / MINUTE;
  const spare = window === null ? null : window - minutes;
  return {
    needed: inHours(time),
    ready: start === null ? null : clockText(start, minutes),
    latest: goal.by === null || start !== null ? null : clockText(goal.by.clock, -Math.ceil(minutes)),
    reached: spare === null ? null : spare >= -ROUNDING,
    spare: spare === null ? null : inHours({ value: spare * MINUTE, unit: 's' }),
  };
};

const wasAssumed = (reply: AmountsReply | null): boolean =>
  reply?.notes.some(({ code }) => code === 'efficiency-assumed') ?? false;

const shown = (plan: Plan, needed: AmountsReply | null, enough: AmountsReply | null): WholeTarget => {
  const { target, goal, species } = plan;
  return {
    name: target.label ?? target.goal,
    species,
    goal: { quantity: goal.quantity, text: goal.text },
    start: target.start ?? null,
    by: goal.by?.text ?? null,
    ...timingOf(plan, needed?.answer.quantities['time']),
    current: needed?.answer.quantities['current'] ?? null,
    enough: enough?.answer.quantities['current'] ?? null,
    assumed: wasAssumed(needed) || wasAssumed(enough),
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
        needed === null && enough === null ? failure(NOT_ENOUGH) : success(shown(plan, needed, enough)),
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
