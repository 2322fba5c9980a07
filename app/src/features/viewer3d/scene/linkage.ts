// The whole picture in the graphics library: made once, drawn again from each model.

import { Color, DirectionalLight, Fog, Group, HemisphereLight, type Scene } from "three";
import { dyedSteel } from "../../../ui/theme/tokens.ts";
import type { SceneModel } from "../sceneModel.ts";
import { BACKDROP } from "../tones.ts";
import { offset, type Vec3 } from "../vectors.ts";
import { type Viewpoint, viewBasis } from "../viewpoint.ts";
import { createBars } from "./bars.ts";
import { EYE_DISTANCE } from "./camera.ts";
import { createCoils } from "./coils.ts";
import { createGround } from "./ground.ts";
import { createLabels, type Naming } from "./labels.ts";
import type { Layer } from "./layer.ts";
import { createMarks } from "./marks.ts";
import { createWheels } from "./wheels.ts";

/** What the picture shows now: the model, and the hardpoint that is pointed at or chosen. */
export interface Drawing {
  readonly model: SceneModel;
  readonly emphasis: (Naming & { readonly path: string }) | null;
}

/** Intensities that give a face turned to the light its own paint. */
const SKY = 1.5;
const LAMP = 2.1;
/** How far the haze begins short of the middle of the picture and ends beyond it, in sizes of the picture. */
const HAZE = { before: 0.15, beyond: 1.9 } as const;

export interface Linkage {
  readonly draw: (drawing: Drawing) => void;
  readonly see: (viewpoint: Viewpoint) => void;
  readonly dispose: () => void;
}

export function createLinkage(scene: Scene): Linkage {
  const marks = createMarks();
  const labels = createLabels();
  const layers: readonly Layer[] = [
    createGround(),
    createBars(),
    createCoils(),
    createWheels(),
    marks,
    labels,
  ];
  const lamp = new DirectionalLight(0xffffff, LAMP);
  const object = new Group();
  const sky = new HemisphereLight(new Color(dyedSteel.ink), new Color(dyedSteel.rule), SKY);
  sky.position.set(0, 0, 1);
  object.add(...layers.map((layer) => layer.object), sky, lamp, lamp.target);
  scene.add(object);
  const haze = new Fog(BACKDROP.edge);
  scene.fog = haze;
  return {
    draw: ({ model, emphasis }) => {
      haze.near = (EYE_DISTANCE - HAZE.before) * model.size;
      haze.far = (EYE_DISTANCE + HAZE.beyond) * model.size;
      for (const layer of layers) layer.draw(model);
      marks.emphasise(emphasis?.path ?? null);
      labels.name(emphasis);
    },
    see: (viewpoint) => {
      const basis = viewBasis(viewpoint);
      for (const layer of layers) layer.see?.(basis, viewpoint.pxPerMm);
      lightFrom(lamp, viewpoint.target, basis);
    },
    dispose: () => {
      scene.remove(object);
      scene.fog = null;
      for (const layer of layers) layer.dispose();
      lamp.dispose();
      sky.dispose();
    },
  };
}

/** Over the viewer's left shoulder, wherever the viewer stands. */
function lightFrom(
  lamp: DirectionalLight,
  target: Vec3,
  { right, up, towards }: ReturnType<typeof viewBasis>,
): void {
  lamp.target.position.set(...target);
  lamp.position.set(...offset(offset(offset(target, towards, 1000), up, 600), right, -500));
}
