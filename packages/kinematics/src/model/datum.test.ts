import { describe, test } from "vitest";
import { expect } from "../../../../tests/helpers/matchers.ts";
import { TOLERANCE } from "../../../../tests/helpers/tolerances.ts";
import type { Coordinates } from "./axle.ts";
import { pointInDatum } from "./datum.ts";
import type { Datum } from "./study.ts";

const POINT: Coordinates = [140, 260, 190];

const datum = (change: Partial<Datum>): Datum => ({
  name: "Jig",
  origin: [0, 0, 0],
  xAxis: [1, 0, 0],
  zAxis: [0, 0, 1],
  ...change,
});

describe("a point in the jig's datum", () => {
  test("without a datum is the car's", () => {
    expect(pointInDatum(null, POINT)).toEqual(POINT);
  });

  test("is measured from the datum's origin", () => {
    expect(pointInDatum(datum({ origin: [100, -50, 180] }), POINT)).toBeWithin(
      [40, 310, 10],
      TOLERANCE.roundOff,
    );
  });

  test("of a jig that looks the other way has x and y turned round, and stays right-handed", () => {
    expect(pointInDatum(datum({ xAxis: [-1, 0, 0] }), POINT)).toBeWithin(
      [-140, -260, 190],
      TOLERANCE.roundOff,
    );
  });

  test("of a jig that lies on its face counts along the axes that it is given", () => {
    // x of the jig down, z of the jig forward: y is z × x = X × (−Z) = Y.
    const lying = datum({ xAxis: [0, 0, -1], zAxis: [1, 0, 0] });
    expect(pointInDatum(lying, POINT)).toBeWithin([-190, 260, 140], TOLERANCE.roundOff);
  });

  test("of a jig turned by 30° about the vertical is turned back by it", () => {
    const [c, s] = [Math.sqrt(3) / 2, 0.5];
    expect(pointInDatum(datum({ xAxis: [c, s, 0] }), POINT)).toBeWithin(
      [140 * c + 260 * s, -140 * s + 260 * c, 190],
      TOLERANCE.roundOff,
    );
  });

  test("does not depend on how long the axes are written", () => {
    const long = datum({ origin: [5, 6, 7], xAxis: [30, 40, 0], zAxis: [0, 0, 0.01] });
    const unit = datum({ origin: [5, 6, 7], xAxis: [0.6, 0.8, 0], zAxis: [0, 0, 1] });
    expect(pointInDatum(long, POINT)).toBeWithin(pointInDatum(unit, POINT), TOLERANCE.roundOff);
  });

  test("keeps distances though z is a hair off square: z is squared to x", () => {
    const skewed = datum({ zAxis: [0.001, 0, 1] });
    expect(pointInDatum(skewed, POINT)).toBeWithin(POINT, TOLERANCE.roundOff);
  });
});

test("axes that make no datum are the program's mistake: checkStudy refuses them", () => {
  expect(() => pointInDatum(datum({ xAxis: [0, 0, 0] }), POINT)).toThrow("no direction");
  expect(() => pointInDatum(datum({ zAxis: [2, 0, 0] }), POINT)).toThrow("parallel");
});
