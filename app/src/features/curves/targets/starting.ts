// Targets to begin with, and the bands they count over. Common practice, per wheel; a shop sets its own.

import type { RideHeight, Study, Target } from "@linkwright/kinematics";
import { heightsOf } from "../series/heights.ts";

export interface StartingTarget {
  readonly id: string;
  readonly label: string;
  readonly bumpSteerDeg: number;
  /** Half of the band, mm. */
  readonly travel: number;
}

export const STARTING_TARGETS: readonly StartingTarget[] = [
  { id: "street", label: "Street", bumpSteerDeg: 0.15, travel: 50 },
  { id: "track", label: "Track or hill climb, after shimming", bumpSteerDeg: 0.05, travel: 40 },
];

interface TargetsAndHeights {
  readonly targets: readonly Target[];
  readonly rideHeights: readonly RideHeight[];
}

/** The study's targets with this one for bump steer, and every ride height's band set to the travel it counts over. */
export function withStartingTarget(
  study: Study,
  { bumpSteerDeg, travel }: StartingTarget,
): TargetsAndHeights {
  const others = study.targets.filter(({ quantity }) => quantity !== "bumpSteerDeg");
  return {
    targets: [{ quantity: "bumpSteerDeg", min: -bumpSteerDeg, max: bumpSteerDeg }, ...others],
    rideHeights: heightsOf(study).map((height) => ({ ...height, band: [-travel, travel] as const })),
  };
}
