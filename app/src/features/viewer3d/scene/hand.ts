// Pointer, touch and wheel, by the library's own controls. They move the camera; the viewpoint is read back from it.

import { MOUSE, type OrthographicCamera, TOUCH } from "three";
import { OrbitControls } from "three/addons/controls/OrbitControls.js";
import type { Channel } from "../channel.ts";
import { keepScrollManners } from "../scrollManners.ts";
import { UP } from "../vectors.ts";
import type { Viewpoint, ZoomLimits } from "../viewpoint.ts";
import { placeCamera, readCamera } from "./camera.ts";

interface HandOptions {
  readonly host: HTMLElement;
  readonly camera: OrthographicCamera;
  readonly viewpoint: Channel<Viewpoint>;
  readonly limits: () => ZoomLimits;
  readonly onHand: () => void;
}

export interface Hand {
  /** Puts the camera where the viewpoint is, unless the camera is where it came from. */
  readonly follow: (size: number) => void;
  readonly detach: () => void;
}

export function attachHand({ host, camera, viewpoint, limits, onHand }: HandOptions): Hand {
  // The controls take up from the camera once, when they are made.
  camera.up.set(...UP);
  const controls = new OrbitControls(camera, host);
  controls.mouseButtons = { LEFT: MOUSE.ROTATE, MIDDLE: MOUSE.DOLLY, RIGHT: MOUSE.PAN };
  controls.touches = { ONE: TOUCH.ROTATE, TWO: TOUCH.DOLLY_PAN };
  controls.zoomToCursor = true;
  host.style.cursor = "";
  const endManners = keepScrollManners(host);
  let isReading = false;
  let isPlacing = false;

  const read = () => {
    if (isPlacing) return;
    isReading = true;
    viewpoint.set(readCamera(camera, controls.target));
    isReading = false;
  };
  const begin = () => {
    const { least, most } = limits();
    controls.minZoom = least;
    controls.maxZoom = most;
    onHand();
  };
  controls.addEventListener("change", read);
  controls.addEventListener("start", begin);
  return {
    follow: (size) => {
      if (isReading) return;
      isPlacing = true;
      placeCamera(camera, controls.target, viewpoint.get(), size);
      controls.update();
      isPlacing = false;
    },
    detach: () => {
      endManners();
      controls.dispose();
      host.style.cursor = "";
    },
  };
}
