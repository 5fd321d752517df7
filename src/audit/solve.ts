import { type Rational, rational } from '../exact/rational.ts';
import { type IntegerVector, nullSpace } from '../exact/matrix.ts';
import { type Surplus, matrixOf } from './writing.ts';

/**
 * The numbers x of `columns` that take the surplus away, or null where they are not unique or do not exist.
 *
 *     sum x_j u_j = -R / D        R / D: right minus left as written
 *
 * A null vector z of [u_1 .. u_k  R] with a last entry z_R other than 0 gives x_j = z_j / (z_R D). It is unique
 * exactly where the null space has one dimension.
 */
export const completion = (surplus: Surplus, columns: readonly IntegerVector[]): readonly Rational[] | null => {
  const all = [...columns, surplus.vector];
  const [only, another] = nullSpace(matrixOf(all, surplus.vector.length), all.length);
  const last = only?.[columns.length] ?? 0n;
  if (only === undefined || another !== undefined || last === 0n) return null;
  return only.slice(0, columns.length).map((value) => rational(value, last * surplus.scale));
};

/**
 * A basis of the whole vectors p with sum p_j u_j = 0, each turned so that most of its numbers are positive. Where it
 * has one vector, that is the only balance.
 */
export const balancesOf = (columns: readonly IntegerVector[], rowCount: number): readonly (readonly bigint[])[] =>
  nullSpace(matrixOf(columns, rowCount), columns.length).map(upright);

const upright = (numbers: readonly bigint[]): readonly bigint[] => {
  const balance = numbers.reduce((sum, value) => sum + (value > 0n ? 1 : value < 0n ? -1 : 0), 0);
  return balance < 0 ? numbers.map((value) => -value) : numbers;
};

/** The only vector of `balances`, or null. */
export const onlyOne = (balances: readonly (readonly bigint[])[]): readonly bigint[] | null =>
  balances.length === 1 ? (balances[0] ?? null) : null;
