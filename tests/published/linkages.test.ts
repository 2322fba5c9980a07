// Linkages from textbooks and papers, written as axles (see loopAxle.ts) and solved by the product's sweep.

import { checkAxle, type SideRow, sweepAxle } from "@linkwright/kinematics";
import { describe, test } from "vitest";
import { type Branch, circleThrough, meetSphere } from "../helpers/closedForm/circle.ts";
import { add, cross, dot, length, scale, subtract, unit, type Vector } from "../helpers/closedForm/vector.ts";
import { type Crank, jointAt, type Loop, type PlacedLoop, placeLoop } from "../helpers/loopAxle.ts";
import { expect } from "../helpers/matchers.ts";
import { asStated, printedTo, TOLERANCE } from "../helpers/tolerances.ts";

const radians = (degrees: number): number => (degrees * Math.PI) / 180;
const degrees = (angle: number): number => (angle * 180) / Math.PI;
/** The same direction, in −180 … 180°. */
const wrapped = (angleDeg: number): number => ((((angleDeg + 180) % 360) + 360) % 360) - 180;

/** Where the other crank stands, worked out in closed form: what the axle is drawn at. */
function outputAngle({ input, output }: Loop, rodLength: number, inputRad: number, branch: Branch): number {
  const circle = circleThrough(output.joint, output.origin, output.axis);
  const angle = meetSphere(circle, jointAt(input, inputRad), rodLength, branch);
  if (angle === null) throw new Error(`the loop does not close at ${degrees(inputRad)}°`);
  return angle;
}

/** Draws the loop at `drawnDeg` and lets the engine carry it to `toDeg`. */
function carry(
  loop: Loop,
  rodLength: number,
  branch: Branch,
  { drawnDeg, toDeg }: { drawnDeg: number; toDeg: number },
): { placed: PlacedLoop; side: SideRow } {
  const drawn = radians(drawnDeg);
  const outputRad = outputAngle(loop, rodLength, drawn, branch);
  const placed = placeLoop(loop, { inputRad: drawn, outputRad }, radians(toDeg));
  expect(checkAxle(placed.axle)).toEqual([]);
  const sweep = sweepAxle(placed.axle, { travels: [placed.travelTo(radians(toDeg))], steers: [0] });
  const side = sweep.rows[0]?.left;
  if (!side) throw new Error(`not reached: ${JSON.stringify(sweep.ends)}`);
  return { placed, side };
}

const Z: Vector = [0, 0, 1];
const planarCrank = (x: number, y: number, arm: number): Crank => ({
  origin: [x, y, 0],
  axis: Z,
  joint: [x + arm, y, 0],
});

interface FourBar {
  readonly crank: number;
  readonly coupler: number;
  readonly rocker: number;
  /** From the crank's pivot to the rocker's. */
  readonly ground: readonly [number, number];
}

const fourBarLoop = ({ crank, rocker, ground }: FourBar): Loop => ({
  input: planarCrank(0, 0, crank),
  output: planarCrank(ground[0], ground[1], rocker),
});

/** θ3 and θ4 of a four-bar, degrees, when the crank has been turned to θ2. */
function fourBarAt(bar: FourBar, branch: Branch, turned: { drawnDeg: number; toDeg: number }) {
  const loop = fourBarLoop(bar);
  const { placed, side } = carry(loop, bar.coupler, branch, turned);
  const inputRad = radians(turned.toDeg);
  const joint = placed.outputJoint(side, inputRad);
  const rod = subtract(joint, jointAt(loop.input, inputRad));
  const arm = subtract(joint, loop.output.origin);
  expect(length(arm)).toBeWithin(bar.rocker, TOLERANCE.closure, "the rocker");
  return {
    theta3Deg: degrees(Math.atan2(rod[1], rod[0])),
    theta4Deg: degrees(Math.atan2(arm[1], arm[0])),
    omega3: placed.rodSpeedRatio(side, inputRad),
    omega4: placed.speedRatio(side, inputRad),
  };
}

const level = (crank: number, coupler: number, rocker: number, ground: number): FourBar => ({
  crank,
  coupler,
  rocker,
  ground: [ground, 0],
});

