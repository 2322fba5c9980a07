// The little vector sum a picture needs, in the car's axes: X forward, Y left, Z up, mm.

import type { Coordinates } from "@linkwright/kinematics";

export type Vec3 = Coordinates;

export const UP: Vec3 = [0, 0, 1];

export function add(a: Vec3, b: Vec3): Vec3 {
  return [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
}

/** From `from` to `to`. */
export function between(from: Vec3, to: Vec3): Vec3 {
  return [to[0] - from[0], to[1] - from[1], to[2] - from[2]];
}

export function scale(a: Vec3, factor: number): Vec3 {
  return [a[0] * factor, a[1] * factor, a[2] * factor];
}

/** The point that lies `factor` times `along` from `start`. */
export function offset(start: Vec3, along: Vec3, factor: number): Vec3 {
  return [start[0] + along[0] * factor, start[1] + along[1] * factor, start[2] + along[2] * factor];
}

export function dot(a: Vec3, b: Vec3): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
}

export function cross(a: Vec3, b: Vec3): Vec3 {
  return [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]];
}

export function length(a: Vec3): number {
  return Math.hypot(a[0], a[1], a[2]);
}

export function mix(a: Vec3, b: Vec3, share: number): Vec3 {
  return offset(a, between(a, b), share);
}

/** Null where the vector has no direction. */
export function findUnit(a: Vec3): Vec3 | null {
  const size = length(a);
  return size > 0 ? scale(a, 1 / size) : null;
}

/** The point of the segment from `a` to `b` that is nearest to `point`. */
export function nearestOnSegment(point: Vec3, a: Vec3, b: Vec3): Vec3 {
  const along = between(a, b);
  const square = dot(along, along);
  if (square === 0) return a;
  const share = dot(between(a, point), along) / square;
  return offset(a, along, Math.min(1, Math.max(0, share)));
}
