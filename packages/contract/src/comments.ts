// Comments on a study: on the whole of it, or pinned to a hardpoint.

import { z } from "zod";
import { Id, PersonRef, Timestamp, textOf } from "./primitives.ts";
import { defineRoute, NoBody } from "./route.ts";
import { StudyParams } from "./studies.ts";

/** `path` is the hardpoint's, as kinematics lists it: "left.suspension.lowerArm.frontPivot". */
export const CommentPin = z.discriminatedUnion("type", [
  z.strictObject({ type: z.literal("study") }),
  z.strictObject({ type: z.literal("hardpoint"), path: z.string().min(1).max(200) }),
]);
export type CommentPin = z.infer<typeof CommentPin>;

export const CommentParams = z.strictObject({ workshopId: Id, commentId: Id });

export const Comment = z.object({
  id: Id,
  studyId: Id,
  /** The revision that was being looked at; null for the draft. */
  revision: z.int().nullable(),
  pin: CommentPin,
  text: z.string(),
  createdBy: PersonRef,
  createdAt: Timestamp,
  /** Null while it is open. */
  resolvedBy: PersonRef.nullable(),
  resolvedAt: Timestamp.nullable(),
});
export type Comment = z.infer<typeof Comment>;

export const CommentList = z.object({ comments: z.array(Comment) });
export type CommentList = z.infer<typeof CommentList>;

export const CreateCommentRequest = z.strictObject({
  id: Id,
  pin: CommentPin,
  revision: z.int().min(1).nullable().default(null),
  text: textOf(4000).min(1, "A comment says something"),
});
export type CreateCommentRequest = z.infer<typeof CreateCommentRequest>;

export const SettleCommentRequest = z.strictObject({ resolved: z.boolean() });
export type SettleCommentRequest = z.infer<typeof SettleCommentRequest>;

export const commentRoutes = {
  list: defineRoute({
    method: "GET",
    path: "/api/workshops/:workshopId/studies/:studyId/comments",
    access: "workshop.read",
    params: StudyParams,
    body: NoBody,
    answer: CommentList,
    status: 200,
  }),
  create: defineRoute({
    method: "POST",
    path: "/api/workshops/:workshopId/studies/:studyId/comments",
    access: "comment.write",
    params: StudyParams,
    body: CreateCommentRequest,
    answer: Comment,
    status: 201,
  }),
  /** Resolve or reopen. Another person's comment asks for more: policy's maySettleComment. */
  settle: defineRoute({
    method: "PATCH",
    path: "/api/workshops/:workshopId/comments/:commentId",
    access: "comment.write",
    params: CommentParams,
    body: SettleCommentRequest,
    answer: Comment,
    status: 200,
  }),
} as const;
