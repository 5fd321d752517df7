import type { Member } from '../notation/formula.ts';

/** Names that stand for formulas in one ask. Made by `readDefinitions` only. */
export interface Definitions {
  /** The members that each name stands for. */
  readonly members: ReadonlyMap<string, readonly Member[]>;
  /** The canonical spelling of each name with its charge: "EDTA^4-". */
  readonly spellings: ReadonlySet<string>;
  /** Equal where the definitions are equal: the key under which readings are kept. */
  readonly signature: string;
}
