// Bump steer at every point of every band of both sides, and how each move changes it.

import { transformDirection, transformPoint } from "../../geometry/pose.ts";
import { between, dot, findUnit, type Vec3 } from "../../geometry/vec3.ts";
import { invariant } from "../../invariant.ts";
import { measureToeDeg } from "../../metrics/wheel.ts";
import type { Axle } from "../../model/axle.ts";
import { SIDES, type Side } from "../../model/design.ts";
import { type CornerSolver, poseAt, prepareCorner, steerTo, travelColumn } from "../../pose/cornerSolver.ts";
import { tieRodGainRad } from "../../pose/gradients.ts";
import type { Evaluation } from "../../solver/leastSquares.ts";
import { degFromRad } from "../../units.ts";
import type { Band } from "../bumpSteer.ts";
import { bandTravels } from "../bumpSteer.ts";
import { jointShift, type Move } from "./moves.ts";

/**
 * The sides whose bump steer is not a copy of the other's: straight ahead a mirrored corner is the left's image,
 * whatever the steering.
 */
function differentSides(axle: Axle): readonly Side[] {
  return axle.right === "mirror" ? ["left"] : SIDES;
}

/**
 * Residuals in degrees of toe and their analytic columns, in one order: height, side, travel. Null when a ride
 * height is out of reach. A band that the linkage cannot follow to its end keeps its number of residuals: those
 * beyond the end repeat the last one, so that the sum stays comparable.
 */
export function bumpSteerResiduals(
  axle: Axle,
  moves: readonly Move[],
  heights: readonly Band[],
  step: number,
): Evaluation | null {
  const parts: SidePart[] = [];
  for (const height of heights) {
    const travels = bandTravels(height.band, step);
    for (const side of differentSides(axle)) {
      const part = sidePart(axle, side, moves, height.wheelUp, travels);
      if (part === null) return null;
      parts.push(part);
    }
  }
  return {
    residuals: Float64Array.from(parts.flatMap((part) => part.bumpSteerDeg)),
    columns: moves.map((_, k) => Float64Array.from(parts.flatMap((part) => part.columns[k] as number[]))),
  };
}

interface SidePart {
  readonly bumpSteerDeg: number[];
  readonly columns: number[][];
}

/**
 * With y the tie rod's gain at a travel and w = u·(R δouter − δinner) the rod's lengthening there per mm of a
 * move, the row's error changes by w − dL, where dL = w at the ride height keeps toe there (pose and toe at the
 * ride height do not depend on the move). So d(toe)/d(move) = −y·(w − w at the ride height).
 */
function sidePart(
  axle: Axle,
  side: Side,
  moves: readonly Move[],
  wheelUp: number,
  travels: readonly number[],
): SidePart | null {
  const prepared = prepareCorner(axle, side, wheelUp);
  if (prepared.status !== "ready") return null;
  const { solver } = prepared;
  steerTo(solver, 0);
  const absolute = travels.map((travel) => wheelUp + travel);
  const column = travelColumn(solver, absolute);
  const staticToeDeg = toeDegAt(solver, solver.start, 0);
  const atHeight = moves.map((move) => lengthening(solver, solver.start, 0, move));
  const part: SidePart = { bumpSteerDeg: [], columns: moves.map(() => []) };
  for (const index of reachedOrNearest(column.reached)) {
    const inputs = { travel: absolute[index] as number, steer: 0 };
    const gainRad = tieRodGainRad(solver, column.poses, index, inputs);
    if (gainRad === null) return null;
    part.bumpSteerDeg.push(toeDegAt(solver, column.poses, index) - staticToeDeg);
    for (const [k, move] of moves.entries()) {
      const w = lengthening(solver, column.poses, index, move) - (atHeight[k] as number);
      part.columns[k]?.push(-degFromRad(gainRad) * w);
    }
  }
  return part;
}

/** For each asked travel its own index where it was reached, else that of the nearest one that was. */
function reachedOrNearest(reached: Uint8Array): number[] {
  const good = [...reached.keys()].filter((index) => reached[index] === 1);
  invariant(good.length > 0, "a band holds its ride height, which was reached");
  return [...reached.keys()].map((index) =>
    good.reduce((best, other) => (Math.abs(other - index) < Math.abs(best - index) ? other : best)),
  );
}

/** mm by which the straight line between the rod's joints grows per mm of a move, at this pose. */
function lengthening(solver: CornerSolver, poses: Float64Array, index: number, move: Move): number {
  const { design } = solver;
  const pose = poseAt(poses, index);
  const along: Vec3 | null = findUnit(
    between(design.tieRod.inner, transformPoint(pose, design.tieRod.outer)),
  );
  invariant(along !== null, "a tie rod has a length at every pose");
  const shift = jointShift(move, design.side);
  return dot(along, transformDirection(pose, shift.outer)) - dot(along, shift.inner);
}

function toeDegAt(solver: CornerSolver, poses: Float64Array, index: number): number {
  const { design } = solver;
  return measureToeDeg(transformDirection(poseAt(poses, index), design.u_K_spin), design.outward);
}
