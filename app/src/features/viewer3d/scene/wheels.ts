// Wheels as scribed rings with a breath of rubber between them, and their ghosts at other travels.

import type { Side } from "@linkwright/kinematics";
import {
  BufferAttribute,
  BufferGeometry,
  DoubleSide,
  Group,
  type Matrix4,
  Mesh,
  MeshLambertMaterial,
  Vector3,
} from "three";
import { LineMaterial } from "three/addons/lines/LineMaterial.js";
import { LineSegments2 } from "three/addons/lines/LineSegments2.js";
import { LineSegmentsGeometry } from "three/addons/lines/LineSegmentsGeometry.js";
import type { WheelPicture } from "../parts.ts";
import { PAINT } from "../tones.ts";
import { flatten, type Ring, ringPoints, type WheelFrame, type WheelShape } from "../wheelShape.ts";
import type { Layer } from "./layer.ts";

const RING_SEGMENTS = 96;
const SKIN_OPACITY = 0.13;
/** Dash and gap, as a share of the wheel's radius. */
const DASH = 0.075;

interface WheelMaterials {
  readonly tread: LineMaterial;
  readonly rim: LineMaterial;
  readonly ghost: LineMaterial;
  readonly skin: MeshLambertMaterial;
}

interface WheelGeometry {
  readonly key: string;
  readonly tread: LineSegmentsGeometry;
  readonly rim: LineSegmentsGeometry;
  readonly skin: BufferGeometry;
}

export function createWheels(): Layer {
  const object = new Group();
  const sides = { left: createSide("left"), right: createSide("right") };
  object.add(sides.left.object, sides.right.object);
  return {
    object,
    draw: ({ wheels, ghosts }) => {
      for (const side of ["left", "right"] as const) {
        const wheel = wheels.find((picture) => picture.side === side) ?? null;
        sides[side].draw(
          wheel,
          ghosts.filter((ghost) => ghost.side === side),
        );
      }
    },
    dispose: () => {
      sides.left.dispose();
      sides.right.dispose();
    },
  };
}

function createSide(side: Side) {
  const materials = createMaterials(side);
  const object = new Group();
  const wheel = fixedGroup();
  const ghosts = new Group();
  object.add(wheel, ghosts);
  let geometry: WheelGeometry | null = null;

  const reshape = ({ shape }: WheelPicture) => {
    const key = JSON.stringify(shape);
    if (geometry?.key === key) return geometry;
    if (geometry) disposeGeometry(geometry);
    geometry = createGeometry(key, shape);
    for (const material of [materials.tread, materials.rim, materials.ghost]) {
      material.dashSize = DASH * shape.outerRadius;
      material.gapSize = DASH * shape.outerRadius * 0.7;
    }
    wheel.clear();
    ghosts.clear();
    wheel.add(
      new LineSegments2(geometry.tread, materials.tread),
      new LineSegments2(geometry.rim, materials.rim),
      new Mesh(geometry.skin, materials.skin),
    );
    return geometry;
  };

  return {
    object,
    draw: (picture: WheelPicture | null, ghostPictures: readonly WheelPicture[]) => {
      object.visible = picture !== null || ghostPictures.length > 0;
      wheel.visible = picture !== null;
      const first = picture ?? ghostPictures[0];
      if (!first) return;
      const { tread } = reshape(first);
      if (picture) standAt(wheel, picture.frame);
      while (ghosts.children.length > ghostPictures.length) ghosts.children.at(-1)?.removeFromParent();
      for (const [k, ghost] of ghostPictures.entries()) {
        const lines = ghosts.children[k] ?? addFixed(ghosts, new LineSegments2(tread, materials.ghost));
        standAt(lines, ghost.frame);
      }
    },
    dispose: () => {
      if (geometry) disposeGeometry(geometry);
      for (const material of Object.values(materials)) material.dispose();
    },
  };
}

function createMaterials(side: Side): WheelMaterials {
  const dashed = side === "right";
  const line = { color: PAINT[side], dashed, transparent: true, depthWrite: false };
  const tread = new LineMaterial({ ...line, linewidth: 1.75 });
  const rim = new LineMaterial({ ...line, linewidth: 1.1, opacity: 0.75 });
  const ghost = new LineMaterial({ ...line, linewidth: 1, opacity: 0.5 });
  for (const material of [tread, rim, ghost]) material.fog = true;
  const skin = new MeshLambertMaterial({
    color: PAINT[side],
    transparent: true,
    opacity: SKIN_OPACITY,
    depthWrite: false,
    side: DoubleSide,
  });
  return { tread, rim, ghost, skin };
}

function createGeometry(key: string, shape: WheelShape): WheelGeometry {
  const isTread = ({ part }: Ring) => part === "tread";
  return {
    key,
    tread: ringLines(shape.rings.filter(isTread), shape.loadedRadius),
    rim: ringLines(
      shape.rings.filter((ring) => !isTread(ring)),
      shape.loadedRadius,
    ),
    skin: skinGeometry(shape),
  };
}

function disposeGeometry({ tread, rim, skin }: WheelGeometry): void {
  tread.dispose();
  rim.dispose();
  skin.dispose();
}

/** Segments with the running length that dashes need, each ring from its own start. */
function ringLines(rings: readonly Ring[], loadedRadius: number): LineSegmentsGeometry {
  const positions = rings.flatMap((ring) => {
    const points = ringPoints(ring, loadedRadius, RING_SEGMENTS);
    return points.slice(1).flatMap((point, k) => [...(points[k] ?? point), ...point]);
  });
  const geometry = new LineSegmentsGeometry();
  geometry.setPositions(positions);
  const lines = new LineSegments2(geometry);
  lines.computeLineDistances();
  lines.material.dispose();
  return geometry;
}

/** The tyre's section turned about the spin axis, pressed flat where it stands. */
function skinGeometry({ profile, loadedRadius }: WheelShape): BufferGeometry {
  const geometry = new BufferGeometry();
  const positions: number[] = [];
  const indices: number[] = [];
  for (let k = 0; k <= RING_SEGMENTS; k++) {
    const angleRad = (2 * Math.PI * k) / RING_SEGMENTS;
    for (const [across, radius] of profile) {
      positions.push(radius * Math.sin(angleRad), flatten(radius * Math.cos(angleRad), loadedRadius), across);
    }
  }
  for (let k = 0; k < RING_SEGMENTS; k++) {
    for (let j = 0; j + 1 < profile.length; j++) {
      const here = k * profile.length + j;
      const next = here + profile.length;
      indices.push(here, next, here + 1, here + 1, next, next + 1);
    }
  }
  geometry.setAttribute("position", new BufferAttribute(new Float32Array(positions), 3));
  geometry.setIndex(indices);
  geometry.computeVertexNormals();
  return geometry;
}

function fixedGroup(): Group {
  const group = new Group();
  group.matrixAutoUpdate = false;
  return group;
}

function addFixed(parent: Group, lines: LineSegments2): LineSegments2 {
  lines.matrixAutoUpdate = false;
  parent.add(lines);
  return lines;
}

function standAt(object: { matrix: Matrix4; matrixWorldNeedsUpdate: boolean }, frame: WheelFrame): void {
  const { centre, level, down, outboard } = frame;
  object.matrix
    .makeBasis(new Vector3(...level), new Vector3(...down), new Vector3(...outboard))
    .setPosition(...centre);
  object.matrixWorldNeedsUpdate = true;
}
