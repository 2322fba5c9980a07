import type { Edit } from "@linkwright/contract";
import type { Coordinates, Study } from "@linkwright/kinematics";
import { expect, test } from "vitest";
import { ApiProblem } from "../../lib/problem.ts";
import { startingStudy } from "../builds/startingStudy.ts";
import {
  documentOpened,
  hasUnsaved,
  isReadyToSave,
  type OpenStudy,
  type StudyAction,
  studyReducer,
} from "./state.ts";

const INNER = "left.tieRod.inner";
const INNER_PATH = ["axle", "left", "tieRod", "inner"];
const LOWER = "left.suspension.lowerArm.ballJoint";
const offline = new ApiProblem({ kind: "offline", title: "No connection", detail: "" });
const refused = new ApiProblem({ kind: "study_refused", title: "Not possible", detail: "" });

const study = startingStudy("Front axle", "front");
const drawnInner = study.axle.left.tieRod.inner;

function play(state: OpenStudy, ...actions: StudyAction[]): OpenStudy {
  return actions.reduce(studyReducer, state);
}

function open(): OpenStudy {
  return documentOpened(7, study, null);
}

function moveTo(to: Coordinates, hardpoint = INNER): StudyAction {
  return { type: "pointMoved", hardpoint, to };
}

function innerOf(state: OpenStudy): Coordinates {
  return state.draft.axle.left.tieRod.inner;
}

function withInner(to: Coordinates): Study {
  const { left } = study.axle;
  return { ...study, axle: { ...study.axle, left: { ...left, tieRod: { ...left.tieRod, inner: to } } } };
}

test("a study opens saved, with nothing to undo", () => {
  expect(hasUnsaved(open())).toBe(false);
  expect(open().past).toEqual([]);
});

test("moving a point changes the draft and leaves what the server has alone", () => {
  const state = play(open(), moveTo([120, 300, 231]));
  expect(innerOf(state)).toEqual([120, 300, 231]);
  expect(state.base).toBe(study);
  expect(state.pending).toEqual([{ path: INNER_PATH, from: drawnInner, to: [120, 300, 231] }]);
});

test("on a mirrored axle a right point moves its twin on the left", () => {
  expect(innerOf(play(open(), moveTo([120, -301, 231], "right.tieRod.inner")))).toEqual([120, 301, 231]);
});

test("two changes of one point are one edit, from the first value to the last", () => {
  const { pending } = play(open(), moveTo([120, 300, 231]), moveTo([120, 300, 240]));
  expect(pending).toEqual([{ path: INNER_PATH, from: drawnInner, to: [120, 300, 240] }]);
});

test("a point moved back to where it was leaves nothing to save", () => {
  expect(hasUnsaved(play(open(), moveTo([120, 300, 231]), moveTo(drawnInner)))).toBe(false);
});

test("what is not a study is not taken into the draft, and the place is told", () => {
  const state = play(open(), { type: "valueChanged", path: ["axle", "left", "wheel", "toeDeg"], to: 90 });
  expect(state.draft).toBe(study);
  expect(state.trouble).toMatchObject({
    status: "impossible",
    path: ["axle", "left", "wheel", "toeDeg"],
    value: 90,
  });
});

test("undo brings the value back and redo brings the change back", () => {
  const moved = play(open(), moveTo([120, 300, 231]));
  const undone = play(moved, { type: "undone" });
  expect(innerOf(undone)).toEqual(drawnInner);
  expect(hasUnsaved(undone)).toBe(false);
  expect(innerOf(play(undone, { type: "redone" }))).toEqual([120, 300, 231]);
});

test("undoing what has been saved is itself a change to save", () => {
  const saved = play(
    open(),
    moveTo([120, 300, 231]),
    { type: "saveStarted", id: "a" },
    { type: "editsSaved", id: "a", version: 8, draft: withInner([120, 300, 231]) },
  );
  const undone = play(saved, { type: "undone" });
  expect(undone.pending).toEqual([{ path: INNER_PATH, from: [120, 300, 231], to: drawnInner }]);
});

