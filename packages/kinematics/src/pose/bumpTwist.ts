// The instantaneous screw of wheel travel: J ξ = unit bump. Every gradient comes from it, none from differences.

import type { Twist } from "../geometry/twist.ts";
import { setBodyPoint, setValue } from "../solver/constraints.ts";
import { solveDriveTwist } from "../solver/continuation.ts";
import { type CornerSolver, innerJointAt, POSE_NUMBERS } from "./cornerSolver.ts";

/**
 * The knuckle's twist per mm of bump at the pose that starts at `index` of a solved column, at this travel and
 * steer. Null where the Jacobian is singular: the linkage is at its limit there.
 */
export function bumpTwistAt(
  solver: CornerSolver,
  poses: Float64Array,
  index: number,
  inputs: { readonly travel: number; readonly steer: number },
): Twist | null {
  const { system } = solver;
  const at = index * POSE_NUMBERS;
  system.pose.set(poses.subarray(at, at + POSE_NUMBERS));
  setBodyPoint(system, solver.tieRod, innerJointAt(solver, inputs.steer));
  setValue(system, solver.wheelHeight, solver.design.p_K_wheelCentre[2] + inputs.travel);
  if (!solveDriveTwist(system, solver.wheelHeight)) return null;
  const { step } = system;
  const number = (k: number) => step[k] as number;
  return {
    velocity: [number(0), number(1), number(2)],
    angular: [number(3), number(4), number(5)],
  };
}
