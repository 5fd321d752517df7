import { pickColumns, speciesMatrix } from '../../balance/matrix.ts';
import type { Numbers } from '../../balance/solve.ts';
import type { Unknown } from '../../balance/unknowns.ts';
import { lcmOf } from '../../exact/integer.ts';
import { type IntegerMatrix, nullSpace, primitiveVector, range } from '../../exact/matrix.ts';
import { denominatorOf, numeratorOf } from '../../exact/rational.ts';
import { ELECTRON, sameSpecies } from '../../species/species.ts';
import { type Labelled, labelRows } from './labels.ts';
import { PROTON, WATER } from '../media.ts';
import { labelsInSkeleton } from './odd-atom.ts';
import type { MeasuredChange, Pair } from './pair.ts';
import { isSolvent } from './solvent.ts';

/** The halves of a pair, each whole and primitive; null where conservation label by label leaves one of them open. */
export interface PairHalves {
  /** Those of the skeleton, then H^+ and H2O if they were not among them, then the electron. */
  readonly unknowns: readonly Unknown[];
  readonly oxidation: Numbers | null;
  readonly reduction: Numbers | null;
}

/**
 * The halves of `pair`: beside elements and charge each oxidation number is conserved but for the half's own change. Only
 * what the overall reaction holds is used if that settles the half, else what the medium lends, else H^+ too, then H2O,
 * which the halves of a molecular skeleton hand to one another.
 */
export const halvesOfPair = (skeletonUnknowns: readonly Unknown[], pair: Pair): PairHalves => {
  const lent = (species: Unknown['species']): Unknown => ({ species, side: 'free', written: false, helper: true });
  const extra = [PROTON, WATER].filter((one) => !skeletonUnknowns.some(({ species }) => sameSpecies(species, one)));
  const unknowns = [...skeletonUnknowns, ...extra.map(lent), { ...lent(ELECTRON), helper: false }];
  const labelled = labelsInSkeleton(unknowns) ?? [];
  const all = range(unknowns.length);
  const electron = unknowns.length - 1;
  const sets = [
    all.filter((index) => (pair.numbers[index] ?? 0n) !== 0n),
    ...range(extra.length + 1).map((more) => range(skeletonUnknowns.length + more)),
  ].map((columns) => [...columns, electron]);
  const half = (change: MeasuredChange, other: MeasuredChange): Numbers | null => {
    // the other partner may lend what does not change in it, as HCl does; where that leaves a choice, it does not
    const alone = sets.map((columns) => columns.filter((index) => index !== other.index || index === change.index));
    for (const columns of [...sets, ...alone]) {
      const numbers = solveHalf(unknowns, labelled, change, columns);
      if (numbers !== null) return numbers;
    }
    return null;
  };
  const { oxidation, reduction } = pair;
  return { unknowns, oxidation: half(oxidation, reduction), reduction: half(reduction, oxidation) };
};

const solveHalf = (
  unknowns: readonly Unknown[],
  labelled: readonly Labelled[],
  change: MeasuredChange,
  columns: readonly number[],
): Numbers | null => {
  const { rows } = speciesMatrix(unknowns.map(({ species }) => species));
  const width = unknowns.length;
  const scale = lcmOf(change.moved.map(denominatorOf));
  const weights = change.moved.map((value) => numeratorOf(value) * (scale / denominatorOf(value)));
  // all transitions of the half as one column, in the ratio in which the overall reaction moves them
  const asOne = labelRows(labelled, change.transitions).map((row) => [
    ...row.slice(0, width),
    weights.reduce((sum, weight, at) => sum + weight * (row[width + at] ?? 0n), 0n),
  ]);
  const joined: IntegerMatrix = [...rows.map((row) => [...row, 0n]), ...asOne];
  const [line, second] = nullSpace(pickColumns(joined, [...columns, width]), columns.length + 1);
  const extent = line?.at(-1) ?? 0n;
  if (line === undefined || second !== undefined || extent === 0n) return null;
  const numbers = new Array<bigint>(width).fill(0n);
  columns.forEach((column, at) => {
    numbers[column] = (line[at] ?? 0n) * (extent > 0n ? 1n : -1n);
  });
  return staysOnSides(unknowns, numbers) ? primitiveVector(numbers) : null;
};

/** Written species stand where they are written, or not at all; what the solvent gives in one half the other may take. */
const staysOnSides = (unknowns: readonly Unknown[], numbers: Numbers): boolean =>
  unknowns.every((unknown, index) => {
    const [nu, side] = [numbers[index] ?? 0n, unknown.side];
    return isSolvent(unknown) || side === 'free' || (side === 'left' ? nu <= 0n : nu >= 0n);
  });
