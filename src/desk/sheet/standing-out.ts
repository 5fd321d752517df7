import { type FoundEfficiency, isStated, uncertaintyOfFound } from './efficiency.ts';

/** Standard uncertainties beyond which a run is said to stand out. */
const COVERAGE = 2;
/** Runs whose scatter says something about one more. */
const ENOUGH = 3;
/** Differences that are no more than rounding. */
const ROUNDING = 1e-12;

/** A run as it is compared: what it found, its standard uncertainty, and whether the sheet states one. */
interface Compared {
  readonly at: number;
  readonly value: number;
  readonly variance: number;
  readonly stated: boolean;
}

/** Sums over the runs that are compared; values count from `origin`, so that squares do not cancel. */
interface Sums {
  readonly count: number;
  readonly origin: number;
  readonly values: number;
  readonly squares: number;
  readonly variances: number;
  readonly stated: number;
}

const sumsOf = (runs: readonly Compared[]): Sums => {
  const sum = (pick: (run: Compared) => number): number => runs.reduce((total, run) => total + pick(run), 0);
  const origin = sum(({ value }) => value) / Math.max(1, runs.length);
  return {
    count: runs.length,
    origin,
    values: sum(({ value }) => value - origin),
    squares: sum(({ value }) => (value - origin) ** 2),
    variances: sum(({ variance }) => variance),
    stated: runs.filter(({ stated }) => stated).length,
  };
};

/** How far a run lies from the mean of the others. */
interface Gap {
  readonly at: number;
  /** Run minus mean, as a fraction. */
  readonly difference: number;
  /** In standard uncertainties of the difference. */
  readonly ratio: number;
}

/**
 * The standard uncertainty of the difference between a run and the mean of n others: what is stated,
 * u² = u_i² + Σ u_j² / n², or what three or more others scatter by, s² (1 + 1/n), whichever is larger. Undefined where
 * neither is known. Taking stated uncertainties as independent errs on the side of silence.
 *
 * The others are all but the run, from sums over all:  s² = (Σ x_j² - (Σ x_j)² / n) / (n - 1).
 */
const gapOf = (run: Compared, sums: Sums): Gap | undefined => {
  const count = sums.count - 1;
  const stated = sums.stated === sums.count;
  if (count < 1 || (!stated && count < ENOUGH)) return undefined;
  const own = run.value - sums.origin;
  const others = sums.values - own;
  const scatter = Math.max(0, sums.squares - own ** 2 - others ** 2 / count) / Math.max(1, count - 1);
  const known = stated ? run.variance + (sums.variances - run.variance) / count ** 2 : 0;
  const uncertainty = Math.sqrt(Math.max(known, count < ENOUGH ? 0 : scatter * (1 + 1 / count)));
  const difference = own - others / count;
  if (Math.abs(difference) < ROUNDING) return undefined;
  return { at: run.at, difference, ratio: Math.abs(difference) / uncertainty };
};

const OVER = 'the current efficiency is over 100 %: look at the weighing, the record and the reactions.';

const sentence = ({ difference, ratio }: Gap, pair: boolean): string => {
  const points = `${(Math.abs(difference) * 100).toPrecision(2)} points ${difference > 0 ? 'above' : 'below'}`;
  const times = ratio > 100 ? 'over 100' : ratio.toPrecision(2);
  const whom = pair ? 'the only other weighed run' : "the mean of the tank's other weighed runs";
  return `${points} ${whom}, ${times} standard uncertainties of the difference: look at the weighing and the record.`;
};

/** The run that lies farthest out, if it lies beyond the coverage. */
const farthest = (runs: readonly Compared[]): Gap | undefined => {
  const sums = sumsOf(runs);
  let most: Gap | undefined;
  for (const run of runs) {
    const gap = gapOf(run, sums);
    if (gap !== undefined && gap.ratio > Math.max(COVERAGE, most?.ratio ?? 0)) most = gap;
  }
  return most;
};

const comparedOf = (found: FoundEfficiency, at: number): Compared => ({
  at,
  value: found.value,
  variance: uncertaintyOfFound(found) ** 2,
  stated: isStated(found),
});

/**
 * For each weighed run of a tank the sentence that it stands out, or null. A run over 100 % always does. Of the others
 * the one farthest from the mean of the rest is set aside as long as it lies more than two standard uncertainties off,
 * so that one bad weighing does not cast doubt on the good ones; two that remain and disagree are both named.
 */
export const standingOut = (runs: readonly FoundEfficiency[]): readonly (string | null)[] => {
  const verdicts: (string | null)[] = runs.map(({ value }) => (value > 1 ? OVER : null));
  let among = runs.map(comparedOf).filter(({ value }) => value <= 1);
  for (let gap = farthest(among); gap !== undefined; gap = farthest(among)) {
    const { at } = gap;
    if (among.length === 2) {
      const sums = sumsOf(among);
      for (const run of among) {
        const both = gapOf(run, sums);
        if (both !== undefined) verdicts[run.at] = sentence(both, true);
      }
      break;
    }
    verdicts[at] = sentence(gap, false);
    among = among.filter((run) => run.at !== at);
  }
  return verdicts;
};
