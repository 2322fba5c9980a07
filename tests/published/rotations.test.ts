// Rotations and angles against the formula every textbook has.

import { degFromRad, radFromDeg, rotate, rotationAbout } from "@linkwright/kinematics";
import { describe, test } from "vitest";
import { expect } from "../helpers/matchers.ts";
import { asStated, TOLERANCE } from "../helpers/tolerances.ts";

const columns = (axis: readonly [number, number, number], angleDeg: number) => {
  const rotation = rotationAbout(axis, radFromDeg(angleDeg));
  return (
    [
      [1, 0, 0],
      [0, 1, 0],
      [0, 0, 1],
    ] as const
  ).map((direction) => [...rotate(rotation, direction)]);
};

const transposed = (matrix: readonly (readonly number[])[]) =>
  matrix.map((_, i) => matrix.map((row) => row[i]!));

// O. Rodrigues' formula (read): R = I + sin θ K + (1 − cos θ) K².
describe("a rotation about an axis", () => {
  test("by 120° about (1, 1, 1) takes each axis to the next", () => {
    const third = 1 / Math.sqrt(3);
    expect(transposed(columns([third, third, third], 120))).toBeWithin(
      [
        [0, 0, 1],
        [1, 0, 0],
        [0, 1, 0],
      ],
      TOLERANCE.roundOff,
    );
  });

  test("by 40° about (1, 2, 2) has the matrix of Rodrigues' formula", () => {
    expect(transposed(columns([1 / 3, 2 / 3, 2 / 3], 40))).toBeWithin(
      [
        [0.792039505, -0.3765349494, 0.4805151969],
        [0.4805151969, 0.8700246907, -0.1102822891],
        [-0.3765349494, 0.3182427841, 0.8700246907],
      ],
      asStated(1e-9, "1", "the source states 1e-9 for its ten decimals"),
    );
  });
});

test("degrees and radians are turned into one another by π/180", () => {
  expect(degFromRad(Math.PI)).toBeWithin(180, TOLERANCE.roundOff);
  expect(radFromDeg(57.29577951308232)).toBeWithin(1, TOLERANCE.roundOff);
});
