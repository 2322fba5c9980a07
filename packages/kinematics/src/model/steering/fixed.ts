// A toe link on the body: its inner joint never moves.

import type { FixedSteering } from "../axle.ts";
import type { SteeringKind } from "./kind.ts";

export const fixed: SteeringKind<FixedSteering> = {
  unit: null,
  lock: () => 0,
  leftTurnSign: () => null,
  innerAt: (_steering, inner) => inner,
  innerRate: () => [0, 0, 0],
  check: () => [],
};
