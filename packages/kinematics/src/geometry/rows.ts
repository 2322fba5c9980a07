// What can hold a rigid body, and what can drive it. No linkage is known here: a wishbone is two distances.

import type { Direction, Point } from "./vec3.ts";

/** A link of fixed length between a point of the car and a point of the moving body. One equation. */
export interface DistanceRow {
  readonly kind: "distance";
  readonly name: string;
  readonly bodyPoint: Point<"V">;
  readonly knucklePoint: Point<"K">;
  readonly length: number;
}

/** A point of the car that stays on a line fixed in the moving body. Two equations. */
export interface PointOnLineRow {
  readonly kind: "pointOnLine";
  readonly name: string;
  readonly bodyPoint: Point<"V">;
  readonly linePoint: Point<"K">;
  readonly lineDirection: Direction<"K">;
}

export type ConstraintRow = DistanceRow | PointOnLineRow;

/** One coordinate of a point of the moving body, along `direction`, is given. One equation. */
export interface DrivenPoint {
  readonly kind: "drivenPoint";
  readonly name: string;
  readonly point: Point<"K">;
  readonly direction: Direction<"V">;
  readonly value: number;
}

/** The component of a direction of the moving body along `along` is given. One equation. */
export interface DrivenDirection {
  readonly kind: "drivenDirection";
  readonly name: string;
  readonly direction: Direction<"K">;
  readonly along: Direction<"V">;
  readonly value: number;
}

export type Drive = DrivenPoint | DrivenDirection;
