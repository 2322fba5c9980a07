// The engine against the worked axle's independent solution: every row and every column that it has.

import { checkAxle, sweepAxle } from "@linkwright/kinematics";
import { describe, test } from "vitest";
import { expect } from "../helpers/matchers.ts";
import { printedTo } from "../helpers/tolerances.ts";
import {
  printedToleranceOf,
  workedAxle,
  workedGrid,
  workedRows,
  workedStudies,
} from "../helpers/workedAxle.ts";

/** Columns of the file that are the working towards others: what the product shows of them is the anti-dive. */
function shown<T extends { travel: number; contactVelocity: unknown; sideViewSlope: unknown }>(side: T) {
  const { travel: _, contactVelocity: __, sideViewSlope: ___, ...columns } = side;
  return columns;
}

describe("the engine and the worked axle", () => {
  test("the document is sound", () => {
    expect(checkAxle(workedAxle)).toEqual([]);
  });

  test("agree in every row and column, to the digits the file prints", () => {
    const { rows, ends } = sweepAxle(workedAxle, workedGrid);
    expect(ends).toEqual([]);
    const expected = workedRows.map((row) => ({
      steer: row.steer,
      travel: row.travel,
      left: shown(row.left),
      right: shown(row.right),
      axle: row.axle,
    }));
    expect(rows).toBeWithin(expected, printedToleranceOf);
  });

  test("agree on toe when it is set again at another ride height", () => {
    const { wheelUp, travels, toeDeg } = workedStudies.rideHeight;
    const { rows } = sweepAxle(workedAxle, { travels, steers: [0], wheelUp });
    for (const side of ["left", "right"] as const) {
      expect(rows.map((row) => row[side]?.toeDeg)).toBeWithin(toeDeg, printedTo(8, "degrees"), side);
    }
  });

  test("the order of travels and steers asked for does not change what is found", () => {
    const shuffled = { travels: [20, -60, 60, 0, -20, 40, -40], steers: [40, -40, 0] };
    const { rows } = sweepAxle(workedAxle, shuffled);
    expect(rows.map(({ steer, travel }) => [steer, travel])).toEqual(
      shuffled.steers.flatMap((steer) => shuffled.travels.map((travel) => [steer, travel])),
    );
    for (const row of rows) {
      const expected = workedRows.find(({ steer, travel }) => steer === row.steer && travel === row.travel)!;
      expect(row.left).toBeWithin(shown(expected.left), printedToleranceOf);
      expect(row.right).toBeWithin(shown(expected.right), printedToleranceOf);
    }
  });
});
