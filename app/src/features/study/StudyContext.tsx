// What every screen of an open study works on.

import type { Coordinates, Issue, Path, Study } from "@linkwright/kinematics";
import { createContext, type ReactNode, useContext, useMemo } from "react";
import type { Change, EditValue } from "./edits.ts";
import type { OpenStudy } from "./state.ts";
import type { StudyHandle } from "./useOpenStudy.ts";

export interface StudyPlace {
  readonly workshopId: string;
  readonly buildId: string;
  readonly studyId: string;
}

/** The open document and the ways to change it. The functions keep their identity. */
export interface StudyDocument extends StudyPlace {
  readonly study: Study;
  /** Why the draft cannot be solved as it stands; empty when it can. */
  readonly issues: readonly Issue[];
  readonly mayEdit: boolean;
  readonly movePoint: (hardpoint: string, to: Coordinates, gesture?: string) => void;
  readonly changeValue: (path: Path, to: EditValue, gesture?: string) => void;
  /** Several values as one step of undo. */
  readonly changeValues: (changes: readonly Change[]) => void;
  readonly undo: () => void;
  readonly redo: () => void;
  readonly canUndo: boolean;
  readonly canRedo: boolean;
}

const DocumentContext = createContext<StudyDocument | null>(null);
const SavingContext = createContext<StudyHandle | null>(null);

interface ProviderProps {
  readonly place: StudyPlace;
  readonly handle: StudyHandle;
  readonly mayEdit: boolean;
  readonly children: ReactNode;
}

export function StudyProvider({ place, handle, mayEdit, children }: ProviderProps) {
  const { state, dispatch, issues } = handle;
  const { workshopId, buildId, studyId } = place;
  const actions = useMemo(
    () => ({
      movePoint: (hardpoint: string, to: Coordinates, gesture?: string) =>
        dispatch({ type: "pointMoved", hardpoint, to, ...(gesture && { gesture }) }),
      changeValue: (path: Path, to: EditValue, gesture?: string) =>
        dispatch({ type: "valueChanged", path, to, ...(gesture && { gesture }) }),
      changeValues: (changes: readonly Change[]) => dispatch({ type: "valuesChanged", changes }),
      undo: () => dispatch({ type: "undone" }),
      redo: () => dispatch({ type: "redone" }),
    }),
    [dispatch],
  );
  const { draft, past, future } = state;
  const canUndo = past.length > 0;
  const canRedo = future.length > 0;
  const value = useMemo<StudyDocument>(
    () => ({ workshopId, buildId, studyId, study: draft, issues, mayEdit, canUndo, canRedo, ...actions }),
    [workshopId, buildId, studyId, draft, issues, mayEdit, canUndo, canRedo, actions],
  );
  return (
    <DocumentContext.Provider value={value}>
      <SavingContext.Provider value={handle}>{children}</SavingContext.Provider>
    </DocumentContext.Provider>
  );
}

/** The open study. Does not render anew while a save merely comes and goes. */
export function useStudy(): StudyDocument {
  const document = useContext(DocumentContext);
  if (!document) throw new Error("useStudy needs the StudyShell above it.");
  return document;
}

/** How far the open study is saved, for the shell's own parts. */
export function useSaving(): StudyHandle & { readonly state: OpenStudy } {
  const handle = useContext(SavingContext);
  if (!handle) throw new Error("useSaving needs the StudyShell above it.");
  return handle;
}
