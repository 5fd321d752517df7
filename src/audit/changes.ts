import { type Rational, showRational } from '../exact/rational.ts';
import { type Species, plainSpecies } from '../species/species.ts';
import type { Draft, DraftTerm, Side } from './writing.ts';

/** One difference between what was written and its repair. */
export type Change =
  | { readonly kind: 'number'; readonly was: DraftTerm; readonly is: DraftTerm }
  | { readonly kind: 'moved'; readonly was: DraftTerm; readonly is: DraftTerm }
  | { readonly kind: 'respelled'; readonly was: DraftTerm; readonly is: DraftTerm }
  | { readonly kind: 'dropped'; readonly was: DraftTerm }
  | { readonly kind: 'added'; readonly is: DraftTerm };

/** The changes that take `before` to `after`, in the order of the terms as written, the added ones last. */
export const changesOf = (before: Draft, after: Draft): readonly Change[] => {
  const kept = before.flatMap((was, index): readonly Change[] => {
    const is = after.find(({ origin }) => origin === index);
    return is === undefined ? [{ kind: 'dropped', was }] : changesOfTerm(was, is);
  });
  return [...kept, ...after.flatMap((is): readonly Change[] => (is.origin === null ? [{ kind: 'added', is }] : []))];
};

const changesOfTerm = (was: DraftTerm, is: DraftTerm): readonly Change[] => [
  ...(is.side === was.side ? [] : [{ kind: 'moved', was, is } as const]),
  ...(is.species.key === was.species.key ? [] : [{ kind: 'respelled', was, is } as const]),
  ...(is.coefficient.equals(was.coefficient) ? [] : [{ kind: 'number', was, is } as const]),
];

/** A change in words: the contract's edit. `from` and `to` are numbers, sides or spellings. */
export interface Edit {
  /** The species as written, or the one added. */
  readonly term: string;
  readonly from: string;
  readonly to: string;
  /** What to do, as one would say it. */
  readonly text: string;
}

const counted = (coefficient: Rational, species: Species): string =>
  coefficient.n === coefficient.d ? plainSpecies(species) : `${showRational(coefficient)} ${plainSpecies(species)}`;

const onThe = (side: Side): string => `on the ${side}`;

/** `change` in words. */
export const editOf = (change: Change): Edit => {
  switch (change.kind) {
    case 'number': {
      const { was, is } = change;
      const [term, from, to] = [plainSpecies(was.species), showRational(was.coefficient), showRational(is.coefficient)];
      return { term, from, to, text: `${to} ${plainSpecies(is.species)} instead of ${from} ${onThe(is.side)}` };
    }
    case 'moved': {
      const { was, is } = change;
      const text = `move ${counted(was.coefficient, was.species)} from the ${was.side} to the ${is.side}`;
      return { term: plainSpecies(was.species), from: was.side, to: is.side, text };
    }
    case 'respelled': {
      const [from, to] = [plainSpecies(change.was.species), plainSpecies(change.is.species)];
      return { term: from, from, to, text: `${to} instead of ${from} ${onThe(change.was.side)}` };
    }
    case 'dropped': {
      const { coefficient, species, side } = change.was;
      const text = `drop ${counted(coefficient, species)} ${onThe(side)}`;
      return { term: plainSpecies(species), from: showRational(coefficient), to: '0', text };
    }
    case 'added': {
      const { coefficient, species, side } = change.is;
      const text = `add ${counted(coefficient, species)} ${onThe(side)}`;
      return { term: plainSpecies(species), from: '0', to: showRational(coefficient), text };
    }
  }
};
