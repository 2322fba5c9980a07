// The second method itself, held to solutions that others worked out, before the engine is held to it.

import { describe, test } from "vitest";
import {
  anglesOf,
  contactPointOf,
  deviate,
  kingpinGroundPoint,
  partsOf,
  poseAtTravel,
  setToeAt,
  sweepByClosedForm,
} from "../helpers/closedForm/index.ts";
import { expect } from "../helpers/matchers.ts";
import { referenceW1, w1Deviations, w1RackRows, w1TravelRows } from "../helpers/referenceW1.ts";
import { printedTo } from "../helpers/tolerances.ts";
import {
  printedToleranceOf,
  workedAxle,
  workedGrid,
  workedRows,
  workedStudies,
} from "../helpers/workedAxle.ts";

describe("the second method agrees with the worked axle", () => {
  test("in every row and column the file has, to the digits it prints", () => {
    const rows = sweepByClosedForm(workedAxle, workedGrid).map((row) => ({
      steer: row.steer,
      travel: row.travel,
      left: sideWithVelocities(row, "left"),
      right: sideWithVelocities(row, "right"),
      axle: row.axle,
    }));
    expect(rows).toBeWithin(workedRows, printedToleranceOf);
  });

  test("with toe set again at another ride height", () => {
    const { wheelUp, travels, toeDeg } = workedStudies.rideHeight;
    const rows = sweepByClosedForm(workedAxle, { travels, steers: [0], wheelUp });
    expect(rows.map((row) => row.left?.toeDeg)).toBeWithin(toeDeg, printedTo(8, "degrees"));
    expect(rows.map((row) => row.right?.toeDeg)).toBeWithin(toeDeg, printedTo(8, "degrees"));
  });

  test("with three parts off the drawing and toe set back", () => {
    const { deviations, travels, bumpSteerDeg } = workedStudies.partDeviation;
    const made = setToeAt(deviate(partsOf(workedAxle, "left"), deviations), 0)!;
    const toe = (travel: number): number =>
      anglesOf(made, poseAtTravel(made, travel, { by: "tieRod", steer: 0 })!).toeDeg;
    expect(travels.map((travel) => toe(travel) - toe(0))).toBeWithin(bumpSteerDeg, printedTo(8, "degrees"));
  });
});

function sideWithVelocities(row: ReturnType<typeof sweepByClosedForm>[number], side: "left" | "right") {
  const velocity = row.solutions[side]!.contactVelocity;
  return {
    ...row[side],
    travel: row.travel,
    contactVelocity: velocity,
    sideViewSlope: velocity[0] / velocity[2],
  };
}

describe("the second method agrees with reference case W1 (three algorithms and a general physics engine)", () => {
  const parts = partsOf(referenceW1, "left");
  const at = (travel: number, steer = 0) => {
    const pose = poseAtTravel(parts, travel, { by: "tieRod", steer })!;
    const contact = contactPointOf(parts, pose);
    const ground = kingpinGroundPoint(pose, contact);
    return {
      ...anglesOf(parts, pose),
      wheelCentre: pose.wheelCentre,
      // This source measures both along the car's axes, not along the wheel's heading.
      trailAlongCar: ground[0] - contact[0],
      offsetAcrossCar: contact[1] - ground[1],
    };
  };

  test.each(w1TravelRows)("at a travel of $travel mm", (row) => {
    const found = at(row.travel);
    expect(found).toBeWithin(row.angles, printedTo(6, "degrees"));
    expect(found.wheelCentre.slice(0, 2)).toBeWithin(row.wheelCentreXY, printedTo(5, "mm"));
    expect(found).toBeWithin(row.alongCar, printedTo(5, "mm"));
  });

  test.each(w1RackRows)("with the rack at $rack mm", (row) => {
    expect(-at(0, row.rack).toeDeg).toBeWithin(row.leftSteerDeg, printedTo(6, "degrees"));
    expect(at(0, -row.rack).toeDeg).toBeWithin(row.rightSteerDeg, printedTo(6, "degrees"));
    expect(at(0, row.rack).camberDeg).toBeWithin(row.leftCamberDeg, printedTo(6, "degrees"));
  });

  test.each(w1Deviations)("with $what", (row) => {
    const made = row.tieRodLonger
      ? { ...parts, tieRodLength: parts.tieRodLength + row.tieRodLonger }
      : deviate(parts, row.deviations ?? {});
    const toeChange = [-40, 0, 40].map((travel) => {
      const pose = poseAtTravel(made, travel, { by: "tieRod", steer: 0 })!;
      return anglesOf(made, pose).toeDeg - at(travel).toeDeg;
    });
    expect(toeChange).toBeWithin(row.toeChangeDeg, printedTo(6, "degrees"));
  });
});
