import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Rational, ZERO, showRational } from '../../src/exact/rational.ts';
import { EXCEPTIONS } from '../../src/species/oxidation-exceptions.ts';
import { KNOWN_GROUPS } from '../../src/species/oxidation-groups.ts';
import { type OxidationNumbers, oxidationNumbers } from '../../src/species/oxidation.ts';
import { chargeOf } from '../../src/species/oxidation-site.ts';
import type { Species } from '../../src/species/species.ts';
import { plain } from '../support/plain.ts';
import { readTable } from '../support/table.ts';

const shown = (found: OxidationNumbers): Readonly<Record<string, readonly string[]>> =>
  found.kind === 'undecided'
    ? {}
    : Object.fromEntries([...found.numbers].map(([element, list]) => [element, list.map(showRational)]));

const byHand = (text: string): Readonly<Record<string, readonly string[]>> =>
  Object.fromEntries(
    text.split('; ').map((entry) => {
      const [element = '', list = ''] = entry.split(' ');
      return [element, list.split(',')];
    }),
  );

const sum = (values: Iterable<Rational>): Rational => [...values].reduce((total, value) => total.add(value), ZERO);

/** The law: number times count comes to the charge, and the counts to the composition. */
const expectLaw = (species: Species): void => {
  const found = oxidationNumbers(species);
  if (found.kind === 'undecided') return;
  expect(showRational(sum(found.totals.values()))).toBe(showRational(species.charge));
  for (const [element, atoms] of species.composition) {
    const numbers = found.numbers.get(element) ?? [];
    const counts = found.counts.get(element) ?? [];
    expect(showRational(sum(counts))).toBe(showRational(atoms));
    const total = sum(numbers.map((number, index) => number.mul(counts[index] ?? ZERO)));
    expect(found.totals.get(element)?.equals(total)).toBe(true);
  }
};

describe('oxidation numbers', () => {
  it.each(readTable('oxidation/numbers.tsv'))('of $species are $numbers', ({ species = '', numbers = '' }) => {
    expect(shown(oxidationNumbers(plain(species)))).toEqual(byHand(numbers));
    expectLaw(plain(species));
  });

  it.each(readTable('oxidation/undecided.tsv'))('of $species are undecided: $ground', ({ species = '' }) => {
    const found = oxidationNumbers(plain(species));
    expect(found.kind).toBe('undecided');
  });

  it('stand in the order of the formula, the numbers of one element rising', () => {
    const found = oxidationNumbers(plain('NH4NO3'));
    expect(found.kind === 'decided' && [...found.numbers.keys()]).toEqual(['N', 'H', 'O']);
    expect(shown(found)).toEqual({ N: ['-3', '5'], H: ['1'], O: ['-2'] });
  });

  it('say how many atoms have each number', () => {
    const found = oxidationNumbers(plain('S2O8^2-'));
    if (found.kind === 'undecided') throw new Error(found.why);
    expect(found.counts.get('O')?.map(showRational)).toEqual(['6', '2']);
    expect(showRational(found.totals.get('O') ?? ZERO)).toBe('-14');
  });

  it('treat nuclides as their element', () => {
    const water = plain('H2O');
    const heavy: Species = {
      ...water,
      parts: water.parts.map((part) => ({
        ...part,
        members: part.members.map((member) =>
          member.kind === 'atom' && member.symbol === 'H' ? { ...member, massNumber: '2' } : member,
        ),
      })),
      composition: new Map([...water.composition].map(([key, count]) => [key === 'H' ? '2H' : key, count])),
    };
    expect(shown(oxidationNumbers(heavy))).toEqual({ H: ['1'], O: ['-2'] });
  });

  it('read a defined name through its members', () => {
    const bath = plain('Cu(C10H12N2O8)^2-');
    const named: Species = {
      ...bath,
      parts: bath.parts.map((part) => ({
        ...part,
        members: part.members.map((member) =>
          member.kind === 'group' ? { ...member, kind: 'named' as const, name: 'EDTA' } : member,
        ),
      })),
    };
    expect(shown(oxidationNumbers(named))).toEqual(shown(oxidationNumbers(bath)));
  });

  it('do not change with an outer pair of brackets', () => {
    for (const text of ['Fe(CN)6^4-', 'Cu(NH3)4^2+', 'SO4^2-', 'Ag(S2O3)2^3-']) {
      const bracketed = text.replace(/^(.*)\^/, '[$1]^');
      expect(shown(oxidationNumbers(plain(bracketed)))).toEqual(shown(oxidationNumbers(plain(text))));
    }
  });

  it('name the formula where convention does not decide', () => {
    expect(oxidationNumbers(plain('MnCo2O4'))).toEqual({
      kind: 'undecided',
      why: 'Convention does not decide the oxidation numbers in MnCo2O4.',
    });
  });
});

describe('laws of oxidation numbers', () => {
  const element = fc.constantFrom(...'H Li C N O F Na Al P S Cl K Ca Ti Mn Fe Cu Zn As Br Ag I Pb U'.split(' '));
  const count = fc.integer({ min: 1, max: 6 }).map((n) => (n === 1 ? '' : String(n)));
  const atoms = fc
    .array(fc.tuple(element, count), { minLength: 1, maxLength: 5 })
    .map((list) => list.map(([symbol, n]) => symbol + n).join(''));
  const charge = fc.constantFrom('', '', '^+', '^-', '^2+', '^2-', '^3-', '^4-');

  it('number times count comes to the charge, for any formula that is decided', () => {
    fc.assert(
      fc.property(atoms, charge, (formula, z) => {
        expectLaw(plain(formula + z));
      }),
      { numRuns: 600 },
    );
  });

  it('every listed species comes to its charge', () => {
    for (const [key, sites] of EXCEPTIONS) {
      expect([key, showRational(chargeOf(sites))]).toEqual([key, key.split(' ^')[1]]);
    }
  });

  it('every known ion and ligand is decided by itself', () => {
    const spelled = KNOWN_GROUPS.map(({ key, charge: z }) => ({ formula: key.replace(/([A-Z][a-z]?)1\b/g, '$1'), z }));
    for (const { formula, z } of spelled) {
      const species = { ...plain(formula.replaceAll(' ', '')), charge: z };
      expect([formula, oxidationNumbers(species).kind]).toEqual([formula, 'decided']);
    }
  });
});
