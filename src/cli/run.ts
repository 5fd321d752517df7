import { CommanderError } from '@commander-js/extra-typings';
import { shielded, unshielded } from './arrow-argument.ts';
import { program } from './program.ts';
import type { Shell } from './shell.ts';
import { type ExitCode, type World, UnreadableFile, WrongSetting } from './world.ts';

/** Help and version end a command well; everything else that commander ends is a wrong command. */
const codeOf = (problem: unknown, world: World): ExitCode => {
  if (problem instanceof CommanderError) return problem.exitCode === 0 ? 0 : 2;
  if (problem instanceof UnreadableFile) {
    world.err(`${problem.message}\n`);
    return 2;
  }
  if (problem instanceof WrongSetting) {
    world.err(problem.message);
    return 2;
  }
  world.err(`The program broke: ${problem instanceof Error ? problem.message : String(problem)}. Please report it.\n`);
  return 1;
};

/**
 * The command line: `argv` without the program's own name. Standard output carries answers only.
 * Gives 0 where it was answered, 1 for a fault or an unbalanced audit, 2 where the command itself was wrong.
 */
export const run = async (argv: readonly string[], world: World): Promise<ExitCode> => {
  let code: ExitCode = 0;
  const shell: Shell = {
    world,
    finish: (outcome) => {
      code = outcome;
    },
    ask: async (fields, showing) => {
      const plain = Object.entries(fields).map(([name, part]) => [name, unshielded(part)] as const);
      // The desk, its schemas and the pages are loaded when there is something to ask: help starts without them.
      const { answerAsk } = await import('./outcome.ts');
      code = await answerAsk(Object.fromEntries(plain), showing, world);
    },
  };
  try {
    await program(shell).parseAsync(argv.map(shielded), { from: 'user' });
    return code;
  } catch (problem) {
    return codeOf(problem, world);
  }
};
