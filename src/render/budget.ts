import type { AmountsAnswerShown } from '../desk/schema/answer.ts';
import { wrapped } from './block.ts';
import { type Cell, columns } from './columns.ts';
import type { Look } from './look.ts';

type Budgets = NonNullable<AmountsAnswerShown['budgets']>;

/** Less than this part of a variance is named, not counted. */
const LEAST = 0.0005;
const TEXT_WIDTH = 56;

const percent = (part: number): string => (part < LEAST ? '< 0.1 %' : `${(part * 100).toPrecision(3)} %`);

const linesOf = (name: string, lines: Budgets[string], look: Look): readonly (readonly (Cell | string)[])[] => {
  const text = lines.map(({ input, part }) => `${input.replaceAll('_', ' ')} ${percent(part)}`).join(', ');
  return wrapped(text, TEXT_WIDTH).map((line, at) => [
    { text: (at === 0 ? name.replaceAll('_', ' ') : '').padEnd(10), paint: look.paint.faint },
    line,
  ]);
};

/** Who contributes what to the variance of each quantity, the largest first. Nothing where it was not asked for. */
export const budgetLines = (budgets: Budgets | undefined, look: Look): readonly string[] => {
  const uncertain = Object.entries(budgets ?? {}).filter(([name, lines]) => lines.some(({ input }) => input !== name));
  if (uncertain.length === 0) return [];
  const head = [
    { text: 'budget', paint: look.paint.faint },
    { text: 'parts of the variance', paint: look.paint.faint },
  ];
  return columns([head, ...uncertain.flatMap(([name, lines]) => linesOf(name, lines, look))], ['left', 'left']);
};
