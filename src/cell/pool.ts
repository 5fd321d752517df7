import type { Reaction } from '../balance/reaction.ts';
import { type Rational, ZERO } from '../exact/rational.ts';
import { type Species, isElectron } from '../species/species.ts';

/**
 * The distinct species of several reactions, each in its place. One formula in two states takes two places;
 * where no state is written the species takes the place of the first state that is, since it may be either.
 */
export interface Pool {
  readonly species: readonly Species[];
  readonly placeOf: (species: Species) => number;
}

/** The pool of these reactions, electrons left out, in the order in which the species first appear. */
export const poolOf = (reactions: readonly Reaction[]): Pool => {
  const all = reactions.flatMap((reaction) => reaction.terms.map((term) => term.species)).filter((s) => !isElectron(s));
  const species: Species[] = [];
  const exact = new Map<string, number>();
  const first = new Map<string, number>();
  for (const one of all.map((each) => statedTwin(each, all))) {
    if (exact.has(inState(one))) continue;
    exact.set(inState(one), species.length);
    if (!first.has(one.key)) first.set(one.key, species.length);
    species.push(one);
  }
  const placeOf = (one: Species): number =>
    exact.get(inState(one)) ?? (one.state === null ? first.get(one.key) : undefined) ?? -1;
  return { species, placeOf };
};

/** A species without a state stands for the first of its kind that has one. */
const statedTwin = (one: Species, all: readonly Species[]): Species =>
  one.state !== null ? one : (all.find((other) => other.key === one.key && other.state !== null) ?? one);

const inState = (species: Species): string => `${species.key} in ${species.state ?? 'any state'}`;

/** How much of each species of the pool the reaction makes (positive) or uses (negative). */
export const amountsIn = (pool: Pool, reaction: Reaction): readonly Rational[] => {
  const amounts = pool.species.map(() => ZERO);
  for (const { species, nu } of reaction.terms) {
    const place = isElectron(species) ? -1 : pool.placeOf(species);
    if (place >= 0) amounts[place] = (amounts[place] ?? ZERO).add(nu);
  }
  return amounts;
};
