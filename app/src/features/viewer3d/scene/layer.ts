// Everything in this folder draws with three.js and is loaded with it; nothing outside imports it but by the one
// dynamic import of Scene.tsx, or three would be downloaded with every page.

import type { Object3D } from "three";
import type { SceneModel } from "../sceneModel.ts";
import type { ViewBasis } from "../viewpoint.ts";

/** A kind of part in the graphics library: made once, then moved. */
export interface Layer {
  readonly object: Object3D;
  readonly draw: (model: SceneModel) => void;
  /** For what keeps its size on the screen or depends on where the eye is. */
  readonly see?: (basis: ViewBasis, pxPerMm: number) => void;
  readonly dispose: () => void;
}
