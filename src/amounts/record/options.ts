import { type Result, all, chain, failure, inField, success } from '../../report/result.ts';
import { wholeSpan } from '../../report/span.ts';
import type { IntegralRules } from './integral.ts';
import type { DecimalSign } from './number.ts';
import { QUANTITIES } from '../quantities.ts';
import { type Measurand, readQuantity } from '../quantity.ts';

/** How a record is to be read, as a person writes it; everything left out is told by the record itself. */
export interface RecordOptions {
  /** Columns by name, or by number from 1. */
  readonly time?: string | undefined;
  readonly current?: string | undefined;
  readonly timeUnit?: string | undefined;
  readonly currentUnit?: string | undefined;
  readonly decimal?: 'point' | 'comma' | undefined;
  readonly rule?: IntegralRules['rule'] | undefined;
  /** A step longer than this is a gap: "30 s"; or a number of usual steps: "10". */
  readonly gap?: string | undefined;
  readonly gapCharge?: IntegralRules['gapCharge'] | undefined;
  /** A current of this size or less is a pause: "50 mA". */
  readonly zero?: string | undefined;
}

/** Options once read. */
export interface ReadingRules {
  readonly integral: IntegralRules;
  readonly decimal: DecimalSign;
}

/** A gap is a step longer than ten usual ones (common practice, no source). */
const GAP_STEPS = 10;

const amountOf = (text: string | undefined, measurand: Measurand, field: string): Result<number | null> => {
  if (text === undefined) return success(null);
  const read = inField(readQuantity(text, measurand), field);
  if (!read.ok || read.value.value >= 0) return read.ok ? success(read.value.value) : read;
  return failure({ code: 'bad-ask', message: `${measurand.name} cannot be negative`, field, span: wholeSpan(text) });
};

const gapRule = (text: string | undefined): Result<Pick<IntegralRules, 'gapLimit' | 'gapSteps'>> => {
  const steps = Number(text ?? GAP_STEPS);
  if (steps > 1) return success({ gapLimit: null, gapSteps: steps });
  if (!Number.isNaN(steps))
    return failure({
      code: 'bad-ask',
      message: 'a gap is more than one usual step',
      field: 'gap',
      span: wholeSpan(text ?? ''),
      hint: 'Give a number of steps over 1, as in 10, or a time with its unit, as in 30 s.',
    });
  return chain(amountOf(text, { ...QUANTITIES.time, name: 'the gap' }, 'gap'), (gapLimit) =>
    success({ gapLimit, gapSteps: GAP_STEPS }),
  );
};

/** The rules that the options stand for. Faults of reading a quantity, in the fields `gap` and `zero`; `bad-ask`. */
export const readRecordOptions = (options: RecordOptions): Result<ReadingRules> => {
  const zero = amountOf(options.zero, { ...QUANTITIES.current, name: 'the zero' }, 'zero');
  return chain(gapRule(options.gap), (gap) =>
    chain(all([zero]), ([smallest]) =>
      success({
        integral: {
          rule: options.rule ?? 'trapezoid',
          ...gap,
          gapCharge: options.gapCharge ?? 'count',
          zero: smallest ?? 0,
        },
        decimal: options.decimal ?? null,
      }),
    ),
  );
};
