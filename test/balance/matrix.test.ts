import { describe, expect, it } from 'vitest';
import { isEven, ledgerOf, showLedger } from '../../src/balance/ledger.ts';
import { speciesMatrix } from '../../src/balance/matrix.ts';
import type { Reaction } from '../../src/balance/reaction.ts';
import { isConserved, proved, residualOf } from '../../src/balance/recount.ts';
import { showRational } from '../../src/exact/rational.ts';
import { plain, plainEquation } from '../support/plain.ts';

const reactionOf = (text: string): Reaction => {
  const { left, right } = plainEquation(text);
  return {
    terms: [
      ...left.map(({ species, coefficient }) => ({ species, nu: coefficient.neg() })),
      ...right.map(({ species, coefficient }) => ({ species, nu: coefficient })),
    ],
  };
};

describe('the conservation matrix', () => {
  it('has a row for each element in order of appearance and one for the charge', () => {
    expect(speciesMatrix([plain('MnO4^-'), plain('H^+'), plain('e^-')])).toEqual({
      labels: ['Mn', 'O', 'H', 'charge'],
      rows: [
        [1n, 0n, 0n],
        [4n, 0n, 0n],
        [0n, 1n, 0n],
        [-1n, 1n, -1n],
      ],
      scales: [1n, 1n, 1n, 1n],
    });
  });

  it('clears decimal subscripts row by row', () => {
    const { rows, scales } = speciesMatrix([plain('Li0.5CoO2'), plain('Li0.3CoO2'), plain('Li^+')]);
    expect(rows[0]).toEqual([5n, 3n, 10n]);
    expect(scales).toEqual([10n, 1n, 1n, 1n]);
  });
});

describe('the ledger', () => {
  it('counts atoms and charge on both sides', () => {
    const ledger = ledgerOf(reactionOf('Cr2O7^2- + 14 H^+ + 6 e^- -> 2 Cr^3+ + 7 H2O'));
    expect(showLedger(ledger)).toEqual({ Cr: ['2', '2'], O: ['7', '7'], H: ['14', '14'], charge: ['6', '6'] });
    expect(isEven(ledger)).toBe(true);
  });

  it('shows what does not agree, fractions too', () => {
    const ledger = ledgerOf(reactionOf('H2 + 1/2 O2 -> H2O + 1/3 O2'));
    expect(showLedger(ledger)).toEqual({ H: ['2', '2'], O: ['1', '5/3'], charge: ['0', '0'] });
    expect(isEven(ledger)).toBe(false);
  });
});

describe('the recount', () => {
  it('finds nothing left over in a balanced reaction', () => {
    expect(isConserved(reactionOf('CuSO4*5H2O + 2 e^- -> Cu + SO4^2- + 5 H2O'))).toBe(true);
    expect(isConserved(reactionOf('[Fe(CN)6]^3- + e^- -> [Fe(CN)6]^4-'))).toBe(true);
  });

  it('says what is left over, right minus left', () => {
    const residual = residualOf(reactionOf('MnO4^- + 5 e^- -> Mn^2+'));
    expect([...residual].map(([key, value]) => `${key} ${showRational(value)}`)).toEqual(['O -4', 'charge 8']);
  });

  it('throws on a reaction of ours that does not conserve', () => {
    expect(() => proved(reactionOf('Cu^2+ + e^- -> Cu'))).toThrow('charge');
  });
});
