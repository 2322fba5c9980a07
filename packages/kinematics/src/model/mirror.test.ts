import { describe, test } from "vitest";
import { ALL_AXLES, unequalSides } from "../../../../tests/helpers/axles.ts";
import { expect } from "../../../../tests/helpers/matchers.ts";
import { workedAxle } from "../../../../tests/helpers/workedAxle.ts";
import type { Corner } from "./axle.ts";
import { mirrorCorner, mirrorPoint, rightCorner } from "./mirror.ts";

/** A corner with every optional part, each of whose points has another y. */
const full: Corner = {
  ...workedAxle.left,
  spring: { body: [1, 341, 560], lower: [2, 472, 190], on: "lowerArm", rateNPerMm: 28 },
  antiRollBar: {
    axis: [
      [-150, 10, 250],
      [-150, 305, 252],
    ],
    arm: [-40, 306, 240],
    link: { lower: [-40, 407, 200], on: "lowerArm" },
    rateNmPerDeg: 12,
  },
  shapes: [{ on: "tieRod", from: [128, 275, 214], to: [116, 589, 219], radius: 9 }],
};

/** Every point in a corner, in the order in which they are written. */
function pointsIn(value: unknown): (readonly number[])[] {
  if (Array.isArray(value) && value.every((item) => typeof item === "number")) return [value];
  return typeof value === "object" && value !== null ? Object.values(value).flatMap(pointsIn) : [];
}

describe("a mirrored point", () => {
  test("keeps x and z and changes the sign of y", () => {
    expect(mirrorPoint([10, 20, 30])).toEqual([10, -20, 30]);
  });

  test("on the centre plane stays there, without becoming −0", () => {
    expect(Object.is(mirrorPoint([10, 0, 30])[1], 0)).toBe(true);
    expect(Object.is(mirrorPoint([10, -0, 30])[1], 0)).toBe(true);
  });
});

describe("a mirrored corner", () => {
  test("has every point on the other side, the optional parts' included", () => {
    const points = pointsIn(full);
    expect(points).toHaveLength(17);
    expect(pointsIn(mirrorCorner(full))).toEqual(points.map(([x, y, z]) => [x, -(y as number), z]));
  });

  test("keeps toe, camber and all that has no side", () => {
    const { wheel, spring, antiRollBar, shapes } = mirrorCorner(full);
    expect({ ...wheel, centre: null }).toEqual({ ...full.wheel, centre: null });
    expect(spring).toMatchObject({ on: "lowerArm", rateNPerMm: 28 });
    expect(antiRollBar).toMatchObject({ rateNmPerDeg: 12, link: { on: "lowerArm" } });
    expect(shapes).toMatchObject([{ on: "tieRod", radius: 9 }]);
  });

  test("has no part that the corner has not", () => {
    const { spring: _spring, ...bare } = workedAxle.left;
    expect(Object.keys(mirrorCorner(bare)).sort()).toEqual(["suspension", "tieRod", "wheel"]);
  });

  test("mirrored again is the corner itself", () => {
    for (const corner of [full, ...ALL_AXLES.map((axle) => axle.left)]) {
      expect(mirrorCorner(mirrorCorner(corner))).toEqual(corner);
    }
  });

  test("leaves the corner it was made from alone", () => {
    const before = structuredClone(full);
    mirrorCorner(full);
    expect(full).toEqual(before);
  });
});

describe("the right corner", () => {
  test('is the left\'s image where the document says "mirror"', () => {
    expect(rightCorner(workedAxle).tieRod).toEqual({ inner: [128, -275, 214], outer: [116, -589, 219] });
  });

  test("is the document's own where it is given", () => {
    expect(rightCorner(unequalSides)).toBe(unequalSides.right);
  });
});
