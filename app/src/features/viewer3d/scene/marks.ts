// Hardpoints as punch marks: points that face the eye and keep their size on the screen, always in sight.

import {
  BufferAttribute,
  BufferGeometry,
  CanvasTexture,
  DynamicDrawUsage,
  Group,
  LinearFilter,
  Points,
  PointsMaterial,
  SRGBColorSpace,
} from "three";
import { dyedSteel } from "../../../ui/theme/tokens.ts";
import { MARK } from "../markLook.ts";
import type { Mark } from "../parts.ts";
import { dot } from "../vectors.ts";
import type { ViewBasis } from "../viewpoint.ts";
import type { Layer } from "./layer.ts";

/** Marks drawn after the bars, and above them. */
export const MARK_ORDER = 10;
const TEXTURE_PX = 96;

export interface MarksLayer extends Layer {
  readonly emphasise: (path: string | null) => void;
}

export function createMarks(): MarksLayer {
  const plain = createPoints(MARK.diameter, drawPlain, 64);
  const chosen = createPoints(MARK.chosenDiameter, drawChosen, 1);
  const object = new Group();
  object.add(plain.points, chosen.points);
  let marks: readonly Mark[] = [];
  let chosenPath: string | null = null;
  let towards: ViewBasis["towards"] = [1, 0, 0];

  const place = () => {
    // Farthest first: the nearer of two marks on one spot must cover the other.
    const ordered = [...marks].sort((a, b) => dot(a.point, towards) - dot(b.point, towards));
    plain.place(ordered.filter(({ path }) => path !== chosenPath));
    chosen.place(ordered.filter(({ path }) => path === chosenPath));
  };
  return {
    object,
    draw: (model) => {
      marks = model.marks;
      place();
    },
    emphasise: (path) => {
      if (path === chosenPath) return;
      chosenPath = path;
      place();
    },
    see: (basis) => {
      towards = basis.towards;
      place();
    },
    dispose: () => {
      plain.dispose();
      chosen.dispose();
    },
  };
}

type Painter = (context: CanvasRenderingContext2D, unit: number) => void;

function createPoints(diameterPx: number, paint: Painter, capacity: number) {
  const geometry = new BufferGeometry();
  const texture = paintTexture(diameterPx, paint);
  const material = new PointsMaterial({
    map: texture,
    size: diameterPx,
    sizeAttenuation: false,
    transparent: true,
    depthTest: false,
    depthWrite: false,
  });
  const points = new Points(geometry, material);
  points.frustumCulled = false;
  points.renderOrder = MARK_ORDER;
  let positions = new BufferAttribute(new Float32Array(3 * capacity), 3).setUsage(DynamicDrawUsage);
  geometry.setAttribute("position", positions);
  const place = (marks: readonly Mark[]) => {
    if (marks.length > positions.count) {
      positions = new BufferAttribute(new Float32Array(6 * marks.length), 3).setUsage(DynamicDrawUsage);
      geometry.setAttribute("position", positions);
    }
    for (const [k, { point }] of marks.entries()) positions.setXYZ(k, ...point);
    positions.needsUpdate = true;
    geometry.setDrawRange(0, marks.length);
  };
  const dispose = () => {
    geometry.dispose();
    material.dispose();
    texture.dispose();
  };
  return { points, place, dispose };
}

function paintTexture(diameterPx: number, paint: Painter): CanvasTexture {
  const canvas = document.createElement("canvas");
  canvas.width = TEXTURE_PX;
  canvas.height = TEXTURE_PX;
  const context = canvas.getContext("2d");
  if (context) {
    context.translate(TEXTURE_PX / 2, TEXTURE_PX / 2);
    paint(context, TEXTURE_PX / diameterPx);
  }
  const texture = new CanvasTexture(canvas);
  texture.colorSpace = SRGBColorSpace;
  texture.minFilter = LinearFilter;
  texture.generateMipmaps = false;
  return texture;
}

function disc(context: CanvasRenderingContext2D, radius: number, fill: string): void {
  context.beginPath();
  context.arc(0, 0, radius, 0, 2 * Math.PI);
  context.fillStyle = fill;
  context.fill();
}

const drawPlain: Painter = (context, unit) => {
  disc(context, MARK.ringRadius * unit, dyedSteel.ink);
  disc(context, (MARK.ringRadius - MARK.ringWidth) * unit, dyedSteel.ground);
  disc(context, MARK.dotRadius * unit, dyedSteel.ink);
};

/** The other way round: a bright face with a dark punch, in a ring of its own. */
const drawChosen: Painter = (context, unit) => {
  disc(context, (MARK.chosenDiameter / 2 - 1) * unit, dyedSteel.ink);
  disc(context, (MARK.chosenDiameter / 2 - 2.5) * unit, dyedSteel.ground);
  disc(context, (MARK.chosenDiameter / 2 - 4.5) * unit, dyedSteel.ink);
  disc(context, MARK.dotRadius * 1.3 * unit, dyedSteel.ground);
};
