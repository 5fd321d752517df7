import { describe, expect, it } from 'vitest';
import { answer } from '../../src/desk/answer.ts';
import { answerSchema } from '../../src/desk/schema/answer.ts';
import { askSchema } from '../../src/desk/schema/ask.ts';

type Fields = Readonly<Record<string, unknown>>;

/** As a program on the other side of a pipe would see it; ask and answer fit the schemas. */
const sent = (ask: Fields): unknown => {
  const given: unknown = JSON.parse(JSON.stringify(answer(ask)));
  expect(askSchema.safeParse(ask).error?.issues).toBeUndefined();
  expect(answerSchema.safeParse(given).error?.issues).toBeUndefined();
  return given;
};

const answerOf = (ask: Fields): unknown => {
  const given = sent(ask);
  expect(given).toMatchObject({ ok: true });
  return given;
};

describe('hydronium', () => {
  it('is another species than H^+ unless folding is asked for', () => {
    const ask = { ask: 'half', skeleton: 'H3O^+ -> H2', medium: 'acid' };
    expect(answerOf({ ...ask, foldHydronium: true })).toMatchObject({
      answer: { reaction: { plain: '2 H^+ + 2 e^- -> H2' } },
      notes: expect.arrayContaining([expect.objectContaining({ code: 'hydronium-folded' })]) as unknown,
    });
    expect(answerOf({ ask: 'half', skeleton: 'H3O^+ -> H2', medium: { helpers: ['H2O'] } })).toMatchObject({
      answer: { reaction: { plain: '2 H3O^+ + 2 e^- -> H2 + 2 H2O' } },
    });
  });

  it('leaves water free beside it, whatever the medium lends', () => {
    const skeleton = 'MnO4^- + H3O^+ -> Mn^2+ + H2O';
    expect(answerOf({ ask: 'half', skeleton, medium: 'acid', foldHydronium: true })).toMatchObject({
      answer: { reaction: { plain: 'MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O' } },
    });
    expect(answerOf({ ask: 'half', skeleton, medium: 'none', foldHydronium: true })).toMatchObject({
      answer: { reaction: { plain: 'MnO4^- + 8 H^+ + 5 e^- -> 4 H2O + Mn^2+' } },
    });
    expect(
      answerOf({ ask: 'redox', skeleton: 'Zn + H3O^+ -> Zn^2+ + H2 + H2O', medium: 'acid', foldHydronium: true }),
    ).toMatchObject({ answer: { overall: { plain: 'Zn + 2 H^+ -> Zn^2+ + H2' } } });
  });

  it('is folded in equations, audits, cells and amounts as well', () => {
    expect(answerOf({ ask: 'equation', text: '2 H3O^+ -> H2', foldHydronium: true })).toMatchObject({
      answer: {
        left: [
          { coefficient: '2', species: { plain: 'H^+' } },
          { coefficient: '2', species: { plain: 'H2O' } },
        ],
      },
    });
    const equation = 'Zn + 2 H3O^+ -> Zn^2+ + H2 + 2 H2O';
    expect(answerOf({ ask: 'audit', equation, foldHydronium: true })).toMatchObject({
      answer: { verdict: 'balanced' },
    });
    expect(
      answerOf({ ask: 'cell', anode: ['Zn -> Zn^2+'], cathode: ['H3O^+ -> H2'], medium: 'acid', foldHydronium: true }),
    ).toMatchObject({ answer: { overall: { plain: 'Zn + 2 H^+ -> Zn^2+ + H2' } } });
    const half = '2 H3O^+ + 2 e^- -> H2 + 2 H2O';
    expect(answerOf({ ask: 'amounts', half, species: 'H^+', given: {}, foldHydronium: true })).toMatchObject({
      answer: { electronsPerMole: { 'H^+': '1', H2: '2' } },
    });
  });

  it('cannot be folded in a diagram', () => {
    const ask = { ask: 'cell', diagram: 'Zn | Zn^2+ || Cu^2+ | Cu', foldHydronium: true };
    expect(answer(ask)).toMatchObject({ ok: false, fault: { code: 'bad-ask', field: 'foldHydronium' } });
  });
});

