import { type Rational, ZERO, isZero, signOf } from '../exact/rational.ts';
import { oxidationNumbers } from '../species/oxidation.ts';
import { isElectron } from '../species/species.ts';
import type { Draft } from './writing.ts';

/** What becomes of the oxidation numbers in an equation; `unknown` where convention does not decide one of them. */
export type RedoxChange = 'none' | 'oxidation' | 'reduction' | 'both' | 'unknown';

/**
 * How the oxidation numbers change from left to right. An element whose numbers are spread otherwise, though their sum
 * is the same, is oxidised and reduced at once.
 */
export const redoxChangeOf = (draft: Draft): RedoxChange => {
  const spread = spreadOf(draft);
  if (spread === null) return 'unknown';
  let [up, down] = [false, false];
  for (const byNumber of spread.values()) {
    const changed = [...byNumber.values()].filter(({ atoms }) => !isZero(atoms));
    const sum = changed.reduce((total, { number, atoms }) => total.add(number.mul(atoms)), ZERO);
    const mixed = changed.length > 0 && isZero(sum);
    up ||= mixed || signOf(sum) > 0n;
    down ||= mixed || signOf(sum) < 0n;
  }
  if (up && down) return 'both';
  return up ? 'oxidation' : down ? 'reduction' : 'none';
};

interface Spread {
  readonly number: Rational;
  /** Right minus left. */
  readonly atoms: Rational;
}

/** Atoms of each element at each oxidation number, right minus left; null where a species is undecided. */
const spreadOf = (draft: Draft): ReadonlyMap<string, ReadonlyMap<string, Spread>> | null => {
  const spread = new Map<string, Map<string, Spread>>();
  for (const { species, side, coefficient } of draft) {
    if (isElectron(species)) continue;
    const own = oxidationNumbers(species);
    if (own.kind === 'undecided') return null;
    const times = side === 'right' ? coefficient : coefficient.neg();
    for (const [element, numbers] of own.numbers) {
      const byNumber = spread.get(element) ?? new Map<string, Spread>();
      spread.set(element, byNumber);
      numbers.forEach((number, index) => {
        const key = number.toFraction();
        const atoms = (byNumber.get(key)?.atoms ?? ZERO).add(times.mul(own.counts.get(element)?.[index] ?? ZERO));
        byNumber.set(key, { number, atoms });
      });
    }
  }
  return spread;
};
