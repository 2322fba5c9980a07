// All bars in one instanced mesh: one draw call, and moving them writes sixteen numbers each.

import { Color, CylinderGeometry, DynamicDrawUsage, Group, InstancedMesh, MeshLambertMaterial } from "three";
import { type Bar, TONES, type Tone } from "../parts.ts";
import { BAND_PITCH, bandPaint, PAINT } from "../tones.ts";
import type { Layer } from "./layer.ts";

const SIDES_OF_ROUND = 14;

type Paints = Readonly<Record<Tone, { readonly bright: Color; readonly dark: Color }>>;

export function createBars(): Layer {
  const object = new Group();
  const geometry = new CylinderGeometry(1, 1, 1, SIDES_OF_ROUND);
  const material = new MeshLambertMaterial();
  const paints = mixPaints();
  let mesh = createMesh(geometry, material, 256);
  object.add(mesh);
  return {
    object,
    draw: ({ bars, size }) => {
      const pitch = BAND_PITCH * size;
      const pieces = bars.reduce((sum, bar) => sum + piecesOf(bar, pitch), 0);
      if (pieces > mesh.instanceMatrix.count) {
        object.remove(mesh);
        mesh.dispose();
        mesh = createMesh(geometry, material, pieces * 2);
        object.add(mesh);
      }
      writeBars(mesh, bars, pitch, paints);
    },
    dispose: () => {
      mesh.dispose();
      geometry.dispose();
      material.dispose();
    },
  };
}

function createMesh(
  geometry: CylinderGeometry,
  material: MeshLambertMaterial,
  capacity: number,
): InstancedMesh {
  const mesh = new InstancedMesh(geometry, material, capacity);
  mesh.instanceMatrix.setUsage(DynamicDrawUsage);
  mesh.setColorAt(0, new Color()); // makes the attribute
  mesh.frustumCulled = false; // its bounds are those of the first drawing
  return mesh;
}

function mixPaints(): Paints {
  const entries = TONES.map((tone) => [
    tone,
    { bright: new Color(PAINT[tone]), dark: new Color(bandPaint(tone)) },
  ]);
  return Object.fromEntries(entries) as Paints;
}

/** A banded bar is laid of pieces, bright at both ends. */
function piecesOf(bar: Bar, pitch: number): number {
  if (!bar.banded) return 1;
  const [x, y, z] = [bar.to[0] - bar.from[0], bar.to[1] - bar.from[1], bar.to[2] - bar.from[2]];
  return 2 * Math.round(Math.hypot(x, y, z) / pitch) + 1;
}

function writeBars(mesh: InstancedMesh, bars: readonly Bar[], pitch: number, paints: Paints): void {
  const matrices = mesh.instanceMatrix.array;
  const colours = mesh.instanceColor?.array;
  let piece = 0;
  for (const bar of bars) {
    const pieces = piecesOf(bar, pitch);
    const { bright, dark } = paints[bar.tone];
    for (let k = 0; k < pieces; k++) {
      writePiece(matrices, 16 * piece, bar, (k + 0.5) / pieces, 1 / pieces);
      const paint = k % 2 === 0 ? bright : dark;
      if (colours) paint.toArray(colours, 3 * piece);
      piece++;
    }
  }
  mesh.count = piece;
  mesh.instanceMatrix.needsUpdate = true;
  if (mesh.instanceColor) mesh.instanceColor.needsUpdate = true;
}

/**
 * The matrix, by columns, that takes the unit cylinder (radius 1, height 1 along y) to `share` of the bar, with its
 * middle at `middle` of the way along.
 */
export function writePiece(
  out: { [index: number]: number },
  at: number,
  { from, to, radius }: Pick<Bar, "from" | "to" | "radius">,
  middle: number,
  share: number,
): void {
  const [x, y, z] = [to[0] - from[0], to[1] - from[1], to[2] - from[2]];
  const size = Math.hypot(x, y, z) || 1;
  const [ux, uy, uz] = [x / size, y / size, z / size];
  // Some direction across the bar: level, unless the bar is upright.
  const level = Math.hypot(ux, uy);
  const [px, py, pz] = level > 1e-6 ? [-uy / level, ux / level, 0] : [1, 0, 0];
  out[at] = px * radius;
  out[at + 1] = py * radius;
  out[at + 2] = pz * radius;
  out[at + 3] = 0;
  out[at + 4] = x * share;
  out[at + 5] = y * share;
  out[at + 6] = z * share;
  out[at + 7] = 0;
  // p × u, which with x = p and y = u is z of a right-handed frame.
  out[at + 8] = (py * uz - pz * uy) * radius;
  out[at + 9] = (pz * ux - px * uz) * radius;
  out[at + 10] = (px * uy - py * ux) * radius;
  out[at + 11] = 0;
  out[at + 12] = from[0] + x * middle;
  out[at + 13] = from[1] + y * middle;
  out[at + 14] = from[2] + z * middle;
  out[at + 15] = 1;
}
