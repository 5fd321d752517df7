import { showRational } from '../exact/rational.ts';
import { allByRank } from '../report/precedence.ts';
import { type Result, chain, map, success } from '../report/result.ts';
import { ALONGSIDE_NAMES, type Companion, checkParts, companionsOf, partsOf, splitsCurrent } from './alongside.ts';
import { type AnswerUnits, type Quantity, readWanted, showQuantities } from './answered.ts';
import { budgetsOf } from './budget.ts';
import { deriveAll } from './derivation.ts';
import { checkEnough } from './enough.ts';
import { findShares } from './found-shares.ts';
import { type GivenReadings, convertGiven, readGivenTexts } from './given.ts';
import type { Measured } from './measured.ts';
import { amountNotes } from './notes.ts';
import { type Problem, electronsPerMole, setUp } from './problem.ts';
import { QUANTITY_NAMES, type QuantityName } from './quantities.ts';
import { FARADAY_FORMULA } from './relations.ts';
import type { Derivation } from './solver.ts';
import { readStack } from './stack.ts';
import { withUnitArea } from './unit-area.ts';
import type { AmountsAnswer, AmountsRequest, DerivedQuantity, Working } from './working.ts';

const namesShown = ({ derived, problem, request }: Working): ReadonlySet<QuantityName> => {
  const shown = QUANTITY_NAMES.filter((name) => derived.known.has(name) && !derived.assumed.has(name));
  const asksShare = request.given['share'] !== undefined || request.want?.['share'] !== undefined;
  const share =
    shown.includes('efficiency') && (asksShare || problem.circuit.kind === 'electrode' || splitsCurrent(problem));
  const volume = request.want?.['volume'] !== undefined;
  return new Set([...shown, ...(share ? ['share' as const] : []), ...(volume ? ['volume' as const] : [])]);
};

const showAsked = (working: Working): Readonly<Record<string, Quantity>> => {
  const { derived, units, request } = working;
  const efficiency = derived.known.get('efficiency');
  const known = efficiency === undefined ? derived.known : new Map([...derived.known, ['share', efficiency] as const]);
  return showQuantities(known, namesShown(working), units, request.correlations ?? []);
};

const showCompanion = (
  { units, request }: Working,
  { known, shared }: Companion,
): Readonly<Record<string, Quantity>> => {
  const names = new Set<QuantityName>([...ALONGSIDE_NAMES, ...(shared ? (['efficiency', 'share'] as const) : [])]);
  const efficiency = known.get('efficiency');
  const all = efficiency === undefined ? known : new Map([...known, ['share', efficiency] as const]);
  return showQuantities(all, names, units, request.correlations ?? []);
};

/** A step through a hidden quantity is shown as the relation it belongs to: no blank, one cell, Faraday's law. */
const shownFormula = ({ relation, name }: Derivation): string =>
  relation.step === true && name === 'charge' ? FARADAY_FORMULA : relation.formula;

const stepsOf = ({ derived }: Working): readonly DerivedQuantity[] =>
  derived.steps.flatMap((step) => {
    const quantity = QUANTITY_NAMES.find((one) => one === step.name);
    return quantity === undefined ? [] : [{ quantity, relation: shownFormula(step) }];
  });

const answerFrom = (working: Working): AmountsAnswer => {
  const { problem, companions, request } = working;
  const shown = showAsked(working);
  return {
    quantities: shown,
    alongside: Object.fromEntries(companions.map((one) => [one.stake.name, showCompanion(working, one)])),
    electronsPerMole: Object.fromEntries(electronsPerMole(problem).map(([name, value]) => [name, showRational(value)])),
    derived: stepsOf(working),
    ...(request.budget === true ? { budgets: budgetsOf(working.derived.known, Object.keys(shown)) } : {}),
  };
};

/** The texts of the ask, read before anything is said of the species. */
interface Texts {
  readonly readings: GivenReadings;
  readonly units: AnswerUnits;
  readonly series: Measured;
}

/** Reads the texts of an ask. Faults in `given.NAME`, `want.NAME`, `cells`, `bypass`, those of reading first. */
export const readTexts = (request: Pick<AmountsRequest, 'given' | 'want' | 'cells' | 'bypass'>): Result<Texts> => {
  const given = readGivenTexts(request.given);
  const want = readWanted(request.want ?? {});
  const stack = readStack(request);
  return chain(first([given, want, stack]), () =>
    chain(given, (readings) => chain(want, (units) => map(stack, (series) => ({ readings, units, series })))),
  );
};

/** The fault that comes first, or nothing: the notes come with the values. */
const first = (results: readonly Result<unknown>[]): Result<null> => {
  const ranked = allByRank(results);
  return ranked.ok ? success(null) : ranked;
};

const workOut = (request: AmountsRequest, { readings, units, series }: Texts, problem: Problem): Result<Working> =>
  chain(convertGiven(readings, problem.weigh(problem.asked.species)), (given) =>
    chain(deriveAll(problem, given, series), (solved) =>
      chain(findShares(problem, solved, given), (shared) => {
        const derived = withUnitArea(shared.derived);
        const parts = partsOf(problem, shared);
        const companions = companionsOf(problem, derived, parts);
        const working = { request, problem, given, derived, parts, companions, units };
        return map(checkParts(problem, parts, given), () => working);
      }),
    ),
  );

/**
 * What Faraday's law makes of what was given, for one species of a half-reaction, of reactions in parallel at an
 * electrode or of a cell: everything that follows, in the units wanted, with standard uncertainties (first order, JCGM
 * 100:2008), and the same for every other species for the same charge.
 *
 * Faults, with the field of the ask: `unknown-quantity`, `unknown-unit`, `empty`, `too-long`, `bad-ask`,
 * `not-enough-given`, `contradiction`. A fault in `species` spans the whole name.
 */
export const computeAmounts = (request: AmountsRequest): Result<AmountsAnswer> =>
  chain(readTexts(request), (texts) =>
    chain(setUp(request.circuit, request.species), (problem) =>
      chain(workOut(request, texts, problem), (working) => {
        const answer = answerFrom(working);
        return chain(checkEnough(working, answer), () => success(answer, amountNotes(working, answer)));
      }),
    ),
  );
