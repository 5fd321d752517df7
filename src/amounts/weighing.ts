import { ONE } from '../exact/rational.ts';
import { molarMass } from '../species/molar-mass.ts';
import type { Species } from '../species/species.ts';
import { type Measured, type Source, weightedSum } from './measured.ts';
import { toFloat } from './number.ts';

/** Molar mass in kg/mol, or undefined where an element or nuclide of the species has no weight. */
export type Weighing = (species: Species) => Measured | undefined;

const KILOGRAM = 1e-3;

/** The weight of one element as an input of its own, in kg/mol. */
const weightSource = (key: string, species: Species): Source | undefined => {
  const mass = molarMass({ ...species, composition: new Map([[key, ONE]]) });
  if (mass.kind === 'missing') return undefined;
  const name = `atomic weight of ${key}`;
  return { name, value: mass.value * KILOGRAM, uncertainty: mass.uncertainty * KILOGRAM, lastDigit: 0 };
};

/**
 * Molar masses in which all species share the weights of their elements as inputs, so that an oxide and its metal are
 * correlated: M = sum of count times weight, dM/d(weight) = count.
 */
export const createWeighing = (): Weighing => {
  const sources = new Map<string, Source>();
  return (species) => {
    const parts: (readonly [number, Measured])[] = [];
    const total = molarMass(species);
    if (total.kind === 'missing') return undefined;
    for (const [key, count] of species.composition) {
      const source = sources.get(key) ?? weightSource(key, species);
      if (source === undefined) return undefined;
      sources.set(key, source);
      parts.push([toFloat(count), { value: source.value, slopes: new Map([[source, 1]]) }]);
    }
    return { value: total.value * KILOGRAM, slopes: weightedSum(parts).slopes };
  };
};
