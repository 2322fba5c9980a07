// From a wheel height to a pose: one bracketed root, on the lower arm's angle.

import { findFirstRoot } from "./bracketedRoot.ts";
import { type Held, type Parts, type Pose, poseAtLowerAngle } from "./corner.ts";
import { distance } from "./vector.ts";

/** Coarse enough to be quick, fine enough that the wheel's height does not turn back within a step of a real linkage. */
const WALK_RAD = 0.04;
/** A joint that has gone half way round its arm is back where it started from below. */
const FURTHEST_RAD = Math.PI;

/** The pose with the wheel centre `travel` above its design height; null when that cannot be reached. */
export function poseAtTravel(parts: Parts, travel: number, held: Held): Pose | null {
  const height = parts.knuckle.wheelCentre[2] + travel;
  const missing = (lowerAngle: number): number | null => {
    const pose = poseAtLowerAngle(parts, lowerAngle, held);
    return pose === null ? null : pose.wheelCentre[2] - height;
  };
  const atDesign = missing(0);
  if (atDesign === null) return null;
  const lowerAngle = findFirstRoot(missing, atDesign > 0 ? -WALK_RAD : WALK_RAD, FURTHEST_RAD);
  return lowerAngle === null ? null : poseAtLowerAngle(parts, lowerAngle, held);
}

/**
 * The same parts with the tie rod turned until static toe is right at `wheelUp`: the knuckle is put there at that toe
 * with the rod off, and the rod is made to fit. Null when the wheel cannot be put there.
 */
export function setToeAt(parts: Parts, wheelUp: number): Parts | null {
  const pose = poseAtTravel(parts, wheelUp, { by: "toe", toeDeg: parts.staticToeDeg });
  return pose === null ? null : { ...parts, tieRodLength: distance(pose.steeringArm, parts.rackInner) };
}
