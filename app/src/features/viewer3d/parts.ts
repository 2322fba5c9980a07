// The pieces a picture is made of, whoever draws them.

import type { Side } from "@linkwright/kinematics";
import type { Vec3 } from "./vectors.ts";
import type { WheelFrame, WheelShape } from "./wheelShape.ts";

export type Tone = Side | "knuckle" | "tieRod" | "rack" | "housing" | "spring" | "scribe" | "fault";

export interface Bar {
  /** Where it belongs, as `left.lowerArm.frontPivot`: a fault speaks of parts by these names. */
  readonly part: string;
  readonly from: Vec3;
  readonly to: Vec3;
  readonly radius: number;
  readonly tone: Tone;
  /** The right side is told from the left by bands as well as by colour. */
  readonly banded: boolean;
}

export interface Coil {
  readonly from: Vec3;
  readonly to: Vec3;
  readonly radius: number;
}

/** A hardpoint: a centre-punch. */
export interface Mark {
  /** In the axle document, as `left.suspension.lowerArm.frontPivot`. */
  readonly path: string;
  readonly side: Side;
  readonly name: string;
  readonly point: Vec3;
}

export interface WheelPicture {
  readonly side: Side;
  readonly frame: WheelFrame;
  readonly shape: WheelShape;
}

/** The plane the tyres stand on, level along the car; it leans where the two sides do not stand equally high. */
export interface Ground {
  /** On the car's centre plane. */
  readonly centre: Vec3;
  /** Rise to the left, mm per mm. */
  readonly slope: number;
}

export interface Label {
  readonly text: "FRONT" | "LEFT" | "RIGHT";
  readonly point: Vec3;
  readonly tone: Tone;
  /** Out of the car, on its side of it. */
  readonly outward: Vec3;
}

export const TONES = [
  "left",
  "right",
  "knuckle",
  "tieRod",
  "rack",
  "housing",
  "spring",
  "scribe",
  "fault",
] as const satisfies readonly Tone[];
