import { describe, expect, it } from 'vitest';
import type { AmountsAnswer } from '../../src/amounts/working.ts';
import type { Fault } from '../../src/report/fault.ts';
import { amountsOf, electrodeCircuit } from './circuit.ts';

const COPPER = 'Cu^2+ + 2 e^- -> Cu';
const HYDROGEN = '2 H^+ + 2 e^- -> H2(g)';

type Args = Parameters<typeof amountsOf>;
const answer = (...args: Args): AmountsAnswer => {
  const result = amountsOf(...args);
  if (!result.ok) throw new Error(JSON.stringify(result.fault));
  return result.value;
};
const notes = (...args: Args): readonly string[] => {
  const result = amountsOf(...args);
  return result.ok ? result.notes.map(({ code }) => code) : [result.fault.code];
};
const fault = (...args: Args): Fault => {
  const result = amountsOf(...args);
  if (result.ok) throw new Error(JSON.stringify(result.value.quantities));
  return result.fault;
};

describe('an ask for amounts', () => {
  it('answers copper in an hour with everything that follows, in the usual units', () => {
    const { quantities, alongside, electronsPerMole } = answer(COPPER, 'Cu', { current: '250 A', time: '1 h' });
    expect(Object.keys(quantities)).toEqual([
      'charge',
      'current',
      'time',
      'amount',
      'mass',
      'mass_per_charge',
      'charge_per_mass',
    ]);
    expect(quantities['charge']).toEqual({ value: 900000, unit: 'C' });
    expect(quantities['amount']?.unit).toBe('mol');
    expect(quantities['mass']?.value).toBeCloseTo(296.373546, 6);
    expect(quantities['mass']?.unit).toBe('g');
    expect(quantities['mass_per_charge']?.unit).toBe('g/(A h)');
    expect(quantities['charge_per_mass']?.unit).toBe('A h/kg');
    expect(Object.keys(alongside)).toEqual(['Cu^2+']);
    expect(electronsPerMole).toEqual({ 'Cu^2+': '2', Cu: '2' });
  });

  it('uses C, A, s, mol, g, L, µm, %, kWh, g/(A h), A h/kg and kWh/kg where nothing is wanted', () => {
    const given = {
      current: '2 A',
      time: '1 h',
      voltage: '2 V',
      efficiency: '90 %',
      density: '8.96 g/cm^3',
      area: '1 dm^2',
    };
    const { quantities } = answer(COPPER, 'Cu', given);
    const units = Object.fromEntries(Object.entries(quantities).map(([name, { unit }]) => [name, unit]));
    expect(units).toMatchObject({ charge: 'C', current: 'A', time: 's', amount: 'mol', mass: 'g', thickness: 'µm' });
    expect(units).toMatchObject({ efficiency: '%', energy: 'kWh', energy_per_mass: 'kWh/kg', voltage: 'V' });
    const gas = answer(HYDROGEN, 'H2', { charge: '1 A h', temperature: '25 °C', pressure: '1 bar' });
    expect(gas.quantities['volume']?.unit).toBe('L');
  });

  it('answers wanted units in quantities and alongside, spelled as asked', () => {
    const { quantities, alongside } = answer(
      COPPER,
      'Cu',
      { charge: '1 kA h' },
      { want: { mass: 'kg', charge: 'kA h' } },
    );
    expect(quantities['mass']?.unit).toBe('kg');
    expect(quantities['charge']).toEqual({ value: 1, unit: 'kA h' });
    expect(alongside['Cu^2+']?.['mass']?.unit).toBe('kg');
    expect(quantities['amount']?.unit).toBe('mol');
  });

  it('keeps numbers unrounded and leaves the uncertainty out where nothing is known', () => {
    const { quantities } = answer('3 Li -> 3 Li^+ + 3 e^-', 'Li', { charge: '1 C' });
    expect(quantities['amount']).toEqual({ value: 1 / 96485.33212331001, unit: 'mol' });
    expect(quantities['mass']?.uncertainty).toBeGreaterThan(0);
  });

  it('counts electrons per mole exactly, fractions included', () => {
    const vanadium = answer('VO2^+ + 2 H^+ + e^- -> VO^2+ + H2O', 'H^+', {});
    expect(vanadium.electronsPerMole).toEqual({ 'VO2^+': '1', 'H^+': '1/2', 'VO^2+': '1', H2O: '1' });
    const cobalt = answer('LiCoO2 -> Li0.5CoO2 + 0.5 Li^+ + 0.5 e^-', 'LiCoO2', {});
    expect(cobalt.electronsPerMole).toEqual({ LiCoO2: '1/2', 'Li0.5CoO2': '1/2', 'Li^+': '1' });
  });

  it('answers the equivalents of a half-reaction when nothing is given', () => {
    expect(Object.keys(answer(COPPER, 'Cu', {}).quantities)).toEqual(['mass_per_charge', 'charge_per_mass']);
  });

  it('tells from which relation each quantity came, in order', () => {
    const { derived } = answer(COPPER, 'Cu', { current: '250 A', time: '1 h' });
    expect(derived.map(({ quantity, relation }) => `${quantity}: ${relation}`)).toEqual([
      'charge: Q = I t',
      'amount: n = η Q |ν| / (z F)',
      'mass: m = n M',
      'mass_per_charge: m / Q = η M |ν| / (z F)',
      'charge_per_mass: Q / m = 1 / (m / Q)',
    ]);
  });
});

