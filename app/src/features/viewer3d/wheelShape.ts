// The wheel as it is drawn: rings about its spin axis, flattened where the tyre carries the car.

import type { CornerPlacement, Side, Wheel } from "@linkwright/kinematics";
import { add, cross, findUnit, offset, scale, UP, type Vec3 } from "./vectors.ts";

/** A right-handed frame that does not turn with the wheel: in its plane `level` is horizontal and `down` at its lowest. */
export interface WheelFrame {
  readonly centre: Vec3;
  readonly level: Vec3;
  readonly down: Vec3;
  readonly outboard: Vec3;
}

/** A circle about the spin axis: `across` is where its plane lies, outboard of the wheel centre. */
export interface Ring {
  readonly radius: number;
  readonly across: number;
  readonly part: "tread" | "shoulder" | "rim" | "face";
}

export interface WheelShape {
  readonly loadedRadius: number;
  readonly rings: readonly Ring[];
  /** Half the tyre's section from rim to rim, as [across, radius]; empty when the document has no tyre. */
  readonly profile: readonly (readonly [number, number])[];
  readonly outerRadius: number;
  /** Of the tyre, or 0 when the document has none. */
  readonly width: number;
  /** Where the hub's face lies, outboard of the wheel centre. */
  readonly face: number;
}

/** Shares of the tyre's width and of its height above the rim: round enough to read as a tyre. */
const TREAD_HALF = 0.4;
const BULGE_HALF = 0.5;
const RIM_HALF = 0.42;
/** A face ring of this share of the rim shows where the hub bolts on. */
const FACE_SHARE = 0.3;

export function outwardOf(side: Side): 1 | -1 {
  return side === "left" ? 1 : -1;
}

/** Null only for a wheel that lies flat on the ground. */
export function findWheelFrame(placement: CornerPlacement): WheelFrame | null {
  const { spinAxis, wheelCentre } = placement;
  const down = findUnit(add(scale(UP, -1), scale(spinAxis, spinAxis[2])));
  if (down === null) return null;
  return { centre: wheelCentre, level: cross(down, spinAxis), down, outboard: spinAxis };
}

/** Lowest point of the circle of the loaded radius about the wheel centre, in the wheel plane. */
export function contactOf(frame: WheelFrame, loadedRadius: number): Vec3 {
  return offset(frame.centre, frame.down, loadedRadius);
}

export function wheelShape({ loadedRadius, rim, tyre }: Wheel): WheelShape {
  const outerRadius = tyre ? tyre.diameter / 2 : loadedRadius;
  const width = tyre?.width ?? 0;
  const rimRadius = rim ? rim.diameter / 2 : outerRadius * 0.68;
  const face = rim?.offset ?? 0;
  const rings: Ring[] = tyre
    ? [
        { radius: outerRadius, across: TREAD_HALF * width, part: "tread" },
        { radius: outerRadius, across: -TREAD_HALF * width, part: "tread" },
      ]
    : [{ radius: loadedRadius, across: 0, part: "tread" }];
  if (rim) {
    rings.push(
      { radius: rimRadius, across: rim.width / 2, part: "rim" },
      { radius: rimRadius, across: -rim.width / 2, part: "rim" },
      { radius: rimRadius * FACE_SHARE, across: face, part: "face" },
    );
  }
  const height = outerRadius - rimRadius;
  const profile = tyre
    ? ([
        [RIM_HALF * width, rimRadius],
        [BULGE_HALF * width, rimRadius + 0.45 * height],
        [0.48 * width, rimRadius + 0.8 * height],
        [TREAD_HALF * width, outerRadius],
        [-TREAD_HALF * width, outerRadius],
        [-0.48 * width, rimRadius + 0.8 * height],
        [-BULGE_HALF * width, rimRadius + 0.45 * height],
        [-RIM_HALF * width, rimRadius],
      ] as const)
    : [];
  return { loadedRadius, rings, profile, outerRadius, width, face };
}

/** How far below the wheel centre a point of the tyre may come: the ground bears it from there. */
export function flatten(down: number, loadedRadius: number): number {
  return Math.min(down, loadedRadius);
}

/** A ring as a closed chain of points: x level, y down, z outboard of the wheel centre. */
export function ringPoints(ring: Ring, loadedRadius: number, segments: number): Vec3[] {
  return Array.from({ length: segments + 1 }, (_, k) => {
    const angleRad = (2 * Math.PI * k) / segments;
    const down = flatten(ring.radius * Math.cos(angleRad), loadedRadius);
    return [ring.radius * Math.sin(angleRad), down, ring.across];
  });
}

export function fromWheelFrame(frame: WheelFrame, [x, y, z]: Vec3): Vec3 {
  return offset(offset(offset(frame.centre, frame.level, x), frame.down, y), frame.outboard, z);
}
