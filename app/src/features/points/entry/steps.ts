// How far one press of a stepper goes, in the unit that is shown.

import type { LengthUnit } from "@linkwright/contract";

export interface Step {
  /** In that unit. */
  readonly size: number;
  readonly label: string;
}

const STEPS: Readonly<Record<LengthUnit, readonly Step[]>> = {
  mm: [
    { size: 0.1, label: "0.1" },
    { size: 0.5, label: "0.5" },
    { size: 1, label: "1" },
    { size: 5, label: "5" },
  ],
  inch: [
    { size: 0.005, label: "0.005" },
    { size: 1 / 64, label: "1/64" },
    { size: 1 / 32, label: "1/32" },
    { size: 1 / 16, label: "1/16" },
    { size: 1 / 4, label: "1/4" },
  ],
};
const USUAL: Readonly<Record<LengthUnit, number>> = { mm: 1, inch: 1 / 16 };

export function stepsFor(units: LengthUnit): readonly Step[] {
  return STEPS[units];
}

/** The step that was stored for this unit, or the usual one. */
export function stepFromStored(units: LengthUnit, stored: string | null): Step {
  const size = stored === null ? USUAL[units] : Number(stored);
  const found = STEPS[units].find((step) => step.size === size);
  return found ?? (STEPS[units].find((step) => step.size === USUAL[units]) as Step);
}
