// The axle document as it is stored, imported and exported: plain JSON, mm and degrees, ISO 8855 axes.
// A later kind of linkage or steering adds a member to the unions below and nothing else in this file.

/** A point or direction in the document: [x forward, y left, z up], mm. */
export type Coordinates = readonly [number, number, number];

/** Two pivots on the body and the joint that carries the knuckle. The pivot axis may point anywhere. */
export interface Wishbone {
  readonly frontPivot: Coordinates;
  readonly rearPivot: Coordinates;
  readonly ballJoint: Coordinates;
}

export interface DoubleWishbone {
  readonly type: "doubleWishbone";
  readonly lowerArm: Wishbone;
  readonly upperArm: Wishbone;
}

export type Suspension = DoubleWishbone;

/** A tie rod, or a toe link where the steering is fixed. */
export interface TieRod {
  readonly inner: Coordinates;
  readonly outer: Coordinates;
}

export interface Rim {
  readonly diameter: number;
  readonly width: number;
  /** From the rim's middle to its mounting face, positive when the face lies outboard. */
  readonly offset: number;
}

export interface Tyre {
  readonly width: number;
  readonly diameter: number;
}

export interface Wheel {
  readonly centre: Coordinates;
  /** Static toe of this wheel, positive toe-in. */
  readonly toeDeg: number;
  /** Static camber, positive when the top leans outboard. */
  readonly camberDeg: number;
  /** From wheel centre to ground with the car's weight on the tyre. */
  readonly loadedRadius: number;
  readonly rim?: Rim;
  readonly tyre?: Tyre;
}

export type SpringMount = "lowerArm" | "upperArm" | "knuckle";

export interface Spring {
  readonly body: Coordinates;
  readonly lower: Coordinates;
  readonly on: SpringMount;
  readonly rateNPerMm?: number;
  readonly freeLength?: number;
  /** Eye to eye, damper fully out. */
  readonly openLength?: number;
  /** Eye to eye, damper fully in. */
  readonly closedLength?: number;
}

export interface AntiRollBar {
  readonly axis: readonly [Coordinates, Coordinates];
  /** Where the drop link meets the bar's arm. */
  readonly arm: Coordinates;
  readonly link: { readonly lower: Coordinates; readonly on: SpringMount };
  readonly rateNmPerDeg?: number;
}

/** A round-ended bar that stands for metal when clearances are checked. */
export interface Shape {
  readonly on: "lowerArm" | "upperArm" | "knuckle" | "tieRod" | "body";
  readonly from: Coordinates;
  readonly to: Coordinates;
  readonly radius: number;
}

export interface Corner {
  readonly suspension: Suspension;
  readonly tieRod: TieRod;
  readonly wheel: Wheel;
  readonly spring?: Spring;
  readonly antiRollBar?: AntiRollBar;
  readonly shapes?: readonly Shape[];
}

export interface RackSteering {
  readonly type: "rack";
  /** Need not be unit, but must point left: y > 0. */
  readonly axis: Coordinates;
  /** ± from centre. */
  readonly travel: number;
  readonly mmPerTurn?: number;
  /** Which way the rack moves when the driver turns left, as the part is mounted. */
  readonly wheelLeftMoves?: "left" | "right";
  /** A bought rack keeps the distance between its inner joints. Absent means false. */
  readonly bought?: boolean;
}

/** A toe link on the body: nothing steers. */
export interface FixedSteering {
  readonly type: "fixed";
}

export type Steering = RackSteering | FixedSteering;

export interface Body {
  readonly massKg?: number;
  /** 0 … 1. */
  readonly frontMassShare?: number;
  /** Above the ground. */
  readonly cgHeight?: number;
  /** 0 … 1. */
  readonly frontBrakeShare?: number;
  /** Share of the drive at this axle, 0 … 1. */
  readonly driveShare?: number;
  readonly unsprungMassKg?: number;
}

export const AXLE_FORMAT = "linkwright.axle/1";

export interface Axle {
  readonly format: typeof AXLE_FORMAT;
  readonly name: string;
  readonly position: "front" | "rear";
  readonly wheelbase: number;
  /** Written for the left; the hardpoints are those of the design position. */
  readonly left: Corner;
  /** `"mirror"`, or a corner in the same axes with its wheel at negative y. */
  readonly right: "mirror" | Corner;
  readonly steering: Steering;
  readonly body?: Body;
}
