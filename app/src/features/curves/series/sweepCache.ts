import type { Axle, RideHeight } from "@linkwright/kinematics";
import type { TravelRange } from "./heights.ts";
import { type HeightSweep, sweepHeight } from "./sweepHeight.ts";

export type Sweeper = (axle: Axle, height: RideHeight, range: TravelRange, steer: number) => HeightSweep;

interface Entry {
  readonly asked: readonly [Axle, RideHeight, TravelRange, number];
  readonly sweep: HeightSweep;
}

/** As many as a board shows at once: the present, one that rests, and what was before, at a few ride heights. */
const MOST = 16;

/** sweepHeight that remembers its last answers by what was asked, so that the same curve is solved once. */
export function createSweeper(): Sweeper {
  let entries: readonly Entry[] = [];
  return (...asked) => {
    const known = entries.find((entry) => entry.asked.every((part, at) => part === asked[at]));
    if (known) return known.sweep;
    const sweep = sweepHeight(...asked);
    entries = [{ asked, sweep }, ...entries.slice(0, MOST - 1)];
    return sweep;
  };
}
