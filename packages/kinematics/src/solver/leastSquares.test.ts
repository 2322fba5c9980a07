// Linear problems have their normal equations; the hard ones are J. J. Moré, B. S. Garbow, K. E. Hillstrom,
// Testing Unconstrained Optimization Software, ACM TOMS 7 (1981): functions 1 and 2, minima from memory, checked.

import { describe, test } from "vitest";
import { expect } from "../../../../tests/helpers/matchers.ts";
import { asStated, TOLERANCE } from "../../../../tests/helpers/tolerances.ts";
import { type LeastSquaresOutcome, type LeastSquaresProblem, solveLeastSquares } from "./leastSquares.ts";

type Found = Extract<LeastSquaresOutcome, { status: "found" }>;

function find(problem: LeastSquaresProblem, start: readonly number[]): Found {
  const outcome = solveLeastSquares(problem, start);
  if (outcome.status !== "found") throw new Error(`nothing found: ${outcome.status}`);
  return outcome;
}

/** r = A x − b. `columns` are those of A. */
const linear = (
  columns: readonly (readonly number[])[],
  b: readonly number[],
  bounds: readonly (readonly [number, number])[],
): LeastSquaresProblem => ({
  lower: bounds.map(([low]) => low),
  upper: bounds.map(([, high]) => high),
  evaluate: (x) => ({
    residuals: Float64Array.from(b, (value, i) =>
      columns.reduce((sum, column, k) => sum + (column[i] as number) * (x[k] as number), -value),
    ),
    columns: columns.map((column) => Float64Array.from(column)),
  }),
});

/** What a minimum of a sum whose curvature is about 1 is good to: half the digits of the sum. */
const MINIMUM = asStated(1e-6, "1", "a sum is flat about its minimum: 1e-12 of it is 1e-6 of x");

describe("a linear problem", () => {
  const columns = [
    [1, 1, 1, 1],
    [0, 1, 2, 3],
  ];
  const heights = [1, 3, 2, 5];

  test("has the answer of its normal equations, 1.1 + 1.1 x", () => {
    const { x, cost, held } = find(
      linear(columns, heights, [
        [-10, 10],
        [-10, 10],
      ]),
      [0, 0],
    );
    expect(x).toBeWithin([1.1, 1.1], MINIMUM);
    expect(cost).toBeWithin(0.01 + 0.64 + 1.69 + 0.36, TOLERANCE.roundOff);
    expect(held).toEqual([]);
  });

  test("whose residuals can vanish is solved to the last digits", () => {
    const { x, cost } = find(
      linear(
        columns,
        [1, 3, 5, 7],
        [
          [-10, 10],
          [-10, 10],
        ],
      ),
      [-9, 9],
    );
    expect(x).toBeWithin([1, 2], asStated(1e-8, "1", "1e-9 of the range is where steps stop to matter"));
    expect(cost).toBeLessThan(1e-15);
  });

  test("that stands at its answer already is left there", () => {
    const { x, iterations, stopped } = find(linear([[1, 1]], [2, 4], [[0, 10]]), [3]);
    expect({ x, iterations, stopped }).toEqual({ x: [3], iterations: 0, stopped: "flat" });
  });
});

describe("bounds", () => {
  // Free minimum (3, 1) of (2x + y − 7)² + (x − y − 2)².
  const columns = [
    [2, 1],
    [1, -1],
  ];
  const b = [7, 2];
  const wide: readonly [number, number] = [-10, 10];

  test("that hold one unknown leave the other where it is best beside it", () => {
    // With x = 2 the sum is (y − 3)² + y²: best at y = 1.5, not at the free minimum's 1.
    const outcome = find(linear(columns, b, [[-10, 2], wide]), [0, 0]);
    expect(outcome.x).toBeWithin([2, 1.5], MINIMUM);
    expect(outcome.cost).toBeWithin(4.5, TOLERANCE.roundOff);
    expect(outcome.held).toEqual([{ unknown: 0, bound: "upper" }]);
  });

  test("hold from below too", () => {
    // With y = 4: (2x − 3)² + (x − 6)², best at x = 2.4.
    const outcome = find(linear(columns, b, [wide, [4, 9]]), [0, 5]);
    expect(outcome.x).toBeWithin([2.4, 4], MINIMUM);
    expect(outcome.held).toEqual([{ unknown: 1, bound: "lower" }]);
  });

  test("may hold every unknown in a corner", () => {
    const outcome = find(
      linear(columns, b, [
        [-10, 1],
        [-10, 0],
      ]),
      [-3, -3],
    );
    expect(outcome.x).toEqual([1, 0]);
    expect(outcome.held).toEqual([
      { unknown: 0, bound: "upper" },
      { unknown: 1, bound: "upper" },
    ]);
  });

  test("that do not matter are not said to hold anything", () => {
    // x may be at most 3, which is where it is best anyway.
    const outcome = find(linear(columns, b, [[-10, 3 + 1e-3], wide]), [0, 0]);
    expect(outcome.x).toBeWithin([3, 1], MINIMUM);
    expect(outcome.held).toEqual([]);
  });

  test("let an unknown go again that starts on one and wants to leave it", () => {
    const outcome = find(
      linear(columns, b, [
        [-10, 10],
        [-2, 10],
      ]),
      [-10, -2],
    );
    expect(outcome.x).toBeWithin([3, 1], MINIMUM);
  });

  test("pull a start that lies outside to their edge", () => {
    const outcome = find(linear([[1]], [100], [[0, 5]]), [-40]);
    expect(outcome.x).toEqual([5]);
    expect(outcome.held).toEqual([{ unknown: 0, bound: "upper" }]);
  });

  test("that meet keep an unknown where it is", () => {
    const outcome = find(linear(columns, b, [[1, 1], wide]), [1, 0]);
    // With x = 1: (y − 5)² + (−y − 1)², best at y = 2.
    expect(outcome.x).toBeWithin([1, 2], MINIMUM);
  });
});

