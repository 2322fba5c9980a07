// What a pose means for a wheel, each quantity from its definition: ISO 8855 axes (x forward, y left, z up), degrees, mm.

import { type Parts, type Pose, springEye } from "./corner.ts";
import { across, add, cross, distance, dot, scale, subtract, unit, type Vector } from "./vector.ts";

export interface Angles {
  readonly toeDeg: number;
  readonly camberDeg: number;
  readonly casterDeg: number;
  readonly kingpinInclinationDeg: number;
}

const degrees = (radians: number): number => (radians * 180) / Math.PI;

/** Toe from the spin axis: positive toe-in on both sides. */
export function toeDegOf(spin: Vector, outward: 1 | -1): number {
  return degrees(Math.atan2(spin[0], outward * spin[1]));
}

export function anglesOf(parts: Parts, pose: Pose): Angles {
  const kingpin = subtract(pose.upperBallJoint, pose.lowerBallJoint);
  return {
    toeDeg: toeDegOf(pose.spin, parts.outward),
    camberDeg: degrees(Math.asin(-pose.spin[2])),
    casterDeg: degrees(Math.atan2(-kingpin[0], kingpin[2])),
    kingpinInclinationDeg: degrees(Math.atan2(-parts.outward * kingpin[1], kingpin[2])),
  };
}

/** The lowest point of the circle of the loaded radius about the wheel centre, in the wheel's plane. */
export function contactPointOf(parts: Parts, pose: Pose): Vector {
  const down = unit(across([0, 0, -1], pose.spin));
  return add(pose.wheelCentre, scale(down, parts.loadedRadius));
}

/** Where the steering axis meets the horizontal plane through the contact point. */
export function kingpinGroundPoint(pose: Pose, contactPoint: Vector): Vector {
  const kingpin = subtract(pose.upperBallJoint, pose.lowerBallJoint);
  return add(pose.lowerBallJoint, scale(kingpin, (contactPoint[2] - pose.lowerBallJoint[2]) / kingpin[2]));
}

/** Trail along the wheel's heading (positive ahead) and scrub radius across it (positive inboard). */
export function groundOffsets(parts: Parts, pose: Pose): { casterTrail: number; scrubRadius: number } {
  const contactPoint = contactPointOf(parts, pose);
  const offset = subtract(kingpinGroundPoint(pose, contactPoint), contactPoint);
  const outboard = unit([pose.spin[0], pose.spin[1], 0]);
  const ahead = scale(cross(outboard, [0, 0, 1]), parts.outward);
  return { casterTrail: dot(offset, ahead), scrubRadius: -dot(offset, outboard) };
}

/** The angle between steering arm and tie rod seen along the kingpin, from lying in one line: 0 … 90. */
export function toggleMarginDegOf(pose: Pose): number {
  const kingpin = unit(subtract(pose.upperBallJoint, pose.lowerBallJoint));
  const arm = unit(across(subtract(pose.steeringArm, pose.lowerBallJoint), kingpin));
  const rod = unit(across(subtract(pose.rackInner, pose.steeringArm), kingpin));
  return degrees(Math.atan2(Math.abs(dot(cross(arm, rod), kingpin)), Math.abs(dot(arm, rod))));
}

export function springLengthOf(parts: Parts, pose: Pose): number | null {
  const eye = springEye(parts, pose);
  return eye === null || parts.spring === null ? null : distance(eye, parts.spring.body);
}
