// What a kind of steering tells the rest of the engine. A new kind is one file that exports one of these.

import type { Direction, Point } from "../../geometry/vec3.ts";
import type { Issue, Path } from "../issue.ts";

export interface SteeringKind<S> {
  /** Unit of `steer`, or null when nothing steers. */
  readonly unit: "mm" | "°" | null;
  /** Full lock either way, in that unit; 0 when nothing steers. */
  lock(steering: S): number;
  /** Sign of `steer` when the driver turns left, or null when the document does not say. */
  leftTurnSign(steering: S): 1 | -1 | null;
  /** Where an inner joint drawn at `inner` stands after `steer`. */
  innerAt(steering: S, inner: Point<"V">, steer: number): Point<"V">;
  /** d(inner joint)/d(steer) there. */
  innerRate(steering: S, inner: Point<"V">, steer: number): Direction<"V">;
  check(steering: S, path: Path): readonly Issue[];
}
