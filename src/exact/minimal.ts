import { type Meter, type TooHard, startMeter } from './bounds.ts';
import {
  type IntegerMatrix,
  type IntegerVector,
  clearColumn,
  echelonOf,
  entry,
  leftNullSpace,
  nullSpace,
  range,
  weighted,
} from './matrix.ts';
import { type WholeSolution, withFree } from './positive.ts';
import { type Support, isInside, sizeOf, supportOf, unionOf } from './support.ts';

/** All minimal solutions; or the lines that dependent free columns leave; or the bound that was passed. */
export type MinimalSolutions =
  | { readonly kind: 'rays'; readonly rays: readonly WholeSolution[] }
  | { readonly kind: 'lines'; readonly lines: readonly IntegerVector[] }
  | TooHard;

/**
 * The extreme rays of { (x, h) : A_S x + A_H h = 0, x >= 0, h free }, each whole and jointly primitive, the ones of
 * fewest strict columns first. A_S is `strict`, A_H is `free`. Every solution is a non-negative combination of them and
 * none has a solution of smaller support in x. If the columns of A_H depend on one another the set contains lines and
 * has no extreme rays: their basis is given, for the caller to settle.
 *
 * With the rows of C a basis of { w : w A_H = 0 }, x runs through the pointed cone  C A_S x = 0, x >= 0,  and each x
 * has one h. So no free column is ever split in two.
 */
export const minimalSolutions = (
  strict: IntegerMatrix,
  free: IntegerMatrix,
  meter: Meter = startMeter(),
): MinimalSolutions => {
  const lines = nullSpace(free, free[0]?.length ?? 0);
  if (lines.length > 0) return { kind: 'lines', lines };
  const width = strict[0]?.length ?? 0;
  const equations = leftNullSpace(free, strict.length).map((row) => weighted(row, strict, width));
  const cone = extremeRays(equations, width, meter);
  const rays = cone.flatMap((x) => (meter.step(width) ? (withFree(strict, free, x, meter) ?? []) : []));
  return meter.passed() ?? { kind: 'rays', rays: bySupport(rays, (ray) => ray.strict) };
};

/** `items` by the vectors that they hold: fewest columns first, then least total, then the earlier columns. */
export const bySupport = <T>(items: readonly T[], vectorOf: (item: T) => IntegerVector): readonly T[] => {
  const keyed = items.map((item) => {
    const vector = vectorOf(item);
    const count = vector.reduce((sum, value) => (value === 0n ? sum : sum + 1), 0);
    return { item, vector, count, total: vector.reduce((sum, value) => sum + value, 0n) };
  });
  const sorted = keyed.toSorted((a, b) => {
    if (a.count !== b.count) return a.count - b.count;
    return a.total === b.total ? compareColumns(b.vector, a.vector) : a.total < b.total ? -1 : 1;
  });
  return sorted.map(({ item }) => item);
};

/** By the first column in which the two differ. */
const compareColumns = (a: IntegerVector, b: IntegerVector): number => {
  const at = a.findIndex((value, index) => value !== entry(b, index));
  return at === -1 ? 0 : entry(a, at) < entry(b, at) ? -1 : 1;
};

/**
 * A ray x as the row [x | E x] of the tableau of double description: what an equation makes of x is combined along
 * with x, since E is linear, and need not be computed again. The content of the row is that of x.
 */
interface Ray {
  readonly row: IntegerVector;
  readonly support: Support;
}

/**
 * The extreme rays of { x >= 0 : E x = 0 }, E the `equations` of `width` columns, by double description
 * (T. S. Motzkin et al., Contributions to the Theory of Games II, 1953; K. Fukuda, A. Prodon, Double description method
 * revisited, 1996). It begins with the unit vectors, the rays of x >= 0, and cuts with one equation e after the other:
 *
 *     e r+ > 0 > e r-   and r+, r- adjacent   give   (-e r-) r+  +  (e r+) r-,   on which e is 0
 *
 * and rays with e r = 0 stay. Stops with an unfinished list once the meter has passed a bound.
 */
const extremeRays = (equations: IntegerMatrix, width: number, meter: Meter): readonly IntegerVector[] => {
  const { rows } = echelonOf(equations, range(width), meter);
  if (!meter.step(width * (width + rows.length))) return [];
  let rays = range(width).map((at) => {
    const unit = range(width).map((column) => (column === at ? 1n : 0n));
    return rayOf([...unit, ...rows.map((row) => entry(row, at))], width);
  });
  let waiting = range(rows.length).map((index) => width + index);
  for (let done = 0; waiting.length > 0 && meter.step(waiting.length * rays.length); done += 1) {
    const column = cheapestCut(waiting, rays);
    waiting = waiting.filter((other) => other !== column);
    rays = cut(rays, column, { width, done, meter });
  }
  return rays.map(({ row }) => row.slice(0, width));
};

const rayOf = (row: IntegerVector, width: number): Ray => ({ row, support: supportOf(row, width) });

/** The equation with the fewest pairs of rays on its two sides: the order decides how many rays arise on the way. */
const cheapestCut = (waiting: readonly number[], rays: readonly Ray[]): number => {
  let [best, fewest] = [-1, Infinity];
  for (const column of waiting) {
    const above = rays.filter(({ row }) => entry(row, column) > 0n).length;
    const below = rays.filter(({ row }) => entry(row, column) < 0n).length;
    if (above * below < fewest) [best, fewest] = [column, above * below];
  }
  return best;
};

/** Where a cut stands: columns of x, equations that hold already, work so far. */
interface CutState {
  readonly width: number;
  readonly done: number;
  readonly meter: Meter;
}

/** The rays on which the equation whose values stand in `column` holds. */
const cut = (rays: readonly Ray[], column: number, state: CutState): Ray[] => {
  const { width, meter } = state;
  const kept = rays.filter(({ row }) => entry(row, column) === 0n);
  const below = rays.filter(({ row }) => entry(row, column) < 0n);
  for (const up of rays.filter(({ row }) => entry(row, column) > 0n)) {
    for (const down of below) {
      if (!areAdjacent(up, down, rays, state)) continue;
      if (!meter.write(1, up.row.length, entry(up.row, column))) return kept;
      const row = clearColumn(down.row, up.row, column);
      if (!meter.hold(row, kept.length + 1)) return kept;
      kept.push(rayOf(row, width));
    }
    if (meter.passed() !== undefined) return kept;
  }
  return kept;
};

/**
 * Two rays are adjacent exactly when no third has its support inside the union of theirs (Fukuda and Prodon,
 * proposition 7). After `done` independent equations a face of two rays has at most `done` + 2 columns, which rules most
 * pairs out at once.
 */
const areAdjacent = (a: Ray, b: Ray, rays: readonly Ray[], { done, meter }: CutState): boolean => {
  if (!meter.step(1 + a.support.length)) return false;
  const union = unionOf(a.support, b.support);
  if (sizeOf(union) > done + 2 || !meter.step(rays.length)) return false;
  return rays.every((ray) => ray === a || ray === b || !isInside(ray.support, union));
};