// R. L. Norton, Design of Machinery, Ex. 4-1: lengths read in a public transcription, angles from memory; the open
// branch was reproduced by a general constraint solver (planegcs). Full digits by Freudenstein's equation.
describe("Norton's four-bar 40, 120, 80, 100 mm", () => {
  const bar = level(40, 120, 80, 100);

  test.each([
    {
      name: "open",
      branch: -1 as const,
      toDeg: 40,
      theta3Deg: 20.297883,
      theta4Deg: 57.32488,
      printed: [20.3, 57.33],
    },
    {
      name: "crossed",
      branch: 1 as const,
      toDeg: 40,
      theta3Deg: -60.977967,
      theta4Deg: -98.004964,
      printed: [-60.98, -98.01],
    },
    { name: "open", branch: -1 as const, toDeg: 30, theta3Deg: 22.409015, theta4Deg: 55.267777 },
    { name: "crossed", branch: 1 as const, toDeg: 30, theta3Deg: -56.437478, theta4Deg: -89.296241 },
  ])(
    "stands at the known angles with the crank at $toDeg°, $name",
    ({ branch, toDeg, printed, ...angles }) => {
      const found = fourBarAt(bar, branch, { drawnDeg: toDeg - 25, toDeg });
      expect(found).toBeWithin(
        { theta3Deg: angles.theta3Deg, theta4Deg: angles.theta4Deg },
        printedTo(6, "degrees"),
      );
      if (printed) {
        const book = asStated(0.006, "degrees", "the book rounds its intermediate steps");
        expect([found.theta3Deg, found.theta4Deg]).toBeWithin(printed, book);
      }
    },
  );

  // Norton, Ex. 6-7: set-up read, results from memory, matched by the closed form.
  test("turns and moves at the known speeds with the crank at 25 rad/s", () => {
    const { omega3, omega4, theta4Deg } = fourBarAt(bar, -1, { drawnDeg: 20, toDeg: 40 });
    expect({ omega3: 25 * omega3, omega4: 25 * omega4 }).toBeWithin(
      { omega3: -4.121, omega4: 6.998 },
      printedTo(3, "rad/s"),
    );
    const theta4 = radians(theta4Deg);
    const jointVelocity = [-80 * 25 * omega4 * Math.sin(theta4), 80 * 25 * omega4 * Math.cos(theta4)];
    expect(jointVelocity).toBeWithin([-471.242, 302.243], printedTo(3, "mm/s"));
  });
});

// P. E. Nikravesh, Planar Multibody Dynamics, Ex. 5.2: inputs read in the book's companion script; results derived.
describe("Nikravesh's four-bar 0.1, 0.3, 0.22, 0.2 m with the crank at 45°", () => {
  const bar = level(100, 300, 220, 200);

  test.each([
    { branch: -1 as const, theta3Rad: 0.272125, theta4Rad: 0.758631 },
    { branch: 1 as const, theta3Rad: -1.273073, theta4Rad: -1.759579 },
  ])("stands at θ3 = $theta3Rad rad", ({ branch, theta3Rad, theta4Rad }) => {
    const found = fourBarAt(bar, branch, { drawnDeg: 70, toDeg: 45 });
    expect({ theta3Rad: radians(found.theta3Deg), theta4Rad: radians(found.theta4Deg) }).toBeWithin(
      { theta3Rad, theta4Rad },
      printedTo(6, "rad"),
    );
  });

  test("turns at the known speeds with the crank at 1.5 rad/s", () => {
    const { omega3, omega4 } = fourBarAt(bar, -1, { drawnDeg: 70, toDeg: 45 });
    expect({ omega3: 1.5 * omega3, omega4: 1.5 * omega4 }).toBeWithin(
      { omega3: 0.028622, omega4: 0.716076 },
      printedTo(6, "rad/s"),
    );
  });
});

