// Arms and knuckle of one corner as bars.

import type { CornerPlacement, Side, Suspension } from "@linkwright/kinematics";
import type { Bar, Tone } from "./parts.ts";
import { nearestOnSegment, offset, type Vec3 } from "./vectors.ts";

/** Radii as shares of the picture's size, the distance between the wheels. */
const ARM = 0.0082;
const HINGE = 0.0022;
const UPRIGHT = 0.0105;
const STEERING_ARM = 0.0085;
const STUB = 0.009;

interface CornerPicture {
  readonly side: Side;
  readonly suspension: Suspension;
  readonly placement: CornerPlacement;
  readonly size: number;
  /** Of the hub's face, outboard of the wheel centre. */
  readonly face: number;
}

export function suspensionBars(corner: CornerPicture): Bar[] {
  switch (corner.suspension.type) {
    case "doubleWishbone":
      return [
        ...wishboneBars(corner, "lowerArm"),
        ...wishboneBars(corner, "upperArm"),
        ...knuckleBars(corner, "suspension.lowerArm.ballJoint", "suspension.upperArm.ballJoint"),
      ];
  }
}

function bar(side: Side, part: string, ends: readonly [Vec3, Vec3], radius: number, tone: Tone): Bar {
  return { part: `${side}.${part}`, from: ends[0], to: ends[1], radius, tone, banded: side === "right" };
}

function wishboneBars({ side, placement, size }: CornerPicture, arm: "lowerArm" | "upperArm"): Bar[] {
  const { points } = placement;
  const front = points[`suspension.${arm}.frontPivot`];
  const rear = points[`suspension.${arm}.rearPivot`];
  const joint = points[`suspension.${arm}.ballJoint`];
  if (!front || !rear || !joint) return [];
  return [
    bar(side, `${arm}.frontPivot`, [front, joint], ARM * size, side),
    bar(side, `${arm}.rearPivot`, [rear, joint], ARM * size, side),
    bar(side, `${arm}.axis`, [front, rear], HINGE * size, side),
  ];
}

/** The steering arm and the stub axle leave the upright where they are nearest to it. */
function knuckleBars(corner: CornerPicture, lowerPath: string, upperPath: string): Bar[] {
  const { side, placement, size, face } = corner;
  const { points, wheelCentre, spinAxis } = placement;
  const lower = points[lowerPath];
  const upper = points[upperPath];
  const outer = points["tieRod.outer"];
  if (!lower || !upper) return [];
  const stubRoot = nearestOnSegment(wheelCentre, lower, upper);
  const bars = [
    knuckleBar(side, "upright", [lower, upper], UPRIGHT * size),
    knuckleBar(side, "stub", [stubRoot, offset(wheelCentre, spinAxis, face)], STUB * size),
  ];
  if (!outer) return bars;
  return [
    ...bars,
    knuckleBar(side, "steeringArm", [nearestOnSegment(outer, lower, upper), outer], STEERING_ARM * size),
  ];
}

/** White on both sides: it is the part between the arms and the wheel, whose colours already tell the side. */
function knuckleBar(side: Side, part: string, ends: readonly [Vec3, Vec3], radius: number): Bar {
  return { ...bar(side, part, ends, radius, "knuckle"), banded: false };
}
