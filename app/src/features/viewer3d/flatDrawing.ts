// The model projected onto the screen as strokes, farthest first.

import { labelIsShown } from "./labelPlaces.ts";
import type { Bar, Mark, WheelPicture } from "./parts.ts";
import type { SceneModel } from "./sceneModel.ts";
import { BAND_PITCH, bandPaint, PAINT } from "./tones.ts";
import { add, between, cross, findUnit, mix, offset, UP, type Vec3 } from "./vectors.ts";
import { projectToScreen, type ScreenPoint, type Viewpoint, type Viewport, viewBasis } from "./viewpoint.ts";
import { fromWheelFrame, type Ring, ringPoints } from "./wheelShape.ts";

export interface Stroke {
  readonly key: string;
  /** An SVG path. */
  readonly d: string;
  readonly paint: string;
  readonly width: number;
  readonly opacity: number;
  readonly dash: string | undefined;
}

export interface FlatDrawing {
  readonly strokes: readonly Stroke[];
  readonly marks: readonly (Mark & ScreenPoint)[];
  readonly labels: readonly (ScreenPoint & { readonly text: string; readonly paint: string })[];
}

type Project = (point: Vec3) => ScreenPoint;
type DeepStroke = Stroke & { readonly depth: number };

const RING_SEGMENTS = 48;
const GROUND_REACH = 0.75;
const COIL_TURNS = 7;
const DASH = "7 5";
/** Pixels. */
const FINEST_BAR = 1.2;

export function flatDrawing(model: SceneModel, viewpoint: Viewpoint, viewport: Viewport): FlatDrawing {
  const basis = viewBasis(viewpoint);
  const project: Project = (point) => projectToScreen(point, viewpoint, viewport, basis);
  const pitch = BAND_PITCH * model.size * viewpoint.pxPerMm;
  const solids = [
    ...model.bars.flatMap((bar, k) => barStrokes(bar, `bar-${k}`, { project, pitch, viewpoint })),
    ...model.coils.map((coil, k) => coilStroke(coil, `coil-${k}`, project)),
  ];
  return {
    strokes: [
      groundStroke(model, project),
      ...model.ghosts.flatMap((ghost, k) => wheelStrokes(ghost, `ghost-${k}`, project)),
      ...solids.sort((a, b) => a.depth - b.depth),
      ...model.wheels.flatMap((wheel, k) => wheelStrokes(wheel, `wheel-${k}`, project)),
    ],
    marks: model.marks.map((mark) => ({ ...mark, ...project(mark.point) })).sort((a, b) => a.depth - b.depth),
    labels: model.labels
      .filter((label) => labelIsShown(label, basis.towards))
      .map(({ text, tone, point }) => ({ text, paint: PAINT[tone], ...project(point) })),
  };
}

interface BarContext {
  readonly project: Project;
  /** Pixels. */
  readonly pitch: number;
  readonly viewpoint: Viewpoint;
}

/** A banded bar is a dark stroke under a dashed bright one. */
function barStrokes(bar: Bar, key: string, { project, pitch, viewpoint }: BarContext): DeepStroke[] {
  const [from, to] = [project(bar.from), project(bar.to)];
  const stroke: DeepStroke = {
    key,
    d: path([from, to]),
    paint: PAINT[bar.tone],
    width: Math.max(FINEST_BAR, 2 * bar.radius * viewpoint.pxPerMm),
    opacity: 1,
    dash: undefined,
    depth: (from.depth + to.depth) / 2,
  };
  if (!bar.banded) return [stroke];
  const half = number(pitch / 2);
  return [
    { ...stroke, key: `${key}-under`, paint: bandPaint(bar.tone) },
    { ...stroke, dash: `${half} ${half}` },
  ];
}

function wheelStrokes({ side, frame, shape }: WheelPicture, key: string, project: Project): Stroke[] {
  const isGhost = key.startsWith("ghost");
  const rings = shape.rings.filter(({ part }) => !isGhost || part === "tread");
  return rings.map((ring: Ring, k) => {
    const points = ringPoints(ring, shape.loadedRadius, RING_SEGMENTS);
    return {
      key: `${key}-${k}`,
      d: `${path(points.map((point) => project(fromWheelFrame(frame, point))))}Z`,
      paint: PAINT[side],
      width: isGhost || ring.part !== "tread" ? 1 : 1.75,
      opacity: isGhost ? 0.5 : 0.9,
      dash: side === "right" ? DASH : undefined,
    };
  });
}

/** Seen from aside a coil is a zigzag; that is what a draughtsman draws. */
function coilStroke(coil: SceneModel["coils"][number], key: string, project: Project): DeepStroke {
  const along = between(coil.from, coil.to);
  const across = findUnit(cross(along, [1, 0, 0])) ?? UP;
  const turns = Array.from({ length: 2 * COIL_TURNS }, (_, k) => {
    const way = k % 2 === 0 ? coil.radius : -coil.radius;
    return offset(mix(coil.from, coil.to, 0.12 + (0.76 * (k + 0.5)) / (2 * COIL_TURNS)), across, way);
  });
  const points = turns.map(project);
  const depth = project(mix(coil.from, coil.to, 0.5)).depth;
  return { key, d: path(points), paint: PAINT.spring, width: 2, opacity: 1, dash: undefined, depth };
}

/** One line from left to right and one along the car: enough to stand on. */
function groundStroke({ ground, size }: SceneModel, project: Project): Stroke {
  const reach = GROUND_REACH * size;
  const across: Vec3 = [0, reach, reach * ground.slope];
  const ends = (way: Vec3) => [project(add(ground.centre, way)), project(offset(ground.centre, way, -1))];
  return {
    key: "ground",
    d: path(ends(across)) + path(ends([reach, 0, 0])),
    paint: PAINT.scribe,
    width: 1,
    opacity: 0.6,
    dash: undefined,
  };
}

function path(points: readonly ScreenPoint[]): string {
  return points.map(({ x, y }, k) => `${k === 0 ? "M" : "L"}${number(x)} ${number(y)}`).join("");
}

/** Hundredths of a pixel: more would only make the path longer. */
function number(value: number): number {
  return Math.round(value * 100) / 100;
}
