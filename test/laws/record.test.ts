import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type Integral, type IntegralRules, integrateRecord } from '../../src/amounts/record/integral.ts';
import { openRecord } from '../../src/amounts/record/reader.ts';
import { readRecordStream } from '../../src/amounts/record/stream.ts';

/** Readings in whole milliseconds and whole milliamperes, in order of time: they can be integrated exactly. */
const readings = fc
  .array(fc.tuple(fc.integer({ min: 0, max: 5000 }), fc.integer({ min: -2000, max: 2000 })), {
    minLength: 2,
    maxLength: 300,
  })
  .map((steps) => {
    let time = 0n;
    return steps.map(([step, current]) => [(time += BigInt(step)), BigInt(current)] as const);
  });

type Readings = readonly (readonly [bigint, bigint])[];

const RULES: IntegralRules = { rule: 'trapezoid', gapLimit: Infinity, gapSteps: 10, gapCharge: 'count', zero: 0 };

const integralOf = (rows: Readings, rules: IntegralRules): Integral => {
  const integral = integrateRecord(
    rows.map(([time, current]) => [Number(time) / 1000, Number(current) / 1000] as const),
    rules,
  );
  if (integral === undefined) throw new Error('two readings or more');
  return integral;
};

/** Twice the net charge in microcoulombs, over whole numbers. */
const exactTwice = (rows: Readings, rule: IntegralRules['rule']): bigint =>
  rows.slice(1).reduce((sum, [time, current], at) => {
    const [before, held] = rows[at] ?? [time, current];
    return sum + (time - before) * (rule === 'hold' ? 2n * held : held + current);
  }, 0n);

/** What moves at the most, for a tolerance in C. */
const moved = (rows: Readings): number => {
  const last = rows.at(-1)?.[0] ?? 0n;
  return (Number(last) / 1000) * 2 + 1e-9;
};

const textOf = (rows: Readings): string =>
  `t (ms);I (mA)\r\n${rows.map(([time, current]) => `${String(time)};${String(current)}`).join('\r\n')}\r\n`;

describe('the charge of a record', () => {
  test.each(['trapezoid', 'hold'] as const)('agrees with a sum over whole numbers: %s', (rule) => {
    fc.assert(
      fc.property(readings, (rows) => {
        const { charge } = integralOf(rows, { ...RULES, rule });
        expect(Math.abs(charge - Number(exactTwice(rows, rule)) / 2e6)).toBeLessThan(1e-13 * moved(rows));
      }),
      { numRuns: 150 },
    );
  });

  test('is forward and reverse together, and neither has the other sign', () => {
    fc.assert(
      fc.property(readings, (rows) => {
        const { charge, forward, reverse } = integralOf(rows, RULES);
        expect(forward).toBeGreaterThanOrEqual(0);
        expect(reverse).toBeLessThanOrEqual(0);
        expect(Math.abs(forward + reverse - charge)).toBeLessThan(1e-14 * moved(rows));
      }),
      { numRuns: 150 },
    );
  });

  test('turns its sign with the current', () => {
    fc.assert(
      fc.property(readings, (rows) => {
        const there = integralOf(rows, RULES);
        const back = integralOf(
          rows.map(([time, current]) => [time, -current] as const),
          RULES,
        );
        expect(back.charge + there.charge).toBe(0);
        expect(back.forward + there.reverse).toBe(0);
        expect(back.reversals).toEqual(there.reversals);
      }),
      { numRuns: 100 },
    );
  });

  test('adds up over two parts that share a reading', () => {
    fc.assert(
      fc.property(readings, fc.nat(), (rows, cut) => {
        const at = 1 + (cut % (rows.length - 1));
        fc.pre(at < rows.length - 1);
        const whole = integralOf(rows, RULES);
        const parts = [rows.slice(0, at + 1), rows.slice(at)].map((part) => integralOf(part, RULES).charge);
        expect(Math.abs(whole.charge - (parts[0] ?? 0) - (parts[1] ?? 0))).toBeLessThan(1e-12 * moved(rows));
      }),
      { numRuns: 100 },
    );
  });

  test('does not lose small steps beside large ones', () => {
    // One C, then a hundred thousand readings of 1e-16 C each: added one by one to 1 they would all be rounded away.
    const rows = function* (): Generator<readonly [number, number]> {
      yield [0, 1];
      yield [1, 1];
      for (let at = 0; at <= 100_000; at += 1) yield [1 + at, 1e-16];
    };
    const charge = integrateRecord(rows(), RULES)?.charge ?? 0;
    expect(charge).toBeCloseTo(1 + 1e-11, 14);
    expect(charge).toBeGreaterThan(1);
  });
});

