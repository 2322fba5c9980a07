// A rack carries both inner joints along its axis; `steer` is mm, positive to the left.

import { findUnit, offsetPoint, type Vec3 } from "../../geometry/vec3.ts";
import { invariant } from "../../invariant.ts";
import type { RackSteering } from "../axle.ts";
import type { SteeringKind } from "./kind.ts";

export const rack: SteeringKind<RackSteering> = {
  unit: "mm",
  lock: (steering) => steering.travel,
  leftTurnSign: ({ wheelLeftMoves }) => {
    if (wheelLeftMoves === undefined) return null;
    return wheelLeftMoves === "left" ? 1 : -1;
  },
  innerAt: (steering, inner, steer) => offsetPoint(inner, unitAxis(steering), steer),
  innerRate: (steering) => unitAxis(steering),
  check(steering, path) {
    if (steering.axis[1] > 0) return [];
    return [
      {
        path: [...path, "axis"],
        value: steering.axis,
        problem: "The rack's axis must point to the left: its y must be greater than 0.",
        hint: "Turn the axis round (change all three signs), or use [0, 1, 0] for a rack square to the car.",
      },
    ];
  },
};

function unitAxis(steering: RackSteering): Vec3 {
  const axis = findUnit(steering.axis);
  invariant(axis !== null, "the rack's axis has no direction");
  return axis;
}
