// Where a part that is bolted to an arm or to the knuckle goes when the knuckle moves.

import { DESIGN_POSE, type Pose, transformPoint } from "../geometry/pose.ts";
import { angleAbout, rotate, rotationAbout } from "../geometry/rotation.ts";
import { pointVelocity, type Twist } from "../geometry/twist.ts";
import { between, cross, type Direction, dot, offsetPoint, type Point } from "../geometry/vec3.ts";
import type { Coordinates, SpringMount } from "../model/axle.ts";
import type { CornerDesign } from "../model/design.ts";
import type { HingedArm } from "../model/suspension/index.ts";

export interface CarriedPoint {
  readonly point: Point<"V">;
  /** Its velocity for the twist asked about, per unit of it. */
  readonly velocity: Direction<"V">;
}

/** A point drawn at `drawn` on a part, at this pose. Null when this kind of suspension has no such part. */
export function carryPoint(
  design: CornerDesign,
  on: SpringMount,
  drawn: Coordinates,
  pose: Pose<"V", "K">,
  twist: Twist,
): CarriedPoint | null {
  if (on === "knuckle") {
    const point = transformPoint(pose, drawn);
    return { point, velocity: pointVelocity(twist, point) };
  }
  const arm = design.parts[on];
  return arm === null ? null : carryOnArm(arm, drawn, pose, twist);
}

/**
 * An arm has turned about its hinge by the angle through which its ball joint moved. Its rate follows from the
 * ball joint's velocity v: with t = n × (ball joint − hinge), the angular rate is v·t / t·t.
 */
export function carryOnArm(
  arm: HingedArm,
  drawn: Coordinates,
  pose: Pose<"V", "K">,
  twist: Twist,
): CarriedPoint {
  const p_V_ballJoint = transformPoint(pose, arm.ballJoint);
  const toJoint = between(arm.hingePoint, p_V_ballJoint);
  const angleRad = angleAbout(
    arm.hingeAxis,
    between(arm.hingePoint, transformPoint(DESIGN_POSE, arm.ballJoint)),
    toJoint,
  );
  const turned = rotate(rotationAbout(arm.hingeAxis, angleRad), between(arm.hingePoint, drawn));
  const tangent = cross(arm.hingeAxis, toJoint);
  const rate = dot(pointVelocity(twist, p_V_ballJoint), tangent) / dot(tangent, tangent);
  const sweep = cross(arm.hingeAxis, turned);
  return {
    point: offsetPoint(arm.hingePoint, turned),
    velocity: [sweep[0] * rate, sweep[1] * rate, sweep[2] * rate],
  };
}
