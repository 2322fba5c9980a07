// What comes from a file or a request: parsed whole and kept whole, or refused with every reason.

import type { Axle, Study } from "@linkwright/kinematics";
import { describe, test } from "vitest";
import { rearFixed, unequalSides } from "../../../tests/helpers/axles.ts";
import { expect } from "../../../tests/helpers/matchers.ts";
import { workedAxle } from "../../../tests/helpers/workedAxle.ts";
import { type Parsed, parseAxle, parseStudy } from "./documents.ts";

type Json = Record<string, unknown>;

/** A document with every member that format 1 has. */
const everything: Axle = {
  ...unequalSides,
  left: {
    ...workedAxle.left,
    wheel: {
      ...workedAxle.left.wheel,
      rim: { diameter: 330.2, width: 139.7, offset: -12 },
      tyre: { width: 165, diameter: 561 },
    },
    spring: {
      body: [2, 345, 560],
      lower: [4, 470, 190],
      on: "lowerArm",
      rateNPerMm: 28,
      freeLength: 300,
      openLength: 440,
      closedLength: 320,
    },
    antiRollBar: {
      axis: [
        [-150, 0, 250],
        [-150, 300, 250],
      ],
      arm: [-40, 300, 240],
      link: { lower: [-40, 400, 200], on: "lowerArm" },
      rateNmPerDeg: 12,
    },
    shapes: [{ on: "knuckle", from: [0, 580, 180], to: [0, 550, 420], radius: 18 }],
  },
  steering: {
    type: "rack",
    axis: [0, 1, 0],
    travel: 60,
    mmPerTurn: 44,
    wheelLeftMoves: "left",
    bought: true,
  },
  body: {
    massKg: 640,
    frontMassShare: 0.48,
    cgHeight: 430,
    frontBrakeShare: 0.66,
    driveShare: 0,
    unsprungMassKg: 26,
  },
};

const study: Study = {
  format: "linkwright.study/1",
  axle: everything,
  rideHeights: [
    { name: "Street", wheelUp: 0, rakeDeg: 0.5, band: [-50, 50] },
    { name: "Hill climb", wheelUp: 35, rakeDeg: 0, band: [-40, 40] },
  ],
  targets: [
    { quantity: "bumpSteerDeg", min: -0.15, max: 0.15 },
    { quantity: "track", min: null, max: 1300 },
  ],
  datum: { name: "Jig table", origin: [-200, 0, 100], xAxis: [1, 0, 0], zAxis: [0, 0, 1] },
  tolerances: [],
  pointNotes: [],
  locks: [],
  parts: [],
  shims: [],
};

/** As a file or a request brings it. */
const asJson = (document: unknown): Json => JSON.parse(JSON.stringify(document)) as Json;

/** A copy of the worked axle with one value put at a path; undefined takes the member away. */
function changed(path: string, value: unknown, document: unknown = workedAxle): Json {
  const copy = asJson(document);
  const steps = path.split(".");
  const last = steps.pop() as string;
  let at: Json = copy;
  for (const step of steps) at = at[step] as Json;
  if (value === undefined) delete at[last];
  else at[last] = value;
  return copy;
}

const issuesOf = (parsed: Parsed<unknown>) => (parsed.ok ? [] : parsed.issues);
const pathsOf = (parsed: Parsed<unknown>): string[] => issuesOf(parsed).map(({ path }) => path.join("."));

describe("a document of format 1 is loaded and saved again as it was", () => {
  test.each([
    { name: "the worked axle", axle: workedAxle },
    { name: "a rear axle with a toe link", axle: rearFixed },
    { name: "two unlike sides", axle: unequalSides },
    { name: "an axle with every optional member", axle: everything },
  ])("$name", ({ axle }) => {
    const parsed = parseAxle(asJson(axle));
    expect(parsed).toEqual({ ok: true, value: axle });
    expect(parsed.ok && asJson(parsed.value)).toEqual(asJson(axle));
  });

  test("a study", () => {
    expect(parseStudy(asJson(study))).toEqual({ ok: true, value: study });
  });

  test("no number loses a digit", () => {
    const inner = [0.1 + 0.2, 275.00000000000006, -1 / 3];
    const parsed = parseAxle(changed("left.tieRod.inner", inner));
    expect(parsed.ok && parsed.value.left.tieRod.inner).toEqual(inner);
  });

  test("what comes in is left as it came", () => {
    const input = asJson(study);
    parseStudy(input);
    expect(input).toEqual(asJson(study));
  });
});

