import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { parse } from 'yaml';
import type { RecordOptions } from '../../src/amounts/record/options.ts';
import { openRecord } from '../../src/amounts/record/reader.ts';
import { MOST_STRETCHES } from '../../src/amounts/record/series.ts';
import { readRecordStream } from '../../src/amounts/record/stream.ts';
import type { RecordSummary } from '../../src/amounts/record/summary.ts';
import { LINES_KEPT } from '../../src/amounts/record/tally.ts';
import type { Result } from '../../src/report/result.ts';

interface Read {
  readonly name: string;
  readonly text: string;
  readonly options?: RecordOptions;
  readonly charge: number;
  readonly forward?: number;
  readonly reverse?: number;
  readonly counted?: number;
  readonly lines?: RecordSummary['lines'];
  readonly bad?: Readonly<Record<string, readonly number[]>>;
  readonly repeated?: readonly number[];
  readonly paused?: { readonly count: number; readonly time: number };
  readonly reversals?: readonly number[];
  readonly gaps?: {
    readonly limit: number;
    readonly count: number;
    readonly time: number;
    readonly lines: readonly number[];
  };
  readonly decimal?: string;
  readonly midnights?: number;
  readonly unended?: boolean;
}

interface Refused {
  readonly name: string;
  readonly text: string;
  readonly options?: RecordOptions;
  readonly code: string;
  readonly message: string;
}

const CASES = parse(readFileSync(new URL('../../fixtures/amounts/records.yaml', import.meta.url), 'utf8')) as {
  readonly read: readonly Read[];
  readonly refused: readonly Refused[];
};

const resultOf = (text: string, options: RecordOptions = {}): Result<RecordSummary> => {
  const opened = openRecord(options);
  if (!opened.ok) return opened;
  opened.value.take(text);
  return opened.value.end();
};

const recordOf = (text: string, options: RecordOptions = {}): RecordSummary => {
  const result = resultOf(text, options);
  if (!result.ok) throw new Error(result.fault.message);
  return result.value;
};

const gapsOf = ({ gaps: { limit, count, time, list } }: RecordSummary) => ({
  limit: limit?.value,
  count,
  time: time.value,
  lines: list.map(({ line }) => line),
});

describe.each(CASES.read)('$name', (written) => {
  const record = recordOf(written.text, written.options);
  test('has the charge that a hand computes', () => {
    expect(record.charge.value).toBeCloseTo(written.charge, 9);
    expect(record.forward.value).toBeCloseTo(written.forward ?? written.charge, 9);
    expect(record.reverse.value).toBeCloseTo(written.reverse ?? 0, 9);
    if (written.counted !== undefined) expect(record.counted.value).toBeCloseTo(written.counted, 9);
  });
  test('accounts for each line', () => {
    const { total, used, bad, blank, comments, before } = record.lines;
    expect(used + bad + blank + comments + before).toBe(total);
    if (written.lines !== undefined) expect(record.lines).toEqual(written.lines);
    expect(Object.fromEntries(record.bad.map(({ reason, lines }) => [reason, lines]))).toEqual(written.bad ?? {});
    expect(record.repeated.flatMap(({ lines }) => lines)).toEqual(written.repeated ?? []);
  });
  test('tells pauses, reversals and gaps', () => {
    const { count, time } = record.paused;
    expect({ count, time: time.value }).toEqual(written.paused ?? { count: 0, time: 0 });
    expect(record.reversals.lines).toEqual(written.reversals ?? []);
    if (written.gaps === undefined) expect(record.gaps.count).toBe(0);
    else expect(gapsOf(record)).toEqual(written.gaps);
  });
  test('says how it was read', () => {
    if (written.decimal !== undefined) expect(record.decimal).toBe(written.decimal);
    expect(record.midnights).toBe(written.midnights ?? 0);
    if (written.unended !== undefined) expect(record.unended).toBe(written.unended);
  });
});

describe.each(CASES.refused)('$name', ({ text, options, code, message }) => {
  test('is a fault that says what is wrong', () => {
    const result = resultOf(text, options);
    expect(result).toMatchObject({ ok: false, fault: { code } });
    if (!result.ok) expect(result.fault.message).toContain(message);
  });
});

