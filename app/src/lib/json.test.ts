import { expect, test } from "vitest";
import { isSameJson } from "./json.ts";

test.each([
  [1, 1],
  [null, null],
  [
    [1, 2, 3],
    [1, 2, 3],
  ],
  [
    { a: 1, b: [2] },
    { b: [2], a: 1 },
  ],
])("%j says the same as %j", (a, b) => {
  expect(isSameJson(a, b)).toBe(true);
});

test.each([
  [1, "1"],
  [null, undefined],
  [null, {}],
  [[], {}],
  [
    [1, 2],
    [2, 1],
  ],
  [[1], [1, 2]],
  [{ a: 1 }, { a: 1, b: undefined }],
  [{ a: 1 }, { b: 1 }],
])("%j does not say the same as %j", (a, b) => {
  expect(isSameJson(a, b)).toBe(false);
});
