import { describe, expect, it } from 'vitest';
import { type Reaction, plainReaction } from '../../src/balance/reaction.ts';
import { lowestWhole, perElectron, perMole, wholeFactor } from '../../src/balance/scale.ts';
import { rational, showRational } from '../../src/exact/rational.ts';
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

const shown = (reaction: Reaction | undefined): string => (reaction === undefined ? 'none' : plainReaction(reaction));

describe('the scale of a reaction', () => {
  it('is lowest whole numbers', () => {
    expect(shown(lowestWhole(reactionOf('H2 + 1/2 O2 -> H2O')))).toBe('2 H2 + O2 -> 2 H2O');
    expect(shown(lowestWhole(reactionOf('4 H2 + 2 O2 -> 4 H2O')))).toBe('2 H2 + O2 -> 2 H2O');
    expect(showRational(wholeFactor(reactionOf('2/3 Al^3+ + 2 e^- -> 2/3 Al')))).toBe('3/2');
  });

  it('is one electron on request', () => {
    expect(shown(perElectron(reactionOf('O2 + 4 H^+ + 4 e^- -> 2 H2O')))).toBe('1/4 O2 + H^+ + e^- -> 1/2 H2O');
    expect(shown(perElectron(reactionOf('2 CrO4^2- + 2 H^+ -> Cr2O7^2- + H2O')))).toBe('none');
  });

  it('is one mole of a named species on request', () => {
    const half = reactionOf('2 LiCoO2 -> 2 Li0.5CoO2 + Li^+ + e^-');
    expect(shown(perMole(half, plain('Li0.5CoO2')))).toBe('LiCoO2 -> Li0.5CoO2 + 1/2 Li^+ + 1/2 e^-');
    expect(shown(perMole(half, plain('Na')))).toBe('none');
  });

  it('keeps the reaction', () => {
    const half = reactionOf('MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O');
    expect(shown(lowestWhole(perElectron(half) ?? half))).toBe(shown(half));
    expect(half.terms[0]?.nu.equals(rational(-1n))).toBe(true);
  });
});
