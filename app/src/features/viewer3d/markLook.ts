/** The punch mark, in pixels on the screen. */
export const MARK = {
  diameter: 15,
  ringRadius: 6.6,
  ringWidth: 1.5,
  dotRadius: 2,
  chosenDiameter: 26,
} as const;

export const LABEL = { sizePx: 13, belowPx: 13 } as const;
