import { type Rational, ONE, ZERO, rationalFromText, showRational } from '../exact/rational.ts';

/** A run of atoms as spelled in the tables of known ions: C2H3O2 is C 2, H 3, O 2; CH3COO keeps both C. */
export type Run = readonly (readonly [element: string, count: Rational])[];

/** The run of a formula without brackets. */
export const runOf = (formula: string): Run =>
  [...formula.matchAll(/([A-Z][a-z]?)(\d*)/g)].map(([, element = '', digits = '']) => [
    element,
    digits === '' ? ONE : rationalFromText(digits),
  ]);

/** Like atoms added up. */
export const countsOf = (run: Run): ReadonlyMap<string, Rational> => {
  const counts = new Map<string, Rational>();
  for (const [element, count] of run) counts.set(element, (counts.get(element) ?? ZERO).add(count));
  return counts;
};

/** A composition as text, elements in alphabetical order: a key that does not depend on the spelling. */
export const compositionKey = (counts: ReadonlyMap<string, Rational>): string =>
  [...counts]
    .toSorted(([a], [b]) => (a < b ? -1 : 1))
    .map(([element, count]) => `${element}${showRational(count)}`)
    .join(' ');
