// A revision: the whole study document as it stood, numbered within the study, never changed again.

import { z } from "zod";
import { Id, PersonRef, Timestamp, textOf } from "./primitives.ts";
import { defineRoute, NoBody } from "./route.ts";
import { StudyDocument, StudyParams } from "./studies.ts";

export const RevisionStatus = z.enum([
  "saved",
  "inReview",
  "changesAsked",
  "approved",
  "released",
  "superseded",
]);
export type RevisionStatus = z.infer<typeof RevisionStatus>;

export const RevisionParams = StudyParams.extend({
  number: z.coerce
    .number()
    .int()
    .min(1)
    .max(2 ** 31 - 1),
});

export const RevisionSummary = z.object({
  number: z.int(),
  note: z.string(),
  status: RevisionStatus,
  /** SHA-256 of the study's canonical JSON (RFC 8785), in hex. */
  hash: z.string().regex(/^[0-9a-f]{64}$/),
  createdBy: PersonRef,
  createdAt: Timestamp,
});
export type RevisionSummary = z.infer<typeof RevisionSummary>;

export const RevisionList = z.object({ revisions: z.array(RevisionSummary) });
export type RevisionList = z.infer<typeof RevisionList>;

export const RevisionAnswer = RevisionSummary.extend({ study: StudyDocument });
export type RevisionAnswer = z.infer<typeof RevisionAnswer>;

export const SaveRevisionRequest = z.strictObject({
  id: Id,
  /** The draft's version that is meant: what has moved on in the meantime is not saved unseen. */
  version: z
    .int()
    .min(1)
    .max(2 ** 31 - 1),
  note: textOf(2000).default(""),
});
export type SaveRevisionRequest = z.infer<typeof SaveRevisionRequest>;

/** As much of the hash as a sheet bears: short enough to read out over the telephone. */
export function shortHash(hash: string): string {
  return hash.slice(0, 12);
}

export const revisionRoutes = {
  list: defineRoute({
    method: "GET",
    path: "/api/workshops/:workshopId/studies/:studyId/revisions",
    access: "workshop.read",
    params: StudyParams,
    body: NoBody,
    answer: RevisionList,
    status: 200,
  }),
  save: defineRoute({
    method: "POST",
    path: "/api/workshops/:workshopId/studies/:studyId/revisions",
    access: "revision.save",
    params: StudyParams,
    body: SaveRevisionRequest,
    answer: RevisionAnswer,
    status: 201,
  }),
  get: defineRoute({
    method: "GET",
    path: "/api/workshops/:workshopId/studies/:studyId/revisions/:number",
    access: "workshop.read",
    params: RevisionParams,
    body: NoBody,
    answer: RevisionAnswer,
    status: 200,
  }),
} as const;
