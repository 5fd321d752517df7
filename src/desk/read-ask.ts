import type * as z from 'zod';
import { didYouMean, nearest } from '../report/suggest.ts';
import { type Result, failure, success } from '../report/result.ts';
import { type Ask, type AskKind, ASK_KINDS, askSchemas } from './schema/ask.ts';
import { type Issue, foremost, issueFault } from './issue.ts';

/** The fields of any JSON object, or null where `ask` is not one. */
export const fieldsOf = (ask: unknown): Readonly<Record<string, unknown>> | null =>
  typeof ask === 'object' && ask !== null && !Array.isArray(ask) ? (ask as Readonly<Record<string, unknown>>) : null;

/** The kind of an ask, or null where it cannot be told. */
export const kindOf = (ask: unknown): AskKind | null => {
  const named = fieldsOf(ask)?.['ask'];
  return ASK_KINDS.find((kind) => kind === named) ?? null;
};

type Fields = Readonly<Record<string, unknown>>;

/** Cells, audits and amounts have several forms: the field that is there tells which is meant. */
const schemaFor = (kind: AskKind, fields: Fields): z.ZodType<Ask> & { readonly shape: object } => {
  if (kind === 'cell') return 'diagram' in fields ? askSchemas.drawn : askSchemas.composed;
  if (kind === 'audit') {
    const whole = 'anode' in fields || 'cathode' in fields || 'overall' in fields;
    return whole && !('equation' in fields) ? askSchemas.cellAudit : askSchemas.equationAudit;
  }
  if (kind === 'amounts') {
    if ('cell' in fields) return askSchemas.cellAmounts;
    return 'electrode' in fields ? askSchemas.electrodeAmounts : askSchemas.halfAmounts;
  }
  return askSchemas[kind];
};

/** Two forms in one ask: which is meant is not ours to guess. */
const EXCLUSIVE: readonly (readonly [AskKind, string, readonly string[]])[] = [
  ['cell', 'diagram', ['anode', 'cathode', 'medium', 'separator', 'settle', 'foldHydronium']],
  ['audit', 'equation', ['anode', 'cathode', 'overall', 'electrons']],
  ['amounts', 'cell', ['half', 'electrode']],
  ['amounts', 'electrode', ['half']],
];

const mixedForms = (kind: AskKind, fields: Fields): Result<never> | null => {
  for (const [ofKind, one, others] of EXCLUSIVE) {
    const other = others.find((name) => name in fields);
    if (ofKind !== kind || !(one in fields) || other === undefined) continue;
    const message = `${one} and ${other} cannot stand in one ask of kind ${kind}.`;
    return failure({ code: 'bad-ask', field: other, message, hint: `Give ${one} or ${other}, not both.` });
  }
  return null;
};

const unknownKind = (fields: Fields): Result<never> => {
  const named = fields['ask'];
  const kinds = `The kinds are ${ASK_KINDS.join(', ')}.`;
  if (typeof named !== 'string') {
    const message = named === undefined ? 'The ask does not say its kind.' : 'The kind of an ask must be text.';
    return failure({ code: 'bad-ask', field: 'ask', message, hint: kinds });
  }
  const guess = didYouMean(nearest(named, ASK_KINDS, 2, 1));
  const hint = guess === undefined ? kinds : `${guess} ${kinds}`;
  return failure({ code: 'bad-ask', field: 'ask', message: `There is no kind of ask called ${named}.`, hint });
};

/**
 * The ask that a JSON value is, checked against its schema.
 * Faults: `bad-ask` with the field, for a value that is no object, an unknown kind or field, a wrong type.
 */
export const readAsk = (value: unknown): Result<Ask> => {
  const fields = fieldsOf(value);
  if (fields === null) {
    return failure({
      code: 'bad-ask',
      message: 'An ask must be a JSON object.',
      hint: 'For example {"ask": "half", "skeleton": "Cu^2+ -> Cu"}.',
    });
  }
  const kind = kindOf(fields);
  if (kind === null) return unknownKind(fields);
  const mixed = mixedForms(kind, fields);
  if (mixed !== null) return mixed;
  const schema = schemaFor(kind, fields);
  const parsed = schema.safeParse(fields);
  if (parsed.success) return success(parsed.data);
  const issues: readonly Issue[] = parsed.error.issues;
  return failure(issueFault(foremost(issues), Object.keys(schema.shape), `an ask of kind ${kind}`));
};
