// Linkages that can be worked out by hand: a strut in one plane, a crank with a rod, a four-bar.

import { describe, test } from "vitest";
import { expect } from "../../../../tests/helpers/matchers.ts";
import { asStated, printedTo, TOLERANCE } from "../../../../tests/helpers/tolerances.ts";
import { type Pose, transformPoint } from "../geometry/pose.ts";
import type { ConstraintRow, Drive } from "../geometry/rows.ts";
import { pointVelocity, type Twist } from "../geometry/twist.ts";
import { distance, type Vec3 } from "../geometry/vec3.ts";
import { compileSystem, equationIndex, type PoseSystem, setBodyPoint, setValue } from "./constraints.ts";
import { branchOf, follow, followColumn, solveAdjoint, solveDriveTwist } from "./continuation.ts";
import { rowThatRanOut } from "./ranOut.ts";

const POSE = 7;
const UP: Vec3 = [0, 0, 1];

const END = asStated(
  1e-6,
  "mm",
  "a fold is narrowed down to steps of 1e-8 mm; a kit is never measured finer than 1e-2",
);

const rod = (name: string, bodyPoint: Vec3, knucklePoint: Vec3): ConstraintRow => ({
  kind: "distance",
  name,
  bodyPoint,
  knucklePoint,
  length: distance(bodyPoint, knucklePoint),
});

function poseIn(numbers: Float64Array, index = 0): Pose<"V", "K"> {
  const [w, x, y, z, ...translation] = numbers.subarray(index * POSE, (index + 1) * POSE);
  return { rotation: [w, x, y, z] as never, translation: translation as unknown as Vec3 };
}

/** The car's y, z of a point that lies in the plane x = 0. */
const inPlane = (pose: Pose<"V", "K">, point: Vec3): number[] => [...transformPoint(pose, point)].slice(1);

/** The first of `values` is where the system stands. */
function column(system: PoseSystem, drive: string, values: readonly number[]) {
  const poses = new Float64Array(values.length * POSE);
  poses.set(system.pose);
  const track = {
    values: Float64Array.from(values),
    poses,
    count: values.length,
    known: 1,
    limit: Number.NaN,
  };
  const solved = followColumn(system, equationIndex(system, drive), track, branchOf(system));
  return { poses, solved, limit: track.limit };
}

/** F3: a strut whose axis runs through the ball joint, arm and tie rod alike, everything in the front view. */
const PIVOT = { y: 330, z: 210 };
const BALL: Vec3 = [0, 640, 200];
const TOP: Vec3 = [0, 560, 850];
const CENTRE: Vec3 = [0, 720, 290];
const CONTACT: Vec3 = [0, 720, 0];
const strut = () =>
  compileSystem(
    [
      rod("lowerArm.frontPivot", [150, PIVOT.y, PIVOT.z], BALL),
      rod("lowerArm.rearPivot", [-150, PIVOT.y, PIVOT.z], BALL),
      {
        kind: "pointOnLine",
        name: "strut",
        bodyPoint: TOP,
        linePoint: BALL,
        lineDirection: [0, TOP[1] - BALL[1], TOP[2] - BALL[2]],
      },
      rod("tieRod", [-120, PIVOT.y, PIVOT.z], [-120, BALL[1], BALL[2]]),
    ],
    [{ kind: "drivenPoint", name: "wheelHeight", point: CENTRE, direction: UP, value: CENTRE[2] }],
  );

/** The same strut with circle and ruler: where the ball joint stands decides where the strut points. */
function strutByHand(armTurnedRad: number) {
  const arm = Math.hypot(BALL[1] - PIVOT.y, BALL[2] - PIVOT.z);
  const drawn = Math.atan2(BALL[2] - PIVOT.z, BALL[1] - PIVOT.y);
  const ball = [
    PIVOT.y + arm * Math.cos(drawn + armTurnedRad),
    PIVOT.z + arm * Math.sin(drawn + armTurnedRad),
  ];
  const lean = (y: number, z: number) => Math.atan2(TOP[2] - z, TOP[1] - y);
  const turned = lean(ball[0] as number, ball[1] as number) - lean(BALL[1], BALL[2]);
  const carried = (point: Vec3): number[] => {
    const [dy, dz] = [point[1] - BALL[1], point[2] - BALL[2]];
    return [
      (ball[0] as number) + dy * Math.cos(turned) - dz * Math.sin(turned),
      (ball[1] as number) + dy * Math.sin(turned) + dz * Math.cos(turned),
    ];
  };
  return { turned, ball, carried };
}

