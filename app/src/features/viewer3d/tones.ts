// What each part is painted with: dyed steel with scribed lines, the same in both themes.

import { dyedSteel } from "../../ui/theme/tokens.ts";
import type { Tone } from "./parts.ts";

export const BACKDROP = { centre: dyedSteel.dyeWash, edge: dyedSteel.ground } as const;

export const PAINT: Readonly<Record<Tone, string>> = {
  left: dyedSteel.dye,
  right: dyedSteel.oxide,
  knuckle: dyedSteel.ink,
  tieRod: dyedSteel.amber,
  rack: blend(dyedSteel.amber, dyedSteel.ground, 0.25),
  housing: blend(dyedSteel.amber, dyedSteel.ground, 0.6),
  spring: dyedSteel.inkSoft,
  scribe: dyedSteel.edge,
  fault: dyedSteel.fault,
};

/** The dark half of a banded bar, as a share of the backdrop in its paint. */
const BAND_SHADE = 0.62;

export function bandPaint(tone: Tone): string {
  return blend(PAINT[tone], dyedSteel.ground, BAND_SHADE);
}

/** `share` of the second colour in the first; both as #RRGGBB. */
function blend(one: string, other: string, share: number): string {
  const channel = (colour: string, at: number) => Number.parseInt(colour.slice(at, at + 2), 16);
  const mixed = [1, 3, 5].map((at) =>
    Math.round(channel(one, at) * (1 - share) + channel(other, at) * share)
      .toString(16)
      .padStart(2, "0"),
  );
  return `#${mixed.join("")}`;
}

/** A bright and a dark half together, as a share of the picture's size. */
export const BAND_PITCH = 0.03;
