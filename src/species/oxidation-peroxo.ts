import { type Rational, isWhole, numeratorOf, rational } from '../exact/rational.ts';
import type { Site } from './oxidation-site.ts';

/**
 * Oxygen of which some atoms are peroxidic, where oxide alone would take the other element above its highest number.
 * n atoms E at their highest number h, m oxygens, k of them at -1:  n h - 2 (m - k) - k = rest, hence k is the excess
 *     k = n (average - h),  average = (rest + 2 m) / n:  2 in HSO5^-, 4 in CrO5.
 * k must be a whole number of pairs and at most m; undefined otherwise.
 */
export const withPeroxo = (
  element: string,
  count: Rational,
  average: Rational,
  highest: bigint,
  oxygens: Rational,
): readonly Site[] | undefined => {
  const peroxidic = average.sub(highest).mul(count);
  if (!isWhole(peroxidic) || numeratorOf(peroxidic) % 2n !== 0n || peroxidic.compare(oxygens) > 0) return undefined;
  const oxide = oxygens.sub(peroxidic);
  const sites: Site[] = [
    { element, number: rational(highest), count },
    { element: 'O', number: rational(-1n), count: peroxidic },
  ];
  return oxide.n === 0n ? sites : [...sites, { element: 'O', number: rational(-2n), count: oxide }];
};