describe('efficiency', () => {
  it('multiplies mass_per_charge, divides charge_per_mass and energy_per_mass', () => {
    const whole = answer(COPPER, 'Cu', { voltage: '2 V' }).quantities;
    const half = answer(COPPER, 'Cu', { voltage: '2 V', efficiency: '50 %' }).quantities;
    const ratio = (name: string): number => (half[name]?.value ?? NaN) / (whole[name]?.value ?? NaN);
    expect(ratio('mass_per_charge')).toBeCloseTo(0.5, 12);
    expect(ratio('charge_per_mass')).toBeCloseTo(2, 12);
    expect(ratio('energy_per_mass')).toBeCloseTo(2, 12);
  });

  it('is taken as 100 % with a note, and never shown as if it were known', () => {
    expect(notes(COPPER, 'Cu', { charge: '1 A h' })).toContain('efficiency-assumed');
    expect(answer(COPPER, 'Cu', { charge: '1 A h' }).quantities['efficiency']).toBeUndefined();
  });

  it('over 100 % is a note when weighed and a contradiction when given', () => {
    expect(notes(COPPER, 'Cu', { charge: '1 A h', mass: '1.3 g' })).toContain('efficiency-over-100');
    expect(fault(COPPER, 'Cu', { charge: '1 A h', efficiency: '120 %' })).toMatchObject({
      code: 'contradiction',
      field: 'given.efficiency',
      span: { from: 0, to: 5 },
    });
    expect(fault(COPPER, 'Cu', { charge: '1 A h', efficiency: '96' })).toMatchObject({ code: 'contradiction' });
  });

  it('takes percentage points on a percentage and a relative part elsewhere', () => {
    const points = answer(COPPER, 'Cu', { charge: '1 A h', efficiency: '50 % ± 1 %' }).quantities;
    expect(points['efficiency']?.uncertainty).toBeCloseTo(1, 12);
    const relative = answer(COPPER, 'Cu', { charge: '50 A h ± 1 %' }, { want: { charge: 'A h' } }).quantities;
    expect(relative['charge']?.uncertainty).toBeCloseTo(0.5, 12);
  });
});

