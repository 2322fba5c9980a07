import { describe, test } from "vitest";
import { expect } from "../../../../tests/helpers/matchers.ts";
import { workedAxle } from "../../../../tests/helpers/workedAxle.ts";
import { checkStudyLists } from "./checkStudy.ts";
import { formatPath } from "./issue.ts";
import type { Datum, RideHeight, Study, Target } from "./study.ts";

const study = (change: Partial<Study>): Study => ({
  format: "linkwright.study/1",
  axle: workedAxle,
  rideHeights: [],
  targets: [],
  datum: null,
  tolerances: [],
  pointNotes: [],
  locks: [],
  parts: [],
  shims: [],
  ...change,
});

const pathsOf = (change: Partial<Study>): string[] =>
  checkStudyLists(study(change)).map(({ path }) => formatPath(path));

const height = (band: RideHeight["band"], name = "Street"): RideHeight => ({
  name,
  wheelUp: 0,
  rakeDeg: 0,
  band,
});

test("a study that asks for nothing is not refused", () => {
  expect(checkStudyLists(study({}))).toEqual([]);
});

describe("a ride height's band", () => {
  test.each([{ band: [-50, 50] as const }, { band: [0, 50] as const }, { band: [-0.1, 0] as const }])(
    "$band about the ride height is one",
    ({ band }) => {
      expect(pathsOf({ rideHeights: [height(band)] })).toEqual([]);
    },
  );

  test.each([
    { band: [50, -50] as const },
    { band: [0.1, 50] as const },
    { band: [-50, -0.1] as const },
    { band: [0, 0] as const },
  ])("$band is none", ({ band }) => {
    expect(checkStudyLists(study({ rideHeights: [height([-1, 1], "A"), height(band, "B")] }))).toEqual([
      {
        path: ["rideHeights", 1, "band"],
        value: band,
        problem: 'The band of "B" must run from droop (0 or less) to bump (0 or more).',
        hint: "Give the travel about this ride height, for example [-50, 50].",
      },
    ]);
  });
});

test("two ride heights of one name are told apart by refusing the later one", () => {
  const rideHeights = [height([-50, 50], "Street"), height([-40, 40], "Track"), height([-30, 30], "Street")];
  expect(checkStudyLists(study({ rideHeights }))).toEqual([
    {
      path: ["rideHeights", 2, "name"],
      value: "Street",
      problem: 'Another ride height is called "Street".',
      hint: "Give each ride height a name of its own.",
    },
  ]);
});

describe("a target", () => {
  const target = (min: number | null, max: number | null): Target => ({ quantity: "camberDeg", min, max });

  test("may bound one side, both, or be a single value", () => {
    expect(pathsOf({ targets: [target(-2, null), target(null, 0), target(-2, 0), target(-1, -1)] })).toEqual(
      [],
    );
  });

  test("without a bound asks for nothing", () => {
    expect(checkStudyLists(study({ targets: [target(-2, 0), target(null, null)] }))).toMatchObject([
      { path: ["targets", 1], hint: "Give min, max or both, or remove the target." },
    ]);
  });

  test("whose least lies above its greatest can never be met", () => {
    expect(checkStudyLists(study({ targets: [target(-1, -1.01)] }))).toMatchObject([
      {
        path: ["targets", 0, "min"],
        value: -1,
        problem: "The least value is above the greatest, -1.01.",
        hint: "Exchange the two.",
      },
    ]);
    expect(pathsOf({ targets: [target(-1, -0.99)] })).toEqual([]);
  });
});

describe("a datum", () => {
  const datum = (xAxis: Datum["xAxis"], zAxis: Datum["zAxis"]): Datum => ({
    name: "Jig",
    origin: [0, 0, 0],
    xAxis,
    zAxis,
  });
  const leaning = (angleDeg: number): Datum =>
    datum([2, 0, 0], [Math.cos((angleDeg * Math.PI) / 180), 0, Math.sin((angleDeg * Math.PI) / 180)]);

  test("with square axes is one, wherever they point", () => {
    expect(pathsOf({ datum: datum([0, 0, -3], [5, 5, 0]) })).toEqual([]);
  });

  test.each([1, -1])("may be off square by 0.099° (to side %d) but not by 0.101°", (side) => {
    expect(pathsOf({ datum: leaning(90 + side * 0.099) })).toEqual([]);
    expect(pathsOf({ datum: leaning(90 + side * 0.101) })).toEqual(["datum.zAxis"]);
  });

  test("with a crooked axis is told the angle", () => {
    expect(checkStudyLists(study({ datum: leaning(60) }))).toMatchObject([
      {
        path: ["datum", "zAxis"],
        problem: "The datum's x and z axes make 60.00°; they must be square.",
        hint: "Give two directions at right angles.",
      },
    ]);
  });

  test("with an axis of no direction is told which", () => {
    expect(checkStudyLists(study({ datum: datum([0, 0, 0], [0, 0, 1]) }))).toMatchObject([
      { path: ["datum", "xAxis"], value: [0, 0, 0] },
    ]);
    expect(pathsOf({ datum: datum([1, 0, 0], [0, 0, 0]) })).toEqual(["datum.zAxis"]);
  });
});
