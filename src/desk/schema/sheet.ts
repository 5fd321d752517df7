import * as z from 'zod';

const text = z.string().min(1);
const quantity = (example: string) => z.string().min(1).optional().describe(`A quantity with its unit: "${example}".`);

const medium = z
  .union([text, z.strictObject({ helpers: z.array(text).readonly() })])
  .optional()
  .describe(
    '"acid", "base", "neutral", "none", a melt, or {helpers: [...]}: exactly these. Left out: acid, with a note.',
  );

const reaction = z
  .union([
    text.describe('A skeleton: "Cu^2+ -> Cu"; coefficients are found, not written.'),
    z
      .strictObject({
        skeleton: text.describe('Reactants -> products: "Zn(OH)4^2- -> Zn".'),
        medium,
        share: text.optional().describe('The part of the current that this reaction takes: "92 %".'),
        settle: text.optional().describe('Which of several balances is meant: the text that was offered.'),
      })
      .describe('A skeleton with its own medium or share.'),
  ])
  .describe('One reaction of an electrode.');
const electrode = z.array(reaction).min(1).readonly();

/** What makes the charge, and what the gas stands under: the same for runs and goals. */
const conditions = {
  current: quantity('250 A'),
  current_density: quantity('2 A/dm^2'),
  area: quantity('40 dm^2'),
  efficiency: quantity('94 %'),
  temperature: quantity('25 °C'),
  pressure: quantity('101.325 kPa'),
  vapour_pressure: quantity('3.2 kPa'),
  voltage: quantity('2.1 V'),
  density: quantity('8.96 g/cm^3').describe('Of the deposit, for its thickness; or of the solution, for mg/kg.'),
};

const product = text
  .optional()
  .describe('The species that the efficiency is about; left out: the product of the tank.');

/** A logged current: a file beside the sheet, and what its header does not say. */
const recordSchema = z.union([
  text.describe('The path of a CSV file, seen from the sheet: "logs/monday.csv".'),
  z.strictObject({
    file: text.describe('The path of a CSV file, seen from the sheet.'),
    time: text.optional().describe('The column of time, by name or number from 1.'),
    current: text.optional().describe('The column of current, by name or number from 1.'),
    time_unit: text.optional(),
    current_unit: text.optional(),
    decimal: z.enum(['point', 'comma']).optional(),
    rule: z.enum(['trapezoid', 'hold']).optional(),
    gap: text.optional().describe('A step longer than this is a gap: "30 s".'),
    gap_charge: z.enum(['count', 'skip']).optional(),
    zero: text.optional().describe('A current of this size or less is a pause: "50 mA".'),
    meter: text.optional().describe('One standard uncertainty of the logged current, relative: "0.5 %".'),
  }),
]);

/** One run of a tank. */
export const runSchema = z
  .strictObject({
    label: text.describe('What the run is called.'),
    product,
    record: recordSchema.optional().describe('The logged current of the run; it gives the charge and the time.'),
    charge: quantity('1500 A h'),
    time: quantity('6 h 30 min'),
    ...conditions,
    blank: quantity('2 A h').describe('Charge that a run without the product takes; subtracted before efficiency.'),
    volume: quantity('200 L').describe('Of the gas, or of the tank where from and to are given.'),
    from: quantity('12 g/L').describe('Concentration of the product at the start.'),
    to: quantity('0.4 g/L').describe('Concentration of the product at the end.'),
    weighed: quantity('2.060(2) kg').describe('The mass of the product that was found; gives the current efficiency.'),
    note: text.optional(),
  })
  .describe('One run: any quantities that are known; what follows from them is answered.');

/** One goal of a tank. */
export const targetSchema = z
  .strictObject({
    goal: text.describe('What is wanted: "2 kg by 16:00", "12 µm", "40 L of H2 by 2026-05-04 16:00".'),
    label: text.optional(),
    product,
    start: text.optional().describe('When the current starts: "08:00", or with its date "2026-05-04 08:00".'),
    ...conditions,
  })
  .describe(
    'A goal: with a current the time it needs, with start and end the current it needs, and whether it is met.',
  );

/** One tank of a plant. */
export const tankSchema = z
  .strictObject({
    name: text.describe('Each tank has its own.'),
    purpose: text.optional(),
    product: text.optional().describe('What the tank is run for; left out: the first product of the cathode.'),
    medium,
    anode: electrode.describe('The reactions of the anode: oxidations.'),
    cathode: electrode.describe('The reactions of the cathode: reductions.'),
    separator: z
      .enum(['true', 'false', 'yes', 'no'])
      .optional()
      .describe('yes: the electrolytes do not mix, nothing folds to water.'),
    present: z
      .array(text)
      .readonly()
      .optional()
      .describe('Species that are there and take no part; the cautions know them: ["CN^-"].'),
    mode: z
      .enum(['electrolysis', 'galvanic', 'charging'])
      .optional()
      .describe('What drives the current; left out: electrolysis.'),
    runs: z.array(z.unknown()).readonly().optional(),
    targets: z.array(z.unknown()).readonly().optional(),
  })
  .describe('One tank: its electrodes, its runs and its goals.');

/** The head of a sheet; its tanks are read one by one, so that a fault in one does not lose the others. */
export const sheetSchema = z
  .strictObject({
    plant: text.describe('The name of the plant.'),
    figures: z.enum(['measured', 'invented']).optional().describe('"invented": every page says so.'),
    about: text.optional(),
    where: z.record(z.string(), text).optional().describe('Unknown subscripts: {x: "0.4"}.'),
    define: z.record(z.string(), text).optional().describe('Named species: {EDTA^4-: C10H12N2O8^4-}.'),
    cells: z.array(z.unknown()).min(1).readonly().describe('The tanks.'),
  })
  .describe('A plant: its tanks, what runs in them, and what came of it. Quantities are text with a unit.');

/** The sheet as one schema, for editors: what the parts are checked against one by one stands in its place. */
export const wholeSheetSchema = z
  .strictObject({
    ...sheetSchema.shape,
    cells: z
      .array(
        z.strictObject({
          ...tankSchema.shape,
          runs: z.array(runSchema).readonly().optional(),
          targets: z.array(targetSchema).readonly().optional(),
        }),
      )
      .min(1)
      .readonly()
      .describe('The tanks.'),
  })
  .describe(sheetSchema.description ?? '');

export type SheetRun = z.infer<typeof runSchema>;
export type SheetTarget = z.infer<typeof targetSchema>;
export type SheetTank = z.infer<typeof tankSchema>;
export type SheetHead = z.infer<typeof sheetSchema>;
export type RecordSource = z.infer<typeof recordSchema>;
