// Every column of one side at one travel and steer.

import type { Parts, Pose } from "./corner.ts";
import { differentiate } from "./derivative.ts";
import {
  type Angles,
  anglesOf,
  contactPointOf,
  groundOffsets,
  kingpinGroundPoint,
  springLengthOf,
  toeDegOf,
  toggleMarginDegOf,
} from "./measure.ts";
import { poseAtTravel } from "./solve.ts";
import { subtract, type Vector } from "./vector.ts";

export interface SideColumns extends Angles {
  readonly casterTrail: number;
  readonly scrubRadius: number;
  readonly wheelCentre: Vector;
  readonly contactPoint: Vector;
  readonly bumpSteerDegPerMm: number;
  readonly camberChangeDegPerMm: number;
  readonly toggleMarginDeg: number;
  readonly springLength: number | null;
  readonly springMotionRatio: number | null;
}

/** What the axle's columns need besides, and what a caller may want to look at. */
export interface SideSolution {
  readonly columns: SideColumns;
  /** Of the contact point as a point of the knuckle, mm per mm of travel. */
  readonly contactVelocity: Vector;
  readonly wheelCentreVelocity: Vector;
  /** About +Z, positive to the left, from the toe at the same travel with the steering straight ahead. */
  readonly steerDeg: number;
  /** Where the steering axis meets the ground with the steering straight ahead at this travel. */
  readonly straightGroundPoint: Vector;
}

/** Rates of everything that has one. The contact point is marked on the knuckle at `pose` and followed. */
function ratesAt(parts: Parts, pose: Pose, travel: number, steer: number): number[] | null {
  const marked = subtract(contactPointOf(parts, pose), pose.wheelCentre);
  const markedInDesign = carryBack(pose, marked);
  return differentiate((at) => {
    const near = poseAtTravel(parts, at, { by: "tieRod", steer });
    if (near === null) return null;
    const angles = anglesOf(parts, near);
    const centre = parts.knuckle.wheelCentre;
    const contact = near.carry([
      centre[0] + markedInDesign[0],
      centre[1] + markedInDesign[1],
      centre[2] + markedInDesign[2],
    ]);
    return [
      angles.toeDeg,
      angles.camberDeg,
      ...contact,
      ...near.wheelCentre,
      springLengthOf(parts, near) ?? 0,
    ];
  }, travel);
}

/** A direction of the knuckle as it was in design: the transpose of the knuckle's turn, read off three carried axes. */
function carryBack(pose: Pose, direction: Vector): Vector {
  const origin = pose.carry([0, 0, 0]);
  const axis = (along: Vector): number => {
    const carried = subtract(pose.carry(along), origin);
    return carried[0] * direction[0] + carried[1] * direction[1] + carried[2] * direction[2];
  };
  return [axis([1, 0, 0]), axis([0, 1, 0]), axis([0, 0, 1])];
}

/** Null when the pose, or the poses a millimetre to both sides that its rates are taken from, cannot be reached. */
export function solveSide(parts: Parts, travel: number, steer: number): SideSolution | null {
  const pose = poseAtTravel(parts, travel, { by: "tieRod", steer });
  const straight = poseAtTravel(parts, travel, { by: "tieRod", steer: 0 });
  if (pose === null || straight === null) return null;
  const rates = ratesAt(parts, pose, travel, steer);
  if (rates === null) return null;
  const [toe, camber, cx, cy, cz, wx, wy, wz, spring] = rates as [
    number,
    number,
    number,
    number,
    number,
    number,
    number,
    number,
    number,
  ];
  const toeIn = toeDegOf(pose.spin, parts.outward) - toeDegOf(straight.spin, parts.outward);
  return {
    columns: {
      ...anglesOf(parts, pose),
      ...groundOffsets(parts, pose),
      wheelCentre: pose.wheelCentre,
      contactPoint: contactPointOf(parts, pose),
      bumpSteerDegPerMm: toe,
      camberChangeDegPerMm: camber,
      toggleMarginDeg: toggleMarginDegOf(pose),
      springLength: springLengthOf(parts, pose),
      springMotionRatio: parts.spring === null ? null : -spring,
    },
    contactVelocity: [cx, cy, cz],
    wheelCentreVelocity: [wx, wy, wz],
    steerDeg: -parts.outward * toeIn,
    straightGroundPoint: kingpinGroundPoint(straight, contactPointOf(parts, straight)),
  };
}
