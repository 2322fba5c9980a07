// From a corner of the document to what the solver and the metrics work with.

import type { ConstraintRow } from "../geometry/rows.ts";
import { type Direction, distance, type Point } from "../geometry/vec3.ts";
import { radFromDeg } from "../units.ts";
import type { Axle, Corner, Spring, Wheel } from "./axle.ts";
import { rightCorner } from "./mirror.ts";
import { type SuspensionParts, suspensionKind } from "./suspension/index.ts";

export type Side = "left" | "right";
export const SIDES: readonly Side[] = ["left", "right"];

/** The name that the tie rod's row bears; the others are named by their place in the document. */
export const TIE_ROD = "tieRod";

export interface CornerDesign {
  readonly side: Side;
  /** +1 left, −1 right: the one sign in which the sides differ. */
  readonly outward: 1 | -1;
  readonly parts: SuspensionParts;
  readonly tieRod: {
    readonly inner: Point<"V">;
    readonly outer: Point<"K">;
    readonly length: number;
  };
  readonly wheel: Wheel;
  readonly p_K_wheelCentre: Point<"K">;
  /** Unit vector along the spin axis, outboard. */
  readonly u_K_spin: Direction<"K">;
  readonly spring: Spring | null;
}

export function designCorner(axle: Axle, side: Side): CornerDesign {
  const corner: Corner = side === "left" ? axle.left : rightCorner(axle);
  const outward = side === "left" ? 1 : -1;
  const { inner, outer } = corner.tieRod;
  return {
    side,
    outward,
    parts: suspensionKind(corner.suspension).parts(corner.suspension),
    tieRod: { inner, outer, length: distance(inner, outer) },
    wheel: corner.wheel,
    p_K_wheelCentre: corner.wheel.centre,
    u_K_spin: spinAxis(corner.wheel, outward),
    spring: corner.spring ?? null,
  };
}

/** The tie rod as a row, from an inner joint that may have moved and with a length that may have been set. */
export function tieRodRow(design: CornerDesign, inner: Point<"V">, length: number): ConstraintRow {
  return { kind: "distance", name: TIE_ROD, bodyPoint: inner, knucklePoint: design.tieRod.outer, length };
}

/** The outboard spin axis that has the document's toe and camber: the inverse of toe and camber's definitions. */
function spinAxis(wheel: Wheel, outward: 1 | -1): Direction<"K"> {
  const toeRad = radFromDeg(wheel.toeDeg);
  const camberRad = radFromDeg(wheel.camberDeg);
  const level = Math.cos(camberRad);
  return [level * Math.sin(toeRad), outward * level * Math.cos(toeRad), -Math.sin(camberRad)];
}
