// What a study asks for beside its axle: ride heights, targets, datum.

import { cross, dot, findUnit, norm } from "../geometry/vec3.ts";
import { degFromRad } from "../units.ts";
import type { Issue } from "./issue.ts";
import type { Datum, RideHeight, Study, Target } from "./study.ts";

/** °. A datum's axes further than this from a right angle were mistyped, not measured. */
const SQUARE_WITHIN = 0.1;

export function checkStudyLists(study: Study): Issue[] {
  return [
    ...study.rideHeights.flatMap(checkRideHeight),
    ...study.rideHeights.flatMap((height, index) => checkNameIsNew(study.rideHeights, height, index)),
    ...study.targets.flatMap(checkTarget),
    ...(study.datum ? checkDatum(study.datum) : []),
  ];
}

function checkRideHeight(height: RideHeight, index: number): Issue[] {
  const [from, to] = height.band;
  if (from <= 0 && to >= 0 && from < to) return [];
  return [
    {
      path: ["rideHeights", index, "band"],
      value: height.band,
      problem: `The band of "${height.name}" must run from droop (0 or less) to bump (0 or more).`,
      hint: "Give the travel about this ride height, for example [-50, 50].",
    },
  ];
}

function checkNameIsNew(heights: readonly RideHeight[], height: RideHeight, index: number): Issue[] {
  if (heights.findIndex((other) => other.name === height.name) === index) return [];
  return [
    {
      path: ["rideHeights", index, "name"],
      value: height.name,
      problem: `Another ride height is called "${height.name}".`,
      hint: "Give each ride height a name of its own.",
    },
  ];
}

function checkTarget(target: Target, index: number): Issue[] {
  const path = ["targets", index];
  if (target.min === null && target.max === null) {
    return [
      {
        path,
        value: target,
        problem: "This target has neither a least nor a greatest value.",
        hint: "Give min, max or both, or remove the target.",
      },
    ];
  }
  if (target.min === null || target.max === null || target.min <= target.max) return [];
  return [
    {
      path: [...path, "min"],
      value: target.min,
      problem: `The least value is above the greatest, ${target.max}.`,
      hint: "Exchange the two.",
    },
  ];
}

function checkDatum(datum: Datum): Issue[] {
  const xAxis = findUnit(datum.xAxis);
  const zAxis = findUnit(datum.zAxis);
  if (xAxis === null || zAxis === null) {
    const name = xAxis === null ? "xAxis" : "zAxis";
    return [
      {
        path: ["datum", name],
        value: datum[name],
        problem: "This axis has no direction: all three numbers are 0.",
        hint: "Give a direction in the car's axes, for example [1, 0, 0].",
      },
    ];
  }
  const angleDeg = degFromRad(Math.atan2(norm(cross(xAxis, zAxis)), dot(xAxis, zAxis)));
  if (Math.abs(angleDeg - 90) <= SQUARE_WITHIN) return [];
  return [
    {
      path: ["datum", "zAxis"],
      value: datum.zAxis,
      problem: `The datum's x and z axes make ${angleDeg.toFixed(2)}°; they must be square.`,
      hint: "Give two directions at right angles.",
    },
  ];
}
