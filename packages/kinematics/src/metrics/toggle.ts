// How near the tie rod and the steering arm are to lying in line.

import { rejectFrom } from "../geometry/rotation.ts";
import { between, cross, dot, findUnit, norm, type Point } from "../geometry/vec3.ts";
import { type Deg, degFromRad } from "../units.ts";
import type { SteeringAxis } from "./steeringAxis.ts";

/** Under this the steering is heavy with lost motion (common practice): amber. */
export const TOGGLE_AMBER_DEG = 30;
/** Under this a little wear or flex can carry it over centre (common practice): red. */
export const TOGGLE_RED_DEG = 20;

/**
 * The acute angle between steering arm and tie rod seen along the steering axis, 0 … 90°: 0 is in line. The arm
 * is the outer joint's offset from the axis. Null when either has no length in that view.
 */
export function measureToggleMarginDeg(
  axis: SteeringAxis,
  p_V_outer: Point<"V">,
  p_V_inner: Point<"V">,
): Deg | null {
  const along = findUnit(between(axis.lower, axis.upper));
  if (along === null) return null;
  const arm = rejectFrom(along, between(axis.lower, p_V_outer));
  const rod = rejectFrom(along, between(p_V_inner, p_V_outer));
  if (norm(arm) === 0 || norm(rod) === 0) return null;
  return degFromRad(Math.atan2(norm(cross(arm, rod)), Math.abs(dot(arm, rod))));
}
