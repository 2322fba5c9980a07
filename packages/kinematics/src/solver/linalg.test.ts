import { describe, test } from "vitest";
import { expect } from "../../../../tests/helpers/matchers.ts";
import { TOLERANCE } from "../../../../tests/helpers/tolerances.ts";
import { dampedStep, smallestSingular } from "./linalg.ts";

describe("the smallest singular value", () => {
  // U diag(5, 2) Vᵀ with U turned by atan(3/4) and V by atan(4/3).
  const matrix = [
    [0.8 * 5 * 0.6 + 0.6 * 2 * 0.8, 0.8 * 5 * 0.8 - 0.6 * 2 * 0.6],
    [0.6 * 5 * 0.6 - 0.8 * 2 * 0.8, 0.6 * 5 * 0.8 + 0.8 * 2 * 0.6],
  ];

  test("comes last, with the vectors that belong to it", () => {
    const { values, left, right } = smallestSingular(matrix);
    expect(values).toBeWithin([5, 2], TOLERANCE.roundOff);
    // left·A = value·rightᵀ, whatever the sign the two of them share.
    const product = [0, 1].map((k) =>
      matrix.reduce((sum, row, e) => sum + (left[e] as number) * (row[k] as number), 0),
    );
    expect(product).toBeWithin(
      right.map((entry) => 2 * entry),
      TOLERANCE.roundOff,
    );
    expect(left.map(Math.abs)).toBeWithin([0.6, 0.8], TOLERANCE.roundOff);
  });

  test("is 0 for a matrix whose rows depend on one another", () => {
    const { values, left } = smallestSingular([
      [1, 2, 3],
      [4, 5, 6],
      [5, 7, 9],
    ]);
    expect(values.at(-1)).toBeWithin(0, TOLERANCE.roundOff);
    // The third row is the sum of the other two.
    expect(left.map((entry) => entry / (left[0] as number))).toBeWithin([1, 1, -1], TOLERANCE.roundOff);
  });

  test("leaves the matrix alone", () => {
    const before = structuredClone(matrix);
    smallestSingular(matrix);
    expect(matrix).toEqual(before);
  });
});

describe("a damped step", () => {
  const columns = [Float64Array.of(1, 1, 1), Float64Array.of(0, 1, 2)];
  const residuals = Float64Array.of(-1, -3, -2);

  test("without damping is the regression line of three points: 1.5 + 0.5 x", () => {
    expect(dampedStep(columns, residuals, [0, 0])).toBeWithin([1.5, 0.5], TOLERANCE.roundOff);
  });

  test("with damping solves (JᵀJ + D²) s = −Jᵀr", () => {
    // JᵀJ = [3 3; 3 5], Jᵀr = [−6, −7]; D² = [1, 4]: s = [4 3; 3 9]⁻¹ [6, 7] = [33, 10] / 27.
    expect(dampedStep(columns, residuals, [1, 2])).toBeWithin([33 / 27, 10 / 27], TOLERANCE.roundOff);
  });

  test("shares the step between two unknowns that do the same", () => {
    const same = [Float64Array.of(1, 1), Float64Array.of(1, 1)];
    const [a, b] = dampedStep(same, Float64Array.of(-1, -1), [1e-3, 1e-3]);
    expect(a).toBeWithin(b as number, TOLERANCE.roundOff);
    // 2·(a + b) + 1e-6·a = 2.
    expect(a).toBeWithin(2 / (4 + 1e-6), TOLERANCE.roundOff);
  });

  test("leaves its arguments alone", () => {
    dampedStep(columns, residuals, [1, 2]);
    expect(columns.map((column) => [...column])).toEqual([
      [1, 1, 1],
      [0, 1, 2],
    ]);
    expect([...residuals]).toEqual([-1, -3, -2]);
  });
});
