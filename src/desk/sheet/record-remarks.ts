import type { RecordSummary } from '../../amounts/record/summary.ts';
import type { BadRowReason } from '../../amounts/record/tally.ts';

/** Why rows were left out, as their counts are followed by it. */
const REASONS: Readonly<Record<BadRowReason, string>> = {
  'too-few-columns': 'with too few columns',
  'too-many-columns': 'with too many columns',
  'missing-value': 'with a missing value',
  'not-a-number': 'with something that is no number',
  'decimal-sign': 'with another decimal sign',
  'bad-time': 'with a time that cannot be read',
  'other-time-format': 'with a time in another form',
  'backward-time': 'with a time before the one above',
  'open-quote': 'with a quotation mark that is not closed',
  'not-text': 'with characters that cannot be read',
  'too-long': 'that are too long',
  'header-again': 'that repeat the header',
  'cut-short': 'cut short at the end',
};

const MOST_LINES = 5;

const rows = (count: number): string => (count === 1 ? '1 row' : `${String(count)} rows`);

const inLines = (lines: readonly number[], count: number): string => {
  const named = lines.slice(0, MOST_LINES).map(String);
  const more = count > named.length ? ' and more' : '';
  return `${count === 1 ? 'line' : 'lines'} ${named.join(', ')}${more}`;
};

const minutes = (seconds: number): string =>
  seconds < 120
    ? `${String(Number(seconds.toPrecision(3)))} s`
    : `${String(Number((seconds / 60).toPrecision(3)))} min`;

const times = (count: number, one: string, many: string): string =>
  count === 1 ? `1 ${one}` : `${String(count)} ${many}`;

/** What the reader of a record must know: what was left out, by line, gaps, pauses and reversals; [] for a plain one. */
export const recordRemarks = (summary: RecordSummary): readonly string[] => {
  const { bad, repeated, gaps, paused, reversals, unended } = summary;
  const across = gaps.counted ? 'charge counted across' : 'charge not counted across';
  return [
    ...bad.map(({ reason, count, lines }) => `${rows(count)} left out ${REASONS[reason]}: ${inLines(lines, count)}`),
    ...repeated.map(
      ({ count, lines }) => `${rows(count)} at the time of the one above, taken as a step: ${inLines(lines, count)}`,
    ),
    ...(gaps.count === 0
      ? []
      : [
          `${times(gaps.count, 'gap', 'gaps')}, ${minutes(gaps.time.value)} in all, ${across}: before ${inLines(
            gaps.list.map(({ line }) => line),
            gaps.count,
          )}`,
        ]),
    ...(paused.count === 0 ? [] : [`${times(paused.count, 'pause', 'pauses')}, ${minutes(paused.time.value)} in all`]),
    ...(reversals.count === 0
      ? []
      : [`current reversed ${times(reversals.count, 'time', 'times')}: ${inLines(reversals.lines, reversals.count)}`]),
    ...(unended ? ['the last line has no line end: it may have been cut short'] : []),
  ];
};
