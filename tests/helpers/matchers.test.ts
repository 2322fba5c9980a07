// The matchers must be able to fail, and must say where.

import { describe, test } from "vitest";
import { expect } from "./matchers.ts";
import { printedTo, TOLERANCE } from "./tolerances.ts";

const tolerance = { name: "half", value: 0.5, unit: "mm", reason: "for this test" };

describe("toBeWithin", () => {
  test("accepts a difference of the tolerance and refuses more, on both sides", () => {
    for (const sign of [1, -1]) {
      expect(10 + sign * 0.5).toBeWithin(10, tolerance);
      expect(() => expect(10 + sign * 0.51).toBeWithin(10, tolerance)).toThrow("differs by 0.5");
    }
  });

  test("says both values, the difference and the place", () => {
    const rows = [{ left: { toeDeg: 1, wheelCentre: [0, 600, 300] } }];
    const expected = [{ left: { toeDeg: 1, wheelCentre: [0, 601, 300] } }];
    const attempt = () => expect(rows).toBeWithin(expected, tolerance);
    expect(attempt).toThrow("[0].left.wheelCentre[1] is 600, expected 601, differs by 1");
  });

  test("refuses NaN, null, a missing column and a list of another length", () => {
    expect(() => expect(Number.NaN).toBeWithin(0, tolerance)).toThrow("is NaN, expected 0");
    expect(() => expect({ a: null }).toBeWithin({ a: 0 }, tolerance)).toThrow("a is null, expected 0");
    expect(() => expect({}).toBeWithin({ a: 0 }, tolerance)).toThrow("a is undefined, expected 0");
    expect(() => expect([1, 2]).toBeWithin([1], tolerance)).toThrow("has 2 entries, expected 1");
    expect(() => expect({ a: 0 }).toBeWithin({ a: null }, tolerance)).toThrow("a is 0, expected null");
  });

  test("takes a tolerance for each place", () => {
    const toleranceOf = (where: string) => (where === "coarse" ? tolerance : TOLERANCE.roundOff);
    expect({ coarse: 0.4, fine: 0 }).toBeWithin({ coarse: 0, fine: 0 }, toleranceOf);
    expect(() => expect({ fine: 0.4 }).toBeWithin({ fine: 0 }, toleranceOf)).toThrow("fine is 0.4");
  });
});

test("a printed value is met within half a unit of its last digit", () => {
  expect(57.3248).toBeWithin(57.32, printedTo(2, "degrees"));
  expect(() => expect(57.3252).toBeWithin(57.32, printedTo(2, "degrees"))).toThrow("printedTo(2)");
});

test("a number that JSON cannot carry is found wherever it hides", () => {
  expect({ rows: [{ a: 1, b: null, c: "text" }] }).toHoldOnlyFiniteNumbers();
  for (const bad of [Number.NaN, Number.POSITIVE_INFINITY, undefined]) {
    expect(() => expect({ rows: [{ a: bad }] }).toHoldOnlyFiniteNumbers()).toThrow("value.rows.0.a is");
  }
});
