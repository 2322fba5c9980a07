import { type Axle, findFaults } from "@linkwright/kinematics";
import { describe, expect, test } from "vitest";
import { workedAxle } from "../../../../tests/helpers/workedAxle.ts";
import { DIALECT_WORDS } from "../../lib/dialect.ts";
import { type NamedBand, reportFaults } from "./reports.ts";
import { leftLockSign, steerInWords } from "./steerWords.ts";

const heights: readonly NamedBand[] = [
  { name: "Road", wheelUp: 0, band: [-50, 50] },
  { name: "Low", wheelUp: 30, band: [-40, 40] },
];

function steering(change: object): Axle {
  return { ...workedAxle, steering: { ...workedAxle.steering, ...change } as Axle["steering"] };
}

function reportsFor(axle: Axle, bands: readonly NamedBand[] = heights) {
  const context = { axle, heights: bands, units: "mm" as const, words: DIALECT_WORDS.uk };
  return reportFaults(findFaults(axle, bands), context);
}

test("a sound axle has nothing to report", () => {
  expect(reportsFor(steering({ wheelLeftMoves: "left" }))).toEqual([]);
});

test("an axle that steers backwards is told in red, without a place, and says what to do", () => {
  const [report, ...others] = reportsFor(steering({ wheelLeftMoves: "right" }));
  expect(others).toEqual([]);
  expect(report).toMatchObject({ severity: "red", title: "It steers backwards", where: null, place: null });
  expect(report?.advice).toContain("other side of the axle");
});

test("what is not stated is a caution, not a fault", () => {
  expect(reportsFor(workedAxle)).toMatchObject([{ severity: "amber", key: "steeringNotStated" }]);
});

test("a band that the linkage cannot follow is told once a wheel and way, where it ends soonest", () => {
  const bands: NamedBand[] = [{ name: "Road", wheelUp: 0, band: [-50, 300] }];
  const reports = reportsFor(steering({ wheelLeftMoves: "left" }), bands).filter(({ key }) =>
    key.startsWith("outOfReach"),
  );
  expect(reports.map(({ key }) => key)).toEqual(["outOfReach 0 left bump", "outOfReach 0 right bump"]);
  expect(reports[0]?.title).toMatch(/^Left wheel comes to its end at \+\d+\.\d mm in bump$/);
  expect(reports[0]?.place?.height).toBe("Road");
});

test("a ride height out of reach is not mistaken for an end in droop", () => {
  const bands: NamedBand[] = [{ name: "Slammed", wheelUp: 300, band: [-50, 50] }];
  const [report] = reportsFor(steering({ wheelLeftMoves: "left" }), bands);
  expect(report?.title).toBe("Left wheel cannot be brought to the ride height Slammed");
});

test("near the dead point the margin, the place and the lock are told, red before amber", () => {
  const far = steering({ wheelLeftMoves: "left", travel: 95 });
  const reports = reportsFor(far).filter(({ key }) => key.startsWith("nearToggle"));
  expect(reports.length).toBeGreaterThan(0);
  for (const { title, where } of reports) {
    expect(title).toMatch(/steering arm and track rod only \d+\.\d° from lying in line$/);
    expect(where).toMatch(/(left|right) lock$/);
  }
});

test("a red fault stands before an amber one", () => {
  const reports = reportFaults(
    [
      { kind: "steeringNotStated", severity: "amber" },
      { kind: "steersBackwards", severity: "red" },
    ],
    { axle: workedAxle, heights, units: "mm", words: DIALECT_WORDS.uk },
  );
  expect(reports.map(({ severity }) => severity)).toEqual(["red", "amber"]);
});

describe("the steering in words", () => {
  const left = steering({ wheelLeftMoves: "left" });
  const right = steering({ wheelLeftMoves: "right" });

  test("left lock is where the driver turns left, whichever way the rack then moves", () => {
    expect(steerInWords(left, 60, "mm")).toBe("left lock");
    expect(steerInWords(right, 60, "mm")).toBe("right lock");
    expect(steerInWords(right, -60, "mm")).toBe("left lock");
  });

  test("short of a lock says how far towards it", () => {
    expect(steerInWords(left, 0, "mm")).toBe("straight ahead");
    expect(steerInWords(left, -12, "mm")).toBe("12.0 mm towards right lock");
    expect(steerInWords(left, -25.4, "inch")).toBe("1.000 in towards right lock");
  });

  test("while it is not stated, left is the way the car goes", () => {
    expect(leftLockSign(workedAxle)).toBe(1);
  });
});
