import { speciesMatrix } from '../balance/matrix.ts';
import { independentColumns } from '../exact/matrix.ts';
import type { Equation } from '../species/equation.ts';
import { type Species, ELECTRON, plainSpecies, sameSpecies } from '../species/species.ts';
import { HYDROXIDE, PROTON, mediumRow } from './media.ts';
import type { Medium } from './medium.ts';

/** The helpers that a medium lends to one skeleton. */
export interface Loan {
  readonly helpers: readonly Species[];
  /** Left out by the printed preference of a built-in medium. */
  readonly leftOut: readonly Species[];
}

/**
 * What `medium` lends to `skeleton`. Where the helpers of a built-in medium depend on one another, those written stay
 * and of the others each that depends on what came before is left out. A user's list is lent whole: exactly these.
 * `electron`: e^- is an unknown beside them.
 */
export const lend = (medium: Medium, skeleton: Equation, electron: boolean): Loan => {
  if (medium.name === 'neutral') return lendNeutral(skeleton);
  if (medium.name === null) return { helpers: medium.helpers, leftOut: [] };
  const written = medium.helpers.filter((one) => isWritten(one, skeleton));
  const spare = medium.helpers.filter((one) => !isWritten(one, skeleton));
  const fixed = [...(electron ? [ELECTRON] : []), ...written];
  const kept = independentColumns(speciesMatrix([...fixed, ...spare]).rows);
  const leftOut = spare.filter((_, index) => !kept.includes(fixed.length + index));
  return { helpers: medium.helpers.filter((one) => !leftOut.includes(one)), leftOut };
};

/** True where `species` stands in the text of `skeleton`. */
export const isWritten = (species: Species, skeleton: Equation): boolean =>
  [...skeleton.left, ...skeleton.right].some((term) => sameSpecies(term.species, species));

/** As in acid; with OH^- in place of H^+ where OH^- is written and H^+ is not. */
const lendNeutral = (skeleton: Equation): Loan => {
  const asBase = isWritten(HYDROXIDE, skeleton) && !isWritten(PROTON, skeleton);
  const without = asBase ? PROTON : HYDROXIDE;
  const helpers = mediumRow('neutral')?.helpers ?? [];
  return { helpers: helpers.filter((one) => one !== without), leftOut: asBase ? [PROTON] : [] };
};

/** The sentence of a built-in medium's preference, with what it left out. */
export const preferenceSentence = (medium: Medium, loan: Loan): string => {
  const preference = mediumRow(medium.name ?? '')?.preference ?? '';
  return `The helpers of ${medium.name ?? 'the medium'} depend on one another: ${preference}. Left out here: ${loan.leftOut
    .map(plainSpecies)
    .join(', ')}.`;
};
