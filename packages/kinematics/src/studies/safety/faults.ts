// What can kill: a steering that turns the wrong way, a tie rod near its dead point, a lock out of reach.

import { TOGGLE_AMBER_DEG, TOGGLE_RED_DEG } from "../../metrics/toggle.ts";
import type { Axle } from "../../model/axle.ts";
import type { Side } from "../../model/design.ts";
import { steeringKind, steeringLock } from "../../model/steering/index.ts";
import { sweepAxle } from "../../sweeps/sweepAxle.ts";
import type { Deg } from "../../units.ts";
import { type Band, bandTravels } from "../bumpSteer.ts";
import { steerPerInput } from "./steeringDirection.ts";

export type Fault =
  /** Turning left steers the car right. */
  | { readonly kind: "steersBackwards"; readonly severity: "red" }
  /** The document does not say which way the rack moves when the driver turns left. */
  | { readonly kind: "steeringNotStated"; readonly severity: "amber" }
  | {
      readonly kind: "nearToggle";
      readonly severity: "red" | "amber";
      readonly side: Side;
      readonly marginDeg: Deg;
      readonly wheelUp: number;
      readonly travel: number;
      readonly steer: number;
    }
  /** The linkage runs out before full lock or before the end of the band. */
  | {
      readonly kind: "outOfReach";
      readonly severity: "red";
      readonly side: Side;
      readonly wheelUp: number;
      readonly steer: number;
      readonly lastTravel: number | null;
      readonly link: string;
    };

/** mm of travel, and parts of a lock, between the positions that are tried: a margin is smooth between them. */
const TRAVEL_STEP = 10;
const LOCK_PARTS = 4;

/** Every fault of an axle at its ride heights (the design height when it has none), worst margin a height. */
export function findFaults(axle: Axle, heights: readonly Band[]): Fault[] {
  const judged = heights.length > 0 ? heights : [{ wheelUp: 0, band: [0, 0] as const }];
  return [...directionFaults(axle), ...judged.flatMap((height) => heightFaults(axle, height))];
}

function directionFaults(axle: Axle): Fault[] {
  const perInput = steerPerInput(axle);
  if (perInput === null) return [];
  const sign = steeringKind(axle.steering).leftTurnSign(axle.steering);
  if (sign === null) return [{ kind: "steeringNotStated", severity: "amber" }];
  return sign * perInput < 0 ? [{ kind: "steersBackwards", severity: "red" }] : [];
}

function heightFaults(axle: Axle, { wheelUp, band }: Band): Fault[] {
  const lock = steeringLock(axle.steering);
  const parts = Array.from({ length: 2 * LOCK_PARTS + 1 }, (_, k) => (lock * (k - LOCK_PARTS)) / LOCK_PARTS);
  const travels = bandTravels(band, TRAVEL_STEP).map((travel) => wheelUp + travel);
  const sweep = sweepAxle(axle, { travels, steers: lock === 0 ? [0] : parts, wheelUp });
  const outOfReach = sweep.ends.map(
    (end): Fault => ({ kind: "outOfReach", severity: "red", wheelUp, ...end }),
  );
  let worst: Extract<Fault, { kind: "nearToggle" }> | null = null;
  for (const { travel, steer, left, right } of sweep.rows) {
    for (const [side, row] of [["left", left] as const, ["right", right] as const]) {
      const marginDeg = row?.toggleMarginDeg ?? null;
      if (marginDeg === null || marginDeg >= (worst?.marginDeg ?? TOGGLE_AMBER_DEG)) continue;
      const severity = marginDeg < TOGGLE_RED_DEG ? "red" : "amber";
      worst = { kind: "nearToggle", severity, side, marginDeg, wheelUp, travel, steer };
    }
  }
  return worst === null ? outOfReach : [...outOfReach, worst];
}
