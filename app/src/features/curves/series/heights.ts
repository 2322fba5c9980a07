import type { RideHeight, Study } from "@linkwright/kinematics";

/** What stands in until a study names a ride height of its own. */
const DESIGN_HEIGHT: RideHeight = { name: "Design height", wheelUp: 0, rakeDeg: 0, band: [-50, 50] };
const DESIGN_ALONE: readonly RideHeight[] = [DESIGN_HEIGHT];

/** Never empty, and the same list for the same study. */
export function heightsOf(study: Pick<Study, "rideHeights">): readonly RideHeight[] {
  return study.rideHeights.length > 0 ? study.rideHeights : DESIGN_ALONE;
}

/** The one of that name; the first when there is none, e.g. since it was renamed. */
export function chooseHeight(heights: readonly RideHeight[], name: string | null): RideHeight {
  return heights.find((height) => height.name === name) ?? heights[0] ?? DESIGN_HEIGHT;
}

export interface TravelRange {
  readonly from: number;
  readonly to: number;
}

/** mm shown beyond the widest band, so that one sees where it ends and what the curve does next. */
const BEYOND = 10;
const LEAST = 40;

/** One rule for all ride heights, on whole centimetres, so that it does not jump when another is chosen. */
export function ruleRange(heights: readonly RideHeight[]): TravelRange {
  const droop = Math.max(LEAST, ...heights.map(({ band }) => BEYOND - band[0]));
  const bump = Math.max(LEAST, ...heights.map(({ band }) => BEYOND + band[1]));
  return { from: -Math.ceil(droop / 10) * 10, to: Math.ceil(bump / 10) * 10 };
}
