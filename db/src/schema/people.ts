// People, the workshops they belong to, and their sessions.

import { sql } from "drizzle-orm";
import {
  check,
  index,
  integer,
  json,
  pgPolicy,
  pgTable,
  primaryKey,
  text,
  uniqueIndex,
  uuid,
  varchar,
} from "drizzle-orm/pg-core";
import { appRole, createdAt, currentPerson, currentWorkshop, instant, workshopId } from "./columns.ts";

export const people = pgTable(
  "people",
  {
    id: uuid("id").primaryKey(),
    /** In small letters. */
    email: text("email").notNull(),
    name: text("name").notNull(),
    passwordHash: text("password_hash").notNull(),
    units: text("units", { enum: ["mm", "inch"] })
      .notNull()
      .default("mm"),
    dialect: text("dialect", { enum: ["uk", "us"] })
      .notNull()
      .default("uk"),
    theme: text("theme", { enum: ["light", "dark", "system"] })
      .notNull()
      .default("system"),
    cautionsAcknowledgedAt: instant("cautions_acknowledged_at").notNull(),
    /** Which wording was acknowledged. */
    cautionsEdition: integer("cautions_edition").notNull(),
    createdAt: createdAt(),
  },
  (table) => [
    uniqueIndex("people_email").on(table.email),
    check("people_email_is_small", sql`${table.email} = lower(${table.email})`),
    check("people_email_length", sql`length(${table.email}) between 3 and 254`),
    check("people_name_length", sql`length(${table.name}) between 1 and 120`),
    check("people_units", sql`${table.units} in ('mm', 'inch')`),
    check("people_dialect", sql`${table.dialect} in ('uk', 'us')`),
    check("people_theme", sql`${table.theme} in ('light', 'dark', 'system')`),
  ],
);

export const workshops = pgTable(
  "workshops",
  {
    id: uuid("id").primaryKey(),
    name: text("name").notNull(),
    createdAt: createdAt(),
  },
  (table) => [
    check("workshops_name_length", sql`length(${table.name}) between 1 and 120`),
    pgPolicy("itself_or_ones_own", {
      for: "select",
      to: appRole,
      using: sql`id = ${currentWorkshop} or id in (select memberships.workshop_id from memberships where memberships.person_id = ${currentPerson})`,
    }),
    pgPolicy("made_as_itself", { for: "insert", to: appRole, withCheck: sql`id = ${currentWorkshop}` }),
    pgPolicy("changed_as_itself", {
      for: "update",
      to: appRole,
      using: sql`id = ${currentWorkshop}`,
      withCheck: sql`id = ${currentWorkshop}`,
    }),
  ],
);

export const memberships = pgTable(
  "memberships",
  {
    workshopId: workshopId().references(() => workshops.id),
    personId: uuid("person_id")
      .notNull()
      .references(() => people.id),
    role: text("role", { enum: ["owner", "engineer", "fabricator", "reviewer"] }).notNull(),
    createdAt: createdAt(),
  },
  (table) => [
    primaryKey({ columns: [table.workshopId, table.personId] }),
    index("memberships_person").on(table.personId),
    check("memberships_role", sql`${table.role} in ('owner', 'engineer', 'fabricator', 'reviewer')`),
    pgPolicy("of_the_workshop_or_ones_own", {
      for: "select",
      to: appRole,
      using: sql`workshop_id = ${currentWorkshop} or person_id = ${currentPerson}`,
    }),
    pgPolicy("made_in_the_workshop", {
      for: "insert",
      to: appRole,
      withCheck: sql`workshop_id = ${currentWorkshop}`,
    }),
  ],
);

/** The table that connect-pg-simple expects, under a name of ours. */
export const sessions = pgTable(
  "sessions",
  {
    sid: varchar("sid").primaryKey(),
    sess: json("sess").notNull(),
    expire: instant("expire").notNull(),
  },
  (table) => [index("sessions_expire").on(table.expire)],
);
