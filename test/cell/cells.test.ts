import { readFileSync } from 'node:fs';
import { parse } from 'yaml';
import { describe, expect, it } from 'vitest';
import type { CellReaction } from '../../src/cell/cell-reaction.ts';
import { composeCell } from '../../src/cell/compose.ts';
import { plainReaction } from '../../src/balance/reaction.ts';
import { type Rational, ZERO, rationalFromText, showRational } from '../../src/exact/rational.ts';
import { plainSpecies } from '../../src/species/species.ts';
import { plainEquation, residualByHand } from '../support/plain.ts';
import { electrodesOf } from './cell-of.ts';

type Figure = number | string;
interface Row {
  readonly name: string;
  readonly anode: readonly string[];
  readonly cathode: readonly string[];
  readonly separator?: boolean;
  readonly overall: string;
  readonly electrons: Figure;
  readonly multipliers?: readonly [readonly Figure[], readonly Figure[]];
  readonly cancelled?: Readonly<Record<string, Figure>>;
  readonly water?: Figure;
  readonly crossing?: readonly string[];
  readonly notes?: readonly string[];
}

const rows = parse(readFileSync('fixtures/cell/cells.yaml', 'utf8')) as readonly Row[];

const bare = (half: string): string => half.split(' @ ').at(-1) ?? '';
const multipliersOf = ({ multipliers }: Row): readonly string[] => (multipliers ?? [[1], [1]]).flat().map(String);

const gcdByHand = (a: number, b: number): number => (b === 0 ? a : gcdByHand(b, a % b));

/** Amounts by species without states, positive on the right; the test's own sum. */
const tally = (texts: readonly (readonly [string, Rational])[]): ReadonlyMap<string, Rational> => {
  const sums = new Map<string, Rational>();
  for (const [text, times] of texts.filter(([each]) => each !== '')) {
    const { left, right } = plainEquation(text);
    for (const { coefficient, species } of [...right, ...left.map((t) => ({ ...t, coefficient: t.coefficient.neg() }))])
      sums.set(species.key, (sums.get(species.key) ?? ZERO).add(coefficient.mul(times)));
  }
  return new Map([...sums].filter(([, value]) => !value.equals(ZERO)));
};

const composed = (row: Row): { readonly cell: CellReaction; readonly notes: readonly string[] } => {
  const result = composeCell(electrodesOf(row.anode, row.cathode), { separator: row.separator ?? false });
  if (!result.ok) throw new Error(result.fault.message);
  return { cell: result.value, notes: result.notes.map((each) => each.code) };
};

const showCrossing = (cell: CellReaction): readonly string[] =>
  (cell.crossing ?? []).map(
    ({ species, amount, from, to }) =>
      `${showRational(amount)} ${species === null ? 'charge' : plainSpecies(species)} ${from}-${to}`,
  );

describe('the table of cells', () => {
  it('holds at least 60 cells, each named once', () => {
    expect(rows.length).toBeGreaterThanOrEqual(60);
    expect(new Set(rows.map((row) => row.name)).size).toBe(rows.length);
  });

  it.each(rows)('was written down right by an independent count: $name', (row) => {
    for (const half of [...row.anode, ...row.cathode]) expect(residualByHand(bare(half)).size).toBe(0);
    const halves = [...row.anode, ...row.cathode].map(bare);
    const water = rationalFromText(String(row.water ?? 0));
    const inSum = tally(halves.map((half, at) => [half, rationalFromText(multipliersOf(row)[at] ?? '')]));
    const states = row.notes?.includes('states-differ') ?? false;
    if (states) return;
    const before = [...inSum].map(([key, value]) => {
      const folded = key === 'H^+' || key === 'OH^-' ? water : ZERO;
      const sign = value.compare(ZERO) < 0 ? folded.neg() : folded;
      return [key, key === 'H2O' ? value : value.sub(sign)] as const;
    });
    const rest = new Map(before.filter(([key, value]) => !value.equals(ZERO) && key !== 'H2O'));
    const expected = new Map([...tally([[row.overall, rationalFromText('1')]])].filter(([key]) => key !== 'H2O'));
    expect(rest).toEqual(expected);
    if (row.overall !== '') expect(residualByHand(row.overall).size).toBe(0);
  });

  it.each(rows)('is in lowest terms jointly with its electron number: $name', ({ overall, electrons }) => {
    if (overall === '') return;
    const { left, right } = plainEquation(overall);
    const sizes = [...left, ...right].map((term) => Number(showRational(term.coefficient)));
    expect([...sizes, Number(electrons)].reduce(gcdByHand)).toBe(1);
  });

  it.each(rows)('composes $name', (row) => {
    const { cell, notes } = composed(row);
    expect(plainReaction(cell.overall)).toBe(row.overall);
    expect(showRational(cell.electrons)).toBe(String(row.electrons));
    expect([...cell.anode, ...cell.cathode].map((half) => showRational(half.multiplier))).toEqual(multipliersOf(row));
    expect(notes).toEqual(row.notes ?? []);
  });

  it.each(rows)('says what it struck out and folded: $name', (row) => {
    const { cell } = composed(row);
    const struck = Object.fromEntries(
      cell.cancelled.map(({ species, amount }) => [plainSpecies(species), showRational(amount)]),
    );
    const expected = Object.entries(row.cancelled ?? {}).map(([key, value]) => [key, String(value)]);
    expect(struck).toEqual(Object.fromEntries(expected));
    expect(showRational(cell.waterFormed)).toBe(String(row.water ?? 0));
  });

  it.each(rows)('says what must cross: $name', (row) => {
    const { cell } = composed(row);
    expect(cell.crossing === null).toBe(row.separator !== true);
    expect(showCrossing(cell)).toEqual(row.crossing ?? []);
  });
});
