import { type Rational, showRational, signOf } from '../exact/rational.ts';
import { type Note, note } from '../report/note.ts';

/** What is to be said of an electron number that was claimed: it is no positive number, or another was found. */
export const claimNotes = (claimed: Rational | null, found: Rational | null): readonly Note[] => {
  if (claimed !== null && signOf(claimed) <= 0n) return [noNumber(claimed, found)];
  return claimed === null || found === null || claimed.equals(found)
    ? []
    : [note('electrons-claimed', `${showRational(found)} electrons are exchanged, not ${showRational(claimed)}.`)];
};

/** An electron number is the count of electrons exchanged, whichever way they go. */
const noNumber = (claimed: Rational, found: Rational | null): Note => {
  const exchanged = found === null ? '' : ` ${showRational(found)} electrons are exchanged.`;
  return note('electrons-claimed', `An electron number is positive, ${showRational(claimed)} is none.${exchanged}`);
};
