import type { Fault } from '../../report/fault.ts';
import type { BadRowReason, CountedRows } from './tally.ts';

/** No line names the columns; `before`: what the line before the numbers has. */
export const noHeader = (before: readonly string[]): Fault => ({
  code: 'bad-ask',
  message: 'no line names a column of time and one of current',
  field: 'record',
  hint:
    before.length > 0
      ? `The line before the numbers has ${before.join(', ')}: name them with --time and --current.`
      : 'Name the columns in a first line, as in time_s, current_A, or give --time-unit and --current-unit.',
});

/** A column whose unit nothing says; `headed`: it has a name in a header. */
export const noUnit = (kind: 'time' | 'current', name: string, headed: boolean): Fault => ({
  code: 'unknown-unit',
  message: `the unit of ${kind} is not known, in ${headed ? `the column ${name}` : name}`,
  field: `${kind}Unit`,
  hint: `${headed ? `Write it in the header, as in ${name} (${kind === 'time' ? 's' : 'A'}), or give` : 'Give'} --${kind}-unit.`,
});

/** Fewer than two readings can be used; `worst`: why most rows cannot. */
export const tooFewReadings = (worst: CountedRows<BadRowReason> | undefined): Fault => ({
  code: 'not-enough-given',
  message: 'a record needs two readings or more',
  field: 'record',
  missing: ['record'],
  ...(worst === undefined
    ? {}
    : {
        hint: `Most rows were left out as ${worst.reason}, the first in line ${String(worst.lines[0] ?? 0)}: ${worst.example}`,
      }),
});
