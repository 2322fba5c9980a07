// What must not depend on how the car is written down: side, origin, scale, order, and the zero of the inputs.

import {
  type Axle,
  type Coordinates,
  type Corner,
  rightCorner,
  type SideRow,
  type SweepRow,
  sweepAxle,
} from "@linkwright/kinematics";
import fc from "fast-check";
import { describe, test } from "vitest";
import {
  acrossTheCar,
  anyAxle,
  anyInput,
  anyRearAxle,
  type Input,
  PROPERTY_RUNS,
  SLOW_PROPERTY_MS,
} from "../helpers/generators.ts";
import { expect } from "../helpers/matchers.ts";
import { asStated, TOLERANCE, type Tolerance } from "../helpers/tolerances.ts";

function rowAt(axle: Axle, { travel, steer }: Input): SweepRow & { left: SideRow; right: SideRow } {
  const row = sweepAxle(axle, { travels: [travel], steers: [steer] }).rows[0];
  fc.pre(row !== undefined && row.left !== null && row.right !== null);
  return row as SweepRow & { left: SideRow; right: SideRow };
}

/**
 * The same sums in another order. What crosses far away magnifies round-off, as does Ackermann near straight ahead:
 * both its differences of angles shrink with the square of the steer.
 */
function sameSums(row: SweepRow): (where: string) => Tolerance {
  const metresOut = 1 + Math.abs(row.axle.rollCentreLateral ?? 0) / 1000;
  const magnified = asStated(
    1e-8 * metresOut ** 2,
    "mm",
    `round-off magnified ${metresOut.toFixed(1)} m out`,
  );
  const percent = asStated(
    1e-7 * (1 + 1 / row.steer ** 2),
    "%",
    `a ratio of small differences at ${row.steer} mm`,
  );
  return (where) => {
    if (where.includes("rollCentre")) return magnified;
    return where.includes("Percent") ? percent : TOLERANCE.solve;
  };
}

type Move = (point: Coordinates) => Coordinates;

/** The corner with every hardpoint moved. */
function moved(corner: Corner, move: Move): Corner {
  const arm = ({ frontPivot, rearPivot, ballJoint }: Corner["suspension"]["lowerArm"]) => ({
    frontPivot: move(frontPivot),
    rearPivot: move(rearPivot),
    ballJoint: move(ballJoint),
  });
  const { suspension, tieRod, wheel, spring } = corner;
  return {
    ...corner,
    suspension: { ...suspension, lowerArm: arm(suspension.lowerArm), upperArm: arm(suspension.upperArm) },
    tieRod: { inner: move(tieRod.inner), outer: move(tieRod.outer) },
    wheel: { ...wheel, centre: move(wheel.centre) },
    ...(spring ? { spring: { ...spring, body: move(spring.body), lower: move(spring.lower) } } : {}),
  };
}

const bothMoved = (axle: Axle, move: Move): Axle => ({
  ...axle,
  left: moved(axle.left, move),
  right: axle.right === "mirror" ? "mirror" : moved(axle.right, move),
});

describe("sides", () => {
  const flip = ([x, y, z]: Coordinates): Coordinates => [x, -y, z];

  function swapped(axle: Axle): Axle {
    const { steering } = axle;
    return {
      ...axle,
      left: acrossTheCar(rightCorner(axle)),
      right: acrossTheCar(axle.left),
      // Seen in the mirror the rack's axis runs (x, −y, z); written with y > 0 it is the opposite of that.
      steering:
        steering.type === "rack"
          ? { ...steering, axis: [-steering.axis[0], steering.axis[1], -steering.axis[2]] }
          : steering,
    };
  }

  const inMirror = (side: SideRow): SideRow => ({
    ...side,
    wheelCentre: flip(side.wheelCentre),
    contactPoint: flip(side.contactPoint),
  });

  test(
    "swapping them, with the steering negated, swaps the rows",
    () => {
      fc.assert(
        fc.property(anyAxle(), anyInput(), (axle, { travel, steer }) => {
          const row = rowAt(axle, { travel, steer });
          const other = rowAt(swapped(axle), { travel, steer: -steer });
          const { rollCentreLateral, ...rest } = row.axle;
          const expected = {
            left: inMirror(row.right),
            right: inMirror(row.left),
            axle: { ...rest, rollCentreLateral: rollCentreLateral === null ? null : -rollCentreLateral },
          };
          expect(other).toBeWithin(expected, sameSums(row));
        }),
        PROPERTY_RUNS,
      );
    },
    SLOW_PROPERTY_MS,
  );
});

