import * as z from 'zod';
import {
  cautionSchema,
  exactSchema,
  halfSchema,
  ledgerSchema,
  noteSchema,
  quantitySchema,
  reactionSchema,
  scaledHalfSchema,
  speciesSchema,
} from './shape.ts';
import { ASK_KINDS } from './ask.ts';
import { faultSchema } from './fault.ts';

const speciesAnswer = z.strictObject({
  species: speciesSchema,
  readings: z.array(speciesSchema).readonly().describe('Every reading the spelling allows, the preferred first.'),
  molarMass: z.exactOptional(quantitySchema).describe('Absent where an element has no standard atomic weight.'),
  oxidationNumbers: z
    .exactOptional(z.record(z.string(), z.array(exactSchema).readonly()))
    .describe('{"Fe": ["8/3"]}; absent where convention does not decide.'),
});

const writtenTerms = z.array(z.strictObject({ coefficient: exactSchema, species: speciesSchema })).readonly();
const equationAnswer = z
  .strictObject({ left: writtenTerms, right: writtenTerms })
  .describe('The terms as written; nothing is balanced.');

const redoxAnswer = z.strictObject({
  overall: reactionSchema,
  electrons: exactSchema.describe('Exchanged between the two halves at the scale of the overall reaction.'),
  dimension: z.number().int(),
  ledger: ledgerSchema,
  oxidation: z.exactOptional(scaledHalfSchema),
  reduction: z.exactOptional(scaledHalfSchema),
  changes: z
    .array(z.strictObject({ element: z.string(), from: exactSchema, to: exactSchema }))
    .readonly()
    .describe('Oxidation numbers that change, each distinct triple once.'),
});

const crossing = z.strictObject({
  species: z.string().nullable().describe('null: positive charge, carried by ions that take no part.'),
  amount: exactSchema.describe('Moles per mole of electrons.'),
  from: z.enum(['anode', 'cathode']),
  to: z.enum(['anode', 'cathode']),
});

const cellAnswer = z.strictObject({
  overall: reactionSchema,
  electrons: exactSchema.describe('The electron number of the overall reaction as written.'),
  ledger: ledgerSchema,
  anode: z.array(scaledHalfSchema).readonly(),
  cathode: z.array(scaledHalfSchema).readonly(),
  cancelled: z
    .array(z.strictObject({ species: z.string(), amount: exactSchema }))
    .readonly()
    .describe('What stood on both sides, at the scale of the overall reaction; electrons left out.'),
  waterFormed: exactSchema.describe('Water that H^+ and OH^- fold into, at the scale of the overall reaction.'),
  crossing: z
    .exactOptional(z.array(crossing).readonly())
    .describe('With a separator: what must cross it for each electron.'),
});

const edit = z.strictObject({ term: z.string(), from: z.string(), to: z.string(), text: z.string() });
const repair = z.strictObject({
  kind: z.string(),
  reaction: reactionSchema,
  edits: z.array(edit).readonly(),
  improbable: z.exactOptional(z.literal(true)),
});

/** The audit of one equation. */
export const equationAuditSchema = z.strictObject({
  verdict: z.enum(['balanced', 'not-lowest', 'unbalanced']),
  residual: z.record(z.string(), exactSchema).describe('Right minus left; zeros left out.'),
  dimension: z.number().int().describe('Of the written species only.'),
  ledger: ledgerSchema,
  repairs: z.array(repair).readonly().describe('The likeliest first; an improbable one never first.'),
});

const cellAuditSchema = z.strictObject({
  verdict: z.enum(['balanced', 'not-lowest', 'unbalanced']),
  parts: z.strictObject({
    anode: equationAuditSchema,
    cathode: equationAuditSchema,
    overall: equationAuditSchema,
  }),
  multipliers: z.exactOptional(z.strictObject({ anode: exactSchema, cathode: exactSchema })),
  electrons: z.strictObject({ claimed: exactSchema.nullable(), found: exactSchema.nullable() }),
  failed: z.array(z.enum(['anode', 'cathode', 'overall', 'electrons'])).readonly(),
  electronsPerMole: z.record(z.string(), exactSchema).describe('Of each product of the overall reaction.'),
});

const quantities = z.record(z.string(), quantitySchema);
const amountsAnswer = z.strictObject({
  quantities: quantities.describe('Of the species asked.'),
  alongside: z.record(z.string(), quantities).describe('Of every other species, for the same charge.'),
  electronsPerMole: z.record(z.string(), exactSchema).describe('Moles of electrons per mole of each species.'),
  derived: z
    .array(z.strictObject({ quantity: z.string(), relation: z.string() }))
    .readonly()
    .describe('In the order of derivation: each quantity with the relation it follows from.'),
});

const kind = z.enum(ASK_KINDS);
const answered = <Kind extends string, Shape extends z.ZodType>(name: Kind, shape: Shape) =>
  z.strictObject({
    id: z.exactOptional(z.string()),
    contract: z.literal(1),
    ask: z.literal(name),
    ok: z.literal(true),
    answer: shape,
    notes: z.array(noteSchema).readonly(),
    cautions: z.array(cautionSchema).readonly(),
  });

/** A fault in its envelope. */
export const faultedSchema = z.strictObject({
  id: z.exactOptional(z.string()),
  contract: z.literal(1),
  ask: kind.nullable().describe('null where the kind of ask could not be told.'),
  ok: z.literal(false),
  fault: faultSchema,
});

/** What each kind of ask is answered with. */
export const answerSchemas = {
  species: answered('species', speciesAnswer),
  equation: answered('equation', equationAnswer),
  half: answered('half', halfSchema),
  redox: answered('redox', redoxAnswer),
  cell: answered('cell', cellAnswer),
  audit: answered('audit', z.union([equationAuditSchema, cellAuditSchema])),
  amounts: answered('amounts', amountsAnswer),
};

/** Every answer or fault, as one schema. */
export const answerSchema = z.union([...Object.values(answerSchemas), faultedSchema]);

export type Answer = z.infer<typeof answerSchema>;
export type Answered = Extract<Answer, { readonly ok: true }>;
export type Faulted = z.infer<typeof faultedSchema>;
export type SpeciesAnswer = z.infer<typeof speciesAnswer>;
export type EquationAnswer = z.infer<typeof equationAnswer>;
export type RedoxAnswer = z.infer<typeof redoxAnswer>;
export type CellAnswer = z.infer<typeof cellAnswer>;
export type EquationAuditAnswer = z.infer<typeof equationAuditSchema>;
export type CellAuditAnswer = z.infer<typeof cellAuditSchema>;
export type AmountsAnswerShown = z.infer<typeof amountsAnswer>;
