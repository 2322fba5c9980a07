// Springs as coils. The wire is wound once and stretched with the spring.

import {
  type BufferGeometry,
  CatmullRomCurve3,
  Group,
  Mesh,
  MeshLambertMaterial,
  TubeGeometry,
  Vector3,
} from "three";
import type { Coil } from "../parts.ts";
import { PAINT } from "../tones.ts";
import { writePiece } from "./bars.ts";
import type { Layer } from "./layer.ts";

const TURNS = 7;
const STEPS_PER_TURN = 14;
const WIRE = 0.13;
/** Share of the length at either end that is the damper's rod and not the coil. */
const BARE = 0.12;
/** The wire is wound in proportion to a spring so many times as long as it is wide, or it would look squashed. */
const SLENDERNESS = 8;

export function createCoils(): Layer {
  const object = new Group();
  const geometry = windCoil();
  const material = new MeshLambertMaterial({ color: PAINT.spring });
  return {
    object,
    draw: ({ coils }) => {
      while (object.children.length > coils.length) object.children.at(-1)?.removeFromParent();
      for (const [k, coil] of coils.entries()) {
        stretch(object.children[k] ?? addCoil(object, geometry, material), coil);
      }
    },
    dispose: () => {
      geometry.dispose();
      material.dispose();
    },
  };
}

/** About y, from −½ to ½, of radius 1, as the unit cylinder of bars.ts has it. */
function windCoil(): BufferGeometry {
  const steps = TURNS * STEPS_PER_TURN;
  const helix = Array.from({ length: steps + 1 }, (_, k) => {
    const angleRad = (2 * Math.PI * k) / STEPS_PER_TURN;
    const along = (k / steps - 0.5) * (1 - 2 * BARE) * SLENDERNESS;
    return new Vector3(Math.cos(angleRad), along, Math.sin(angleRad));
  });
  const geometry = new TubeGeometry(new CatmullRomCurve3(helix), steps, WIRE, 6);
  return geometry.scale(1, 1 / SLENDERNESS, 1);
}

function addCoil(parent: Group, geometry: BufferGeometry, material: MeshLambertMaterial): Mesh {
  const mesh = new Mesh(geometry, material);
  mesh.matrixAutoUpdate = false;
  mesh.frustumCulled = false;
  parent.add(mesh);
  return mesh;
}

function stretch(mesh: Pick<Mesh, "matrix" | "matrixWorldNeedsUpdate">, coil: Coil): void {
  writePiece(mesh.matrix.elements, 0, coil, 0.5, 1);
  mesh.matrixWorldNeedsUpdate = true;
}
