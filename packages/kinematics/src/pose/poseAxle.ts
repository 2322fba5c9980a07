// Where every hardpoint stands at a travel and steer: for pictures.

import { type Pose, transformDirection, transformPoint } from "../geometry/pose.ts";
import type { Axle, Coordinates } from "../model/axle.ts";
import { type CornerDesign, SIDES, type Side } from "../model/design.ts";
import { carryPoint } from "./carriers.ts";
import {
  type CornerSolver,
  innerJointAt,
  poseAt,
  prepareCorner,
  steerTo,
  travelColumn,
} from "./cornerSolver.ts";

export interface AxleInputs {
  /** Wheel travel from design of each side. */
  readonly travel: Readonly<Record<Side, number>>;
  readonly steer: number;
  /** Where toe is set; 0 is the design height. */
  readonly wheelUp?: number;
}

/** A corner's points by their path in the corner: `tieRod.outer`, `suspension.lowerArm.ballJoint`. */
export interface CornerPlacement {
  readonly points: Readonly<Record<string, Coordinates>>;
  readonly wheelCentre: Coordinates;
  /** Unit, outboard. */
  readonly spinAxis: Coordinates;
}

/** Both corners as they stand; null for a side that cannot be reached. */
export function poseAxle(axle: Axle, inputs: AxleInputs): Readonly<Record<Side, CornerPlacement | null>> {
  const [left = null, right = null] = SIDES.map((side) => placeCorner(axle, side, inputs));
  return { left, right };
}

function placeCorner(axle: Axle, side: Side, inputs: AxleInputs): CornerPlacement | null {
  const prepared = prepareCorner(axle, side, inputs.wheelUp ?? 0);
  if (prepared.status !== "ready") return null;
  const { solver } = prepared;
  if (steerTo(solver, inputs.steer).status === "stopped") return null;
  const column = travelColumn(solver, [inputs.travel[side]]);
  if (column.reached[0] !== 1) return null;
  return placement(solver, poseAt(column.poses), inputs.steer);
}

const STILL = { velocity: [0, 0, 0], angular: [0, 0, 0] } as const;

function placement(solver: CornerSolver, pose: Pose<"V", "K">, steer: number): CornerPlacement {
  const { design } = solver;
  const wheelCentre = transformPoint(pose, design.p_K_wheelCentre);
  return {
    points: {
      ...suspensionPoints(design, pose),
      ...springPoints(design, pose),
      "tieRod.inner": innerJointAt(solver, steer),
      "tieRod.outer": transformPoint(pose, design.tieRod.outer),
      "wheel.centre": wheelCentre,
    },
    wheelCentre,
    spinAxis: transformDirection(pose, design.u_K_spin),
  };
}

function suspensionPoints(design: CornerDesign, pose: Pose<"V", "K">): Record<string, Coordinates> {
  const { bodyPoints, knucklePoints } = design.parts;
  const entries: [string, Coordinates][] = [
    ...Object.entries(bodyPoints).map(([path, point]): [string, Coordinates] => [
      `suspension.${path}`,
      point,
    ]),
    ...Object.entries(knucklePoints).map(([path, point]): [string, Coordinates] => [
      `suspension.${path}`,
      transformPoint(pose, point),
    ]),
  ];
  return Object.fromEntries(entries);
}

function springPoints(design: CornerDesign, pose: Pose<"V", "K">): Record<string, Coordinates> {
  const { spring } = design;
  if (spring === null) return {};
  const lower = carryPoint(design, spring.on, spring.lower, pose, STILL);
  return { "spring.body": spring.body, ...(lower && { "spring.lower": lower.point }) };
}
