import { sql } from "drizzle-orm";
import { check, foreignKey, index, integer, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { createdAt, instant, onlyItsWorkshop, workshopId } from "./columns.ts";
import { people } from "./people.ts";
import { revisions } from "./revisions.ts";

/** A file made from a revision: the row is here, the bytes are in the object store. */
export const sheets = pgTable(
  "sheets",
  {
    workshopId: workshopId(),
    id: uuid("id").notNull(),
    studyId: uuid("study_id").notNull(),
    revisionNumber: integer("revision_number").notNull(),
    kind: text("kind", { enum: ["hardpointTable"] }).notNull(),
    units: text("units", { enum: ["mm", "inch"] }).notNull(),
    status: text("status", { enum: ["queued", "made", "failed"] })
      .notNull()
      .default("queued"),
    failure: text("failure"),
    storageKey: text("storage_key"),
    fileName: text("file_name"),
    byteSize: integer("byte_size"),
    createdBy: uuid("created_by")
      .notNull()
      .references(() => people.id),
    createdAt: createdAt(),
    finishedAt: instant("finished_at"),
  },
  (table) => [
    primaryKey({ columns: [table.workshopId, table.id] }),
    foreignKey({
      name: "sheets_revision",
      columns: [table.workshopId, table.studyId, table.revisionNumber],
      foreignColumns: [revisions.workshopId, revisions.studyId, revisions.number],
    }),
    index("sheets_of_study").on(table.workshopId, table.studyId, table.createdAt),
    check("sheets_kind", sql`${table.kind} in ('hardpointTable')`),
    check("sheets_units", sql`${table.units} in ('mm', 'inch')`),
    check("sheets_status", sql`${table.status} in ('queued', 'made', 'failed')`),
    check(
      "sheets_made",
      sql`(${table.status} = 'made') = (${table.storageKey} is not null and ${table.fileName} is not null and ${table.byteSize} is not null)`,
    ),
    check("sheets_failed", sql`(${table.status} = 'failed') = (${table.failure} is not null)`),
    check("sheets_finished", sql`(${table.status} = 'queued') = (${table.finishedAt} is null)`),
    onlyItsWorkshop(),
  ],
);
