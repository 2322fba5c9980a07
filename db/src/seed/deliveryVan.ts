// The invented shop's 1950s-style delivery van: a front axle whose sides came off the jig unequal, and the same design
// with its rack turned round, which steers backwards.

import type { Study } from "@linkwright/contract";
import { studyOf } from "./studyOf.ts";

type Axle = Study["axle"];
type Corner = Axle["left"];

const left: Corner = {
  suspension: {
    type: "doubleWishbone",
    lowerArm: { frontPivot: [186, 214, 224], rearPivot: [-158, 206, 230], ballJoint: [4, 596, 208] },
    upperArm: { frontPivot: [92, 332, 446], rearPivot: [-118, 338, 434], ballJoint: [-12, 566, 458] },
  },
  tieRod: { inner: [158, 242, 264], outer: [148, 604, 252] },
  wheel: {
    centre: [0, 694, 342],
    toeDeg: 0.1,
    camberDeg: -0.25,
    loadedRadius: 332,
    rim: { diameter: 406, width: 127, offset: 30 },
    tyre: { width: 185, diameter: 686 },
  },
  spring: {
    body: [2, 322, 598],
    lower: [4, 448, 214],
    on: "lowerArm",
    rateNPerMm: 62,
    freeLength: 310,
    openLength: 520,
    closedLength: 360,
  },
};

/** Measured on the trolley: the upper front bracket 4 mm high, the inner tie-rod joint 5 mm low, the knuckle 1 mm out. */
const rightAsWelded: Corner = {
  ...left,
  suspension: {
    type: "doubleWishbone",
    lowerArm: { frontPivot: [186, -215, 224], rearPivot: [-158, -206, 231], ballJoint: [4, -597, 208] },
    upperArm: { frontPivot: [92, -332, 450], rearPivot: [-117, -338, 434], ballJoint: [-12, -566, 458] },
  },
  tieRod: { inner: [158, -242, 259], outer: [148, -605, 252] },
  wheel: { ...left.wheel, centre: [0, -695, 342], camberDeg: -0.35 },
  spring: {
    body: [2, -322, 598],
    lower: [4, -448, 214],
    on: "lowerArm",
    rateNPerMm: 62,
    freeLength: 310,
    openLength: 520,
    closedLength: 360,
  },
};

const asWelded: Axle = {
  format: "linkwright.axle/1",
  name: "Delivery van, front, as welded",
  position: "front",
  wheelbase: 2690,
  left,
  right: rightAsWelded,
  steering: {
    type: "rack",
    axis: [0, 1, 0],
    travel: 68,
    mmPerTurn: 40,
    wheelLeftMoves: "left",
    bought: true,
  },
  body: {
    massKg: 1480,
    frontMassShare: 0.54,
    cgHeight: 690,
    frontBrakeShare: 0.68,
    driveShare: 0,
    unsprungMassKg: 41,
  },
};

/** The bought rack is made for arms behind the axle; put ahead of it unaltered, it turns the wheels the wrong way. */
const rackTurnedRound: Axle = {
  ...asWelded,
  name: "Delivery van, front, rack turned round",
  right: "mirror",
  steering: {
    type: "rack",
    axis: [0, 1, 0],
    travel: 68,
    mmPerTurn: 40,
    wheelLeftMoves: "right",
    bought: true,
  },
};

const ASKED: Pick<Study, "rideHeights" | "targets"> = {
  rideHeights: [
    { name: "Unladen", wheelUp: 0, rakeDeg: 0, band: [-50, 50] },
    { name: "Laden", wheelUp: 30, rakeDeg: -0.5, band: [-50, 40] },
  ],
  targets: [
    { quantity: "bumpSteerDeg", min: -0.15, max: 0.15 },
    { quantity: "casterDeg", min: 2, max: 6 },
    { quantity: "scrubRadius", min: 10, max: 80 },
  ],
};

export const frontAsWelded: Study = studyOf(asWelded, ASKED);
export const frontRackTurnedRound: Study = studyOf(rackTurnedRound, ASKED);
