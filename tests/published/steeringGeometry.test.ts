// Steering: Ackermann, the kingpin and where it meets the ground, what caster does to a turned wheel.

import { type Axle, checkAxle, type SweepRow, sweepAxle } from "@linkwright/kinematics";
import { describe, test } from "vitest";
import { behindAxle } from "../helpers/axles.ts";
import { findBracketedRoot, findFirstRoot } from "../helpers/closedForm/bracketedRoot.ts";
import { expect } from "../helpers/matchers.ts";
import { centredKingpinAxle, uprightKingpins } from "../helpers/planarAxles.ts";
import { asStated, printedTo, TOLERANCE } from "../helpers/tolerances.ts";
import { workedAxle } from "../helpers/workedAxle.ts";

const radians = (degrees: number): number => (degrees * Math.PI) / 180;
const degrees = (angle: number): number => (angle * 180) / Math.PI;

function atSteer(axle: Axle, steer: number): SweepRow {
  return sweepAxle(axle, { travels: [0], steers: [steer] }).rows[0]!;
}

/** Steer of the left wheel, + left, of an axle with no static toe. */
const leftSteerDeg = (row: SweepRow): number => -row.left!.toeDeg;

/** The row at which the left wheel stands at `steerDeg`, found by walking the rack away from straight ahead. */
function turnedTo(axle: Axle, steerDeg: number): SweepRow {
  const missing = (steer: number): number | null => {
    const row = sweepAxle(axle, { travels: [0], steers: [steer] }).rows[0];
    return row?.left ? leftSteerDeg(row) - steerDeg : null;
  };
  const leftwards = leftSteerDeg(atSteer(axle, 1)) > 0 ? 1 : -1;
  const steer = findFirstRoot(missing, 5 * leftwards * Math.sign(steerDeg), 120);
  if (steer === null) throw new Error(`no rack position turns the left wheel to ${steerDeg}°`);
  return atSteer(axle, steer);
}

/** The outer wheel's angle of true rolling that a row's Ackermann percentage implies. */
function idealOuterDeg(innerDeg: number, outerDeg: number, percent: number): number {
  return innerDeg - (100 * (innerDeg - outerDeg)) / percent;
}

describe("Ackermann, cot δo − cot δi = w/l (any theory-of-machines text)", () => {
  test.each([
    // S. S. Rattan, Theory of Machines: w/l = 0.44, inner 18° → outer 15°52′ (from memory; 15.869284° derived).
    { apart: 1100, wheelbase: 2500, innerDeg: 18, outerDeg: 15.87, tolerance: 0.01 },
    // An automotive teaching page: kingpins 1.6 m, wheelbase 3.2 m, turning circle 13.225 m over 225 mm tyres.
    { apart: 1600, wheelbase: 3200, innerDeg: 38.259902, outerDeg: 29.492373, tolerance: 0.001 },
    // R. N. Jazar's layout (inputs from memory, result derived), inches there.
    { apart: 61.6 * 25.4, wheelbase: 103.1 * 25.4, innerDeg: 12, outerDeg: 10.680762, tolerance: 1e-6 },
  ])(
    "inner $innerDeg° rolls truly with outer $outerDeg°",
    ({ apart, wheelbase, innerDeg, outerDeg, tolerance }) => {
      const axle = uprightKingpins({ apart, wheelbase, convergeDeg: 8 });
      expect(checkAxle(axle)).toEqual([]);
      const row = turnedTo(axle, innerDeg);
      const found = idealOuterDeg(innerDeg, row.right!.toeDeg, row.axle.ackermannPercent!);
      expect(found).toBeWithin(outerDeg, asStated(tolerance, "degrees", "as far as the source goes"));
    },
  );

  test("arms that make the outer wheel follow the law have 100 %", () => {
    const car = { apart: 1500, wheelbase: 2500 };
    const outerAt20 = degrees(Math.atan(1 / (1 / Math.tan(radians(20)) + car.apart / car.wheelbase)));
    const outer = (convergeDeg: number): number =>
      turnedTo(uprightKingpins({ ...car, convergeDeg }), 20).right!.toeDeg;
    const convergeDeg = findBracketedRoot((angle) => outer(angle) - outerAt20, 0, 35);
    const row = turnedTo(uprightKingpins({ ...car, convergeDeg }), 20);
    expect(row.axle.ackermannPercent).toBeWithin(100, TOLERANCE.referencePercent);
  });

  // Factory page of a 1973 full-size saloon (second hand): inner 20° → outer 18.8°; track and wheelbase from memory.
  test("a saloon that turns out 1.2° at 20° has about 40 %", () => {
    const car = { apart: 62.1 * 25.4, wheelbase: 120 * 25.4 };
    const outer = (convergeDeg: number): number =>
      turnedTo(uprightKingpins({ ...car, convergeDeg }), 20).right!.toeDeg;
    const convergeDeg = findBracketedRoot((angle) => outer(angle) - 18.8, -10, 35);
    const row = turnedTo(uprightKingpins({ ...car, convergeDeg }), 20);
    const percent = asStated(3, "%", "track and wheelbase are remembered, the angles printed to 0.1°");
    expect(row.axle.ackermannPercent).toBeWithin(40, percent);
  });

  test("turning right is turning left seen in a mirror, and straight ahead there is no percentage", () => {
    const left = atSteer(workedAxle, 30);
    const right = atSteer(workedAxle, -30);
    expect(right.axle.ackermannPercent).toBeWithin(left.axle.ackermannPercent, TOLERANCE.referencePercent);
    expect(atSteer(workedAxle, 0).axle.ackermannPercent).toBeNull();
    expect(atSteer(workedAxle, 0).because["axle.ackermannPercent"]).toBeTypeOf("string");
  });
});

