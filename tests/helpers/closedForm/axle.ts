// A whole axle by the second method: rows with the same columns as the product's sweep.

import type { Axle, Corner } from "@linkwright/kinematics";
import { buildParts, type Parts } from "./corner.ts";
import { type SideColumns, type SideSolution, solveSide } from "./side.ts";
import { setToeAt } from "./solve.ts";
import type { Vector } from "./vector.ts";

export interface AxleColumns {
  readonly rollCentreHeight: number | null;
  readonly rollCentreLateral: number | null;
  readonly ackermannPercent: number | null;
  readonly track: number | null;
  readonly antiDivePercent: number | null;
  readonly antiLiftPercent: number | null;
  readonly antiSquatPercent: number | null;
}

export interface ClosedFormRow {
  readonly steer: number;
  readonly travel: number;
  readonly left: SideColumns | null;
  readonly right: SideColumns | null;
  readonly axle: AxleColumns;
  readonly solutions: { readonly left: SideSolution | null; readonly right: SideSolution | null };
}

const radians = (degrees: number): number => (degrees * Math.PI) / 180;
const degrees = (angle: number): number => (angle * 180) / Math.PI;
/** Two normals closer to parallel than this have no crossing worth the name. */
const PARALLEL_DEG = 0.05;

const flip = (p: Vector): Vector => [p[0], -p[1], p[2]];

/** The right corner of an axle whose right is the mirror of its left. Only what the second method reads is mirrored. */
export function mirrorCorner(corner: Corner): Corner {
  const { lowerArm, upperArm } = corner.suspension;
  const arm = (wishbone: typeof lowerArm): typeof lowerArm => ({
    frontPivot: flip(wishbone.frontPivot),
    rearPivot: flip(wishbone.rearPivot),
    ballJoint: flip(wishbone.ballJoint),
  });
  const { spring } = corner;
  return {
    suspension: { ...corner.suspension, lowerArm: arm(lowerArm), upperArm: arm(upperArm) },
    tieRod: { inner: flip(corner.tieRod.inner), outer: flip(corner.tieRod.outer) },
    wheel: { ...corner.wheel, centre: flip(corner.wheel.centre) },
    ...(spring ? { spring: { ...spring, body: flip(spring.body), lower: flip(spring.lower) } } : {}),
  };
}

export function partsOf(axle: Axle, side: "left" | "right"): Parts {
  if (side === "left") return buildParts(axle.left, axle.steering, 1);
  const corner = axle.right === "mirror" ? mirrorCorner(axle.left) : axle.right;
  return buildParts(corner, axle.steering, -1);
}

/** Where the two lines cross that pass through the contact points at right angles to their front-view velocities. */
export function rollCentre(
  left: SideSolution,
  right: SideSolution,
): { height: number; lateral: number | null } {
  // Each line is {p : v·(p − c) = 0} in (y, z).
  const line = ({ columns, contactVelocity }: SideSolution) => {
    const [, vy, vz] = contactVelocity;
    const [, cy, cz] = columns.contactPoint;
    return { vy, vz, offset: vy * cy + vz * cz, cy, cz };
  };
  const [l, r] = [line(left), line(right)];
  const ground = (y: number): number => l.cz + ((r.cz - l.cz) * (y - l.cy)) / (r.cy - l.cy);
  const across = l.vy * r.vz - l.vz * r.vy;
  const along = l.vy * r.vy + l.vz * r.vz;
  if (degrees(Math.atan2(Math.abs(across), Math.abs(along))) < PARALLEL_DEG) {
    return { height: (l.offset / l.vz + r.offset / r.vz) / 2 - ground(0), lateral: null };
  }
  const y = (l.offset * r.vz - r.offset * l.vz) / across;
  const z = (l.vy * r.offset - r.vy * l.offset) / across;
  return { height: z - ground(y), lateral: y };
}

/** 100·(δi − δo)/(δi − δo*), cot δo* = cot δi + d/L; null straight ahead. */
export function ackermannPercent(left: SideSolution, right: SideSolution, wheelbase: number): number | null {
  const meanSteer = (left.steerDeg + right.steerDeg) / 2;
  if (meanSteer === 0) return null;
  const [inner, outer] = meanSteer > 0 ? [left.steerDeg, right.steerDeg] : [-right.steerDeg, -left.steerDeg];
  const between = left.straightGroundPoint[1] - right.straightGroundPoint[1];
  const ideal = degrees(Math.atan(1 / (1 / Math.tan(radians(inner)) + between / wheelbase)));
  return (100 * (inner - outer)) / (inner - ideal);
}

const slope = ([x, , z]: Vector): number => x / z;

function antiColumns(axle: Axle, left: SideSolution, right: SideSolution) {
  const { cgHeight, frontBrakeShare, driveShare } = axle.body ?? {};
  const contact = (slope(left.contactVelocity) + slope(right.contactVelocity)) / 2;
  const centre = (slope(left.wheelCentreVelocity) + slope(right.wheelCentreVelocity)) / 2;
  const percent = (share: number | undefined, steepness: number): number | null =>
    share === undefined || cgHeight === undefined
      ? null
      : (100 * share * steepness * axle.wheelbase) / cgHeight;
  const front = axle.position === "front";
  const rearBrakeShare = frontBrakeShare === undefined ? undefined : 1 - frontBrakeShare;
  return {
    antiDivePercent: front ? percent(frontBrakeShare, contact) : null,
    antiLiftPercent: front ? null : percent(rearBrakeShare, -contact),
    antiSquatPercent: front ? null : percent(driveShare, -centre),
  };
}

const NO_AXLE: AxleColumns = {
  rollCentreHeight: null,
  rollCentreLateral: null,
  ackermannPercent: null,
  track: null,
  antiDivePercent: null,
  antiLiftPercent: null,
  antiSquatPercent: null,
};

function axleColumns(axle: Axle, left: SideSolution | null, right: SideSolution | null): AxleColumns {
  if (left === null || right === null) return NO_AXLE;
  const centre = rollCentre(left, right);
  return {
    rollCentreHeight: centre.height,
    rollCentreLateral: centre.lateral,
    ackermannPercent: ackermannPercent(left, right, axle.wheelbase),
    track: left.columns.contactPoint[1] - right.columns.contactPoint[1],
    ...antiColumns(axle, left, right),
  };
}

/** Rows over every steer and travel, with toe set at `wheelUp`; a side that cannot be reached is null. */
export function sweepByClosedForm(
  axle: Axle,
  grid: {
    readonly travels: readonly number[];
    readonly steers: readonly number[];
    readonly wheelUp?: number;
  },
): ClosedFormRow[] {
  const wheelUp = grid.wheelUp ?? 0;
  const withToeSet = (parts: Parts): Parts | null => (wheelUp === 0 ? parts : setToeAt(parts, wheelUp));
  const leftParts = withToeSet(partsOf(axle, "left"));
  const rightParts = withToeSet(partsOf(axle, "right"));
  return grid.steers.flatMap((steer) =>
    grid.travels.map((travel) => {
      const left = leftParts === null ? null : solveSide(leftParts, travel, steer);
      const right = rightParts === null ? null : solveSide(rightParts, travel, steer);
      return {
        steer,
        travel,
        left: left?.columns ?? null,
        right: right?.columns ?? null,
        axle: axleColumns(axle, left, right),
        solutions: { left, right },
      };
    }),
  );
}
