import { type FoundEfficiency, isStated, uncertaintyOfFound } from './sheet-efficiency.ts';

/** Standard uncertainties beyond which a run is said to stand out. */
const COVERAGE = 2;
/** Runs whose scatter says something about one more. */
const ENOUGH = 3;

const meanOf = (values: readonly number[]): number => values.reduce((sum, one) => sum + one, 0) / values.length;

/**
 * The standard uncertainty of the difference between a run and the mean of n others: what is stated,
 * u² = u_i² + Σ u_j² / n², or what three or more others scatter by, s² (1 + 1/n), whichever is larger. Undefined where
 * neither is known. Taking stated uncertainties as independent errs on the side of silence.
 */
const uncertaintyOfGap = (run: FoundEfficiency, others: readonly FoundEfficiency[]): number | undefined => {
  const stated = [run, ...others].every(isStated);
  const count = others.length;
  if (!stated && count < ENOUGH) return undefined;
  const own = uncertaintyOfFound(run) ** 2 + meanOf(others.map((one) => uncertaintyOfFound(one) ** 2)) / count;
  const mean = meanOf(others.map(({ value }) => value));
  const scatter = others.reduce((sum, { value }) => sum + (value - mean) ** 2, 0) / Math.max(1, count - 1);
  return Math.sqrt(Math.max(stated ? own : 0, count < ENOUGH ? 0 : scatter * (1 + 1 / count)));
};

/** How far a run lies from the mean of the others. */
interface Gap {
  readonly at: number;
  /** Run minus mean, as a fraction. */
  readonly difference: number;
  /** In standard uncertainties of the difference. */
  readonly ratio: number;
}

const gapOf = (runs: readonly FoundEfficiency[], at: number, among: readonly number[]): Gap | undefined => {
  const run = runs[at];
  const others = among.flatMap((index) => (index === at ? [] : (runs[index] ?? [])));
  if (run === undefined || others.length === 0) return undefined;
  const uncertainty = uncertaintyOfGap(run, others);
  const difference = run.value - meanOf(others.map(({ value }) => value));
  if (uncertainty === undefined || difference === 0) return undefined;
  return { at, difference, ratio: Math.abs(difference) / uncertainty };
};

const OVER = 'the current efficiency is over 100 %: look at the weighing, the record and the reactions.';

const sentence = ({ difference, ratio }: Gap, pair: boolean): string => {
  const points = `${(Math.abs(difference) * 100).toPrecision(2)} points ${difference > 0 ? 'above' : 'below'}`;
  const times = ratio > 100 ? 'over 100' : ratio.toPrecision(2);
  const whom = pair ? 'the only other weighed run' : "the mean of the tank's other weighed runs";
  return `${points} ${whom}, ${times} standard uncertainties of the difference: look at the weighing and the record.`;
};

/** The run that lies farthest out of `among`, if it lies beyond the coverage. */
const farthest = (runs: readonly FoundEfficiency[], among: readonly number[]): Gap | undefined => {
  const gaps = among.flatMap((at) => gapOf(runs, at, among) ?? []);
  const [most] = gaps.sort((one, other) => other.ratio - one.ratio);
  return most !== undefined && most.ratio > COVERAGE ? most : undefined;
};

/**
 * For each weighed run of a tank the sentence that it stands out, or null. A run over 100 % always does. Of the others
 * the one farthest from the mean of the rest is set aside as long as it lies more than two standard uncertainties off,
 * so that one bad weighing does not cast doubt on the good ones; two that remain and disagree are both named.
 */
export const standingOut = (runs: readonly FoundEfficiency[]): readonly (string | null)[] => {
  const verdicts: (string | null)[] = runs.map(({ value }) => (value > 1 ? OVER : null));
  let among = runs.flatMap(({ value }, at) => (value > 1 ? [] : [at]));
  for (let gap = farthest(runs, among); gap !== undefined; gap = farthest(runs, among)) {
    const { at } = gap;
    verdicts[at] = sentence(gap, among.length === 2);
    if (among.length === 2) {
      const other = among.find((index) => index !== at);
      const back = other === undefined ? undefined : gapOf(runs, other, among);
      if (other !== undefined && back !== undefined) verdicts[other] = sentence(back, true);
      break;
    }
    among = among.filter((index) => index !== at);
  }
  return verdicts;
};
