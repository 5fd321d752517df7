import { assemble } from '../balance/assemble.ts';
import type { Reaction } from '../balance/reaction.ts';
import { proved } from '../balance/recount.ts';
import { type Verdict, solve } from '../balance/solve.ts';
import { type Unknown, coefficientNotes, unknownsOf } from '../balance/unknowns.ts';
import { type Note, note } from '../report/note.ts';
import { type Meter, startMeter } from '../exact/bounds.ts';
import type { Equation } from '../species/equation.ts';
import { plainSpecies, sameSpecies } from '../species/species.ts';
import { type Loan, lend, preferenceSentence } from './lend.ts';
import { WATER } from './media.ts';
import type { Medium } from './medium.ts';
import { foldNeutral } from './neutral.ts';

/** A skeleton in its medium, with what conservation says of it. */
export interface Attempt {
  readonly skeleton: Equation;
  readonly medium: Medium;
  readonly loan: Loan;
  /** What is sought. In a neutral medium written water is free here, since it may end on either side. */
  readonly unknowns: readonly Unknown[];
  /** The same, each on the side where it is written. */
  readonly asWritten: readonly Unknown[];
  readonly verdict: Verdict;
  /** Counts all work that is spent on it. */
  readonly meter: Meter;
}

/** Lends the helpers of `medium` to `skeleton` and solves; `electron`: e^- is an unknown. */
export const attempt = (
  skeleton: Equation,
  medium: Medium,
  electron: boolean,
  meter: Meter = startMeter(),
): Attempt => {
  const loan = lend(medium, skeleton, electron);
  const asWritten = unknownsOf(skeleton, { helpers: loan.helpers, electron });
  const unknowns = medium.name === 'neutral' ? asWritten.map(freeWater) : asWritten;
  const verdict = solve(unknowns, meter);
  const idle = verdict.kind === 'unique' ? idleWater({ medium, asWritten }, verdict.numbers) : -1;
  const known: Verdict = idle === -1 ? verdict : { kind: 'idle-species', index: idle };
  return { skeleton, medium, loan, unknowns, asWritten, verdict: known, meter };
};

const isWater = (unknown: Unknown): boolean => sameSpecies(unknown.species, WATER);

const freeWater = (unknown: Unknown): Unknown => (isWater(unknown) ? { ...unknown, side: 'free' } : unknown);

/** Freed water must still take part, as in acid or once H^+ is folded; -1 where it does or is not asked to. */
const idleWater = (
  { medium, asWritten }: Pick<Attempt, 'medium' | 'asWritten'>,
  numbers: readonly bigint[],
): number => {
  if (medium.name !== 'neutral') return -1;
  const folded = foldNeutral({ unknowns: asWritten, numbers }).numbers;
  return asWritten.findIndex(
    (unknown, index) => isWater(unknown) && unknown.side !== 'free' && numbers[index] === 0n && folded[index] === 0n,
  );
};

/** The reaction of whole numbers for the unknowns of an attempt: folded where the medium is neutral, and recounted. */
export const finish = ({ medium, unknowns }: Attempt, numbers: readonly bigint[]): Reaction => {
  const plain = { unknowns, numbers };
  const folded = medium.name === 'neutral' ? foldNeutral(plain) : plain;
  return proved(assemble(folded.unknowns, folded.numbers));
};

/** What the reader must know of a balance: coefficients ignored, species dropped, helpers settled by preference. */
export const notesOf = (tried: Attempt, reaction: Reaction): readonly Note[] => {
  const takesPart = ({ species }: Unknown): boolean => reaction.terms.some((term) => term.species === species);
  const settled = tried.loan.leftOut.length > 0 && tried.asWritten.some((one) => one.helper && takesPart(one));
  return [
    ...coefficientNotes(tried.skeleton),
    ...tried.asWritten.filter((one) => one.written && !takesPart(one)).map(droppedNote),
    ...(settled ? [note('medium-preference', preferenceSentence(tried.medium, tried.loan))] : []),
  ];
};

const droppedNote = ({ species, side }: Unknown): Note => {
  const why = side === 'free' ? 'is written on both sides, comes out at 0' : 'is used up as it forms';
  return note('species-dropped', `${plainSpecies(species)} ${why} and is left out.`);
};