describe("origin", () => {
  test(
    "moving the whole axle along x and z moves its points and changes nothing else",
    () => {
      const shift = fc.integer({ min: -1500, max: 1500 });
      fc.assert(
        fc.property(anyAxle(), anyInput(), shift, shift, (axle, input, dx, dz) => {
          const row = rowAt(axle, input);
          const there = ([x, y, z]: Coordinates): Coordinates => [x + dx, y, z + dz];
          const pointsMoved = (side: SideRow): SideRow => ({
            ...side,
            wheelCentre: there(side.wheelCentre),
            contactPoint: there(side.contactPoint),
          });
          expect(rowAt(bothMoved(axle, there), input)).toBeWithin(
            { left: pointsMoved(row.left), right: pointsMoved(row.right), axle: row.axle },
            sameSums(row),
          );
        }),
        PROPERTY_RUNS,
      );
    },
    SLOW_PROPERTY_MS,
  );
});

describe("scale", () => {
  const LENGTHS = ["casterTrail", "scrubRadius", "springLength"] as const;
  const RATES = ["bumpSteerDegPerMm", "camberChangeDegPerMm"] as const;

  test(
    "an axle built s times as large has s times the lengths, 1/s the rates per mm, and the same angles",
    () => {
      fc.assert(
        fc.property(anyAxle(), anyInput(), fc.integer({ min: 5, max: 30 }), (axle, input, tenths) => {
          const s = tenths / 10;
          const larger: Axle = {
            ...bothMoved(axle, ([x, y, z]) => [s * x, s * y, s * z]),
            wheelbase: s * axle.wheelbase,
            body: { ...axle.body, cgHeight: s * axle.body!.cgHeight! },
          };
          const withRadius = (corner: Corner): Corner => ({
            ...corner,
            wheel: { ...corner.wheel, loadedRadius: s * corner.wheel.loadedRadius },
          });
          const scaled: Axle = {
            ...larger,
            left: withRadius(larger.left),
            right: larger.right === "mirror" ? "mirror" : withRadius(larger.right),
          };
          const row = rowAt(axle, input);
          const found = rowAt(scaled, { travel: s * input.travel, steer: s * input.steer });
          const sideScaled = (side: SideRow) => ({
            ...side,
            ...Object.fromEntries(LENGTHS.map((name) => [name, s * side[name]!])),
            ...Object.fromEntries(RATES.map((name) => [name, side[name]! / s])),
            wheelCentre: side.wheelCentre.map((coordinate) => s * coordinate),
            contactPoint: side.contactPoint.map((coordinate) => s * coordinate),
          });
          const times = (value: number | null): number | null => (value === null ? null : s * value);
          expect(found).toBeWithin(
            {
              left: sideScaled(row.left),
              right: sideScaled(row.right),
              axle: {
                ...row.axle,
                track: times(row.axle.track),
                rollCentreHeight: times(row.axle.rollCentreHeight),
                rollCentreLateral: times(row.axle.rollCentreLateral),
              },
            },
            sameSums(row),
          );
        }),
        PROPERTY_RUNS,
      );
    },
    SLOW_PROPERTY_MS,
  );
});

test(
  "zero in, design out",
  () => {
    fc.assert(
      fc.property(fc.oneof(anyAxle(), anyRearAxle()), (axle) => {
        const row = rowAt(axle, { travel: 0, steer: 0 });
        for (const [side, corner] of [
          [row.left, axle.left],
          [row.right, rightCorner(axle)],
        ] as const) {
          const { toeDeg, camberDeg, centre } = corner.wheel;
          expect(side).toBeWithin({ toeDeg, camberDeg, wheelCentre: centre }, TOLERANCE.roundOff);
        }
      }),
      PROPERTY_RUNS,
    );
  },
  SLOW_PROPERTY_MS,
);

test(
  "a row is the same alone, in a grid, and in a grid asked for in another order",
  () => {
    fc.assert(
      fc.property(anyAxle(), anyInput(), (axle, input) => {
        const alone = rowAt(axle, input);
        const travels = [input.travel, 70, -70, 0, input.travel / 2];
        const steers = [10, input.steer, -45];
        const { rows } = sweepAxle(axle, { travels, steers });
        const found = rows.find((row) => row.travel === input.travel && row.steer === input.steer);
        expect(found).toBeWithin({ left: alone.left, right: alone.right, axle: alone.axle }, sameSums(alone));
      }),
      PROPERTY_RUNS,
    );
  },
  SLOW_PROPERTY_MS,
);
