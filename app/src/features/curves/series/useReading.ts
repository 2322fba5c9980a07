import { useCallback, useMemo, useState } from "react";
import { usePreferences } from "@/features/session/index.ts";
import { readStored, writeStored } from "@/lib/storage.ts";
import type { Reading } from "./panels.ts";
import { TOE_IN_DEGREES, type ToeDisplay } from "./toeDisplay.ts";

const STORAGE_KEY = "linkwright.toe";

/** Stored as the diameter in mm; anything else means degrees. */
function storedToe(): ToeDisplay {
  const diameter = Number(readStored(STORAGE_KEY) ?? Number.NaN);
  return diameter > 0 ? { as: "length", diameter } : TOE_IN_DEGREES;
}

/** How numbers are read on the study's screens, and the way to choose how toe is told. Kept on this device. */
export function useReading() {
  const { units, words } = usePreferences();
  const [toe, setToe] = useState(storedToe);
  const reading = useMemo<Reading>(() => ({ units, words, toe }), [units, words, toe]);
  const chooseToe = useCallback((next: ToeDisplay) => {
    writeStored(STORAGE_KEY, next.as === "length" ? String(next.diameter) : "degrees");
    setToe(next);
  }, []);
  return { reading, chooseToe };
}
