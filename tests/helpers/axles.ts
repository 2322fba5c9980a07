// Axles of every shape the first documents allow, each with a whole sweep that the engine must get right.

import type { Axle, Coordinates, Corner } from "@linkwright/kinematics";
import { referenceW1 } from "./referenceW1.ts";
import { workedAxle } from "./workedAxle.ts";

/** ±80 mm of travel in steps of 10. */
export const FULL_TRAVEL = Array.from({ length: 17 }, (_, i) => -80 + 10 * i);

/** From lock to lock, 0 among them. */
export function fullLock(axle: Axle): number[] {
  if (axle.steering.type === "fixed") return [0];
  const { travel } = axle.steering;
  return [-1, -2 / 3, -1 / 3, 0, 1 / 3, 2 / 3, 1].map((share) => share * travel);
}

function withLeft(axle: Axle, change: (left: Corner) => Corner, name: string): Axle {
  return { ...axle, name, left: change(axle.left) };
}

/** Everything of the corner turned about the vertical plane through the axle: what lay ahead lies behind. */
function foreAndAft(corner: Corner): Corner {
  const flip = ([x, y, z]: Coordinates): Coordinates => [-x, y, z];
  const tieRod = { inner: flip(corner.tieRod.inner), outer: flip(corner.tieRod.outer) };
  return { ...corner, tieRod };
}

/** Rack and arm behind the axle; the uprights keep their caster. */
export const behindAxle = withLeft(workedAxle, foreAndAft, "Steering arm behind the axle");

/** The rack's axis is neither level nor square to the car, and not a unit vector. */
export const tiltedRack: Axle = {
  ...workedAxle,
  name: "Rack set askew",
  steering: { type: "rack", axis: [0.08, 2, -0.11], travel: 55 },
};

/** A driven rear axle with a toe link on the body; springs on the knuckle. */
export const rearFixed: Axle = {
  ...withLeft(
    referenceW1,
    (left) => ({
      ...left,
      wheel: { ...left.wheel, toeDeg: 0.2 },
      spring: { body: [-20, 420, 600], lower: [-25, 640, 230], on: "knuckle" },
    }),
    "Rear axle with a toe link",
  ),
  position: "rear",
  steering: { type: "fixed" },
  body: { cgHeight: 520, frontBrakeShare: 0.62, driveShare: 1 },
};

/** The right side is its own: other arms, another arm of the knuckle, a spring on the upper arm. */
export const unequalSides: Axle = {
  ...workedAxle,
  name: "Left and right built unequal",
  right: {
    suspension: {
      type: "doubleWishbone",
      lowerArm: { frontPivot: [143, -263, 192], rearPivot: [-104, -259, 181], ballJoint: [5, -583, 176] },
      upperArm: { frontPivot: [99, -316, 414], rearPivot: [-95, -327, 399], ballJoint: [-15, -545, 425] },
    },
    tieRod: { inner: [128, -273, 217], outer: [113, -592, 216] },
    wheel: { centre: [2, -643, 306], toeDeg: -0.1, camberDeg: -0.5, loadedRadius: 300 },
    spring: { body: [5, -350, 640], lower: [-3, -480, 418], on: "upperArm" },
  },
};

/** Twin trailing arms: both pivot axes run across the car. */
export const trailingArms: Axle = {
  format: "linkwright.axle/1",
  name: "Twin trailing arms",
  position: "front",
  wheelbase: 2300,
  left: {
    suspension: {
      type: "doubleWishbone",
      lowerArm: { frontPivot: [215, 560, 205], rearPivot: [212, 380, 203], ballJoint: [6, 610, 190] },
      upperArm: { frontPivot: [200, 540, 350], rearPivot: [203, 390, 352], ballJoint: [-8, 590, 355] },
    },
    tieRod: { inner: [-110, 300, 240], outer: [-118, 600, 236] },
    wheel: { centre: [0, 660, 290], toeDeg: 0, camberDeg: 0.25, loadedRadius: 285 },
    spring: { body: [150, 500, 420], lower: [90, 580, 200], on: "lowerArm" },
  },
  right: "mirror",
  steering: { type: "rack", axis: [0, 1, 0], travel: 45 },
  body: { cgHeight: 480, frontBrakeShare: 0.6 },
};

export const ALL_AXLES: readonly Axle[] = [
  workedAxle,
  referenceW1,
  behindAxle,
  tiltedRack,
  rearFixed,
  unequalSides,
  trailingArms,
];
