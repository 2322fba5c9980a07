import { type Db, memberships, type PersonScope, people, type Tx, workshops } from "@linkwright/db";
import { asc, eq } from "drizzle-orm";

export type PersonRow = typeof people.$inferSelect;
export type NewPerson = typeof people.$inferInsert;

export async function findPersonByEmail(db: Db | Tx, email: string): Promise<PersonRow | null> {
  const [row] = await db.select().from(people).where(eq(people.email, email));
  return row ?? null;
}

export async function findPerson(db: Db | Tx, id: string): Promise<PersonRow | null> {
  const [row] = await db.select().from(people).where(eq(people.id, id));
  return row ?? null;
}

/** False when the id or the e-mail address is taken. */
export async function addPerson(tx: Tx, person: NewPerson): Promise<boolean> {
  const added = await tx.insert(people).values(person).onConflictDoNothing().returning({ id: people.id });
  return added.length === 1;
}

/** False when the id is taken. */
export async function addWorkshop(tx: Tx, workshop: typeof workshops.$inferInsert): Promise<boolean> {
  const added = await tx
    .insert(workshops)
    .values(workshop)
    .onConflictDoNothing()
    .returning({ id: workshops.id });
  return added.length === 1;
}

export async function addMembership(tx: Tx, membership: typeof memberships.$inferInsert): Promise<void> {
  await tx.insert(memberships).values(membership);
}

export async function changePerson(
  tx: Tx,
  id: string,
  change: Partial<Pick<PersonRow, "name" | "units" | "dialect" | "theme">>,
): Promise<void> {
  await tx.update(people).set(change).where(eq(people.id, id));
}

export function listMemberships({ tx, personId }: PersonScope) {
  return tx
    .select({ workshopId: workshops.id, workshopName: workshops.name, role: memberships.role })
    .from(memberships)
    .innerJoin(workshops, eq(workshops.id, memberships.workshopId))
    .where(eq(memberships.personId, personId))
    .orderBy(asc(workshops.name), asc(workshops.id));
}