describe('a long record', () => {
  const header = 'time_s,current_A\n';
  const rows = (count: number, row: (at: number) => string): string =>
    header + Array.from({ length: count }, (_, at) => `${row(at)}\n`).join('');

  test('keeps a bounded number of line numbers and exact counts', () => {
    const record = recordOf(rows(1000, (at) => (at % 3 === 0 ? `${String(at)},x` : `${String(at)},1`)));
    const [bad] = record.bad;
    expect(bad?.count).toBe(334);
    expect(bad?.lines).toHaveLength(LINES_KEPT);
    expect(bad?.lines.slice(0, 3)).toEqual([2, 5, 8]);
    expect(record.lines.used).toBe(666);
  });

  test('is thinned for a picture without losing a peak', () => {
    const record = recordOf(rows(50_000, (at) => `${String(at)},${at === 31_234 ? '900' : '1'}`));
    expect(record.series.length).toBeLessThanOrEqual(MOST_STRETCHES);
    expect(record.series.length).toBeGreaterThan(MOST_STRETCHES / 4);
    expect(Math.max(...record.series.map(({ greatest }) => greatest))).toBe(900);
    expect(record.series.at(-1)?.to).toBe(49_999);
    // 49 999 s at 1 A, and a triangle of 2 s and 899 A.
    expect(record.charge.value).toBeCloseTo(49_999 + 899, 6);
    expect(record.series.at(-1)?.charge).toBeCloseTo(record.charge.value, 6);
  });

  test('passes over a line that never ends', () => {
    const record = recordOf(`${header}0,1\n1,${'9'.repeat(200_000)}\n2,1\n`);
    expect(record.bad.map(({ reason, lines }) => [reason, lines])).toEqual([['too-long', [3]]]);
    expect(record.charge.value).toBe(2);
  });

  test('takes the usual step from its first steps and finds a gap among them', () => {
    const record = recordOf(rows(300, (at) => `${String(at < 5 ? at : at + 50)},1`));
    expect(record.gaps.usualStep?.value).toBe(1);
    expect(gapsOf(record)).toEqual({ limit: 10, count: 1, time: 51, lines: [7] });
  });
});

describe('the bytes of a record', () => {
  const stream = async function* (bytes: Uint8Array, size: number): AsyncGenerator<Uint8Array> {
    for (let at = 0; at < bytes.length; at += size) {
      await Promise.resolve();
      yield bytes.subarray(at, at + size);
    }
  };
  const text = 'Zeit (s);Strom [µA]\r\n0;1000000\r\n10;1000000\r\n';

  test.each([1, 2, 3, 1000])('UTF-8 in pieces of %i', async (size) => {
    const read = await readRecordStream(stream(new TextEncoder().encode(text), size));
    expect(read).toMatchObject({ ok: true, value: { charge: { value: 10 } } });
  });

  test.each([1, 2, 3, 1000])('UTF-16 behind its mark in pieces of %i', async (size) => {
    const read = await readRecordStream(stream(Buffer.from(`\ufeff${text}`, 'utf16le'), size));
    expect(read).toMatchObject({ ok: true, value: { charge: { value: 10 } } });
  });

  test('a character that is no text is named with its line', async () => {
    const bytes = Buffer.concat([
      Buffer.from('time_s,current_A\n0,1\n1,'),
      Buffer.from([0xff, 0x0a]),
      Buffer.from('2,1\n'),
    ]);
    const read = await readRecordStream(stream(bytes, 5));
    expect(read).toMatchObject({
      ok: true,
      value: { bad: [{ reason: 'not-text', lines: [3] }], charge: { value: 2 } },
    });
  });

  test('nothing more is read after a fault', async () => {
    let asked = 0;
    const endless = async function* (): AsyncGenerator<Uint8Array> {
      for (;;) {
        asked += 1;
        await Promise.resolve();
        yield new TextEncoder().encode('time_s,voltage_V\n0,1\n');
      }
    };
    expect(await readRecordStream(endless())).toMatchObject({ ok: false, fault: { code: 'bad-ask' } });
    expect(asked).toBe(1);
  });
});
