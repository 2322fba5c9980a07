// Axles that cannot be built, or hardly, for fast-check: what the engine must answer honestly.

import type { Axle, Coordinates, Corner, SpringMount } from "@linkwright/kinematics";
import fc from "fast-check";
import { anyAxle, between, pointAlong } from "./generators.ts";

const anywhere = fc.oneof(
  { weight: 3, arbitrary: between(-800, 800) },
  { weight: 1, arbitrary: fc.constantFrom(0, 0, 1e-9, -1e-9, 100, 4999, -4999, 6000) },
  { weight: 1, arbitrary: fc.double({ noNaN: true, noDefaultInfinity: true, min: -1e4, max: 1e4 }) },
);
const anyPoint: fc.Arbitrary<Coordinates> = fc.tuple(anywhere, anywhere, anywhere);

/** Hardpoints anywhere, often on one another or in line: nothing a shop would build, much of it unbuildable. */
export function anyNastyAxle(): fc.Arbitrary<Axle> {
  const nastyArm = fc
    .record({ frontPivot: anyPoint, rearPivot: anyPoint, ballJoint: anyPoint, collapse: fc.nat({ max: 9 }) })
    .map(({ frontPivot, rearPivot, ballJoint, collapse }) => ({
      frontPivot,
      rearPivot:
        collapse === 0 ? frontPivot : collapse === 1 ? pointAlong(frontPivot, ballJoint, 0.5) : rearPivot,
      ballJoint: collapse === 2 ? rearPivot : ballJoint,
    }));
  return fc
    .record({
      lowerArm: nastyArm,
      upperArm: nastyArm,
      inner: anyPoint,
      outer: anyPoint,
      centre: fc.tuple(anywhere, between(1, 900), anywhere),
      toeDeg: between(-30, 30),
      camberDeg: between(-40, 40),
      loadedRadius: between(1, 600),
      axis: fc.constantFrom<Coordinates>([0, 1, 0], [1, 1e-6, 0], [0, 1, 50], [3, 1, -2]),
      fixed: fc.boolean(),
      front: fc.boolean(),
      springOn: fc.constantFrom<SpringMount>("lowerArm", "upperArm", "knuckle"),
      springBody: anyPoint,
      springLower: anyPoint,
    })
    .map((raw) => ({
      format: "linkwright.axle/1",
      name: "Hardpoints anywhere",
      position: raw.front ? "front" : "rear",
      wheelbase: 2400,
      left: {
        suspension: { type: "doubleWishbone", lowerArm: raw.lowerArm, upperArm: raw.upperArm },
        tieRod: { inner: raw.inner, outer: raw.outer },
        wheel: {
          centre: raw.centre,
          toeDeg: raw.toeDeg,
          camberDeg: raw.camberDeg,
          loadedRadius: raw.loadedRadius,
        },
        spring: { on: raw.springOn, body: raw.springBody, lower: raw.springLower },
      },
      right: "mirror",
      steering: raw.fixed ? { type: "fixed" } : { type: "rack", axis: raw.axis, travel: 60 },
      body: { cgHeight: 500, frontBrakeShare: 0.6, driveShare: 1 },
    }));
}

/** Pulls one dimension of a believable axle to where something must give: dead points, lost reach, coplanar links. */
export function anyStrainedAxle(): fc.Arbitrary<Axle> {
  return fc
    .record({ axle: anyAxle(), how: fc.nat({ max: 4 }), by: between(0, 1) })
    .map(({ axle, how, by }) => {
      const { left } = axle;
      const { lowerArm, upperArm } = left.suspension;
      const strain = (corner: Partial<Corner>): Axle => ({
        ...axle,
        right: "mirror",
        left: { ...left, ...corner },
      });
      switch (how) {
        case 0: // tie rod in line with the steering arm
          return strain({
            tieRod: { ...left.tieRod, inner: pointAlong(left.tieRod.outer, lowerArm.ballJoint, 3 + by) },
          });
        case 1: // an upper arm so short that travel runs out
          return strain({
            suspension: {
              ...left.suspension,
              upperArm: {
                ...upperArm,
                frontPivot: pointAlong(upperArm.ballJoint, upperArm.frontPivot, 0.1 + 0.2 * by),
                rearPivot: pointAlong(upperArm.ballJoint, upperArm.rearPivot, 0.1 + 0.2 * by),
              },
            },
          });
        case 2: // both arms on one pivot line
          return strain({
            suspension: {
              ...left.suspension,
              upperArm: { ...upperArm, frontPivot: lowerArm.frontPivot, rearPivot: lowerArm.rearPivot },
            },
          });
        case 3: // a tie rod on the kingpin
          return strain({
            tieRod: { ...left.tieRod, outer: pointAlong(lowerArm.ballJoint, upperArm.ballJoint, by) },
          });
        default: // a spring whose eyes meet
          return strain({
            spring: {
              on: "knuckle",
              lower: left.wheel.centre,
              body: pointAlong(left.wheel.centre, [0, 0, 0], by / 10),
            },
          });
      }
    });
}
