// What a new study begins with: an axle that assembles and can be solved, to be drawn over point by point.

import {
  AXLE_FORMAT,
  type Axle,
  type Corner,
  STUDY_FORMAT,
  type Steering,
  type Study,
} from "@linkwright/kinematics";

const FRONT: Corner = {
  suspension: {
    type: "doubleWishbone",
    lowerArm: { frontPivot: [150, 280, 180], rearPivot: [-150, 280, 180], ballJoint: [0, 620, 170] },
    upperArm: { frontPivot: [110, 340, 400], rearPivot: [-110, 340, 400], ballJoint: [-20, 590, 415] },
  },
  tieRod: { inner: [120, 300, 220], outer: [110, 630, 225] },
  wheel: { centre: [0, 700, 300], toeDeg: 0, camberDeg: 0, loadedRadius: 290 },
};

const REAR: Corner = {
  suspension: {
    type: "doubleWishbone",
    lowerArm: { frontPivot: [180, 260, 180], rearPivot: [-60, 260, 180], ballJoint: [0, 620, 170] },
    upperArm: { frontPivot: [120, 320, 400], rearPivot: [-60, 320, 400], ballJoint: [0, 590, 415] },
  },
  tieRod: { inner: [-140, 280, 195], outer: [-140, 620, 190] },
  wheel: { centre: [0, 700, 300], toeDeg: 0, camberDeg: 0, loadedRadius: 290 },
};

const RACK: Steering = { type: "rack", axis: [0, 1, 0], travel: 65, wheelLeftMoves: "left", bought: true };

/** Per wheel, over the band of the ride height: the street target of common practice. */
const STREET_BUMP_STEER_DEG = 0.15;
const STREET_BAND = [-50, 50] as const;

function startingAxle(name: string, position: Axle["position"]): Axle {
  const isFront = position === "front";
  return {
    format: AXLE_FORMAT,
    name,
    position,
    wheelbase: 2400,
    left: isFront ? FRONT : REAR,
    right: "mirror",
    steering: isFront ? RACK : { type: "fixed" },
  };
}

export function startingStudy(name: string, position: Axle["position"]): Study {
  return {
    format: STUDY_FORMAT,
    axle: startingAxle(name, position),
    rideHeights: [{ name: "Design height", wheelUp: 0, rakeDeg: 0, band: STREET_BAND }],
    targets: [{ quantity: "bumpSteerDeg", min: -STREET_BUMP_STEER_DEG, max: STREET_BUMP_STEER_DEG }],
    datum: null,
    tolerances: [],
    pointNotes: [],
    locks: [],
    parts: [],
    shims: [],
  };
}
