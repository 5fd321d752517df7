import { type Rational, ZERO } from '../exact/rational.ts';

/** `count` atoms of `element` that share the oxidation number `number`. */
export interface Site {
  readonly element: string;
  readonly number: Rational;
  readonly count: Rational;
}

/** The sum of number times count: the charge of what the sites make up. */
export const chargeOf = (sites: readonly Site[]): Rational =>
  sites.reduce((sum, { number, count }) => sum.add(number.mul(count)), ZERO);

/** The same sites, `times` over. */
export const repeated = (sites: readonly Site[], times: Rational): readonly Site[] =>
  sites.map((site) => ({ ...site, count: site.count.mul(times) }));

/** Sites with equal element and number made one, numbers rising within each element. */
export const merged = (sites: readonly Site[]): readonly Site[] => {
  const found: Site[] = [];
  for (const site of sites) {
    const at = found.findIndex(({ element, number }) => element === site.element && number.equals(site.number));
    const same = found[at];
    if (same === undefined) found.push(site);
    else found[at] = { ...same, count: same.count.add(site.count) };
  }
  return found.toSorted((a, b) => a.number.compare(b.number));
};
