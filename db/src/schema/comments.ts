import { sql } from "drizzle-orm";
import { check, foreignKey, index, integer, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { createdAt, instant, onlyItsWorkshop, workshopId } from "./columns.ts";
import { people } from "./people.ts";
import { revisions } from "./revisions.ts";
import { studies } from "./studies.ts";

export const comments = pgTable(
  "comments",
  {
    workshopId: workshopId(),
    id: uuid("id").notNull(),
    studyId: uuid("study_id").notNull(),
    /** The revision that was being looked at; null for the draft. */
    revisionNumber: integer("revision_number"),
    pin: text("pin", { enum: ["study", "hardpoint"] }).notNull(),
    /** Null when the comment is on the whole study. */
    hardpointPath: text("hardpoint_path"),
    text: text("text").notNull(),
    createdBy: uuid("created_by")
      .notNull()
      .references(() => people.id),
    createdAt: createdAt(),
    resolvedBy: uuid("resolved_by").references(() => people.id),
    resolvedAt: instant("resolved_at"),
  },
  (table) => [
    primaryKey({ columns: [table.workshopId, table.id] }),
    foreignKey({
      name: "comments_study",
      columns: [table.workshopId, table.studyId],
      foreignColumns: [studies.workshopId, studies.id],
    }),
    foreignKey({
      name: "comments_revision",
      columns: [table.workshopId, table.studyId, table.revisionNumber],
      foreignColumns: [revisions.workshopId, revisions.studyId, revisions.number],
    }),
    index("comments_of_study").on(table.workshopId, table.studyId, table.createdAt),
    check("comments_text_length", sql`length(${table.text}) between 1 and 4000`),
    check("comments_pin", sql`${table.pin} in ('study', 'hardpoint')`),
    check("comments_pin_path", sql`(${table.pin} = 'hardpoint') = (${table.hardpointPath} is not null)`),
    check("comments_resolved", sql`(${table.resolvedBy} is null) = (${table.resolvedAt} is null)`),
    onlyItsWorkshop(),
  ],
);
