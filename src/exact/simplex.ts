import { type Meter, type TooHard, startMeter } from './bounds.ts';
import { lcmOf } from './integer.ts';
import { clearColumn, entry, range } from './matrix.ts';
import type { IntegerMatrix, IntegerVector } from './matrix.ts';

/** Whether B y = b has a solution y >= 0: one, as `numbers / denominator`; Farkas' weights against all; or a work limit. */
export type Feasibility =
  | { readonly kind: 'feasible'; readonly numbers: bigint[]; readonly denominator: bigint }
  | { readonly kind: 'infeasible'; readonly weights: bigint[] }
  | TooHard;

/**
 * The tableau. Columns: y[0 .. n), one artificial variable for each row, the objective z, the right side.
 * Each row is an equation, primitive and positive at its basic variable; the last one, kept apart, is the cost
 * z - sum of artificials = 0, positive at z.
 */
interface Tableau {
  readonly rows: IntegerVector[];
  readonly basis: number[];
  cost: IntegerVector;
  readonly width: number;
}

/**
 * Solves B y = b, y >= 0 exactly, B of `width` columns; or gives u with u B >= 0 and u b < 0, which no y >= 0 survives
 * (Farkas' lemma: A. Schrijver, Theory of Linear and Integer Programming, 1986, section 7.3).
 *
 * First phase of the simplex method: minimise the sum of artificial variables a >= 0 in S B y + a = S b, S the signs
 * that make S b >= 0. Rows stay whole, since an equation may be scaled by any positive number. While the sum falls the
 * steepest column enters; once a step leaves it as it was Bland's rule (Math. Oper. Res. 2 (1977) 103), the least index
 * in and the least index out, which cannot cycle, rules until it falls again. A vertex never comes back after a fall, so
 * the loop ends, when the sum is 0 or when nothing lowers it. Then the dual values y* = 1 - cost[a] satisfy
 * y* S B <= 0 and y* S b = the least sum; u = -y* S.
 */
export const solveNonNegative = (
  matrix: IntegerMatrix,
  right: IntegerVector,
  width: number,
  meter: Meter = startMeter(),
): Feasibility => {
  const tableau = startTableau(matrix, right, width);
  const last = width + matrix.length + 1;
  let column = steepest(tableau);
  while (column !== undefined && entry(tableau.cost, last) !== 0n) {
    const row = leaving(tableau, column);
    const falls = entry(tableau.rows[row] ?? [], last) > 0n;
    pivotOn(tableau, row, column, meter);
    const passed = meter.passed();
    if (passed !== undefined) return passed;
    column = falls ? steepest(tableau) : entering(tableau);
  }
  return entry(tableau.cost, last) === 0n ? solutionIn(tableau, last) : weightsIn(tableau, right);
};

const startTableau = (matrix: IntegerMatrix, right: IntegerVector, width: number): Tableau => {
  const count = matrix.length;
  const last = width + count + 1;
  const rows = matrix.map((row, index) => {
    const sign = entry(right, index) < 0n ? -1n : 1n;
    const full = new Array<bigint>(last + 1).fill(0n);
    row.forEach((value, column) => {
      full[column] = sign * value;
    });
    full[width + index] = 1n;
    full[last] = sign * entry(right, index);
    return full;
  });
  // the cost in terms of y alone: z - sum of (rows without their artificials) = right side
  const cost = range(last + 1).map((column) => {
    if (column === width + count) return 1n;
    if (column >= width && column < width + count) return 0n;
    return -rows.reduce((sum, row) => sum + entry(row, column), 0n);
  });
  return { rows, basis: range(count).map((index) => width + index), cost, width };
};

/** Bland: the first column whose rise lowers the cost; artificial variables never come back. */
const entering = ({ cost, width }: Tableau): number | undefined => {
  for (let column = 0; column < width; column += 1) if (entry(cost, column) < 0n) return column;
  return undefined;
};

/** The column with the most negative cost; of equals the first. */
const steepest = ({ cost, width }: Tableau): number | undefined => {
  let best: number | undefined;
  for (let column = 0; column < width; column += 1) {
    if (entry(cost, column) < (best === undefined ? 0n : entry(cost, best))) best = column;
  }
  return best;
};

/** The row that bounds the rise of `column` first; of equals the one with the least basic index. */
const leaving = ({ rows, basis }: Tableau, column: number): number => {
  let best = -1;
  rows.forEach((row, index) => {
    if (entry(row, column) <= 0n) return;
    const bound = best < 0 ? -1n : compareRatios(row, rows[best] ?? [], column);
    if (bound < 0n || (bound === 0n && (basis[index] ?? 0) < (basis[best] ?? 0))) best = index;
  });
  if (best < 0) throw new Error('a sum of non-negative numbers cannot fall without end');
  return best;
};

/** Negative where a's right side over its entry in `column` is less than b's; both entries are positive. */
const compareRatios = (a: IntegerVector, b: IntegerVector, column: number): bigint =>
  entry(a, a.length - 1) * entry(b, column) - entry(b, b.length - 1) * entry(a, column);

const pivotOn = (tableau: Tableau, at: number, column: number, meter: Meter): void => {
  const pivot = tableau.rows[at] ?? [];
  const touched = tableau.rows.filter((row) => entry(row, column) !== 0n).length;
  // its right side is the sum of what came before: no entry of the row is likely to be much longer
  if (!meter.write(touched, pivot.length, entry(pivot, column) * entry(pivot, pivot.length - 1))) return;
  tableau.rows.forEach((row, index) => {
    if (index !== at) tableau.rows[index] = clearColumn(row, pivot, column);
  });
  tableau.cost = clearColumn(tableau.cost, pivot, column);
  tableau.basis[at] = column;
};

/** Basic variables read off over one common denominator; the others are 0. */
const solutionIn = ({ rows, basis, width }: Tableau, last: number): Feasibility => {
  const basic = rows.map((row, index) => {
    const variable = basis[index] ?? 0;
    return { variable, top: entry(row, last), bottom: entry(row, variable) };
  });
  const denominator = lcmOf(basic.map(({ bottom }) => bottom));
  const numbers = new Array<bigint>(width).fill(0n);
  for (const { variable, top, bottom } of basic) {
    if (variable < width) numbers[variable] = (top * denominator) / bottom;
  }
  return { kind: 'feasible', numbers, denominator };
};

/** u = -y* S, scaled by the cost row's own factor, which stands at z. */
const weightsIn = ({ cost, width, rows }: Tableau, right: IntegerVector): Feasibility => {
  const scale = entry(cost, width + rows.length);
  const weights = rows.map((_, index) => {
    const sign = entry(right, index) < 0n ? -1n : 1n;
    return sign * (entry(cost, width + index) - scale);
  });
  return { kind: 'infeasible', weights };
};
