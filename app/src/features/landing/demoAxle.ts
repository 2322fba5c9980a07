// A front axle of our own making for the start page: a rack set a little too low, as it is often found.

import { AXLE_FORMAT, type Axle } from "@linkwright/kinematics";

export const demoAxle: Axle = {
  format: AXLE_FORMAT,
  name: "Start page",
  position: "front",
  wheelbase: 2280,
  left: {
    suspension: {
      type: "doubleWishbone",
      lowerArm: { frontPivot: [140, 262, 176], rearPivot: [-120, 262, 172], ballJoint: [4, 586, 166] },
      upperArm: { frontPivot: [96, 324, 398], rearPivot: [-104, 328, 390], ballJoint: [-16, 552, 416] },
    },
    tieRod: { inner: [122, 281, 206], outer: [112, 592, 216] },
    wheel: {
      centre: [0, 646, 291],
      toeDeg: 0,
      camberDeg: -0.5,
      loadedRadius: 284,
      tyre: { width: 155, diameter: 582 },
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
};
