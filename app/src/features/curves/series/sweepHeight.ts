// The quantities of one ride height over the rule, solved once for a document.

import {
  type Axle,
  bandTravels,
  type RideHeight,
  type Side,
  type SweepEnd,
  type SweepRow,
  sweepAxle,
} from "@linkwright/kinematics";
import type { TravelPoint } from "@/ui/rule/series.ts";
import type { TravelRange } from "./heights.ts";
import { type ToeDisplay, toeShown } from "./toeDisplay.ts";

export const QUANTITIES = ["toe", "camber", "caster", "track"] as const;
export type Quantity = (typeof QUANTITIES)[number];

export interface HeightSweep {
  readonly height: RideHeight;
  readonly steer: number;
  /** About the ride height, ascending; 0 is among them. */
  readonly travels: readonly number[];
  /** One for each travel; null where neither side can be. */
  readonly rows: readonly (SweepRow | null)[];
  readonly ends: readonly SweepEnd[];
}

/** Pieces of a curve: a straight one stands off the true curve by 1/PIECES² of the whole's bow, less than a pixel. */
const PIECES = 24;
/** Away from straight ahead the engine solves every travel twice, for Ackermann; a curve of fewer pieces will do. */
const STEERED_PIECES = 16;

/** Call it with an axle that checkAxle accepts. */
export function sweepHeight(
  axle: Axle,
  height: RideHeight,
  { from, to }: TravelRange,
  steer = 0,
): HeightSweep {
  const travels = bandTravels([from, to], (to - from) / (steer === 0 ? PIECES : STEERED_PIECES));
  const { wheelUp } = height;
  const absolute = travels.map((travel) => wheelUp + travel);
  const { rows, ends } = sweepAxle(axle, { travels: absolute, steers: [steer], wheelUp });
  const byTravel = new Map(rows.map((row) => [row.travel, row]));
  return { height, steer, travels, rows: absolute.map((travel) => byTravel.get(travel) ?? null), ends };
}

/** One side's curve of a quantity; track is the same for both. Toe is its change from the ride height. */
export function curvePoints(
  sweep: HeightSweep,
  quantity: Quantity,
  side: Side,
  toe: ToeDisplay,
): TravelPoint[] {
  const read = reader(sweep, quantity, side, toe);
  return sweep.travels.map((travel, at) => {
    const row = sweep.rows[at] ?? null;
    return { travel, value: row && read(row) };
  });
}

type Reader = (row: SweepRow) => number | null;

function reader(sweep: HeightSweep, quantity: Quantity, side: Side, toe: ToeDisplay): Reader {
  switch (quantity) {
    case "toe": {
      const atHeight = sweep.rows[sweep.travels.indexOf(0)]?.[side]?.toeDeg ?? null;
      return (row) => {
        const toeDeg = row[side]?.toeDeg ?? null;
        return toeDeg === null || atHeight === null ? null : toeShown(toeDeg, toe) - toeShown(atHeight, toe);
      };
    }
    case "camber":
      return (row) => row[side]?.camberDeg ?? null;
    case "caster":
      return (row) => row[side]?.casterDeg ?? null;
    case "track":
      return (row) => row.axle.track;
  }
}
