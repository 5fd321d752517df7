import { describe, expect, it } from 'vitest';
import {
  type Measured,
  measuredFrom,
  over,
  scaled,
  times,
  uncertaintyOf,
  weightedSum,
} from '../../src/amounts/measured.ts';
import { amountsOf, electrodeCircuit } from '../amounts/circuit.ts';

const input = (name: string, value: number, uncertainty: number): Measured =>
  measuredFrom({ name, value, uncertainty, lastDigit: 0 });

describe('worked examples of the GUM (JCGM 100:2008)', () => {
  it('H.1, end-gauge calibration: 32 nm from 25, 9.7, 2.9 and 16.6 nm', () => {
    // l = l_S + d - l_S (d_alpha theta + alpha_S d_theta), lengths in nm.
    const standard = input('l_S', 50_000_623, 25);
    const difference = input('d', 215, 9.7);
    const expansion = times(input('d_alpha', 0, 0.58e-6), input('theta', -0.1, 0.41));
    const temperature = times(input('alpha_S', 11.5e-6, 1.2e-6), input('d_theta', 0, 0.029));
    const correction = times(
      standard,
      weightedSum([
        [1, expansion],
        [1, temperature],
      ]),
    );
    const length = weightedSum([
      [1, standard],
      [1, difference],
      [-1, correction],
    ]);
    expect(length.value).toBe(50_000_838);
    expect(uncertaintyOf(times(standard, expansion))).toBeCloseTo(2.9, 1);
    expect(uncertaintyOf(times(standard, temperature))).toBeCloseTo(16.7, 1);
    expect(Math.round(uncertaintyOf(length))).toBe(32);
  });

  it('H.2, impedance from correlated voltage and current: Z = 254.26 ohm, u = 0.236 ohm, r(V, I) = -0.36', () => {
    const impedance = over(input('V', 4.999, 0.0032), input('I', 0.019661, 0.0000095));
    expect(impedance.value).toBeCloseTo(254.26, 2);
    const correlated = uncertaintyOf(impedance, [{ between: ['V', 'I'], coefficient: -0.36 }]);
    expect(Math.abs(correlated - 0.236)).toBeLessThan(0.001);
    expect(uncertaintyOf(impedance)).toBeLessThan(correlated);
  });

  it('5.2.2, ten resistors calibrated against one standard add linearly: 1 ohm, not 0.32 ohm', () => {
    const standard = input('R_S', 1000, 0.1);
    const ten = weightedSum(Array.from({ length: 10 }, () => [1, scaled(standard, 1)] as const));
    expect(uncertaintyOf(ten)).toBeCloseTo(1, 12);
  });
});

/** A small seeded generator (mulberry32), so that a run can be repeated. */
const generator = (seed: number): (() => number) => {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
};
const draw = generator(20260);
const normal = (mean: number, deviation: number): number =>
  mean + deviation * Math.sqrt(-2 * Math.log(1 - draw())) * Math.cos(2 * Math.PI * draw());
const rectangle = (middle: number, halfWidth: number): number => middle + halfWidth * (2 * draw() - 1);

/** Mean and standard deviation of 60 000 draws of a model written here by hand (JCGM 101:2008, 7). */
const simulate = (model: () => number): { readonly mean: number; readonly deviation: number } => {
  const count = 60_000;
  const draws = Array.from({ length: count }, model);
  const mean = draws.reduce((sum, one) => sum + one, 0) / count;
  const variance = draws.reduce((sum, one) => sum + (one - mean) ** 2, 0) / (count - 1);
  return { mean, deviation: Math.sqrt(variance) };
};

const F = 96485.33212331;

const agree = (
  result: ReturnType<typeof amountsOf>,
  name: string,
  simulated: { readonly mean: number; readonly deviation: number },
): void => {
  if (!result.ok) throw new Error(JSON.stringify(result.fault));
  const quantity = result.value.quantities[name];
  expect(Math.abs((quantity?.value ?? NaN) - simulated.mean)).toBeLessThan(0.05 * simulated.deviation);
  expect(Math.abs((quantity?.uncertainty ?? NaN) / simulated.deviation - 1)).toBeLessThan(0.02);
};

describe('Monte Carlo (JCGM 101:2008), seeded', () => {
  it('agrees on a current efficiency weighed from lead, whose weight is the widest', () => {
    const given = { current: '2.000(10) A', time: '1 h ± 10 s', mass: '7.600(20) g' };
    const result = amountsOf('Pb^2+ + 2 e^- -> Pb', 'Pb', given);
    const model = (): number =>
      (100 * normal(7.6, 0.02) * 2 * F) / (rectangle(207.2, 1.1) * normal(2, 0.01) * normal(3600, 10));
    agree(result, 'efficiency', simulate(model));
  });

  it('agrees on a wet gas at an uncertain temperature and pressure', () => {
    const given = {
      charge: '2.00(2) A h',
      temperature: '25.0(5) °C',
      pressure: '1.000(5) bar',
      vapour_pressure: '3.17(10) kPa',
    };
    const result = amountsOf('2 H^+ + 2 e^- -> H2(g)', 'H2', given);
    const model = (): number =>
      ((normal(7200, 72) / (2 * F)) * 8.31446261815324 * normal(298.15, 0.5) * 1000) /
      (normal(100000, 500) - normal(3170, 100));
    agree(result, 'volume', simulate(model));
  });

  it('agrees on a blank subtracted before the efficiency', () => {
    const given = { charge: '3.100(8) C', blank: '0.100(6) C', efficiency: '99.0(5) %' };
    const result = amountsOf('2 I^- -> I2 + 2 e^-', 'I2', given);
    agree(
      result,
      'amount',
      simulate(() => (normal(0.99, 0.005) * (normal(3.1, 0.008) - normal(0.1, 0.006))) / (2 * F)),
    );
  });

  it('agrees on a share found from the mass of an oxide whose weight enters twice', () => {
    const circuit = electrodeCircuit(['Pb^2+ + 2 H2O -> PbO2 + 4 H^+ + 2 e^-'], ['2 H2O -> O2(g) + 4 H^+ + 4 e^-']);
    const result = amountsOf(circuit, 'PbO2', { charge: '10.00(5) A h', mass: '40.00(10) g' });
    const model = (): number =>
      (100 * normal(40, 0.1) * 2 * F) / ((rectangle(207.2, 1.1) + 2 * rectangle(15.999, 0.001)) * normal(36000, 180));
    agree(result, 'share', simulate(model));
  });
});
