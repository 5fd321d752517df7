import * as z from 'zod';
import { answerSchema } from './answer.ts';
import { askSchema } from './ask.ts';
import { recordReplySchema } from './record.ts';
import { wholeSheetSchema } from './sheet.ts';

/** The schemas that are published. */
export const PUBLISHED = ['sheet', 'asks', 'answers', 'record'] as const;
export type Published = (typeof PUBLISHED)[number];

const DIALECT = 'https://json-schema.org/draft/2020-12/schema';

/** A node of a JSON Schema. */
type Node = z.core.JSONSchema.BaseSchema;

/**
 * In a sheet every scalar is text, as it is written; an editor sees the number or the truth value that YAML would make
 * of it. What is text there may be either.
 */
const asWritten = (node: Node): void => {
  // Keys are text in any reading.
  delete node.propertyNames;
  if (node.type !== 'string') return;
  if (node.enum === undefined) Object.assign(node, { type: ['string', 'number'] });
  else if (node.enum.includes('true')) {
    node.enum = [...node.enum, true, false];
    delete node.type;
  }
};

const schemaOf = (which: Published): Node => {
  if (which === 'asks') return z.toJSONSchema(askSchema);
  if (which === 'answers') return z.toJSONSchema(answerSchema);
  if (which === 'record') return z.toJSONSchema(recordReplySchema);
  return z.toJSONSchema(wholeSheetSchema, {
    override: ({ jsonSchema }) => {
      asWritten(jsonSchema);
    },
  });
};

const TITLES: Readonly<Record<Published, string>> = {
  sheet: 'A sheet of Couplet',
  asks: 'An ask of Couplet',
  answers: 'An answer of Couplet',
  record: 'What a current record comes to, by Couplet',
};

/** JSON Schema (2020-12) of what the code itself checks against: a sheet as YAML or JSON, an ask, an answer, what a record comes to. */
export const publishedSchema = (which: Published): object => {
  const schema = schemaOf(which);
  return { ...schema, $schema: DIALECT, title: TITLES[which] };
};
