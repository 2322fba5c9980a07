// Studies with their drafts, and the log of edits that made each draft what it is.

import { sql } from "drizzle-orm";
import {
  check,
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  unique,
  uuid,
} from "drizzle-orm/pg-core";
import { builds } from "./builds.ts";
import { createdAt, instant, onlyItsWorkshop, workshopId } from "./columns.ts";
import { people } from "./people.ts";

export const studies = pgTable(
  "studies",
  {
    workshopId: workshopId(),
    id: uuid("id").notNull(),
    buildId: uuid("build_id").notNull(),
    name: text("name").notNull(),
    draft: jsonb("draft").notNull(),
    draftFormat: text("draft_format").notNull(),
    /** Up by one with every save. */
    version: integer("version").notNull().default(1),
    createdBy: uuid("created_by")
      .notNull()
      .references(() => people.id),
    createdAt: createdAt(),
    updatedBy: uuid("updated_by")
      .notNull()
      .references(() => people.id),
    updatedAt: instant("updated_at").notNull().defaultNow(),
  },
  (table) => [
    primaryKey({ columns: [table.workshopId, table.id] }),
    foreignKey({
      name: "studies_build",
      columns: [table.workshopId, table.buildId],
      foreignColumns: [builds.workshopId, builds.id],
    }),
    index("studies_of_build").on(table.workshopId, table.buildId, table.createdAt),
    check("studies_name_length", sql`length(${table.name}) between 1 and 120`),
    check("studies_version", sql`${table.version} >= 1`),
    check("studies_draft_format", sql`${table.draft} ->> 'format' is not distinct from ${table.draftFormat}`),
    onlyItsWorkshop(),
  ],
);

/** One accepted save. Its id is the client's, so a repeat finds itself here and changes nothing. */
export const draftEdits = pgTable(
  "draft_edits",
  {
    workshopId: workshopId(),
    id: uuid("id").notNull(),
    studyId: uuid("study_id").notNull(),
    /** The version that this save made. */
    version: integer("version").notNull(),
    baseVersion: integer("base_version").notNull(),
    /** SHA-256 of what was asked for, so that an id used again for something else is noticed. */
    requestHash: text("request_hash").notNull(),
    /** What it changed: path, from and to, in the order they were made. */
    edits: jsonb("edits").notNull(),
    createdBy: uuid("created_by")
      .notNull()
      .references(() => people.id),
    createdAt: createdAt(),
  },
  (table) => [
    primaryKey({ columns: [table.workshopId, table.id] }),
    foreignKey({
      name: "draft_edits_study",
      columns: [table.workshopId, table.studyId],
      foreignColumns: [studies.workshopId, studies.id],
    }),
    unique("draft_edits_version").on(table.workshopId, table.studyId, table.version),
    check("draft_edits_base", sql`${table.baseVersion} >= 1 and ${table.baseVersion} < ${table.version}`),
    check("draft_edits_list", sql`jsonb_typeof(${table.edits}) = 'array'`),
    onlyItsWorkshop(),
  ],
);
