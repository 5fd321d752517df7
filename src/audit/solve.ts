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

/** The primitive whole vector p with sum p_j u_j = 0, or null where it is not unique up to its sign. */
export const ray = (columns: readonly IntegerVector[], rowCount: number): readonly bigint[] | null => {
  const [only, another] = nullSpace(matrixOf(columns, rowCount), columns.length);
  return only === undefined || another !== undefined ? null : only;
};
