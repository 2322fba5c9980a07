// Suspensions that move in one plane, against exact geometry and closed forms (derived; textbook constructions).

import { type Axle, checkAxle, sweepAxle } from "@linkwright/kinematics";
import { describe, test } from "vitest";
import { expect } from "../helpers/matchers.ts";
import { frontViewAxle, translatingAxle } from "../helpers/planarAxles.ts";
import { printedTo, TOLERANCE } from "../helpers/tolerances.ts";

function rowsOf(axle: Axle, travels: readonly number[]) {
  expect(checkAxle(axle)).toEqual([]);
  const { rows, ends } = sweepAxle(axle, { travels, steers: [0] });
  expect(ends).toEqual([]);
  return rows.map((row) => ({ travel: row.travel, left: row.left!, right: row.right!, axle: row.axle }));
}

// Instant centre where the arms' lines meet, (−2740/3, 805/3): exact rationals. Roll centre where the line from the
// contact point through it meets the centre plane, 828/7.
describe("a front-view linkage of unequal arms", () => {
  const axle = frontViewAxle({
    name: "Front-view linkage",
    lowerInner: [340, 190],
    lowerOuter: [660, 170],
    upperInner: [380, 430],
    upperOuter: [620, 460],
    wheelCentre: [720, 290],
    // On the lower arm's line, 220 mm from its inner pivot.
    spring: { body: [0, 430, 520], lower: alongLowerArm(220), on: "lowerArm" },
  });

  function alongLowerArm(distance: number): readonly [number, number, number] {
    const length = Math.hypot(320, -20);
    return [0, 340 + (distance * 320) / length, 190 - (distance * 20) / length];
  }

  test("has its roll centre where geometry puts it, on the centre plane", () => {
    const [row] = rowsOf(axle, [0]);
    expect(row!.axle).toBeWithin({ rollCentreHeight: 828 / 7, rollCentreLateral: 0 }, TOLERANCE.referenceMm);
    expect(row!.axle.rollCentreHeight).toBeWithin(118.285714, printedTo(6, "mm"));
  });

  test("has the camber rate of its swing arm, 1/1633.333 mm, on both sides", () => {
    const [row] = rowsOf(axle, [0]);
    for (const side of [row!.left, row!.right]) {
      expect(side.camberChangeDegPerMm).toBeWithin(-0.03507905, printedTo(8, "degrees per mm"));
      expect(side.camberChangeDegPerMm).toBeWithin(-180 / Math.PI / (4900 / 3), TOLERANCE.roundOff);
    }
  });

  test("has the spring motion ratio of the closed form", () => {
    const [row] = rowsOf(axle, [0]);
    expect(row!.left.springMotionRatio).toBeWithin(0.60389986, printedTo(8, "mm per mm"));
    expect(row!.right.springMotionRatio).toBeWithin(0.60389986, printedTo(8, "mm per mm"));
  });

  // A planar four-bar, by circle intersection.
  test.each([
    [-75, 2.23834, -8.3872, -19.7135],
    [-50, 1.57446, -3.4616, -11.4297],
    [-25, 0.8305, -0.6924, -4.8958],
    [25, -0.92775, -1.352, 3.3436],
    [50, -1.96813, -4.7581, 5.2015],
    [75, -3.14237, -10.2709, 5.6261],
  ])("moves and leans as the four-bar does at %d mm", (travel, camberDeg, centreDy, contactDy) => {
    const [row] = rowsOf(axle, [travel]);
    for (const [side, outward] of [
      [row!.left, 1],
      [row!.right, -1],
    ] as const) {
      expect(side.camberDeg).toBeWithin(camberDeg, printedTo(5, "degrees"));
      expect(outward * side.wheelCentre[1] - 720).toBeWithin(centreDy, printedTo(4, "mm"));
      expect(outward * side.contactPoint[1] - 720).toBeWithin(contactDy, printedTo(4, "mm"));
    }
  });

  test("never steers, for its toe link copies its lower arm", () => {
    for (const { left, right } of rowsOf(axle, [-75, -40, 0, 40, 75])) {
      expect([left.toeDeg, right.toeDeg]).toBeWithin([0, 0], TOLERANCE.roundOff);
      expect([left.bumpSteerDegPerMm, right.bumpSteerDegPerMm]).toBeWithin([0, 0], TOLERANCE.roundOff);
    }
  });
});

