// Rotations as unit quaternions [w, x, y, z].

import type { Rad } from "../units.ts";
import { cross, dot, norm, scale, type Vec3 } from "./vec3.ts";

export type Quaternion = readonly [number, number, number, number];

export const IDENTITY_ROTATION: Quaternion = [1, 0, 0, 0];

/** The rotation by `angleRad` about `axis` (need not be unit), right-hand rule. */
export function rotationAbout(axis: Vec3, angleRad: Rad): Quaternion {
  const half = angleRad / 2;
  const factor = Math.sin(half) / norm(axis);
  return [Math.cos(half), axis[0] * factor, axis[1] * factor, axis[2] * factor];
}

/** v + 2w(q × v) + 2 q × (q × v), the Euler–Rodrigues form. */
export function rotate(rotation: Quaternion, v: Vec3): Vec3 {
  const [w, qx, qy, qz] = rotation;
  const tx = 2 * (qy * v[2] - qz * v[1]);
  const ty = 2 * (qz * v[0] - qx * v[2]);
  const tz = 2 * (qx * v[1] - qy * v[0]);
  return [
    v[0] + w * tx + qy * tz - qz * ty,
    v[1] + w * ty + qz * tx - qx * tz,
    v[2] + w * tz + qx * ty - qy * tx,
  ];
}

/**
 * The angle by which `from` must turn about the unit vector `axis` to point at `to`, both seen along the axis;
 * right-hand rule, (−π, π].
 */
export function angleAbout(axis: Vec3, from: Vec3, to: Vec3): Rad {
  const flatFrom = rejectFrom(axis, from);
  const flatTo = rejectFrom(axis, to);
  return Math.atan2(dot(axis, cross(flatFrom, flatTo)), dot(flatFrom, flatTo));
}

/** The part of `v` at right angles to the unit vector `axis`. */
export function rejectFrom(axis: Vec3, v: Vec3): Vec3 {
  const along = scale(axis, dot(axis, v));
  return [v[0] - along[0], v[1] - along[1], v[2] - along[2]];
}
