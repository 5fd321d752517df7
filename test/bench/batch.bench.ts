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

const load = new TextEncoder().encode(
  Array.from({ length: LINES }, (_, at) => `${JSON.stringify({ id: String(at), ...ASKS[at % ASKS.length] })}\n`).join(
    '',
  ),
);

/** The load in pieces as a pipe delivers them. */
const pipe = async function* (): AsyncGenerator<Uint8Array> {
  await Promise.resolve();
  for (let at = 0; at < load.length; at += 65_536) yield load.subarray(at, at + 65_536);
};

describe('batch', () => {
  bench(
    `${String(LINES)} lines of every kind: multiply the rate by ${String(LINES)} for lines per second`,
    async () => {
      await answerBatch({ input: pipe(), write: () => Promise.resolve() });
    },
    { time: 2000, iterations: 3, warmupIterations: 1 },
  );
});

describe('one ask', () => {
  for (const ask of ASKS) bench(JSON.stringify(ask), () => void answer(ask), { time: 300 });
});
