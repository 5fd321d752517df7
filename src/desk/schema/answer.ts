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

const contribution = z
  .strictObject({
    term: z.string().describe('The term as written, its coefficient with it.'),
    side: z.enum(['left', 'right']),
    amounts: z.record(z.string(), exactSchema).describe('Atoms of each element, and the charge where it is not 0.'),
  })
  .describe('What one written term puts into the ledger.');

/** The audit of one equation. */
export const equationAuditSchema = z.strictObject({
  verdict: z.enum(['balanced', 'not-lowest', 'unbalanced']),
  residual: z.record(z.string(), exactSchema).describe('Right minus left; zeros left out.'),
  dimension: z.number().int().describe('Of the written species only.'),
  ledger: ledgerSchema,
  repairs: z.array(repair).readonly().describe('The likeliest first; an improbable one never first.'),
  contributions: z
    .exactOptional(z.array(contribution).readonly())
    .describe('Only where asked for: each term in the order written.'),
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
const budgetLine = z
  .strictObject({
    input: z.string().describe('A quantity given, a share, or "atomic weight of Cu".'),
    uncertainty: z.number().describe('Its standard uncertainty in SI base units.'),
    sensitivity: z.number().describe('The sensitivity coefficient in SI base units (JCGM 100:2008, 5.1.3).'),
    part: z.number().describe('Its part of the variance, 0 to 1, inputs taken as uncorrelated.'),
  })
  .describe('What one input contributes to an uncertainty.');

const gain = z.exactOptional(quantitySchema);
const tankBalance = z
  .strictObject({
    acid: gain.describe('mol of H^+.'),
    base: gain.describe('mol of OH^-.'),
    water: z.exactOptional(
      z.strictObject({ amount: quantitySchema, mass: quantitySchema, volume: quantitySchema }).describe('Of H2O(l).'),
    ),
  })
  .describe('What the tank gains (negative: loses) by stoichiometry alone; absent where nothing of it changes.');

const amountsShape = {
  quantities: quantities.describe('Of the species asked.'),
  alongside: z.record(z.string(), quantities).describe('Of every other species, for the same charge.'),
  electronsPerMole: z.record(z.string(), exactSchema).describe('Moles of electrons per mole of each species.'),
  derived: z
    .array(z.strictObject({ quantity: z.string(), relation: z.string() }))
    .readonly()
    .describe('In the order of derivation: each quantity with the relation it follows from.'),
  budgets: z
    .exactOptional(z.record(z.string(), z.array(budgetLine).readonly()))
    .describe('Only where asked for: who contributes what to the uncertainty of each quantity, the largest first.'),
};

const amountsAnswer = z.strictObject({
  ...amountsShape,
  tank: z.exactOptional(tankBalance).describe('Only where asked for.'),
  series: z
    .exactOptional(z.array(z.strictObject(amountsShape)).readonly())
    .describe('Of the further cells in series, in the order of the ask.'),
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
export type TankBalanceShown = z.infer<typeof tankBalance>;
