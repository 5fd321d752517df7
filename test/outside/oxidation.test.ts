import { describe, expect, it } from 'vitest';
import { type Rational, ONE, ZERO, isZero, showRational } from '../../src/exact/rational.ts';
import type { EquationTerm } from '../../src/species/equation.ts';
import { oxidationNumbers } from '../../src/species/oxidation.ts';
import { isElectron } from '../../src/species/species.ts';
import { plain, plainEquation } from '../support/plain.ts';
import { readTable } from '../support/table.ts';

const shown = (text: string): string => {
  const found = oxidationNumbers(plain(text));
  if (found.kind === 'undecided') return found.why;
  return [...found.numbers].map(([element, list]) => `${element} ${list.map(showRational).join(',')}`).join('; ');
};

/** Right minus left of number times count, per element; zeros left out; undecided species under "?". */
const changesOf = (text: string): readonly string[] => {
  const sums = new Map<string, Rational>();
  const add = (terms: readonly EquationTerm[], sign: Rational): void => {
    for (const { species, coefficient } of terms.filter((term) => !isElectron(term.species))) {
      const found = oxidationNumbers(species);
      const totals = found.kind === 'decided' ? found.totals : new Map([['?', ONE]]);
      for (const [element, total] of totals) {
        sums.set(element, (sums.get(element) ?? ZERO).add(total.mul(coefficient).mul(sign)));
      }
    }
  };
  const equation = plainEquation(text);
  add(equation.right, ONE);
  add(equation.left, ONE.neg());
  return [...sums].filter(([, sum]) => !isZero(sum)).map(([element, sum]) => `${element} ${showRational(sum)}`);
};

const electronsOf = (text: string): string => {
  const { left, right } = plainEquation(text);
  const sum = (terms: readonly EquationTerm[]): Rational =>
    terms.filter(({ species }) => isElectron(species)).reduce((total, term) => total.add(term.coefficient), ZERO);
  return showRational(sum(right).sub(sum(left)));
};

describe('oxidation numbers against the examples of the IUPAC reports of 2014 and 2016', () => {
  const rows = readTable('oxidation/numbers.tsv').filter(({ source }) => source?.startsWith('iupac-'));

  it('are there in number', () => {
    expect(rows.length).toBeGreaterThan(60);
  });

  it.each(rows)('$species: $numbers ($source)', ({ species = '', numbers }) => {
    expect(shown(species)).toBe(numbers);
  });
});

describe('oxidation numbers against published half-reactions', () => {
  /** Two elements change where hydrogen becomes hydride beside silicon (Karen et al. 2016: Si 4, H -1 in SiH4). */
  const TWO_CHANGE: Readonly<Record<string, readonly string[]>> = {
    'Si(s) + 4 H^+(aq) + 4 e^- -> SiH4(g)': ['Si 4', 'H -8'],
  };

  it.each(readTable('published/standard-potentials.tsv'))('one element takes all electrons: $reaction', (row) => {
    const { reaction = '' } = row;
    const changes = changesOf(reaction);
    const expected = TWO_CHANGE[reaction];
    if (expected === undefined) {
      expect(changes).toHaveLength(1);
      expect(changes[0]?.split(' ')[1]).toBe(electronsOf(reaction));
    } else expect(changes).toEqual(expected);
  });
});

describe('oxidation numbers against published equilibria without electrons', () => {
  it.each(readTable('published/equilibria.tsv'))('nothing changes: $reaction', ({ reaction = '' }) => {
    expect(changesOf(reaction)).toEqual([]);
  });
});