describe('too much and too little', () => {
  it.each([
    [{ current: '250 A' }, ['time']],
    [{ time: '1 h' }, ['current']],
    [{ current: '250 A', efficiency: '96 %' }, ['time']],
    [{ current_density: '2 A/dm^2' }, ['time', 'area']],
    [{ current_density: '2 A/dm^2', time: '1 h' }, ['area']],
    [{ temperature: '25 °C' }, ['charge']],
    [{ area: '1 dm^2' }, ['time', 'current']],
    [{ from: '2 g/L' }, ['volume', 'to']],
    [{ volume: '1 L', from: '2 g/L' }, ['to']],
    [{ volume: '1 L' }, ['from', 'to']],
    [{ thickness: '1 µm' }, ['charge', 'density']],
  ])('%j is not enough and says what would do: %j', (given, missing) => {
    expect(fault(COPPER, 'Cu', given as Args[2])).toMatchObject({ code: 'not-enough-given', field: 'given', missing });
  });

  it('refuses a wanted quantity that follows for no species and names what would do', () => {
    expect(fault(HYDROGEN, 'H2', { charge: '1 A h' }, { want: { volume: 'L' } })).toMatchObject({
      code: 'not-enough-given',
      field: 'want.volume',
      missing: ['temperature', 'pressure'],
    });
    expect(fault(COPPER, 'Cu', { charge: '1 A h' }, { want: { efficiency: '%' } })).toMatchObject({
      code: 'not-enough-given',
      missing: ['mass'],
    });
    expect(fault(COPPER, 'Cu', {}, { want: { mass: 'kg' } })).toMatchObject({ missing: ['charge'] });
    expect(fault(COPPER, 'Cu', { charge: '1 A h' }, { want: { energy: 'kWh' } })).toMatchObject({
      missing: ['voltage'],
    });
    expect(fault(COPPER, 'Cu', { charge: '1 A h' }, { want: { thickness: 'µm' } })).toMatchObject({
      missing: ['density', 'area'],
    });
  });

  it('answers a wanted quantity that follows for another species only', () => {
    const given = { charge: '1 A h', temperature: '25 °C', pressure: '1 bar' };
    const { quantities, alongside } = answer(HYDROGEN, 'H^+', given, { want: { volume: 'mL' } });
    expect(quantities['volume']).toBeUndefined();
    expect(alongside['H2']?.['volume']?.unit).toBe('mL');
  });

  it('answers what is wanted although a given quantity leads nowhere, with a note', () => {
    expect(notes(COPPER, 'Cu', { current: '250 A' }, { want: { mass_per_charge: 'g/(A h)' } })).toEqual([
      'given-unused',
    ]);
  });

  it('finds a contradiction and gives both values', () => {
    const found = fault(COPPER, 'Cu', { current: '10 A', time: '1 h', charge: '20 A h' });
    expect(found).toMatchObject({ code: 'contradiction', field: 'given.charge', span: { from: 0, to: 6 } });
    expect(found.message).toMatch(/72000 C.*36000 C/);
    const weighed = { charge: '1 A h', mass: '1.1 g', efficiency: '96 %' };
    expect(fault(COPPER, 'Cu', weighed)).toMatchObject({ code: 'contradiction' });
    const spread = { current: '2 A', area: '1 dm^2', current_density: '3 A/dm^2', time: '1 h' };
    expect(fault(COPPER, 'Cu', spread)).toMatchObject({ code: 'contradiction' });
  });

  it('notes a surplus that agrees, within its digits and uncertainties', () => {
    expect(notes(COPPER, 'Cu', { current: '10 A', time: '2 h', charge: '20 A h' })).toContain('surplus-agrees');
    expect(notes(COPPER, 'Cu', { charge: '1 A h', mass: '1.185 g', efficiency: '100 %' })).toContain('surplus-agrees');
    const wide = { current: '10.0(3) A', time: '2 h', charge: '20.5 A h' };
    expect(notes(COPPER, 'Cu', wide)).toContain('surplus-agrees');
    expect(fault(COPPER, 'Cu', { ...wide, charge: '22.5 A h' }).code).toBe('contradiction');
  });

  it('takes no derived value for a surplus', () => {
    expect(notes(COPPER, 'Cu', { current: '10 A', time: '2 h', area: '1 dm^2', density: '8.96 g/cm^3' })).toEqual([
      'efficiency-assumed',
    ]);
  });
});

