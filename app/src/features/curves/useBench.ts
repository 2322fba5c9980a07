import type { Axle, RideHeight, Target } from "@linkwright/kinematics";
import { useMemo } from "react";
import { heightsOf, ruleRange, type TravelRange } from "./series/heights.ts";
import { useSameWhileEqual, useSoundStudy } from "./useSoundStudy.ts";

export interface Bench {
  readonly axle: Axle;
  readonly heights: readonly RideHeight[];
  readonly targets: readonly Target[];
  readonly range: TravelRange;
}

/** What a study's screens solve and judge, each part the same object while it says the same. */
export function useBench(): Bench | null {
  const { study } = useSoundStudy();
  const axle = useSameWhileEqual(study?.axle ?? null);
  const heights = useSameWhileEqual(study ? heightsOf(study) : null);
  const targets = useSameWhileEqual(study?.targets ?? null);
  const range = useMemo(() => heights && ruleRange(heights), [heights]);
  return useMemo(
    () => (axle && heights && targets && range ? { axle, heights, targets, range } : null),
    [axle, heights, targets, range],
  );
}
