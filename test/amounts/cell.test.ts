import { describe, expect, it } from 'vitest';
import type { Circuit } from '../../src/amounts/branches.ts';
import { computeSeries } from '../../src/amounts/series.ts';
import { tankBalance } from '../../src/amounts/tank-balance.ts';
import { composeCell } from '../../src/cell/compose.ts';
import type { ElectrodeReaction } from '../../src/cell/cell-reaction.ts';
import { type Rational, rationalFromText } from '../../src/exact/rational.ts';
import { plain } from '../support/plain.ts';
import { amountsOf, halfCircuit, plainHalf } from './circuit.ts';

const F = 96485.33212331;

const halfOf = (text: string, kind: 'oxidation' | 'reduction', share?: string): ElectrodeReaction => {
  const { reaction, electrons } = plainHalf(text);
  const part: Rational | null = share === undefined ? null : rationalFromText(share);
  return { half: { reaction, kind, electrons, medium: { name: null, helpers: [] }, dimension: 1 }, share: part };
};

type Written = readonly (readonly [string, string?])[];
const cellOf = (anode: Written, cathode: Written, separator = false): Circuit => {
  const composed = composeCell(
    {
      anode: anode.map(([text, share]) => halfOf(text, 'oxidation', share)),
      cathode: cathode.map(([text, share]) => halfOf(text, 'reduction', share)),
    },
    { separator },
  );
  if (!composed.ok) throw new Error(JSON.stringify(composed.fault));
  const shared = (side: Written): boolean => side.some(([, share]) => share !== undefined);
  return { kind: 'cell', cell: composed.value, shares: { anode: shared(anode), cathode: shared(cathode) } };
};
const answer = (...args: Parameters<typeof amountsOf>) => {
  const result = amountsOf(...args);
  if (!result.ok) throw new Error(JSON.stringify(result.fault));
  return { ...result.value, notes: result.notes.map(({ code }) => code) };
};

const OXYGEN = '2 H2O -> O2(g) + 4 H^+ + 4 e^-';
const COPPER = 'Cu^2+ + 2 e^- -> Cu';
const WATER = '2 H2O + 2 e^- -> H2(g) + 2 OH^-';

describe('a whole cell', () => {
  it('gives every species of both electrodes for the same charge', () => {
    const { quantities, alongside, electronsPerMole } = answer(cellOf([[OXYGEN]], [[COPPER]]), 'Cu', { charge: '4 F' });
    expect(quantities['amount']?.value).toBeCloseTo(2, 12);
    expect(electronsPerMole).toEqual({ H2O: '2', O2: '4', 'H^+': '1', 'Cu^2+': '2', Cu: '2' });
    expect(alongside['O2']?.['amount']?.value).toBeCloseTo(1, 12);
    expect(alongside['H^+']?.['amount']?.value).toBeCloseTo(4, 12);
    expect(alongside['Cu^2+']?.['amount']?.value).toBeCloseTo(2, 12);
  });

  it('folds H^+ with OH^- to water as the cell reaction does, and not across a separator', () => {
    const folded = answer(cellOf([[OXYGEN]], [[WATER]]), 'H2', { charge: '4 F' });
    expect(folded.electronsPerMole).toEqual({ H2O: '2', O2: '4', H2: '2' });
    expect(folded.alongside['H2O']?.['amount']?.value).toBeCloseTo(2, 12);
    const apart = answer(cellOf([[OXYGEN]], [[WATER]], true), 'H2', { charge: '4 F' });
    expect(apart.electronsPerMole).toEqual({ H2O: '2/3', O2: '4', 'H^+': '1', H2: '2', 'OH^-': '1' });
    expect(apart.alongside['OH^-']?.['amount']?.value).toBeCloseTo(4, 12);
  });

  it('counts a species of both electrodes once, with a note', () => {
    const lead = cellOf([['Pb + SO4^2- -> PbSO4 + 2 e^-']], [['PbO2 + SO4^2- + 4 H^+ + 2 e^- -> PbSO4 + 2 H2O']]);
    const { electronsPerMole, quantities, notes } = answer(lead, 'PbSO4', { charge: '2 F' });
    expect(electronsPerMole['PbSO4']).toBe('1');
    expect(electronsPerMole['SO4^2-']).toBe('1');
    expect(quantities['amount']?.value).toBeCloseTo(2, 12);
    expect(notes).toContain('summed');
  });

  it('refuses a species that is made and used up alike', () => {
    const result = amountsOf(cellOf([[OXYGEN]], [['2 H^+ + 2 e^- -> H2(g)']]), 'H^+', { charge: '1 F' });
    expect(result).toMatchObject({ ok: false, fault: { code: 'bad-ask', field: 'species' } });
  });

  it('takes shares of the current for efficiencies, and gives the other electrode its full charge', () => {
    const zinc = cellOf([[OXYGEN]], [['Zn^2+ + 2 e^- -> Zn', '0.9'], ['2 H^+ + 2 e^- -> H2(g)']]);
    const { quantities, alongside, electronsPerMole } = answer(zinc, 'Zn', { charge: '2 F' });
    expect(quantities['efficiency']?.value).toBeCloseTo(90, 12);
    expect(quantities['amount']?.value).toBeCloseTo(0.9, 12);
    expect(electronsPerMole['Zn']).toBe('2');
    expect(alongside['H2']?.['amount']?.value).toBeCloseTo(0.1, 12);
    expect(alongside['O2']?.['amount']?.value).toBeCloseTo(0.5, 12);
    expect(alongside['H^+']?.['amount']?.value).toBeCloseTo(1.8, 12);
  });

  it('lets a given efficiency hold for the reaction of the species and leaves the other electrode whole', () => {
    const cell = cellOf([[OXYGEN]], [[COPPER]]);
    const { quantities, alongside } = answer(cell, 'Cu', { charge: '4 F', efficiency: '90 %' });
    expect(quantities['amount']?.value).toBeCloseTo(1.8, 12);
    expect(alongside['Cu^2+']?.['amount']?.value).toBeCloseTo(1.8, 12);
    expect(alongside['O2']?.['amount']?.value).toBeCloseTo(1, 12);
  });

  it('follows consecutive steps: each takes its part of the charge', () => {
    const cell = cellOf([['Cu -> Cu^+ + e^-'], ['Cu^+ -> Cu^2+ + e^-']], [['2 H^+ + 2 e^- -> H2(g)']]);
    const { electronsPerMole, alongside } = answer(cell, 'Cu', { charge: '2 F' });
    expect(electronsPerMole).toEqual({ Cu: '2', 'Cu^2+': '2', 'H^+': '1', H2: '2' });
    expect(alongside['Cu^2+']?.['amount']?.value).toBeCloseTo(1, 12);
  });
});