describe('bad input', () => {
  it.each([
    [{ current: '250 Q', time: '1 h' }, 'unknown-unit', 'given.current', { from: 4, to: 5 }],
    [{ current: '250 V', time: '1 h' }, 'unknown-unit', 'given.current', { from: 4, to: 5 }],
    [{ current: '', time: '1 h' }, 'empty', 'given.current', { from: 0, to: 0 }],
    [{ current: 'much', time: '1 h' }, 'bad-ask', 'given.current', { from: 0, to: 4 }],
    [{ current: '0 A', time: '1 h' }, 'bad-ask', 'given.current', { from: 0, to: 3 }],
    [{ current: '2 A', time: '-1 h' }, 'bad-ask', 'given.time', { from: 0, to: 4 }],
    [{ mass: '-2 g' }, 'bad-ask', 'given.mass', { from: 0, to: 4 }],
    [{ curent: '2 A' }, 'unknown-quantity', 'given.curent', { from: 0, to: 6 }],
    [{ charge: '2 A h', efficiency: '-5 %' }, 'bad-ask', 'given.efficiency', { from: 0, to: 4 }],
    [{ charge: '2 A h', temperature: '-300 °C' }, 'bad-ask', 'given.temperature', { from: 0, to: 7 }],
  ])('%j: %s at %s', (given, code, field, span) => {
    expect(fault(COPPER, 'Cu', given as Args[2])).toMatchObject({ code, field, span });
  });

  it('proposes the nearest quantity and refuses unknown ones and units in want', () => {
    expect(fault(COPPER, 'Cu', { curent: '2 A' }).hint).toBe('Did you mean current?');
    expect(fault(COPPER, 'Cu', { charge: '1 C' }, { want: { weight: 'g' } })).toMatchObject({
      code: 'unknown-quantity',
      field: 'want.weight',
    });
    expect(fault(COPPER, 'Cu', { charge: '1 C' }, { want: { mass: 'grm' } })).toMatchObject({
      code: 'unknown-unit',
      field: 'want.mass',
      span: { from: 0, to: 3 },
    });
    expect(fault(COPPER, 'Cu', { charge: '1 C' }, { want: { mass: 'A h' } })).toMatchObject({ code: 'unknown-unit' });
    expect(fault(COPPER, 'Cu', { charge: '1 C' }, { want: { mass: 'oz' } }).hint).toContain('oz_t');
  });

  it('refuses a species with no part and names those that have one', () => {
    expect(fault(COPPER, 'Ag', { charge: '1 C' })).toMatchObject({ code: 'bad-ask', field: 'species' });
    expect(fault(COPPER, 'e^-', { charge: '1 C' })).toMatchObject({ code: 'bad-ask', field: 'species' });
    expect(fault(COPPER, 'Ag', { charge: '1 C' }).hint).toContain('Cu^2+, Cu');
  });

  it('reports a text that cannot be read before a species that takes no part', () => {
    expect(fault(COPPER, 'Ag', { charge: '1 Q' })).toMatchObject({ code: 'unknown-unit', field: 'given.charge' });
    expect(fault(COPPER, 'Ag', { charge: '1 C' }, { want: { mass: 'Q' } })).toMatchObject({ field: 'want.mass' });
  });

  it('does without a mass where an element has no standard weight, with a note', () => {
    const { quantities } = answer('TcO4^- + 8 H^+ + 7 e^- -> Tc + 4 H2O', 'Tc', { charge: '7 F' });
    expect(quantities['amount']?.value).toBeCloseTo(1, 12);
    expect(quantities['mass']).toBeUndefined();
    expect(notes('TcO4^- + 8 H^+ + 7 e^- -> Tc + 4 H2O', 'Tc', { charge: '7 F' })).toContain('no-molar-mass');
    const wanted = fault(
      'TcO4^- + 8 H^+ + 7 e^- -> Tc + 4 H2O',
      'Tc',
      { charge: '7 F' },
      { want: { thickness: 'µm' } },
    );
    expect(wanted.code).toBe('not-enough-given');
  });
});

