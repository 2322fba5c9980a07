// Curves over wheel travel: reading a value off them, and the span of values that a panel has to show.

export interface TravelPoint {
  readonly travel: number;
  /** Null where the linkage cannot be or the quantity makes no sense; the curve has a gap there. */
  readonly value: number | null;
}

/** Left is solid dye, right dashed oxide, an earlier revision faint, anything else plain ink. */
export type SeriesLook = "left" | "right" | "faint" | "plain";

export interface TravelSeries {
  readonly id: string;
  readonly label: string;
  readonly look: SeriesLook;
  /** In ascending travel. */
  readonly points: readonly TravelPoint[];
}

/** Where a value should lie, over all travel or a part of it. An end left null is open. */
export interface TargetBand {
  readonly min: number | null;
  readonly max: number | null;
  readonly fromTravel?: number;
  readonly toTravel?: number;
}

/** Read between the neighbouring points; null outside them or in a gap. */
export function findValueAt(points: readonly TravelPoint[], travel: number): number | null {
  const upper = points.findIndex((point) => point.travel >= travel);
  const above = points[upper];
  if (above === undefined) return null;
  if (above.travel === travel) return above.value;
  const below = points[upper - 1];
  if (below === undefined || below.value === null || above.value === null) return null;
  const share = (travel - below.travel) / (above.travel - below.travel);
  return below.value + share * (above.value - below.value);
}

interface DomainRequest {
  readonly series: readonly TravelSeries[];
  readonly band?: TargetBand | undefined;
  /** The least span shown, so that a flat curve looks flat instead of being blown up to noise. */
  readonly minSpan: number;
  /** A value that is always in sight, e.g. 0 for toe change. */
  readonly include?: number | undefined;
}

/** Room left beside the outermost values, as a share of the span. */
const MARGIN = 0.06;

export function valueDomain({ series, band, minSpan, include }: DomainRequest): [number, number] {
  const values = series.flatMap(({ points }) =>
    points.flatMap(({ value }) => (value === null ? [] : [value])),
  );
  for (const extra of [band?.min, band?.max, include]) if (typeof extra === "number") values.push(extra);
  if (values.length === 0) return [-minSpan / 2, minSpan / 2];
  const low = values.reduce((least, value) => Math.min(least, value));
  const high = values.reduce((most, value) => Math.max(most, value));
  const lacking = Math.max(0, minSpan - (high - low)) / 2;
  const margin = Math.max(high - low, minSpan) * MARGIN;
  return [low - lacking - margin, high + lacking + margin];
}
