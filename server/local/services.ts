// Everything a Linkwright on one machine consists of, started in order: database, mail and files, server, worker.
import { randomBytes } from "node:crypto";
import { existsSync, mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { migrateDatabase } from "@linkwright/db";
import { databaseUrls, ensureDatabase, type Place, startCluster } from "@linkwright/db/postgres";
import { type Context, PlainProblem } from "./context.ts";
import type { FakesReady } from "./fakes.ts";
import {
  endOfLog,
  freePort,
  type Held,
  runToEnd,
  type Service,
  startService,
  whileRunning,
} from "./processes.ts";

export type Settings = {
  /** Where mail, files, secrets and logs are kept. */
  readonly folder: string;
  readonly place: Place;
  readonly durable: boolean;
  readonly port: number;
  readonly host: string;
  readonly publicUrl: string;
  /** Absent while the bundler serves the client itself. */
  readonly webFolder?: string;
  /** Restart the server and the worker when their sources change. */
  readonly watch: boolean;
};

export type Ended = { readonly name: string; readonly how: string; readonly log: string };

export type Running = {
  readonly mailUrl: string;
  readonly accounts: readonly Record<string, unknown>[];
  /** Resolves when one of them ends by itself. */
  readonly firstEnd: Promise<Ended>;
};

const DATABASE = "linkwright";
const BUCKET = "linkwright";
const READY_TIMEOUT_MS = 60_000;
const POLL_MS = 100;

function logOf(settings: Settings, name: string): string {
  return join(settings.folder, "logs", `${name}.log`);
}

/** Kept from start to start, or everybody would be signed out by each. */
function sessionSecret(folder: string): string {
  const file = join(folder, "session-secret");
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString("hex"), { mode: 0o600 });
  return readFileSync(file, "utf8");
}

async function startDatabase(settings: Settings, context: Context, held: Held) {
  const log = logOf(settings, "postgres");
  const cluster = await startCluster(settings.place, { durable: settings.durable, log });
  held.push(cluster.stop);
  const isNew = await ensureDatabase(cluster.adminUrl, DATABASE);
  context.stop.throwIfAborted();
  const notes = [`port ${cluster.port}`, `data in ${cluster.folder}`, cluster.recovered];
  const ended = cluster.exited.then((how) => ({ name: "database server", how, log }));
  return {
    isNew,
    ended,
    urls: databaseUrls(cluster.adminUrl, DATABASE),
    note: notes.filter(Boolean).join(", "),
  };
}

/** Begun before the database and waited for after it, as neither needs the other. */
async function beginFakes(settings: Settings, context: Context, held: Held): Promise<Service> {
  const pagePort = await freePort(settings.port + 1);
  const service = startService({
    name: "mail and file server",
    args: ["--import", "tsx", join(context.root, "server/local/fakes.ts")],
    cwd: context.root,
    env: { FAKES_FOLDER: settings.folder, S3_BUCKET: BUCKET, MAIL_PAGE_PORT: String(pagePort) },
    log: logOf(settings, "fakes"),
    echo: "none",
  });
  held.push(service.stop);
  return service;
}

async function waitForFakes(service: Service, context: Context) {
  const ports = (await whileRunning(service, context.stop, service.message)) as FakesReady;
  return { ports, note: `mail at http://127.0.0.1:${ports.pagePort}` };
}

function programEnvironment(settings: Settings, urls: { app: string; owner: string }, ports: FakesReady) {
  return {
    NODE_ENV: settings.watch ? "development" : "production",
    DATABASE_URL: urls.app,
    DATABASE_OWNER_URL: undefined, // the programs never get the owner's address
    PORT: String(settings.port),
    HOST: settings.host,
    PUBLIC_URL: settings.publicUrl,
    SESSION_SECRET: sessionSecret(settings.folder),
    SMTP_URL: `smtp://127.0.0.1:${ports.smtpPort}`,
    MAIL_FROM: "Linkwright <no-reply@linkwright.example>",
    S3_ENDPOINT: `http://127.0.0.1:${ports.s3Port}`,
    S3_REGION: "us-east-1",
    S3_BUCKET: BUCKET,
    S3_ACCESS_KEY_ID: "S3RVER", // the fake knows this pair only
    S3_SECRET_ACCESS_KEY: "S3RVER",
    WEB_DIR: settings.webFolder,
  };
}