describe('gas', () => {
  const given = { charge: '2 A h', temperature: '25 °C', pressure: '1 bar' };

  it('has a volume where the state is g, or without a state where the species is listed, with a note', () => {
    expect(answer(HYDROGEN, 'H2', given).quantities['volume']?.value).toBeCloseTo(0.9249328, 7);
    expect(notes(HYDROGEN, 'H2', given)).toEqual(['efficiency-assumed', 'dry-gas']);
    expect(notes('2 H^+ + 2 e^- -> H2', 'H2', given)).toEqual(['efficiency-assumed', 'gas-assumed', 'dry-gas']);
    expect(answer('2 H^+ + 2 e^- -> H2(aq)', 'H2', given).quantities['volume']).toBeUndefined();
    expect(answer('2 Br^- -> Br2 + 2 e^-', 'Br2', given).quantities['volume']).toBeUndefined();
    expect(answer('2 Br^- -> Br2(g) + 2 e^-', 'Br2', given).quantities['volume']?.unit).toBe('L');
  });

  it('needs temperature and pressure, and says so when a volume was measured', () => {
    expect(fault(HYDROGEN, 'H2', { volume: '900 mL' })).toMatchObject({
      code: 'not-enough-given',
      field: 'given',
      missing: ['temperature', 'pressure'],
    });
    expect(notes(HYDROGEN, 'H2', { charge: '2 A h', volume: '900 mL' })).toContain('given-unused');
  });

  it('subtracts the vapour pressure', () => {
    const wet = answer(HYDROGEN, 'H2', { ...given, vapour_pressure: '3.17 kPa' }).quantities['volume']?.value;
    const dry = answer(HYDROGEN, 'H2', given).quantities['volume']?.value;
    expect((wet ?? NaN) / (dry ?? NaN)).toBeCloseTo(100 / 96.83, 12);
    expect(notes(HYDROGEN, 'H2', { ...given, vapour_pressure: '3.17 kPa' })).toEqual(['efficiency-assumed']);
  });
});

describe('thickness, blank, record, tank', () => {
  it('gives thickness without an area: from the current density, or per square metre, with a note', () => {
    const density = '8.96 g/cm^3';
    const dense = { current_density: '2 A/dm^2', time: '30 min', density };
    expect(answer(COPPER, 'Cu', dense).quantities['thickness']?.value).toBeCloseTo(13.230962, 6);
    expect(notes(COPPER, 'Cu', dense)).toContain('per-area');
    const spread = { charge: '3600 C', density };
    expect(answer(COPPER, 'Cu', spread).quantities['thickness']?.value).toBeCloseTo(1.18549418 / 8.96, 7);
    expect(notes(COPPER, 'Cu', spread)).toContain('per-area');
    expect(notes(COPPER, 'Cu', { ...spread, area: '1 m^2' })).not.toContain('per-area');
  });

  it('subtracts the blank before the efficiency', () => {
    const given = { charge: '10 C', blank: '2 C', efficiency: '50 %' };
    const { quantities } = answer('Ag^+ + e^- -> Ag', 'Ag', given);
    expect((quantities['amount']?.value ?? NaN) * 96485.33212331).toBeCloseTo(4, 10);
    expect(quantities['blank']).toEqual({ value: 2, unit: 'C' });
  });

  it('integrates a record by trapezoids, net and possibly negative', () => {
    const record = [
      ['0 s', '1 A'],
      ['60 s', '-2 A'],
    ] as const;
    const { quantities } = answer(COPPER, 'Cu', { record });
    expect(quantities['charge']).toEqual({ value: -30, unit: 'C' });
    expect(quantities['mass']?.value).toBeLessThan(0);
    expect(quantities['time']).toEqual({ value: 60, unit: 's' });
    const far = fault(COPPER, 'Cu', { record, charge: '30 C' });
    expect(far).toMatchObject({ code: 'contradiction', field: 'given.charge' });
  });

  it('points into a record at what is wrong', () => {
    const bad = (record: readonly (readonly [string, string])[]): Fault => fault(COPPER, 'Cu', { record });
    expect(
      bad([
        ['0 s', '1 A'],
        ['60 s', '1 Q'],
      ]),
    ).toMatchObject({ code: 'unknown-unit', field: 'given.record[1][1]' });
    expect(
      bad([
        ['60 s', '1 A'],
        ['0 s', '1 A'],
      ]),
    ).toMatchObject({ code: 'bad-ask', field: 'given.record[1][0]' });
    expect(bad([['60 s', '1 A']])).toMatchObject({ code: 'not-enough-given', field: 'given.record' });
    expect(bad([])).toMatchObject({ code: 'not-enough-given' });
    expect(fault(COPPER, 'Cu', { record: '2 A' })).toMatchObject({ code: 'bad-ask', field: 'given.record' });
    expect(fault(COPPER, 'Cu', { charge: [['0 s', '1 A']] })).toMatchObject({ code: 'bad-ask', field: 'given.charge' });
  });

  it('counts from and to by the species asked', () => {
    const given = { volume: '100 L', from: '5 g/L', to: '1 g/L' };
    expect(answer(COPPER, 'Cu^2+', given).quantities['mass']?.value).toBeCloseTo(400, 9);
    expect(answer(COPPER, 'Cu', given).quantities['mass']?.value).toBeCloseTo(400, 9);
    expect(fault(COPPER, 'Cu^2+', { ...given, to: '6 g/L' })).toMatchObject({
      code: 'contradiction',
      field: 'given.to',
    });
    expect(fault(COPPER, 'Cu^2+', { from: '5 g/L', to: '1 g/L' })).toMatchObject({ code: 'not-enough-given' });
    expect(fault(COPPER, 'Cu^2+', { volume: '1 L', from: '500 ppm', to: '0' })).toMatchObject({ missing: ['density'] });
    expect(fault(COPPER, 'Cu^2+', { volume: '1 mol', from: '5 g/L', to: '0' })).toMatchObject({ code: 'unknown-unit' });
  });
});

