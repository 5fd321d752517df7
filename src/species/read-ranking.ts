import type { Rational } from '../exact/rational.ts';
import { isWhole } from '../exact/rational.ts';
import type { Formula, Member } from '../notation/formula.ts';
import { type PartSyntax, type SpeciesSyntax, chainItems } from '../notation/syntax.ts';
import { isAdductMolecule } from './adducts.ts';
import { type Species, plainSpecies } from './species.ts';

/** One reading of a spelling: what was parsed and the species it makes. */
export interface Reading {
  readonly syntax: SpeciesSyntax;
  readonly species: Species;
}

/** True for a species of the table of ions or of the ask's definitions. */
export type IsKnown = (species: Species) => boolean;

/** How the readings of one spelling were put in order: chosen first, or `contested` where nobody can say. */
export interface Ranking {
  readonly readings: readonly Reading[];
  readonly contested: boolean;
  /** The rule that decided, in words; null for a single reading. */
  readonly because: string | null;
}

/**
 * THE RANKING OF READINGS (common practice, no source). A caret, a superscript, a space or brackets around the charge
 * leave one reading; these rules are for what stays open. The first that decides wins.
 *
 *  rule                spelling        taken as          because
 *  contested           I3-, Br3-       several-readings  chemists write both: (I3)^- and I^3-
 *                      N3-, O2-, VO2+  several-readings  both are well-known ions
 *                      CrCl2+          several-readings  any spelling of which both readings are in the table of ions
 *  one known ion       NO3-, TiO2+     NO3^-, TiO^2+     exactly one reading is in the table of ions (or defined in the ask)
 *  last digit          SO42-, Hg22+    SO4^2-, Hg2^2+    of several digits the last is the charge
 *  whole bracket       [Fe(CN)6]3-     [Fe(CN)6]^3-      a bracket around everything is followed by the charge
 *  single cation       Fe3+            Fe^3+             one atom and one digit: the digit is the charge
 *  single anion        F2-             several-readings  nothing decides between (F2)^- and F^2-
 *  one digit           C2H3O2-         C2H3O2^-          after several atoms one digit is a count
 *  hydrate             CuSO4.5H2O      CuSO4*5H2O        what follows the period is a molecule that hydrates and adducts hold
 *  decimal             Li2.5Mn2O4      Li2.5Mn2O4        otherwise a period between digits is a decimal point
 */
const CONTESTED: ReadonlySet<string> = new Set(['I3^-', 'Br3^-', 'N3^-', 'O2^-', 'VO2^+']);

/** The digit was taken as the charge. */
const takesCharge = (reading: Reading): boolean => reading.syntax.charge?.tight === true;

/** A period with a number behind it, taken as the dot of an adduct: CuSO4.5H2O. Before a letter it can be nothing else. */
const isDoubtfulDot = ({ separator, multiplier }: PartSyntax): boolean =>
  separator?.type === 'period' && multiplier?.kind === 'number';

const dotsOf = (reading: Reading): number => chainItems(reading.syntax.parts).filter(isDoubtfulDot).length;

const lastMember = (species: Species): Member | undefined => species.parts.at(-1)?.members.at(-1);

/** The last count has two digits or more in the reading that takes no charge. */
const hasSeveralDigits = (count: Rational): boolean => isWhole(count) && count.n > 9n;

const isWholeBracket = (parts: Formula): boolean =>
  parts.length === 1 && parts[0]?.members.length === 1 && parts[0].members[0]?.kind === 'group';

const isSingleElement = (parts: Formula): boolean =>
  parts.length === 1 && parts[0]?.members.length === 1 && parts[0].members[0]?.kind === 'atom';

type Decision = { readonly first: 'charge' | 'count' | 'neither'; readonly because: string };

/** Between the charge reading and the count reading of one spelling. */
const decideCharge = (charge: Reading, count: Reading, isKnown: IsKnown): Decision => {
  const known = [charge, count].filter(({ species }) => isKnown(species));
  if (CONTESTED.has(plainSpecies(count.species)) || known.length === 2)
    return { first: 'neither', because: 'chemists differ' };
  if (known.length === 1)
    return { first: known[0] === charge ? 'charge' : 'count', because: 'only that is a known ion' };
  const last = lastMember(count.species);
  if (last !== undefined && hasSeveralDigits(last.count))
    return { first: 'charge', because: 'of several digits the last is the charge' };
  const { parts } = charge.species;
  if (isWholeBracket(parts))
    return { first: 'charge', because: 'a bracket around everything is followed by the charge' };
  if (!isSingleElement(parts)) return { first: 'count', because: 'after several atoms one digit is a count' };
  return count.species.charge.compare(0n) > 0
    ? { first: 'charge', because: 'after one atom the digit is the charge' }
    : { first: 'neither', because: 'nothing decides' };
};

/** What follows each dot is a molecule that adducts hold. */
const isPlausibleAdduct = (reading: Reading): boolean =>
  chainItems(reading.syntax.parts).every((written, index) => {
    const part = reading.species.parts[index];
    return !isDoubtfulDot(written) || (part !== undefined && isAdductMolecule(part));
  });

/** Where the first doubtful dot stands: in CaSO4.0.5H2O the first period is the dot, since nobody writes a count of 4.0. */
const firstDot = (reading: Reading): number =>
  chainItems(reading.syntax.parts).find(isDoubtfulDot)?.separator?.offset ?? 0;

/** The adduct with the most plausible dots, else the reading with the fewest dots; of two, the one with the earlier dot. */
const byPeriods = (readings: readonly Reading[]): readonly Reading[] => {
  const weight = (reading: Reading): number =>
    dotsOf(reading) === 0 ? 1 : isPlausibleAdduct(reading) ? 0 : 1 + dotsOf(reading);
  return readings.toSorted((a, b) => weight(a) - weight(b) || firstDot(a) - firstDot(b));
};

const sortPair = (readings: readonly Reading[], isKnown: IsKnown): Ranking => {
  const ordered = byPeriods(readings);
  const [best] = ordered;
  const same = ordered.filter((reading) => best !== undefined && dotsOf(reading) === dotsOf(best));
  const charge = same.find(takesCharge);
  const count = same.find((reading) => !takesCharge(reading));
  if (charge === undefined || count === undefined)
    return {
      readings: ordered,
      contested: false,
      because:
        best !== undefined && dotsOf(best) > 0
          ? 'what follows the period is a molecule that adducts hold'
          : 'a period between digits is a decimal point',
    };
  const { first, because } = decideCharge(charge, count, isKnown);
  const chosen = first === 'charge' ? charge : count;
  const others = ordered.filter((reading) => reading !== chosen);
  return { readings: [chosen, ...others], contested: first === 'neither', because };
};

/** The readings of one spelling in order of preference, by the table above. `isKnown`: the ion has a name of its own. */
export const rankReadings = (readings: readonly Reading[], isKnown: IsKnown): Ranking =>
  readings.length < 2 ? { readings, contested: false, because: null } : sortPair(readings, isKnown);
