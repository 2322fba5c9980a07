import { expect, test } from "vitest";
import { assertNever, invariant } from "./invariant.ts";

test("a broken invariant throws with the values that show it", () => {
  expect(() => invariant(1 + 1 === 3, "the sum was 2")).toThrow("Invariant broken: the sum was 2");
});

test("an invariant that holds says nothing", () => {
  expect(() => invariant(true, "never told")).not.toThrow();
});

test("a union's unknown member throws and is shown", () => {
  expect(() => assertNever({ type: "sledge" } as never)).toThrow('{"type":"sledge"}');
});
