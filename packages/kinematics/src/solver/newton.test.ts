import { describe, test } from "vitest";
import { across, distance, subtract, unit } from "../../../../tests/helpers/closedForm/vector.ts";
import { expect } from "../../../../tests/helpers/matchers.ts";
import { asStated, TOLERANCE } from "../../../../tests/helpers/tolerances.ts";
import { type Pose, transformDirection, transformPoint } from "../geometry/pose.ts";
import type { ConstraintRow, Drive } from "../geometry/rows.ts";
import type { Point, Vec3 } from "../geometry/vec3.ts";
import { compileSystem, EQUATIONS, equationIndex, type PoseSystem, setValue } from "./constraints.ts";
import { branchOf } from "./continuation.ts";
import { eliminate } from "./eliminate.ts";
import { applyTwist, CLOSURE, evaluate, solvePose } from "./newton.ts";

const WIDTH = EQUATIONS + 1;
const DEGREE = Math.PI / 180;

function poseOf(system: PoseSystem): Pose<"V", "K"> {
  const [w, x, y, z, tx, ty, tz] = system.pose as unknown as [number, number, number, number, ...Vec3];
  return { rotation: [w, x, y, z], translation: [tx, ty, tz] };
}

const lineOn = (bodyPoint: Point<"V">, name: string): ConstraintRow => ({
  kind: "pointOnLine",
  name,
  bodyPoint,
  linePoint: [0, 0, 0],
  lineDirection: [0, 0, 1],
});

const height: Drive = {
  kind: "drivenPoint",
  name: "height",
  point: [0, 0, 0],
  direction: [0, 0, 1],
  value: 0,
};
const heading: Drive = {
  kind: "drivenDirection",
  name: "heading",
  direction: [1, 0, 0],
  along: [0, 1, 0],
  value: 0,
};

/** A sleeve on an upright post: it slides and turns about Z, and its height and heading are given. */
const sleeve = () =>
  compileSystem([lineOn([0, 0, 0], "foot"), lineOn([0, 0, 300], "head")], [height, heading]);

const rod = (name: string, bodyPoint: Vec3, knucklePoint: Vec3): ConstraintRow => ({
  kind: "distance",
  name,
  bodyPoint,
  knucklePoint,
  length: distance(bodyPoint, knucklePoint),
});

/** A strut of no special symmetry: an arm of two rods, the top mount on a leaning line, a tie rod. */
const BALL_JOINT: Vec3 = [8, 640, 205];
const TOP_MOUNT: Vec3 = [-22, 561, 848];
const WHEEL_CENTRE: Vec3 = [3, 705, 292];
const STRUT_ROWS: readonly ConstraintRow[] = [
  rod("lowerArm.frontPivot", [160, 331, 214], BALL_JOINT),
  rod("lowerArm.rearPivot", [-171, 342, 203], BALL_JOINT),
  {
    kind: "pointOnLine",
    name: "strut",
    bodyPoint: TOP_MOUNT,
    linePoint: [-4, 610, 420],
    lineDirection: subtract(TOP_MOUNT, [-4, 610, 420]),
  },
  rod("tieRod", [-118, 322, 262], [-127, 652, 257]),
];
const wheelHeight: Drive = {
  kind: "drivenPoint",
  name: "wheelHeight",
  point: WHEEL_CENTRE,
  direction: [0, 0, 1],
  value: WHEEL_CENTRE[2],
};

describe("a sleeve on a post", () => {
  test("turns until its driven direction has the component that is asked for", () => {
    const system = sleeve();
    setValue(system, equationIndex(system, "heading"), Math.sin(20 * DEGREE));
    expect(solvePose(system)).toBeGreaterThan(0);
    const { rotation, translation } = poseOf(system);
    expect(rotation).toBeWithin([Math.cos(10 * DEGREE), 0, 0, Math.sin(10 * DEGREE)], TOLERANCE.roundOff);
    expect(translation).toBeWithin([0, 0, 0], TOLERANCE.roundOff);
  });

  test("slides to the height that its driven point is asked for", () => {
    const system = sleeve();
    setValue(system, equationIndex(system, "height"), 12.5);
    expect(solvePose(system)).toBeGreaterThan(0);
    expect([...system.pose]).toBeWithin([1, 0, 0, 0, 0, 0, 12.5], TOLERANCE.roundOff);
  });

  test("needs no elimination where it already stands", () => {
    expect(solvePose(sleeve())).toBe(0);
  });

  test("is refused a direction longer than a unit vector", () => {
    const system = sleeve();
    setValue(system, equationIndex(system, "heading"), 1.02);
    expect(solvePose(system)).toBe(-1);
  });

  test("is refused a start whose residual is over the limit, and taken with one at it", () => {
    const system = sleeve();
    setValue(system, equationIndex(system, "height"), 8);
    expect(solvePose(system, 7.99)).toBe(-1);
    expect(solvePose(system, 8)).toBeGreaterThan(0);
  });

  test("is singular when two drives ask for the same thing", () => {
    const twice = compileSystem(
      [lineOn([0, 0, 0], "foot"), lineOn([0, 0, 300], "head")],
      [height, { ...height, name: "height again" }],
    );
    expect(branchOf(twice)).toBe(0);
    setValue(twice, 4, 1);
    expect(solvePose(twice)).toBe(-1);
  });
});

