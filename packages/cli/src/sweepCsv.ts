// A sweep as a table: one line a row, points in three columns, reasons for empty cells in the last.

import type { Sweep, SweepRow } from "@linkwright/kinematics";
import Papa from "papaparse";

const POINT_PARTS = ["x", "y", "z"];

export function sweepCsv(sweep: Sweep): string {
  const lines = sweep.rows.map(flattenRow);
  const heads = [...new Set(lines.flatMap((line) => Object.keys(line)))].filter((head) => head !== "because");
  return `${Papa.unparse(lines, { columns: [...heads, "because"], newline: "\n" })}\n`;
}

function flattenRow(row: SweepRow): Record<string, number | string | null> {
  const reasons = Object.entries(row.because).map(([field, reason]) => `${field}: ${reason}`);
  return {
    steer: row.steer,
    travel: row.travel,
    ...flattenGroup("left", row.left),
    ...flattenGroup("right", row.right),
    ...flattenGroup("axle", row.axle),
    because: reasons.join("; "),
  };
}

function flattenGroup(name: string, group: object | null): Record<string, number | null> {
  const cells: [string, number | null][] = [];
  for (const [field, value] of Object.entries(group ?? {})) {
    if (Array.isArray(value)) {
      for (const [k, part] of POINT_PARTS.entries()) cells.push([`${name}.${field}.${part}`, value[k]]);
    } else {
      cells.push([`${name}.${field}`, value]);
    }
  }
  return Object.fromEntries(cells);
}
