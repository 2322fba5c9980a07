import type { Path } from "@linkwright/kinematics";
import { createContext, type ReactNode, useCallback, useContext, useMemo, useRef, useState } from "react";
import { type Change, type EditValue, useStudy } from "@/features/study/index.ts";
import { attempt, type Kept, withoutKept } from "./attempt.ts";
import { NO_GESTURE, nextGesture } from "./gesture.ts";

export interface Entry {
  readonly kept: readonly Kept[];
  /** Puts a value into the drawing at once, or keeps it with the reason why it cannot be built. */
  readonly enter: (path: Path, to: EditValue, field: string) => void;
  readonly putBack: (path: Path) => void;
}

const EntryContext = createContext<Entry | null>(null);

/** Stands above the screens of a study, so that what is kept outlives a tab. */
export function EntryProvider({ children }: { children: ReactNode }) {
  const { study, changeValue, changeValues } = useStudy();
  const [kept, setKept] = useState<readonly Kept[]>([]);
  const gesture = useRef(NO_GESTURE);
  // Read when a value is entered, so that `enter` keeps its identity and fields need not render anew.
  const latest = useRef({ study, kept });
  latest.current = { study, kept };

  const enter = useCallback(
    (path: Path, to: EditValue, field: string) => {
      const change: Change = { path, to };
      const tried = attempt(latest.current.study, latest.current.kept, change, field);
      setKept(tried.kept);
      const [only, ...more] = tried.changes;
      if (only === undefined) return;
      if (more.length > 0) return changeValues(tried.changes);
      gesture.current = nextGesture(gesture.current, field, performance.now());
      changeValue(only.path, only.to, gesture.current.id);
    },
    [changeValue, changeValues],
  );
  const putBack = useCallback((path: Path) => setKept((last) => withoutKept(last, path)), []);
  const entry = useMemo(() => ({ kept, enter, putBack }), [kept, enter, putBack]);
  return <EntryContext.Provider value={entry}>{children}</EntryContext.Provider>;
}

export function useEntry(): Entry {
  const entry = useContext(EntryContext);
  if (!entry) throw new Error("Values are entered below an EntryProvider.");
  return entry;
}
