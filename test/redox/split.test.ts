import { describe, expect, it } from 'vitest';
import { plainReaction } from '../../src/balance/reaction.ts';
import { showRational } from '../../src/exact/rational.ts';
import { balanceRedox } from '../../src/redox/redox.ts';
import { readEquation } from '../../src/species/read.ts';
import { plainEquation } from '../support/plain.ts';

const splitOf = (skeleton: string, medium?: string) => {
  const found = balanceRedox(plainEquation(skeleton), medium);
  if (!found.ok) throw new Error(found.fault.message);
  const { oxidation, reduction, electrons } = found.value;
  return {
    notes: found.notes.map(({ code }) => code),
    electrons: showRational(electrons),
    oxidation: oxidation === null ? null : plainReaction(oxidation.half.reaction),
    reduction: reduction === null ? null : plainReaction(reduction.half.reaction),
    medium: oxidation?.half.medium.name,
    dimension: oxidation?.half.dimension,
    changes: found.value.changes,
  };
};

describe('the medium of the halves', () => {
  // by hand: what the text shows
  it('is base where a molecular skeleton holds a hydroxide and no strong acid', () => {
    expect(splitOf('Al + NaOH + H2O -> NaAl(OH)4 + H2').medium).toBe('base');
    expect(splitOf('Fe(OH)2 + O2 + H2O -> Fe(OH)3').medium).toBe('base');
  });

  it('is acid where a molecular skeleton shows neither', () => {
    expect(splitOf('Fe2O3 + CO -> Fe + CO2').medium).toBe('acid');
  });

  it('is the one given where ions are written', () => {
    expect(splitOf('MnO4^- + SO3^2- -> MnO2 + SO4^2-', 'neutral').medium).toBe('neutral');
    expect(splitOf('MnO4^- + I^- -> MnO2 + IO3^-', 'base').medium).toBe('base');
  });

  it('may be none where all that the halves need is written', () => {
    const { oxidation, reduction } = splitOf('MnO4^- + SO2 + H2O -> Mn^2+ + SO4^2- + H^+', 'none');
    expect(oxidation).toBe('SO2 + 2 H2O -> SO4^2- + 4 H^+ + 2 e^-');
    expect(reduction).toBe('MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O');
  });
});

describe('the note on an assumed medium', () => {
  const noteOf = (skeleton: string, settle?: string): string | undefined => {
    const read = readEquation(skeleton);
    if (!read.ok) throw new Error(read.fault.message);
    const found = balanceRedox(read.value, undefined, settle);
    if (!found.ok) throw new Error(found.fault.message);
    return found.notes.find(({ code }) => code === 'medium-assumed')?.message;
  };

  it('says where the halves stand, if that is not in acid', () => {
    const settle = 'if KO2 is oxidised to O2 and KO2 is reduced to H2O2';
    expect(noteOf('KO2 + H2O -> KOH + H2O2 + O2', settle)).toContain('its halves stand in the medium base (H2O, OH^-)');
    expect(noteOf('D2 + O2 -> D2O')).toContain('its halves stand beside D2O, D^+');
    expect(noteOf('Na + O2 -> Na2O')).toContain('its halves stand in the medium molten-oxide (O^2-)');
  });

  it('says that acid was taken, if it was', () => {
    expect(noteOf('Zn + HCl -> ZnCl2 + H2')).toContain('acid was taken');
  });
});

describe('heavy hydrogen', () => {
  it('has halves with helpers of its own nuclide', () => {
    // by hand: 2 D2 + O2 -> 2 D2O as in a fuel cell
    const read = readEquation('D2 + O2 -> D2O');
    if (!read.ok) throw new Error(read.fault.message);
    const found = balanceRedox(read.value, 'acid');
    if (!found.ok) throw new Error(found.fault.message);
    const { oxidation, reduction } = found.value;
    expect(oxidation && plainReaction(oxidation.half.reaction)).toBe('D2 -> 2 D^+ + 2 e^-');
    expect(reduction && plainReaction(reduction.half.reaction)).toBe('O2 + 4 D^+ + 4 e^- -> 2 D2O');
    expect(oxidation && showRational(oxidation.multiplier)).toBe('2');
  });
});

describe('halves that cannot be told', () => {
  it('are left out with a note, and the electrons are the sum of all increases', () => {
    const split = splitOf('ClO3^- -> ClO4^- + Cl^-', 'none');
    expect(split.notes).toContain('halves-omitted');
    expect(split).toMatchObject({ oxidation: null, reduction: null, electrons: '6' });
  });
});

describe('changes of oxidation number', () => {
  it('are told once, however many species share them', () => {
    const { changes } = splitOf('K2Cr2O7 + FeSO4 + H2SO4 -> Cr2(SO4)3 + Fe2(SO4)3 + K2SO4 + H2O');
    expect(changes).toHaveLength(2);
  });

  it('leave out atoms that find their own number on the other side', () => {
    // by hand: of 5 nitrogen at 5 two stay, three go to 0, and so do 5 at -3
    const split = splitOf('NH4NO3 -> N2 + HNO3 + H2O');
    const told = split.changes.map(({ element, from, to }) => `${element} ${showRational(from)} ${showRational(to)}`);
    expect([...told].sort()).toEqual(['N -3 0', 'N 5 0']);
    expect(split.electrons).toBe('15');
  });
});
