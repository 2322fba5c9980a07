// Every refusal of a geometry, on both sides of its limit: one slip in an axle that is otherwise sound.

import { describe, test } from "vitest";
import { ALL_AXLES, unequalSides } from "../../../../tests/helpers/axles.ts";
import { expect } from "../../../../tests/helpers/matchers.ts";
import { workedAxle } from "../../../../tests/helpers/workedAxle.ts";
import type { Axle, Coordinates, Spring } from "./axle.ts";
import { checkGeometry } from "./check.ts";
import { moveHardpoint } from "./hardpoints.ts";
import { formatPath } from "./issue.ts";

const pathsOf = (axle: Axle): string[] => checkGeometry(axle).map(({ path }) => formatPath(path));

const withSpring = (change: Partial<Spring>): Axle => ({
  ...workedAxle,
  left: {
    ...workedAxle.left,
    spring: { body: [2, 345, 560], lower: [4, 470, 190], on: "lowerArm", ...change },
  },
});

test("axles that can be built are not refused", () => {
  for (const axle of ALL_AXLES) expect(checkGeometry(axle)).toEqual([]);
});

test("a refusal tells what, where, how large, and what to do", () => {
  const [issue] = checkGeometry(moveHardpoint(workedAxle, "left.tieRod.inner", [128, 2750, 5214]));
  expect(issue).toEqual({
    path: ["left", "tieRod", "inner"],
    value: [128, 2750, 5214],
    problem: "This point is 5.9 m from the origin; 5 m is the most.",
    hint: "Coordinates are in mm: check the unit and the digits.",
  });
});

describe("a point further than 5 m from the origin is refused", () => {
  const at = (path: string, point: Coordinates) => pathsOf(moveHardpoint(workedAxle, path, point));

  test.each([
    "left.suspension.lowerArm.frontPivot",
    "left.suspension.upperArm.ballJoint",
    "left.tieRod.outer",
    "left.wheel.centre",
    "left.spring.body",
  ])("%s", (path) => {
    expect(at(path, [3000, 4000 * 1.01, 0])).toEqual([path]);
    expect(at(path, [3000, 4000 * 0.99, 0])).toEqual([]);
  });

  test("on a right side given in full, under its own path", () => {
    const axle = moveHardpoint(unequalSides, "right.tieRod.inner", [0, -5050, 0]);
    expect(pathsOf(axle)).toEqual(["right.tieRod.inner"]);
  });

  test("in a list of shapes, with its place there", () => {
    const shape = { on: "body", from: [0, 0, 0], to: [0, 5050, 0], radius: 10 } as const;
    const axle: Axle = { ...workedAxle, left: { ...workedAxle.left, shapes: [shape] } };
    expect(pathsOf(axle)).toEqual(["left.shapes[0].to"]);
  });

  test("and every one that is so is named at once", () => {
    const axle = moveHardpoint(
      moveHardpoint(workedAxle, "left.tieRod.inner", [0, 0, 9000]),
      "left.spring.lower",
      [0, -9000, 0],
    );
    expect(pathsOf(axle)).toEqual(["left.tieRod.inner", "left.spring.lower"]);
  });
});

describe("a wheel on the wrong side is refused", () => {
  test("the left one at a negative y", () => {
    expect(checkGeometry(moveHardpoint(workedAxle, "left.wheel.centre", [0, -640, 305]))).toMatchObject([
      {
        path: ["left", "wheel", "centre"],
        value: [0, -640, 305],
        problem: "The left wheel's centre is not on the left of the car: y is -640.",
        hint: "Y points left, so the left wheel's y must be greater than 0.",
      },
    ]);
  });

  test("the right one at a positive y", () => {
    expect(checkGeometry(moveHardpoint(unequalSides, "right.wheel.centre", [2, 643, 306]))).toMatchObject([
      {
        path: ["right", "wheel", "centre"],
        hint: "Y points left, so the right wheel's y must be less than 0.",
      },
    ]);
  });

  test("and one on the centre plane is on neither", () => {
    expect(pathsOf(moveHardpoint(workedAxle, "left.wheel.centre", [0, 0, 305]))).toEqual([
      "left.wheel.centre",
    ]);
    expect(pathsOf(moveHardpoint(workedAxle, "left.wheel.centre", [0, 0.01, 305]))).toEqual([]);
  });
});

test("an inner tie-rod joint may lie across the centre plane", () => {
  expect(pathsOf(moveHardpoint(workedAxle, "left.tieRod.inner", [128, -12, 214]))).toEqual([]);
});

