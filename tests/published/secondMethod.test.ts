// The engine against circles, spheres and bracketed roots, over ±80 mm × full lock, both sides, every column.

import { type Axle, checkAxle, sweepAxle } from "@linkwright/kinematics";
import fc from "fast-check";
import { describe, test } from "vitest";
import { ALL_AXLES, FULL_TRAVEL, fullLock } from "../helpers/axles.ts";
import { sweepByClosedForm } from "../helpers/closedForm/index.ts";
import { columnTolerancesOf } from "../helpers/columnTolerances.ts";
import { anyAxle, anyRearAxle, SLOW_PROPERTY_MS, SLOW_PROPERTY_RUNS } from "../helpers/generators.ts";
import { expect } from "../helpers/matchers.ts";

/** A column that the second method leaves null because a spring is missing is absent from the engine's row. */
function withoutSpringNulls(side: object | null): object | null {
  return side && Object.fromEntries(Object.entries(side).filter(([, value]) => value !== null));
}

function expectAgreement(axle: Axle, grid: { travels: number[]; steers: number[]; wheelUp?: number }): void {
  const { rows, ends } = sweepAxle(axle, grid);
  const expected = sweepByClosedForm(axle, grid).map(({ solutions: _, left, right, ...row }) => ({
    ...row,
    left: withoutSpringNulls(left),
    right: withoutSpringNulls(right),
  }));
  expect(ends).toEqual([]);
  expect(rows.length).toBe(expected.length);
  for (const [index, row] of expected.entries()) {
    const where = `steer ${row.steer}, travel ${row.travel}: `;
    expect(rows[index]).toBeWithin(row, columnTolerancesOf(row), where);
  }
}

describe.each(ALL_AXLES.map((axle) => [axle.name, axle] as const))("%s", (_name, axle) => {
  const grid = { travels: FULL_TRAVEL, steers: fullLock(axle) };

  test("is a sound document", () => {
    expect(checkAxle(axle)).toEqual([]);
  });

  test("agrees with the second method at every travel and lock", () => {
    expectAgreement(axle, grid);
  });

  test.each([-30, 45])("agrees with it with toe set again at %d mm", (wheelUp) => {
    expectAgreement(axle, { ...grid, wheelUp });
  });
});

describe("axles of random but believable dimensions", () => {
  test(
    "agree with the second method, steered",
    () => {
      fc.assert(
        fc.property(anyAxle(), (axle) => {
          expectAgreement(axle, { travels: [-60, -15, 0, 35, 60], steers: [-40, 0, 25] });
        }),
        SLOW_PROPERTY_RUNS,
      );
    },
    SLOW_PROPERTY_MS,
  );

  test(
    "agree with it with a toe link, at another ride height",
    () => {
      fc.assert(
        fc.property(anyRearAxle(), fc.integer({ min: -40, max: 40 }), (axle, wheelUp) => {
          expectAgreement(axle, { travels: [-60, -15, 0, 35, 60], steers: [0], wheelUp });
        }),
        SLOW_PROPERTY_RUNS,
      );
    },
    SLOW_PROPERTY_MS,
  );
});
