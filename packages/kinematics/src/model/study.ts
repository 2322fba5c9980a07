// The study document: what people save, revise, hash and compare. It holds an axle and all that is asked of it.

import type { Axle, Coordinates } from "./axle.ts";

/** A named ride height, where the shop turns the tie rod until static toe is right again. */
export interface RideHeight {
  readonly name: string;
  /** Wheel travel from design; a lowered car is positive. */
  readonly wheelUp: number;
  /** Nose-down positive. */
  readonly rakeDeg: number;
  /** Travel about this ride height over which the targets count: [droop, bump]. */
  readonly band: readonly [number, number];
}

/** Quantities that a target may bound. `bumpSteerDeg` is judged over each ride height's band, the rest at it. */
export const TARGET_QUANTITIES = [
  "bumpSteerDeg",
  "camberDeg",
  "camberChangeDegPerMm",
  "casterDeg",
  "kingpinInclinationDeg",
  "casterTrail",
  "scrubRadius",
  "rollCentreHeight",
  "track",
  "ackermannPercent",
] as const;
export type TargetQuantity = (typeof TARGET_QUANTITIES)[number];

export interface Target {
  readonly quantity: TargetQuantity;
  readonly min: number | null;
  readonly max: number | null;
}

/** The jig's own datum: an origin and two axes in the car's axes. Its y axis is zAxis × xAxis. */
export interface Datum {
  readonly name: string;
  readonly origin: Coordinates;
  readonly xAxis: Coordinates;
  readonly zAxis: Coordinates;
}

export const STUDY_FORMAT = "linkwright.study/1";

export interface Study {
  readonly format: typeof STUDY_FORMAT;
  readonly axle: Axle;
  readonly rideHeights: readonly RideHeight[];
  readonly targets: readonly Target[];
  /** Null: the car's own origin and axes. */
  readonly datum: Datum | null;
  // The lists below have their place in the format from the first day and stay empty until they are used.
  readonly tolerances: readonly never[];
  readonly pointNotes: readonly never[];
  readonly locks: readonly never[];
  readonly parts: readonly never[];
  readonly shims: readonly never[];
}
