// The one way a document comes in: shape by zod, then possible geometry by kinematics, every issue with its path.

import { type Axle, checkAxle, checkStudy, type Issue, type Study } from "@linkwright/kinematics";
import type { z } from "zod";
import { AxleSchema } from "./axle.ts";
import { StudySchema } from "./study.ts";

export type Parsed<T> = { ok: true; value: T } | { ok: false; issues: readonly Issue[] };

/** An axle from unknown JSON, or every reason why it is none. */
export function parseAxle(input: unknown): Parsed<Axle> {
  return parseDocument(AxleSchema, checkAxle, input);
}

/** A study from unknown JSON, or every reason why it is none. */
export function parseStudy(input: unknown): Parsed<Study> {
  return parseDocument(StudySchema, checkStudy, input);
}

function parseDocument<T>(
  schema: z.ZodType<T>,
  check: (value: T) => readonly Issue[],
  input: unknown,
): Parsed<T> {
  const shape = schema.safeParse(input);
  if (!shape.success) return { ok: false, issues: issuesFromZod(shape.error, input) };
  const issues = check(shape.data);
  return issues.length === 0 ? { ok: true, value: shape.data } : { ok: false, issues };
}

/** zod's findings in the words of our own issues; an unknown key is named by its full path. */
export function issuesFromZod(error: z.ZodError, input: unknown): Issue[] {
  return error.issues.flatMap((issue) => fromZodIssue(issue, input));
}

type ZodIssue = z.ZodError["issues"][number];

function fromZodIssue(issue: ZodIssue, input: unknown): Issue[] {
  const path = issue.path.map((step) => (typeof step === "symbol" ? String(step) : step));
  const value = valueAt(input, path);
  switch (issue.code) {
    case "unrecognized_keys":
      return issue.keys.map((key) => ({
        path: [...path, key],
        value: valueAt(input, [...path, key]),
        problem: `"${key}" is not known here.`,
        hint: "Check the spelling, or remove it: nothing unknown is kept.",
      }));
    case "invalid_union": {
      // A corner that is neither "mirror" nor right in itself: tell what is wrong with the corner.
      const branches = issue.errors.filter((branch) => branch.some((inner) => inner.path.length > 0));
      const closest = branches.sort((a, b) => a.length - b.length)[0];
      if (closest === undefined) break;
      return closest.flatMap((inner) =>
        fromZodIssue({ ...inner, path: [...issue.path, ...inner.path] } as ZodIssue, input),
      );
    }
    default:
      break;
  }
  return [{ path, value, problem: problemFor(issue, value), hint: hintFor(issue, value) }];
}

/** What zod calls a kind of value, in words that a person who edits a document by hand understands. */
const KIND_NAMES: Readonly<Record<string, string>> = {
  array: "a list",
  boolean: "true or false",
  number: "a number",
  object: "an object { … }",
  string: "a text",
  tuple: "a list of numbers",
};

function problemFor(issue: ZodIssue, value: unknown): string {
  if (value === undefined) return "Nothing stands here.";
  if (issue.code === "invalid_type") {
    return `This must be ${KIND_NAMES[issue.expected] ?? issue.expected}.`;
  }
  return `${issue.message.replace("Invalid input: ", "")}.`;
}

function hintFor(issue: ZodIssue, value: unknown): string {
  if (value === undefined) return "Add it: it is required.";
  switch (issue.code) {
    case "invalid_type":
      if (issue.expected === "number" && typeof value === "string")
        return "Write the number without quotation marks.";
      return `Give ${KIND_NAMES[issue.expected] ?? issue.expected}.`;
    case "invalid_value":
      return `Use one of: ${issue.values.map((allowed) => JSON.stringify(allowed)).join(", ")}.`;
    case "too_small":
      return `Give ${issue.inclusive ? "at least" : "more than"} ${issue.minimum}.`;
    case "too_big":
      return `Give ${issue.inclusive ? "at most" : "less than"} ${issue.maximum}.`;
    default:
      return "Mend this value and try again.";
  }
}

function valueAt(input: unknown, path: readonly (string | number)[]): unknown {
  let value = input;
  for (const step of path) {
    if (typeof value !== "object" || value === null) return undefined;
    value = (value as Record<string | number, unknown>)[step];
  }
  return value;
}
