// From an unknown body to a typed one, or to every reason why not.

import { issuesFromZod, type ProblemIssue } from "@linkwright/contract";
import type { z } from "zod";
import { ServiceError } from "./problems.ts";

/** Deeper than any document of ours, and shallow enough for everything that walks it by recursion. */
const DEEPEST = 32;

export function parseBody<T extends z.ZodType>(schema: T, body: unknown): z.output<T> {
  const unfit = findUnfit(body);
  if (unfit) throw new ServiceError("invalid", { issues: [unfit] });
  const parsed = schema.safeParse(body);
  if (parsed.success) return parsed.data;
  throw new ServiceError("invalid", { issues: issuesFromZod(parsed.error, body) });
}

/** A path that cannot be one of ours leads to nothing, so the answer is the same as for an id that nobody has. */
export function parseParams<T extends z.ZodType>(schema: T, params: unknown): z.output<T> {
  const parsed = schema.safeParse(params);
  if (!parsed.success) throw new ServiceError("not_found");
  return parsed.data;
}

/** Refuses what JSON can carry and PostgreSQL cannot keep: NUL, halves of surrogate pairs; and bottomless nesting. */
function findUnfit(body: unknown): ProblemIssue | null {
  const open: { value: unknown; path: (string | number)[] }[] = [{ value: body, path: [] }];
  for (let next = open.pop(); next !== undefined; next = open.pop()) {
    const { value, path } = next;
    if (typeof value === "string" && !isStorable(value)) return unstorable(path);
    if (typeof value !== "object" || value === null) continue;
    if (path.length >= DEEPEST) return tooDeep(path);
    for (const [key, member] of Object.entries(value)) {
      if (!isStorable(key)) return unstorable(path);
      open.push({ value: member, path: [...path, Array.isArray(value) ? Number(key) : key] });
    }
  }
  return null;
}

function isStorable(text: string): boolean {
  return !text.includes("\u0000") && !/\p{Cs}/u.test(text);
}

function unstorable(path: (string | number)[]): ProblemIssue {
  return {
    path,
    problem: "This text holds a character that cannot be kept.",
    hint: "Take out NUL characters and broken pairs, often left by copying from another program.",
  };
}

function tooDeep(path: (string | number)[]): ProblemIssue {
  return { path, problem: `This is nested deeper than ${DEEPEST} levels.`, hint: "Send a flatter document." };
}
