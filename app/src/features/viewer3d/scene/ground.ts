// The ground the tyres stand on: a grid that fades out, one line every hundred millimetres.

import {
  BufferAttribute,
  BufferGeometry,
  Color,
  LineBasicMaterial,
  LineSegments,
  Matrix4,
  Vector3,
} from "three";
import { dyedSteel } from "../../../ui/theme/tokens.ts";
import type { Layer } from "./layer.ts";

const PITCH = 100;
/** Of the picture's size: how far the grid reaches from its middle. */
const REACH = 1;
const STRENGTH = 0.34;
const PIECES_PER_LINE = 16;

export function createGround(): Layer {
  let geometry = new BufferGeometry();
  const material = new LineBasicMaterial({ vertexColors: true, transparent: true, depthWrite: false });
  const object = new LineSegments(geometry, material);
  object.matrixAutoUpdate = false;
  object.renderOrder = -1;
  let reach = 0;
  return {
    object,
    draw: ({ ground, size }) => {
      const wanted = Math.ceil((REACH * size) / PITCH) * PITCH;
      if (wanted !== reach) {
        reach = wanted;
        geometry.dispose();
        geometry = gridGeometry(reach);
        object.geometry = geometry;
      }
      const across = new Vector3(0, 1, ground.slope).normalize();
      const along = new Vector3(1, 0, 0);
      object.matrix = new Matrix4()
        .makeBasis(along, across, new Vector3().crossVectors(along, across))
        .setPosition(...ground.centre);
      object.matrixWorldNeedsUpdate = true;
    },
    dispose: () => {
      geometry.dispose();
      material.dispose();
    },
  };
}

function gridGeometry(reach: number): BufferGeometry {
  const colour = new Color(dyedSteel.edge);
  const positions: number[] = [];
  const colours: number[] = [];
  const push = (x: number, y: number) => {
    const fade = Math.max(0, 1 - Math.hypot(x, y) / reach);
    positions.push(x, y, 0);
    colours.push(colour.r, colour.g, colour.b, STRENGTH * fade);
  };
  const step = (2 * reach) / PIECES_PER_LINE;
  for (let at = -reach; at <= reach; at += PITCH) {
    for (let k = 0; k < PIECES_PER_LINE; k++) {
      const from = -reach + k * step;
      push(at, from);
      push(at, from + step);
      push(from, at);
      push(from + step, at);
    }
  }
  const geometry = new BufferGeometry();
  geometry.setAttribute("position", new BufferAttribute(new Float32Array(positions), 3));
  geometry.setAttribute("color", new BufferAttribute(new Float32Array(colours), 4));
  return geometry;
}
