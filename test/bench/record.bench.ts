import process from 'node:process';
import { bench, describe } from 'vitest';
import { readRecordStream } from '../../src/amounts/record/stream.ts';
import { madeUpRecord } from './record-rows.ts';

const ROWS = 10_000_000;

/** One run of ten million rows; the making of the rows is timed alone and taken off. */
describe('a record of ten million rows', () => {
  bench(
    'streamed and integrated',
    async () => {
      const start = performance.now();
      let bytes = 0;
      for await (const piece of madeUpRecord(ROWS)) bytes += piece.length;
      const making = performance.now() - start;
      const resident = process.memoryUsage().rss;
      let peak = resident;
      const reading = performance.now();
      const record = await readRecordStream(madeUpRecord(ROWS), {}, () => {
        peak = Math.max(peak, process.memoryUsage.rss());
      });
      const seconds = (performance.now() - reading - making) / 1000;
      if (!record.ok || record.value.lines.used !== ROWS) throw new Error('the record was not read');
      process.stdout.write(
        `${String(Math.round(bytes / 1e6))} MB, ${String(Math.round(ROWS / seconds / 1000))} thousand rows per second; peak memory ` +
          `${String(Math.round(peak / 1e6))} MB, ${String(Math.round((peak - resident) / 1e6))} MB more than before\n`,
      );
    },
    { iterations: 1, time: 0, warmupIterations: 0, warmupTime: 0 },
  );
});
