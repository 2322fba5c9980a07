import { describe, test } from "vitest";
import { ALL_AXLES, unequalSides } from "../../../../tests/helpers/axles.ts";
import { expect } from "../../../../tests/helpers/matchers.ts";
import { workedAxle } from "../../../../tests/helpers/workedAxle.ts";
import type { Axle, Coordinates } from "./axle.ts";
import { listHardpoints, moveHardpoint } from "./hardpoints.ts";

const withBar: Axle = {
  ...workedAxle,
  left: {
    ...workedAxle.left,
    antiRollBar: {
      axis: [
        [-150, 0, 250],
        [-150, 300, 250],
      ],
      arm: [-40, 300, 240],
      link: { lower: [-40, 400, 200], on: "lowerArm" },
    },
  },
};

const pointOf = (axle: Axle, path: string): Coordinates | undefined =>
  listHardpoints(axle).find((hardpoint) => hardpoint.path === path)?.point;

describe("the list of hardpoints", () => {
  test("names each point of a double wishbone plainly, in the order a shop reads them", () => {
    const left = listHardpoints(workedAxle).filter(({ side }) => side === "left");
    expect(left.map(({ group, label }) => `${group}, ${label}`)).toEqual([
      "Lower arm, front pivot",
      "Lower arm, rear pivot",
      "Lower arm, ball joint",
      "Upper arm, front pivot",
      "Upper arm, rear pivot",
      "Upper arm, ball joint",
      "Tie rod, inner joint",
      "Tie rod, outer joint",
      "Wheel, centre",
      "Spring, body end",
      "Spring, lower end",
    ]);
  });

  test("gives the place of each in the document and where it stands", () => {
    expect(pointOf(workedAxle, "left.suspension.upperArm.rearPivot")).toEqual([-92, 324, 400]);
    expect(pointOf(workedAxle, "left.wheel.centre")).toEqual([0, 640, 305]);
  });

  test("lists a mirrored right side with its own coordinates", () => {
    expect(pointOf(workedAxle, "right.suspension.upperArm.rearPivot")).toEqual([-92, -324, 400]);
  });

  test("lists a right side given in full as it is given", () => {
    expect(pointOf(unequalSides, "right.tieRod.outer")).toEqual([113, -592, 216]);
  });

  test("holds no spring where there is none, and the bar's four points where there is one", () => {
    const { spring: _spring, ...left } = workedAxle.left;
    const groups = (axle: Axle) => listHardpoints(axle).map(({ group }) => group);
    expect(groups({ ...workedAxle, left })).not.toContain("Spring");
    expect(groups(withBar).filter((group) => group === "Anti-roll bar")).toHaveLength(8);
  });

  test("has no path twice", () => {
    for (const axle of [...ALL_AXLES, withBar]) {
      const paths = listHardpoints(axle).map(({ path }) => path);
      expect(new Set(paths).size).toBe(paths.length);
    }
  });
});

describe("a moved hardpoint", () => {
  test("is found where it was put, and no other has moved, whichever it is", () => {
    for (const axle of [unequalSides, withBar]) {
      for (const { path, point } of listHardpoints(axle)) {
        const target: Coordinates = [point[0] + 1.5, point[1] - 2.5, point[2] + 3.5];
        const moved = listHardpoints(moveHardpoint(axle, path, target));
        const twin = axle.right === "mirror" ? path.replace(/^(left|right)/, (side) => other(side)) : null;
        expect(moved.find((hardpoint) => hardpoint.path === path)?.point).toEqual(target);
        const untouched = (list: typeof moved) =>
          list.filter((hardpoint) => hardpoint.path !== path && hardpoint.path !== twin);
        expect(untouched(moved)).toEqual(untouched(listHardpoints(axle)));
      }
    }
  });

  test("of a mirrored right side moves its twin on the left", () => {
    const moved = moveHardpoint(workedAxle, "right.tieRod.inner", [130, -280, 220]);
    expect(moved.right).toBe("mirror");
    expect(moved.left.tieRod.inner).toEqual([130, 280, 220]);
  });

  test("of a right side given in full leaves the left alone", () => {
    const moved = moveHardpoint(unequalSides, "right.tieRod.inner", [130, -280, 220]);
    expect(moved.left).toBe(unequalSides.left);
    expect(pointOf(moved, "right.tieRod.inner")).toEqual([130, -280, 220]);
  });

  test("inside a list keeps it a list", () => {
    const moved = moveHardpoint(withBar, "left.antiRollBar.axis.1", [-150, 310, 255]);
    expect(moved.left.antiRollBar?.axis).toEqual([
      [-150, 0, 250],
      [-150, 310, 255],
    ]);
  });

  test("leaves the document it was moved in as it was", () => {
    const before = structuredClone(workedAxle);
    moveHardpoint(workedAxle, "left.wheel.centre", [0, 645, 305]);
    expect(workedAxle).toEqual(before);
  });
});

function other(side: string): string {
  return side === "left" ? "right" : "left";
}
