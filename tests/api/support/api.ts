// The real server on a port of its own, before a database of its own, as each test file of this folder uses it.

import type { AddressInfo } from "node:net";
import { type Connection, connect } from "@linkwright/db";
import { type AppOptions, createApp } from "@linkwright/server/app";
import type { Storage } from "@linkwright/server/files";
import { createLog } from "@linkwright/server/log";
import { afterAll, beforeAll } from "vitest";
import { createTestDatabase, type TestDatabase } from "../../helpers/database.ts";

export interface TestApi {
  readonly url: string;
  readonly app: ReturnType<typeof createApp>;
  readonly database: TestDatabase;
  /** As the programs connect. */
  readonly connection: Connection;
  /** What the server wrote into its log. */
  readonly logged: readonly string[];
  readonly stop: () => Promise<void>;
}

export interface TestApiOptions extends Partial<Omit<AppOptions, "connection" | "log">> {
  /** Where the server reaches the database; the database's own address unless something stands in between. */
  readonly throughUrl?: (database: TestDatabase) => Promise<string> | string;
}

export const PUBLIC_URL = "http://linkwright.test";
export const MAIL_FROM = "Linkwright <mail@linkwright.test>";

/** Files are the matter of few tests; in the others, whoever opens one has gone wrong. */
export const noStorage: Storage = {
  put: () => Promise.reject(new Error("this test has no file store")),
  open: () => Promise.reject(new Error("this test has no file store")),
  close: () => {},
};

export async function startApi({ throughUrl, ...options }: TestApiOptions = {}): Promise<TestApi> {
  const database = await createTestDatabase();
  const url = throughUrl ? await throughUrl(database) : database.appUrl;
  const connection = connect({ url, poolSize: 5 });
  const logged: string[] = [];
  const app = createApp({
    storage: noStorage,
    mail: { publicUrl: PUBLIC_URL, from: MAIL_FROM },
    sessionSecret: "a secret of the tests that is long enough",
    ...options,
    connection,
    log: createLog((line) => logged.push(line)),
  });
  const server = app.listen(0, "127.0.0.1");
  await new Promise((resolve) => server.once("listening", resolve));
  const { port } = server.address() as AddressInfo;
  return {
    url: `http://127.0.0.1:${port}`,
    app,
    database,
    connection,
    logged,
    async stop() {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
      await connection.close();
      await database.drop();
    },
  };
}

/** Starts a server before the file's tests and stops it after them. */
export function serveApi(options?: TestApiOptions): () => TestApi {
  let api: TestApi | undefined;
  beforeAll(async () => {
    api = await startApi(options);
  });
  afterAll(() => api?.stop());
  return () => {
    if (!api) throw new Error("the server is started before the tests, not while they are collected");
    return api;
  };
}
