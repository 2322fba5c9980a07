import type { StudyAnswer } from "@linkwright/contract";
import { checkStudy, type Issue } from "@linkwright/kinematics";
import { type Dispatch, useEffect, useMemo, useReducer, useState } from "react";
import { documentOpened, hasUnsaved, type OpenStudy, type StudyAction, studyReducer } from "./state.ts";
import { keepUnsaved, readUnsaved } from "./unsavedStorage.ts";
import { useAutosave } from "./useAutosave.ts";

interface OpenStudyOptions {
  readonly workshopId: string;
  readonly personId: string;
  /** As last loaded; a newer one slides under what is unsaved. */
  readonly loaded: StudyAnswer;
}

export interface StudyHandle {
  readonly state: OpenStudy;
  readonly dispatch: Dispatch<StudyAction>;
  /** Why the draft is impossible as it stands; empty when it can be solved. */
  readonly issues: readonly Issue[];
  /** False when this device keeps nothing: what is unsaved would go with the tab. */
  readonly isKeptOnDevice: boolean;
}

export function useOpenStudy({ workshopId, personId, loaded }: OpenStudyOptions): StudyHandle {
  const studyId = loaded.id;
  const [state, dispatch] = useReducer(studyReducer, null, () =>
    documentOpened(loaded.version, loaded.draft, readUnsaved(personId, studyId)),
  );
  const { draft, inFlight, pending } = state;

  useEffect(
    () => dispatch({ type: "draftRefreshed", version: loaded.version, draft: loaded.draft }),
    [loaded.version, loaded.draft],
  );

  const [isKeptOnDevice, setIsKeptOnDevice] = useState(true);
  useEffect(
    () => setIsKeptOnDevice(keepUnsaved(personId, studyId, { inFlight, pending })),
    [personId, studyId, inFlight, pending],
  );

  const issues = useMemo(() => checkStudy(draft), [draft]);
  useAutosave({ workshopId, personId, studyId, state, dispatch, isSound: issues.length === 0 });
  useLeaveWarning(hasUnsaved({ inFlight, pending }) && !isKeptOnDevice);

  return { state, dispatch, issues, isKeptOnDevice };
}

/** Only where the device keeps nothing; else what is unsaved is there again when the study is opened next. */
function useLeaveWarning(isNeeded: boolean): void {
  useEffect(() => {
    if (!isNeeded) return;
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener("beforeunload", warn);
    return () => window.removeEventListener("beforeunload", warn);
  }, [isNeeded]);
}
