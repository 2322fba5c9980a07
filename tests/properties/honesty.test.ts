// Whatever the document says, the engine never answers with NaN, never throws, and gives its reasons.

import { type Axle, checkAxle, findFaults, poseAxle, type Sweep, sweepAxle } from "@linkwright/kinematics";
import fc from "fast-check";
import { describe, test } from "vitest";
import { anglesOf, partsOf, poseAtTravel } from "../helpers/closedForm/index.ts";
import { anyAxle, PROPERTY_RUNS, SLOW_PROPERTY_MS, SLOW_PROPERTY_RUNS } from "../helpers/generators.ts";
import { expect } from "../helpers/matchers.ts";
import { translatingAxle, uprightKingpins } from "../helpers/planarAxles.ts";
import { TOLERANCE } from "../helpers/tolerances.ts";
import { anyNastyAxle, anyStrainedAxle } from "../helpers/unsoundAxles.ts";

const GRID = { travels: [-160, -90, -30, 0, 30, 90, 160], steers: [-60, 0, 25] };

/** Every null column has a reason under its own name. */
function expectReasons({ rows }: Sweep): void {
  for (const row of rows) {
    for (const part of ["left", "right", "axle"] as const) {
      const columns = row[part];
      if (columns === null) {
        expect(row.because[part], `${part} at ${row.travel}`).toBeTypeOf("string");
        continue;
      }
      for (const [column, value] of Object.entries(columns)) {
        const reason = row.because[`${part}.${column}`];
        expect(typeof reason, `${part}.${column} is ${value}`).toBe(value === null ? "string" : "undefined");
      }
    }
  }
}

function expectHonestAnswers(axle: Axle, grid: typeof GRID & { wheelUp?: number }): void {
  const issues = checkAxle(axle);
  for (const issue of issues) {
    expect(issue.path.length).toBeGreaterThan(0);
    expect(issue.problem).toMatch(/\S/);
    expect(issue.hint).toMatch(/\S/);
  }
  if (issues.length > 0) return;
  const sweep = sweepAxle(axle, axle.steering.type === "fixed" ? { ...grid, steers: [0] } : grid);
  expect(sweep).toHoldOnlyFiniteNumbers();
  expectReasons(sweep);
  const travel = { left: grid.travels[1]!, right: grid.travels.at(-1)! };
  expect(poseAxle(axle, { travel, steer: 0 })).toHoldOnlyFiniteNumbers();
  expect(findFaults(axle, [{ wheelUp: grid.wheelUp ?? 0, band: [-20, 30] }])).toHoldOnlyFiniteNumbers();
}

describe("no NaN, no infinity, no exception, and a reason for every null", () => {
  test(
    "for hardpoints anywhere",
    () => {
      fc.assert(
        fc.property(anyNastyAxle(), (axle) => expectHonestAnswers(axle, GRID)),
        { ...PROPERTY_RUNS, numRuns: 200 },
      );
    },
    SLOW_PROPERTY_MS,
  );

  test(
    "for believable axles strained until something gives",
    () => {
      fc.assert(
        fc.property(anyStrainedAxle(), fc.constantFrom(0, 0, 30, -120), (axle, wheelUp) =>
          expectHonestAnswers(axle, { ...GRID, wheelUp }),
        ),
        SLOW_PROPERTY_RUNS,
      );
    },
    SLOW_PROPERTY_MS,
  );

  test(
    "for believable axles far beyond their travel and lock",
    () => {
      fc.assert(
        fc.property(anyAxle(), (axle) =>
          expectHonestAnswers(axle, { travels: [-600, -250, 0, 250, 600], steers: [-400, 0, 90] }),
        ),
        SLOW_PROPERTY_RUNS,
      );
    },
    SLOW_PROPERTY_MS,
  );
});

// The second method keeps to the drawing's assembly by construction; the engine does by never stepping over a dead point.
test(
  "however far the inputs jump in one go, the linkage is never put together the other way round",
  () => {
    const far = fc.record({
      steer: fc.integer({ min: -160, max: 160 }),
      travel: fc.integer({ min: -120, max: 120 }),
    });
    let compared = 0;
    fc.assert(
      fc.property(anyAxle(), far, (axle, { steer, travel }) => {
        const row = sweepAxle(axle, { travels: [travel], steers: [steer] }).rows[0];
        for (const side of ["left", "right"] as const) {
          const parts = partsOf(axle, side);
          const pose = poseAtTravel(parts, travel, { by: "tieRod", steer });
          if (!row?.[side] || pose === null) continue;
          expect(row[side].toeDeg).toBeWithin(anglesOf(parts, pose).toeDeg, TOLERANCE.referenceDeg, side);
          compared++;
        }
      }),
      PROPERTY_RUNS,
    );
    expect(compared).toBeGreaterThan(PROPERTY_RUNS.numRuns / 2);
  },
  SLOW_PROPERTY_MS,
);

