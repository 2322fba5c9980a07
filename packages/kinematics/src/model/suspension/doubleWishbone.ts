// Two wishbones: each is two links that share their outer point.

import type { DistanceRow } from "../../geometry/rows.ts";
import { between, cross, distance, findUnit, norm } from "../../geometry/vec3.ts";
import { invariant } from "../../invariant.ts";
import type { DoubleWishbone, Wishbone } from "../axle.ts";
import type { Issue, Path } from "../issue.ts";
import { SHORTEST_LINK, tooClose } from "../separation.ts";
import type { HardpointName, HingedArm, SuspensionKind } from "./kind.ts";

export const doubleWishbone: SuspensionKind<DoubleWishbone> = {
  hardpoints: [...armHardpoints("lowerArm", "Lower arm"), ...armHardpoints("upperArm", "Upper arm")],

  check(suspension, path) {
    const { lowerArm, upperArm } = suspension;
    return [
      ...checkArm(lowerArm, [...path, "lowerArm"]),
      ...checkArm(upperArm, [...path, "upperArm"]),
      ...tooClose(
        { point: upperArm.ballJoint, path: [...path, "upperArm", "ballJoint"] },
        { point: lowerArm.ballJoint, name: "the lower ball joint" },
      ),
    ];
  },

  parts({ lowerArm, upperArm }) {
    return {
      rows: [...armLinks("lowerArm", lowerArm), ...armLinks("upperArm", upperArm)],
      steeringAxis: { lower: lowerArm.ballJoint, upper: upperArm.ballJoint },
      bodyPoints: {
        "lowerArm.frontPivot": lowerArm.frontPivot,
        "lowerArm.rearPivot": lowerArm.rearPivot,
        "upperArm.frontPivot": upperArm.frontPivot,
        "upperArm.rearPivot": upperArm.rearPivot,
      },
      knucklePoints: {
        "lowerArm.ballJoint": lowerArm.ballJoint,
        "upperArm.ballJoint": upperArm.ballJoint,
      },
      lowerArm: hinge(lowerArm),
      upperArm: hinge(upperArm),
    };
  },
};

function armHardpoints(arm: "lowerArm" | "upperArm", group: string): HardpointName[] {
  return [
    { path: [arm, "frontPivot"], group, label: "front pivot" },
    { path: [arm, "rearPivot"], group, label: "rear pivot" },
    { path: [arm, "ballJoint"], group, label: "ball joint" },
  ];
}

function armLinks(name: string, arm: Wishbone): DistanceRow[] {
  return (["frontPivot", "rearPivot"] as const).map((pivot) => ({
    kind: "distance",
    name: `${name}.${pivot}`,
    bodyPoint: arm[pivot],
    knucklePoint: arm.ballJoint,
    length: distance(arm[pivot], arm.ballJoint),
  }));
}

function hinge(arm: Wishbone): HingedArm {
  const hingeAxis = findUnit(between(arm.rearPivot, arm.frontPivot));
  invariant(hingeAxis !== null, `wishbone pivots coincide at ${arm.frontPivot}`);
  return { hingePoint: arm.rearPivot, hingeAxis, ballJoint: arm.ballJoint };
}

function checkArm(arm: Wishbone, path: Path): Issue[] {
  const pivots = tooClose(
    { point: arm.rearPivot, path: [...path, "rearPivot"] },
    { point: arm.frontPivot, name: "the front pivot" },
  );
  if (pivots.length > 0) return pivots;
  const axis = between(arm.rearPivot, arm.frontPivot);
  const radius = norm(cross(axis, between(arm.rearPivot, arm.ballJoint))) / norm(axis);
  if (radius >= SHORTEST_LINK) return [];
  return [
    {
      path: [...path, "ballJoint"],
      value: arm.ballJoint,
      problem: "The ball joint lies on the line through the arm's two pivots, so the arm cannot swing.",
      hint: "Move the ball joint away from the pivot axis.",
    },
  ];
}
