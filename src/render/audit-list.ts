import type { EquationAuditAnswer } from '../desk/schema/answer.ts';
import type { Fault } from '../report/fault.ts';
import { repaired } from './audit.ts';
import { page } from './block.ts';
import { type Cell, columns } from './columns.ts';
import { renderFault } from './fault.ts';
import type { Look, Paint } from './look.ts';

/** What came of one equation of a list. */
export type Audited =
  | { readonly line: number; readonly label: string; readonly text: string; readonly audit: EquationAuditAnswer }
  | { readonly line: number; readonly label: string; readonly text: string; readonly fault: Fault };

/** The verdict of one line, "unreadable" for a fault. */
export type ListVerdict = EquationAuditAnswer['verdict'] | 'unreadable';

/** How many lines there are of each verdict. */
export type VerdictCounts = Readonly<Record<ListVerdict, number>>;

/** In the order in which they are counted. */
export const LIST_VERDICTS: readonly ListVerdict[] = ['balanced', 'not-lowest', 'unbalanced', 'unreadable'];

const PAINTS: Readonly<Record<ListVerdict, keyof Paint>> = {
  balanced: 'good',
  'not-lowest': 'warn',
  unbalanced: 'bad',
  unreadable: 'bad',
};

/** The verdict of an audited line. */
export const verdictOf = (audited: Audited): ListVerdict => ('fault' in audited ? 'unreadable' : audited.audit.verdict);

/** "O -1, charge +2": right minus left; of a fault its sentence. */
export const gapText = (audited: Audited): string => {
  if ('fault' in audited) return audited.fault.message;
  const entries = Object.entries(audited.audit.residual);
  return entries.map(([label, off]) => `${label} ${off.startsWith('-') ? off : `+${off}`}`).join(', ');
};

/** The likeliest repair, "" where there is none. */
export const repairText = (audited: Audited): string =>
  'fault' in audited ? '' : (audited.audit.repairs[0]?.reaction.plain ?? '');

const place = ({ line, label }: Audited): string => `line ${String(line)}${label === '' ? '' : `, ${label}`}`;

const attention = (audited: Audited, look: Look): readonly string[] => {
  const { paint } = look;
  const verdict = verdictOf(audited);
  const head = `${place(audited)}   ${paint[PAINTS[verdict]](verdict)}`;
  if ('fault' in audited)
    return [head, ...renderFault(audited.fault, audited.text, look).trimEnd().split('\n').slice(1)];
  const gap = gapText(audited);
  const [repair] = audited.audit.repairs;
  return [
    head,
    `  ${audited.text}`,
    ...(gap === '' ? [] : [`  ${paint.faint('right minus left:')} ${look.unicode ? gap.replaceAll('-', '−') : gap}`]),
    ...(repair === undefined ? [] : [`  ${paint.faint('likeliest repair:')} ${repaired(repair, look)}`]),
  ];
};

const countRows = (counts: VerdictCounts, look: Look): readonly (readonly (Cell | string)[])[] =>
  LIST_VERDICTS.map((verdict) => {
    const count = counts[verdict];
    return [{ text: verdict, paint: count > 0 ? look.paint[PAINTS[verdict]] : look.paint.faint }, String(count)];
  });

/** The counts of a list, then the lines that need attention; `more` of these are not shown. */
export const listText = (counts: VerdictCounts, lines: readonly Audited[], more: number, look: Look): string =>
  page([
    columns(countRows(counts, look), ['left', 'right']),
    ...lines.map((audited) => attention(audited, look)),
    more === 0 ? [] : [`and ${String(more)} more: the formats csv and ndjson show all`],
  ]);

const markdownCell = (text: string): string => text.replaceAll('|', '\\|').replaceAll('\n', ' ');

const markdownRow = (cells: readonly string[]): string => `| ${cells.map(markdownCell).join(' | ')} |`;

/** The same as Markdown tables, for a report. */
export const listMarkdown = (counts: VerdictCounts, lines: readonly Audited[], more: number): string => {
  const summary = [
    '| verdict | equations |',
    '|---|--:|',
    ...LIST_VERDICTS.map((verdict) => markdownRow([verdict, String(counts[verdict])])),
  ];
  const rows = lines.map((audited) =>
    markdownRow([
      String(audited.line),
      audited.label,
      `\`${audited.text}\``,
      verdictOf(audited),
      gapText(audited),
      repairText(audited) === '' ? '' : `\`${repairText(audited)}\``,
    ]),
  );
  const head = [
    '| line | label | equation | verdict | right minus left | likeliest repair |',
    '|--:|---|---|---|---|---|',
  ];
  const table = rows.length === 0 ? [] : ['', ...head, ...rows];
  const rest = more === 0 ? [] : ['', `And ${String(more)} more.`];
  return `${[...summary, ...table, ...rest].join('\n')}\n`;
};

const csvField = (text: string): string => (/[",\n\r]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text);

/** The header of `csvLine`. */
export const CSV_HEADER = 'line,label,equation,verdict,right_minus_left,likeliest_repair\n';

/** One audited line as a CSV record. */
export const csvLine = (audited: Audited): string =>
  `${[String(audited.line), audited.label, audited.text, verdictOf(audited), gapText(audited), repairText(audited)]
    .map(csvField)
    .join(',')}\n`;
