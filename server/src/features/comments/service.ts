import {
  type Comment,
  type CommentList,
  type CommentPin,
  type CreateCommentRequest,
  maySettleComment,
  type ProblemIssue,
  type Role,
} from "@linkwright/contract";
import type { WorkshopScope } from "@linkwright/db";
import { type Axle, listHardpoints } from "@linkwright/kinematics";
import { ServiceError } from "../../http/problems.ts";
import { findRevision } from "../revisions/index.ts";
import { getStudy, readStoredStudy } from "../studies/index.ts";
import * as repo from "./repo.ts";

export async function listComments(scope: WorkshopScope, studyId: string): Promise<CommentList> {
  await getStudy(scope, studyId);
  const rows = await repo.listComments(scope, studyId);
  return { comments: rows.map(presentComment) };
}

export async function createComment(
  scope: WorkshopScope,
  personId: string,
  studyId: string,
  request: CreateCommentRequest,
): Promise<Comment> {
  const known = await repo.findComment(scope, request.id);
  if (known) return requireRepeat(known, personId, studyId, request);

  const axle = await axleLookedAt(scope, studyId, request.revision);
  requireHardpoint(axle, request.pin);
  await repo.addComment(scope, {
    id: request.id,
    studyId,
    revisionNumber: request.revision,
    pin: request.pin.type,
    hardpointPath: hardpointOf(request.pin),
    text: request.text,
    createdBy: personId,
  });
  return requireRepeat(await getRow(scope, request.id), personId, studyId, request);
}

export async function settleComment(
  scope: WorkshopScope,
  member: { readonly personId: string; readonly role: Role },
  commentId: string,
  isResolved: boolean,
): Promise<Comment> {
  const row = await getRow(scope, commentId);
  const isOwn = row.createdBy.id === member.personId;
  if (!maySettleComment(member.role, isOwn)) throw new ServiceError("not_allowed");
  await repo.settleComment(scope, commentId, isResolved ? member.personId : null);
  return presentComment(await getRow(scope, commentId));
}

async function getRow(scope: WorkshopScope, commentId: string): Promise<repo.CommentRow> {
  const row = await repo.findComment(scope, commentId);
  if (row === null) throw new ServiceError("not_found");
  return row;
}

/** The comment under this id, if it is what is asked for. */
function requireRepeat(
  row: repo.CommentRow,
  personId: string,
  studyId: string,
  request: CreateCommentRequest,
): Comment {
  const isSame =
    row.createdBy.id === personId &&
    row.studyId === studyId &&
    row.text === request.text &&
    row.revision === request.revision &&
    row.hardpointPath === hardpointOf(request.pin);
  if (!isSame) throw new ServiceError("id_reused");
  return presentComment(row);
}

async function axleLookedAt(scope: WorkshopScope, studyId: string, revision: number | null): Promise<Axle> {
  const study = await getStudy(scope, studyId);
  if (revision === null) return study.draft.axle;
  const row = await findRevision(scope, studyId, revision);
  if (row) return readStoredStudy(row.study).axle;
  refuse({
    path: ["revision"],
    value: revision,
    problem: `The study has no revision ${revision}.`,
    hint: "Name a revision that has been saved, or leave it out to speak of the draft.",
  });
}

function requireHardpoint(axle: Axle, pin: CommentPin): void {
  if (pin.type === "study" || listHardpoints(axle).some(({ path }) => path === pin.path)) return;
  refuse({
    path: ["pin", "path"],
    value: pin.path,
    problem: "The axle has no such hardpoint.",
    hint: "Pin the comment to a hardpoint of the table, or to the whole study.",
  });
}

function refuse(issue: ProblemIssue): never {
  throw new ServiceError("invalid", { issues: [issue] });
}

function hardpointOf(pin: CommentPin): string | null {
  return pin.type === "hardpoint" ? pin.path : null;
}

function presentComment(row: repo.CommentRow): Comment {
  const { hardpointPath, ...rest } = row;
  return {
    ...rest,
    pin: hardpointPath === null ? { type: "study" } : { type: "hardpoint", path: hardpointPath },
    createdAt: row.createdAt.toISOString(),
    resolvedAt: row.resolvedAt?.toISOString() ?? null,
  };
}
