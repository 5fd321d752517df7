import { assemble } from '../balance/assemble.ts';
import type { Reaction } from '../balance/reaction.ts';
import { proved } from '../balance/recount.ts';
import { type Verdict, solve } from '../balance/solve.ts';
import { type Unknown, coefficientNotes, unknownsOf } from '../balance/unknowns.ts';
import { type Note, note } from '../report/note.ts';
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
  readonly unknowns: readonly Unknown[];
  readonly verdict: Verdict;
}

/** Lends the helpers of `medium` to `skeleton` and solves; `electron`: e^- is an unknown. */
export const attempt = (skeleton: Equation, medium: Medium, electron: boolean): Attempt => {
  const loan = lend(medium, skeleton, electron);
  const unknowns = unknownsOf(skeleton, { helpers: loan.helpers, electron });
  const first: Attempt = { skeleton, medium, loan, unknowns, verdict: solve(unknowns) };
  return medium.name === 'neutral' ? turnWater(first) : first;
};

/** In a neutral medium written water may end on either side: where it cannot stand as written it is tried on the other. */
const turnWater = (first: Attempt): Attempt => {
  const { verdict } = first;
  if (verdict.kind !== 'wrong-side') return first;
  const wrong = first.unknowns[verdict.index];
  if (wrong === undefined || !sameSpecies(wrong.species, WATER)) return first;
  const turned: Unknown = { ...wrong, side: wrong.side === 'left' ? 'right' : 'left' };
  const unknowns = first.unknowns.map((unknown) => (unknown === wrong ? turned : unknown));
  return { ...first, unknowns, verdict: solve(unknowns) };
};

/** The reaction of whole numbers for the unknowns of an attempt: folded where the medium is neutral, and recounted. */
export const finish = ({ medium, unknowns }: Attempt, numbers: readonly bigint[]): Reaction => {
  const plain = { unknowns, numbers };
  const folded = medium.name === 'neutral' ? foldNeutral(plain) : plain;
  return proved(assemble(folded.unknowns, folded.numbers));
};

/** What the reader must know of a balance: coefficients ignored, species dropped, helpers settled by preference. */
export const notesOf = (tried: Attempt, reaction: Reaction): readonly Note[] => {
  const takesPart = (unknown: Unknown): boolean => reaction.terms.some((term) => term.species === unknown.species);
  const dropped = tried.unknowns.filter((one) => one.written && one.side === 'free' && !takesPart(one));
  const settled = tried.loan.leftOut.length > 0 && tried.unknowns.some((one) => one.helper && takesPart(one));
  return [
    ...coefficientNotes(tried.skeleton),
    ...dropped.map(({ species }) => {
      const name = plainSpecies(species);
      return note('species-dropped', `${name} is written on both sides, comes out at 0 and is left out.`);
    }),
    ...(settled ? [note('medium-preference', preferenceSentence(tried.medium, tried.loan))] : []),
  ];
};
