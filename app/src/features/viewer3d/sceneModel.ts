// An axle and where its parts stand → what is to be drawn. Knows no screen and no graphics library.

import {
  type Axle,
  type Corner,
  type CornerPlacement,
  type Fault,
  listHardpoints,
  rightCorner,
  SIDES,
  type Side,
} from "@linkwright/kinematics";
import { faultedParts } from "./faultedParts.ts";
import type { Bar, Coil, Ground, Label, Mark, WheelPicture } from "./parts.ts";
import { steeringBars, tieRodBar } from "./steeringBars.ts";
import { suspensionBars } from "./suspensionBars.ts";
import { offset, type Vec3 } from "./vectors.ts";
import { contactOf, findWheelFrame, outwardOf, wheelShape } from "./wheelShape.ts";

export type Placements = Readonly<Record<Side, CornerPlacement | null>>;

export interface SceneInput {
  readonly axle: Axle;
  readonly placements: Placements;
  /** The same axle at other travels, of which only the wheels are drawn. */
  readonly ghosts: readonly Placements[];
  readonly steer: number;
  readonly faults: readonly Fault[];
}

export interface SceneModel {
  readonly bars: readonly Bar[];
  readonly coils: readonly Coil[];
  readonly marks: readonly Mark[];
  readonly wheels: readonly WheelPicture[];
  readonly ghosts: readonly WheelPicture[];
  readonly ground: Ground;
  readonly labels: readonly Label[];
  /** Sides that cannot be reached and are not drawn. */
  readonly missing: readonly Side[];
  /** What everything is drawn in proportion to: the distance between the wheels. */
  readonly size: number;
}

/** Shares of the picture's size. */
const COIL = 0.024;
const DAMPER_ROD = 0.0042;
const CONTACT = 0.0022;
const LABEL_GAP = 0.03;
const FRONT_GAP = 0.1;
const ARROW = { length: 0.075, head: 0.022, radius: 0.0018 } as const;

export function buildSceneModel(input: SceneInput): SceneModel {
  const { axle, placements, steer } = input;
  const corners: Readonly<Record<Side, Corner>> = { left: axle.left, right: rightCorner(axle) };
  const size = sizeOf(corners);
  const wheels = wheelPictures(corners, placements);
  const ground = groundUnder(wheels, corners);
  const inner = { left: corners.left.tieRod.inner, right: corners.right.tieRod.inner };
  const front = frontOf(axle, size, ground);
  const bars = [
    ...SIDES.flatMap((side) => cornerBars(side, corners[side], placements[side], size)),
    ...steeringBars(axle, inner, { steer, size, placements }),
    ...wheels.map((wheel) => contactBar(wheel, size)),
    ...arrowBars(front, size),
  ];
  return {
    bars: markFaults(bars, faultedParts(input.faults)),
    coils: SIDES.flatMap((side) => coilOf(placements[side], size)),
    marks: marksOf(axle, placements),
    wheels,
    ghosts: input.ghosts.flatMap((ghost) => wheelPictures(corners, ghost)),
    ground,
    labels: labelsOf(wheels, front, size),
    missing: SIDES.filter((side) => placements[side] === null),
    size,
  };
}

export function sizeOf(corners: Readonly<Record<Side, Corner>>): number {
  return corners.left.wheel.centre[1] - corners.right.wheel.centre[1];
}

function wheelPictures(corners: Readonly<Record<Side, Corner>>, placements: Placements): WheelPicture[] {
  return SIDES.flatMap((side) => {
    const placement = placements[side];
    const frame = placement === null ? null : findWheelFrame(placement);
    return frame === null ? [] : [{ side, frame, shape: wheelShape(corners[side].wheel) }];
  });
}

/** Under both contact points, or level under the only one; without any, where the drawing has the wheels stand. */
function groundUnder(wheels: readonly WheelPicture[], corners: Readonly<Record<Side, Corner>>): Ground {
  const [one, other] = wheels.map(({ frame, shape }) => contactOf(frame, shape.loadedRadius));
  if (one === undefined) {
    const { centre, loadedRadius } = corners.left.wheel;
    return { centre: [centre[0], 0, centre[2] - loadedRadius], slope: 0 };
  }
  if (other === undefined) return { centre: [one[0], 0, one[2]], slope: 0 };
  const slope = (one[2] - other[2]) / (one[1] - other[1]);
  return { centre: [(one[0] + other[0]) / 2, 0, one[2] - slope * one[1]], slope };
}

