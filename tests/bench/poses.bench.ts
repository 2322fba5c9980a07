// Corner poses a second on one core, beside the same work done the plain way.

import { type Axle, prepareCorner, steerTo, travelColumn } from "@linkwright/kinematics";
import { timeCalls } from "./measure.ts";
import { plainSweep } from "./plainNewton.ts";

const STEP = 5;
const UP = Array.from({ length: 16 }, (_, k) => (k + 1) * STEP);
const TRAVELS = [...UP.map((travel) => -travel).reverse(), 0, ...UP];

export function benchPoses(axle: Axle): string[] {
  const prepared = prepareCorner(axle, "left");
  if (prepared.status !== "ready") throw new Error(`the bench's axle is ${prepared.status}`);
  const { solver } = prepared;
  const own = timeCalls(() => {
    steerTo(solver, 0);
    travelColumn(solver, TRAVELS);
  });
  const plain = timeCalls(() => {
    plainSweep(axle, UP);
    plainSweep(axle, [0, ...UP.map((travel) => -travel)]);
  });
  const ownRate = TRAVELS.length / own.secondsPerCall;
  const plainRate = TRAVELS.length / plain.secondsPerCall;
  return [
    `corner poses over ±80 mm at 5 mm, one core      ${(ownRate / 1e6).toFixed(2)} million/s (asked: 1.50)`,
    `the same by ml-matrix, Jacobian by differences  ${(plainRate / 1e6).toFixed(4)} million/s`,
    `ratio                                           ${(ownRate / plainRate).toFixed(0)}`,
  ];
}
