// Parts that differ from the drawing: each deviation belongs to one part, and every other dimension stays as drawn.

import type { Arm, Parts } from "./corner.ts";
import { distance, type Vector } from "./vector.ts";

const AXES = ["x", "y", "z"];

function shifted(point: Vector, axis: string, by: number): Vector {
  const moved: [number, number, number] = [...point];
  const index = AXES.indexOf(axis);
  if (index < 0) throw new Error(`no axis ${axis}`);
  moved[index] = moved[index]! + by;
  return moved;
}

/** A bracket that is off moves the pivot and leaves the arm's lengths; an arm that is off is as long as made to its drawn pivots. */
function deviateArm(arm: Arm, drawn: Arm, what: string, axis: string, by: number): Arm {
  if (what === "frontPivot") return { ...arm, frontPivot: shifted(arm.frontPivot, axis, by) };
  if (what === "rearPivot") return { ...arm, rearPivot: shifted(arm.rearPivot, axis, by) };
  const joint = shifted(arm.drawnBallJoint, axis, by);
  return {
    ...arm,
    drawnBallJoint: joint,
    frontLength: distance(joint, drawn.frontPivot),
    rearLength: distance(joint, drawn.rearPivot),
  };
}

function deviateOne(parts: Parts, drawn: Parts, coordinate: string, by: number): Parts {
  const [part, ...rest] = coordinate.split(".") as [string, ...string[]];
  const axis = rest.at(-1)!;
  if (part === "frame") {
    const arm = rest[0] as "lowerArm" | "upperArm";
    return { ...parts, [arm]: deviateArm(parts[arm], drawn[arm], rest[1]!, axis, by) };
  }
  if (part === "lowerArm" || part === "upperArm") {
    return { ...parts, [part]: deviateArm(parts[part], drawn[part], "ballJoint", axis, by) };
  }
  if (part === "rack") return { ...parts, rackInner: shifted(parts.rackInner, axis, by) };
  const joint = rest[0] as "lowerBallJoint" | "upperBallJoint" | "steeringArm";
  return { ...parts, knuckle: { ...parts.knuckle, [joint]: shifted(parts.knuckle[joint], axis, by) } };
}

/** `deviations` by coordinate name, such as `frame.upperArm.frontPivot.z` or `knuckle.steeringArm.z`, in mm. */
export function deviate(parts: Parts, deviations: Readonly<Record<string, number>>): Parts {
  return Object.entries(deviations).reduce(
    (soFar, [coordinate, by]) => deviateOne(soFar, parts, coordinate, by),
    parts,
  );
}