test("a change after an undo lets the undone go", () => {
  const state = play(open(), moveTo([120, 300, 231]), { type: "undone" }, moveTo([120, 300, 200]));
  expect(state.future).toEqual([]);
});

test("the changes of one gesture are undone together", () => {
  const held = (z: number): StudyAction => ({ ...moveTo([120, 300, z]), gesture: "hold-1" }) as StudyAction;
  const state = play(open(), held(221), held(222), held(223), { type: "undone" });
  expect(innerOf(state)).toEqual(drawnInner);
});

test("several values changed at once are one step", () => {
  const changes = [
    { path: INNER_PATH, to: [120, 300, 231] },
    { path: ["axle", "wheelbase"], to: 2500 },
  ];
  const state = play(open(), { type: "valuesChanged", changes }, { type: "undone" });
  expect(state.draft).toEqual(study);
});

test("while a save is on its way, further changes wait for the next one", () => {
  const state = play(
    open(),
    moveTo([120, 300, 231]),
    { type: "saveStarted", id: "a" },
    moveTo([120, 300, 240]),
  );
  expect(state.inFlight).toEqual({
    id: "a",
    baseVersion: 7,
    edits: [{ path: INNER_PATH, from: drawnInner, to: [120, 300, 231] }],
  });
  expect(state.pending).toEqual([{ path: INNER_PATH, from: [120, 300, 231], to: [120, 300, 240] }]);
  expect(isReadyToSave(state)).toBe(false);
});

test("an acknowledged save brings other people's changes in and keeps what was typed meanwhile", () => {
  const theirs = {
    ...withInner([120, 300, 231]),
    axle: { ...withInner([120, 300, 231]).axle, wheelbase: 2501 },
  };
  const state = play(
    open(),
    moveTo([120, 300, 231]),
    { type: "saveStarted", id: "a" },
    moveTo([0, 621, 170], LOWER),
    { type: "editsSaved", id: "a", version: 9, draft: theirs },
  );
  expect(state.version).toBe(9);
  expect(state.draft.axle.wheelbase).toBe(2501);
  expect(state.draft.axle.left.suspension.lowerArm.ballJoint).toEqual([0, 621, 170]);
  expect(isReadyToSave(state)).toBe(true);
});

test("an answer to a save that is no longer on its way changes nothing", () => {
  const state = play(open(), moveTo([120, 300, 231]));
  expect(play(state, { type: "editsSaved", id: "old", version: 9, draft: study })).toBe(state);
});

test("a save that nobody answered stays on its way, the same edits under the same id", () => {
  const sent = play(open(), moveTo([120, 300, 231]), { type: "saveStarted", id: "a" });
  const delayed = play(
    sent,
    { type: "saveDelayed", id: "a", problem: offline },
    { type: "saveDelayed", id: "a", problem: offline },
  );
  expect(delayed.inFlight).toEqual(sent.inFlight);
  expect(delayed.trouble).toMatchObject({ status: "delayed", attempt: 2 });
  expect(innerOf(delayed)).toEqual([120, 300, 231]);
});

test("refused edits stay in the draft, and the next change lets them be sent again", () => {
  const state = play(
    open(),
    moveTo([120, 300, 231]),
    { type: "saveStarted", id: "a" },
    { type: "saveRefused", id: "a", problem: refused },
  );
  expect(innerOf(state)).toEqual([120, 300, 231]);
  expect(isReadyToSave(state)).toBe(false);
  expect(isReadyToSave(play(state, moveTo([120, 300, 225])))).toBe(true);
});

