import { type Rational, ZERO, rationalFromText } from '../exact/rational.ts';
import { nuclideMass } from '../elements/nuclides.ts';
import { splitNuclide } from '../elements/table.ts';
import { standardWeight } from '../elements/weights.ts';
import { type Species, isElectron } from './species.ts';

/** A molar mass with its standard uncertainty, or the first part of the species whose mass no table has. */
export type MolarMass =
  | {
      readonly kind: 'known';
      /** g/mol. */
      readonly value: number;
      /** One standard uncertainty in g/mol. */
      readonly uncertainty: number;
      /** The same mass without rounding, g/mol. */
      readonly exact: Rational;
    }
  | { readonly kind: 'missing'; readonly element: string };

interface Mass {
  readonly value: Rational;
  readonly variance: Rational;
}

const squared = (text: string): Rational => rationalFromText(text).mul(rationalFromText(text));

/** Every value within ±a is taken as equally likely (IUPAC 2018, Possolo et al.): the variance of a rectangle is a²/3. */
const massOfElement = (symbol: string): Mass | undefined => {
  const weight = standardWeight(symbol);
  if (weight === undefined) return undefined;
  return { value: rationalFromText(weight.value), variance: squared(weight.halfWidth).div(3n) };
};

const massOfNuclide = (nuclide: string): Mass | undefined => {
  const mass = nuclideMass(nuclide);
  if (mass === undefined) return undefined;
  return { value: rationalFromText(mass.value), variance: squared(mass.uncertainty) };
};

/** The molar mass constant differs from 1 g/mol by parts in 1e10 since 2019: a weight reads as g/mol. */
const massOf = (key: string): Mass | undefined =>
  splitNuclide(key).massNumber === null ? massOfElement(key) : massOfNuclide(key);

/**
 * Molar mass of `species` in g/mol: the exact sum of weight times count, rounded once at the end. The atoms of one
 * element share one weight, so that u(M)² = Σ (count × u(weight))², element by element. The electrons that an ion has
 * gained or lost are not weighed (0.00055 g/mol each). The electron itself is `missing`: nobody asks for its mass.
 * Source of the uncertainty: A. Possolo, A. M. H. van der Veen, J. Meija, D. B. Hibbert, Pure Appl. Chem. 90 (2018) 395.
 */
export const molarMass = (species: Species): MolarMass => {
  if (isElectron(species)) return { kind: 'missing', element: 'e' };
  let exact = ZERO;
  let variance = ZERO;
  for (const [key, count] of species.composition) {
    const mass = massOf(key);
    if (mass === undefined) return { kind: 'missing', element: key };
    exact = exact.add(mass.value.mul(count));
    variance = variance.add(mass.variance.mul(count).mul(count));
  }
  return { kind: 'known', value: exact.valueOf(), uncertainty: Math.sqrt(variance.valueOf()), exact };
};
