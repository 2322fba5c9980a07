// The database goes away and comes back, while server and worker keep running.

import { randomUUID } from "node:crypto";
import { authRoutes, buildRoutes, pathTo, sheetRoutes } from "@linkwright/contract";
import { startWorker } from "@linkwright/server/jobs";
import { quietLog } from "@linkwright/server/log";
import { afterAll, beforeAll, describe, expect, test, vi } from "vitest";
import { MAIL_FROM, startApi, type TestApi } from "./support/api.ts";
import { createClient, problemOf } from "./support/client.ts";
import { startObjectStore } from "./support/fakes.ts";
import { buildShop, PASSWORD, type Shop } from "./support/shop.ts";
import { layWire, type Wire } from "./support/wire.ts";
import { buildStudy, saveRevision } from "./support/work.ts";

let api: TestApi;
let wire: Wire;
let shop: Shop;

beforeAll(async () => {
  api = await startApi({
    throughUrl: async ({ appUrl }) => {
      wire = await layWire(appUrl);
      return wire.url;
    },
  });
  shop = await buildShop(api);
});

afterAll(async () => {
  await api?.stop();
  await wire?.stop();
});

const listBuilds = () =>
  shop.members.engineer.client.send("GET", pathTo(buildRoutes.list, { workshopId: shop.id }));

test("a request while the database is away gets a 503 that says when to come back, and the next one after it is answered", async () => {
  expect((await listBuilds()).status).toBe(200);
  wire.cut();
  const reply = await listBuilds();
  expect(problemOf(reply)).toMatchObject({ status: 503, code: "unavailable" });
  expect(reply.headers.get("retry-after")).toBe("5");
  expect(reply.text).not.toMatch(/ECONN|postgres|127\.0\.0\.1|select/i);
  wire.mend();
  expect((await listBuilds()).status).toBe(200);
});

test("signing in and writing say so as well, and what was not acknowledged is sent again with the same id", async () => {
  const body = { id: randomUUID(), name: "In the dark" };
  const create = () =>
    shop.members.engineer.client.send("POST", pathTo(buildRoutes.create, { workshopId: shop.id }), { body });
  const signIn = () =>
    createClient(api.url).send("POST", authRoutes.signIn.path, {
      body: { email: shop.members.owner.email, password: PASSWORD },
    });
  wire.cut();
  expect((await create()).status).toBe(503);
  expect((await signIn()).status).toBe(503);
  wire.mend();
  expect((await create()).status).toBe(201);
  expect((await create()).status).toBe(201);
  expect((await signIn()).status).toBe(200);
});

describe("health", () => {
  test("alive means the process, ready means the database too", async () => {
    const get = (path: string) => createClient(api.url).send("GET", path);
    expect(await get("/healthz")).toMatchObject({ status: 200, json: { status: "alive" } });
    expect(await get("/readyz")).toMatchObject({ status: 200, json: { status: "ready" } });
    wire.cut();
    expect((await get("/healthz")).status).toBe(200);
    expect(problemOf(await get("/readyz")).code).toBe("unavailable");
    wire.mend();
    expect((await get("/readyz")).status).toBe(200);
  });
});

test("a worker started while the database is away takes up its work when it is back", async () => {
  const store = await startObjectStore();
  const work = await buildStudy(shop);
  await saveRevision(shop, work);
  const sheet = { id: randomUUID(), revision: 1, kind: "hardpointTable", units: "mm" } as const;
  const { client } = shop.members.fabricator;
  await client.call(sheetRoutes.create, work.params, sheet);
  wire.cut();
  const worker = startWorker({
    connection: api.connection,
    databaseUrl: wire.url,
    storage: store.storage,
    transport: { sendMail: () => Promise.reject(new Error("no mail in this file")) },
    mailFrom: MAIL_FROM,
    log: quietLog,
    pollMs: 50,
  });
  await expect(client.send("GET", "/readyz")).resolves.toMatchObject({ status: 503 });
  wire.mend();
  await vi.waitFor(
    async () => {
      const { status } = await client.call(sheetRoutes.get, { workshopId: shop.id, sheetId: sheet.id });
      expect(status).toBe("made");
    },
    { timeout: 20_000, interval: 100 },
  );
  await worker.stop();
  await store.stop();
});