describe('the text of a record', () => {
  /** Good rows, bad rows, all ends of lines, a byte-order mark, and perhaps no end at the end. */
  const texts = fc
    .array(
      fc.tuple(
        fc.constantFrom('1,0', '2;3,5', '"4";"5,5"', '# note', '', '9;x', '1;1', '5;', 'µ;é', '12;-3', '20;0', '21;0'),
        fc.constantFrom('\n', '\r', '\r\n', '\n\n', '\r\r\n'),
      ),
      { maxLength: 40 },
    )
    .map((lines) => `\ufeffZeit (s);Strom (µA)\r\n0;1\r\n30;2\n${lines.map(([line, end]) => line + end).join('')}40;1`);

  test('gives the same wherever it is cut', () => {
    fc.assert(
      fc.property(texts, fc.array(fc.nat(), { maxLength: 8 }), (text, cuts) => {
        const whole = openRecord();
        const pieces = openRecord();
        if (!whole.ok || !pieces.ok) throw new Error('no options');
        whole.value.take(text);
        const places = [...new Set(cuts.map((cut) => cut % (text.length + 1)))].sort((a, b) => a - b);
        [0, ...places].forEach((from, at) => {
          pieces.value.take(text.slice(from, places[at] ?? text.length));
        });
        expect(pieces.value.end()).toEqual(whole.value.end());
      }),
      { numRuns: 200 },
    );
  });

  test('gives the same byte by byte', async () => {
    const each = async function* (bytes: Uint8Array, size: number): AsyncGenerator<Uint8Array> {
      for (let at = 0; at < bytes.length; at += size) {
        await Promise.resolve();
        yield bytes.subarray(at, at + size);
      }
    };
    await fc.assert(
      fc.asyncProperty(texts, fc.integer({ min: 1, max: 7 }), async (text, size) => {
        const bytes = new TextEncoder().encode(text);
        expect(await readRecordStream(each(bytes, size))).toEqual(await readRecordStream(each(bytes, bytes.length)));
      }),
      { numRuns: 60 },
    );
  });

  test('every line is used or counted', () => {
    fc.assert(
      fc.property(texts, (text) => {
        const reader = openRecord();
        if (!reader.ok) throw new Error('no options');
        reader.value.take(text);
        const record = reader.value.end();
        if (!record.ok) throw new Error(record.fault.message);
        const { total, used, bad, blank, comments, before } = record.value.lines;
        expect(total).toBe(text.split(/\r\n|\r|\n/).length);
        expect(used + bad + blank + comments + before).toBe(total);
        expect(record.value.bad.reduce((sum, { count }) => sum + count, 0)).toBe(bad);
      }),
      { numRuns: 100 },
    );
  });

  test('whatever it holds, it is a fault or every line is accounted for', () => {
    const shards = [
      '0,1',
      '1;2',
      '\t',
      '"',
      "'",
      '10:00',
      '2026-01-01',
      '-',
      '1e999',
      '\ufffd',
      'time_s',
      'I (A)',
      '# ',
      ';;',
      ',',
    ];
    const anything = fc
      .array(fc.oneof(fc.constantFrom(...shards, '\n', '\r', '\r\n', ' '), fc.string({ maxLength: 6 })), {
        maxLength: 60,
      })
      .map((parts) => parts.join(''));
    fc.assert(
      fc.property(anything, fc.boolean(), (text, headed) => {
        const reader = openRecord({ timeUnit: 's', currentUnit: 'A' });
        if (!reader.ok) throw new Error('no options');
        reader.value.take(headed ? `time_s,current_A\n0,1\n1,1\n${text}` : text);
        const record = reader.value.end();
        if (!record.ok) {
          expect(headed).toBe(false);
          expect(record.fault.message).not.toBe('');
          return;
        }
        const { total, used, bad, blank, comments, before } = record.value.lines;
        expect(used + bad + blank + comments + before).toBe(total);
        expect(Number.isFinite(record.value.charge.value)).toBe(true);
      }),
      { numRuns: 400 },
    );
  });

  test('means what its readings mean', () => {
    fc.assert(
      fc.property(readings, (rows) => {
        const reader = openRecord({ gap: '1000000 h' });
        if (!reader.ok) throw new Error('no options');
        reader.value.take(textOf(rows));
        const record = reader.value.end();
        if (!record.ok) throw new Error(record.fault.message);
        expect(record.value.lines.used).toBe(rows.length);
        const exact = Number(exactTwice(rows, 'trapezoid')) / 2e6;
        expect(Math.abs(record.value.charge.value - exact)).toBeLessThan(1e-12 * moved(rows));
      }),
      { numRuns: 100 },
    );
  });
});
