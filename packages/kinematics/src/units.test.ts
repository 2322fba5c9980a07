import { test } from "vitest";
import { expect } from "../../../tests/helpers/matchers.ts";
import { TOLERANCE } from "../../../tests/helpers/tolerances.ts";
import { degFromRad, radFromDeg } from "./units.ts";

test("half a turn is 180° and π", () => {
  expect(degFromRad(Math.PI)).toBeWithin(180, TOLERANCE.roundOff);
  expect(radFromDeg(180)).toBeWithin(Math.PI, TOLERANCE.roundOff);
});

test("one degree is 0.017453292519943295 rad", () => {
  expect(radFromDeg(1)).toBeWithin(0.017453292519943295, TOLERANCE.roundOff);
});

test("there and back again is the same angle, of either sign", () => {
  for (const angleDeg of [-270, -0.05, 0, 1e-9, 33.3, 90]) {
    expect(degFromRad(radFromDeg(angleDeg))).toBeWithin(angleDeg, TOLERANCE.roundOff);
  }
});
