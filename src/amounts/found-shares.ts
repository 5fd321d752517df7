import { FARADAY } from '../elements/constants.ts';
import { type Result, failure, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import type { Derived } from './derivation.ts';
import type { Given } from './given.ts';
import { type Measured, exactly, over, scaled, times, weightedSum } from './measured.ts';
import { toFloat } from './number.ts';
import type { Problem } from './problem.ts';
import { compareValues, derive, isNearZero } from './solver.ts';

/** Shares by reaction that a measured amount gives; null where none was found. */
export type FoundShares = readonly (Measured | null)[];

/** What follows, and the shares that several reactions of the species asked were found to take. */
export interface Shared {
  readonly derived: Derived;
  readonly found: FoundShares | null;
}

const MEASURES = ['mass', 'amount', 'volume', 'normal'] as const;

/** Where a fault of a found share points: what was measured of the species, else the reactions. */
export const measuredPlace = (given: readonly Given[]): { readonly field: string; readonly text?: string } =>
  given.find(({ name }) => MEASURES.some((one) => one === name)) ?? { field: 'electrode' };

/** `contradiction` where shares do not go together with what was measured. */
export const shareFault = (given: readonly Given[], message: string): Result<never> => {
  const { field, text } = measuredPlace(given);
  return failure({
    code: 'contradiction',
    message,
    field,
    ...(text === undefined ? {} : { span: wholeSpan(text) }),
    hint: 'Look at the weighing, the charge and the reactions: shares are parts of one current.',
  });
};

/** A share in words: 62.9 %. */
export const showPercent = ({ value }: Measured): string => `${String(Number((value * 100).toPrecision(4)))} %`;

const notSettled = (message: string): Result<never> =>
  failure({ code: 'not-enough-given', message, field: 'electrode', missing: ['share'], hint: 'Give the shares.' });

interface Own {
  readonly branch: number;
  /** mol per mol of electrons, positive. */
  readonly yield: number;
  readonly share: Measured | null;
}

const WHOLE = exactly(1);

/**
 * The share of the only open reaction of the species, the others being written.
 *   n F / Q = sum of y s  gives  s = (n F / Q - sum of the others' y s) / y
 */
const oneShare = (perElectron: Measured, own: readonly Own[], open: Own): Measured => {
  const known = own.flatMap(({ share, yield: size }) => (share === null ? [] : [[-size, share] as const]));
  return scaled(weightedSum([[1, perElectron], ...known]), 1 / open.yield);
};

/**
 * The share of the first of two open reactions that take the rest r of the current together.
 *   y1 s1 + y2 (r - s1) = n F / Q - (the others)  gives  s1 = (n F / Q - (the others) - y2 r) / (y1 - y2)
 */
const firstOfTwo = (perElectron: Measured, own: readonly Own[], rest: Measured, [one, two]: readonly [Own, Own]) => {
  const remaining = oneShare(perElectron, own, { ...one, yield: 1 });
  return scaled(
    weightedSum([
      [1, remaining],
      [-two.yield, rest],
    ]),
    1 / (one.yield - two.yield),
  );
};

const isPart = (share: Measured, of: Measured): boolean => {
  const left = weightedSum([
    [1, of],
    [-1, share],
  ]);
  return [share, left].every((part) => part.value >= 0 || isNearZero(part, 1));
};

/** With both yields alike the amount says nothing of the shares, and must be what any shares give. */
const alike = (
  name: string,
  perElectron: Measured,
  own: readonly Own[],
  rest: Measured,
  size: number,
  given: readonly Given[],
) => {
  const remaining = oneShare(perElectron, own, { branch: 0, yield: 1, share: null });
  if (!compareValues(remaining, scaled(rest, size)).agrees)
    return shareFault(given, `no shares of these reactions give this amount of ${name} for this charge`);
  return notSettled(`these reactions have as much of ${name} for a charge: the amount does not say their shares`);
};

/** What the open reactions of the species take together: what an efficiency leaves of it, else what is left of the whole. */
const remainderOf = ({ branches }: Problem, own: readonly Own[], efficiency: Measured | undefined): Measured => {
  const whole = branches.flatMap(({ share }) => share?.measured ?? []);
  const written = efficiency === undefined ? whole : own.flatMap(({ share }) => share ?? []);
  return weightedSum([[1, efficiency ?? WHOLE], ...written.map((share) => [-1, share] as const)]);
};

const sharesOf = (
  problem: Problem,
  perElectron: Measured,
  own: readonly Own[],
  efficiency: Measured | undefined,
  given: readonly Given[],
): Result<FoundShares> => {
  const { asked, branches } = problem;
  const rest = remainderOf(problem, own, efficiency);
  const [one, two, more] = own.filter(({ share }) => share === null);
  const open = branches.filter(({ share }) => share === null).length;
  if (one === undefined || more !== undefined || (two !== undefined && open > 2 && efficiency === undefined))
    return notSettled(
      `the shares of ${String(open)} reactions are open: the amount of ${asked.name} alone does not settle them`,
    );
  const near = two !== undefined && Math.abs(one.yield - two.yield) < 1e-12;
  if (near) return alike(asked.name, perElectron, own, rest, one.yield, given);
  const first = two === undefined ? oneShare(perElectron, own, one) : firstOfTwo(perElectron, own, rest, [one, two]);
  if (!isPart(first, rest))
    return shareFault(
      given,
      `no shares of these reactions give this amount of ${asked.name}: one would take ${showPercent(first)}`,
    );
  const second = weightedSum([
    [1, rest],
    [-1, first],
  ]);
  return success(branches.map((_, branch) => (branch === one.branch ? first : branch === two?.branch ? second : null)));
};

/** Charge and amount are known, yet not how the several reactions of the species share the current. */
const isOpen = ({ circuit, asked, branches }: Problem): boolean =>
  circuit.kind === 'electrode' &&
  asked.parts.length > 1 &&
  asked.parts.some(({ branch }) => (branches[branch]?.share ?? null) === null);

/**
 * Finds the shares of several reactions of the species asked from its amount and the charge, where they follow. Faults:
 * `contradiction` where no shares give the amount, `not-enough-given` where more than one set of shares does.
 */
export const findShares = (problem: Problem, derived: Derived, given: readonly Given[]): Result<Shared> => {
  const { known, relations } = derived;
  const amount = known.get('amount');
  const net = known.get('net');
  if (!isOpen(problem) || amount === undefined || net === undefined) return success({ derived, found: null });
  const { parts, name } = problem.asked;
  const [sign] = parts.map(({ perElectron }) => Math.sign(toFloat(perElectron)));
  if (parts.some(({ perElectron }) => Math.sign(toFloat(perElectron)) !== sign))
    return notSettled(
      `${name} is made in one reaction and used up in another: its amount alone does not say their shares`,
    );
  if (net.value === 0) return shareFault(given, `no charge is left to give this amount of ${name}`);
  const perElectron = times(scaled(amount, toFloat(FARADAY)), over(WHOLE, net));
  const own = parts.map(({ branch, perElectron: size }): Own => ({
    branch,
    yield: Math.abs(toFloat(size)),
    share: problem.branches[branch]?.share?.measured ?? null,
  }));
  const found = sharesOf(problem, perElectron, own, known.get('efficiency'), given);
  if (!found.ok) return found;
  const shares = own.flatMap(({ branch, share }) => share ?? found.value[branch] ?? []);
  const efficiency = weightedSum(shares.map((share) => [1, share] as const));
  if (!compareValues(known.get('efficiency') ?? efficiency, efficiency).agrees)
    return shareFault(given, `the efficiency given and the amount of ${name} do not go together`);
  const solution = derive(new Map([...known, ['efficiency', efficiency] as const]), relations);
  const settled = { ...derived, known: solution.known, steps: [...derived.steps, ...solution.derived] };
  return success({ derived: settled, found: found.value });
};
