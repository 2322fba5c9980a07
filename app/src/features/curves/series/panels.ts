// How each quantity's panel is titled, scaled and read.

import type { LengthUnit } from "@linkwright/contract";
import { capitalise, type DialectWord } from "../../../lib/dialect.ts";
import { formatAngle, formatLength, formatNumber, lengthFromMm, unitSymbol } from "../../../lib/format.ts";
import type { Quantity } from "./sweepHeight.ts";
import { formatToe, type ToeDisplay, toeShown, toeUnit } from "./toeDisplay.ts";

export interface PanelStyle {
  readonly title: string;
  readonly unitLabel: string;
  readonly minSpan: number;
  readonly include?: number;
  readonly format: (value: number | null) => string;
  readonly formatTick: (value: number) => string;
}

export interface Reading {
  readonly units: LengthUnit;
  readonly words: Readonly<Record<DialectWord, string>>;
  readonly toe: ToeDisplay;
}

/** Degrees. A flat curve has to look flat: half of this lies on either side of it. */
const LEAST_TOE_SPAN_DEG = 0.4;
const LEAST_ANGLE_SPAN_DEG = 2;
/** mm. */
const LEAST_TRACK_SPAN = 10;

export function panelStyle(quantity: Quantity, { units, words, toe }: Reading): PanelStyle {
  switch (quantity) {
    case "toe":
      return {
        title: "Toe change",
        unitLabel: toeUnit(toe, units),
        minSpan: toeShown(LEAST_TOE_SPAN_DEG, toe),
        include: 0,
        format: (value) => formatToe(value, toe, { units, sign: "always" }),
        formatTick: toe.as === "degrees" ? tick : (value) => tick(lengthFromMm(value, units)),
      };
    case "camber":
    case "caster":
      return {
        title: quantity === "camber" ? "Camber" : capitalise(words.caster),
        unitLabel: "degrees",
        minSpan: LEAST_ANGLE_SPAN_DEG,
        format: (value) => formatAngle(value),
        formatTick: tick,
      };
    case "track":
      return {
        title: "Track",
        unitLabel: unitSymbol(units),
        minSpan: LEAST_TRACK_SPAN,
        format: (value) => formatLength(value, units, units === "inch" ? { decimals: 2 } : {}),
        formatTick: (value) => tick(lengthFromMm(value, units)),
      };
  }
}

const MOST_DECIMALS = 3;

/** As many decimals as the tick has, so that 0.05 is not told as 0.1. */
function tick(value: number): string {
  let decimals = 0;
  while (decimals < MOST_DECIMALS && Math.abs(value - Number(value.toFixed(decimals))) > 1e-6) decimals += 1;
  return formatNumber(value, { decimals });
}
