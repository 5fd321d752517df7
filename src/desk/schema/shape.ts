import * as z from 'zod';

/** An exact number as text: "5", "-5/2". */
export const exactSchema = z
  .string()
  .regex(/^-?\d+(\/[1-9]\d*)?$/)
  .describe('An exact number in lowest terms: "5", "-5/2".');

/** A measured or derived quantity, unrounded. */
export const quantitySchema = z
  .strictObject({
    value: z.number(),
    unit: z.string(),
    uncertainty: z
      .exactOptional(z.number())
      .describe('One standard uncertainty in the same unit; absent where unknown.'),
  })
  .describe('A measured or derived quantity, unrounded.');

/** The contract's SPECIES. */
export const speciesSchema = z
  .strictObject({
    plain: z.string().describe('The canonical spelling, with the state where written: "Cr2O7^2-(aq)".'),
    composition: z
      .record(z.string(), exactSchema)
      .describe('Atoms of each element; a nuclide is keyed by mass number and symbol: "2H".'),
    charge: exactSchema.describe('The charge number z: "-2".'),
    state: z.string().nullable().describe('The state as written: "aq", "s"; null where none is written.'),
  })
  .describe('A species as it was read.');

/** The contract's TERM. */
export const termSchema = z
  .strictObject({
    species: z.string().describe('The canonical spelling without state.'),
    nu: exactSchema.describe('The stoichiometric number; negative for a reactant (IUPAC Green Book).'),
    state: z.string().nullable(),
  })
  .describe('A species in a reaction.');

/** The contract's REACTION. */
export const reactionSchema = z
  .strictObject({
    plain: z.string().describe('The canonical plain spelling; "" where nothing is left.'),
    terms: z.array(termSchema).readonly().describe('In the order of the spelling, reactants first.'),
  })
  .describe('A reaction; reading its plain spelling back gives the same reaction.');

/** The contract's LEDGER. */
export const ledgerSchema = z
  .record(z.string(), z.tuple([exactSchema, exactSchema]).readonly())
  .describe('Atoms of each element and the charge: [left, right].');

/** A medium in an answer. */
export const shownMediumSchema = z
  .union([z.string(), z.strictObject({ helpers: z.array(z.string()).readonly() })])
  .describe('The name of a built-in medium, or the list of helper species that was given.');

/** The contract's HALF. */
export const halfSchema = z
  .strictObject({
    reaction: reactionSchema,
    kind: z.enum(['reduction', 'oxidation']),
    electrons: exactSchema.describe('The electron number at the scale of the reaction; positive.'),
    medium: shownMediumSchema,
    ledger: ledgerSchema,
    dimension: z.number().int().describe('Unknown species minus the rank of elements and charge.'),
  })
  .describe('A balanced half-reaction.');

/** A half-reaction as part of a whole. */
export const scaledHalfSchema = z
  .strictObject({
    ...halfSchema.shape,
    multiplier: z.exactOptional(exactSchema).describe('How often the half is taken in the overall reaction.'),
  })
  .describe('A half-reaction and how often it is taken in the overall reaction.');

/** Something the reader must know. */
export const noteSchema = z
  .strictObject({ code: z.string(), message: z.string() })
  .describe('Something the reader must know: a medium assumed, a reading chosen.');

/** A usual caution. */
export const cautionSchema = z
  .strictObject({
    text: z.string(),
    because: z.array(z.string()).readonly().describe('The species or elements that call for it.'),
    basis: z.string(),
    grave: z
      .exactOptional(z.boolean())
      .describe('true: it can kill or explode at once, and is shown before everything else.'),
    conditional: z
      .exactOptional(z.boolean())
      .describe('true: it holds only where what the end of its text names holds too.'),
  })
  .describe('A usual caution. That none is given does not mean that the work is safe.');

export type Quantity = z.infer<typeof quantitySchema>;
export type ShownSpecies = z.infer<typeof speciesSchema>;
export type ShownLedger = z.infer<typeof ledgerSchema>;
export type ShownMedium = z.infer<typeof shownMediumSchema>;
export type ShownHalf = z.infer<typeof halfSchema>;
export type ShownScaledHalf = z.infer<typeof scaledHalfSchema>;
export type ShownNote = z.infer<typeof noteSchema>;
export type ShownCaution = z.infer<typeof cautionSchema>;