/** Once for each database: what people have since changed or removed in the demo stays as they left it. */
async function seedOnce(
  settings: Settings,
  context: Context,
  env: Record<string, string | undefined>,
  isNew: boolean,
) {
  const file = join(settings.folder, "demo-accounts.json");
  const isDue = isNew || !existsSync(file);
  if (isDue) {
    const log = logOf(settings, "seed");
    const args = ["--import", "tsx", join(context.root, "db/src/seed.ts")];
    const how = await runToEnd(
      { name: "seed", args, cwd: context.root, env, log, echo: "none" },
      context.stop,
    );
    if (how !== "exit code 0") {
      throw new PlainProblem(`The demo cannot be seeded (${how}). The end of ${log}:\n${endOfLog(log)}`);
    }
    const lines = readFileSync(log, "utf8").split("\n");
    writeFileSync(file, `[${lines.filter((line) => line.startsWith("{")).join()}]`);
  }
  const accounts = JSON.parse(readFileSync(file, "utf8")) as Record<string, unknown>[];
  return { accounts, note: isDue ? "" : "was done before" };
}

async function waitUntilReady(service: Service, settings: Settings, context: Context): Promise<void> {
  const host = settings.host === "0.0.0.0" ? "127.0.0.1" : settings.host;
  const until = performance.now() + READY_TIMEOUT_MS;
  while (!service.hasExited() && !context.stop.aborted && performance.now() < until) {
    const response = await fetch(`http://${host}:${settings.port}/readyz`).catch(() => null);
    await response?.body?.cancel();
    if (response?.ok) return;
    await new Promise((resolve) => setTimeout(resolve, POLL_MS));
  }
  throw new PlainProblem(`The web server is not ready. The end of ${service.log}:\n${endOfLog(service.log)}`);
}

async function startPrograms(
  settings: Settings,
  context: Context,
  held: Held,
  env: Record<string, string | undefined>,
) {
  const start = (name: string, program: string, log: string) => {
    const how = settings.watch
      ? [join(context.root, "node_modules/tsx/dist/cli.mjs"), "watch", "--clear-screen=false"]
      : ["--import", "tsx"];
    const service = startService({
      name,
      args: [...how, join(context.root, program)],
      cwd: context.root,
      env,
      log: logOf(settings, log),
      echo: settings.watch ? "named" : "none",
    });
    held.push(service.stop);
    return service;
  };
  const worker = start("job worker", "server/src/worker.ts", "worker");
  const web = start("web server", "server/src/main.ts", "web");
  await whileRunning(worker, context.stop, waitUntilReady(web, settings, context));
  return [worker, web];
}

export async function startServices(settings: Settings, context: Context, held: Held): Promise<Running> {
  mkdirSync(join(settings.folder, "logs"), { recursive: true });
  const fakesService = await beginFakes(settings, context, held);
  const database = await context.step("Starting the database", () => startDatabase(settings, context, held));
  await context.step("Bringing its tables up to date", () => migrateDatabase(database.urls.owner));
  context.stop.throwIfAborted();
  const fakes = await context.step("Starting mail and file storage", () =>
    waitForFakes(fakesService, context),
  );
  const env = programEnvironment(settings, database.urls, fakes.ports);
  const demo = await context.step("Seeding the demo", () =>
    seedOnce(settings, context, { ...env, DATABASE_OWNER_URL: database.urls.owner }, database.isNew),
  );
  const programs = await context.step("Starting the web server and the job worker", () =>
    startPrograms(settings, context, held, env),
  );
  const ends = [...programs, fakesService].map(async ({ name, exited, log }) => ({
    name,
    how: await exited,
    log,
  }));
  return {
    mailUrl: `http://127.0.0.1:${fakes.ports.pagePort}`,
    accounts: demo.accounts,
    firstEnd: Promise.race([database.ended, ...ends]),
  };
}
