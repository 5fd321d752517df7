import { type Rational, isZero, showRational, signOf } from '../exact/rational.ts';
import { ONE } from '../exact/rational.ts';
import type { ShownReaction } from '../report/fault.ts';
import { type Species, plainSpecies, plainWithState } from '../species/species.ts';

/** A species with its stoichiometric number: nu < 0 for a reactant (IUPAC Green Book). Never 0. */
export interface Term {
  readonly species: Species;
  readonly nu: Rational;
}

/** A reaction: its terms in the order in which they are printed, reactants first. */
export interface Reaction {
  readonly terms: readonly Term[];
}

/** The reactants, or the products, in printing order. */
export const sideOf = (reaction: Reaction, side: 'left' | 'right'): readonly Term[] =>
  reaction.terms.filter((term) => signOf(term.nu) === (side === 'left' ? -1n : 1n));

const plainTerm = (term: Term): string => {
  const size = term.nu.abs();
  return (size.equals(ONE) ? '' : `${showRational(size)} `) + plainWithState(term.species);
};

/** The canonical plain spelling; "" where nothing is left. */
export const plainReaction = (reaction: Reaction): string => {
  const terms = reaction.terms.filter((term) => !isZero(term.nu));
  if (terms.length === 0) return '';
  const side = (which: 'left' | 'right'): string => sideOf({ terms }, which).map(plainTerm).join(' + ');
  return `${side('left')} -> ${side('right')}`;
};

/** The contract's REACTION. */
export const showReaction = (reaction: Reaction): ShownReaction => ({
  plain: plainReaction(reaction),
  terms: reaction.terms.map((term) => ({
    species: plainSpecies(term.species),
    nu: showRational(term.nu),
    state: term.species.state,
  })),
});
