import type { Reaction, Term } from '../balance/reaction.ts';
import { isZero, signOf } from '../exact/rational.ts';
import type { Medium } from '../redox/medium.ts';
import { type Note, note } from '../report/note.ts';
import { type Species, plainSpecies, plainWithState } from '../species/species.ts';
import type { CellReaction } from './cell-reaction.ts';

/** Notes on a composed cell: `media-differ` where nothing keeps the electrodes apart, `states-differ`, `nothing-left`. */
export const cellNotes = (cell: CellReaction): readonly Note[] => {
  const notes: Note[] = [];
  if (cell.crossing === null && mediaOf(cell).size > 1) notes.push(mediaDiffer(!isZero(cell.waterFormed)));
  notes.push(...statesThatDiffer(cell.overall));
  if (cell.overall.terms.length === 0) notes.push(nothingLeft());
  return notes;
};

/** The media that lend anything, each by its helpers. */
const mediaOf = ({ anode, cathode }: CellReaction): ReadonlySet<string> =>
  new Set([...anode, ...cathode].map(({ half }) => helperKeys(half.medium)).filter((keys) => keys !== ''));

const helperKeys = (medium: Medium): string =>
  medium.helpers
    .map((helper) => helper.key)
    .sort()
    .join(' ');

const mediaDiffer = (folded: boolean): Note =>
  note(
    'media-differ',
    folded
      ? 'the half-reactions stand in different media; their H^+ and OH^- were folded into water all the same. ' +
          'With a separator between the electrodes they would not meet'
      : 'the half-reactions stand in different media; without a separator between the electrodes they mix',
  );

const nothingLeft = (): Note =>
  note('nothing-left', 'everything cancels: the electrodes differ in concentration or pressure only');

/** One note for each species that stands on the left in one state and on the right in another. */
const statesThatDiffer = (overall: Reaction): readonly Note[] => {
  const isReactant = ({ nu }: Term): boolean => signOf(nu) < 0n;
  return overall.terms.filter(isReactant).flatMap(({ species }) => {
    const twin = overall.terms.find((other) => !isReactant(other) && other.species.key === species.key);
    return twin === undefined ? [] : [statesDiffer(species, twin.species)];
  });
};

const statesDiffer = (one: Species, other: Species): Note =>
  note(
    'states-differ',
    `${plainWithState(one)} and ${plainWithState(other)} are both written: ${plainSpecies(one)} was not cancelled`,
  );
