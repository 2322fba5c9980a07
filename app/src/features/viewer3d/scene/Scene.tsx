// The one module through which three.js is loaded. React builds it once; from then on it listens to channels and
// moves what is there, so that a slider renders nothing in here.

import { Canvas, useThree } from "@react-three/fiber";
import { memo, useEffect } from "react";
import type { OrthographicCamera } from "three";
import type { Channel } from "../channel.ts";
import type { Viewpoint, ZoomLimits } from "../viewpoint.ts";
import { attachHand } from "./hand.ts";
import { createLinkage, type Drawing } from "./linkage.ts";

export interface SceneProps {
  /** Takes the pointers and the wheel. */
  readonly host: HTMLElement;
  readonly viewpoint: Channel<Viewpoint>;
  readonly drawing: Channel<Drawing>;
  readonly limits: () => ZoomLimits;
  readonly onFirstPicture: () => void;
  /** A hand begins to turn, shift or zoom the picture. */
  readonly onHand: () => void;
  readonly onContextLost: () => void;
}

/** Denser is not seen, and costs four times the pixels. */
const DENSITY: [number, number] = [1, 2];

export const Scene = memo(function Scene(props: SceneProps) {
  return (
    <Canvas
      orthographic
      flat
      frameloop="demand"
      dpr={DENSITY}
      gl={{ alpha: true, antialias: true }}
      resize={{ scroll: false, debounce: 0 }}
      style={{ pointerEvents: "none" }}
    >
      <Content {...props} />
    </Canvas>
  );
});

function Content({ host, viewpoint, drawing, limits, onFirstPicture, onHand, onContextLost }: SceneProps) {
  const scene = useThree((state) => state.scene);
  const camera = useThree((state) => state.camera) as OrthographicCamera; // the Canvas is orthographic
  const canvas = useThree((state) => state.gl.domElement);
  const invalidate = useThree((state) => state.invalidate);

  useEffect(() => {
    const linkage = createLinkage(scene);
    const hand = attachHand({ host, camera, viewpoint, limits, onHand });
    const draw = () => {
      linkage.draw(drawing.get());
      invalidate();
    };
    const see = () => {
      hand.follow(drawing.get().model.size);
      linkage.see(viewpoint.get());
      invalidate();
    };
    draw();
    see();
    const stops = [drawing.subscribe(draw), viewpoint.subscribe(see), hand.detach, linkage.dispose];
    return () => {
      for (const stop of stops) stop();
    };
  }, [scene, camera, invalidate, host, viewpoint, drawing, limits, onHand]);

  useEffect(() => {
    scene.onAfterRender = () => {
      scene.onAfterRender = () => undefined;
      onFirstPicture();
    };
  }, [scene, onFirstPicture]);

  useEffect(() => {
    const lose = (event: Event) => {
      event.preventDefault();
      onContextLost();
    };
    canvas.addEventListener("webglcontextlost", lose);
    return () => canvas.removeEventListener("webglcontextlost", lose);
  }, [canvas, onContextLost]);

  return null;
}
