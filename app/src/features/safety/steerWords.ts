// The steering input in words. `steer` is positive to the left of the car, but which lock that is depends on how the
// part is mounted: a person only ever hears of left lock and right lock.

import type { LengthUnit } from "@linkwright/contract";
import { type Axle, steeringLock, steeringUnit, steerPerInput } from "@linkwright/kinematics";
import { formatAngle, formatLength } from "../../lib/format.ts";

/** mm or degrees. Closer to full lock than this is full lock: a slider's steps need not divide it. */
const AT_LOCK = 0.05;

/**
 * Sign of `steer` when the driver turns left: as stated, or else the way that turns the car left. A car that steers
 * backwards keeps the driver's left.
 */
export function leftLockSign(axle: Axle): 1 | -1 {
  const { steering } = axle;
  if (steering.type === "rack" && steering.wheelLeftMoves !== undefined) {
    return steering.wheelLeftMoves === "left" ? 1 : -1;
  }
  return (steerPerInput(axle) ?? 1) < 0 ? -1 : 1;
}

export function formatSteer(axle: Axle, size: number, unit: LengthUnit): string {
  return steeringUnit(axle.steering) === "°" ? formatAngle(size, { decimals: 1 }) : formatLength(size, unit);
}

/** "straight ahead", "left lock", "12.0 mm towards right lock". */
export function steerInWords(axle: Axle, steer: number, unit: LengthUnit): string {
  const size = Math.abs(steer);
  if (size < AT_LOCK) return "straight ahead";
  const lock = steer * leftLockSign(axle) > 0 ? "left lock" : "right lock";
  return size > steeringLock(axle.steering) - AT_LOCK
    ? lock
    : `${formatSteer(axle, size, unit)} towards ${lock}`;
}
