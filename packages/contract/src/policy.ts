// Who may do what: the one table that server and client read. A role belongs to a membership, never to a person.

import type { Role } from "./primitives.ts";

export const ACTIONS = [
  "workshop.read",
  "build.edit",
  "study.edit",
  "revision.save",
  "comment.write",
  /** Settling another person's comment; one's own may always be settled by whoever may write comments. */
  "comment.settleAny",
  "sheet.make",
] as const;
export type Action = (typeof ACTIONS)[number];

const REVIEWER: readonly Action[] = ["workshop.read", "comment.write"];
const FABRICATOR: readonly Action[] = ["workshop.read", "comment.write", "sheet.make"];
const ENGINEER: readonly Action[] = [
  ...FABRICATOR,
  "build.edit",
  "study.edit",
  "revision.save",
  "comment.settleAny",
];
const OWNER: readonly Action[] = [...new Set([...ENGINEER, ...REVIEWER])];

const ALLOWED: Readonly<Record<Role, ReadonlySet<Action>>> = {
  owner: new Set(OWNER),
  engineer: new Set(ENGINEER),
  fabricator: new Set(FABRICATOR),
  reviewer: new Set(REVIEWER),
};

export function may(role: Role, action: Action): boolean {
  return ALLOWED[role].has(action);
}

/** Settling (resolving or reopening) a comment: one's own, or anyone's with the right to it. */
export function maySettleComment(role: Role, isOwn: boolean): boolean {
  return may(role, "comment.settleAny") || (isOwn && may(role, "comment.write"));
}
