import { answer } from '../desk/answer.ts';
import type { PrintStyle } from '../notation/print/print.ts';
import {
  type Audited,
  type ListVerdict,
  CSV_HEADER,
  csvLine,
  listMarkdown,
  listText,
  verdictOf,
} from '../render/audit-list.ts';
import { type ListedEquation, equationsOfCsv, equationsOfText } from './equation-list.ts';
import { lookFor } from './look.ts';
import type { AskFields } from './outcome.ts';
import { type ExitCode, type World, bytesOf } from './world.ts';

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

const pieces = async function* (world: World, path: string): AsyncGenerator<string> {
  const decoder = new TextDecoder();
  for await (const chunk of bytesOf(world, path)) yield decoder.decode(chunk, { stream: true });
};

const audited = (listed: ListedEquation, { fields }: ListRequest): Audited & { readonly json: unknown } => {
  const given = answer({ ask: 'audit', equation: listed.text, ...fields });
  const json = { line: listed.line, label: listed.label, ...given };
  if (!given.ok) return { ...listed, fault: given.fault, json };
  if (given.ask !== 'audit' || 'parts' in given.answer)
    throw new RangeError('an audit was answered with something else');
  return { ...listed, audit: given.answer, json };
};

const lineText = (format: ListFormat, one: Audited & { readonly json: unknown }): string => {
  if (format === 'csv') return csvLine(one);
  return format === 'ndjson' ? `${JSON.stringify(one.json)}\n` : '';
};

/**
 * Audits every equation of a file as it streams by. Text and Markdown give the counts and what needs attention,
 * CSV and NDJSON one line for each equation. Exit code 1 where anything is unbalanced or unreadable.
 */
export const auditList = async (request: ListRequest, world: World): Promise<ExitCode> => {
  const { path, column, format } = request;
  const text = pieces(world, path);
  const counts: Record<ListVerdict, number> = { balanced: 0, 'not-lowest': 0, unbalanced: 0, unreadable: 0 };
  const shown: Audited[] = [];
  let waiting = format === 'csv' ? CSV_HEADER : '';
  for await (const listed of column === undefined ? equationsOfText(text) : equationsOfCsv(text, column)) {
    const one = audited(listed, request);
    counts[verdictOf(one)] += 1;
    if (verdictOf(one) !== 'balanced' && shown.length < MOST_SHOWN) shown.push(one);
    waiting += lineText(format, one);
    if (waiting.length >= FULL) {
      await world.out(waiting);
      waiting = '';
    }
  }
  const more = counts['not-lowest'] + counts.unbalanced + counts.unreadable - shown.length;
  const look = lookFor(world, request.plain, request.style);
  if (format === 'text') waiting = listText(counts, shown, more, look);
  if (format === 'markdown') waiting = listMarkdown(counts, shown, more);
  if (waiting !== '') await world.out(waiting);
  return counts.unbalanced + counts.unreadable > 0 ? 1 : 0;
};
