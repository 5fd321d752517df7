import { type Result, chain, failure, inField, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import { type Measured, exactly, measuredFrom, scaled, weightedSum } from './measured.ts';
import { QUANTITIES } from './quantities.ts';
import { readQuantity } from './quantity.ts';

/** A stack: `cells` in series carry one current, of which `bypass` ("2 %") misses the electrodes. */
export interface Stack {
  /** A whole number as text. */
  readonly cells?: string;
  readonly bypass?: string;
}

const readCells = (text: string): Result<number> =>
  /^[1-9]\d{0,5}$/u.test(text.trim())
    ? success(Number(text))
    : failure({
        code: 'bad-ask',
        message: 'a stack has a whole number of cells',
        field: 'cells',
        span: wholeSpan(text),
        hint: 'Write a number from 1: 24.',
      });

const readBypass = (text: string): Result<Measured> =>
  chain(inField(readQuantity(text, QUANTITIES.share), 'bypass'), ({ value, uncertainty, lastDigit }) =>
    value < 0 || value >= 1
      ? failure({
          code: 'contradiction',
          message: 'the bypass is a part of the current, below 100 %',
          field: 'bypass',
          span: wholeSpan(text),
        })
      : success(measuredFrom({ name: 'bypass', value, uncertainty, lastDigit })),
  );

/** Charge that works in all cells per charge through the line: n (1 - bypass); 1 where neither is given. */
export const readStack = ({ cells, bypass }: Stack): Result<Measured> =>
  chain(cells === undefined ? success(1) : readCells(cells), (count) =>
    chain(bypass === undefined ? success(exactly(0)) : readBypass(bypass), (missed) => {
      const passing = weightedSum([
        [1, exactly(1)],
        [-1, missed],
      ]);
      return success(scaled(passing, count));
    }),
  );
