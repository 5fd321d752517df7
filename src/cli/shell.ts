import type { AskFields, Showing } from './outcome.ts';
import type { ExitCode, World } from './world.ts';

/** What a command needs: the world, and a place for its exit code. */
export interface Shell {
  readonly world: World;
  readonly finish: (code: ExitCode) => void;
  /** Answers one ask, shows it and keeps the exit code. */
  readonly ask: (fields: AskFields, showing: Showing) => Promise<void>;
}

/** Examples at the end of a command's help. */
export const examples = (...lines: readonly string[]): string =>
  `\nExamples:\n${lines.map((line) => `  ${line}`).join('\n')}\n`;
