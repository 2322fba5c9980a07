// The open study: what the server has, what has been typed on top of it, and how far that has been saved.
// Pure: ids, time, network and storage belong to useOpenStudy.

import type { DraftConflict, Edit, EditConflict } from "@linkwright/contract";
import { readAt } from "@linkwright/contract";
import type { Coordinates, Path, Study } from "@linkwright/kinematics";
import { isSameJson } from "../../lib/json.ts";
import type { ApiProblem } from "../../lib/problem.ts";
import {
  addEdits,
  type Change,
  type EditValue,
  editFor,
  hardpointChange,
  inverseOf,
  layOver,
} from "./edits.ts";

/** Edits on their way to the server. Sent again after a lost answer they are the very same, id and all. */
export interface Flight {
  readonly id: string;
  readonly baseVersion: number;
  readonly edits: readonly Edit[];
}

/** What is not yet acknowledged: kept on the device until it is. */
export interface Unsaved {
  readonly inFlight: Flight | null;
  readonly pending: readonly Edit[];
}

interface Step {
  readonly edits: readonly Edit[];
  /** Changes of one gesture, such as a held stepper, are undone together. */
  readonly gesture: string | null;
}

export type Trouble =
  /** Nothing is wrong with the edits; they are sent again. */
  | { readonly status: "delayed"; readonly problem: ApiProblem; readonly attempt: number }
  /** The server will not have them as they are. */
  | { readonly status: "refused"; readonly problem: ApiProblem }
  /** A change that would make the document none. The draft is as it was before. */
  | { readonly status: "impossible"; readonly path: Path; readonly value: EditValue }
  | { readonly status: "conflict"; readonly edits: readonly EditConflict[] };

export interface OpenStudy extends Unsaved {
  readonly base: Study;
  readonly version: number;
  /** The base with all unsaved edits laid over it: what screens show. */
  readonly draft: Study;
  readonly past: readonly Step[];
  readonly future: readonly Step[];
  readonly trouble: Trouble | null;
}

export type StudyAction =
  | {
      readonly type: "pointMoved";
      readonly hardpoint: string;
      readonly to: Coordinates;
      readonly gesture?: string;
    }
  | { readonly type: "valueChanged"; readonly path: Path; readonly to: EditValue; readonly gesture?: string }
  | { readonly type: "valuesChanged"; readonly changes: readonly Change[]; readonly gesture?: string }
  | { readonly type: "undone" }
  | { readonly type: "redone" }
  | { readonly type: "saveStarted"; readonly id: string }
  | { readonly type: "editsSaved"; readonly id: string; readonly version: number; readonly draft: Study }
  | { readonly type: "saveDelayed"; readonly id: string; readonly problem: ApiProblem }
  | { readonly type: "saveRefused"; readonly id: string; readonly problem: ApiProblem }
  | {
      readonly type: "conflictArrived";
      readonly conflict: DraftConflict;
      readonly version: number;
      readonly draft: Study;
    }
  | { readonly type: "conflictSettled"; readonly choices: readonly ConflictChoice[] }
  | { readonly type: "draftRefreshed"; readonly version: number; readonly draft: Study }
  | { readonly type: "unsavedDiscarded" };

export interface ConflictChoice {
  readonly path: Path;
  readonly keep: "mine" | "theirs";
}

/** The most steps that can be undone; older ones are let go. */
const LONGEST_PAST = 200;

/** A study as it was opened, with what an earlier visit left unsaved laid over it. */
export function documentOpened(version: number, draft: Study, kept: Unsaved | null): OpenStudy {
  const unsaved = kept ?? { inFlight: null, pending: [] };
  const opened: OpenStudy = { ...unsaved, base: draft, version, draft, past: [], future: [], trouble: null };
  return rebased(opened, draft, version);
}

export function studyReducer(state: OpenStudy, action: StudyAction): OpenStudy {
  switch (action.type) {
    case "pointMoved":
      return changed(state, [hardpointChange(state.draft.axle, action.hardpoint, action.to)], action.gesture);
    case "valueChanged":
      return changed(state, [{ path: action.path, to: action.to }], action.gesture);
    case "valuesChanged":
      return changed(state, action.changes, action.gesture);
    case "undone":
      return undone(state);
    case "redone":
      return redone(state);
    case "saveStarted":
      return saveStarted(state, action.id);
    case "editsSaved":
      if (state.inFlight?.id !== action.id) return state;
      return rebased({ ...state, inFlight: null, trouble: null }, action.draft, action.version);
    case "saveDelayed":
      if (state.inFlight?.id !== action.id) return state;
      return {
        ...state,
        trouble: { status: "delayed", problem: action.problem, attempt: attemptsOf(state) + 1 },
      };
    case "saveRefused":
      if (state.inFlight?.id !== action.id) return state;
      return { ...withFlightReturned(state), trouble: { status: "refused", problem: action.problem } };
    case "conflictArrived":
      return conflictArrived(state, action.conflict, action.draft, action.version);
    case "conflictSettled":
      return conflictSettled(state, action.choices);
    case "draftRefreshed":
      if (state.inFlight || action.version <= state.version) return state;
      return rebased(state, action.draft, action.version);
    case "unsavedDiscarded":
      return {
        ...state,
        inFlight: null,
        pending: [],
        draft: state.base,
        past: [],
        future: [],
        trouble: null,
      };
  }
}