describe("equal parallel level arms of 300 mm", () => {
  const copying = translatingAxle({ inner: [-120, 300, 170], outer: [-120, 600, 170] });

  test.each([
    [30, -1.503769],
    [60, -6.061231],
    [-60, -6.061231],
  ])("move the wheel along their circle at %d mm, upright all the while", (travel, lateral) => {
    const [row] = rowsOf(copying, [travel]);
    expect(row!.left.wheelCentre[1] - 680).toBeWithin(lateral, printedTo(6, "mm"));
    expect(row!.left.camberDeg).toBeWithin(0, TOLERANCE.roundOff);
  });

  test("have their roll centre on the ground, with no crossing to place sideways", () => {
    const { rows } = sweepAxle(copying, { travels: [0], steers: [0] });
    expect(rows[0]!.axle.rollCentreHeight).toBeWithin(0, TOLERANCE.roundOff);
    expect(rows[0]!.axle.rollCentreLateral).toBeNull();
    expect(rows[0]!.because["axle.rollCentreLateral"]).toMatch(/parallel/);
  });

  // Steering arm 120 mm, tie rod of length l level at design but for its inner joint raised by ε. Steer + = toe-out.
  const CURVES = [
    { length: 300, raised: 0, steer: [0, 0, 0, 0, 0, 0, 0] },
    { length: 280, raised: 0, steer: [0.211461, 0.092268, 0.022818, 0, 0.022818, 0.092268, 0.211461] },
    { length: 320, raised: 0, steer: [-0.184256, -0.080588, -0.019957, 0, -0.019957, -0.080588, -0.184256] },
    { length: 300, raised: 10, steer: [0.978077, 0.643829, 0.319378, 0, -0.318666, -0.640922, -0.971306] },
    { length: 300, raised: -10, steer: [-0.971306, -0.640922, -0.318666, 0, 0.319378, 0.643829, 0.978077] },
    { length: 280, raised: 10, steer: [1.26327, 0.783258, 0.36518, 0, -0.318666, -0.595118, -0.831871] },
  ];
  const TRAVELS = [-60, -40, -20, 0, 20, 40, 60];

  describe.each([
    { where: "behind the steering axis", x: -120, sign: 1 },
    { where: "ahead of it, where every sign is the other", x: 120, sign: -1 },
  ])("with a steering arm $where", ({ x, sign }) => {
    test.each(CURVES)("steer by the closed form with a rod of $length mm raised $raised mm", (curve) => {
      const { length, raised, steer } = curve;
      const axle = translatingAxle({ inner: [x, 600 - length, 250 + raised], outer: [x, 600, 250] });
      const rows = rowsOf(axle, TRAVELS);
      const toes = steer.map((degrees) => -sign * degrees);
      expect(rows.map(({ left }) => left.toeDeg)).toBeWithin(toes, printedTo(6, "degrees"), "left");
      expect(rows.map(({ right }) => right.toeDeg)).toBeWithin(toes, printedTo(6, "degrees"), "right");
    });
  });

  test("have the bump-steer slope −ε/(l·a) of a rod whose inner joint is ε too high", () => {
    const axle = translatingAxle({ inner: [-120, 300, 260], outer: [-120, 600, 250] });
    const [row] = rowsOf(axle, [0]);
    // Toe-out positive in the source: −0.0159155 °/mm, so toe-in in bump here.
    expect(row!.left.bumpSteerDegPerMm).toBeWithin(0.0159155, printedTo(7, "degrees per mm"));
  });
});
