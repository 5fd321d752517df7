import { Chalk } from 'chalk';
import type { PrintStyle } from '../notation/print/print.ts';
import { type Look, UNPAINTED } from '../render/look.ts';
import type { World } from './world.ts';

/** What a terminal or a pipe gets; `plain` asks for the canonical spelling on a terminal too, `style` for its own. */
export const lookFor = ({ terminal, colour }: World, plain = false, style?: PrintStyle): Look => {
  const chalk = new Chalk({ level: 1 });
  const paint = {
    strong: chalk.bold,
    faint: chalk.dim,
    good: chalk.green,
    warn: chalk.yellow,
    bad: chalk.red,
    mark: chalk.underline,
  };
  const unicode = style === undefined ? terminal && !plain : style === 'unicode';
  return { unicode, paint: colour ? paint : UNPAINTED };
};
