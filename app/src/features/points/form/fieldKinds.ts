// Numbers of the document as a person reads and types them.

import type { LengthUnit } from "@linkwright/contract";
import { formatNumber, lengthDecimals, lengthFromMm, mmFromLength, unitSymbol } from "../../../lib/format.ts";

export type FieldKind =
  | "length"
  | "angle"
  /** ° per mm in the document, ° per in where inches are read. */
  | "gradient"
  | "percent"
  /** 0 … 1 in the document, percent on screen. */
  | "share"
  | "mass"
  /** Components of a direction. */
  | "plain";

export function shownFrom(value: number, kind: FieldKind, units: LengthUnit): number {
  if (kind === "length") return lengthFromMm(value, units);
  if (kind === "gradient") return value / lengthFromMm(1, units);
  return kind === "share" ? value * 100 : value;
}

export function valueFrom(shown: number, kind: FieldKind, units: LengthUnit): number {
  if (kind === "length") return mmFromLength(shown, units);
  if (kind === "gradient") return shown * lengthFromMm(1, units);
  return kind === "share" ? shown / 100 : shown;
}

export function unitFor(kind: FieldKind, units: LengthUnit): string {
  switch (kind) {
    case "length":
      return unitSymbol(units);
    case "angle":
      return "°";
    case "gradient":
      return `°/${unitSymbol(units)}`;
    case "percent":
    case "share":
      return "%";
    case "mass":
      return "kg";
    case "plain":
      return "";
  }
}

export function decimalsFor(kind: FieldKind, units: LengthUnit): number {
  switch (kind) {
    case "length":
      return lengthDecimals(units);
    case "angle":
      return 2;
    case "gradient":
      return units === "inch" ? 3 : 4;
    case "percent":
    case "share":
      return 1;
    case "mass":
      return 0;
    case "plain":
      return 3;
  }
}

export function stepFor(kind: FieldKind, units: LengthUnit): number {
  switch (kind) {
    case "length":
      return units === "inch" ? 1 / 16 : 1;
    case "angle":
      return 0.05;
    case "gradient":
      return units === "inch" ? 0.01 : 0.001;
    case "percent":
    case "share":
    case "mass":
      return 1;
    case "plain":
      return 0.01;
  }
}

/** As it stands in a field; nothing for what is not given. */
export function textFrom(value: number | null | undefined, kind: FieldKind, units: LengthUnit): string {
  if (value === null || value === undefined) return "";
  return formatNumber(shownFrom(value, kind, units), { decimals: decimalsFor(kind, units) });
}

/** A figure and its unit stay on one line. */
export function unbroken(text: string): string {
  return text.replaceAll(" ", "\u00a0");
}

export function labelledValue(value: number | null | undefined, kind: FieldKind, units: LengthUnit): string {
  const text = textFrom(value, kind, units);
  if (text === "") return "not given";
  const unit = unitFor(kind, units);
  return unit === "°" ? `${text}°` : unbroken(`${text} ${unit}`.trim());
}
