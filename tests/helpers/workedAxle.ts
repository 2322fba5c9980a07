// The worked axle and its independent solution (data/): circle and sphere intersections and bracketed root finding in
// numpy and scipy, worked out apart from this project; the notes inside the files say how.

import type { Axle } from "@linkwright/kinematics";
import expectedJson from "./data/worked-axle.expected.json" with { type: "json" };
import axleJson from "./data/worked-axle.json" with { type: "json" };
import studiesJson from "./data/worked-axle.studies.json" with { type: "json" };
import { asStated, printedTo, TOLERANCE, type Tolerance } from "./tolerances.ts";

/** JSON modules are typed with arrays where the document has triples; the file is the document, unaltered. */
export const workedAxle = axleJson as unknown as Axle;

export const workedRows = expectedJson.rows;
export const workedStudies = studiesJson;

/** The rows' grid, in the order the rows have. */
export const workedGrid = {
  steers: [...new Set(workedRows.map((row) => row.steer))],
  travels: [...new Set(workedRows.map((row) => row.travel))],
};

const DIFFERENCES = "the file's gradients are central differences of 1e-3 mm, so 7 digits of them are good";
const GRADIENT = asStated(1e-9, "per mm", DIFFERENCES);
const ROLL_CENTRE = asStated(5e-7, "mm", DIFFERENCES);
const ANTI_DIVE = asStated(2e-7, "%", DIFFERENCES);
const DEG = printedTo(9, "degrees");
const POINT = printedTo(6, "mm");
const MM = printedTo(9, "mm");

/** As many digits as the file prints, column by column. */
export function printedToleranceOf(where: string): Tolerance {
  const column = where.replace(/\[\d+\]$/, "").replace(/^.*\./, "");
  switch (column) {
    case "toeDeg":
    case "camberDeg":
    case "casterDeg":
    case "kingpinInclinationDeg":
      return DEG;
    case "wheelCentre":
    case "contactPoint":
      return POINT;
    case "contactVelocity":
      return printedTo(6, "mm per mm");
    case "casterTrail":
    case "scrubRadius":
    case "springLength":
      return MM;
    case "bumpSteerDegPerMm":
    case "camberChangeDegPerMm":
    case "sideViewSlope":
    case "springMotionRatio":
      return GRADIENT;
    case "rollCentreHeight":
    case "rollCentreLateral":
      return ROLL_CENTRE;
    case "antiDivePercent":
      return ANTI_DIVE;
    case "track":
      return printedTo(7, "mm");
    default:
      return TOLERANCE.roundOff;
  }
}