describe("what is unknown is refused under its full path", () => {
  test.each([
    "colour",
    "body.colour",
    "steering.colour",
    "left.colour",
    "left.suspension.colour",
    "left.suspension.lowerArm.colour",
    "left.tieRod.colour",
    "left.wheel.rim.colour",
    "left.spring.colour",
    "left.antiRollBar.link.colour",
    "left.shapes.0.colour",
    "right.colour",
    "right.suspension.upperArm.colour",
    "right.wheel.colour",
  ])("%s", (path) => {
    expect(issuesOf(parseAxle(changed(path, "red", everything)))).toEqual([
      {
        path: path.split(".").map((step) => (step === "0" ? 0 : step)),
        value: "red",
        problem: '"colour" is not known here.',
        hint: "Check the spelling, or remove it: nothing unknown is kept.",
      },
    ]);
  });

  test("several at once", () => {
    const input = { ...changed("left.colour", "red"), owner: "nobody", left2: {} };
    expect(pathsOf(parseAxle(input)).toSorted()).toEqual(["left.colour", "left2", "owner"]);
  });

  test("in a study, the axle's own too", () => {
    expect(pathsOf(parseStudy(changed("rideHeights.1.colour", "red", study)))).toEqual([
      "rideHeights.1.colour",
    ]);
    expect(pathsOf(parseStudy(changed("axle.left.colour", "red", study)))).toEqual(["axle.left.colour"]);
  });

  test("even under a name that JavaScript has a use for", () => {
    const text = JSON.stringify(workedAxle).replace("{", '{"__proto__": {"name": "x"},');
    expect(pathsOf(parseAxle(JSON.parse(text)))).toEqual(["__proto__"]);
  });
});

describe("what is required and absent is asked for", () => {
  test.each([
    "format",
    "name",
    "position",
    "wheelbase",
    "left",
    "right",
    "steering",
    "steering.axis",
    "steering.travel",
    "left.suspension",
    "left.suspension.lowerArm",
    "left.suspension.upperArm.ballJoint",
    "left.tieRod.inner",
    "left.wheel.toeDeg",
    "left.wheel.loadedRadius",
    "left.spring.on",
    "right.wheel",
    "right.tieRod.outer",
  ])("%s", (path) => {
    expect(issuesOf(parseAxle(changed(path, undefined, everything)))).toEqual([
      {
        path: path.split("."),
        value: undefined,
        problem: "Nothing stands here.",
        hint: "Add it: it is required.",
      },
    ]);
  });

  test.each(["rideHeights", "targets", "datum", "tolerances", "shims"])("%s of a study", (path) => {
    expect(pathsOf(parseStudy(changed(path, undefined, study)))).toEqual([path]);
  });
});

describe("a number", () => {
  test("written as text is refused, and the remedy named", () => {
    expect(issuesOf(parseAxle(changed("left.tieRod.inner.1", "275")))).toEqual([
      {
        path: ["left", "tieRod", "inner", 1],
        value: "275",
        problem: "This must be a number.",
        hint: "Write the number without quotation marks.",
      },
    ]);
  });

  test.each([Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY])("%d is none", (value) => {
    const input = structuredClone(workedAxle) as unknown as {
      wheelbase: number;
      left: { wheel: { centre: number[] } };
    };
    input.left.wheel.centre[2] = value;
    input.wheelbase = value;
    expect(pathsOf(parseAxle(input))).toEqual(["wheelbase", "left.wheel.centre.2"]);
  });

  test("that JSON could not carry and wrote as null is none", () => {
    expect(pathsOf(parseAxle(changed("wheelbase", null)))).toEqual(["wheelbase"]);
  });

  test.each([
    { path: "wheelbase", good: 1e-3, bad: 0 },
    { path: "left.wheel.loadedRadius", good: 1e-3, bad: -300 },
    { path: "left.wheel.toeDeg", good: 0.99 * 45, bad: 1.01 * 45 },
    { path: "left.wheel.toeDeg", good: -0.99 * 45, bad: -1.01 * 45 },
    { path: "left.wheel.camberDeg", good: 0.99 * 45, bad: 1.01 * 45 },
    { path: "left.wheel.camberDeg", good: -0.99 * 45, bad: -1.01 * 45 },
    { path: "steering.travel", good: 1e-3, bad: 0 },
    { path: "steering.mmPerTurn", good: 44, bad: -44 },
    { path: "left.spring.rateNPerMm", good: 1e-3, bad: 0 },
    { path: "left.shapes.0.radius", good: 1e-3, bad: 0 },
    { path: "body.frontBrakeShare", good: 1, bad: 1.01 },
    { path: "body.frontMassShare", good: 0, bad: -0.01 },
    { path: "body.driveShare", good: 0.99, bad: 1.01 },
    { path: "body.cgHeight", good: 1e-3, bad: 0 },
  ])("of $path may be $good but not $bad", ({ path, good, bad }) => {
    expect(pathsOf(parseAxle(changed(path, good, everything)))).toEqual([]);
    expect(issuesOf(parseAxle(changed(path, bad, everything)))).toMatchObject([{ value: bad }]);
    expect(pathsOf(parseAxle(changed(path, bad, everything)))).toEqual([path]);
  });

  test.each([
    { path: "rideHeights.0.wheelUp", good: 0.99 * 500, bad: 1.01 * 500 },
    { path: "rideHeights.0.wheelUp", good: -0.99 * 500, bad: -1.01 * 500 },
    { path: "rideHeights.0.rakeDeg", good: 0.99 * 20, bad: 1.01 * 20 },
    { path: "rideHeights.0.band.0", good: -0.99 * 500, bad: -1.01 * 500 },
    { path: "rideHeights.0.band.1", good: 0.99 * 500, bad: 1.01 * 500 },
  ])("of a study's $path may be $good but not $bad", ({ path, good, bad }) => {
    expect(pathsOf(parseStudy(changed(path, good, study)))).toEqual([]);
    expect(pathsOf(parseStudy(changed(path, bad, study)))).toEqual([path]);
  });
});

