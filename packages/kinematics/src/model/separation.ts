// Two points that must be apart.

import { distance } from "../geometry/vec3.ts";
import type { Coordinates } from "./axle.ts";
import type { Issue, Path } from "./issue.ts";

/** mm. A link shorter than this is a slip of the pen: no joint is smaller. */
export const SHORTEST_LINK = 1;

interface Placed {
  readonly point: Coordinates;
  readonly path: Path;
}

/** An issue at `moved` when it stands on, or within a millimetre of, the other point; else none. */
export function tooClose(moved: Placed, other: { point: Coordinates; name: string }): Issue[] {
  const apart = distance(moved.point, other.point);
  if (apart >= SHORTEST_LINK) return [];
  return [
    {
      path: moved.path,
      value: moved.point,
      problem: `This point is ${apart === 0 ? "the same as" : "less than 1 mm from"} ${other.name}.`,
      hint: `Move it at least ${SHORTEST_LINK} mm away; check that no line was copied twice.`,
    },
  ];
}
