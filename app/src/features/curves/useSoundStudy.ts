import type { Study } from "@linkwright/kinematics";
import { useRef } from "react";
import { useStudy } from "@/features/study/index.ts";
import { isSameJson } from "@/lib/json.ts";

/** The same value as last time while it says the same, so that what is solved from it is solved once. */
export function useSameWhileEqual<Value>(value: Value): Value {
  const last = useRef(value);
  if (!isSameJson(last.current, value)) last.current = value;
  return last.current;
}

export interface SoundStudy {
  /** The last draft that can be built; null when none was since the study was opened. */
  readonly study: Study | null;
  /** False while the draft itself cannot be built. */
  readonly isCurrent: boolean;
}

/** What curves and pictures are solved from: the engine is never asked about a linkage that cannot be. */
export function useSoundStudy(): SoundStudy {
  const { study, issues } = useStudy();
  const last = useRef<Study | null>(null);
  const isCurrent = issues.length === 0;
  if (isCurrent) last.current = study;
  return { study: last.current, isCurrent };
}