describe("a word out of a list", () => {
  test("that is not in it is refused with the list", () => {
    expect(issuesOf(parseAxle(changed("position", "middle")))).toMatchObject([
      { path: ["position"], value: "middle", hint: 'Use one of: "front", "rear".' },
    ]);
  });

  test.each([
    { path: "format", value: "linkwright.axle/2" },
    { path: "steering.wheelLeftMoves", value: "port" },
    { path: "left.spring.on", value: "tieRod" },
    { path: "left.shapes.0.on", value: "rim" },
    { path: "steering.type", value: "tiller" },
    { path: "left.suspension.type", value: "leafSpring" },
  ])("$path cannot be $value", ({ path, value }) => {
    expect(issuesOf(parseAxle(changed(path, value, everything)))).toMatchObject([
      { path: path.split(".").map((step) => (step === "0" ? 0 : step)), value },
    ]);
  });

  test("a target's quantity must be one that is judged", () => {
    expect(pathsOf(parseStudy(changed("targets.0.quantity", "comfort", study)))).toEqual([
      "targets.0.quantity",
    ]);
  });
});

describe("the right side", () => {
  test("that is a corner is told what is wrong with the corner, not with the choice", () => {
    const right = {
      ...unequalSides.left,
      tieRod: { inner: [1, 2, "3"], outer: [4, 5, 6] },
      wheel: undefined,
    };
    const input = { ...workedAxle, right };
    expect(pathsOf(parseAxle(asJson(input)))).toEqual(["right.tieRod.inner.2", "right.wheel"]);
  });

  test("that is neither a corner nor a mirror is refused at its own place", () => {
    for (const value of ["mirrored", 7, true, null, []]) {
      expect(pathsOf(parseAxle(changed("right", value)))).toEqual(["right"]);
    }
  });
});

describe("a point", () => {
  test("of two or four numbers is none", () => {
    expect(pathsOf(parseAxle(changed("left.tieRod.inner", [1, 2])))).toEqual(["left.tieRod.inner"]);
    expect(pathsOf(parseAxle(changed("left.tieRod.inner", [1, 2, 3, 4])))).toEqual(["left.tieRod.inner"]);
  });

  test("written with names is none", () => {
    expect(pathsOf(parseAxle(changed("left.tieRod.inner", { x: 1, y: 2, z: 3 })))).toEqual([
      "left.tieRod.inner",
    ]);
  });
});

test.each([null, 7, "linkwright", [], [workedAxle]])("%j is no document at all", (input) => {
  expect(pathsOf(parseAxle(input))).toEqual([""]);
  expect(pathsOf(parseStudy(input))).toEqual([""]);
});

describe("a name", () => {
  test("must be there", () => {
    expect(pathsOf(parseAxle(changed("name", "   ")))).toEqual(["name"]);
  });

  test("may have 120 characters and not 121", () => {
    expect(pathsOf(parseAxle(changed("name", "n".repeat(120))))).toEqual([]);
    expect(pathsOf(parseAxle(changed("name", "n".repeat(121))))).toEqual(["name"]);
  });
});

test("lists that have their place in the format and no use yet must be empty", () => {
  for (const list of ["tolerances", "pointNotes", "locks", "parts", "shims"]) {
    const [first] = issuesOf(parseStudy(changed(list, [{ spare: "ball joint" }], study)));
    expect(first?.path[0]).toBe(list);
  }
});

describe("a document of the right shape whose geometry is impossible", () => {
  test("is refused by the engine's own check", () => {
    expect(issuesOf(parseAxle(changed("left.wheel.centre", [0, -640, 305])))).toMatchObject([
      { path: ["left", "wheel", "centre"], value: [0, -640, 305] },
    ]);
  });

  test("is told its shape first: geometry of broken points says nothing", () => {
    const input = changed("left.wheel.centre", [0, -640, 305]);
    input.wheelbase = "long";
    expect(pathsOf(parseAxle(input))).toEqual(["wheelbase"]);
  });

  test("has its path below the axle in a study", () => {
    expect(pathsOf(parseStudy(changed("axle.left.wheel.centre", [0, -640, 305], study)))).toEqual([
      "axle.left.wheel.centre",
    ]);
  });
});
