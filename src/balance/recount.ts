import type { Reaction } from './reaction.ts';
import type { Member } from '../notation/formula.ts';
import { type Rational, ZERO, isZero } from '../exact/rational.ts';

/**
 * Right minus left of each element or nuclide and of the charge (key `charge`), zeros left out: counted anew from the
 * spelled parts of each term, member by member. It uses neither the compositions nor the matrix that the solver used.
 */
export const residualOf = (reaction: Reaction): ReadonlyMap<string, Rational> => {
  const residual = new Map<string, Rational>();
  const add = (key: string, value: Rational): void => {
    residual.set(key, (residual.get(key) ?? ZERO).add(value));
  };
  for (const { species, nu } of reaction.terms) {
    for (const part of species.parts) {
      for (const member of part.members) walk(member, nu.mul(part.multiplier), add);
    }
    add('charge', species.charge.mul(nu));
  }
  return new Map([...residual].filter(([, value]) => !isZero(value)));
};

/** Down to the atoms; the counts on the way multiply. */
const walk = (member: Member, times: Rational, add: (key: string, value: Rational) => void): void => {
  const count = times.mul(member.count);
  if (member.kind === 'atom') add((member.massNumber ?? '') + member.symbol, count);
  else for (const inner of member.members) walk(inner, count, add);
};

/** True where the recount finds nothing left over. */
export const isConserved = (reaction: Reaction): boolean => residualOf(reaction).size === 0;

/** `reaction`, recounted. A reaction of ours that does not conserve is a broken program: it throws. */
export const proved = (reaction: Reaction): Reaction => {
  const residual = residualOf(reaction);
  if (residual.size === 0) return reaction;
  throw new Error(`a balanced reaction does not conserve ${[...residual.keys()].join(', ')}`);
};