/** An upper arm a fraction of its drawn length: travel runs out within ±300 mm. */
function anyShortArmedAxle(): fc.Arbitrary<Axle> {
  return fc.record({ axle: anyAxle(), share: fc.integer({ min: 15, max: 40 }) }).map(({ axle, share }) => {
    const { upperArm } = axle.left.suspension;
    const nearer = (pivot: readonly [number, number, number]) =>
      pivot.map((value, i) => upperArm.ballJoint[i]! + ((value - upperArm.ballJoint[i]!) * share) / 100);
    const shortened = {
      ...upperArm,
      frontPivot: nearer(upperArm.frontPivot) as [number, number, number],
      rearPivot: nearer(upperArm.rearPivot) as [number, number, number],
    };
    const left = { ...axle.left, suspension: { ...axle.left.suspension, upperArm: shortened } };
    return { ...axle, left, right: "mirror" };
  });
}

describe("where travel runs out", () => {
  const travels = Array.from({ length: 61 }, (_, i) => -300 + 10 * i);
  const held = { by: "tieRod", steer: 0 } as const;

  test(
    "what is reached is one stretch about the design height, and its ends are told to within a hundredth",
    () => {
      fc.assert(
        fc.property(anyShortArmedAxle(), (axle) => {
          fc.pre(checkAxle(axle).length === 0);
          const { rows, ends } = sweepAxle(axle, { travels, steers: [0] });
          const reached = rows.filter(({ left }) => left !== null).map(({ travel }) => travel);
          expect(reached.length).toBe((reached.at(-1)! - reached[0]!) / 10 + 1);
          expect(reached).toContain(0);
          const leftEnds = ends.filter(({ side }) => side === "left");
          expect(leftEnds.length).toBe((reached[0]! > -300 ? 1 : 0) + (reached.at(-1)! < 300 ? 1 : 0));
          for (const { lastTravel, link } of leftEnds) {
            expect(link).toMatch(/^(lowerArm|upperArm)\.(frontPivot|rearPivot)$|^tieRod$/);
            const way = Math.sign(lastTravel!);
            const at = (travel: number) =>
              sweepAxle(axle, { travels: [travel], steers: [0] }).rows[0]?.left ?? null;
            expect(at(lastTravel! - way * 0.01), `short of ${lastTravel}`).not.toBeNull();
            expect(at(lastTravel! + way * 0.01), `beyond ${lastTravel}`).toBeNull();
          }
        }),
        PROPERTY_RUNS,
      );
    },
    SLOW_PROPERTY_MS,
  );

  test(
    "the second method goes no further",
    () => {
      fc.assert(
        fc.property(anyShortArmedAxle(), (axle) => {
          fc.pre(checkAxle(axle).length === 0);
          const parts = partsOf(axle, "left");
          for (const { side, lastTravel } of sweepAxle(axle, { travels, steers: [0] }).ends) {
            const beyond = lastTravel! + Math.sign(lastTravel!) * 0.01;
            if (side === "left") expect(poseAtTravel(parts, beyond, held), `at ${beyond}`).toBeNull();
          }
        }),
        SLOW_PROPERTY_RUNS,
      );
    },
    SLOW_PROPERTY_MS,
  );

  // The arms of 300 mm stand upright there.
  test("level arms of 300 mm end at ±300 mm, and the arms are named", () => {
    const axle = translatingAxle({ inner: [-120, 300, 250], outer: [-120, 600, 250] });
    const { rows, ends } = sweepAxle(axle, { travels: [-310, -299.9, 0, 299.9, 310], steers: [0] });
    expect(rows.map(({ travel }) => travel)).toEqual([-299.9, 0, 299.9]);
    for (const end of ends) {
      expect(Math.abs(end.lastTravel!)).toBeWithin(300, TOLERANCE.referenceMm);
      expect(end.link).toMatch(/^(lowerArm|upperArm)\./);
    }
    expect(ends.map(({ side }) => side).sort()).toEqual(["left", "left", "right", "right"]);
  });

  // Arm 120 mm and rod 330 mm lie in one line when the inner joint is 450 mm from the kingpin.
  test("a rack pulls an arm of 120 mm round until rod and arm lie in line, and the tie rod is named", () => {
    const axle = uprightKingpins({ apart: 1400, wheelbase: 2400, convergeDeg: 0 });
    const furthest = Math.sqrt(450 ** 2 - 120 ** 2) - 330;
    const reached = sweepAxle(axle, { travels: [0], steers: [-(furthest - 1e-3)] });
    expect(reached.rows[0]!.left!.toggleMarginDeg).toBeLessThan(1);
    const { rows, ends } = sweepAxle(axle, { travels: [0], steers: [-(furthest + 1e-3)] });
    expect(rows[0]?.left ?? null).toBeNull();
    expect(ends).toContainEqual({
      side: "left",
      steer: -(furthest + 1e-3),
      lastTravel: null,
      link: "tieRod",
    });
  });
});
