// What a kind of suspension tells the rest of the engine. A new kind is one file that exports one of these.

import type { ConstraintRow } from "../../geometry/rows.ts";
import type { Direction, Point } from "../../geometry/vec3.ts";
import type { Issue, Path } from "../issue.ts";

/** An arm that turns about a line fixed in the body and carries a joint of the knuckle. */
export interface HingedArm {
  readonly hingePoint: Point<"V">;
  /** Unit. */
  readonly hingeAxis: Direction<"V">;
  /** A document point is also a knuckle point: the two frames coincide at the design position. */
  readonly ballJoint: Point<"K">;
}

export interface SuspensionParts {
  /** All rows but the tie rod: with it and the driven wheel height they fix the knuckle's pose. */
  readonly rows: readonly ConstraintRow[];
  /** Lower and upper point of the steering axis, or null for a kind that has none. */
  readonly steeringAxis: { readonly lower: Point<"K">; readonly upper: Point<"K"> } | null;
  /** Points by their path below `suspension`: fixed to the body, and carried by the knuckle. */
  readonly bodyPoints: Readonly<Record<string, Point<"V">>>;
  readonly knucklePoints: Readonly<Record<string, Point<"K">>>;
  readonly lowerArm: HingedArm | null;
  readonly upperArm: HingedArm | null;
}

/** A hardpoint of a kind: where it stands below `suspension`, and its plain name. */
export interface HardpointName {
  readonly path: readonly string[];
  readonly group: string;
  readonly label: string;
}

export interface SuspensionKind<S> {
  readonly hardpoints: readonly HardpointName[];
  /** Geometry that cannot be built; only called when every coordinate is a number within reach. */
  check(suspension: S, path: Path): readonly Issue[];
  /** Only called for a suspension that `check` finds nothing wrong with. */
  parts(suspension: S): SuspensionParts;
}
