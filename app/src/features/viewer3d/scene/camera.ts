// The viewpoint as a camera of the graphics library, and back. Both use the car's own axes, with Z up, so that
// nothing is turned or mirrored in between.

import type { OrthographicCamera, Vector3 } from "three";
import { offset, UP } from "../vectors.ts";
import { type Viewpoint, viewBasis } from "../viewpoint.ts";

/** In sizes of the picture; without perspective only what is cut off in front and behind depends on it. */
export const EYE_DISTANCE = 6;
const DEPTH = { near: 0.1, far: 14 } as const;

export function placeCamera(
  camera: OrthographicCamera,
  target: Vector3,
  viewpoint: Viewpoint,
  size: number,
): void {
  const { towards } = viewBasis(viewpoint);
  camera.up.set(...UP);
  target.set(...viewpoint.target);
  camera.position.set(...offset(viewpoint.target, towards, EYE_DISTANCE * size));
  camera.near = DEPTH.near * size;
  camera.far = DEPTH.far * size;
  camera.zoom = viewpoint.pxPerMm;
  camera.lookAt(target);
  camera.updateProjectionMatrix();
  camera.updateMatrixWorld();
}

export function readCamera(camera: OrthographicCamera, target: Vector3): Viewpoint {
  const [x, y, z] = [
    camera.position.x - target.x,
    camera.position.y - target.y,
    camera.position.z - target.z,
  ];
  return {
    azimuthRad: Math.atan2(y, x),
    elevationRad: Math.atan2(z, Math.hypot(x, y)),
    target: [target.x, target.y, target.z],
    pxPerMm: camera.zoom,
  };
}
