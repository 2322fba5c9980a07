// The hardpoints of an axle by plain name: one list for tables, views, comments and sheets.

import type { Axle, Coordinates, Corner } from "./axle.ts";
import type { Side } from "./design.ts";
import { mirrorPoint, rightCorner } from "./mirror.ts";
import { suspensionKind } from "./suspension/index.ts";

export interface Hardpoint {
  /** Where it stands in the axle document, as `left.suspension.lowerArm.frontPivot`. */
  readonly path: string;
  readonly side: Side;
  /** "Lower arm". */
  readonly group: string;
  /** "front pivot". */
  readonly label: string;
  /** In the car's axes, design position. */
  readonly point: Coordinates;
}

interface NamedPath {
  readonly path: readonly string[];
  readonly group: string;
  readonly label: string;
}

/**
 * Every hardpoint of both sides. Where the right is the mirror of the left its points are listed under
 * `right.…` with their mirrored coordinates, so that comments and sheets can speak of them.
 */
export function listHardpoints(axle: Axle): Hardpoint[] {
  return [...cornerHardpoints(axle.left, "left"), ...cornerHardpoints(rightCorner(axle), "right")];
}

/** The same axle with one hardpoint moved. On a mirrored axle a `right.…` path moves the left's twin. */
export function moveHardpoint(axle: Axle, path: string, point: Coordinates): Axle {
  const [side, ...rest] = path.split(".");
  if (side === "right" && axle.right === "mirror") {
    return { ...axle, left: withPoint(axle.left, rest, mirrorPoint(point)) };
  }
  if (side === "right") return { ...axle, right: withPoint(rightCorner(axle), rest, point) };
  return { ...axle, left: withPoint(axle.left, rest, point) };
}

function cornerHardpoints(corner: Corner, side: Side): Hardpoint[] {
  return namedPaths(corner).map(({ path, group, label }) => ({
    path: [side, ...path].join("."),
    side,
    group,
    label,
    point: pointAt(corner, path),
  }));
}

function namedPaths(corner: Corner): NamedPath[] {
  const suspension = suspensionKind(corner.suspension).hardpoints.map((named) => ({
    ...named,
    path: ["suspension", ...named.path],
  }));
  const spring: NamedPath[] = corner.spring
    ? [
        { path: ["spring", "body"], group: "Spring", label: "body end" },
        { path: ["spring", "lower"], group: "Spring", label: "lower end" },
      ]
    : [];
  const bar: NamedPath[] = corner.antiRollBar
    ? [
        { path: ["antiRollBar", "axis", "0"], group: "Anti-roll bar", label: "axis, first point" },
        { path: ["antiRollBar", "axis", "1"], group: "Anti-roll bar", label: "axis, second point" },
        { path: ["antiRollBar", "arm"], group: "Anti-roll bar", label: "arm end" },
        { path: ["antiRollBar", "link", "lower"], group: "Anti-roll bar", label: "link, lower end" },
      ]
    : [];
  return [
    ...suspension,
    { path: ["tieRod", "inner"], group: "Tie rod", label: "inner joint" },
    { path: ["tieRod", "outer"], group: "Tie rod", label: "outer joint" },
    { path: ["wheel", "centre"], group: "Wheel", label: "centre" },
    ...spring,
    ...bar,
  ];
}

function pointAt(corner: Corner, path: readonly string[]): Coordinates {
  let value: unknown = corner;
  for (const step of path) value = (value as Record<string, unknown>)[step];
  return value as Coordinates; // namedPaths lists only paths that the types say are points
}

function withPoint(corner: Corner, path: readonly string[], point: Coordinates): Corner {
  return replaceAt(corner, path, point) as Corner; // a point replaced by a point leaves the type as it was
}

function replaceAt(value: unknown, path: readonly string[], leaf: unknown): unknown {
  const [step, ...rest] = path;
  if (step === undefined) return leaf;
  if (Array.isArray(value)) {
    return value.map((item, index) => (String(index) === step ? replaceAt(item, rest, leaf) : item));
  }
  const record = value as Record<string, unknown>;
  return { ...record, [step]: replaceAt(record[step], rest, leaf) };
}
