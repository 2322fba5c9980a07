// What a ride height's bump steer comes to, in figures: the worse side of each.

import {
  type Axle,
  type BumpSteerCurve,
  bumpSteerCurves,
  type RideHeight,
  type Target,
  worseOf,
} from "@linkwright/kinematics";
import { BAND_STEP, bandCandidates, type Judgement, judge, worstOf } from "../targets/judge.ts";

export interface HeightFigures {
  readonly height: RideHeight;
  readonly peakToPeakDeg: number | null;
  /** Greatest |bump steer| in the band. */
  readonly worstDeg: number | null;
  /** At the ride height, positive toe-in in bump. */
  readonly gradientDegPerMm: number | null;
  /** Null without a target for bump steer. */
  readonly judgement: Judgement | null;
  readonly curves: readonly BumpSteerCurve[];
}

export function heightFigures(axle: Axle, height: RideHeight, targets: readonly Target[]): HeightFigures {
  const curves = bumpSteerCurves(axle, height, BAND_STEP);
  const worse = worseOf(curves);
  const target = targets.find(({ quantity }) => quantity === "bumpSteerDeg");
  return {
    height,
    peakToPeakDeg: worse?.peakToPeakDeg ?? null,
    worstDeg: worse?.maxDeg ?? null,
    gradientDegPerMm: steepest(curves),
    judgement: target
      ? worstOf(bandCandidates(curves).map((candidate) => judge(target, candidate, height.name)))
      : null,
    curves,
  };
}

function steepest(curves: readonly BumpSteerCurve[]): number | null {
  return curves.reduce<number | null>((worst, { gradientDegPerMm }) => {
    if (gradientDegPerMm === null) return worst;
    return worst === null || Math.abs(gradientDegPerMm) > Math.abs(worst) ? gradientDegPerMm : worst;
  }, null);
}