/** The bounds of the published problems are wide enough to play no part. */
const open = (evaluate: LeastSquaresProblem["evaluate"]): LeastSquaresProblem => ({
  lower: [-1000, -1000],
  upper: [1000, 1000],
  evaluate,
});

const freudensteinRoth = open(([x = 0, y = 0]) => ({
  residuals: Float64Array.of(-13 + x + ((5 - y) * y - 2) * y, -29 + x + ((y + 1) * y - 14) * y),
  columns: [Float64Array.of(1, 1), Float64Array.of((10 - 3 * y) * y - 2, (3 * y + 2) * y - 14)],
}));

describe("Freudenstein and Roth's function", () => {
  test("from (0.5, −2) ends in its false minimum, and says that the sum there is 48.98", () => {
    const { x, cost, stopped } = find(freudensteinRoth, [0.5, -2]);
    expect(cost).toBeWithin(48.9842, asStated(1e-4, "1", "the source breaks off after four decimals"));
    // Where 3y² − 4y − 6 = 0 has its lower root.
    const minimum = [(53 - 4 * Math.sqrt(22)) / 3, (2 - Math.sqrt(22)) / 3];
    expect(x).toBeWithin(minimum, asStated(1e-3, "1", "the sum is flat to 1e-10 of 49 there"));
    expect(stopped).not.toBe("tooManyIterations");
  });

  test("from beyond the ridge finds its root (5, 4)", () => {
    const { x, cost } = find(freudensteinRoth, [15, 6]);
    expect(x).toBeWithin([5, 4], MINIMUM);
    expect(cost).toBeLessThan(1e-12);
  });
});

test("Rosenbrock's valley is followed from (−1.2, 1) to its end at (1, 1)", () => {
  const rosenbrock = open(([x = 0, y = 0]) => ({
    residuals: Float64Array.of(10 * (y - x * x), 1 - x),
    columns: [Float64Array.of(-20 * x, -1), Float64Array.of(10, 0)],
  }));
  const { x, cost } = find(rosenbrock, [-1.2, 1]);
  expect(x).toBeWithin([1, 1], MINIMUM);
  expect(cost).toBeLessThan(1e-12);
});

describe("unknowns that cannot be told apart", () => {
  test("share their work when two do the same", () => {
    const { x, cost } = find(
      linear(
        [
          [1, 1, 1],
          [1, 1, 1],
        ],
        [2, 4, 6],
        [
          [-9, 9],
          [-9, 9],
        ],
      ),
      [0, 0],
    );
    expect((x[0] as number) + (x[1] as number)).toBeWithin(4, MINIMUM);
    expect(x[0]).toBeWithin(x[1] as number, MINIMUM);
    expect(cost).toBeWithin(8, TOLERANCE.roundOff);
  });

  test("are let lie when they change nothing", () => {
    const { x, held } = find(
      linear(
        [
          [1, 1],
          [0, 0],
        ],
        [1, 3],
        [
          [-9, 9],
          [-9, 9],
        ],
      ),
      [0, 7],
    );
    expect(x).toBeWithin([2, 7], MINIMUM);
    expect(held).toEqual([]);
  });
});

describe("residuals that do not exist everywhere", () => {
  /** (√x − 2)² lives on x ≥ 0 only; its minimum is 4. */
  const root: LeastSquaresProblem = {
    lower: [-100],
    upper: [100],
    evaluate: ([x = 0]) =>
      x <= 0
        ? null
        : { residuals: Float64Array.of(Math.sqrt(x) - 2), columns: [Float64Array.of(0.5 / Math.sqrt(x))] },
  };

  test("shorten a step that leads where they do not", () => {
    // Newton's first step from 90 leads to 90 − 2·(√90 − 2)·√90 = −52.
    expect(find(root, [90]).x).toBeWithin([4], MINIMUM);
  });

  test("at the start are told as such", () => {
    expect(solveLeastSquares(root, [-1])).toEqual({ status: "noStart" });
  });
});

test("the start is not changed", () => {
  const start = Object.freeze([0, 0]);
  find(
    linear(
      [
        [1, 0],
        [0, 1],
      ],
      [1, 1],
      [
        [-9, 9],
        [-9, 9],
      ],
    ),
    start,
  );
  expect(start).toEqual([0, 0]);
});
