// Mail is posted into the outbox in the transaction of what it tells of: either both happen or neither.

import { randomUUID } from "node:crypto";
import { outbox, type Tx } from "@linkwright/db";
import type { Message } from "./messages.ts";
import type { MailSettings } from "./settings.ts";

export async function postMail(tx: Tx, settings: MailSettings, message: Message): Promise<void> {
  const id = randomUUID();
  await tx.insert(outbox).values({
    id,
    messageId: `<${id}@${mailDomain(settings.from)}>`,
    toAddress: message.to.email,
    toName: message.to.name,
    subject: message.subject,
    bodyText: message.text,
    bodyHtml: message.html,
  });
}

function mailDomain(from: string): string {
  return from.replace(/>\s*$/, "").split("@").at(-1) ?? "localhost";
}
