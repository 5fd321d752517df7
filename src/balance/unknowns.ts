import { type Note, note } from '../report/note.ts';
import type { Span } from '../report/span.ts';
import type { Equation, EquationTerm } from '../species/equation.ts';
import { type Species, ELECTRON, isElectron, sameSpecies } from '../species/species.ts';

/** A species whose stoichiometric number is sought. */
export interface Unknown {
  readonly species: Species;
  /** Where it must stand, and take part; `free`: on either side, or not at all. */
  readonly side: 'left' | 'right' | 'free';
  /** It stands in the skeleton. */
  readonly written: boolean;
  /** It is one of the medium's helpers, written or not. */
  readonly helper: boolean;
  /** Of the term that wrote it first. */
  readonly span?: Span;
}

/** What else may take part. */
export interface Lent {
  readonly helpers: readonly Species[];
  /** The electron is an unknown too: in a half-reaction. */
  readonly electron: boolean;
}

/**
 * The unknowns of a skeleton in printing order: its species as written, left then right, then the helpers that are not
 * written, in their order, and the electron last. Equal species on one side are merged; a species on both sides is free.
 */
export const unknownsOf = (skeleton: Equation, lent: Lent): readonly Unknown[] => {
  const written: Unknown[] = [];
  const add = (term: EquationTerm, side: 'left' | 'right'): void => {
    const at = written.findIndex((unknown) => sameSpecies(unknown.species, term.species));
    const known = written[at];
    if (known === undefined) {
      const helper = lent.helpers.some((one) => sameSpecies(one, term.species));
      written.push({ species: term.species, side, written: true, helper, span: term.span });
    } else {
      // the state, where only one of the two writes it, is kept: a third in another state stays apart
      const species = known.species.state === null ? term.species : known.species;
      written[at] = { ...known, species, side: known.side === side ? side : 'free' };
    }
  };
  for (const term of skeleton.left) add(term, 'left');
  for (const term of skeleton.right) add(term, 'right');
  return arrange(written, lent);
};

const arrange = (written: readonly Unknown[], lent: Lent): readonly Unknown[] => {
  const stands = (species: Species): boolean => written.some((unknown) => sameSpecies(unknown.species, species));
  const spare = (species: Species): Unknown => ({ species, side: 'free', written: false, helper: true });
  const helpers = lent.helpers.filter((one) => !stands(one)).map(spare);
  const electrons = written.filter((unknown) => isElectron(unknown.species));
  if (electrons.length === 0 && lent.electron) electrons.push({ ...spare(ELECTRON), helper: false });
  return [...written.filter((unknown) => !isElectron(unknown.species)), ...helpers, ...electrons];
};

/** Coefficients of a skeleton are ignored, which is said. */
export const coefficientNotes = (skeleton: Equation): readonly Note[] =>
  [...skeleton.left, ...skeleton.right].some((term) => term.coefficientWritten)
    ? [note('coefficients-ignored', 'The coefficients of a skeleton are ignored; they are found anew.')]
    : [];
