import type { Study } from "@linkwright/kinematics";
import { expect, test } from "vitest";
import { unequalSides } from "../../../../../tests/helpers/axles.ts";
import { workedAxle } from "../../../../../tests/helpers/workedAxle.ts";
import { attempt, keptAt, withoutKept } from "./attempt.ts";
import { NO_GESTURE, nextGesture } from "./gesture.ts";
import { drawnSide, editPathOf, listedPoint, pointGroups, withCoordinate } from "./rows.ts";
import { stepFromStored } from "./steps.ts";
import { isUntyped } from "./untyped.ts";

const study: Study = {
  format: "linkwright.study/1",
  axle: workedAxle,
  rideHeights: [{ name: "Road", wheelUp: 0, rakeDeg: 0, band: [-50, 50] }],
  targets: [],
  datum: null,
  tolerances: [],
  pointNotes: [],
  locks: [],
  parts: [],
  shims: [],
};
const inner = editPathOf("left.tieRod.inner");
const outer = editPathOf("left.tieRod.outer");

test("a value that can be built goes in at once", () => {
  const change = { path: inner, to: [128, 275, 220] };
  expect(attempt(study, [], change, "z")).toEqual({ changes: [change], kept: [] });
});

test("a value that cannot is kept as typed, with the reason and what to do", () => {
  const change = { path: inner, to: [128, 275, 21400] };
  const { changes, kept } = attempt(study, [], change, "z");
  expect(changes).toEqual([]);
  expect(kept).toMatchObject([{ change, field: "z" }]);
  expect(kept[0]?.issue.problem).toContain("21.4 m");
  expect(kept[0]?.issue.hint).toContain("mm");
});

test("the shape of the document is minded too", () => {
  const { kept } = attempt(study, [], { path: ["axle", "left", "wheel", "toeDeg"], to: 90 }, "toe");
  expect(kept).toHaveLength(1);
});

test("what is kept goes in with the change that makes it possible", () => {
  const onOuter = { path: inner, to: [116, 589, 219] };
  const { kept } = attempt(study, [], onOuter, "x");
  expect(kept).toHaveLength(1);
  const away = { path: outer, to: [116, 620, 219] };
  expect(attempt(study, kept, away, "y")).toEqual({ changes: [onOuter, away], kept: [] });
});

test("a change that helps nothing goes in by itself and leaves the rest kept", () => {
  const far = { path: inner, to: [128, 275, 21400] };
  const { kept } = attempt(study, [], far, "z");
  const other = { path: outer, to: [116, 590, 219] };
  expect(attempt(study, kept, other, "y")).toEqual({ changes: [other], kept });
});

test("a place is kept but once, and can be put back", () => {
  const first = attempt(study, [], { path: inner, to: [128, 275, 21400] }, "z").kept;
  const second = attempt(study, first, { path: inner, to: [128, 275, 9000] }, "z").kept;
  expect(second).toHaveLength(1);
  expect(keptAt(second, inner)?.change.to).toEqual([128, 275, 9000]);
  expect(withoutKept(second, inner)).toEqual([]);
});

test("a mirrored right side lists the left's points; an own one its own", () => {
  expect(drawnSide(workedAxle, "right")).toBe("left");
  expect(drawnSide(unequalSides, "right")).toBe("right");
  expect(listedPoint(workedAxle, "right.tieRod.inner")).toBe("left.tieRod.inner");
  expect(listedPoint(unequalSides, "right.tieRod.inner")).toBe("right.tieRod.inner");
});

test("rows come part by part, with what is kept laid over what is drawn", () => {
  const { kept } = attempt(study, [], { path: inner, to: [128, 275, 21400] }, "z");
  const groups = pointGroups(workedAxle, "left", kept);
  expect(groups.map(({ group }) => group)).toEqual(["Lower arm", "Upper arm", "Tie rod", "Wheel", "Spring"]);
  const row = groups[2]?.rows[0];
  expect(row?.point).toEqual([128, 275, 214]);
  expect(row?.shown).toEqual([128, 275, 21400]);
});

test("one coordinate changes and the others stay", () => {
  expect(withCoordinate([1, 2, 3], 1, 9)).toEqual([1, 9, 3]);
});

test("presses close together are one gesture; a pause or another field begins a new one", () => {
  const first = nextGesture(NO_GESTURE, "z", 1000);
  const second = nextGesture(first, "z", 1500);
  expect(second.id).toBe(first.id);
  expect(nextGesture(second, "z", 2600).id).not.toBe(first.id);
  expect(nextGesture(second, "y", 1600).id).not.toBe(first.id);
});

test("a stored step counts only where the unit has it", () => {
  expect(stepFromStored("mm", "0.5").size).toBe(0.5);
  expect(stepFromStored("mm", "0.3").size).toBe(1);
  expect(stepFromStored("inch", null).label).toBe("1/16");
  expect(stepFromStored("inch", String(1 / 64)).label).toBe("1/64");
});

test("a field that shows its value rounded counts as untyped", () => {
  expect(isUntyped("275.0", 275.04)).toBe(true);
  expect(isUntyped("275.0", 275.2)).toBe(false);
  expect(isUntyped("−12.5", -12.5)).toBe(true);
  expect(isUntyped("", 0)).toBe(false);
});