// K. J. Waldron & G. L. Kinzel, Kinematics, Dynamics and Design of Machinery, Ex. 7.1 (drag link; inputs read in a
// public transcription) and E. Constans & K. B. Dyer, Introduction to Mechanism Design (lengths read in student code
// that uses the book's method). Results derived.
describe("a drag link and a crank-rocker from two more textbooks", () => {
  const dragLink = level(200, 350, 400, 100);
  const crankRocker = level(130, 200, 170, 220);

  test.each([
    { bar: dragLink, toDeg: 0, branch: 1 as const, theta3Deg: 66.867604, theta4Deg: 53.576426 },
    { bar: dragLink, toDeg: 90, branch: -1 as const, theta3Deg: 21.984557, theta4Deg: 55.849115 },
    { bar: dragLink, toDeg: 180, branch: -1 as const, theta3Deg: 75.522488, theta4Deg: 122.089951 },
    { bar: dragLink, toDeg: 90, branch: 1 as const, theta3Deg: -148.854455, theta4Deg: 177.280988 },
    { bar: dragLink, toDeg: 270, branch: 1 as const, theta3Deg: -21.984557, theta4Deg: -55.849115 },
    { bar: crankRocker, toDeg: 0, branch: -1 as const, theta3Deg: 57.769047, theta4Deg: 84.373729 },
    { bar: crankRocker, toDeg: 30, branch: -1 as const, theta3Deg: 26.483619, theta4Deg: 65.09272 },
    { bar: crankRocker, toDeg: 60, branch: -1 as const, theta3Deg: 15.41439, theta4Deg: 77.150747 },
    { bar: crankRocker, toDeg: 90, branch: -1 as const, theta3Deg: 11.051601, theta4Deg: 98.016876 },
    { bar: crankRocker, toDeg: 120, branch: -1 as const, theta3Deg: 9.503549, theta4Deg: 121.074127 },
  ])("$bar.crank, $bar.coupler, $bar.rocker at $toDeg°", ({ bar, branch, toDeg, theta3Deg, theta4Deg }) => {
    const found = fourBarAt(bar, branch, { drawnDeg: toDeg + 20, toDeg });
    expect({ theta3Deg: wrapped(found.theta3Deg), theta4Deg: wrapped(found.theta4Deg) }).toBeWithin(
      { theta3Deg, theta4Deg },
      printedTo(6, "degrees"),
    );
  });
});

// Andrews' squeezing mechanism, three planar loops with a consistent state published to 30 digits: W. Schiehlen (ed.),
// Multibody Systems Handbook, 1990; E. Hairer & G. Wanner, Solving ODEs II, §VII.7; F. Mazzia & C. Magherini, Test Set
// for IVP Solvers. Loop after loop; metres there, tenths of a millimetre here; the angles as a double holds them.
describe("Andrews' squeezing mechanism at its published state", () => {
  const m = (metres: number): number => metres * 1e4;
  const [xa, ya, xb, yb] = [m(-0.06934), m(-0.00227), m(-0.03635), m(0.03273)];
  const [d, e, rr, ss, zf, zt, u] = [m(0.028), m(0.02), m(0.007), m(0.035), m(0.02), m(0.04), m(0.04)];
  const beta = -0.06171389001427645;
  const gamma = 0.45527981916307037;
  const phi = 0.22266839016588588;
  const delta = 0.48736497954384256;
  const omega = -phi;
  const epsilon = 1.2305474445498212;
  const stated = asStated(
    1e-11,
    "rad",
    "a double solve of loops of a few hundred mm; the source has 30 digits",
  );

  // Θ = 0: the first two links lie folded on one another. The first loop's crank turns about O and its arm about B; the
  // arm then drives the other two loops, whose second links turn about A. In each the angles follow from the equations.
  const fromB: readonly [number, number] = [xa - xb, ya - yb];
  test.each([
    {
      loop: "first",
      bar: { crank: rr, coupler: d, rocker: ss, ground: [xb, yb] as const },
      crankRad: beta,
      theta3Rad: beta + Math.PI,
      theta4Rad: gamma - Math.PI / 2,
    },
    {
      loop: "second",
      bar: { crank: ss, coupler: e, rocker: zt, ground: fromB },
      crankRad: gamma - Math.PI / 2,
      theta3Rad: phi + delta + Math.PI / 2,
      theta4Rad: delta,
    },
    {
      loop: "third",
      bar: { crank: ss, coupler: zf, rocker: u, ground: fromB },
      crankRad: gamma - Math.PI / 2,
      theta3Rad: omega + epsilon + Math.PI,
      theta4Rad: epsilon - Math.PI / 2,
    },
  ])("closes its $loop loop at the published angles", ({ bar, crankRad, theta3Rad, theta4Rad }) => {
    const toDeg = degrees(crankRad);
    const found = fourBarAt(bar, branchAt(bar, crankRad, theta4Rad), { drawnDeg: toDeg + 6, toDeg });
    const missed = (angleDeg: number, rad: number): number => radians(wrapped(angleDeg - degrees(rad)));
    expect({
      theta3: missed(found.theta3Deg, theta3Rad),
      theta4: missed(found.theta4Deg, theta4Rad),
    }).toBeWithin({ theta3: 0, theta4: 0 }, stated);
  });

  function branchAt(bar: FourBar, crankRad: number, theta4Rad: number): Branch {
    const loop = fourBarLoop(bar);
    const missed = (branch: Branch): number =>
      Math.abs(wrapped(degrees(outputAngle(loop, bar.coupler, crankRad, branch) - theta4Rad)));
    return missed(1) < missed(-1) ? 1 : -1;
  }
});

