import { sql } from "drizzle-orm";
import {
  check,
  foreignKey,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  unique,
  uuid,
} from "drizzle-orm/pg-core";
import { createdAt, onlyItsWorkshop, workshopId } from "./columns.ts";
import { people } from "./people.ts";
import { studies } from "./studies.ts";

/** Never changed again but for its status: a trigger in the migrations refuses it to everybody. */
export const revisions = pgTable(
  "revisions",
  {
    workshopId: workshopId(),
    id: uuid("id").notNull(),
    studyId: uuid("study_id").notNull(),
    number: integer("number").notNull(),
    /** The draft's version that was saved. */
    version: integer("version").notNull(),
    study: jsonb("study").notNull(),
    studyFormat: text("study_format").notNull(),
    /** SHA-256 of the study's canonical JSON (RFC 8785), in hex. */
    hash: text("hash").notNull(),
    note: text("note").notNull(),
    status: text("status", {
      enum: ["saved", "inReview", "changesAsked", "approved", "released", "superseded"],
    })
      .notNull()
      .default("saved"),
    createdBy: uuid("created_by")
      .notNull()
      .references(() => people.id),
    createdAt: createdAt(),
  },
  (table) => [
    primaryKey({ columns: [table.workshopId, table.id] }),
    foreignKey({
      name: "revisions_study",
      columns: [table.workshopId, table.studyId],
      foreignColumns: [studies.workshopId, studies.id],
    }),
    unique("revisions_number").on(table.workshopId, table.studyId, table.number),
    check("revisions_number_counts", sql`${table.number} >= 1`),
    check("revisions_hash_form", sql`${table.hash} ~ '^[0-9a-f]{64}$'`),
    check("revisions_note_length", sql`length(${table.note}) <= 2000`),
    check(
      "revisions_study_format",
      sql`${table.study} ->> 'format' is not distinct from ${table.studyFormat}`,
    ),
    check(
      "revisions_status",
      sql`${table.status} in ('saved', 'inReview', 'changesAsked', 'approved', 'released', 'superseded')`,
    ),
    onlyItsWorkshop(),
  ],
);
