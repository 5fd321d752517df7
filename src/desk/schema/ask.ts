import * as z from 'zod';

const skeleton = z.string().describe('Reactants -> products; coefficients are ignored: "MnO4^- -> Mn^2+".');
const equation = z.string().describe('An equation with its coefficients: "2 H2 + O2 -> 2 H2O".');
const mediumSchema = z
  .union([z.string(), z.strictObject({ helpers: z.array(z.string()).readonly() })])
  .describe('"acid", "base", "neutral", "none", a melt, or {"helpers": ["CN^-", "H2O", "OH^-"]}: exactly these.');
const medium = mediumSchema.optional();
const settle = z.string().optional().describe('The `assume` text of one of the couplings of `several-balances`.');
const share = z.string().optional().describe('The part of the current that a reaction takes: "0.95", "19/20", "95 %".');

const foldHydronium = z
  .boolean()
  .optional()
  .describe('true: every H3O^+ that is written is read as H^+ and H2O. Left out, the two are different species.');
const per = z
  .string()
  .optional()
  .describe(
    'The scale of the answer: "electron" (the electron number becomes 1) or a species that takes part, "Cu" (its ' +
      'stoichiometric number becomes 1 or -1); other numbers may become fractions. Left out: lowest whole numbers.',
  );
const irreducible = z
  .boolean()
  .optional()
  .describe('true: where several balances exist, the fault lists the irreducible whole ones too (the Hilbert basis).');
const contributions = z.boolean().optional().describe('true: what each written term puts into the ledger is listed.');

const common = {
  id: z.string().optional().describe('Comes back with the answer.'),
  where: z.record(z.string(), z.string()).optional().describe('Unknown subscripts: {"x": "0.4"}.'),
  define: z.record(z.string(), z.string()).optional().describe('Named species: {"EDTA^4-": "C10H12N2O8^4-"}.'),
  strict: z
    .boolean()
    .optional()
    .describe(
      'true: every ambiguity is a fault: a spelling or a unit with two readings, a gas that does not say it is one.',
    ),
};

const electrodeReaction = z.union([
  z.string(),
  z.strictObject({ skeleton, medium, share, settle }).describe('A skeleton with its own medium or share.'),
]);
const electrode = z.array(electrodeReaction).min(1).readonly().describe('The reactions of one electrode.');

const composed = z.strictObject({
  anode: electrode,
  cathode: electrode,
  medium,
  separator: z.boolean().optional().describe('true: the electrolytes do not mix, nothing folds to water.'),
  settle,
});
const drawn = z.strictObject({
  diagram: z.string().describe('IUPAC line notation, the anode on the left: "Zn | Zn^2+ || Cu^2+ | Cu".'),
});

/** The fields of a cell: two electrodes, or a diagram. */
export const cellFieldsSchema = z.union([composed, drawn]);

const given = z
  .record(z.string(), z.union([z.string(), z.array(z.tuple([z.string(), z.string()]).readonly()).readonly()]))
  .describe('What is known, each quantity as text with its unit: {"current": "2 A"}; `record` is a list of pairs.');
const correlation = z
  .strictObject({
    between: z
      .tuple([z.string(), z.string()])
      .readonly()
      .describe('Two inputs, as given names them: ["mass", "time"].'),
    coefficient: z.string().describe('From "-1" to "1".'),
  })
  .describe('The correlation coefficient between two inputs.');
const amountsFields = {
  species: z.string().describe('The species whose amounts are asked.'),
  given,
  want: z.record(z.string(), z.string()).optional().describe('Units to answer in: {"mass": "kg"}.'),
  medium,
  settle,
  foldHydronium,
  cells: z.string().optional().describe('Of a stack: cells in series that the current works in, "24".'),
  bypass: z.string().optional().describe('Of a stack: the part of the current that misses the electrodes, "2 %".'),
  budget: z.boolean().optional().describe('true: what each input contributes to the uncertainty of each quantity.'),
  correlations: z
    .array(correlation)
    .readonly()
    .optional()
    .describe('Inputs that are not independent; all others are taken as uncorrelated.'),
  tank: z
    .boolean()
    .optional()
    .describe('true: the H^+, OH^- and water that the tank gains or loses while the charge flows.'),
};
const sharedHalf = z.strictObject({ half: z.string(), share });
const halfField = z.string().describe('A half-reaction; where it conserves it is used as written.');
const electrodeField = z.array(sharedHalf).min(1).readonly().describe('Half-reactions that run in parallel.');

