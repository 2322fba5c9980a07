// Axles whose motion is planar, so that textbook and closed-form results hold for them exactly.

import type { Axle, Body, Coordinates, Corner, RackSteering, Spring, Steering } from "@linkwright/kinematics";

const BASE = { format: "linkwright.axle/1", wheelbase: 2400, right: "mirror" } as const;
const FIXED: Steering = { type: "fixed" };
const LEVEL_RACK: RackSteering = { type: "rack", axis: [0, 1, 0], travel: 60 };

interface FrontView {
  readonly name: string;
  /** [y outboard, z]. */
  readonly lowerInner: readonly [number, number];
  readonly lowerOuter: readonly [number, number];
  readonly upperInner: readonly [number, number];
  readonly upperOuter: readonly [number, number];
  readonly wheelCentre: readonly [number, number];
  readonly spring?: Spring;
}

/**
 * Both pivot axes along X, so that the knuckle moves in the front view alone. The toe link is the lower arm's twin,
 * set aside along X: the one arrangement that never steers.
 */
export function frontViewAxle(view: FrontView): Axle {
  const at = ([y, z]: readonly [number, number], x = 0): Coordinates => [x, y, z];
  const arm = (inner: readonly [number, number], outer: readonly [number, number]) => ({
    frontPivot: at(inner, 130),
    rearPivot: at(inner, -130),
    ballJoint: at(outer),
  });
  return {
    ...BASE,
    name: view.name,
    position: "front",
    left: {
      suspension: {
        type: "doubleWishbone",
        lowerArm: arm(view.lowerInner, view.lowerOuter),
        upperArm: arm(view.upperInner, view.upperOuter),
      },
      tieRod: { inner: at(view.lowerInner, -110), outer: at(view.lowerOuter, -110) },
      wheel: {
        centre: at(view.wheelCentre),
        toeDeg: 0,
        camberDeg: 0,
        loadedRadius: view.wheelCentre[1],
      },
      ...(view.spring ? { spring: view.spring } : {}),
    },
    steering: FIXED,
  };
}

/** Equal, parallel, level arms of 300 mm and an upright steering axis: the knuckle moves without turning. */
export function translatingAxle(tieRod: { inner: Coordinates; outer: Coordinates }): Axle {
  const arm = (z: number) => ({
    frontPivot: [130, 300, z] as const,
    rearPivot: [-130, 300, z] as const,
    ballJoint: [0, 600, z] as const,
  });
  return {
    ...BASE,
    name: "Equal parallel level arms",
    position: "front",
    left: {
      suspension: { type: "doubleWishbone", lowerArm: arm(170), upperArm: arm(430) },
      tieRod,
      wheel: { centre: [0, 680, 300], toeDeg: 0, camberDeg: 0, loadedRadius: 300 },
    },
    steering: FIXED,
  };
}

/**
 * A knuckle that at design turns about a given side-view instant centre [x, z] (from the contact point) and moves
 * straight up otherwise: both arms lie across the car, each pivot axis points at that centre.
 */
export function sideViewAxle(
  car: { position: "front" | "rear"; wheelbase: number; body: Body },
  slopes: { readonly lower: number; readonly upper: number },
): Axle {
  // Pivot axis (1, 0, slope): the ball joint, straight out along Y, moves along (−slope, 0, 1).
  const arm = (z: number, slope: number) => ({
    frontPivot: [130, 300, z + 130 * slope] as const,
    rearPivot: [-130, 300, z - 130 * slope] as const,
    ballJoint: [0, 600, z] as const,
  });
  return {
    ...BASE,
    ...car,
    name: "Arms across the car, pivot axes aimed at one point",
    left: {
      suspension: {
        type: "doubleWishbone",
        lowerArm: arm(170, slopes.lower),
        upperArm: arm(430, slopes.upper),
      },
      tieRod: { inner: [-120, 300, 250], outer: [-120, 600, 250] },
      wheel: { centre: [0, 700, 300], toeDeg: 0, camberDeg: 0, loadedRadius: 300 },
    },
    steering: FIXED,
  };
}

/** The slopes of both pivot axes that meet at a side-view centre `behind` the contact point and `above` the ground. */
export function aimedAt(behind: number, above: number): { lower: number; upper: number } {
  return { lower: (170 - above) / behind, upper: (430 - above) / behind };
}

/** A steering axis through the wheel centre: turning about it leaves the wheel's height alone, and so the axis itself. */
export function centredKingpinAxle(kingpin: { casterDeg: number; inclinationDeg: number }): Axle {
  const tangent = (degrees: number): number => Math.tan((degrees * Math.PI) / 180);
  const centre: Coordinates = [0, 700, 300];
  const onAxis = (up: number): Coordinates => [
    -up * tangent(kingpin.casterDeg),
    700 - up * tangent(kingpin.inclinationDeg),
    300 + up,
  ];
  const arm = ([x, y, z]: Coordinates) => ({
    frontPivot: [x + 130, y - 300, z + 5] as const,
    rearPivot: [x - 130, y - 300, z - 5] as const,
    ballJoint: [x, y, z] as const,
  });
  const left: Corner = {
    suspension: { type: "doubleWishbone", lowerArm: arm(onAxis(-130)), upperArm: arm(onAxis(130)) },
    tieRod: { inner: [-118, 350, 310], outer: [-120, 690, 305] },
    wheel: { centre, toeDeg: 0, camberDeg: 0, loadedRadius: 300 },
  };
  return { ...BASE, name: "Kingpin through the wheel centre", position: "front", left, steering: LEVEL_RACK };
}

/**
 * Upright kingpins `apart` from one another, steering arms behind them, 120 mm long and turned inboard by
 * `convergeDeg`, on a level rack: how far each wheel turns is plane geometry.
 */
export function uprightKingpins(car: { apart: number; wheelbase: number; convergeDeg: number }): Axle {
  const y = car.apart / 2;
  const converge = (car.convergeDeg * Math.PI) / 180;
  const outer: Coordinates = [-120 * Math.cos(converge), y - 120 * Math.sin(converge), 250];
  const arm = (z: number) => ({
    frontPivot: [130, y - 300, z] as const,
    rearPivot: [-130, y - 300, z] as const,
    ballJoint: [0, y, z] as const,
  });
  return {
    ...BASE,
    name: "Upright kingpins",
    position: "front",
    wheelbase: car.wheelbase,
    left: {
      suspension: { type: "doubleWishbone", lowerArm: arm(170), upperArm: arm(430) },
      tieRod: { inner: [outer[0], y - 330, 250], outer },
      wheel: { centre: [0, y, 300], toeDeg: 0, camberDeg: 0, loadedRadius: 300 },
    },
    steering: { ...LEVEL_RACK, travel: 100 },
  };
}
