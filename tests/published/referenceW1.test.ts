// The engine against W1, a complete corner worked out by three algorithms and reproduced by a general physics engine.

import { type Axle, poseAxle, sweepAxle, type Wishbone } from "@linkwright/kinematics";
import { describe, test } from "vitest";
import { across, cross, dot, subtract, unit, type Vector } from "../helpers/closedForm/vector.ts";
import { expect } from "../helpers/matchers.ts";
import {
  referenceW1,
  w1Deviations,
  w1PhysicsEngine,
  w1RackRows,
  w1Slopes,
  w1TravelRows,
} from "../helpers/referenceW1.ts";
import { asStated, printedTo, TOLERANCE } from "../helpers/tolerances.ts";

const sweepAt = (axle: Axle, travels: readonly number[], steers: readonly number[]) =>
  sweepAxle(axle, { travels, steers }).rows;

describe("W1 over its travel", () => {
  const rows = sweepAt(
    referenceW1,
    w1TravelRows.map(({ travel }) => travel),
    [0],
  );

  test.each(w1TravelRows.map((row, index) => ({ ...row, index })))("at $travel mm", (row) => {
    const { left, right } = rows[row.index]!;
    for (const side of [left!, right!]) {
      expect(side).toBeWithin(row.angles, printedTo(6, "degrees"));
      const outward = side === left ? 1 : -1;
      expect([side.wheelCentre[0], outward * side.wheelCentre[1]]).toBeWithin(
        row.wheelCentreXY,
        printedTo(5, "mm"),
      );
      // The table's trail and offset run along the car; ours along the wheel's heading, turned in by toe.
      const toe = (side.toeDeg * Math.PI) / 180;
      const { trailAlongCar, offsetAcrossCar } = row.alongCar;
      expect(side).toBeWithin(
        {
          casterTrail: trailAlongCar * Math.cos(toe) + offsetAcrossCar * Math.sin(toe),
          scrubRadius: offsetAcrossCar * Math.cos(toe) - trailAlongCar * Math.sin(toe),
        },
        asStated(1.1e-5, "mm", "both printed to 5 decimals and turned into one another"),
      );
    }
  });

  test("at −60 mm trail and scrub radius along the heading are as stated", () => {
    expect(rows[0]!.left).toBeWithin({ casterTrail: 16.3164, scrubRadius: 31.04082 }, printedTo(5, "mm"));
  });

  test.each(w1PhysicsEngine)("at $travel mm the physics engine's own digits are met", (row) => {
    const { left } = sweepAt(referenceW1, [row.travel], [0])[0]!;
    expect([left!.toeDeg, left!.camberDeg]).toBeWithin([row.toeDeg, row.camberDeg], printedTo(10, "degrees"));
    expect(left!.wheelCentre.slice(0, 2)).toBeWithin([row.x, row.y], printedTo(7, "mm"));
  });

  test("at design its slopes are as stated", () => {
    const { left } = sweepAt(referenceW1, [0], [0])[0]!;
    expect(left).toBeWithin(
      { bumpSteerDegPerMm: w1Slopes.toe, camberChangeDegPerMm: w1Slopes.camber },
      printedTo(9, "degrees per mm"),
    );
    const [below, above] = sweepAt(referenceW1, [-0.01, 0.01], [0]);
    const slope = (above!.left!.wheelCentre[1] - below!.left!.wheelCentre[1]) / 0.02;
    expect(slope).toBeWithin(w1Slopes.wheelCentreY, printedTo(9, "mm per mm"));
  });
});

// The loop lower arm, knuckle, upper arm in closed form: J. M. McCarthy & G. S. Soh, Geometric Design of Linkages, 2011,
// App. A. Turns about each arm's axis from rear to front pivot, right-handed.
describe("W1's arms turn together as the closed form says", () => {
  const { lowerArm, upperArm } = referenceW1.left.suspension;
  const turnDeg = ({ frontPivot, rearPivot, ballJoint }: Wishbone, now: Vector): number => {
    const axis = unit(subtract(frontPivot, rearPivot));
    const [was, is] = [ballJoint, now].map((joint) => across(subtract(joint, rearPivot), axis)) as [
      Vector,
      Vector,
    ];
    return (Math.atan2(dot(axis, cross(was, is)), dot(was, is)) * 180) / Math.PI;
  };

  test.each([
    [-60, -10.319557, -13.881909],
    [-40, -6.836466, -9.218064],
    [-20, -3.401211, -4.599967],
    [20, 3.37968, 4.607749],
    [40, 6.749565, 9.248809],
    [60, 10.12105, 13.949542],
  ])("at %d mm", (travel, lowerDeg, upperDeg) => {
    const { points } = poseAxle(referenceW1, { travel: { left: travel, right: travel }, steer: 0 }).left!;
    expect([
      turnDeg(lowerArm, points["suspension.lowerArm.ballJoint"]!),
      turnDeg(upperArm, points["suspension.upperArm.ballJoint"]!),
    ]).toBeWithin([lowerDeg, upperDeg], printedTo(6, "degrees"));
  });
});

describe("W1 over its rack", () => {
  test.each(w1RackRows)("at $rack mm", (row) => {
    const { left, right } = sweepAt(referenceW1, [0], [row.rack])[0]!;
    expect([-left!.toeDeg, right!.toeDeg, left!.camberDeg]).toBeWithin(
      [row.leftSteerDeg, row.rightSteerDeg, row.leftCamberDeg],
      printedTo(6, "degrees"),
    );
  });
});

// "Other lengths unchanged" is what a rack does that moves that way: the inner joint goes, every link keeps its length.
describe("W1's toe answers to its tie rod's inner joint", () => {
  const directions: Readonly<Record<string, readonly [number, number, number]>> = {
    "rack.inner.x": [1, 1e-9, 0],
    "rack.inner.y": [0, 1, 0],
    "rack.inner.z": [0, 1e-9, 1],
  };

  test.each(w1Deviations.filter(({ deviations }) => deviations !== undefined))("$what", (row) => {
    const [coordinate] = Object.keys(row.deviations!);
    const axis = directions[coordinate!]!;
    const moving: Axle = { ...referenceW1, steering: { type: "rack", axis, travel: 60 } };
    const travels = [-40, 0, 40];
    const toes = (steer: number) => sweepAt(moving, travels, [steer]).map(({ left }) => left!.toeDeg);
    const drawn = toes(0);
    expect(toes(1).map((toe, index) => toe - drawn[index]!)).toBeWithin(
      row.toeChangeDeg,
      printedTo(6, "degrees"),
    );
  });
});

test("W1's left and right are mirror images of one another", () => {
  for (const { left, right } of sweepAt(referenceW1, [-40, 0, 40], [0])) {
    const [x, y, z] = right!.contactPoint;
    expect({ ...right, wheelCentre: null, contactPoint: [x, -y, z] }).toBeWithin(
      { ...left, wheelCentre: null },
      TOLERANCE.roundOff,
    );
  }
});
