import * as z from 'zod';

const text = z.string();
const medium = z
  .union([text, z.strictObject({ helpers: z.array(text).readonly() })])
  .optional()
  .describe('"acid", "base", "neutral", "none", a melt, or {helpers: [...]}.');

const reaction = z.union([
  text,
  z.strictObject({ skeleton: text, medium, share: text.optional(), settle: text.optional() }),
]);
const electrode = z.array(reaction).min(1).readonly();

/** Every quantity that a run may state, as text with its unit; what was weighed goes into `weighed`. */
export const runQuantities = {
  current: text.optional(),
  current_density: text.optional(),
  area: text.optional(),
  charge: text.optional(),
  time: text.optional(),
  efficiency: text.optional(),
  blank: text.optional(),
  temperature: text.optional(),
  pressure: text.optional(),
  vapour_pressure: text.optional(),
  voltage: text.optional(),
  density: text.optional(),
  volume: text.optional(),
  from: text.optional(),
  to: text.optional(),
};

/** One run of a tank. */
export const runSchema = z.strictObject({
  label: text,
  product: text.optional().describe('The species that the efficiency and the weighing are about.'),
  ...runQuantities,
  weighed: text.optional().describe('The mass of the product that was found: "4.82 kg".'),
  note: text.optional(),
});

/** One tank of a plant. */
export const tankSchema = z.strictObject({
  name: text,
  purpose: text.optional(),
  product: text.optional().describe('What the tank is run for; left out: the first product of the cathode.'),
  medium,
  anode: electrode,
  cathode: electrode,
  separator: z.enum(['true', 'false', 'yes', 'no']).optional(),
  runs: z.array(z.unknown()).readonly().optional(),
});

/** The head of a sheet; its tanks are read one by one, so that a fault in one does not lose the others. */
export const sheetSchema = z.strictObject({
  plant: text,
  figures: z.enum(['measured', 'invented']).optional().describe('"invented": every page says so.'),
  about: text.optional(),
  where: z.record(text, text).optional(),
  define: z.record(text, text).optional(),
  cells: z.array(z.unknown()).min(1).readonly(),
});

export type SheetRun = z.infer<typeof runSchema>;
export type SheetTank = z.infer<typeof tankSchema>;
export type SheetHead = z.infer<typeof sheetSchema>;
