import { applyMove, bandTravels, bumpSteerCurve, summariseCurve } from "@linkwright/kinematics";
import { useMemo } from "react";
import type { TravelSeries } from "@/ui/rule/series.ts";
import { demoAxle } from "./demoAxle.ts";

export const DEMO_TRAVEL = 60;
/** Per wheel, for the street; common practice. */
export const STREET_TARGET_DEG = 0.15;

const TRAVELS = bandTravels([-DEMO_TRAVEL, DEMO_TRAVEL], 4);

function leftCurve(rackUp: number) {
  return bumpSteerCurve(applyMove(demoAxle, "rackHeight", rackUp), "left", 0, TRAVELS);
}

function pointsOf({ travels, bumpSteerDeg }: ReturnType<typeof leftCurve>) {
  return travels.map((travel, at) => ({ travel, value: bumpSteerDeg[at] ?? null }));
}

/** The start page's axle with its rack moved, solved by the same engine as in the workshop. */
export function useDemo(rackUp: number) {
  return useMemo(() => {
    const found: TravelSeries = {
      id: "found",
      label: "as found",
      look: "faint",
      points: pointsOf(leftCurve(0)),
    };
    const curve = leftCurve(rackUp);
    const now: TravelSeries = { id: "now", label: "now", look: "left", points: pointsOf(curve) };
    return {
      axle: applyMove(demoAxle, "rackHeight", rackUp),
      series: rackUp === 0 ? [now] : [found, now],
      worstDeg: summariseCurve(curve)?.maxDeg ?? null,
    };
  }, [rackUp]);
}
