import process from 'node:process';
import { bench, describe } from 'vitest';
import { answerBatch } from '../../src/batch/batch.ts';
import { answer } from '../../src/desk/answer.ts';

/** One ask of each kind that a load is usually made of. */
const ASKS: readonly Readonly<Record<string, unknown>>[] = [
  { ask: 'species', text: 'CuSO4*5H2O' },
  { ask: 'half', skeleton: 'MnO4^- -> Mn^2+', medium: 'acid' },
  { ask: 'half', skeleton: 'Cr2O7^2- -> Cr^3+', medium: 'acid' },
  { ask: 'redox', skeleton: 'MnO4^- + Fe^2+ -> Mn^2+ + Fe^3+', medium: 'acid' },
  { ask: 'cell', anode: ['H2O -> O2'], cathode: ['Cu^2+ -> Cu'], medium: 'acid' },
  { ask: 'audit', equation: 'MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O' },
  { ask: 'audit', equation: 'MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 3 H2O' },
  { ask: 'amounts', half: 'Cu^2+ + 2 e^- -> Cu', species: 'Cu', given: { current: '2 A', time: '1 h' } },
];

const LINES = 2000;

const text = Array.from(
  { length: LINES },
  (_, at) => `${JSON.stringify({ id: String(at), ...ASKS[at % ASKS.length] })}\n`,
).join('');
const load = new TextEncoder().encode(text);

/** The load in pieces as a pipe delivers them. */
const pipe = async function* (): AsyncGenerator<Uint8Array> {
  await Promise.resolve();
  for (let at = 0; at < load.length; at += 65_536) yield load.subarray(at, at + 65_536);
};

/** Every line read, checked and written by JSON alone: what no filter can do without, to measure the batch against. */
const passThrough = (): number =>
  text.split('\n').reduce((length, line) => length + (line === '' ? 0 : JSON.stringify(JSON.parse(line)).length), 0);

const rateOf = async (run: () => unknown): Promise<number> => {
  await run();
  const start = performance.now();
  await run();
  return (1000 * LINES) / (performance.now() - start);
};

const batch = (): Promise<unknown> => answerBatch({ input: pipe(), write: () => Promise.resolve() });

describe('batch', () => {
  bench(
    `${String(LINES)} lines of every kind`,
    async () => {
      const [answered, passed] = [await rateOf(batch), await rateOf(passThrough)];
      process.stdout.write(
        `${String(Math.round(answered))} lines per second; JSON alone takes 1/${String(Math.round(passed / answered))} of the time\n`,
      );
    },
    { time: 0, iterations: 1, warmupIterations: 0, warmupTime: 0 },
  );
});

describe('one ask', () => {
  for (const ask of ASKS) bench(JSON.stringify(ask), () => void answer(ask), { time: 300 });
});
