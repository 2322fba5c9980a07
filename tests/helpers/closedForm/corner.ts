// One double-wishbone corner as the parts that make it up, and where they stand once the lower arm's angle is known.
// Method: each ball joint goes round a circle on its arm; the knuckle is turned about its kingpin until the tie rod
// fits, or until toe is as asked. Everything is a circle met with a sphere; no iteration on the knuckle's pose.

import type { Corner, Spring, Steering, Wishbone } from "@linkwright/kinematics";
import {
  type Branch,
  branchAtStart,
  type Circle,
  circleThrough,
  meetSphere,
  pointOnCircle,
  solveCosineSine,
} from "./circle.ts";
import {
  across,
  add,
  cross,
  distance,
  dot,
  scale,
  subtract,
  turn,
  turnFromTo,
  unit,
  type Vector,
} from "./vector.ts";

/** An arm: where its brackets are, and how far its ball joint lies from each pivot. */
export interface Arm {
  readonly frontPivot: Vector;
  readonly rearPivot: Vector;
  readonly frontLength: number;
  readonly rearLength: number;
  /** The drawn ball joint: it says which way round the circle angle 0 lies. */
  readonly drawnBallJoint: Vector;
}

/** Points of the knuckle, all in the design position. */
export interface Knuckle {
  readonly lowerBallJoint: Vector;
  readonly upperBallJoint: Vector;
  readonly steeringArm: Vector;
  readonly wheelCentre: Vector;
  /** Unit vector along the spin axis, outboard. */
  readonly spin: Vector;
}

export interface Parts {
  readonly outward: 1 | -1;
  readonly lowerArm: Arm;
  readonly upperArm: Arm;
  readonly knuckle: Knuckle;
  readonly rackInner: Vector;
  /** Unit; null where nothing steers. */
  readonly rackAxis: Vector | null;
  readonly tieRodLength: number;
  readonly loadedRadius: number;
  readonly staticToeDeg: number;
  readonly spring: Spring | null;
}

/** Where everything stands. */
export interface Pose {
  readonly lowerAngle: number;
  readonly upperAngle: number;
  readonly lowerBallJoint: Vector;
  readonly upperBallJoint: Vector;
  readonly steeringArm: Vector;
  readonly rackInner: Vector;
  readonly wheelCentre: Vector;
  readonly spin: Vector;
  /** Takes a design point of the knuckle to where it stands. */
  readonly carry: (designPoint: Vector) => Vector;
}

/** The knuckle is held by the tie rod, or turned to a toe angle while the tie rod is off. */
export type Held =
  | { readonly by: "tieRod"; readonly steer: number }
  | { readonly by: "toe"; readonly toeDeg: number };

const radians = (degrees: number): number => (degrees * Math.PI) / 180;

function buildArm(wishbone: Wishbone): Arm {
  return {
    frontPivot: wishbone.frontPivot,
    rearPivot: wishbone.rearPivot,
    frontLength: distance(wishbone.ballJoint, wishbone.frontPivot),
    rearLength: distance(wishbone.ballJoint, wishbone.rearPivot),
    drawnBallJoint: wishbone.ballJoint,
  };
}

/** Outboard spin axis from toe (positive toe-in) and camber (positive top outboard). */
export function spinFromAngles(toeDeg: number, camberDeg: number, outward: 1 | -1): Vector {
  const [toe, camber] = [radians(toeDeg), radians(camberDeg)];
  return [Math.cos(camber) * Math.sin(toe), outward * Math.cos(camber) * Math.cos(toe), -Math.sin(camber)];
}

export function buildParts(corner: Corner, steering: Steering, outward: 1 | -1): Parts {
  const { lowerArm, upperArm } = corner.suspension;
  return {
    outward,
    lowerArm: buildArm(lowerArm),
    upperArm: buildArm(upperArm),
    knuckle: {
      lowerBallJoint: lowerArm.ballJoint,
      upperBallJoint: upperArm.ballJoint,
      steeringArm: corner.tieRod.outer,
      wheelCentre: corner.wheel.centre,
      spin: spinFromAngles(corner.wheel.toeDeg, corner.wheel.camberDeg, outward),
    },
    rackInner: corner.tieRod.inner,
    rackAxis: steering.type === "rack" ? unit(steering.axis) : null,
    tieRodLength: distance(corner.tieRod.outer, corner.tieRod.inner),
    loadedRadius: corner.wheel.loadedRadius,
    staticToeDeg: corner.wheel.toeDeg,
    spring: corner.spring ?? null,
  };
}

/** Arm angle 0 is (nearest to) the drawn position, and turning it positively lifts the ball joint. */
export function armCircle(arm: Arm): Circle {
  const along = unit(subtract(arm.frontPivot, arm.rearPivot));
  const span = distance(arm.frontPivot, arm.rearPivot);
  const foot = (arm.rearLength ** 2 - arm.frontLength ** 2 + span ** 2) / (2 * span);
  const radius = Math.sqrt(arm.rearLength ** 2 - foot ** 2);
  const centre = add(arm.rearPivot, scale(along, foot));
  const start = scale(unit(across(subtract(arm.drawnBallJoint, centre), along)), radius);
  return { centre, start, quarter: cross(liftingAxis(arm), start) };
}

