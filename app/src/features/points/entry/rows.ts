// The hardpoints of one side as a table lists them, with what is kept beside the drawing laid over it.

import {
  type Axle,
  type Coordinates,
  type Hardpoint,
  listHardpoints,
  type Path,
  type Side,
} from "@linkwright/kinematics";
import { type Kept, keptAt } from "./attempt.ts";

export type AxisIndex = 0 | 1 | 2;
export const AXES = [0, 1, 2] as const;
export const AXIS_NAMES = ["X ahead", "Y left", "Z up"] as const;

export interface PointRow extends Hardpoint {
  readonly editPath: Path;
  /** As typed where it is kept, else as drawn. */
  readonly shown: Coordinates;
  readonly kept: Kept | undefined;
}

export interface PointGroup {
  readonly group: string;
  readonly rows: readonly PointRow[];
}

/** The side whose points are written in the document: a mirrored right side has none of its own. */
export function drawnSide(axle: Axle, side: Side): Side {
  return axle.right === "mirror" ? "left" : side;
}

export function pointGroups(axle: Axle, side: Side, kept: readonly Kept[]): PointGroup[] {
  const groups = new Map<string, PointRow[]>();
  for (const hardpoint of listHardpoints(axle)) {
    if (hardpoint.side !== drawnSide(axle, side)) continue;
    const row = pointRow(hardpoint, kept);
    groups.set(hardpoint.group, [...(groups.get(hardpoint.group) ?? []), row]);
  }
  return [...groups].map(([group, rows]) => ({ group, rows }));
}

/** A hardpoint's name as the picture tells it → the one that is listed: a mirrored right point is its left twin. */
export function listedPoint(axle: Axle, hardpoint: string): string {
  return axle.right === "mirror" ? hardpoint.replace(/^right\./, "left.") : hardpoint;
}

export function sideOfPoint(hardpoint: string): Side {
  return hardpoint.startsWith("right.") ? "right" : "left";
}

export function fieldOf(hardpoint: string, axis: AxisIndex): string {
  return `${hardpoint} ${axis}`;
}

export function withCoordinate(point: Coordinates, axis: AxisIndex, value: number): Coordinates {
  return [axis === 0 ? value : point[0], axis === 1 ? value : point[1], axis === 2 ? value : point[2]];
}

function pointRow(hardpoint: Hardpoint, kept: readonly Kept[]): PointRow {
  const editPath = editPathOf(hardpoint.path);
  const found = keptAt(kept, editPath);
  // Kept under a point's own path there can only be a point.
  return {
    ...hardpoint,
    editPath,
    kept: found,
    shown: (found?.change.to as unknown as Coordinates) ?? hardpoint.point,
  };
}

/** `left.antiRollBar.axis.0` in the study document: numbers lead into lists. */
export function editPathOf(hardpoint: string): Path {
  return ["axle", ...hardpoint.split(".").map((step) => (/^\d+$/.test(step) ? Number(step) : step))];
}
