// Where the marks of the steel rule stand, in either unit. Travel is mm throughout; only the marks are cut in inches.

import type { LengthUnit } from "@linkwright/contract";
import { formatNumber, lengthFromMm, mmFromLength } from "../../lib/format.ts";

export interface Graduation {
  readonly travel: number;
  readonly size: "labelled" | "half" | "fine";
  /** Only where `size` is "labelled". */
  readonly label: string | null;
}

interface Cut {
  /** Between labels, in the shown unit. */
  readonly label: number;
  /** How many half and fine marks one label step is divided into. */
  readonly halves: number;
  readonly fines: number;
  readonly decimals: number;
}

const MM_CUTS: readonly Cut[] = [
  { label: 5, halves: 1, fines: 5, decimals: 0 },
  { label: 10, halves: 2, fines: 10, decimals: 0 },
  { label: 20, halves: 2, fines: 10, decimals: 0 },
  { label: 50, halves: 5, fines: 25, decimals: 0 },
  { label: 100, halves: 2, fines: 10, decimals: 0 },
];
const INCH_CUTS: readonly Cut[] = [
  { label: 0.25, halves: 1, fines: 5, decimals: 2 },
  { label: 0.5, halves: 1, fines: 10, decimals: 1 },
  { label: 1, halves: 2, fines: 10, decimals: 0 },
  { label: 2, halves: 2, fines: 8, decimals: 0 },
];

/** Pixels: closer than this, labels would touch and fine marks would grey the rule. */
const LEAST_LABEL_GAP = 30;
const LEAST_FINE_GAP = 3.2;

export function findGraduations(
  from: number,
  to: number,
  unit: LengthUnit,
  pixelsPerMm: number,
): Graduation[] {
  const cuts = unit === "inch" ? INCH_CUTS : MM_CUTS;
  const pixelsPerUnit = pixelsPerMm * mmFromLength(1, unit);
  const cut = cuts.find(({ label }) => label * pixelsPerUnit >= LEAST_LABEL_GAP) ?? cuts[cuts.length - 1];
  if (cut === undefined || from >= to) return [];
  const fines = (cut.label / cut.fines) * pixelsPerUnit >= LEAST_FINE_GAP ? cut.fines : cut.halves;
  const step = cut.label / fines;
  // A hair of room, so that an end that stands on a mark keeps it.
  const first = Math.ceil(lengthFromMm(from, unit) / step - 1e-6);
  const last = Math.floor(lengthFromMm(to, unit) / step + 1e-6);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, at) =>
    graduationAt(first + at, cut, fines, unit),
  );
}

function graduationAt(index: number, cut: Cut, fines: number, unit: LengthUnit): Graduation {
  const shown = (index * cut.label) / fines;
  const travel = mmFromLength(shown, unit);
  if (index % fines === 0) {
    return {
      travel,
      size: "labelled",
      label: formatNumber(shown, { decimals: cut.decimals, sign: "always" }),
    };
  }
  return { travel, size: (index * cut.halves) % fines === 0 ? "half" : "fine", label: null };
}
