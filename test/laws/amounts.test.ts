import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Quantity } from '../../src/amounts/answered.ts';
import { QUANTITIES, QUANTITY_NAMES } from '../../src/amounts/quantities.ts';
import { readQuantity } from '../../src/amounts/quantity.ts';
import type { AmountsAnswer } from '../../src/amounts/working.ts';
import { amountsOf, electrodeCircuit } from '../amounts/circuit.ts';

const RUNS = { numRuns: 60 };
const HALVES = [
  ['Cu^2+ + 2 e^- -> Cu', 'Cu'],
  ['Ag^+ + e^- -> Ag', 'Ag'],
  ['2 H^+ + 2 e^- -> H2(g)', 'H2'],
  ['2 H2O -> O2(g) + 4 H^+ + 4 e^-', 'O2'],
  ['CrO4^2- + 8 H^+ + 6 e^- -> Cr + 4 H2O', 'Cr'],
] as const;
const half = fc.constantFrom(...HALVES);
/** A positive number with few digits, so that its text is its value. */
const size = fc.integer({ min: 1, max: 9999 }).map((whole) => whole / 100);
const percent = fc.integer({ min: 1, max: 1000 }).map((whole) => whole / 10);

const answered = (...args: Parameters<typeof amountsOf>): AmountsAnswer => {
  const result = amountsOf(...args);
  if (!result.ok) throw new Error(JSON.stringify(result.fault));
  return result.value;
};
const text = ({ value, unit }: Quantity): string => `${String(value)} ${unit}`;
const near = (a: number | undefined, b: number | undefined): void => {
  expect(Math.abs((a ?? NaN) - (b ?? NaN))).toBeLessThanOrEqual(1e-9 * Math.abs(b ?? NaN));
};

