// The two programs as they are run: they start from their environment alone, and stop when they are asked to.

import { type ChildProcess, spawn } from "node:child_process";
import { once } from "node:events";
import { createInterface } from "node:readline";
import { fileURLToPath } from "node:url";
import { afterAll, beforeAll, expect, test, vi } from "vitest";
import { createTestDatabase, type TestDatabase } from "../helpers/database.ts";

const ROOT = fileURLToPath(new URL("../..", import.meta.url));
let database: TestDatabase;

beforeAll(async () => {
  database = await createTestDatabase();
});

afterAll(() => database?.drop());

interface Program {
  readonly child: ChildProcess;
  readonly lines: readonly { readonly event: string; readonly port?: number }[];
  readonly errors: () => string;
  /** Its exit status. */
  readonly ended: Promise<number | null>;
}

function run(path: string, change: Record<string, string | undefined> = {}): Program {
  const env: Record<string, string | undefined> = {
    PATH: process.env.PATH,
    DATABASE_URL: database.appUrl,
    PORT: "0",
    PUBLIC_URL: "http://linkwright.test",
    SESSION_SECRET: "a secret of the tests that is long enough",
    MAIL_FROM: "mail@linkwright.test",
    SMTP_URL: "smtp://127.0.0.1:1",
    S3_ENDPOINT: "http://127.0.0.1:1",
    S3_BUCKET: "files",
    S3_ACCESS_KEY_ID: "key",
    S3_SECRET_ACCESS_KEY: "secret",
    ...change,
  };
  const child = spawn(process.execPath, ["--import", "tsx", path], {
    cwd: ROOT,
    env: env as NodeJS.ProcessEnv, // a member that is undefined is left out
    stdio: ["ignore", "pipe", "pipe"],
  });
  const lines: Program["lines"][number][] = [];
  let errors = "";
  createInterface(child.stdout!).on("line", (line) => lines.push(JSON.parse(line)));
  child.stderr!.on("data", (chunk) => {
    errors += chunk;
  });
  return { child, lines, errors: () => errors, ended: once(child, "close").then(([status]) => status) };
}

const said = (program: Program, event: string) =>
  vi.waitFor(
    () => {
      const line = program.lines.find((entry) => entry.event === event);
      expect(line, program.errors()).toBeDefined();
      return line!;
    },
    { timeout: 20_000, interval: 50 },
  );

test("the server listens, answers, and on SIGTERM ends by itself", async () => {
  const server = run("server/src/main.ts");
  const { port } = await said(server, "listening");
  const reply = await fetch(`http://127.0.0.1:${port}/readyz`);
  expect(await reply.json()).toEqual({ status: "ready" });
  server.child.kill("SIGTERM");
  expect(await server.ended, server.errors()).toBe(0);
});

test("the server starts while the database is away, and says that it is not ready", async () => {
  const away = new URL(database.appUrl);
  away.port = "1";
  const server = run("server/src/main.ts", { DATABASE_URL: away.href });
  const { port } = await said(server, "listening");
  expect((await fetch(`http://127.0.0.1:${port}/healthz`)).status).toBe(200);
  expect((await fetch(`http://127.0.0.1:${port}/readyz`)).status).toBe(503);
  server.child.kill("SIGINT");
  expect(await server.ended, server.errors()).toBe(0);
});

test("the worker takes jobs, and on SIGTERM ends by itself", async () => {
  const worker = run("server/src/worker.ts");
  await said(worker, "worker takes jobs");
  worker.child.kill("SIGTERM");
  expect(await worker.ended, worker.errors()).toBe(0);
});

test.each(["server/src/main.ts", "server/src/worker.ts"])(
  "%s without its settings ends with what is missing",
  async (path) => {
    const program = run(path, { DATABASE_URL: undefined, S3_BUCKET: undefined });
    expect(await program.ended).not.toBe(0);
    expect(program.errors()).toContain("DATABASE_URL is not set");
    expect(program.errors()).toContain("S3_BUCKET is not set");
  },
);
