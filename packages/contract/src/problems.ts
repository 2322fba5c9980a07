// How every refusal of the API is told: RFC 9457 problem details with a code of ours.

import { z } from "zod";
import { DraftConflict } from "./edits.ts";

export const PROBLEM_CODES = [
  /** The request does not have the form it must have: `issues` says where. */
  "invalid",
  /** The form is right, but the study is impossible: `issues` says why. */
  "study_refused",
  "not_signed_in",
  "wrong_credentials",
  "not_allowed",
  /** A request that changes something did not come from our own pages. */
  "foreign_request",
  "not_found",
  /** Someone else changed the same thing first: `conflict` holds both values. */
  "edit_conflict",
  /** The draft has moved on since it was looked at. */
  "draft_moved",
  /** The client-made id already stands for something else. */
  "id_reused",
  "sheet_not_ready",
  "too_large",
  "too_many_attempts",
  "unavailable",
  "internal",
] as const;

export const ProblemCode = z.enum(PROBLEM_CODES);
export type ProblemCode = z.infer<typeof ProblemCode>;

/** kinematics' Issue on the wire. */
export const ProblemIssue = z.object({
  path: z.array(z.union([z.string(), z.number()])).readonly(),
  problem: z.string(),
  hint: z.string(),
  value: z.unknown().optional(),
});
export type ProblemIssue = z.infer<typeof ProblemIssue>;

export const Problem = z.object({
  /** `urn:linkwright:problem:<code>` */
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  code: ProblemCode,
  /** To be told when asking for help; it stands in the server's log. */
  requestId: z.string(),
  issues: z.exactOptional(z.array(ProblemIssue)),
  conflict: z.exactOptional(DraftConflict),
  retryAfterSeconds: z.exactOptional(z.int()),
});
export type Problem = z.infer<typeof Problem>;