describe("points that must be apart are refused within a millimetre of one another", () => {
  const beside = ([x, y, z]: Coordinates, apart: number): Coordinates => [
    x,
    y + 0.6 * apart,
    z - 0.8 * apart,
  ];
  const { lowerArm, upperArm } = workedAxle.left.suspension;
  const { tieRod } = workedAxle.left;

  test.each([
    { path: "left.tieRod.outer", from: tieRod.inner, name: "the tie rod's inner joint" },
    { path: "left.suspension.lowerArm.rearPivot", from: lowerArm.frontPivot, name: "the front pivot" },
    { path: "left.suspension.upperArm.rearPivot", from: upperArm.frontPivot, name: "the front pivot" },
    { path: "left.suspension.upperArm.ballJoint", from: lowerArm.ballJoint, name: "the lower ball joint" },
    { path: "left.spring.lower", from: [2, 345, 560] as const, name: "the spring's body end" },
  ])("$path from $name", ({ path, from, name }) => {
    const at = (apart: number) => checkGeometry(moveHardpoint(workedAxle, path, beside(from, apart)));
    expect(at(1.01)).toEqual([]);
    expect(at(0.99)).toMatchObject([
      {
        path: path.split("."),
        value: beside(from, 0.99),
        problem: `This point is less than 1 mm from ${name}.`,
        hint: "Move it at least 1 mm away; check that no line was copied twice.",
      },
    ]);
    expect(at(0)).toMatchObject([{ problem: `This point is the same as ${name}.` }]);
  });
});

describe("a ball joint on its own arm's pivot axis is refused", () => {
  const axis = { front: [140, 260, 190] as const, rear: [-105, 262, 184] as const };
  const along = axis.front.map((value, k) => value - (axis.rear[k] as number));
  const level = Math.hypot(along[0] as number, along[1] as number);
  /** A point of the axis, moved off it by `off` mm along a level line square to it. */
  const joint = (off: number): Coordinates => [
    axis.rear[0] + 0.4 * (along[0] as number) - (off * (along[1] as number)) / level,
    axis.rear[1] + 0.4 * (along[1] as number) + (off * (along[0] as number)) / level,
    axis.rear[2] + 0.4 * (along[2] as number),
  ];
  const at = (off: number) =>
    checkGeometry(moveHardpoint(workedAxle, "left.suspension.lowerArm.ballJoint", joint(off)));

  test("under a millimetre from it, and not over", () => {
    expect(at(1.01)).toEqual([]);
    expect(at(0.99)).toMatchObject([
      {
        path: ["left", "suspension", "lowerArm", "ballJoint"],
        value: joint(0.99),
        problem: "The ball joint lies on the line through the arm's two pivots, so the arm cannot swing.",
        hint: "Move the ball joint away from the pivot axis.",
      },
    ]);
  });
});

describe("a rack's axis", () => {
  const aimed = (axis: Coordinates): Axle => ({
    ...workedAxle,
    steering: { type: "rack", axis, travel: 60 },
  });

  test("must point to the left", () => {
    expect(checkGeometry(aimed([0, -1, 0]))).toMatchObject([
      {
        path: ["steering", "axis"],
        value: [0, -1, 0],
        problem: "The rack's axis must point to the left: its y must be greater than 0.",
      },
    ]);
    expect(pathsOf(aimed([1, 0, 0]))).toEqual(["steering.axis"]);
    expect(pathsOf(aimed([0, 0, 0]))).toEqual(["steering.axis"]);
  });

  test("may lean and may be of any length", () => {
    expect(pathsOf(aimed([0.2, 0.9, -0.1]))).toEqual([]);
    expect(pathsOf(aimed([0, 6000, 0]))).toEqual([]);
  });
});

describe("a damper's closed length", () => {
  test("must be less than its open length", () => {
    expect(checkGeometry(withSpring({ openLength: 400, closedLength: 404 }))).toMatchObject([
      {
        path: ["left", "spring", "closedLength"],
        value: 404,
        problem: "The closed length must be less than the open length, 400.",
        hint: "Check which of the two is which: both are eye to eye.",
      },
    ]);
    expect(pathsOf(withSpring({ openLength: 400, closedLength: 400 }))).toHaveLength(1);
    expect(pathsOf(withSpring({ openLength: 400, closedLength: 396 }))).toEqual([]);
  });

  test("says nothing without the other", () => {
    expect(pathsOf(withSpring({ closedLength: 404 }))).toEqual([]);
    expect(pathsOf(withSpring({ openLength: 400 }))).toEqual([]);
  });
});

test("several slips are all told, the left's first", () => {
  const axle = moveHardpoint(
    moveHardpoint(unequalSides, "right.wheel.centre", [2, 643, 306]),
    "left.tieRod.outer",
    unequalSides.left.tieRod.inner,
  );
  expect(pathsOf({ ...axle, steering: { type: "rack", axis: [0, -1, 0], travel: 60 } })).toEqual([
    "left.tieRod.outer",
    "right.wheel.centre",
    "steering.axis",
  ]);
});
