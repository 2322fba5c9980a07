// Rows and drives laid flat for the hot loop.

import type { ConstraintRow, Drive } from "../geometry/rows.ts";
import { cross, findUnit, type Point, perpendicularTo } from "../geometry/vec3.ts";
import { invariant } from "../invariant.ts";

export const EQUATIONS = 6;

/** Numbers an equation takes in the table; the layout is drawn at the head of newton.ts. */
export const STRIDE = 10;

export const DISTANCE = 0;
export const PLANE = 1;
export const DRIVEN_POINT = 2;
export const DRIVEN_DIRECTION = 3;

/** mm. A direction's error is told as the offset it makes at this arm, so that all residuals are mm. */
export const DIRECTION_ARM = 100;

/** Six equations for one pose, laid flat, with the work space of the solve. One system belongs to one caller. */
export interface PoseSystem {
  readonly kinds: Uint8Array;
  readonly table: Float64Array;
  /** Name of the row or drive of each equation. */
  readonly names: readonly string[];
  /** qw qx qy qz tx ty tz of X_VK. */
  readonly pose: Float64Array;
  /** 6 × 7, row after row: the Jacobian and the right-hand side. */
  readonly work: Float64Array;
  /** The last solution of the 6 × 6 system: v₀ (3), ω (3). */
  readonly step: Float64Array;
  /** [determinant of the last elimination, largest residual of the last evaluation in mm]. */
  readonly report: Float64Array;
}

/** Lays rows and drives into a table; together they must make six equations. Starts at the design pose. */
export function compileSystem(rows: readonly ConstraintRow[], drives: readonly Drive[]): PoseSystem {
  const equations = [...rows.flatMap(equationsOfRow), ...drives.map(equationOfDrive)];
  invariant(equations.length === EQUATIONS, `a pose needs 6 equations, got ${equations.length}`);
  const table = new Float64Array(EQUATIONS * STRIDE);
  for (const [index, equation] of equations.entries()) table.set(equation.numbers, index * STRIDE);
  return {
    kinds: Uint8Array.from(equations, (equation) => equation.kind),
    table,
    names: equations.map((equation) => equation.name),
    pose: Float64Array.of(1, 0, 0, 0, 0, 0, 0),
    work: new Float64Array(EQUATIONS * (EQUATIONS + 1)),
    step: new Float64Array(EQUATIONS),
    report: new Float64Array(2),
  };
}

interface Equation {
  readonly kind: number;
  readonly name: string;
  readonly numbers: readonly number[];
}

function equationsOfRow(row: ConstraintRow): Equation[] {
  if (row.kind === "distance") {
    invariant(row.length > 0, `link ${row.name} has length ${row.length}`);
    const numbers = [...row.bodyPoint, ...row.knucklePoint, 0, 0, 0, row.length];
    return [{ kind: DISTANCE, name: row.name, numbers }];
  }
  const along = findUnit(row.lineDirection);
  invariant(along !== null, `line ${row.name} has no direction`);
  const across = perpendicularTo(along);
  return [across, cross(along, across)].map((normal) => ({
    kind: PLANE,
    name: row.name,
    numbers: [...row.bodyPoint, ...row.linePoint, ...normal, 0],
  }));
}

function equationOfDrive(drive: Drive): Equation {
  if (drive.kind === "drivenPoint") {
    const numbers = [0, 0, 0, ...drive.point, ...drive.direction, drive.value];
    return { kind: DRIVEN_POINT, name: drive.name, numbers };
  }
  const along = drive.along.map((component) => component * DIRECTION_ARM);
  const numbers = [0, 0, 0, ...drive.direction, ...along, drive.value * DIRECTION_ARM];
  return { kind: DRIVEN_DIRECTION, name: drive.name, numbers };
}

/** Which equation bears a name; the first of two for a line. */
export function equationIndex(system: PoseSystem, name: string): number {
  const index = system.names.indexOf(name);
  invariant(index >= 0, `no equation is called ${name}`);
  return index;
}

export function setBodyPoint(system: PoseSystem, equation: number, point: Point<"V">): void {
  system.table.set(point, equation * STRIDE);
}

/** The length of a link, or the value of a drive. */
export function setValue(system: PoseSystem, equation: number, value: number): void {
  const arm = system.kinds[equation] === DRIVEN_DIRECTION ? DIRECTION_ARM : 1;
  system.table[equation * STRIDE + 9] = value * arm;
}

export function getValue(system: PoseSystem, equation: number): number {
  const arm = system.kinds[equation] === DRIVEN_DIRECTION ? DIRECTION_ARM : 1;
  return (system.table[equation * STRIDE + 9] as number) / arm;
}