describe("a strut in the front view", () => {
  test.each([-0.2, -0.1, -0.03, 0.05, 0.15, 0.22])(
    "stands where circle and ruler put it with its arm turned by %d rad",
    (armTurnedRad) => {
      const hand = strutByHand(armTurnedRad);
      const height = hand.carried(CENTRE)[1] as number;
      const system = strut();
      const { poses, solved } = column(system, "wheelHeight", [CENTRE[2], height]);
      expect(solved).toBe(2);
      const pose = poseIn(poses, 1);
      expect(inPlane(pose, BALL)).toBeWithin(hand.ball, TOLERANCE.closure);
      expect(inPlane(pose, CONTACT)).toBeWithin(hand.carried(CONTACT), TOLERANCE.closure);
      expect(2 * Math.atan2(pose.rotation[1], pose.rotation[0])).toBeWithin(hand.turned, TOLERANCE.roundOff);
    },
  );

  // The line through the top mount square to the strut meets the arm's line there: every text on suspension.
  test("turns about its instant centre, and has its roll centre 56.069037 mm up", () => {
    const system = strut();
    expect(solveDriveTwist(system, equationIndex(system, "wheelHeight"))).toBe(true);
    const twist: Twist = {
      velocity: [...system.step.subarray(0, 3)] as unknown as Vec3,
      angular: [...system.step.subarray(3, 6)] as unknown as Vec3,
    };
    expect(pointVelocity(twist, CENTRE)[2]).toBeWithin(1, TOLERANCE.roundOff);
    const instantCentre: Vec3 = [0, -3607.891374, 337.028754];
    expect(pointVelocity(twist, instantCentre)).toBeWithin([0, 0, 0], printedTo(6, "mm per mm"));
    const [, vy, vz] = pointVelocity(twist, CONTACT);
    expect((CONTACT[1] * vy) / vz).toBeWithin(56.069037, asStated(1e-5, "mm", "the source states it"));
  });
});

/** A crank on an upright post, turned by a rod whose other joint is carried along by the steering. */
const CRANK = 120;
const ROD = 300;
const crank = (innerAt: Vec3, crankRad: number) => {
  const joint: Vec3 = [CRANK * Math.cos(crankRad), CRANK * Math.sin(crankRad), 0];
  const post = (name: string, z: number): ConstraintRow => ({
    kind: "pointOnLine",
    name,
    bodyPoint: [0, 0, z],
    linePoint: [0, 0, 0],
    lineDirection: UP,
  });
  const height: Drive = { kind: "drivenPoint", name: "height", point: [0, 0, 0], direction: UP, value: 0 };
  const system = compileSystem([post("foot", -200), post("head", 200), rod("rod", innerAt, joint)], [height]);
  return { system, rodIndex: equationIndex(system, "rod"), joint };
};

/** The crank's angle by the law of cosines; `sign` is the assembly. */
function crankAngle([x, y]: Vec3, sign: 1 | -1): number {
  const d = Math.hypot(x, y);
  return Math.atan2(y, x) + sign * Math.acos((CRANK ** 2 + d ** 2 - ROD ** 2) / (2 * CRANK * d));
}

const crankTurned = (pose: Float64Array): number => 2 * Math.atan2(pose[3] as number, pose[0] as number);