export function hasUnsaved({ inFlight, pending }: Unsaved): boolean {
  return inFlight !== null || pending.length > 0;
}

/** Edits to send, and nothing in the way of sending them. */
export function isReadyToSave({ inFlight, pending, trouble }: OpenStudy): boolean {
  return pending.length > 0 && inFlight === null && (trouble === null || trouble.status === "impossible");
}

function attemptsOf({ trouble }: OpenStudy): number {
  return trouble?.status === "delayed" ? trouble.attempt : 0;
}

/** A new base under the unsaved edits. The draft keeps its identity when nothing in it changes. */
function rebased(state: OpenStudy, base: Study, version: number): OpenStudy {
  const unsaved = [...(state.inFlight?.edits ?? []), ...state.pending];
  const laid = layOver(base, unsaved) ?? base;
  return { ...state, base, version, draft: isSameJson(laid, state.draft) ? state.draft : laid };
}

/** A change by the person clears a refusal: what was refused may be mended by it. */
function troubleAfterChange({ trouble }: OpenStudy): Trouble | null {
  return trouble?.status === "refused" || trouble?.status === "impossible" ? null : trouble;
}

function changed(state: OpenStudy, changes: readonly Change[], gesture: string | undefined): OpenStudy {
  let draft = state.draft;
  const edits: Edit[] = [];
  for (const change of changes) {
    const edit = editFor(draft, change);
    if (edit === null) continue;
    const next = layOver(draft, [edit]);
    if (next === null)
      return { ...state, trouble: { status: "impossible", path: change.path, value: change.to } };
    edits.push(edit);
    draft = next;
  }
  if (edits.length === 0) return { ...state, trouble: troubleAfterChange(state) };
  return {
    ...state,
    draft,
    pending: addEdits(state.pending, edits),
    past: withStep(state.past, edits, gesture ?? null),
    future: [],
    trouble: troubleAfterChange(state),
  };
}

function withStep(past: readonly Step[], edits: readonly Edit[], gesture: string | null): Step[] {
  const last = past.at(-1);
  if (last && gesture !== null && last.gesture === gesture) {
    return [...past.slice(0, -1), { edits: addEdits(last.edits, edits), gesture }];
  }
  return [...past, { edits, gesture }].slice(-LONGEST_PAST);
}

function undone(state: OpenStudy): OpenStudy {
  const step = state.past.at(-1);
  if (!step) return state;
  const retraced = retrace(state, inverseOf(state.draft, step.edits));
  return { ...retraced, past: state.past.slice(0, -1), future: [...state.future, step] };
}

function redone(state: OpenStudy): OpenStudy {
  const step = state.future.at(-1);
  if (!step) return state;
  const edits = step.edits.map((edit) => ({ ...edit, from: readAt(state.draft, edit.path) }));
  const retraced = retrace(state, edits);
  return { ...retraced, past: [...state.past, step], future: state.future.slice(0, -1) };
}

/** A step that leads nowhere any more, because others changed what it was about, is passed over. */
function retrace(state: OpenStudy, edits: readonly Edit[]): OpenStudy {
  const draft = layOver(state.draft, edits);
  if (draft === null) return state;
  return { ...state, draft, pending: addEdits(state.pending, edits), trouble: troubleAfterChange(state) };
}

function saveStarted(state: OpenStudy, id: string): OpenStudy {
  if (!isReadyToSave(state)) return state;
  return {
    ...state,
    inFlight: { id, baseVersion: state.version, edits: state.pending },
    pending: [],
    trouble: null,
  };
}

function withFlightReturned(state: OpenStudy): OpenStudy {
  return { ...state, inFlight: null, pending: addEdits(state.inFlight?.edits ?? [], state.pending) };
}

function conflictArrived(state: OpenStudy, conflict: DraftConflict, base: Study, version: number): OpenStudy {
  const returned = rebased(withFlightReturned(state), base, version);
  const edits = returned.pending.flatMap((edit): EditConflict[] => {
    const told = conflict.edits.find(({ path }) => isSameJson(path, edit.path));
    const theirs = readAt(base, edit.path);
    if (isSameJson(theirs, edit.to) || (!told && isSameJson(theirs, edit.from))) return [];
    const { changedBy = null, changedAt = null } = told ?? {};
    return [{ path: edit.path, base: edit.from, theirs, yours: edit.to, changedBy, changedAt }];
  });
  return { ...returned, trouble: edits.length > 0 ? { status: "conflict", edits } : null };
}

function conflictSettled(state: OpenStudy, choices: readonly ConflictChoice[]): OpenStudy {
  const pending = state.pending.flatMap((edit): Edit[] => {
    const choice = choices.find(({ path }) => isSameJson(path, edit.path));
    if (!choice) return [edit];
    return choice.keep === "theirs" ? [] : [{ ...edit, from: readAt(state.base, edit.path) }];
  });
  return rebased({ ...state, pending, trouble: null }, state.base, state.version);
}
