import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import { auditCell } from '../../src/audit/cell.ts';
import { rationalFromText, showRational } from '../../src/exact/rational.ts';
import type { Rational } from '../../src/exact/rational.ts';
import { mediumRow } from '../../src/redox/media.ts';
import { plainEquation } from '../support/plain.ts';

interface Row {
  readonly name: string;
  readonly anode: string;
  readonly cathode: string;
  readonly overall: string;
  readonly electrons?: string;
  readonly expect: {
    readonly verdict: string;
    readonly failed: readonly string[];
    readonly multipliers: { readonly anode: string; readonly cathode: string } | null;
    readonly found: string | null;
    readonly perMole?: Readonly<Record<string, string>>;
    readonly notes?: readonly string[];
  };
}

const rows = parse(readFileSync(new URL('../../fixtures/audit/cells.yaml', import.meta.url), 'utf8')) as readonly Row[];

const NOTHING: Row['expect'] = { verdict: '', failed: [], multipliers: null, found: null };

const show = (value: Rational | null): string | null => (value === null ? null : showRational(value));

const auditOf = ({ anode, cathode, overall, electrons }: Row) => {
  const result = auditCell({
    anode: plainEquation(anode),
    cathode: plainEquation(cathode),
    overall: plainEquation(overall),
    ...(electrons === undefined ? {} : { electrons: rationalFromText(electrons) }),
  });
  if (!result.ok) throw new Error(result.fault.message);
  return result;
};

describe('a claimed cell', () => {
  it.each(rows)('$name', (row) => {
    const { value, notes } = auditOf(row);
    const { multipliers, electrons } = value;
    expect(value.verdict).toBe(row.expect.verdict);
    expect(value.failed).toEqual(row.expect.failed);
    expect(
      multipliers === null ? null : { anode: show(multipliers.anode), cathode: show(multipliers.cathode) },
    ).toEqual(row.expect.multipliers);
    expect(show(electrons.found)).toBe(row.expect.found);
    expect(show(electrons.claimed)).toBe(row.electrons ?? null);
    if (row.expect.perMole !== undefined) {
      const perMole = value.electronsPerMole.map(({ species, electrons: each }) => [species.key, showRational(each)]);
      expect(Object.fromEntries(perMole)).toEqual(row.expect.perMole);
    }
    for (const code of row.expect.notes ?? []) expect(notes.map((note) => note.code)).toContain(code);
  });

  it('says of which part a note speaks', () => {
    const row = rows.find(({ name }) => name === 'the same with fractions');
    if (row === undefined) throw new Error('the row is gone');
    expect(auditOf(row).notes).toContainEqual({
      code: 'fractions',
      message: 'overall: The coefficients are fractions and conserve: accepted as written.',
    });
  });

  it('names the equation that the electrodes make instead', () => {
    const row = rows.find(({ name }) => name === 'the overall equation is about another metal');
    if (row === undefined) throw new Error('the row is gone');
    const told = auditOf(row).notes.find(({ code }) => code === 'not-the-sum')?.message;
    expect(told).toContain('Zn + 2 Ag^+ -> Zn^2+ + 2 Ag with 2 electrons');
  });

  it.each([
    ['Zn + CuSO4 -> ZnSO4 + Cu', 'without the spectators SO4^2-: Zn + Cu^2+ -> Zn^2+ + Cu.'],
    ['Zn + 2 CuCl -> ZnCl2 + 2 Cu', null],
    ['Zn + Cu(NO3)2 -> Zn(NO3)2 + Cu', 'without the spectators NO3^-: Zn + Cu^2+ -> Zn^2+ + Cu.'],
  ])('names the spectators of %s over ionic electrodes', (overall, expected) => {
    const row = { anode: 'Zn -> Zn^2+ + 2 e^-', cathode: 'Cu^2+ + 2 e^- -> Cu', overall };
    const told = auditOf({ name: '', ...row, expect: NOTHING }).notes.filter(({ code }) => code === 'spectator');
    expect(told.map(({ message }) => message)).toEqual(expected === null ? [] : [expect.stringContaining(expected)]);
  });

  it('takes an acid apart, but nothing that an electrode holds', () => {
    const told = auditOf({
      name: '',
      anode: 'Pb + SO4^2- -> PbSO4 + 2 e^-',
      cathode: 'PbO2 + SO4^2- + 4 H^+ + 2 e^- -> PbSO4 + 2 H2O',
      overall: 'Pb + PbO2 + 2 H2SO4 -> 2 PbSO4 + 2 H2O',
      expect: NOTHING,
    }).notes.find(({ code }) => code === 'spectator');
    expect(told?.message).toContain('is the sum: Pb + PbO2 + 4 H^+ + 2 SO4^2- -> 2 PbSO4 + 2 H2O.');
  });

  it('says that an electron number is positive', () => {
    const row = rows.find(({ name }) => name === 'a claim of no electrons');
    if (row === undefined) throw new Error('the row is gone');
    expect(auditOf(row).notes).toContainEqual({
      code: 'electrons-claimed',
      message: 'An electron number is positive, 0 is none. 2 electrons are exchanged.',
    });
  });

  it('checks the electrodes against the medium, and the overall equation not', () => {
    const medium = mediumRow('base');
    if (medium === undefined) throw new Error('the medium is gone');
    const result = auditCell({
      anode: plainEquation('H2 -> 2 H^+ + 2 e^-'),
      cathode: plainEquation('Cu^2+ + 2 e^- -> Cu'),
      overall: plainEquation('H2 + Cu^2+ -> 2 H^+ + Cu'),
      medium,
    });
    const clashes = result.ok ? result.notes.filter(({ code }) => code === 'medium-clash') : [];
    expect(clashes.map(({ message }) => message)).toEqual(['anode: H^+ is foreign to the base medium.']);
  });

  it('takes a missing state for any state', () => {
    const result = auditCell({
      anode: plainEquation('Zn(s) -> Zn^2+(aq) + 2 e^-'),
      cathode: plainEquation('Cu^2+ + 2 e^- -> Cu'),
      overall: plainEquation('Zn + Cu^2+(aq) -> Zn^2+ + Cu(s)'),
    });
    expect(result.ok ? result.value.failed : null).toEqual([]);
  });
});
