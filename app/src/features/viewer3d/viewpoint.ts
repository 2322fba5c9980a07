// From where the car is looked at, and where a point of it then falls on the screen. No perspective: as on a drawing,
// what is parallel stays parallel, and a view from the front is true to scale.

import { dot, mix, offset, type Vec3 } from "./vectors.ts";

export interface Viewpoint {
  /** Of the eye, about +Z from straight ahead: 0 looks at the car's front, +90° at its left side. */
  readonly azimuthRad: number;
  /** Of the eye above the horizontal: +90° looks down from above. */
  readonly elevationRad: number;
  /** The point in the middle of the picture. */
  readonly target: Vec3;
  readonly pxPerMm: number;
}

export interface Viewport {
  readonly width: number;
  readonly height: number;
}

/** The screen's own directions in the car's axes: to its right, up it, and out of it towards the eye. */
export interface ViewBasis {
  readonly right: Vec3;
  readonly up: Vec3;
  readonly towards: Vec3;
}

export interface ScreenPoint {
  /** Pixels from the left edge. */
  readonly x: number;
  /** Pixels from the upper edge. */
  readonly y: number;
  /** mm towards the eye from the middle of the picture. */
  readonly depth: number;
}

/** Radians short of straight up and down, where the azimuth would be lost: 0.03 mm over a car's height. */
const POLE_MARGIN = 1e-4;
const STEEPEST = Math.PI / 2 - POLE_MARGIN;

export function viewBasis({ azimuthRad, elevationRad }: Viewpoint): ViewBasis {
  const [ca, sa] = [Math.cos(azimuthRad), Math.sin(azimuthRad)];
  const [ce, se] = [Math.cos(elevationRad), Math.sin(elevationRad)];
  return { right: [-sa, ca, 0], up: [-se * ca, -se * sa, ce], towards: [ce * ca, ce * sa, se] };
}

export function projectToScreen(
  point: Vec3,
  viewpoint: Viewpoint,
  viewport: Viewport,
  basis: ViewBasis = viewBasis(viewpoint),
): ScreenPoint {
  const { target, pxPerMm } = viewpoint;
  const from: Vec3 = [point[0] - target[0], point[1] - target[1], point[2] - target[2]];
  return {
    x: viewport.width / 2 + dot(from, basis.right) * pxPerMm,
    y: viewport.height / 2 - dot(from, basis.up) * pxPerMm,
    depth: dot(from, basis.towards),
  };
}

export function clampElevation(elevationRad: number): number {
  return Math.min(STEEPEST, Math.max(-STEEPEST, elevationRad));
}

/** The eye carried to the viewer's right and up. */
export function orbit(viewpoint: Viewpoint, rightRad: number, upRad: number): Viewpoint {
  return {
    ...viewpoint,
    azimuthRad: viewpoint.azimuthRad + rightRad,
    elevationRad: clampElevation(viewpoint.elevationRad + upRad),
  };
}

export function zoom(viewpoint: Viewpoint, factor: number, limits: ZoomLimits): Viewpoint {
  const pxPerMm = Math.min(limits.most, Math.max(limits.least, viewpoint.pxPerMm * factor));
  return { ...viewpoint, pxPerMm };
}

export interface ZoomLimits {
  readonly least: number;
  readonly most: number;
}

/** The picture moved by so many pixels to the right and up. */
export function pan(viewpoint: Viewpoint, rightPx: number, upPx: number): Viewpoint {
  const { right, up } = viewBasis(viewpoint);
  const { target, pxPerMm } = viewpoint;
  return {
    ...viewpoint,
    target: offset(offset(target, right, -rightPx / pxPerMm), up, -upPx / pxPerMm),
  };
}

/** Part of the way from one viewpoint to another, round the shorter side. */
export function mixViewpoints(from: Viewpoint, to: Viewpoint, share: number): Viewpoint {
  const turn = Math.PI * 2;
  const way = to.azimuthRad - from.azimuthRad;
  const shorter = way - turn * Math.round(way / turn);
  return {
    azimuthRad: from.azimuthRad + shorter * share,
    elevationRad: from.elevationRad + (to.elevationRad - from.elevationRad) * share,
    target: mix(from.target, to.target, share),
    pxPerMm: from.pxPerMm * (to.pxPerMm / from.pxPerMm) ** share,
  };
}
