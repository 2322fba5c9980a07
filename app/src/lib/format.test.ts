import { expect, test } from "vitest";
import {
  formatAngle,
  formatAngleGradient,
  formatBytes,
  formatCount,
  formatDate,
  formatDateTime,
  formatLength,
  formatLengthFigure,
  formatNumber,
  formatPercent,
  formatTravel,
  lengthFromMm,
  mmFromLength,
} from "./format.ts";

test.each([
  [12.345, 1, "12.3"],
  [-12.345, 2, "−12.35"],
  [0, 1, "0.0"],
])("%d with %d decimals is %s", (value, decimals, text) => {
  expect(formatNumber(value, { decimals })).toBe(text);
});

test("a minus is as wide as a plus, and a plus is shown only where asked for", () => {
  expect(formatNumber(3, { decimals: 0, sign: "always" })).toBe("+3");
  expect(formatNumber(-3, { decimals: 0, sign: "always" })).toBe("−3");
  expect(formatNumber(3, { decimals: 0 })).toBe("3");
});

test("what rounds to nothing bears no sign", () => {
  expect(formatNumber(-0.004, { decimals: 2 })).toBe("0.00");
  expect(formatNumber(0.004, { decimals: 2, sign: "always" })).toBe("0.00");
});

test.each([null, Number.NaN, Number.POSITIVE_INFINITY])("%s is shown as no value", (value) => {
  expect(formatNumber(value, { decimals: 1 })).toBe("–");
  expect(formatLength(value, "mm")).toBe("–");
  expect(formatAngle(value)).toBe("–");
  expect(formatPercent(value)).toBe("–");
  expect(formatAngleGradient(value, "mm")).toBe("–");
});

test("lengths are kept in mm and shown in the person's unit", () => {
  expect(formatLength(277.43, "mm")).toBe("277.4 mm");
  expect(formatLength(25.4, "inch")).toBe("1.000 in");
  expect(formatLengthFigure(-25.4, "inch", { decimals: 2, sign: "always" })).toBe("−1.00");
});

test.each([0, 1, 277.43218, -1234.5])("%d mm survives the way to inches and back", (mm) => {
  expect(mmFromLength(lengthFromMm(mm, "inch"), "inch")).toBeCloseTo(mm, 9);
});

test("travel bears its sign: bump +, droop −", () => {
  expect(formatTravel(30, "mm")).toBe("+30");
  expect(formatTravel(-25.4, "inch")).toBe("−1.00");
  expect(formatTravel(0, "mm")).toBe("0");
});

test("a gradient per mm is 25.4 times as much per inch", () => {
  expect(formatAngleGradient(0.001, "mm")).toBe("0.0010 °/mm");
  expect(formatAngleGradient(0.001, "inch")).toBe("0.025 °/in");
});

test("counts, sizes and shares read as words", () => {
  expect(formatCount(1, "study", "studies")).toBe("1 study");
  expect(formatCount(3, "study", "studies")).toBe("3 studies");
  expect(formatBytes(812)).toBe("812 bytes");
  expect(formatBytes(12_345)).toBe("12.3 kB");
  expect(formatPercent(94.4)).toBe("94 %");
});

test("a date is told in the reader's own zone", () => {
  const lateEvening = "2026-12-01T23:30:00.000Z";
  expect(formatDate(lateEvening, { timeZone: "UTC" })).toBe("1 Dec 2026");
  expect(formatDate(lateEvening, { timeZone: "Asia/Tokyo" })).toBe("2 Dec 2026");
  expect(formatDateTime(lateEvening, { timeZone: "UTC" })).toBe("1 Dec 2026, 23:30");
});
