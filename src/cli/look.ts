import { Chalk } from 'chalk';
import { type Look, UNPAINTED } from '../render/look.ts';
import type { World } from './world.ts';

/** What a terminal or a pipe gets; `plain` asks for the canonical spelling on a terminal too. */
export const lookFor = ({ terminal, colour }: World, plain = false): Look => {
  const chalk = new Chalk({ level: 1 });
  const paint = {
    strong: chalk.bold,
    faint: chalk.dim,
    good: chalk.green,
    warn: chalk.yellow,
    bad: chalk.red,
    mark: chalk.underline,
  };
  return { unicode: terminal && !plain, paint: colour ? paint : UNPAINTED };
};