const inSeries = { species: amountsFields.species, given: given.optional(), want: amountsFields.want, medium, settle };
const seriesCell = z
  .union([
    z.strictObject({ half: halfField, ...inSeries }),
    z.strictObject({ electrode: electrodeField, ...inSeries }),
    z.strictObject({ cell: cellFieldsSchema, ...inSeries }),
  ])
  .describe('Another cell that the same charge flows through.');
const series = z
  .array(seriesCell)
  .min(1)
  .readonly()
  .optional()
  .describe(
    'Further cells in series with this one. The charge that one cell gives, by its current and time or by what was ' +
      'weighed in it (a coulometer), flows through all.',
  );

const balanced = { skeleton, medium, settle, per, irreducible, foldHydronium };

/** The ask of each kind that has one form; cells and amounts have several and are told apart by a field. */
export const askSchemas = {
  species: z.strictObject({ ask: z.literal('species'), ...common, text: z.string() }),
  equation: z.strictObject({ ask: z.literal('equation'), ...common, text: z.string(), foldHydronium }),
  half: z.strictObject({ ask: z.literal('half'), ...common, ...balanced }),
  redox: z.strictObject({ ask: z.literal('redox'), ...common, ...balanced }),
  composed: z.strictObject({ ask: z.literal('cell'), ...common, ...composed.shape, per, foldHydronium }),
  drawn: z.strictObject({ ask: z.literal('cell'), ...common, ...drawn.shape, per }),
  equationAudit: z.strictObject({ ask: z.literal('audit'), ...common, equation, medium, contributions, foldHydronium }),
  cellAudit: z.strictObject({
    ask: z.literal('audit'),
    ...common,
    anode: equation,
    cathode: equation,
    overall: equation,
    electrons: z.string().optional().describe('The electron number claimed for the overall reaction.'),
    medium,
    contributions,
    foldHydronium,
  }),
  halfAmounts: z.strictObject({
    ask: z.literal('amounts'),
    ...common,
    half: halfField,
    ...amountsFields,
    series,
  }),
  electrodeAmounts: z.strictObject({
    ask: z.literal('amounts'),
    ...common,
    electrode: electrodeField,
    ...amountsFields,
    series,
  }),
  cellAmounts: z.strictObject({
    ask: z.literal('amounts'),
    ...common,
    cell: cellFieldsSchema,
    ...amountsFields,
    series,
  }),
};

/** Every ask, as one schema: JSON Schema and OpenAPI come from it. */
export const askSchema = z.union([
  askSchemas.species,
  askSchemas.equation,
  askSchemas.half,
  askSchemas.redox,
  askSchemas.composed,
  askSchemas.drawn,
  askSchemas.equationAudit,
  askSchemas.cellAudit,
  askSchemas.halfAmounts,
  askSchemas.electrodeAmounts,
  askSchemas.cellAmounts,
]);

/** The kinds of ask, in the order of the contract. */
export const ASK_KINDS = ['species', 'equation', 'half', 'redox', 'cell', 'audit', 'amounts'] as const;

export type AskKind = (typeof ASK_KINDS)[number];
export type Ask = z.infer<typeof askSchema>;
export type AskOf<Kind extends AskKind> = Extract<Ask, { readonly ask: Kind }>;
export type AskedMedium = z.infer<typeof mediumSchema>;
export type CellFields = z.infer<typeof cellFieldsSchema>;
export type SeriesCell = z.infer<typeof seriesCell>;
export type AskedCorrelation = z.infer<typeof correlation>;
