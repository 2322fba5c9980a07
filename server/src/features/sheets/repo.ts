import { people, sheets, type WorkshopScope } from "@linkwright/db";
import { and, desc, eq, type SQL, sql } from "drizzle-orm";

export type NewSheet = Omit<typeof sheets.$inferInsert, "workshopId">;
export type SheetRow = Awaited<ReturnType<typeof selectSheets>>[number];

function selectSheets({ tx, workshopId }: WorkshopScope, only: SQL) {
  return tx
    .select({
      id: sheets.id,
      studyId: sheets.studyId,
      revision: sheets.revisionNumber,
      kind: sheets.kind,
      units: sheets.units,
      status: sheets.status,
      failure: sheets.failure,
      storageKey: sheets.storageKey,
      fileName: sheets.fileName,
      byteSize: sheets.byteSize,
      createdBy: { id: people.id, name: people.name },
      createdAt: sheets.createdAt,
      finishedAt: sheets.finishedAt,
    })
    .from(sheets)
    .innerJoin(people, eq(people.id, sheets.createdBy))
    .where(and(eq(sheets.workshopId, workshopId), only))
    .orderBy(desc(sheets.createdAt), desc(sheets.id));
}

/** Newest first. */
export function listSheets(scope: WorkshopScope, studyId: string): Promise<SheetRow[]> {
  return selectSheets(scope, eq(sheets.studyId, studyId));
}

export async function findSheet(scope: WorkshopScope, id: string): Promise<SheetRow | null> {
  const [row] = await selectSheets(scope, eq(sheets.id, id));
  return row ?? null;
}

/** False, and the sheet left as it is, when one has this id already. */
export async function addSheet({ tx, workshopId }: WorkshopScope, sheet: NewSheet): Promise<boolean> {
  const added = await tx
    .insert(sheets)
    .values({ ...sheet, workshopId })
    .onConflictDoNothing()
    .returning({ id: sheets.id });
  return added.length === 1;
}

type Ending =
  | { status: "made"; storageKey: string; fileName: string; byteSize: number }
  | { status: "failed"; failure: string };

/** Ends a sheet that is still in the queue; one that has ended stays as it is. */
export async function finishSheet(
  { tx, workshopId }: WorkshopScope,
  id: string,
  ending: Ending,
): Promise<void> {
  await tx
    .update(sheets)
    .set({ ...ending, finishedAt: sql`now()` })
    .where(and(eq(sheets.workshopId, workshopId), eq(sheets.id, id), eq(sheets.status, "queued")));
}
