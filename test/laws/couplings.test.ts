import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { plainReaction } from '../../src/balance/reaction.ts';
import { showRational } from '../../src/exact/rational.ts';
import { type RedoxReaction, balanceRedox } from '../../src/redox/redox.ts';
import type { SplitHalf } from '../../src/redox/split/complete.ts';
import type { ShownCoupling } from '../../src/report/fault.ts';
import { electronsIn, leftOver, scaled } from '../support/halves.ts';
import { plainEquation, residualByHand } from '../support/plain.ts';
import { mediumOf } from '../support/redox.ts';
import { readTable } from '../support/table.ts';

const couplingsOf = (skeleton: string, medium: string): readonly ShownCoupling[] => {
  const result = balanceRedox(plainEquation(skeleton), mediumOf(medium));
  return !result.ok && result.fault.code === 'several-balances' ? result.fault.couplings : [];
};

const settledBy = (skeleton: string, medium: string, assume: string): RedoxReaction => {
  const result = balanceRedox(plainEquation(skeleton), mediumOf(medium), assume);
  if (!result.ok) throw new Error(`${skeleton}, ${assume}: ${result.fault.message}`);
  return result.value;
};

const shown = ({ multiplier, half }: SplitHalf): string =>
  `${showRational(multiplier)} ${plainReaction(half.reaction)}`;

const isIonic = (skeleton: string): boolean => skeleton.includes('^');

/** What settling each coupling of a skeleton must give; the number of couplings. */
const holds = (skeleton: string, medium: string): number => {
  const couplings = couplingsOf(skeleton, medium);
  expect(new Set(couplings.map(({ assume }) => assume)).size).toBe(couplings.length);
  for (const { assume, overall: promised, electrons } of couplings) {
    const { overall, oxidation, reduction, ...settled } = settledBy(skeleton, medium, assume);
    expect({ overall: plainReaction(overall), electrons: showRational(settled.electrons) }).toEqual({
      overall: promised?.plain,
      electrons,
    });
    expect(residualByHand(plainReaction(overall))).toEqual(new Map());
    if (oxidation === null || reduction === null) continue;
    for (const half of [oxidation, reduction].map(shown)) {
      expect(residualByHand(scaled(half).half)).toEqual(new Map());
      expect(showRational(electronsIn(half))).toBe(electrons);
    }
    if (isIonic(skeleton)) expect(leftOver([shown(oxidation), shown(reduction)], plainReaction(overall))).toEqual([]);
  }
  return couplings.length;
};

describe('settling a coupling', () => {
  const families = readTable('redox/families.tsv').filter(({ ask }) => ask === 'redox');

  it.each(families)(
    'gives the reaction and the electrons that it promised: $skeleton',
    ({ skeleton = '', medium = '' }) => {
      expect(holds(skeleton, medium)).toBeGreaterThan(0);
    },
  );

  it.each(readTable('redox/couplings.tsv'))('does so for $skeleton, $assume', ({ skeleton = '', medium = '' }) => {
    expect(holds(skeleton, medium)).toBeGreaterThan(0);
  });

  /** Couples in acid or base that ozone, peroxide or a stronger oxidant oxidises. */
  const reducing = fc.constantFrom(
    ['Fe^2+', 'Fe^3+'],
    ['I^-', 'I2'],
    ['Br^-', 'BrO3^-'],
    ['NO2^-', 'NO3^-'],
    ['SO3^2-', 'SO4^2-'],
    ['S2O3^2-', 'SO4^2-'],
    ['AsO3^3-', 'AsO4^3-'],
    ['Mn^2+', 'MnO4^-'],
    ['Cr^3+', 'CrO4^2-'],
    ['HCOOH', 'CO2'],
    ['VO^2+', 'VO2^+'],
  );
  const oxidising = fc.constantFrom(
    ['MnO4^-', 'MnO2'],
    ['Cr2O7^2-', 'Cr^3+'],
    ['ClO^-', 'Cl^-'],
    ['IO3^-', 'I2'],
    ['PbO2', 'Pb^2+'],
    ['BiO3^-', 'Bi^3+'],
    ['Ce^4+', 'Ce^3+'],
    ['S2O8^2-', 'SO4^2-'],
    ['CrO4^2-', 'Cr(OH)3'],
  );
  const medium = fc.constantFrom('acid', 'base', 'neutral');

  it('of ozone, which gives one atom and leaves as oxygen', () => {
    fc.assert(
      fc.property(reducing, medium, ([from = '', to = ''], where) => {
        const skeleton = `${from} + O3 -> ${to} + O2`;
        expect(holds(skeleton, where)).toBe(1);
        const [only] = couplingsOf(skeleton, where);
        expect(only?.assume).toBe('if 1 O3 gives 1 O2');
        const nu = (species: string): string => only?.overall?.terms.find((one) => one.species === species)?.nu ?? '';
        expect(`-${nu('O2')}`).toBe(nu('O3'));
        expect(Number(only?.electrons)).toBe(2 * Number(nu('O2')));
      }),
      { numRuns: 25 },
    );
  });

  it('of peroxide with an oxidant, first only oxidised', () => {
    fc.assert(
      fc.property(oxidising, medium, ([from = '', to = ''], where) => {
        const skeleton = `${from} + H2O2 -> ${to} + O2`;
        expect(holds(skeleton, where)).toBeGreaterThan(0);
        expect(couplingsOf(skeleton, where)[0]?.assume).toBe('if H2O2 is only oxidised, to O2');
      }),
      { numRuns: 25 },
    );
  });

  it('of an oxidant shared by two reductants', () => {
    fc.assert(
      fc.property(oxidising, fc.tuple(reducing, reducing), medium, ([a = '', b = ''], pair, where) => {
        const [[c = '', d = ''], [e = '', f = '']] = pair;
        holds(`${a} + ${c} + ${e} -> ${b} + ${d} + ${f}`, where);
      }),
      { numRuns: 20 },
    );
  });
});

describe('a settle where nothing is open', () => {
  it.each(readTable('redox/overall.tsv').slice(0, 20))('is refused: $reaction', ({ reaction = '', medium = '' }) => {
    const result = balanceRedox(plainEquation(reaction), mediumOf(medium), 'if anything');
    expect(result.ok ? null : result.fault).toMatchObject({ code: 'bad-ask', field: 'settle' });
  });
});
