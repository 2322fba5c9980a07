import type { Edit } from "@linkwright/contract";
import { comments, draftEdits, people, revisions, studies, type WorkshopScope } from "@linkwright/db";
import { and, asc, eq, gt, isNull, sql } from "drizzle-orm";
import { alias } from "drizzle-orm/pg-core";

export type StudyRow = Awaited<ReturnType<typeof selectStudies>>[number];
export type NewStudy = Omit<typeof studies.$inferInsert, "workshopId">;
export type NewSave = Omit<typeof draftEdits.$inferInsert, "workshopId" | "edits"> & {
  readonly edits: readonly Edit[];
};

/** A save since some version, with who made it. */
export interface SaveRow {
  readonly version: number;
  readonly edits: readonly Edit[];
  readonly createdBy: { readonly id: string; readonly name: string };
  readonly createdAt: Date;
}

const creator = alias(people, "creator");
const updater = alias(people, "updater");

function selectStudies({ tx, workshopId }: WorkshopScope, only: { buildId?: string; studyId?: string }) {
  return tx
    .select({
      id: studies.id,
      buildId: studies.buildId,
      name: studies.name,
      draft: studies.draft,
      version: studies.version,
      latestRevision: sql<number | null>`(${tx
        .select({ latest: sql`max(${revisions.number})` })
        .from(revisions)
        .where(and(eq(revisions.workshopId, studies.workshopId), eq(revisions.studyId, studies.id)))})`,
      openComments: sql<number>`(${tx
        .select({ count: sql`count(*)::int` })
        .from(comments)
        .where(
          and(
            eq(comments.workshopId, studies.workshopId),
            eq(comments.studyId, studies.id),
            isNull(comments.resolvedAt),
          ),
        )})`,
      createdBy: { id: creator.id, name: creator.name },
      createdAt: studies.createdAt,
      updatedBy: { id: updater.id, name: updater.name },
      updatedAt: studies.updatedAt,
    })
    .from(studies)
    .innerJoin(creator, eq(creator.id, studies.createdBy))
    .innerJoin(updater, eq(updater.id, studies.updatedBy))
    .where(
      and(
        eq(studies.workshopId, workshopId),
        only.buildId === undefined ? undefined : eq(studies.buildId, only.buildId),
        only.studyId === undefined ? undefined : eq(studies.id, only.studyId),
      ),
    )
    .orderBy(asc(studies.createdAt), asc(studies.id));
}

export function listStudies(scope: WorkshopScope, buildId: string): Promise<StudyRow[]> {
  return selectStudies(scope, { buildId });
}

export async function findStudy(scope: WorkshopScope, studyId: string): Promise<StudyRow | null> {
  const [row] = await selectStudies(scope, { studyId });
  return row ?? null;
}

/** Leaves a study that has this id already as it is. */
export async function addStudy({ tx, workshopId }: WorkshopScope, study: NewStudy): Promise<void> {
  await tx
    .insert(studies)
    .values({ ...study, workshopId })
    .onConflictDoNothing();
}

/** False when there is no such study. */
export async function renameStudy(
  { tx, workshopId }: WorkshopScope,
  studyId: string,
  change: { readonly name: string; readonly updatedBy: string },
): Promise<boolean> {
  const changed = await tx
    .update(studies)
    .set({ ...change, updatedAt: sql`now()` })
    .where(and(eq(studies.workshopId, workshopId), eq(studies.id, studyId)))
    .returning({ id: studies.id });
  return changed.length === 1;
}

/** The draft, held until the transaction ends, so that saves come one after the other. Null when there is none. */
export async function lockDraft({ tx, workshopId }: WorkshopScope, studyId: string) {
  const [row] = await tx
    .select({ id: studies.id, draft: studies.draft, version: studies.version })
    .from(studies)
    .where(and(eq(studies.workshopId, workshopId), eq(studies.id, studyId)))
    .for("update");
  return row ?? null;
}

export async function writeDraft(
  { tx, workshopId }: WorkshopScope,
  studyId: string,
  change: Pick<NewStudy, "draft" | "draftFormat" | "version" | "updatedBy">,
): Promise<void> {
  await tx
    .update(studies)
    .set({ ...change, updatedAt: sql`now()` })
    .where(and(eq(studies.workshopId, workshopId), eq(studies.id, studyId)));
}

export async function findSave({ tx, workshopId }: WorkshopScope, id: string) {
  const [row] = await tx
    .select({
      studyId: draftEdits.studyId,
      version: draftEdits.version,
      requestHash: draftEdits.requestHash,
      createdBy: draftEdits.createdBy,
    })
    .from(draftEdits)
    .where(and(eq(draftEdits.workshopId, workshopId), eq(draftEdits.id, id)));
  return row ?? null;
}

/** In the order they were made. */
export async function listSavesAfter(
  { tx, workshopId }: WorkshopScope,
  studyId: string,
  version: number,
): Promise<SaveRow[]> {
  const rows = await tx
    .select({
      version: draftEdits.version,
      edits: draftEdits.edits,
      createdBy: { id: people.id, name: people.name },
      createdAt: draftEdits.createdAt,
    })
    .from(draftEdits)
    .innerJoin(people, eq(people.id, draftEdits.createdBy))
    .where(
      and(
        eq(draftEdits.workshopId, workshopId),
        eq(draftEdits.studyId, studyId),
        gt(draftEdits.version, version),
      ),
    )
    .orderBy(asc(draftEdits.version));
  return rows.map((row) => ({ ...row, edits: row.edits as readonly Edit[] })); // addSave writes nothing else
}

export async function addSave({ tx, workshopId }: WorkshopScope, save: NewSave): Promise<void> {
  await tx.insert(draftEdits).values({ ...save, workshopId });
}
