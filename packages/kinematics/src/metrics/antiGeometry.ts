// Anti-dive, anti-lift and anti-squat: how much of the load transfer the links carry instead of the springs.

import type { Direction } from "../geometry/vec3.ts";
import type { Body } from "../model/axle.ts";
import { type Measured, measured, unmeasured } from "./measured.ts";

export interface AntiGeometry {
  readonly antiDivePercent: Measured;
  readonly antiLiftPercent: Measured;
  readonly antiSquatPercent: Measured;
}

/** One side's velocities per mm of bump, as points of the knuckle. */
export interface SideMotion {
  readonly v_V_contact: Direction<"V">;
  readonly v_V_wheelCentre: Direction<"V">;
}

/**
 * Front, outboard brakes: 100·frontBrakeShare·(v.x/v.z)·wheelbase/cgHeight, v of the contact point. Rear:
 * anti-lift 100·(1 − frontBrakeShare)·(−v.x/v.z)·wheelbase/cgHeight; anti-squat with driveShare and v of the
 * wheel centre. Mean of both sides. (v.x/v.z is the tangent of the angle of the line from the contact point to
 * the side-view instant centre: Barton & Fieldhouse, Automotive Chassis Engineering, 2018, ch. 3.)
 */
export function measureAntiGeometry(
  sides: readonly [SideMotion, SideMotion],
  car: { readonly position: "front" | "rear"; readonly wheelbase: number; readonly body?: Body | undefined },
): AntiGeometry {
  const brakeSlope = meanSlope(sides.map((side) => side.v_V_contact));
  const driveSlope = meanSlope(sides.map((side) => side.v_V_wheelCentre));
  const { frontBrakeShare, driveShare } = car.body ?? {};
  const rearBrakeShare = frontBrakeShare === undefined ? undefined : 1 - frontBrakeShare;
  const percent = (name: string, share: number | undefined, slope: number | null): Measured => {
    const cgHeight = car.body?.cgHeight;
    if (share === undefined) return unmeasured(`body.${name} is not given`);
    if (cgHeight === undefined) return unmeasured("body.cgHeight is not given");
    if (slope === null) return unmeasured("the wheel does not move up at this position");
    return measured((100 * share * slope * car.wheelbase) / cgHeight);
  };
  if (car.position === "front") {
    const rear = unmeasured("only a rear axle has it");
    return {
      antiDivePercent: percent("frontBrakeShare", frontBrakeShare, brakeSlope),
      antiLiftPercent: rear,
      antiSquatPercent: rear,
    };
  }
  return {
    antiDivePercent: unmeasured("only a front axle has it"),
    antiLiftPercent: percent("frontBrakeShare", rearBrakeShare, brakeSlope && -brakeSlope),
    antiSquatPercent: percent("driveShare", driveShare, driveSlope && -driveSlope),
  };
}

function meanSlope(velocities: readonly Direction<"V">[]): number | null {
  if (velocities.some((v) => v[2] === 0)) return null;
  return velocities.reduce((sum, v) => sum + v[0] / v[2], 0) / velocities.length;
}
