import { type Reaction, type Term } from '../balance/reaction.ts';
import { lcmOf } from '../exact/integer.ts';
import { nullSpace } from '../exact/matrix.ts';
import { type Rational, ONE, ZERO, denominatorOf, isZero, numeratorOf, rational, signOf } from '../exact/rational.ts';
import { HYDROXIDE, PROTON, WATER } from '../redox/media.ts';
import { type Species, isElectron, sameSpecies } from '../species/species.ts';

/** How two half-reactions make an overall reaction. */
export interface Combination {
  /** How often the anode's and the cathode's equation run, at the scale of the overall reaction; positive. */
  readonly anode: Rational;
  readonly cathode: Rational;
  /** Electrons exchanged at that scale. */
  readonly electrons: Rational;
}

/** Electrons that `reaction` gives, right minus left. */
export const electronsGiven = (reaction: Reaction): Rational =>
  reaction.terms.reduce((sum, { species, nu }) => (isElectron(species) ? sum.add(nu) : sum), ZERO);

/** Species of several reactions, like ones once, and each reaction's amounts of them, right counted positive. */
interface Pool {
  readonly species: readonly Species[];
  readonly amounts: readonly (readonly Rational[])[];
}

const poolOf = (reactions: readonly Reaction[]): Pool => {
  const species: Species[] = [];
  for (const { terms } of reactions) {
    for (const term of terms) if (!species.some((one) => sameSpecies(one, term.species))) species.push(term.species);
  }
  const place = (one: Species): number => species.findIndex((other) => sameSpecies(other, one));
  const amountsOf = ({ terms }: Reaction): readonly Rational[] => {
    const amounts = species.map(() => ZERO);
    for (const { species: one, nu } of terms) amounts[place(one)] = (amounts[place(one)] ?? ZERO).add(nu);
    return amounts;
  };
  return { species, amounts: reactions.map(amountsOf) };
};

/** H^+ + OH^- -> H2O, by which electrodes of different media meet. */
const FOLDING: Reaction = {
  terms: [
    { species: PROTON, nu: ONE.neg() },
    { species: HYDROXIDE, nu: ONE.neg() },
    { species: WATER, nu: ONE },
  ],
};

const wholeRow = (row: readonly Rational[]): bigint[] => {
  const scale = lcmOf(row.map(denominatorOf));
  return row.map((value) => (numeratorOf(value) * scale) / denominatorOf(value));
};

/**
 * The multipliers with  x anode + y cathode + w (H^+ + OH^- -> H2O) = overall,  species by species, electrons among
 * them; null where there are none, or x or y is not positive. A null vector z of the four columns gives x = -z_1 / z_4.
 */
export const combinationOf = (anode: Reaction, cathode: Reaction, overall: Reaction): Combination | null => {
  // the written species come first in the pool: folded water takes their states
  const { species, amounts } = poolOf([anode, cathode, overall, FOLDING]);
  const rows = species.map((_, place) => wholeRow(amounts.map((column) => column[place] ?? ZERO)));
  const [only, another] = nullSpace(rows, 4);
  const [a = 0n, c = 0n, o = 0n] = only ?? [];
  if (only === undefined || another !== undefined || o === 0n) return null;
  const [x, y] = [rational(-a, o), rational(-c, o)];
  if (signOf(x) <= 0n || signOf(y) <= 0n) return null;
  return { anode: x, cathode: y, electrons: x.mul(electronsGiven(anode)) };
};

/** What two half-reactions make. */
export interface Composition {
  readonly overall: Reaction;
  readonly combination: Combination;
}

/**
 * The overall reaction of an anode that gives electrons and a cathode that takes them, with its electron number in
 * lowest terms together; null where one of them exchanges none or runs the wrong way.
 */
export const composed = (anode: Reaction, cathode: Reaction): Composition | null => {
  const [given, taken] = [electronsGiven(anode), electronsGiven(cathode).neg()];
  if (signOf(given) <= 0n || signOf(taken) <= 0n) return null;
  const { species, amounts } = poolOf([anode, cathode, FOLDING]);
  const [atAnode = [], atCathode = [], folding = []] = amounts;
  const sum = species.map((_, place) => (atAnode[place] ?? ZERO).div(given).add((atCathode[place] ?? ZERO).div(taken)));
  const meeting = meetingOf(species, sum);
  const folded = sum.map((value, place) => value.add((folding[place] ?? ZERO).mul(meeting)));
  const scale = rational(lcmOf(folded.map(denominatorOf)));
  const terms = species.map((one, place): Term => ({ species: one, nu: (folded[place] ?? ZERO).mul(scale) }));
  return {
    overall: { terms: inPrintingOrder(terms.filter(({ nu }) => !isZero(nu))) },
    combination: { anode: scale.div(given), cathode: scale.div(taken), electrons: scale },
  };
};

const inPrintingOrder = (terms: readonly Term[]): readonly Term[] => [
  ...terms.filter(({ nu }) => signOf(nu) < 0n),
  ...terms.filter(({ nu }) => signOf(nu) > 0n),
];

/** How often H^+ and OH^- that stand on one side meet: positive where both are made. */
const meetingOf = (species: readonly Species[], sum: readonly Rational[]): Rational => {
  const amount = (ion: Species): Rational => sum[species.findIndex((one) => one.key === ion.key)] ?? ZERO;
  const [acid, base] = [amount(PROTON), amount(HYDROXIDE)];
  if (signOf(acid) !== signOf(base)) return ZERO;
  return acid.abs().compare(base.abs()) < 0 ? acid : base;
};