/** Unit vector along the pivots, about which a positive turn lifts the drawn ball joint. */
function liftingAxis(arm: Arm): Vector {
  const along = unit(subtract(arm.frontPivot, arm.rearPivot));
  const lifts = cross(along, subtract(arm.drawnBallJoint, arm.rearPivot))[2] > 0;
  return lifts ? along : scale(along, -1);
}

interface Branches {
  readonly upper: Branch;
  readonly tieRod: Branch;
}

/** The branch the drawing is on. Parts that differ from it by a few millimetres are on the same one. */
function branchesOf(parts: Parts): Branches {
  const { knuckle } = parts;
  const kingpin = unit(subtract(knuckle.upperBallJoint, knuckle.lowerBallJoint));
  return {
    upper: branchAtStart(armCircle(parts.upperArm), knuckle.lowerBallJoint),
    tieRod: branchAtStart(
      circleThrough(knuckle.steeringArm, knuckle.lowerBallJoint, kingpin),
      parts.rackInner,
    ),
  };
}

function moveRack(parts: Parts, steer: number): Vector {
  return parts.rackAxis === null ? parts.rackInner : add(parts.rackInner, scale(parts.rackAxis, steer));
}

/** How far the knuckle is turned about its kingpin. `directed` carries a design direction along, untwisted. */
function twistOf(
  parts: Parts,
  branch: Branch,
  held: Held,
  frame: { origin: Vector; kingpin: Vector; directed: (direction: Vector) => Vector },
): number | null {
  const { origin, kingpin, directed } = frame;
  if (held.by === "tieRod") {
    const arm = add(origin, directed(subtract(parts.knuckle.steeringArm, parts.knuckle.lowerBallJoint)));
    const circle = circleThrough(arm, origin, kingpin);
    return meetSphere(circle, moveRack(parts, held.steer), parts.tieRodLength, branch);
  }
  const toe = radians(held.toeDeg);
  const ahead: Vector = [Math.cos(toe), -parts.outward * Math.sin(toe), 0];
  const outboard: Vector = [Math.sin(toe), parts.outward * Math.cos(toe), 0];
  const spin = directed(parts.knuckle.spin);
  const start = across(spin, kingpin);
  const a = dot(start, ahead);
  const b = dot(cross(kingpin, start), ahead);
  const c = -dot(spin, kingpin) * dot(kingpin, ahead);
  for (const side of [1, -1] as const) {
    const twist = solveCosineSine(a, b, c, side);
    if (twist !== null && dot(turn(spin, kingpin, twist), outboard) > 0) return twist;
  }
  return null;
}

/** The pose at a given angle of the lower arm; null where the linkage does not close. */
export function poseAtLowerAngle(parts: Parts, lowerAngle: number, held: Held): Pose | null {
  const { knuckle } = parts;
  const branches = branchesOf(parts);
  const origin = pointOnCircle(armCircle(parts.lowerArm), lowerAngle);
  const knuckleLength = distance(knuckle.lowerBallJoint, knuckle.upperBallJoint);
  const upperCircle = armCircle(parts.upperArm);
  const upperAngle = meetSphere(upperCircle, origin, knuckleLength, branches.upper);
  if (upperAngle === null) return null;
  const upperBallJoint = pointOnCircle(upperCircle, upperAngle);

  const kingpin = unit(subtract(upperBallJoint, origin));
  const drawnKingpin = unit(subtract(knuckle.upperBallJoint, knuckle.lowerBallJoint));
  const directed = (direction: Vector): Vector => turnFromTo(direction, drawnKingpin, kingpin);
  const twist = twistOf(parts, branches.tieRod, held, { origin, kingpin, directed });
  if (twist === null) return null;

  const carryDirection = (direction: Vector): Vector => turn(directed(direction), kingpin, twist);
  const carry = (point: Vector): Vector =>
    add(origin, carryDirection(subtract(point, knuckle.lowerBallJoint)));
  return {
    lowerAngle,
    upperAngle,
    lowerBallJoint: origin,
    upperBallJoint,
    steeringArm: carry(knuckle.steeringArm),
    rackInner: moveRack(parts, held.by === "tieRod" ? held.steer : 0),
    wheelCentre: carry(knuckle.wheelCentre),
    spin: carryDirection(knuckle.spin),
    carry,
  };
}

/** Where the spring's lower eye stands. */
export function springEye(parts: Parts, pose: Pose): Vector | null {
  const { spring } = parts;
  if (spring === null) return null;
  if (spring.on === "knuckle") return pose.carry(spring.lower);
  const arm = spring.on === "lowerArm" ? parts.lowerArm : parts.upperArm;
  const angle = spring.on === "lowerArm" ? pose.lowerAngle : pose.upperAngle;
  const pivot = arm.rearPivot;
  return add(pivot, turn(subtract(spring.lower, pivot), liftingAxis(arm), angle));
}