test("a start far enough off for another assembly is refused instead of slipping there", () => {
  const system = compileSystem(STRUT_ROWS, [wheelHeight]);
  setValue(system, equationIndex(system, "wheelHeight"), WHEEL_CENTRE[2] + 300);
  expect(solvePose(system)).toBe(-1);
});

describe("a strut, which no document describes yet", () => {
  test.each([-60, -25, 0, 10, 40])("keeps every constraint with the wheel %d mm up", (travel) => {
    const system = compileSystem(STRUT_ROWS, [wheelHeight]);
    const drive = equationIndex(system, "wheelHeight");
    for (const share of [0.25, 0.5, 0.75, 1]) {
      setValue(system, drive, WHEEL_CENTRE[2] + travel * share);
      expect(solvePose(system)).toBeGreaterThanOrEqual(0);
    }
    const pose = poseOf(system);
    for (const row of STRUT_ROWS) {
      if (row.kind === "distance") {
        const length = distance(transformPoint(pose, row.knucklePoint), row.bodyPoint);
        expect(length).toBeWithin(row.length, TOLERANCE.closure, row.name);
      } else {
        const along = unit(transformDirection(pose, row.lineDirection));
        const offLine = across(subtract(row.bodyPoint, transformPoint(pose, row.linePoint)), along);
        expect(offLine).toBeWithin([0, 0, 0], TOLERANCE.closure, row.name);
      }
    }
    expect(transformPoint(pose, WHEEL_CENTRE)[2]).toBeWithin(WHEEL_CENTRE[2] + travel, TOLERANCE.closure);
  });
});

describe("the Jacobian", () => {
  // Any pose will do: the derivative holds off the solution too.
  const poses: Readonly<Record<string, readonly number[]>> = {
    "in the design pose": [1, 0, 0, 0, 0, 0, 0],
    "turned and carried off": [0.9, -0.1, 0.3, 0.2, 25, -40, 60].map((x, i) =>
      i < 4 ? x / Math.sqrt(0.95) : x,
    ),
  };
  const systems = {
    "distances, a line and a driven point": () => compileSystem(STRUT_ROWS, [wheelHeight]),
    "lines and a driven direction": sleeve,
  };
  const cases = Object.entries(systems).flatMap(([name, build]) =>
    Object.entries(poses).map(([where, pose]) => ({ name, where, build, pose })),
  );

  test.each(cases)("of $name is the derivative of the residuals, $where", ({ build, pose }) => {
    const system = build();
    const residualsAt = (axis: number, amount: number): number[] => {
      system.pose.set(pose);
      const twist = new Float64Array(EQUATIONS);
      twist[axis] = amount;
      applyTwist(system.pose, twist);
      evaluate(system);
      return Array.from({ length: EQUATIONS }, (_, e) => -(system.work[e * WIDTH + EQUATIONS] as number));
    };
    system.pose.set(pose);
    evaluate(system);
    const jacobian = Float64Array.from(system.work);
    const difference = (axis: number, step: number): number[] => {
      const [after, before] = [residualsAt(axis, step), residualsAt(axis, -step)];
      return after.map((value, e) => (value - (before[e] as number)) / (2 * step));
    };
    // A turn of 1 rad moves these points by metres, so a turn's step is as much smaller.
    for (let axis = 0; axis < EQUATIONS; axis++) {
      const step = Math.cbrt(Number.EPSILON);
      for (const h of [step, step / 2]) {
        for (const [e, estimate] of difference(axis, h).entries()) {
          const analytic = jacobian[e * WIDTH + axis] as number;
          const tolerance = asStated(
            TOLERANCE.finiteDifference.value * Math.max(1, Math.abs(analytic)),
            TOLERANCE.finiteDifference.unit,
            TOLERANCE.finiteDifference.reason,
          );
          expect(estimate).toBeWithin(analytic, tolerance, `equation ${e}, axis ${axis}`);
        }
      }
    }
  });

  test("of a link is its line's direction and moment: its Plücker coordinates", () => {
    const system = compileSystem(STRUT_ROWS, [wheelHeight]);
    evaluate(system);
    const pivot: Vec3 = [160, 331, 214];
    const along = unit(subtract(BALL_JOINT, pivot));
    const moment = [
      pivot[1] * along[2] - pivot[2] * along[1],
      pivot[2] * along[0] - pivot[0] * along[2],
      pivot[0] * along[1] - pivot[1] * along[0],
    ];
    expect([...system.work.subarray(0, EQUATIONS)]).toBeWithin([...along, ...moment], TOLERANCE.roundOff);
  });
});

