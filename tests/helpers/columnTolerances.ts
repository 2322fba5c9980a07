// How near the engine and the second method must be to one another, column by column.

import { asStated, TOLERANCE, type Tolerance } from "./tolerances.ts";

/**
 * A crossing of two nearly parallel lines is lost in their directions' error times the square of how far out it lies:
 * 1e-10 of gradient is 1e-7 mm at a metre and 1e-5 mm at ten.
 */
function rollCentreTolerance(lateral: number | null): Tolerance {
  const metresOut = 1 + Math.abs(lateral ?? 0) / 1000;
  return asStated(1e-6 * metresOut ** 2, "mm", `the lines cross ${metresOut.toFixed(1)} m out`);
}

interface ExpectedRow {
  readonly axle: { readonly rollCentreLateral: number | null };
}

/** The tolerance at a place of this row, such as `left.contactPoint[1]`. */
export const columnTolerancesOf =
  (expected: ExpectedRow) =>
  (where: string): Tolerance => {
    const column = where.replace(/\[\d+\]$/, "").replace(/^.*\./, "");
    switch (column) {
      case "toeDeg":
      case "camberDeg":
      case "casterDeg":
      case "kingpinInclinationDeg":
      case "toggleMarginDeg":
        return TOLERANCE.referenceDeg;
      case "casterTrail":
      case "scrubRadius":
        return TOLERANCE.referenceGroundMm;
      case "bumpSteerDegPerMm":
      case "camberChangeDegPerMm":
      case "springMotionRatio":
        return TOLERANCE.referenceGradient;
      case "ackermannPercent":
      case "antiDivePercent":
      case "antiLiftPercent":
      case "antiSquatPercent":
        return TOLERANCE.referencePercent;
      case "rollCentreLateral":
      case "rollCentreHeight":
        return rollCentreTolerance(expected.axle.rollCentreLateral);
      default:
        return TOLERANCE.referenceMm;
    }
  };
