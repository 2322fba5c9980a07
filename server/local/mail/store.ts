// Messages as files: one `.eml` each, so that they outlive a restart and any mail program can open them.
import { createWriteStream } from "node:fs";
import { mkdir, open, readdir, readFile, rename, rm } from "node:fs/promises";
import { join } from "node:path";
import type { Readable } from "node:stream";
import { pipeline } from "node:stream/promises";
import { type AddressObject, simpleParser } from "mailparser";

export type Message = {
  readonly id: string;
  readonly receivedAt: string;
  readonly from: string;
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string | null;
  readonly attachments: readonly { readonly name: string; readonly bytes: number }[];
};

export type MailStore = {
  save(message: Readable): Promise<string>;
  /** Newest first. */
  list(limit: number): Promise<Message[]>;
  find(id: string): Promise<Message | null>;
};

/** Milliseconds since 1970, then a count within them: in the order of arrival, and safe as a file name. */
const ID = /^\d{13}-\d{4}$/;

function addressText(address: AddressObject | AddressObject[] | undefined): string {
  return [address ?? []]
    .flat()
    .map((part) => part.text)
    .join(", ");
}

async function syncToDisk(path: string): Promise<void> {
  const file = await open(path, "r");
  await file.sync();
  await file.close();
}

export async function openMailStore(folder: string, now: () => number = Date.now): Promise<MailStore> {
  await mkdir(folder, { recursive: true });
  let count = 0;

  async function save(message: Readable): Promise<string> {
    count = (count + 1) % 10_000;
    const id = `${now()}-${String(count).padStart(4, "0")}`;
    const path = join(folder, `${id}.eml`);
    const partial = `${path}.part`;
    try {
      await pipeline(message, createWriteStream(partial, { mode: 0o600 }));
      await syncToDisk(partial);
      await rename(partial, path);
    } catch (error) {
      await rm(partial, { force: true });
      throw error;
    }
    return id;
  }

  async function find(id: string): Promise<Message | null> {
    if (!ID.test(id)) return null;
    const source = await readFile(join(folder, `${id}.eml`)).catch(() => null);
    if (!source) return null;
    const mail = await simpleParser(source, { skipTextToHtml: true });
    return {
      id,
      receivedAt: new Date(Number(id.slice(0, 13))).toISOString(),
      from: addressText(mail.from),
      to: addressText(mail.to),
      subject: mail.subject ?? "",
      text: mail.text ?? "",
      html: mail.html || null,
      attachments: mail.attachments.map((part) => ({ name: part.filename ?? "unnamed", bytes: part.size })),
    };
  }

  async function list(limit: number): Promise<Message[]> {
    const ids = (await readdir(folder))
      .filter((name) => name.endsWith(".eml"))
      .map((name) => name.slice(0, -4));
    const newest = ids.sort().reverse().slice(0, limit);
    const messages = await Promise.all(newest.map(find));
    return messages.filter((message) => message !== null);
  }

  return { save, list, find };
}
