// The studies on bump steer against cases whose curve, and whose cure, are known exactly.

import { bumpSteerCurve, flatten, type Move, summariseCurve } from "@linkwright/kinematics";
import { describe, test } from "vitest";
import { expect } from "../helpers/matchers.ts";
import { translatingAxle } from "../helpers/planarAxles.ts";
import { asStated, printedTo, TOLERANCE } from "../helpers/tolerances.ts";
import { workedAxle, workedStudies } from "../helpers/workedAxle.ts";

test("the worked axle's bump steer about a ride height of 40 mm is the independent solution's", () => {
  const { wheelUp, travels, toeDeg } = workedStudies.rideHeight;
  const about = travels.map((travel) => travel - wheelUp);
  for (const side of ["left", "right"] as const) {
    const curve = bumpSteerCurve(workedAxle, side, wheelUp, about);
    expect(curve.travels).toEqual(about);
    // Toe is the document's, 0.05°, at the ride height.
    expect(curve.bumpSteerDeg).toBeWithin(
      toeDeg.map((toe) => toe - 0.05),
      printedTo(8, "degrees"),
      side,
    );
  }
});

/** Level arms of 300 mm, arm of 120 mm behind, rod `length` long with its inner joint `raised` too high. */
const levelArms = (length: number, raised: number) =>
  translatingAxle({ inner: [-120, 600 - length, 250 + raised], outer: [-120, 600, 250] });

// Derived in closed form: the curve of a rod 20 mm too short and 10 mm too high.
test("a curve's figures are those of its points", () => {
  const curve = bumpSteerCurve(levelArms(280, 10), "left", 0, [-60, -40, -20, 0, 20, 40, 60]);
  const toeIn = [-1.26327, -0.783258, -0.36518, 0, 0.318666, 0.595118, 0.831871];
  expect(curve.bumpSteerDeg).toBeWithin(toeIn, printedTo(6, "degrees"));
  const figures = summariseCurve(curve)!;
  expect(figures).toBeWithin(
    { maxDeg: 1.26327, peakToPeakDeg: 1.26327 + 0.831871 },
    asStated(1.1e-6, "degrees", "two printed values"),
  );
  const rms = Math.sqrt(toeIn.reduce((sum, toe) => sum + toe * toe, 0) / toeIn.length);
  expect(figures.rmsDeg).toBeWithin(rms, printedTo(6, "degrees"));
  expect(curve.gradientDegPerMm).toBeWithin(((10 / (280 * 120)) * 180) / Math.PI, TOLERANCE.roundOff);
});

// A tie rod parallel to the arms and as long as they are copies them: bump steer is exactly nothing.
describe("finding the flattest finds the rod that copies the arms", () => {
  const heights = [{ wheelUp: 0, band: [-60, 60] as const }];
  const within = asStated(1e-3, "mm", "the least squares stop when a step no longer flattens the curve");
  const find = (length: number, raised: number, moves: readonly Move[]) => {
    const free = moves.map((move) => ({ move, low: -40, high: 40 }));
    const outcome = flatten(levelArms(length, raised), { free, heights, step: 10 });
    if (outcome.status !== "found") throw new Error(outcome.because);
    const found = Object.fromEntries(outcome.moves.map(({ move, mm }) => [move, mm]));
    return { found, after: outcome.heights[0]!.after!, before: outcome.heights[0]!.before! };
  };

  test.each([10, -7])("by lowering a rack that is %d mm too high", (raised) => {
    const { found, after, before } = find(300, raised, ["rackHeight"]);
    expect(found).toBeWithin({ rackHeight: -raised }, within);
    expect(before.maxDeg).toBeGreaterThan(0.5);
    expect(after.maxDeg).toBeLessThan(1e-4);
  });

  test("by bringing in the inner joints of a rod that is 20 mm too short", () => {
    const { found, after } = find(280, 0, ["innerWidth"]);
    expect(found).toBeWithin({ innerWidth: -20 }, within);
    expect(after.maxDeg).toBeLessThan(1e-4);
  });

  test("by both at once, and by the outer joint as well as by the inner one", () => {
    expect(find(285, 12, ["rackHeight", "innerWidth"]).found).toBeWithin(
      { rackHeight: -12, innerWidth: -15 },
      within,
    );
    expect(find(300, 9, ["outerHeight"]).found).toBeWithin({ outerHeight: 9 }, within);
  });

  test("at two ride heights together as at one, for a rod that copies the arms does so everywhere", () => {
    const outcome = flatten(levelArms(300, 10), {
      free: [{ move: "rackHeight", low: -40, high: 40 }],
      heights: [
        { wheelUp: 0, band: [-50, 50] },
        { wheelUp: 40, band: [-50, 50] },
      ],
      step: 10,
    });
    if (outcome.status !== "found") throw new Error(outcome.because);
    expect(outcome.moves[0]!.mm).toBeWithin(-10, within);
    expect(outcome.heldBy).toEqual([]);
    for (const { after } of outcome.heights) expect(after!.maxDeg).toBeLessThan(1e-4);
  });

  test("as near as its bounds allow, and says which bound holds it", () => {
    const outcome = flatten(levelArms(300, 10), {
      free: [{ move: "rackHeight", low: -4, high: 4 }],
      heights,
      step: 10,
    });
    if (outcome.status !== "found") throw new Error(outcome.because);
    expect(outcome.moves[0]!.mm).toBeWithin(-4, TOLERANCE.roundOff);
    expect(outcome.heldBy).toEqual([{ move: "rackHeight", bound: "low" }]);
  });
});
