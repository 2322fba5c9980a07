// A study: a front axle, a rear axle or a variant, with its working draft.

import type { Study } from "@linkwright/kinematics";
import { z } from "zod";
import { BuildParams } from "./builds.ts";
import { SaveEditsRequest } from "./edits.ts";
import { Id, Name, PersonRef, Timestamp } from "./primitives.ts";
import { defineRoute, NoBody } from "./route.ts";
import { StudySchema } from "./study.ts";

/** The whole study under kinematics' own type, which zod's inference would only approach. */
export const StudyDocument: z.ZodType<Study, Study> = StudySchema;

export const StudyParams = z.strictObject({ workshopId: Id, studyId: Id });

export const StudySummary = z.object({
  id: Id,
  buildId: Id,
  name: z.string(),
  position: z.enum(["front", "rear"]),
  /** Of the draft; it goes up by one with every save. */
  version: z.int(),
  /** Null while nothing has been saved as a revision. */
  latestRevision: z.int().nullable(),
  openComments: z.int(),
  createdBy: PersonRef,
  createdAt: Timestamp,
  updatedBy: PersonRef,
  updatedAt: Timestamp,
});
export type StudySummary = z.infer<typeof StudySummary>;

export const StudyList = z.object({ studies: z.array(StudySummary) });
export type StudyList = z.infer<typeof StudyList>;

export const StudyAnswer = StudySummary.extend({ draft: StudyDocument });
export type StudyAnswer = z.infer<typeof StudyAnswer>;

export const CreateStudyRequest = z.strictObject({
  id: Id,
  name: Name,
  source: z.discriminatedUnion("type", [
    z.strictObject({ type: z.literal("document"), study: StudyDocument }),
    /** The draft of another study of the workshop, as it stands. */
    z.strictObject({ type: z.literal("copy"), studyId: Id }),
  ]),
});
export type CreateStudyRequest = z.infer<typeof CreateStudyRequest>;

export const RenameStudyRequest = z.strictObject({ name: Name });
export type RenameStudyRequest = z.infer<typeof RenameStudyRequest>;

/** The draft as this save left it: other people's edits since the base are in it. */
export const SavedDraft = z.object({ version: z.int(), draft: StudyDocument });
export type SavedDraft = z.infer<typeof SavedDraft>;

export const studyRoutes = {
  list: defineRoute({
    method: "GET",
    path: "/api/workshops/:workshopId/builds/:buildId/studies",
    access: "workshop.read",
    params: BuildParams,
    body: NoBody,
    answer: StudyList,
    status: 200,
  }),
  create: defineRoute({
    method: "POST",
    path: "/api/workshops/:workshopId/builds/:buildId/studies",
    access: "study.edit",
    params: BuildParams,
    body: CreateStudyRequest,
    answer: StudyAnswer,
    status: 201,
  }),
  get: defineRoute({
    method: "GET",
    path: "/api/workshops/:workshopId/studies/:studyId",
    access: "workshop.read",
    params: StudyParams,
    body: NoBody,
    answer: StudyAnswer,
    status: 200,
  }),
  rename: defineRoute({
    method: "PATCH",
    path: "/api/workshops/:workshopId/studies/:studyId",
    access: "study.edit",
    params: StudyParams,
    body: RenameStudyRequest,
    answer: StudyAnswer,
    status: 200,
  }),
  saveEdits: defineRoute({
    method: "POST",
    path: "/api/workshops/:workshopId/studies/:studyId/edits",
    access: "study.edit",
    params: StudyParams,
    body: SaveEditsRequest,
    answer: SavedDraft,
    status: 200,
  }),
} as const;
