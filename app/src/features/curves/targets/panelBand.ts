// The part of a panel where a target holds: the whole band for bump steer, a gate at the ride height for the rest.

import type { RideHeight, Target, TargetQuantity } from "@linkwright/kinematics";
import type { TargetBand } from "@/ui/rule/series.ts";
import type { TravelRange } from "../series/heights.ts";
import type { Quantity } from "../series/sweepHeight.ts";
import { type ToeDisplay, toeShown } from "../series/toeDisplay.ts";

const BOUNDED_BY: Readonly<Record<Quantity, TargetQuantity>> = {
  toe: "bumpSteerDeg",
  camber: "camberDeg",
  caster: "casterDeg",
  track: "track",
};

/** Of the rule's length: a gate has to be seen, and to be seen as a gate. */
const GATE_SHARE = 0.03;

interface PanelBandRequest {
  readonly quantity: Quantity;
  readonly targets: readonly Target[];
  readonly height: RideHeight;
  readonly range: TravelRange;
  readonly toe: ToeDisplay;
}

export function panelBand(request: PanelBandRequest): TargetBand | undefined {
  const { quantity, targets, height, range, toe } = request;
  const target = targets.find((each) => each.quantity === BOUNDED_BY[quantity]);
  if (target === undefined) return undefined;
  if (quantity === "toe") {
    const shown = (bound: number | null) => bound && toeShown(bound, toe);
    const [fromTravel, toTravel] = height.band;
    return { min: shown(target.min), max: shown(target.max), fromTravel, toTravel };
  }
  const half = (range.to - range.from) * GATE_SHARE;
  return { min: target.min, max: target.max, fromTravel: -half, toTravel: half };
}
