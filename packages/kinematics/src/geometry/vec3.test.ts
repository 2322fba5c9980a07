import { describe, test } from "vitest";
import { expect } from "../../../../tests/helpers/matchers.ts";
import { TOLERANCE } from "../../../../tests/helpers/tolerances.ts";
import { between, cross, distance, dot, findUnit, norm, offsetPoint, perpendicularTo } from "./vec3.ts";

test("the vector between two points leads from the first to the second", () => {
  expect(between([1, 2, 3], [4, 6, 8])).toEqual([3, 4, 5]);
});

test("X crossed with Y is Z: the axes are right-handed", () => {
  expect(cross([1, 0, 0], [0, 1, 0])).toEqual([0, 0, 1]);
});

test("the distance of two points is that of a 2-3-6 box's corners, 7", () => {
  expect(distance([10, -20, 5], [12, -17, -1])).toBe(7);
});

test("a point is offset along a direction, as far as asked", () => {
  expect(offsetPoint([1, 2, 3], [0, 1, -1], 4)).toEqual([1, 6, -1]);
});

describe("a unit vector", () => {
  test("points the same way and is 1 long", () => {
    expect(findUnit([3, 0, -4])).toBeWithin([0.6, 0, -0.8], TOLERANCE.roundOff);
  });

  test("does not exist where there is no direction", () => {
    expect(findUnit([0, 0, 0])).toBeNull();
  });
});

test.each([
  { axis: [1, 0, 0] as const },
  { axis: [0, 1, 0] as const },
  { axis: [0, 0, -1] as const },
  { axis: [0.6, 0, -0.8] as const },
  { axis: [1 / Math.sqrt(3), -1 / Math.sqrt(3), 1 / Math.sqrt(3)] as const },
])("some unit vector stands at right angles to $axis", ({ axis }) => {
  const across = perpendicularTo(axis);
  expect(dot(across, axis)).toBeWithin(0, TOLERANCE.roundOff);
  expect(norm(across)).toBeWithin(1, TOLERANCE.roundOff);
});
