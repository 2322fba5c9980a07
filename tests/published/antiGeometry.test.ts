// Anti-dive, anti-lift and anti-squat through whole documents.

import { type Axle, checkAxle, sweepAxle } from "@linkwright/kinematics";
import { describe, test } from "vitest";
import { expect } from "../helpers/matchers.ts";
import { aimedAt, sideViewAxle } from "../helpers/planarAxles.ts";
import { asStated, TOLERANCE } from "../helpers/tolerances.ts";

function atDesign(axle: Axle) {
  expect(checkAxle(axle)).toEqual([]);
  return sweepAxle(axle, { travels: [0], steers: [0] }).rows[0]!;
}

describe("a front axle", () => {
  // A kit-car builder's worked example: 60 % front brakes, wheelbase 2550, cg 600 high, tan α = 0.098 (α = 5.6°) → 25 %.
  test("with a contact point that moves 0.098 ahead per mm of bump resists a quarter of the dive", () => {
    const body = { cgHeight: 600, frontBrakeShare: 0.6 };
    const axle = sideViewAxle({ position: "front", wheelbase: 2550, body }, { lower: -0.098, upper: -0.098 });
    const printed = asStated(0.13, "%", "the source prints the tangent to three decimals");
    expect(atDesign(axle).axle.antiDivePercent).toBeWithin(25, printed);
  });

  // Derived: 100·0.65·(150/3000)·2500/500.
  test("with its side-view centre 3 m behind and 150 mm above the contact point has 16.25 % anti-dive", () => {
    const body = { cgHeight: 500, frontBrakeShare: 0.65 };
    const axle = sideViewAxle({ position: "front", wheelbase: 2500, body }, aimedAt(3000, 150));
    const { axle: found, because } = atDesign(axle);
    expect(found.antiDivePercent).toBeWithin(16.25, TOLERANCE.roundOff);
    expect([found.antiLiftPercent, found.antiSquatPercent]).toEqual([null, null]);
    expect(because["axle.antiLiftPercent"]).toBeTypeOf("string");
  });

  test("whose centre lies as far ahead of the wheel helps the dive by as much", () => {
    const body = { cgHeight: 500, frontBrakeShare: 0.65 };
    const axle = sideViewAxle({ position: "front", wheelbase: 2500, body }, aimedAt(-3000, 150));
    expect(atDesign(axle).axle.antiDivePercent).toBeWithin(-16.25, TOLERANCE.roundOff);
  });
});

describe("a rear axle", () => {
  // D. C. Barton & J. D. Fieldhouse, Automotive Chassis Engineering, 2018, eq. (3.69), p. 197: a rear-driven car does
  // not pitch under drive when the line from the wheel to the side-view centre rises (h/l)(1 + kr/kf); here h 0.55,
  // l 2.6, kr/kf 0.9, so 0.401923. Measured as anti-squat that is 100·(1 + kr/kf).
  test("that does not pitch under drive has 100·(1 + kr/kf) per cent of anti-squat", () => {
    const slope = 0.401923;
    const ahead = 1500;
    const body = { cgHeight: 550, frontBrakeShare: 0.6, driveShare: 1 };
    // The centre lies ahead of the wheel and `slope` above the wheel centre, from which an engine fixed to the body pulls.
    const axle = sideViewAxle(
      { position: "rear", wheelbase: 2600, body },
      aimedAt(-ahead, 300 + slope * ahead),
    );
    const printed = asStated(0.0003, "%", "the slope is printed to six decimals");
    expect(atDesign(axle).axle.antiSquatPercent).toBeWithin(190, printed);
  });

  // Derived: 100·(1 − 0.6)·(150/1500)·2400/480.
  test("with its side-view centre 1.5 m ahead and 150 mm above the contact point has 20 % anti-lift", () => {
    const body = { cgHeight: 480, frontBrakeShare: 0.6 };
    const axle = sideViewAxle({ position: "rear", wheelbase: 2400, body }, aimedAt(-1500, 150));
    const { axle: found, because } = atDesign(axle);
    expect(found.antiLiftPercent).toBeWithin(20, TOLERANCE.roundOff);
    expect(found.antiDivePercent).toBeNull();
    expect(found.antiSquatPercent).toBeNull();
    expect(because["axle.antiSquatPercent"]).toMatch(/driveShare/);
  });
});
