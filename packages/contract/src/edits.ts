// Edits to a study's draft: what a save sends, how it is applied, and what a conflict looks like.
// The functions are pure, and both sides use them: the client to lay its unsaved edits over a newer draft.

import type { Issue, Path } from "@linkwright/kinematics";
import { z } from "zod";
import { Id, PersonRef, Timestamp } from "./primitives.ts";

const LONGEST_PATH = 12;
const MOST_EDITS = 500;

export const EditPath = z
  .array(z.union([z.string().min(1).max(80), z.int().min(0).max(10_000)]))
  .min(1, "An edit names what it changes")
  .max(LONGEST_PATH);

/**
 * One value of the study from the document's root, e.g. ["axle", "left", "tieRod", "inner"]. A point, an axis or
 * a band is edited whole: half a point from each of two people is a point nobody chose.
 * `from` or `to` left out means that the (optional) member is not there.
 */
export const Edit = z.strictObject({
  path: EditPath,
  from: z.json().optional(),
  to: z.json().optional(),
});
export type Edit = z.infer<typeof Edit>;

export const SaveEditsRequest = z.strictObject({
  /** Names this save: sent again after a lost answer, it changes nothing and answers the same. */
  id: Id,
  /** The version of the draft that the edits were made on. */
  baseVersion: z
    .int()
    .min(1)
    .max(2 ** 31 - 2),
  edits: z.array(Edit).min(1, "There is nothing to save").max(MOST_EDITS),
});
export type SaveEditsRequest = z.infer<typeof SaveEditsRequest>;

/** The same place of the draft changed by two people. `theirs` stands in the draft; nothing of `yours` was saved. */
export const EditConflict = z.object({
  path: EditPath,
  /** What stood there when you began. */
  base: z.json().optional(),
  theirs: z.json().optional(),
  yours: z.json().optional(),
  /** Null when no save since `baseVersion` touched this place: then `base` was never what stood there. */
  changedBy: PersonRef.nullable(),
  changedAt: Timestamp.nullable(),
});
export type EditConflict = z.infer<typeof EditConflict>;

export const DraftConflict = z.object({
  /** The draft's version now: what a new save builds on once the person has chosen. */
  version: z.int(),
  edits: z.array(EditConflict),
});
export type DraftConflict = z.infer<typeof DraftConflict>;

type Json = z.core.util.JSONType;

/** What stands at the path; undefined when nothing does. */
export function readAt(document: unknown, path: Path): Json | undefined {
  let value: unknown = document;
  for (const step of path) {
    if (typeof value !== "object" || value === null || !Object.hasOwn(value, step)) return undefined;
    value = (value as Record<string | number, unknown>)[step];
  }
  return value as Json | undefined;
}

export type Applied<T> = { ok: true; value: T } | { ok: false; issues: readonly Issue[] };

/** A new document with the edits made one after the other, or the edits that lead nowhere. Checks no geometry. */
export function applyEdits(document: unknown, edits: readonly Edit[]): Applied<unknown> {
  const issues: Issue[] = [];
  let value = document;
  for (const edit of edits) {
    const issue = misdirected(value, edit);
    if (issue) issues.push(issue);
    else value = writeAt(value, edit.path, edit.to);
  }
  return issues.length === 0 ? { ok: true, value } : { ok: false, issues };
}

/** Whether `path` is `ancestor` or lies below it. */
export function isWithin(path: Path, ancestor: Path): boolean {
  return ancestor.length <= path.length && ancestor.every((step, at) => step === path[at]);
}

function misdirected(document: unknown, edit: Edit): Issue | null {
  const parent = readAt(document, edit.path.slice(0, -1));
  const step = edit.path.at(-1);
  const refuse = (problem: string, hint: string): Issue => ({
    path: edit.path,
    value: edit.to,
    problem,
    hint,
  });
  if (typeof parent !== "object" || parent === null) {
    return refuse("The draft has nothing at this path.", "Read the draft again and edit what it holds.");
  }
  if (!Array.isArray(parent)) {
    return typeof step === "string"
      ? null
      : refuse("This is not a list, so a number leads nowhere.", "Name the member by its name.");
  }
  if (typeof step !== "number" || step >= parent.length) {
    return refuse("The list has no such entry.", "To add or remove an entry, give the whole list.");
  }
  if (parent.every((entry) => typeof entry === "number")) {
    return refuse("A point, an axis or a band is edited whole.", "Give all of its numbers as one value.");
  }
  return edit.to === undefined
    ? refuse("An entry cannot be taken out of a list.", "Give the whole list without it.")
    : null;
}

function writeAt(document: unknown, path: Path, to: Json | undefined): unknown {
  const [step, ...rest] = path;
  if (step === undefined) return to;
  if (Array.isArray(document)) {
    return document.map((entry, at) => (at === step ? writeAt(entry, rest, to) : entry));
  }
  const members = Object.entries(document as Record<string, unknown>);
  const written = writeAt(readAt(document, [step]), rest, to);
  const others = members.filter(([key]) => key !== String(step));
  if (written === undefined) return Object.fromEntries(others);
  return Object.fromEntries(
    Object.hasOwn(document as object, step)
      ? members.map(([key, value]) => [key, key === String(step) ? written : value])
      : [...members, [String(step), written]],
  );
}
