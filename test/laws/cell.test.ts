import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { parse } from 'yaml';
import { describe, expect, it } from 'vitest';
import { plainReaction } from '../../src/balance/reaction.ts';
import type { CellReaction, ElectrodeReaction } from '../../src/cell/cell-reaction.ts';
import { type Electrodes, composeCell } from '../../src/cell/compose.ts';
import { type Rational, ONE, ZERO, isWhole, isZero, rational } from '../../src/exact/rational.ts';
import type { HalfReaction } from '../../src/redox/half-reaction.ts';
import { residualByHand } from '../support/plain.ts';
import { electrodeReactionOf } from '../cell/cell-of.ts';

interface Row {
  readonly anode: readonly string[];
  readonly cathode: readonly string[];
}

const rows = parse(readFileSync('fixtures/cell/cells.yaml', 'utf8')) as readonly Row[];
const bare = (text: string): string => text.split(' @ ').at(-1) ?? '';
const stateless = (text: string): boolean => !/\((?:l|g|s|aq)\)/.test(text);
const halvesAt = (which: 'anode' | 'cathode'): readonly HalfReaction[] =>
  [...new Set(rows.flatMap((row) => row[which].map(bare)))]
    .filter(stateless)
    .map((text) => electrodeReactionOf(text).half);

const oxidation = fc.constantFrom(...halvesAt('anode'));
const reduction = fc.constantFrom(...halvesAt('cathode'));
const separator = fc.boolean();

const alone = (half: HalfReaction): ElectrodeReaction => ({ half, share: null });
const steps = (half: fc.Arbitrary<HalfReaction>) => fc.uniqueArray(half, { minLength: 1, maxLength: 3 });

/** One to three reactions, whole parts of a current that they share. */
const shared = (half: fc.Arbitrary<HalfReaction>) =>
  steps(half).chain((halves) =>
    fc.array(fc.integer({ min: 1, max: 9 }), { minLength: halves.length, maxLength: halves.length }).map((parts) => {
      const whole = BigInt(parts.reduce((a, b) => a + b, 0));
      return halves.map((half, at) => ({ half, share: rational(BigInt(parts[at] ?? 0), whole) }));
    }),
  );

const electrode = (half: fc.Arbitrary<HalfReaction>) =>
  fc.oneof(
    steps(half).map((halves) => halves.map(alone)),
    shared(half),
  );

const composed = (electrodes: Electrodes, apart: boolean): CellReaction => {
  const result = composeCell(electrodes, { separator: apart });
  if (!result.ok) throw new Error(result.fault.message);
  return result.value;
};

const cells = fc.record({ anode: electrode(oxidation), cathode: electrode(reduction) });
const law = (check: (electrodes: Electrodes, apart: boolean) => void): void => {
  fc.assert(fc.property(cells, separator, check), { numRuns: 120 });
};

const electronsAt = (halves: CellReaction['anode']): Rational =>
  halves.reduce((sum, { half, multiplier }) => sum.add(half.electrons.mul(multiplier)), ZERO);

