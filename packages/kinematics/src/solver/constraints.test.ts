import { describe, expect, test } from "vitest";
import type { ConstraintRow, Drive } from "../geometry/rows.ts";
import { compileSystem, equationIndex, getValue, setValue } from "./constraints.ts";

const rod = (name: string, length = 300): ConstraintRow => ({
  kind: "distance",
  name,
  bodyPoint: [0, 300, 0],
  knucklePoint: [0, 600, 0],
  length,
});
const line: ConstraintRow = {
  kind: "pointOnLine",
  name: "strut",
  bodyPoint: [0, 500, 800],
  linePoint: [0, 600, 200],
  lineDirection: [0, -1, 6],
};
const height: Drive = {
  kind: "drivenPoint",
  name: "height",
  point: [0, 650, 300],
  direction: [0, 0, 1],
  value: 300,
};
const toe: Drive = {
  kind: "drivenDirection",
  name: "toe",
  direction: [0, 1, 0],
  along: [1, 0, 0],
  value: 0.25,
};

test("a line counts for two equations and a rod for one", () => {
  const system = compileSystem([rod("a"), line, rod("b")], [height, toe]);
  expect(system.names).toEqual(["a", "strut", "strut", "b", "height", "toe"]);
  expect(equationIndex(system, "strut")).toBe(1);
});

test("a value is read back as it was set, of a length, a height and a direction alike", () => {
  const system = compileSystem([rod("a"), line, rod("b")], [height, toe]);
  const read = (name: string) => getValue(system, equationIndex(system, name));
  expect([read("a"), read("height"), read("toe")]).toEqual([300, 300, 0.25]);
  for (const [name, value] of [["a", 301.5] as const, ["height", 280] as const, ["toe", -0.125] as const]) {
    setValue(system, equationIndex(system, name), value);
    expect(read(name)).toBe(value);
  }
});

describe("a program's mistake is told at once", () => {
  test("too few equations", () => {
    expect(() => compileSystem([rod("a"), line, rod("b")], [height])).toThrow("needs 6 equations, got 5");
  });

  test("too many equations", () => {
    expect(() => compileSystem([rod("a"), line, rod("b"), rod("c")], [height, toe])).toThrow("got 7");
  });

  test("a link of no length", () => {
    expect(() => compileSystem([rod("a", 0), line, rod("b")], [height, toe])).toThrow("link a has length 0");
  });

  test("a line of no direction", () => {
    const pointless: ConstraintRow = { ...line, lineDirection: [0, 0, 0] };
    expect(() => compileSystem([rod("a"), pointless, rod("b")], [height, toe])).toThrow("line strut");
  });

  test("a name that no equation bears", () => {
    const system = compileSystem([rod("a"), line, rod("b")], [height, toe]);
    expect(() => equationIndex(system, "sway bar")).toThrow("no equation is called sway bar");
  });
});
