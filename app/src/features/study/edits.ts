// Lists of edits: making them, joining them, and laying them over a draft. Pure.

import { applyEdits, type Edit, isWithin, readAt, StudySchema } from "@linkwright/contract";
import type { Axle, Coordinates, Path, Study } from "@linkwright/kinematics";
import { mirrorPoint } from "@linkwright/kinematics";
import { isSameJson } from "../../lib/json.ts";

export type EditValue = Edit["to"];

export interface Change {
  readonly path: Path;
  /** Undefined takes an optional member away. */
  readonly to: EditValue;
}

/** The edit that makes a change on a draft; null when it changes nothing. */
export function editFor(draft: Study, { path, to }: Change): Edit | null {
  const from = readAt(draft, path);
  return isSameJson(from, to) ? null : { path: [...path], from, to };
}

/**
 * The change that moves a hardpoint, named as kinematics lists it: `left.suspension.lowerArm.ballJoint`. Where the
 * right is the mirror of the left, moving a right point moves its twin.
 */
export function hardpointChange(axle: Axle, hardpoint: string, to: Coordinates): Change {
  const [side, ...steps] = hardpoint.split(".");
  const rest = steps.map((step) => (/^\d+$/.test(step) ? Number(step) : step));
  const isTwin = side === "right" && axle.right === "mirror";
  const point = isTwin ? mirrorPoint(to) : to;
  return { path: ["axle", isTwin ? "left" : (side ?? ""), ...rest], to: [...point] };
}

/** A second edit of the same place joins the first, unless one in between touches that place from above or below. */
export function addEdit(edits: readonly Edit[], edit: Edit): Edit[] {
  const at = edits.findLastIndex(({ path }) => isWithin(path, edit.path) || isWithin(edit.path, path));
  const earlier = edits[at];
  if (earlier === undefined || !isSameJson(earlier.path, edit.path)) return [...edits, edit];
  const joined: Edit = { ...earlier, to: edit.to };
  const rest = edits.filter((_, index) => index !== at);
  return isSameJson(joined.from, joined.to) ? rest : [...rest.slice(0, at), joined, ...rest.slice(at)];
}

export function addEdits(edits: readonly Edit[], more: readonly Edit[]): Edit[] {
  return more.reduce<Edit[]>(addEdit, [...edits]);
}

/** The edits that undo these, made on what stands there now. */
export function inverseOf(draft: Study, edits: readonly Edit[]): Edit[] {
  return [...edits].reverse().map(({ path, from }) => ({ path, from: readAt(draft, path), to: from }));
}

/** The draft with every edit laid over it that still leads somewhere; null when that is no study any more. */
export function layOver(draft: Study, edits: readonly Edit[]): Study | null {
  const laid = edits.reduce<unknown>((value, edit) => {
    const applied = applyEdits(value, [edit]);
    return applied.ok ? applied.value : value;
  }, draft);
  const parsed = StudySchema.safeParse(laid);
  return parsed.success ? parsed.data : null;
}
