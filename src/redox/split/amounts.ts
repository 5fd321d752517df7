import type { Reaction, Term } from '../../balance/reaction.ts';
import { type Rational, ZERO, isZero } from '../../exact/rational.ts';

/** Stoichiometric numbers by the key of their species, in the order in which the species came in; states aside. */
export type Amounts = ReadonlyMap<string, Term>;

/** The terms of several lists added up, each times its factor; what comes to 0 goes. */
export const sumOfTerms = (lists: readonly (readonly [readonly Term[], Rational])[]): Amounts => {
  const sums = new Map<string, Term>();
  for (const [terms, factor] of lists) {
    for (const { species, nu } of terms) {
      const known = sums.get(species.key);
      sums.set(species.key, { species: known?.species ?? species, nu: (known?.nu ?? ZERO).add(nu.mul(factor)) });
    }
  }
  return new Map([...sums].filter(([, { nu }]) => !isZero(nu)));
};

/** The terms of `amounts`. */
export const termsOf = (amounts: Amounts): readonly Term[] => [...amounts.values()];

/** True where one formula stands in two states, which `Amounts` cannot tell apart. */
export const hasTwoStates = (reaction: Reaction): boolean =>
  new Set(reaction.terms.map((term) => term.species.key)).size < reaction.terms.length;