describe("the 6 × 6 elimination", () => {
  /** Rows of a matrix that needs pivoting in every column, and det = −2·3·4·5·6·7 by its one even cycle. */
  const permuted = (right: readonly number[]): Float64Array =>
    Float64Array.from(
      [
        [0, 2, 0, 0, 0, 0],
        [0, 0, 3, 0, 0, 0],
        [0, 0, 0, 4, 0, 0],
        [0, 0, 0, 0, 5, 0],
        [0, 0, 0, 0, 0, 6],
        [7, 0, 0, 0, 0, 0],
      ].flatMap((row, e) => [...row, right[e] as number]),
    );

  test("solves a system whose every pivot stands in the wrong row, and knows its determinant's sign", () => {
    const solution = new Float64Array(6);
    const report = new Float64Array(2);
    expect(eliminate(permuted([2, 6, 12, 20, 30, 42]), solution, report)).toBe(true);
    expect([...solution]).toBeWithin([6, 1, 2, 3, 4, 5], TOLERANCE.roundOff);
    expect(report[0]).toBeWithin(-5040, TOLERANCE.roundOff);
  });

  test("solves a full system: A x is b again", () => {
    const a = Array.from({ length: 6 }, (_, e) => Array.from({ length: 6 }, (_, k) => 1 / (1 + e + 2 * k)));
    const x = [3, -1, 4, 1, -5, 9];
    const b = a.map((row) => row.reduce((sum, entry, k) => sum + entry * (x[k] as number), 0));
    const solution = new Float64Array(6);
    const work = Float64Array.from(a.flatMap((row, e) => [...row, b[e] as number]));
    expect(eliminate(work, solution, new Float64Array(2))).toBe(true);
    const again = a.map((row) => row.reduce((sum, entry, k) => sum + entry * (solution[k] as number), 0));
    expect(again).toBeWithin(b, TOLERANCE.roundOff);
  });

  test("says no to a singular system and leaves the solution alone", () => {
    const solution = Float64Array.of(9, 9, 9, 9, 9, 9);
    const work = permuted([1, 1, 1, 1, 1, 1]);
    work.fill(0, 0, WIDTH);
    expect(eliminate(work, solution, new Float64Array(2))).toBe(false);
    expect([...solution]).toEqual([9, 9, 9, 9, 9, 9]);
  });
});

describe("a twist applied to a pose", () => {
  test("turns about the car's origin and then adds the velocity", () => {
    const pose = Float64Array.of(1, 0, 0, 0, 100, 0, 0);
    // The Cayley map turns by 2·atan(|ω|/2): |ω| = 2 is a quarter turn.
    applyTwist(pose, Float64Array.of(5, 6, 7, 0, 0, 2));
    const half = Math.SQRT1_2;
    expect([...pose]).toBeWithin([half, 0, 0, half, 5, 106, 7], TOLERANCE.roundOff);
  });

  test("keeps the quaternion unit to 1e-14 however often it is applied", () => {
    const pose = Float64Array.of(1, 0, 0, 0, 0, 0, 0);
    let worst = 0;
    for (let i = 0; i < 100_000; i++) {
      applyTwist(pose, Float64Array.of(0, 0, 0, 0.3 * Math.sin(i), 0.2 * Math.cos(1.7 * i), -0.25));
      const norm = Math.hypot(...pose.subarray(0, 4));
      worst = Math.max(worst, Math.abs(norm - 1));
    }
    expect(worst).toBeLessThan(1e-14);
  });
});

test("a solved pose's residual is under the closure", () => {
  const system = compileSystem(STRUT_ROWS, [wheelHeight]);
  setValue(system, equationIndex(system, "wheelHeight"), WHEEL_CENTRE[2] + 15);
  expect(solvePose(system)).toBeGreaterThan(0);
  expect(evaluate(system)).toBeLessThanOrEqual(CLOSURE);
});
