import type { Fault } from '../report/fault.ts';
import { answer } from '../desk/answer.ts';
import type { Answer } from '../desk/schema/answer.ts';
import { type Line, LONGEST_LINE, LineCutter } from './lines.ts';

/** How many lines were answered and how many faulted. */
export interface Tally {
  readonly answered: number;
  readonly faulted: number;
}

/** Where a batch reads and writes. `write` resolves when more may be written. */
export interface BatchStreams {
  readonly input: AsyncIterable<Uint8Array>;
  readonly write: (text: string) => Promise<void>;
}

/** Characters of answers that may wait before they are written, so that memory stays the same for any load. */
const FULL = 65_536;

const lineFault = (code: 'bad-ask' | 'too-long', message: string, hint: string): Answer => {
  const fault: Fault = { code, message, hint };
  return { contract: 1, ask: null, ok: false, fault };
};

const answerText = (text: string): Answer => {
  try {
    return answer(JSON.parse(text));
  } catch (error) {
    if (!(error instanceof SyntaxError)) throw error;
    const at = /position (\d+)/.exec(error.message)?.[1];
    const place = at === undefined ? '' : ` It stops making sense at character ${String(Number(at) + 1)}.`;
    return lineFault(
      'bad-ask',
      `This line is not JSON.${place}`,
      'One ask a line: {"ask": "half", "skeleton": "Cu^2+ -> Cu"}.',
    );
  }
};

/** The answer to one line of a batch. A blank line is no JSON object either: lines out stay in step with lines in. */
export const answerLine = (line: Line): Answer => {
  if (line.kind === 'too-long') {
    const most = `A line may have at most ${String(LONGEST_LINE)} bytes.`;
    return lineFault('too-long', `This line is too long. ${most}`, 'Is a line end missing between two asks?');
  }
  if (line.kind === 'not-utf-8') {
    return lineFault('bad-ask', 'This line is not UTF-8 text.', 'Save the file as UTF-8.');
  }
  if (line.text.trim() === '') return lineFault('bad-ask', 'This line is blank.', 'One ask a line, as a JSON object.');
  return answerText(line.text);
};

/**
 * Answers asks, one JSON object a line, in order: one line out for each line in. A line that
 * cannot be answered gives a fault and the rest goes on. Reads no further than it has written.
 */
export const answerBatch = async ({ input, write }: BatchStreams): Promise<Tally> => {
  const cutter = new LineCutter();
  let waiting = '';
  let answered = 0;
  let faulted = 0;
  const answerAll = async (lines: Iterable<Line>): Promise<void> => {
    for (const line of lines) {
      const given = answerLine(line);
      if (given.ok) answered += 1;
      else faulted += 1;
      waiting += `${JSON.stringify(given)}\n`;
      if (waiting.length >= FULL) await flush();
    }
  };
  const flush = async (): Promise<void> => {
    const text = waiting;
    waiting = '';
    if (text !== '') await write(text);
  };
  for await (const chunk of input) {
    await answerAll(cutter.take(chunk));
    await flush();
  }
  await answerAll(cutter.rest());
  await flush();
  return { answered, faulted };
};
