// Toe as degrees, or as a length across a rim or a gauge bar of a stated diameter: D·sin(toe).

import type { LengthUnit } from "@linkwright/contract";
import { radFromDeg } from "@linkwright/kinematics";
import { formatAngle, formatLength, formatLengthFigure } from "../../../lib/format.ts";

export type ToeDisplay =
  | { readonly as: "degrees" }
  /** mm. */
  | { readonly as: "length"; readonly diameter: number };

export const TOE_IN_DEGREES: ToeDisplay = { as: "degrees" };

/** Degrees, or mm at the stated diameter. */
export function toeShown(toeDeg: number, display: ToeDisplay): number {
  return display.as === "degrees" ? toeDeg : display.diameter * Math.sin(radFromDeg(toeDeg));
}

interface ToeStyle {
  readonly units: LengthUnit;
  readonly decimals?: number;
  readonly sign?: "always";
}

/** What toeShown answered, as text. */
export function formatToe(
  shown: number | null,
  display: ToeDisplay,
  { units, decimals, sign }: ToeStyle,
): string {
  const style = sign ? { sign } : {};
  if (display.as === "degrees") return formatAngle(shown, { decimals: decimals ?? 2, ...style });
  return formatLength(shown, units, { decimals: lengthDecimals(units), ...style });
}

/** An angle of toe as figures tell it: finer than a curve's read-out. */
export function formatToeAngle(
  deg: number | null,
  { toe, units }: { readonly toe: ToeDisplay; readonly units: LengthUnit },
): string {
  return deg === null || toe.as === "degrees"
    ? formatAngle(deg, { decimals: 3 })
    : formatToe(toeShown(deg, toe), toe, { units });
}

/** The unit with its diameter, as it stands at the head of a scale. */
export function toeUnit(display: ToeDisplay, units: LengthUnit): string {
  if (display.as === "degrees") return "degrees";
  const diameter = formatLengthFigure(display.diameter, units, { decimals: units === "inch" ? 1 : 0 });
  return units === "inch" ? `in at ⌀ ${diameter}` : `mm at ⌀ ${diameter}`;
}

function lengthDecimals(units: LengthUnit): number {
  return units === "inch" ? 3 : 2;
}
