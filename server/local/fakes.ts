// The stand-ins for what a hosted installation buys: mail by SMTP, files by the S3 API. One program of its own, so that
// the server and the worker reach them over the network as they would reach the real ones.
import type { AddressInfo, Server } from "node:net";
import { join } from "node:path";
import S3rver from "s3rver";
import { createMailPages, createSmtpServer } from "./mail/server.ts";
import { openMailStore } from "./mail/store.ts";

/** What it tells its parent once everything listens. */
export type FakesReady = { readonly smtpPort: number; readonly pagePort: number; readonly s3Port: number };

const HOST = "127.0.0.1";

function readEnvironment(name: string): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is not set: this program is started by server/local/services.ts`);
  return value;
}

function listen(server: Server, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once("error", reject);
    server.listen(port, HOST, () => resolve((server.address() as AddressInfo).port));
  });
}

const folder = readEnvironment("FAKES_FOLDER");
const store = await openMailStore(join(folder, "mail"));
const smtp = createSmtpServer(store);
const pages = createMailPages(store);
const s3 = new S3rver({
  address: HOST,
  port: 0,
  silent: true,
  directory: join(folder, "files"),
  vhostBuckets: false,
  configureBuckets: [{ name: readEnvironment("S3_BUCKET"), configs: [] }],
});

smtp.on("error", (error) => console.error(`SMTP: ${error.message}`)); // one connection's trouble is not the server's
const ready: FakesReady = {
  smtpPort: await listen(smtp.server, 0),
  pagePort: await listen(pages, Number(readEnvironment("MAIL_PAGE_PORT"))),
  s3Port: (await s3.run()).port,
};
process.send?.(ready);

async function stop(): Promise<void> {
  pages.closeAllConnections();
  await Promise.all([
    new Promise<void>((resolve) => smtp.close(() => resolve())),
    new Promise<void>((resolve) => pages.close(() => resolve())),
    s3.close(),
  ]);
  process.exit(0);
}

process.once("SIGTERM", () => void stop());
