import type { AmountsAnswer } from '../../src/amounts/working.ts';
import type { Fault } from '../../src/report/fault.ts';
import { amountsOf } from './circuit.ts';

type Args = Parameters<typeof amountsOf>;

/** The answer to an ask that must be answered, with the codes of its notes. */
export const answerOf = (...args: Args): AmountsAnswer & { readonly notes: readonly string[] } => {
  const result = amountsOf(...args);
  if (!result.ok) throw new Error(JSON.stringify(result.fault));
  return { ...result.value, notes: result.notes.map(({ code }) => code) };
};

/** The fault of an ask that must be refused. */
export const faultOf = (...args: Args): Fault => {
  const result = amountsOf(...args);
  if (result.ok) throw new Error(JSON.stringify(result.value.quantities));
  return result.fault;
};
