import { describe, expect, it } from 'vitest';
import { answer } from '../../src/desk/answer.ts';
import { answerSchema } from '../../src/desk/schema/answer.ts';
import { askSchema } from '../../src/desk/schema/ask.ts';

type Fields = Readonly<Record<string, unknown>>;
interface Amounts {
  readonly ok: boolean;
  readonly fault: { readonly code: string };
  readonly answer: {
    readonly quantities: Readonly<Record<string, { readonly value: number; readonly uncertainty?: number }>>;
    readonly budgets?: Readonly<Record<string, readonly { readonly input: string; readonly part: number }[]>>;
    readonly tank?: {
      readonly acid?: { readonly value: number };
      readonly base?: { readonly value: number };
      readonly water?: { readonly amount: { readonly value: number } };
    };
    readonly series?: readonly Amounts['answer'][];
  };
}

/** As a program on the other side of a pipe would see it; ask and answer fit the schemas. */
const sent = (fields: Fields): Amounts => {
  const ask = { ask: 'amounts', ...fields };
  const given: unknown = JSON.parse(JSON.stringify(answer(ask)));
  expect(askSchema.safeParse(ask).error?.issues).toBeUndefined();
  expect(answerSchema.safeParse(given).error?.issues).toBeUndefined();
  return given as Amounts;
};

const COPPER = { half: 'Cu^2+ + 2 e^- -> Cu', species: 'Cu' };
const FARADAY = 96485.33212;

describe('a stack', () => {
  it('works in every cell with what does not pass by', () => {
    const given = { charge: `${String(FARADAY * 2)} C` };
    const one = sent({ ...COPPER, given }).answer.quantities['amount']?.value ?? 0;
    expect(one).toBeCloseTo(1, 8);
    const stack = sent({ ...COPPER, given, cells: '24', bypass: '2 %' });
    expect(stack.answer.quantities['amount']?.value).toBeCloseTo(24 * 0.98, 6);
  });

  it('has a whole number of cells, as text', () => {
    expect(sent({ ...COPPER, given: { charge: '1 C' }, cells: '2.5' })).toMatchObject({
      fault: { code: 'bad-ask', field: 'cells' },
    });
    expect(answer({ ask: 'amounts', ...COPPER, given: {}, cells: 24 })).toMatchObject({
      fault: { code: 'bad-ask', field: 'cells' },
    });
  });
});

describe('a budget', () => {
  const given = { current: '2.00 A ± 0.02 A', time: '100 s ± 2 s' };

  it('says who contributes what', () => {
    const { budgets } = sent({ ...COPPER, given, budget: true }).answer;
    // u^2(Q)/Q^2 = 0.01^2 + 0.02^2: time has 4 parts of 5.
    expect(budgets?.['charge']?.map(({ input }) => input)).toEqual(['time', 'current']);
    expect(budgets?.['charge']?.[0]?.part).toBeCloseTo(0.8, 9);
    expect(sent({ ...COPPER, given }).answer.budgets).toBeUndefined();
  });

  it('knows of inputs that are correlated', () => {
    const correlated = (coefficient: string) => {
      const correlations = [{ between: ['current', 'time'], coefficient }];
      return sent({ ...COPPER, given, correlations }).answer.quantities['charge']?.uncertainty;
    };
    // Relative: fully correlated 1 % + 2 % = 3 %, fully opposed 1 %, of 200 C.
    expect(correlated('1')).toBeCloseTo(6, 9);
    expect(correlated('-1')).toBeCloseTo(2, 9);
    expect(correlated('0')).toBeCloseTo(200 * Math.sqrt(0.0005), 9);
  });

  it.each([
    [{ between: ['current', 'tme'], coefficient: '1' }, 'correlations[0].between[1]'],
    [{ between: ['current', 'current'], coefficient: '1' }, 'correlations[0].between'],
    [{ between: ['current', 'time'], coefficient: '1.5' }, 'correlations[0].coefficient'],
    [{ between: ['current', 'time'], coefficient: 'much' }, 'correlations[0].coefficient'],
  ])('refuses %j', (one, field) => {
    expect(sent({ ...COPPER, given, correlations: [one] })).toMatchObject({ fault: { code: 'bad-ask', field } });
  });
});

