import { parseStudy } from "@linkwright/contract";
import { bumpSteerCurves, findFaults } from "@linkwright/kinematics";
import { expect, test } from "vitest";
import { startingStudy } from "./startingStudy.ts";

test.each(["front", "rear"] as const)("a new %s study is one that the contract accepts", (position) => {
  expect(parseStudy(startingStudy("New axle", position))).toMatchObject({ ok: true });
});

test.each(["front", "rear"] as const)("a new %s study can be solved over its whole band", (position) => {
  const { axle, rideHeights } = startingStudy("New axle", position);
  for (const height of rideHeights) {
    for (const curve of bumpSteerCurves(axle, height, 5)) expect(curve.reached).toEqual(height.band);
  }
});

test.each(["front", "rear"] as const)("a new %s study starts without a safety fault", (position) => {
  const { axle, rideHeights } = startingStudy("New axle", position);
  expect(findFaults(axle, rideHeights)).toEqual([]);
});
