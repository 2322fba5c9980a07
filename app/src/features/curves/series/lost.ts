// What of a ride height's band the linkage cannot follow.

import { SIDES, type Side } from "@linkwright/kinematics";
import type { HeightSweep } from "./sweepHeight.ts";

export type LostPart =
  /** Not even the ride height is reached. */
  | { readonly side: Side; readonly way: "whole"; readonly link: string }
  | {
      readonly side: Side;
      readonly way: "bump" | "droop";
      /** About the ride height. */
      readonly asked: number;
      readonly reached: number;
      readonly link: string;
    };

/** mm. Ends this close to the band's own are the band's own. */
const CLOSE = 1e-6;

export function lostParts({ height, travels, rows, ends }: HeightSweep): LostPart[] {
  const atHeight = rows[travels.indexOf(0)] ?? null;
  return SIDES.flatMap((side): LostPart[] => {
    const sideEnds = ends.filter((end) => end.side === side);
    const [first] = sideEnds;
    if (first === undefined) return [];
    if ((atHeight?.[side] ?? null) === null) return [{ side, way: "whole", link: first.link }];
    return sideEnds.flatMap(({ lastTravel, link }): LostPart[] => {
      if (lastTravel === null) return [];
      const reached = lastTravel - height.wheelUp;
      const way = reached >= 0 ? "bump" : "droop";
      const asked = height.band[way === "bump" ? 1 : 0];
      // An end beyond the band, on the rule's margin, loses nothing that was asked for.
      return Math.abs(asked) > Math.abs(reached) + CLOSE ? [{ side, way, asked, reached, link }] : [];
    });
  });
}
