import { bench, describe } from 'vitest';
import { auditEquation } from '../../src/audit/audit.ts';
import { type Reaction, sideOf } from '../../src/balance/reaction.ts';
import { readEquation } from '../../src/species/read-equation.ts';
import type { Equation } from '../../src/species/equation.ts';
import { overallReactions } from '../audit/overall.ts';
import { type Planted, type Slip, SLIPS, plantings, sortedText } from '../audit/planting.ts';
import { publishedEquilibria, publishedHalves } from '../audit/published.ts';
import { plainEquation } from '../support/plain.ts';

/** Equations of a stream: published ones as they are printed, every second one with a planted mistake. */
const STREAM_LENGTH = 100_000;

const halves = publishedHalves().map((text) => plainEquation(text.replace('(s,red)', '(s)')));
const balanced = [...halves, ...publishedEquilibria().map(plainEquation), ...overallReactions(halves, 137)].filter(
  ({ left, right }) => left.length + right.length > 2,
);
const planted = balanced.flatMap(plantings);
const texts = [...publishedHalves(), ...publishedEquilibria()];

const textOf = (reaction: Reaction): string => {
  const side = (which: 'left' | 'right'): Equation['left'] =>
    sideOf(reaction, which).map(({ species, nu }) => ({
      species,
      coefficient: nu.abs(),
      coefficientWritten: true,
      span: { from: 0, to: 0 },
    }));
  return sortedText({ left: side('left'), right: side('right') });
};

/** Where the planted repair stands; -1 where it is not shown, null where the slip left a balanced equation. */
const placeOf = ({ wrong, right }: Planted): number | null => {
  const result = auditEquation(wrong);
  if (!result.ok || result.value.verdict !== 'unbalanced') return null;
  return result.value.repairs.findIndex(({ reaction }) => textOf(reaction) === sortedText(right));
};

const percent = (part: number, whole: number): string => `${((100 * part) / whole).toFixed(1)} %`.padStart(8);

const rateOf = (slip: Slip): string => {
  // every fifth planting: enough for a tenth of a percent, and it keeps the run short
  const places = planted
    .filter((one, index) => one.slip === slip && index % 5 === 0)
    .map(placeOf)
    .filter((place) => place !== null);
  const first = places.filter((place) => place === 0).length;
  const shown = places.filter((place) => place >= 0 && place < 3).length;
  return `${slip.padEnd(30)}${String(places.length).padStart(7)}${percent(first, places.length)}${percent(shown, places.length)}`;
};

const printRates = (): void => {
  const head = `${'planted slip'.padEnd(30)}${'cases'.padStart(7)}${'first'.padStart(8)}${'in three'.padStart(9)}`;
  process.stdout.write(`\n${[head, ...SLIPS.map(rateOf)].join('\n')}\n`);
};

/** Reads and audits a stream of texts one by one, keeping nothing but a count, and tells speed and memory. */
const printStream = (): void => {
  let unbalanced = 0;
  let [start, before, highest] = [0, 0, 0];
  for (let index = 0; index < STREAM_LENGTH; index += 1) {
    if (index === STREAM_LENGTH / 10) {
      // caches are full by now: from here on memory must stay where it is
      start = performance.now();
      before = process.memoryUsage().heapUsed;
    }
    const text = texts[index % texts.length] ?? '';
    const equation = index % 2 === 0 ? readEquation(text) : readEquation(text.replace('->', '+ 2 e^- ->'));
    const result = equation.ok ? auditEquation(equation.value) : null;
    if (result?.ok === true && result.value.verdict === 'unbalanced') unbalanced += 1;
    if (index % 10_000 === 0) highest = Math.max(highest, process.memoryUsage().heapUsed);
  }
  const seconds = (performance.now() - start) / 1000;
  const rate = Math.round((STREAM_LENGTH * 0.9) / seconds);
  const megabytes = ((highest - before) / 1e6).toFixed(0);
  process.stdout.write(
    `\n${String(STREAM_LENGTH)} equations in a stream, ${String(unbalanced)} unbalanced: ` +
      `${String(rate)} a second, heap at most ${megabytes} MB above where it was after a tenth\n`,
  );
};

describe('audit', () => {
  printRates();
  printStream();
  const wrong = planted.filter((_, index) => index % 97 === 0);

  bench('balanced equations', () => {
    for (const equation of balanced.slice(0, 100)) auditEquation(equation);
  });

  bench(`equations with one planted mistake (${String(wrong.length)})`, () => {
    for (const { wrong: equation } of wrong) auditEquation(equation);
  });
});