describe('laws of the amounts', () => {
  it('returns an input that is taken out when what was derived from it is given', () => {
    const inputs = fc.record({ current: size, time: size, efficiency: percent, voltage: size });
    fc.assert(
      fc.property(half, inputs, fc.constantFrom('current', 'time', 'efficiency'), ([reaction, species], is, out) => {
        const given = {
          current: `${String(is.current)} A`,
          time: `${String(is.time)} h`,
          efficiency: `${String(is.efficiency)} %`,
        };
        const all = answered(reaction, species, given).quantities;
        for (const derived of ['mass', 'amount'] as const) {
          const quantity = all[derived];
          if (quantity === undefined) throw new Error(derived);
          const rest = Object.fromEntries(Object.entries(given).filter(([name]) => name !== out));
          const back = answered(reaction, species, { ...rest, [derived]: text(quantity) });
          near(back.quantities[out]?.value, all[out]?.value);
        }
      }),
      RUNS,
    );
  });

  it('agrees with itself: everything derived can be given back at once', () => {
    fc.assert(
      fc.property(half, size, size, percent, size, ([reaction, species], current, time, efficiency, voltage) => {
        const given = {
          current: `${String(current)} A`,
          time: `${String(time)} min`,
          efficiency: `${String(efficiency)} %`,
          voltage: `${String(voltage)} V`,
          temperature: '298.15 K',
          pressure: '100 kPa',
        };
        const { quantities } = answered(reaction, species, given);
        const again = Object.fromEntries(Object.entries(quantities).map(([name, one]) => [name, text(one)]));
        const back = answered(reaction, species, again).quantities;
        for (const [name, one] of Object.entries(quantities)) near(back[name]?.value, one.value);
      }),
      RUNS,
    );
  });

  it('does not care for the units of the ask or of the answer', () => {
    const currents = fc.constantFrom(['A', 1], ['mA', 1000], ['kA', 0.001] as const);
    fc.assert(
      fc.property(half, fc.integer({ min: 1, max: 5000 }), currents, ([reaction, species], amperes, [unit, per]) => {
        const plain = answered(reaction, species, { current: `${String(amperes)} A`, time: '2 h' });
        const other = answered(
          reaction,
          species,
          { current: `${String(amperes * per)} ${unit}`, time: '7200 s' },
          { want: { mass: 'lb', charge: 'A h' } },
        );
        near((other.quantities['mass']?.value ?? NaN) * 453.59237, plain.quantities['mass']?.value);
        near((other.quantities['charge']?.value ?? NaN) * 3600, plain.quantities['charge']?.value);
      }),
      RUNS,
    );
  });

  it('is linear in the charge, for the species asked and for all others', () => {
    fc.assert(
      fc.property(half, size, fc.integer({ min: 2, max: 50 }), ([reaction, species], charge, factor) => {
        const one = answered(reaction, species, { charge: `${String(charge)} C` });
        const many = answered(reaction, species, { charge: `${String(charge)} C` }, { cells: String(factor) });
        near(many.quantities['mass']?.value, factor * (one.quantities['mass']?.value ?? NaN));
        const more = answered(reaction, species, { charge: `${String(charge * factor)} C` });
        near(more.quantities['amount']?.value, factor * (one.quantities['amount']?.value ?? NaN));
        for (const [name, quantities] of Object.entries(one.alongside))
          near(more.alongside[name]?.['mass']?.value, factor * (quantities['mass']?.value ?? NaN));
      }),
      RUNS,
    );
  });

  it('adds the shares of an electrode up to the whole current, written or found', () => {
    const circuit = (share?: string) =>
      electrodeCircuit(share === undefined ? ['Zn^2+ + 2 e^- -> Zn'] : ['Zn^2+ + 2 e^- -> Zn', share], [
        '2 H2O + 2 e^- -> H2(g) + 2 OH^-',
      ]);
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 999 }), size, (perMille, charge) => {
        const share = `${String(perMille / 10)} %`;
        const written = answered(circuit(share), 'Zn', { charge: `${String(charge)} A h` });
        near((written.quantities['share']?.value ?? NaN) + (written.alongside['H2']?.['share']?.value ?? NaN), 100);
        const mass = written.quantities['mass'];
        if (mass === undefined) throw new Error('mass');
        const found = answered(circuit(), 'Zn', { charge: `${String(charge)} A h`, mass: text(mass) });
        near(found.quantities['share']?.value, perMille / 10);
        const moles = (answer: AmountsAnswer): number =>
          2 * ((answer.quantities['amount']?.value ?? NaN) + (answer.alongside['H2']?.['amount']?.value ?? NaN));
        near(moles(found) * 96485.33212331, charge * 3600);
      }),
      RUNS,
    );
  });

  it('scales nothing with the scale of the half-reaction', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 40 }), size, (scale, charge) => {
        const times = (count: number): string => (count * scale === 1 ? '' : `${String(count * scale)} `);
        const reaction = `${times(1)}Cr2O7^2- + ${times(14)}H^+ + ${times(6)}e^- -> ${times(2)}Cr^3+ + ${times(7)}H2O`;
        const answer = answered(reaction, 'Cr^3+', { charge: `${String(charge)} C` });
        expect(answer.electronsPerMole).toEqual({
          'Cr2O7^2-': '6',
          'H^+': '3/7',
          'Cr^3+': '3',
          H2O: '6/7',
        });
      }),
      RUNS,
    );
  });

  it('never throws on any text, and points into it', () => {
    const pieces = fc.constantFrom(
      '2',
      '1.5',
      ' ',
      'A',
      'h',
      '/',
      '(',
      ')',
      '±',
      '%',
      '°C',
      'x',
      '^',
      '-',
      '10',
      'min',
      '🔥',
    );
    fc.assert(
      fc.property(fc.array(pieces, { maxLength: 9 }), fc.constantFrom(...QUANTITY_NAMES), (parts, name) => {
        const given = parts.join('');
        const result = readQuantity(given, QUANTITIES[name]);
        if (result.ok) return Number.isFinite(result.value.value);
        const { from, to } = result.fault.span ?? { from: -1, to: -1 };
        return from >= 0 && to >= from && to <= Array.from(given).length;
      }),
      { numRuns: 1500 },
    );
  });

  it('answers nothing that cannot be: no negative time, area, efficiency or concentration, whatever is given', () => {
    const value = fc.constantFrom('-3', '0', '0.5', '2', '40');
    const units = {
      charge: 'A h',
      current: 'A',
      current_density: 'A/dm^2',
      area: 'dm^2',
      time: 'h',
      blank: 'A h',
      mass: 'g',
      volume: 'L',
      from: 'g/L',
      to: 'g/L',
      voltage: 'V',
      energy: 'kWh',
      vapour_pressure: 'kPa',
      pressure: 'kPa',
    };
    const names = Object.entries(units);
    const given = fc
      .uniqueArray(fc.tuple(fc.constantFrom(...names), value), { selector: ([[name]]) => name, maxLength: 5 })
      .map((entries) => Object.fromEntries(entries.map(([[name, unit], number]) => [name, `${number} ${unit}`])));
    const species = fc.constantFrom(['Cu^2+ + 2 e^- -> Cu', 'Cu^2+'], ['2 H^+ + 2 e^- -> H2(g)', 'H2'] as const);
    fc.assert(
      fc.property(species, given, ([reaction, asked], texts) => {
        const result = amountsOf(reaction, asked, texts);
        if (!result.ok) return result.fault.message !== '';
        const codes = result.notes.map(({ code }) => code);
        const { quantities } = result.value;
        const never = ['time', 'area', 'efficiency', 'temperature', 'mass_per_charge', 'charge_per_mass'];
        const stays = [...never, ...(codes.includes('below-zero') ? [] : ['from', 'to'])];
        const turned = codes.includes('runs-backwards') ? [] : ['mass', 'amount', 'volume'];
        return [...stays, ...turned].every((name) => (quantities[name]?.value ?? 0) >= 0);
      }),
      { numRuns: 400 },
    );
  });
});
