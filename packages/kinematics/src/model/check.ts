// Geometry that no metal can have: refused with path, value and a hint. The shape of the document is for the
// contract to parse; every number here is finite.

import { norm } from "../geometry/vec3.ts";
import type { Axle, Coordinates, Corner } from "./axle.ts";
import type { Side } from "./design.ts";
import type { Issue, Path } from "./issue.ts";
import { rightCorner } from "./mirror.ts";
import { tooClose } from "./separation.ts";
import { steeringKind } from "./steering/index.ts";
import { suspensionKind } from "./suspension/index.ts";

/** mm. No point of one axle lies further from the origin; a larger figure is a slip of unit or of a digit. */
const FURTHEST = 5000;

/** Everything about an axle's geometry that cannot be built, but for whether it assembles: see checkAxle. */
export function checkGeometry(axle: Axle): Issue[] {
  const reach = [
    ...pointsOf(axle.left, ["left"]),
    ...(axle.right === "mirror" ? [] : pointsOf(axle.right, ["right"])),
  ].flatMap(({ point, path }) => checkReach(point, path));
  // Lengths and axes of points that are out of reach say nothing more.
  if (reach.length > 0) return reach;
  return [
    ...checkCorner(axle.left, "left"),
    ...(axle.right === "mirror" ? [] : checkCorner(rightCorner(axle), "right")),
    ...steeringKind(axle.steering).check(axle.steering, ["steering"]),
  ];
}

function checkCorner(corner: Corner, side: Side): Issue[] {
  const path: Path = [side];
  const { wheel, tieRod, spring, suspension } = corner;
  return [
    ...checkWheelSide(wheel.centre, side),
    ...suspensionKind(suspension).check(suspension, [...path, "suspension"]),
    ...tooClose(
      { point: tieRod.outer, path: [...path, "tieRod", "outer"] },
      { point: tieRod.inner, name: "the tie rod's inner joint" },
    ),
    ...(spring
      ? tooClose(
          { point: spring.lower, path: [...path, "spring", "lower"] },
          { point: spring.body, name: "the spring's body end" },
        )
      : []),
    ...(spring ? checkSpringLengths(spring, [...path, "spring"]) : []),
  ];
}

function checkWheelSide(centre: Coordinates, side: Side): Issue[] {
  const outward = side === "left" ? 1 : -1;
  if (outward * centre[1] > 0) return [];
  return [
    {
      path: [side, "wheel", "centre"],
      value: centre,
      problem: `The ${side} wheel's centre is not on the ${side} of the car: y is ${centre[1]}.`,
      hint:
        side === "left"
          ? "Y points left, so the left wheel's y must be greater than 0."
          : "Y points left, so the right wheel's y must be less than 0.",
    },
  ];
}

function checkSpringLengths(
  spring: { readonly openLength?: number; readonly closedLength?: number },
  path: Path,
): Issue[] {
  const { openLength, closedLength } = spring;
  if (openLength === undefined || closedLength === undefined || openLength > closedLength) return [];
  return [
    {
      path: [...path, "closedLength"],
      value: closedLength,
      problem: `The closed length must be less than the open length, ${openLength}.`,
      hint: "Check which of the two is which: both are eye to eye.",
    },
  ];
}

function checkReach(point: Coordinates, path: Path): Issue[] {
  if (norm(point) <= FURTHEST) return [];
  return [
    {
      path,
      value: point,
      problem: `This point is ${(norm(point) / 1000).toFixed(1)} m from the origin; 5 m is the most.`,
      hint: "Coordinates are in mm: check the unit and the digits.",
    },
  ];
}

interface Placed {
  readonly point: Coordinates;
  readonly path: Path;
}

/** Every point below a value of the document: any array of three numbers is one. */
function pointsOf(value: unknown, path: Path): Placed[] {
  if (Array.isArray(value)) {
    if (value.length === 3 && value.every((item) => typeof item === "number")) {
      return [{ point: value as unknown as Coordinates, path }];
    }
    return value.flatMap((item, index) => pointsOf(item, [...path, index]));
  }
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([key, item]) => pointsOf(item, [...path, key]));
}
