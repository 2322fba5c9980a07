import { expect, test } from "vitest";
import { findGraduations } from "./graduations.ts";

const labelsOf = (from: number, to: number, unit: "mm" | "inch", pixelsPerMm: number) =>
  findGraduations(from, to, unit, pixelsPerMm).flatMap(({ label }) => label ?? []);

test("labels run from droop to bump with their signs, and design is bare", () => {
  expect(labelsOf(-40, 40, "mm", 2)).toEqual(["−40", "−20", "0", "+20", "+40"]);
});

test("a mark that stands on the end of the rule is kept", () => {
  const travels = findGraduations(-60, 60, "mm", 4).map(({ travel }) => travel);
  expect(travels.at(0)).toBeCloseTo(-60, 9);
  expect(travels.at(-1)).toBeCloseTo(60, 9);
});

test("a rule in inches is cut in inches", () => {
  expect(labelsOf(-25.4, 25.4, "inch", 2)).toEqual(["−1", "0", "+1"]);
  const first = findGraduations(-25.4, 25.4, "inch", 2)[0];
  expect(first?.travel).toBeCloseTo(-25.4, 9);
});

test.each([0.5, 1, 2, 4, 8])("at %d pixels per mm labels keep clear of each other", (pixelsPerMm) => {
  const labelled = findGraduations(-80, 80, "mm", pixelsPerMm).filter(({ label }) => label !== null);
  for (let at = 1; at < labelled.length; at++) {
    const gap = ((labelled[at]?.travel ?? 0) - (labelled[at - 1]?.travel ?? 0)) * pixelsPerMm;
    expect(gap).toBeGreaterThanOrEqual(30);
  }
});

test("every labelled step holds marks of all sizes when there is room", () => {
  const sizes = new Set(findGraduations(-60, 60, "mm", 4).map(({ size }) => size));
  expect(sizes).toEqual(new Set(["labelled", "half", "fine"]));
});

test("a rule without length has no marks", () => {
  expect(findGraduations(10, 10, "mm", 4)).toEqual([]);
});
