import { Chalk } from 'chalk';
import type { PrintStyle } from '../notation/print/print.ts';
import { type Look, UNPAINTED } from '../render/look.ts';
import type { World } from './world.ts';

/** What a terminal or a pipe gets; `plain` asks for the canonical spelling on a terminal too, `style` for its own. */
export const lookFor = ({ terminal, colour }: World, plain = false, style?: PrintStyle): Look => {
  const chalk = new Chalk({ level: 1 });
  // Chalk prints every argument that it is handed: a paint takes one, also where a list is mapped with it.
  const only =
    (print: (text: string) => string): ((text: string) => string) =>
    (text) =>
      print(text);
  const paint = {
    strong: only(chalk.bold),
    faint: only(chalk.dim),
    good: only(chalk.green),
    warn: only(chalk.yellow),
    bad: only(chalk.red),
    mark: only(chalk.underline),
  };
  const unicode = style === undefined ? terminal && !plain : style === 'unicode';
  return { unicode, paint: colour ? paint : UNPAINTED };
};
