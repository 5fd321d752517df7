import { type Ledger, ledgerOf } from '../balance/ledger.ts';
import type { Reaction } from '../balance/reaction.ts';
import { residualOf } from '../balance/recount.ts';
import { gcdOf } from '../exact/integer.ts';
import { type Rational, isWhole, numeratorOf, rational } from '../exact/rational.ts';
import type { Medium } from '../redox/medium.ts';
import { type Note, note } from '../report/note.ts';
import { type Result, success } from '../report/result.ts';
import type { Equation } from '../species/equation.ts';
import { changesOf, editOf } from './changes.ts';
import { dimensionOf } from './dimension.ts';
import { findingsOf } from './findings.ts';
import { type Repair, repairsOf } from './repairs.ts';
import { type Draft, draftOf, reactionOf } from './writing.ts';

/** What the audit says of an equation. */
export type Verdict = 'balanced' | 'not-lowest' | 'unbalanced';

/** The audit of one equation. */
export interface Audit {
  /** The equation as written. */
  readonly reaction: Reaction;
  readonly verdict: Verdict;
  /** Right minus left, zeros left out. */
  readonly residual: ReadonlyMap<string, Rational>;
  /** Written species minus rank of elements and charge. */
  readonly dimension: number;
  readonly ledger: Ledger;
  /** The likeliest first. */
  readonly repairs: readonly Repair[];
}

/**
 * What is wrong with `equation`, and the likeliest repairs. The medium is only a check. Nothing faults: what the
 * search cannot settle within its bounds it says in a note.
 */
export const auditEquation = (equation: Equation, medium?: Medium): Result<Audit> => {
  const draft = draftOf(equation);
  const reaction = reactionOf(draft);
  const ledger = ledgerOf(reaction);
  const residual = inOrder(residualOf(reaction), ledger);
  const common = commonFactor(draft);
  const verdict: Verdict = residual.size > 0 ? 'unbalanced' : common > 1n ? 'not-lowest' : 'balanced';
  const found =
    verdict === 'unbalanced' ? repairsOf(draft, residual, medium) : { repairs: lowest(draft, common), notes: [] };
  const dimension = dimensionOf(draft);
  const audit: Audit = { reaction, verdict, residual, dimension, ledger, repairs: found.repairs };
  return success(audit, [
    ...fractionNotes(draft, residual.size === 0),
    ...findingsOf(draft, audit, medium),
    ...found.notes,
  ]);
};

/** `residual` in the order of `ledger`: elements as they appear, the charge last. */
const inOrder = (residual: ReadonlyMap<string, Rational>, ledger: Ledger): ReadonlyMap<string, Rational> =>
  new Map([...ledger.keys()].flatMap((label) => [...residual].filter(([other]) => other === label)));

const commonFactor = (draft: Draft): bigint =>
  draft.every(({ coefficient }) => isWhole(coefficient))
    ? gcdOf(draft.map(({ coefficient }) => numeratorOf(coefficient)))
    : 1n;

const lowest = (draft: Draft, common: bigint): readonly Repair[] => {
  if (common <= 1n) return [];
  const divided = draft.map((term) => ({ ...term, coefficient: term.coefficient.div(rational(common)) }));
  const edits = changesOf(draft, divided).map(editOf);
  return [{ kind: 'lowest-terms', reaction: reactionOf(divided), edits, improbable: false }];
};

const fractionNotes = (draft: Draft, conserved: boolean): readonly Note[] =>
  conserved && draft.some(({ coefficient }) => !isWhole(coefficient))
    ? [note('fractions', 'The coefficients are fractions and conserve: accepted as written.')]
    : [];
