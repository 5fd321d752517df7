import { describe, expect, it } from 'vitest';
import { composeCell } from '../../src/cell/compose.ts';
import { plainReaction } from '../../src/balance/reaction.ts';
import { showRational } from '../../src/exact/rational.ts';
import { electrodesOf } from './cell-of.ts';

const ZINC = 'Zn -> Zn^2+ + 2 e^-';
const COPPER = 'Cu^2+ + 2 e^- -> Cu';
const HYDROGEN = '2 H^+ + 2 e^- -> H2';

const faultOf = (anode: readonly string[], cathode: readonly string[]) => {
  const result = composeCell(electrodesOf(anode, cathode));
  return result.ok ? null : result.fault;
};

const valueOf = (anode: readonly string[], cathode: readonly string[]) => {
  const result = composeCell(electrodesOf(anode, cathode));
  if (!result.ok) throw new Error(result.fault.message);
  return result;
};

describe('the direction of each electrode', () => {
  it('refuses a reduction at the anode, says where and to swap', () => {
    const fault = faultOf([COPPER], [COPPER]);
    expect(fault).toMatchObject({ code: 'electrode-direction', field: 'anode[0]' });
    expect(fault?.hint).toContain('swap');
  });

  it('refuses an oxidation at the cathode, also as the second reaction there', () => {
    expect(faultOf([ZINC], [COPPER, ZINC])).toMatchObject({ code: 'electrode-direction', field: 'cathode[1]' });
  });

  it('names the anode first where both are turned around', () => {
    expect(faultOf([COPPER], [ZINC])).toMatchObject({ code: 'electrode-direction', field: 'anode[0]' });
  });
});

describe('shares of the current', () => {
  it('refuses shares over the whole current', () => {
    expect(faultOf([ZINC], [`0.9 @ ${COPPER}`, `0.2 @ ${HYDROGEN}`])).toMatchObject({
      code: 'contradiction',
      field: 'cathode',
    });
  });

  it('refuses shares that leave some current to nobody', () => {
    expect(faultOf([ZINC], [`0.9 @ ${COPPER}`, `0.05 @ ${HYDROGEN}`])).toMatchObject({ code: 'contradiction' });
    expect(faultOf([ZINC], [`0.9 @ ${COPPER}`])).toMatchObject({ code: 'contradiction' });
  });

  it('refuses a negative share', () => {
    expect(faultOf([ZINC], [`-0.1 @ ${COPPER}`, `1.1 @ ${HYDROGEN}`])).toMatchObject({ code: 'bad-ask' });
  });

  it('asks for more where two reactions have no share', () => {
    expect(faultOf([ZINC], [`0.9 @ ${COPPER}`, HYDROGEN, 'Ag^+ + e^- -> Ag'])).toMatchObject({
      code: 'not-enough-given',
      missing: ['share'],
      field: 'cathode',
    });
  });

  it('gives one reaction without a share the rest and says so', () => {
    const { value, notes } = valueOf([ZINC], [`3/4 @ ${COPPER}`, HYDROGEN]);
    expect(notes.map((each) => each.code)).toEqual(['share-assigned']);
    // by hand: 4 Zn give 8 electrons, 6 of them to 3 Cu^2+, 2 to hydrogen
    expect(plainReaction(value.overall)).toBe('4 Zn + 3 Cu^2+ + 2 H^+ -> 4 Zn^2+ + 3 Cu + H2');
    expect(showRational(value.electrons)).toBe('8');
  });

  it('leaves a reaction with no current out of the overall reaction', () => {
    const { value } = valueOf([ZINC], [`1 @ ${COPPER}`, `0 @ ${HYDROGEN}`]);
    expect(plainReaction(value.overall)).toBe('Zn + Cu^2+ -> Zn^2+ + Cu');
    expect(value.cathode.map((half) => showRational(half.multiplier))).toEqual(['1', '0']);
  });

  it('speaks of shares before it speaks of the direction', () => {
    expect(faultOf([COPPER], [`0.9 @ ${COPPER}`])).toMatchObject({ code: 'contradiction' });
  });
});

describe('consecutive steps', () => {
  it('finds the intermediate also where the later step is listed first', () => {
    const steps = ['2 NO2^- + 8 H^+ + 6 e^- -> N2 + 4 H2O', 'NO3^- + 2 H^+ + 2 e^- -> NO2^- + H2O'];
    const { value } = valueOf(['H2 -> 2 H^+ + 2 e^-'], steps);
    expect(value.cathode.map((half) => showRational(half.multiplier))).toEqual(['1', '2']);
  });

  it('scales a chain of three through both intermediates', () => {
    // by hand: V(V) to V(II), one electron a step
    const steps = ['VO2^+ + 2 H^+ + e^- -> VO^2+ + H2O', 'VO^2+ + 2 H^+ + e^- -> V^3+ + H2O', 'V^3+ + e^- -> V^2+'];
    const { value } = valueOf([ZINC], steps);
    expect(plainReaction(value.overall)).toBe('3 Zn + 2 VO2^+ + 8 H^+ -> 3 Zn^2+ + 2 V^2+ + 4 H2O');
    expect(showRational(value.electrons)).toBe('6');
  });

  it('takes the product of the first step as the intermediate where the steps also return a reactant', () => {
    // by hand: chloride is used by the first and returned by the second step; chlorine cancels
    const steps = ['2 Cl^- -> Cl2 + 2 e^-', 'Cl2 + 3 H2O -> ClO3^- + Cl^- + 6 H^+ + 4 e^-'];
    const { value } = valueOf(steps, [HYDROGEN]);
    expect(plainReaction(value.overall)).toBe('Cl^- + 3 H2O -> ClO3^- + 3 H2');
  });

  it('runs steps one to one where no ratio makes the shared species cancel', () => {
    // by hand: two routes lead on from hydrogen peroxide, and nothing says which is taken how often
    const steps = [
      'O2 + 2 H^+ + 2 e^- -> H2O2',
      'H2O2 + 2 H^+ + 2 e^- -> 2 H2O',
      'H2O2 + Mn^2+ + 2 H^+ + 4 e^- -> Mn + 2 H2O',
    ];
    const { value } = valueOf([ZINC], steps);
    const [first, ...others] = value.cathode.map((half) => showRational(half.multiplier));
    expect(others).toEqual([first, first]);
  });
});

describe('ions and water', () => {
  it('keeps what is left over of H^+ after folding', () => {
    // by hand: 4 H^+ meet 2 OH^- where half of the current makes silver
    const { value } = valueOf(
      ['2 H2O -> O2 + 4 H^+ + 4 e^-'],
      ['0.5 @ 2 H2O + 2 e^- -> H2 + 2 OH^-', '0.5 @ Ag^+ + e^- -> Ag'],
    );
    expect(plainReaction(value.overall)).toBe('2 Ag^+ + 2 H2O -> O2 + H2 + 2 Ag + 2 H^+');
    expect(showRational(value.waterFormed)).toBe('2');
  });
});
