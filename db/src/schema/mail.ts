// What is kept beside the workshops' own data: mail to be sent, and how often somebody has tried something.

import { sql } from "drizzle-orm";
import { bigint, check, index, integer, pgTable, text, uuid, varchar } from "drizzle-orm/pg-core";
import { createdAt, instant } from "./columns.ts";

/** A mail is written in the transaction of what it tells of, and sent by the worker afterwards. */
export const outbox = pgTable(
  "outbox",
  {
    id: uuid("id").primaryKey(),
    /** The Message-ID it keeps through every try: a mail server or reader can tell a repeat by it. */
    messageId: text("message_id").notNull().unique(),
    toAddress: text("to_address").notNull(),
    toName: text("to_name").notNull(),
    subject: text("subject").notNull(),
    bodyText: text("body_text").notNull(),
    bodyHtml: text("body_html").notNull(),
    createdAt: createdAt(),
    attempts: integer("attempts").notNull().default(0),
    /** While a worker is sending it this lies ahead; a worker that dies leaves it to be tried again then. */
    nextAttemptAt: instant("next_attempt_at").notNull().defaultNow(),
    sentAt: instant("sent_at"),
    givenUpAt: instant("given_up_at"),
    lastError: text("last_error"),
  },
  (table) => [
    index("outbox_due").on(table.nextAttemptAt).where(sql`sent_at is null and given_up_at is null`),
    check("outbox_ended_once", sql`${table.sentAt} is null or ${table.givenUpAt} is null`),
    check("outbox_subject_line", sql`${table.subject} !~ '[\\r\\n]'`),
  ],
);

/** The table that rate-limiter-flexible expects. */
export const rateLimits = pgTable(
  "rate_limits",
  {
    key: varchar("key", { length: 255 }).primaryKey(),
    points: integer("points").notNull().default(0),
    /** Milliseconds since 1970. */
    expire: bigint("expire", { mode: "number" }),
  },
  (table) => [index("rate_limits_expire").on(table.expire)],
);
