import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import { answer } from '../../src/desk/answer.ts';
import { answerSchema } from '../../src/desk/schema/answer.ts';
import { askSchema } from '../../src/desk/schema/ask.ts';

interface BadAsk {
  readonly name: string;
  readonly ask: unknown;
  readonly kind: string | null;
  readonly field?: string;
  readonly hint?: string;
}

interface KindCase {
  readonly ask: Readonly<Record<string, unknown>>;
  readonly code?: string;
  readonly field?: string;
  readonly span?: unknown;
}

const table = (path: string): unknown => parse(readFileSync(path, 'utf8'));
const badAsks = table('fixtures/asks/bad-asks.yaml') as readonly BadAsk[];
const kinds = table('fixtures/asks/every-kind.yaml') as readonly KindCase[];
const contract = table('fixtures/contract/asks.yaml') as readonly { readonly name: string; readonly ask: unknown }[];

/** As a program on the other side of a pipe would see it. */
const sent = (ask: unknown): unknown => JSON.parse(JSON.stringify(answer(ask)));

describe('an ask that is wrong as an ask', () => {
  it.each(badAsks)('is refused with its field: $name', ({ ask, kind, field, hint }) => {
    const given = answer(ask);
    expect(given).toMatchObject({ contract: 1, ask: kind, ok: false, fault: { code: 'bad-ask' } });
    if (given.ok) return;
    expect(given.fault.field).toBe(field);
    if (hint !== undefined) expect(given.fault.hint).toContain(hint);
    expect(askSchema.safeParse(ask).success && !/where|share|electrons/.test(field ?? '')).toBe(false);
  });
});

describe('an ask of each kind', () => {
  it.each(kinds.filter(({ code }) => code === undefined))(
    'is answered in the shape of the contract: $ask',
    ({ ask }) => {
      const given = sent(ask);
      expect(given).toMatchObject({ contract: 1, ask: ask['ask'], ok: true });
      expect(answerSchema.safeParse(given).error?.issues).toBeUndefined();
      expect(askSchema.safeParse(ask).success).toBe(true);
    },
  );

  it.each(kinds.filter(({ code }) => code !== undefined))(
    'names the field of a fault: $ask',
    ({ ask, code, field, span }) => {
      const given = sent(ask);
      expect(given).toMatchObject({ contract: 1, ask: ask['ask'], ok: false, fault: { code, field } });
      if (span !== undefined) expect(given).toMatchObject({ fault: { span } });
      expect(answerSchema.safeParse(given).error?.issues).toBeUndefined();
    },
  );

  it.each(contract)('has the shape of the contract: $name', ({ ask }) => {
    expect(answerSchema.safeParse(sent(ask)).error?.issues).toBeUndefined();
  });
});

describe('the envelope', () => {
  it('gives the id back with an answer and with a fault', () => {
    expect(answer({ id: 'a', ask: 'species', text: 'Fe' })).toMatchObject({ id: 'a', ok: true });
    expect(answer({ id: 'b', ask: 'species', text: 'Xx' })).toMatchObject({ id: 'b', ok: false });
    expect(answer({ id: 'c', ask: 'nothing' })).toMatchObject({ id: 'c', ask: null, ok: false });
  });

  it('gives no id back where there is none, or none that is text', () => {
    expect('id' in answer({ ask: 'species', text: 'Fe' })).toBe(false);
    expect('id' in answer({ id: 4, ask: 'species', text: 'Fe' })).toBe(false);
  });

  it('has notes and cautions even where there are none', () => {
    expect(answer({ ask: 'equation', text: 'H2 -> H2' })).toMatchObject({ ok: true, notes: [], cautions: [] });
  });

  it('says a note once where two electrodes call for the same', () => {
    const given = answer({ ask: 'cell', anode: ['Zn -> Zn^2+'], cathode: ['Cu^2+ -> Cu'] });
    const assumed = given.ok ? given.notes.filter(({ code }) => code === 'medium-assumed') : [];
    expect(assumed).toHaveLength(1);
  });

  it('takes undefined for a field that was left out, as a program in JavaScript writes it', () => {
    expect(answer({ ask: 'half', skeleton: 'Cu^2+ -> Cu', medium: undefined })).toMatchObject({ ok: true });
  });

  it('does not take a field called __proto__ for nothing', () => {
    const ask: unknown = JSON.parse('{"ask": "species", "text": "Fe", "__proto__": {"strict": true}}');
    expect(answer(ask)).toMatchObject({ ok: false, fault: { code: 'bad-ask', field: '__proto__' } });
  });

  it('changes nothing in the ask', () => {
    const ask = { ask: 'half', skeleton: 'Cu^2+ -> Cu', medium: { helpers: ['H2O'] }, where: { x: '0.4' } };
    const before = structuredClone(ask);
    answer(ask);
    expect(ask).toEqual(before);
  });
});

describe('several faults in one ask', () => {
  it('tells a fault of reading before one of balancing, wherever it stands', () => {
    const ask = { ask: 'cell', anode: ['Zn + Na -> Zn^2+'], cathode: ['Cu^2+ -> Cq'] };
    expect(answer(ask)).toMatchObject({ fault: { code: 'unknown-element', field: 'cathode[0]' } });
  });

  it('tells a missing element before nothing oxidised', () => {
    const ask = { ask: 'cell', anode: ['CrO4^2- -> Cr2O7^2-'], cathode: ['Cu^2+ + Na^+ -> Cu'], medium: 'acid' };
    expect(answer(ask)).toMatchObject({ fault: { code: 'missing-element', field: 'cathode[0]' } });
  });
});

describe('an ask that is too much work', () => {
  it.each([
    [{ ask: 'half', skeleton: 'Zn -> Zn^2+', medium: { helpers: Array.from({ length: 25 }, () => 'H2O') } }, 'medium'],
    [{ ask: 'cell', anode: Array.from({ length: 101 }, () => 'Zn -> Zn^2+'), cathode: ['Cu^2+ -> Cu'] }, 'anode'],
    [
      {
        ask: 'species',
        text: 'Fe',
        where: Object.fromEntries(Array.from({ length: 201 }, (_, at) => [`x${String(at)}`, '1'])),
      },
      'where',
    ],
  ])('is refused with the limit it passes %#', (ask, field) => {
    expect(answer(ask)).toMatchObject({ ok: false, fault: { code: 'too-hard', field } });
    expect(answerSchema.safeParse(sent(ask)).success).toBe(true);
  });

  it('is refused by its length before it is read', () => {
    expect(answer({ ask: 'species', text: 'Fe'.repeat(100_000) })).toMatchObject({
      fault: { code: 'too-long', field: 'text' },
    });
  });
});
