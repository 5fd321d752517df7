import * as z from 'zod';
import { MOST_SHOWN } from '../../redox/coupling/several.ts';
import { exactSchema, reactionSchema } from './shape.ts';

const common = {
  message: z.string().describe('What is wrong, in one sentence.'),
  field: z.exactOptional(z.string()).describe('The part of the ask: "skeleton", "anode[1]", "given.current".'),
  span: z
    .exactOptional(z.strictObject({ from: z.number().int(), to: z.number().int() }))
    .describe('Code points in the text of that part, from 0, the end exclusive.'),
  hint: z.exactOptional(z.string()).describe('What to try.'),
};

const plainCodes = z.enum([
  'empty',
  'too-long',
  'unknown-character',
  'unknown-element',
  'bad-charge',
  'bad-count',
  'bracket',
  'no-arrow',
  'empty-side',
  'unknown-medium',
  'electrode-direction',
  'unknown-unit',
  'unknown-quantity',
  'contradiction',
  'bad-ask',
]);

const couplingSchema = z
  .strictObject({
    assume: z.string().describe('The assumption in words; give it back as `settle`.'),
    overall: z.exactOptional(reactionSchema),
    reaction: z.exactOptional(reactionSchema),
    electrons: exactSchema,
  })
  .describe('One way to settle what conservation leaves open.');

const certificateSchema = z.strictObject({
  weights: z.record(z.string(), exactSchema).describe('Weights on elements and `charge` that no balance can meet.'),
  text: z.string(),
});

/** The contract's FAULT: every way an ask can fail and what each carries. */
export const faultSchema = z
  .discriminatedUnion('code', [
    z.strictObject({ code: plainCodes, ...common }),
    z.strictObject({ code: z.literal('several-readings'), ...common, readings: z.array(z.string()).readonly() }),
    z.strictObject({ code: z.literal('missing-element'), ...common, element: z.string() }),
    z.strictObject({ code: z.literal('no-balance'), ...common, certificate: certificateSchema }),
    z.strictObject({ code: z.literal('wrong-side'), ...common, species: z.string(), reaction: reactionSchema }),
    z.strictObject({ code: z.literal('idle-species'), ...common, species: z.string() }),
    z.strictObject({
      code: z.literal('several-balances'),
      ...common,
      dimension: z.number().int(),
      family: z
        .array(reactionSchema)
        .readonly()
        .describe(
          `The minimal balances: from none can a species with a side be dropped. At most ${String(MOST_SHOWN)}, those of the fewest species; the message says where there are more.`,
        ),
      couplings: z.array(couplingSchema).readonly(),
      irreducible: z
        .exactOptional(z.array(reactionSchema).readonly())
        .describe('Only where asked for: whole balances that are no sum of two others; every other is a sum of them.'),
    }),
    z.strictObject({ code: z.literal('no-electrons'), ...common, reaction: reactionSchema }),
    z.strictObject({ code: z.literal('not-enough-given'), ...common, missing: z.array(z.string()).readonly() }),
    z.strictObject({ code: z.literal('too-hard'), ...common, limit: z.string() }),
  ])
  .describe('Why an ask was not answered.');
