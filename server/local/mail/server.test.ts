import { mkdtempSync, readdirSync, rmSync } from "node:fs";
import type { AddressInfo, Server } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { createTransport } from "nodemailer";
import type { SMTPServer } from "smtp-server";
import { afterEach, beforeEach, expect, test } from "vitest";
import { createMailPages, createSmtpServer } from "./server.ts";
import { openMailStore } from "./store.ts";

let folder: string;
let smtp: SMTPServer;
let pages: Server;
let address: string;
let smtpPort: number;

async function listen(server: Server): Promise<number> {
  await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
  return (server.address() as AddressInfo).port;
}

async function open(): Promise<void> {
  const store = await openMailStore(folder);
  smtp = createSmtpServer(store);
  pages = createMailPages(store);
  smtpPort = await listen(smtp.server);
  address = `http://127.0.0.1:${await listen(pages)}`;
}

async function close(): Promise<void> {
  await new Promise<void>((resolve) => smtp.close(() => resolve()));
  await new Promise((resolve) => pages.close(resolve));
}

async function send(subject: string, text: string, html?: string): Promise<void> {
  const transport = createTransport({ host: "127.0.0.1", port: smtpPort });
  await transport.sendMail({ from: "shop@linkwright.example", to: "eva@shop.example", subject, text, html });
  transport.close();
}

const get = async (path: string) => (await fetch(address + path)).text();

beforeEach(async () => {
  folder = mkdtempSync(join(tmpdir(), "mail-"));
  await open();
});
afterEach(async () => {
  await close();
  rmSync(folder, { recursive: true });
});

test("a message that was sent is read on a page, also after a restart", async () => {
  await send("Grüße from the jig", "Shim the left rack mount by 0.5 mm.");
  await close();
  await open();
  const [message] = JSON.parse(await get("/messages.json"));
  expect(message).toMatchObject({ subject: "Grüße from the jig", to: "eva@shop.example", html: null });
  expect(await get("/")).toContain("Grüße from the jig");
  expect(await get(`/messages/${message.id}`)).toContain("Shim the left rack mount by 0.5 mm.");
});

test("the newest message comes first", async () => {
  await send("first", "1");
  await send("second", "2");
  const subjects = JSON.parse(await get("/messages.json")).map(
    (message: { subject: string }) => message.subject,
  );
  expect(subjects).toEqual(["second", "first"]);
});

test("an address in the text is a link, and nothing in a message becomes markup of ours", async () => {
  await send("<script>alert(1)</script>", `Reset: http://localhost:3000/reset?a=1&b="2" <b>bold</b>`);
  const [message] = JSON.parse(await get("/messages.json"));
  const page = await get(`/messages/${message.id}`);
  expect(page).toContain('href="http://localhost:3000/reset?a=1&amp;b="');
  expect(page).toContain("&lt;b&gt;bold&lt;/b&gt;");
  expect(page).not.toContain("<script>");
});

test("a message's HTML is shown in a sandbox in which no script runs", async () => {
  await send("Welcome", "plain", "<p>rich</p><script>alert(1)</script>");
  const [message] = JSON.parse(await get("/messages.json"));
  expect(await get(`/messages/${message.id}`)).toContain('sandbox="allow-popups"');
  const html = await fetch(`${address}/messages/${message.id}/html`);
  expect(html.headers.get("content-security-policy")).toMatch(/default-src 'none'.*sandbox/);
  expect(await html.text()).toContain("<p>rich</p>");
});

test("no other file is reached through a message's name", async () => {
  for (const path of [
    "/messages/..%2f..%2fetc%2fpasswd",
    "/messages/1-1",
    "/messages/1-1/html",
    "/nothing",
  ]) {
    expect((await fetch(address + path)).status, path).toBe(404);
  }
  expect(readdirSync(folder)).toEqual([]);
});
