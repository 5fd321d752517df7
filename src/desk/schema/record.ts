import * as z from 'zod';
import type { RecordSummary } from '../../amounts/record/summary.ts';
import type { BadRowReason } from '../../amounts/record/tally.ts';
import { faultSchema } from './fault.ts';
import { quantitySchema } from './shape.ts';

const count = z.number().int().nonnegative();
const line = z.number().int().positive().describe('A line of the file, counted from 1.');
const firstLines = z.array(line).readonly().describe('The first of these lines; the count has all.');
const column = z.strictObject({
  name: z.string(),
  unit: z.string().describe('Empty for clock times and dates.'),
});

const rows = <Reason extends string>(reasons: Readonly<Record<Reason, Reason>>) =>
  z
    .array(
      z.strictObject({
        reason: z.enum(reasons),
        count,
        lines: firstLines,
        example: z.string().describe('What stood in the first of them.'),
      }),
    )
    .readonly();

/** Every reason once: the type asks for each. */
const BAD_ROWS: { readonly [Reason in BadRowReason]: Reason } = {
  'too-few-columns': 'too-few-columns',
  'too-many-columns': 'too-many-columns',
  'missing-value': 'missing-value',
  'not-a-number': 'not-a-number',
  'decimal-sign': 'decimal-sign',
  'bad-time': 'bad-time',
  'other-time-format': 'other-time-format',
  'backward-time': 'backward-time',
  'open-quote': 'open-quote',
  'not-text': 'not-text',
  'too-long': 'too-long',
  'header-again': 'header-again',
  'cut-short': 'cut-short',
};

const gap = z.strictObject({ line, from: quantitySchema, duration: quantitySchema });
const gaps = z
  .strictObject({
    limit: z.exactOptional(quantitySchema).describe('A longer step is a gap; absent where nothing says so.'),
    usualStep: z.exactOptional(quantitySchema),
    counted: z.boolean().describe('Whether charge is counted across gaps.'),
    count,
    time: quantitySchema,
    list: z.array(gap).readonly().describe('The first gaps, each at the line of the reading after it.'),
  })
  .describe('Steps in time that are much longer than the others.');

const point = z
  .strictObject({ from: z.number(), to: z.number(), least: z.number(), greatest: z.number(), charge: z.number() })
  .describe('A stretch of the record for a picture: times in s, currents in A, the net charge at its end in C.');

const lines = z
  .strictObject({ total: count, used: count, bad: count, blank: count, comments: count, before: count })
  .describe('What became of the lines; `before`: the header and what stands above it. Together they are all.');

/** What a current record comes to. */
const summarySchema: z.ZodType<RecordSummary> = z
  .strictObject({
    charge: quantitySchema.describe('The net charge: forward and reverse together.'),
    forward: quantitySchema,
    reverse: quantitySchema.describe('Zero or negative.'),
    duration: quantitySchema,
    counted: quantitySchema.describe('The time over which charge was counted.'),
    current: z.strictObject({ mean: quantitySchema, least: quantitySchema, greatest: quantitySchema }),
    paused: z.strictObject({ count, time: quantitySchema, zero: quantitySchema }),
    reversals: z.strictObject({ count, lines: firstLines }),
    gaps,
    rule: z.enum(['trapezoid', 'hold']),
    lines,
    bad: rows(BAD_ROWS).describe('Rows that were not used, by reason.'),
    repeated: rows({ 'repeated-time': 'repeated-time' }).describe(
      'Readings at the time of the one before: used, as steps.',
    ),
    columns: z.strictObject({ time: column, current: column }),
    delimiter: z.enum(['\t', ';', ',', ' ']),
    decimal: z.enum(['point', 'comma']).nullable().describe('null where no number showed it.'),
    midnights: count.describe('Midnights that clock times ran past.'),
    unended: z.boolean().describe('True where the last line has no line end: it may have been cut short.'),
    series: z.array(point).readonly(),
  })
  .describe('What a current record comes to, and what became of each of its lines.');

/** What `couplet record --json` prints. */
export const recordReplySchema = z.discriminatedUnion('ok', [
  z.strictObject({ contract: z.literal(1), ok: z.literal(true), record: summarySchema }),
  z.strictObject({ contract: z.literal(1), ok: z.literal(false), fault: faultSchema }),
]);