function inConflict(): OpenStudy {
  const yours: Edit = { path: INNER_PATH, from: drawnInner as never, to: [120, 300, 231] };
  return play(
    open(),
    moveTo([120, 300, 231]),
    moveTo([0, 621, 170], LOWER),
    { type: "saveStarted", id: "a" },
    {
      type: "conflictArrived",
      version: 9,
      draft: withInner([120, 300, 199]),
      conflict: {
        version: 9,
        edits: [
          {
            path: yours.path,
            base: yours.from,
            theirs: [120, 300, 199],
            yours: yours.to,
            changedBy: null,
            changedAt: null,
          },
        ],
      },
    },
  );
}

test("a conflict shows both values and keeps one's own in the draft until the person chooses", () => {
  const state = inConflict();
  expect(state.trouble).toMatchObject({
    status: "conflict",
    edits: [{ path: INNER_PATH, theirs: [120, 300, 199], yours: [120, 300, 231] }],
  });
  expect(innerOf(state)).toEqual([120, 300, 231]);
  expect(isReadyToSave(state)).toBe(false);
});

test("keeping one's own sends it again on what the other person wrote", () => {
  const state = play(inConflict(), {
    type: "conflictSettled",
    choices: [{ path: INNER_PATH, keep: "mine" }],
  });
  expect(innerOf(state)).toEqual([120, 300, 231]);
  expect(state.pending).toContainEqual({ path: INNER_PATH, from: [120, 300, 199], to: [120, 300, 231] });
  expect(isReadyToSave(state)).toBe(true);
});

test("taking the other's drops one's own edit of that place and no other", () => {
  const state = play(inConflict(), {
    type: "conflictSettled",
    choices: [{ path: INNER_PATH, keep: "theirs" }],
  });
  expect(innerOf(state)).toEqual([120, 300, 199]);
  expect(state.pending.map(({ path }) => path)).toEqual([
    ["axle", "left", "suspension", "lowerArm", "ballJoint"],
  ]);
});

test("both having chosen the same value is no conflict", () => {
  const state = play(
    open(),
    moveTo([120, 300, 231]),
    { type: "saveStarted", id: "a" },
    {
      type: "conflictArrived",
      version: 9,
      draft: withInner([120, 300, 231]),
      conflict: { version: 9, edits: [] },
    },
  );
  expect(state.trouble).toBeNull();
});

test("a newer draft from the server slides under the unsaved edits", () => {
  const newer = { ...study, axle: { ...study.axle, wheelbase: 2501 } };
  const state = play(open(), moveTo([120, 300, 231]), { type: "draftRefreshed", version: 8, draft: newer });
  expect(state.draft.axle.wheelbase).toBe(2501);
  expect(innerOf(state)).toEqual([120, 300, 231]);
});

test("an older draft that comes late is passed over", () => {
  const state = open();
  expect(play(state, { type: "draftRefreshed", version: 7, draft: withInner([1, 2, 3]) })).toBe(state);
});

test("what an earlier visit left unsaved is laid over the draft when it is opened again", () => {
  const left = play(
    open(),
    moveTo([120, 300, 231]),
    { type: "saveStarted", id: "a" },
    moveTo([0, 621, 170], LOWER),
  );
  const again = documentOpened(8, study, { inFlight: left.inFlight, pending: left.pending });
  expect(innerOf(again)).toEqual([120, 300, 231]);
  expect(again.draft.axle.left.suspension.lowerArm.ballJoint).toEqual([0, 621, 170]);
  expect(again.inFlight?.id).toBe("a");
});

test("discarding goes back to what the server has", () => {
  const state = play(open(), moveTo([120, 300, 231]), { type: "unsavedDiscarded" });
  expect(state.draft).toEqual(study);
  expect(hasUnsaved(state)).toBe(false);
});

test("a draft that a save did not change keeps its identity, so that nothing is solved twice", () => {
  const moved = play(open(), moveTo([120, 300, 231]), { type: "saveStarted", id: "a" });
  const saved = play(moved, { type: "editsSaved", id: "a", version: 8, draft: structuredClone(moved.draft) });
  expect(saved.draft).toBe(moved.draft);
});
