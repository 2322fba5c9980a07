// Values on their way into the drawing. What cannot be built is kept beside the drawing, as typed, until it can.

import { applyEdits, isWithin, parseStudy } from "@linkwright/contract";
import type { Issue, Path, Study } from "@linkwright/kinematics";
import type { Change } from "@/features/study/index.ts";
import { isSameJson } from "../../../lib/json.ts";

export interface Kept {
  readonly change: Change;
  /** The field it was typed into: its place, and the axis of a point. */
  readonly field: string;
  readonly issue: Issue;
}

export interface Attempt {
  /** To be made on the drawing now, as one step. */
  readonly changes: readonly Change[];
  readonly kept: readonly Kept[];
}

/** With all that was kept, or by itself, a change goes in; else it is kept too. One place is kept but once. */
export function attempt(study: Study, kept: readonly Kept[], change: Change, field: string): Attempt {
  const others = kept.filter((each) => !isSameJson(each.change.path, change.path));
  const together = [...others.map((each) => each.change), change];
  if (issuesWith(study, together).length === 0) return { changes: together, kept: [] };
  const issues = issuesWith(study, [change]);
  if (issues.length === 0) return { changes: [change], kept: others };
  const [first] = issues;
  const issue = issues.find(({ path }) => isWithin(path, change.path)) ?? (first as Issue);
  return { changes: [], kept: [...others, { change, field, issue }] };
}

/** Why the study with these changes could not be built. */
export function issuesWith(study: Study, changes: readonly Change[]): readonly Issue[] {
  const applied = applyEdits(
    study,
    changes.map(({ path, to }) => ({ path: [...path], to })),
  );
  if (!applied.ok) return applied.issues;
  const parsed = parseStudy(applied.value);
  return parsed.ok ? [] : parsed.issues;
}

export function keptAt(kept: readonly Kept[], path: Path): Kept | undefined {
  return kept.find((each) => isSameJson(each.change.path, path));
}

export function withoutKept(kept: readonly Kept[], path: Path): readonly Kept[] {
  return kept.filter((each) => !isSameJson(each.change.path, path));
}
