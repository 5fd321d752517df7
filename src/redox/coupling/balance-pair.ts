import { speciesMatrix } from '../../balance/matrix.ts';
import type { Numbers } from '../../balance/solve.ts';
import type { Unknown } from '../../balance/unknowns.ts';
import type { Meter } from '../../exact/bounds.ts';
import { gcdOf } from '../../exact/integer.ts';
import { type IntegerMatrix, nullSpace, primitiveVector } from '../../exact/matrix.ts';
import { type Rational, ZERO, denominatorOf, numeratorOf, rational, signOf } from '../../exact/rational.ts';
import { onTheirSides, ratiosOfProducts } from './assume.ts';
import { type Labelled, countOf, labelRows } from './labels.ts';
import type { Change, MeasuredChange, Pair } from './pair.ts';

/**
 * The balance in which nothing but these two changes happens, if that, or with it that all of a partner's atoms of a
 * changing number change, or with it one ratio of two products, leaves one balance with each species on its side. Of no
 * use once the meter has passed a bound.
 */
export const balancePair = (
  unknowns: readonly Unknown[],
  labelled: readonly Labelled[],
  [one, other]: readonly [Change, Change],
  meter: Meter,
): Pair | undefined => {
  for (const { line, also } of linesOf(unknowns, labelled, [one, other], meter)) {
    const pair = measure(unknowns, one, other, line);
    if (pair !== undefined) return also === undefined ? pair : { ...pair, also };
  }
  return undefined;
};

interface Line {
  readonly line: Numbers;
  readonly also?: string;
}

/** The only balance label by label; else the one where all that may change does, then those with one ratio. */
const linesOf = (
  unknowns: readonly Unknown[],
  labelled: readonly Labelled[],
  [one, other]: readonly [Change, Change],
  meter: Meter,
): readonly Line[] => {
  const transitions = [...one.transitions, ...other.transitions];
  const still = transitions.map(() => 0n);
  const { rows } = speciesMatrix(unknowns.map(({ species }) => species));
  const joined = [...rows.map((row) => [...row, ...still]), ...labelRows(labelled, transitions)];
  const width = unknowns.length + transitions.length;
  const lines = nullSpace(joined, width, meter);
  if (lines.length <= 1) return lines.map((line) => ({ line }));
  const whole = onlyVector([...joined, ...wholeRows(unknowns.length, labelled, [one, other])], width, meter);
  const simple = lines.length === 2 && one.transitions.length === 1 && other.transitions.length === 1;
  const ratios = !simple ? [] : ratiosOfProducts(unknowns);
  return [
    ...(whole === undefined ? [] : [{ line: whole }]),
    ...ratios.flatMap(({ words, row }) => {
      const line = onlyVector([...joined, [...row, ...still]], width, meter);
      return line === undefined ? [] : [{ line, also: words }];
    }),
  ];
};

const measure = (unknowns: readonly Unknown[], one: Change, other: Change, line: Numbers): Pair | undefined => {
  const numbers = onTheirSides(unknowns, line.slice(0, unknowns.length));
  if (numbers === undefined) return undefined;
  // what moves follows the sign and, since numbers of their own are made primitive, the content of the species' part
  const scale = gcdOf(numbers) * (numbers.every((value, index) => value === line[index]) ? 1n : -1n);
  const moved = line.slice(unknowns.length).map((value) => rational(value, scale));
  if (moved.some((value) => signOf(value) <= 0n)) return undefined;
  const at = one.transitions.length;
  const measured = [
    { ...one, moved: moved.slice(0, at) },
    { ...other, moved: moved.slice(at) },
  ].toSorted((a, b) => electronsGiven(b).compare(electronsGiven(a)));
  const [oxidation, reduction] = measured;
  if (oxidation === undefined || reduction === undefined) return undefined;
  const electrons = electronsGiven(oxidation);
  return signOf(electrons) === 0n ? undefined : { oxidation, reduction, numbers: primitiveVector(numbers), electrons };
};

/** The vector that spans the null space of `rows`, if one does. */
const onlyVector = (rows: IntegerMatrix, width: number, meter: Meter): Numbers | undefined => {
  const [line, second] = nullSpace(rows, width, meter);
  return second === undefined ? line : undefined;
};

/**
 * Where the labels alone leave the pair open, all that may change in a partner does: of reactant j, n atoms of a label in
 * one formula unit,   moved + n nu_j = 0.
 */
const wholeRows = (count: number, labelled: readonly Labelled[], changes: readonly Change[]): IntegerMatrix => {
  const steps = changes.flatMap(({ index, transitions }) => transitions.map(({ from }) => ({ index, from })));
  return steps.map(({ index, from }, at) => {
    const atoms = countOf(labelled[index] ?? [], from);
    const row = new Array<bigint>(count + steps.length).fill(0n);
    row[index] = numeratorOf(atoms);
    row[count + at] = denominatorOf(atoms);
    return row;
  });
};

/** Electrons that a change gives; negative where it takes them. In a pair the two sums are opposite. */
const electronsGiven = ({ transitions, moved }: MeasuredChange): Rational =>
  transitions.reduce((sum, { given }, at) => sum.add(given.mul(moved[at] ?? ZERO)), ZERO);
