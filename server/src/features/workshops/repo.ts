import type { Role } from "@linkwright/contract";
import { memberships, people, type WorkshopScope, workshops } from "@linkwright/db";
import { and, asc, eq } from "drizzle-orm";

/** Null for whoever is no member. */
export async function findRole({ tx, workshopId }: WorkshopScope, personId: string): Promise<Role | null> {
  const [row] = await tx
    .select({ role: memberships.role })
    .from(memberships)
    .where(and(eq(memberships.workshopId, workshopId), eq(memberships.personId, personId)));
  return row?.role ?? null;
}

export function listMembers({ tx, workshopId }: WorkshopScope) {
  return tx
    .select({
      personId: people.id,
      name: people.name,
      email: people.email,
      role: memberships.role,
      joinedAt: memberships.createdAt,
    })
    .from(memberships)
    .innerJoin(people, eq(people.id, memberships.personId))
    .where(eq(memberships.workshopId, workshopId))
    .orderBy(asc(people.name), asc(people.id));
}

export async function getWorkshopName({ tx, workshopId }: WorkshopScope): Promise<string> {
  const [row] = await tx.select({ name: workshops.name }).from(workshops).where(eq(workshops.id, workshopId));
  if (!row) throw new Error(`there is no workshop ${workshopId}`);
  return row.name;
}
