import { speciesMatrix } from '../../balance/matrix.ts';
import { inPrintingOrder } from '../../balance/assemble.ts';
import type { Term } from '../../balance/reaction.ts';
import { proved } from '../../balance/recount.ts';
import { gcdOf, lcmOf } from '../../exact/integer.ts';
import { independentColumns, nullSpace } from '../../exact/matrix.ts';
import { type Rational, ONE, ZERO, denominatorOf, numeratorOf, rational, signOf } from '../../exact/rational.ts';
import { type Species, ELECTRON, isElectron } from '../../species/species.ts';
import type { HalfReaction } from '../half-reaction.ts';
import { HYDROXIDE, PROTON, WATER } from '../media.ts';
import type { Medium } from '../medium.ts';
import { sumOfTerms, termsOf } from './amounts.ts';

/** A half-reaction and how often it runs in the overall reaction. */
export interface SplitHalf {
  readonly half: HalfReaction;
  readonly multiplier: Rational;
}

/** The helpers that the halves are completed with; H^+ stands for both ions of water where the medium is neutral. */
export const helpersOf = (medium: Medium): readonly Species[] => {
  const helpers = medium.name === 'neutral' ? [WATER, PROTON] : medium.helpers;
  const kept = independentColumns(speciesMatrix([ELECTRON, ...helpers]).rows);
  return helpers.filter((_, at) => kept.includes(at + 1));
};

/**
 * `terms` with the helpers and electrons that conserve what they hold, at the same scale; null where none do.
 * Given amounts r of the terms,  r + A_h h + A_e e = 0  has one solution, for the helpers and e^- are independent.
 */
export const completeTerms = (terms: readonly Term[], medium: Medium): readonly Term[] | null => {
  const free = [...helpersOf(medium), ELECTRON];
  const scale = lcmOf(terms.map(({ nu }) => denominatorOf(nu)));
  const { rows } = speciesMatrix([...terms.map(({ species }) => species), ...free]);
  const joined = rows.map((row) => [
    terms.reduce((sum, { nu }, at) => sum + numeratorOf(nu.mul(rational(scale))) * (row[at] ?? 0n), 0n),
    ...row.slice(terms.length),
  ]);
  const line = nullSpace(joined, free.length + 1).find(([first]) => first !== 0n);
  const first = line?.[0];
  if (line === undefined || first === undefined) return null;
  const lent = free.map((species, at) => ({ species, nu: rational(line[at + 1] ?? 0n, first * scale) }));
  const sum = termsOf(
    sumOfTerms([
      [terms, ONE],
      [lent, ONE],
    ]),
  );
  return medium.name === 'neutral' ? withoutAcid(sum) : sum;
};

/** In a neutral medium no H^+ is used up: OH^- added on both sides makes water of it and stands on the right. */
const withoutAcid = (terms: readonly Term[]): readonly Term[] => {
  const acid = terms.find(({ species }) => species.key === PROTON.key);
  return acid === undefined || signOf(acid.nu) > 0n ? terms : inHydroxide(terms);
};

/** OH^- added on both sides until no H^+ is left:  H^+ + OH^- = H2O. */
export const inHydroxide = (terms: readonly Term[]): readonly Term[] => {
  const acid = terms.find(({ species }) => species.key === PROTON.key);
  if (acid === undefined) return terms;
  const change = [
    { species: acid.species, nu: acid.nu.neg() },
    { species: WATER, nu: acid.nu },
    { species: HYDROXIDE, nu: acid.nu.neg() },
  ];
  return termsOf(
    sumOfTerms([
      [terms, ONE],
      [change, ONE],
    ]),
  );
};

/** The electrons on the right of `terms`, negative where they are on the left. */
export const electronsOf = (terms: readonly Term[]): Rational =>
  terms.find(({ species }) => isElectron(species))?.nu ?? ZERO;

/**
 * The half-reaction in lowest whole numbers that `terms` are a multiple of; its species in the order of `spelled`, and
 * with the states that they have there.
 */
export const halfOfTerms = (terms: readonly Term[], medium: Medium, spelled: readonly Species[]): SplitHalf => {
  const order = spelled.map(({ key }) => key);
  const common = lcmOf(terms.map(({ nu }) => denominatorOf(nu)));
  const whole = terms.map(({ species, nu }) => ({ species, number: numeratorOf(nu.mul(rational(common))) }));
  const divisor = gcdOf(whole.map(({ number }) => number));
  const helpers = medium.helpers.map((helper) => helper.key);
  const rank = ({ key }: Species): number => {
    const lent = helpers.indexOf(key);
    return lent === -1 ? order.indexOf(key) : order.length + lent;
  };
  const sorted = whole
    .toSorted((a, b) => rank(a.species) - rank(b.species))
    .map(({ species, number }) => ({
      species: spelled[order.indexOf(species.key)] ?? species,
      nu: rational(number, divisor),
    }));
  const reaction = proved(inPrintingOrder({ terms: sorted }));
  const electrons = electronsOf(reaction.terms);
  const half: HalfReaction = {
    reaction,
    kind: signOf(electrons) > 0n ? 'oxidation' : 'reduction',
    electrons: electrons.abs(),
    medium,
    dimension: dimensionOf(terms, medium),
  };
  return { half, multiplier: rational(divisor, common) };
};

/** Unknown species of the half-reaction minus the rank of elements and charge. */
const dimensionOf = (terms: readonly Term[], medium: Medium): number => {
  const lent = new Set(medium.helpers.map((helper) => helper.key));
  const written = terms.map(({ species }) => species).filter((one) => !isElectron(one) && !lent.has(one.key));
  const species = [...written, ...helpersOf(medium), ELECTRON];
  return nullSpace(speciesMatrix(species).rows, species.length).length;
};
