// The jig's own datum: the same points in the axes that the fabricator measures from.

import { rejectFrom } from "../geometry/rotation.ts";
import { between, cross, dot, findUnit } from "../geometry/vec3.ts";
import { invariant } from "../invariant.ts";
import type { Coordinates } from "./axle.ts";
import type { Datum } from "./study.ts";

/**
 * A point of the car in the datum's axes: components of (point − origin) along xAxis, zAxis × xAxis and zAxis.
 * xAxis counts exactly; zAxis is squared to it (checkStudy lets it be off by a hair). Null datum: the car's own.
 */
export function pointInDatum(datum: Datum | null, point: Coordinates): Coordinates {
  if (datum === null) return point;
  const x = findUnit(datum.xAxis);
  invariant(x !== null, "the datum's x axis has no direction");
  const z = findUnit(rejectFrom(x, datum.zAxis));
  invariant(z !== null, "the datum's axes are parallel");
  const from = between(datum.origin, point);
  return [dot(from, x), dot(from, cross(z, x)), dot(from, z)];
}
