import { ONE, type Rational, isZero, rational } from '../../src/exact/rational.ts';
import type { Member } from '../../src/notation/formula.ts';
import type { Equation, EquationTerm } from '../../src/species/equation.ts';
import { type Species, plainCharge, plainSpecies } from '../../src/species/species.ts';
import { plain } from '../support/plain.ts';

/**
 * Mistakes planted into a balanced equation, one at a time. Nothing of the audit is used here: what the mistake was
 * is known because it was made.
 */

/** The kinds of slips that are planted. */
export const SLIPS = [
  'one number wrong',
  'one number left out',
  'electrons on the wrong side',
  'ion of the other medium',
  'helper forgotten',
  'helper too many',
  'electrons forgotten',
  'charge number wrong',
  'charge sign wrong',
  'charge left out',
  'subscript wrong',
] as const;

export type Slip = (typeof SLIPS)[number];

/** An equation with one planted mistake. */
export interface Planted {
  readonly slip: Slip;
  readonly wrong: Equation;
  readonly right: Equation;
}

type Side = 'left' | 'right';
const SIDES: readonly Side[] = ['left', 'right'];
const HELPERS: ReadonlySet<string> = new Set(['H2O', 'H^+', 'OH^-']);

const withSide = (equation: Equation, side: Side, terms: readonly EquationTerm[]): Equation => ({
  ...equation,
  [side]: terms,
});

const replaceAt = (equation: Equation, side: Side, index: number, terms: readonly EquationTerm[]): Equation =>
  withSide(equation, side, [...equation[side].slice(0, index), ...terms, ...equation[side].slice(index + 1)]);

const isElectron = ({ species }: EquationTerm): boolean => species.key === 'e^-';
const isHelper = ({ species }: EquationTerm): boolean => HELPERS.has(plainSpecies(species));

const renumbered = (term: EquationTerm, coefficient: Rational): EquationTerm => ({
  ...term,
  coefficient,
  coefficientWritten: !coefficient.equals(ONE),
});

const respelled = (term: EquationTerm, text: string): EquationTerm => ({
  ...term,
  species: { ...plain(text), state: term.species.state },
});

const charged = (species: Species, charge: Rational): string => species.formula + plainCharge(charge);

const wrongNumbers = (term: EquationTerm): readonly EquationTerm[] =>
  [1n, -1n, 2n]
    .map((step) => term.coefficient.add(rational(step)))
    .filter((value) => value.compare(0) > 0)
    .map((value) => renumbered(term, value));

const wrongCharges = (term: EquationTerm): readonly EquationTerm[] =>
  [1n, -1n]
    .map((step) => term.species.charge.add(rational(step)))
    .filter((charge) => !isZero(charge) && charge.s === term.species.charge.s)
    .map((charge) => respelled(term, charged(term.species, charge)));

const spellMember = (member: Member): string => {
  const count = member.count.equals(ONE) ? '' : String(member.count.n);
  if (member.kind === 'atom') return member.symbol + count;
  if (member.kind === 'named') return member.name + count;
  return `(${member.members.map(spellMember).join('')})${count}`;
};

/** The formula with one outermost count raised or lowered by one. */
const wrongSubscripts = (term: EquationTerm): readonly EquationTerm[] => {
  const { parts, charge } = term.species;
  const members = parts[0]?.members ?? [];
  if (parts.length !== 1) return [];
  return members.flatMap((member, index) =>
    [1n, -1n]
      .map((step) => member.count.add(rational(step)))
      .filter((count) => count.compare(0) > 0)
      .map((count) => members.map((other, at) => (at === index ? { ...member, count } : other)))
      .map((changed) => respelled(term, changed.map(spellMember).join('') + plainCharge(charge))),
  );
};

const slipsOfTerm = (right: Equation, side: Side, index: number, term: EquationTerm): readonly Planted[] => {
  const other: Side = side === 'left' ? 'right' : 'left';
  const put = (slip: Slip, terms: readonly EquationTerm[]): Planted => ({
    slip,
    right,
    wrong: replaceAt(right, side, index, terms),
  });
  const isIon = !isElectron(term) && !isZero(term.species.charge);
  const found: Planted[] = wrongNumbers(term).map((wrong) => put('one number wrong', [wrong]));
  if (!term.coefficient.equals(ONE)) found.push(put('one number left out', [renumbered(term, ONE)]));
  if (isElectron(term)) {
    const dropped = replaceAt(right, side, index, []);
    found.push({
      slip: 'electrons on the wrong side',
      right,
      wrong: withSide(dropped, other, [...right[other], term]),
    });
    found.push(put('electrons forgotten', []));
  }
  const spelled = plainSpecies(term.species);
  if (spelled === 'H^+') found.push(put('ion of the other medium', [respelled(term, 'OH^-')]));
  if (spelled === 'OH^-') found.push(put('ion of the other medium', [respelled(term, 'H^+')]));
  if (isHelper(term)) found.push(put('helper forgotten', []));
  if (isIon) {
    found.push(...wrongCharges(term).map((wrong) => put('charge number wrong', [wrong])));
    const flipped = charged(term.species, term.species.charge.neg());
    found.push(put('charge sign wrong', [respelled(term, flipped)]));
    found.push(put('charge left out', [respelled(term, term.species.formula)]));
  }
  if (!isElectron(term)) found.push(...wrongSubscripts(term).map((wrong) => put('subscript wrong', [wrong])));
  return found;
};

const superfluous = (right: Equation): readonly Planted[] =>
  ['H2O', 'H^+', 'OH^-'].flatMap((text) => {
    const isWritten = [...right.left, ...right.right].some(({ species }) => plainSpecies(species) === text);
    const term = { coefficient: ONE, coefficientWritten: false, species: plain(text), span: { from: 0, to: 0 } };
    return isWritten
      ? []
      : SIDES.map((side) => ({
          slip: 'helper too many' as const,
          right,
          wrong: withSide(right, side, [...right[side], term]),
        }));
  });

/** Every mistake that can be planted into `right`, equations with an empty side left out. */
export const plantings = (right: Equation): readonly Planted[] => {
  const inTerms = SIDES.flatMap((side) => right[side].flatMap((term, index) => slipsOfTerm(right, side, index, term)));
  return [...inTerms, ...superfluous(right)].filter(({ wrong }) => wrong.left.length > 0 && wrong.right.length > 0);
};

/** The plain text of an equation, its terms in the order of the alphabet: two orders of one equation are equal. */
export const sortedText = (equation: Pick<Equation, 'left' | 'right'>): string =>
  SIDES.map((side) =>
    equation[side]
      .map(({ coefficient, species }) => `${coefficient.toFraction()} ${plainSpecies(species)}`)
      .sort()
      .join(' + '),
  ).join(' -> ');
