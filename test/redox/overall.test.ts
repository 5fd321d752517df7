import { describe, expect, it } from 'vitest';
import { plainReaction } from '../../src/balance/reaction.ts';
import { showRational } from '../../src/exact/rational.ts';
import { balanceOverall } from '../../src/redox/overall.ts';
import { flowsOf, increaseIn } from '../../src/redox/split/flows.ts';
import type { ShownCoupling } from '../../src/report/fault.ts';
import { plainEquation } from '../support/plain.ts';
import { faultWith, overall } from '../support/redox.ts';

const couplings = (skeleton: string, medium?: string): readonly string[] =>
  faultWith(overall(skeleton, medium), 'several-balances').couplings.map(
    (one: ShownCoupling) => `${one.assume}: ${one.overall?.plain ?? ''} (${one.electrons})`,
  );

describe('balancing an overall reaction', () => {
  it('refuses a written electron', () => {
    expect(overall('Fe^3+ + e^- -> Fe^2+', 'acid')).toMatchObject({ code: 'bad-ask' });
  });

  it('counts no electron among the unknowns', () => {
    expect(overall('Zn + Cu^2+ -> Zn^2+ + Cu', 'none')).toMatchObject({ dimension: 1 });
    expect(overall('Cu -> Cu^2+', 'none')).toMatchObject({ code: 'no-balance' });
  });

  it('takes the medium from the text or assumes acid, with a note', () => {
    expect(overall('MnO4^- + Fe^2+ -> Mn^2+ + Fe^3+')).toEqual({
      reaction: 'MnO4^- + 5 Fe^2+ + 8 H^+ -> Mn^2+ + 5 Fe^3+ + 4 H2O',
      dimension: 1,
      notes: ['medium-assumed'],
    });
  });
});

describe('couplings', () => {
  it('name what is assumed of permanganate and peroxide, the usual answer first', () => {
    expect(couplings('MnO4^- + H2O2 -> Mn^2+ + O2', 'acid')).toEqual([
      'if H2O2 is only oxidised, to O2: 2 MnO4^- + 5 H2O2 + 6 H^+ -> 2 Mn^2+ + 5 O2 + 8 H2O (10)',
      'if H2O2 is only reduced, to H2O: 2 MnO4^- + 3 H2O2 + 6 H^+ -> 2 Mn^2+ + 4 O2 + 6 H2O (6)',
    ]);
  });

  it('work alike for a molecular skeleton', () => {
    expect(couplings('KMnO4 + H2O2 + H2SO4 -> MnSO4 + K2SO4 + O2 + H2O', 'none')[0]).toBe(
      'if H2O2 is only oxidised, to O2: 2 KMnO4 + 5 H2O2 + 3 H2SO4 -> 2 MnSO4 + K2SO4 + 5 O2 + 8 H2O (10)',
    );
    expect(couplings('KClO3 + HCl -> KCl + Cl2 + ClO2 + H2O', 'none')[0]).toBe(
      'if KClO3 is only reduced, to ClO2: 2 KClO3 + 4 HCl -> 2 KCl + Cl2 + 2 ClO2 + 2 H2O (2)',
    );
  });

  it('do not cross oxidation numbers before others', () => {
    expect(couplings('VO2^+ + V^2+ -> VO^2+ + V^3+', 'acid')[0]).toBe(
      'if VO2^+ is only reduced, to VO^2+: VO2^+ + V^2+ + 2 H^+ -> VO^2+ + V^3+ + H2O (1)',
    );
  });

  it('fall back on simple ratios where more than one substance is oxidised', () => {
    expect(couplings('Cl2 -> Cl^- + ClO^- + ClO3^-', 'base')).toEqual([
      'if ClO^- and ClO3^- form one to one: 4 Cl2 + 8 OH^- -> 6 Cl^- + ClO^- + ClO3^- + 4 H2O (6)',
    ]);
    expect(couplings('PbS + O3 -> PbSO4 + O2', 'none')[0]).toBe('if 1 O3 gives 1 O2: PbS + 4 O3 -> PbSO4 + 4 O2 (8)');
  });

  it('put a ratio of products before an independent helper that takes no part', () => {
    // from memory: chlorine on thiosulfate
    expect(couplings('S2O3^2- + Cl2 -> SO4^2- + S + Cl^-', 'acid')[0]).toMatch(
      /^if SO4\^2- and S form one to one: S2O3\^2- \+ Cl2 \+ H2O -> SO4\^2- \+ S \+ 2 Cl\^- \+ 2 H\^\+ /,
    );
  });

  it('let no electrons go in a circle between two reactants of one element', () => {
    for (const skeleton of ['O3 + NO -> NO2 + O2', 'O3 + SO2 -> SO3 + O2', 'CO + O3 -> CO2 + O2']) {
      expect(couplings(skeleton, 'none')).toHaveLength(1);
    }
  });

  it('are left out, and the family still listed, where far too much is open', () => {
    const fuels = Array.from({ length: 40 }, (_, index) => `C${String(index + 1)}H${String(2 * index + 4)}`);
    const fault = faultWith(overall(`${fuels.join(' + ')} + O2 -> CO + CO2 + H2O`, 'none'), 'several-balances');
    expect(fault).toMatchObject({ dimension: 41, couplings: [] });
    expect(fault.family).toHaveLength(80);
  });

  it('bring their two halves', () => {
    const skeleton = plainEquation('MnO4^- + H2O2 -> Mn^2+ + O2');
    const result = balanceOverall(skeleton, 'acid', 'if H2O2 is only oxidised, to O2');
    const split = result.ok ? result.value.coupling?.split.value : undefined;
    expect(split?.oxidation && plainReaction(split.oxidation.half.reaction)).toBe('H2O2 -> O2 + 2 H^+ + 2 e^-');
    expect(split?.reduction && plainReaction(split.reduction.half.reaction)).toBe(
      'MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O',
    );
  });
});

describe('the electrons exchanged', () => {
  const electrons = (skeleton: string, medium: string): string | undefined => {
    const result = balanceOverall(plainEquation(skeleton), medium);
    return result.ok ? showRational(increaseIn(flowsOf(result.value.reaction.terms).flows)) : undefined;
  };

  it('are the sum of all increases in oxidation number', () => {
    expect(electrons('FeS2 + NO3^- -> Fe^3+ + SO4^2- + NO', 'acid')).toBe('15');
    expect(electrons('NH4NO3 -> N2O + H2O', 'none')).toBe('4');
    expect(electrons('Fe3O4 + MnO4^- -> Fe2O3 + MnO2', 'base')).toBe('6');
  });

  it('are 0 where nothing is oxidised', () => {
    expect(electrons('CrO4^2- -> Cr2O7^2-', 'acid')).toBe('0');
  });
});