describe("a crank turned by a rod", () => {
  const straightPath = (from: Vec3, to: Vec3, sign: 1 | -1) => {
    const { system, rodIndex } = crank(from, crankAngle(from, sign));
    const place = (fraction: number): void =>
      setBodyPoint(system, rodIndex, [
        from[0] + (to[0] - from[0]) * fraction,
        from[1] + (to[1] - from[1]) * fraction,
        0,
      ]);
    return { system, outcome: follow(system, { length: distance(from, to), place }, branchOf(system)) };
  };

  test.each([
    { clear: 10, sign: 1 as const },
    { clear: 1, sign: 1 as const },
    { clear: 0.01, sign: 1 as const },
    { clear: 0.01, sign: -1 as const },
    { clear: 1e-5, sign: 1 as const },
  ])(
    "stays on its assembly when the rod passes $clear mm short of folding over the crank (assembly $sign)",
    ({ clear, sign }) => {
      const from: Vec3 = [ROD - CRANK + clear, -90, 0];
      const to: Vec3 = [ROD - CRANK + clear, 75, 0];
      const { system, outcome } = straightPath(from, to, sign);
      expect(outcome).toEqual({ status: "arrived" });
      const turnedRad = crankAngle(to, sign) - crankAngle(from, sign);
      expect(crankTurned(system.pose)).toBeWithin(turnedRad, TOLERANCE.closure);
    },
  );

  test("is followed to where rod and crank lie stretched in one line, and no further", () => {
    const from: Vec3 = [350, 0, 0];
    const { system, outcome } = straightPath(from, [520, 0, 0], -1);
    const reached = outcome.status === "stopped" ? 350 + 170 * outcome.fraction : Number.NaN;
    expect(reached).toBeWithin(CRANK + ROD, END);
    // It is left there, assembled: the rod has its length.
    const joint = transformPoint(poseIn(system.pose), [
      CRANK * Math.cos(crankAngle(from, -1)),
      CRANK * Math.sin(crankAngle(from, -1)),
      0,
    ]);
    expect(distance(joint, [reached, 0, 0])).toBeWithin(ROD, TOLERANCE.closure);
  });

  test("blames the rod for that, not the post", () => {
    const { system } = straightPath([350, 0, 0], [520, 0, 0], 1);
    expect(rowThatRanOut(system, ["height"])).toBe("rod");
  });

  test("goes the whole way of a path that ends a hair before the dead point", () => {
    const to: Vec3 = [CRANK + ROD - 1e-6, 0, 0];
    const { system, outcome } = straightPath([350, 0, 0], to, 1);
    expect(outcome).toEqual({ status: "arrived" });
    const turnedRad = crankAngle(to, 1) - crankAngle([350, 0, 0], 1);
    // Near the dead point a closure of 1e-10 mm leaves √(1e-10·2L/(r(r+L))) of angle free.
    expect(crankTurned(system.pose)).toBeWithin(turnedRad, asStated(1e-6, "rad", "see above"));
  });

  test("has its dead point told as no branch at all", () => {
    const { system } = crank([CRANK + ROD, 0, 0], 0);
    expect(branchOf(system)).toBe(0);
  });

  test("has opposite branches on its two assemblies", () => {
    const [one, other] = ([1, -1] as const).map((sign) =>
      branchOf(crank([350, 0, 0], crankAngle([350, 0, 0], sign)).system),
    );
    expect(Math.abs(one as number)).toBe(1);
    expect(other).toBe(-(one as number));
  });

  test("turns by the adjoint's gain when its rod is made longer", () => {
    const { system, rodIndex } = crank([350, 0, 0], crankAngle([350, 0, 0], 1));
    expect(solveAdjoint(system, [0, 0, 0, 0, 0, 1])).toBe(true);
    // L² = r² + d² − 2rd·cos θ, so dθ/dL = L/(r·d·sin θ).
    const gain = ROD / (CRANK * 350 * Math.sin(crankAngle([350, 0, 0], 1)));
    expect(system.step[rodIndex]).toBeWithin(gain, TOLERANCE.roundOff);
  });
});

/** A four-bar in the front view, driven by its crank's joint: crank 150, coupler 180, rocker 130, pivots 300 apart. */
const A = 150;
const B = 180;
const C = 130;
const D = 300;
const couplerJoints = (crankRad: number) => {
  const a: Vec3 = [0, A * Math.cos(crankRad), A * Math.sin(crankRad)];
  const [dy, dz] = [D - a[1], -a[2]];
  const diagonal = Math.hypot(dy, dz);
  const rise = Math.atan2(dz, dy) + Math.acos((B ** 2 + diagonal ** 2 - C ** 2) / (2 * B * diagonal));
  const b: Vec3 = [0, a[1] + B * Math.cos(rise), a[2] + B * Math.sin(rise)];
  return { a, b, rise };
};
const START = couplerJoints(0.3);
const fourBar = () =>
  compileSystem(
    [
      rod("crank.front", [140, 0, 0], START.a),
      rod("crank.rear", [-140, 0, 0], START.a),
      rod("rocker.front", [140, D, 0], START.b),
      rod("rocker.rear", [-140, D, 0], START.b),
    ],
    [
      { kind: "drivenPoint", name: "crankHeight", point: START.a, direction: UP, value: START.a[2] },
      // Keeps the coupler from spinning about itself; it never stands upright, where this would not hold it.
      { kind: "drivenDirection", name: "unspun", direction: [1, 0, 0], along: UP, value: 0 },
    ],
  );
