// The only door to ml-matrix: decompositions of matrices whose size varies.

import { Matrix, QrDecomposition, SingularValueDecomposition } from "ml-matrix";

export interface SmallestSingular {
  /** All singular values, largest first. */
  readonly values: readonly number[];
  /** Unit vectors of the smallest: left·A = value·rightᵀ. */
  readonly left: readonly number[];
  readonly right: readonly number[];
}

/** The smallest singular value of a square matrix and its two vectors. `rows` is left alone. */
export function smallestSingular(rows: readonly (readonly number[])[]): SmallestSingular {
  const svd = new SingularValueDecomposition(new Matrix(rows.map((row) => [...row])));
  const last = rows.length - 1;
  return {
    values: svd.diagonal,
    left: svd.leftSingularVectors.getColumn(last),
    right: svd.rightSingularVectors.getColumn(last),
  };
}

/**
 * The step s that makes |J s + r|² + λ |D s|² least, by QR of the tall system [J; √λ D]. `columns` are those of
 * J; D is diagonal. With λ D > 0 the system has full rank whatever J is. The arguments are left alone.
 */
export function dampedStep(
  columns: readonly Float64Array[],
  residuals: Float64Array,
  damping: readonly number[],
): number[] {
  const rows = residuals.length;
  const system = new Matrix(rows + columns.length, columns.length);
  const right = new Matrix(rows + columns.length, 1);
  for (const [k, column] of columns.entries()) {
    for (let i = 0; i < rows; i++) system.set(i, k, column[i] as number);
    system.set(rows + k, k, damping[k] as number);
  }
  for (let i = 0; i < rows; i++) right.set(i, 0, -(residuals[i] as number));
  return new QrDecomposition(system).solve(right).to1DArray();
}