describe('any cell', () => {
  it('passes as many electrons at the anode as at the cathode, its electron number', () => {
    law((electrodes, apart) => {
      const cell = composed(electrodes, apart);
      expect(electronsAt(cell.anode).equals(cell.electrons)).toBe(true);
      expect(electronsAt(cell.cathode).equals(cell.electrons)).toBe(true);
    });
  });

  it('conserves elements and charge, by an independent count', () => {
    law((electrodes, apart) => {
      const plain = plainReaction(composed(electrodes, apart).overall);
      if (plain !== '') expect(residualByHand(plain).size).toBe(0);
    });
  });

  it('is whole and has no factor in common with its electron number', () => {
    law((electrodes, apart) => {
      const { overall, electrons } = composed(electrodes, apart);
      const numbers = [...overall.terms.map(({ nu }) => nu), electrons];
      expect(numbers.every(isWhole)).toBe(true);
      for (const prime of [2n, 3n, 5n, 7n, 11n, 13n]) {
        expect(numbers.every((value) => isWhole(value.div(rational(prime))))).toBe(false);
      }
    });
  });

  it('is the sum of multiplier times half, H^+ and OH^- folded into the water told', () => {
    law((electrodes, apart) => {
      const cell = composed(electrodes, apart);
      const sums = new Map<string, Rational>();
      const put = (key: string, value: Rational): void => {
        sums.set(key, (sums.get(key) ?? ZERO).add(value));
      };
      for (const { half, multiplier } of [...cell.anode, ...cell.cathode])
        for (const { species, nu } of half.reaction.terms) put(species.key, nu.mul(multiplier));
      for (const { species, nu } of cell.overall.terms) put(species.key, nu.neg());
      const folded = (sums.get('H^+') ?? ZERO).abs();
      expect(folded.equals(cell.waterFormed)).toBe(true);
      expect((sums.get('OH^-') ?? ZERO).abs().equals(folded)).toBe(true);
      expect((sums.get('H2O') ?? ZERO).abs().equals(folded)).toBe(true);
      const rest = [...sums].filter(([key, value]) => !['H^+', 'OH^-', 'H2O'].includes(key) && !isZero(value));
      expect(rest).toEqual([]);
    });
  });

  it('strikes out what stands on both sides, never more than one side has', () => {
    law((electrodes, apart) => {
      const cell = composed(electrodes, apart);
      for (const { species, amount } of cell.cancelled) {
        const left = amountOn(cell, species.key, -1);
        const right = amountOn(cell, species.key, 1);
        const water = species.key === 'H2O' ? cell.waterFormed : ZERO;
        expect(amount.compare(ZERO)).toBe(1);
        expect(amount.compare(left.add(water)) <= 0 && amount.compare(right.add(water)) <= 0).toBe(true);
      }
    });
  });

  it('does not change where its half-reactions are written at another scale', () => {
    const factor = fc.tuple(fc.integer({ min: 1, max: 12 }), fc.integer({ min: 1, max: 12 }));
    const scaledCells = fc.tuple(oxidation, reduction, factor, factor);
    fc.assert(
      fc.property(scaledCells, ([anode, cathode, [a, b], [c, d]]) => {
        const plainCell = composed({ anode: [alone(anode)], cathode: [alone(cathode)] }, false);
        const scaledAnode = [alone(scaledBy(anode, rational(BigInt(a), BigInt(b))))];
        const scaledCathode = [alone(scaledBy(cathode, rational(BigInt(c), BigInt(d))))];
        const scaledCell = composed({ anode: scaledAnode, cathode: scaledCathode }, false);
        expect(plainReaction(scaledCell.overall)).toBe(plainReaction(plainCell.overall));
        expect(scaledCell.electrons.equals(plainCell.electrons)).toBe(true);
      }),
      { numRuns: 100 },
    );
  });

  it('lets one positive charge cross a separator for each electron', () => {
    fc.assert(
      fc.property(cells, (electrodes) => {
        const crossing = composed(electrodes, true).crossing ?? [];
        const forward = crossing.reduce((sum, { species, amount, from }) => {
          const charge = (species?.charge ?? ONE).mul(amount);
          return from === 'anode' ? sum.add(charge) : sum.sub(charge);
        }, ZERO);
        expect(forward.equals(ONE)).toBe(true);
      }),
      { numRuns: 100 },
    );
  });
});

const scaledBy = (half: HalfReaction, factor: Rational): HalfReaction => ({
  ...half,
  reaction: { terms: half.reaction.terms.map(({ species, nu }) => ({ species, nu: nu.mul(factor) })) },
  electrons: half.electrons.mul(factor),
});

/** What all runs together use (-1) or give (1) of a species. */
const amountOn = (cell: CellReaction, key: string, sign: -1 | 1): Rational =>
  [...cell.anode, ...cell.cathode].reduce((sum, { half, multiplier }) => {
    const amounts = half.reaction.terms
      .filter((term) => term.species.key === key)
      .map(({ nu }) => nu.mul(multiplier).mul(rational(BigInt(sign))))
      .filter((value) => value.compare(ZERO) > 0);
    return amounts.reduce((total, value) => total.add(value), sum);
  }, ZERO);