describe('the balance of a tank', () => {
  it('of copper winning makes acid of water', () => {
    // 2 Cu^2+ + 2 H2O -> O2 + 2 Cu + 4 H^+ with 4 e^-: 1 mol of H^+ made and 1/2 mol of H2O used per mole of e^-.
    const cell = { anode: ['H2O -> O2'], cathode: ['Cu^2+ -> Cu'], medium: 'acid' };
    const { tank } = sent({ cell, species: 'Cu', given: { charge: `${String(FARADAY)} C` }, tank: true }).answer;
    expect(tank?.acid?.value).toBeCloseTo(1, 8);
    expect(tank?.water?.amount.value).toBeCloseTo(-0.5, 8);
    expect(tank).not.toHaveProperty('base');
  });

  it('follows the charge that a weighing gives, and an efficiency', () => {
    const half = '2 H2O + 2 e^- -> H2 + 2 OH^-';
    const charge = `${String(FARADAY)} C`;
    const { tank } = sent({ half, species: 'H2', given: { charge, efficiency: '50 %' }, tank: true }).answer;
    expect(tank?.base?.value).toBeCloseTo(0.5, 8);
    const weighed = sent({ half, species: 'H2', given: { amount: '0.5 mol' }, tank: true }).answer;
    expect(weighed.tank?.base?.value).toBeCloseTo(1, 8);
  });

  it('knows the share that a weighing gives, and lets the other reaction take the rest', () => {
    const electrode = [{ half: 'Cu^2+ + 2 e^- -> Cu' }, { half: '2 H^+ + 2 e^- -> H2' }];
    // A quarter of a mole of copper takes half a mole of electrons of one; the rest takes up half a mole of H^+.
    const given = { charge: `${String(FARADAY)} C`, amount: '0.25 mol' };
    const { tank } = sent({ electrode, species: 'Cu', given, tank: true }).answer;
    expect(tank?.acid?.value).toBeCloseTo(-0.5, 8);
  });

  it('needs a charge', () => {
    expect(sent({ ...COPPER, given: {}, tank: true })).toMatchObject({
      fault: { code: 'not-enough-given', missing: ['charge'] },
    });
  });
});

describe('cells in series', () => {
  it('share the charge that one of them gives', () => {
    const silver = { half: 'Ag^+ + e^- -> Ag', species: 'Ag' };
    const { series } = sent({ ...COPPER, given: { charge: `${String(FARADAY)} C` }, series: [silver] }).answer;
    expect(series?.[0]?.quantities['amount']?.value).toBeCloseTo(1, 8);
    // A silver coulometer measures for the copper: 107.87 g of silver (IUPAC 2021, abridged) is 1 mol of electrons, half a mole of copper.
    const coulometer = { ...silver, given: { mass: '107.87 g' } };
    const measured = sent({ ...COPPER, given: {}, series: [coulometer] }).answer;
    expect(measured.quantities['amount']?.value).toBeCloseTo(0.5, 8);
  });

  it('are bounded', () => {
    const series = Array.from({ length: 101 }, () => COPPER);
    expect(sent({ ...COPPER, given: {}, series })).toMatchObject({ fault: { code: 'too-hard', field: 'series' } });
  });

  it('name the cell that is at fault', () => {
    const base = { ...COPPER, given: { charge: '1 C' } };
    expect(sent({ ...base, series: [{ half: 'Ag^+ -> Xx', species: 'Ag' }] })).toMatchObject({
      fault: { code: 'unknown-element', field: 'series[0].half' },
    });
    const given = { mass: '1 parsec' };
    expect(sent({ ...base, series: [{ half: 'Ag^+ + e^- -> Ag', species: 'Ag', given }] })).toMatchObject({
      fault: { code: 'unknown-unit', field: 'series[0].given.mass' },
    });
    expect(sent({ ...COPPER, given: { charge: '1 parsec' }, series: [COPPER] })).toMatchObject({
      fault: { code: 'unknown-unit', field: 'given.charge' },
    });
  });
});

describe('a strict ask', () => {
  it('takes no unit that has two meanings', () => {
    const given = { volume: '100 L', from: '50 ppm', to: '10 ppm', density: '1 kg/L' };
    expect(sent({ ...COPPER, given })).toMatchObject({ ok: true });
    expect(sent({ ...COPPER, given, strict: true })).toMatchObject({
      fault: { code: 'unknown-unit', field: 'given.from', span: { from: 0, to: 6 } },
    });
    const want = { mass_per_charge: 'g/A h' };
    expect(sent({ ...COPPER, given: {}, want })).toMatchObject({ ok: true });
    expect(sent({ ...COPPER, given: {}, want, strict: true })).toMatchObject({
      fault: { code: 'unknown-unit', field: 'want.mass_per_charge' },
    });
  });

  it('takes nothing as a gas that does not say so', () => {
    const given = { charge: '1 A h', temperature: '25 °C', pressure: '1 bar' };
    const oxygen = (state: string) => ({ half: `2 H2O -> O2${state} + 4 H^+ + 4 e^-`, species: 'O2', given });
    expect(sent(oxygen(''))).toMatchObject({ ok: true });
    expect(sent({ ...oxygen(''), strict: true })).toMatchObject({ fault: { code: 'bad-ask', field: 'half' } });
    expect(sent({ ...oxygen('(g)'), strict: true })).toMatchObject({ ok: true });
  });
});
