// The invented shop's light hill-climb special: a front axle that steers itself over bumps, the same one cured, and
// a rear axle with a fixed toe link.

import type { Study } from "@linkwright/contract";
import { studyOf } from "./studyOf.ts";

type Axle = Study["axle"];

const front: Axle = {
  format: "linkwright.axle/1",
  name: "Hill-climb special, front",
  position: "front",
  wheelbase: 2285,
  left: {
    suspension: {
      type: "doubleWishbone",
      lowerArm: { frontPivot: [172, 252, 161], rearPivot: [-128, 246, 168], ballJoint: [8, 566, 152] },
      upperArm: { frontPivot: [112, 308, 366], rearPivot: [-104, 314, 352], ballJoint: [-14, 534, 379] },
    },
    // The rack sits where its bracket was easy to weld: too high.
    tieRod: { inner: [131, 268, 226], outer: [122, 578, 196] },
    wheel: {
      centre: [0, 632, 281],
      toeDeg: 0.1,
      camberDeg: -1,
      loadedRadius: 279,
      rim: { diameter: 381, width: 165, offset: 20 },
      tyre: { width: 195, diameter: 576 },
    },
    spring: {
      body: [4, 330, 540],
      lower: [6, 452, 166],
      on: "lowerArm",
      rateNPerMm: 38,
      freeLength: 230,
      openLength: 470,
      closedLength: 320,
    },
  },
  right: "mirror",
  steering: {
    type: "rack",
    axis: [0, 1, 0],
    travel: 62,
    mmPerTurn: 44,
    wheelLeftMoves: "left",
    bought: true,
  },
  body: {
    massKg: 640,
    frontMassShare: 0.46,
    cgHeight: 410,
    frontBrakeShare: 0.64,
    driveShare: 0,
    unsprungMassKg: 29,
  },
};

const rear: Axle = {
  format: "linkwright.axle/1",
  name: "Hill-climb special, rear",
  position: "rear",
  wheelbase: 2285,
  left: {
    suspension: {
      type: "doubleWishbone",
      lowerArm: { frontPivot: [148, 238, 176], rearPivot: [-92, 232, 180], ballJoint: [-6, 560, 158] },
      upperArm: { frontPivot: [96, 322, 398], rearPivot: [-88, 322, 392], ballJoint: [6, 552, 414] },
    },
    tieRod: { inner: [-142, 244, 188], outer: [-136, 562, 172] },
    wheel: {
      centre: [0, 622, 284],
      toeDeg: 0.15,
      camberDeg: -1.25,
      loadedRadius: 282,
      rim: { diameter: 381, width: 190, offset: 15 },
      tyre: { width: 205, diameter: 585 },
    },
    spring: {
      body: [-48, 352, 560],
      lower: [-40, 470, 172],
      on: "lowerArm",
      rateNPerMm: 46,
      openLength: 480,
      closedLength: 330,
    },
  },
  right: "mirror",
  steering: { type: "fixed" },
  body: {
    massKg: 640,
    frontMassShare: 0.46,
    cgHeight: 410,
    frontBrakeShare: 0.64,
    driveShare: 1,
    unsprungMassKg: 32,
  },
};

const HEIGHTS: Study["rideHeights"] = [
  { name: "Road", wheelUp: 0, rakeDeg: 0, band: [-50, 50] },
  { name: "Hill climb", wheelUp: 25, rakeDeg: 0.4, band: [-40, 40] },
];

const JIG: Study["datum"] = {
  name: "Jig table, from the front crossmember",
  origin: [210, 0, 120],
  xAxis: [-1, 0, 0],
  zAxis: [0, 0, 1],
};

const TARGETS: Study["targets"] = [
  { quantity: "bumpSteerDeg", min: -0.15, max: 0.15 },
  { quantity: "camberChangeDegPerMm", min: -0.04, max: -0.01 },
  { quantity: "casterDeg", min: 4, max: 7 },
];

export const frontAsDrawn: Study = studyOf(front, { rideHeights: HEIGHTS, targets: TARGETS, datum: JIG });

/** The flattest with the rack lowered and the outer joint raised on a spacer, to the tenth of a millimetre. */
export const frontCured: Study = {
  ...frontAsDrawn,
  axle: { ...front, left: { ...front.left, tieRod: { inner: [131, 268, 212.6], outer: [122, 578, 211] } } },
};

export const rearWithToeLink: Study = studyOf(rear, {
  rideHeights: HEIGHTS,
  targets: [
    { quantity: "bumpSteerDeg", min: -0.15, max: 0.15 },
    { quantity: "camberChangeDegPerMm", min: -0.04, max: -0.01 },
  ],
});
