// The instantaneous motion of a rigid body, told at the car's origin.

import { cross, type Direction, type Point, type Vec3 } from "./vec3.ts";

/** Velocity of the body point that passes the origin of V, and angular velocity (rad), both in V. */
export interface Twist {
  readonly velocity: Vec3;
  readonly angular: Vec3;
}

/** The velocity of the body point that is at `p_V`: v₀ + ω × p. */
export function pointVelocity(twist: Twist, p_V: Point<"V">): Direction<"V"> {
  const turn = cross(twist.angular, p_V);
  return [twist.velocity[0] + turn[0], twist.velocity[1] + turn[1], twist.velocity[2] + turn[2]];
}

/** The rate of a direction fixed in the body: ω × u. */
export function directionRate(twist: Twist, u_V: Direction<"V">): Direction<"V"> {
  return cross(twist.angular, u_V);
}
