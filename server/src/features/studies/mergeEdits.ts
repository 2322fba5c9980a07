// Laying a save's edits over a draft that may have moved on since. Pure: it is told what happened, and decides.

import {
  applyEdits,
  type Edit,
  type EditConflict,
  isWithin,
  type ProblemIssue,
  readAt,
} from "@linkwright/contract";
import { isSameDocument } from "@linkwright/db";
import type { SaveRow } from "./repo.ts";

export type Merge =
  /** `done` holds what was really changed, with what stood there before. */
  | { readonly status: "merged"; readonly draft: unknown; readonly done: readonly Edit[] }
  | { readonly status: "conflict"; readonly conflicts: readonly EditConflict[] }
  | { readonly status: "misdirected"; readonly issues: readonly ProblemIssue[] };

/**
 * An edit is taken when its place still holds what the editor saw there, whatever was saved elsewhere since. It is
 * a conflict when the place holds something else, or when a whole that contains it was replaced since: an index into
 * a list then need not mean what it meant. `since`: the saves after the version that the edits were made on.
 */
export function mergeEdits(draft: unknown, edits: readonly Edit[], since: readonly SaveRow[]): Merge {
  const issues: ProblemIssue[] = [];
  const conflicts: EditConflict[] = [];
  const done: Edit[] = [];
  let merged = draft;
  for (const edit of edits) {
    const stands = readAt(merged, edit.path);
    if (isSameDocument(stands, edit.to)) continue;
    const applied = applyEdits(merged, [edit]);
    const isGone = stands === undefined && edit.from !== undefined && since.length > 0;
    const isMoved = isWholeReplaced(edit, since) && !isOwnPlace(edit, done);
    if (!applied.ok && !isGone) {
      issues.push(...applied.issues);
    } else if (!applied.ok || isMoved || !isSameDocument(stands, edit.from)) {
      conflicts.push(describeConflict(draft, edit, since));
    } else {
      merged = applied.value;
      done.push(withMembers(edit, stands));
    }
  }
  if (issues.length > 0) return { status: "misdirected", issues };
  if (conflicts.length > 0) return { status: "conflict", conflicts };
  return { status: "merged", draft: merged, done };
}

/** The draft as it was before the saves given (in the order they were made). */
export function rewind(draft: unknown, saves: readonly SaveRow[]): unknown {
  const back = saves.flatMap((save) => save.edits).reverse();
  const applied = applyEdits(
    draft,
    back.map(({ path, from }) => ({ path, ...(from !== undefined && { to: from }) })),
  );
  if (!applied.ok) throw new Error("the log of edits does not lead back to an earlier draft");
  return applied.value;
}

function isWholeReplaced(edit: Edit, since: readonly SaveRow[]): boolean {
  return since.some((save) =>
    save.edits.some(({ path }) => path.length < edit.path.length && isWithin(edit.path, path)),
  );
}

/** Below something that this same save has put there. */
function isOwnPlace(edit: Edit, done: readonly Edit[]): boolean {
  return done.some(({ path }) => isWithin(edit.path, path));
}

function describeConflict(draft: unknown, edit: Edit, since: readonly SaveRow[]): EditConflict {
  const last = since.findLast((save) =>
    save.edits.some(({ path }) => isWithin(edit.path, path) || isWithin(path, edit.path)),
  );
  const theirs = readAt(draft, edit.path);
  return {
    path: edit.path,
    ...(edit.from !== undefined && { base: edit.from }),
    ...(theirs !== undefined && { theirs }),
    ...(edit.to !== undefined && { yours: edit.to }),
    changedBy: last?.createdBy ?? null,
    changedAt: last?.createdAt.toISOString() ?? null,
  };
}

function withMembers({ path, to }: Edit, from: Edit["from"]): Edit {
  return { path, ...(from !== undefined && { from }), ...(to !== undefined && { to }) };
}