describe('several reactions at an electrode', () => {
  const ZINC = 'Zn^2+ + 2 e^- -> Zn';
  const WATER = '2 H2O + 2 e^- -> H2(g) + 2 OH^-';

  it('lets one reaction without a share take the rest, with a note', () => {
    const circuit = electrodeCircuit([ZINC, '0.85'], [WATER]);
    const { quantities, alongside } = answer(circuit, 'Zn', { charge: '2 F' });
    expect(quantities['efficiency']).toEqual({ value: 85, unit: '%' });
    expect(quantities['amount']?.value).toBeCloseTo(0.85, 12);
    expect(alongside['H2']?.['amount']?.value).toBeCloseTo(0.15, 12);
    expect(notes(circuit, 'Zn', { charge: '2 F' })).toEqual(['share-assigned']);
  });

  it('reads shares as percentages, decimals and fractions', () => {
    for (const share of ['85 %', '0.85', '17/20', '85(1) %'])
      expect(answer(electrodeCircuit([ZINC, share], [WATER]), 'Zn', {}).quantities['share']?.value).toBeCloseTo(85, 12);
  });

  it('refuses shares over 100 %, negative ones and unreadable ones', () => {
    const two = (a: string, b: string) => electrodeCircuit([ZINC, a], [WATER, b]);
    expect(fault(two('85 %', '20 %'), 'Zn', {})).toMatchObject({ code: 'contradiction', field: 'electrode' });
    expect(fault(two('-5 %', '20 %'), 'Zn', {})).toMatchObject({ code: 'bad-ask', field: 'electrode[0].share' });
    expect(fault(two('85 %', 'x'), 'Zn', {})).toMatchObject({ code: 'bad-ask', field: 'electrode[1].share' });
  });

  it('finds the share from charge and a measured mass, amount or volume, and gives the rest to the other reaction', () => {
    const circuit = electrodeCircuit([ZINC], [WATER]);
    const weighed = answer(circuit, 'Zn', { charge: '2 F', amount: '0.85 mol' });
    expect(weighed.quantities['share']?.value).toBeCloseTo(85, 12);
    expect(weighed.alongside['H2']?.['share']?.value).toBeCloseTo(15, 10);
    expect(notes(circuit, 'Zn', { charge: '2 F', amount: '0.85 mol' })).toEqual(['share-found', 'share-assigned']);
    const gas = { charge: '2 F', volume: '5 L', temperature: '0 °C', pressure: '1 atm' };
    expect(answer(circuit, 'H2', gas).quantities['share']?.value).toBeCloseTo((5 / 22.41396954) * 100, 6);
    expect(fault(circuit, 'Zn', { charge: '2 F' })).toMatchObject({
      code: 'not-enough-given',
      field: 'electrode',
      missing: ['share'],
    });
  });

  it('notes a share over 100 % and leaves the other reaction out', () => {
    const circuit = electrodeCircuit([ZINC], [WATER]);
    const given = { charge: '2 F', amount: '1.1 mol' };
    expect(notes(circuit, 'Zn', given)).toEqual(['share-found', 'efficiency-over-100']);
    expect(answer(circuit, 'Zn', given).alongside['H2']).toEqual({});
  });

  it('checks a measured mass against a written share', () => {
    const circuit = electrodeCircuit([ZINC, '85 %'], [WATER]);
    expect(fault(circuit, 'Zn', { charge: '2 F', amount: '0.7 mol' })).toMatchObject({ code: 'contradiction' });
    expect(notes(circuit, 'Zn', { charge: '2 F', amount: '0.85 mol' })).toContain('surplus-agrees');
    expect(fault(circuit, 'Zn', { charge: '2 F', efficiency: '90 %' })).toMatchObject({ code: 'contradiction' });
    expect(notes(circuit, 'Zn', { charge: '2 F', share: '85 %' })).toContain('surplus-agrees');
  });

  it('takes a share in given for that of the reaction', () => {
    const circuit = electrodeCircuit([ZINC], [WATER]);
    const { quantities, alongside } = answer(circuit, 'Zn', { charge: '2 F', share: '85 %' });
    expect(quantities['amount']?.value).toBeCloseTo(0.85, 12);
    expect(alongside['H2']?.['amount']?.value).toBeCloseTo(0.15, 12);
  });

  it('adds up a species in several reactions, with a note', () => {
    const circuit = electrodeCircuit(['O2 + 4 H^+ + 4 e^- -> 2 H2O', '90 %'], ['O2 + 2 H^+ + 2 e^- -> H2O2']);
    const { quantities, electronsPerMole, alongside } = answer(circuit, 'O2', { charge: '1 F' });
    expect(quantities['amount']?.value).toBeCloseTo(0.9 / 4 + 0.1 / 2, 12);
    expect(electronsPerMole['O2']).toBe('40/11');
    expect(alongside['H^+']?.['amount']?.value).toBeCloseTo(1, 12);
    expect(notes(circuit, 'O2', { charge: '1 F' })).toEqual(['share-assigned', 'summed']);
  });
});

