// Sends what lies in the outbox. Several workers share the work: each claims one mail at a time.

import { type Db, outbox } from "@linkwright/db";
import { and, asc, eq, isNull, lte, sql } from "drizzle-orm";
import type { Transporter } from "nodemailer";
import { describeError, type Log } from "../log.ts";

export interface MailRun {
  readonly db: Db;
  readonly transport: Pick<Transporter, "sendMail">;
  readonly from: string;
  readonly now: () => Date;
  readonly log: Log;
}

type MailRow = typeof outbox.$inferSelect;

/** How long a mail is one worker's. A worker that died in between has its mail sent again after this, under the same
 *  Message-ID: whether the first one went out only the mail server knows. */
const CLAIM_MS = 5 * 60 * 1000;
const FIRST_WAIT_MS = 30 * 1000;
const LONGEST_WAIT_MS = 6 * 60 * 60 * 1000;
/** Three days' worth with the waits above. */
const MOST_ATTEMPTS = 20;

/** Sends all that is due and answers how many went out. */
export async function sendDueMail(run: MailRun): Promise<number> {
  let sent = 0;
  for (let mail = await claimMail(run); mail !== null; mail = await claimMail(run)) {
    if (await trySending(run, mail)) sent += 1;
  }
  return sent;
}

async function claimMail({ db, now }: MailRun): Promise<MailRow | null> {
  const at = now();
  const next = db
    .select({ id: outbox.id })
    .from(outbox)
    .where(and(isNull(outbox.sentAt), isNull(outbox.givenUpAt), lte(outbox.nextAttemptAt, at)))
    .orderBy(asc(outbox.nextAttemptAt))
    .limit(1)
    .for("update", { skipLocked: true });
  const [mail] = await db
    .update(outbox)
    .set({ attempts: sql`${outbox.attempts} + 1`, nextAttemptAt: new Date(at.getTime() + CLAIM_MS) })
    .where(eq(outbox.id, next))
    .returning();
  return mail ?? null;
}

async function trySending({ db, transport, from, now, log }: MailRun, mail: MailRow): Promise<boolean> {
  try {
    await transport.sendMail({
      messageId: mail.messageId,
      from,
      to: { name: mail.toName, address: mail.toAddress },
      subject: mail.subject,
      text: mail.bodyText,
      html: mail.bodyHtml,
      date: mail.createdAt,
    });
  } catch (error) {
    const after = afterFailure(mail.attempts, error, now());
    await db.update(outbox).set(after).where(eq(outbox.id, mail.id));
    log.error(after.givenUpAt ? "mail given up" : "mail not sent, to be tried again", {
      mailId: mail.id,
      attempts: mail.attempts,
      ...describeError(error),
    });
    return false;
  }
  await db.update(outbox).set({ sentAt: now(), lastError: null }).where(eq(outbox.id, mail.id));
  log.info("mail sent", { mailId: mail.id });
  return true;
}

function afterFailure(attempts: number, error: unknown, at: Date) {
  const lastError = error instanceof Error ? error.message : String(error);
  if (attempts >= MOST_ATTEMPTS || isRefusedForGood(error)) return { givenUpAt: at, lastError };
  const wait = Math.min(FIRST_WAIT_MS * 2 ** (attempts - 1), LONGEST_WAIT_MS);
  return { nextAttemptAt: new Date(at.getTime() + wait), lastError, givenUpAt: null };
}

/** The mail server knows this recipient and will never take mail for it. Other 5xx answers are about ourselves. */
function isRefusedForGood(error: unknown): boolean {
  if (!(error instanceof Error) || !("code" in error) || !("responseCode" in error)) return false;
  return error.code === "EENVELOPE" && typeof error.responseCode === "number" && error.responseCode >= 500;
}