describe('the scale of an answer', () => {
  it('is lowest whole numbers, one electron, or one mole of a species', () => {
    const half = { ask: 'half', skeleton: 'O2 -> H2O', medium: 'acid' };
    expect(answerOf({ ...half, per: 'electron' })).toMatchObject({
      answer: {
        reaction: { plain: '1/4 O2 + H^+ + e^- -> 1/2 H2O' },
        electrons: '1',
        ledger: { O: ['1/2', '1/2'], H: ['1', '1'], charge: ['0', '0'] },
      },
      notes: [{ code: 'scaled' }],
    });
    expect(answerOf({ ...half, per: 'H2O' })).toMatchObject({
      answer: { reaction: { plain: '1/2 O2 + 2 H^+ + 2 e^- -> H2O' }, electrons: '2' },
    });
    expect(answerOf({ ...half, per: 'O2' })).toMatchObject({ answer: { electrons: '4' }, notes: [] });
  });

  it('takes the halves of a redox reaction and of a cell less often', () => {
    const redox = { ask: 'redox', skeleton: 'MnO4^- + Fe^2+ -> Mn^2+ + Fe^3+', medium: 'acid', per: 'Fe^2+' };
    expect(answerOf(redox)).toMatchObject({
      answer: {
        overall: { plain: '1/5 MnO4^- + Fe^2+ + 8/5 H^+ -> 1/5 Mn^2+ + Fe^3+ + 4/5 H2O' },
        electrons: '1',
        oxidation: { multiplier: '1', electrons: '1' },
        reduction: { multiplier: '1/5', electrons: '5' },
      },
    });
    const cell = { ask: 'cell', anode: ['H2O -> O2'], cathode: ['Cu^2+ -> Cu'], medium: 'acid', per: 'electron' };
    expect(answerOf(cell)).toMatchObject({
      answer: {
        overall: { plain: '1/2 Cu^2+ + 1/2 H2O -> 1/4 O2 + 1/2 Cu + H^+' },
        electrons: '1',
        anode: [{ multiplier: '1/4' }],
        cathode: [{ multiplier: '1/2' }],
      },
    });
  });

  it('cannot be that of a species which takes no part, or which cannot be read', () => {
    const half = { ask: 'half', skeleton: 'O2 -> H2O', medium: 'acid' };
    expect(sent({ ...half, per: 'Cu' })).toMatchObject({
      fault: { code: 'bad-ask', field: 'per', span: { from: 0, to: 2 } },
    });
    expect(sent({ ...half, per: 'Xx' })).toMatchObject({ fault: { code: 'unknown-element', field: 'per' } });
  });
});

describe('irreducible balances', () => {
  const ask = { ask: 'redox', skeleton: 'MnO4^- + H2O2 -> Mn^2+ + O2', medium: 'acid' };

  it('stand in the fault where they are asked for, each conserved', () => {
    const given = sent({ ...ask, irreducible: true });
    expect(given).toMatchObject({ fault: { code: 'several-balances', field: 'skeleton' } });
    const { irreducible, family } = (given as { fault: Record<string, readonly { plain: string }[]> }).fault;
    const plain = (irreducible ?? []).map((one) => one.plain);
    // By hand: with a of MnO4^- and b of H2O2, O2 is (5 a + 2 b) / 4; what is whole is 4 a, 2 b, or 2 a with b.
    const extreme = ['2 H2O2 -> O2 + 2 H2O', '4 MnO4^- + 12 H^+ -> 4 Mn^2+ + 5 O2 + 6 H2O'];
    const middle = '2 MnO4^- + H2O2 + 6 H^+ -> 2 Mn^2+ + 3 O2 + 4 H2O';
    expect(new Set(plain)).toEqual(new Set([...extreme, middle]));
    expect(new Set(family?.map((one) => one.plain))).toEqual(new Set(extreme));
  });

  it('are left out where they are not asked for, and change nothing where the balance is unique', () => {
    expect((sent(ask) as { fault: object }).fault).not.toHaveProperty('irreducible');
    const unique = { ask: 'half', skeleton: 'Cu^2+ -> Cu', medium: 'acid' };
    expect(sent({ ...unique, irreducible: true })).toEqual(sent(unique));
  });
});

describe('contributions to a ledger', () => {
  it('are listed term by term on request', () => {
    const equation = '2 H2 + O2 -> H2O';
    expect(answerOf({ ask: 'audit', equation, contributions: true })).toMatchObject({
      answer: {
        contributions: [
          { term: '2 H2', side: 'left', amounts: { H: '4' } },
          { term: 'O2', side: 'left', amounts: { O: '2' } },
          { term: 'H2O', side: 'right', amounts: { H: '2', O: '1' } },
        ],
      },
    });
    expect((answerOf({ ask: 'audit', equation }) as { answer: object }).answer).not.toHaveProperty('contributions');
    const cell = { anode: 'Zn -> Zn^2+ + 2 e^-', cathode: 'Ag^+ + e^- -> Ag', overall: 'Zn + 2 Ag^+ -> Zn^2+ + 2 Ag' };
    expect(answerOf({ ask: 'audit', ...cell, contributions: true })).toMatchObject({
      answer: { parts: { anode: { contributions: [{ term: 'Zn' }, { term: 'Zn^2+' }, { term: '2 e^-' }] } } },
    });
  });
});
