import { bench, describe } from 'vitest';
import { irreducibleBalances, minimalBalances } from '../../src/balance/family.ts';
import { unknownsOf } from '../../src/balance/unknowns.ts';
import { completeHalf } from '../../src/redox/half.ts';
import { balanceOverall } from '../../src/redox/overall.ts';
import { plainEquation } from '../support/plain.ts';

const peroxide = plainEquation('MnO4^- + H2O2 -> Mn^2+ + O2');
const oxygen = plainEquation('O2 -> H2O2');

/** Alkanes burnt together: one minimal balance for each way to make each product. */
const fuels = (count: number): string => {
  const left = Array.from({ length: count }, (_, index) => `C${String(index + 1)}H${String(2 * index + 4)}`);
  return `${left.join(' + ')} + O2 -> CO + CO2 + H2O`;
};

describe('families', () => {
  bench('permanganate and peroxide with their couplings', () => {
    balanceOverall(peroxide, 'acid');
  });
  bench('the only elementary balance of oxygen and peroxide', () => {
    completeHalf(oxygen, 'acid');
  });
  for (const count of [2, 10, 50, 100, 396]) {
    const unknowns = unknownsOf(plainEquation(fuels(count)), { helpers: [], electron: false });
    bench(
      `the minimal balances of ${String(count + 4)} species`,
      () => {
        minimalBalances(unknowns);
      },
      { time: 200, iterations: 2, warmupTime: 0, warmupIterations: 1 },
    );
  }
  for (const count of [2, 5]) {
    const unknowns = unknownsOf(plainEquation(fuels(count)), { helpers: [], electron: false });
    bench(`the irreducible balances of ${String(count + 4)} species`, () => {
      irreducibleBalances(unknowns);
    });
  }
});
