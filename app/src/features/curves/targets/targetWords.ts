// Targets and verdicts as text. Bounds are told in the reader's units; what is outside says by how much.

import type { LengthUnit } from "@linkwright/contract";
import type { Target, TargetQuantity } from "@linkwright/kinematics";
import { capitalise, type DialectWord } from "../../../lib/dialect.ts";
import {
  formatAngle,
  formatAngleGradient,
  formatLength,
  formatPercent,
  NO_VALUE,
  unitSymbol,
} from "../../../lib/format.ts";
import type { Judgement } from "./judge.ts";

type Words = Readonly<Record<DialectWord, string>>;

export function quantityName(quantity: TargetQuantity, words: Words): string {
  return capitalise(NAMES[quantity](words));
}

const NAMES: Readonly<Record<TargetQuantity, (words: Words) => string>> = {
  bumpSteerDeg: () => "bump steer in the band",
  camberDeg: () => "camber",
  camberChangeDegPerMm: () => "camber change",
  casterDeg: ({ caster }) => caster,
  kingpinInclinationDeg: () => "kingpin inclination",
  casterTrail: ({ caster }) => `${caster} trail`,
  scrubRadius: () => "scrub radius",
  rollCentreHeight: () => "roll centre height",
  track: () => "track",
  ackermannPercent: () => "Ackermann at full lock",
};

export type QuantityKind = "angle" | "gradient" | "length" | "percent";

export const QUANTITY_KIND: Readonly<Record<TargetQuantity, QuantityKind>> = {
  bumpSteerDeg: "angle",
  camberDeg: "angle",
  camberChangeDegPerMm: "gradient",
  casterDeg: "angle",
  kingpinInclinationDeg: "angle",
  casterTrail: "length",
  scrubRadius: "length",
  rollCentreHeight: "length",
  track: "length",
  ackermannPercent: "percent",
};

export function formatQuantity(quantity: TargetQuantity, value: number | null, units: LengthUnit): string {
  switch (QUANTITY_KIND[quantity]) {
    case "angle":
      return formatAngle(value, { decimals: quantity === "bumpSteerDeg" ? 3 : 2 });
    case "gradient":
      return formatAngleGradient(value, units);
    case "length":
      return formatLength(value, units);
    case "percent":
      return formatPercent(value);
  }
}

export function quantityUnit(quantity: TargetQuantity, units: LengthUnit): string {
  switch (QUANTITY_KIND[quantity]) {
    case "angle":
      return "°";
    case "gradient":
      return `°/${unitSymbol(units)}`;
    case "length":
      return unitSymbol(units);
    case "percent":
      return "%";
  }
}

/** "±0.15°", "4.50° to 5.50°", "at least 30 %". */
export function boundsInWords({ quantity, min, max }: Target, units: LengthUnit): string {
  const text = (value: number) => formatBound(quantity, value, units);
  if (min !== null && max !== null)
    return min === -max ? `±${text(max)}` : rangeInWords(text(min), text(max));
  if (min !== null) return `at least ${text(min)}`;
  return max === null ? NO_VALUE : `at most ${text(max)}`;
}

/** A unit that stands apart from its figure is told once. */
function rangeInWords(least: string, most: string): string {
  return `${least.split(" ")[0]} to ${most}`;
}

function formatBound(quantity: TargetQuantity, value: number, units: LengthUnit): string {
  return QUANTITY_KIND[quantity] === "angle"
    ? formatAngle(value, { decimals: 2 })
    : formatQuantity(quantity, value, units);
}

/** "inside ±0.05°", "outside by 0.07°": the sign beside it says the same by its shape. */
export function verdictInWords(judgement: Judgement, units: LengthUnit): string {
  const { target, verdict, by } = judgement;
  switch (verdict) {
    case "inside": {
      const isOpen = target.min === null || target.max === null;
      return `inside${isOpen ? ":" : ""} ${boundsInWords(target, units)}`;
    }
    case "below":
    case "above": {
      const isBand = target.quantity === "bumpSteerDeg";
      return `${isBand ? "outside" : verdict} by ${formatQuantity(target.quantity, by, units)}`;
    }
    case "unknown":
      return "cannot be judged";
  }
}
