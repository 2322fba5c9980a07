import { comments, people, type WorkshopScope } from "@linkwright/db";
import { and, asc, eq, type SQL, sql } from "drizzle-orm";
import { alias } from "drizzle-orm/pg-core";

export type NewComment = Omit<typeof comments.$inferInsert, "workshopId">;
export type CommentRow = Awaited<ReturnType<typeof selectComments>>[number];

const creator = alias(people, "creator");
const resolver = alias(people, "resolver");

function selectComments({ tx, workshopId }: WorkshopScope, only: SQL) {
  return tx
    .select({
      id: comments.id,
      studyId: comments.studyId,
      revision: comments.revisionNumber,
      pin: comments.pin,
      hardpointPath: comments.hardpointPath,
      text: comments.text,
      createdBy: { id: creator.id, name: creator.name },
      createdAt: comments.createdAt,
      resolvedBy: { id: resolver.id, name: resolver.name },
      resolvedAt: comments.resolvedAt,
    })
    .from(comments)
    .innerJoin(creator, eq(creator.id, comments.createdBy))
    .leftJoin(resolver, eq(resolver.id, comments.resolvedBy))
    .where(and(eq(comments.workshopId, workshopId), only))
    .orderBy(asc(comments.createdAt), asc(comments.id));
}

/** Oldest first. */
export function listComments(scope: WorkshopScope, studyId: string): Promise<CommentRow[]> {
  return selectComments(scope, eq(comments.studyId, studyId));
}

export async function findComment(scope: WorkshopScope, id: string): Promise<CommentRow | null> {
  const [row] = await selectComments(scope, eq(comments.id, id));
  return row ?? null;
}

/** Leaves a comment that has this id already as it is. */
export async function addComment({ tx, workshopId }: WorkshopScope, comment: NewComment): Promise<void> {
  await tx
    .insert(comments)
    .values({ ...comment, workshopId })
    .onConflictDoNothing();
}

/** `by` null reopens it. One that is settled so already keeps who settled it, and when. */
export async function settleComment(
  { tx, workshopId }: WorkshopScope,
  id: string,
  by: string | null,
): Promise<void> {
  const isOpen = sql`${comments.resolvedAt} is null`;
  await tx
    .update(comments)
    .set(by === null ? { resolvedBy: null, resolvedAt: null } : { resolvedBy: by, resolvedAt: sql`now()` })
    .where(and(eq(comments.workshopId, workshopId), eq(comments.id, id), by === null ? undefined : isOpen));
}