/** The crank's joint height at which coupler and rocker lie in one line: |A − C|² = (b + c)² by the law of cosines. */
const LOWEST = -A * Math.sqrt(1 - ((A ** 2 + D ** 2 - (B + C) ** 2) / (2 * A * D)) ** 2);

describe("a four-bar driven by its crank", () => {
  const evenly = (from: number, to: number, count: number): number[] =>
    Array.from({ length: count + 1 }, (_, k) => from + ((to - from) * k) / count);
  const uneven = [0, 1, 1.5, 6, 6.001, 20, 45, 60, 61].map((z) => START.a[2] + z);

  test.each([
    { name: "even", values: evenly(START.a[2], START.a[2] + 95, 40) },
    { name: "uneven", values: uneven },
    { name: "two far apart", values: [START.a[2], START.a[2] + 95] },
    { name: "repeated", values: [0, 0, 5, 5, 5, 5, 5, 10].map((z) => START.a[2] + z) },
  ])("stands as trigonometry has it at $name heights", ({ values }) => {
    const { poses, solved } = column(fourBar(), "crankHeight", values);
    expect(solved).toBe(values.length);
    for (const [index, height] of values.entries()) {
      const hand = couplerJoints(Math.asin(height / A));
      const pose = poseIn(poses, index);
      expect(transformPoint(pose, START.a)).toBeWithin(hand.a, TOLERANCE.closure, `a at ${height}`);
      expect(transformPoint(pose, START.b)).toBeWithin(hand.b, TOLERANCE.closure, `b at ${height}`);
    }
  });

  test("is given the same poses whether predicted by the column or followed one by one", () => {
    const values = evenly(START.a[2], START.a[2] + 90, 30);
    const { poses } = column(fourBar(), "crankHeight", values);
    const system = fourBar();
    const drive = equationIndex(system, "crankHeight");
    const branch = branchOf(system);
    for (const [index, value] of values.entries()) {
      const before = values[Math.max(0, index - 1)] as number;
      const place = (fraction: number): void => setValue(system, drive, before + (value - before) * fraction);
      follow(system, { length: Math.max(1e-9, value - before), place }, branch);
      expect([...system.pose]).toBeWithin(
        [...poses.subarray(index * POSE, (index + 1) * POSE)],
        TOLERANCE.closure,
      );
    }
  });

  test("ends where coupler and rocker lie in one line, however the heights are spaced", () => {
    for (const step of [3, 7.5, 40, 400]) {
      const values = Array.from({ length: Math.ceil(400 / step) + 1 }, (_, k) => START.a[2] - k * step);
      const { solved, limit } = column(fourBar(), "crankHeight", values);
      expect(limit).toBeWithin(LOWEST, END, `step ${step}`);
      expect(solved).toBe(values.filter((value) => value >= LOWEST).length);
    }
  });

  test("stays on its side of the dead point when it turns back a hair before it", () => {
    const there = evenly(START.a[2], LOWEST + 1e-4, 23);
    const { poses, solved } = column(fourBar(), "crankHeight", [...there, ...there.toReversed()]);
    expect(solved).toBe(2 * there.length);
    const last = poses.subarray((2 * there.length - 1) * POSE);
    expect([...last]).toBeWithin([1, 0, 0, 0, 0, 0, 0], TOLERANCE.closure);
  });

  test("keeps links to 1e-9 mm and its quaternion unit to 1e-14 after thousands of poses", () => {
    const swing = Array.from({ length: 6000 }, (_, k) => START.a[2] + 55 * Math.sin(k / 7));
    const { poses, solved } = column(fourBar(), "crankHeight", [START.a[2], ...swing]);
    expect(solved).toBe(6001);
    let [worstLink, worstNorm] = [0, 0];
    for (let index = 0; index < solved; index++) {
      const pose = poseIn(poses, index);
      const coupler = distance(transformPoint(pose, START.a), transformPoint(pose, START.b));
      const rocker = distance(transformPoint(pose, START.b), [140, D, 0]);
      const lengths = [coupler - B, rocker - Math.hypot(140, C)];
      worstLink = Math.max(worstLink, ...lengths.map(Math.abs));
      worstNorm = Math.max(worstNorm, Math.abs(Math.hypot(...pose.rotation) - 1));
    }
    expect(worstLink).toBeLessThan(1e-9);
    expect(worstNorm).toBeLessThan(1e-14);
  });
});
