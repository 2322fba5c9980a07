// What the tables have in common: stamps, and the wall between workshops.

import { sql } from "drizzle-orm";
import { pgPolicy, pgRole, timestamp, uuid } from "drizzle-orm/pg-core";

/** The role that server and worker connect as: neither owner nor superuser, so that every policy holds for it. */
export const appRole = pgRole("linkwright_app").existing();

/** The workshop that inWorkshop() has set for this transaction; null outside, and null equals nothing. */
export const currentWorkshop = sql`nullif(current_setting('linkwright.workshop_id', true), '')::uuid`;

/** The person that asPerson() has set for this transaction. */
export const currentPerson = sql`nullif(current_setting('linkwright.person_id', true), '')::uuid`;

/** Row-level security of a tenant table: a query that forgets its `where` still sees one workshop only. */
export function onlyItsWorkshop() {
  return pgPolicy("only_its_workshop", {
    for: "all",
    to: appRole,
    using: sql`workshop_id = ${currentWorkshop}`,
    withCheck: sql`workshop_id = ${currentWorkshop}`,
  });
}

export const instant = (name: string) => timestamp(name, { withTimezone: true, mode: "date" });
export const createdAt = () => instant("created_at").notNull().defaultNow();
export const workshopId = () => uuid("workshop_id").notNull();
