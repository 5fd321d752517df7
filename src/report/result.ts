import type { Fault } from './fault.ts';
import type { Note } from './note.ts';

/** A value with the notes gathered on the way to it. */
export interface Success<T> {
  readonly ok: true;
  readonly value: T;
  readonly notes: readonly Note[];
}

/** A fault: no value. */
export interface Failure {
  readonly ok: false;
  readonly fault: Fault;
}

/** An outcome: a value with its notes, or a fault. Exceptions are for broken programs only. */
export type Result<T> = Success<T> | Failure;

/** A success with `value` and these notes. */
export const success = <T>(value: T, notes: readonly Note[] = []): Success<T> => ({ ok: true, value, notes });

/** A failure with this fault. */
export const failure = (fault: Fault): Failure => ({ ok: false, fault });

/** `result` with `notes` put before its own; a failure stays as it is. */
export const withNotes = <T>(result: Result<T>, notes: readonly Note[]): Result<T> =>
  result.ok && notes.length > 0 ? success(result.value, [...notes, ...result.notes]) : result;

/** The next step on the value of `result`; notes of both are kept in order, the first fault ends it. */
export const chain = <A, B>(result: Result<A>, next: (value: A) => Result<B>): Result<B> =>
  result.ok ? withNotes(next(result.value), result.notes) : result;

/** The value of `result` changed by `change`; notes and faults stay. */
export const map = <A, B>(result: Result<A>, change: (value: A) => B): Result<B> =>
  result.ok ? success(change(result.value), result.notes) : result;

/** All values in order with all notes, or the first fault. */
export const all = <T>(results: readonly Result<T>[]): Result<readonly T[]> => {
  const values: T[] = [];
  const notes: Note[] = [];
  for (const result of results) {
    if (!result.ok) return result;
    values.push(result.value);
    notes.push(...result.notes);
  }
  return success(values, notes);
};

/** `result` with its fault, if it is one, placed in `field` of the ask unless it already names one. */
export const inField = <T>(result: Result<T>, field: string): Result<T> =>
  result.ok || result.fault.field !== undefined ? result : failure({ ...result.fault, field });
