import { describe, test } from "vitest";
import { expect } from "../../../../tests/helpers/matchers.ts";
import { TOLERANCE } from "../../../../tests/helpers/tolerances.ts";
import { DESIGN_POSE, type Pose, transformDirection, transformPoint } from "./pose.ts";
import { rotationAbout } from "./rotation.ts";
import type { Point } from "./vec3.ts";

const QUARTER_LEFT: Pose<"V", "K"> = {
  rotation: rotationAbout([0, 0, 1], Math.PI / 2),
  translation: [100, 10, 1],
};

test("in the design position a point of the knuckle is where the document has it", () => {
  const point: Point<"K"> = [12, 640, 305];
  expect(transformPoint(DESIGN_POSE, point)).toEqual([12, 640, 305]);
});

describe("a pose that turns and carries", () => {
  test("turns a point about the origin first and carries it then", () => {
    expect(transformPoint(QUARTER_LEFT, [3, 0, 5])).toBeWithin([100, 13, 6], TOLERANCE.roundOff);
  });

  test("only turns a direction", () => {
    expect(transformDirection(QUARTER_LEFT, [3, 0, 5])).toBeWithin([0, 3, 5], TOLERANCE.roundOff);
  });
});
