import { magnitude } from './integer.ts';

/** Limits of a search, counted in work and never in time, so that the same question always has the same answer. */
export interface Bounds {
  /** Vectors held at once. */
  readonly vectors: number;
  /** Comparisons of two vectors. */
  readonly steps: number;
  /** Decimal digits of any number. */
  readonly digits: number;
}

/** A second or two of work; tens of megabytes, or a few hundred where every number is as long as the bound allows. */
export const USUAL_BOUNDS: Bounds = { vectors: 5_000, steps: 20_000_000, digits: 1_000 };

/** A search that went beyond a bound; `limit` names it: "5000 vectors". */
export interface TooHard {
  readonly kind: 'too-hard';
  readonly limit: string;
}

/** Counts work against bounds. The first bound that is passed is kept; every later question is answered false. */
export interface Meter {
  readonly passed: () => TooHard | undefined;
  /** Counts `count` comparisons; false beyond the bound. */
  readonly step: (count: number) => boolean;
  /** Looks at a new vector that would be the `held`th; false beyond the bounds of vectors or digits. */
  readonly hold: (vector: readonly bigint[], held: number) => boolean;
}

/** A meter that stands at 0. */
export const startMeter = (bounds: Bounds): Meter => {
  const largest = 10n ** BigInt(bounds.digits);
  let steps = 0;
  let passed: TooHard | undefined;
  const fail = (limit: string): false => {
    passed ??= { kind: 'too-hard', limit };
    return false;
  };
  return {
    passed: () => passed,
    step: (count) => {
      steps += count;
      if (steps > bounds.steps) return fail(`${String(bounds.steps)} steps`);
      return passed === undefined;
    },
    hold: (vector, held) => {
      if (held > bounds.vectors) return fail(`${String(bounds.vectors)} vectors`);
      if (!vector.every((value) => magnitude(value) < largest)) return fail(`${String(bounds.digits)} digits`);
      return passed === undefined;
    },
  };
};
