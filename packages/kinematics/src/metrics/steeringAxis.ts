// Caster, kingpin inclination, and where the steering axis meets the ground.

import { between, type Direction, dot, offsetPoint, type Point } from "../geometry/vec3.ts";
import { type Deg, degFromRad } from "../units.ts";

/** The line through the lower and the upper point of the steering axis, in V. */
export interface SteeringAxis {
  readonly lower: Point<"V">;
  readonly upper: Point<"V">;
}

/** Caster to the body, atan2(−a.x, a.z): positive when the top lies rearward. ISO 8855. */
export function measureCasterDeg({ lower, upper }: SteeringAxis): Deg {
  const a = between(lower, upper);
  return degFromRad(Math.atan2(-a[0], a[2]));
}

/** Kingpin inclination, atan2(−s·a.y, a.z): positive when the top lies inboard. ISO 8855. */
export function measureKingpinInclinationDeg({ lower, upper }: SteeringAxis, outward: 1 | -1): Deg {
  const a = between(lower, upper);
  return degFromRad(Math.atan2(-outward * a[1], a[2]));
}

/** Where the axis meets the horizontal plane through `height`; null for an axis that lies level. */
export function groundPoint({ lower, upper }: SteeringAxis, height: number): Point<"V"> | null {
  const a = between(lower, upper);
  if (a[2] === 0) return null;
  return offsetPoint(lower, a, (height - lower[2]) / a[2]);
}

export interface GroundOffsets {
  /** Positive when the axis meets the ground ahead of the contact point. */
  readonly casterTrail: number;
  /** Positive when the axis meets the ground inboard of the contact point. */
  readonly scrubRadius: number;
}

/**
 * The vector from the contact point to where the axis meets the ground of this side, along the wheel's heading
 * (trail) and along the ground at right angles to it (scrub radius).
 */
export function measureGroundOffsets(
  axis: SteeringAxis,
  p_V_contact: Point<"V">,
  u_V_spin: Direction<"V">,
  outward: 1 | -1,
): GroundOffsets | null {
  const ground = groundPoint(axis, p_V_contact[2]);
  if (ground === null) return null;
  const level = Math.hypot(u_V_spin[0], u_V_spin[1]);
  const outboard: Direction<"V"> = [u_V_spin[0] / level, u_V_spin[1] / level, 0];
  const heading: Direction<"V"> = [outward * outboard[1], -outward * outboard[0], 0];
  const offset = between(p_V_contact, ground);
  return { casterTrail: dot(offset, heading), scrubRadius: -dot(offset, outboard) };
}
