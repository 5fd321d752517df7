/**
 * The rules by which repairs are ranked, all in one place.
 *
 * A repair is a set of edits to what was written. Each edit has a cost; the cost of a repair is the sum, and the
 * cheapest repair comes first. The costs say what a colleague says: one slip is likelier than two, a wrong number
 * likelier than a forgotten species, a forgotten water likelier than forgotten electrons, and an ion that nobody
 * knows (`Cr2O7^-`) is likelier a slip of the pen than the number beside it. Nothing here is measured physics: the
 * figures were set so that planted mistakes come back first, and the benchmark prints how often they do.
 *
 * | class | kind            | what was wrong                                                      |
 * |-------|-----------------|---------------------------------------------------------------------|
 * | 0     | `lowest-terms`  | nothing but a common factor                                         |
 * | 0     | `rounding`      | decimals that miss by their last digit only                         |
 * | 1     | `coefficients`  | numbers; the species and their sides stand                          |
 * | 2     | `electron-side` | the electrons stand on the wrong side                               |
 * | 2     | `term-side`     | another term stands on the wrong side                               |
 * | 3     | `medium-ion`    | H^+ typed for OH^- or back                                          |
 * | 4     | `helpers`       | water, a proton, a hydroxide or another helper forgotten, or one too many |
 * | 5     | `electrons`     | the electrons forgotten, or left in an overall reaction             |
 * | 6     | `species`       | one species mistyped: its charge, a subscript, a letter             |
 * | 7     | `term-dropped`  | a term too many that is no helper                                   |
 *
 * Equal costs are a tie, shown as one; the class then decides only which is printed first.
 *
 * | what is never offered, or not behind something sensible                        | instead                       |
 * |---------------------------------------------------------------------------------|-------------------------------|
 * | an unlisted species with a charge that its atoms are not known to bear (H2O^2+)  | never proposed                |
 * | an everyday species taken for an odd one: a radical (O), Na^-, an unlisted one   | only where nothing else is found |
 * | a species in no table brought in, where one repair has listed species throughout | dropped                       |
 *
 * Where more than half of the numbers are 1, hardly anything was claimed of them: one species is then taken for a near
 * one and the numbers are solved anew, first for species that look mistyped, and for any only where nothing sensible is
 * found. A species looks mistyped where it is no common one, or stands on both sides unchanged.
 */
export const REPAIR_KINDS = {
  'lowest-terms': { order: 0, words: 'divided by the common factor' },
  rounding: { order: 0, words: 'exact numbers in place of rounded decimals' },
  coefficients: { order: 1, words: 'other numbers for the same species' },
  'electron-side': { order: 2, words: 'the electrons moved to the other side' },
  'term-side': { order: 2, words: 'a term moved to the other side' },
  'medium-ion': { order: 3, words: 'the ion of the medium exchanged' },
  helpers: { order: 4, words: 'a helper of the medium added or dropped' },
  electrons: { order: 5, words: 'electrons added or dropped' },
  species: { order: 6, words: 'one species spelled otherwise' },
  'term-dropped': { order: 7, words: 'a term dropped' },
} as const;

/** The kind of a repair. */
export type RepairKind = keyof typeof REPAIR_KINDS;

/** What each edit costs. */
export const EDIT_COSTS = {
  /** A number that was written is changed. */
  writtenNumber: 1,
  /** A number where none was written: left out, not wrong. */
  unwrittenNumber: 0.8,
  /** The same in an equation without any number, once no species looks mistyped: nobody claimed the numbers. */
  skeletonNumber: 0.15,
  /** Left in such an equation: a species that looks mistyped. */
  suspectInSkeleton: 0.7,
  /** Per doubling or halving of a number; so that the smallest change comes first. */
  perDoubling: 0.01,
  electronMoved: 1.05,
  helperMoved: 1.3,
  termMoved: 1.6,
  /** H^+ for OH^- or back; less where the medium is given and the ion is foreign to it. */
  ionExchanged: 1.1,
  foreignIonExchanged: 0.9,
  helperAdded: 1.2,
  /** A second helper added together with the first. */
  furtherHelper: 0.7,
  helperDropped: 1.25,
  /** H^+ dropped where OH^- is written too, or back. */
  oneOfBothIonsDropped: 0.25,
  electronsAdded: 1.4,
  /** The same in an overall reaction, which needs none. */
  electronsAddedInVain: 2.4,
  electronsDropped: 1.1,
  termDropped: 1.7,
  /** Per unit of charge or atom by which a species changes, after the first. */
  perFurtherUnit: 0.08,
  /** Charge and atoms change both: two slips in one species. */
  chargeAndAtoms: 0.9,
  /** An element comes in or goes: more than a subscript. */
  otherElements: 0.4,
  /** A species written on both sides, no helper, is left there unchanged: one of the two was meant otherwise. */
  leftOnBothSides: 0.6,
  /** A solid, a liquid or a gas becomes an ion. */
  ionInBulk: 1,
  /** Taken off where an element of single atoms is written as dissolved: its charge was left out. */
  dissolvedElement: 0.7,
} as const;

/**
 * What it costs to take one species for another, by how well both are known. A salt is one whose ions cancel though no
 * table holds it: likelier meant than an unlisted species, less likely than a common one.
 */
export const RESPELLING_COSTS = {
  common: { common: 1.5, salt: 2.4, other: 3 },
  salt: { common: 0.75, salt: 1.5, other: 1.8 },
  rare: { common: 0.5, salt: 1.5, other: 2 },
  unlisted: { common: 0.75, salt: 1.1, other: 1.8 },
  'unlisted-ion': { common: 0.12, salt: 0.5, other: 1.8 },
} as const;

/** Costs that differ by less are a tie. */
export const TIE = 0.005;

/** The most repairs that an audit shows. */
export const MOST_REPAIRS = 6;

/**
 * A re-solve is improbable where more than `share` of the numbers change and the largest grows over `growth` times,
 * unless no number was written at all and no species looks mistyped.
 */
export const IMPROBABLE = { share: 0.5, growth: 4 } as const;
