import { describe, test } from "vitest";
import { ALL_AXLES, unequalSides } from "../../../../tests/helpers/axles.ts";
import { expect } from "../../../../tests/helpers/matchers.ts";
import { translatingAxle } from "../../../../tests/helpers/planarAxles.ts";
import { workedAxle } from "../../../../tests/helpers/workedAxle.ts";
import { moveHardpoint } from "../model/hardpoints.ts";
import type { Study } from "../model/study.ts";
import { checkAxle, checkStudy } from "./checkAxle.ts";

const sound: Study = {
  format: "linkwright.study/1",
  axle: workedAxle,
  rideHeights: [{ name: "Street", wheelUp: 0, rakeDeg: 0, band: [-50, 50] }],
  targets: [],
  datum: null,
  tolerances: [],
  pointNotes: [],
  locks: [],
  parts: [],
  shims: [],
};

test("axles that assemble are not refused", () => {
  for (const axle of ALL_AXLES) expect(checkAxle(axle)).toEqual([]);
});

describe("an axle that does not assemble is refused", () => {
  test("with its tie rod on the steering axis, which nothing then holds from turning", () => {
    // Kingpin upright at y = 600: the rod's outer joint stands on it.
    const axle = translatingAxle({ inner: [0, 300, 250], outer: [0, 600, 250] });
    expect(checkAxle(axle)).toMatchObject([
      {
        path: ["left", "tieRod"],
        value: axle.left.tieRod,
        hint: "Check that the tie rod's outer joint stands clear of the steering axis and that no link points along another.",
      },
    ]);
  });

  test("with its tie rod drawn in line with its steering arm", () => {
    const axle = translatingAxle({ inner: [-400, 600, 250], outer: [-120, 600, 250] });
    expect(checkAxle(axle)).toMatchObject([{ path: ["left", "tieRod"] }]);
  });

  test("and is not when the rod's outer joint stands clear", () => {
    expect(checkAxle(translatingAxle({ inner: [-1, 300, 250], outer: [-1, 600, 250] }))).toEqual([]);
  });
});

test("an axle whose geometry is impossible is told that, and not that it does not assemble", () => {
  const [issue, ...others] = checkAxle(
    moveHardpoint(unequalSides, "left.suspension.lowerArm.ballJoint", [140, 260, 190]),
  );
  expect(others).toEqual([]);
  expect(issue?.path).toEqual(["left", "suspension", "lowerArm", "ballJoint"]);
});

describe("a study", () => {
  test("that is sound is not refused", () => {
    expect(checkStudy(sound)).toEqual([]);
  });

  test("has its axle's issues under the axle's path, and its own beside them", () => {
    const axle = moveHardpoint(workedAxle, "left.wheel.centre", [0, -640, 305]);
    const rideHeights = [{ name: "Street", wheelUp: 0, rakeDeg: 0, band: [10, 50] as const }];
    expect(checkStudy({ ...sound, axle, rideHeights }).map(({ path }) => path)).toEqual([
      ["axle", "left", "wheel", "centre"],
      ["rideHeights", 0, "band"],
    ]);
  });
});
