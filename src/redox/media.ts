import { rational } from '../exact/rational.ts';
import { ONE } from '../exact/rational.ts';
import type { Atom } from '../notation/formula.ts';
import { type Species, countAtoms, plainCharge } from '../species/species.ts';
import type { MediumName } from './medium.ts';

/** A helper from its atoms in the order of its formula: `[['H', 2n], ['O', 1n]]`, charge number 0. */
const helper = (atoms: readonly (readonly [string, bigint])[], charge = 0n): Species => {
  const members = atoms.map(([symbol, count]): Atom => ({
    kind: 'atom',
    symbol,
    massNumber: null,
    count: rational(count),
  }));
  const parts = [{ multiplier: ONE, members }];
  const formula = atoms.map(([symbol, count]) => symbol + (count === 1n ? '' : String(count))).join('');
  const number = rational(charge);
  const key = formula + plainCharge(number);
  return { formula, parts, composition: countAtoms(parts), charge: number, state: null, key };
};

export const WATER = helper([
  ['H', 2n],
  ['O', 1n],
]);
export const PROTON = helper([['H', 1n]], 1n);
export const HYDROXIDE = helper(
  [
    ['O', 1n],
    ['H', 1n],
  ],
  -1n,
);
const CHLORIDE = helper([['Cl', 1n]], -1n);
const FLUORIDE = helper([['F', 1n]], -1n);
export const OXIDE = helper([['O', 1n]], -2n);
const NITRIDE = helper([['N', 1n]], -3n);
const CARBONATE = helper(
  [
    ['C', 1n],
    ['O', 3n],
  ],
  -2n,
);
const BICARBONATE = helper(
  [
    ['H', 1n],
    ['C', 1n],
    ['O', 3n],
  ],
  -1n,
);
const CARBON_DIOXIDE = helper([
  ['C', 1n],
  ['O', 2n],
]);
const AMMONIA = helper([
  ['N', 1n],
  ['H', 3n],
]);
const AMMONIUM = helper(
  [
    ['N', 1n],
    ['H', 4n],
  ],
  1n,
);
const AMIDE = helper(
  [
    ['N', 1n],
    ['H', 2n],
  ],
  -1n,
);

/** A built-in medium: what it lends, and how that is settled where it depends on itself. */
export interface MediumRow {
  readonly name: MediumName;
  /** In printing order, and in order of preference: one that depends on those before it is left out. */
  readonly helpers: readonly Species[];
  /** What the preference says, for the reader; only where the helpers depend on one another. */
  readonly preference?: string;
  /** Other words for it, for suggestions. */
  readonly alias: readonly string[];
}

/**
 * The built-in media. Common practice, no source: water with its two ions; for a melt the anion that the solvent
 * lends (Lux and Flood for oxide ions); carbon dioxide beside carbonate, as in a molten-carbonate fuel cell; liquid
 * ammonia and its ions; carbon dioxide and bicarbonate as the acid and base of a buffer of pH 6 to 9.
 */
export const MEDIA: readonly MediumRow[] = [
  { name: 'acid', helpers: [WATER, PROTON], alias: ['acidic'] },
  { name: 'base', helpers: [WATER, HYDROXIDE], alias: ['basic', 'alkaline', 'alkali'] },
  {
    name: 'neutral',
    helpers: [WATER, PROTON, HYDROXIDE],
    preference: 'H^+ and OH^- form but are not used up: balanced with H^+, or with OH^- where that is written',
    alias: ['water', 'aqueous'],
  },
  { name: 'none', helpers: [], alias: ['nothing', 'aprotic'] },
  { name: 'molten-chloride', helpers: [CHLORIDE], alias: ['chloride'] },
  { name: 'molten-oxide', helpers: [OXIDE], alias: ['oxide'] },
  { name: 'molten-carbonate', helpers: [CARBONATE, CARBON_DIOXIDE], alias: ['carbonate'] },
  { name: 'molten-fluoride', helpers: [FLUORIDE], alias: ['fluoride'] },
  { name: 'molten-nitride', helpers: [NITRIDE], alias: ['nitride'] },
  {
    name: 'ammonia',
    helpers: [AMMONIA, AMMONIUM, AMIDE],
    preference: 'balanced with NH3 and NH4^+; with NH2^- in place of NH4^+ where NH2^- is written',
    alias: ['liquid-ammonia'],
  },
  {
    name: 'bicarbonate',
    helpers: [WATER, CARBON_DIOXIDE, BICARBONATE, CARBONATE],
    preference: 'balanced with H2O, CO2 and HCO3^-; CO3^2- only where it is written',
    alias: ['hydrogencarbonate', 'bicarbonate-buffer'],
  },
];

/** The row of a built-in medium, or undefined. */
export const mediumRow = (name: string): MediumRow | undefined => MEDIA.find((row) => row.name === name);
