import { expect, test } from "vitest";
import { parseNumber } from "./parseNumber.ts";

test.each([
  ["12.5", 12.5],
  ["12,5", 12.5],
  [" -12.5 ", -12.5],
  ["−12.5", -12.5],
  ["– 3", -3],
  ["+8", 8],
  [".5", 0.5],
  ["5.", 5],
  ["277.4 mm", 277.4],
  ["1.25 in", 1.25],
  ["0.15°", 0.15],
  ["3/8", 0.375],
  ["1 3/8", 1.375],
  ["-1 3/8 in", -1.375],
])("%j is read as %d", (typed, value) => {
  expect(parseNumber(typed)).toEqual({ status: "number", value });
});

test.each(["", "   ", "-", "abc", "12abc", "1e3", "0x10", "NaN", "Infinity", "1/0", "3/", "--5"])(
  "%j is rejected with a message",
  (typed) => {
    expect(parseNumber(typed)).toMatchObject({ status: "rejected", message: expect.stringMatching(/\w/) });
  },
);

test.each(["1,234.5", "1.234,5", "1.2.3"])(
  "%j could be read in two ways, so it is asked for again",
  (typed) => {
    expect(parseNumber(typed)).toMatchObject({
      status: "rejected",
      message: expect.stringContaining("one decimal mark"),
    });
  },
);

test("minus nothing is nothing", () => {
  expect(parseNumber("-0")).toEqual({ status: "number", value: 0 });
});

test("limits hold on both sides and are told with their unit", () => {
  const limits = { min: -5, max: 5, unit: "mm" };
  expect(parseNumber("5", limits)).toEqual({ status: "number", value: 5 });
  expect(parseNumber("5.01", limits)).toEqual({ status: "rejected", message: "The most is 5 mm." });
  expect(parseNumber("-5", limits)).toEqual({ status: "number", value: -5 });
  expect(parseNumber("-5.01", limits)).toEqual({ status: "rejected", message: "The least is -5 mm." });
});
