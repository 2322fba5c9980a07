// Toe, camber and the contact point, from the wheel's spin axis. e: unit vector along it, outboard.

import { rejectFrom } from "../geometry/rotation.ts";
import type { Twist } from "../geometry/twist.ts";
import { directionRate } from "../geometry/twist.ts";
import { type Direction, findUnit, offsetPoint, type Point } from "../geometry/vec3.ts";
import { type Deg, degFromRad, type Rad } from "../units.ts";

const UP: Direction<"V"> = [0, 0, 1];

/** Toe of one wheel, atan2(e.x, s·e.y): positive toe-in on both sides. ISO 8855 axes; `outward` s: +1 left. */
export function measureToeDeg(u_V_spin: Direction<"V">, outward: 1 | -1): Deg {
  return degFromRad(Math.atan2(u_V_spin[0], outward * u_V_spin[1]));
}

/** d(toe) for the motion `twist`, rad per unit of it: the derivative of atan2 along ė = ω × e. */
export function toeRateRad(u_V_spin: Direction<"V">, outward: 1 | -1, twist: Twist): Rad {
  const rate = directionRate(twist, u_V_spin);
  const along = u_V_spin[0];
  const out = outward * u_V_spin[1];
  return (out * rate[0] - along * outward * rate[1]) / (along * along + out * out);
}

/** Camber, asin(−e.z): positive when the top leans outboard. */
export function measureCamberDeg(u_V_spin: Direction<"V">): Deg {
  return degFromRad(Math.asin(Math.min(1, Math.max(-1, -u_V_spin[2]))));
}

/** d(camber) for the motion `twist`, rad per unit of it. */
export function camberRateRad(u_V_spin: Direction<"V">, twist: Twist): Rad {
  const rate = directionRate(twist, u_V_spin);
  return -rate[2] / Math.hypot(u_V_spin[0], u_V_spin[1]);
}

/** The lowest point of the circle of the loaded radius about the wheel centre, in the wheel plane. */
export function contactPoint(
  p_V_wheelCentre: Point<"V">,
  u_V_spin: Direction<"V">,
  loadedRadius: number,
): Point<"V"> {
  const upInPlane = findUnit(rejectFrom(u_V_spin, UP));
  // Only a wheel that lies flat on its side has no lowest point; the document bounds camber far from it.
  return upInPlane === null ? p_V_wheelCentre : offsetPoint(p_V_wheelCentre, upInPlane, -loadedRadius);
}
