// Spring length and how far the spring moves per mm of wheel.

import { between, type Direction, dot, norm, type Point } from "../geometry/vec3.ts";

export interface SpringMeasure {
  readonly length: number;
  /** Spring ÷ wheel, −d(length)/d(travel): positive when the spring shortens in bump. */
  readonly motionRatio: number;
}

/** From the spring's two ends and the velocity of the moving one per mm of bump. Null for a spring of no length. */
export function measureSpring(
  p_V_body: Point<"V">,
  p_V_moving: Point<"V">,
  v_V_moving: Direction<"V">,
): SpringMeasure | null {
  const along = between(p_V_body, p_V_moving);
  const length = norm(along);
  return length === 0 ? null : { length, motionRatio: -dot(along, v_V_moving) / length };
}
