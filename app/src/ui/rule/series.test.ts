import { expect, test } from "vitest";
import { findValueAt, type TravelSeries, valueDomain } from "./series.ts";

const points = [
  { travel: -20, value: -1 },
  { travel: 0, value: 0 },
  { travel: 20, value: 3 },
  { travel: 30, value: null },
];

test("a value is read between its neighbours", () => {
  expect(findValueAt(points, -20)).toBe(-1);
  expect(findValueAt(points, -5)).toBeCloseTo(-0.25, 12);
  expect(findValueAt(points, 10)).toBeCloseTo(1.5, 12);
});

test("outside the curve and within a gap there is no value", () => {
  expect(findValueAt(points, -21)).toBeNull();
  expect(findValueAt(points, 25)).toBeNull();
  expect(findValueAt(points, 31)).toBeNull();
  expect(findValueAt([], 0)).toBeNull();
});

const curve = (...values: (number | null)[]): TravelSeries => ({
  id: "left",
  label: "left",
  look: "left",
  points: values.map((value, travel) => ({ travel, value })),
});

test("the domain holds every curve, the band and what must stay in sight", () => {
  const [low, high] = valueDomain({
    series: [curve(1, null, 2)],
    band: { min: -3, max: null },
    minSpan: 1,
    include: 4,
  });
  expect(low).toBeLessThan(-3);
  expect(high).toBeGreaterThan(4);
});

test("a flat curve keeps the least span round itself", () => {
  const [low, high] = valueDomain({ series: [curve(5, 5, 5)], minSpan: 2 });
  expect(high - low).toBeGreaterThanOrEqual(2);
  expect((low + high) / 2).toBeCloseTo(5, 12);
});

test("without a single value the least span is shown", () => {
  expect(valueDomain({ series: [curve(null)], minSpan: 2 })).toEqual([-1, 1]);
});
