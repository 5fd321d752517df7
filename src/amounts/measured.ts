/**
 * An independent input: its value in SI base units, its standard uncertainty (0 where none is known) and the size of
 * one unit in the last written digit (0 where it counts as exact).
 */
export interface Source {
  readonly name: string;
  readonly value: number;
  readonly uncertainty: number;
  readonly lastDigit: number;
}

/**
 * A value in SI base units with its sensitivity to every input, so that two routes that share an input stay
 * correlated: u^2(y) = sum over inputs of (dy/dx)^2 u^2(x)  (JCGM 100:2008, 5.1.2; correlated inputs 5.2.2).
 */
export interface Measured {
  readonly value: number;
  readonly slopes: ReadonlyMap<Source, number>;
}

/** A number that no input enters. */
export const exactly = (value: number): Measured => ({ value, slopes: new Map() });

/** The value of an input itself. */
export const measuredFrom = (source: Source): Measured => ({ value: source.value, slopes: new Map([[source, 1]]) });

/** Weighted sum: slopes add with the same weights. */
export const weightedSum = (parts: readonly (readonly [weight: number, part: Measured])[]): Measured => {
  const slopes = new Map<Source, number>();
  let value = 0;
  for (const [weight, part] of parts) {
    value += weight * part.value;
    for (const [source, slope] of part.slopes) slopes.set(source, (slopes.get(source) ?? 0) + weight * slope);
  }
  return { value, slopes };
};

/**
 * Product of powers, y = product of x^p:  dy = sum over factors of p x^(p-1) (product of the others) dx, which holds
 * at zero too. Powers are 1 or -1.
 */
export const productOf = (factors: readonly (readonly [power: number, factor: Measured])[]): Measured => {
  const values = factors.map(([power, factor]) => (power < 0 ? 1 / factor.value : factor.value));
  const value = values.reduce((product, factor) => product * factor, 1);
  const others = (skip: number): number =>
    values.reduce((product, factor, index) => (index === skip ? product : product * factor), 1);
  const weight = (power: number, factor: Measured, index: number): number =>
    (power < 0 ? -1 / factor.value ** 2 : 1) * others(index);
  const parts = factors.map(([power, factor], index) => [weight(power, factor, index), factor] as const);
  return { value, slopes: weightedSum(parts).slopes };
};

export const times = (a: Measured, b: Measured): Measured =>
  productOf([
    [1, a],
    [1, b],
  ]);

export const over = (a: Measured, b: Measured): Measured =>
  productOf([
    [1, a],
    [-1, b],
  ]);

export const scaled = (a: Measured, factor: number): Measured => weightedSum([[factor, a]]);

/** A correlation coefficient between two inputs, named as in the ask (`current`, `time`). */
export interface Correlation {
  readonly between: readonly [string, string];
  readonly coefficient: number;
}

/** One standard uncertainty, same unit as the value; 0 where no input has one. */
export const uncertaintyOf = (quantity: Measured, correlations: readonly Correlation[] = []): number => {
  const parts = [...quantity.slopes].map(([source, slope]) => ({
    name: source.name,
    part: slope * source.uncertainty,
  }));
  const alone = parts.reduce((sum, { part }) => sum + part * part, 0);
  const find = (name: string): number => parts.find((part) => part.name === name)?.part ?? 0;
  const joint = correlations.reduce(
    (sum, { between: [a, b], coefficient }) => sum + 2 * coefficient * find(a) * find(b),
    0,
  );
  return Math.sqrt(Math.max(0, alone + joint));
};
