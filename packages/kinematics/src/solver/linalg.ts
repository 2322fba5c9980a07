// The only door to ml-matrix: decompositions of matrices whose size varies.

import { Matrix, SingularValueDecomposition } from "ml-matrix";

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
