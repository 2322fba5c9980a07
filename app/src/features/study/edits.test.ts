import type { Edit } from "@linkwright/contract";
import { expect, test } from "vitest";
import { startingStudy } from "../builds/startingStudy.ts";
import { addEdit, editFor, hardpointChange, inverseOf, layOver } from "./edits.ts";

const study = startingStudy("Front axle", "front");
const INNER = ["axle", "left", "tieRod", "inner"];

test("a change to the value that stands there is no edit", () => {
  expect(editFor(study, { path: ["axle", "wheelbase"], to: study.axle.wheelbase })).toBeNull();
});

test("a hardpoint whose name holds a list's index is found by number", () => {
  expect(hardpointChange(study.axle, "left.antiRollBar.axis.1", [1, 2, 3]).path).toEqual([
    "axle",
    "left",
    "antiRollBar",
    "axis",
    1,
  ]);
});

test("where the right is given in full its points are its own", () => {
  const axle = { ...study.axle, right: study.axle.left };
  expect(hardpointChange(axle, "right.tieRod.inner", [1, -2, 3])).toEqual({
    path: ["axle", "right", "tieRod", "inner"],
    to: [1, -2, 3],
  });
});

test("an edit does not join an earlier one across a change of the whole in between", () => {
  const first: Edit = { path: INNER, from: [0, 0, 0], to: [1, 1, 1] };
  const whole: Edit = { path: ["axle", "left", "tieRod"], from: null, to: {} };
  const second: Edit = { path: INNER, from: [2, 2, 2], to: [3, 3, 3] };
  expect([whole, second].reduce<Edit[]>(addEdit, [first])).toEqual([first, whole, second]);
});

test("an optional member can be given and taken away again", () => {
  const given = editFor(study, { path: ["axle", "body"], to: { massKg: 640 } });
  const withBody = layOver(study, given ? [given] : []);
  expect(withBody?.axle.body).toEqual({ massKg: 640 });
  expect(withBody && given && layOver(withBody, inverseOf(withBody, [given]))).toEqual(study);
});

test("an edit that leads nowhere any more is passed over", () => {
  const lost: Edit = { path: ["rideHeights", 4, "name"], from: "Laden", to: "Loaded" };
  expect(layOver(study, [lost])).toEqual(study);
});

test("what is no study after the edits is told as none", () => {
  expect(layOver(study, [{ path: ["axle", "wheelbase"], from: 2400, to: -1 }])).toBeNull();
});
