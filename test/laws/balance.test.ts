import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Reaction, plainReaction } from '../../src/balance/reaction.ts';
import { isConserved } from '../../src/balance/recount.ts';
import { gcdOf, magnitude } from '../../src/exact/integer.ts';
import { isWhole, numeratorOf } from '../../src/exact/rational.ts';
import { type IntegerMatrix, rankOf } from '../../src/exact/matrix.ts';
import { nonNegative } from '../../src/exact/positive.ts';
import { completeHalf } from '../../src/redox/half.ts';
import { balanceOverall } from '../../src/redox/overall.ts';
import type { Fault, ShownReaction } from '../../src/report/fault.ts';
import { plainEquation, residualByHand } from '../support/plain.ts';

const RUNS = { numRuns: 40 };

/** Couples in acid or base, each with an element of its own, so that any of them go together. */
const REDUCED: readonly (readonly [string, string])[] = [
  ['MnO4^-', 'Mn^2+'],
  ['Cr2O7^2-', 'Cr^3+'],
  ['NO3^-', 'NO'],
  ['IO3^-', 'I2'],
  ['VO2^+', 'VO^2+'],
  ['Ce^4+', 'Ce^3+'],
  ['BiO3^-', 'Bi^3+'],
  ['PbO2', 'Pb^2+'],
  ['Mo7O24^6-', 'MoO2'],
];
const OXIDISED: readonly (readonly [string, string])[] = [
  ['Fe^2+', 'Fe^3+'],
  ['Sn^2+', 'Sn^4+'],
  ['CH3OH', 'CO2'],
  ['S2O3^2-', 'SO4^2-'],
  ['As2O3', 'H3AsO4'],
  ['Cl^-', 'ClO3^-'],
  ['Zn', 'Zn^2+'],
  ['Li2Te0.5', 'Li^+ + TeO2'],
];
const COUPLES = [...REDUCED, ...OXIDISED];
const medium = fc.constantFrom('acid', 'base', 'neutral');
const couple = fc.constantFrom(...COUPLES);

const halfOf = (skeleton: string, where: string): Reaction => {
  const result = completeHalf(plainEquation(skeleton), where);
  if (!result.ok) throw new Error(`${skeleton} in ${where}: ${result.fault.message}`);
  return result.value.reaction;
};

const overallOf = (skeleton: string, where: string): Reaction => {
  const result = balanceOverall(plainEquation(skeleton), where);
  if (!result.ok) throw new Error(`${skeleton} in ${where}: ${result.fault.message}`);
  return result.value.reaction;
};

/** Species and numbers in any order. */
const gist = (reaction: Reaction, sign = 1n): readonly string[] =>
  reaction.terms.map(({ species, nu }) => `${String(numeratorOf(nu) * sign)} ${species.key}`).toSorted();

const isPrimitive = (reaction: Reaction): boolean =>
  reaction.terms.every(({ nu }) => isWhole(nu)) && gcdOf(reaction.terms.map(({ nu }) => numeratorOf(nu))) === 1n;