describe('beyond the fields of the contract', () => {
  it('multiplies by the cells of a stack and leaves out what bypasses', () => {
    const stack = answer(HYDROGEN, 'H2', { charge: '2 F' }, { cells: '50', bypass: '2 %' });
    expect(stack.quantities['amount']?.value).toBeCloseTo(49, 12);
    expect(stack.quantities['charge']?.value).toBeCloseTo(2 * 96485.33212331, 6);
    expect(fault(HYDROGEN, 'H2', { charge: '2 F' }, { cells: '2.5' })).toMatchObject({
      code: 'bad-ask',
      field: 'cells',
    });
    expect(fault(HYDROGEN, 'H2', { charge: '2 F' }, { bypass: '100 %' })).toMatchObject({ code: 'contradiction' });
    const energy = answer(HYDROGEN, 'H2', { charge: '2 F', voltage: '95 V' }, { cells: '50' }).quantities;
    const mass = energy['mass']?.value ?? NaN;
    expect(energy['energy_per_mass']?.value).toBeCloseTo((energy['energy']?.value ?? NaN) / (mass / 1000), 9);
  });

  it('says on request who contributes what to each uncertainty', () => {
    const given = { current: '2.000(4) A', time: '3600(5) s' };
    const { budgets } = answer(COPPER, 'Cu', given, { budget: true });
    const charge = budgets?.['charge'] ?? [];
    expect(charge.map(({ input }) => input)).toEqual(['current', 'time']);
    expect(charge[0]?.part).toBeCloseTo(14.4 ** 2 / (14.4 ** 2 + 10 ** 2), 12);
    expect(budgets?.['mass']?.map(({ input }) => input)).toEqual(['current', 'time', 'atomic weight of Cu']);
  });

  it('takes correlated inputs when told', () => {
    const given = { current: '2.000(4) A', time: '3600(5) s' };
    const correlations = [{ between: ['current', 'time'], coefficient: 1 }] as const;
    const charge = answer(COPPER, 'Cu', given, { correlations }).quantities['charge'];
    expect(charge?.uncertainty).toBeCloseTo(24.4, 10);
  });

  it('keeps a metal and its ion in step: their masses share the weight', () => {
    const { alongside } = answer('PbO2 + SO4^2- + 4 H^+ + 2 e^- -> PbSO4 + 2 H2O', 'PbO2', { mass: '239.2 g' });
    const sulfate = alongside['PbSO4']?.['mass'];
    expect(sulfate?.value).toBeCloseTo((303.256 / 239.198) * 239.2, 2);
    expect(sulfate?.uncertainty).toBeLessThan(0.3);
  });
});
