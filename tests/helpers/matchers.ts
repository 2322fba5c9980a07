// `expect` with matchers for numbers that have a tolerance: a failure prints both values, the difference and where.

import { expect } from "vitest";
import type { Tolerance } from "./tolerances.ts";

/** Numbers, nulls and whatever holds them: rows, points, lists of rows. */
export type Comparable = unknown;

interface Difference {
  readonly where: string;
  readonly line: string;
}

export type ToleranceFor = Tolerance | ((where: string) => Tolerance);

const toleranceAt = (tolerance: ToleranceFor, where: string): Tolerance =>
  typeof tolerance === "function" ? tolerance(where) : tolerance;

function compareNumbers(actual: unknown, expected: number, tolerance: Tolerance): string | null {
  if (typeof actual !== "number") return `is ${String(actual)}, expected ${expected}`;
  const difference = Math.abs(actual - expected);
  if (difference <= tolerance.value) return null;
  const allowed = `${tolerance.value} ${tolerance.unit} (${tolerance.name}: ${tolerance.reason})`;
  return `is ${actual}, expected ${expected}, differs by ${difference}, allowed ${allowed}`;
}

/** Every place where `actual` is not `expected`. What `expected` does not mention is not looked at. */
function findDifferences(
  actual: unknown,
  expected: unknown,
  tolerance: ToleranceFor,
  where: string,
): Difference[] {
  if (typeof expected === "number") {
    const line = compareNumbers(actual, expected, toleranceAt(tolerance, where));
    return line === null ? [] : [{ where, line }];
  }
  if (expected === null || typeof expected !== "object") {
    return Object.is(actual, expected)
      ? []
      : [{ where, line: `is ${String(actual)}, expected ${String(expected)}` }];
  }
  if (actual === null || typeof actual !== "object") {
    return [{ where, line: `is ${String(actual)}, expected ${JSON.stringify(expected)}` }];
  }
  if (Array.isArray(expected) && (actual as unknown[]).length !== expected.length) {
    return [{ where, line: `has ${(actual as unknown[]).length} entries, expected ${expected.length}` }];
  }
  return Object.entries(expected).flatMap(([key, value]) => {
    const step = Array.isArray(expected)
      ? `[${key}]`
      : `${where === "" || where.endsWith(" ") ? "" : "."}${key}`;
    return findDifferences((actual as Record<string, unknown>)[key], value, tolerance, `${where}${step}`);
  });
}

/** Every number inside `value`, with its place, that JSON cannot carry. */
function findUnfit(value: unknown, where: string): Difference[] {
  if (typeof value === "number") {
    return Number.isFinite(value) ? [] : [{ where, line: `is ${value}` }];
  }
  if (value === undefined) return [{ where, line: "is undefined" }];
  if (value === null || typeof value !== "object") return [];
  return Object.entries(value).flatMap(([key, entry]) => findUnfit(entry, `${where}.${key}`));
}

const SHOWN = 12;

function report(differences: readonly Difference[]): string {
  const shown = differences.slice(0, SHOWN).map(({ where, line }) => `  ${where || "value"} ${line}`);
  const more = differences.length - shown.length;
  return [...shown, ...(more > 0 ? [`  … and ${more} more`] : [])].join("\n");
}

expect.extend({
  toBeWithin(actual: unknown, expected: unknown, tolerance: ToleranceFor, where = "") {
    const differences = findDifferences(actual, expected, tolerance, where);
    return {
      pass: differences.length === 0,
      message: () => (differences.length === 0 ? "every value is within its tolerance" : report(differences)),
    };
  },
  toHoldOnlyFiniteNumbers(actual: unknown) {
    const differences = findUnfit(actual, "value");
    return {
      pass: differences.length === 0,
      message: () => (differences.length === 0 ? "every number is finite" : report(differences)),
    };
  },
});

interface NumberMatchers {
  /** Every number in `expected` is met within its tolerance; what `expected` leaves out is not looked at. */
  toBeWithin(expected: Comparable, tolerance: ToleranceFor, where?: string): void;
  /** No NaN, no ±∞, no undefined anywhere inside. */
  toHoldOnlyFiniteNumbers(): void;
}

declare module "vitest" {
  // biome-ignore lint/suspicious/noExplicitAny: the declaration it extends is written with any
  interface Matchers<T = any> extends NumberMatchers {}
}

export { expect };