// G. Cremasco Coelho, Exact solutions for the spatial four-bar with dynamic friction, Mechanism and Machine Theory
// (2025), 106163: output angle (rad) and velocity ratio of a spatial loop as a general multibody simulation gave them,
// three significant digits. Column 3 is its static torque ratio, the same number by virtual work.
describe("a published spatial loop of two cranks and a rod", () => {
  const theta = radians(7.294);
  const apart = scale([0.524328, 0.835662, -0.163552], 403.1627);
  const loop: Loop = {
    input: {
      origin: [0, 0, 0],
      axis: unit([0.009243, -0.951003, 0.309043]),
      joint: scale([-0.379646, 0.400777, 0.833815], 201.6318),
    },
    output: {
      origin: apart,
      axis: [1, 0, 0],
      joint: add(apart, scale([-Math.sin(theta), Math.cos(theta), 0], 201.6318)),
    },
  };
  const TABLE: readonly (readonly [number, number, number])[] = [
    [0, 1.71, 1.16],
    [-10, 1.53, 0.893],
    [-20, 1.39, 0.683],
    [-30, 1.29, 0.502],
    [-40, 1.22, 0.335],
    [-50, 1.17, 0.173],
    [-60, 1.16, 0.0103],
    [-70, 1.17, -0.156],
    [-80, 1.21, -0.323],
    [-90, 1.28, -0.483],
    [-100, 1.38, -0.623],
    [-110, 1.5, -0.729],
    [-120, 1.63, -0.791],
    [-130, 1.77, -0.812],
    [-140, 1.91, -0.8],
    [-150, 2.05, -0.768],
    [-160, 2.18, -0.728],
    [-170, 2.3, -0.69],
    [-180, 2.42, -0.659],
    [-190, 2.53, -0.642],
    [-200, 2.65, -0.646],
    [-210, 2.76, -0.685],
    [-220, 2.89, -0.799],
    [-230, 3.05, -1.18],
    [-236, 3.22, -2.48],
  ];
  const angle = asStated(
    0.0051,
    "rad",
    "three significant digits; over all 238 published points 0.00501 is the worst",
  );

  test.each(TABLE)("with the driven crank at %d°", (inputDeg, outputRad, ratio) => {
    // Drawn 20° away, on the side that leads away from the dead point at −237°.
    const drawnDeg = inputDeg + 20;
    const { placed, side } = carry(loop, 350, secondBranch, { drawnDeg, toDeg: inputDeg });
    const arm = subtract(placed.outputJoint(side, radians(inputDeg)), apart);
    const found = Math.atan2(arm[2], arm[1]);
    expect(found < 0 ? found + 2 * Math.PI : found).toBeWithin(outputRad, angle);
    const allowed = Math.max(0.006 * Math.abs(ratio), 0.0006);
    expect(placed.speedRatio(side, radians(inputDeg))).toBeWithin(
      ratio,
      asStated(
        allowed,
        "rad per rad",
        "three digits of a simulation; 0.4 % is the worst seen over all points",
      ),
    );
  });

  /** The source's second closure of the two. */
  const secondBranch: Branch = -1;
});

