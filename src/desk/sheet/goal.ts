import { QUANTITIES } from '../../amounts/quantities.ts';
import { readQuantity } from '../../amounts/quantity.ts';
import { type Result, failure, success } from '../../report/result.ts';
import { type Span, spanOf } from '../../report/span.ts';
import { type Clock, readClock } from './clock.ts';

/** What a goal may be stated in, the likeliest first. */
const GOALS = ['mass', 'thickness', 'amount', 'volume', 'charge'] as const;

/** "2 kg of Cu by 16:00", read. */
export interface Goal {
  readonly quantity: (typeof GOALS)[number];
  /** "2 kg". */
  readonly text: string;
  /** "Cu", or null where the product of the tank is meant. */
  readonly species: string | null;
  readonly by: { readonly text: string; readonly clock: Clock } | null;
}

/**
 *     2 kg of Cu by 16:00
 *     ^^^^    ^^    ^^^^^   quantity, species, time
 */
const FORM = /^\s*(.+?)(?:\s+of\s+(\S+))?(?:\s+by\s+(.+?))?\s*$/u;

const badGoal = (message: string, span: Span, hint: string): Result<never> =>
  failure({ code: 'bad-ask', field: 'goal', message, span, hint });

const CLOCK_HINT = 'Write 16:00, or with its date 2026-05-04 16:00.';

/** Reads the goal of a target. Faults, in `goal`: `bad-ask` for a time, `unknown-unit` or `bad-ask` for a quantity. */
export const readGoal = (goal: string): Result<Goal> => {
  const [, text = '', species, time] = FORM.exec(goal) ?? [];
  const quantity = GOALS.find((name) => readQuantity(text, QUANTITIES[name]).ok);
  const start = goal.length - goal.trimStart().length;
  const span = spanOf(goal, start, start + text.length);
  if (quantity === undefined) {
    const hint = 'Write a mass, a thickness, a volume, an amount or a charge: 2 kg by 16:00, 12 µm, 40 L of H2.';
    return badGoal('This is no goal.', span, hint);
  }
  const clock = time === undefined ? undefined : readClock(time);
  if (time !== undefined && clock === undefined) {
    const at = goal.lastIndexOf(time);
    return badGoal('This is no time of day.', spanOf(goal, at, at + time.length), CLOCK_HINT);
  }
  const by = time === undefined || clock === undefined ? null : { text: time, clock };
  return success({ quantity, text, species: species ?? null, by });
};

/** The start of a target. Fault: `bad-ask` in `start`. */
export const readStart = (start: string | undefined): Result<Clock | null> => {
  if (start === undefined) return success(null);
  const clock = readClock(start);
  if (clock !== undefined) return success(clock);
  const span = spanOf(start, 0, start.length);
  return failure({ code: 'bad-ask', field: 'start', message: 'This is no time of day.', span, hint: CLOCK_HINT });
};
