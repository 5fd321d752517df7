import type { FaultCode } from './fault.ts';
import { type Result, all } from './result.ts';

/** Outcomes in the contract's order: of several faults in one ask the first of these is told. */
const LATER: readonly (readonly FaultCode[])[] = [
  ['bad-ask'],
  ['missing-element'],
  ['several-balances', 'no-balance', 'wrong-side', 'idle-species', 'too-hard'],
  ['no-electrons'],
  ['electrode-direction'],
  ['not-enough-given', 'contradiction'],
];

/** 0 for a fault of reading, more for what comes after. */
const rankOf = (code: FaultCode): number => LATER.findIndex((codes) => codes.includes(code)) + 1;

/** All values in order with all notes; of several faults the one that comes first in the contract's order. */
export const allByRank = <T>(results: readonly Result<T>[]): Result<readonly T[]> => {
  const faults = results.flatMap((result) => (result.ok ? [] : [result]));
  const [first] = faults.toSorted((one, other) => rankOf(one.fault.code) - rankOf(other.fault.code));
  return first ?? all(results);
};
