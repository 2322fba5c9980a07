import type { LengthUnit } from "@linkwright/contract";
import { useCallback, useState } from "react";
import { readStored, writeStored } from "@/lib/storage.ts";
import { type Step, stepFromStored } from "./steps.ts";

/** The chosen step, kept on this device for each unit. */
export function useStep(units: LengthUnit) {
  const key = `linkwright.step.${units}`;
  const [step, setStep] = useState(() => stepFromStored(units, readStored(key)));
  const choose = useCallback(
    (next: Step) => {
      writeStored(key, String(next.size));
      setStep(next);
    },
    [key],
  );
  return [step, choose] as const;
}
