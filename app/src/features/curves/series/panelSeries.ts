// The curves of one panel: both sides as they are, and what they were before as faint lines.

import type { TravelPoint, TravelSeries } from "@/ui/rule/series.ts";
import { curvePoints, type HeightSweep, type Quantity } from "./sweepHeight.ts";
import type { ToeDisplay } from "./toeDisplay.ts";

export interface EarlierSweep {
  readonly label: string;
  readonly sweep: HeightSweep;
}

interface PanelSeriesRequest {
  readonly sweep: HeightSweep;
  readonly quantity: Quantity;
  readonly toe: ToeDisplay;
  readonly earlier: readonly EarlierSweep[];
}

export function panelSeries({ sweep, quantity, toe, earlier }: PanelSeriesRequest): TravelSeries[] {
  const left = curvePoints(sweep, quantity, "left", toe);
  const faint = earlier.flatMap((before): TravelSeries[] => {
    const points = curvePoints(before.sweep, quantity, "left", toe);
    return isSameCurve(points, left)
      ? []
      : [{ id: before.label, label: before.label, look: "faint", points }];
  });
  if (quantity === "track") return [{ id: "track", label: "track", look: "plain", points: left }, ...faint];
  const right = curvePoints(sweep, quantity, "right", toe);
  return [
    { id: "left", label: "left", look: "left", points: left },
    { id: "right", label: "right", look: "right", points: right },
    ...faint,
  ];
}

/** Degrees or mm: what differs by less is the same drawing solved twice. */
const SAME = 1e-9;

function isSameCurve(a: readonly TravelPoint[], b: readonly TravelPoint[]): boolean {
  return (
    a.length === b.length &&
    a.every(({ value }, at) => {
      const other = b[at]?.value ?? null;
      return value === other || (value !== null && other !== null && Math.abs(value - other) < SAME);
    })
  );
}
