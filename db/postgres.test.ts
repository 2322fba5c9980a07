import { execFileSync } from "node:child_process";
import { existsSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import pg from "pg";
import { afterAll, beforeAll, expect, test } from "vitest";
import {
  type Cluster,
  createDatabase,
  databaseUrls,
  dropDatabase,
  ensureDatabase,
  makeTemplate,
  type Place,
  PostgresProblem,
  startCluster,
  temporaryPlace,
} from "./postgres.ts";

let place: Place;
let cluster: Cluster;
const start = () => startCluster(place, { durable: false, log: join(place.folder, "postgres.log") });

async function query(url: string, text: string): Promise<unknown[]> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return (await client.query(text)).rows;
  } finally {
    await client.end();
  }
}

beforeAll(async () => {
  place = temporaryPlace();
  cluster = await start();
  await ensureDatabase(cluster.adminUrl, "shop");
});

afterAll(async () => {
  await cluster.stop();
  rmSync(place.folder, { recursive: true });
});

test("the programs' role is neither superuser nor past row-level security, and cannot make tables", async () => {
  const { app } = databaseUrls(cluster.adminUrl, "shop");
  const [role] = await query(
    app,
    "select rolsuper, rolbypassrls, rolcreatedb from pg_roles where rolname = current_user",
  );
  expect(role).toEqual({ rolsuper: false, rolbypassrls: false, rolcreatedb: false });
  await expect(query(app, "create table public.t (x int)")).rejects.toThrow(/permission denied/);
});

test("a wrong password is refused, also on loopback", async () => {
  const url = new URL(cluster.adminUrl);
  url.password = "wrong";
  await expect(query(url.href, "select 1")).rejects.toThrow(/password authentication failed/);
});

test("a database made from a template holds its rows and is independent of it", async () => {
  await ensureDatabase(cluster.adminUrl, "pattern");
  await query(databaseUrls(cluster.adminUrl, "pattern").owner, "create table parts as select 7 as x");
  await makeTemplate(cluster.adminUrl, "pattern");
  const names = ["copy_a", "copy_b"];
  await Promise.all(names.map((name) => createDatabase(cluster.adminUrl, name, "pattern")));
  await query(databaseUrls(cluster.adminUrl, "copy_a").owner, "update parts set x = 8");
  expect(await query(databaseUrls(cluster.adminUrl, "copy_b").owner, "select x from parts")).toEqual([
    { x: 7 },
  ]);
  for (const name of [...names, "pattern"]) await dropDatabase(cluster.adminUrl, name);
  expect(await query(cluster.adminUrl, "select 1 from pg_database where datname like 'copy%'")).toEqual([]);
});

test("what was committed is there after a stop and a start, and a stop leaves no process", async () => {
  const { owner } = databaseUrls(cluster.adminUrl, "shop");
  await query(owner, "create table kept as select 'axle' as word");
  await cluster.stop();
  expect(existsSync(`/proc/${cluster.pid}`)).toBe(false);
  cluster = await start();
  expect(cluster.recovered).toBeNull();
  expect(await ensureDatabase(cluster.adminUrl, "shop")).toBe(false);
  expect(await query(databaseUrls(cluster.adminUrl, "shop").owner, "select word from kept")).toEqual([
    { word: "axle" },
  ]);
});

test("a server killed outright is started again, and the start says so", async () => {
  process.kill(cluster.pid, "SIGKILL");
  await cluster.exited;
  cluster = await start();
  expect(cluster.recovered).toContain("stale lock file");
});

test("a lock file whose process number is another program's by now does not bar the start", async () => {
  const lockFile = join(place.folder, "data/postmaster.pid");
  const lines = readFileSync(lockFile, "utf8");
  await cluster.stop();
  writeFileSync(lockFile, lines.replace(/^\d+/, String(process.pid)));
  cluster = await start();
  expect(cluster.recovered).toContain("stale lock file");
});

test("a server that an earlier start has left running is stopped first", async () => {
  const left = cluster;
  cluster = await start();
  expect(cluster.recovered).toContain(`process ${left.pid}`);
  expect(await left.exited).toBe("exit code 0");
});

test("a lost password is named with its file", async () => {
  const file = join(place.folder, "password");
  const password = readFileSync(file);
  rmSync(file);
  await expect(start()).rejects.toThrow(PostgresProblem);
  await expect(start()).rejects.toThrow(file);
  writeFileSync(file, password, { mode: 0o600 });
});

test("the server dies with the process that started it, even by kill -9", () => {
  // A process of its own starts a cluster, prints the server's number and is killed by itself.
  const program = `
    import { startCluster, temporaryPlace } from ${JSON.stringify(new URL("./postgres.ts", import.meta.url).href)};
    const place = temporaryPlace();
    const cluster = await startCluster(place, { durable: false, log: place.folder + "/log" });
    console.log(JSON.stringify({ pid: cluster.pid, folder: place.folder }));
    process.kill(process.pid, "SIGKILL");`;
  const script = join(place.folder, "orphan.mts");
  writeFileSync(script, program);
  let printed = "";
  try {
    execFileSync(process.execPath, ["--import", import.meta.resolve("tsx"), script], { encoding: "utf8" });
  } catch (error) {
    printed = (error as { stdout: string }).stdout;
  }
  const { pid, folder } = JSON.parse(printed) as { pid: number; folder: string };
  return expect
    .poll(() => existsSync(`/proc/${pid}/exe`) || existsSync(join(folder, "data/postmaster.pid")), {
      timeout: 10_000,
    })
    .toBe(false)
    .then(() => rmSync(folder, { recursive: true }));
});