// Hooke's joint as a loop whose axes meet: unit arms and a rod of √2 between them. tan β = tan α · cos γ (standard).
describe("a Hooke joint bent by 25°", () => {
  const bend = radians(25);
  const arm = 200;
  const output: Vector = [Math.cos(bend), 0, Math.sin(bend)];
  const loop: Loop = {
    input: { origin: [0, 0, 0], axis: [1, 0, 0], joint: [0, arm, 0] },
    output: { origin: [0, 0, 0], axis: output, joint: scale(cross(output, [0, 1, 0]), arm) },
  };
  const placed = placeLoop(loop, { inputRad: 0, outputRad: 0 }, radians(75));
  const at = (inputDeg: number): SideRow => {
    const travels = [placed.travelTo(radians(inputDeg))];
    return sweepAxle(placed.axle, { travels, steers: [0] }).rows[0]!.left!;
  };

  test.each([
    [15, 13.649732],
    [30, 27.62113],
    [45, 42.186261],
    [60, 57.501415],
    [75, 73.529727],
  ])("turns its output by the known angle at %d°", (inputDeg, outputDeg) => {
    expect(checkAxle(placed.axle)).toEqual([]);
    const joint = placed.outputJoint(at(inputDeg), radians(inputDeg));
    const start = loop.output.joint;
    const across = cross(output, start);
    const found = degrees(Math.atan2(dot(joint, across), dot(joint, start)));
    expect(found).toBeWithin(outputDeg, printedTo(6, "degrees"));
  });

  test("runs slowest, at cos γ, where the driven yoke lies in the plane of the bend's normal", () => {
    expect(placed.speedRatio(at(0), 0)).toBeWithin(Math.cos(bend), TOLERANCE.roundOff);
  });
});

// Where three spheres meet (any text on trilateration). The upper arm's pivots and the lower ball joint are the centres.
describe("trilateration", () => {
  test.each([
    {
      name: "(1, 1, ±2), exactly",
      centres: [
        [0, 0, 0],
        [400, 0, 0],
        [100, 300, 0],
      ],
      radii: [100 * Math.sqrt(6), 100 * Math.sqrt(14), 100 * Math.sqrt(8)],
      points: [
        [100, 100, 200],
        [100, 100, -200],
      ],
      tolerance: TOLERANCE.closure,
    },
    {
      name: "a general case (derived)",
      centres: [
        [10, -20, 5],
        [210, 35, -15],
        [40, 300, 60],
      ],
      radii: [250, 260, 240],
      points: [
        [89.02035591, 112.57839485, 201.66914494],
        [36.43008918, 177.30487698, -146.23569653],
      ],
      tolerance: printedTo(7, "mm"),
    },
  ] as const)("finds $name", ({ centres, radii, points, tolerance }) => {
    const [first, second, third] = centres;
    const along = unit(subtract(second, first));
    // Both points are one turn of the arm about its pivots apart, so one loop closed on either branch finds either.
    const span = length(subtract(second, first));
    const foot = (radii[0] ** 2 - radii[1] ** 2 + span ** 2) / (2 * span);
    const aside = unit(cross(along, subtract(third, first)));
    const joint = add(add(first, scale(along, foot)), scale(aside, Math.sqrt(radii[0] ** 2 - foot ** 2)));
    const loop: Loop = {
      input: { origin: add(third, [0, 250, 0]), axis: [1, 0, 0], joint: third },
      output: { origin: first, axis: along, joint },
    };
    const found = ([1, -1] as const).map((branch) => {
      const { placed, side } = carry(loop, radii[2], branch, { drawnDeg: 12, toDeg: 0 });
      return placed.outputJoint(side, 0);
    });
    const [upper, lower] = found[0]![2] > found[1]![2] ? found : [found[1], found[0]];
    expect([upper, lower]).toBeWithin(points, tolerance);
  });
});
