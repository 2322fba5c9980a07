// The places from which the car is looked at, each fitted to the picture. The whole axle in its design position is
// fitted, with room for travel, so that moving it does not move the eye.

import { type Axle, listHardpoints, radFromDeg, rightCorner } from "@linkwright/kinematics";
import { sizeOf } from "./sceneModel.ts";
import { add, between, findUnit, length, offset, type Vec3 } from "./vectors.ts";
import { clampElevation, type Viewpoint, type Viewport, viewBasis, type ZoomLimits } from "./viewpoint.ts";
import { outwardOf, wheelShape } from "./wheelShape.ts";

export const VIEWS = ["front", "side", "top", "threeQuarter", "alongTieRod"] as const;
export type ViewName = (typeof VIEWS)[number];

export interface Surroundings {
  /** What the picture must hold. */
  readonly points: readonly Vec3[];
  /** From its inner to its outer joint; null where no tie rod can be drawn. */
  readonly tieRod: readonly [Vec3, Vec3] | null;
}

/** Pixels at the edges that captions and buttons cover. */
export interface Insets {
  readonly top: number;
  readonly side: number;
  readonly bottom: number;
}

const THREE_QUARTER_DEG = { azimuth: 32, elevation: 24 } as const;
/** Shares of the distance between the wheels: room for the wheels' travel, and for FRONT ahead of them. */
const TRAVEL_ROOM = 0.05;
const FRONT_ROOM = 0.16;
/** How far one may go out and in, from the fitted picture. */
const ZOOM_RANGE = { least: 0.4, most: 12 } as const;
/** mm: a picture of nothing is fitted as if it were this large. */
const LEAST_SPAN = 100;

/** The axle in its design position: hardpoints, wheels with room to travel, and FRONT. */
export function extentOf(axle: Axle): Vec3[] {
  const corners = { left: axle.left, right: rightCorner(axle) };
  const size = sizeOf(corners);
  const boxes = (["left", "right"] as const).flatMap((side) => {
    const { centre } = corners[side].wheel;
    const { outerRadius, width } = wheelShape(corners[side].wheel);
    const corner = (x: number, y: number, z: number) => add(centre, [x, y * outwardOf(side), z]);
    const rise = outerRadius + TRAVEL_ROOM * size;
    return [-outerRadius, outerRadius].flatMap((x) =>
      [-width / 2, width / 2].flatMap((y) => [-rise, rise].map((z) => corner(x, y, z))),
    );
  });
  const hardpoints = listHardpoints(axle).map(({ point }) => point);
  const foremost = Math.max(...[...boxes, ...hardpoints].map(([x]) => x));
  const lowest = Math.min(...boxes.map(([, , z]) => z));
  const front: Vec3 = [foremost + FRONT_ROOM * size, 0, lowest + TRAVEL_ROOM * size];
  return [...boxes, ...hardpoints, front];
}

export function placeFor(
  view: ViewName,
  surroundings: Surroundings,
  viewport: Viewport,
  insets: Insets,
): Viewpoint {
  return fit(directionOf(view, surroundings.tieRod), surroundings.points, viewport, insets);
}

export function zoomLimits(fitted: Viewpoint): ZoomLimits {
  return { least: fitted.pxPerMm * ZOOM_RANGE.least, most: fitted.pxPerMm * ZOOM_RANGE.most };
}

type Direction = Pick<Viewpoint, "azimuthRad" | "elevationRad">;

function directionOf(view: ViewName, tieRod: Surroundings["tieRod"]): Direction {
  switch (view) {
    case "front":
      return { azimuthRad: 0, elevationRad: 0 };
    case "side":
      return { azimuthRad: Math.PI / 2, elevationRad: 0 };
    case "top":
      // From behind the wheel, so that front is up.
      return { azimuthRad: Math.PI, elevationRad: clampElevation(Math.PI / 2) };
    case "threeQuarter":
      return {
        azimuthRad: radFromDeg(THREE_QUARTER_DEG.azimuth),
        elevationRad: radFromDeg(THREE_QUARTER_DEG.elevation),
      };
    case "alongTieRod":
      return alongRod(tieRod) ?? { azimuthRad: Math.PI / 2, elevationRad: 0 };
  }
}

/** From outboard, so that the wheel is nearest and the rod shrinks to a point. */
function alongRod(tieRod: Surroundings["tieRod"]): Direction | null {
  const unit = tieRod && findUnit(between(...tieRod));
  if (!unit) return null;
  return { azimuthRad: Math.atan2(unit[1], unit[0]), elevationRad: clampElevation(Math.asin(unit[2])) };
}

function fit(direction: Direction, points: readonly Vec3[], viewport: Viewport, insets: Insets): Viewpoint {
  const basis = viewBasis({ ...direction, target: [0, 0, 0], pxPerMm: 1 });
  const across = rangeAlong(points, basis.right);
  const upwards = rangeAlong(points, basis.up);
  const depth = rangeAlong(points, basis.towards);
  const roomAcross = Math.max(1, viewport.width - 2 * insets.side);
  const roomUpwards = Math.max(1, viewport.height - insets.top - insets.bottom);
  const pxPerMm = Math.min(roomAcross / across.span, roomUpwards / upwards.span);
  // The middle of the free room lies below or above the middle of the picture by half the difference of the insets.
  const lift = (insets.bottom - insets.top) / 2 / pxPerMm;
  const target = offset(
    offset(offset([0, 0, 0], basis.right, across.middle), basis.up, upwards.middle - lift),
    basis.towards,
    depth.middle,
  );
  return { ...direction, target, pxPerMm };
}

function rangeAlong(points: readonly Vec3[], along: Vec3): { middle: number; span: number } {
  const places = points.map((point) => point[0] * along[0] + point[1] * along[1] + point[2] * along[2]);
  const [least, most] = [Math.min(...places), Math.max(...places)];
  return { middle: (least + most) / 2, span: Math.max(LEAST_SPAN, most - least) };
}

/** Whether a place fitted anew differs so much from one in use that the picture no longer sits well. */
export function hasOutgrown(used: Viewpoint, fitted: Viewpoint, viewport: Viewport): boolean {
  const growth = Math.abs(Math.log(fitted.pxPerMm / used.pxPerMm));
  const shift = length(between(used.target, fitted.target)) * used.pxPerMm;
  return growth > OUTGROWN.growth || shift > OUTGROWN.shift * Math.min(viewport.width, viewport.height);
}

/** A step of a hardpoint's stepper stays well below these. */
const OUTGROWN = { growth: 0.08, shift: 0.08 } as const;
