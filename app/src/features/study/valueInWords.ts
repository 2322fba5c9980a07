import type { LengthUnit } from "@linkwright/contract";
import { formatLengthFigure, unitSymbol } from "@/lib/format.ts";
import type { EditValue } from "./edits.ts";

/** A value of the document for a person to compare: a point in their unit, the rest as it is written. */
export function valueInWords(value: EditValue, unit: LengthUnit): string {
  if (value === undefined) return "not there";
  if (isPoint(value)) {
    const figures = value.map((coordinate) =>
      formatLengthFigure(coordinate, unit, { decimals: unit === "inch" ? 4 : 2 }),
    );
    return `${figures.join(",  ")} ${unitSymbol(unit)}`;
  }
  return typeof value === "object" ? JSON.stringify(value) : String(value);
}

function isPoint(value: EditValue): value is [number, number, number] {
  return Array.isArray(value) && value.length === 3 && value.every((entry) => typeof entry === "number");
}
