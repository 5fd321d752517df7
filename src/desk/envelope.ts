import type { Fault } from '../report/fault.ts';
import type { Note } from '../report/note.ts';
import type { Answer, Faulted } from './schema/answer.ts';
import type { AskKind } from './schema/ask.ts';
import { fieldsOf, kindOf } from './read-ask.ts';

/** The contract's number; a field may be added under it, none changes its meaning. */
export const CONTRACT = 1;

/** What the envelope repeats of any ask, even of a broken one. */
export interface Addressee {
  readonly id?: string;
  readonly ask: AskKind | null;
}

/** The id, where it is text, and the kind, where it can be told, of any JSON value. */
export const addresseeOf = (value: unknown): Addressee => {
  const id = fieldsOf(value)?.['id'];
  return typeof id === 'string' ? { id, ask: kindOf(value) } : { ask: kindOf(value) };
};

/** A fault in its envelope. */
export const faulted = ({ id, ask }: Addressee, fault: Fault): Faulted => ({
  ...(id === undefined ? {} : { id }),
  contract: CONTRACT,
  ask,
  ok: false,
  fault,
});

/** Notes in order, each once: two electrodes may assume the same medium. */
export const distinctNotes = (notes: readonly Note[]): readonly Note[] =>
  notes.filter(
    (one, at) => notes.findIndex((other) => other.code === one.code && other.message === one.message) === at,
  );

/** What an answer of one kind carries besides its envelope. */
export type Reply = {
  [Kind in AskKind]: Pick<Extract<Answer, { readonly ok: true; readonly ask: Kind }>, 'ask' | 'answer' | 'cautions'>;
}[AskKind];
