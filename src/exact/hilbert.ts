import { type Meter, type TooHard, startMeter } from './bounds.ts';
import { magnitude } from './integer.ts';
import { floorDivide, hermite, integerKernel, subtract } from './lattice.ts';
import { type IntegerMatrix, type IntegerVector, entry, nullSpace, range } from './matrix.ts';
import { bySupport } from './minimal.ts';
import type { WholeSolution } from './positive.ts';

/** All irreducible whole solutions; or the lines that dependent free columns leave; or the bound that was passed. */
export type IrreducibleSolutions =
  | { readonly kind: 'basis'; readonly elements: readonly WholeSolution[] }
  | { readonly kind: 'lines'; readonly lines: readonly IntegerVector[] }
  | TooHard;

/**
 * The Hilbert basis of the monoid { (x, h) whole : A_S x + A_H h = 0, x >= 0, h free }: the solutions that are no sum of
 * two others, of which every other is a sum. A_S is `strict`, A_H is `free`. Those of fewest strict columns come first.
 * Dependent columns of A_H leave lines, as in the minimal solutions.
 *
 * Completion, one coordinate after the other (L. Pottier, Minimal solutions of linear diophantine systems, RTA 1991;
 * R. Hemmecke, On the computation of Hilbert bases of cones, 2002): let G generate the lattice vectors that are >= 0 in
 * the coordinates J. For a further coordinate c write g [= s where g <= s in J and g[c] lies between 0 and s[c]. If every
 * sum f + g of two generators of opposite sign in c is a sum of generators [= f + g, then so is every vector, and those
 * with g[c] >= 0 generate what is >= 0 in J and c. Sums for which this fails leave a remainder that joins G; by Dickson's
 * lemma that ends.
 */
export const hilbertBasis = (
  strict: IntegerMatrix,
  free: IntegerMatrix,
  meter: Meter = startMeter(),
): IrreducibleSolutions => {
  const [width, freeWidth] = [strict[0]?.length ?? 0, free[0]?.length ?? 0];
  const lines = nullSpace(free, freeWidth);
  if (lines.length > 0) return { kind: 'lines', lines };
  const joined = strict.map((row, index) => [...row, ...(free[index] ?? [])]);
  const kernel = integerKernel(joined, width + freeWidth, meter);
  const found = irreducible(kernel, width, meter);
  const passed = meter.passed();
  if (passed !== undefined) return passed;
  const elements = found.map((vector) => ({ strict: vector.slice(0, width), free: vector.slice(width) }));
  return { kind: 'basis', elements: bySupport(elements, (element) => element.strict) };
};

/**
 * With the lattice in Hermite's form its pivot coordinates come first: row b_i brings in coordinate i as a line, +b_i and
 * -b_i, and is 0 in those before. The other coordinates follow from them, the one with the fewest pairs next.
 */
const irreducible = (kernel: IntegerMatrix, width: number, meter: Meter): readonly IntegerVector[] => {
  const { rows, pivots } = hermite(kernel, range(width), meter);
  const settled: number[] = [];
  let generators: readonly IntegerVector[] = [];
  const settle = (vectors: readonly IntegerVector[], column: number): void => {
    generators = complete(vectors, settled, column, meter).filter((vector) => entry(vector, column) >= 0n);
    settled.push(column);
  };
  pivots.forEach((column, index) => {
    const line = rows[index] ?? [];
    const lifted = generators.map((vector) =>
      subtract(vector, floorDivide(entry(vector, column), entry(line, column)), line),
    );
    settle([...lifted, line, line.map((value) => -value)], column);
  });
  let waiting = range(width).filter((column) => !pivots.includes(column));
  while (waiting.length > 0 && meter.step(waiting.length * generators.length)) {
    const column = fewestPairs(waiting, generators);
    settle(generators, column);
    waiting = waiting.filter((other) => other !== column);
  }
  return generators;
};

const fewestPairs = (waiting: readonly number[], generators: readonly IntegerVector[]): number => {
  let [best, fewest] = [-1, Infinity];
  for (const column of waiting) {
    const above = generators.filter((vector) => entry(vector, column) > 0n).length;
    const below = generators.filter((vector) => entry(vector, column) < 0n).length;
    if (above * below < fewest) [best, fewest] = [column, above * below];
  }
  return best;
};

/** `start` completed for `column`, then without the elements that another one is [= of. */
const complete = (
  start: readonly IntegerVector[],
  settled: readonly number[],
  column: number,
  meter: Meter,
): readonly IntegerVector[] => {
  const generators = [...start];
  // every pair once: `late` runs through the list while it grows, `early` through all before it
  for (let late = 1; late < generators.length; late += 1) {
    for (let early = 0; early < late; early += 1) {
      if (!meter.step(1)) return [];
      const [f, g] = [generators[late] ?? [], generators[early] ?? []];
      if (entry(f, column) * entry(g, column) >= 0n) continue;
      const rest = remainder(subtract(f, -1n, g), generators, settled, column, meter);
      if (rest === undefined) continue;
      generators.push(rest);
      if (!meter.hold(rest, generators.length)) return [];
    }
  }
  if (!meter.step(generators.length ** 2)) return [];
  return generators.filter(
    (vector) => !generators.some((other) => other !== vector && isBelow(other, vector, settled, column)),
  );
};

/** `sum` less generators [= it as often as they fit; undefined where nothing is left. */
const remainder = (
  sum: IntegerVector,
  generators: readonly IntegerVector[],
  settled: readonly number[],
  column: number,
  meter: Meter,
): IntegerVector | undefined => {
  let rest = sum;
  const isNothing = (): boolean => entry(rest, column) === 0n && settled.every((at) => entry(rest, at) === 0n);
  for (const generator of generators) {
    if (isNothing()) return undefined;
    if (!meter.step(1)) return undefined;
    if (isBelow(generator, rest, settled, column)) {
      rest = subtract(rest, howOften(generator, rest, [...settled, column]), generator);
    }
  }
  return isNothing() ? undefined : rest;
};

/** The relation g [= s. */
const isBelow = (g: IntegerVector, s: IntegerVector, settled: readonly number[], column: number): boolean => {
  const [own, whole] = [entry(g, column), entry(s, column)];
  if (own > 0n ? whole < own : own < 0n && whole > own) return false;
  return settled.every((at) => entry(g, at) <= entry(s, at));
};

/** How many times g fits into s, g [= s. */
const howOften = (g: IntegerVector, s: IntegerVector, columns: readonly number[]): bigint => {
  let least: bigint | undefined;
  for (const column of columns) {
    const own = magnitude(entry(g, column));
    if (own === 0n) continue;
    const fits = magnitude(entry(s, column)) / own;
    if (least === undefined || fits < least) least = fits;
  }
  return least ?? 0n;
};
