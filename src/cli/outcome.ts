import { answer } from '../desk/answer.ts';
import type { Answer, Answered } from '../desk/schema/answer.ts';
import type { PrintStyle } from '../notation/print/print.ts';
import type { Fault } from '../report/fault.ts';
import { type Subject, renderAnswer, renderRemarks } from '../render/answer.ts';
import { auditMarkdown } from '../render/audit-markdown.ts';
import { renderFault } from '../render/fault.ts';
import type { Look } from '../render/look.ts';
import { styledLines } from '../render/styled.ts';
import { type AskFields, textAt } from './ask-text.ts';
import { forCommandLine } from './command-fault.ts';
import { lookFor } from './look.ts';
import { isMarkup } from './markup-style.ts';
import type { ExitCode, World } from './world.ts';

/** How an answer is shown. */
export interface Showing {
  readonly json?: true | undefined;
  readonly plain?: true | undefined;
  readonly style?: PrintStyle | undefined;
  /** Of an audit: a table to be pasted into a report. */
  readonly markdown?: boolean | undefined;
}

const lookOf = ({ plain, style }: Showing, world: World): Look => lookFor(world, plain, style);

/** The exit code that an answer stands for. */
const exitCodeOf = (given: Answer): ExitCode => {
  if (!given.ok) return 1;
  return given.ask === 'audit' && given.answer.verdict === 'unbalanced' ? 1 : 0;
};

/** What an answer is about, for its heading. */
const subjectOf = (ask: AskFields): Subject => {
  const text = (name: string): string => {
    const field = ask[name];
    return typeof field === 'string' ? field : '';
  };
  const parts = { anode: text('anode'), cathode: text('cathode'), overall: text('overall') };
  return { text: text('equation') || text('species'), parts };
};

const showFault = (fault: Fault, ask: AskFields, showing: Showing, world: World): void => {
  world.err(renderFault(forCommandLine(fault), textAt(ask, fault.field), lookOf(showing, world)));
};

/** A page for a person; or the formulas alone, to be pasted: then what must be known besides goes to standard error. */
const showAnswer = async (given: Answered, ask: AskFields, showing: Showing, world: World): Promise<void> => {
  if (showing.markdown === true && given.ask === 'audit') {
    await world.out(auditMarkdown(given, subjectOf(ask)));
    return;
  }
  const { style } = showing;
  const look = lookOf(showing, world);
  if (!isMarkup(style)) {
    await world.out(renderAnswer(given, subjectOf(ask), look));
    return;
  }
  await world.out(`${styledLines(given, subjectOf(ask), style).join('\n')}\n`);
  const remarks = renderRemarks(given, look);
  if (remarks !== '') world.err(remarks);
};

/** Answers one ask and shows it: the contract's answer on one line with `json`, else a page for a person. */
export const answerAsk = async (ask: AskFields, showing: Showing, world: World): Promise<ExitCode> => {
  const given = answer(ask);
  if (showing.json === true) await world.out(`${JSON.stringify(given)}\n`);
  else if (given.ok) await showAnswer(given, ask, showing, world);
  else showFault(given.fault, ask, showing, world);
  return exitCodeOf(given);
};
