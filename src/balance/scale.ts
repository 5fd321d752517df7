import { gcdOf, lcmOf } from '../exact/integer.ts';
import { type Rational, denominatorOf, numeratorOf, rational } from '../exact/rational.ts';
import { type Species, ELECTRON, sameSpecies } from '../species/species.ts';
import type { Reaction } from './reaction.ts';

/** Each stoichiometric number of `reaction` times `factor`, which must not be 0. */
export const scaled = (reaction: Reaction, factor: Rational): Reaction => ({
  terms: reaction.terms.map(({ species, nu }) => ({ species, nu: nu.mul(factor) })),
});

/** What takes `reaction` to lowest whole numbers: least common denominator over greatest common numerator. */
export const wholeFactor = (reaction: Reaction): Rational => {
  const numbers = reaction.terms.map(({ nu }) => nu);
  const common = gcdOf(numbers.map(numeratorOf));
  // gcd(n_i/d_i) = gcd(n_i) / lcm(d_i) for fractions in lowest terms
  return rational(lcmOf(numbers.map(denominatorOf)), common === 0n ? 1n : common);
};

/** `reaction` in lowest whole numbers. */
export const lowestWhole = (reaction: Reaction): Reaction => scaled(reaction, wholeFactor(reaction));

/** What takes the number of `species` to 1 or -1. Undefined where it takes no part. */
export const factorPerMole = (reaction: Reaction, species: Species): Rational | undefined =>
  reaction.terms
    .find((one) => sameSpecies(one.species, species))
    ?.nu.abs()
    .inverse();

/** `reaction` per mole of `species`: its number becomes 1 or -1, the others fractions. Undefined where it takes no part. */
export const perMole = (reaction: Reaction, species: Species): Reaction | undefined => {
  const factor = factorPerMole(reaction, species);
  return factor === undefined ? undefined : scaled(reaction, factor);
};

/** A half-reaction per electron. Undefined where it exchanges none. */
export const perElectron = (reaction: Reaction): Reaction | undefined => perMole(reaction, ELECTRON);
