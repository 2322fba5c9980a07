// What the Jacobian gives at a solved pose: the screw of wheel travel, J ξ = unit bump, and the gain of the tie
// rod, Jᵀ y = ∂toe/∂ξ. Every gradient comes from here, none from differences.

import { transformDirection } from "../geometry/pose.ts";
import type { Twist } from "../geometry/twist.ts";
import type { Direction, Vec3 } from "../geometry/vec3.ts";
import { setBodyPoint, setValue } from "../solver/constraints.ts";
import { solveAdjoint, solveDriveTwist } from "../solver/continuation.ts";
import type { Rad } from "../units.ts";
import { type CornerSolver, innerJointAt, POSE_NUMBERS, poseAt } from "./cornerSolver.ts";

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
  standAt(solver, poses, index, inputs);
  if (!solveDriveTwist(system, solver.wheelHeight)) return null;
  const { step } = system;
  const number = (k: number) => step[k] as number;
  return {
    velocity: [number(0), number(1), number(2)],
    angular: [number(3), number(4), number(5)],
  };
}

/**
 * d(toe)/d(error of the tie rod's row) at that pose, rad/mm: the first component that matters of Jᵀ y = ∂toe/∂ξ.
 * A rod 1 mm longer changes toe by this much; a joint that moves by w along the rod, away from the inner joint,
 * by −w times it. Null where the Jacobian is singular.
 */
export function tieRodGainRad(
  solver: CornerSolver,
  poses: Float64Array,
  index: number,
  inputs: { readonly travel: number; readonly steer: number },
): Rad | null {
  const { system, design } = solver;
  standAt(solver, poses, index, inputs);
  const u_V_spin = transformDirection(poseAt(poses, index), design.u_K_spin);
  if (!solveAdjoint(system, [0, 0, 0, ...toeGradient(u_V_spin, design.outward)])) return null;
  return system.step[solver.tieRod] as number;
}

function standAt(
  solver: CornerSolver,
  poses: Float64Array,
  index: number,
  { travel, steer }: { readonly travel: number; readonly steer: number },
): void {
  const at = index * POSE_NUMBERS;
  solver.system.pose.set(poses.subarray(at, at + POSE_NUMBERS));
  setBodyPoint(solver.system, solver.tieRod, innerJointAt(solver, steer));
  setValue(solver.system, solver.wheelHeight, solver.design.p_K_wheelCentre[2] + travel);
}

/** ∂toe/∂ω: toe = atan2(e.x, s·e.y) and ė = ω × e. */
function toeGradient(e: Direction<"V">, outward: 1 | -1): Vec3 {
  const level = e[0] * e[0] + e[1] * e[1];
  return [(outward * e[0] * e[2]) / level, (outward * e[1] * e[2]) / level, -outward];
}
