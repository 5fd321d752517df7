/** The bounds of reading: whatever is pasted, an answer comes in well under a second. The README states them. */
export const LIMITS = {
  /** Code points of one equation, skeleton or cell diagram. */
  equationLength: 20_000,
  /** Code points of one species. */
  speciesLength: 1_000,
  /** Brackets inside brackets. */
  nesting: 32,
  /** Digits of one number. */
  digits: 40,
  /** Ways to read one spelling; beyond them it is `too-hard`. */
  readings: 64,
  /** Signs in a charge of signs alone: Fe+++. */
  signRun: 9,
  /** Places in one species where digits and a period can be taken in two ways: each doubles the readings. */
  doubtfulPeriods: 5,
  /** Plus signs inside one species (charges, subscripts such as 2n+2). */
  plusSigns: 12,
  /** Plus signs in a row of terms without spaces that may be charges as well. */
  doubtfulSigns: 100,
  /** Placements of plus signs that are told apart; two are enough to refuse. */
  placements: 4,
  /** Species readings kept for reuse, and the length of a text worth keeping. */
  remembered: 2_000,
  rememberedLength: 200,
  /** Lexers kept for asks with names of their own. */
  rememberedLexers: 16,
  /** Letters and digits of a defined name. */
  nameLength: 40,
  /** Definitions in one ask. */
  definitions: 200,
} as const;
