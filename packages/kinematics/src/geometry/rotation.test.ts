// H1 and H2 of the published rotations: Rodrigues' formula, in every text on rigid bodies.

import { describe, test } from "vitest";
import { expect } from "../../../../tests/helpers/matchers.ts";
import { printedTo, TOLERANCE } from "../../../../tests/helpers/tolerances.ts";
import { degFromRad, radFromDeg } from "../units.ts";
import {
  angleAbout,
  IDENTITY_ROTATION,
  type Quaternion,
  rejectFrom,
  rotate,
  rotationAbout,
} from "./rotation.ts";
import { norm, type Vec3 } from "./vec3.ts";

const UNITS: readonly Vec3[] = [
  [1, 0, 0],
  [0, 1, 0],
  [0, 0, 1],
];

/** Row after row, as matrices are printed. */
function matrixOf(rotation: Quaternion): number[][] {
  const columns = UNITS.map((unit) => rotate(rotation, unit));
  return [0, 1, 2].map((row) => columns.map((column) => column[row] as number));
}

describe("a rotation about an axis", () => {
  test("by 120° about (1, 1, 1) carries x to y to z to x", () => {
    const matrix = matrixOf(rotationAbout([1, 1, 1], radFromDeg(120)));
    expect(matrix).toBeWithin(
      [
        [0, 0, 1],
        [1, 0, 0],
        [0, 1, 0],
      ],
      TOLERANCE.roundOff,
    );
  });

  test("by 40° about (1, 2, 2)/3 has the matrix that Rodrigues' formula prints", () => {
    const matrix = matrixOf(rotationAbout([1 / 3, 2 / 3, 2 / 3], radFromDeg(40)));
    expect(matrix).toBeWithin(
      [
        [0.792039505, -0.3765349494, 0.4805151969],
        [0.4805151969, 0.8700246907, -0.1102822891],
        [-0.3765349494, 0.3182427841, 0.8700246907],
      ],
      printedTo(9, "1"),
    );
  });

  test("does not depend on the length of the axis", () => {
    expect(rotationAbout([10, 20, 20], 0.7)).toBeWithin(
      rotationAbout([1 / 3, 2 / 3, 2 / 3], 0.7),
      TOLERANCE.roundOff,
    );
  });

  test("follows the right-hand rule: about Z it carries forward to left", () => {
    expect(rotate(rotationAbout([0, 0, 1], Math.PI / 2), [1, 0, 0])).toBeWithin(
      [0, 1, 0],
      TOLERANCE.roundOff,
    );
  });

  test("keeps lengths", () => {
    const turned = rotate(rotationAbout([0.3, -2, 1], 2.4), [300, -20, 45]);
    expect(norm(turned)).toBeWithin(norm([300, -20, 45]), TOLERANCE.roundOff);
  });
});

test("the identity leaves every vector where it is", () => {
  expect(rotate(IDENTITY_ROTATION, [1.5, -2.5, 3.5])).toEqual([1.5, -2.5, 3.5]);
});

describe("the angle about an axis", () => {
  test.each([30, -30, 90, 179, -179])(
    "from a vector to the same one turned by %d° is that angle",
    (angleDeg) => {
      const axis: Vec3 = [2 / 7, 3 / 7, 6 / 7];
      const from: Vec3 = [10, -4, 7];
      const to = rotate(rotationAbout(axis, radFromDeg(angleDeg)), from);
      expect(degFromRad(angleAbout(axis, from, to))).toBeWithin(angleDeg, TOLERANCE.roundOff);
    },
  );

  test("does not look at how far the vectors lie along the axis", () => {
    expect(angleAbout([0, 0, 1], [1, 0, 500], [0, 3, -80])).toBeWithin(Math.PI / 2, TOLERANCE.roundOff);
  });
});

test("what is left of a vector across an axis has no part along it", () => {
  expect(rejectFrom([0, 0.6, 0.8], [5, 6, 8])).toBeWithin([5, 0, 0], TOLERANCE.roundOff);
});
