// Tie rods, and the rack between them with the travel it has.

import type { Axle, CornerPlacement, RackSteering, Side } from "@linkwright/kinematics";
import type { Bar } from "./parts.ts";
import { add, between, findUnit, length, mix, offset, scale, type Vec3 } from "./vectors.ts";

/** Radii as shares of the picture's size. */
const TIE_ROD = 0.0066;
const RACK = 0.0072;
const HOUSING = 0.0145;
const SCRIBE = 0.0016;
/** Half the length of the tick at a stop, likewise. */
const TICK_HALF = 0.017;
/** The housing ends this share of the lock short of where an inner joint comes at full lock. */
const HOUSING_CLEARANCE = 1.25;

type Placements = Readonly<Record<Side, CornerPlacement | null>>;

export function tieRodBar(side: Side, placement: CornerPlacement, size: number): Bar | null {
  const from = placement.points["tieRod.inner"];
  const to = placement.points["tieRod.outer"];
  if (!from || !to) return null;
  const banded = side === "right";
  return { part: `${side}.tieRod`, from, to, radius: TIE_ROD * size, tone: "tieRod", banded };
}

/** `inner`: the inner joints straight ahead, from which the rack carries them along its axis. */
export function steeringBars(
  { steering }: Axle,
  inner: Readonly<Record<Side, Vec3>>,
  { steer, size, placements }: { steer: number; size: number; placements: Placements },
): Bar[] {
  if (steering.type !== "rack") return [];
  const axis = findUnit(steering.axis);
  if (axis === null) return [];
  const shown = (["left", "right"] as const).filter((side) => placements[side] !== null);
  return [
    rackBar(inner, scale(axis, steer), size),
    ...housingBar(steering, inner, size),
    ...shown.flatMap((side) => travelBars(side, inner[side], scale(axis, steering.travel), size)),
  ];
}

function rackBar(inner: Readonly<Record<Side, Vec3>>, moved: Vec3, size: number): Bar {
  return {
    part: "rack",
    from: add(inner.right, moved),
    to: add(inner.left, moved),
    radius: RACK * size,
    tone: "rack",
    banded: false,
  };
}

/** The part of the rack that no joint ever reaches; it stands still, so that the rack is seen to move in it. */
function housingBar({ travel }: RackSteering, inner: Readonly<Record<Side, Vec3>>, size: number): Bar[] {
  const span = length(between(inner.right, inner.left));
  const shut = (HOUSING_CLEARANCE * travel) / span;
  if (!(shut < 0.4)) return [];
  return [
    {
      part: "housing",
      from: mix(inner.right, inner.left, shut),
      to: mix(inner.right, inner.left, 1 - shut),
      radius: HOUSING * size,
      tone: "housing",
      banded: false,
    },
  ];
}

/** From one stop of an inner joint to the other, with a tick at each. */
function travelBars(side: Side, inner: Vec3, lock: Vec3, size: number): Bar[] {
  const ends = [add(inner, lock), offset(inner, lock, -1)] as const;
  const scribe = {
    part: `${side}.rackTravel`,
    radius: SCRIBE * size,
    tone: "scribe",
    banded: false,
  } as const;
  const half: Vec3 = [0, 0, TICK_HALF * size];
  return [
    { ...scribe, from: ends[0], to: ends[1] },
    ...ends.map((end) => ({ ...scribe, from: offset(end, half, -1), to: add(end, half) })),
  ];
}
