// Which way the wheels go when the steering moves.

import { DESIGN_POSE, transformPoint } from "../../geometry/pose.ts";
import { between, dot, findUnit } from "../../geometry/vec3.ts";
import { invariant } from "../../invariant.ts";
import type { Axle } from "../../model/axle.ts";
import { SIDES } from "../../model/design.ts";
import { steeringKind, steeringUnit } from "../../model/steering/index.ts";
import { prepareCorner } from "../../pose/cornerSolver.ts";
import { tieRodGainRad } from "../../pose/gradients.ts";
import { degFromRad } from "../../units.ts";

/**
 * Mean steer of both wheels per unit of steering input straight ahead, degrees, positive to the left. A joint
 * that moves by δ along the rod outwards acts like a rod longer by it: d(toe) = gain·(u·δ), u from inner to outer.
 * Null when nothing steers or the axle does not assemble.
 */
export function steerPerInput(axle: Axle): number | null {
  if (steeringUnit(axle.steering) === null) return null;
  const kind = steeringKind(axle.steering);
  let sum = 0;
  for (const side of SIDES) {
    const prepared = prepareCorner(axle, side);
    if (prepared.status !== "ready") return null;
    const { solver } = prepared;
    const { inner, outer } = solver.design.tieRod;
    const gainRad = tieRodGainRad(solver, solver.start, 0, { travel: 0, steer: 0 });
    const along = findUnit(between(inner, transformPoint(DESIGN_POSE, outer)));
    invariant(along !== null, "a tie rod has a length");
    if (gainRad === null) return null;
    const toePerInput = gainRad * dot(along, kind.innerRate(axle.steering, inner, 0));
    sum += -solver.design.outward * toePerInput;
  }
  return degFromRad(sum / SIDES.length);
}