describe('cells in series', () => {
  it('passes one charge through all, each with its own species', () => {
    const result = computeSeries(
      [
        { circuit: halfCircuit('Ag^+ + e^- -> Ag'), species: plain('Ag'), given: {} },
        { circuit: halfCircuit(COPPER), species: plain('Cu'), given: {} },
      ],
      { charge: '2 F' },
    );
    if (!result.ok) throw new Error(JSON.stringify(result.fault));
    expect(result.value.map(({ quantities }) => quantities['amount']?.value)).toEqual([
      expect.closeTo(2, 12),
      expect.closeTo(1, 12),
    ]);
  });

  it('measures the charge with the first cell that can: a coulometer', () => {
    const result = computeSeries(
      [
        { circuit: halfCircuit(COPPER), species: plain('Cu'), given: { mass: '0.2900 g' } },
        { circuit: halfCircuit('Ag^+ + e^- -> Ag'), species: plain('Ag'), given: { mass: '1.0787(2) g' } },
      ].reverse(),
      {},
    );
    if (!result.ok) throw new Error(JSON.stringify(result.fault));
    const [silver, copper] = result.value;
    expect(silver?.quantities['charge']?.value).toBeCloseTo(0.01 * F, 6);
    expect(copper?.quantities['efficiency']?.value).toBeCloseTo((0.29 / 63.546 / 0.005) * 100, 6);
    expect(copper?.quantities['efficiency']?.uncertainty).toBeGreaterThan(0);
  });

  it('names the cell in which something is wrong', () => {
    const one = { circuit: halfCircuit(COPPER), species: plain('Cu') };
    const result = computeSeries(
      [
        { ...one, given: {} },
        { ...one, given: { mass: '1 Q' } },
      ],
      { charge: '2 F' },
    );
    expect(result).toMatchObject({ ok: false, fault: { code: 'unknown-unit', field: 'series[1].given.mass' } });
  });
});

describe('the balance of a tank', () => {
  it('counts the acid of copper winning and the water that goes', () => {
    const result = tankBalance({ circuit: cellOf([[OXYGEN]], [[COPPER]]), given: { charge: '4 F' } });
    if (!result.ok) throw new Error(JSON.stringify(result.fault));
    expect(result.value.acid?.value).toBeCloseTo(4, 12);
    expect(result.value.base).toBeUndefined();
    expect(result.value.water?.amount.value).toBeCloseTo(-2, 12);
    expect(result.value.water?.mass.value).toBeCloseTo(-36.03, 2);
    expect(result.value.water?.volume.value).toBeCloseTo(-0.03614, 5);
  });

  it('counts base of a half-reaction, folds a cell, and multiplies by a stack', () => {
    const half = tankBalance({ circuit: halfCircuit(WATER), given: { current: '2 A', time: '1 h' } });
    expect(half).toMatchObject({ ok: true, value: { base: { value: expect.closeTo(7200 / F, 12) as number } } });
    const less = tankBalance({ circuit: halfCircuit(WATER), given: { charge: '2 F', efficiency: '90 %' } });
    expect(less).toMatchObject({ ok: true, value: { base: { value: expect.closeTo(1.8, 12) as number } } });
    const unclear = { circuit: cellOf([[OXYGEN]], [[WATER]]), given: { charge: '2 F', efficiency: '90 %' } };
    expect(tankBalance(unclear)).toMatchObject({ ok: false, fault: { code: 'bad-ask', field: 'given.efficiency' } });
    const split = tankBalance({ circuit: cellOf([[OXYGEN]], [[WATER]]), given: { charge: '2 F' }, cells: '10' });
    if (!split.ok) throw new Error(JSON.stringify(split.fault));
    expect(split.value.acid).toBeUndefined();
    expect(split.value.water?.amount.value).toBeCloseTo(-10, 12);
  });

  it('needs a charge and every share', () => {
    expect(tankBalance({ circuit: halfCircuit(WATER), given: { current: '2 A' } })).toMatchObject({
      ok: false,
      fault: { code: 'not-enough-given', missing: ['charge'] },
    });
    const circuit: Circuit = { kind: 'electrode', reactions: [plainHalf(WATER), plainHalf(COPPER)] };
    expect(tankBalance({ circuit, given: { charge: '2 F' } })).toMatchObject({
      ok: false,
      fault: { missing: ['share'] },
    });
  });
});
