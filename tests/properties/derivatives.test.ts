// Gradients from the screw against central differences of the poses themselves.

import { type Axle, type SideRow, steerPerInput, sweepAxle } from "@linkwright/kinematics";
import fc from "fast-check";
import { describe, test } from "vitest";
import { anyAxle, anyInput, PROPERTY_RUNS, SLOW_PROPERTY_MS } from "../helpers/generators.ts";
import { expect } from "../helpers/matchers.ts";
import { TOLERANCE } from "../helpers/tolerances.ts";

/** ∛ε·max(1, |x|), ε being how far a solved pose is good: about 1e-12 of a car's size, not the last bit of a double. */
const stepFor = (x: number): number => Math.cbrt(1e-12) * Math.max(1, Math.abs(x));

/** Changes of every number of a side between two rows, per mm. */
function centralDifference(
  axle: Axle,
  at: { travel: number; steer: number },
  by: "travel" | "steer",
  h: number,
) {
  const rowOff = (offset: number) => {
    const travel = at.travel + (by === "travel" ? offset : 0);
    const steer = at.steer + (by === "steer" ? offset : 0);
    const row = sweepAxle(axle, { travels: [travel], steers: [steer] }).rows[0];
    fc.pre(row !== undefined && row.left !== null && row.right !== null);
    return row as typeof row & { left: SideRow; right: SideRow };
  };
  const [after, before] = [rowOff(h), rowOff(-h)];
  const change = (side: "left" | "right", column: "toeDeg" | "camberDeg" | "springLength"): number =>
    (after[side][column]! - before[side][column]!) / (2 * h);
  return (side: "left" | "right") => ({
    bumpSteerDegPerMm: change(side, "toeDeg"),
    camberChangeDegPerMm: change(side, "camberDeg"),
    springMotionRatio: -change(side, "springLength"),
  });
}

describe("per mm of travel", () => {
  test(
    "bump steer, camber change and motion ratio are the slopes of toe, camber and spring length",
    () => {
      fc.assert(
        fc.property(anyAxle(), anyInput(), (axle, at) => {
          const row = sweepAxle(axle, { travels: [at.travel], steers: [at.steer] }).rows[0]!;
          const h = stepFor(at.travel);
          for (const step of [h, h / 2]) {
            const slopes = centralDifference(axle, at, "travel", step);
            expect(row.left).toBeWithin(slopes("left"), TOLERANCE.finiteDifference, `left, step ${step}`);
            expect(row.right).toBeWithin(slopes("right"), TOLERANCE.finiteDifference, `right, step ${step}`);
          }
        }),
        PROPERTY_RUNS,
      );
    },
    SLOW_PROPERTY_MS,
  );
});

test(
  "the steer per mm of rack is the slope of the mean steer",
  () => {
    fc.assert(
      fc.property(anyAxle(), (axle) => {
        const slopes = centralDifference(axle, { travel: 0, steer: 0 }, "steer", stepFor(0));
        const mean = (slopes("right").bumpSteerDegPerMm - slopes("left").bumpSteerDegPerMm) / 2;
        expect(steerPerInput(axle)).toBeWithin(mean, TOLERANCE.finiteDifference);
      }),
      PROPERTY_RUNS,
    );
  },
  SLOW_PROPERTY_MS,
);
