import type { RecordSummary } from '../amounts/record/summary.ts';
import type { BadRowReason, CountedRows } from '../amounts/record/tally.ts';
import { hanging, labelled, page } from './block.ts';
import { type Cell, columns, indented } from './columns.ts';
import { figureOf, quantityText } from './figure.ts';
import type { Look } from './look.ts';

const REASONS: Readonly<Record<BadRowReason, string>> = {
  'too-few-columns': 'too few columns',
  'too-many-columns': 'too many columns',
  'missing-value': 'a value is missing',
  'not-a-number': 'the current is no number',
  'decimal-sign': 'another decimal sign than the rows before',
  'bad-time': 'the time cannot be read',
  'other-time-format': 'the time is written in another way',
  'backward-time': 'earlier than the row before',
  'open-quote': 'a quotation mark is never closed',
  'not-text': 'a character cannot be read',
  'too-long': 'the line is too long',
  'header-again': 'the header again',
  'cut-short': 'the last line is cut short',
};

const figure = (value: number): string => figureOf({ value, unit: '' });

/** "2 h 30 min 5 s", with no more of it than a person needs. */
const durationText = (seconds: number): string => {
  if (seconds < 120) return `${figure(seconds)} s`;
  const whole = Math.round(seconds);
  const parts = [
    [Math.floor(whole / 3600), 'h'],
    [Math.floor((whole % 3600) / 60), 'min'],
    [whole % 60, 's'],
  ] as const;
  return parts
    .filter(([count]) => count > 0)
    .map(([count, unit]) => `${figure(count)} ${unit}`)
    .join(' ');
};

const times = (count: number): string => (count === 1 ? 'once' : `${figure(count)} times`);
const many = (count: number, one: string, more: string): string => `${figure(count)} ${count === 1 ? one : more}`;

/** "line 7" or "lines 7, 9, 12 and 40 more". */
const places = (lines: readonly number[], count: number): string => {
  const shown = lines.slice(0, 5).map(String);
  const rest = count - shown.length;
  return `${count === 1 ? 'line' : 'lines'} ${shown.join(', ')}${rest > 0 ? ` and ${figure(rest)} more` : ''}`;
};

const chargeRow = (label: string, coulombs: number, look: Look): readonly (Cell | string)[] => [
  { text: label.padEnd(10), paint: look.paint.faint },
  figure(coulombs),
  'C',
  figure(coulombs / 3600),
  'A h',
];

const chargeBlock = ({ charge, forward, reverse }: RecordSummary, look: Look): readonly string[] => {
  const both =
    reverse.value === 0 || forward.value === 0 ? [] : [['forward', forward] as const, ['reverse', reverse] as const];
  const rows = [[both.length > 0 ? 'net charge' : 'charge', charge] as const, ...both].map(([label, { value }]) =>
    chargeRow(label, value, look),
  );
  const [first = '', ...others] = columns(rows, ['left', 'right', 'left', 'right', 'left']);
  return [look.paint.strong(first), ...others];
};

const pausedText = ({ paused }: RecordSummary): string => `${times(paused.count)}, ${durationText(paused.time.value)}`;

const currentText = ({ current: { mean, least, greatest } }: RecordSummary): string =>
  `mean ${quantityText(mean)}, from ${figureOf(least)} to ${quantityText(greatest)}`;

const reversalText = ({ charge, forward, reverse, reversals }: RecordSummary): string => {
  const moved = forward.value - reverse.value;
  const net = moved === 0 ? '' : `; the net is ${figure((Math.abs(charge.value) / moved) * 100)} % of the charge moved`;
  return `${times(reversals.count)}, ${places(reversals.lines, reversals.count)}${net}`;
};

const linesText = ({ lines: { total, used, bad, before, blank, comments } }: RecordSummary): string =>
  [
    `${figure(total)} in all`,
    `${figure(used)} used`,
    `${figure(bad)} left out`,
    ...(before > 0 ? [many(before, 'header line', 'header lines')] : []),
    ...(blank > 0 ? [`${figure(blank)} blank`] : []),
    ...(comments > 0 ? [many(comments, 'comment', 'comments')] : []),
  ].join(', ');

const columnText = ({ columns: { time, current }, decimal }: RecordSummary): string =>
  `${[time, current].map(({ name, unit }) => (unit === '' || name.includes(unit) ? name : `${name} in ${unit}`)).join(', ')}${decimal === 'comma' ? '; decimal comma' : ''}`;

const factsBlock = (record: RecordSummary, look: Look): readonly string[] =>
  labelled(
    [
      ['time', durationText(record.duration.value)],
      ['current', currentText(record)],
      ...(record.paused.count > 0 ? [['paused', pausedText(record)] as const] : []),
      ...(record.reversals.count > 0 ? [['reversed', reversalText(record)] as const] : []),
      ['integral', record.rule === 'hold' ? 'each reading held until the next' : 'straight lines between readings'],
      ['columns', columnText(record)],
      ['lines', linesText(record)],
    ],
    look,
  );

const badBlock = ({ bad }: RecordSummary, look: Look): readonly string[] => {
  if (bad.length === 0) return [];
  const rows = bad.map(({ reason, count, lines, example }: CountedRows<BadRowReason>) => [
    figure(count),
    REASONS[reason],
    places(lines, count),
    { text: example.replaceAll(/[\p{Cc}]/gu, ' '), paint: look.paint.faint },
  ]);
  return [look.paint.warn('left out'), ...indented(columns(rows, ['right', 'left', 'left', 'left']))];
};

const gapsBlock = ({ gaps }: RecordSummary, look: Look): readonly string[] => {
  if (gaps.count === 0) return [];
  const head = `${many(gaps.count, 'gap', 'gaps')} longer than ${durationText(gaps.limit?.value ?? 0)}, ${durationText(gaps.time.value)} together`;
  const rows = gaps.list
    .slice(0, 5)
    .map(({ line, from, duration }) => [
      `before line ${String(line)}`,
      `${durationText(duration.value)}, from ${durationText(from.value)} on`,
    ]);
  const rest = gaps.count - rows.length;
  return [
    look.paint.warn(head),
    ...indented([...columns(rows, ['left', 'left']), ...(rest > 0 ? [`and ${figure(rest)} more`] : [])]),
    `  ${gaps.counted ? 'charge is counted across them as across any step' : 'no charge is counted across them'}`,
  ];
};

const notesBlock = ({ repeated, midnights, unended, lines }: RecordSummary, look: Look): readonly string[] =>
  [
    ...repeated.map(
      (rows) =>
        `${many(rows.count, 'row stands', 'rows stand')} at the time of the row before (${places(rows.lines, rows.count)}) and ${rows.count === 1 ? 'was' : 'were'} used as a step.`,
    ),
    ...(midnights > 0 ? [`Clock times ran past midnight ${times(midnights)}.`] : []),
    ...(unended ? [`The last line, ${figure(lines.total)}, has no line end: it may have been cut short.`] : []),
  ].flatMap((text) => hanging('note', text, look.paint.warn));

/** A current record as a page for a person: charge both ways, times, and what became of every line. */
export const renderRecord = (record: RecordSummary, look: Look): string =>
  page([
    chargeBlock(record, look),
    factsBlock(record, look),
    badBlock(record, look),
    gapsBlock(record, look),
    notesBlock(record, look),
  ]);
