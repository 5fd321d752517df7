import type { EquationAuditAnswer } from '../desk/schema/answer.ts';
import { amountText } from './audit-words.ts';
import { type Alignment, type Cell, columns } from './columns.ts';
import type { Look } from './look.ts';
import { termText } from './spelling.ts';

type Contributions = NonNullable<EquationAuditAnswer['contributions']>;

const shownAmount = (label: string, amount: string, look: Look): string => {
  const text = amountText(label, amount);
  return look.unicode ? text.replace('-', '−') : text;
};

/** The labels of a ledger that some term puts something into, in the order of the ledger. */
export const labelsOf = (audit: EquationAuditAnswer): readonly string[] => Object.keys(audit.ledger);

/** What each written term puts into the ledger, one line a term. Nothing where it was not asked for. */
export const contributionLines = (audit: EquationAuditAnswer, look: Look): readonly string[] => {
  const contributions: Contributions = audit.contributions ?? [];
  if (contributions.length === 0) return [];
  const labels = labelsOf(audit);
  const { faint } = look.paint;
  const nothing: Cell = { text: look.unicode ? '·' : '.', paint: faint };
  const head = ['', 'term', ...labels].map((text): Cell => ({ text, paint: faint }));
  const rows = contributions.map(({ term, side, amounts }, at): readonly (Cell | string)[] => {
    const first = contributions[at - 1]?.side !== side;
    return [
      { text: (first ? side : '').padEnd(10), paint: faint },
      termText(term, look),
      ...labels.map((label): Cell | string => {
        const amount = amounts[label];
        return amount === undefined ? nothing : shownAmount(label, amount, look);
      }),
    ];
  });
  return columns([head, ...rows], ['left', 'left', ...labels.map((): Alignment => 'right')]);
};
