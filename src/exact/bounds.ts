import { magnitude, wordsOf } from './integer.ts';

/** Limits of a search, counted in work and never in time, so that the same question always has the same answer. */
export interface Bounds {
  /** Vectors held at once. */
  readonly vectors: number;
  /** Comparisons of two vectors; a number written counts as `WRITING` of them for each of its words. */
  readonly steps: number;
  /** Decimal digits of any number. */
  readonly digits: number;
}

/** About a second of work; tens of megabytes, or a few hundred where every number is as long as the bound allows. */
export const USUAL_BOUNDS: Bounds = { vectors: 5_000, steps: 100_000_000, digits: 1_000 };

/**
 * Measured: a product and a difference of whole numbers take as long as so many comparisons, and the greatest common
 * divisor of long ones as long as so many products for each word.
 */
const WRITING = 8;
const CONTENT = 150;

/** A search that went beyond a bound; `limit` names it: "5000 vectors". */
export interface TooHard {
  readonly kind: 'too-hard';
  readonly limit: string;
}

/** Counts work against bounds. The first bound that is passed is kept; every later question is answered false. */
export interface Meter {
  readonly passed: () => TooHard | undefined;
  /** Counts `count` steps; false beyond the bound. */
  readonly step: (count: number) => boolean;
  /** Counts `rows` rows of `length` numbers of the size of `size`, each made primitive; false beyond the bound. */
  readonly write: (rows: number, length: number, size: bigint) => boolean;
  /** Looks at a new vector that would be the `held`th; false beyond the bounds of vectors or digits. */
  readonly hold: (vector: readonly bigint[], held: number) => boolean;
}

/** A meter that stands at 0. What it counts also counts on `whole`, if given, whose bounds then hold too. */
export const startMeter = (bounds: Bounds = USUAL_BOUNDS, whole?: Meter): Meter => {
  const largest = 10n ** BigInt(bounds.digits);
  let steps = 0;
  let passed: TooHard | undefined;
  const fail = (limit: string): false => {
    passed ??= { kind: 'too-hard', limit };
    return false;
  };
  const step = (count: number): boolean => {
    steps += count;
    if (steps > bounds.steps) return fail(`${String(bounds.steps)} steps`);
    if (whole?.step(count) === false) passed ??= whole.passed();
    return passed === undefined;
  };
  return {
    passed: () => passed,
    step,
    write: (rows, length, size) => {
      const words = wordsOf(size);
      return step(WRITING * words * rows * (length + (words > 1 ? CONTENT : 0)));
    },
    hold: (vector, held) => {
      if (held > bounds.vectors) return fail(`${String(bounds.vectors)} vectors`);
      if (!vector.every((value) => magnitude(value) < largest)) return fail(`${String(bounds.digits)} digits`);
      return passed === undefined;
    },
  };
};