function cornerBars(side: Side, corner: Corner, placement: CornerPlacement | null, size: number): Bar[] {
  if (placement === null) return [];
  const face = wheelShape(corner.wheel).face;
  const rod = tieRodBar(side, placement, size);
  return [
    ...suspensionBars({ side, suspension: corner.suspension, placement, size, face }),
    ...(rod === null ? [] : [rod]),
    ...coilOf(placement, size).map(({ from, to }) => damperRod(side, from, to, size)),
  ];
}

function damperRod(side: Side, from: Vec3, to: Vec3, size: number): Bar {
  return { part: `${side}.spring`, from, to, radius: DAMPER_ROD * size, tone: "spring", banded: false };
}

function coilOf(placement: CornerPlacement | null, size: number): Coil[] {
  const from = placement?.points["spring.lower"];
  const to = placement?.points["spring.body"];
  return from && to ? [{ from, to, radius: COIL * size }] : [];
}

/** Where the tyre meets the ground, as wide as the tyre. */
function contactBar({ side, frame, shape }: WheelPicture, size: number): Bar {
  const contact = contactOf(frame, shape.loadedRadius);
  const half = Math.max(shape.width / 2, LABEL_GAP * size);
  return {
    part: `${side}.contact`,
    from: offset(contact, frame.outboard, -half),
    to: offset(contact, frame.outboard, half),
    radius: CONTACT * size,
    tone: side,
    banded: side === "right",
  };
}

function markFaults(bars: readonly Bar[], faulted: ReadonlySet<string>): readonly Bar[] {
  if (faulted.size === 0) return bars;
  return bars.map((bar) =>
    faulted.has(bar.part) ? { ...bar, tone: "fault", radius: bar.radius * 1.6 } : bar,
  );
}

function marksOf(axle: Axle, placements: Placements): Mark[] {
  return listHardpoints(axle).flatMap(({ path, side, group, label }) => {
    const point = placements[side]?.points[path.slice(side.length + 1)];
    const name = `${side === "left" ? "Left" : "Right"} ${group.toLowerCase()}, ${label}`;
    return point ? [{ path, side, name, point }] : [];
  });
}

/** On the ground ahead of all there is. */
function frontOf(axle: Axle, size: number, ground: Ground): Vec3 {
  const ahead = listHardpoints(axle).map(({ point }) => point[0]);
  const [x, y, z] = ground.centre;
  const radius = wheelShape(axle.left.wheel).outerRadius;
  return [Math.max(...ahead, x + radius) + FRONT_GAP * size, y, z];
}

function arrowBars(tip: Vec3, size: number): Bar[] {
  const line = { part: "front", radius: ARROW.radius * size, tone: "scribe", banded: false } as const;
  const back = (x: number, y: number): Vec3 => [tip[0] - x * size, tip[1] + y * size, tip[2]];
  return [
    { ...line, from: back(ARROW.length, 0), to: tip },
    { ...line, from: back(ARROW.head, ARROW.head), to: tip },
    { ...line, from: back(ARROW.head, -ARROW.head), to: tip },
  ];
}

function labelsOf(wheels: readonly WheelPicture[], front: Vec3, size: number): Label[] {
  return [
    { text: "FRONT", point: offset(front, [1, 0, 0], LABEL_GAP * size), tone: "knuckle", outward: [1, 0, 0] },
    ...wheels.map(({ side, frame, shape }): Label => {
      const outward: Vec3 = [0, outwardOf(side), 0];
      const contact = contactOf(frame, shape.loadedRadius);
      return {
        text: side === "left" ? "LEFT" : "RIGHT",
        point: offset(contact, outward, shape.width / 2 + LABEL_GAP * size),
        tone: side,
        outward,
      };
    }),
  ];
}

/** The tie rod that is looked along: the left one, or the right where the left cannot be reached. */
export function findRod({ bars }: SceneModel): { side: Side; ends: readonly [Vec3, Vec3] } | null {
  for (const side of SIDES) {
    const rod = bars.find(({ part }) => part === `${side}.tieRod`);
    if (rod) return { side, ends: [rod.from, rod.to] };
  }
  return null;
}
