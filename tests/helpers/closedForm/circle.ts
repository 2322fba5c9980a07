// A point that goes round a circle, and where it is at a given distance from another point: all that a wishbone, a
// knuckle on its kingpin and a tie rod are.

import { across, add, cross, dot, scale, subtract, type Vector } from "./vector.ts";

/** point(angle) = centre + cos(angle)·start + sin(angle)·quarter, with |start| = |quarter| = radius. */
export interface Circle {
  readonly centre: Vector;
  readonly start: Vector;
  readonly quarter: Vector;
}

/** The circle that `point` goes round about the line through `origin` along the unit vector `axis`; angle 0 is `point` itself. */
export function circleThrough(point: Vector, origin: Vector, axis: Vector): Circle {
  const fromOrigin = subtract(point, origin);
  const start = across(fromOrigin, axis);
  return { centre: add(origin, scale(axis, dot(fromOrigin, axis))), start, quarter: cross(axis, start) };
}

export function pointOnCircle(circle: Circle, angle: number): Vector {
  return add(
    circle.centre,
    add(scale(circle.start, Math.cos(angle)), scale(circle.quarter, Math.sin(angle))),
  );
}

/** One of the two ways a linkage closes: the sign before the arc cosine. It cannot change without passing a dead point. */
export type Branch = 1 | -1;

/**
 * The angle at which a·cos + b·sin = c, null when there is none.
 * angle = atan2(b, a) ± acos(c / √(a² + b²)); standard trigonometry.
 */
export function solveCosineSine(a: number, b: number, c: number, branch: Branch): number | null {
  const amplitude = Math.hypot(a, b);
  if (!(Math.abs(c) <= amplitude) || amplitude === 0) return null;
  return Math.atan2(b, a) + branch * Math.acos(c / amplitude);
}

/** The angle at which the circle meets the sphere of `radius` about `middle`. */
export function meetSphere(circle: Circle, middle: Vector, radius: number, branch: Branch): number | null {
  const toMiddle = subtract(middle, circle.centre);
  const c = (dot(circle.start, circle.start) + dot(toMiddle, toMiddle) - radius * radius) / 2;
  return solveCosineSine(dot(circle.start, toMiddle), dot(circle.quarter, toMiddle), c, branch);
}

/** The branch on which a circle meets a sphere at angle 0, where both are known to meet in design. */
export function branchAtStart(circle: Circle, middle: Vector): Branch {
  return dot(circle.quarter, subtract(middle, circle.centre)) > 0 ? -1 : 1;
}
