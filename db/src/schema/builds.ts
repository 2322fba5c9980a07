import { sql } from "drizzle-orm";
import { check, index, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { createdAt, instant, onlyItsWorkshop, workshopId } from "./columns.ts";
import { people, workshops } from "./people.ts";

export const builds = pgTable(
  "builds",
  {
    workshopId: workshopId().references(() => workshops.id),
    id: uuid("id").notNull(),
    name: text("name").notNull(),
    summary: text("summary").notNull().default(""),
    createdBy: uuid("created_by")
      .notNull()
      .references(() => people.id),
    createdAt: createdAt(),
    updatedAt: instant("updated_at").notNull().defaultNow(),
  },
  (table) => [
    // The workshop is part of every key: an id made by a client of one workshop can never meet another's row.
    primaryKey({ columns: [table.workshopId, table.id] }),
    index("builds_newest").on(table.workshopId, table.createdAt),
    check("builds_name_length", sql`length(${table.name}) between 1 and 120`),
    check("builds_summary_length", sql`length(${table.summary}) <= 2000`),
    onlyItsWorkshop(),
  ],
);
