import { builds, people, studies, type WorkshopScope } from "@linkwright/db";
import { and, desc, eq, sql } from "drizzle-orm";

export type NewBuild = Omit<typeof builds.$inferInsert, "workshopId">;
export type BuildRow = Awaited<ReturnType<typeof listBuilds>>[number];

function selectBuilds({ tx, workshopId }: WorkshopScope, only?: string) {
  return tx
    .select({
      id: builds.id,
      name: builds.name,
      summary: builds.summary,
      studyCount: sql<number>`(${tx
        .select({ count: sql`count(*)::int` })
        .from(studies)
        .where(and(eq(studies.workshopId, builds.workshopId), eq(studies.buildId, builds.id)))})`,
      createdBy: { id: people.id, name: people.name },
      createdAt: builds.createdAt,
      updatedAt: builds.updatedAt,
    })
    .from(builds)
    .innerJoin(people, eq(people.id, builds.createdBy))
    .where(and(eq(builds.workshopId, workshopId), only === undefined ? undefined : eq(builds.id, only)));
}

export function listBuilds(scope: WorkshopScope) {
  return selectBuilds(scope).orderBy(desc(builds.createdAt), desc(builds.id));
}

export async function findBuild(scope: WorkshopScope, id: string): Promise<BuildRow | null> {
  const [row] = await selectBuilds(scope, id);
  return row ?? null;
}

/** Leaves a build that has this id already as it is. */
export async function addBuild({ tx, workshopId }: WorkshopScope, build: NewBuild): Promise<void> {
  await tx
    .insert(builds)
    .values({ ...build, workshopId })
    .onConflictDoNothing();
}

/** False when there is no such build. */
export async function changeBuild(
  { tx, workshopId }: WorkshopScope,
  id: string,
  change: Partial<Pick<NewBuild, "name" | "summary">>,
): Promise<boolean> {
  const changed = await tx
    .update(builds)
    .set({ ...change, updatedAt: sql`now()` })
    .where(and(eq(builds.workshopId, workshopId), eq(builds.id, id)))
    .returning({ id: builds.id });
  return changed.length === 1;
}
