import { bench, describe } from 'vitest';
import { completeHalf } from '../../src/redox/half.ts';
import { balanceOverall } from '../../src/redox/overall.ts';
import { solve } from '../../src/balance/solve.ts';
import { unknownsOf } from '../../src/balance/unknowns.ts';
import { plainEquation } from '../support/plain.ts';

const permanganate = plainEquation('MnO4^- -> Mn^2+');
const orpiment = plainEquation('As2S3 + NO3^- -> H3AsO4 + SO4^2- + NO');
const alum = plainEquation('K2Cr2O7 + FeSO4 + H2SO4 -> Cr2(SO4)3 + Fe2(SO4)3 + K2SO4 + H2O');

/** `count` made-up elements in a ring: each left species holds one, each right species two neighbours. One balance at most. */
const chain = (count: number): string => {
  const symbols = ELEMENTS.slice(0, count);
  const left = symbols.map((symbol, index) => `${symbol}${String((index % 7) + 2)}`);
  const right = symbols.map((symbol, index) => `${symbol}3${symbols[(index + 1) % symbols.length] ?? ''}`);
  return `${left.join(' + ')} -> ${right.join(' + ')}`;
};

const FIRST = 'B C D E F G H I J K L M N O P Q R S T U V W X Y Z'.split(' ');
const ELEMENTS = FIRST.flatMap((a) => 'a b c d e f g h i'.split(' ').map((b) => a + b));

describe('balancing', () => {
  bench('a half-reaction of 5 species', () => {
    completeHalf(permanganate, 'acid');
  });
  bench('an overall reaction of 7 species', () => {
    balanceOverall(orpiment, 'acid');
  });
  bench('a molecular skeleton of 8 species', () => {
    balanceOverall(alum, 'acid');
  });
  for (const count of [3, 10, 50, 100, 200]) {
    const unknowns = unknownsOf(plainEquation(chain(count)), { helpers: [], electron: false });
    bench(`a chain of ${String(2 * count)} species`, () => {
      solve(unknowns);
    });
  }
});
