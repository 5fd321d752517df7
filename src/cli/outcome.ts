import type { Answer } from '../desk/schema/answer.ts';
import type { Fault } from '../report/fault.ts';
import { renderAnswer } from '../render/answer.ts';
import { renderFault } from '../render/fault.ts';
import { lookFor } from './look.ts';
import type { ExitCode, World } from './world.ts';

/** The fields that an ask may have; unknown fields and wrong types are the desk's to find. */
export type AskFields = Readonly<Record<string, unknown>>;

/** How an answer is shown. */
export interface Showing {
  readonly json?: true | undefined;
  readonly plain?: true | undefined;
}

/** The text that a fault's field names: of "anode[1]" the skeleton that stands there; null where there is none. */
export const textAt = (ask: unknown, field: string | undefined): string | null => {
  const steps = [...(field ?? '').matchAll(/\[(\d+)\]|([^.[\]]+)/g)].map(([, index, name]) => index ?? name ?? '');
  const found = steps.reduce<unknown>(
    (part, step) => (typeof part === 'object' && part !== null ? (part as AskFields)[step] : undefined),
    ask,
  );
  if (typeof found === 'string') return found;
  const inner = typeof found === 'object' && found !== null && 'skeleton' in found ? found.skeleton : undefined;
  return typeof inner === 'string' ? inner : null;
};

/** The exit code that an answer stands for. */
export const exitCodeOf = (given: Answer): ExitCode => {
  if (!given.ok) return 1;
  return given.ask === 'audit' && given.answer.verdict === 'unbalanced' ? 1 : 0;
};

/** What an answer is about, for its heading. */
const subjectOf = (ask: AskFields): { readonly text: string } => {
  const text = ask['equation'] ?? ask['species'];
  return { text: typeof text === 'string' ? text : '' };
};

const showFault = (fault: Fault, ask: AskFields, showing: Showing, world: World): void => {
  world.err(renderFault(fault, textAt(ask, fault.field), lookFor(world, showing.plain)));
};

/** Answers one ask and shows it: the contract's answer on one line with `json`, else a page for a person. */
export const answerAsk = async (ask: AskFields, showing: Showing, world: World): Promise<ExitCode> => {
  // The desk and its schemas are loaded when there is something to ask: help starts without them.
  const { answer } = await import('../desk/answer.ts');
  const given = answer(ask);
  if (showing.json === true) await world.out(`${JSON.stringify(given)}\n`);
  else if (given.ok) await world.out(renderAnswer(given, subjectOf(ask), lookFor(world, showing.plain)));
  else showFault(given.fault, ask, showing, world);
  return exitCodeOf(given);
};
