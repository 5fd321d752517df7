import { type Result, all, failure, inField, success } from '../../report/result.ts';
import { wholeSpan } from '../../report/span.ts';
import { type Measured, type Source, weightedSum } from '../measured.ts';
import { QUANTITIES } from '../quantities.ts';
import { type ReadQuantity, readQuantity } from '../quantity.ts';

/** A current record as an ask writes it: pairs of time and current. */
export type RecordText = readonly (readonly [time: string, current: string])[];

/** The net charge of a record in C and the time from its first to its last reading in s. */
export interface RecordedCharge {
  readonly charge: Measured;
  readonly time: Measured;
}

interface Row {
  readonly time: Source;
  readonly current: Source;
}

const source = (name: string, { value, uncertainty }: ReadQuantity): Source => ({
  name,
  value,
  uncertainty,
  lastDigit: 0,
});

const readRow = ([time, current]: readonly [string, string], index: number): Result<Row> => {
  const field = `given.record[${String(index)}]`;
  const reads = all([
    inField(readQuantity(time, QUANTITIES.time), `${field}[0]`),
    inField(readQuantity(current, QUANTITIES.current), `${field}[1]`),
  ]);
  if (!reads.ok) return reads;
  const [at, flow] = reads.value;
  if (at === undefined || flow === undefined) throw new Error('two texts gave other than two quantities');
  return success({ time: source(`${field}[0]`, at), current: source(`${field}[1]`, flow) }, reads.notes);
};

const tooShort: Result<never> = failure({
  code: 'not-enough-given',
  message: 'a record needs two readings or more',
  field: 'given.record',
  missing: ['record'],
});

const outOfOrder = (index: number, text: string): Result<never> =>
  failure({
    code: 'bad-ask',
    message: 'this reading is earlier than the one before it',
    field: `given.record[${String(index)}][0]`,
    span: wholeSpan(text),
    hint: 'Give the readings in order of time.',
  });

/**
 * Trapezoid:  Q = sum of (t2 - t1) (I1 + I2) / 2, with dQ/dI2 = (t2 - t1) / 2 and dQ/dt2 = (I1 + I2) / 2. Reversed
 * current counts negative, so that the charge is net.
 */
const integrate = (rows: readonly Row[]): Measured => {
  const parts: (readonly [number, Measured])[] = [];
  rows.slice(1).forEach((row, index) => {
    const before = rows[index];
    if (before === undefined) return;
    const step = row.time.value - before.time.value;
    const sum = row.current.value + before.current.value;
    const slopes = new Map([
      [row.current, step / 2],
      [before.current, step / 2],
      [row.time, sum / 2],
      [before.time, -sum / 2],
    ]);
    parts.push([1, { value: (step * sum) / 2, slopes }]);
  });
  return weightedSum(parts);
};

/**
 * Charge and duration of a record, Q = ∫ I dt by the trapezoid rule, net of reversals. Two readings at one time are a
 * step. Faults: those of reading, in `given.record[i][j]`; `bad-ask` for times out of order; `not-enough-given` for
 * fewer than two readings.
 */
export const readRecord = (record: RecordText): Result<RecordedCharge> => {
  const rows = all(record.map(readRow));
  if (!rows.ok) return rows;
  const first = rows.value[0];
  const last = rows.value.at(-1);
  if (first === undefined || last === undefined || first === last) return tooShort;
  const late = rows.value.findIndex((row, index) => row.time.value < (rows.value[index - 1]?.time.value ?? -Infinity));
  if (late >= 0) return outOfOrder(late, record[late]?.[0] ?? '');
  const time = {
    value: last.time.value - first.time.value,
    slopes: new Map([
      [last.time, 1],
      [first.time, -1],
    ]),
  };
  return success({ charge: integrate(rows.value), time }, rows.notes);
};
