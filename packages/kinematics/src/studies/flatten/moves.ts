// What a shop can move to flatten bump steer: each a change to the drawing, in mm.

import { add, scale, type Vec3 } from "../../geometry/vec3.ts";
import type { Axle, Coordinates, Corner } from "../../model/axle.ts";
import type { Side } from "../../model/design.ts";

export const MOVES = [
  "rackHeight",
  "rackForeAft",
  "innerWidth",
  "outerHeight",
  "outerForeAft",
  "outerWidth",
] as const;
export type Move = (typeof MOVES)[number];

/** Which joint a move shifts, and the left corner's shift per mm; on the right y is mirrored. */
const SHIFTS: Readonly<Record<Move, { readonly joint: "inner" | "outer"; readonly left: Vec3 }>> = {
  rackHeight: { joint: "inner", left: [0, 0, 1] },
  rackForeAft: { joint: "inner", left: [1, 0, 0] },
  innerWidth: { joint: "inner", left: [0, 1, 0] },
  outerHeight: { joint: "outer", left: [0, 0, 1] },
  outerForeAft: { joint: "outer", left: [1, 0, 0] },
  outerWidth: { joint: "outer", left: [0, 1, 0] },
};

export interface JointShift {
  readonly inner: Vec3;
  readonly outer: Vec3;
}

const NO_SHIFT: Vec3 = [0, 0, 0];

/** How far each tie-rod joint of a side goes per mm of a move, in the car's axes. */
export function jointShift(move: Move, side: Side): JointShift {
  const { joint, left } = SHIFTS[move];
  const shift: Vec3 = side === "left" ? left : [left[0], -left[1], left[2]];
  return joint === "inner" ? { inner: shift, outer: NO_SHIFT } : { inner: NO_SHIFT, outer: shift };
}

/** The axle with both corners' joints moved by `mm`: a point moves, everything else stays as drawn. */
export function applyMove(axle: Axle, move: Move, mm: number): Axle {
  return {
    ...axle,
    left: shiftCorner(axle.left, jointShift(move, "left"), mm),
    right: axle.right === "mirror" ? "mirror" : shiftCorner(axle.right, jointShift(move, "right"), mm),
  };
}

/** Why this axle's parts do not allow a move; null when they do. */
export function whyNotMove(axle: Axle, move: Move): string | null {
  if (move !== "innerWidth") return null;
  const { steering } = axle;
  if (steering.type !== "rack" || steering.bought !== true) return null;
  return "The rack is a bought part: the distance between its inner joints is fixed.";
}

function shiftCorner(corner: Corner, shift: JointShift, mm: number): Corner {
  const move = (point: Coordinates, by: Vec3): Coordinates =>
    by === NO_SHIFT ? point : add(point, scale(by, mm));
  const { inner, outer } = corner.tieRod;
  return { ...corner, tieRod: { inner: move(inner, shift.inner), outer: move(outer, shift.outer) } };
}
