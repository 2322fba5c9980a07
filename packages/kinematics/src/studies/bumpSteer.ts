// Bump steer over a ride height's band, with the tie rod set there.

import { transformDirection } from "../geometry/pose.ts";
import { measureToeDeg, toeRateRad } from "../metrics/wheel.ts";
import type { Axle } from "../model/axle.ts";
import { SIDES, type Side } from "../model/design.ts";
import type { RideHeight } from "../model/study.ts";
import {
  type CornerSolver,
  poseAt,
  prepareCorner,
  steerTo,
  type TravelColumn,
  travelColumn,
} from "../pose/cornerSolver.ts";
import { bumpTwistAt } from "../pose/gradients.ts";
import { type Deg, degFromRad } from "../units.ts";

/** Where toe is set and how far about it bump steer counts. */
export type Band = Pick<RideHeight, "wheelUp" | "band">;

export interface BumpSteerCurve {
  readonly side: Side;
  readonly wheelUp: number;
  /** About the ride height, ascending; only what the linkage reaches. */
  readonly travels: readonly number[];
  /** toe(wheelUp + travel) − toe(wheelUp) at the same rod length; positive toe-in. */
  readonly bumpSteerDeg: readonly Deg[];
  /** d(toe)/d(travel) at the ride height; null when that height is out of reach. */
  readonly gradientDegPerMm: number | null;
  /** The part of the asked band that is reached; null when the ride height itself is not. */
  readonly reached: readonly [number, number] | null;
}

export interface BumpSteerFigures {
  readonly rmsDeg: number;
  /** Greatest |bump steer| in the band. */
  readonly maxDeg: number;
  readonly peakToPeakDeg: number;
}

/** Travels of a band, evenly spaced, both ends and 0 among them; the spacing is at most `step`. */
export function bandTravels([from, to]: readonly [number, number], step: number): number[] {
  const part = (end: number): number[] => {
    const count = Math.ceil(Math.abs(end) / step - 1e-9);
    return Array.from({ length: count }, (_, k) => (end * (k + 1)) / count);
  };
  return [...part(from).reverse(), 0, ...part(to)];
}

/** One side's bump steer at `travels` about a ride height. Call it with an axle that checkAxle accepts. */
export function bumpSteerCurve(
  axle: Axle,
  side: Side,
  wheelUp: number,
  travels: readonly number[],
): BumpSteerCurve {
  const prepared = prepareCorner(axle, side, wheelUp);
  if (prepared.status !== "ready") {
    return { side, wheelUp, travels: [], bumpSteerDeg: [], gradientDegPerMm: null, reached: null };
  }
  const { solver } = prepared;
  steerTo(solver, 0);
  const column = travelColumn(
    solver,
    travels.map((travel) => wheelUp + travel),
  );
  const at = travels.map((_, index) => index).filter((index) => column.reached[index] === 1);
  const reached = at.map((index) => travels[index] as number);
  const staticToeDeg = toeAt(solver, solver.start, 0);
  return {
    side,
    wheelUp,
    travels: reached,
    bumpSteerDeg: at.map((index) => toeAt(solver, column.poses, index) - staticToeDeg),
    gradientDegPerMm: gradientAtRideHeight(solver),
    reached: [
      Math.min(0, ...column.ends.map((end) => end.lastTravel - wheelUp), ...reached),
      Math.max(0, ...column.ends.map((end) => end.lastTravel - wheelUp), ...reached),
    ],
  };
}

/** Both sides' curves over a band at most `step` apart. */
export function bumpSteerCurves(axle: Axle, height: Band, step: number): BumpSteerCurve[] {
  const travels = bandTravels(height.band, step);
  return SIDES.map((side) => bumpSteerCurve(axle, side, height.wheelUp, travels));
}

/** The figures of one curve; null for a curve without a point. */
export function summariseCurve({ bumpSteerDeg }: BumpSteerCurve): BumpSteerFigures | null {
  if (bumpSteerDeg.length === 0) return null;
  const squares = bumpSteerDeg.reduce((sum, value) => sum + value * value, 0);
  return {
    rmsDeg: Math.sqrt(squares / bumpSteerDeg.length),
    maxDeg: Math.max(...bumpSteerDeg.map(Math.abs)),
    peakToPeakDeg: Math.max(...bumpSteerDeg) - Math.min(...bumpSteerDeg),
  };
}

/** The worse side's figures, each by itself. */
export function worseOf(curves: readonly BumpSteerCurve[]): BumpSteerFigures | null {
  const figures = curves.map(summariseCurve).filter((each) => each !== null);
  if (figures.length === 0) return null;
  const worst = (key: keyof BumpSteerFigures) => Math.max(...figures.map((each) => each[key]));
  return { rmsDeg: worst("rmsDeg"), maxDeg: worst("maxDeg"), peakToPeakDeg: worst("peakToPeakDeg") };
}

function toeAt(solver: CornerSolver, poses: TravelColumn["poses"], index: number): Deg {
  const { design } = solver;
  return measureToeDeg(transformDirection(poseAt(poses, index), design.u_K_spin), design.outward);
}

function gradientAtRideHeight(solver: CornerSolver): number | null {
  const inputs = { travel: solver.wheelUp, steer: 0 };
  const twist = bumpTwistAt(solver, solver.start, 0, inputs);
  if (twist === null) return null;
  const u_V_spin = transformDirection(poseAt(solver.start), solver.design.u_K_spin);
  return degFromRad(toeRateRad(u_V_spin, solver.design.outward, twist));
}
