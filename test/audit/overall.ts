import { ONE, type Rational, isZero, rational, signOf } from '../../src/exact/rational.ts';
import type { Equation, EquationTerm } from '../../src/species/equation.ts';
import type { Species } from '../../src/species/species.ts';

/**
 * Overall reactions made of two published half-reactions by plain arithmetic: each times the electrons of the other,
 * subtracted, divided by the common factor. Nothing of the cell floor is used.
 */

const sumOf = (
  equation: Equation,
  times: Rational,
  into: Map<string, { species: Species; amount: Rational }>,
): void => {
  const add = (terms: readonly EquationTerm[], sign: Rational): void => {
    for (const { species, coefficient } of terms) {
      const was = into.get(species.key)?.amount ?? rational(0n);
      into.set(species.key, { species, amount: was.add(coefficient.mul(times).mul(sign)) });
    }
  };
  add(equation.right, ONE);
  add(equation.left, ONE.neg());
};

const electronsOf = ({ left }: Equation): Rational =>
  left.find(({ species }) => species.key === 'e^-')?.coefficient ?? rational(0n);

const gcd = (a: bigint, b: bigint): bigint => (b === 0n ? a : gcd(b, a % b));

/** The reaction of `oxidant` (a reduction as written) with the reverse of `reductant`; null where nothing sound is left. */
export const overallOf = (oxidant: Equation, reductant: Equation): Equation | null => {
  const sum = new Map<string, { species: Species; amount: Rational }>();
  sumOf(oxidant, electronsOf(reductant), sum);
  sumOf(reductant, electronsOf(oxidant).neg(), sum);
  const left = [...sum.values()].filter(({ amount }) => !isZero(amount));
  const keys = new Set(left.map(({ species }) => species.key));
  if (left.length < 4 || keys.has('e^-') || (keys.has('H^+') && keys.has('OH^-'))) return null;
  const common = left.reduce((all, { amount }) => gcd(all, amount.n), 0n);
  const termsOf = (sign: bigint): readonly EquationTerm[] =>
    left
      .filter(({ amount }) => signOf(amount) === sign)
      .map(({ species, amount }) => {
        const coefficient = amount.abs().div(rational(common));
        return { species, coefficient, coefficientWritten: !coefficient.equals(ONE), span: { from: 0, to: 0 } };
      });
  const equation = { text: '', left: termsOf(-1n), right: termsOf(1n) };
  return equation.left.length > 0 && equation.right.length > 0 ? equation : null;
};

/** Overall reactions of each half-reaction with the one `step` places on, within one medium. */
export const overallReactions = (halves: readonly Equation[], step: number): readonly Equation[] =>
  halves.flatMap((oxidant, index) => {
    const reductant = halves[(index + step) % halves.length];
    return reductant === undefined ? [] : (overallOf(oxidant, reductant) ?? []);
  });
