import { answer } from '../desk/answer.ts';
import type { PrintStyle } from '../notation/print/print.ts';
import {
  type Audited,
  type ListVerdict,
  type VerdictCounts,
  CSV_HEADER,
  csvLine,
  listMarkdown,
  listText,
  verdictOf,
} from '../render/audit-list.ts';
import { renderFault } from '../render/fault.ts';
import type { Look } from '../render/look.ts';
import { printable } from '../report/excerpt.ts';
import { type AskFields, textAt } from './ask-text.ts';
import { asOption, forCommandLine } from './command-fault.ts';
import { type ListedEquation, columnsNamed, equationsOfCsv, equationsOfText } from './equation-list.ts';
import { lookFor } from './look.ts';
import { textPieces } from './text-file.ts';
import { type ExitCode, type World, UnreadableFile, WrongSetting } from './world.ts';

/** How the audit of a list is written. */
export type ListFormat = 'text' | 'markdown' | 'csv' | 'ndjson';

/** What is audited and how it is shown. */
export interface ListRequest {
  readonly path: string;
  /** The column of a CSV file; undefined for a text with one equation a line. */
  readonly column?: string | undefined;
  readonly format: ListFormat;
  /** What every ask of the list carries: medium, definitions. */
  readonly fields: AskFields;
  readonly plain?: true | undefined;
  readonly style?: PrintStyle | undefined;
}

/** Lines that need attention and are kept for the page; the rest is only counted, so that memory stays the same. */
export const MOST_SHOWN = 500;
const FULL = 65_536;

/** A setting that no line could be audited with is refused once, before the file is read. */
const refuseSettings = ({ fields }: ListRequest, look: Look): void => {
  const probe = answer({ ask: 'audit', equation: 'H2 -> H2', ...fields });
  if (probe.ok || probe.fault.field === 'equation') return;
  throw new WrongSetting(renderFault(asOption(probe.fault), textAt(fields, probe.fault.field), look));
};

const audited = (listed: ListedEquation, { fields }: ListRequest): Audited & { readonly json: unknown } => {
  const given = answer({ ask: 'audit', equation: listed.text, ...fields });
  const json = { line: listed.line, label: listed.label, ...given };
  if (!given.ok) return { ...listed, fault: forCommandLine(given.fault), json };
  if (given.ask !== 'audit' || 'parts' in given.answer)
    throw new RangeError('an audit was answered with something else');
  return { ...listed, audit: given.answer, json };
};

const lineText = (format: ListFormat, one: Audited & { readonly json: unknown }): string => {
  if (format === 'csv') return csvLine(one);
  return format === 'ndjson' ? `${JSON.stringify(one.json)}\n` : '';
};

/** A file of CSV read as a text would be one fault a line: better to ask for its column. */
const refuseCsv = (first: ListedEquation, second: ListedEquation, path: string): void => {
  const columns = columnsNamed(first, second);
  if (columns === null) return;
  const named = columns.map(printable).join(', ');
  throw new UnreadableFile(
    `${path} looks like CSV: its first line names ${named}.\nSay which column holds the equations: --column NAME.`,
  );
};

/** The equations of the file, in whichever form it has. */
const listedIn = async function* ({ path, column }: ListRequest, world: World): AsyncGenerator<ListedEquation> {
  const text = textPieces(world, path);
  if (column !== undefined) {
    yield* equationsOfCsv(text, column);
    return;
  }
  let first: ListedEquation | null = null;
  let count = 0;
  for await (const listed of equationsOfText(text)) {
    count += 1;
    first ??= listed;
    if (count === 2) refuseCsv(first, listed, path);
    yield listed;
  }
};

/** What stands at the end: the page where the format is one. */
const closing = (
  counts: VerdictCounts,
  shown: readonly Audited[],
  { format, plain, style }: ListRequest,
  world: World,
) => {
  const more = counts['not-lowest'] + counts.unbalanced + counts.unreadable - shown.length;
  if (format === 'text') return listText(counts, shown, more, lookFor(world, plain, style));
  return format === 'markdown' ? listMarkdown(counts, shown, more) : '';
};

/**
 * Audits every equation of a file as it streams by. Text and Markdown give the counts and what needs attention,
 * CSV and NDJSON one line for each equation. Exit code 1 where anything is unbalanced or unreadable, and where the file
 * holds no equation at all: a check that a build relies on must not pass on nothing.
 */
export const auditList = async (request: ListRequest, world: World): Promise<ExitCode> => {
  const { format, path } = request;
  refuseSettings(request, lookFor(world, request.plain, request.style));
  const counts: Record<ListVerdict, number> = { balanced: 0, 'not-lowest': 0, unbalanced: 0, unreadable: 0 };
  const shown: Audited[] = [];
  let waiting = format === 'csv' ? CSV_HEADER : '';
  for await (const listed of listedIn(request, world)) {
    const one = audited(listed, request);
    counts[verdictOf(one)] += 1;
    if (verdictOf(one) !== 'balanced' && shown.length < MOST_SHOWN) shown.push(one);
    waiting += lineText(format, one);
    if (waiting.length >= FULL) {
      await world.out(waiting);
      waiting = '';
    }
  }
  const total = Object.values(counts).reduce((sum, count) => sum + count, 0);
  if (total === 0) world.err(`Nothing was audited: ${path} holds no equation.\n`);
  waiting += total === 0 && format === 'text' ? '' : closing(counts, shown, request, world);
  if (waiting !== '') await world.out(waiting);
  return total === 0 || counts.unbalanced + counts.unreadable > 0 ? 1 : 0;
};
