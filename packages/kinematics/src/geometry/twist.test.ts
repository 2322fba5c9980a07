import { test } from "vitest";
import { expect } from "../../../../tests/helpers/matchers.ts";
import { TOLERANCE } from "../../../../tests/helpers/tolerances.ts";
import { directionRate, pointVelocity, type Twist } from "./twist.ts";

// A body that turns about the line y = 60, z = 290 along X, as a swing axle does: the line itself stands still.
const RATE = 0.001;
const SWING: Twist = { velocity: [0, RATE * 290, -RATE * 60], angular: [RATE, 0, 0] };

test("a point on the axis of a turning body stands still", () => {
  expect(pointVelocity(SWING, [700, 60, 290])).toBeWithin([0, 0, 0], TOLERANCE.roundOff);
});

test("a point beside the axis moves at right angles to its arm, in proportion to it", () => {
  expect(pointVelocity(SWING, [0, 720, 290])).toBeWithin([0, 0, RATE * 660], TOLERANCE.roundOff);
  expect(pointVelocity(SWING, [0, 60, 0])).toBeWithin([0, RATE * 290, 0], TOLERANCE.roundOff);
});

test("a direction turns but is not carried along", () => {
  expect(directionRate(SWING, [0, 1, 0])).toBeWithin([0, 0, RATE], TOLERANCE.roundOff);
  expect(directionRate({ velocity: [5, 6, 7], angular: [0, 0, 0] }, [0, 1, 0])).toEqual([0, 0, 0]);
});