describe('laws of a balanced half-reaction', () => {
  it('it recounts, by our recount and by plain counting, and is primitive', () => {
    fc.assert(
      fc.property(couple, medium, ([a, b], where) => {
        const reaction = halfOf(`${a} -> ${b}`, where);
        expect(isConserved(reaction)).toBe(true);
        expect(residualByHand(plainReaction(reaction))).toEqual(new Map());
        expect(isPrimitive(reaction)).toBe(true);
      }),
      RUNS,
    );
  });

  it('coefficients of the skeleton change nothing', () => {
    fc.assert(
      fc.property(couple, medium, fc.integer({ min: 2, max: 99 }), ([a, b], where, times) => {
        expect(gist(halfOf(`${String(times)} ${a} -> ${b}`, where))).toEqual(gist(halfOf(`${a} -> ${b}`, where)));
      }),
      RUNS,
    );
  });

  it('swapping the sides flips the signs', () => {
    fc.assert(
      fc.property(couple, fc.constantFrom('acid', 'base'), ([a, b], where) => {
        expect(gist(halfOf(`${b} -> ${a}`, where))).toEqual(gist(halfOf(`${a} -> ${b}`, where), -1n));
      }),
      RUNS,
    );
  });

  it('a spectator on both sides changes nothing', () => {
    fc.assert(
      fc.property(couple, medium, fc.constantFrom('Na^+', 'K2SO4', 'Ba^2+'), ([a, b], where, spectator) => {
        const reaction = halfOf(`${spectator} + ${a} -> ${b} + ${spectator}`, where);
        expect(gist(reaction)).toEqual(gist(halfOf(`${a} -> ${b}`, where)));
      }),
      RUNS,
    );
  });

  it('writing it out in full changes nothing', () => {
    fc.assert(
      fc.property(couple, fc.constantFrom('acid', 'base'), ([a, b], where) => {
        const reaction = halfOf(`${a} -> ${b}`, where);
        expect(gist(halfOf(plainReaction(reaction), where))).toEqual(gist(reaction));
      }),
      RUNS,
    );
  });
});

describe('laws of an overall reaction', () => {
  const pair = fc.tuple(fc.constantFrom(...REDUCED), fc.constantFrom(...OXIDISED), medium);

  it('it recounts and is primitive, in any order of its species', () => {
    fc.assert(
      fc.property(pair, ([[a, b], [c, d], where]) => {
        const reaction = overallOf(`${a} + ${c} -> ${b} + ${d}`, where);
        expect(residualByHand(plainReaction(reaction))).toEqual(new Map());
        expect(isPrimitive(reaction)).toBe(true);
        expect(gist(overallOf(`${c} + ${a} -> ${d} + ${b}`, where))).toEqual(gist(reaction));
      }),
      RUNS,
    );
  });
});

describe('laws of a family', () => {
  /** Several reducing agents for one oxidant: conservation cannot share them out. */
  const skeletons = fc.tuple(
    fc.constantFrom(...REDUCED),
    fc.uniqueArray(fc.constantFrom(...OXIDISED.slice(0, 6)), { minLength: 2, maxLength: 3, selector: ([a]) => a }),
    fc.constantFrom('acid', 'base'),
  );

  const several = (skeleton: string, where: string): Extract<Fault, { readonly code: 'several-balances' }> => {
    const result = balanceOverall(plainEquation(skeleton), where);
    if (result.ok || result.fault.code !== 'several-balances') throw new Error(`${skeleton}: a family was expected`);
    return result.fault;
  };

  const vectors = (reactions: readonly ShownReaction[]): IntegerMatrix => {
    const species = [...new Set(reactions.flatMap(({ terms }) => terms.map((term) => term.species)))];
    return reactions.map(({ terms }) =>
      species.map((name) => BigInt(terms.find((term) => term.species === name)?.nu ?? '0')),
    );
  };

  it('its couplings are non-negative combinations of its members, which span its dimension', () => {
    fc.assert(
      fc.property(skeletons, ([[a, b], others, where]) => {
        const left = [a, ...others.map(([from]) => from)].join(' + ');
        const right = [b, ...others.map(([, to]) => to)].join(' + ');
        const fault = several(`${left} -> ${right}`, where);
        const count = fault.family.length;
        expect(rankOf(vectors(fault.family))).toBe(fault.dimension);
        for (const coupling of fault.couplings) {
          if (coupling.overall === undefined) throw new Error('an overall reaction was expected');
          // sum of x_k member_k - x coupling = 0 with x > 0: columns are the members and the coupling
          const rows = vectors([...fault.family, coupling.overall]);
          const columns = (rows[0] ?? []).map((_, at) =>
            rows.map((row, index) => (row[at] ?? 0n) * (index === count ? -1n : 1n)),
          );
          const found = nonNegative(
            columns,
            columns.map(() => []),
          );
          expect(magnitude(found?.strict[count] ?? 0n)).toBeGreaterThan(0n);
        }
      }),
      { numRuns: 12 },
    );
  });
});
