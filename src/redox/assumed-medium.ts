import { type Note, note } from '../report/note.ts';
import { plainSpecies } from '../species/species.ts';
import type { Medium } from './medium.ts';
import type { RedoxSplit } from './split/split.ts';

/**
 * `notes`, with the one that says that acid was assumed made to tell where the halves stand, if that is elsewhere: those
 * of a molecular skeleton are in base where it shows a hydroxide.
 */
export const withMediumOfHalves = (notes: readonly Note[], split: RedoxSplit): readonly Note[] => {
  const elsewhere = [split.oxidation, split.reduction]
    .flatMap((half) => (half === null ? [] : [half.half.medium]))
    .find(({ name }) => name !== 'acid');
  if (elsewhere === undefined) return notes;
  const message = `No medium was given: the skeleton was balanced as in acid, and its halves stand ${placeOf(elsewhere)}.`;
  return notes.map((one) => (one.code === 'medium-assumed' ? note('medium-assumed', message) : one));
};

const placeOf = ({ name, helpers }: Medium): string => {
  const lent = helpers.map(plainSpecies).join(', ');
  return name === null ? `beside ${lent}` : `in the medium ${name} (${lent})`;
};
