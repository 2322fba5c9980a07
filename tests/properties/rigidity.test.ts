// Links keep their length and bodies their shape, wherever the linkage goes.

import {
  type Axle,
  type Coordinates,
  type CornerPlacement,
  poseAt,
  poseAxle,
  prepareCorner,
  rightCorner,
  SIDES,
  type Side,
  steerTo,
  travelColumn,
} from "@linkwright/kinematics";
import fc from "fast-check";
import { describe, test } from "vitest";
import { anyAxle, anyInput, anyRearAxle, PROPERTY_RUNS, SLOW_PROPERTY_MS } from "../helpers/generators.ts";
import { expect } from "../helpers/matchers.ts";
import { TOLERANCE } from "../helpers/tolerances.ts";

const apart = (a: Coordinates, b: Coordinates): number => Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]);

/** The axle's hardpoints of one side as drawn, under the names that poseAxle gives them. */
function drawnPoints(axle: Axle, side: Side): Record<string, Coordinates> {
  const corner = side === "left" ? axle.left : rightCorner(axle);
  const { lowerArm, upperArm } = corner.suspension;
  return {
    "suspension.lowerArm.frontPivot": lowerArm.frontPivot,
    "suspension.lowerArm.rearPivot": lowerArm.rearPivot,
    "suspension.lowerArm.ballJoint": lowerArm.ballJoint,
    "suspension.upperArm.frontPivot": upperArm.frontPivot,
    "suspension.upperArm.rearPivot": upperArm.rearPivot,
    "suspension.upperArm.ballJoint": upperArm.ballJoint,
    "tieRod.inner": corner.tieRod.inner,
    "tieRod.outer": corner.tieRod.outer,
    "wheel.centre": corner.wheel.centre,
  };
}

/** Pairs of points that one part holds apart. */
const HELD_APART = [
  ["suspension.lowerArm.frontPivot", "suspension.lowerArm.ballJoint"],
  ["suspension.lowerArm.rearPivot", "suspension.lowerArm.ballJoint"],
  ["suspension.upperArm.frontPivot", "suspension.upperArm.ballJoint"],
  ["suspension.upperArm.rearPivot", "suspension.upperArm.ballJoint"],
  ["suspension.lowerArm.ballJoint", "suspension.upperArm.ballJoint"],
  ["suspension.lowerArm.ballJoint", "tieRod.outer"],
  ["suspension.upperArm.ballJoint", "tieRod.outer"],
  ["suspension.lowerArm.ballJoint", "wheel.centre"],
  ["suspension.upperArm.ballJoint", "wheel.centre"],
  ["tieRod.outer", "wheel.centre"],
] as const;
const TIE_ROD = ["tieRod.inner", "tieRod.outer"] as const;

function lengths(
  points: Readonly<Record<string, Coordinates>>,
  pairs: readonly (readonly [string, string])[],
) {
  return Object.fromEntries(pairs.map(([a, b]) => [`${a} to ${b}`, apart(points[a]!, points[b]!)]));
}

function bothSides(axle: Axle, input: { travel: number; steer: number; wheelUp?: number }) {
  const { travel, ...rest } = input;
  const placed = poseAxle(axle, { travel: { left: travel, right: travel }, ...rest });
  fc.pre(placed.left !== null && placed.right !== null);
  return placed as Record<Side, CornerPlacement>;
}

describe("at every reachable travel and rack position", () => {
  test(
    "every link and the knuckle keep their dimensions, and the wheel is as high as asked",
    () => {
      fc.assert(
        fc.property(anyAxle(), anyInput(), (axle, input) => {
          const placed = bothSides(axle, input);
          for (const side of SIDES) {
            const drawn = drawnPoints(axle, side);
            const pairs = [...HELD_APART, TIE_ROD];
            expect(lengths(placed[side].points, pairs)).toBeWithin(
              lengths(drawn, pairs),
              TOLERANCE.closure,
              side,
            );
            const height = placed[side].wheelCentre[2] - drawn["wheel.centre"]![2];
            expect(height).toBeWithin(input.travel, TOLERANCE.closure, `${side} wheel travel`);
            expect(Math.hypot(...placed[side].spinAxis)).toBeWithin(1, TOLERANCE.roundOff);
          }
        }),
        PROPERTY_RUNS,
      );
    },
    SLOW_PROPERTY_MS,
  );

  test(
    "setting toe at a ride height changes the tie rod's length and no other",
    () => {
      fc.assert(
        fc.property(
          anyRearAxle(),
          anyInput(),
          fc.integer({ min: -50, max: 50 }),
          (axle, { travel }, wheelUp) => {
            const placed = bothSides(axle, { travel, steer: 0, wheelUp });
            const there = bothSides(axle, { travel: wheelUp, steer: 0, wheelUp });
            for (const side of SIDES) {
              const drawn = lengths(drawnPoints(axle, side), HELD_APART);
              expect(lengths(placed[side].points, HELD_APART)).toBeWithin(drawn, TOLERANCE.closure, side);
              const rod = lengths(there[side].points, [TIE_ROD]);
              expect(lengths(placed[side].points, [TIE_ROD])).toBeWithin(rod, TOLERANCE.closure, side);
            }
          },
        ),
        PROPERTY_RUNS,
      );
    },
    SLOW_PROPERTY_MS,
  );
});

test(
  "a long sweep lets no error build up: rotations stay unit and there and back ends where it began",
  () => {
    const finely = Array.from({ length: 1401 }, (_, i) => -70 + i / 10);
    fc.assert(
      fc.property(
        anyAxle(),
        fc.constantFrom(...SIDES),
        fc.integer({ min: -45, max: 45 }),
        (axle, side, steer) => {
          const prepared = prepareCorner(axle, side);
          fc.pre(prepared.status === "ready");
          const { solver } = prepared as Extract<typeof prepared, { status: "ready" }>;
          const poseHere = () => poseAt(travelColumn(solver, [0]).poses);
          steerTo(solver, 0);
          const before = poseHere();
          fc.pre(steerTo(solver, steer).status === "reached");
          const column = travelColumn(solver, finely);
          for (const [index] of finely.entries()) {
            if (column.reached[index] === 0) continue;
            expect(Math.hypot(...poseAt(column.poses, index).rotation)).toBeWithin(1, TOLERANCE.roundOff);
          }
          steerTo(solver, -steer);
          travelColumn(solver, finely);
          steerTo(solver, 0);
          expect(poseHere()).toBeWithin(before, TOLERANCE.roundOff);
        },
      ),
      { ...PROPERTY_RUNS, numRuns: 30 },
    );
  },
  SLOW_PROPERTY_MS,
);
