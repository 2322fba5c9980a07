// The one place where left becomes right.

import type { AntiRollBar, Axle, Coordinates, Corner, Shape, Spring, Suspension, Wishbone } from "./axle.ts";

/** Mirrors a point in the car's centre plane y = 0. */
export function mirrorPoint([x, y, z]: Coordinates): Coordinates {
  return [x, y === 0 ? 0 : -y, z];
}

/** The corner of the other side: every y changes sign; toe, camber and lengths are the same by their definition. */
export function mirrorCorner(corner: Corner): Corner {
  return {
    ...corner,
    suspension: mirrorSuspension(corner.suspension),
    tieRod: { inner: mirrorPoint(corner.tieRod.inner), outer: mirrorPoint(corner.tieRod.outer) },
    wheel: { ...corner.wheel, centre: mirrorPoint(corner.wheel.centre) },
    ...(corner.spring && { spring: mirrorSpring(corner.spring) }),
    ...(corner.antiRollBar && { antiRollBar: mirrorAntiRollBar(corner.antiRollBar) }),
    ...(corner.shapes && { shapes: corner.shapes.map(mirrorShape) }),
  };
}

/** The right corner of an axle in the car's axes, whether given in full or as the mirror of the left. */
export function rightCorner(axle: Axle): Corner {
  return axle.right === "mirror" ? mirrorCorner(axle.left) : axle.right;
}

function mirrorSuspension(suspension: Suspension): Suspension {
  return {
    ...suspension,
    lowerArm: mirrorWishbone(suspension.lowerArm),
    upperArm: mirrorWishbone(suspension.upperArm),
  };
}

function mirrorWishbone(arm: Wishbone): Wishbone {
  return {
    frontPivot: mirrorPoint(arm.frontPivot),
    rearPivot: mirrorPoint(arm.rearPivot),
    ballJoint: mirrorPoint(arm.ballJoint),
  };
}

function mirrorSpring(spring: Spring): Spring {
  return { ...spring, body: mirrorPoint(spring.body), lower: mirrorPoint(spring.lower) };
}

function mirrorAntiRollBar(bar: AntiRollBar): AntiRollBar {
  return {
    ...bar,
    axis: [mirrorPoint(bar.axis[0]), mirrorPoint(bar.axis[1])],
    arm: mirrorPoint(bar.arm),
    link: { ...bar.link, lower: mirrorPoint(bar.link.lower) },
  };
}

function mirrorShape(shape: Shape): Shape {
  return { ...shape, from: mirrorPoint(shape.from), to: mirrorPoint(shape.to) };
}
