import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { applyEdits, type Edit, isWithin, readAt } from "./edits.ts";

const document = {
  name: "Axle",
  left: { tieRod: { inner: [1, 2, 3], outer: [4, 5, 6] }, spring: { on: "lowerArm" } },
  heights: [
    { name: "Road", band: [-50, 50] },
    { name: "Track", band: [-40, 40] },
  ],
};

const apply = (...edits: Edit[]) => applyEdits(document, edits);

describe("reading", () => {
  test.each<[(string | number)[], unknown]>([
    [[], document],
    [
      ["left", "tieRod", "inner"],
      [1, 2, 3],
    ],
    [["heights", 1, "name"], "Track"],
    [["heights", 2], undefined],
    [["left", "wheel", "rim"], undefined],
    [["name", "length"], undefined],
    [["constructor"], undefined],
    [["__proto__", "toString"], undefined],
  ])("%j", (path, value) => {
    expect(readAt(document, path)).toEqual(value);
  });
});

describe("applying", () => {
  test("changes what is named and leaves the document that was given alone", () => {
    const before = structuredClone(document);
    const applied = apply(
      { path: ["left", "tieRod", "inner"], to: [7, 8, 9] },
      { path: ["left", "spring"], from: document.left.spring },
      { path: ["left", "wheel"], to: { centre: [0, 0, 0] } },
    );
    expect(applied).toEqual({
      ok: true,
      value: {
        ...document,
        left: { tieRod: { inner: [7, 8, 9], outer: [4, 5, 6] }, wheel: { centre: [0, 0, 0] } },
      },
    });
    expect(document).toEqual(before);
  });

  test("an edit may build on the one before it", () => {
    const applied = apply(
      { path: ["left", "wheel"], to: { centre: [0, 0, 0] } },
      { path: ["left", "wheel", "centre"], to: [1, 1, 1] },
    );
    expect(applied.ok && readAt(applied.value, ["left", "wheel"])).toEqual({ centre: [1, 1, 1] });
  });

  test("tells of every edit that leads nowhere, and then changes nothing", () => {
    const paths = [
      ["left", "tieRod", "inner", 2],
      ["heights", 0, "band", 1],
      ["nothing", "there"],
      ["heights", 2],
    ];
    const applied = apply(...paths.map((path) => ({ path, to: 1 })), { path: ["name"], to: "B" });
    expect(applied.ok).toBe(false);
    expect(!applied.ok && applied.issues.map(({ path }) => path)).toEqual(paths);
  });

  test("no path reaches a prototype", () => {
    const applied = apply(
      { path: ["__proto__"], to: { polluted: true } },
      { path: ["left", "constructor"], to: {} },
    );
    expect(({} as Record<string, unknown>).polluted).toBeUndefined();
    expect(applied.ok && Object.getPrototypeOf(applied.value)).toBe(Object.prototype);
    expect(applied.ok && Object.hasOwn(applied.value as object, "__proto__")).toBe(true);
  });

  test("and back again is where one began", () => {
    const member = fc.constantFrom("name", "left", "right", "spring", "other");
    const path = fc.array(fc.oneof(member, fc.nat(2)), { minLength: 1, maxLength: 4 });
    const edit = fc.record({ path, to: fc.option(fc.jsonValue({ maxDepth: 2 }), { nil: undefined }) });
    fc.assert(
      fc.property(fc.array(edit, { maxLength: 6 }), (edits) => {
        let value: unknown = document;
        const done: Edit[] = [];
        for (const { path: at, to } of edits as Edit[]) {
          const applied = applyEdits(value, [{ path: at, to }]);
          if (!applied.ok) continue;
          done.unshift({ path: at, to: readAt(value, at) });
          value = applied.value;
        }
        const back = applyEdits(value, done);
        expect(back).toEqual({ ok: true, value: document });
      }),
      { seed: 20_261_201, numRuns: 500 },
    );
  });
});

test.each<[(string | number)[], (string | number)[], boolean]>([
  [["a", 0, "b"], ["a", 0], true],
  [["a", 0], ["a", 0], true],
  [["a", 0], ["a", 0, "b"], false],
  [["a", 0], ["a", 1], false],
  [["a", "0"], ["a", 0], false],
  [["a"], [], true],
])("%j within %j is %s", (path, ancestor, expected) => {
  expect(isWithin(path, ancestor)).toBe(expected);
});
