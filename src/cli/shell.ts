import type { AskFields } from './ask-text.ts';
import type { Showing } from './outcome.ts';
import type { ExitCode, World } from './world.ts';

/** What a command needs: the world, and a place for its exit code. */
export interface Shell {
  readonly world: World;
  readonly finish: (code: ExitCode) => void;
  /** Answers one ask, shows it and keeps the exit code. */
  readonly ask: (fields: AskFields, showing: Showing) => Promise<void>;
}

/** What to try where a text has fallen into words. */
export const UNQUOTED = 'Put a text with blanks, = or > in quotes: "Cu^2+ -> Cu", --given current="2 A".';

const MEASURE = 76;

/** A long command as a shell takes it over several lines: broken before options, each line but the last ends in \\. */
const folded = (command: string): readonly string[] => {
  const lines: string[] = [];
  for (const piece of command.split(/ (?=--)/)) {
    const last = lines.at(-1);
    if (last !== undefined && last.length + piece.length < MEASURE) lines[lines.length - 1] = `${last} ${piece}`;
    else lines.push(last === undefined ? piece : `    ${piece}`);
  }
  return lines.map((line, at) => (at < lines.length - 1 ? `${line} \\` : line));
};

/** Examples at the end of a command's help. */
export const examples = (...commands: readonly string[]): string =>
  `\nExamples:\n${commands
    .flatMap(folded)
    .map((line) => `  ${line}`)
    .join('\n')}\n`;
