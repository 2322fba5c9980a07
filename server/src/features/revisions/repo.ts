import { people, revisions, type WorkshopScope } from "@linkwright/db";
import { and, desc, eq, sql } from "drizzle-orm";

export type NewRevision = Omit<typeof revisions.$inferInsert, "workshopId">;
export type RevisionRow = Awaited<ReturnType<typeof selectRevisions>>[number];

function selectRevisions({ tx, workshopId }: WorkshopScope, studyId: string, number?: number) {
  return tx
    .select({
      id: revisions.id,
      number: revisions.number,
      version: revisions.version,
      study: revisions.study,
      hash: revisions.hash,
      note: revisions.note,
      status: revisions.status,
      createdBy: { id: people.id, name: people.name },
      createdAt: revisions.createdAt,
    })
    .from(revisions)
    .innerJoin(people, eq(people.id, revisions.createdBy))
    .where(
      and(
        eq(revisions.workshopId, workshopId),
        eq(revisions.studyId, studyId),
        number === undefined ? undefined : eq(revisions.number, number),
      ),
    )
    .orderBy(desc(revisions.number));
}

/** Newest first. */
export function listRevisions(scope: WorkshopScope, studyId: string): Promise<RevisionRow[]> {
  return selectRevisions(scope, studyId);
}

export async function findRevision(
  scope: WorkshopScope,
  studyId: string,
  number: number,
): Promise<RevisionRow | null> {
  const [row] = await selectRevisions(scope, studyId, number);
  return row ?? null;
}

export async function findRevisionById({ tx, workshopId }: WorkshopScope, id: string) {
  const [row] = await tx
    .select({
      studyId: revisions.studyId,
      number: revisions.number,
      version: revisions.version,
      note: revisions.note,
      createdBy: revisions.createdBy,
    })
    .from(revisions)
    .where(and(eq(revisions.workshopId, workshopId), eq(revisions.id, id)));
  return row ?? null;
}

/** Call it with the study's draft locked, so that no two revisions take the same number. */
export async function nextNumber({ tx, workshopId }: WorkshopScope, studyId: string): Promise<number> {
  const [row] = await tx
    .select({ next: sql<number>`coalesce(max(${revisions.number}), 0) + 1` })
    .from(revisions)
    .where(and(eq(revisions.workshopId, workshopId), eq(revisions.studyId, studyId)));
  return row?.next ?? 1;
}

export async function addRevision({ tx, workshopId }: WorkshopScope, revision: NewRevision): Promise<void> {
  await tx.insert(revisions).values({ ...revision, workshopId });
}