// Derived from the definitions (ISO 8855 axes).
test("a kingpin meets the ground where its two points aim", () => {
  const axle: Axle = {
    format: "linkwright.axle/1",
    name: "A kingpin",
    position: "front",
    wheelbase: 2400,
    left: {
      suspension: {
        type: "doubleWishbone",
        lowerArm: { frontPivot: [150, 330, 190], rearPivot: [-150, 330, 190], ballJoint: [0, 660, 170] },
        upperArm: { frontPivot: [110, 380, 430], rearPivot: [-130, 380, 430], ballJoint: [-20, 620, 460] },
      },
      tieRod: { inner: [-120, 340, 220], outer: [-125, 650, 215] },
      wheel: { centre: [0, 720, 290], toeDeg: 0, camberDeg: 0, loadedRadius: 290 },
    },
    right: "mirror",
    steering: { type: "rack", axis: [0, 1, 0], travel: 60 },
  };
  const { left, right } = atSteer(axle, 0);
  for (const side of [left!, right!]) {
    expect(side).toBeWithin(
      { casterDeg: 3.945186, kingpinInclinationDeg: 7.853313 },
      printedTo(6, "degrees"),
    );
    expect(side).toBeWithin({ casterTrail: 11.724138, scrubRadius: 36.551724 }, printedTo(6, "mm"));
  }
  // What ISO-successor vocabulary calls scrub radius is the planar distance.
  expect(Math.hypot(left!.casterTrail!, left!.scrubRadius!)).toBeWithin(38.385986, printedTo(6, "mm"));
});

// Derived: the wheel turned about an axis of 7° inclination and 5° caster by Rodrigues' formula.
describe("a wheel turned about a kingpin of 7° inclination and 5° caster", () => {
  const axle = centredKingpinAxle({ casterDeg: 5, inclinationDeg: 7 });

  test("turns about the axis it was given", () => {
    expect(checkAxle(axle)).toEqual([]);
    for (const steer of [-40, 0, 40]) {
      expect(atSteer(axle, steer).left).toBeWithin(
        { casterDeg: 5, kingpinInclinationDeg: 7 },
        TOLERANCE.roundOff,
      );
    }
  });

  test.each([
    [-29.7359, -1.557],
    [-19.8109, -1.2806],
    [-9.8973, -0.7562],
    [9.8793, 0.9653],
    [19.7425, 2.1106],
    [29.5956, 3.4019],
  ])("leans as it must when steered to %d°", (steerDeg, camberDeg) => {
    const row = turnedTo(axle, steerDeg);
    expect(row.left!.camberDeg).toBeWithin(
      camberDeg,
      asStated(1e-4, "degrees", "both angles are printed to four decimals"),
    );
  });

  // Trade rule (read): caster is about 1.5 × the camber change between 20° in and 20° out; exactly 1/(2 sin 20°).
  test("shows its caster by its camber swing between 20° either way", () => {
    const swing = turnedTo(axle, 20).left!.camberDeg - turnedTo(axle, -20).left!.camberDeg;
    expect(swing).toBeWithin(3.430837, printedTo(6, "degrees"));
    expect(swing / (2 * Math.sin(radians(20)))).toBeWithin(
      5,
      asStated(0.02, "degrees", "first order in the swing"),
    );
    expect(1.5 * swing).toBeWithin(5, asStated(0.15, "degrees", "the workshop's round figure"));
  });
});

// Service manuals (read): with the rods ahead of the axle shorten them for toe-in, behind it lengthen them. Moving the
// rack to the left does to the left wheel what a longer rod does.
test("a longer tie rod toes the wheel out ahead of the axle and in behind it", () => {
  const toeChange = (axle: Axle): number => atSteer(axle, 1).left!.toeDeg - atSteer(axle, 0).left!.toeDeg;
  expect(toeChange(workedAxle)).toBeLessThan(-0.1);
  expect(toeChange(behindAxle)).toBeGreaterThan(0.1);
});
